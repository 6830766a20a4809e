package hemline.tracking;

/**
 * A run of neighbouring vertices of one curve that move alike, some 8 km long: the unit of linking, so that a curve
 * may belong to several tracks and a track to several curves.
 *
 * @param from  first vertex
 * @param to    vertex after the last
 * @param sweep index of its sweep
 */
record Piece(int from, int to, int sweep) {
    /** Vertices are about 1 km apart. */
    double lengthKm() {
        return to - from;
    }
}
