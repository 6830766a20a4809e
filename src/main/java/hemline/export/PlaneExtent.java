package hemline.export;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.BeamGeometry;
import hemline.pipeline.Analysis;

/** How much of the plane a picture shows. */
final class PlaneExtent {
    private static final double[] RING_STEPS_KM = {5, 10, 20, 25, 50, 100};
    private static final double LEAST_KM = 20;
    private static final double MOST_KM = 300;
    private static final double FARTHEST_M = 500_000;

    private PlaneExtent() {
    }

    /** Half width that shows everything found with some room, or the reach of the height ceiling, km. */
    static double halfKm(Analysis analysis, double ceilingM) {
        double reach = 0;
        for (Track track : analysis.tracks()) {
            for (TrackPiece piece : track.pieces()) {
                for (TrackVertex vertex : piece.vertices()) {
                    reach = Math.max(reach, Math.max(Math.abs(vertex.position().xKm()),
                            Math.abs(vertex.position().yKm())));
                }
            }
        }
        double ceiling = ceilingRangeKm(analysis.frames().get(0).beam(), ceilingM);
        double wanted = reach > 0 ? Math.max(1.12 * reach, Math.min(ceiling, 40)) : ceiling;
        return Math.min(MOST_KM, Math.max(LEAST_KM, wanted));
    }

    /** Ground range at which the beam rises through a height above the radar, km; infinite beyond 500 km. */
    static double ceilingRangeKm(BeamGeometry beam, double ceilingM) {
        double low = 0;
        double high = FARTHEST_M;
        if (beam.heightAboveAntennaM(high) < ceilingM) {
            return Double.POSITIVE_INFINITY;
        }
        while (high - low > 10) {
            double middle = (low + high) / 2;
            if (beam.heightAboveAntennaM(middle) < ceilingM) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return beam.groundRangeM(high) / 1000;
    }

    /** A round distance between range rings that gives at most five of them, km. */
    static double ringStepKm(double halfKm) {
        for (double step : RING_STEPS_KM) {
            if (halfKm / step <= 5) {
                return step;
            }
        }
        return RING_STEPS_KM[RING_STEPS_KM.length - 1];
    }
}
