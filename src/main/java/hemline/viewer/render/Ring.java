package hemline.viewer.render;

import hemline.viewer.viewmodel.ViewTransform;

/**
 * A thin circle about the radar, drawn into the sweep's own pixels in the background: stroking large circles is what
 * would cost the software renderer most.
 *
 * @param radiusKm ground range, km
 * @param argb     colour, not premultiplied
 * @param dashPx   length of a dash and of a gap along the circle, pixels; 0 for a whole line
 */
public record Ring(double radiusKm, int argb, double dashPx) {

    /** Draws it onto premultiplied pixels, row by row from the top. */
    void paint(int[] pixels, int width, int height, ViewTransform view, double pixelsPerUnit) {
        double x = view.screenX(0) * pixelsPerUnit;
        double y = view.screenY(0) * pixelsPerUnit;
        double r = radiusKm * view.pxPerKm() * pixelsPerUnit;
        if (!(r > 1)) {
            return;
        }
        // Where the circle runs more across than down each column is crossed once above and once below; elsewhere rows.
        double half = r * Math.sqrt(0.5);
        for (int column = from(x - half); column <= Math.min(width - 1, x + half); column++) {
            double across = column + 0.5 - x;
            double down = Math.sqrt(r * r - across * across);
            crossing(pixels, width, height, column, y - down, false, Math.atan2(across, down) * r);
            crossing(pixels, width, height, column, y + down, false, Math.atan2(across, -down) * r);
        }
        for (int row = from(y - half); row <= Math.min(height - 1, y + half); row++) {
            double down = row + 0.5 - y;
            double across = Math.sqrt(r * r - down * down);
            crossing(pixels, width, height, row, x - across, true, Math.atan2(-across, -down) * r);
            crossing(pixels, width, height, row, x + across, true, Math.atan2(across, -down) * r);
        }
    }

    private static int from(double edge) {
        return (int) Math.max(0, Math.ceil(edge - 0.5));
    }

    /** Shares the line's unit width between the two pixels it lies on. */
    private void crossing(int[] pixels, int width, int height, int line, double at, boolean row, double alongPx) {
        if (dashPx > 0 && Math.floorMod((long) Math.floor(alongPx / dashPx), 2L) == 1) {
            return;
        }
        int first = (int) Math.floor(at - 0.5);
        double share = at - 0.5 - first;
        for (int i = 0; i < 2; i++) {
            int other = first + i;
            boolean inside = other >= 0 && other < (row ? width : height);
            if (inside) {
                int index = row ? line * width + other : other * width + line;
                pixels[index] = over(pixels[index], i == 0 ? 1 - share : share);
            }
        }
    }

    private int over(int below, double cover) {
        double alpha = (argb >>> 24) / 255.0 * cover;
        int mixed = 0;
        for (int shift = 24; shift >= 0; shift -= 8) {
            double ink = shift == 24 ? 255 : argb >>> shift & 0xff;
            mixed |= (int) Math.round(ink * alpha + (below >>> shift & 0xff) * (1 - alpha)) << shift;
        }
        return mixed;
    }
}
