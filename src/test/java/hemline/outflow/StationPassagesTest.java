package hemline.outflow;

import static hemline.outflow.InventedStation.PASSAGE_MS;
import static hemline.outflow.InventedStation.PLANE;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.boundary.TrackVertex;
import hemline.boundary.station.AirChange;
import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationPassage;
import hemline.boundary.station.StationSeries;
import hemline.boundary.station.StationSignal;
import hemline.geometry.Point;
import java.util.List;
import org.junit.jupiter.api.Test;

class StationPassagesTest {
    private static final StationSettings SETTINGS = StationSettings.defaults();

    private static List<StationPassage> find(Track track, StationSeries station) {
        return new StationPassages(PLANE, SETTINGS).find(List.of(track), List.of(station));
    }

    private static StationPassage only(Track track, StationSeries station) {
        List<StationPassage> found = find(track, station);
        assertThat(found).hasSize(1);
        return found.get(0);
    }

    private static double minutes(long timeMs) {
        return (timeMs - PASSAGE_MS) / 60000.0;
    }

    @Test
    void thePassageIsTimedFromTheTrackBetweenSweeps() {
        StationPassage passage = only(InventedStation.track(0, 1), InventedStation.station(60_000, 1, 1));
        assertThat(minutes(passage.trackTimeMs())).isCloseTo(0, within(0.05));
        // 0.4 km at 10 m/s is 40 s for one sweep, less for four: 0.4 km over 10 m/s times 0.5 and a little.
        assertThat(passage.trackTimeSdS()).isBetween(20.0, 25.0);
        assertThat(passage.bearingDeg()).isEqualTo(0);
        assertThat(passage.speed()).isEqualTo(new Speed(10, 0.5));
    }

    @Test
    void theStatedTimeUncertaintyOfTheTrackIsTrue() {
        int inside = 0;
        for (int seed = 0; seed < 200; seed++) {
            TrackCrossing crossing = TrackCrossing.of(InventedStation.track(0.4, seed), new Point(0, 30), SETTINGS)
                    .orElseThrow();
            inside += Math.abs(crossing.timeMs() - PASSAGE_MS) <= 2000 * crossing.timeSdS() ? 1 : 0;
        }
        assertThat(inside / 200.0).isBetween(0.91, 0.995);
    }

    @Test
    void theStationsOwnSignalIsFoundInEachQuantity() {
        StationSignal signal = only(InventedStation.track(0, 1), InventedStation.station(60_000, 1, 2)).signal()
                .orElseThrow();
        assertThat(signal.from()).isEqualTo("wind");
        assertThat(minutes(signal.timeMs())).isCloseTo(0, within(1.0));
        assertThat(signal.wind().orElseThrow().change().value()).isCloseTo(11, within(1.5));
        assertThat(signal.temperature().orElseThrow().change().value()).isCloseTo(-6, within(0.7));
        assertThat(minutes(signal.temperature().orElseThrow().startMs())).isCloseTo(0, within(2.0));
        assertThat(minutes(signal.temperature().orElseThrow().endMs())).isCloseTo(8, within(3.0));
        assertThat(minutes(signal.pressure().orElseThrow().startMs())).isCloseTo(-3, within(1.5));
    }

    /**
     * Common practice, no source: the pressure begins to rise at or before the wind shift and ahead of the full fall of
     * temperature.
     */
    @Test
    void pressureRisesFirstAndTheFullFallOfTemperatureComesLast() {
        for (int seed = 0; seed < 20; seed++) {
            StationSignal signal = only(InventedStation.track(0, 1), InventedStation.station(60_000, 0.5, seed)).signal()
                    .orElseThrow();
            assertThat(signal.pressure().orElseThrow().startMs()).isLessThanOrEqualTo(signal.wind().orElseThrow().startMs());
            assertThat(signal.temperature().orElseThrow().endMs()).isGreaterThan(signal.pressure().orElseThrow().startMs());
        }
    }

