package hemline.simulation.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.simulation.Simulation;
import hemline.simulation.SimulatedLoop;
import hemline.simulation.radar.RadarSpec;
import hemline.sweep.Sweep;
import io.jhdf.HdfFile;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Assumptions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import ucar.ma2.Array;
import ucar.nc2.NetcdfFile;

/** Files are read back with NetCDF-Java and jHDF directly, not with Hemline's own readers. */
class FormatsTest {
    private static final SimulatedLoop BYTES = Simulation.of("sample", "lornfield", 7);
    private static final SimulatedLoop SHORTS = Simulation.of("single-ring", "harrowmere", 7);
    @TempDir
    private Path dir;

    private static SimulatedLoop loop(String packing) {
        return packing.equals("bytes") ? BYTES : SHORTS;
    }

    private Path written(FileFormat format, SimulatedLoop loop) throws IOException {
        Path file = dir.resolve(format.label() + format.ending());
        RadarSpec radar = loop.radar();
        format.writer().write(file, loop.sweep(2), radar.receiver().packing(), radar.receiver().velocityPacking());
        return file;
    }

    @ParameterizedTest
    @EnumSource(FileFormat.class)
    void theSameSweepGivesTheSameBytes(FileFormat format) throws IOException {
        byte[] first = Files.readAllBytes(written(format, BYTES));
        assertThat(Files.readAllBytes(written(format, BYTES))).isEqualTo(first);
        assertThat(new String(first, java.nio.charset.StandardCharsets.ISO_8859_1)).doesNotContain("Linux", "amd64");
    }

    @ParameterizedTest
    @ValueSource(strings = {"bytes", "shorts"})
    void bothCfRadialFilesHoldTheSweepRayByRay(String packing) throws Exception {
        for (FileFormat format : new FileFormat[] {FileFormat.CFRADIAL_NETCDF3, FileFormat.CFRADIAL_NETCDF4}) {
            Sweep sweep = loop(packing).sweep(2);
            NetcdfFile file = NetcdfFile.open(written(format, loop(packing)).toString());
            try {
                Array azimuth = file.findVariable("azimuth").read();
                Array time = file.findVariable("time").read();
                Array range = file.findVariable("range").read();
                assertThat(range.getDouble(0)).isEqualTo(sweep.firstGateCentreM());
                assertThat(range.getDouble(1) - range.getDouble(0)).isEqualTo(sweep.gateSpacingM());
                long origin = new ScanOrder(sweep).originMs();
                assertThat(file.findVariable("time").findAttribute("units").getStringValue())
                        .isEqualTo("seconds since " + ScanOrder.iso(origin));
                for (int i = 0; i < sweep.rayCount(); i++) {
                    int ray = sweep.rays().nearestRay(azimuth.getDouble(i));
                    assertThat(azimuth.getDouble(i)).isEqualTo(sweep.rays().azimuthDeg(ray));
                    assertThat(origin + Math.round(1000 * time.getDouble(i))).isEqualTo(sweep.rays().timeMs(ray));
                    for (int g = 0; g < sweep.gateCount(); g += 7) {
                        assertThat(Float.valueOf(cfValue(file, "DBZH", i * sweep.gateCount() + g)))
                                .isEqualTo(Float.valueOf(sweep.reflectivity().at(ray, g)));
                    }
                }
            } finally {
                file.close();
            }
        }
    }

    private static float cfValue(NetcdfFile file, String name, int index) throws IOException {
        var variable = file.findVariable(name);
        double raw = cached(variable).getDouble(index);
        if (raw == variable.findAttribute("_FillValue").getNumericValue().doubleValue()) {
            return Float.NaN;
        }
        if (raw == variable.findAttribute("_Undetect").getNumericValue().doubleValue()) {
            return Float.NEGATIVE_INFINITY;
        }
        return (float) (raw * variable.findAttribute("scale_factor").getNumericValue().doubleValue()
                + variable.findAttribute("add_offset").getNumericValue().doubleValue());
    }

    private static Array cached(ucar.nc2.Variable variable) throws IOException {
        variable.setCaching(true);
        return variable.read();
    }

