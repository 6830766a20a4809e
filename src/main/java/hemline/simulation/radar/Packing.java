package hemline.simulation.radar;

/**
 * How reflectivity is written as whole numbers.
 *
 * @param name      for people
 * @param scaleDb   decibels for one step
 * @param offsetDbz value of the number 0, dBZ
 * @param lowest    lowest number that stands for an echo
 * @param highest   highest number that stands for an echo
 * @param undetect  number for "measured, nothing above the detection level"
 * @param noData    number for "not measured"
 */
public record Packing(String name, double scaleDb, double offsetDbz, int lowest, int highest, int undetect, int noData) {
    /** Half-decibel steps in one byte, as most operational ODIM_H5 files have. */
    public static final Packing BYTE = new Packing("uint8", 0.5, -32, 1, 254, 0, 255);
    /** Hundredths of a decibel in two bytes, as most CfRadial files have. */
    public static final Packing SHORT = new Packing("int16", 0.01, 0, -9000, 9000, -32767, -32768);

    public boolean isByte() {
        return highest < 256 && undetect >= 0;
    }

    /** The number for a value: −∞ for undetected, NaN for not measured; values beyond the ends become the ends. */
    public int pack(double dbz) {
        if (Double.isNaN(dbz)) {
            return noData;
        }
        if (dbz == Double.NEGATIVE_INFINITY) {
            return undetect;
        }
        return (int) Math.max(lowest, Math.min(highest, Math.rint((dbz - offsetDbz) / scaleDb)));
    }

    /** The value of a number, dBZ. */
    public double unpack(int number) {
        if (number == noData) {
            return Double.NaN;
        }
        return number == undetect ? Double.NEGATIVE_INFINITY : number * scaleDb + offsetDbz;
    }
}
