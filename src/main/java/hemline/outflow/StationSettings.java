package hemline.outflow;

/**
 * How passages over stations are looked for.
 *
 * @param positionSdKm  standard deviation of a tracked line's place, km, where its own scatter is not larger
 * @param pastEndKm     how far past the end of a line a station still counts as passed, km
 * @param maxStepMinutes longest gap between two sweeps across which a passage is interpolated, minutes
 * @param searchMinutes the station's own signal is looked for within this of the track's passage, minutes
 * @param meanMinutes   length of the means before and after, minutes
 * @param maxGapMinutes longest gap between observations around a passage, minutes
 */
public record StationSettings(double positionSdKm, double pastEndKm, double maxStepMinutes, double searchMinutes,
                              double meanMinutes, double maxGapMinutes) {
    public StationSettings {
        above0("position standard deviation, km", positionSdKm);
        above0("distance past the end, km", pastEndKm);
        above0("longest step between sweeps, minutes", maxStepMinutes);
        above0("search, minutes", searchMinutes);
        above0("length of means, minutes", meanMinutes);
        above0("longest gap, minutes", maxGapMinutes);
    }

    private static void above0(String what, double value) {
        if (!(value > 0)) {
            throw new IllegalArgumentException(what + " must be above 0, got " + value);
        }
    }

    public static StationSettings defaults() {
        return new StationSettings(0.4, 2, 20, 15, 10, 15);
    }
}