    @ParameterizedTest
    @ValueSource(strings = {"bytes", "shorts"})
    void odimFileHoldsTheSweepRayByRay(String packing) throws IOException {
        Sweep sweep = loop(packing).sweep(2);
        try (HdfFile file = new HdfFile(written(FileFormat.ODIM_H5, loop(packing)))) {
            short[][] raw = (short[][]) file.getDatasetByPath("/dataset1/data1/data").getData();
            var what = file.getByPath("/dataset1/data1/what");
            double gain = (double) what.getAttribute("gain").getData();
            double offset = (double) what.getAttribute("offset").getData();
            double undetect = (double) what.getAttribute("undetect").getData();
            double nodata = (double) what.getAttribute("nodata").getData();
            double[] start = (double[]) file.getByPath("/dataset1/how").getAttribute("startazA").getData();
            double[] stop = (double[]) file.getByPath("/dataset1/how").getAttribute("stopazA").getData();
            double[] time = (double[]) file.getByPath("/dataset1/how").getAttribute("startazT").getData();
            for (int r = 0; r < sweep.rayCount(); r++) {
                double middle = stop[r] < start[r] ? (start[r] + stop[r] + 360) / 2 % 360 : (start[r] + stop[r]) / 2;
                assertThat(middle).isCloseTo(sweep.rays().azimuthDeg(r), within(1e-12));
                assertThat(Math.round(1000 * time[r])).isEqualTo(sweep.rays().timeMs(r));
                for (int g = 0; g < sweep.gateCount(); g++) {
                    float value = raw[r][g] == nodata ? Float.NaN
                            : raw[r][g] == undetect ? Float.NEGATIVE_INFINITY : (float) (raw[r][g] * gain + offset);
                    assertThat(Float.valueOf(value)).isEqualTo(Float.valueOf(sweep.reflectivity().at(r, g)));
                }
            }
            long first = (long) file.getByPath("/dataset1/where").getAttribute("a1gate").getData();
            assertThat(sweep.rays().timeMs((int) first)).isEqualTo(sweep.startMs());
            assertThat((double) file.getByPath("/dataset1/where").getAttribute("rstart").getData())
                    .as("near edge of the first gate, km, ODIM_H5 2.2 table 4").isZero();
        }
    }

    @Test
    void velocitiesComeBackAsTheyWereMade() throws IOException {
        Sweep sweep = BYTES.sweep(2);
        NetcdfFile file = NetcdfFile.open(written(FileFormat.CFRADIAL_NETCDF3, BYTES).toString());
        try {
            Array azimuth = file.findVariable("azimuth").read();
            for (int i = 0; i < sweep.rayCount(); i += 11) {
                int ray = sweep.rays().nearestRay(azimuth.getDouble(i));
                for (int g = 0; g < sweep.gateCount(); g++) {
                    float stored = cfValue(file, "VRADH", i * sweep.gateCount() + g);
                    float made = sweep.velocity().orElseThrow().at(ray, g);
                    assertThat(stored == made || Math.abs(stored - made) < 1e-4).isTrue();
                }
            }
        } finally {
            file.close();
        }
        assertThat(Math.abs(sweep.nyquistMs())).isCloseTo(26.5, within(1e-6));
    }

    /** The netCDF C library is the reference for netCDF-4; ncdump is part of it. */
    @Test
    void netcdfLibraryReadsNamedDimensions() throws Exception {
        Path file = written(FileFormat.CFRADIAL_NETCDF4, SHORTS);
        String header;
        try {
            Process process = new ProcessBuilder("ncdump", "-h", file.toString()).redirectErrorStream(true).start();
            header = new String(process.getInputStream().readAllBytes(), java.nio.charset.StandardCharsets.UTF_8);
            assertThat(process.waitFor(20, TimeUnit.SECONDS)).isTrue();
        } catch (IOException e) {
            Assumptions.abort("ncdump is not installed: " + e.getMessage());
            return;
        }
        assertThat(header).contains("time = 360 ;", "range = 520 ;", "sweep = 1 ;", "short DBZH(time, range) ;",
                "float azimuth(time) ;", "string sweep_mode(sweep) ;").doesNotContain("phony_dim");
    }
}
