package hemline.sweep;

/**
 * Reflectivity to colour: dark for weak, lighter with every dBZ, in steps that look even, most of them spent on
 * −5…30 dBZ where boundaries live.
 *
 * <p>The colours run from ink blue through slate, sage and straw to near white at low chroma, so that marks drawn
 * in saturated warm colours stand out from them, and order never rests on hue. Evenness is that of OKLab (Ottosson
 * 2020, A perceptual color space for image processing): equal steps of dBZ inside one band are equal distances there.
 * Immutable; safe for use by several threads.
 */
public final class ReflectivityScale {
    /** Reflectivity of the darkest colour and below, dBZ. */
    public static final double LOWEST_DBZ = -20;
    /** Start of the emphasised band, dBZ. */
    public static final double EMPHASIS_FROM_DBZ = -5;
    /** End of the emphasised band, dBZ. */
    public static final double EMPHASIS_TO_DBZ = 30;
    /** Reflectivity of the lightest colour and above, dBZ. */
    public static final double HIGHEST_DBZ = 65;
    /** Colour of a gate that was measured and held no detectable echo: opaque, darker than every echo. */
    public static final int BELOW_DETECTION_ARGB = 0xff0a0c12;
    /** Colour of a gate that was not measured: fully transparent. */
    public static final int NOT_MEASURED_ARGB = 0;

    /** Corner colours of the path: OKLCH lightness, chroma, hue in degrees. */
    private static final double[][] PATH = {
        {0.17, 0.040, 278}, {0.30, 0.072, 264}, {0.45, 0.080, 238}, {0.60, 0.080, 200}, {0.74, 0.085, 155},
        {0.87, 0.088, 112}, {0.975, 0.030, 100}};
    /** Share of the path, by length in OKLab, that is spent at the corners of the dBZ bands. */
    private static final double[] BAND_DBZ = {LOWEST_DBZ, EMPHASIS_FROM_DBZ, EMPHASIS_TO_DBZ, HIGHEST_DBZ};
    private static final double[] BAND_SHARE = {0, 0.12, 0.82, 1};
    private static final int STEPS_PER_DB = 4;
    private static final int PATH_POINTS = 4096;
    private static final ReflectivityScale STANDARD = new ReflectivityScale();

    private final int[] table;

    private ReflectivityScale() {
        double[][] path = densePath();
        double[] along = new double[path.length];
        for (int i = 1; i < path.length; i++) {
            along[i] = along[i - 1] + distance(path[i], path[i - 1]);
        }
        int steps = (int) Math.round((HIGHEST_DBZ - LOWEST_DBZ) * STEPS_PER_DB) + 1;
        table = new int[steps];
        int at = 0;
        for (int i = 0; i < steps; i++) {
            double wanted = shareAt(LOWEST_DBZ + (double) i / STEPS_PER_DB) * along[along.length - 1];
            while (at + 1 < along.length && along[at + 1] <= wanted) {
                at++;
            }
            table[i] = OkLab.toArgb(path[at][0], path[at][1], path[at][2]);
        }
    }

    public static ReflectivityScale standard() {
        return STANDARD;
    }

    /** The colour of a gate as {@code 0xAARRGGBB} in sRGB; values beyond the scale get its end colours. */
    public int argb(float dbz) {
        if (Float.isNaN(dbz)) {
            return NOT_MEASURED_ARGB;
        }
        if (dbz == Float.NEGATIVE_INFINITY) {
            return BELOW_DETECTION_ARGB;
        }
        long step = Math.round((dbz - LOWEST_DBZ) * STEPS_PER_DB);
        return table[(int) Math.max(0, Math.min(step, table.length - 1L))];
    }

    private static double shareAt(double dbz) {
        int band = 0;
        while (band + 2 < BAND_DBZ.length && dbz > BAND_DBZ[band + 1]) {
            band++;
        }
        double within = (dbz - BAND_DBZ[band]) / (BAND_DBZ[band + 1] - BAND_DBZ[band]);
        return BAND_SHARE[band] + within * (BAND_SHARE[band + 1] - BAND_SHARE[band]);
    }

    /** Points {@code {L, a, b}} close together along the path. */
    private static double[][] densePath() {
        double[][] points = new double[PATH_POINTS][];
        for (int i = 0; i < PATH_POINTS; i++) {
            double place = (double) i / (PATH_POINTS - 1) * (PATH.length - 1);
            int corner = Math.min((int) place, PATH.length - 2);
            double t = place - corner;
            double[] from = PATH[corner];
            double[] to = PATH[corner + 1];
            double chroma = from[1] + t * (to[1] - from[1]);
            double hue = Math.toRadians(from[2] + t * (to[2] - from[2]));
            points[i] = new double[] {from[0] + t * (to[0] - from[0]), chroma * StrictMath.cos(hue),
                chroma * StrictMath.sin(hue)};
        }
        return points;
    }

    private static double distance(double[] p, double[] q) {
        return Math.sqrt((p[0] - q[0]) * (p[0] - q[0]) + (p[1] - q[1]) * (p[1] - q[1])
                + (p[2] - q[2]) * (p[2] - q[2]));
    }
}
