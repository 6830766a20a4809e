package hemline.sweep;

/**
 * A sweep and what is to be thought of its gates. The raw sweep is kept as it was.
 *
 * @param raw  the sweep as measured
 * @param mask reasons per gate, the shape of the reflectivity
 */
public record ScreenedSweep(Sweep raw, GateMask mask) {
}
