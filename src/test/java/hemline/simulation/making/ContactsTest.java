package hemline.simulation.making;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthMeeting;
import hemline.geometry.Point;
import hemline.simulation.front.BowCurve;
import hemline.simulation.scene.Clearing;
import hemline.simulation.scene.Front;
import hemline.simulation.scene.Life;
import hemline.simulation.scene.LineLook;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class ContactsTest {

    private static Truth truth(List<Front> fronts) {
        LoopMaker maker = new LoopMaker(SmallScenes.scene(SmallScenes.air(0, 1.3), fronts, List.of(), List.of()),
                SmallScenes.radar(16, 160), new double[] {0, 1200, 2400}, 3);
        List<LoopMaker.Made> made = new ArrayList<>();
        for (int i = 0; i < maker.size(); i++) {
            made.add(maker.make(i));
        }
        return maker.truth(made);
    }

    /** Circles of 8 and 10 km growing by 9 and 6 m/s with centres 45 km apart touch after (45 − 18) km / 15 m/s = 1800 s. */
    @Test
    void growingCirclesTouchWhenTheirRadiiAddUpToTheirDistance() {
        List<TruthMeeting> meetings = truth(List.of(SmallScenes.circle("a", new Point(-20, 10), 8, 9, 15),
                SmallScenes.circle("b", new Point(25, 10), 10, 6, 15))).meetings();
        assertThat(meetings).hasSize(1);
        TruthMeeting meeting = meetings.get(0);
        assertThat(meeting.timeMs() - 1_900_000_000_000L).isCloseTo(1_800_000L, within(500L));
        assertThat(meeting.xKm()).isCloseTo(-20 + 8 + 16.2, within(0.05));
        assertThat(meeting.yKm()).isCloseTo(10, within(0.5));
        assertThat(meeting.closingMs()).isCloseTo(15, within(0.05));
        assertThat(meeting.crossingAngleDeg()).isCloseTo(0, within(3.0));
        assertThat(meeting.detectable()).isTrue();
    }

    /** A line that overtakes another from behind at 12 − 7 m/s over 6 km touches after 1200 s. */
    @Test
    void aFasterLineOvertakesASlowerOne() {
        List<TruthMeeting> meetings = truth(List.of(line("slow", 10, 7), line("fast", 4, 12))).meetings();
        assertThat(meetings).hasSize(1);
        assertThat(meetings.get(0).timeMs() - 1_900_000_000_000L).isCloseTo(1_200_000L, within(500L));
        assertThat(meetings.get(0).closingMs()).isCloseTo(5, within(0.01));
    }

    @Test
    void frontsThatStayApartDoNotMeet() {
        assertThat(truth(List.of(line("fast", 10, 12), line("slow", 4, 7))).meetings()).isEmpty();
    }

    private static Front line(String id, double northKm, double speedMs) {
        BowCurve curve = new BowCurve(new BowCurve.Motion(new Point(0, northKm), 0, speedMs, 0, 0), 30, 0, 0, List.of());
        return new Front(id, curve, new LineLook(15, 0.5, 0.5, 0, 0, 0, 0), Clearing.NONE, Life.ALWAYS, Front.Window.ALL, 1.4,
                true, 0);
    }
}
