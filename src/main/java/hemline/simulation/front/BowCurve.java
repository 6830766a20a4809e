package hemline.simulation.front;

import hemline.geometry.Point;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/**
 * A straight or bowed line: X(u, t) = o + u T + (D(t) + f(u, t)) N with N the unit vector toward its heading,
 * T = 90° clockwise of N, D = v (t − t₀) + ½ a (t − t₀)² and f = −b(t) (u/h)² + Σ lobes. Its normal speed is
 * (Ḋ + ∂f/∂t)/√(1 + f′²).
 */
public final class BowCurve implements FrontCurve {
    private final Motion motion;
    private final double halfLengthKm;
    private final double bowKm;
    private final double bowGrowthMs;
    private final List<Lobe> lobes;
    private final Point ahead;
    private final Point along;

    /**
     * How the middle of the line moves.
     *
     * @param originKm   where it is at {@code onsetS}
     * @param headingDeg compass bearing it moves toward
     * @param speedMs    at {@code onsetS}, m s⁻¹
     * @param gainMs2    change of the speed, m s⁻²
     * @param onsetS     t₀, s after the scene's start
     */
    public record Motion(Point originKm, double headingDeg, double speedMs, double gainMs2, double onsetS) {
        double pathKm(double timeS) {
            double s = timeS - onsetS;
            return (speedMs + 0.5 * gainMs2 * s) * s / 1000;
        }

        double nowMs(double timeS) {
            return speedMs + gainMs2 * (timeS - onsetS);
        }
    }

    /**
     * @param halfLengthKm stations run from minus this to plus this
     * @param bowKm        how far the ends lag behind the middle at the onset, km
     * @param bowGrowthMs  how fast that lag grows, m s⁻¹
     * @param lobes        departures from the smooth line, wavelength and size in km
     */
    public BowCurve(Motion motion, double halfLengthKm, double bowKm, double bowGrowthMs, List<Lobe> lobes) {
        if (!(halfLengthKm > 0)) {
            throw new IllegalArgumentException("half length must be above 0 km, got " + halfLengthKm);
        }
        this.motion = motion;
        this.halfLengthKm = halfLengthKm;
        this.bowKm = bowKm;
        this.bowGrowthMs = bowGrowthMs;
        this.lobes = List.copyOf(lobes);
        double heading = FastMath.toRadians(motion.headingDeg());
        ahead = new Point(FastMath.sin(heading), FastMath.cos(heading));
        along = new Point(ahead.yKm(), -ahead.xKm());
    }

    private double lagKm(double timeS) {
        return bowKm + bowGrowthMs * (timeS - motion.onsetS()) / 1000;
    }

    private double offset(double u, double lagKm) {
        double share = u / halfLengthKm;
        double sum = -lagKm * share * share;
        for (Lobe lobe : lobes) {
            sum += lobe.size() * FastMath.sin(2 * Math.PI * u / lobe.wave() + lobe.phaseRad());
        }
        return sum;
    }

    private double slope(double u, double lagKm) {
        double sum = -2 * lagKm * u / (halfLengthKm * halfLengthKm);
        for (Lobe lobe : lobes) {
            double k = 2 * Math.PI / lobe.wave();
            sum += lobe.size() * k * FastMath.cos(k * u + lobe.phaseRad());
        }
        return sum;
    }

    @Override
    public CurvePoint at(double station, double timeS) {
        double lag = lagKm(timeS);
        double bend = slope(station, lag);
        double norm = Math.sqrt(1 + bend * bend);
        Point place = motion.originKm().plus(along.times(station))
                .plus(ahead.times(motion.pathKm(timeS) + offset(station, lag)));
        double share = station / halfLengthKm;
        double speed = (motion.nowMs(timeS) - bowGrowthMs * share * share) / norm;
        return new CurvePoint(place, ahead.minus(along.times(bend)).times(1 / norm), speed);
    }

    @Override
    public double firstStation() {
        return -halfLengthKm;
    }

    @Override
    public double lastStation() {
        return halfLengthKm;
    }

    @Override
    public boolean closed() {
        return false;
    }

    @Override
    public double kmPerStation(double timeS) {
        return 1;
    }

    @Override
    public Still still(double timeS) {
        double lag = lagKm(timeS);
        double path = motion.pathKm(timeS);
        Point following = ahead.times(motion.nowMs(timeS));
        double reach = 20 + Math.abs(lag);
        return new Still() {
            @Override
            public void locate(double xKm, double yKm, Foot foot) {
                double dx = xKm - motion.originKm().xKm();
                double dy = yKm - motion.originKm().yKm();
                double u = dx * along.xKm() + dy * along.yKm();
                double n = dx * ahead.xKm() + dy * ahead.yKm() - path;
                foot.station = u;
                if (Math.abs(n) > reach && Math.abs(u) < 1.5 * halfLengthKm) {
                    foot.aheadKm = n + (n < 0 ? lag * u * u / (halfLengthKm * halfLengthKm) : 0);
                    return;
                }
                double bend = slope(u, lag);
                foot.aheadKm = (n - offset(u, lag)) / Math.sqrt(1 + bend * bend);
            }

            @Override
            public Point followingMs(double xKm, double yKm) {
                return following;
            }
        };
    }
}
