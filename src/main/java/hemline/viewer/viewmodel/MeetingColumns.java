package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import java.util.List;

/** The columns of the ledger's meetings. */
public final class MeetingColumns {
    private MeetingColumns() {
    }

    public static List<LedgerColumn<Meeting>> all() {
        String ms = Words.METRES_PER_SECOND;
        return List.of(
                LedgerColumn.text("Meeting", "Its name, short and stable within a run", Meeting::id),
                LedgerColumn.text("Tracks", "The two boundaries that meet", m -> m.trackA() + " \u00d7 " + m.trackB()),
                LedgerColumn.of("Time", "UTC", "First contact", Meeting::timeMs, m -> Words.shortClock(m.timeMs())),
                LedgerColumn.number("\u00b1 sd", "min", "One standard deviation of the time", 1,
                        m -> m.timeSdS() / 60),
                LedgerColumn.text("Status", "Observed in the loop, or expected after its end",
                        m -> m.status().label()),
                LedgerColumn.number("Chance", "%", "Probability that they meet", 0, m -> 100 * m.probability()),
                LedgerColumn.number("Closing", ms, "Speed at which the gap closed", 1, m -> m.closing().speedMs()),
                LedgerColumn.number("\u00b1 sd clos.", ms, "One standard deviation of the closing speed", 2,
                        m -> m.closing().sdMs()),
                LedgerColumn.of("Crossing", "", "Angle between the two lines, 0 to 90 degrees",
                        Meeting::crossingAngleDeg, m -> Words.number(m.crossingAngleDeg(), 0) + "\u00b0"),
                LedgerColumn.number("East", "km", "East of the radar", 1, m -> m.place().xKm()),
                LedgerColumn.number("North", "km", "North of the radar", 1, m -> m.place().yKm()),
                LedgerColumn.number("Within", "km", "One standard deviation of the place along its worse axis", 1,
                        m -> m.ellipse().majorKm()));
    }
}
