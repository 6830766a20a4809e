package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import hemline.pipeline.Analysis;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import ucar.nc2.NetcdfFile;

class BoundariesNetcdfTest {
    @TempDir
    private Path temp;

    /** The library's own class is from before resources closed themselves. */
    private record Opened(NetcdfFile file) implements AutoCloseable {
        @Override
        public void close() throws IOException {
            file.close();
        }
    }

    private Path written(Analysis analysis) throws IOException {
        Path file = temp.resolve("boundaries.nc");
        Files.deleteIfExists(file);
        BoundariesNetcdf.write(file, new RunRecord("1", analysis, 1500, JsonNodeFactory.instance.objectNode(),
                List.of(), List.of()), new Geolocation(analysis.site()));
        return file;
    }

    @Test
    void linesAndTheirVerticesComeBack() throws IOException {
        try (Opened opened = new Opened(NetcdfFile.open(written(InventedAnalysis.at(InventedAnalysis.PLACED)).toString()))) {
            NetcdfFile file = opened.file();
            assertThat(file.findDimension("line").getLength()).isEqualTo(3 + 4);
            int[] counts = (int[]) file.findVariable("vertex_count").read().copyTo1DJavaArray();
            assertThat(java.util.Arrays.stream(counts).sum()).isEqualTo(file.findDimension("vertex").getLength());
            assertThat(file.findVariable("x").read().getDouble(0)).isCloseTo(-26.580, within(0.001));
            assertThat(file.findVariable("lat").read().getDouble(0)).isCloseTo(48.038991, within(1e-6));
            assertThat(file.findVariable("time").read().getDouble(0)).isEqualTo(
                    (InventedAnalysis.START_MS + 13_950) / 1000.0);
            assertThat(file.findVariable("track_id").read().toString()).contains("T01", "T02");
            assertThat(file.findVariable("line_geometry").findAttribute("node_coordinates").getStringValue())
                    .isEqualTo("lon lat");
        }
    }

    @Test
    void withoutAPositionTheNodesAreThoseOfThePlane() throws IOException {
        try (Opened opened = new Opened(NetcdfFile.open(written(InventedAnalysis.at(InventedAnalysis.UNPLACED)).toString()))) {
            NetcdfFile file = opened.file();
            assertThat(file.findVariable("lat")).isNull();
            assertThat(file.findVariable("line_geometry").findAttribute("node_coordinates").getStringValue())
                    .isEqualTo("x y");
        }
    }

    @Test
    void anEmptyResultGivesAFileThatOpens() throws IOException {
        Analysis empty = InventedAnalysis.at(InventedAnalysis.PLACED).withFound(List.of(), List.of());
        try (Opened opened = new Opened(NetcdfFile.open(written(empty).toString()))) {
            NetcdfFile file = opened.file();
            assertThat(file.findGlobalAttribute("Conventions").getStringValue()).isEqualTo("CF-1.8");
        }
    }

    /** Read by ncdump of Unidata's C library where it is installed. */
    @Test
    void anIndependentProgramReadsItsHeader() throws Exception {
        Path file = written(InventedAnalysis.at(InventedAnalysis.PLACED));
        assumeTrue(Files.isExecutable(Path.of("/usr/bin/ncdump")), "ncdump is not installed");
        Process dump = new ProcessBuilder("/usr/bin/ncdump", "-h", file.toString()).redirectErrorStream(true).start();
        String said = new String(dump.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(dump.waitFor()).isZero();
        assertThat(said).contains("line = 7", ":Conventions = \"CF-1.8\"", "x:standard_name = \"projection_x_coordinate\"",
                "plane:grid_mapping_name = \"azimuthal_equidistant\"");
    }

    /** Units accepted by UDUNITS-2 where its program is installed. */
    @Test
    void everyUnitIsKnownToUdunits() throws Exception {
        assumeTrue(Files.isExecutable(Path.of("/usr/bin/udunits2")), "udunits2 is not installed");
        try (Opened opened = new Opened(NetcdfFile.open(written(InventedAnalysis.at(InventedAnalysis.PLACED)).toString()))) {
            NetcdfFile file = opened.file();
            List<String> units = file.getVariables().stream().filter(v -> v.findAttribute("units") != null)
                    .map(v -> v.findAttribute("units").getStringValue()).distinct().toList();
            assertThat(units).contains("m s-1", "km", "dBZ");
            for (String unit : units) {
                Process check = new ProcessBuilder("/usr/bin/udunits2", "-H", unit).redirectErrorStream(true).start();
                check.getOutputStream().close();
                String said = new String(check.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
                check.waitFor();
                assertThat(said).as(unit).doesNotContain("Don't recognize");
            }
        }
    }
}
