package hemline.viewer.viewmodel;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.viewer.viewmodel.Trace.Sample;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;

/** Makes the traces of a track from its pieces. */
public final class Traces {
    private Traces() {
    }

    /** Normal speed, radius, length and reflectivity of a track. */
    public static List<Trace> of(Track track) {
        List<Sample> radii = track.arc().map(arc -> arc.radii().stream()
                .map(r -> new Sample(r.sweep(), r.timeMs(), r.radiusKm(), r.sdKm())).toList()).orElse(List.of());
        String noArc = track.arcRefusal().isBlank() ? "no arc is fitted" : "no arc: " + track.arcRefusal();
        return List.of(
                trace("Normal speed", Words.METRES_PER_SECOND, "Mean along the line; the band is two standard"
                        + " deviations of a vertex either way", sampled(track, Traces::speed), "no speed is known"),
                trace("Radius", "km", "Of the arc fitted through time; the band is two standard deviations either way",
                        radii, noArc),
                trace("Length", "km", "Of all stretches together", sampled(track, Traces::length), ""),
                trace("Reflectivity", "dBZ", "Mean on the line, decibels averaged; the band is two standard"
                        + " deviations of its vertices either way", sampled(track, Traces::reflectivity),
                        "no reflectivity is known"));
    }

    private static Trace trace(String name, String unit, String about, List<Sample> samples, String none) {
        return new Trace(name, unit, about, samples, samples.isEmpty() ? none : "");
    }

    private static List<Sample> sampled(Track track, Function<List<TrackPiece>, double[]> valueAndSd) {
        List<Sample> samples = new ArrayList<>();
        track.bySweep().forEach((sweep, pieces) -> {
            double[] found = valueAndSd.apply(pieces);
            if (Double.isFinite(found[0])) {
                samples.add(new Sample(sweep, pieces.get(0).meanTimeMs(), found[0], found[1]));
            }
        });
        return samples;
    }

    /** Mean weighted by 1/variance, and the root mean square of the vertices' standard deviations. */
    private static double[] speed(List<TrackPiece> pieces) {
        double weights = 0;
        double sum = 0;
        double squares = 0;
        int known = 0;
        for (TrackVertex vertex : vertices(pieces)) {
            if (vertex.speed().isKnown()) {
                double sd = vertex.speed().sdMs();
                double weight = 1 / Math.max(1e-4, sd * sd);
                weights += weight;
                sum += weight * vertex.speed().speedMs();
                squares += sd * sd;
                known++;
            }
        }
        return new double[] {sum / weights, Math.sqrt(squares / known)};
    }

    private static double[] length(List<TrackPiece> pieces) {
        return new double[] {pieces.stream().mapToDouble(p -> p.line().lengthKm()).sum(), Double.NaN};
    }

    private static double[] reflectivity(List<TrackPiece> pieces) {
        double[] values = vertices(pieces).stream().mapToDouble(TrackVertex::reflectivityDbz).filter(Double::isFinite)
                .toArray();
        double mean = java.util.Arrays.stream(values).average().orElse(Double.NaN);
        double squares = java.util.Arrays.stream(values).map(v -> (v - mean) * (v - mean)).sum();
        return new double[] {mean, values.length > 1 ? Math.sqrt(squares / (values.length - 1)) : Double.NaN};
    }

    private static List<TrackVertex> vertices(List<TrackPiece> pieces) {
        return pieces.stream().flatMap(p -> p.vertices().stream()).toList();
    }
}
