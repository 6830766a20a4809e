package hemline.export;

import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.IntStream;

/**
 * {@code boundaries.nc}: boundaries, tracks and meetings as CF-1.8 netCDF. Each stretch of a boundary in one sweep is a
 * line of a geometry container (CF conventions 1.8, section 7.5, simple geometries); what belongs to its vertices lies
 * on the node dimension. Without the radar's position the nodes are those of the plane only.
 */
final class BoundariesNetcdf {
    private static final double FILL = 9.969209968386869e36;

    private final RunRecord run;
    private final Geolocation where;
    private final List<TrackPiece> lines = new ArrayList<>();
    private final List<Integer> trackOfLine = new ArrayList<>();
    private final List<TrackVertex> vertices = new ArrayList<>();

    private BoundariesNetcdf(RunRecord run, Geolocation where) {
        this.run = run;
        this.where = where;
        List<Track> tracks = run.analysis().tracks();
        for (int i = 0; i < tracks.size(); i++) {
            for (Map.Entry<Integer, List<TrackPiece>> sweep : tracks.get(i).bySweep().entrySet()) {
                for (TrackPiece piece : sweep.getValue()) {
                    lines.add(piece);
                    trackOfLine.add(i);
                    vertices.addAll(piece.vertices());
                }
            }
        }
    }

    /** Writes the file; one without tracks has no lines, one without meetings no meeting variables. */
    static void write(Path file, RunRecord run, Geolocation where) throws IOException {
        new BoundariesNetcdf(run, where).file().writeTo(file);
    }

    private NetcdfOut file() {
        NetcdfOut out = new NetcdfOut()
                .global("Conventions", "CF-1.8").global("title", "Convective outflow boundaries")
                .global("source", "hemline " + run.version() + " from weather-radar sweeps of "
                        + run.analysis().site().name())
                .global("comment", Cautions.GUIDANCE);
        plane(out, run.analysis().site());
        if (!lines.isEmpty()) {
            lines(out);
            vertices(out);
            tracks(out, run.analysis().tracks());
        }
        if (!run.analysis().meetings().isEmpty()) {
            meetings(out, run.analysis().meetings());
        }
        return out;
    }

    private static void plane(NetcdfOut out, RadarSite site) {
        Optional<GeoPoint> place = site.position();
        if (place.isPresent()) {
            out.container("plane", "grid_mapping_name", "azimuthal_equidistant",
                    "latitude_of_projection_origin", place.get().latitudeDeg(),
                    "longitude_of_projection_origin", place.get().longitudeDeg(), "false_easting", 0.0,
                    "false_northing", 0.0, "semi_major_axis", 6378137.0, "inverse_flattening", 298.257223563);
        } else {
            out.container("plane", "long_name", "plane of the radar, whose position is not known");
        }
    }

    private void lines(NetcdfOut out) {
        out.dimension("line", lines.size()).dimension("vertex", vertices.size());
        out.container("line_geometry", "geometry_type", "line", "node_count", "vertex_count",
                "node_coordinates", where.known() ? "lon lat" : "x y", "grid_mapping", "plane");
        out.ints("vertex_count", "line", lines.stream().mapToInt(p -> p.vertices().size()).toArray(),
                "long_name", "number of vertices of the line");
        onLine(out, "line_time", "time", "seconds since 1970-01-01 00:00:00 UTC",
                p -> p.meanTimeMs() / 1000.0, "mean time of the rays that saw it");
        out.ints("line_sweep", "line", lines.stream().mapToInt(TrackPiece::sweep).toArray(),
                "long_name", "index of the sweep in the loop", "geometry", "line_geometry");
        out.ints("line_track", "line", trackOfLine.stream().mapToInt(i -> i).toArray(),
                "long_name", "index of its track along the track dimension", "geometry", "line_geometry");
        byte[] kinds = flags(p -> p.kind() == BoundaryKind.ARC);
        out.bytes("line_kind", "line", kinds, "long_name", "how the boundary shows", "flag_values",
                new byte[] {0, 1}, "flag_meanings", "thin-line arc", "geometry", "line_geometry");
        out.bytes("line_origin", "line", flags(p -> p.origin() == Origin.HAND), "long_name", "who put it there",
                "flag_values", new byte[] {0, 1}, "flag_meanings", "auto hand", "geometry", "line_geometry");
    }

    private byte[] flags(java.util.function.Predicate<TrackPiece> set) {
        byte[] flags = new byte[lines.size()];
        IntStream.range(0, flags.length).forEach(i -> flags[i] = (byte) (set.test(lines.get(i)) ? 1 : 0));
        return flags;
    }

    private void onLine(NetcdfOut out, String name, String standardName, String units,
                        ToDoubleFunction<TrackPiece> value, String longName) {
        out.doubles(name, "line", lines.stream().mapToDouble(value).toArray(), "standard_name", standardName,
                "long_name", longName, "units", units, "calendar", "standard", "geometry", "line_geometry");
    }

