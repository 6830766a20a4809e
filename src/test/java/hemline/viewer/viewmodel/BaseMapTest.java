package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geodesy.GeoPoint;
import hemline.geodesy.LocalPlane;
import hemline.geometry.Point;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class BaseMapTest {
    private static double nearestKm(List<MapLine> lines, MapLine.Kind kind, Point place) {
        double nearest = Double.POSITIVE_INFINITY;
        for (MapLine line : lines) {
            for (int i = 1; line.kind() == kind && i < line.points(); i++) {
                Point a = new Point(line.xKm(i - 1), line.yKm(i - 1));
                Point step = new Point(line.xKm(i), line.yKm(i)).minus(a);
                double share = Math.max(0, Math.min(1, place.minus(a).dot(step) / Math.max(1e-12, step.dot(step))));
                nearest = Math.min(nearest, a.plus(step.times(share)).distanceKm(place));
            }
        }
        return nearest;
    }

    /** By statute the border of the United States and Canada runs near 49° N between Minnesota and the Strait. */
    @Test
    void knowsTheFortyNinthParallel() throws IOException {
        GeoPoint radar = new GeoPoint(48.5, -107);
        List<MapLine> lines = BaseMap.near(radar, 300);
        Point onBorder = new LocalPlane(radar).toPlane(new GeoPoint(49, -107));
        assertThat(nearestKm(lines, MapLine.Kind.BORDER, onBorder)).isLessThan(1.5);
        assertThat(lines).noneMatch(line -> line.kind() == MapLine.Kind.COAST);
    }

    /** Kansas ends at 37° N; Four Corners lie at 37° N 109.045° W (National Geodetic Survey, from memory). */
    @Test
    void knowsStateBorders() throws IOException {
        GeoPoint radar = new GeoPoint(37.5, -99);
        Point south = new LocalPlane(radar).toPlane(new GeoPoint(37, -99));
        assertThat(nearestKm(BaseMap.near(radar, 300), MapLine.Kind.STATE_BORDER, south)).isLessThan(1);
        GeoPoint west = new GeoPoint(37.2, -108.5);
        Point corners = new LocalPlane(west).toPlane(new GeoPoint(36.999, -109.045));
        assertThat(nearestKm(BaseMap.near(west, 300), MapLine.Kind.STATE_BORDER, corners)).isLessThan(1);
    }

    @Test
    void knowsACoastOnTheOtherSideOfTheDateLine() throws IOException {
        // Vanua Levu, Fiji, reaches across 180°; a radar just west of it sees coast to its east.
        List<MapLine> lines = BaseMap.near(new GeoPoint(-16.7, 179.9), 100);
        assertThat(lines).anyMatch(line -> line.kind() == MapLine.Kind.COAST);
        lines.forEach(line -> {
            for (int i = 0; i < line.points(); i++) {
                assertThat(Math.hypot(line.xKm(i), line.yKm(i))).as("km from the radar").isLessThan(2500);
            }
        });
    }

    @Test
    void theOpenOceanIsEmpty() throws IOException {
        assertThat(BaseMap.near(new GeoPoint(-45, -120), 300)).isEmpty();
    }

    @Test
    void onlyStretchesNearTheRadarAreTaken() {
        List<MapLine> taken = new ArrayList<>();
        double[] longitude = {-2, -1.8, -0.2, 0, 0.2, 1.8, 2, 1.8, 0.1};
        BaseMap.take(taken, MapLine.Kind.OWN, new LocalPlane(new GeoPoint(0, 0)), new double[9], longitude, 60);
        // Near is within 0.54 degrees; long steps are divided into quarters of a degree at most.
        assertThat(taken).hasSize(2).allSatisfy(line -> {
            assertThat(Math.abs(line.xKm(0))).isLessThan(60 + 28);
            for (int i = 1; i < line.points(); i++) {
                assertThat(Math.abs(line.xKm(i) - line.xKm(i - 1))).isLessThan(28);
            }
        });
        assertThat(taken.get(0).xKm(0)).isLessThan(-60);
        assertThat(taken.get(0).xKm(taken.get(0).points() - 1)).isGreaterThan(60);
    }
}
