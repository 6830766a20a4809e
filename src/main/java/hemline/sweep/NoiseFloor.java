package hemline.sweep;

/**
 * The weakest echo a sweep can show: constant received power, so 20 dB a decade of range in reflectivity.
 *
 * <p>Learned as a low quantile of {@code dBZ − 20 log₁₀ r} over the echoes beyond 10 km, so that a few stray gates do
 * not move it. A gate below detection holds at most this much: that is what the gate tells.
 *
 * @param dbzAt1Km reflectivity of the weakest echo at 1 km, dBZ
 */
public record NoiseFloor(double dbzAt1Km) {
    /** A common sensitivity of weather radars, used where a sweep has too few echoes to tell (common practice). */
    public static final NoiseFloor USUAL = new NoiseFloor(-40);
    /** Below this reflectivity there is nothing left to tell apart, dBZ. */
    public static final double LEAST_DBZ = -8;

    private static final double QUANTILE = 0.005;
    private static final double FROM_RANGE_M = 10_000;
    private static final int FEWEST_ECHOES = 400;
    private static final double LOWEST = -100;
    private static final double STEP = 0.25;

    public NoiseFloor {
        if (!(Math.abs(dbzAt1Km) <= 150)) {
            throw new IllegalArgumentException("the noise floor must lie within -150..150 dBZ, got " + dbzAt1Km);
        }
    }

    /** The floor of one sweep; {@link #USUAL} where it has too few echoes. */
    public static NoiseFloor of(Sweep sweep) {
        Field field = sweep.reflectivity();
        int[] counts = new int[1000];
        int total = 0;
        float[] ray = new float[field.gates()];
        for (int r = 0; r < field.rays(); r += 2) {
            field.copyRay(r, ray);
            for (int g = r / 2 % 3; g < ray.length; g += 3) {
                double range = sweep.slantRangeM(g);
                if (range >= FROM_RANGE_M && Field.isEcho(ray[g])) {
                    double power = ray[g] - 20 * Math.log10(range / 1000);
                    int bin = (int) ((power - LOWEST) / STEP);
                    counts[Math.max(0, Math.min(counts.length - 1, bin))]++;
                    total++;
                }
            }
        }
        if (total < FEWEST_ECHOES) {
            return USUAL;
        }
        long wanted = Math.round(QUANTILE * total);
        int bin = 0;
        for (long seen = counts[0]; seen <= wanted && bin < counts.length - 1; seen += counts[bin]) {
            bin++;
        }
        return new NoiseFloor(LOWEST + (bin + 0.5) * STEP);
    }

    /** Reflectivity of the weakest echo at a slant range, dBZ, never below {@link #LEAST_DBZ}. */
    public double dbzAt(double slantRangeM) {
        return Math.max(LEAST_DBZ, dbzAt1Km + 20 * Math.log10(Math.max(slantRangeM, 1) / 1000));
    }
}
