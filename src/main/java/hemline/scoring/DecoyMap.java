package hemline.scoring;

import hemline.boundary.truth.Truth.TruthDecoy;
import hemline.boundary.truth.Truth.TruthLine;
import hemline.boundary.truth.Truth.TruthVertex;
import java.util.List;

/** What a false length lies on in one sweep. */
final class DecoyMap {
    /** The cause of false length near no known decoy. */
    static final String OTHER = "other";

    private final List<TruthDecoy> decoys;
    private final ElementGrid grid;
    private final OwnerHits hits = new OwnerHits();

    DecoyMap(List<TruthDecoy> decoys, int sweepIndex, ScoreSettings settings) {
        this.decoys = decoys;
        // A longer element than for matching: causes need no fine lengths.
        LineElements elements = new LineElements(1);
        for (int d = 0; d < decoys.size(); d++) {
            for (TruthLine line : decoys.get(d).lines()) {
                if (line.sweep() == sweepIndex) {
                    elements.add(d, SweepPair.values(line.vertices(), TruthVertex::xKm),
                            SweepPair.values(line.vertices(), TruthVertex::yKm),
                            SweepPair.values(line.vertices(), v -> 1), 0);
                }
            }
        }
        grid = new ElementGrid(elements, settings.decoyKm(), 1);
    }

    String causeAt(double x, double y) {
        grid.collect(x, y, Double.NaN, Double.NaN, 0, hits);
        int element = hits.choose(-1);
        return element < 0 ? OTHER : decoys.get(grid.elements().owner(element)).cause();
    }
}
