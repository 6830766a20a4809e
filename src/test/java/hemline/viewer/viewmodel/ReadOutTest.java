package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hemline.geodesy.GeoPoint;
import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.GateMask;
import hemline.sweep.MaskReason;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.Sweep;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ReadOutTest {
    private static final int GATES = 400;

    private static Sweep sweep(Optional<GeoPoint> position, int rays) {
        double[] azimuth = new double[rays];
        double[] elevation = new double[rays];
        long[] time = new long[rays];
        float[] dbz = new float[rays * GATES];
        for (int i = 0; i < rays; i++) {
            azimuth[i] = i * 360.0 / 360;
            elevation[i] = 0.5;
            time[i] = 1_000_000L + 50L * i;
            for (int g = 0; g < GATES; g++) {
                dbz[i * GATES + g] = g == 0 ? Field.BELOW_DETECTION : g == 1 ? Field.NOT_MEASURED : i + g / 1000f;
            }
        }
        return new Sweep(new RadarSite("test", position, 0), "made by hand", 0.5, 1, 125, 250,
                new RayGeometry(azimuth, elevation, time), new Field("DBZH", "dBZ", rays, GATES, dbz),
                Optional.empty(), Double.NaN);
    }

    private static ReadOut at(double azimuth, double km) {
        return ReadOut.at(Point.towards(azimuth).times(km), new HeldSweep(0, sweep(Optional.empty(), 360),
                Optional.empty()));
    }

    @Test
    void readsTheGateUnderThePlaceAndItsRaysTime() {
        ReadOut read = at(30.3, 50);
        assertThat(read.dbz()).isCloseTo(30.2f, within(0.002f));
        assertThat(read.rayMs()).isEqualTo(1_000_000L + 50 * 30);
        assertThat(read.rangeKm()).isCloseTo(50, within(1e-9));
        assertThat(read.azimuthDeg()).isCloseTo(30.3, within(1e-9));
    }

    /** Doviak and Zrnić (1993) eq. 2.28b at 0.5°: 583.46 m at 50 km and 1461.13 m at 100 km of slant range. */
    @Test
    void beamHeightIsThatOfTheFourThirdsEarth() {
        Sweep sweep = sweep(Optional.empty(), 360);
        double ground = sweep.beam().groundRangeM(50_000) / 1000;
        assertThat(at(0, ground).beamHeightM()).isCloseTo(583.46, within(0.05));
        assertThat(at(0, sweep.beam().groundRangeM(100_000) / 1000).beamHeightM()).isCloseTo(1461.13, within(0.05));
    }

    /** A beam of 1° is 873 m wide at 50 km: range times angle. */
    @Test
    void beamWidthGrowsWithRange() {
        assertThat(at(0, 50).beamWidthM()).isCloseTo(873, within(1.0));
    }

    /** GeographicLib 2.0, direct geodesic of 100 km from 48° N 9° E toward 45°. */
    @Test
    void latitudeAndLongitudeAreOnTheEllipsoid() {
        ReadOut read = ReadOut.at(Point.towards(45).times(100),
                new HeldSweep(0, sweep(Optional.of(new GeoPoint(48, 9)), 360), Optional.empty()));
        assertThat(read.geo().orElseThrow().latitudeDeg()).isCloseTo(48.63193821, within(1e-8));
        assertThat(read.geo().orElseThrow().longitudeDeg()).isCloseTo(9.95932217, within(1e-8));
    }

    @Test
    void saysWhenTheRadarsPositionIsUnknown() {
        assertThat(at(0, 10).latitudeWords()).isEqualTo("no position");
    }

    @Test
    void tellsBelowDetectionFromNotMeasuredFromNoGate() {
        assertThat(at(10, 0.12).reflectivityWords()).isEqualTo("below detection");
        assertThat(at(10, 0.37).reflectivityWords()).isEqualTo("not measured");
        assertThat(at(10, 300).reflectivityWords()).isEqualTo("no gate");
    }

    @Test
    void aLostSectorHasNoGate() {
        ReadOut read = ReadOut.at(Point.towards(300).times(20), new HeldSweep(0, sweep(Optional.empty(), 270),
                Optional.empty()));
        assertThat(read.gate()).isFalse();
    }

    @Test
    void namesEveryReasonOfAMaskedGate() {
        byte[] bits = new byte[360 * GATES];
        bits[30 * GATES + 200] = (byte) (MaskReason.CLUTTER.bit() | MaskReason.SPECKLE.bit());
        ReadOut read = ReadOut.at(Point.towards(30).times(50.1), new HeldSweep(0, sweep(Optional.empty(), 360),
                Optional.of(new GateMask(360, GATES, bits))));
        assertThat(read.masked()).isEqualTo("static clutter, speckle");
    }
}
