package hemline.sweep;

/**
 * One quantity over the gates of a sweep, {@code [ray][gate]}. Not measured (no data, range folded, a lost ray) is
 * {@code NaN}; measured but below the detection level is {@code −∞}: two different facts that never mix.
 */
public final class Field {
    /** The gate was not measured. */
    public static final float NOT_MEASURED = Float.NaN;
    /** The gate was measured and held no detectable echo. */
    public static final float BELOW_DETECTION = Float.NEGATIVE_INFINITY;

    private final String name;
    private final String units;
    private final int rays;
    private final int gates;
    private final float[] values;

    /**
     * @param name   the quantity's name in its file, for example {@code DBZH}
     * @param units  its units, for example {@code dBZ} or {@code m s-1}
     * @param values {@code rays × gates} values, ray by ray; handed over, the caller must not change it afterwards
     */
    public Field(String name, String units, int rays, int gates, float[] values) {
        if (rays < 1 || gates < 1 || values.length != (long) rays * gates) {
            throw new IllegalArgumentException(
                    "field " + name + ": " + rays + " rays x " + gates + " gates do not match " + values.length + " values");
        }
        this.name = name;
        this.units = units;
        this.rays = rays;
        this.gates = gates;
        this.values = values;
    }

    public String name() {
        return name;
    }

    public String units() {
        return units;
    }

    public int rays() {
        return rays;
    }

    public int gates() {
        return gates;
    }

    public float at(int ray, int gate) {
        return values[ray * gates + gate];
    }

    /** Copies one ray's gates into {@code into}, which holds at least {@link #gates()} values. */
    public void copyRay(int ray, float[] into) {
        System.arraycopy(values, ray * gates, into, 0, gates);
    }

    /** A copy of all values, ray by ray. */
    public float[] toArray() {
        return values.clone();
    }

    public static boolean isMeasured(float value) {
        return !Float.isNaN(value);
    }

    /** True for a detected echo: measured and above the detection level. */
    public static boolean isEcho(float value) {
        return value > Float.NEGATIVE_INFINITY;
    }
}
