package hemline.reader;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.sweep.Progress;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Loops opened from real files. */
class RealLoopsTest {

    private static OpenedLoop open(String... names) {
        return LoopOpener.open(java.util.Arrays.stream(names).map(RealSweeps::file).toList(), ReadOptions.defaults(),
                Progress.NONE);
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "reject/terrey_00.h5 | no sweep between 0.0 and 1.5 degrees; its lowest sweep is at 32.0 degrees",
        "reject/example_cfradial_rhi.nc | RHI scan",
        "reject/composite_swe_gmap.h5 | COMP object, which holds no sweep",
        "reject/CORRUPT_sekkr_scan_0.5_pn282_20180405T102500Z_0x9.h5 | every gate of DBZH is no-data",
        "reject/KBMX20160509_093623_V06.gz | holds no radial",
    })
    void unusableFileIsRefusedInOneClearLine(String name, String reason) {
        OpenedLoop opened = open(name);

        assertThat(opened.loop().size()).isZero();
        InputFate fate = opened.inputs().get(0);
        assertThat(fate.fate()).isEqualTo(InputFate.Fate.REFUSED);
        assertThat(fate.reason()).contains(reason).doesNotContain("\n").doesNotContain("Exception");
        assertThat(fate.sha256()).hasSize(64);
    }

    @Test
    void sameSweepInTwoFormatsIsTakenOnce() {
        OpenedLoop opened = open("MLL2217907250U.002.nc", "MLL2217907250U.002_classic.nc");

        assertThat(opened.loop().size()).isEqualTo(1);
        assertThat(opened.inputs()).extracting(InputFate::fate)
                .containsExactly(InputFate.Fate.READ, InputFate.Fate.DUPLICATE);
        assertThat(opened.notes()).anyMatch(note -> note.contains("is the same sweep as"));
    }

    @Test
    void sweepOfMountainRadarBelowTheHorizonIsTaken() {
        OpenedLoop opened = open("T_PAGZ51_C_LZIB_20130313075500.hdf");

        assertThat(opened.loop().size()).isEqualTo(1);
        assertThat(opened.loop().sweep(0).elevationDeg()).isBetween(-0.51, -0.49);
        assertThat(opened.notes()).anyMatch(note -> note.contains("below the horizon"));
    }

    @Test
    void loopIsOfOneRadarAndOthersAreNamed() throws IOException {
        Path folder = RealSweeps.folder();
        OpenedLoop opened = LoopOpener.open(List.of(folder.resolve("pvol_seang_20090501T120000Z.h5"),
                folder.resolve("scan_sehuv_0.5_20110126T184500Z.h5")), ReadOptions.defaults().withSite("se44"),
                Progress.NONE);

        assertThat(opened.site().name()).isEqualTo("SE44");
        assertThat(opened.inputs()).extracting(InputFate::fate)
                .containsExactly(InputFate.Fate.REFUSED, InputFate.Fate.READ);
        assertThat(opened.inputs().get(0).reason()).contains("SE50").contains("--site");
        Sweep sweep = opened.loop().sweep(0);
        assertThat(sweep.site()).isEqualTo(opened.site());
        assertThat(Files.exists(folder.resolve("reject"))).isTrue();
    }
}
