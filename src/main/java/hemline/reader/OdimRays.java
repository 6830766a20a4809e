package hemline.reader;

import java.time.DateTimeException;
import java.time.LocalDate;
import java.time.LocalTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Azimuth, elevation and time of the rays of one ODIM_H5 dataset, from per-ray arrays where they are present and
 * from the dataset's own start and end otherwise.
 */
record OdimRays(RayTable table, long startMs, long endMs) {
    private static final long DAY_MS = 86_400_000;
    private static final double MILLISECONDS_FROM = 1e11;

    static OdimRays of(InputFile file, OdimNode node, String object, int rays, List<String> notes)
            throws UnreadableFileException {
        double[] azimuth = azimuths(node, object, rays, notes);
        double[] elevation = elevations(node, rays);
        long start = startMs(file, node, notes);
        long end = endMs(file, node, start, notes);
        long[] times = times(node, rays, start, end, notes);
        return new OdimRays(new RayTable(azimuth, elevation, times), start, end);
    }

    private static double[] azimuths(OdimNode node, String object, int rays, List<String> notes)
            throws UnreadableFileException {
        Optional<double[]> from = perRay(node, "startazA", rays, notes);
        Optional<double[]> to = perRay(node, "stopazA", rays, notes);
        double[] azimuth = new double[rays];
        if (from.isPresent() && to.isPresent()) {
            for (int i = 0; i < rays; i++) {
                azimuth[i] = middleDeg(from.get()[i], to.get()[i]);
            }
            return azimuth;
        }
        if (object.equals("ELEV")) {
            Arrays.fill(azimuth, node.number("where", "az_angle").or(() -> Optional.of(0.0)).orElse(0.0));
            return azimuth;
        }
        double first = node.number("how", "astart").orElse(0.0);
        double turn = 360;
        Optional<Double> sectorFrom = node.number("where", "startaz");
        Optional<Double> sectorTo = node.number("where", "stopaz");
        if (object.equals("AZIM") && sectorFrom.isPresent() && sectorTo.isPresent()) {
            first = sectorFrom.get();
            turn = ((sectorTo.get() - first) % 360 + 360) % 360;
            turn = turn == 0 ? 360 : turn;
        }
        for (int i = 0; i < rays; i++) {
            azimuth[i] = first + (i + 0.5) * turn / rays;
        }
        return azimuth;
    }

    /** Half way along the shorter arc from one azimuth to another, so that 359 and 1 give 0. */
    static double middleDeg(double fromDeg, double toDeg) {
        double step = ((toDeg - fromDeg) % 360 + 540) % 360 - 180;
        return ((fromDeg + step / 2) % 360 + 360) % 360;
    }

    private static double[] elevations(OdimNode node, int rays) throws UnreadableFileException {
        double[] elevation = new double[rays];
        Optional<double[]> from = node.numbers("how", "startelA").filter(a -> a.length == rays);
        Optional<double[]> to = node.numbers("how", "stopelA").filter(a -> a.length == rays);
        Optional<double[]> angles = node.numbers("how", "elangles").filter(a -> a.length == rays);
        double nominal = node.number("where", "elangle").orElse(Double.NaN);
        for (int i = 0; i < rays; i++) {
            double angle = from.isPresent() && to.isPresent() ? (from.get()[i] + to.get()[i]) / 2
                    : angles.isPresent() ? angles.get()[i] : nominal;
            elevation[i] = angle > 180 ? angle - 360 : angle;
        }
        return elevation;
    }

    private static long startMs(InputFile file, OdimNode node, List<String> notes) throws UnreadableFileException {
        Optional<Long> start = instant(node.text("what", "startdate"), node.text("what", "starttime"));
        if (start.isPresent()) {
            return start.get();
        }
        // The nominal time can be minutes off and repeat; it is the last resort.
        Optional<Long> nominal = instant(node.text("what", "date"), node.text("what", "time"));
        if (nominal.isEmpty()) {
            throw file.fault(node.path() + "/what", "has no usable time (startdate, starttime)",
                    "ask the file's maker for the times");
        }
        notes.add("no start time of its own; the file's nominal time is taken");
        return nominal.get();
    }

