package hemline.simulation.scene;

/**
 * How the thin line of a front looks.
 *
 * @param peakDbz     mean reflectivity of the line's own echo along its crest, dBZ
 * @param aheadSdKm   Gaussian half width on the side ahead, km (full width at half power is 2.35 times)
 * @param behindSdKm  Gaussian half width behind, km
 * @param variationDb standard deviation along the line over some 10 km, dB
 * @param patchDb     standard deviation along the line over 2 to 3 km, dB
 * @param brokenShare share of its length that is missing, 0 to 0.6
 * @param trendDbPerH gain or loss of strength, dB per hour
 */
public record LineLook(double peakDbz, double aheadSdKm, double behindSdKm, double variationDb, double patchDb,
                       double brokenShare, double trendDbPerH) {
    /** No line: only the step of a clear-air arc. */
    public static final LineLook NONE = new LineLook(-99, 1, 1, 0, 0, 0, 0);

    public LineLook {
        if (!(aheadSdKm > 0) || !(behindSdKm > 0) || !(brokenShare >= 0 && brokenShare <= 0.6)) {
            throw new IllegalArgumentException("a line needs widths above 0 km and a broken share within 0..0.6, got "
                    + aheadSdKm + " and " + behindSdKm + " km, " + brokenShare);
        }
    }

    public boolean present() {
        return peakDbz > -90;
    }
}
