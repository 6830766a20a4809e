package hemline.casefile.store;

import com.fasterxml.jackson.annotation.JsonPropertyOrder;
import com.fasterxml.jackson.core.JsonProcessingException;
import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.casefile.edit.Found;
import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * What a run found, as four files of text with one JSON object a line. The sweeps' rays are among them, so that a
 * case can be corrected and measured where its sources are not at hand.
 */
final class FoundText {
    static final String RUN = "found/run.jsonl";
    static final String SWEEPS = "found/sweeps.jsonl";
    static final String TRACKS = "found/tracks.jsonl";
    static final String MEETINGS = "found/meetings.jsonl";
    static final List<String> NAMES = List.of(RUN, SWEEPS, TRACKS, MEETINGS);

    private FoundText() {
    }

    /** Each file's content by its name, in the order of {@link #NAMES}. */
    static Map<String, byte[]> write(Found found) {
        Map<String, byte[]> files = new LinkedHashMap<>();
        RadarSite site = found.site();
        files.put(RUN, lines(List.of(
                new RunLine(site.name(), site.position(), site.altitudeM(), found.cautions()))));
        files.put(SWEEPS, lines(found.frames().stream().map(SweepLine::of).toList()));
        List<Object> tracks = new ArrayList<>();
        for (Track track : found.tracks()) {
            tracks.add(TrackLine.of(track));
            track.pieces().forEach(piece -> tracks.add(StretchLine.of(piece)));
        }
        files.put(TRACKS, lines(tracks));
        files.put(MEETINGS, lines(found.meetings()));
        return files;
    }

    /** @param files content by name, as {@link #write} gives it */
    static Found read(Path folder, Map<String, byte[]> files) throws CaseFileException {
        LineReader run = new LineReader(folder.resolve(RUN), files.get(RUN));
        RunLine head = run.next(RunLine.class);
        LineReader sweeps = new LineReader(folder.resolve(SWEEPS), files.get(SWEEPS));
        List<SweepFrame> frames = new ArrayList<>();
        while (sweeps.more()) {
            frames.add(sweeps.make(sweeps.next(SweepLine.class), SweepLine::toFrame));
        }
        LineReader lines = new LineReader(folder.resolve(TRACKS), files.get(TRACKS));
        List<Track> tracks = new ArrayList<>();
        while (lines.more()) {
            TrackLine track = lines.next(TrackLine.class);
            List<TrackPiece> pieces = new ArrayList<>();
            for (int i = 0; i < track.stretches(); i++) {
                pieces.add(lines.make(lines.next(StretchLine.class), StretchLine::toPiece));
            }
            tracks.add(lines.make(track, line -> line.toTrack(pieces)));
        }
        LineReader meetingLines = new LineReader(folder.resolve(MEETINGS), files.get(MEETINGS));
        List<Meeting> meetings = new ArrayList<>();
        while (meetingLines.more()) {
            meetings.add(meetingLines.next(Meeting.class));
        }
        return lines.make(head, line -> new Found(line.toSite(), frames, tracks, meetings, line.cautions()));
    }

    private static byte[] lines(List<?> objects) {
        StringBuilder text = new StringBuilder();
        try {
            for (Object object : objects) {
                text.append(CaseJson.MAPPER.writeValueAsString(object)).append('\n');
            }
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a result could not be put into JSON", e);
        }
        return text.toString().getBytes(StandardCharsets.UTF_8);
    }

    @JsonPropertyOrder({"radar", "position", "altitudeM", "cautions"})
    private record RunLine(String radar, Optional<GeoPoint> position, double altitudeM, List<String> cautions) {
        RadarSite toSite() {
            return new RadarSite(radar, position, altitudeM);
        }
    }

    /** Times of rays are kept as ms after the first ray's, which may be negative. */
    @JsonPropertyOrder({"index", "beam", "firstRayMs", "azimuthDeg", "elevationDeg", "afterFirstMs"})
    private record SweepLine(int index, BeamGeometry beam, long firstRayMs, double[] azimuthDeg,
                             double[] elevationDeg, long[] afterFirstMs) {
        static SweepLine of(SweepFrame frame) {
            RayGeometry rays = frame.rays();
            double[] azimuth = new double[rays.rays()];
            double[] elevation = new double[rays.rays()];
            long[] after = new long[rays.rays()];
            for (int i = 0; i < azimuth.length; i++) {
                azimuth[i] = rays.azimuthDeg(i);
                elevation[i] = rays.elevationDeg(i);
                after[i] = rays.timeMs(i) - rays.timeMs(0);
            }
            return new SweepLine(frame.index(), frame.beam(), rays.timeMs(0), azimuth, elevation, after);
        }

        SweepFrame toFrame() {
            long[] times = Arrays.stream(afterFirstMs).map(after -> Math.addExact(firstRayMs, after)).toArray();
            return new SweepFrame(index, new RayGeometry(azimuthDeg, elevationDeg, times), beam);
        }
    }

    /** A track without its stretches, which follow on as many lines. */
    @JsonPropertyOrder({"track", "speed", "bearingDeg", "arc", "arcRefusal", "score", "stretches"})
    private record TrackLine(String track, Speed speed, double bearingDeg, Optional<ArcHistory> arc,
                             String arcRefusal, double score, int stretches) {
        static TrackLine of(Track track) {
            return new TrackLine(track.id(), track.speed(), track.bearingDeg(), track.arc(), track.arcRefusal(),
                    track.score(), track.pieces().size());
        }

        Track toTrack(List<TrackPiece> pieces) {
            return new Track(track, pieces, speed, bearingDeg, arc, arcRefusal, score);
        }
    }

    /** Vertices are arrays: [[x, y], time, dBZ, beam height, bearing moved toward, [speed, its sd], seen]. */
    @JsonPropertyOrder({"sweep", "kind", "origin", "vertices"})
    private record StretchLine(int sweep, BoundaryKind kind, Origin origin, List<TrackVertex> vertices) {
        static StretchLine of(TrackPiece piece) {
            return new StretchLine(piece.sweep(), piece.kind(), piece.origin(), piece.vertices());
        }

        TrackPiece toPiece() {
            return new TrackPiece(sweep, kind, origin, vertices);
        }
    }
}
