package hemline.cli;

import hemline.boundary.ArcHistory;
import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.workflow.RunOutcome;
import java.io.PrintWriter;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;

/** What a run found, in a table for people. */
final class Summary {
    private static final DateTimeFormatter DAY =
            DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm:ss", Locale.ROOT).withZone(ZoneOffset.UTC);
    private static final DateTimeFormatter CLOCK =
            DateTimeFormatter.ofPattern("HH:mm:ss", Locale.ROOT).withZone(ZoneOffset.UTC);

    private final PrintWriter out;

    Summary(PrintWriter out) {
        this.out = out;
    }

    void print(RunOutcome outcome) {
        out.println("Radar " + outcome.site().name() + ", " + counted(outcome.sweeps(), "sweep") + ", "
                + DAY.format(Instant.ofEpochMilli(outcome.firstMs())) + " to "
                + DAY.format(Instant.ofEpochMilli(outcome.lastMs())) + " UTC");
        out.println();
        tracks(outcome.tracks());
        out.println();
        meetings(outcome.meetings());
        out.println();
        outcome.cautions().forEach(caution -> out.println("Caution: " + caution));
        out.println("Results: " + outcome.out() + " (" + String.join(", ", outcome.files()) + ")");
        out.flush();
    }

    private void tracks(List<Track> tracks) {
        out.println(tracks.size() == 1 ? "1 boundary" : tracks.size() + " boundaries");
        if (tracks.isEmpty()) {
            return;
        }
        TextTable table = new TextTable("track", "first", "last", "sweeps", "length km", "speed m s⁻¹", "toward",
                "radius km", "expansion m s⁻¹");
        for (Track track : tracks) {
            table.row(track.id(), clock(track.firstMs()), clock(track.lastMs()),
                    Integer.toString(track.sweepCount()), number(track.maxLengthKm(), 1), speed(track.speed()),
                    bearing(track.bearingDeg()), track.arc().map(Summary::radii).orElse("-"),
                    track.arc().map(arc -> speed(arc.expansion())).orElse("-"));
        }
        table.print(out);
    }

    private void meetings(List<Meeting> meetings) {
        out.println(counted(meetings.size(), "meeting"));
        if (meetings.isEmpty()) {
            return;
        }
        TextTable table = new TextTable("meeting", "tracks", "time", "x km", "y km", "angle", "closing m s⁻¹", "status");
        for (Meeting meeting : meetings) {
            table.row(meeting.id(), meeting.trackA() + " " + meeting.trackB(), clock(meeting.timeMs()),
                    number(meeting.place().xKm(), 1), number(meeting.place().yKm(), 1),
                    bearing(meeting.crossingAngleDeg()), speed(meeting.closing()), meeting.status().label());
        }
        table.print(out);
    }

    private static String radii(ArcHistory arc) {
        return number(arc.radii().get(0).radiusKm(), 1) + " to "
                + number(arc.radii().get(arc.radii().size() - 1).radiusKm(), 1);
    }

    private static String clock(long timeMs) {
        return CLOCK.format(Instant.ofEpochMilli(timeMs));
    }

    private static String speed(Speed speed) {
        return speed.isKnown() ? number(speed.speedMs(), 1) + " ± " + number(speed.sdMs(), 1) : "-";
    }

    private static String bearing(double degrees) {
        return Double.isNaN(degrees) ? "-" : number(degrees, 0) + "°";
    }

    private static String number(double value, int decimals) {
        return Double.isNaN(value) ? "-" : String.format(Locale.ROOT, "%." + decimals + "f", value);
    }

    private static String counted(int count, String noun) {
        return count + " " + noun + (count == 1 ? "" : "s");
    }
}
