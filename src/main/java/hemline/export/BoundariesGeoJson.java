package hemline.export;

import com.fasterxml.jackson.core.JsonGenerator;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.Map;

/**
 * {@code boundaries.geojson}: one feature per boundary and sweep, the isochrones of its passage. WGS 84, longitude
 * first, cut at the antimeridian; without the radar's position features have no geometry (RFC 7946 section 3.2).
 */
final class BoundariesGeoJson {
    private BoundariesGeoJson() {
    }

    static void write(OutputStream out, Analysis analysis, Geolocation where) throws IOException {
        try (GeoFeatures features = new GeoFeatures(out)) {
            for (Track track : analysis.tracks()) {
                for (Map.Entry<Integer, List<TrackPiece>> sweep : track.bySweep().entrySet()) {
                    GeoLines lines = new GeoLines();
                    sweep.getValue().forEach(piece -> lines.add(where.line(piece.points())));
                    features.add(track.id() + "/" + sweep.getKey(), json -> GeoGeometry.lines(json, lines),
                            json -> properties(json, track, sweep.getKey(), sweep.getValue()));
                }
            }
        }
    }

    private static void properties(JsonGenerator json, Track track, int sweep, List<TrackPiece> pieces)
            throws IOException {
        json.writeStringField("track_id", track.id());
        json.writeNumberField("sweep", sweep);
        json.writeStringField("time_utc", Times.iso(meanTimeMs(pieces)));
        json.writeStringField("kind", pieces.get(0).kind().label());
        json.writeStringField("origin", TracksTable.originOf(track).label());
        GeoFeatures.number(json, "length_km", pieces.stream().mapToDouble(p -> p.line().lengthKm()).sum(), 2);
        Speed speed = track.speed();
        GeoFeatures.number(json, "track_speed_ms", speed.speedMs(), 2);
        GeoFeatures.number(json, "track_speed_sd_ms", speed.sdMs(), 2);
        GeoFeatures.number(json, "track_bearing_deg", track.bearingDeg(), 1);
    }

    private static long meanTimeMs(List<TrackPiece> pieces) {
        long first = pieces.get(0).vertices().get(0).timeMs();
        return first + Math.round(pieces.stream().flatMap(p -> p.vertices().stream())
                .mapToDouble(v -> v.timeMs() - first).average().orElseThrow());
    }
}
