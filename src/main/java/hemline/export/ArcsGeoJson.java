package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import hemline.boundary.ArcHistory;
import hemline.boundary.ArcHistory.RadiusAt;
import hemline.boundary.Track;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;

/** {@code arcs.geojson}: the fitted circle of each track at each of its sweeps, and the way of its centre. */
final class ArcsGeoJson {
    private static final int SIDES = 120;

    private ArcsGeoJson() {
    }

    static void write(OutputStream out, Analysis analysis, Geolocation where) throws IOException {
        try (GeoFeatures features = new GeoFeatures(out)) {
            for (Track track : analysis.tracks()) {
                if (track.arc().isPresent()) {
                    ArcHistory arc = track.arc().get();
                    for (RadiusAt radius : arc.radii()) {
                        circle(features, track, arc, radius, where);
                    }
                    centre(features, track, arc, where);
                }
            }
        }
    }

    private static void circle(GeoFeatures features, Track track, ArcHistory arc, RadiusAt radius, Geolocation where)
            throws IOException {
        List<Point> around = new ArrayList<>();
        for (int i = 0; i <= SIDES; i++) {
            around.add(arc.centreAt(radius.timeMs()).plus(Point.towards(360.0 * (i % SIDES) / SIDES)
                    .times(radius.radiusKm())));
        }
        GeoLines lines = new GeoLines();
        lines.add(where.line(around));
        features.add(track.id() + "/arc/" + radius.sweep(), json -> GeoGeometry.lines(json, lines), json -> {
            json.writeStringField("track_id", track.id());
            json.writeStringField("what", "arc");
            json.writeNumberField("sweep", radius.sweep());
            json.writeStringField("time_utc", Times.iso(radius.timeMs()));
            GeoFeatures.number(json, "radius_km", radius.radiusKm(), 2);
            GeoFeatures.number(json, "radius_sd_km", radius.sdKm(), 2);
            expansion(json, arc);
        });
    }

    private static void centre(GeoFeatures features, Track track, ArcHistory arc, Geolocation where)
            throws IOException {
        List<Point> way = arc.radii().stream().map(r -> arc.centreAt(r.timeMs())).toList();
        GeoLines lines = new GeoLines();
        lines.add(where.line(way));
        features.add(track.id() + "/centre", json -> GeoGeometry.lines(json, lines), json -> {
            json.writeStringField("track_id", track.id());
            json.writeStringField("what", "centre");
            json.writeStringField("time_utc", Times.iso(arc.referenceMs()));
            GeoFeatures.number(json, "centre_sd_km", arc.centreSdKm(), 2);
            GeoFeatures.number(json, "drift_east_ms", arc.driftEastMs(), 2);
            GeoFeatures.number(json, "drift_north_ms", arc.driftNorthMs(), 2);
            expansion(json, arc);
        });
    }

    private static void expansion(JsonGenerator json, ArcHistory arc) throws IOException {
        GeoFeatures.number(json, "expansion_ms", arc.expansion().speedMs(), 2);
        GeoFeatures.number(json, "expansion_sd_ms", arc.expansion().sdMs(), 2);
    }
}
