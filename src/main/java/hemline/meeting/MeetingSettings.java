package hemline.meeting;

/**
 * How meetings and arrivals are found.
 *
 * @param contactKm    distance at which two lines count as touching, km
 * @param extendKm     length by which ends are carried on smoothly for the test of contact, km
 * @param minCrossDeg  smallest angle between the directions of motion of two lines that meet, degrees
 * @param horizonS     how far ahead meetings and arrivals are looked for, s
 * @param draws        number of sampled futures
 * @param seed         of the sampling
 * @param minProbability least probability at which an expected meeting is told
 */
public record MeetingSettings(double contactKm, double extendKm, double minCrossDeg, double horizonS, int draws,
                              long seed, double minProbability) {
    public MeetingSettings {
        if (!(contactKm > 0 && contactKm <= 10)) {
            throw new IllegalArgumentException("the distance of contact must be within 0..10 km, got " + contactKm);
        }
        if (!(extendKm >= 0 && extendKm <= 50)) {
            throw new IllegalArgumentException("ends are carried on by 0..50 km, got " + extendKm);
        }
        if (!(minCrossDeg >= 0 && minCrossDeg < 180)) {
            throw new IllegalArgumentException("the least angle must be within 0..180 degrees, got " + minCrossDeg);
        }
        if (!(horizonS > 0 && horizonS <= 6 * 3600)) {
            throw new IllegalArgumentException("the horizon must be within 0..6 h, got " + horizonS + " s");
        }
        if (draws < 10) {
            throw new IllegalArgumentException("at least 10 draws are needed, got " + draws);
        }
        if (!(minProbability >= 0 && minProbability <= 1)) {
            throw new IllegalArgumentException("a probability lies within 0..1, got " + minProbability);
        }
    }

    public static MeetingSettings defaults() {
        return new MeetingSettings(1.5, 10, 40, 3600, 200, 20_260_101, 0.1);
    }

    public MeetingSettings withHorizonS(double seconds) {
        return new MeetingSettings(contactKm, extendKm, minCrossDeg, seconds, draws, seed, minProbability);
    }

    public MeetingSettings withSeed(long newSeed) {
        return new MeetingSettings(contactKm, extendKm, minCrossDeg, horizonS, draws, newSeed, minProbability);
    }
}
