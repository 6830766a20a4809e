package hemline.simulation.radar;

/**
 * How a quantity is written as whole numbers: value = scale × number + offset.
 *
 * @param name     for people
 * @param scale    units of the quantity for one step
 * @param offset   value of the number 0
 * @param lowest   lowest number that stands for an echo
 * @param highest  highest number that stands for an echo
 * @param undetect number for "measured, nothing above the detection level"
 * @param noData   number for "not measured"
 */
public record Packing(String name, double scale, double offset, int lowest, int highest, int undetect, int noData) {
    /** Reflectivity in half-decibel steps in one byte, as most operational ODIM_H5 files have. */
    public static final Packing BYTE = new Packing("uint8", 0.5, -32, 1, 254, 0, 255);
    /** Reflectivity in hundredths of a decibel in two bytes, as most CfRadial files have. */
    public static final Packing SHORT = new Packing("int16", 0.01, 0, -9000, 9000, -32767, -32768);

    /** The packing of velocities, in as many bytes as this one, that holds ± an unambiguous velocity, m s⁻¹. */
    public Packing forVelocity(double nyquistMs) {
        if (!isByte()) {
            return SHORT;
        }
        double step = Math.ceil(100 * nyquistMs / 126) / 100;
        return new Packing("uint8", step, -127 * step, 1, 253, 0, 255);
    }

    public boolean isByte() {
        return noData == 255;
    }

    /** The number for a value: −∞ for undetected, NaN for not measured; values beyond the ends become the ends. */
    public int pack(double value) {
        if (Double.isNaN(value)) {
            return noData;
        }
        if (value == Double.NEGATIVE_INFINITY) {
            return undetect;
        }
        return (int) Math.max(lowest, Math.min(highest, Math.rint((value - offset) / scale)));
    }

    /** The value of a number; −∞ for undetected, NaN for not measured. */
    public double unpack(int number) {
        if (number == noData) {
            return Double.NaN;
        }
        return number == undetect ? Double.NEGATIVE_INFINITY : number * scale + offset;
    }
}
