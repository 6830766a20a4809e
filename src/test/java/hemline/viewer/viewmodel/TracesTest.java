package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import hemline.viewer.FakeLoop;
import java.util.List;
import org.junit.jupiter.api.Test;

class TracesTest {
    private static TrackVertex vertex(double x, double dbz, Speed speed) {
        return new TrackVertex(new Point(x, 0), 1000, dbz, 500, 0, speed, true);
    }

    @Test
    void speedIsWeightedByItsUncertainty() {
        Track track = Track.linked("T01", List.of(new TrackPiece(3, BoundaryKind.THIN_LINE, Origin.AUTO, List.of(
                vertex(0, 10, new Speed(10, 1)), vertex(1, 14, new Speed(14, 2)), vertex(2, Double.NaN,
                        Speed.UNKNOWN)))), 1);
        Trace speed = Traces.of(track).get(0);
        // (10/1 + 14/4) / (1 + 1/4) = 10.8; sqrt((1 + 4) / 2) = 1.5811
        assertThat(speed.samples()).hasSize(1);
        assertThat(speed.samples().get(0).value()).isCloseTo(10.8, within(1e-9));
        assertThat(speed.samples().get(0).sd()).isCloseTo(Math.sqrt(2.5), within(1e-9));
        assertThat(speed.samples().get(0).sweep()).isEqualTo(3);
        Trace dbz = Traces.of(track).get(3);
        assertThat(dbz.samples().get(0).value()).isCloseTo(12, within(1e-9));
    }

    @Test
    void lengthCountsAllStretchesOfASweep() {
        Track track = Track.linked("T01", List.of(
                new TrackPiece(0, BoundaryKind.ARC, Origin.AUTO, List.of(vertex(0, 1, Speed.UNKNOWN), vertex(3, 1,
                        Speed.UNKNOWN))),
                new TrackPiece(0, BoundaryKind.ARC, Origin.AUTO, List.of(vertex(5, 1, Speed.UNKNOWN), vertex(9, 1,
                        Speed.UNKNOWN)))), 1);
        assertThat(Traces.of(track).get(2).samples()).singleElement()
                .satisfies(s -> assertThat(s.value()).isCloseTo(7, within(1e-9)));
    }

    @Test
    void whatIsNotKnownSaysWhy() {
        List<Trace> traces = Traces.of(FakeLoop.small(true).tracks().get(2));
        assertThat(traces.get(1).samples()).isEmpty();
        assertThat(traces.get(1).none()).isEqualTo("no arc: curvature is not significant");
        Track unmeasured = Track.linked("T09", List.of(new TrackPiece(0, BoundaryKind.ARC, Origin.AUTO,
                List.of(vertex(0, 1, Speed.UNKNOWN), vertex(3, 1, Speed.UNKNOWN)))), 1);
        assertThat(Traces.of(unmeasured).get(0).none()).isEqualTo("no speed is known");
    }

    @Test
    void bandsAreTwoStandardDeviations() {
        Trace radius = Traces.of(FakeLoop.small(true).tracks().get(0)).get(1);
        Trace.Sample first = radius.samples().get(0);
        assertThat(first.high() - first.low()).isCloseTo(4 * 0.4, within(1e-9));
        assertThat(radius.words(first)).isEqualTo("21:00  9.0 \u00b1 0.8 km");
    }

    @Test
    void hoverFindsTheSampleNearestInTime() {
        Trace length = Traces.of(FakeLoop.small(true).tracks().get(0)).get(2);
        assertThat(length.nearest(FakeLoop.timeMs(4) + 60_000).orElseThrow().sweep()).isEqualTo(4);
    }

    @Test
    void theValueAxisHoldsEveryBand() {
        for (Track track : FakeLoop.small(true).tracks()) {
            for (Trace trace : Traces.of(track)) {
                ValueScale scale = ValueScale.of(trace, 100, 20);
                trace.samples().forEach(s -> {
                    assertThat(scale.y(s.high())).isBetween(20.0, 100.0);
                    assertThat(scale.y(s.low())).isBetween(20.0, 100.0);
                });
            }
        }
    }
}
