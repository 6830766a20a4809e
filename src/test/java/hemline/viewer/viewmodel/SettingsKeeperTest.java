package hemline.viewer.viewmodel;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import hemline.viewer.FakeLoop;
import hemline.viewer.FakeOpener;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class SettingsKeeperTest {
    @TempDir
    private Path folder;

    private static ViewerModel model() {
        return new ViewerModel(new FakeOpener(FakeLoop::small), Runnable::run, Runnable::run, Runnable::run,
                Clock.systemUTC());
    }

    @Test
    void whatWasChosenComesBack() throws IOException {
        Path file = folder.resolve("deep/viewer.properties");
        ViewerModel before = model();
        before.settings().darkProperty().set(false);
        before.settings().textScaleProperty().set(1.3);
        before.overlays().toggle(Overlay.GRATICULE);
        before.loop().sweepsPerSecondProperty().set(7);
        before.settings().windowProperty().set(new WindowPlace(-20, 30, 1400, 900, true));
        before.open(List.of(Path.of("/data/a b \u00fc")));
        before.open(List.of(Path.of("/data/second")));
        new SettingsKeeper(file, before).save();

        ViewerModel after = model();
        new SettingsKeeper(file, after).load();
        assertThat(after.settings().darkProperty().get()).isFalse();
        assertThat(after.settings().textScaleProperty().get()).isEqualTo(1.3);
        assertThat(after.overlays().isShown(Overlay.GRATICULE)).isTrue();
        assertThat(after.loop().sweepsPerSecondProperty().get()).isEqualTo(7);
        assertThat(after.settings().windowProperty().get()).isEqualTo(new WindowPlace(-20, 30, 1400, 900, true));
        assertThat(after.settings().recent()).containsExactly(Path.of("/data/second"), Path.of("/data/a b \u00fc"));
    }

    @Test
    void theSameSettingsAreTheSameFile() throws IOException {
        Path a = folder.resolve("a");
        Path b = folder.resolve("b");
        new SettingsKeeper(a, model()).save();
        new SettingsKeeper(b, model()).save();
        assertThat(a).hasSameBinaryContentAs(b);
        assertThat(Files.list(folder)).as("nothing half written stays").hasSize(2);
    }

    @Test
    void aMissingFileLeavesTheUsual() throws IOException {
        ViewerModel model = model();
        new SettingsKeeper(folder.resolve("none"), model).load();
        assertThat(model.settings().darkProperty().get()).isTrue();
    }

    @Test
    void valuesThatMakeNoSenseLeaveTheUsual() throws IOException {
        Path file = folder.resolve("odd");
        Files.writeString(file, "dark=perhaps\ntext-scale=NaN\nwindow=1 2 3\nsweeps-per-second=-4\nrecent.0=\n");
        ViewerModel model = model();
        new SettingsKeeper(file, model).load();
        assertThat(model.settings().darkProperty().get()).isTrue();
        assertThat(model.settings().textScaleProperty().get()).isEqualTo(1);
        assertThat(model.settings().windowProperty().get()).isNull();
        assertThat(model.loop().sweepsPerSecondProperty().get()).isEqualTo(4);
    }

    @Test
    void aFileThatIsNoSettingsFileSaysHowToMendIt() throws IOException {
        Path file = folder.resolve("broken");
        Files.writeString(file, "dark=\\uZZZZ\n");
        assertThatThrownBy(() -> new SettingsKeeper(file, model()).load()).isInstanceOf(IOException.class)
                .hasMessageContaining(file.toString()).hasMessageContaining("delete the file");
    }

    @Test
    void onlyTheNewestPathsAreKept() {
        SettingsModel settings = new SettingsModel();
        for (int i = 0; i < 12; i++) {
            settings.remember(Path.of("p" + i));
        }
        settings.remember(Path.of("p8"));
        assertThat(settings.recent()).hasSize(8).startsWith(Path.of("p8"), Path.of("p11"));
    }
}
