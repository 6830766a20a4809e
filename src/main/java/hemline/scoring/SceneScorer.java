package hemline.scoring;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth;
import hemline.boundary.truth.Truth.TruthBoundary;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SortedMap;

/** Counts one scene. Use once. */
final class SceneScorer {
    private static final int LONG_TRACK_SWEEPS = 4;

    private final Truth truth;
    private final List<Track> tracks;
    private final ScoreSettings settings;
    private final TruthClock clock;
    private final List<SweepPair> pairs = new ArrayList<>();
    private final List<DecoyMap> decoys = new ArrayList<>();
    private final List<SweepPair.Matches> matches = new ArrayList<>();

    private final double[] totalKm = new double[SceneTally.STRENGTH_CLASSES];
    private final double[] foundKm = new double[SceneTally.STRENGTH_CLASSES];
    private final double[] trackKm;
    private final double[] trackNeitherKm;
    private final double[] trackSpeedKm;
    private final double[][] followedKm;
    private final double[][][] recalledKm;
    private final double[] boundaryKm;
    private double falseKm;
    private final SortedMap<String, Double> falseByCause = new java.util.TreeMap<>();
    private final ErrorSamples.Collector position = new ErrorSamples.Collector();
    private final ErrorSamples.Collector speed = new ErrorSamples.Collector();
    private final ErrorSamples.Collector speedLong = new ErrorSamples.Collector();

    SceneScorer(Truth truth, List<Track> tracks, ScoreSettings settings) {
        this.truth = truth;
        this.tracks = tracks;
        this.settings = settings;
        clock = new TruthClock(truth.sweeps());
        int boundaries = truth.boundaries().size();
        trackKm = new double[tracks.size()];
        trackNeitherKm = new double[tracks.size()];
        trackSpeedKm = new double[tracks.size()];
        followedKm = new double[tracks.size()][boundaries];
        recalledKm = new double[boundaries][truth.sweeps().size()][tracks.size()];
        boundaryKm = new double[boundaries];
    }

    SceneTally tally(List<Meeting> meetings) {
        pairUp();
        matchTwice();
        for (int s = 0; s < pairs.size(); s++) {
            countTruth(s);
            countFound(s);
        }
        ErrorSamples.Collector expansion = new ErrorSamples.Collector();
        ExpansionCheck arcs = new ExpansionCheck(truth, clock);
        List<SceneTally.TrackTally> trackTallies = new ArrayList<>();
        for (int t = 0; t < tracks.size(); t++) {
            trackTallies.add(trackTally(t, arcs, expansion));
        }
        List<SceneTally.BoundaryTally> boundaryTallies = new ArrayList<>();
        for (int b = 0; b < truth.boundaries().size(); b++) {
            boundaryTallies.add(boundaryTally(b));
        }
        return new SceneTally(truth.scene(), truth.seed(), truth.sweeps().size(),
                new SceneTally.Recalled(totalKm, foundKm),
                Arrays.stream(followedKm).flatMapToDouble(Arrays::stream).sum(), Arrays.stream(trackNeitherKm).sum(),
                falseKm, falseByCause,
                truth.decoys().stream().filter(d -> !d.lines().isEmpty()).map(Truth.TruthDecoy::cause).distinct()
                        .sorted().toList(),
                boundaryTallies, trackTallies, MeetingTally.of(meetings, truth.meetings(), settings),
                position.collected(), speed.collected(), speedLong.collected(), expansion.collected(),
                clock.cautions());
    }

    private void pairUp() {
        for (int s = 0; s < truth.sweeps().size(); s++) {
            pairs.add(new SweepPair(settings));
            decoys.add(new DecoyMap(truth.decoys(), truth.sweeps().get(s).index(), settings));
        }
        for (int b = 0; b < truth.boundaries().size(); b++) {
            for (TruthLine line : truth.boundaries().get(b).lines()) {
                pairs.get(clock.placeOf(line.sweep())).addTruth(b, line);
            }
        }
        for (int t = 0; t < tracks.size(); t++) {
            for (TrackPiece piece : tracks.get(t).pieces()) {
                pairs.get(clock.nearest(piece.meanTimeMs())).addFound(t, piece);
            }
        }
        pairs.forEach(SweepPair::close);
    }

