package hemline.simulation.scene;

import hemline.geometry.Point;

/**
 * A rain cell.
 *
 * @param startKm   its centre at {@code life.fromS()}
 * @param driftMs   its motion, m s⁻¹ east and north
 * @param life      its growth and decay
 * @param peakDbz   reflectivity of the grown core, dBZ
 * @param radiusKm  mean distance from the core at which it has lost 12 dB, km
 * @param stretch   long over short axis of its shape
 * @param longDeg   compass bearing of the long axis
 * @param number    tells cells apart in their ragged edges
 */
public record Cell(Point startKm, Point driftMs, Life life, double peakDbz, double radiusKm, double stretch,
                   double longDeg, long number) implements EchoSpec {
}
