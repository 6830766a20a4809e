package hemline.export;

import hemline.boundary.Meeting;
import hemline.geodesy.GeoPoint;
import java.util.List;
import java.util.Optional;

/** {@code meetings.csv}: one row a meeting of two boundaries. */
final class MeetingsTable {
    static final Table<Row> TABLE = new Table<>("meetings", "One row per first contact of two boundaries.", List.of(
            Column.text("meeting_id", "Name of the meeting within this run.", r -> r.meeting.id()),
            Column.text("track_a", "One boundary, see tracks.csv.", r -> r.meeting.trackA()),
            Column.text("track_b", "The other boundary.", r -> r.meeting.trackB()),
            Column.time("time_utc", "Time of first contact.", r -> r.meeting.timeMs()),
            Column.number("x_km", "km", 2, "Place of first contact, east of the radar.", r -> r.meeting.place().xKm()),
            Column.number("y_km", "km", 2, "Place of first contact, north of the radar.", r -> r.meeting.place().yKm()),
            Column.number("latitude", "degree_north", 5, "WGS 84; empty when the radar's position is unknown.",
                    r -> r.geo.map(GeoPoint::latitudeDeg).orElse(Double.NaN)),
            Column.number("longitude", "degree_east", 5, "WGS 84; empty when the radar's position is unknown.",
                    r -> r.geo.map(GeoPoint::longitudeDeg).orElse(Double.NaN)),
            Column.number("crossing_angle_deg", "degree", 1, "Angle between the lines, 0 to 90.",
                    r -> r.meeting.crossingAngleDeg()),
            Column.number("closing_speed_ms", "m s-1", 2, "Speed at which the gap closed.",
                    r -> r.meeting.closing().speedMs()),
            Column.text("status", "observed: within the loop; expected: foreseen from the motion of both.",
                    r -> r.meeting.status().label()),
            Column.number("time_sd_s", "s", 0, "Standard deviation of the time.", r -> r.meeting.timeSdS()),
            Column.number("closing_speed_sd_ms", "m s-1", 2, "Standard deviation of the closing speed.",
                    r -> r.meeting.closing().sdMs()),
            Column.number("ellipse_major_km", "km", 2, "Longer half axis of the one-sigma ellipse of the place.",
                    r -> r.meeting.ellipse().majorKm()),
            Column.number("ellipse_minor_km", "km", 2, "Shorter half axis of that ellipse.",
                    r -> r.meeting.ellipse().minorKm()),
            Column.number("ellipse_bearing_deg", "degree", 0, "Compass bearing of the longer axis, 0 to 180.",
                    r -> r.meeting.ellipse().majorBearingDeg()),
            Column.number("probability", "1", 2, "That they meet, 0 to 1; 1 when observed.",
                    r -> r.meeting.probability())));

    private MeetingsTable() {
    }

    record Row(Meeting meeting, Optional<GeoPoint> geo) {
    }

    static List<Row> rows(List<Meeting> meetings, Geolocation where) {
        return meetings.stream().map(m -> new Row(m, where.of(m.place()))).toList();
    }
}
