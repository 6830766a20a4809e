package hemline.reader;

import static hemline.reader.ReaderTestKit.facts;
import static hemline.reader.ReaderTestKit.loop;
import static hemline.reader.ReaderTestKit.ms;
import static hemline.reader.ReaderTestKit.read;
import static hemline.reader.ReaderTestKit.refusal;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Quirks of real CfRadial 1 files, each known from public issue threads of open radar libraries and numbered as in
 * {@code docs/formats.md}.
 */
class CfRadialQuirksTest {
    @TempDir
    private Path folder;

    private static float[] azimuths(double from, double step, int rays) {
        float[] azimuth = new float[rays];
        for (int i = 0; i < rays; i++) {
            azimuth[i] = (float) (((from + i * step) % 360 + 360) % 360);
        }
        return azimuth;
    }

    @Test
    void quirk02RangeIsTheGatesCentreAlready() throws UnreadableFileException {
        Sweep sweep = read(new CfSketch().write(folder), 0);

        assertThat(sweep.firstGateCentreM()).isEqualTo(250);
        assertThat(sweep.gateSpacingM()).isEqualTo(500);
    }

    @Test
    void quirk05RaysMayStartAnywhereAndTurnEitherWay() throws UnreadableFileException {
        Path file = new CfSketch().variable("azimuth", "time", azimuths(200, -30, 12)).write(folder);

        assertThat(facts(file).sweeps().get(0).firstRayAzimuthDeg()).isEqualTo(200);
        Sweep sweep = read(file, 0);
        assertThat(sweep.rayCount()).isEqualTo(12);
        int third = sweep.rays().nearestRay(140);
        assertThat(sweep.rays().timeMs(third)).isEqualTo(ms("2020-06-11T12:00:02Z"));
        assertThat(sweep.reflectivity().at(third, 0)).isEqualTo(2f);
    }

    @Test
    void quirk06RaysBeyondATurnAndDoubledRaysAreLeftOutWithANote() {
        float[] azimuth = azimuths(15, 30, 14);
        azimuth[6] = azimuth[5];
        Path file = new CfSketch(14, 8).variable("azimuth", "time", azimuth).write(folder);

        OpenedLoop opened = loop(file);
        Sweep sweep = opened.loop().sweep(0);
        assertThat(sweep.rayCount()).isEqualTo(12);
        assertThat(sweep.reflectivity().at(0, 0)).isZero();
        assertThat(sweep.reflectivity().at(5, 0)).isEqualTo(5f);
        assertThat(sweep.reflectivity().at(6, 0)).isNaN();
        assertThat(opened.notes()).anyMatch(n -> n.contains("rays beyond a full turn are left out"));
        assertThat(opened.notes()).anyMatch(n -> n.contains("rays at the azimuth of another are left out"));
    }

