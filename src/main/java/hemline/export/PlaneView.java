package hemline.export;

import hemline.geometry.Point;

/**
 * A square piece of the plane as a square of pixels, north up.
 *
 * @param centre   in the middle of the picture, km
 * @param halfKm   from the middle to each side, km
 * @param leftPx   left side of the square in the picture
 * @param topPx    top of the square in the picture
 * @param sizePx   length of its sides
 */
record PlaneView(Point centre, double halfKm, int leftPx, int topPx, int sizePx) {

    double x(Point place) {
        return leftPx + sizePx / 2.0 + (place.xKm() - centre.xKm()) * pxPerKm();
    }

    double y(Point place) {
        return topPx + sizePx / 2.0 - (place.yKm() - centre.yKm()) * pxPerKm();
    }

    double pxPerKm() {
        return sizePx / (2 * halfKm);
    }

    /** The place under the middle of a pixel. */
    Point place(int xPx, int yPx) {
        return new Point(centre.xKm() + (xPx + 0.5 - leftPx - sizePx / 2.0) / pxPerKm(),
                centre.yKm() - (yPx + 0.5 - topPx - sizePx / 2.0) / pxPerKm());
    }
}
