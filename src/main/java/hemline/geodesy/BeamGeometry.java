package hemline.geodesy;

/**
 * Where the beam is: height and ground range of a gate under the 4/3 effective earth radius.
 *
 * <p>Doviak and Zrnić (1993), Doppler Radar and Weather Observations, 2nd ed., eqs. 2.28b and 2.28c.
 * All distances in metres, angles in degrees.
 *
 * @param elevationDeg     elevation of the beam centre above the horizon, degrees
 * @param antennaAltitudeM antenna height above mean sea level, m
 * @param earthRadiusM     true earth radius at sea level under the radar, m
 */
public record BeamGeometry(double elevationDeg, double antennaAltitudeM, double earthRadiusM) {
    /** Effective over true earth radius in a standard atmosphere. */
    public static final double EFFECTIVE_RADIUS_FACTOR = 4.0 / 3.0;
    /** Mean earth radius R₁ of the IUGG, m; a local radius changes heights by under 1.5 m at 100 km. */
    public static final double MEAN_EARTH_RADIUS_M = 6_371_008.77;

    public BeamGeometry(double elevationDeg, double antennaAltitudeM) {
        this(elevationDeg, antennaAltitudeM, MEAN_EARTH_RADIUS_M);
    }

    private double effectiveRadiusM() {
        return EFFECTIVE_RADIUS_FACTOR * (earthRadiusM + antennaAltitudeM);
    }

    /** Height of the beam centre above the antenna at a slant range, m. */
    public double heightAboveAntennaM(double slantRangeM) {
        double a = effectiveRadiusM();
        double sin = Math.sin(Math.toRadians(elevationDeg));
        return Math.sqrt(slantRangeM * slantRangeM + a * a + 2 * slantRangeM * a * sin) - a;
    }

    /** Height of the beam centre above mean sea level at a slant range, m. */
    public double heightAboveSeaM(double slantRangeM) {
        return antennaAltitudeM + heightAboveAntennaM(slantRangeM);
    }

    /** Distance along the earth's surface under the gate at a slant range, m. */
    public double groundRangeM(double slantRangeM) {
        double a = effectiveRadiusM();
        double cos = Math.cos(Math.toRadians(elevationDeg));
        return a * Math.asin(slantRangeM * cos / (a + heightAboveAntennaM(slantRangeM)));
    }

    /** Slant range of the gate above a ground range, m: the inverse of {@link #groundRangeM}. */
    public double slantRangeM(double groundRangeM) {
        double a = effectiveRadiusM();
        double angle = groundRangeM / a;
        double elevation = Math.toRadians(elevationDeg);
        // Sine rule in the triangle of earth centre, antenna and gate.
        return a * Math.sin(angle) / Math.cos(elevation + angle);
    }
}
