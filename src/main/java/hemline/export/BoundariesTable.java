package hemline.export;

import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** {@code boundaries.csv}: one row a vertex. */
final class BoundariesTable {
    static final Table<Row> TABLE = new Table<>("boundaries",
            "One row per vertex of a boundary in one sweep; the vertices of a stretch follow each other along it, at "
            + "most 1 km apart.", List.of(
            Column.text("track_id", "The boundary, see tracks.csv.", r -> r.track),
            Column.time("time_utc", "Time of the ray that saw the vertex.", r -> r.vertex().timeMs()),
            Column.integer("vertex", "Place of the vertex along its stretch; 0 begins a new stretch.", r -> r.index),
            Column.number("x_km", "km", 3, "East of the radar, azimuthal equidistant plane.", r -> r.place().xKm()),
            Column.number("y_km", "km", 3, "North of the radar, azimuthal equidistant plane.", r -> r.place().yKm()),
            Column.number("latitude", "degree_north", 6, "WGS 84; empty when the radar's position is unknown.",
                    r -> r.geo.map(GeoPoint::latitudeDeg).orElse(Double.NaN)),
            Column.number("longitude", "degree_east", 6, "WGS 84; empty when the radar's position is unknown.",
                    r -> r.geo.map(GeoPoint::longitudeDeg).orElse(Double.NaN)),
            Column.number("beam_height_m", "m", 0, "Beam centre above mean sea level, 4/3 effective earth radius.",
                    r -> r.vertex().beamHeightM()),
            Column.number("reflectivity_dbz", "dBZ", 1, "On the line; empty where not measured or below detection.",
                    r -> r.vertex().reflectivityDbz()),
            Column.number("normal_bearing_deg", "degree", 1,
                    "Compass bearing moved toward, clockwise from north; empty when unknown.",
                    r -> r.vertex().normalBearingDeg()),
            Column.number("speed_ms", "m s-1", 2, "Speed along that bearing, relative to the ground.",
                    r -> r.vertex().speed().speedMs()),
            Column.number("speed_sd_ms", "m s-1", 2, "Standard deviation of the speed.", r -> r.vertex().speed().sdMs()),
            Column.text("kind", "thin-line: a line brighter than both sides; arc: the rim of clearer air.",
                    r -> r.piece.kind().label()),
            Column.text("origin", "auto: found; hand: drawn or corrected by an analyst.", r -> r.piece.origin().label()),
            Column.integer("sweep", "The sweep, 0 the earliest of the loop.", r -> r.piece.sweep()),
            Column.integer("stretch", "Stretch of the boundary within the sweep; between stretches is a gap.",
                    r -> r.stretch),
            Column.flag("seen", "true where this sweep shows it; false where it was filled in from sweeps around it.",
                    r -> r.vertex().seen())));

    private BoundariesTable() {
    }

    /**
     * @param stretch place of the piece among those of its track in its sweep
     * @param index   place of the vertex in its piece
     */
    record Row(String track, TrackPiece piece, int stretch, int index, Optional<GeoPoint> geo) {
        TrackVertex vertex() {
            return piece.vertices().get(index);
        }

        Point place() {
            return vertex().position();
        }
    }

    static List<Row> rows(List<Track> tracks, Geolocation where) {
        List<Row> rows = new ArrayList<>();
        for (Track track : tracks) {
            for (Map.Entry<Integer, List<TrackPiece>> sweep : track.bySweep().entrySet()) {
                int stretch = 0;
                for (TrackPiece piece : sweep.getValue()) {
                    for (int i = 0; i < piece.vertices().size(); i++) {
                        rows.add(new Row(track.id(), piece, stretch, i, where.of(piece.vertices().get(i).position())));
                    }
                    stretch++;
                }
            }
        }
        return rows;
    }
}
