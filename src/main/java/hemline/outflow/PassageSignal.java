package hemline.outflow;

import hemline.boundary.station.Onset;
import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationSignal;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/**
 * The passage in a station's own record: a rise of the wind toward the boundary's motion, a fall of temperature, a rise
 * of pressure. The passage is the wind's rise; where there is none the fall of temperature, else the rise of pressure
 * (the pressure can begin to rise before the edge: Wakimoto 1982, Mon. Weather Rev. 110:1060). The wind's rise is taken
 * as a step, at its middle where it takes a while; those of temperature and pressure as ramps, at their start.
 */
final class PassageSignal {
    private static final double WINDOW_S = 1800;
    private static final double LONGEST_RAMP_S = 1200;
    private static final double LEAST_WIND_MS = 1.5;
    private static final double LEAST_FALL_K = 0.5;
    private static final double LEAST_RISE_HPA = 0.2;

    private PassageSignal() {
    }

    /**
     * @param observations around the passage
     * @param aroundMs     when the track passed
     * @param bearingDeg   of the boundary's motion
     * @param searchS      how far from that to look, s
     */
    static Optional<StationSignal> find(List<StationObservation> observations, long aroundMs, double bearingDeg,
                                        double searchS) {
        List<StationObservation> near = observations.stream()
                .filter(o -> Math.abs(o.timeMs() - aroundMs) <= 1000 * (WINDOW_S + searchS)).toList();
        double[] time = near.stream().mapToDouble(o -> (o.timeMs() - aroundMs) / 1000.0).toArray();
        Optional<Onset> wind = onset(near, time, o -> o.windTowardMs(bearingDeg), aroundMs, searchS, LEAST_WIND_MS, 1,
                0);
        Optional<Onset> temperature = onset(near, time, StationObservation::temperatureC, aroundMs, searchS, LEAST_FALL_K,
                -1, LONGEST_RAMP_S);
        Optional<Onset> pressure = onset(near, time, StationObservation::pressureHpa, aroundMs, searchS, LEAST_RISE_HPA,
                1, LONGEST_RAMP_S);
        Optional<Onset> chosen = wind.or(() -> temperature).or(() -> pressure);
        String from = wind.isPresent() ? "wind" : temperature.isPresent() ? "temperature" : "pressure";
        return chosen.map(o -> new StationSignal(o.startMs(), o.startSdS(), from, wind, temperature, pressure));
    }

    private static Optional<Onset> onset(List<StationObservation> near, double[] time,
                                         ToDoubleFunction<StationObservation> of, long aroundMs, double searchS,
                                         double least, int sign, double longestS) {
        double[] value = near.stream().mapToDouble(of).toArray();
        return RampFit.of(time, value, -searchS, searchS, least, sign, longestS).map(fit -> new Onset(
                aroundMs + Math.round(1000 * fit.startS()), fit.startSdS(), aroundMs + Math.round(1000 * fit.endS()),
                fit.change()));
    }
}
