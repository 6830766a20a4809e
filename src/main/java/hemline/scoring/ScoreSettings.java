package hemline.scoring;

/**
 * What counts as a match. All bounds are inclusive.
 *
 * @param toleranceKm     greatest distance between a found line and the truth, km, on either side and past the ends
 * @param maxAngleDeg     greatest angle between their directions, degrees
 * @param plainFrom       least detectability that has to be found, 0 to 1
 * @param sampleKm        length of the elements lines are cut into, km
 * @param decoyKm         false length this near to a decoy is put down to it, km
 * @param meetingKm       greatest distance between a found and a true meeting, km
 * @param meetingMinutes  greatest time between them, minutes
 * @param replicates      bootstrap replicates; 0 for no intervals
 * @param seed            of the bootstrap
 */
public record ScoreSettings(double toleranceKm, double maxAngleDeg, double plainFrom, double sampleKm, double decoyKm,
                            double meetingKm, double meetingMinutes, int replicates, long seed) {
    public ScoreSettings {
        above0("tolerance, km", toleranceKm);
        above0("greatest angle, degrees", maxAngleDeg);
        above0("sample length, km", sampleKm);
        above0("decoy distance, km", decoyKm);
        above0("meeting distance, km", meetingKm);
        above0("meeting time, minutes", meetingMinutes);
        if (maxAngleDeg > 90) {
            throw new IllegalArgumentException("greatest angle must be at most 90 degrees, got " + maxAngleDeg);
        }
        if (!(plainFrom >= 0 && plainFrom <= 1)) {
            throw new IllegalArgumentException("least detectability must lie within 0..1, got " + plainFrom);
        }
        if (replicates < 0) {
            throw new IllegalArgumentException("bootstrap replicates must be at least 0, got " + replicates);
        }
    }

    private static void above0(String what, double value) {
        if (!(value > 0)) {
            throw new IllegalArgumentException(what + " must be above 0, got " + value);
        }
    }

    /** 2 km, 30 degrees, detectability 0.5, meetings within 8 km and 10 minutes. */
    public static ScoreSettings defaults() {
        return new ScoreSettings(2, 30, 0.5, 0.25, 4, 8, 10, 1000, 1);
    }

    public ScoreSettings withToleranceKm(double km) {
        return new ScoreSettings(km, maxAngleDeg, plainFrom, sampleKm, decoyKm, meetingKm, meetingMinutes, replicates,
                seed);
    }

    public ScoreSettings withMeetings(double km, double minutes) {
        return new ScoreSettings(toleranceKm, maxAngleDeg, plainFrom, sampleKm, decoyKm, km, minutes, replicates, seed);
    }

    public ScoreSettings withBootstrap(int newReplicates, long newSeed) {
        return new ScoreSettings(toleranceKm, maxAngleDeg, plainFrom, sampleKm, decoyKm, meetingKm, meetingMinutes,
                newReplicates, newSeed);
    }
}
