package hemline.viewer.render;

/** Draws thin lines onto premultiplied pixels, row by row from the top, in the background. */
final class PixelPen {
    private final int[] pixels;
    private final int width;
    private final int height;

    PixelPen(int[] pixels, int width, int height) {
        this.pixels = pixels;
        this.width = width;
        this.height = height;
    }

    int width() {
        return width;
    }

    int height() {
        return height;
    }

    /**
     * A straight line one pixel wide, its edges smoothed by sharing its width between the two pixels it lies on
     * (after Wu 1991, An efficient antialiasing technique, Computer Graphics 25:143). What lies outside is left out.
     *
     * @param argb colour, not premultiplied
     */
    void line(double x0, double y0, double x1, double y1, int argb) {
        boolean steep = Math.abs(y1 - y0) > Math.abs(x1 - x0);
        double a0 = steep ? y0 : x0;
        double a1 = steep ? y1 : x1;
        double b0 = steep ? x0 : y0;
        double b1 = steep ? x1 : y1;
        if (a0 > a1) {
            double swap = a0;
            a0 = a1;
            a1 = swap;
            swap = b0;
            b0 = b1;
            b1 = swap;
        }
        if (a1 - a0 < 1e-9) {
            return;
        }
        double slope = (b1 - b0) / (a1 - a0);
        int last = (int) Math.min((steep ? height : width) - 1, Math.ceil(a1 - 0.5) - 1);
        for (int a = (int) Math.max(0, Math.ceil(a0 - 0.5)); a <= last; a++) {
            cross(a, b0 + (a + 0.5 - a0) * slope, steep, argb);
        }
    }

    /**
     * A line's crossing of one column, or of one row.
     *
     * @param line index of the column or row
     * @param at   where it is crossed, pixels from the top or the left
     */
    void cross(int line, double at, boolean isRow, int argb) {
        int first = (int) Math.floor(at - 0.5);
        double share = at - 0.5 - first;
        for (int i = 0; i < 2; i++) {
            int other = first + i;
            if (other >= 0 && other < (isRow ? width : height)) {
                int index = isRow ? line * width + other : other * width + line;
                pixels[index] = over(pixels[index], argb, i == 0 ? 1 - share : share);
            }
        }
    }

    private static int over(int below, int argb, double cover) {
        double alpha = (argb >>> 24) / 255.0 * cover;
        int mixed = 0;
        for (int shift = 24; shift >= 0; shift -= 8) {
            double ink = shift == 24 ? 255 : argb >>> shift & 0xff;
            mixed |= (int) Math.round(ink * alpha + (below >>> shift & 0xff) * (1 - alpha)) << shift;
        }
        return mixed;
    }
}
