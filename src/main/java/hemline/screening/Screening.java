package hemline.screening;

import hemline.numerics.Workers;
import hemline.sweep.Loop;
import hemline.sweep.NoiseFloor;
import hemline.sweep.Progress;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;

/**
 * Learns from a loop what stays in place and gives each sweep's gates their reasons.
 *
 * <p>Accepted: loops of any length, sweeps of mixed geometry. Loops of fewer than {@link #FEWEST_FOR_STAYING} sweeps
 * cannot tell what stays; there only texture speaks for clutter. Memory: a byte for each cell of one polar map and
 * learned sweep, at most {@link #MOST_LEARNED} of them.
 */
public final class Screening {
    /** Sweeps from which "it stays while weather moves" can be said. */
    static final int FEWEST_FOR_STAYING = 4;
    /** Sweeps, evenly spread over a long loop, that are learned from. */
    static final int MOST_LEARNED = 48;

    private Screening() {
    }

    /** @throws java.util.concurrent.CancellationException if cancelled */
    public static ScreenedLoop learn(Loop loop, ScreeningSettings settings, Workers workers, Progress progress) {
        int learned = Math.min(loop.size(), MOST_LEARNED);
        AtomicInteger done = new AtomicInteger();
        List<PolarMap> maps = workers.map(learned, progress::cancelled, i -> {
            Sweep sweep = loop.sweep(spread(i, learned, loop.size()));
            PolarMap map = PolarMap.of(sweep, NoiseFloor.of(sweep));
            progress.step("screening", done.incrementAndGet(), learned);
            return map;
        });
        StayingEcho staying = maps.size() < FEWEST_FOR_STAYING ? StayingEcho.none()
                : StayingEcho.learn(maps, settings.clutterOverDb());
        BlockedSectors blocked = maps.size() < FEWEST_FOR_STAYING ? BlockedSectors.none() : BlockedSectors.learn(maps);
        SweepScreener screener = new SweepScreener(settings, staying, blocked, loop.size() < FEWEST_FOR_STAYING);
        return new ScreenedLoop() {
            @Override
            public int size() {
                return loop.size();
            }

            @Override
            public ScreenedSweep screened(int index) {
                return screener.screen(loop.sweep(index));
            }
        };
    }

    private static int spread(int i, int of, int size) {
        return of == size ? i : (int) ((long) i * (size - 1) / (of - 1));
    }
}
