package hemline.simulation.scene;

import hemline.simulation.front.RingCurve;

/**
 * Animals leaving a roost at dawn or dusk: a broad ring that grows from a point and thins out. It is no boundary.
 *
 * @param curve    the middle of the ring
 * @param peakDbz  at the start of its growth, dBZ
 * @param sdKm     Gaussian half width at the start, km; it widens by a quarter of the growth
 * @param depthKm  depth of the flying animals above the ground, km
 * @param lopsided share by which the stronger side exceeds the mean, 0 to 1
 * @param towardDeg compass bearing of the stronger side
 * @param life     its coming and going
 * @param number   tells roosts apart
 */
public record Roost(RingCurve curve, double peakDbz, double sdKm, double depthKm, double lopsided, double towardDeg,
                    Life life, long number) implements EchoSpec {
}
