package hemline.export;

import hemline.boundary.station.AirChange;
import hemline.boundary.station.AirMeans;
import hemline.boundary.station.Onset;
import hemline.boundary.station.StationPassage;
import hemline.boundary.station.StationSignal;
import hemline.boundary.station.TheoryCheck;
import hemline.numerics.Estimate;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.Stream;

/** {@code passages.csv}: one row a passage of a boundary over a station. */
final class PassagesTable {
    static final Table<StationPassage> TABLE = new Table<>("passages",
            "One row per passage of a boundary over a station; written when stations are given.",
            Stream.of(crossing(), signal(), change(), theory()).flatMap(List::stream).toList());

    private PassagesTable() {
    }

    private static List<Column<StationPassage>> crossing() {
        return List.of(Column.text("station", "Name of the station.", StationPassage::station),
                Column.text("track_id", "The boundary, see tracks.csv.", StationPassage::trackId),
                Column.time("time_utc", "When the tracked line passed the station.", StationPassage::trackTimeMs),
                Column.number("time_sd_s", "s", 0, "Standard deviation of the time.", StationPassage::trackTimeSdS),
                Column.number("bearing_deg", "degree", 1, "Compass bearing the line moved toward there.",
                        StationPassage::bearingDeg),
                Column.number("speed_ms", "m s-1", 2, "Speed along that bearing, relative to the ground.",
                        p -> p.speed().speedMs()),
                Column.number("speed_sd_ms", "m s-1", 2, "Standard deviation of the speed.", p -> p.speed().sdMs()));
    }

    private static List<Column<StationPassage>> signal() {
        return List.of(
                time("signal_utc", "When the station's own record shows the passage.",
                        s -> OptionalLong.of(s.timeMs())),
                signalNumber("signal_sd_s", "s", 0, "Standard deviation of that time.", StationSignal::timeSdS),
                Column.text("signal_of", "What that time is of: wind, temperature or pressure.",
                        p -> p.signal().map(StationSignal::from).orElse("")),
                signalNumber("wind_rise_ms", "m s-1", 2, "Rise of the wind toward bearing_deg.",
                        s -> rise(s.wind()).value()),
                signalNumber("wind_rise_sd_ms", "m s-1", 2, "Standard deviation of that.", s -> rise(s.wind()).sd()),
                time("temperature_start_utc", "When the fall of temperature begins.", s -> start(s.temperature())),
                time("temperature_end_utc", "When it ends.", s -> end(s.temperature())),
                time("pressure_start_utc", "When the rise of pressure begins.", s -> start(s.pressure())),
                time("pressure_end_utc", "When it ends.", s -> end(s.pressure())));
    }

    private static List<Column<StationPassage>> change() {
        return List.of(mean("temperature_before_c", "degree_Celsius", 1, "Mean temperature before.", false,
                        AirMeans::temperatureC),
                mean("temperature_after_c", "degree_Celsius", 1, "Mean temperature after.", true, AirMeans::temperatureC),
                value("temperature_fall_k", "K", "Fall of temperature.", AirChange::temperatureFallK),
                sd("temperature_fall_sd_k", "K", AirChange::temperatureFallK),
                mean("theta_v_before_k", "K", 2, "Mean virtual potential temperature before.", false, AirMeans::thetaVK),
                mean("theta_v_after_k", "K", 2, "Mean virtual potential temperature after.", true, AirMeans::thetaVK),
                value("theta_v_fall_k", "K", "Fall of virtual potential temperature.", AirChange::thetaVFallK),
                sd("theta_v_fall_sd_k", "K", AirChange::thetaVFallK),
                mean("theta_e_before_k", "K", 2, "Mean equivalent potential temperature before.", false,
                        AirMeans::thetaEK),
                mean("theta_e_after_k", "K", 2, "Mean equivalent potential temperature after.", true, AirMeans::thetaEK),
                value("theta_e_fall_k", "K", "Fall of equivalent potential temperature.", AirChange::thetaEFallK),
                sd("theta_e_fall_sd_k", "K", AirChange::thetaEFallK),
                mean("pressure_before_hpa", "hPa", 2, "Mean pressure at the station before.", false,
                        AirMeans::pressureHpa),
                mean("pressure_after_hpa", "hPa", 2, "Mean pressure at the station after.", true, AirMeans::pressureHpa),
                value("pressure_rise_hpa", "hPa", "Rise of pressure.", AirChange::pressureRiseHpa),
                sd("pressure_rise_sd_hpa", "hPa", AirChange::pressureRiseHpa),
                mean("wind_before_ms", "m s-1", 1, "Speed of the mean wind before.", false, AirMeans::windSpeedMs),
                mean("wind_before_from_deg", "degree", 0, "Compass bearing it came from.", false, AirMeans::windFromDeg),
                mean("wind_after_ms", "m s-1", 1, "Speed of the mean wind after.", true, AirMeans::windSpeedMs),
                mean("wind_after_from_deg", "degree", 0, "Compass bearing it came from.", true, AirMeans::windFromDeg),
                value("wind_shift_deg", "degree", "Turn of the wind, clockwise positive.", AirChange::windShiftDeg),
                sd("wind_shift_sd_deg", "degree", AirChange::windShiftDeg));
    }

