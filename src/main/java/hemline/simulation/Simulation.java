package hemline.simulation;

import hemline.numerics.Workers;
import hemline.simulation.making.LoopMaker;
import hemline.simulation.radar.RadarSpec;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.SceneSpec;
import hemline.sweep.Progress;
import java.io.IOException;
import java.nio.file.Path;
import org.apache.commons.math3.random.RandomGenerator;

/** Makes invented loops: the same scene, radar and seed always give the same loop. */
public final class Simulation {
    private Simulation() {
    }

    /**
     * The loop of a named scene under a named radar.
     *
     * @param scene one of {@link Scenes#names()}
     * @param radar one of {@link Radars#names()}
     */
    public static SimulatedLoop of(String scene, String radar, long seed) {
        RadarSpec spec = Radars.named(radar);
        return Scenes.build(scene, spec, seed);
    }

    /** The loop of any scene under any radar, with {@code sweeps} sweeps from the scene's start on. */
    public static SimulatedLoop of(SceneSpec scene, RadarSpec radar, int sweeps, long seed) {
        return new SimulatedLoop(scene, radar, new LoopMaker(scene, radar, sweepStartsS(radar, sweeps, seed), seed));
    }

    /**
     * Writes a loop into a folder, one file a sweep, and its truth beside it as {@code truth.json}.
     *
     * @param dir created if need be; files of the same names are replaced, others left alone
     * @throws IllegalArgumentException                      when there is no such scene or radar
     * @throws java.util.concurrent.CancellationException when {@code progress} says so
     */
    public static WrittenLoop write(Path dir, SimulationRequest request, Workers workers, Progress progress)
            throws IOException {
        SimulatedLoop loop = of(request.scene(), request.radar(), request.seed());
        return LoopFiles.write(dir, loop, request.formats(), workers, progress);
    }

    /** As {@link #write(Path, SimulationRequest, Workers, Progress)} on one thread. */
    public static WrittenLoop write(Path dir, SimulationRequest request, Progress progress) throws IOException {
        try (Workers workers = new Workers(1)) {
            return write(dir, request, workers, progress);
        }
    }

    /** When the sweeps of a loop start, s after the scene's start: an uneven beat with holes. */
    static double[] sweepStartsS(RadarSpec radar, int sweeps, long seed) {
        RandomGenerator random = new Streams(seed).part(radar.site().name(), 0).stream("timing");
        double[] starts = new double[sweeps];
        double turnS = 360 / radar.dish().turnDegS();
        int beat = 0;
        double least = 0;
        for (int i = 0; i < sweeps; i++, beat++) {
            while (i > 0 && random.nextDouble() < radar.timing().holeShare()) {
                beat++;
            }
            double wanted = beat * radar.timing().intervalS() + radar.timing().jitterS() * random.nextGaussian();
            starts[i] = Math.rint(1000 * Math.max(least, wanted)) / 1000;
            least = starts[i] + turnS + 20;
        }
        return starts;
    }
}
