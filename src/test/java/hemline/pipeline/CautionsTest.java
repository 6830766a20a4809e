package hemline.pipeline;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geodesy.BeamGeometry;
import hemline.geodesy.GeoPoint;
import hemline.sweep.RadarSite;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class CautionsTest {
    private static final RadarSite SITE = new RadarSite("x", Optional.of(new GeoPoint(0, 0)), 10);

    private static List<String> cautions(int... minutes) {
        List<SweepFrame> frames = new ArrayList<>();
        for (int minute : minutes) {
            frames.add(new SweepFrame(frames.size(), new RayGeometry(new double[] {0}, new double[] {0.5},
                    new long[] {60_000L * minute}), new BeamGeometry(0.5, 10)));
        }
        return Cautions.of(SITE, frames, Settings.defaults());
    }

    @Test
    void anEvenLoopHasNoCaution() {
        assertThat(cautions(0, 5, 10, 15, 20)).isEmpty();
    }

    @Test
    void aHoleIsToldWithItsLength() {
        assertThat(cautions(0, 5, 10, 30, 35)).containsExactly(
                "The loop has a gap of up to 20 min between sweeps that usually follow each other after 5 min.");
        assertThat(cautions(0, 5, 15, 20, 32, 37)).singleElement().asString().startsWith("The loop has 2 gaps");
    }
}
