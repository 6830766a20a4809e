package hemline.simulation.scene;

import hemline.geometry.Point;
import hemline.simulation.random.Texture;
import java.util.List;

/**
 * Clear air with insects in it.
 *
 * @param baseDbz      mean reflectivity, dBZ
 * @param depthKm      depth of the insect layer above the ground, km
 * @param octaves      its lumps, dB
 * @param rolls        bands along the wind
 * @param gradientDb   change of the mean over 100 km, dB
 * @param gradientDeg  compass bearing toward which it rises
 * @param trendDbPerH  change with time, dB per hour
 */
public record Air(double baseDbz, double depthKm, List<Texture.Octave> octaves, List<Rolls> rolls, double gradientDb,
                  double gradientDeg, double trendDbPerH) {
    public Air {
        octaves = List.copyOf(octaves);
        rolls = List.copyOf(rolls);
        if (!(depthKm > 0)) {
            throw new IllegalArgumentException("the insect layer needs a depth above 0 km, got " + depthKm);
        }
    }

    /**
     * Horizontal convective rolls: parallel bands of insects along the wind (Weckwerth et al. 1997, Mon. Wea. Rev.
     * 125:505-526). They drift along themselves with the wind and slowly across.
     *
     * @param alongDeg  compass bearing of the bands
     * @param spacingKm distance between bands, km
     * @param ampDb     height of a band over the mean, dB
     * @param driftMs   motion across the bands, m s⁻¹
     * @param centreKm  middle of the area they fill
     * @param radiusKm  its radius, km
     */
    public record Rolls(double alongDeg, double spacingKm, double ampDb, double driftMs, Point centreKm,
                        double radiusKm) {
    }
}
