package hemline.simulation.scene;

import hemline.geometry.Point;
import java.util.List;

/** Something between the scene and the numbers written down. */
public sealed interface FaultSpec {

    /**
     * An obstacle that takes part of the beam away beyond its range, everywhere in a sector.
     *
     * @param fromDeg  first azimuth, degrees clockwise from north
     * @param widthDeg width of the sector, degrees
     * @param rangeKm  distance of the obstacle, km
     * @param lossDb   two-way loss in its middle, dB; above some 25 dB nothing is left
     * @param ragged   true when the loss changes from ray to ray as a skyline does
     */
    record Obstacle(double fromDeg, double widthDeg, double rangeKm, double lossDb, boolean ragged)
            implements FaultSpec {
    }

    /**
     * A sector written with another gain than the rest.
     *
     * @param fromDeg  first azimuth, degrees clockwise from north
     * @param widthDeg width, degrees
     * @param gainDb   dB
     */
    record SectorGain(double fromDeg, double widthDeg, double gainDb) implements FaultSpec {
    }

    /**
     * Rays that are lost now and then.
     *
     * @param share share of rays in a sweep, 0 to 0.2
     */
    record LostRays(double share) implements FaultSpec {
    }

    /**
     * Rays that are written a second time in place of the next one.
     *
     * @param share share of rays in a sweep
     */
    record RepeatedRays(double share) implements FaultSpec {
    }

    /**
     * Interference of another transmitter: whole or part rays with power that does not fall with range.
     *
     * @param perSweep     mean number a sweep
     * @param aboveNoiseDb mean power above the receiver's noise, dB
     */
    record Spikes(double perSweep, double aboveNoiseDb) implements FaultSpec {
    }

    /**
     * The sun low over the horizon: one or two rays with even noise to any range.
     *
     * @param azimuthDeg   azimuth at the scene's start, degrees clockwise from north
     * @param turnDegH     how it moves, degrees per hour
     * @param aboveNoiseDb power above the receiver's noise in the middle of the beam, dB
     * @param fromS        first time, s after the scene's start
     * @param toS          last time, s
     */
    record SunStrobe(double azimuthDeg, double turnDegH, double aboveNoiseDb, double fromS, double toS)
            implements FaultSpec {
    }

    /**
     * Echo of storms beyond the unambiguous range, shown at a shorter one: radial streaks that tremble from sweep to
     * sweep.
     *
     * @param startKm   middle of the streak as shown, at the scene's start
     * @param driftMs   its motion as shown, m s⁻¹ east and north
     * @param lengthKm  half length along the ray, km
     * @param widthDeg  half width, degrees
     * @param dbz       as shown, dBZ
     * @param number    tells streaks apart
     */
    record SecondTrip(Point startKm, Point driftMs, double lengthKm, double widthDeg, double dbz, long number)
            implements FaultSpec {
    }

    /**
     * Rings of raised noise at fixed ranges, from the receiver itself.
     *
     * @param rangesKm     slant ranges, km
     * @param aboveNoiseDb power above the receiver's noise, dB
     */
    record RangeRings(List<Double> rangesKm, double aboveNoiseDb) implements FaultSpec {
        public RangeRings {
            rangesKm = List.copyOf(rangesKm);
        }
    }

    /**
     * Single gates with an echo of their own: birds, aircraft, noise.
     *
     * @param share   share of gates in a sweep
     * @param meanDbz mean of their reflectivity, dBZ; the standard deviation is 6 dB
     */
    record Speckles(double share, double meanDbz) implements FaultSpec {
    }

    /**
     * Loss in rain, growing along the ray.
     *
     * @param oneWayDbKm   specific loss a of k = a Rᵇ, dB km⁻¹ one way, with R in mm h⁻¹ from Z = 200 R¹·⁶ (Marshall and
     *                     Palmer 1948, J. Meteor. 5:165-166)
     * @param rateExponent b
     */
    record RainLoss(double oneWayDbKm, double rateExponent) implements FaultSpec {
    }
}
