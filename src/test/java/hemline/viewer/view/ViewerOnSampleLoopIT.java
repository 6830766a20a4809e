package hemline.viewer.view;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.workflow.FileSessions;
import hemline.workflow.ReadChoices;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.control.Label;
import javafx.scene.control.TitledPane;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;

/** The real sample loop, read and analysed, in the real window; leaves pictures in {@code target/viewer-pictures}. */
class ViewerOnSampleLoopIT {
    @Test
    void theSampleLoopIsAnalysedAndShown() throws Exception {
        Path sweeps = Path.of(System.getProperty("hemline.basedir", "."), "sample-sweeps");
        try (Toolkit viewer = new Toolkit(FileSessions.usual(ReadChoices.defaults(), 2), 1280, 720)) {
            ViewerModel model = viewer.model;
            Toolkit.run(() -> model.open(List.of(sweeps)));
            Toolkit.await(() -> model.shownProperty().get() != null);
            assertThat(model.session().frames()).hasSizeGreaterThanOrEqualTo(14);
            Toolkit.await(() -> !model.job().runningProperty().get());
            assertThat(model.job().troubleProperty().get()).isEmpty();
            assertThat(model.session().analysed()).isTrue();
            assertThat(model.ledger().tracks()).as("two cold pools and a line").hasSizeGreaterThanOrEqualTo(3);
            assertThat(model.shownProperty().get().mask()).isPresent();
            picture(viewer, "newest-dark", true, -1, "");
            String longest = model.ledger().tracks().stream()
                    .max((a, b) -> Double.compare(a.maxLengthKm(), b.maxLengthKm())).orElseThrow().id();
            picture(viewer, "middle-dark", true, model.loop().sizeProperty().get() * 2 / 3, longest);
            picture(viewer, "middle-light", false, model.loop().sizeProperty().get() * 2 / 3, longest);
            Label heading = (Label) viewer.stage.getScene().lookup("#traces-heading");
            assertThat(heading.getText()).startsWith(longest);
            Toolkit.run(() -> {
                model.plane().fieldProperty().set(PlaneField.REMOVED);
                model.settings().sidePanelProperty().set(false);
                ((TitledPane) viewer.stage.getScene().lookup("#legend")).setExpanded(true);
            });
            picture(viewer, "removed-dark", true, model.loop().sizeProperty().get() * 2 / 3, longest);
        }
    }

    private static void picture(Toolkit viewer, String name, boolean dark, int sweep, String track) throws Exception {
        Toolkit.run(() -> {
            viewer.model.settings().darkProperty().set(dark);
            if (sweep >= 0) {
                viewer.model.loop().show(sweep);
            }
            viewer.model.selection().selectTrack(track);
        });
        PlaneView plane = (PlaneView) viewer.stage.getScene().lookup("#plane");
        Toolkit.await(plane::isSharp);
        Path file = Files.createDirectories(Path.of("target/viewer-pictures")).resolve(name + ".png");
        try (OutputStream out = Files.newOutputStream(file)) {
            ImageIO.write(SwingFXUtils.fromFXImage(Toolkit.onFx(() -> viewer.stage.getScene().snapshot(null)), null),
                    "png", out);
        }
    }
}
