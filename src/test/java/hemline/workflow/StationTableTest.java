package hemline.workflow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.boundary.station.StationObservation;
import hemline.boundary.station.StationSeries;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StationTableTest {
    @TempDir
    private Path folder;

    private List<StationSeries> read(String... lines) throws UserProblem, IOException {
        Path file = folder.resolve("stations.csv");
        Files.writeString(file, String.join("\n", lines) + "\n");
        return StationTable.read(file);
    }

    private static final String HEAD = "station,time_utc,latitude,longitude,";

    @Test
    void rowsOfSeveralStationsAreSortedByTime() throws Exception {
        List<StationSeries> series = read(HEAD + "altitude_m,temperature_c,dew_point_c,pressure_hpa,wind_speed_ms,"
                        + "wind_from_deg",
                "B,2026-06-01T12:05:00Z,48.1,9.1,450,24.5,18,960.2,8,190",
                "A,2026-06-01T12:00:00Z,48,9,,25,,,,",
                "B,2026-06-01T12:00:00+00:00,48.1,9.1,450,30,17,958.9,0,");
        assertThat(series).extracting(StationSeries::name).containsExactly("B", "A");
        StationObservation first = series.get(0).observations().get(0);
        assertThat(first.temperatureC()).isEqualTo(30);
        assertThat(first.windSpeedMs()).isZero();
        assertThat(first.windFromDeg()).isNaN();
        assertThat(series.get(0).altitudeM()).isEqualTo(450);
        StationObservation bare = series.get(1).observations().get(0);
        assertThat(bare.dewPointC()).isNaN();
        assertThat(bare.pressureHpa()).isNaN();
        assertThat(bare.windSpeedMs()).isNaN();
        assertThat(series.get(1).altitudeM()).isNaN();
    }

    /** 77 F = 25 C = 298.15 K; 50 km/h = 13.889 m/s; 20 kt = 10.289 m/s; 96 000 Pa = 960 hPa. */
    @ParameterizedTest
    @CsvSource({"temperature_f,77,25", "temperature_k,298.15,25", "dew_point_f,50,10", "dew_point_k,283.15,10",
        "pressure_pa,96000,960", "wind_speed_kmh,50,13.8889", "wind_speed_kt,20,10.2889"})
    void unitsAreReadFromTheColumnNames(String column, String cell, double expected) throws Exception {
        String extra = column.startsWith("wind") ? "wind_from_deg,temperature_c" : column.startsWith("temperature")
                ? "wind_from_deg,wind_speed_ms" : "wind_from_deg,temperature_c";
        StationObservation o = read(HEAD + column + "," + extra, "A,2026-06-01T12:00:00Z,48,9," + cell + ",200,26")
                .get(0).observations().get(0);
        double got = column.startsWith("temperature") ? o.temperatureC() : column.startsWith("dew") ? o.dewPointC()
                : column.startsWith("pressure") ? o.pressureHpa() : o.windSpeedMs();
        assertThat(got).isCloseTo(expected, within(1e-3));
    }

    @Test
    void humidityGivesTheDewPoint() throws Exception {
        StationObservation o = read(HEAD + "temperature_c,humidity_percent", "A,2026-06-01T12:00:00Z,48,9,30,55.05")
                .get(0).observations().get(0);
        // e(20 C) / e(30 C) = 23.369 / 42.456 by Bolton (1980), eq. 10.
        assertThat(o.dewPointC()).isCloseTo(20, within(0.01));
        assertThat(read(HEAD + "temperature_c,humidity_percent", "A,2026-06-01T12:00:00Z,48,9,30,101")
                .get(0).observations().get(0).dewPointC()).isEqualTo(30);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', value = {
        "temperature|25|line 1, column temperature: its unit is not known; name it temperature_c or temperature_k or",
        "temperature_c,pressure|25,960|column pressure: its unit is not known; name it pressure_hpa or pressure_pa",
        "temperature_c,wind_direction|25,180|column wind_direction: its unit is not known; name it wind_from_deg",
        "temperature_c|298.15|line 2, column temperature_c: expected -90 to 60, found 298.15; check the unit",
        "temperature_k|25|column temperature_k: expected 183 to 333, found 25; check the unit",
        "pressure_hpa|96000|column pressure_hpa: expected 500 to 1090, found 96000",
        "temperature_c,wind_from_deg|25,370|column wind_from_deg: expected 0 to 360, found 370",
        "temperature_c,dew_point_c|25,28|column dew_point_c: expected a dew point of at most the temperature, found 28",
        "pressure_hpa,altitude_m|1015,1600|column pressure_hpa: expected about 835 hPa at 1600 m, found 1015; give the "
            + "pressure at the station",
        "temperature_c,temperature_k|25,298|columns temperature_c and temperature_k give the same quantity",
        "remark|hello|line 1: expected a column of temperature, pressure or wind",
        "temperature_c|warm|column temperature_c: expected a number"})
    void wrongUnitsAndImpossibleValuesAreRefused(String columns, String cells, String message) {
        assertThatThrownBy(() -> read(HEAD + columns, "A,2026-06-01T12:00:00Z,48,9," + cells))
                .isInstanceOf(UserProblem.class).hasMessageContaining("stations.csv, line ")
                .hasMessageContaining(message);
    }

    @Test
    void aStationHasOnePlaceAndOneObservationATime() {
        assertThatThrownBy(() -> read(HEAD + "temperature_c", "A,2026-06-01T12:00:00Z,48,9,20",
                "A,2026-06-01T12:05:00Z,48.2,9,20")).hasMessageContaining("line 3").hasMessageContaining("one place");
        assertThatThrownBy(() -> read(HEAD + "temperature_c", "A,2026-06-01T12:00:00Z,48,9,20",
                "A,2026-06-01T12:00:00Z,48,9,21")).hasMessageContaining("line 3, column time_utc")
                .hasMessageContaining("two observations");
        assertThatThrownBy(() -> read(HEAD + "temperature_c", "A,2026-06-01 12:00,48,9,20"))
                .hasMessageContaining("expected an ISO 8601 time with its zone");
        assertThatThrownBy(() -> read(HEAD + "temperature_c", "A,2026-06-01T12:00:00Z,148,9,20"))
                .hasMessageContaining("column latitude: expected -90 to 90");
    }

    @Test
    void columnsThatAreNoQuantityAreLetBe() throws Exception {
        assertThat(read(HEAD + "temperature_c,remark", "A,2026-06-01T12:00:00Z,48,9,20,fine")).hasSize(1);
    }
}
