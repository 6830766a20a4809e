package hemline.export;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import java.util.ArrayList;
import java.util.List;

/**
 * One quantity of a track against time, a value a sweep.
 *
 * @param key    short name for files
 * @param name   what it is, with its unit
 * @param values by rising time
 */
record Series(String key, String name, List<Value> values) {
    Series {
        values = List.copyOf(values);
    }

    /**
     * @param timeMs ms since 1970-01-01T00:00Z
     * @param value  in the unit of the series
     * @param sd     standard deviation; NaN when there is none
     */
    record Value(long timeMs, double value, double sd) {
    }

    /**
     * Mean normal speed over the vertices of each sweep, m s⁻¹. Neighbouring speeds share their data, so the standard
     * deviation of the mean is taken as the mean of theirs, not divided by their number.
     */
    static Series speed(Track track) {
        List<Value> values = new ArrayList<>();
        for (List<TrackPiece> pieces : track.bySweep().values()) {
            double speed = 0;
            double sd = 0;
            double time = 0;
            int known = 0;
            long first = pieces.get(0).vertices().get(0).timeMs();
            for (TrackPiece piece : pieces) {
                for (TrackVertex vertex : piece.vertices()) {
                    if (vertex.speed().isKnown()) {
                        speed += vertex.speed().speedMs();
                        sd += vertex.speed().sdMs();
                        time += vertex.timeMs() - first;
                        known++;
                    }
                }
            }
            if (known > 0) {
                values.add(new Value(first + Math.round(time / known), speed / known, sd / known));
            }
        }
        return new Series("speed", "normal speed, m s⁻¹", values);
    }

    /** The fitted radius at each sweep, km; empty for a track without an arc. */
    static Series radius(Track track) {
        return new Series("radius", "radius, km", track.arc().map(arc -> arc.radii().stream()
                .map(r -> new Value(r.timeMs(), r.radiusKm(), r.sdKm())).toList()).orElse(List.of()));
    }

    /** Length seen in each sweep, km. */
    static Series length(Track track) {
        List<Value> values = new ArrayList<>();
        for (List<TrackPiece> pieces : track.bySweep().values()) {
            values.add(new Value(pieces.get(0).meanTimeMs(),
                    pieces.stream().mapToDouble(p -> p.line().lengthKm()).sum(), Double.NaN));
        }
        return new Series("length", "length, km", values);
    }
}
