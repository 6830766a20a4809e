package hemline.viewer.render;

import hemline.viewer.viewmodel.ViewTransform;

/**
 * A thin circle about the radar.
 *
 * @param radiusKm ground range, km
 * @param argb     colour, not premultiplied
 * @param dashPx   length of a dash and of a gap along the circle, pixels; 0 for a whole line
 */
public record Ring(double radiusKm, int argb, double dashPx) {

    void paint(PixelPen pen, ViewTransform view, double pixelsPerUnit) {
        double x = view.screenX(0) * pixelsPerUnit;
        double y = view.screenY(0) * pixelsPerUnit;
        double r = radiusKm * view.pxPerKm() * pixelsPerUnit;
        if (!(r > 1)) {
            return;
        }
        // Where the circle runs more across than down, each column is crossed once above and once below; elsewhere
        // rows.
        double half = r * Math.sqrt(0.5);
        for (int column = from(x - half); column <= Math.min(pen.width() - 1, x + half); column++) {
            double across = column + 0.5 - x;
            double down = Math.sqrt(r * r - across * across);
            cross(pen, column, y - down, false, Math.atan2(across, down) * r);
            cross(pen, column, y + down, false, Math.atan2(across, -down) * r);
        }
        for (int row = from(y - half); row <= Math.min(pen.height() - 1, y + half); row++) {
            double down = row + 0.5 - y;
            double across = Math.sqrt(r * r - down * down);
            cross(pen, row, x - across, true, Math.atan2(-across, -down) * r);
            cross(pen, row, x + across, true, Math.atan2(across, -down) * r);
        }
    }

    private static int from(double edge) {
        return (int) Math.max(0, Math.ceil(edge - 0.5));
    }

    private void cross(PixelPen pen, int line, double at, boolean isRow, double alongPx) {
        if (dashPx == 0 || Math.floorMod((long) Math.floor(alongPx / dashPx), 2L) == 0) {
            pen.cross(line, at, isRow, argb);
        }
    }
}
