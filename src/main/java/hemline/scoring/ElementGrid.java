package hemline.scoring;

import java.util.Arrays;

/** Finds the elements near a place without trying all: a grid of cells, each with the elements whose middle it holds. */
final class ElementGrid {
    private final LineElements elements;
    private final double reachKm;
    private final double cellKm;
    private final double minX;
    private final double minY;
    private final int columns;
    private final int rows;
    private final int[] start;
    private final int[] member;

    /**
     * @param elements what to find
     * @param reachKm  the greatest distance that will be asked for, km
     * @param sampleKm the longest element, km
     */
    ElementGrid(LineElements elements, double reachKm, double sampleKm) {
        this.elements = elements;
        this.reachKm = reachKm;
        cellKm = reachKm + sampleKm;
        double lowX = Double.POSITIVE_INFINITY;
        double lowY = Double.POSITIVE_INFINITY;
        double highX = Double.NEGATIVE_INFINITY;
        double highY = Double.NEGATIVE_INFINITY;
        for (int e = 0; e < elements.size(); e++) {
            lowX = Math.min(lowX, elements.midX(e));
            lowY = Math.min(lowY, elements.midY(e));
            highX = Math.max(highX, elements.midX(e));
            highY = Math.max(highY, elements.midY(e));
        }
        minX = lowX;
        minY = lowY;
        columns = elements.size() == 0 ? 0 : (int) ((highX - lowX) / cellKm) + 1;
        rows = elements.size() == 0 ? 0 : (int) ((highY - lowY) / cellKm) + 1;
        start = new int[columns * rows + 1];
        for (int e = 0; e < elements.size(); e++) {
            start[cell(e) + 1]++;
        }
        for (int c = 0; c < columns * rows; c++) {
            start[c + 1] += start[c];
        }
        member = new int[elements.size()];
        int[] next = Arrays.copyOf(start, columns * rows);
        for (int e = 0; e < elements.size(); e++) {
            member[next[cell(e)]++] = e;
        }
    }

    private int cell(int e) {
        int column = (int) ((elements.midX(e) - minX) / cellKm);
        int row = (int) ((elements.midY(e) - minY) / cellKm);
        return row * columns + column;
    }

    LineElements elements() {
        return elements;
    }

    /**
     * Collects, for each owner, its nearest element within reach and direction.
     *
     * @param tangentX direction to agree with; NaN for any
     * @param leastCos least absolute cosine between the directions
     * @param into     emptied first
     */
    void collect(double x, double y, double tangentX, double tangentY, double leastCos, OwnerHits into) {
        into.clear();
        if (member.length == 0) {
            return;
        }
        int column = (int) Math.floor((x - minX) / cellKm);
        int row = (int) Math.floor((y - minY) / cellKm);
        for (int r = Math.max(0, row - 1); r <= Math.min(rows - 1, row + 1); r++) {
            for (int c = Math.max(0, column - 1); c <= Math.min(columns - 1, column + 1); c++) {
                int at = r * columns + c;
                for (int i = start[at]; i < start[at + 1]; i++) {
                    int e = member[i];
                    double cos = Math.abs(tangentX * elements.tangentX(e) + tangentY * elements.tangentY(e));
                    // Not a number where either has no direction: then any angle will do.
                    if (cos < leastCos) {
                        continue;
                    }
                    double distance = elements.distanceKm(e, x, y);
                    if (distance <= reachKm) {
                        into.offer(elements.owner(e), e, distance, elements.plain(e));
                    }
                }
            }
        }
    }
}
