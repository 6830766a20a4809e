package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.GeoPoint;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.io.OutputStream;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * {@code boundaries.geojson}: one feature per boundary and sweep, the isochrones of its passage. WGS 84, longitude
 * first, cut at the antimeridian; without the radar's position features have no geometry (RFC 7946 section 3.2).
 */
final class BoundariesGeoJson {
    private BoundariesGeoJson() {
    }

    static void write(OutputStream out, Analysis analysis, Geolocation where) throws IOException {
        try (JsonGenerator json = Json.compact(out)) {
            json.writeStartObject();
            json.writeStringField("type", "FeatureCollection");
            json.writeArrayFieldStart("features");
            for (Track track : analysis.tracks()) {
                for (Map.Entry<Integer, List<TrackPiece>> sweep : track.bySweep().entrySet()) {
                    json.writeRaw('\n');
                    feature(json, track, sweep.getKey(), sweep.getValue(), where);
                }
            }
            json.writeRaw('\n');
            json.writeEndArray();
            json.writeEndObject();
            json.writeRaw('\n');
        }
    }

    private static void feature(JsonGenerator json, Track track, int sweep, List<TrackPiece> pieces, Geolocation where)
            throws IOException {
        GeoLines lines = new GeoLines();
        for (TrackPiece piece : pieces) {
            List<GeoPoint> line = new ArrayList<>();
            for (TrackVertex vertex : piece.vertices()) {
                Optional<GeoPoint> place = where.of(vertex.position());
                place.ifPresent(line::add);
            }
            lines.add(line);
        }
        json.writeStartObject();
        json.writeStringField("type", "Feature");
        json.writeStringField("id", track.id() + "/" + sweep);
        GeoGeometry.lines(json, lines);
        json.writeObjectFieldStart("properties");
        properties(json, track, sweep, pieces);
        json.writeEndObject();
        json.writeEndObject();
    }

    private static void properties(JsonGenerator json, Track track, int sweep, List<TrackPiece> pieces)
            throws IOException {
        json.writeStringField("track_id", track.id());
        json.writeNumberField("sweep", sweep);
        json.writeStringField("time_utc", Times.iso(meanTimeMs(pieces)));
        json.writeStringField("kind", pieces.get(0).kind().label());
        json.writeStringField("origin", TracksTable.originOf(track).label());
        number(json, "length_km", pieces.stream().mapToDouble(p -> p.line().lengthKm()).sum(), 2);
        Speed speed = track.speed();
        number(json, "track_speed_ms", speed.speedMs(), 2);
        number(json, "track_speed_sd_ms", speed.sdMs(), 2);
        number(json, "track_bearing_deg", track.bearingDeg(), 1);
    }

    private static long meanTimeMs(List<TrackPiece> pieces) {
        long first = pieces.get(0).vertices().get(0).timeMs();
        return first + Math.round(pieces.stream().flatMap(p -> p.vertices().stream())
                .mapToDouble(v -> v.timeMs() - first).average().orElseThrow());
    }

    private static void number(JsonGenerator json, String name, double value, int decimals) throws IOException {
        json.writeFieldName(name);
        if (Double.isFinite(value)) {
            json.writeRawValue(Numbers.fixed(value, decimals));
        } else {
            json.writeNull();
        }
    }
}
