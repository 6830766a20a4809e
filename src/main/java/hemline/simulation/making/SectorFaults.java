package hemline.simulation.making;

import hemline.geometry.Point;
import hemline.simulation.echo.Decibels;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.Steps;
import hemline.sweep.RayGeometry;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/** Faults of some directions: obstacles, gains, loss in rain, echo of the second trip. */
final class SectorFaults {
    private static final double NO_ECHO_LOSS_DB = 60;
    private static final double MARSHALL_PALMER_A = 200;
    private static final double MARSHALL_PALMER_B = 1.6;
    private static final double TREMBLE_DB = 3;
    private final RadarSpec radar;
    private final Streams streams;

    SectorFaults(RadarSpec radar, Streams streams) {
        this.radar = radar;
        this.streams = streams;
    }

    void block(CleanSweep clean, FaultSpec.Obstacle obstacle, int number) {
        LatticeNoise skyline = new LatticeNoise(streams.stream("skyline", number, 0));
        int from = Math.max(0, (int) Math.ceil(
                (obstacle.rangeKm() * 1000 - radar.gates().firstCentreM()) / radar.gates().spacingM()));
        for (int r = 0; r < clean.rays; r++) {
            double into = intoDeg(clean, r, obstacle.fromDeg());
            if (into < obstacle.widthDeg()) {
                double edge = Math.min(into, obstacle.widthDeg() - into);
                double loss = obstacle.lossDb() * Steps.smooth(edge / 1.2);
                if (obstacle.ragged()) {
                    loss *= Math.max(0.1, 1 + 0.5 * skyline.at(clean.azimuthDeg(r) / 1.6, 0));
                }
                scale(clean, r, from, Decibels.toLinear(-Math.min(NO_ECHO_LOSS_DB, loss)));
            }
        }
    }

    void gain(CleanSweep clean, FaultSpec.SectorGain gain) {
        for (int r = 0; r < clean.rays; r++) {
            if (intoDeg(clean, r, gain.fromDeg()) < gain.widthDeg()) {
                scale(clean, r, 0, Decibels.toLinear(gain.gainDb()));
            }
        }
    }

    private static double intoDeg(CleanSweep clean, int ray, double fromDeg) {
        return (clean.azimuthDeg(ray) - fromDeg + 720) % 360;
    }

    private static void scale(CleanSweep clean, int ray, int fromGate, double factor) {
        for (int i = ray * clean.gates + fromGate; i < (ray + 1) * clean.gates; i++) {
            scale(clean, i, factor);
        }
    }

    private static void scale(CleanSweep clean, int gate, double factor) {
        clean.total[gate] *= (float) factor;
        clean.withoutLines[gate] *= (float) factor;
        clean.withoutClearing[gate] *= (float) factor;
    }

    /** The loss up to a gate comes from the true echo of the gates before it, so each ray is walked outward. */
    void attenuate(CleanSweep clean, FaultSpec.RainLoss loss) {
        double gateKm = radar.gates().spacingM() / 1000;
        for (int r = 0; r < clean.rays; r++) {
            double lossDb = 0;
            for (int g = 0; g < clean.gates; g++) {
                int i = r * clean.gates + g;
                double z = clean.total[i];
                scale(clean, i, Decibels.toLinear(-Math.min(NO_ECHO_LOSS_DB, lossDb)));
                if (z > 1000) {
                    double rate = FastMath.pow(z / MARSHALL_PALMER_A, 1 / MARSHALL_PALMER_B);
                    lossDb += 2 * gateKm * loss.oneWayDbKm() * FastMath.pow(rate, loss.rateExponent());
                }
            }
        }
    }

    void secondTrip(CleanSweep clean, FaultSpec.SecondTrip trip, RandomGenerator random) {
        double timeS = clean.plan.timeOfS(180);
        Point centre = trip.startKm().plus(trip.driftMs().times(timeS / 1000));
        LatticeNoise lumps = new LatticeNoise(streams.stream("streak", trip.number(), 0));
        for (int r = 0; r < clean.rays; r++) {
            double off = RayGeometry.gapDeg(clean.azimuthDeg(r), centre.bearingDeg()) / trip.widthDeg();
            double tremble = TREMBLE_DB * random.nextGaussian();
            if (off > 1.5) {
                continue;
            }
            for (int g = 0; g < clean.gates; g++) {
                double along = (radar.slantRangeM(g) / 1000 - centre.lengthKm()) / trip.lengthKm();
                double square = off * off + along * along;
                if (square < 2) {
                    double dbz = trip.dbz() + tremble + 4 * lumps.at(4 * along + 7, 3 * off) - 12 * square;
                    add(clean, r * clean.gates + g, Decibels.toLinear(dbz));
                }
            }
        }
    }

    static void add(CleanSweep clean, int gate, double linear) {
        clean.total[gate] += (float) linear;
        clean.withoutLines[gate] += (float) linear;
        clean.withoutClearing[gate] += (float) linear;
    }
}
