package hemline.reader;

import java.util.Arrays;
import java.util.Optional;

/** Gates of CfRadial sweeps: {@code range} holds gate centres, in metres unless its units say km. */
final class CfRanges {
    private CfRanges() {
    }

    /**
     * @param gates gates that the sweep's fields have
     * @param rayFrom,rayTo the sweep's rays, end exclusive, for per-ray geometry
     * @param sweep index of the sweep, for a range array with one row a sweep
     */
    static Ranges of(InputFile file, ArrayGroup group, int gates, int rayFrom, int rayTo, int sweep)
            throws UnreadableFileException {
        Optional<double[]> start = CfNumbers.find(file, group, "ray_start_range");
        Optional<double[]> spacing = CfNumbers.find(file, group, "ray_gate_spacing");
        if (start.isPresent() && spacing.isPresent() && start.get().length >= rayTo && spacing.get().length >= rayTo) {
            double first = constant(file, "ray_start_range", start.get(), rayFrom, rayTo);
            double step = constant(file, "ray_gate_spacing", spacing.get(), rayFrom, rayTo);
            if (step > 0) {
                return checked(file, new Ranges(first, step, gates));
            }
        }
        ArrayVariable variable = group.variable("range").orElseThrow(() -> file.fault(group.path(),
                "has no range array", "ask the file's maker for complete geometry"));
        double[] all = CfNumbers.of(file, variable);
        int[] shape = variable.shape();
        double[] range = all;
        if (shape.length == 2) {
            int row = shape[0] > sweep && shape[0] < rayTo - rayFrom ? sweep : Math.min(rayFrom, shape[0] - 1);
            range = Arrays.copyOfRange(all, row * shape[1], (row + 1) * shape[1]);
        }
        return uniform(file, variable, range, gates);
    }

    private static double constant(InputFile file, String name, double[] values, int from, int to)
            throws UnreadableFileException {
        for (int i = from; i < to; i++) {
            if (Math.abs(values[i] - values[from]) > 0.5) {
                throw file.fault("/" + name, "changes within a sweep, from " + values[from] + " to " + values[i],
                        "give sweeps with one range geometry each");
            }
        }
        return values[from];
    }

    private static Ranges uniform(InputFile file, ArrayVariable variable, double[] range, int gates)
            throws UnreadableFileException {
        double factor = metres(variable.attributes().text("units").orElse(""));
        if (range.length < gates || gates < 1) {
            throw file.broken(variable.path(), "has " + range.length + " gates, the fields have " + gates);
        }
        double first = range[0] * factor;
        if (gates == 1) {
            double step = variable.attributes().number("meters_between_gates").orElse(Double.NaN);
            return checked(file, new Ranges(first, step, 1));
        }
        double step = (range[gates - 1] - range[0]) * factor / (gates - 1);
        for (int i = 0; i < gates; i++) {
            if (!(Math.abs(range[i] * factor - first - i * step) <= 0.2 * Math.abs(step))) {
                throw file.fault(variable.path(), "gates are not evenly spaced: gate " + i + " is at "
                        + range[i] * factor + " m", "resample the file to even gates");
            }
        }
        return checked(file, new Ranges(first, step, gates));
    }

    private static double metres(String units) {
        String plain = units.strip().toLowerCase(java.util.Locale.ROOT);
        return plain.equals("km") || plain.startsWith("kilomet") ? 1000 : 1;
    }

    private static Ranges checked(InputFile file, Ranges ranges) throws UnreadableFileException {
        if (!(ranges.spacingM() > 0 && ranges.spacingM() < 1e5) || !(Math.abs(ranges.firstCentreM()) < 1e6)) {
            throw file.fault("/range", "gates start at " + ranges.firstCentreM() + " m and are " + ranges.spacingM()
                    + " m long", "ask the file's maker for usable geometry");
        }
        return ranges;
    }
}
