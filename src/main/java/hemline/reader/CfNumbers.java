package hemline.reader;

import hemline.sweep.Field;
import java.util.Optional;

/** Small numeric arrays of a CfRadial file, unpacked; NaN where missing. */
final class CfNumbers {
    private CfNumbers() {
    }

    static double[] of(InputFile file, ArrayVariable variable) throws UnreadableFileException {
        if (Limits.elements(file, variable.path(), variable.shape()) > Limits.MAX_FILE_RAYS) {
            throw file.broken(variable.path(), "claims more than " + Limits.MAX_FILE_RAYS + " entries");
        }
        RawArray raw = variable.read();
        Attributes attributes = variable.attributes();
        raw = attributes.text("_Unsigned").orElse("").equalsIgnoreCase("true") ? raw.asUnsigned() : raw;
        double scale = attributes.number("scale_factor").orElse(1.0);
        double offset = attributes.number("add_offset").orElse(0.0);
        Optional<Double> fill = attributes.number("_FillValue");
        Optional<Double> missing = attributes.number("missing_value");
        double[] values = raw.toDoubles();
        for (int i = 0; i < values.length; i++) {
            boolean absent = fill.isPresent() && same(values[i], fill.get(), raw)
                    || missing.isPresent() && same(values[i], missing.get(), raw)
                    || raw.isReal() && !(Math.abs(values[i]) < 9.9e36);
            values[i] = absent ? Field.NOT_MEASURED : scale * values[i] + offset;
        }
        return values;
    }

    private static boolean same(double stored, double code, RawArray raw) {
        return stored == (raw.array() instanceof float[] ? (float) code : code);
    }

    /** The named array, or the first of several names that is there and numeric. */
    static Optional<double[]> find(InputFile file, ArrayGroup group, String... names) throws UnreadableFileException {
        for (String name : names) {
            Optional<ArrayVariable> variable = group.variable(name);
            if (variable.isPresent() && !variable.get().isText()) {
                return Optional.of(of(file, variable.get()));
            }
        }
        return Optional.empty();
    }
}
