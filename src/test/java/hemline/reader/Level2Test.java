package hemline.reader;

import static hemline.reader.ReaderTestKit.facts;
import static hemline.reader.ReaderTestKit.loop;
import static hemline.reader.ReaderTestKit.ms;
import static hemline.reader.ReaderTestKit.read;
import static hemline.reader.ReaderTestKit.refusal;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geodesy.GeoPoint;
import hemline.sweep.Field;
import hemline.sweep.Loop;
import hemline.sweep.Sweep;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.zip.GZIPOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Level II archives made up from interface documents 2620002 and 2620010 of the Radar Operations Center. */
class Level2Test {
    @TempDir
    private Path folder;

    private static Level2Sketch splitCutVolume(String version) {
        return new Level2Sketch(version).pattern(0.48, 0.48, 1.45, 2.4)
                .cut(0.48, 12, "REF", "ZDR").cut(0.48, 12, "REF", "VEL").cut(1.45, 12, "REF", "VEL")
                .cut(2.4, 12, "REF", "VEL");
    }

    @ParameterizedTest
    @ValueSource(strings = {"AR2V0001", "AR2V0006", "AR2V0008"})
    void generationsOfTheArchiveReadAlikePackedAndPlain(String version) throws UnreadableFileException {
        Path plain = Level2Sketch.write(folder, "plain", splitCutVolume(version).plain());
        Path packed = Level2Sketch.write(folder, "packed", splitCutVolume(version).packed(5));

        for (Path file : new Path[] {plain, packed}) {
            RadarFileFacts facts = facts(file);
            assertThat(facts.format()).startsWith("WSR-88D Level II " + version + " message 31 VCP 212");
            assertThat(facts.site().name()).isEqualTo(version.equals("AR2V0008") ? "TJUA" : "KXXX");
            assertThat(facts.site().altitudeM()).isEqualTo(299);
            assertThat(facts.antennaAboveSiteM()).isEqualTo(30);
            assertThat(facts.sweeps()).hasSize(4);
            Sweep sweep = read(file, 1);
            assertThat(sweep.site().altitudeM()).isEqualTo(329);
            assertThat(sweep.startMs()).isEqualTo(ms("2020-06-11T12:00:12Z"));
            assertThat(sweep.reflectivity().at(3, 0)).isEqualTo(3f);
            assertThat(sweep.reflectivity().at(3, 1)).isEqualTo(Field.BELOW_DETECTION);
            assertThat(sweep.reflectivity().at(3, 2)).isNaN();
            assertThat(sweep.nyquistMs()).isEqualTo(26.5);
        }
    }

    @Test
    void splitCutIsOneSweepWithTheDopplerPartsVelocityOnTheReflectivitysGates() {
        Path file = Level2Sketch.write(folder, "a", splitCutVolume("AR2V0006").packed(5));

        OpenedLoop opened = loop(file);
        assertThat(opened.loop().size()).isEqualTo(1);
        Sweep sweep = opened.loop().sweep(0);
        assertThat(sweep.startMs()).isEqualTo(ms("2020-06-11T12:00:00Z"));
        assertThat(sweep.gateSpacingM()).isEqualTo(1000);
        // The gate of 500 m lies between velocity gates 1 (375 m) and 2 (625 m); code 1 of gate 2 is range folded.
        assertThat(sweep.velocity().orElseThrow().at(4, 0)).isNaN();
        // The gate of 1500 m: velocity gate 6 of 1625 m, (129 + 8 + 6 - 129) / 2.
        assertThat(sweep.velocity().orElseThrow().at(4, 1)).isEqualTo(7f);
        assertThat(opened.notes()).anyMatch(n -> n.contains("split cut"));
    }

    @Test
    void lowestElevationScannedAgainLaterInTheVolumeIsAnotherSweep() {
        byte[] volume = new Level2Sketch("AR2V0006").pattern(0.5, 0.5, 1.5, 2.4, 0.5, 0.5, 3.5)
                .cut(0.5, 12, "REF").cut(0.5, 12, "REF", "VEL").cut(1.5, 12, "REF", "VEL").cut(2.4, 12, "REF")
                .cut(0.5, 12, "REF").cut(0.5, 12, "REF", "VEL").cut(3.5, 12, "REF").packed(7);

        OpenedLoop opened = loop(Level2Sketch.write(folder, "a", volume));
        assertThat(opened.loop().size()).isEqualTo(2);
        assertThat(opened.loop().sweep(1).source()).isEqualTo("a sweep 4");
        assertThat(opened.loop().sweep(1).startMs()).isEqualTo(ms("2020-06-11T12:00:48Z"));
        assertThat(opened.loop().sweep(1).velocity()).isPresent();
    }

    /** What the loop reads again, from where it found the cut, is what it read at first. */
    @Test
    void sweepReadAgainFromItsPlaceIsTheSame() throws UnreadableFileException {
        byte[] volume = new Level2Sketch("AR2V0006").pattern(1.5, 0.5, 0.5, 2.4).cut(1.5, 12, "REF")
                .cut(0.5, 12, "REF").cut(0.5, 12, "REF", "VEL").cut(2.4, 12, "REF").packed(7);
        for (byte[] bytes : new byte[][] {volume, splitCutVolume("AR2V0003").plain()}) {
            Path file = Level2Sketch.write(folder, "a", bytes);
            FileSurvey survey = FileSurvey.of(new InputPaths.Candidate(file, false), ReadOptions.defaults(),
                    new SweepCache(0));
            SweepTicket ticket = survey.tickets().get(0);
            assertThat(ticket.span()).isPresent();

            Sweep again = ticket.load(FieldChoice.automatic());
            Sweep whole;
            try (RadarFile opened = RadarFiles.open(file)) {
                whole = opened.read(ticket.cut(), FieldChoice.automatic());
            }
            assertThat(again.source()).isEqualTo(whole.source());
            assertThat(again.startMs()).isEqualTo(whole.startMs());
            assertThat(again.reflectivity().toArray()).isEqualTo(whole.reflectivity().toArray());
            assertThat(again.velocity().orElseThrow().toArray()).isEqualTo(whole.velocity().orElseThrow().toArray());
        }
    }

