package hemline.simulation.front;

/**
 * One sinusoidal departure of a curve from its plain shape. For a ring {@code wave} is the whole number of lobes and
 * {@code size} a share of the radius; for a bow {@code wave} is the wavelength in km and {@code size} in km.
 */
public record Lobe(double wave, double size, double phaseRad) {
}
