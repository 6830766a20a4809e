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
import java.io.IOException;
import java.io.OutputStream;
import java.net.URISyntaxException;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.zip.GZIPOutputStream;
import org.apache.commons.compress.compressors.bzip2.BZip2CompressorOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Quirks of strings, storages and packings, numbered as in {@code docs/formats.md}. The files were written by the
 * HDF5 and netCDF C libraries with {@code make_fixtures.py}, which says what is in them.
 */
class ContainerQuirksTest {
    @TempDir
    private Path folder;

    static Path fixture(String name) {
        try {
            return Path.of(ContainerQuirksTest.class.getResource("/reader/" + name).toURI());
        } catch (URISyntaxException e) {
            throw new AssertionError(e);
        }
    }

    private static void checkOdimCodes(Path file) throws UnreadableFileException {
        Sweep sweep = read(file, 0);
        assertThat(sweep.rayCount()).isEqualTo(24);
        assertThat(sweep.reflectivity().at(0, 0)).isNaN();
        assertThat(sweep.reflectivity().at(0, 1)).isEqualTo(Field.BELOW_DETECTION);
        for (int ray = 1; ray < 24; ray++) {
            for (int gate = 0; gate < 10; gate++) {
                assertThat(sweep.reflectivity().at(ray, gate)).isEqualTo(-32 + 0.5f * (1 + (7 * ray + 3 * gate) % 200));
            }
        }
    }

