package hemline.detection;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.boundary.BoundaryKind;
import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.numerics.Workers;
import hemline.sweep.GateMask;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.ScreenedSweep;
import java.util.List;
import org.junit.jupiter.api.Test;

class DetectionTest {

    private static ScreenedLoop unmasked(Loop loop) {
        return new ScreenedLoop() {
            @Override
            public int size() {
                return loop.size();
            }

            @Override
            public ScreenedSweep screened(int index) {
                var sweep = loop.sweep(index);
                return new ScreenedSweep(sweep, GateMask.clear(sweep.rayCount(), sweep.gateCount()));
            }
        };
    }

    private static List<ObservedBoundary> detect(Loop loop, DetectionSettings settings, int threads) {
        try (Workers workers = new Workers(threads)) {
            return Detection.detect(unmasked(loop), settings, workers, Progress.NONE);
        }
    }

    @Test
    void aMovingLineIsFoundWhereItIsAndMovesAsItDoes() {
        InventedAir air = new InventedAir();
        air.echo = InventedAir.line(60, -10, 12, 8, 1.6);
        List<ObservedBoundary> found = detect(air.loop(), DetectionSettings.defaults(), 1);
        for (int k = 0; k < air.sweeps; k++) {
            int sweep = k;
            List<ObservedVertex> vertices = found.stream().filter(b -> b.sweep() == sweep)
                    .flatMap(b -> b.vertices().stream()).toList();
            assertThat(vertices).as("sweep %d", k).hasSizeBetween(50, 72);
            double sumOfSquares = 0;
            for (ObservedVertex v : vertices) {
                double across = v.position().xKm() * Math.sin(Math.toRadians(60))
                        + v.position().yKm() * Math.cos(Math.toRadians(60)) + 10 - 12 * v.timeMs() / 1e6;
                double along = -v.position().xKm() * Math.cos(Math.toRadians(60))
                        + v.position().yKm() * Math.sin(Math.toRadians(60));
                boolean end = Math.abs(along) > 27;
                assertThat(Math.abs(across)).isLessThan(2.0);
                assertThat(hemline.sweep.RayGeometry.gapDeg(v.normal().bearingDeg(), 60)).isLessThan(end ? 30 : 18);
                assertThat(v.lineDb()).isGreaterThan(3);
                sumOfSquares += across * across;
            }
            assertThat(Math.sqrt(sumOfSquares / vertices.size())).as("rms offset, km").isLessThan(0.6);
            assertThat(vertices.stream().mapToDouble(ObservedVertex::motionMs).average().orElseThrow())
                    .isBetween(10.0, 14.0);
        }
        assertThat(found).allMatch(b -> b.kind() == BoundaryKind.THIN_LINE);
    }

    @Test
    void aStepWithoutALineIsAnArcSignedTowardTheBrighterSide() {
        InventedAir air = new InventedAir();
        air.echo = (x, y, t) -> {
            double radius = Math.hypot(x - 10, y + 5);
            return radius < 18 + 8 * t / 1000 ? -6 : 2;
        };
        List<ObservedBoundary> found = detect(air.loop(), DetectionSettings.defaults(), 1);
        List<ObservedBoundary> middle = found.stream().filter(b -> b.sweep() == 3).toList();
        assertThat(middle.stream().mapToInt(b -> b.vertices().size()).sum()).isGreaterThan(70);
        for (ObservedBoundary one : middle) {
            assertThat(one.kind()).isEqualTo(BoundaryKind.ARC);
            for (ObservedVertex v : one.vertices()) {
                double outward = (v.position().xKm() - 10) * v.normal().xKm() + (v.position().yKm() + 5) * v.normal().yKm();
                assertThat(outward).isPositive();
                assertThat(v.stepDb()).isGreaterThan(4);
            }
        }
    }

    @Test
    void theResultDoesNotDependOnTheNumberOfThreads() {
        InventedAir air = new InventedAir();
        air.sweeps = 4;
        air.echo = InventedAir.line(200, 5, 15, 6, 2);
        Loop loop = air.loop();
        assertThat(detect(loop, DetectionSettings.defaults(), 3)).isEqualTo(detect(loop, DetectionSettings.defaults(), 1));
    }

    @Test
    void aStrongLineIsFoundInASingleSweepToo() {
        InventedAir air = new InventedAir();
        air.sweeps = 1;
        air.echo = InventedAir.line(120, 15, 0, 9, 2);
        List<ObservedBoundary> found = detect(air.loop(), DetectionSettings.defaults(), 1);
        assertThat(found.stream().mapToInt(b -> b.vertices().size()).sum()).isGreaterThan(40);
    }

    @Test
    void anEmptyLoopGivesNothing() {
        assertThat(detect(Loop.of(List.of()), DetectionSettings.defaults(), 1)).isEmpty();
    }
}
