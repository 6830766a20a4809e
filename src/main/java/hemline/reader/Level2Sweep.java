package hemline.reader;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A cut of a Level II volume while its radials are counted; complete or not. */
final class Level2Sweep {
    private static final Map<String, String> UNITS = Map.of("REF", "dBZ", "VEL", "m s-1", "SW", "m s-1", "ZDR", "dB",
            "PHI", "degrees");

    private final int number;
    private final Level2Position from;
    private final List<Level2Radial> rays = new ArrayList<>();
    private final Map<String, Ranges> moments = new LinkedHashMap<>();
    private final List<String> notes = new ArrayList<>();
    private Level2Position to = Level2Position.END;

    Level2Sweep(int number, Level2Position from) {
        this.number = number;
        this.from = from;
    }

    Level2Position from() {
        return from;
    }

    Level2Position to() {
        return to;
    }

    void endAt(Level2Position at) {
        to = at;
    }

    boolean continuesWith(Level2Radial radial) {
        // A start flag amid a cut of the same number opens a repetition; a stray one right after the start does not.
        return radial.elevationNumber() == number && !(radial.starts() && rays.size() > 10);
    }

    void add(Level2Radial radial) {
        if (rays.size() == Limits.MAX_RAYS) {
            return;
        }
        for (Level2Radial.Moment moment : radial.moments()) {
            Ranges own = moment.ranges();
            Ranges known = moments.get(moment.name());
            if (known == null || sameGates(known, own) && own.gates() > known.gates()) {
                moments.put(moment.name(), own);
            } else if (!sameGates(known, own)) {
                String note = moment.name() + " changes its gates within the cut; rays with other gates are left out";
                if (!notes.contains(note)) {
                    notes.add(note);
                }
            }
        }
        rays.add(new Level2Radial(radial.azimuthDeg(), radial.elevationDeg(), radial.elevationNumber(),
                radial.starts(), radial.timeMs(), radial.nyquistMs(), List.of(), -1));
    }

    private static boolean sameGates(Ranges a, Ranges b) {
        return a.firstCentreM() == b.firstCentreM() && a.spacingM() == b.spacingM();
    }

    SweepHead head(int index) {
        RayTable table = new RayTable(rays.stream().mapToDouble(Level2Radial::azimuthDeg).toArray(),
                rays.stream().mapToDouble(Level2Radial::elevationDeg).toArray(),
                rays.stream().mapToLong(Level2Radial::timeMs).toArray());
        List<FieldHead> fields = new ArrayList<>();
        moments.forEach((name, ranges) -> fields.add(new FieldHead(name, "", "", UNITS.getOrDefault(name, ""), ranges,
                true)));
        double nyquist = rays.stream().mapToDouble(Level2Radial::nyquistMs).filter(v -> v > 0).findFirst()
                .orElse(Double.NaN);
        return new SweepHead("cut " + number + " (sweep " + index + ")", ScanMode.of("", table.azimuthDeg(),
                table.elevationDeg()), table.medianElevationDeg(), Double.NaN, nyquist, table, table.firstTimeMs(),
                table.lastTimeMs(), fields, notes);
    }
}
