package hemline.simulation.scene;

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
     * Rays that are lost now and then.
     *
     * @param share share of rays in a sweep, 0 to 0.2
     */
    record LostRays(double share) implements FaultSpec {
    }

    /**
     * Interference of another transmitter: whole or part rays with power that does not fall with range.
     *
     * @param perSweep  mean number a sweep
     * @param aboveNoiseDb mean power above the receiver's noise, dB
     */
    record Spikes(double perSweep, double aboveNoiseDb) implements FaultSpec {
    }
}
