package hemline.scoring;

import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The found and the true lines of one sweep, cut into elements and ready to be asked for each other. */
final class SweepPair {
    final List<TruthLine> truthLines = new ArrayList<>();
    final List<TrackPiece> pieces = new ArrayList<>();
    final LineElements truth;
    final LineElements found;
    private final ScoreSettings settings;
    private ElementGrid truthGrid;
    private ElementGrid foundGrid;

    SweepPair(ScoreSettings settings) {
        this.settings = settings;
        truth = new LineElements(settings.sampleKm());
        found = new LineElements(settings.sampleKm());
    }

    void addTruth(int boundary, TruthLine line) {
        truthLines.add(line);
        truth.add(boundary, values(line.vertices(), TruthVertex::xKm), values(line.vertices(), TruthVertex::yKm),
                values(line.vertices(), TruthVertex::detectability), settings.plainFrom());
    }

    void addFound(int track, TrackPiece piece) {
        pieces.add(piece);
        List<TrackVertex> vertices = piece.vertices();
        found.add(track, values(vertices, v -> v.position().xKm()), values(vertices, v -> v.position().yKm()),
                values(vertices, v -> 1), settings.plainFrom());
    }

    static <T> double[] values(List<T> items, ToDoubleFunction<T> of) {
        return items.stream().mapToDouble(of).toArray();
    }

    /** To be called once all lines are in. */
    void close() {
        truthGrid = new ElementGrid(truth, settings.toleranceKm(), settings.sampleKm());
        foundGrid = new ElementGrid(found, settings.toleranceKm(), settings.sampleKm());
    }

    /**
     * Pairs elements with the nearest of the other side.
     *
     * @param truthOfTrack the true boundary each track is held to follow where it has a choice; −1 for none
     * @param trackOfTruth the track each true boundary is held to be found by where it has a choice; −1 for none
     */
    Matches match(int[] truthOfTrack, int[] trackOfTruth) {
        double leastCos = Math.cos(Math.toRadians(settings.maxAngleDeg())) - 1e-12;
        OwnerHits hits = new OwnerHits();
        int[] truthFor = new int[found.size()];
        boolean[] nearHidden = new boolean[found.size()];
        for (int f = 0; f < found.size(); f++) {
            truthGrid.collect(found.midX(f), found.midY(f), found.tangentX(f), found.tangentY(f), leastCos, hits);
            truthFor[f] = hits.choose(truthOfTrack[found.owner(f)]);
            nearHidden[f] = hits.anyHidden();
        }
        int[] foundFor = new int[truth.size()];
        for (int t = 0; t < truth.size(); t++) {
            foundGrid.collect(truth.midX(t), truth.midY(t), truth.tangentX(t), truth.tangentY(t), leastCos, hits);
            foundFor[t] = hits.choose(trackOfTruth[truth.owner(t)]);
        }
        return new Matches(truthFor, nearHidden, foundFor);
    }

    /**
     * @param truthFor   for each found element the plain element of truth it follows; −1 for none
     * @param nearHidden for each found element whether hidden truth is within reach
     * @param foundFor   for each element of truth the found one that shows it; −1 for none
     */
    record Matches(int[] truthFor, boolean[] nearHidden, int[] foundFor) {
    }
}
