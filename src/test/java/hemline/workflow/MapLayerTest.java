package hemline.workflow;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.geodesy.GeoPoint;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Geometries are the examples of RFC 7946, appendix A. */
class MapLayerTest {
    @TempDir
    private Path folder;

    private MapLayer read(String text) throws IOException {
        Path file = folder.resolve("map.geojson");
        Files.writeString(file, text);
        return MapLayer.read(file);
    }

    @Test
    void readsALineAndAPolygonWithAHole() throws IOException {
        assertThat(read("{\"type\":\"LineString\",\"coordinates\":[[100.0,0.0],[101.0,1.0]]}").lines())
                .singleElement().asList().containsExactly(new GeoPoint(0, 100), new GeoPoint(1, 101));
        assertThat(read("{\"type\":\"Polygon\",\"coordinates\":[[[100.0,0.0],[101.0,0.0],[101.0,1.0],[100.0,1.0],"
                + "[100.0,0.0]],[[100.8,0.8],[100.8,0.2],[100.2,0.2],[100.2,0.8],[100.8,0.8]]]}").lines()).hasSize(2);
    }

    @Test
    void readsCollectionsAndLeavesPointsOut() throws IOException {
        MapLayer layer = read("{\"type\":\"FeatureCollection\",\"features\":[{\"type\":\"Feature\",\"geometry\":{"
                + "\"type\":\"GeometryCollection\",\"geometries\":[{\"type\":\"Point\",\"coordinates\":[100.0,0.0]},"
                + "{\"type\":\"MultiLineString\",\"coordinates\":[[[100.0,0.0],[101.0,1.0]],[[102.0,2.0],[103.0,3.0]]]}]},"
                + "\"properties\":{}},{\"type\":\"Feature\",\"geometry\":null,\"properties\":{}},{\"type\":\"Feature\","
                + "\"geometry\":{\"type\":\"MultiPolygon\",\"coordinates\":[[[[102.0,2.0],[103.0,2.0],[103.0,3.0],"
                + "[102.0,2.0]]]]},\"properties\":{}}]}");
        assertThat(layer.lines()).hasSize(3);
        assertThat(layer.name()).isEqualTo("map.geojson");
    }

    @Test
    void saysWhatIsWrongAndHowToMendIt() {
        assertThatThrownBy(() -> read("{\"type\":\"LineString\",\"coordinates\":[[100")).isInstanceOf(IOException.class)
                .hasMessageContaining("not JSON").hasMessageContaining("GeoJSON");
        assertThatThrownBy(() -> read("{\"type\":\"Topology\"}")).hasMessageContaining("found \"Topology\"");
        assertThatThrownBy(() -> read("{\"type\":\"LineString\",\"coordinates\":[[430000,5000000],[1,2]]}"))
                .hasMessageContaining("[430000,5000000]").hasMessageContaining("WGS 84");
        assertThatThrownBy(() -> read("{\"type\":\"Point\",\"coordinates\":[1,2]}")).hasMessageContaining("no line");
        assertThatThrownBy(() -> MapLayer.read(folder.resolve("none.geojson"))).isInstanceOf(IOException.class);
    }
}
