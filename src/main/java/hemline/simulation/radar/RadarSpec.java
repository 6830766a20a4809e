package hemline.simulation.radar;

import hemline.geodesy.BeamGeometry;
import hemline.sweep.RadarSite;

/**
 * An invented radar.
 *
 * @param site      name, position and antenna altitude
 * @param dish      its antenna and how it turns
 * @param gates     its gates
 * @param receiver  what it can hear
 * @param timing    when its lowest sweeps come
 */
public record RadarSpec(RadarSite site, Dish dish, Gates gates, Receiver receiver, Timing timing) {

    /**
     * @param beamWidthDeg one-way half-power width, degrees
     * @param elevationDeg elevation of the lowest sweep, degrees
     * @param aboveGroundM height of the antenna above the ground, m
     * @param rays         rays of a full turn
     * @param turnDegS     speed of rotation, degrees per second
     * @param jitterDeg    standard deviation of a ray's azimuth about its nominal place, degrees
     */
    public record Dish(double beamWidthDeg, double elevationDeg, double aboveGroundM, int rays, double turnDegS,
                       double jitterDeg) {
        public Dish {
            // Files hold these in single precision.
            beamWidthDeg = (float) beamWidthDeg;
            elevationDeg = (float) elevationDeg;
        }

        /** Nominal angle between rays, degrees. */
        public double stepDeg() {
            return 360.0 / rays;
        }
    }

    /**
     * @param firstCentreM slant range of the centre of the first gate, m
     * @param spacingM     length of a gate, m
     * @param count        gates of a ray
     */
    public record Gates(double firstCentreM, double spacingM, int count) {
    }

    /**
     * @param noiseAtOneKmDbz reflectivity at 1 km whose echo equals the receiver's noise, dBZ; at range r it is this
     *                        plus 20 log₁₀ (r / 1 km)
     * @param thresholdDb     an echo is reported when its power without noise is this far above the noise, dB
     * @param samples         independent samples averaged for a gate
     * @param packing         how values are written
     * @param nyquistMs       unambiguous velocity, m s⁻¹
     */
    public record Receiver(double noiseAtOneKmDbz, double thresholdDb, int samples, Packing packing, double nyquistMs) {
        public Receiver {
            nyquistMs = (float) nyquistMs;
        }

        public Packing velocityPacking() {
            return packing.forVelocity(nyquistMs);
        }
    }

    /**
     * @param intervalS time between lowest sweeps, s
     * @param jitterS   standard deviation of a sweep's time about the even beat, s
     * @param holeShare share of sweeps that are lost
     */
    public record Timing(double intervalS, double jitterS, double holeShare) {
    }

    public BeamGeometry beam() {
        return new BeamGeometry(dish.elevationDeg(), site.altitudeM());
    }

    /** Slant range of a gate's centre, m. */
    public double slantRangeM(int gate) {
        return gates.firstCentreM() + gate * gates.spacingM();
    }
}
