package hemline.viewer.view;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.PlaneField;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.embed.swing.SwingFXUtils;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/**
 * The plane against pictures kept beside the test. Words are left out, since fonts differ from machine to machine.
 * After a wanted change, look at the new pictures in {@code target/plane-pictures} and copy them over the kept ones.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class PlanePictureTest {
    private Toolkit viewer;

    @BeforeAll
    void open() throws Exception {
        viewer = new Toolkit(new FakeOpener(FakeLoop::small), 1000, 640).open();
        Toolkit.run(() -> {
            viewer.model.settings().sidePanelProperty().set(false);
            PlaneView plane = (PlaneView) viewer.stage.getScene().lookup("#plane");
            plane.setMinSize(640, 400);
            plane.setMaxSize(640, 400);
            for (Overlay worded : new Overlay[] {Overlay.LABELS, Overlay.RINGS, Overlay.AZIMUTHS, Overlay.CEILING,
                Overlay.MAP}) {
                viewer.model.overlays().shown(worded).set(false);
            }
        });
    }

    @AfterAll
    void close() throws Exception {
        viewer.close();
    }

    @Test
    void measuredWithTracksLooksAsKept() throws Exception {
        looksAsKept("measured", PlaneField.MEASURED, "T01");
    }

    @Test
    void removedGatesLookAsKept() throws Exception {
        looksAsKept("removed", PlaneField.REMOVED, "");
    }

    @Test
    void velocityLooksAsKept() throws Exception {
        looksAsKept("velocity", PlaneField.VELOCITY, "T02");
    }

    private void looksAsKept(String name, PlaneField field, String track) throws Exception {
        Toolkit.run(() -> {
            viewer.model.plane().fit();
            viewer.model.loop().show(8);
            viewer.model.selection().selectTrack(track);
            viewer.model.plane().fieldProperty().set(field);
            viewer.model.overlays().shown(Overlay.MEETINGS).set(false);
        });
        PlaneView plane = (PlaneView) viewer.stage.getScene().lookup("#plane");
        Toolkit.await(() -> plane.isSharp());
        BufferedImage now = SwingFXUtils.fromFXImage(Toolkit.onFx(() -> Pictures.of(plane)), null);
        Path seen = Files.createDirectories(Path.of("target/plane-pictures")).resolve(name + ".png");
        ImageIO.write(now, "png", seen.toFile());
        BufferedImage kept;
        try (var in = PlanePictureTest.class.getResourceAsStream("/hemline/viewer/plane-" + name + ".png")) {
            assertThat(in).as("a kept picture for " + name + "; look at " + seen).isNotNull();
            kept = ImageIO.read(in);
        }
        assertThat(now.getWidth()).isEqualTo(kept.getWidth());
        assertThat(now.getHeight()).isEqualTo(kept.getHeight());
        assertThat(shareThatDiffers(now, kept)).as("share of pixels that differ plainly; see "
                + seen).isLessThan(0.002);
    }

    /** Edges of lines may be smoothed a little differently; a pixel differs plainly by more than 40 of 255. */
    private static double shareThatDiffers(BufferedImage a, BufferedImage b) throws IOException {
        int differ = 0;
        for (int y = 0; y < a.getHeight(); y++) {
            for (int x = 0; x < a.getWidth(); x++) {
                int p = a.getRGB(x, y);
                int q = b.getRGB(x, y);
                for (int shift = 0; shift <= 16; shift += 8) {
                    if (Math.abs((p >> shift & 0xff) - (q >> shift & 0xff)) > 40) {
                        differ++;
                        break;
                    }
                }
            }
        }
        return (double) differ / (a.getWidth() * a.getHeight());
    }
}
