package hemline.outflow;

import hemline.boundary.station.AirChange;
import hemline.boundary.station.AirMeans;
import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationSeries;
import hemline.numerics.Estimate;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** Means before and after a passage and what changed between them. */
final class PassageMeans {
    /** Least standard deviations of a mean, what sensors repeat to. Common practice, no source. */
    private static final double LEAST_SD_K = 0.2;
    private static final double LEAST_SD_HPA = 0.1;
    private static final double DEFAULT_PRESSURE_HPA = 1000;
    /** Readings a few minutes apart are not independent: one in so many counts. Common practice, no source. */
    private static final double READINGS_PER_INDEPENDENT = 3;

    private final StationSeries series;
    private final double standInHpa;

    PassageMeans(StationSeries series) {
        this.series = series;
        standInHpa = Double.isNaN(series.altitudeM()) ? DEFAULT_PRESSURE_HPA
                : StandardAtmosphere.pressureHpa(series.altitudeM());
    }

    /**
     * @param beforeEndMs  end of the time before
     * @param afterStartMs start of the time after
     * @return empty when either time has no observation
     */
    Optional<AirChange> change(long beforeEndMs, long afterStartMs, long lengthMs) {
        List<StationObservation> before = within(beforeEndMs - lengthMs, beforeEndMs);
        List<StationObservation> after = within(afterStartMs, afterStartMs + lengthMs);
        if (before.isEmpty() || after.isEmpty()) {
            return Optional.empty();
        }
        AirMeans first = means(before);
        AirMeans second = means(after);
        boolean assumed = Double.isNaN(first.pressureHpa()) || Double.isNaN(second.pressureHpa());
        return Optional.of(new AirChange(first, second,
                fall(before, after, StationObservation::temperatureC, LEAST_SD_K),
                fall(before, after, this::thetaVK, LEAST_SD_K), fall(before, after, this::thetaEK, 3 * LEAST_SD_K),
                fall(before, after, StationObservation::pressureHpa, LEAST_SD_HPA).times(-1),
                shift(before, after, first, second), assumed));
    }

    private List<StationObservation> within(long fromMs, long toMs) {
        return series.observations().stream().filter(o -> o.timeMs() >= fromMs && o.timeMs() <= toMs).toList();
    }

    private Optional<AirState> state(StationObservation o) {
        if (Double.isNaN(o.temperatureC())) {
            return Optional.empty();
        }
        double pressure = Double.isNaN(o.pressureHpa()) ? standInHpa : o.pressureHpa();
        return Optional.of(AirState.of(o.temperatureC(), Math.min(o.dewPointC(), o.temperatureC()), pressure));
    }

    /** Dry where the humidity is not known: the fall is then that of potential temperature. */
    private double thetaVK(StationObservation o) {
        return state(o).map(AirState::densityPotentialTemperatureK).orElse(Double.NaN);
    }

    private double thetaEK(StationObservation o) {
        return state(o).map(AirState::equivalentPotentialTemperatureK).orElse(Double.NaN);
    }

    private AirMeans means(List<StationObservation> some) {
        double east = mean(some, o -> o.windTowardMs(90));
        double north = mean(some, o -> o.windTowardMs(0));
        double from = Math.toDegrees(Math.atan2(-east, -north));
        return new AirMeans(some.size(), mean(some, StationObservation::temperatureC),
                mean(some, StationObservation::dewPointC), mean(some, StationObservation::pressureHpa),
                mean(some, this::thetaVK), mean(some, this::thetaEK), Math.hypot(east, north),
                from < 0 ? from + 360 : from);
    }

    private static double mean(List<StationObservation> some, ToDoubleFunction<StationObservation> of) {
        return some.stream().mapToDouble(of).filter(v -> !Double.isNaN(v)).average().orElse(Double.NaN);
    }

    private static Estimate fall(List<StationObservation> before, List<StationObservation> after,
                                 ToDoubleFunction<StationObservation> of, double leastSd) {
        return meanOf(before, of, leastSd).minus(meanOf(after, of, leastSd));
    }

    private static Estimate meanOf(List<StationObservation> some, ToDoubleFunction<StationObservation> of,
                                   double leastSd) {
        double[] values = some.stream().mapToDouble(of).filter(v -> !Double.isNaN(v)).toArray();
        if (values.length == 0) {
            return Estimate.UNKNOWN;
        }
        double mean = mean(some, of);
        double squares = 0;
        for (double value : values) {
            squares += (value - mean) * (value - mean);
        }
        double sd = values.length < 2 ? 0 : Math.sqrt(squares / (values.length - 1));
        return new Estimate(mean, Math.hypot(leastSd, sd / Math.sqrt(Math.max(1,
                values.length / READINGS_PER_INDEPENDENT))));
    }

    /** Unknown where either mean wind is too weak to have a direction. */
    private static Estimate shift(List<StationObservation> before, List<StationObservation> after, AirMeans first,
                                  AirMeans second) {
        double sdBefore = directionSdDeg(before, first);
        double sdAfter = directionSdDeg(after, second);
        if (!(sdBefore < 60) || !(sdAfter < 60)) {
            return Estimate.UNKNOWN;
        }
        double turn = (second.windFromDeg() - first.windFromDeg()) % 360;
        double shift = turn > 180 ? turn - 360 : turn <= -180 ? turn + 360 : turn;
        return new Estimate(shift, Math.hypot(sdBefore, sdAfter));
    }

    private static double directionSdDeg(List<StationObservation> some, AirMeans mean) {
        Estimate across = meanOf(some, o -> o.windTowardMs(mean.windFromDeg() + 90), 0.3);
        return Math.toDegrees(across.sd() / mean.windSpeedMs());
    }
}
