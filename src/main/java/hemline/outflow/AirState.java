package hemline.outflow;

/**
 * Air at one place.
 *
 * @param temperatureC      °C, −90 to 60
 * @param dewPointC         °C, at most 0.5 above the temperature (sensors differ by that much in fog); NaN when unknown
 * @param pressureHpa       at the station, not reduced to sea level, hPa, 300 to 1100
 * @param condensateGPerKg  mixing ratio of rain and cloud water carried along, g kg⁻¹, 0 to 30
 */
public record AirState(double temperatureC, double dewPointC, double pressureHpa, double condensateGPerKg) {
    public AirState {
        within("temperature, degrees C", temperatureC, -90, 60);
        within("pressure, hPa", pressureHpa, 300, 1100);
        within("condensate, g/kg", condensateGPerKg, 0, 30);
        if (dewPointC < -100 || dewPointC > temperatureC + 0.5) {
            throw new IllegalArgumentException("dew point must lie within -100 C and the temperature, "
                    + temperatureC + " C, got " + dewPointC);
        }
    }

    private static void within(String what, double value, double low, double high) {
        if (!(value >= low && value <= high)) {
            throw new IllegalArgumentException(what + " must lie within " + low + ".." + high + ", got " + value);
        }
    }

    public static AirState of(double temperatureC, double dewPointC, double pressureHpa) {
        return new AirState(temperatureC, dewPointC, pressureHpa, 0);
    }

    public AirState withCondensate(double gPerKg) {
        return new AirState(temperatureC, dewPointC, pressureHpa, gPerKg);
    }

    public boolean hasHumidity() {
        return !Double.isNaN(dewPointC);
    }

    private double temperatureK() {
        return temperatureC + MoistAir.ZERO_CELSIUS_K;
    }

    /** Mixing ratio of vapour, kg kg⁻¹; 0 when the humidity is unknown. */
    public double mixingRatio() {
        return hasHumidity() ? MoistAir.mixingRatio(MoistAir.saturationPressureHpa(dewPointC), pressureHpa) : 0;
    }

    /** Density potential temperature, K: virtual potential temperature less the weight of the condensate. */
    public double densityPotentialTemperatureK() {
        return MoistAir.densityTemperatureK(MoistAir.potentialTemperatureK(temperatureK(), pressureHpa),
                mixingRatio(), condensateGPerKg / 1000);
    }

    /** Equivalent potential temperature, K; NaN when the humidity is unknown. */
    public double equivalentPotentialTemperatureK() {
        return hasHumidity() ? MoistAir.equivalentPotentialTemperatureK(temperatureK(),
                Math.min(dewPointC, temperatureC) + MoistAir.ZERO_CELSIUS_K, pressureHpa) : Double.NaN;
    }

    /** Density of the air with its vapour, kg m⁻³. */
    public double densityKgM3() {
        return MoistAir.densityKgM3(MoistAir.densityTemperatureK(temperatureK(), mixingRatio(), 0), pressureHpa);
    }
}
