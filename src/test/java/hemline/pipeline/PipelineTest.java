package hemline.pipeline;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.numerics.Workers;
import hemline.simulation.SimulatedLoop;
import hemline.simulation.Simulation;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

class PipelineTest {
    private static final SimulatedLoop LOOP = Simulation.of("straight-line", "sennick", 4);

    private static Loop first(int sweeps) {
        List<Sweep> held = new ArrayList<>();
        for (int i = 0; i < sweeps; i++) {
            held.add(LOOP.sweep(i));
        }
        return Loop.of(held);
    }

    private static Analysis run(Loop loop, int threads) {
        try (Workers workers = new Workers(threads)) {
            return Pipeline.run(loop, Settings.defaults(), workers, Progress.NONE);
        }
    }

    @Test
    void theResultDoesNotDependOnTheNumberOfThreads() {
        Analysis one = run(first(5), 1);
        Analysis two = run(first(5), 2);
        assertThat(two.tracks()).isEqualTo(one.tracks()).isNotEmpty();
        assertThat(two.meetings()).isEqualTo(one.meetings());
        assertThat(two.counts()).isEqualTo(one.counts());
        assertThat(one.frames()).hasSize(5);
    }

    @Test
    void aSingleSweepGivesNoTrackAndSaysWhy() {
        Analysis single = run(first(1), 1);
        assertThat(single.tracks()).isEmpty();
        assertThat(single.cautions()).anyMatch(c -> c.contains("1 of the 3 sweeps"));
    }

    @Test
    void aRadarWithoutAPositionIsACaution() {
        Sweep placed = LOOP.sweep(0);
        Sweep unplaced = new Sweep(new RadarSite("x", Optional.empty(), Double.NaN), placed.source(),
                placed.elevationDeg(), placed.beamWidthDeg(), placed.firstGateCentreM(), placed.gateSpacingM(),
                placed.rays(), placed.reflectivity(), placed.velocity(), placed.nyquistMs());
        assertThat(run(Loop.of(List.of(unplaced)), 1).cautions()).anyMatch(c -> c.contains("--position"))
                .anyMatch(c -> c.contains("above the antenna"));
    }

    @Test
    void anEmptyLoopIsRefused() {
        assertThatThrownBy(() -> run(Loop.of(List.of()), 1)).isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("got 0");
    }

    @Test
    void cancellingStopsTheRun() {
        AtomicInteger asked = new AtomicInteger();
        Progress impatient = new Progress() {
            @Override
            public boolean cancelled() {
                return asked.incrementAndGet() > 3;
            }
        };
        try (Workers workers = new Workers(1)) {
            assertThatThrownBy(() -> Pipeline.run(first(5), Settings.defaults(), workers, impatient))
                    .isInstanceOf(CancellationException.class);
        }
    }
}
