package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import hemline.boundary.Meeting;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;

/** {@code meetings.geojson}: each meeting as a point, and the one-sigma ellipse of its place. */
final class MeetingsGeoJson {
    private static final int SIDES = 72;

    private MeetingsGeoJson() {
    }

    static void write(OutputStream out, Analysis analysis, Geolocation where) throws IOException {
        try (GeoFeatures features = new GeoFeatures(out)) {
            for (Meeting meeting : analysis.meetings()) {
                features.add(meeting.id(), json -> GeoGeometry.point(json, where.of(meeting.place())),
                        json -> properties(json, meeting, "place"));
                GeoLines rim = new GeoLines();
                rim.add(where.line(ellipse(meeting)));
                features.add(meeting.id() + "/ellipse", json -> GeoGeometry.lines(json, rim),
                        json -> properties(json, meeting, "ellipse"));
            }
        }
    }

    /** The one-standard-deviation ellipse of a meeting's place as a closed line, counter-clockwise, km. */
    static List<Point> ellipse(Meeting meeting) {
        Point major = Point.towards(meeting.ellipse().majorBearingDeg()).times(meeting.ellipse().majorKm());
        Point minor = Point.towards(meeting.ellipse().majorBearingDeg() - 90).times(meeting.ellipse().minorKm());
        List<Point> rim = new ArrayList<>();
        for (int i = 0; i <= SIDES; i++) {
            double turn = Math.toRadians(360.0 * (i % SIDES) / SIDES);
            rim.add(meeting.place().plus(major.times(Math.cos(turn))).plus(minor.times(Math.sin(turn))));
        }
        return rim;
    }

    private static void properties(JsonGenerator json, Meeting meeting, String what) throws IOException {
        json.writeStringField("meeting_id", meeting.id());
        json.writeStringField("what", what);
        json.writeStringField("track_a", meeting.trackA());
        json.writeStringField("track_b", meeting.trackB());
        json.writeStringField("time_utc", Times.iso(meeting.timeMs()));
        GeoFeatures.number(json, "time_sd_s", meeting.timeSdS(), 0);
        json.writeStringField("status", meeting.status().label());
        GeoFeatures.number(json, "probability", meeting.probability(), 2);
        GeoFeatures.number(json, "crossing_angle_deg", meeting.crossingAngleDeg(), 1);
        GeoFeatures.number(json, "closing_speed_ms", meeting.closing().speedMs(), 2);
    }
}