    /** First by nearness alone; then, where a line has a choice, by what it mostly follows. */
    private void matchTwice() {
        int[] noTruth = filled(tracks.size());
        int[] noTrack = filled(truth.boundaries().size());
        double[][] follows = new double[tracks.size()][truth.boundaries().size()];
        double[][] foundBy = new double[truth.boundaries().size()][tracks.size()];
        for (SweepPair pair : pairs) {
            SweepPair.Matches first = pair.match(noTruth, noTrack);
            for (int f = 0; f < pair.found.size(); f++) {
                if (first.truthFor()[f] >= 0) {
                    follows[pair.found.owner(f)][pair.truth.owner(first.truthFor()[f])] += pair.found.lengthKm(f);
                }
            }
            for (int t = 0; t < pair.truth.size(); t++) {
                if (first.foundFor()[t] >= 0 && pair.truth.plain(t)) {
                    foundBy[pair.truth.owner(t)][pair.found.owner(first.foundFor()[t])] += pair.truth.lengthKm(t);
                }
            }
        }
        int[] truthOfTrack = Arrays.stream(follows).mapToInt(SceneScorer::largest).toArray();
        int[] trackOfTruth = Arrays.stream(foundBy).mapToInt(SceneScorer::largest).toArray();
        for (SweepPair pair : pairs) {
            matches.add(pair.match(truthOfTrack, trackOfTruth));
        }
    }

    private void countTruth(int s) {
        SweepPair pair = pairs.get(s);
        for (int e = 0; e < pair.truth.size(); e++) {
            if (!pair.truth.plain(e)) {
                continue;
            }
            double km = pair.truth.lengthKm(e);
            int boundary = pair.truth.owner(e);
            List<TruthVertex> vertices = pair.truthLines.get(pair.truth.line(e)).vertices();
            TruthVertex before = vertices.get(pair.truth.segment(e));
            TruthVertex after = vertices.get(pair.truth.segment(e) + 1);
            int strength = SceneTally.strengthClass(
                    before.peakDbz() + pair.truth.share(e) * (after.peakDbz() - before.peakDbz()));
            totalKm[strength] += km;
            boundaryKm[boundary] += km;
            int found = matches.get(s).foundFor()[e];
            if (found >= 0) {
                foundKm[strength] += km;
                recalledKm[boundary][s][pair.found.owner(found)] += km;
            }
        }
    }

    private void countFound(int s) {
        SweepPair pair = pairs.get(s);
        SweepPair.Matches match = matches.get(s);
        for (int e = 0; e < pair.found.size(); e++) {
            double km = pair.found.lengthKm(e);
            int track = pair.found.owner(e);
            trackKm[track] += km;
            if (match.truthFor()[e] >= 0) {
                followedKm[track][pair.truth.owner(match.truthFor()[e])] += km;
                countRight(pair, e, match.truthFor()[e], km);
            } else if (match.nearHidden()[e]) {
                trackNeitherKm[track] += km;
            } else {
                falseKm += km;
                falseByCause.merge(decoys.get(s).causeAt(pair.found.midX(e), pair.found.midY(e)), km, Double::sum);
            }
        }
    }

    private void countRight(SweepPair pair, int e, int truthElement, double km) {
        double x = pair.found.midX(e);
        double y = pair.found.midY(e);
        if (pair.truth.beside(truthElement, x, y)) {
            position.add(pair.truth.distanceKm(truthElement, x, y), Double.NaN, km);
        }
        TrackVertex vertex = pair.pieces.get(pair.found.line(e)).vertices().get(pair.found.nearestVertex(e));
        if (!vertex.speed().isKnown() || Double.isNaN(vertex.normalBearingDeg())) {
            return;
        }
        int track = pair.found.owner(e);
        trackSpeedKm[track] += km;
        double error = speedErrorMs(pair, truthElement, vertex);
        if (!Double.isNaN(error)) {
            speed.add(error, vertex.speed().sdMs(), km);
            if (tracks.get(track).sweepCount() >= LONG_TRACK_SWEEPS) {
                speedLong.add(error, vertex.speed().sdMs(), km);
            }
        }
    }

