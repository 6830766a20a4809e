package hemline.numerics;

import java.util.Arrays;
import java.util.Optional;

/**
 * Pairs of rows and columns at the least total cost.
 *
 * <p>Successive shortest augmenting paths with dual prices, O(n² m): Jonker and Volgenant (1987), Computing
 * 38:325–340; Kuhn (1955), Nav. Res. Logist. 2:83–97. Ties fall to the lower column, so results are reproducible.
 *
 * @param columnOfRow {@code [rows]}, −1 for a row without a partner
 * @param cost        sum over the pairs made, and over misses where misses are allowed
 */
public record Assignment(int[] columnOfRow, double cost) {

    /**
     * Pairs every row, or every column if there are fewer, with a partner of its own.
     *
     * @param cost {@code [rows][columns]}; +∞ forbids a pair
     * @return empty if no complete pairing avoids the forbidden pairs
     * @throws IllegalArgumentException for NaN, −∞ or rows of different length
     */
    public static Optional<Assignment> complete(double[][] cost) {
        int rows = cost.length;
        int columns = rows == 0 ? 0 : cost[0].length;
        check(cost, columns);
        if (rows == 0 || columns == 0) {
            return Optional.of(new Assignment(filled(rows), 0));
        }
        if (rows <= columns) {
            int[] found = solve(cost, rows, columns);
            return found == null ? Optional.empty() : Optional.of(new Assignment(found, total(cost, found)));
        }
        double[][] turned = new double[columns][rows];
        for (int i = 0; i < rows; i++) {
            for (int j = 0; j < columns; j++) {
                turned[j][i] = cost[i][j];
            }
        }
        int[] rowOfColumn = solve(turned, columns, rows);
        if (rowOfColumn == null) {
            return Optional.empty();
        }
        int[] found = filled(rows);
        for (int j = 0; j < columns; j++) {
            found[rowOfColumn[j]] = j;
        }
        return Optional.of(new Assignment(found, total(cost, found)));
    }

    /**
     * Pairs rows and columns where a pair is cheaper than leaving both alone: a gate of {@code 2 missCost} on any
     * single pair, decided over all pairs together.
     *
     * @param cost     {@code [rows][columns]}; +∞ forbids a pair
     * @param missCost cost of leaving one row or one column alone, at least 0
     */
    public static Assignment gated(double[][] cost, double missCost) {
        if (!(missCost >= 0) || Double.isInfinite(missCost)) {
            throw new IllegalArgumentException("the cost of a miss must be at least 0 and finite, got " + missCost);
        }
        int rows = cost.length;
        int columns = rows == 0 ? 0 : cost[0].length;
        check(cost, columns);
        int size = rows + columns;
        double[][] square = new double[size][size];
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                if (i < rows && j < columns) {
                    square[i][j] = cost[i][j];
                } else {
                    square[i][j] = i < rows || j < columns ? missCost : 0;
                }
            }
        }
        if (size == 0) {
            return new Assignment(new int[0], 0);
        }
        int[] all = solve(square, size, size);
        int[] found = filled(rows);
        for (int i = 0; i < rows; i++) {
            found[i] = all[i] < columns ? all[i] : -1;
        }
        return new Assignment(found, total(square, all));
    }

    private static int[] solve(double[][] cost, int rows, int columns) {
        double[] rowPrice = new double[rows + 1];
        double[] columnPrice = new double[columns + 1];
        int[] rowAt = new int[columns + 1];
        int[] cameFrom = new int[columns + 1];
        for (int row = 1; row <= rows; row++) {
            rowAt[0] = row;
            int column = 0;
            double[] shortest = new double[columns + 1];
            Arrays.fill(shortest, Double.POSITIVE_INFINITY);
            boolean[] done = new boolean[columns + 1];
            do {
                done[column] = true;
                int from = rowAt[column];
                double least = Double.POSITIVE_INFINITY;
                int next = -1;
                for (int j = 1; j <= columns; j++) {
                    if (done[j]) {
                        continue;
                    }
                    double reduced = cost[from - 1][j - 1] - rowPrice[from] - columnPrice[j];
                    if (reduced < shortest[j]) {
                        shortest[j] = reduced;
                        cameFrom[j] = column;
                    }
                    if (shortest[j] < least) {
                        least = shortest[j];
                        next = j;
                    }
                }
                if (next < 0) {
                    return null;
                }
                for (int j = 0; j <= columns; j++) {
                    if (done[j]) {
                        rowPrice[rowAt[j]] += least;
                        columnPrice[j] -= least;
                    } else {
                        shortest[j] -= least;
                    }
                }
                column = next;
            } while (rowAt[column] != 0);
            while (column != 0) {
                rowAt[column] = rowAt[cameFrom[column]];
                column = cameFrom[column];
            }
        }
        int[] found = filled(rows);
        for (int j = 1; j <= columns; j++) {
            if (rowAt[j] > 0) {
                found[rowAt[j] - 1] = j - 1;
            }
        }
        return found;
    }

    private static void check(double[][] cost, int columns) {
        for (double[] row : cost) {
            if (row.length != columns) {
                throw new IllegalArgumentException("all rows must have " + columns + " columns, one has " + row.length);
            }
            for (double value : row) {
                if (Double.isNaN(value) || value == Double.NEGATIVE_INFINITY) {
                    throw new IllegalArgumentException("a cost must be a number or +infinity, got " + value);
                }
            }
        }
    }

    private static int[] filled(int size) {
        int[] none = new int[size];
        Arrays.fill(none, -1);
        return none;
    }

    private static double total(double[][] cost, int[] columnOfRow) {
        double sum = 0;
        for (int i = 0; i < columnOfRow.length; i++) {
            sum += columnOfRow[i] < 0 ? 0 : cost[i][columnOfRow[i]];
        }
        return sum;
    }
}
