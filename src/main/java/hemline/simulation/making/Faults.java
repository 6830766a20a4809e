package hemline.simulation.making;

import hemline.simulation.echo.Decibels;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.FaultSpec;
import hemline.simulation.scene.SceneSpec;
import hemline.simulation.scene.Steps;
import org.apache.commons.math3.distribution.PoissonDistribution;
import org.apache.commons.math3.random.RandomGenerator;

/** Puts a scene's obstacles and receiver faults into a clean sweep. */
final class Faults {
    private static final double NO_ECHO_LOSS_DB = 60;
    private final SceneSpec scene;
    private final RadarSpec radar;
    private final Streams streams;

    Faults(SceneSpec scene, RadarSpec radar, Streams streams) {
        this.scene = scene;
        this.radar = radar;
        this.streams = streams;
    }

    void apply(CleanSweep clean, int sweep) {
        for (int i = 0; i < scene.faults().size(); i++) {
            FaultSpec fault = scene.faults().get(i);
            if (fault instanceof FaultSpec.Obstacle obstacle) {
                block(clean, obstacle, i);
            } else if (fault instanceof FaultSpec.LostRays lost) {
                lose(clean, lost, streams.stream("lost", i, sweep));
            } else if (fault instanceof FaultSpec.Spikes spikes) {
                spike(clean, spikes, streams.stream("spikes", i, sweep));
            }
        }
    }

    private void block(CleanSweep clean, FaultSpec.Obstacle obstacle, int number) {
        LatticeNoise skyline = new LatticeNoise(streams.stream("skyline", number, 0));
        for (int r = 0; r < clean.rays; r++) {
            double into = (clean.azimuthDeg(r) - obstacle.fromDeg() + 720) % 360;
            if (into >= obstacle.widthDeg()) {
                continue;
            }
            double edge = Math.min(into, obstacle.widthDeg() - into);
            double loss = obstacle.lossDb() * Steps.smooth(edge / 1.2);
            if (obstacle.ragged()) {
                loss *= Math.max(0.1, 1 + 0.5 * skyline.at(clean.azimuthDeg(r) / 1.6, 0));
            }
            float keep = (float) Decibels.toLinear(-Math.min(NO_ECHO_LOSS_DB, loss));
            int from = Math.max(0, (int) Math.ceil(
                    (obstacle.rangeKm() * 1000 - radar.gates().firstCentreM()) / radar.gates().spacingM()));
            for (int i = r * clean.gates + from; i < (r + 1) * clean.gates; i++) {
                clean.total[i] *= keep;
                clean.withoutLines[i] *= keep;
                clean.withoutClearing[i] *= keep;
            }
        }
    }

    private static void lose(CleanSweep clean, FaultSpec.LostRays lost, RandomGenerator random) {
        boolean before = false;
        for (int r = 0; r < clean.rays; r++) {
            // Losses cluster: a ray after a lost one is lost three times in ten.
            boolean now = random.nextDouble() < (before ? 0.3 : lost.share());
            clean.lost[r] |= now;
            before = now;
        }
    }

    private void spike(CleanSweep clean, FaultSpec.Spikes spikes, RandomGenerator random) {
        PoissonDistribution count = new PoissonDistribution(random, spikes.perSweep(), 1e-12, 1000);
        int n = count.sample();
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

    private static void addPower(CleanSweep clean, int ray, int from, int to, double overNoise) {
        for (int g = from; g < to; g++) {
            float echo = (float) (overNoise * clean.noise(g));
            clean.total[ray * clean.gates + g] += echo;
            clean.withoutLines[ray * clean.gates + g] += echo;
            clean.withoutClearing[ray * clean.gates + g] += echo;
        }
    }
}
