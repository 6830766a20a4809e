package hemline.boundary;

import java.util.Comparator;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TreeMap;

/**
 * One boundary through time.
 *
 * @param id         short and stable within a run, for example {@code T03}
 * @param pieces     its stretches, by rising sweep
 * @param speed      its speed as a whole along {@code bearingDeg}
 * @param bearingDeg compass bearing it moves toward as a whole, degrees clockwise from north; NaN when unknown
 * @param arc        the arc fitted through time, where curvature is significant
 * @param arcRefusal why there is no arc, in words; empty when there is one
 * @param score      what the decision to keep it rested on, larger is surer
 */
public record Track(String id, List<TrackPiece> pieces, Speed speed, double bearingDeg, Optional<ArcHistory> arc,
                    String arcRefusal, double score) {
    public Track {
        Objects.requireNonNull(speed);
        Objects.requireNonNull(arc);
        if (pieces.isEmpty()) {
            throw new IllegalArgumentException("track " + id + " has no pieces");
        }
        pieces = pieces.stream().sorted(Comparator.comparingInt(TrackPiece::sweep)).toList();
    }

    /** A track as linked, before anything is measured. */
    public static Track linked(String id, List<TrackPiece> pieces, double score) {
        return new Track(id, pieces, Speed.UNKNOWN, Double.NaN, Optional.empty(), "not measured", score);
    }

    public Track withPieces(List<TrackPiece> newPieces) {
        return new Track(id, newPieces, speed, bearingDeg, arc, arcRefusal, score);
    }

    /** Its stretches by sweep index, rising. */
    public SortedMap<Integer, List<TrackPiece>> bySweep() {
        SortedMap<Integer, List<TrackPiece>> found = new TreeMap<>();
        for (TrackPiece piece : pieces) {
            found.merge(piece.sweep(), List.of(piece), Track::joined);
        }
        return found;
    }

    private static List<TrackPiece> joined(List<TrackPiece> a, List<TrackPiece> b) {
        return java.util.stream.Stream.concat(a.stream(), b.stream()).toList();
    }

    /** Number of sweeps in which it is present. */
    public int sweepCount() {
        return bySweep().size();
    }

    /** Time of its earliest vertex, ms since 1970-01-01T00:00Z. */
    public long firstMs() {
        return pieces.stream().flatMap(p -> p.vertices().stream()).mapToLong(TrackVertex::timeMs).min().orElseThrow();
    }

    /** Time of its latest vertex, ms since 1970-01-01T00:00Z. */
    public long lastMs() {
        return pieces.stream().flatMap(p -> p.vertices().stream()).mapToLong(TrackVertex::timeMs).max().orElseThrow();
    }

    /** Length in its longest sweep, km. */
    public double maxLengthKm() {
        return bySweep().values().stream()
                .mapToDouble(list -> list.stream().mapToDouble(p -> p.line().lengthKm()).sum()).max().orElseThrow();
    }
}