    private static long endMs(InputFile file, OdimNode node, long start, List<String> notes)
            throws UnreadableFileException {
        Optional<Long> stated = instant(node.text("what", "enddate"), node.text("what", "endtime"));
        long end = stated.orElse(start);
        if (end < start && end + DAY_MS - start < DAY_MS / 24) {
            return end + DAY_MS;
        }
        if (stated.isPresent() && end > start && end - start < DAY_MS / 24) {
            return end;
        }
        double turnsPerMinute = Math.abs(node.number("how", "rpm").orElse(0.0));
        if (turnsPerMinute > 0.05 && turnsPerMinute < 100) {
            notes.add("no usable end time; the rays' times follow from " + turnsPerMinute + " turns a minute");
            return start + Math.round(60_000 / turnsPerMinute);
        }
        notes.add("no usable end time; all rays carry the start time");
        return start;
    }

    /**
     * Rays' own times: mid of startazT and stopazT, else spread between start and end from {@code a1gate}, the ray
     * radiated first. That index says nothing about direction; the data are never turned by it.
     */
    private static long[] times(OdimNode node, int rays, long start, long end, List<String> notes)
            throws UnreadableFileException {
        long[] times = new long[rays];
        Optional<double[]> from = perRay(node, "startazT", rays, notes);
        Optional<double[]> to = perRay(node, "stopazT", rays, notes).or(() -> from);
        if (from.isPresent() && plausible(from.get(), start, end) && plausible(to.get(), start, end)) {
            for (int i = 0; i < rays; i++) {
                times[i] = Math.round(1000 * (seconds(from.get()[i]) + seconds(to.get()[i])) / 2);
            }
            return times;
        }
        int first = (int) (double) node.number("where", "a1gate").filter(a -> a >= 0 && a < rays).orElse(0.0);
        boolean backwards = node.number("how", "antspeed").or(() -> Optional.of(0.0)).orElse(0.0) < 0
                || node.number("how", "rpm").orElse(0.0) < 0;
        for (int i = 0; i < rays; i++) {
            int turn = Math.floorMod(backwards ? first - i : i - first, rays);
            times[i] = start + Math.round((turn + 0.5) / rays * (end - start));
        }
        return times;
    }

    private static double seconds(double epoch) {
        return epoch > MILLISECONDS_FROM ? epoch / 1000 : epoch;
    }

    private static boolean plausible(double[] epochs, long start, long end) {
        return Arrays.stream(epochs).allMatch(e -> 1000 * seconds(e) > start - DAY_MS / 24.0
                && 1000 * seconds(e) < end + DAY_MS / 24.0);
    }

    private static Optional<double[]> perRay(OdimNode node, String name, int rays, List<String> notes)
            throws UnreadableFileException {
        Optional<double[]> found = node.numbers("how", name);
        if (found.isPresent() && found.get().length != rays) {
            notes.add(name + " has " + found.get().length + " entries for " + rays + " rays and is not used");
            return Optional.empty();
        }
        return found.filter(a -> Arrays.stream(a).allMatch(Double::isFinite));
    }

    static Optional<Long> instant(Optional<String> date, Optional<String> time) {
        if (date.isEmpty() || time.isEmpty()) {
            return Optional.empty();
        }
        try {
            LocalDate day = LocalDate.parse(date.get(), DateTimeFormatter.BASIC_ISO_DATE);
            String digits = time.get();
            String whole = digits.length() > 6 ? digits.substring(0, 6) : digits;
            LocalTime clock = LocalTime.parse("0".repeat(Math.max(0, 6 - whole.length())) + whole,
                    DateTimeFormatter.ofPattern("HHmmss"));
            return Optional.of(day.atTime(clock).toInstant(ZoneOffset.UTC).toEpochMilli());
        } catch (DateTimeException e) {
            return Optional.empty();
        }
    }
}
