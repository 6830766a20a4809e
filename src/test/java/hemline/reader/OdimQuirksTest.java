package hemline.reader;

import static hemline.reader.ReaderTestKit.facts;
import static hemline.reader.ReaderTestKit.loop;
import static hemline.reader.ReaderTestKit.ms;
import static hemline.reader.ReaderTestKit.read;
import static hemline.reader.ReaderTestKit.refusal;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.sweep.Field;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * Quirks of real ODIM_H5 files, each known from public issue threads of open radar libraries and numbered as in
 * {@code docs/formats.md}.
 */
class OdimQuirksTest {
    @TempDir
    private Path folder;

    @ParameterizedTest
    @CsvSource({"V2_0,0.5", "V2_3,0.5", "V2_4,500.0", "V2_4,0.5", "V2_2,500.0", "V3_0,500"})
    void quirk01NearEdgeIsInKmUpTo23AndInMetresFrom24(String version, double stated) throws UnreadableFileException {
        Path file = new OdimSketch("ODIM_H5/" + version, "PVOL").dataset(1, 0.5)
                .set("/dataset1/where", "rstart", stated).write(folder);

        assertThat(facts(file).sweeps().get(0).firstGateCentreM()).isCloseTo(750, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"0,223.5,111.75", "0.125,250,250", "0.5,499.998,749.999", "0.9,960,1380", "1.0,1000,1500"})
    void quirk02NearEdgeAndHalfAGateGiveTheFirstCentre(double startKm, double gateM, double centreM)
            throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/where", "rstart", startKm)
                .set("/dataset1/where", "rscale", gateM).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.firstGateCentreM()).isCloseTo(centreM, within(1e-9));
        assertThat(sweep.gateSpacingM()).isEqualTo(gateM);
    }

    @Test
    void quirk03FirstRadiatedRayTurnsTimesAndNeverData() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/where", "a1gate", 5).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.rays().azimuthDeg(0)).isEqualTo(15);
        assertThat(sweep.reflectivity().at(0, 0)).isEqualTo(-27f);
        assertThat(sweep.rays().timeMs(5)).isEqualTo(ms("2020-06-11T12:00:00.500Z"));
        assertThat(sweep.rays().timeMs(4)).isEqualTo(ms("2020-06-11T12:00:11.500Z"));
        assertThat(sweep.rays().timeMs(0)).isEqualTo(ms("2020-06-11T12:00:07.500Z"));
    }

    @Test
    void quirk03FirstRadiatedRayBeyondTheTurnIsNoRay() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/where", "a1gate", 394).write(folder);

        assertThat(read(file, 0).rays().timeMs(0)).isEqualTo(ms("2020-06-11T12:00:00.500Z"));
    }

    @Test
    void quirk04ImpliedAzimuthsAreMidRay() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).write(folder);

        assertThat(read(file, 0).rays().azimuthDeg(11)).isEqualTo(345);
    }

    @Test
    void quirk04StartAngleOfMinusHalfARayCentresTheFirstOnNorth() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/how", "astart", -15.0).write(folder);

        assertThat(facts(file).sweeps().get(0).firstRayAzimuthDeg()).isZero();
        assertThat(read(file, 0).reflectivity().at(1, 0)).isEqualTo(-26.5f);
    }

    @Test
    void quirk04RayEndsAreAveragedAcrossNorthAndWinOverImpliedAngles() throws UnreadableFileException {
        double[] start = IntStream.range(0, 12).mapToDouble(i -> (345 + 30 * i) % 360).toArray();
        double[] stop = IntStream.range(0, 12).mapToDouble(i -> (15 + 30 * i) % 360).toArray();
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/how", "startazA", start)
                .set("/dataset1/how", "stopazA", stop).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.rays().azimuthDeg(0)).isZero();
        assertThat(sweep.rays().azimuthDeg(11)).isEqualTo(330);
    }

    @Test
    void quirk05RaysInAnyOrderAreSortedWithTheirTimesAndValues() throws UnreadableFileException {
        double[] start = IntStream.range(0, 12).mapToDouble(i -> ((200 - 30 * i) % 360 + 360) % 360).toArray();
        double[] stop = Arrays.stream(start).map(a -> (a + 359) % 360).toArray();
        double[] time = IntStream.range(0, 12).mapToDouble(i -> ms("2020-06-11T12:00:00Z") / 1000.0 + i).toArray();
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/how", "startazA", start)
                .set("/dataset1/how", "stopazA", stop).set("/dataset1/how", "startazT", time).write(folder);

        Sweep sweep = read(file, 0);
        int first = sweep.rays().nearestRay(199.5);
        assertThat(sweep.rays().azimuthDeg(first)).isEqualTo(199.5);
        assertThat(sweep.rays().timeMs(first)).isEqualTo(ms("2020-06-11T12:00:00Z"));
        assertThat(sweep.reflectivity().at(first, 0)).isEqualTo(-27f);
        int third = sweep.rays().nearestRay(139.5);
        assertThat(sweep.rays().timeMs(third)).isEqualTo(ms("2020-06-11T12:00:02Z"));
        assertThat(sweep.reflectivity().at(third, 0)).isEqualTo(-26f);
    }

    @ParameterizedTest
    @CsvSource({"357", "359", "360", "361", "367"})
    void quirk06AnyNumberOfRaysInOneTurn(int rays) throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5, rays, 4).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.rayCount()).isEqualTo(rays);
        assertThat(sweep.rays().azimuthDeg(1) - sweep.rays().azimuthDeg(0)).isCloseTo(360.0 / rays, within(1e-9));
    }

    @Test
    void quirk07UndetectAndNodataAreDifferentFacts() throws UnreadableFileException {
        Sweep sweep = read(OdimSketch.volume().dataset(1, 0.5).write(folder), 0);

        assertThat(sweep.reflectivity().at(0, 0)).isEqualTo(-27f);
        assertThat(sweep.reflectivity().at(0, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(0, 2)).isNaN();
    }

    @Test
    void quirk07CodesHoldWithGainOneAndOffsetZero() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/data1/what", "gain", 1.0)
                .set("/dataset1/data1/what", "offset", 0.0).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.reflectivity().at(3, 0)).isEqualTo(13f);
        assertThat(sweep.reflectivity().at(3, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(3, 2)).isNaN();
    }

    @Test
    void quirk07OneCodeForBothIsUndetectWhereTheRaySawAnything() throws UnreadableFileException {
        int[][] codes = OdimSketch.codes(12, 8);
        codes[4] = new int[8];
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 1, "DBZH", codes)
                .set("/dataset1/data1/what", "nodata", 0.0).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.reflectivity().at(3, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(4, 1)).isNaN();
    }

    @Test
    void quirk08HugeAndInfiniteCodesAreComparedBeforeScaling() throws UnreadableFileException {
        double huge = 1.797e308;
        double[][] values = new double[12][8];
        for (double[] ray : values) {
            Arrays.fill(ray, huge);
            ray[0] = 21;
            ray[1] = Double.NEGATIVE_INFINITY;
        }
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 1, "DBZH", values)
                .set("/dataset1/data1/what", "undetect", huge)
                .set("/dataset1/data1/what", "nodata", Double.NEGATIVE_INFINITY).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.reflectivity().at(0, 0)).isEqualTo(-21.5f);
        assertThat(sweep.reflectivity().at(0, 1)).isNaN();
        assertThat(sweep.reflectivity().at(0, 2)).isEqualTo(Field.BELOW_DETECTION);
    }

    @Test
    void quirk08HugeCodeInFloatArrayIsStoredAsInfinity() throws UnreadableFileException {
        float[][] values = new float[12][8];
        for (float[] ray : values) {
            Arrays.fill(ray, (float) 1.797e308);
            ray[0] = 21;
            ray[1] = Float.NaN;
        }
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 1, "DBZH", values)
                .set("/dataset1/data1/what", "undetect", 1.797e308)
                .set("/dataset1/data1/what", "nodata", Double.NaN).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.reflectivity().at(0, 0)).isEqualTo(-21.5f);
        assertThat(sweep.reflectivity().at(0, 1)).isNaN();
        assertThat(sweep.reflectivity().at(0, 2)).isEqualTo(Field.BELOW_DETECTION);
    }

    @Test
    void quirk09ScalingIsInheritedFromDatasetAndRoot() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).dataset(2, 1.0)
                .without("/dataset1/data1/what", "gain").without("/dataset1/data1/what", "offset")
                .without("/dataset1/data1/what", "undetect").without("/dataset2/data1/what", "gain")
                .set("/dataset1/what", "gain", 2.0).set("/what", "gain", 3.0).set("/dataset1/what", "offset", -40.0)
                .set("/what", "undetect", 0.0).write(folder);

        assertThat(read(file, 0).reflectivity().at(0, 0)).isEqualTo(-20f);
        assertThat(read(file, 0).reflectivity().at(0, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(read(file, 1).reflectivity().at(0, 0)).isEqualTo(-2f);
    }

    @Test
    void quirk10QuantityIsChosenExplicitlyAndQualityLayersAreNoFields() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 1, "TH", OdimSketch.codes(12, 8))
                .field(1, 2, "DBZV", OdimSketch.codes(12, 8)).field(1, 3, "DBZH", OdimSketch.codes(12, 8))
                .set("/dataset1/data1/quality1/what", "gain", 1.0)
                .array("/dataset1/data1/quality1/data", new int[12][8])
                .array("/dataset1/quality1/data", new int[12][8]).write(folder);

        assertThat(facts(file).sweeps().get(0).fields()).extracting(FieldFacts::name)
                .containsExactly("TH", "DBZV", "DBZH");
        assertThat(read(file, 0).reflectivity().name()).isEqualTo("DBZH");
        assertThat(read(file, 0, FieldChoice.named("TH")).reflectivity().name()).isEqualTo("TH");
        assertThat(loop(file).notes()).anyMatch(n -> n.contains("reflectivity DBZH chosen among DBZH, TH, DBZV"));
    }

    @Test
    void quirk10QuantityThatOccursTwiceIsReported() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 2, "DBZH", new int[12][8]).write(folder);

        assertThat(read(file, 0).reflectivity().at(0, 0)).isEqualTo(-27f);
        assertThat(facts(file).sweeps().get(0).notes()).anyMatch(n -> n.contains("DBZH occurs twice"));
    }

    @Test
    void quirk11DatasetsAreNumberedAndTheLowestMayStandAnywhere() throws UnreadableFileException {
        OdimSketch sketch = OdimSketch.volume();
        for (int i = 1; i <= 10; i++) {
            sketch.dataset(i, i == 10 ? 0.4 : 20 - i).set("/dataset" + i + "/what", "starttime", "1200" + (10 + 4 * i))
                    .set("/dataset" + i + "/what", "endtime", "1200" + (13 + 4 * i));
        }
        Path file = sketch.write(folder);

        assertThat(facts(file).sweeps()).extracting(SweepFacts::place).element(1).isEqualTo("/dataset2");
        assertThat(facts(file).sweeps().get(9).elevationDeg()).isEqualTo(0.4);
        OpenedLoop opened = loop(file);
        assertThat(opened.loop().size()).isEqualTo(1);
        assertThat(opened.loop().sweep(0).source()).isEqualTo("sketch.h5 sweep 9");
    }

    @Test
    void quirk11LowTiltRepeatedWithinAVolumeGivesSeveralSweeps() {
        Path file = OdimSketch.volume().dataset(1, 0.5).dataset(2, 4.0).dataset(3, 0.5)
                .set("/dataset3/what", "starttime", "120230").set("/dataset3/what", "endtime", "120242").write(folder);

        OpenedLoop opened = loop(file);
        assertThat(opened.loop().size()).isEqualTo(2);
        assertThat(opened.loop().sweep(1).startMs()).isEqualTo(ms("2020-06-11T12:02:30.500Z"));
        assertThat(opened.inputs().get(0).sweepsTaken()).isEqualTo(2);
    }

    @Test
    void quirk12EachSweepHasItsOwnGates() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).dataset(2, 1.2, 24, 5)
                .set("/dataset2/where", "rscale", 250.0).write(folder);

        assertThat(read(file, 0).gateSpacingM()).isEqualTo(500);
        assertThat(read(file, 1).gateSpacingM()).isEqualTo(250);
        assertThat(read(file, 1).rayCount()).isEqualTo(24);
        assertThat(read(file, 1).gateCount()).isEqualTo(5);
    }

    @Test
    void quirk17TimeIsThatOfTheDatasetAndNotTheNominalOne() throws UnreadableFileException {
        Path file = OdimSketch.volume().set("/what", "time", "114500").dataset(1, 0.5).write(folder);

        assertThat(facts(file).sweeps().get(0).startMs()).isEqualTo(ms("2020-06-11T12:00:00Z"));
    }

    @Test
    void quirk17MissingEndFollowsFromTheTurningRateOrIsSaid() throws UnreadableFileException {
        OdimSketch sketch = OdimSketch.volume().dataset(1, 0.5).without("/dataset1/what", "enddate");
        assertThat(facts(sketch.write(folder)).sweeps().get(0).notes()).anyMatch(n -> n.contains("no usable end time"));

        Path file = sketch.set("/dataset1/how", "rpm", 3.0).write(folder, "turning.h5");
        assertThat(facts(file).sweeps().get(0).endMs()).isEqualTo(ms("2020-06-11T12:00:20Z"));
    }

    @Test
    void quirk17SweepOverMidnightEndsTheNextDay() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/what", "starttime", "235955")
                .set("/dataset1/what", "endtime", "000007").write(folder);

        assertThat(facts(file).sweeps().get(0).endMs()).isEqualTo(ms("2020-06-12T00:00:07Z"));
        assertThat(read(file, 0).rays().timeMs(11)).isEqualTo(ms("2020-06-12T00:00:06.500Z"));
    }

    @Test
    void quirk18ElevationBelowTheHorizonMayBeWrittenAs359() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 359.78).write(folder);

        assertThat(facts(file).sweeps().get(0).elevationDeg()).isCloseTo(-0.22, within(1e-9));
        assertThat(loop(file).loop().size()).isEqualTo(1);
    }

    @Test
    void quirk18SectorScanKeepsTheRestOfTheTurnAsNotMeasured() throws UnreadableFileException {
        Path file = new OdimSketch("ODIM_H5/V2_2", "AZIM").dataset(1, 0.5).set("/dataset1/where", "startaz", 300.0)
                .set("/dataset1/where", "stopaz", 60.0).write(folder);

        assertThat(facts(file).sweeps().get(0).rays()).isEqualTo(12);
        Sweep sweep = read(file, 0);
        assertThat(sweep.rayCount()).isEqualTo(36);
        assertThat(sweep.reflectivity().at(sweep.rays().nearestRay(305), 0)).isEqualTo(-27f);
        assertThat(sweep.reflectivity().at(sweep.rays().nearestRay(55), 0)).isEqualTo(-21.5f);
        assertThat(sweep.reflectivity().at(sweep.rays().nearestRay(180), 0)).isNaN();
    }

    @Test
    void quirk18ElevationScanIsRefused() {
        Path file = new OdimSketch("ODIM_H5/V2_2", "ELEV").dataset(1, 0.5).write(folder);

        assertThat(refusal(file)).contains("RHI");
    }

    @Test
    void quirk19NumbersMayBeArraysOfOneOrText() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).set("/dataset1/where", "rscale", new double[] {600})
                .set("/dataset1/where", "elangle", "0.7").set("/where", "lat", new float[] {50})
                .set("/dataset1/where", "nbins", new long[] {8}).write(folder);

        assertThat(facts(file).sweeps().get(0).gateSpacingM()).isEqualTo(600);
        assertThat(facts(file).sweeps().get(0).elevationDeg()).isEqualTo(0.7);
        assertThat(facts(file).site().position().orElseThrow().latitudeDeg()).isEqualTo(50);
    }

    @Test
    void quirk19UnambiguousVelocityMayBeMissing() throws UnreadableFileException {
        Path file = OdimSketch.volume().dataset(1, 0.5).field(1, 2, "VRADH", OdimSketch.codes(12, 8)).write(folder);

        Sweep sweep = read(file, 0);
        assertThat(sweep.velocity()).isPresent();
        assertThat(sweep.nyquistMs()).isNaN();
    }
}
