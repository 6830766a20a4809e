package hemline.detection;

import hemline.boundary.ObservedBoundary;
import hemline.numerics.Workers;
import hemline.sweep.Progress;
import hemline.sweep.ScreenedLoop;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Finds thin lines and clear-air arcs in every sweep of a loop, from the sweep itself and from its neighbours in time.
 *
 * <p>Accepted: loops of any length and sweeps of mixed geometry; a single sweep gets a result from itself alone. Memory is
 * bounded: long loops are worked through in blocks of {@link #BLOCK} sweeps, about 6 MB each. The result does not depend on
 * the number of threads.
 */
public final class Detection {
    /** Sweeps held at once; what stays in place is learned from a block and its margins. */
    static final int BLOCK = 24;
    /** Neighbours farther away in time lend no evidence, s. */
    private static final double FARTHEST_S = 1500;

    private Detection() {
    }

    /**
     * Boundaries of all sweeps, ordered by sweep and within a sweep from the strongest.
     *
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    public static List<ObservedBoundary> detect(ScreenedLoop loop, DetectionSettings settings, Workers workers,
                                                Progress progress) {
        Rasteriser rasteriser = new Rasteriser(settings.pixelKm(), settings.maxRangeKm());
        SweepDetector detector = new SweepDetector(settings);
        AtomicInteger done = new AtomicInteger();
        List<ObservedBoundary> found = new ArrayList<>();
        int blocks = Math.max(1, (int) Math.ceil(loop.size() / (double) BLOCK));
        for (int block = 0; block < blocks; block++) {
            int from = (int) ((long) block * loop.size() / blocks);
            int to = (int) ((long) (block + 1) * loop.size() / blocks);
            int low = Math.max(0, from - settings.sweepsEachSide());
            int high = Math.min(loop.size(), to + settings.sweepsEachSide());
            List<PreparedSweep> prepared = workers.map(high - low, progress::cancelled,
                    i -> PreparedSweep.of(low + i, loop.screened(low + i), rasteriser));
            if (prepared.isEmpty()) {
                continue;
            }
            RestLevel rest = RestLevel.of(prepared.stream().map(PreparedSweep::evidence).toList());
            workers.map(to - from, progress::cancelled, i -> {
                PreparedSweep sweep = prepared.get(from + i - low);
                EvidenceStack stack = new EvidenceStack(layers(prepared, from + i - low, settings),
                        sweep.evidence().grid, rest, settings.maxSpeedMs());
                List<ObservedBoundary> boundaries = detector.detect(stack, sweep.raster(), sweep.rain(), sweep.frame());
                progress.step("detecting", done.incrementAndGet(), loop.size());
                return boundaries;
            }).forEach(found::addAll);
        }
        return found;
    }

    private static List<EvidenceStack.Layer> layers(List<PreparedSweep> prepared, int at, DetectionSettings settings) {
        long time = prepared.get(at).frame().meanTimeMs();
        List<EvidenceStack.Layer> layers = new ArrayList<>();
        int before = settings.sweepsEachSide();
        int after = settings.onlyPast() ? 0 : settings.sweepsEachSide();
        for (int j = Math.max(0, at - before); j <= Math.min(prepared.size() - 1, at + after); j++) {
            double afterS = (prepared.get(j).frame().meanTimeMs() - time) / 1000.0;
            if (Math.abs(afterS) <= FARTHEST_S) {
                layers.add(new EvidenceStack.Layer(afterS, prepared.get(j).evidence()));
            }
        }
        return layers;
    }
}
