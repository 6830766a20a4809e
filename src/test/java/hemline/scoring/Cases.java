package hemline.scoring;

import hemline.boundary.ArcHistory;
import hemline.boundary.BoundaryKind;
import hemline.boundary.Meeting;
import hemline.boundary.Origin;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;
import hemline.boundary.truth.Truth.TruthBoundary;
import hemline.boundary.truth.Truth.TruthDecoy;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthMeeting;
import hemline.boundary.truth.Truth.TruthSweep;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Tiny truths and tracks of lines that lie west to east, move north and have a vertex each km. */
final class Cases {
    static final long START_MS = 1_700_000_000_000L;
    static final long STEP_MS = 300_000;
    static final ScoreSettings SETTINGS = ScoreSettings.defaults().withBootstrap(200, 7);

    private Cases() {
    }

    static long timeMs(int sweep) {
        return START_MS + sweep * STEP_MS + 10_000;
    }

    static List<TruthSweep> sweeps(int n) {
        List<TruthSweep> sweeps = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            sweeps.add(new TruthSweep(i, START_MS + i * STEP_MS, START_MS + i * STEP_MS + 20_000));
        }
        return sweeps;
    }

    static Truth truth(int sweeps, TruthBoundary... boundaries) {
        return new Truth("case", 1, sweeps(sweeps), List.of(boundaries), List.of(), List.of());
    }

    static Truth with(Truth truth, List<TruthDecoy> decoys, List<TruthMeeting> meetings) {
        return new Truth(truth.scene(), truth.seed(), truth.sweeps(), truth.boundaries(), decoys, meetings);
    }

    static TruthBoundary boundary(String id, TruthLine... lines) {
        return new TruthBoundary(id, "thin-line", true, List.of(lines), List.of());
    }

    static TruthBoundary withArcs(TruthBoundary boundary, TruthArc... arcs) {
        return new TruthBoundary(boundary.id(), boundary.form(), boundary.outflow(), boundary.lines(), List.of(arcs));
    }

    static TruthLine line(int sweep, int fromX, int toX, double y) {
        return line(sweep, fromX, toX, y, 1, 10);
    }

    static TruthLine line(int sweep, int fromX, int toX, double y, double detectability, double dbz) {
        List<TruthVertex> vertices = new ArrayList<>();
        for (int x = fromX; x <= toX; x++) {
            vertices.add(new TruthVertex(x, y, timeMs(sweep), detectability, dbz, 0, 10));
        }
        return new TruthLine(sweep, vertices);
    }

    static TrackPiece piece(int sweep, int fromX, int toX, double y, double bearingDeg, Speed speed) {
        List<TrackVertex> vertices = new ArrayList<>();
        for (int x = fromX; x <= toX; x++) {
            vertices.add(new TrackVertex(new Point(x, y), timeMs(sweep), 10, 500, bearingDeg, speed, true));
        }
        return new TrackPiece(sweep, BoundaryKind.THIN_LINE, Origin.AUTO, vertices);
    }

    static TrackPiece piece(int sweep, int fromX, int toX, double y) {
        return piece(sweep, fromX, toX, y, Double.NaN, Speed.UNKNOWN);
    }

    static Track track(String id, TrackPiece... pieces) {
        return Track.linked(id, List.of(pieces), 1);
    }

    static Track withExpansion(Track track, Speed expansion) {
        ArcHistory arc = new ArcHistory(new Point(0, 0), 1, START_MS, 0, 0, 1,
                List.of(new ArcHistory.RadiusAt(0, timeMs(0), 10, 1)), expansion, 90, 0.3);
        return new Track(track.id(), track.pieces(), track.speed(), track.bearingDeg(), Optional.of(arc), "",
                track.score());
    }

    static Meeting meeting(String id, double x, double y, long timeMs, double timeSdS) {
        return new Meeting(id, "T1", "T2", timeMs, timeSdS, new Point(x, y), new Meeting.Ellipse(1, 1, 0), 30,
                new Speed(15, 2), Meeting.Status.OBSERVED, 1);
    }

    static TruthMeeting trueMeeting(double x, double y, long timeMs, boolean detectable) {
        return new TruthMeeting("A", "B", timeMs, x, y, 30, 15, detectable);
    }

    static Score score(Truth truth, Track... tracks) {
        return Scoring.score(truth, List.of(tracks), List.of(), SETTINGS);
    }
}