    @Test
    void quirk06MissingSectorIsNotMeasuredAndNotItsNeighbour() throws UnreadableFileException {
        Path file = new CfSketch().variable("azimuth", "time", azimuths(100, 10, 12)).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.rayCount()).isEqualTo(36);
        assertThat(sweep.reflectivity().at(sweep.rays().nearestRay(208), 0)).isEqualTo(11f);
        assertThat(sweep.reflectivity().at(sweep.rays().nearestRay(221), 0)).isNaN();
    }

    @Test
    void quirk06SpacingOfRaysIsNotRounded() throws UnreadableFileException {
        Path file = new CfSketch(741, 4).variable("azimuth", "time", azimuths(0, 0.486, 740 + 1)).write(folder);

        assertThat(read(file, 0).rayCount()).isEqualTo(741);
    }

    @Test
    void quirk07OneFillForBothIsBelowDetectionWhereTheRaySawAnything() throws UnreadableFileException {
        float[][] dbz = new float[12][8];
        for (float[] ray : dbz) {
            Arrays.fill(ray, -9999);
        }
        dbz[3][5] = 12;
        Sweep sweep = read(new CfSketch().variable("DBZ", "time range", CfSketch.flat(dbz)).write(folder), 0);

        assertThat(sweep.reflectivity().at(3, 0)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(4, 0)).isNaN();
    }

    @Test
    void quirk07UndetectOfItsOwnIsKeptApartFromFill() throws UnreadableFileException {
        short[] packed = new short[12 * 8];
        Arrays.fill(packed, (short) -32768);
        packed[0] = 100;
        packed[1] = -32767;
        Path file = new CfSketch().variable("DBZ", "time range", packed).attribute("DBZ", "_FillValue", (short) -32768)
                .attribute("DBZ", "_Undetect", (short) -32767).attribute("DBZ", "scale_factor", 0.1f)
                .attribute("DBZ", "add_offset", 5f).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.reflectivity().at(0, 0)).isCloseTo(15f, within(1e-5f));
        assertThat(sweep.reflectivity().at(0, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(0, 2)).isNaN();
    }

    @Test
    void quirk08ValuesOutsideTheValidRangeAreMissingInPackedOrUnpackedNumbers() throws UnreadableFileException {
        byte[] packed = new byte[12 * 8];
        Arrays.fill(packed, (byte) 20);
        packed[1] = 120;
        packed[2] = (byte) 200;
        CfSketch sketch = new CfSketch().variable("DBZ", "time range", packed).attribute("DBZ", "_FillValue", (byte) 0)
                .attribute("DBZ", "scale_factor", 0.5f).attribute("DBZ", "add_offset", -32f)
                .attribute("DBZ", "_Undetect", (byte) 1);

        try (RadarFile file = RadarFiles.open(sketch.attribute("DBZ", "valid_max", (byte) 100).write(folder))) {
            assertThat(file.summarise(0, "DBZ").notMeasured()).isEqualTo(1);
        }
        try (RadarFile file = RadarFiles.open(sketch.attribute("DBZ", "valid_max", 20.5).write(folder))) {
            assertThat(file.summarise(0, "DBZ").notMeasured()).isEqualTo(1);
        }
        sketch.attribute("DBZ", "valid_max", 200.0).attribute("DBZ", "_Unsigned", "true");
        try (RadarFile file = RadarFiles.open(sketch.write(folder))) {
            assertThat(file.summarise(0, "DBZ").max()).isEqualTo(68);
        }
    }

    @Test
    void quirk10CorrectedFieldWinsAndTheChoiceIsReported() {
        float[] values = new float[12 * 8];
        Path file = new CfSketch().variable("TH", "time range", values).variable("DBZHC", "time range", values)
                .variable("ZDR", "time range", values).variable("DBZV", "time range", values).write(folder);

        OpenedLoop opened = loop(file);
        assertThat(opened.loop().sweep(0).reflectivity().name()).isEqualTo("DBZHC");
        assertThat(opened.notes()).anyMatch(n -> n.contains("DBZHC chosen among DBZHC, DBZ, TH, DBZV"));
        assertThat(loop(ReadOptions.defaults().withField("zdr"), file).loop().sweep(0).reflectivity().name())
                .isEqualTo("ZDR");
        assertThat(loop(ReadOptions.defaults().withField("KDP"), file).inputs().get(0).reason())
                .contains("has no field KDP").contains("TH").contains("--field");
    }

    @Test
    void quirk12EachSweepMayHaveItsOwnGatesByRayGeometry() throws UnreadableFileException {
        float[] start = new float[24];
        float[] spacing = new float[24];
        Arrays.fill(start, 0, 12, 125);
        Arrays.fill(spacing, 0, 12, 250);
        Arrays.fill(start, 12, 24, 500);
        Arrays.fill(spacing, 12, 24, 1000);
        float[] azimuth = azimuths(15, 30, 24);
        Path file = new CfSketch(24, 8).dimension("sweep", 2).variable("azimuth", "time", azimuth)
                .variable("sweep_start_ray_index", "sweep", new int[] {0, 12})
                .variable("sweep_end_ray_index", "sweep", new int[] {11, 23})
                .variable("fixed_angle", "sweep", new float[2]).text("sweep_mode", "azimuth_surveillance")
                .variable("ray_start_range", "time", start).variable("ray_gate_spacing", "time", spacing).write(folder);

        assertThat(read(file, 0).gateSpacingM()).isEqualTo(250);
        assertThat(read(file, 1).gateSpacingM()).isEqualTo(1000);
        assertThat(read(file, 1).firstGateCentreM()).isEqualTo(500);
    }

    @Test
    void quirk12GatesBehindTheAntennaAreCutOffAndTextInNumberAttributesIsIgnored() throws UnreadableFileException {
        float[] range = new float[8];
        for (int i = 0; i < 8; i++) {
            range[i] = -700 + 500 * i;
        }
        Path file = new CfSketch().variable("range", "range", range)
                .attribute("range", "meters_to_center_of_first_gate", "about minus 700").write(folder);

        assertThat(facts(file).sweeps().get(0).firstGateCentreM()).isEqualTo(-700);
        Sweep sweep = read(file, 0);
        assertThat(sweep.firstGateCentreM()).isEqualTo(300);
        assertThat(sweep.gateCount()).isEqualTo(6);
    }

    @Test
    void quirk13RaggedFieldsWithIndicesStoredAsFloats() throws UnreadableFileException {
        float[] counts = new float[12];
        float[] starts = new float[12];
        int points = 0;
        for (int i = 0; i < 12; i++) {
            counts[i] = 3 + i % 5;
            starts[i] = points;
            points += (int) counts[i];
        }
        // One point more than the rays use.
        float[] dbz = new float[points + 1];
        for (int i = 0; i < points; i++) {
            dbz[i] = i;
        }
        Path file = new CfSketch().dimension("n_points", points + 1).variable("ray_n_gates", "time", counts)
                .variable("ray_start_index", "time", starts).variable("DBZ", "n_points", dbz)
                .attribute("DBZ", "_Undetect", -1f).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.gateCount()).isEqualTo(7);
        assertThat(sweep.reflectivity().at(1, 0)).isEqualTo(3f);
        assertThat(sweep.reflectivity().at(1, 3)).isEqualTo(6f);
        assertThat(sweep.reflectivity().at(1, 4)).isNaN();
        assertThat(sweep.reflectivity().at(11, 3)).isEqualTo(points - 1f);
    }

    @Test
    void quirk13RaggedIndicesBeyondTheFieldAreRefused() {
        int[] counts = new int[12];
        Arrays.fill(counts, 4);
        int[] starts = new int[12];
        starts[11] = 1_000_000;
        Path file = new CfSketch().dimension("n_points", 48).variable("ray_n_gates", "time", counts)
                .variable("ray_start_index", "time", starts).variable("DBZ", "n_points", new float[48]).write(folder);

        assertThat(refusal(file)).contains("48 points").contains("1000004");
    }

    @Test
    void quirk14EndIndexMayBeExclusive() throws UnreadableFileException {
        Path file = new CfSketch(24, 8).dimension("sweep", 2).variable("azimuth", "time", azimuths(15, 30, 24))
                .variable("sweep_start_ray_index", "sweep", new int[] {0, 12})
                .variable("sweep_end_ray_index", "sweep", new int[] {12, 24})
                .variable("fixed_angle", "sweep", new float[2]).text("sweep_mode", "azimuth_surveillance").write(folder);

        assertThat(facts(file).sweeps()).extracting(SweepFacts::rays).containsExactly(12, 12);
        assertThat(facts(file).notes()).anyMatch(n -> n.contains("exclusive"));
    }

    @ParameterizedTest
    @ValueSource(booleans = {true, false})
    void quirk14SenselessOrMissingIndicesGiveWayToElevation(boolean missing) throws UnreadableFileException {
        float[] elevation = new float[24];
        Arrays.fill(elevation, 0, 12, 0.52f);
        Arrays.fill(elevation, 12, 24, 1.31f);
        CfSketch sketch = new CfSketch(24, 8).dimension("sweep", 2).variable("azimuth", "time", azimuths(15, 30, 24))
                .variable("elevation", "time", elevation).variable("fixed_angle", "sweep", new float[2])
                .variable("sweep_start_ray_index", "sweep", new int[] {0, 12})
                .variable("sweep_end_ray_index", "sweep", new int[] {99, 7}).text("sweep_mode", "azimuth_surveillance");
        if (missing) {
            sketch.without("sweep_start_ray_index").without("sweep_end_ray_index");
        }
        Path file = sketch.write(folder);

        assertThat(facts(file).sweeps()).extracting(SweepFacts::rays).containsExactly(12, 12);
        assertThat(facts(file).sweeps().get(0).elevationDeg()).isCloseTo(0.52, within(1e-6));
        assertThat(facts(file).notes()).anyMatch(n -> n.contains("told apart by elevation"));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "seconds since 2018-10-28 14:14:23 0:00 | 2018-10-28T14:14:23Z",
        "seconds since 2018-10-28T10:30:21Z | 2018-10-28T10:30:21Z",
        "seconds since 2018-10-28T10:30:21+00:00 | 2018-10-28T10:30:21Z",
        "seconds since 2018-10-28T10:30:21+02:00 | 2018-10-28T08:30:21Z",
        "seconds since 2018-10-28 10:30:21 -0530 | 2018-10-28T16:00:21Z",
        "seconds since 2018-10-28 | 2018-10-28T00:00:00Z",
        "Seconds since 2018-10-28 10:30:21.5 UTC | 2018-10-28T10:30:21.500Z",
        "hours since 1970-1-1 0:0:0 | 1970-01-01T00:00:00Z",
        "milliseconds since 2018-10-28T10:30 | 2018-10-28T10:30:00Z",
    })
    void quirk16TimeUnitsInAllTheirSpellingsAreUtc(String units, String origin) throws UnreadableFileException {
        assertThat(CfTime.parse(units).orElseThrow().originMs()).isEqualTo(ms(origin));

        Path file = new CfSketch().attribute("time", "units", units).write(folder);
        assertThat(facts(file).sweeps().get(0).startMs()).isEqualTo(ms(origin));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "fortnights since 2018-10-28", "seconds", "seconds since yesterday",
        "seconds since 2018-13-45T99:00:00Z"})
    void quirk16UnitsThatCannotBeUnderstoodAreRefusedWithoutAnotherOrigin(String units) {
        Path file = new CfSketch().attribute("time", "units", units).write(folder);

        assertThatThrownBy(() -> facts(file)).isInstanceOf(UnreadableFileException.class)
                .hasMessageContaining("/time").hasMessageContaining("units");
    }

    @Test
    void quirk16OriginMayStandInACharacterVariable() throws UnreadableFileException {
        Path file = new CfSketch().attribute("time", "units", "seconds").variable("time_coverage_start", "text",
                Arrays.copyOf("2011-05-20T10:54:16Z".toCharArray(), 32)).write(folder);

        assertThat(facts(file).sweeps().get(0).startMs()).isEqualTo(ms("2011-05-20T10:54:16Z"));
    }

    @Test
    void quirk17RaysWithoutATimeTakeOneBetweenTheirNeighbours() throws UnreadableFileException {
        double[] time = {Double.NaN, 1, 2, Double.NaN, Double.NaN, 5, 6, 7, 8, 9, 10, Double.NaN};
        Path file = new CfSketch().variable("time", "time", time)
                .attribute("time", "units", "seconds since 2020-06-11T12:00:00Z").write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.rays().timeMs(0)).isEqualTo(ms("2020-06-11T12:00:01Z"));
        assertThat(sweep.rays().timeMs(3)).isEqualTo(ms("2020-06-11T12:00:03Z"));
        assertThat(sweep.rays().timeMs(11)).isEqualTo(ms("2020-06-11T12:00:10Z"));
    }

    @Test
    void quirk18TransitionRaysAreDroppedAndElevationWraps() throws UnreadableFileException {
        float[] elevation = new float[12];
        Arrays.fill(elevation, 359.78f);
        byte[] transition = {1, 1, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0};
        Path file = new CfSketch().variable("elevation", "time", elevation)
                .variable("antenna_transition", "time", transition).write(folder);

        assertThat(facts(file).sweeps().get(0).rays()).isEqualTo(10);
        assertThat(facts(file).sweeps().get(0).elevationDeg()).isCloseTo(-0.22, within(1e-4));
        assertThat(read(file, 0).reflectivity().at(2, 0)).isEqualTo(2f);
        assertThat(read(file, 0).reflectivity().at(0, 0)).isNaN();
    }

    @Test
    void quirk18RhiIsToldFromItsAnglesWhereTheModeIsNot() {
        float[] azimuth = new float[12];
        float[] elevation = new float[12];
        for (int i = 0; i < 12; i++) {
            azimuth[i] = 37;
            elevation[i] = 3 * i;
        }
        Path file = new CfSketch().without("sweep_mode").variable("azimuth", "time", azimuth)
                .variable("elevation", "time", elevation).write(folder);

        assertThat(refusal(file)).contains("RHI");
    }

    @Test
    void quirk18VerticalScanIsRefused() {
        float[] elevation = new float[12];
        Arrays.fill(elevation, 90);
        assertThat(refusal(new CfSketch().without("sweep_mode").variable("elevation", "time", elevation)
                .write(folder))).contains("vertical");
    }

    @Test
    void quirk19TextPaddedByBlanksOrNullsIsStripped() throws UnreadableFileException {
        Path file = new CfSketch().attribute("", "instrument_name", "abc \0\0").write(folder);

        assertThat(facts(file).site().name()).isEqualTo("abc");
    }

    @Test
    void velocityTowardTheRadarIsTurnedAround() throws UnreadableFileException {
        float[] toward = new float[12 * 8];
        Arrays.fill(toward, 4);
        float[] nyquist = new float[12];
        Arrays.fill(nyquist, 16);
        Path file = new CfSketch().variable("VR", "time range", toward).attribute("VR", "standard_name",
                "radial_velocity_of_scatterers_toward_instrument").variable("nyquist_velocity", "time", nyquist)
                .write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.velocity().orElseThrow().at(0, 0)).isEqualTo(-4f);
        assertThat(sweep.nyquistMs()).isEqualTo(16);
    }
}
