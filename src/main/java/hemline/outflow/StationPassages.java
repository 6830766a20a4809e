package hemline.outflow;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.station.AirChange;
import hemline.boundary.station.AirMeans;
import hemline.boundary.station.Onset;
import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationPassage;
import hemline.boundary.station.StationSeries;
import hemline.boundary.station.StationSignal;
import hemline.boundary.station.TheoryCheck;
import hemline.geodesy.LocalPlane;
import hemline.numerics.Estimate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/** The passages of tracked boundaries over stations: when, what changed, and how the speed compares with theory. */
public final class StationPassages {
    /** Depth of an outflow where no pressure rise tells it: the mean head of 30 fronts, Mahoney (1988). */
    private static final Estimate ASSUMED_DEPTH_M = Estimate.relative(1300, TheoryInput.DEPTH_SHARE);
    /** Left out before the first sign of a passage: it may have begun a little earlier. */
    private static final long GUARD_MS = 120_000;
    /** The time after begins at most this long after the passage, while the air is still that of the front. */
    private static final long LATEST_AFTER_MS = 1_200_000;

    private final LocalPlane plane;
    private final StationSettings settings;

    /** @param plane centred at the radar */
    public StationPassages(LocalPlane plane, StationSettings settings) {
        this.plane = plane;
        this.settings = settings;
    }

    /** Every passage seen within the loop, by station name, then time. */
    public List<StationPassage> find(List<Track> tracks, List<StationSeries> stations) {
        List<StationPassage> found = new ArrayList<>();
        for (StationSeries station : stations) {
            for (Track track : tracks) {
                TrackCrossing.of(track, plane.toPlane(station.place()), settings)
                        .ifPresent(crossing -> found.add(passage(track, station, crossing)));
            }
        }
        found.sort(Comparator.comparing(StationPassage::station).thenComparingLong(StationPassage::trackTimeMs)
                .thenComparing(StationPassage::trackId));
        return found;
    }

    private StationPassage passage(Track track, StationSeries station, TrackCrossing crossing) {
        String gap = gapAround(station, crossing.timeMs());
        if (!gap.isEmpty()) {
            return new StationPassage(station.name(), track.id(), crossing.timeMs(), crossing.timeSdS(),
                    crossing.bearingDeg(), crossing.speed(), Optional.empty(), Optional.empty(), Optional.empty(), gap);
        }
        double searchS = 60 * settings.searchMinutes() + 2 * crossing.timeSdS();
        Optional<StationSignal> signal = PassageSignal.find(station.observations(), crossing.timeMs(),
                crossing.bearingDeg(), searchS);
        Optional<AirChange> change = change(station, crossing, signal);
        List<String> notes = new ArrayList<>();
        if (signal.isEmpty()) {
            notes.add("no change of wind, temperature or pressure stands out within "
                    + Math.round(searchS / 60) + " min of the passage");
        }
        if (change.isEmpty()) {
            notes.add("no observations in the minutes before or after");
        } else if (change.get().pressureAssumed()) {
            notes.add("pressure not observed: potential temperatures use a standard atmosphere");
        }
        Optional<TheoryCheck> theory = change.flatMap(c -> theory(c, crossing));
        if (change.isPresent() && theory.isEmpty()) {
            notes.add("no theoretical speed: the air behind is not denser, or the speed is not known");
        }
        return new StationPassage(station.name(), track.id(), crossing.timeMs(), crossing.timeSdS(),
                crossing.bearingDeg(), crossing.speed(), signal, change, theory, String.join("; ", notes));
    }

    private String gapAround(StationSeries station, long timeMs) {
        long before = Long.MIN_VALUE;
        long after = Long.MAX_VALUE;
        for (StationObservation o : station.observations()) {
            if (o.timeMs() <= timeMs) {
                before = o.timeMs();
            } else {
                after = Math.min(after, o.timeMs());
            }
        }
        if (before == Long.MIN_VALUE || after == Long.MAX_VALUE) {
            return "the station's record does not cover the passage";
        }
        long minutes = Math.round((after - before) / 60000.0);
        return minutes <= settings.maxGapMinutes() ? "" : "observations are " + minutes
                + " min apart around the passage, at most " + Math.round(settings.maxGapMinutes()) + " are needed";
    }

    private Optional<AirChange> change(StationSeries station, TrackCrossing crossing, Optional<StationSignal> signal) {
        long firstSign = crossing.timeMs();
        long settled = crossing.timeMs() + 300_000;
        if (signal.isPresent()) {
            firstSign = signs(signal.get()).mapToLong(Onset::startMs).min().orElseThrow();
            settled = Math.min(signal.get().timeMs() + LATEST_AFTER_MS,
                    Stream.of(signal.get().wind(), signal.get().temperature()).flatMap(Optional::stream)
                            .mapToLong(Onset::endMs).max().orElse(signal.get().timeMs() + 300_000));
        }
        PassageMeans means = new PassageMeans(station);
        long length = Math.round(60_000 * settings.meanMinutes());
        long beforeEnd = firstSign - GUARD_MS;
        long afterStart = settled;
        // Sparse records: twice as long, rather than nothing.
        return means.change(beforeEnd, afterStart, length).or(() -> means.change(beforeEnd, afterStart, 2 * length));
    }

    private static Stream<Onset> signs(StationSignal signal) {
        return Stream.of(signal.wind(), signal.temperature(), signal.pressure()).flatMap(Optional::stream);
    }

    private static Optional<TheoryCheck> theory(AirChange change, TrackCrossing crossing) {
        Speed speed = crossing.speed();
        Estimate fall = change.thetaVFallK();
        if (!speed.isKnown() || speed.speedMs() <= 0 || !fall.isKnown() || fall.value() <= 0) {
            return Optional.empty();
        }
        AirMeans before = change.before();
        double pressure = Double.isNaN(before.pressureHpa()) ? MoistAir.REFERENCE_PRESSURE_HPA : before.pressureHpa();
        TheoryInput input = TheoryInput.none()
                .withAhead(AirState.of(before.temperatureC(), Math.min(before.dewPointC(), before.temperatureC()), pressure))
                .withDeficitK(new Estimate(fall.value(), Math.hypot(fall.sd(), TheoryInput.DEFICIT_SHARE * fall.value())))
                .withSpeedMs(new Estimate(speed.speedMs(), speed.sdMs()));
        if (!Double.isNaN(before.windSpeedMs())) {
            double along = -before.windSpeedMs()
                    * Math.cos(Math.toRadians(before.windFromDeg() - crossing.bearingDeg()));
            input = input.withWindAlongMs(new Estimate(along, TheoryInput.WIND_SD_MS));
        }
        Estimate rise = change.pressureRiseHpa();
        boolean told = rise.isKnown() && rise.value() > 2 * rise.sd();
        input = told ? input.withRiseHpa(new Estimate(rise.value(),
                Math.hypot(rise.sd(), TheoryInput.RISE_SHARE * rise.value()))) : input.withDepthM(ASSUMED_DEPTH_M);
        TheoryResult result = OutflowTheory.assess(input);
        Estimate ground = result.get("theory_speed_ms");
        Estimate theory = ground.isKnown() ? ground : result.get("theory_relative_speed_ms");
        return theory.isKnown() ? Optional.of(new TheoryCheck(theory, result.get("froude_number"), result.zScore(),
                told ? "pressure rise and deficit" : "assumed, 1300 +- 520 m", result.comparison())) : Optional.empty();
    }
}
