package hemline.reader;

import hemline.sweep.Field;

/**
 * From stored numbers to values by the CF attributes of a field: {@code scale_factor}, {@code add_offset},
 * {@code _FillValue}, {@code missing_value}, {@code valid_min/max/range}, {@code _Unsigned}, and CfRadial 2's
 * {@code _Undetect}. The NetCDF Users' Guide, appendix A, says which of them are in packed numbers.
 */
final class CfPacking {
    private static final double DEFAULT_REAL_FILL = 9.9e36;

    private final double scale;
    private final double offset;
    private final double[] missing;
    private final double[] undetect;
    private final double validMin;
    private final double validMax;
    private final boolean validInValues;
    private final boolean unsigned;

    private CfPacking(Attributes of, boolean real, boolean narrow) throws UnreadableFileException {
        scale = of.number("scale_factor").orElse(1.0);
        offset = of.number("add_offset").orElse(0.0);
        double[] fill = codes(of, "_FillValue", narrow);
        double[] other = codes(of, "missing_value", narrow);
        missing = java.util.stream.DoubleStream.concat(java.util.Arrays.stream(fill), java.util.Arrays.stream(other))
                .toArray();
        undetect = codes(of, "_Undetect", narrow);
        double[] range = of.numbers("valid_range").filter(r -> r.length == 2).orElse(null);
        validMin = range != null ? range[0] : of.number("valid_min").orElse(Double.NEGATIVE_INFINITY);
        validMax = range != null ? range[1] : of.number("valid_max").orElse(Double.POSITIVE_INFINITY);
        boolean packed = scale != 1 || offset != 0;
        // A fractional bound of packed integers can only be meant for the values.
        validInValues = packed && !real && (isFractional(validMin) || isFractional(validMax));
        unsigned = of.text("_Unsigned").orElse("").equalsIgnoreCase("true");
    }

    private static double[] codes(Attributes of, String name, boolean narrow) throws UnreadableFileException {
        double[] codes = of.numbers(name).orElse(new double[0]).clone();
        for (int i = 0; narrow && i < codes.length; i++) {
            codes[i] = (float) codes[i];
        }
        return codes;
    }

    private static boolean isFractional(double bound) {
        return Double.isFinite(bound) && bound != Math.rint(bound);
    }

    /** True if the file tells "below detection" from "not measured". */
    static boolean tellsUndetect(Attributes of) throws UnreadableFileException {
        return of.numbers("_Undetect").isPresent();
    }

    static float[] decode(InputFile file, String path, RawArray stored, Attributes attributes)
            throws UnreadableFileException {
        CfPacking packing = new CfPacking(attributes, stored.isReal(), stored.array() instanceof float[]);
        if (!Double.isFinite(packing.scale) || packing.scale == 0 || !Double.isFinite(packing.offset)) {
            throw file.broken(path, "scale_factor " + packing.scale + " and add_offset " + packing.offset
                    + " give no values");
        }
        return packing.apply(packing.unsigned ? stored.asUnsigned() : stored);
    }

    private float[] apply(RawArray stored) {
        int n = stored.length();
        float[] values = new float[n];
        if (stored.array() instanceof byte[] codes) {
            float[] table = new float[256];
            for (int code = 0; code < 256; code++) {
                table[code] = value(stored.unsigned() ? code : (byte) code, false);
            }
            for (int i = 0; i < n; i++) {
                values[i] = table[codes[i] & 0xff];
            }
            return values;
        }
        boolean real = stored.isReal();
        for (int i = 0; i < n; i++) {
            values[i] = value(stored.at(i), real);
        }
        return values;
    }

    private float value(double stored, boolean real) {
        for (double code : undetect) {
            if (stored == code) {
                return Field.BELOW_DETECTION;
            }
        }
        for (double code : missing) {
            if (stored == code) {
                return Field.NOT_MEASURED;
            }
        }
        if (real && !(Math.abs(stored) < DEFAULT_REAL_FILL)) {
            return Field.NOT_MEASURED;
        }
        double value = scale * stored + offset;
        double checked = validInValues ? value : stored;
        return checked >= validMin && checked <= validMax ? (float) value : Field.NOT_MEASURED;
    }
}
