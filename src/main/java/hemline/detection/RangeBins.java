package hemline.detection;

import hemline.geodesy.BeamGeometry;
import hemline.sweep.Sweep;

/**
 * Which gates make up each even step of ground range: the step's window is half as wide again as the step, and a gate
 * counts by how much of the window it fills.
 */
final class RangeBins {
    private static final double WINDOW = 1.5;

    final int bins;
    final double binKm;
    final int[] firstGate;
    /** {@code [bin][gate − firstGate]}, summing to one over a full window. */
    final float[][] share;

    RangeBins(Sweep sweep, int bins, double binKm) {
        this.bins = bins;
        this.binKm = binKm;
        firstGate = new int[bins];
        share = new float[bins][];
        BeamGeometry beam = sweep.beam();
        double gateM = sweep.gateSpacingM();
        double nearestM = sweep.firstGateCentreM() - gateM / 2;
        double windowM = Math.max(WINDOW * binKm * 1000, gateM);
        for (int b = 0; b < bins; b++) {
            double centreM = beam.slantRangeM((b + 0.5) * binKm * 1000);
            double lowM = centreM - windowM / 2;
            double highM = centreM + windowM / 2;
            int from = (int) Math.max(0, Math.floor((lowM - nearestM) / gateM));
            int to = (int) Math.min(sweep.gateCount(), Math.ceil((highM - nearestM) / gateM));
            firstGate[b] = from;
            share[b] = new float[Math.max(0, to - from)];
            for (int g = from; g < to; g++) {
                double gateLowM = nearestM + g * gateM;
                double overlapM = Math.min(highM, gateLowM + gateM) - Math.max(lowM, gateLowM);
                share[b][g - from] = (float) (Math.max(0, overlapM) / windowM);
            }
        }
    }
}
