package hemline.export;

import hemline.sweep.ReflectivityScale;
import java.awt.image.BufferedImage;

/** The reflectivity scale as an upright bar with its values. */
final class ScaleLegend {
    private static final int WIDTH_PX = 16;

    private ScaleLegend() {
    }

    static void paint(BufferedImage picture, Ink ink, int left, int top, int height) {
        double span = ReflectivityScale.HIGHEST_DBZ - ReflectivityScale.LOWEST_DBZ;
        for (int i = 0; i < height; i++) {
            float dbz = (float) (ReflectivityScale.HIGHEST_DBZ - (i + 0.5) * span / height);
            for (int x = 0; x < WIDTH_PX; x++) {
                picture.setRGB(left + x, top + i, ReflectivityScale.standard().argb(dbz));
            }
        }
        for (int dbz = (int) ReflectivityScale.LOWEST_DBZ; dbz <= ReflectivityScale.HIGHEST_DBZ; dbz += 5) {
            double y = top + (ReflectivityScale.HIGHEST_DBZ - dbz) / span * height;
            ink.line(new java.awt.geom.Line2D.Double(left + WIDTH_PX, y, left + WIDTH_PX + 4, y), Ink.WORDS, 1);
            if (dbz % 10 == 0) {
                ink.words(Integer.toString(dbz).replace('-', '−'), left + WIDTH_PX + 8, y + 4, 9, Ink.WORDS);
            }
        }
        ink.words("dBZ", left, top - 8, 10, Ink.WORDS);
    }
}