    @Test
    void theStatedTimeUncertaintyOfTheSignalIsTrue() {
        int inside = 0;
        int n = 150;
        for (int seed = 0; seed < n; seed++) {
            StationSignal signal = PassageSignal.find(InventedStation.station(60_000, 1.5, seed).observations(),
                    PASSAGE_MS + 180_000, 0, 900).orElseThrow();
            inside += Math.abs(signal.timeMs() - PASSAGE_MS) <= 2000 * signal.timeSdS() ? 1 : 0;
        }
        assertThat(inside / (double) n).isBetween(0.9, 1.0);
    }

    @Test
    void beforeAndAfterAreMeasuredWithTheirUncertainty() {
        AirChange change = only(InventedStation.track(0, 1), InventedStation.station(60_000, 1, 3)).change().orElseThrow();
        assertThat(change.temperatureFallK().value()).isCloseTo(6, within(3 * change.temperatureFallK().sd()));
        assertThat(change.temperatureFallK().sd()).isBetween(0.2, 1.0);
        assertThat(change.pressureRiseHpa().value()).isCloseTo(1.5, within(3 * change.pressureRiseHpa().sd()));
        assertThat(change.thetaVFallK().value()).isCloseTo(6.3, within(1.0));
        assertThat(change.thetaEFallK().value()).isBetween(5.0, 9.0);
        assertThat(change.before().windFromDeg()).isCloseTo(Math.toDegrees(Math.atan2(-1, 2)) + 360, within(50.0));
        assertThat(change.after().windFromDeg()).isCloseTo(186, within(15.0));
        assertThat(Math.abs(change.windShiftDeg().value())).isGreaterThan(90);
        assertThat(change.pressureAssumed()).isFalse();
    }

    /** By hand: θv falls by about 6.2 K, 1.5 hPa of rise: c = 0.77 √(150/1.09) = 9.0 m/s, 2 m/s of head wind off. */
    @Test
    void theSpeedIsComparedWithTheory() {
        StationPassage passage = only(InventedStation.track(0, 1), InventedStation.station(60_000, 0.5, 4));
        assertThat(passage.theory()).isPresent();
        assertThat(passage.theory().get().theoryMs().value()).isCloseTo(9.0 - 0.62 * 2, within(0.4));
        assertThat(passage.theory().get().theoryMs().relativeSd()).isBetween(0.2, 0.5);
        assertThat(passage.theory().get().zScore()).isCloseTo(0.8, within(0.4));
        assertThat(passage.theory().get().froude().value()).isCloseTo((10 + 1.24) / Math.sqrt(150 / 1.09), within(0.06));
        assertThat(passage.theory().get().words()).contains("standard deviations");
        assertThat(passage.note()).isEmpty();
    }

    @Test
    void withoutPressureTheDepthIsAssumedAndSaidSo() {
        StationSeries full = InventedStation.station(60_000, 0.5, 5);
        StationSeries dry = InventedStation.with(full, full.observations().stream().map(o -> new StationObservation(
                o.timeMs(), o.temperatureC(), Double.NaN, Double.NaN, Double.NaN, Double.NaN)).toList());
        StationPassage passage = only(InventedStation.track(0, 1), dry);
        assertThat(passage.signal().orElseThrow().from()).isEqualTo("temperature");
        assertThat(passage.change().orElseThrow().pressureAssumed()).isTrue();
        assertThat(passage.change().orElseThrow().thetaEFallK().isKnown()).isFalse();
        assertThat(passage.theory().orElseThrow().depthFrom()).startsWith("assumed");
        assertThat(passage.note()).contains("pressure not observed");
    }

