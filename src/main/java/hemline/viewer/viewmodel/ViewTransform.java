package hemline.viewer.viewmodel;

import hemline.geometry.Point;

/**
 * How the radar's plane lies on a screen area, north up.
 *
 * @param centre   the place in the middle of the area, km east and north of the radar
 * @param pxPerKm  pixels per km, above 0
 * @param widthPx  width of the area, pixels
 * @param heightPx height of the area, pixels
 */
public record ViewTransform(Point centre, double pxPerKm, double widthPx, double heightPx) {
    /** 2000 km across a small window: beyond any radar's reach. */
    public static final double MIN_PX_PER_KM = 0.3;
    /** A pixel is 2 m: below any gate. */
    public static final double MAX_PX_PER_KM = 500;

    public ViewTransform {
        if (!(pxPerKm >= MIN_PX_PER_KM && pxPerKm <= MAX_PX_PER_KM)) {
            throw new IllegalArgumentException("zoom must lie within " + MIN_PX_PER_KM + ".." + MAX_PX_PER_KM
                    + " pixels per km, got " + pxPerKm);
        }
        if (!(widthPx >= 0 && heightPx >= 0)) {
            throw new IllegalArgumentException("view area must not be negative, got " + widthPx + " x " + heightPx);
        }
    }

    /** A view centred at the radar in which a circle of {@code radiusKm} just fits. */
    public static ViewTransform fitting(double radiusKm, double widthPx, double heightPx) {
        double px = 0.47 * Math.max(1, Math.min(widthPx, heightPx)) / radiusKm;
        return new ViewTransform(new Point(0, 0), clampZoom(px), widthPx, heightPx);
    }

    public double screenX(Point place) {
        return screenX(place.xKm());
    }

    public double screenY(Point place) {
        return screenY(place.yKm());
    }

    public double screenX(double xKm) {
        return widthPx / 2 + (xKm - centre.xKm()) * pxPerKm;
    }

    public double screenY(double yKm) {
        return heightPx / 2 - (yKm - centre.yKm()) * pxPerKm;
    }

    /** The place under a pixel. */
    public Point toPlane(double xPx, double yPx) {
        return new Point(centre.xKm() + (xPx - widthPx / 2) / pxPerKm, centre.yKm() - (yPx - heightPx / 2) / pxPerKm);
    }

    /** The plane dragged by so many pixels to the right and down. */
    public ViewTransform panned(double rightPx, double downPx) {
        return new ViewTransform(new Point(centre.xKm() - rightPx / pxPerKm, centre.yKm() + downPx / pxPerKm), pxPerKm,
                widthPx, heightPx);
    }

    /** Zoomed so that the place under the pixel stays there; stops at the zoom limits. */
    public ViewTransform zoomed(double factor, double xPx, double yPx) {
        double zoom = clampZoom(pxPerKm * factor);
        Point fixed = toPlane(xPx, yPx);
        Point newCentre = new Point(fixed.xKm() - (xPx - widthPx / 2) / zoom, fixed.yKm()
                + (yPx - heightPx / 2) / zoom);
        return new ViewTransform(newCentre, zoom, widthPx, heightPx);
    }

    public ViewTransform resized(double newWidthPx, double newHeightPx) {
        return new ViewTransform(centre, pxPerKm, newWidthPx, newHeightPx);
    }

    public ViewTransform centredOn(Point place) {
        return new ViewTransform(place, pxPerKm, widthPx, heightPx);
    }

    private static double clampZoom(double zoom) {
        return Math.max(MIN_PX_PER_KM, Math.min(MAX_PX_PER_KM, zoom));
    }
}
