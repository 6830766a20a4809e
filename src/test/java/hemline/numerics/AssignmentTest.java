package hemline.numerics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.IntRange;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;

/** Values from the documentation and the public tests of scipy.optimize.linear_sum_assignment, enumerated again. */
class AssignmentTest {
    private static final double INF = Double.POSITIVE_INFINITY;

    private static Assignment complete(double[][] cost) {
        return Assignment.complete(cost).orElseThrow();
    }

    /** The example of scipy's documentation. */
    @Test
    void theWorkedExampleIsSolved() {
        Assignment found = complete(new double[][] {{4, 1, 3}, {2, 0, 5}, {3, 2, 2}});
        assertThat(found.columnOfRow()).containsExactly(1, 0, 2);
        assertThat(found.cost()).isEqualTo(5);
    }

    /** scipy's test of square and rectangular costs; the last has two optimal pairings of cost 452. */
    @Test
    void squareAndRectangularCostsAreSolved() {
        assertThat(complete(new double[][] {{400, 150, 400}, {400, 450, 600}, {300, 225, 300}}).cost()).isEqualTo(850);
        assertThat(complete(new double[][] {{400, 150, 400, 1}, {400, 450, 600, 2}, {300, 225, 300, 3}}).cost())
                .isEqualTo(452);
        assertThat(complete(new double[][] {{10, 10, 8}, {9, 8, 1}, {9, 7, 4}}).cost()).isEqualTo(18);
        assertThat(complete(new double[][] {{10, 10, 8, 11}, {9, 8, 1, 1}, {9, 7, 4, 10}}).cost()).isEqualTo(15);
    }

    @Test
    void moreRowsThanColumnsLeaveRowsAlone() {
        Assignment found = complete(new double[][] {{5}, {2}, {7}});
        assertThat(found.columnOfRow()).containsExactly(-1, 0, -1);
        assertThat(found.cost()).isEqualTo(2);
    }

    /** scipy's tests: infinite costs forbid, a wholly infinite column is infeasible, NaN and −∞ are refused. */
    @Test
    void forbiddenPairsAreAvoidedAndBadCostsRefused() {
        Assignment found = complete(new double[][] {{10, INF, INF}, {INF, INF, 1}, {INF, 7, INF}});
        assertThat(found.columnOfRow()).containsExactly(0, 2, 1);
        assertThat(found.cost()).isEqualTo(18);
        assertThat(Assignment.complete(new double[][] {{INF, 1}, {INF, 2}})).isEmpty();
        assertThatThrownBy(() -> Assignment.complete(new double[][] {{Double.NaN}}))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Assignment.complete(new double[][] {{Double.NEGATIVE_INFINITY}}))
                .isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> Assignment.complete(new double[][] {{1, 2}, {3}}))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void aPairDearerThanTwoMissesIsLeftApart() {
        Assignment found = Assignment.gated(new double[][] {{1, 9}, {9, 9}}, 4);
        assertThat(found.columnOfRow()).containsExactly(0, -1);
        assertThat(found.cost()).isEqualTo(9);
        assertThat(Assignment.gated(new double[0][0], 4).cost()).isZero();
    }

    @Property(tries = 200)
    void noPairingIsCheaper(@ForAll @IntRange(min = 1, max = 5) int rows, @ForAll @IntRange(min = 1, max = 6) int columns,
                            @ForAll long seed) {
        java.util.Random random = new java.util.Random(seed);
        double[][] cost = new double[rows][columns];
        for (double[] row : cost) {
            for (int j = 0; j < columns; j++) {
                row[j] = Math.round(20 * random.nextDouble());
            }
        }
        assertThat(complete(cost).cost()).isCloseTo(cheapest(cost, 0, 0, 0), Offset.offset(1e-9));
    }

    private static double cheapest(double[][] cost, int row, int usedColumns, int paired) {
        int wanted = Math.min(cost.length, cost[0].length);
        if (paired == wanted) {
            return 0;
        }
        if (row == cost.length) {
            return INF;
        }
        double best = cheapest(cost, row + 1, usedColumns, paired);
        for (int j = 0; j < cost[0].length; j++) {
            if ((usedColumns >> j & 1) == 0) {
                best = Math.min(best, cost[row][j] + cheapest(cost, row + 1, usedColumns | 1 << j, paired + 1));
            }
        }
        return best;
    }
}
