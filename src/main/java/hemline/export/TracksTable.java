package hemline.export;

import hemline.boundary.ArcHistory;
import hemline.boundary.ArcHistory.RadiusAt;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** {@code tracks.csv}: one row a boundary. */
final class TracksTable {
    static final Table<Track> TABLE = new Table<>("tracks", "One row per boundary followed through the loop.", List.of(
            Column.text("track_id", "Name of the boundary within this run.", Track::id),
            Column.time("first_utc", "Time of its earliest vertex.", Track::firstMs),
            Column.time("last_utc", "Time of its latest vertex.", Track::lastMs),
            Column.integer("sweeps", "Number of sweeps in which it is present.", Track::sweepCount),
            Column.number("max_length_km", "km", 2, "Length in the sweep that shows most of it.", Track::maxLengthKm),
            Column.number("speed_ms", "m s-1", 2, "Speed of the boundary as a whole, relative to the ground.",
                    t -> t.speed().speedMs()),
            Column.number("speed_sd_ms", "m s-1", 2, "Standard deviation of the speed.", t -> t.speed().sdMs()),
            Column.number("bearing_deg", "degree", 1, "Compass bearing moved toward as a whole.", Track::bearingDeg),
            arc("centre_x_km", "km", 2, "Centre of the fitted arc at centre_utc, east of the radar.",
                    a -> a.centre().xKm()),
            arc("centre_y_km", "km", 2, "Centre of the fitted arc at centre_utc, north of the radar.",
                    a -> a.centre().yKm()),
            arc("first_radius_km", "km", 2, "Radius of the fitted arc when first seen.", a -> first(a).radiusKm()),
            arc("last_radius_km", "km", 2, "Radius of the fitted arc when last seen.", a -> last(a).radiusKm()),
            arc("expansion_ms", "m s-1", 2, "Mean rate of growth of the radius.", a -> a.expansion().speedMs()),
            arc("expansion_sd_ms", "m s-1", 2, "Standard deviation of the rate of growth.", a -> a.expansion().sdMs()),
            new Column<>("centre_utc", Column.Type.TIME, "", "Time at which the arc's centre is given.",
                    t -> t.arc().map(a -> Times.iso(a.referenceMs())).orElse("")),
            arc("centre_sd_km", "km", 2, "Standard deviation of the centre along its worse axis.",
                    ArcHistory::centreSdKm),
            arc("first_radius_sd_km", "km", 2, "Standard deviation of first_radius_km.", a -> first(a).sdKm()),
            arc("last_radius_sd_km", "km", 2, "Standard deviation of last_radius_km.", a -> last(a).sdKm()),
            arc("drift_east_ms", "m s-1", 2, "Motion of the arc's centre toward the east.", ArcHistory::driftEastMs),
            arc("drift_north_ms", "m s-1", 2, "Motion of the arc's centre toward the north.", ArcHistory::driftNorthMs),
            arc("drift_sd_ms", "m s-1", 2, "Standard deviation of either drift.", ArcHistory::driftSdMs),
            arc("coverage_deg", "degree", 0, "Angle about the centre that was seen.", ArcHistory::coverageDeg),
            arc("arc_rms_km", "km", 2, "Root mean square distance of the vertices from the fitted arcs.",
                    ArcHistory::rmsKm),
            Column.text("arc_refusal", "Why no arc is given; empty when one is.", Track::arcRefusal),
            Column.number("arc_share", "1", 2, "Share of the vertices whose kind is arc, 0 to 1.", TracksTable::arcShare),
            Column.text("origin", "auto: found; hand: any part of it drawn or corrected by an analyst.",
                    t -> originOf(t).label()),
            Column.number("score", "1", 2, "What the decision to keep it rested on, larger is surer.", Track::score)));

    private TracksTable() {
    }

    private static Column<Track> arc(String name, String unit, int decimals, String meaning,
                                     ToDoubleFunction<ArcHistory> value) {
        return Column.number(name, unit, decimals, meaning,
                t -> t.arc().isPresent() ? value.applyAsDouble(t.arc().get()) : Double.NaN);
    }

    private static RadiusAt first(ArcHistory arc) {
        return arc.radii().get(0);
    }

    private static RadiusAt last(ArcHistory arc) {
        return arc.radii().get(arc.radii().size() - 1);
    }

    private static double arcShare(Track track) {
        int arcs = track.pieces().stream().filter(p -> p.kind() == BoundaryKind.ARC)
                .mapToInt(p -> p.vertices().size()).sum();
        return (double) arcs / track.pieces().stream().mapToInt(p -> p.vertices().size()).sum();
    }

    static Origin originOf(Track track) {
        return track.pieces().stream().map(TrackPiece::origin).anyMatch(o -> o == Origin.HAND)
                ? Origin.HAND : Origin.AUTO;
    }
}
