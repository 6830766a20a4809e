package hemline.detection;

/**
 * Square pixels about the radar; the radar stands on the corner of the four middle ones. Row 0 is the southernmost.
 *
 * @param width     pixels a side, a multiple of 4
 * @param spacingKm side of a pixel, km
 */
record PlaneGrid(int width, double spacingKm) {
    PlaneGrid {
        if (width < 4 || width % 4 != 0) {
            throw new IllegalArgumentException("the width must be a multiple of 4, got " + width);
        }
    }

    /** The least grid that reaches a distance from the radar and has a coarser one over the same square. */
    static PlaneGrid reaching(double reachKm, double spacingKm) {
        return new PlaneGrid((int) Math.max(8, 8 * Math.ceil(reachKm / spacingKm / 4)), spacingKm);
    }

    /** The grid of twice the spacing over the same square. */
    PlaneGrid coarse() {
        return new PlaneGrid(width / 2, 2 * spacingKm);
    }

    int size() {
        return width * width;
    }

    /** Centre of a column or row, km east or north. */
    double km(int index) {
        return (index - (width - 1) / 2.0) * spacingKm;
    }

    /** Column or row of a place, as a fraction: whole numbers are centres. */
    double index(double km) {
        return km / spacingKm + (width - 1) / 2.0;
    }
}
