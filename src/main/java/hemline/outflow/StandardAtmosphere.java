package hemline.outflow;

/**
 * The U.S. Standard Atmosphere, 1976, below 11 km of geopotential height: what stands in for a pressure that a station
 * does not report.
 */
public final class StandardAtmosphere {
    private static final double SEA_LEVEL_K = 288.15;
    private static final double SEA_LEVEL_HPA = 1013.25;
    private static final double LAPSE_K_PER_M = 0.0065;
    private static final double GRAVITY = 9.80665;
    /** Gas constant over molar mass with the constants of 1976, J kg⁻¹ K⁻¹. */
    private static final double GAS_CONSTANT = 8314.32 / 28.9644;
    private static final double EARTH_RADIUS_M = 6_356_766;

    private StandardAtmosphere() {
    }

    private static double geopotentialM(double altitudeM) {
        if (!(altitudeM >= -1000 && altitudeM <= 11_000)) {
            throw new IllegalArgumentException("altitude must lie within -1000..11000 m, got " + altitudeM);
        }
        return EARTH_RADIUS_M * altitudeM / (EARTH_RADIUS_M + altitudeM);
    }

    /** @param altitudeM height above mean sea level, m, −1000 to 11 000 */
    public static double temperatureK(double altitudeM) {
        return SEA_LEVEL_K - LAPSE_K_PER_M * geopotentialM(altitudeM);
    }

    /** @param altitudeM height above mean sea level, m, −1000 to 11 000 */
    public static double pressureHpa(double altitudeM) {
        return SEA_LEVEL_HPA * Math.pow(temperatureK(altitudeM) / SEA_LEVEL_K, GRAVITY / (GAS_CONSTANT * LAPSE_K_PER_M));
    }

    /** @param altitudeM height above mean sea level, m, −1000 to 11 000 */
    public static double densityKgM3(double altitudeM) {
        return 100 * pressureHpa(altitudeM) / (GAS_CONSTANT * temperatureK(altitudeM));
    }
}