    private void vertices(NetcdfOut out) {
        onVertex(out, "x", v -> v.position().xKm(), "standard_name", "projection_x_coordinate", "units", "km",
                "axis", "X", "long_name", "east of the radar");
        onVertex(out, "y", v -> v.position().yKm(), "standard_name", "projection_y_coordinate", "units", "km",
                "axis", "Y", "long_name", "north of the radar");
        if (where.known()) {
            List<GeoPoint> places = vertices.stream().map(v -> where.of(v.position()).orElseThrow()).toList();
            out.doubles("lat", "vertex", places.stream().mapToDouble(GeoPoint::latitudeDeg).toArray(),
                    "standard_name", "latitude", "units", "degrees_north", "axis", "Y");
            out.doubles("lon", "vertex", places.stream().mapToDouble(GeoPoint::longitudeDeg).toArray(),
                    "standard_name", "longitude", "units", "degrees_east", "axis", "X");
        }
        onVertex(out, "time", v -> v.timeMs() / 1000.0, "standard_name", "time",
                "units", "seconds since 1970-01-01 00:00:00 UTC", "calendar", "standard",
                "long_name", "time of the ray that saw the vertex");
        onVertex(out, "beam_height", TrackVertex::beamHeightM, "standard_name", "altitude", "units", "m",
                "positive", "up", "long_name", "beam centre above mean sea level");
        onVertex(out, "reflectivity", TrackVertex::reflectivityDbz, "standard_name",
                "equivalent_reflectivity_factor", "units", "dBZ");
        onVertex(out, "normal_bearing", TrackVertex::normalBearingDeg, "units", "degree",
                "long_name", "compass bearing moved toward, clockwise from north");
        onVertex(out, "speed", v -> v.speed().speedMs(), "units", "m s-1", "long_name", "speed along normal_bearing",
                "ancillary_variables", "speed_sd");
        onVertex(out, "speed_sd", v -> v.speed().sdMs(), "units", "m s-1",
                "long_name", "standard deviation of speed");
    }

    private void onVertex(NetcdfOut out, String name, ToDoubleFunction<TrackVertex> value, Object... attributes) {
        out.doubles(name, "vertex", filled(vertices.stream().mapToDouble(value).toArray()), withFill(attributes));
    }

    private static void tracks(NetcdfOut out, List<Track> tracks) {
        out.dimension("track", tracks.size());
        out.words("track_id", "track", tracks.stream().map(Track::id).toList(), "long_name", "name of the track");
        onTrack(out, tracks, "track_speed", t -> t.speed().speedMs(), "m s-1", "speed of the track as a whole");
        onTrack(out, tracks, "track_speed_sd", t -> t.speed().sdMs(), "m s-1", "standard deviation of track_speed");
        onTrack(out, tracks, "track_bearing", Track::bearingDeg, "degree", "compass bearing moved toward as a whole");
        onTrack(out, tracks, "arc_centre_x", t -> arc(t, a -> a.centre().xKm()), "km", "centre of the arc, east");
        onTrack(out, tracks, "arc_centre_y", t -> arc(t, a -> a.centre().yKm()), "km", "centre of the arc, north");
        onTrack(out, tracks, "arc_expansion", t -> arc(t, a -> a.expansion().speedMs()), "m s-1",
                "mean rate of growth of the radius");
        onTrack(out, tracks, "arc_expansion_sd", t -> arc(t, a -> a.expansion().sdMs()), "m s-1",
                "standard deviation of arc_expansion");
    }

    private static double arc(Track track, ToDoubleFunction<ArcHistory> value) {
        return track.arc().isPresent() ? value.applyAsDouble(track.arc().get()) : Double.NaN;
    }

    private static void onTrack(NetcdfOut out, List<Track> tracks, String name, ToDoubleFunction<Track> value,
                                String units, String longName) {
        out.doubles(name, "track", filled(tracks.stream().mapToDouble(value).toArray()),
                withFill("units", units, "long_name", longName));
    }

    private static void meetings(NetcdfOut out, List<Meeting> meetings) {
        out.dimension("meeting", meetings.size());
        out.words("meeting_id", "meeting", meetings.stream().map(Meeting::id).toList());
        out.words("meeting_track_a", "meeting", meetings.stream().map(Meeting::trackA).toList());
        out.words("meeting_track_b", "meeting", meetings.stream().map(Meeting::trackB).toList());
        onMeeting(out, meetings, "meeting_time", m -> m.timeMs() / 1000.0, "seconds since 1970-01-01 00:00:00 UTC",
                "time of first contact");
        onMeeting(out, meetings, "meeting_x", m -> m.place().xKm(), "km", "place of first contact, east");
        onMeeting(out, meetings, "meeting_y", m -> m.place().yKm(), "km", "place of first contact, north");
        onMeeting(out, meetings, "crossing_angle", Meeting::crossingAngleDeg, "degree", "angle between the lines");
        onMeeting(out, meetings, "closing_speed", m -> m.closing().speedMs(), "m s-1", "speed at which the gap closed");
        onMeeting(out, meetings, "meeting_probability", Meeting::probability, "1", "that they meet");
    }

    private static void onMeeting(NetcdfOut out, List<Meeting> meetings, String name, ToDoubleFunction<Meeting> value,
                                  String units, String longName) {
        out.doubles(name, "meeting", filled(meetings.stream().mapToDouble(value).toArray()),
                withFill("units", units, "long_name", longName));
    }

    private static double[] filled(double[] values) {
        for (int i = 0; i < values.length; i++) {
            values[i] = Double.isFinite(values[i]) ? values[i] : FILL;
        }
        return values;
    }

    private static Object[] withFill(Object... attributes) {
        List<Object> all = new ArrayList<>(List.of(attributes));
        all.add("_FillValue");
        all.add(FILL);
        return all.toArray();
    }
}
