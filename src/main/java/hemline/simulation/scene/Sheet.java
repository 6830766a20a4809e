package hemline.simulation.scene;

import hemline.geometry.Point;

/**
 * Widespread rain, with snow above the melting level and a bright band just below it.
 *
 * @param startKm    its middle at the scene's start
 * @param driftMs    its motion, m s⁻¹ east and north
 * @param life       its coming and going
 * @param dbz        mean reflectivity of the rain, dBZ
 * @param lumpsDb    standard deviation of its texture, dB
 * @param radiusKm   half its length, km
 * @param stretch    length over width
 * @param longDeg    compass bearing of its length
 * @param meltingKm  height of the melting level above the ground, km; infinite for rain to any height
 * @param brightDb   how far the bright band stands over the rain, dB
 * @param number     tells sheets apart
 */
public record Sheet(Point startKm, Point driftMs, Life life, double dbz, double lumpsDb, double radiusKm, double stretch,
                    double longDeg, double meltingKm, double brightDb, long number) implements EchoSpec {
    /** The bright band reaches this far below the melting level, km. */
    public static final double BRIGHT_DEPTH_KM = 0.5;
}
