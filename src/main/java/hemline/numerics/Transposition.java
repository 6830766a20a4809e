package hemline.numerics;

/** Turns a square plane about its diagonal, tile by tile so that both sides stay in cache. */
public final class Transposition {
    private static final int TILE = 16;

    private Transposition() {
    }

    public static void square(float[] in, float[] out, int width) {
        if (in.length != (long) width * width || out.length != in.length) {
            throw new IllegalArgumentException("planes of " + in.length + " and " + out.length + " are not " + width
                    + " square");
        }
        for (int y0 = 0; y0 < width; y0 += TILE) {
            int y1 = Math.min(width, y0 + TILE);
            for (int x0 = 0; x0 < width; x0 += TILE) {
                int x1 = Math.min(width, x0 + TILE);
                for (int y = y0; y < y1; y++) {
                    for (int x = x0; x < x1; x++) {
                        out[x * width + y] = in[y * width + x];
                    }
                }
            }
        }
    }
}
