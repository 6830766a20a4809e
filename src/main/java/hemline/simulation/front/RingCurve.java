package hemline.simulation.front;

import hemline.geometry.Point;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/**
 * A lobed ring whose centre drifts and whose radius grows: X(φ, t) = c(t) + R(t) g(φ) e(φ), with φ the bearing from the
 * centre in radians and g = 1 + Σ aₘ cos(mφ + pₘ). Its normal speed is Ẋ·n with n ∝ g e − g′ e_φ.
 */
public final class RingCurve implements FrontCurve {
    private static final int TABLE = 2048;
    private static final double TURN = 2 * Math.PI;
    private static final double FAR_KM = 60;
    private final Point centreKm;
    private final Point driftMs;
    private final GrowthLaw growth;
    private final double[] shape = new double[TABLE + 1];
    private final double[] slope = new double[TABLE + 1];

    /**
     * @param centreKm where the centre is at the onset of growth
     * @param driftMs  velocity of the centre, m s⁻¹ east and north
     * @param lobes    departures from the circle; their sizes must sum to under 0.5
     */
    public RingCurve(Point centreKm, Point driftMs, GrowthLaw growth, List<Lobe> lobes) {
        double total = lobes.stream().mapToDouble(lobe -> Math.abs(lobe.size())).sum();
        if (!(total < 0.5)) {
            throw new IllegalArgumentException("lobes must sum to under 0.5 of the radius, got " + total);
        }
        this.centreKm = centreKm;
        this.driftMs = driftMs;
        this.growth = growth;
        for (int i = 0; i <= TABLE; i++) {
            double phi = TURN * i / TABLE;
            shape[i] = 1;
            for (Lobe lobe : lobes) {
                double angle = lobe.wave() * phi + lobe.phaseRad();
                shape[i] += lobe.size() * FastMath.cos(angle);
                slope[i] -= lobe.size() * lobe.wave() * FastMath.sin(angle);
            }
        }
    }

    public GrowthLaw growth() {
        return growth;
    }

    /** Centre at a time, km. */
    public Point centreKm(double timeS) {
        return centreKm.plus(driftMs.times((timeS - growth.onsetS()) / 1000));
    }

    private static double turned(double phi) {
        double turns = phi / TURN;
        return TABLE * (turns - FastMath.floor(turns));
    }

    private static double read(double[] table, double place) {
        int below = Math.min(TABLE - 1, (int) place);
        return table[below] + (place - below) * (table[below + 1] - table[below]);
    }

    @Override
    public CurvePoint at(double station, double timeS) {
        double place = turned(station);
        double g = read(shape, place);
        double slopeHere = read(slope, place);
        Point out = new Point(FastMath.sin(station), FastMath.cos(station));
        Point along = new Point(out.yKm(), -out.xKm());
        Point normal = out.times(g).minus(along.times(slopeHere)).times(1 / Math.sqrt(g * g + slopeHere * slopeHere));
        Point velocity = driftMs.plus(out.times(g * growth.growthMs(timeS)));
        return new CurvePoint(centreKm(timeS).plus(out.times(growth.radiusKm(timeS) * g)), normal, velocity.dot(normal));
    }

    @Override
    public double firstStation() {
        return 0;
    }

    @Override
    public double lastStation() {
        return TURN;
    }

    @Override
    public boolean closed() {
        return true;
    }

    @Override
    public double kmPerStation(double timeS) {
        return growth.radiusKm(timeS);
    }

    @Override
    public Still still(double timeS) {
        Point centre = centreKm(timeS);
        double radius = growth.radiusKm(timeS);
        double growthMs = growth.growthMs(timeS);
        return new Still() {
            @Override
            public void locate(double xKm, double yKm, Foot foot) {
                double dx = xKm - centre.xKm();
                double dy = yKm - centre.yKm();
                double distance = Math.sqrt(dx * dx + dy * dy);
                if (distance > 1.5 * radius + FAR_KM) {
                    foot.aheadKm = distance - radius;
                    foot.station = 0;
                    return;
                }
                double phi = Bearing.of(dx, dy);
                double place = turned(phi);
                double g = read(shape, place);
                double bend = read(slope, place);
                foot.station = phi;
                foot.aheadKm = (distance - radius * g) * g / Math.sqrt(g * g + bend * bend);
            }

            @Override
            public Point followingMs(double xKm, double yKm) {
                Point from = new Point(xKm - centre.xKm(), yKm - centre.yKm());
                return driftMs.plus(from.times(growthMs / radius));
            }
        };
    }
}
