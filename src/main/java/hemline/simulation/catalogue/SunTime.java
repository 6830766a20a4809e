package hemline.simulation.catalogue;

import org.apache.commons.math3.util.FastMath;

/**
 * When and where the sun stands at an elevation, to a few tenths of a degree: declination and equation of time after
 * Cooper (1969) and Duffie and Beckman, Solar Engineering of Thermal Processes, eqs. 1.5.3 and 1.6.1 (from memory).
 */
final class SunTime {
    private final double latitudeRad;
    private final double declinationRad;
    private final double equationMin;

    /** @param dayOfYear 1 for 1 January */
    SunTime(double latitudeDeg, int dayOfYear) {
        latitudeRad = FastMath.toRadians(latitudeDeg);
        declinationRad = FastMath.toRadians(23.45) * FastMath.sin(2 * Math.PI * (284 + dayOfYear) / 365);
        double b = 2 * Math.PI * (dayOfYear - 81) / 364;
        equationMin = 9.87 * FastMath.sin(2 * b) - 7.53 * FastMath.cos(b) - 1.5 * FastMath.sin(b);
    }

    /** Mean solar hour, 0 to 24, at which the sun passes an elevation; noon or midnight where it never does. */
    double hourAt(double elevationDeg, boolean morning) {
        double cos = (FastMath.sin(FastMath.toRadians(elevationDeg)) - FastMath.sin(latitudeRad) * FastMath.sin(declinationRad))
                / (FastMath.cos(latitudeRad) * FastMath.cos(declinationRad));
        double hours = FastMath.toDegrees(FastMath.acos(Math.max(-1, Math.min(1, cos)))) / 15;
        return 12 - equationMin / 60 + (morning ? -hours : hours);
    }

    /** Its azimuth at that time, degrees clockwise from north. */
    double azimuthDegAt(double elevationDeg, boolean morning) {
        double elevation = FastMath.toRadians(elevationDeg);
        double cos = (FastMath.sin(declinationRad) - FastMath.sin(elevation) * FastMath.sin(latitudeRad))
                / (FastMath.cos(elevation) * FastMath.cos(latitudeRad));
        double east = FastMath.toDegrees(FastMath.acos(Math.max(-1, Math.min(1, cos))));
        return morning ? east : 360 - east;
    }
}
