package hemline.scoring;

import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;

/** Tracks rebuilt from {@code boundaries.csv} and {@code tracks.csv}. */
final class TrackTables {
    /** Without a sweep column, stretches whose mean times differ by more than this are of different sweeps. */
    private static final long SWEEP_GAP_MS = 90_000;

    private final List<Stretch> stretches = new ArrayList<>();
    private final Map<String, ArcHistory> arcs = new LinkedHashMap<>();
    private int single;

    /** A stretch begins at vertex 0, and wherever the track, the sweep or the order of vertices breaks. */
    TrackTables(TableFile boundaries) throws InputFileException {
        boundaries.require(List.of("track_id", "time_utc", "vertex", "x_km", "y_km"));
        Stretch current = null;
        double before = 0;
        for (TableFile.Row row : boundaries.rows()) {
            String track = row.text("track_id");
            if (track.isEmpty()) {
                throw row.problem("track_id", "expected a name, found an empty cell", "name the boundary");
            }
            double vertex = row.needed("vertex");
            double sweep = row.number("sweep");
            if (current == null || !current.track.equals(track) || vertex <= before
                    || !(Double.compare(sweep, current.sweep) == 0)) {
                current = new Stretch(track, sweep, kind(row), origin(row), new ArrayList<>());
                stretches.add(current);
            }
            before = vertex;
            current.vertices.add(new TrackVertex(new Point(row.needed("x_km"), row.needed("y_km")),
                    row.timeMs("time_utc"), row.number("reflectivity_dbz"), row.number("beam_height_m"),
                    row.number("normal_bearing_deg"), RunTables.speed(row, "speed_ms", "speed_sd_ms"),
                    !row.text("seen").equals("false")));
        }
        single = (int) stretches.stream().filter(s -> !s.isLine()).count();
        stretches.removeIf(s -> !s.isLine());
    }

    private static BoundaryKind kind(TableFile.Row row) {
        return row.text("kind").equals(BoundaryKind.ARC.label()) ? BoundaryKind.ARC : BoundaryKind.THIN_LINE;
    }

    private static Origin origin(TableFile.Row row) {
        return row.text("origin").equals(Origin.HAND.label()) ? Origin.HAND : Origin.AUTO;
    }

    void addArcs(TableFile table) throws InputFileException {
        table.require(List.of("track_id", "first_utc", "last_utc", "expansion_ms", "expansion_sd_ms"));
        for (TableFile.Row row : table.rows()) {
            Speed expansion = RunTables.speed(row, "expansion_ms", "expansion_sd_ms");
            if (expansion.isKnown()) {
                ArcHistory.RadiusAt first = new ArcHistory.RadiusAt(0, row.timeMs("first_utc"),
                        row.number("first_radius_km"), row.number("first_radius_sd_km"));
                ArcHistory.RadiusAt last = new ArcHistory.RadiusAt(1, row.timeMs("last_utc"),
                        row.number("last_radius_km"), row.number("last_radius_sd_km"));
                arcs.put(row.text("track_id"), new ArcHistory(
                        new Point(row.number("centre_x_km"), row.number("centre_y_km")), row.number("centre_sd_km"),
                        row.text("centre_utc").isEmpty() ? first.timeMs() : row.timeMs("centre_utc"),
                        row.number("drift_east_ms"), row.number("drift_north_ms"), row.number("drift_sd_ms"),
                        List.of(first, last), expansion, row.number("coverage_deg"), row.number("arc_rms_km")));
            }
        }
    }

    List<Track> tracks() {
        Map<Stretch, Integer> sweeps = sweepOf();
        Map<String, List<TrackPiece>> pieces = new LinkedHashMap<>();
        for (Stretch stretch : stretches) {
            pieces.computeIfAbsent(stretch.track, id -> new ArrayList<>()).add(
                    new TrackPiece(sweeps.get(stretch), stretch.kind, stretch.origin, stretch.vertices));
        }
        return pieces.entrySet().stream().map(entry -> new Track(entry.getKey(), entry.getValue(), Speed.UNKNOWN,
                Double.NaN, Optional.ofNullable(arcs.get(entry.getKey())),
                arcs.containsKey(entry.getKey()) ? "" : "not in the table", 0)).collect(Collectors.toList());
    }

    private Map<Stretch, Integer> sweepOf() {
        Map<Stretch, Integer> sweeps = new java.util.IdentityHashMap<>();
        if (stretches.stream().noneMatch(s -> Double.isNaN(s.sweep))) {
            stretches.forEach(s -> sweeps.put(s, (int) s.sweep));
            return sweeps;
        }
        List<Stretch> byTime = new ArrayList<>(stretches);
        byTime.sort(Comparator.comparingLong(Stretch::meanMs));
        int sweep = 0;
        for (int i = 0; i < byTime.size(); i++) {
            sweep += i > 0 && byTime.get(i).meanMs() - byTime.get(i - 1).meanMs() > SWEEP_GAP_MS ? 1 : 0;
            sweeps.put(byTime.get(i), sweep);
        }
        return sweeps;
    }

    List<String> notes() {
        return single == 0 ? List.of() : List.of(single + " stretches of a single place were left out");
    }

    private record Stretch(String track, double sweep, BoundaryKind kind, Origin origin, List<TrackVertex> vertices) {
        boolean isLine() {
            return vertices.stream().map(TrackVertex::position).distinct().count() > 1;
        }

        long meanMs() {
            return Math.round(vertices.stream().mapToDouble(TrackVertex::timeMs).average().orElseThrow());
        }
    }
}
