package hemline.scoring;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** Laws that hold whatever is found. */
class ScoringPropertiesTest {
    private static Track wavy(String id, double turnDeg, double offKm, int fromX, int toX, double speedMs) {
        List<TrackVertex> vertices = new ArrayList<>();
        Point along = Point.towards(90 + turnDeg);
        Point ahead = Point.towards(turnDeg);
        for (int x = fromX; x <= toX; x++) {
            Point place = along.times(x).plus(ahead.times(offKm + 0.3 * Math.sin(x)));
            vertices.add(new TrackVertex(place, Cases.timeMs(0), 10, 500, turnDeg, new Speed(speedMs, 1.5), true));
        }
        return Track.linked(id, List.of(new TrackPiece(0, BoundaryKind.THIN_LINE, Origin.AUTO, vertices)), 1);
    }

    private static Truth turned(double turnDeg) {
        List<Truth.TruthVertex> vertices = new ArrayList<>();
        for (int x = 0; x <= 30; x++) {
            Point place = Point.towards(90 + turnDeg).times(x);
            vertices.add(new Truth.TruthVertex(place.xKm(), place.yKm(), Cases.timeMs(0), 1, 6, turnDeg, 10));
        }
        return Cases.truth(1, Cases.boundary("A", new Truth.TruthLine(0, vertices)));
    }

    @Property(tries = 100)
    void turningTheWholeSceneChangesNothing(@ForAll @DoubleRange(min = 0, max = 359) double turnDeg,
            @ForAll @DoubleRange(min = -1.2, max = 1.2) double offKm,
            @ForAll @IntRange(min = 12, max = 40) int lengthKm) {
        Score still = Cases.score(turned(0), wavy("T1", 0, offKm, 5, 5 + lengthKm, 9));
        Score turned = Cases.score(turned(turnDeg), wavy("T1", turnDeg, offKm, 5, 5 + lengthKm, 9));
        // All but the one measure that is a threshold on a length that moves by an element.
        for (Measure measure : EnumSet.complementOf(EnumSet.of(Measure.BOUNDARIES_FOUND))) {
            if (Double.isNaN(still.value(measure))) {
                assertThat(turned.value(measure)).as(measure.key()).isNaN();
            } else {
                // An element on the very edge of the tolerance may fall on either side after turning.
                assertThat(turned.value(measure)).as(measure.key()).isCloseTo(still.value(measure), within(0.03));
            }
        }
    }

    @Property(tries = 100)
    void lengthsAddUp(@ForAll @DoubleRange(min = -5, max = 5) double offKm,
            @ForAll @IntRange(min = 1, max = 60) int lengthKm, @ForAll @DoubleRange(min = 0, max = 90) double turnDeg) {
        Track track = wavy("T1", turnDeg, offKm, 0, lengthKm, 9);
        SceneTally tally = Cases.score(turned(0), track).scenes().get(0);
        assertThat(tally.rightKm() + tally.neitherKm() + tally.falseKm())
                .isCloseTo(track.maxLengthKm(), within(1e-6));
        assertThat(tally.detectable().allFoundKm()).isBetween(0.0, tally.detectable().allKm() + 1e-9);
        assertThat(tally.detectable().allKm()).isCloseTo(30, within(1e-9));
    }

    @Property(tries = 50)
    void findingMoreNeverLowersRecall(@ForAll @IntRange(min = 1, max = 20) int lengthKm,
            @ForAll @DoubleRange(min = -3, max = 3) double offKm) {
        Track first = wavy("T1", 0, offKm, 0, lengthKm, 9);
        Track second = wavy("T2", 0, -offKm, 10, 10 + lengthKm, 9);
        double one = Cases.score(turned(0), first).value(Measure.RECALL);
        assertThat(Cases.score(turned(0), first, second).value(Measure.RECALL)).isGreaterThanOrEqualTo(one);
    }
}
