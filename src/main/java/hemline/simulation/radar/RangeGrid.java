package hemline.simulation.radar;

import hemline.geodesy.BeamGeometry;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.apache.commons.math3.special.Erf;

/** The places along any ray at which a scene is evaluated: each gate is cut into equal parts of at most 250 m. */
public final class RangeGrid {
    private static final double FINEST_M = 250;
    private final int partsPerGate;
    private final int gates;
    private final double[] slantKm;
    private final double[] groundKm;
    private final double[] heightKm;
    private final double[] spreadKm;
    private final double antennaKm;
    private final Map<Double, double[]> shares = new ConcurrentHashMap<>();
    private final Map<Double, double[]> below = new ConcurrentHashMap<>();

    public RangeGrid(RadarSpec radar) {
        partsPerGate = (int) Math.ceil(radar.gates().spacingM() / FINEST_M - 1e-9);
        gates = radar.gates().count();
        antennaKm = radar.dish().aboveGroundM() / 1000;
        int bins = gates * partsPerGate;
        slantKm = new double[bins];
        groundKm = new double[bins];
        heightKm = new double[bins];
        spreadKm = new double[bins];
        BeamGeometry beam = radar.beam();
        double part = radar.gates().spacingM() / partsPerGate;
        double edge = radar.gates().firstCentreM() - radar.gates().spacingM() / 2;
        for (int i = 0; i < bins; i++) {
            double slantM = Math.max(1, edge + (i + 0.5) * part);
            slantKm[i] = slantM / 1000;
            groundKm[i] = beam.groundRangeM(slantM) / 1000;
            heightKm[i] = beam.heightAboveAntennaM(slantM) / 1000;
            spreadKm[i] = slantKm[i] * Math.toRadians(twoWaySdDeg(radar.dish().beamWidthDeg()));
        }
    }

    /**
     * Standard deviation of the two-way beam: the one-way pattern exp(−4 ln 2 (φ/θ)²) squared is a Gaussian of
     * θ/(4 √ln 2) = 0.300 θ (Doviak and Zrnić 1993, section 5.2, Gaussian beam).
     */
    public static double twoWaySdDeg(double beamWidthDeg) {
        return beamWidthDeg / (4 * Math.sqrt(Math.log(2)));
    }

    public int bins() {
        return slantKm.length;
    }

    public int gates() {
        return gates;
    }

    public int partsPerGate() {
        return partsPerGate;
    }

    public double slantKm(int bin) {
        return slantKm[bin];
    }

    public double groundKm(int bin) {
        return groundKm[bin];
    }

    /** Height of the beam centre above the ground, km. */
    public double aboveGroundKm(int bin) {
        return heightKm[bin] + antennaKm;
    }

    /** Vertical standard deviation of the two-way beam, km. */
    public double spreadKm(int bin) {
        return spreadKm[bin];
    }

    /**
     * Share of the two-way beam within a layer that reaches from the ground to {@code depthKm}, for each bin. The
     * array is shared and must not be changed.
     */
    public double[] layerShare(double depthKm) {
        return shares.computeIfAbsent(depthKm, depth -> {
            double[] share = new double[bins()];
            for (int i = 0; i < share.length; i++) {
                share[i] = layerShare(i, 0, depth);
            }
            return share;
        });
    }

    /** Share of the two-way beam below a height above the ground, km, for each bin. Shared; must not be changed. */
    public double[] layerShareBelow(double heightKm) {
        return below.computeIfAbsent(heightKm, height -> {
            double[] share = new double[bins()];
            for (int i = 0; i < share.length; i++) {
                share[i] = layerShare(i, aboveGroundKm(i) - 12 * spreadKm[i] - 1, height);
            }
            return share;
        });
    }

    /** Share of the two-way beam of a bin between two heights above the ground, km. */
    public double layerShare(int bin, double fromKm, double toKm) {
        double scale = Math.sqrt(2) * spreadKm[bin];
        double centre = aboveGroundKm(bin);
        return 0.5 * Erf.erf((fromKm - centre) / scale, (toKm - centre) / scale);
    }
}
