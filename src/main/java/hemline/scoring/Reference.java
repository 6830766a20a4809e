package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthArc;
import hemline.boundary.truth.Truth.TruthBoundary;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthMeeting;
import hemline.boundary.truth.Truth.TruthSweep;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * One run or hand case taken as the truth for another: all of it has to be found (detectability 1), its observed
 * meetings too.
 *
 * <p>Vertices whose speed is not known get a speed of NaN, and speeds are not compared there.
 */
public final class Reference {
    /** Stretches of two runs with less than this between them can be of one sweep. */
    private static final long SAME_SWEEP_MS = 30_000;

    private Reference() {
    }

    /** The reference when the sweeps of the loop are known. */
    public static Truth of(List<Track> tracks, List<Meeting> meetings, List<SweepFrame> frames) {
        List<TruthSweep> sweeps = new ArrayList<>();
        for (SweepFrame frame : frames) {
            long start = Long.MAX_VALUE;
            long end = Long.MIN_VALUE;
            for (int ray = 0; ray < frame.rays().rays(); ray++) {
                start = Math.min(start, frame.rays().timeMs(ray));
                end = Math.max(end, frame.rays().timeMs(ray));
            }
            sweeps.add(new TruthSweep(frame.index(), start, end));
        }
        return of(tracks, meetings, new TruthClock(sweeps), sweeps);
    }

    /**
     * The reference when only tables are at hand: the sweeps are told from the times of the lines of both runs, so a
     * sweep in which neither has a line is not counted.
     *
     * @throws IllegalArgumentException when neither has a line
     */
    public static Truth of(RunTables reference, RunTables other) {
        List<Span> spans = new ArrayList<>(spans(reference.tracks(), 0));
        spans.addAll(spans(other.tracks(), 1));
        if (spans.isEmpty()) {
            throw new IllegalArgumentException("two runs can be compared only where one has a line, both have none");
        }
        spans.sort(Comparator.comparingLong(Span::startMs).thenComparingInt(Span::run));
        List<TruthSweep> sweeps = new ArrayList<>();
        TreeSet<Integer> runs = new TreeSet<>();
        for (Span span : spans) {
            TruthSweep last = sweeps.isEmpty() ? null : sweeps.get(sweeps.size() - 1);
            if (last == null || span.startMs - last.endMs() >= SAME_SWEEP_MS || runs.contains(span.run)) {
                sweeps.add(new TruthSweep(sweeps.size(), span.startMs, span.endMs));
                runs.clear();
            } else {
                sweeps.set(sweeps.size() - 1,
                        new TruthSweep(last.index(), last.startMs(), Math.max(last.endMs(), span.endMs)));
            }
            runs.add(span.run);
        }
        return of(reference.tracks(), reference.meetings(), new TruthClock(sweeps), sweeps);
    }

    private static List<Span> spans(List<Track> tracks, int run) {
        SortedMap<Integer, Span> bySweep = new TreeMap<>();
        for (Track track : tracks) {
            for (TrackPiece piece : track.pieces()) {
                for (TrackVertex vertex : piece.vertices()) {
                    bySweep.merge(piece.sweep(), new Span(run, vertex.timeMs(), vertex.timeMs()), Span::and);
                }
            }
        }
        return List.copyOf(bySweep.values());
    }

    private static Truth of(List<Track> tracks, List<Meeting> meetings, TruthClock clock, List<TruthSweep> sweeps) {
        List<TruthBoundary> boundaries = new ArrayList<>();
        for (Track track : tracks) {
            List<TruthLine> lines = new ArrayList<>();
            List<TruthArc> arcs = new ArrayList<>();
            TreeSet<Integer> seenIn = new TreeSet<>();
            for (TrackPiece piece : track.pieces()) {
                TruthSweep sweep = sweeps.get(clock.nearest(piece.meanTimeMs()));
                lines.add(new TruthLine(sweep.index(), piece.vertices().stream().map(Reference::vertex).toList()));
                if (track.arc().isPresent() && track.arc().get().expansion().isKnown() && seenIn.add(sweep.index())) {
                    arcs.add(arc(track, piece, sweep.index()));
                }
            }
            boundaries.add(new TruthBoundary(track.id(), "both", true, lines, arcs));
        }
        return new Truth("comparison", 0, sweeps, boundaries, List.of(), meetings.stream()
                .filter(m -> m.status() == Meeting.Status.OBSERVED).map(Reference::meeting).toList());
    }

    private static TruthVertex vertex(TrackVertex v) {
        return new TruthVertex(v.position().xKm(), v.position().yKm(), v.timeMs(), 1, v.reflectivityDbz(),
                v.normalBearingDeg(), v.speed().speedMs());
    }

    /** The reference states one mean growth; the radius between its first and last is not needed to compare it. */
    private static TruthArc arc(Track track, TrackPiece piece, int sweep) {
        return new TruthArc(sweep, piece.meanTimeMs(), track.arc().get().centreAt(piece.meanTimeMs()).xKm(),
                track.arc().get().centreAt(piece.meanTimeMs()).yKm(), track.arc().get().radii().get(0).radiusKm(),
                track.arc().get().expansion().speedMs());
    }

    private static TruthMeeting meeting(Meeting m) {
        return new TruthMeeting(m.trackA(), m.trackB(), m.timeMs(), m.place().xKm(), m.place().yKm(),
                m.crossingAngleDeg(), m.closing().speedMs(), true);
    }

    private record Span(int run, long startMs, long endMs) {
        Span and(Span other) {
            return new Span(run, Math.min(startMs, other.startMs), Math.max(endMs, other.endMs));
        }
    }
}
