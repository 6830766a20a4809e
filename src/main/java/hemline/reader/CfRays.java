package hemline.reader;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Angles and times of all rays of a CfRadial group, in the order of the file.
 *
 * @param timeMs times, ms since 1970-01-01T00:00Z, gaps filled between neighbours
 * @param use    false for rays in transition between sweeps and rays without direction
 */
record CfRays(double[] azimuthDeg, double[] elevationDeg, long[] timeMs, boolean[] use) {

    static CfRays of(InputFile file, ArrayGroup group, ArrayGroup root, List<String> notes)
            throws UnreadableFileException {
        double[] azimuth = required(file, group, "azimuth");
        int rays = azimuth.length;
        if (rays < 1) {
            throw file.broken(group.path(), "holds no ray");
        }
        double[] elevation = required(file, group, "elevation");
        if (elevation.length == 1 && rays > 1) {
            double fixed = elevation[0];
            elevation = new double[rays];
            Arrays.fill(elevation, fixed);
        }
        if (elevation.length != rays) {
            throw file.broken(group.path(), "has " + rays + " azimuths and " + elevation.length + " elevations");
        }
        boolean[] use = new boolean[rays];
        Optional<double[]> transition = CfNumbers.find(file, group, "antenna_transition")
                .filter(t -> t.length == rays && Arrays.stream(t).anyMatch(v -> v != 1));
        for (int i = 0; i < rays; i++) {
            elevation[i] = elevation[i] > 180 ? elevation[i] - 360 : elevation[i];
            boolean pointed = Math.abs(azimuth[i]) <= 720 && Math.abs(elevation[i]) <= 180;
            use[i] = pointed && !(transition.isPresent() && transition.get()[i] == 1);
            elevation[i] = pointed ? elevation[i] : Double.NaN;
            azimuth[i] = pointed ? azimuth[i] : Double.NaN;
        }
        return new CfRays(azimuth, elevation, times(file, group, root, rays, notes), use);
    }

    private static double[] required(InputFile file, ArrayGroup group, String name) throws UnreadableFileException {
        return CfNumbers.find(file, group, name).orElseThrow(() -> file.fault(group.path(), "has no " + name
                + " array", "ask the file's maker for complete geometry"));
    }

    private static long[] times(InputFile file, ArrayGroup group, ArrayGroup root, int rays, List<String> notes)
            throws UnreadableFileException {
        ArrayVariable variable = group.variable("time").orElseThrow(() -> file.fault(group.path(),
                "has no time array", "ask the file's maker for the rays' times"));
        double[] raw = CfNumbers.of(file, variable);
        if (raw.length != rays) {
            throw file.broken(variable.path(), "has " + raw.length + " entries for " + rays + " rays");
        }
        String units = variable.attributes().text("units").orElse("");
        Optional<CfTime> scale = CfTime.parse(units);
        if (scale.isEmpty()) {
            Optional<Long> origin = coverageStart(group).or(() -> Optional.empty());
            origin = origin.isPresent() ? origin : coverageStart(root);
            scale = origin.map(ms -> new CfTime(1000, ms));
            notes.add("time units \"" + units + "\" are not understood; seconds since time_coverage_start assumed");
        }
        CfTime clock = scale.orElseThrow(() -> file.fault(variable.path(), "its units \"" + units
                + "\" cannot be understood", "give units such as seconds since 2020-01-01T00:00:00Z"));
        return filled(file, variable.path(), raw, clock);
    }

    private static Optional<Long> coverageStart(ArrayGroup group) throws UnreadableFileException {
        Optional<ArrayVariable> variable = group.variable("time_coverage_start");
        String text = variable.isPresent() && variable.get().isText()
                ? variable.get().texts().stream().findFirst().orElse("")
                : group.attributes().text("time_coverage_start").orElse("");
        return CfTime.instant(text);
    }

    /** Rays without a time take one between their neighbours'. */
    private static long[] filled(InputFile file, String path, double[] raw, CfTime clock)
            throws UnreadableFileException {
        long[] times = new long[raw.length];
        int known = -1;
        for (int i = 0; i < raw.length; i++) {
            if (!Double.isFinite(raw[i])) {
                continue;
            }
            times[i] = clock.toMs(raw[i]);
            for (int gap = known + 1; gap < i; gap++) {
                times[gap] = known < 0 ? times[i]
                        : times[known] + (times[i] - times[known]) * (gap - known) / (i - known);
            }
            known = i;
        }
        if (known < 0) {
            throw file.fault(path, "no ray has a time", "ask the file's maker for the rays' times");
        }
        Arrays.fill(times, known + 1, times.length, times[known]);
        return times;
    }
}
