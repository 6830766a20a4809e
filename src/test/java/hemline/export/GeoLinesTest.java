package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import hemline.pipeline.Analysis;
import hemline.sweep.RadarSite;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class GeoLinesTest {
    private static JsonNode written(Analysis analysis) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        BoundariesGeoJson.write(out, analysis, new Geolocation(analysis.site()));
        return new ObjectMapper().readTree(out.toByteArray());
    }

    /** The example of RFC 7946 section 3.1.9: a line from 45 N 170 E to 45 N 170 W, cut at the antimeridian. */
    @Test
    void aLineOverTheAntimeridianIsCutAsInTheStandard() {
        GeoLines lines = new GeoLines();
        lines.add(List.of(new GeoPoint(45, 170), new GeoPoint(45, -170)));
        assertThat(lines.parts()).hasSize(2);
        assertThat(lines.parts().get(0)).containsExactly(new double[] {170, 45}, new double[] {180, 45});
        assertThat(lines.parts().get(1)).containsExactly(new double[] {-180, 45}, new double[] {-170, 45});
    }

    /** The bounding box of RFC 7946 section 5.2: Fiji, from 177 E to 178 W, has a west greater than its east. */
    @Test
    void theBoxOfALineOverTheAntimeridianHasItsWestInTheEast() {
        GeoLines lines = new GeoLines();
        lines.add(List.of(new GeoPoint(-16, -178), new GeoPoint(-20, 177)));
        assertThat(lines.box()).containsExactly(new double[] {177, -20, -178, -16}, within(1e-9));
    }

    @Test
    void aLineElsewhereIsLeftWhole() {
        GeoLines lines = new GeoLines();
        lines.add(List.of(new GeoPoint(10, -1), new GeoPoint(11, 1), new GeoPoint(12, 0.5)));
        assertThat(lines.parts()).hasSize(1);
        assertThat(lines.box()).containsExactly(new double[] {-1, 10, 1, 12}, within(1e-9));
    }

    @Test
    void oneFeatureComesOutPerBoundaryAndSweep() throws IOException {
        JsonNode root = written(InventedAnalysis.at(InventedAnalysis.PLACED));
        assertThat(root.get("type").asText()).isEqualTo("FeatureCollection");
        assertThat(root.get("features")).hasSize(3 + 2);
        JsonNode ring = root.get("features").get(0);
        assertThat(ring.get("geometry").get("type").asText()).isEqualTo("LineString");
        assertThat(ring.get("geometry").get("coordinates")).hasSize(31);
        assertThat(ring.get("geometry").get("coordinates").get(0).get(0).asDouble()).isCloseTo(8.643554, within(1e-6));
        assertThat(ring.get("geometry").get("coordinates").get(0).get(1).asDouble()).isCloseTo(48.038991, within(1e-6));
        assertThat(ring.get("properties").get("track_id").asText()).isEqualTo("T01");
        JsonNode line = root.get("features").get(3);
        assertThat(line.get("geometry").get("type").asText()).isEqualTo("MultiLineString");
        assertThat(line.get("properties").get("track_speed_ms").isNull()).isTrue();
    }

    private interface Writing {
        void to(ByteArrayOutputStream out) throws IOException;
    }

    private static JsonNode features(Writing writing) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        writing.to(out);
        return new ObjectMapper().readTree(out.toByteArray()).get("features");
    }

    @Test
    void arcsAreCirclesAroundTheMovingCentre() throws IOException {
        Analysis analysis = InventedAnalysis.at(InventedAnalysis.PLACED);
        JsonNode arcs = features(out -> ArcsGeoJson.write(out, analysis, new Geolocation(analysis.site())));
        assertThat(arcs).hasSize(3 + 1);
        LocalPlane plane = new LocalPlane(InventedAnalysis.PLACED.position().orElseThrow());
        Point centre = analysis.tracks().get(0).arc().orElseThrow().centreAt(InventedAnalysis.START_MS);
        for (JsonNode place : arcs.get(0).get("geometry").get("coordinates")) {
            Point at = plane.toPlane(new GeoPoint(place.get(1).asDouble(), place.get(0).asDouble()));
            assertThat(at.distanceKm(centre)).isCloseTo(10, within(0.001));
        }
        assertThat(arcs.get(3).get("properties").get("what").asText()).isEqualTo("centre");
    }

    @Test
    void meetingsArePointsWithTheirEllipse() throws IOException {
        Analysis analysis = InventedAnalysis.at(InventedAnalysis.PLACED);
        JsonNode meetings = features(out -> MeetingsGeoJson.write(out, analysis, new Geolocation(analysis.site())));
        assertThat(meetings).hasSize(2);
        assertThat(meetings.get(0).get("geometry").get("type").asText()).isEqualTo("Point");
        JsonNode rim = meetings.get(1).get("geometry").get("coordinates");
        assertThat(rim.get(0)).isEqualTo(rim.get(rim.size() - 1));
        LocalPlane plane = new LocalPlane(InventedAnalysis.PLACED.position().orElseThrow());
        Point tip = plane.toPlane(new GeoPoint(rim.get(0).get(1).asDouble(), rim.get(0).get(0).asDouble()));
        assertThat(tip.minus(new Point(-12.345, 6.5)).bearingDeg()).isCloseTo(35, within(0.1));
        assertThat(tip.distanceKm(new Point(-12.345, 6.5))).isCloseTo(1.5, within(0.001));
    }

    @Test
    void everyPlaceLiesInItsFeaturesBox() throws IOException {
        for (JsonNode feature : written(InventedAnalysis.at(InventedAnalysis.PLACED)).get("features")) {
            JsonNode box = feature.get("bbox");
            boolean single = feature.get("geometry").get("type").asText().equals("LineString");
            JsonNode coordinates = feature.get("geometry").get("coordinates");
            for (JsonNode place : single ? coordinates : coordinates.get(0)) {
                assertThat(place.get(0).asDouble()).isBetween(box.get(0).asDouble(), box.get(2).asDouble());
                assertThat(place.get(1).asDouble()).isBetween(box.get(1).asDouble(), box.get(3).asDouble());
            }
        }
    }

    @Test
    void withoutAPositionFeaturesHaveNoGeometry() throws IOException {
        for (JsonNode feature : written(InventedAnalysis.at(InventedAnalysis.UNPLACED)).get("features")) {
            assertThat(feature.get("geometry").isNull()).isTrue();
            assertThat(feature.has("bbox")).isFalse();
        }
    }

    @Test
    void aRadarOnTheAntimeridianGivesLinesOnBothSides() throws IOException {
        RadarSite site = new RadarSite("Date Line", Optional.of(new GeoPoint(-17, -179.8)), 10);
        JsonNode ring = written(InventedAnalysis.at(site)).get("features").get(0);
        JsonNode parts = ring.get("geometry").get("coordinates");
        assertThat(ring.get("geometry").get("type").asText()).isEqualTo("MultiLineString");
        for (JsonNode part : parts) {
            double side = Math.signum(part.get(0).get(0).asDouble());
            for (JsonNode place : part) {
                assertThat(Math.signum(place.get(0).asDouble())).isEqualTo(side);
            }
        }
        assertThat(ring.get("bbox").get(0).asDouble()).isGreaterThan(ring.get("bbox").get(2).asDouble());
    }
}
