package hemline.outflow;

/**
 * Moist-air thermodynamics. Temperatures in K unless named {@code C}, pressures in hPa, mixing ratios in kg kg⁻¹.
 *
 * <p>Bolton (1980), The computation of equivalent potential temperature, Mon. Weather Rev. 108:1046–1053; equation
 * numbers are that paper's.
 */
public final class MoistAir {
    public static final double ZERO_CELSIUS_K = 273.15;
    /** Ratio of the molar masses of water and dry air. */
    public static final double EPSILON = 0.622;
    /** Gas constant over heat capacity at constant pressure of dry air, an ideal diatomic gas; Bolton has 0.2854. */
    public static final double KAPPA = 2.0 / 7.0;
    /** Gas constant of dry air, J kg⁻¹ K⁻¹. */
    public static final double DRY_GAS_CONSTANT = 287.05;
    public static final double REFERENCE_PRESSURE_HPA = 1000;

    private MoistAir() {
    }

    /** Saturation vapour pressure over water, hPa (eq. 10; within 0.3 % from −35 to 35 °C by the paper). */
    public static double saturationPressureHpa(double temperatureC) {
        return 6.112 * Math.exp(17.67 * temperatureC / (temperatureC + 243.5));
    }

    /** Dew point, °C: the inverse of eq. 10; −∞ for dry air. */
    public static double dewPointC(double vapourPressureHpa) {
        if (vapourPressureHpa == 0) {
            return Double.NEGATIVE_INFINITY;
        }
        double log = Math.log(vapourPressureHpa / 6.112);
        return 243.5 * log / (17.67 - log);
    }

    /** Mixing ratio of vapour, kg kg⁻¹. */
    public static double mixingRatio(double vapourPressureHpa, double pressureHpa) {
        return EPSILON * vapourPressureHpa / (pressureHpa - vapourPressureHpa);
    }

    public static double potentialTemperatureK(double temperatureK, double pressureHpa) {
        return temperatureK * Math.pow(REFERENCE_PRESSURE_HPA / pressureHpa, KAPPA);
    }

    /**
     * Virtual temperature, or with condensate density temperature: that of dry air as dense at the same pressure
     * (Emanuel 1994, Atmospheric Convection, ch. 4).
     *
     * @param mixingRatio vapour, kg kg⁻¹
     * @param condensate  mixing ratio of liquid and ice carried along, kg kg⁻¹
     */
    public static double densityTemperatureK(double temperatureK, double mixingRatio, double condensate) {
        return temperatureK * (1 + mixingRatio / EPSILON) / (1 + mixingRatio + condensate);
    }

    /** Temperature at the lifting condensation level from temperature and dew point, K (eq. 15). */
    public static double condensationTemperatureK(double temperatureK, double dewPointK) {
        return 1 / (1 / (dewPointK - 56) + Math.log(temperatureK / dewPointK) / 800) + 56;
    }

    /** The same from temperature and vapour pressure, K (eq. 21). */
    public static double condensationTemperatureFromVapourK(double temperatureK, double vapourPressureHpa) {
        return 2840 / (3.5 * Math.log(temperatureK) - Math.log(vapourPressureHpa) - 4.805) + 55;
    }

    /** The same from temperature and relative humidity in percent, K (eq. 22). */
    public static double condensationTemperatureFromHumidityK(double temperatureK, double humidityPercent) {
        return 1 / (1 / (temperatureK - 55) - Math.log(humidityPercent / 100) / 2840) + 55;
    }

    /** Equivalent potential temperature, K (eq. 39, the more exact one). */
    public static double equivalentPotentialTemperatureK(double temperatureK, double dewPointK, double pressureHpa) {
        double vapour = saturationPressureHpa(dewPointK - ZERO_CELSIUS_K);
        double r = mixingRatio(vapour, pressureHpa);
        double level = condensationTemperatureK(temperatureK, dewPointK);
        double dry = temperatureK * Math.pow(REFERENCE_PRESSURE_HPA / (pressureHpa - vapour), KAPPA)
                * Math.pow(temperatureK / level, 0.28 * r);
        return dry * Math.exp((3036 / level - 1.78) * r * (1 + 0.448 * r));
    }

    /** Equivalent potential temperature, K (eq. 43, the simpler one). */
    public static double equivalentPotentialTemperatureSimpleK(double temperatureK, double dewPointK,
                                                              double pressureHpa) {
        double gPerKg = 1000 * mixingRatio(saturationPressureHpa(dewPointK - ZERO_CELSIUS_K), pressureHpa);
        double level = condensationTemperatureK(temperatureK, dewPointK);
        return temperatureK * Math.pow(REFERENCE_PRESSURE_HPA / pressureHpa, 0.2854 * (1 - 0.28e-3 * gPerKg))
                * Math.exp((3.376 / level - 0.00254) * gPerKg * (1 + 0.81e-3 * gPerKg));
    }

    /** Density of air, kg m⁻³. */
    public static double densityKgM3(double virtualTemperatureK, double pressureHpa) {
        return 100 * pressureHpa / (DRY_GAS_CONSTANT * virtualTemperatureK);
    }
}