    @Test
    void quirk19TextOfEveryKindAndManyAttributes() throws UnreadableFileException {
        Path file = fixture("odim_strings.h5");

        assertThat(facts(file).site().name()).isEqualTo("WMO 02606");
        assertThat(facts(file).sweeps().get(0).startMs()).isEqualTo(ms("2020-06-11T12:00:00Z"));
        assertThat(facts(file).sweeps().get(0).fields().get(0).name()).isEqualTo("DBZH");
        assertThat(read(file, 0).beamWidthDeg()).isEqualTo(0.9);
        checkOdimCodes(file);
        try (ArrayFile arrays = Hdf5File.open(new InputFile(file), ByteBuffer.wrap(Files.readAllBytes(file)))) {
            assertThat(arrays.root().group("what").orElseThrow().attributes().text("source"))
                    .contains("WMO:02606,PLC:Ängelholm");
            assertThat(arrays.root().group("how").orElseThrow().attributes().text("note07")).contains("füller 7");
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    @Test
    void quirk20TextHeapOfFileWithFourByteLengths() throws UnreadableFileException {
        assertThat(facts(fixture("odim_heap4.h5")).site().name()).isEqualTo("sehuv");
        checkOdimCodes(fixture("odim_heap4.h5"));
    }

    @Test
    void quirk20UserBlockAndChecksumWithoutShuffle() throws UnreadableFileException {
        checkOdimCodes(fixture("odim_userblock.h5"));
    }

    @ParameterizedTest
    @CsvSource({"odim_lzf.h5,id=32000", "odim_scaleoffset.h5,id=6"})
    void quirk20FilterThatIsNotReadIsNamedWithAMend(String name, String filter) {
        assertThat(refusal(fixture(name))).contains("filter").contains(filter).contains("h5repack");
    }

    @ParameterizedTest
    @ValueSource(strings = {"storage_earliest.h5", "storage_latest.h5"})
    void quirk20EveryStorageOfHdf5GivesTheSameArray(String name) throws UnreadableFileException, IOException {
        Path file = fixture(name);
        try (ArrayFile arrays = Hdf5File.open(new InputFile(file), ByteBuffer.wrap(Files.readAllBytes(file)))) {
            for (String array : new String[] {"contiguous", "compact", "chunked", "gzip", "single_chunk",
                "unlimited_rows", "unlimited_both"}) {
                check(arrays, array, 0);
            }
            for (String array : new String[] {"big_endian", "shuffle_gzip", "fletcher", "shuffle_gzip_fletcher",
                "double"}) {
                check(arrays, array, 1000);
            }
            double[] partly = all(arrays, "partly_written");
            assertThat(partly[9 * 17]).isEqualTo(-7);
            assertThat(partly[10 * 17 + 3]).isEqualTo(1000 + (37 * 10 + 33) % 251);
            assertThat(partly[15 * 17]).isEqualTo(-7);
            assertThat(all(arrays, "never_written")).containsOnly(-7);
            assertThat(all(arrays, "never_written_chunked")).containsOnly(-7.5);
            assertThat(all(arrays, "masked")).isEqualTo(all(arrays, "masked_plain"));
            assertThat(all(arrays, "enum")[1]).isEqualTo(1);
        }
    }

    private static double[] all(ArrayFile arrays, String name) throws UnreadableFileException {
        return arrays.root().variable(name).orElseThrow().read().toDoubles();
    }

    private static void check(ArrayFile arrays, String name, int base) throws UnreadableFileException {
        ArrayVariable variable = arrays.root().variable(name).orElseThrow();
        assertThat(variable.shape()).containsExactly(23, 17);
        double[] whole = variable.read().toDoubles();
        double[] rows = variable.rows(6, 11).toDoubles();
        for (int i = 0; i < 23; i++) {
            for (int j = 0; j < 17; j++) {
                double expected = base + (37 * i + 11 * j) % 251;
                assertThat(whole[17 * i + j]).as("%s[%d][%d]", name, i, j).isEqualTo(expected);
                if (i >= 6 && i < 17) {
                    assertThat(rows[17 * (i - 6) + j]).as("%s rows [%d][%d]", name, i, j).isEqualTo(expected);
                }
            }
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"cfradial2_sweep_0.nc", "cfradial2_sweep_0000.nc"})
    void quirk15SweepGroupsOfCfRadial2InFullAndPartialConformance(String name) throws UnreadableFileException {
        Path file = fixture(name);

        assertThat(facts(file).format()).isEqualTo("CfRadial 2.0 netCDF-4");
        assertThat(facts(file).sweeps()).extracting(SweepFacts::gates).containsExactly(10, 9);
        assertThat(facts(file).sweeps().get(1).fields()).extracting(FieldFacts::name).containsExactly("ZDR", "DBZH");
        OpenedLoop opened = loop(file);
        Sweep sweep = opened.loop().sweep(0);
        assertThat(sweep.elevationDeg()).isEqualTo(0.5);
        assertThat(sweep.startMs()).isEqualTo(ms("2020-06-11T12:00:30Z"));
        assertThat(sweep.reflectivity().name()).isEqualTo("DBZH");
        assertThat(sweep.reflectivity().at(3, 4)).isCloseTo(4.4f, within(1e-5f));
        assertThat(sweep.reflectivity().at(0, 1)).isEqualTo(Field.BELOW_DETECTION);
        assertThat(sweep.reflectivity().at(0, 2)).isNaN();
    }

    @ParameterizedTest
    @ValueSource(strings = {"cfradial1_cdf1.nc", "cfradial1_cdf2.nc", "cfradial1_cf4.nc"})
    void cfRadialOneInItsThreeContainers(String name) throws UnreadableFileException {
        Sweep sweep = read(fixture(name), 0);

        assertThat(sweep.rayCount()).isEqualTo(24);
        assertThat(sweep.reflectivity().at(5, 7)).isCloseTo(5.7f, within(1e-5f));
        assertThat(sweep.rays().timeMs(23)).isEqualTo(ms("2020-06-11T12:00:23Z"));
    }

    @Test
    void variantOfNetcdfThatIsNotReadIsNamedWithAMend() {
        assertThat(refusal(fixture("cfradial1_cdf5.nc"))).contains("CDF-5").contains("nccopy");
    }

    @ParameterizedTest
    @CsvSource({"odim_userblock.h5,gz,x.nc", "odim_heap4.h5,bz2,x.txt", "cfradial1_cdf1.nc,gz,x.h5",
        "cfradial1_cf4.nc,bz2,noname", "cfradial2_sweep_0.nc,none,x.bz2", "cfradial1_cdf2.nc,none,x.gz"})
    void quirk20ContentAndNotTheNameTellsPackingAndFormat(String name, String packing, String as)
            throws IOException, UnreadableFileException {
        Path file = folder.resolve(as);
        try (OutputStream raw = Files.newOutputStream(file);
                OutputStream out = packing.equals("gz") ? new GZIPOutputStream(raw)
                        : packing.equals("bz2") ? new BZip2CompressorOutputStream(raw) : raw) {
            Files.copy(fixture(name), out);
        }

        assertThat(read(file, 0).rayCount()).isEqualTo(24);
        try (var listing = Files.list(folder)) {
            assertThat(listing).as("nothing is written beside the input").containsExactly(file);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"odim_userblock.h5", "cfradial1_cdf1.nc", "cfradial1_cf4.nc", "cfradial2_sweep_0.nc"})
    void quirk20TruncatedFileIsRefusedWhereverItEnds(String name) throws IOException {
        byte[] whole = Files.readAllBytes(fixture(name));
        for (int part = 1; part < 12; part++) {
            Path file = folder.resolve("cut" + part);
            Files.write(file, Arrays.copyOf(whole, whole.length * part / 12));
            OpenedLoop opened = loop(file);
            InputFate fate = opened.inputs().get(0);
            assertThat(fate.reason()).as("%s cut to %d/12", name, part).doesNotContain("Exception");
            assertThat(fate.fate()).as("%s cut to %d/12", name, part).isEqualTo(InputFate.Fate.REFUSED);
        }
    }

    @Test
    void quirk20VelocityInASisterFileIsCarriedToItsReflectivity() throws UnreadableFileException {
        Path reflectivity = OdimSketch.volume().dataset(1, 0.5).write(folder, "a_dbzh.h5");
        Path velocity = OdimSketch.volume().dataset(1, 0.5).field(1, 1, "VRADH", OdimSketch.codes(12, 8))
                .set("/how", "NI", 7.5).write(folder, "a_vrad.h5");

        OpenedLoop opened = loop(reflectivity, velocity);
        assertThat(opened.inputs()).extracting(InputFate::fate).containsOnly(InputFate.Fate.READ);
        assertThat(opened.loop().size()).isEqualTo(1);
        assertThat(opened.loop().sweep(0).velocity().orElseThrow().at(2, 0)).isEqualTo(-26f);
        assertThat(opened.loop().sweep(0).nyquistMs()).isEqualTo(7.5);
        assertThat(refusal(velocity)).contains("has velocity, but no reflectivity");
    }
}
