package hemline.simulation.making;

import hemline.simulation.echo.Decibels;
import hemline.simulation.scene.FaultSpec;
import hemline.sweep.RayGeometry;
import org.apache.commons.math3.distribution.PoissonDistribution;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.util.FastMath;

/** Faults of the receiver and its surroundings: lost and repeated rays, interference, the sun, rings, single gates. */
final class ReceiverFaults {
    /** A ray after a lost one is lost this often: losses cluster. */
    private static final double LOST_AGAIN = 0.3;
    private static final double SPECKLE_SD_DB = 6;

    void lose(CleanSweep clean, FaultSpec.LostRays lost, RandomGenerator random) {
        boolean before = false;
        for (int r = 0; r < clean.rays; r++) {
            boolean now = random.nextDouble() < (before ? LOST_AGAIN : lost.share());
            clean.lost[r] |= now;
            before = now;
        }
    }

    void repeat(CleanSweep clean, FaultSpec.RepeatedRays repeated, RandomGenerator random) {
        for (int r = 1; r < clean.rays; r++) {
            if (random.nextDouble() < repeated.share()) {
                int from = (r - 1) * clean.gates;
                int to = r * clean.gates;
                System.arraycopy(clean.total, from, clean.total, to, clean.gates);
                System.arraycopy(clean.withoutLines, from, clean.withoutLines, to, clean.gates);
                System.arraycopy(clean.withoutClearing, from, clean.withoutClearing, to, clean.gates);
            }
        }
    }

    void spike(CleanSweep clean, FaultSpec.Spikes spikes, RandomGenerator random) {
        int n = spikes.perSweep() <= 0 ? 0 : new PoissonDistribution(random, spikes.perSweep(), 1e-12, 1000).sample();
        for (int k = 0; k < n; k++) {
            int ray = random.nextInt(clean.rays);
            int width = 1 + random.nextInt(3);
            double power = Decibels.toLinear(spikes.aboveNoiseDb() + 4 * random.nextGaussian());
            boolean whole = random.nextDouble() < 0.6;
            int from = whole ? 0 : random.nextInt(clean.gates / 2);
            int to = whole ? clean.gates : Math.min(clean.gates, from + 20 + random.nextInt(clean.gates / 2));
            for (int w = 0; w < width; w++) {
                double share = w == width / 2 ? 1 : 0.3 * random.nextDouble();
                addPower(clean, (ray + w) % clean.rays, from, to, share * power);
            }
        }
    }

    void sun(CleanSweep clean, FaultSpec.SunStrobe strobe) {
        double sd = clean.radar.dish().beamWidthDeg() / 2.355;
        for (int r = 0; r < clean.rays; r++) {
            double timeS = clean.plan.timeOfS(clean.plan.turnedDeg(clean.plan.scannedAt(r)));
            if (timeS >= strobe.fromS() && timeS <= strobe.toS()) {
                double azimuth = strobe.azimuthDeg() + strobe.turnDegH() * timeS / 3600;
                double off = RayGeometry.gapDeg(clean.azimuthDeg(r), azimuth) / sd;
                if (off < 4) {
                    double power = Decibels.toLinear(strobe.aboveNoiseDb()) * FastMath.exp(-0.5 * off * off);
                    addPower(clean, r, 0, clean.gates, power);
                }
            }
        }
    }

    void rings(CleanSweep clean, FaultSpec.RangeRings rings) {
        for (double rangeKm : rings.rangesKm()) {
            double gate = (rangeKm * 1000 - clean.radar.gates().firstCentreM()) / clean.radar.gates().spacingM();
            int g = (int) Math.rint(gate);
            if (g >= 0 && g + 1 < clean.gates) {
                for (int r = 0; r < clean.rays; r++) {
                    addPower(clean, r, g, g + 2, Decibels.toLinear(rings.aboveNoiseDb()));
                }
            }
        }
    }

    void speckle(CleanSweep clean, FaultSpec.Speckles speckles, RandomGenerator random) {
        int n = (int) (speckles.share() * clean.total.length);
        for (int k = 0; k < n; k++) {
            double dbz = speckles.meanDbz() + SPECKLE_SD_DB * random.nextGaussian();
            SectorFaults.add(clean, random.nextInt(clean.total.length), Decibels.toLinear(dbz));
        }
    }

    private static void addPower(CleanSweep clean, int ray, int from, int to, double overNoise) {
        for (int g = from; g < to; g++) {
            SectorFaults.add(clean, ray * clean.gates + g, overNoise * clean.noise(g));
        }
    }
}
