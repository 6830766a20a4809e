package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.geometry.Point;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/**
 * What a run or an exported case left in its folder, read back.
 *
 * @param tracks   from {@code boundaries.csv} and {@code tracks.csv}
 * @param meetings from {@code meetings.csv}
 * @param notes    what was not there, in words
 */
public record RunTables(List<Track> tracks, List<Meeting> meetings, List<String> notes) {
    public RunTables {
        tracks = List.copyOf(tracks);
        meetings = List.copyOf(meetings);
        notes = List.copyOf(notes);
    }

    /**
     * Reads {@code boundaries.csv}, which has to be there, and {@code tracks.csv} and {@code meetings.csv}, whose
     * absence is noted: then no expansion or no meeting is scored.
     *
     * @throws InputFileException when a table cannot be used
     */
    public static RunTables read(Path folder) throws InputFileException {
        List<String> notes = new ArrayList<>();
        TrackTables tables = new TrackTables(TableFile.read(folder.resolve("boundaries.csv")));
        if (Files.exists(folder.resolve("tracks.csv"))) {
            tables.addArcs(TableFile.read(folder.resolve("tracks.csv")));
        } else {
            notes.add(folder + " has no tracks.csv: expansions are not scored");
        }
        List<Meeting> meetings = new ArrayList<>();
        if (Files.exists(folder.resolve("meetings.csv"))) {
            TableFile table = TableFile.read(folder.resolve("meetings.csv"));
            table.require(List.of("meeting_id", "track_a", "track_b", "time_utc", "x_km", "y_km", "status"));
            for (TableFile.Row row : table.rows()) {
                meetings.add(meeting(row));
            }
        } else {
            notes.add(folder + " has no meetings.csv: meetings are scored as if none was found");
        }
        notes.addAll(tables.notes());
        return new RunTables(tables.tracks(), meetings, notes);
    }

    private static Meeting meeting(TableFile.Row row) throws InputFileException {
        return new Meeting(row.text("meeting_id"), row.text("track_a"), row.text("track_b"), row.timeMs("time_utc"),
                row.number("time_sd_s"), new Point(row.needed("x_km"), row.needed("y_km")),
                new Meeting.Ellipse(row.number("ellipse_major_km"), row.number("ellipse_minor_km"),
                        row.number("ellipse_bearing_deg")),
                row.number("crossing_angle_deg"), speed(row, "closing_speed_ms", "closing_speed_sd_ms"), status(row),
                row.number("probability"));
    }

    private static Meeting.Status status(TableFile.Row row) throws InputFileException {
        for (Meeting.Status status : Meeting.Status.values()) {
            if (status.label().equals(row.text("status"))) {
                return status;
            }
        }
        throw row.problem("status", "expected observed or expected, found \"" + row.text("status") + "\"",
                "write one of the two");
    }

    /** A speed without its standard deviation is no measurement: it is taken as not given. */
    static Speed speed(TableFile.Row row, String speedColumn, String sdColumn) throws InputFileException {
        double speed = row.number(speedColumn);
        double sd = row.number(sdColumn);
        if (sd < 0) {
            throw row.problem(sdColumn, "expected a standard deviation of at least 0, found " + sd, "mend the cell");
        }
        return Double.isNaN(speed) || Double.isNaN(sd) ? Speed.UNKNOWN : new Speed(speed, sd);
    }
}
