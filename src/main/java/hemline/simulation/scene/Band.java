package hemline.simulation.scene;

import hemline.simulation.front.BowCurve;

/**
 * A narrow band of rain that moves with the wind: looks like a line, is rain.
 *
 * @param curve     its axis
 * @param dbz       reflectivity on the axis, dBZ
 * @param sdKm      Gaussian half width, km
 * @param raggedDb  standard deviation along and across it, dB
 * @param life      its coming and going
 * @param number    tells bands apart
 */
public record Band(BowCurve curve, double dbz, double sdKm, double raggedDb, Life life, long number)
        implements EchoSpec {
}