    @Test
    void messageOneHasNoPositionUntilItIsGiven() throws UnreadableFileException {
        byte[] volume = new Level2Sketch("AR2V0001").legacyCut(0.5, 12, true, false).legacyCut(0.5, 12, false, true)
                .legacyCut(1.5, 12, true, true).plain();
        Path file = Level2Sketch.write(folder, "a", volume);

        assertThat(facts(file).format()).contains("message 1 VCP 21");
        assertThat(facts(file).sweeps()).hasSize(3);
        OpenedLoop opened = loop(file);
        assertThat(opened.site().position()).isEmpty();
        assertThat(opened.notes()).anyMatch(n -> n.contains("--position"));
        Sweep sweep = opened.loop().sweep(0);
        assertThat(sweep.rays().azimuthDeg(2)).isCloseTo(75, within(0.003));
        assertThat(sweep.reflectivity().at(2, 3)).isEqualTo(3.5f);
        assertThat(sweep.reflectivity().at(2, 1)).isEqualTo(Field.BELOW_DETECTION);
        // 3000 m is 13.5 gates of 250 m from -375 m; gate 14 holds 66 + 4 + 14 at 1 m/s a code.
        assertThat(sweep.velocity().orElseThrow().at(2, 3)).isEqualTo(66 + 4 + 14 - 129f);

        OpenedLoop placed = loop(ReadOptions.defaults().withPosition(new GeoPoint(45.5, -98.4), 420), file);
        assertThat(placed.site().position()).contains(new GeoPoint(45.5, -98.4));
        assertThat(placed.loop().sweep(0).site().altitudeM()).isEqualTo(420);
    }

    @Test
    void incompleteCutIsKeptAsFarAsItGoes() throws UnreadableFileException {
        byte[] whole = new Level2Sketch("AR2V0006").cut(0.5, 12, "REF", "VEL").packed(4);
        for (byte[] bytes : new byte[][] {
            new Level2Sketch("AR2V0003").cut(0.5, 7, "REF", "VEL").plain(),
            Arrays.copyOf(whole, whole.length - 60)}) {
            Path file = Level2Sketch.write(folder, "a", bytes);
            int rays = facts(file).sweeps().get(0).rays();
            assertThat(rays).isBetween(7, 11);
            Sweep sweep = loop(file).loop().sweep(0);
            assertThat(sweep.rayCount()).isEqualTo(12);
            assertThat(sweep.reflectivity().at(6, 0)).isEqualTo(6f);
            assertThat(sweep.reflectivity().at(11, 0)).isNaN();
        }
    }

    @Test
    void gzipAroundPackedOrPlainMessagesIsReadWithoutTraces() throws IOException, UnreadableFileException {
        PrintStream before = System.out;
        ByteArrayOutputStream printed = new ByteArrayOutputStream();
        System.setOut(new PrintStream(printed));
        try {
            for (byte[] bytes : new byte[][] {splitCutVolume("AR2V0006").packed(5), splitCutVolume("AR2V0003").plain()}) {
                ByteArrayOutputStream packed = new ByteArrayOutputStream();
                try (GZIPOutputStream gzip = new GZIPOutputStream(packed)) {
                    gzip.write(bytes);
                }
                Path file = Level2Sketch.write(folder, "x.gz", packed.toByteArray());
                assertThat(read(file, 0).reflectivity().at(5, 0)).isEqualTo(5f);
                assertThat(loop(file).loop().size()).isEqualTo(1);
            }
        } finally {
            System.setOut(before);
        }
        assertThat(printed.toString()).isEmpty();
        try (var listing = Files.list(folder)) {
            assertThat(listing).hasSize(1);
        }
    }

    @Test
    void archiveWithoutARadialIsRefused() {
        assertThat(refusal(Level2Sketch.write(folder, "a", new Level2Sketch("AR2V0006").pattern(0.5).packed(3))))
                .contains("holds no radial");
        assertThat(refusal(Level2Sketch.write(folder, "b", Arrays.copyOf(splitCutVolume("AR2V0006").plain(), 20))))
                .contains("ends after 20 bytes");
    }

    @Test
    void planThatIsNotKeptToDoesNotHideTheLowCuts() {
        byte[] volume = new Level2Sketch("AR2V0006").pattern(0.5, 1.5, 2.5).cut(4, 12, "REF").cut(0.9, 12, "REF")
                .plain();

        assertThat(loop(Level2Sketch.write(folder, "a", volume)).loop().sweep(0).elevationDeg())
                .isCloseTo(0.9, within(1e-6));
    }

    @Test
    void loopStaysReadableByManyThreads() {
        Path file = Level2Sketch.write(folder, "a", splitCutVolume("AR2V0006").packed(5));
        Loop loop = loop(file).loop();
        float[] first = loop.sweep(0).reflectivity().toArray();
        assertThat(java.util.stream.IntStream.range(0, 16).parallel()
                .allMatch(i -> Arrays.equals(first, loop.sweep(0).reflectivity().toArray()))).isTrue();
    }
}
