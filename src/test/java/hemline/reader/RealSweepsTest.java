package hemline.reader;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.sweep.Field;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.stream.Stream;
import org.junit.jupiter.api.Named;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Every fact of every real file, against numbers that other programs read from it. */
class RealSweepsTest {

    static Stream<Named<Map<String, String>>> readable() throws IOException {
        return RealSweeps.expected().stream().filter(row -> !row.get("file").startsWith("reject/"))
                .map(row -> Named.of(row.get("file"), row));
    }

    @ParameterizedTest
    @MethodSource("readable")
    void headsAgreeWithIndependentReaders(Map<String, String> row) throws UnreadableFileException {
        try (RadarFile file = RadarFiles.open(RealSweeps.file(row.get("file")))) {
            RadarFileFacts facts = file.facts();
            checkSite(facts.site(), row);
            assertThat(facts.sweeps()).hasSize(number(row, "sweeps"));

            SweepFacts lowest = facts.sweeps().get(number(row, "lowest_sweep"));
            assertThat(lowest.mode()).isEqualTo(ScanMode.PPI);
            assertThat(lowest.rays()).isEqualTo(number(row, "rays"));
            assertThat(lowest.gates()).isEqualTo(number(row, "gates"));
            // The table's is the median of float32 steps, which are 499.998 m near and 500.0 m far out in one file.
            assertThat(lowest.gateSpacingM()).isCloseTo(real(row, "gate_spacing_m"), within(0.0025));
            assertThat(lowest.firstGateCentreM()).isCloseTo(real(row, "first_gate_centre_m"), within(0.006));
            assertThat(lowest.elevationDeg()).isCloseTo(real(row, "elevation_deg"), within(0.00051));
            assertThat(lowest.firstRayAzimuthDeg()).isCloseTo(real(row, "first_ray_azimuth_deg"), within(0.00051));
            assertThat(utc(lowest.startMs())).isEqualTo(row.get("start_utc"));
            assertThat(utc(lowest.endMs())).isEqualTo(row.get("end_utc"));
            assertThat(file.reflectivityField(lowest.index(), FieldChoice.automatic()))
                    .contains(row.get("reflectivity_field"));

            TreeSet<String> names = new TreeSet<>();
            facts.sweeps().forEach(sweep -> sweep.fields().forEach(field -> names.add(field.name())));
            if (row.get("format").contains("msg1")) {
                // The table's decoder of message 1 left the spectrum width out.
                names.remove("SW");
            }
            assertThat(names).isEqualTo(new TreeSet<>(List.of(row.get("fields").split(","))));
        }
    }

    @ParameterizedTest
    @MethodSource("readable")
    void valuesAgreeWithIndependentReaders(Map<String, String> row) throws UnreadableFileException {
        try (RadarFile file = RadarFiles.open(RealSweeps.file(row.get("file")))) {
            FieldSummary values = file.summarise(number(row, "lowest_sweep"), row.get("reflectivity_field"));
            assertThat(values.valid()).isEqualTo(number(row, "valid_gates"));
            assertThat(values.min()).isCloseTo(real(row, "min_dbz"), within(0.0051));
            assertThat(values.max()).isCloseTo(real(row, "max_dbz"), within(0.0051));
            assertThat(values.mean()).isCloseTo(real(row, "mean_dbz"), within(0.00051));
            assertThat(values.maxRay()).isEqualTo(number(row, "max_ray"));
            assertThat(values.maxGate()).isEqualTo(number(row, "max_gate"));
        }
    }

    /** The sweep as handed on, rays sorted by azimuth, has its maximum at the same azimuth and range. */
    @ParameterizedTest
    @MethodSource("readable")
    void sweepKeepsTheMaximumAtItsAzimuthAndRange(Map<String, String> row) throws UnreadableFileException {
        try (RadarFile file = RadarFiles.open(RealSweeps.file(row.get("file")))) {
            Sweep sweep = file.read(number(row, "lowest_sweep"), FieldChoice.automatic());
            Field dbz = sweep.reflectivity();
            float top = (float) real(row, "max_dbz");
            boolean found = false;
            float highest = Float.NEGATIVE_INFINITY;
            for (int ray = 0; ray < sweep.rayCount(); ray++) {
                for (int gate = 0; gate < sweep.gateCount(); gate++) {
                    highest = Field.isEcho(dbz.at(ray, gate)) ? Math.max(highest, dbz.at(ray, gate)) : highest;
                    found |= Math.abs(dbz.at(ray, gate) - top) < 0.0051
                            && Math.abs(sweep.rays().azimuthDeg(ray) - real(row, "max_azimuth_deg")) < 0.00051
                            && Math.abs(sweep.slantRangeM(gate) / 1000 - real(row, "max_range_km")) < 0.00051;
                }
            }
            assertThat(found).isTrue();
            assertThat(highest).isCloseTo(top, within(0.0051f));
            assertThat(utc(sweep.startMs())).isBetween(row.get("start_utc"), row.get("end_utc"));
            assertThat(utc(sweep.endMs())).isBetween(row.get("start_utc"), row.get("end_utc"));
        }
    }

    private static void checkSite(RadarSite site, Map<String, String> row) {
        if (row.get("lat_deg").isEmpty()) {
            assertThat(site.position()).isEmpty();
            return;
        }
        assertThat(site.position().orElseThrow().latitudeDeg()).isCloseTo(real(row, "lat_deg"), within(0.0000051));
        assertThat(site.position().orElseThrow().longitudeDeg()).isCloseTo(real(row, "lon_deg"), within(0.0000051));
        assertThat(site.altitudeM()).isCloseTo(real(row, "alt_m"), within(0.051));
    }

    private static String utc(long ms) {
        return Instant.ofEpochMilli(ms).truncatedTo(ChronoUnit.SECONDS).toString().replace("Z", "");
    }

    private static int number(Map<String, String> row, String column) {
        return Integer.parseInt(row.get(column));
    }

    private static double real(Map<String, String> row, String column) {
        return Double.parseDouble(row.get(column));
    }
}
