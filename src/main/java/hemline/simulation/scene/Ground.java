package hemline.simulation.scene;

import hemline.geometry.Point;

/**
 * A patch of ground echo that the clutter filter leaves: it stands still and flickers.
 *
 * @param centreKm  middle of the patch
 * @param radiusKm  its extent, km
 * @param peakDbz   its strongest lumps, dBZ
 * @param coverage  share of the patch with echo, 0 to 1
 * @param grainKm   size of its lumps, km
 * @param flickerDb change from sweep to sweep, dB
 * @param number    tells patches apart
 */
public record Ground(Point centreKm, double radiusKm, double peakDbz, double coverage, double grainKm,
                     double flickerDb, long number) implements EchoSpec {
    public Ground {
        if (!(radiusKm > 0) || !(grainKm > 0) || !(coverage > 0 && coverage <= 1)) {
            throw new IllegalArgumentException("ground needs sizes above 0 km and a coverage in (0, 1], got "
                    + radiusKm + " km, " + grainKm + " km, " + coverage);
        }
    }
}