    /** Found velocity along the true normal less the true normal speed, m s⁻¹; NaN where the truth states no speed. */
    private static double speedErrorMs(SweepPair pair, int truthElement, TrackVertex vertex) {
        List<TruthVertex> vertices = pair.truthLines.get(pair.truth.line(truthElement)).vertices();
        int i = pair.truth.segment(truthElement);
        double share = pair.truth.share(truthElement);
        TruthVertex nearer = vertices.get(share < 0.5 ? i : i + 1);
        Point normal = Point.towards(nearer.normalBearingDeg());
        Point before = velocity(vertices.get(i).normalBearingDeg(), vertices.get(i).speedMs());
        Point after = velocity(vertices.get(i + 1).normalBearingDeg(), vertices.get(i + 1).speedMs());
        double trueMs = before.plus(after.minus(before).times(share)).dot(normal);
        return velocity(vertex.normalBearingDeg(), vertex.speed().speedMs()).dot(normal) - trueMs;
    }

    private static Point velocity(double bearingDeg, double speedMs) {
        return Point.towards(bearingDeg).times(speedMs);
    }

    private SceneTally.TrackTally trackTally(int t, ExpansionCheck arcs, ErrorSamples.Collector expansion) {
        Track track = tracks.get(t);
        int dominant = largest(followedKm[t]);
        double trueExpansion = Double.NaN;
        if (dominant >= 0) {
            boolean[] followed = new boolean[pairs.size()];
            for (int s = 0; s < pairs.size(); s++) {
                followed[s] = recalledKm[dominant][s][t] > 0;
            }
            trueExpansion = arcs.meanExpansionMs(dominant, followed);
        }
        boolean asked = !Double.isNaN(trueExpansion);
        boolean given = asked && track.arc().isPresent() && track.arc().get().expansion().isKnown();
        if (given) {
            expansion.add(track.arc().get().expansion().speedMs() - trueExpansion,
                    track.arc().get().expansion().sdMs(), 1);
        }
        return new SceneTally.TrackTally(track.id(), trackKm[t], Arrays.stream(followedKm[t]).sum(),
                trackNeitherKm[t], dominant < 0 ? "" : truth.boundaries().get(dominant).id(),
                dominant < 0 ? 0 : followedKm[t][dominant], asked, given, trackSpeedKm[t]);
    }

    private SceneTally.BoundaryTally boundaryTally(int b) {
        TruthBoundary boundary = truth.boundaries().get(b);
        double[] byTrack = new double[tracks.size()];
        int switches = 0;
        int links = 0;
        int before = -1;
        for (double[] inSweep : recalledKm[b]) {
            int now = largest(inSweep);
            for (int t = 0; t < byTrack.length; t++) {
                byTrack[t] += inSweep[t];
            }
            if (now >= 0) {
                links += before >= 0 ? 1 : 0;
                switches += before >= 0 && now != before ? 1 : 0;
                before = now;
            }
        }
        int dominant = largest(byTrack);
        return new SceneTally.BoundaryTally(boundary.id(), boundaryKm[b], Arrays.stream(byTrack).sum(),
                dominant < 0 ? "" : tracks.get(dominant).id(), dominant < 0 ? 0 : byTrack[dominant], switches, links);
    }

    private static int[] filled(int size) {
        int[] none = new int[size];
        Arrays.fill(none, -1);
        return none;
    }

    /** Index of the largest value above 0, the first of equals; −1 when all are 0. */
    private static int largest(double[] values) {
        int best = -1;
        for (int i = 0; i < values.length; i++) {
            if (values[i] > 0 && (best < 0 || values[i] > values[best])) {
                best = i;
            }
        }
        return best;
    }
}