    @Test
    void aQuietRecordHasNoSignal() {
        int found = 0;
        for (int seed = 0; seed < 40; seed++) {
            StationSeries other = InventedStation.station(60_000, 1, 100 + seed);
            // Only what came before the passage, a slow fall of 3 K an hour added.
            List<StationObservation> quiet = other.observations().subList(0, 50).stream().map(o -> new StationObservation(
                    o.timeMs() + 35 * 60_000, o.temperatureC() - 3 * (o.timeMs() - PASSAGE_MS) / 3.6e6, o.dewPointC(),
                    o.pressureHpa(), o.windSpeedMs(), o.windFromDeg())).toList();
            found += PassageSignal.find(quiet, PASSAGE_MS, 0, 900).isPresent() ? 1 : 0;
        }
        assertThat(found).isLessThanOrEqualTo(2);
    }

    @Test
    void anOutlierIsNoPassage() {
        StationSeries full = InventedStation.station(60_000, 0.2, 7);
        List<StationObservation> spiked = full.observations().subList(0, 55).stream().map(o ->
                new StationObservation(o.timeMs() + 30 * 60_000, Math.abs(o.timeMs() - PASSAGE_MS + 30 * 60_000) < 30_000
                        ? -40 : o.temperatureC(), o.dewPointC(), o.pressureHpa(), o.windSpeedMs(), o.windFromDeg())).toList();
        assertThat(PassageSignal.find(spiked, PASSAGE_MS, 0, 900)).isEmpty();
    }

    @Test
    void gapsAreTold() {
        StationSeries full = InventedStation.station(60_000, 1, 8);
        StationSeries holed = InventedStation.with(full, full.observations().stream()
                .filter(o -> Math.abs(o.timeMs() - PASSAGE_MS) > 600_000).toList());
        assertThat(only(InventedStation.track(0, 1), holed).note()).matches("observations are 2[12] min apart around the "
                + "passage, at most 15 are needed");
        StationSeries ended = InventedStation.with(full, full.observations().subList(0, 40));
        assertThat(only(InventedStation.track(0, 1), ended).note()).contains("does not cover the passage");
        assertThat(only(InventedStation.track(0, 1), ended).signal()).isEmpty();
    }

    @Test
    void sparseRecordsStillGiveMeans() {
        StationPassage passage = only(InventedStation.track(0, 1), InventedStation.station(600_000, 0.3, 9));
        assertThat(passage.change()).isPresent();
        assertThat(passage.change().get().temperatureFallK().value()).isCloseTo(6, within(1.0));
    }

    @Test
    void aStationBesideTheTrackIsNotPassed() {
        Track track = InventedStation.track(0, 1);
        StationSeries series = InventedStation.station(60_000, 1, 1);
        assertThat(find(track, new StationSeries("far", PLANE.toGeo(new Point(25, 30)), 450, series.observations())))
                .isEmpty();
        assertThat(find(track, new StationSeries("ahead", PLANE.toGeo(new Point(0, 60)), 450, series.observations())))
                .isEmpty();
        assertThat(find(track, new StationSeries("near", PLANE.toGeo(new Point(21.5, 30)), 450, series.observations())))
                .hasSize(1);
    }

    @Test
    void aTrackWithoutDirectionPassesNothing() {
        Track track = InventedStation.track(0, 1);
        List<TrackPiece> blind = track.pieces().stream().map(p -> new TrackPiece(p.sweep(), p.kind(), p.origin(),
                p.vertices().stream().map(v -> v.withMotion(Double.NaN, Speed.UNKNOWN)).toList())).toList();
        assertThat(find(track.withPieces(blind), InventedStation.station(60_000, 1, 1))).isEmpty();
    }

    @Test
    void withoutVertexSpeedsTheSpeedIsThatOfThePassage() {
        Track track = InventedStation.track(0, 1);
        List<TrackPiece> slow = track.pieces().stream().map(p -> new TrackPiece(p.sweep(), p.kind(), p.origin(),
                p.vertices().stream().map((TrackVertex v) -> v.withMotion(0, Speed.UNKNOWN)).toList())).toList();
        Speed speed = only(track.withPieces(slow), InventedStation.station(60_000, 1, 1)).speed();
        assertThat(speed.speedMs()).isCloseTo(10, within(1e-6));
        assertThat(speed.sdMs()).isBetween(0.3, 1.0);
    }
}