    private static List<Column<StationPassage>> theory() {
        return List.of(theoryNumber("theory_ms", "m s-1", "Speed of a density current, relative to the ground.",
                        t -> t.theoryMs().value()),
                theoryNumber("theory_sd_ms", "m s-1", "Standard deviation of that, all sources together.",
                        t -> t.theoryMs().sd()),
                theoryNumber("froude", "1", "Observed speed relative to the air ahead over that of long waves.",
                        t -> t.froude().value()),
                theoryNumber("froude_sd", "1", "Standard deviation of the Froude number.", t -> t.froude().sd()),
                theoryNumber("z_score", "1", "Observed less theoretical speed over the standard deviation of both.",
                        TheoryCheck::zScore),
                Column.text("depth_from", "Where the depth of the cold air came from.",
                        p -> p.theory().map(TheoryCheck::depthFrom).orElse("")),
                Column.text("note", "Why something is missing; empty when nothing is.", StationPassage::note));
    }

    private static Estimate rise(Optional<Onset> onset) {
        return onset.map(Onset::change).orElse(Estimate.UNKNOWN);
    }

    private static OptionalLong start(Optional<Onset> onset) {
        return onset.map(o -> OptionalLong.of(o.startMs())).orElse(OptionalLong.empty());
    }

    private static OptionalLong end(Optional<Onset> onset) {
        return onset.map(o -> OptionalLong.of(o.endMs())).orElse(OptionalLong.empty());
    }

    private static Column<StationPassage> time(String name, String meaning,
                                               Function<StationSignal, OptionalLong> of) {
        return new Column<>(name, Column.Type.TIME, "", meaning, p -> {
            OptionalLong ms = p.signal().map(of).orElse(OptionalLong.empty());
            return ms.isPresent() ? Times.iso(ms.getAsLong()) : "";
        });
    }

    private static Column<StationPassage> signalNumber(String name, String unit, int decimals, String meaning,
                                                       ToDoubleFunction<StationSignal> of) {
        return Column.number(name, unit, decimals, meaning,
                p -> p.signal().isPresent() ? of.applyAsDouble(p.signal().get()) : Double.NaN);
    }

    private static Column<StationPassage> mean(String name, String unit, int decimals, String meaning, boolean after,
                                               ToDoubleFunction<AirMeans> of) {
        return Column.number(name, unit, decimals, meaning, p -> p.change().isPresent()
                ? of.applyAsDouble(after ? p.change().get().after() : p.change().get().before()) : Double.NaN);
    }

    private static Column<StationPassage> value(String name, String unit, String meaning,
                                                Function<AirChange, Estimate> of) {
        return Column.number(name, unit, 2, meaning, p -> p.change().map(of).orElse(Estimate.UNKNOWN).value());
    }

    private static Column<StationPassage> sd(String name, String unit, Function<AirChange, Estimate> of) {
        return Column.number(name, unit, 2, "Standard deviation of that.",
                p -> p.change().map(of).orElse(Estimate.UNKNOWN).sd());
    }

    private static Column<StationPassage> theoryNumber(String name, String unit, String meaning,
                                                       ToDoubleFunction<TheoryCheck> of) {
        return Column.number(name, unit, 2, meaning,
                p -> p.theory().isPresent() ? of.applyAsDouble(p.theory().get()) : Double.NaN);
    }
}
