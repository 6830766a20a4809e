package hemline.viewer;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** XDG Base Directory Specification 0.8 on Linux; the systems' own application folders elsewhere. */
class SettingsPlaceTest {
    @Test
    void followsTheXdgConfigFolder() {
        assertThat(SettingsPlace.file(Map.of("XDG_CONFIG_HOME", "/c"), "Linux", "/home/u", null))
                .isEqualTo(Path.of("/c/hemline/viewer.properties"));
        assertThat(SettingsPlace.file(Map.of("XDG_CONFIG_HOME", ""), "Linux", "/home/u", null))
                .isEqualTo(Path.of("/home/u/.config/hemline/viewer.properties"));
    }

    @Test
    void usesTheSystemsOwnFolderElsewhere() {
        assertThat(SettingsPlace.file(Map.of("APPDATA", "/roaming"), "Windows 11", "/u", null))
                .isEqualTo(Path.of("/roaming/Hemline/viewer.properties"));
        assertThat(SettingsPlace.file(Map.of(), "Mac OS X", "/Users/u", null))
                .isEqualTo(Path.of("/Users/u/Library/Application Support/Hemline/viewer.properties"));
    }

    @Test
    void canBeOverridden() {
        assertThat(SettingsPlace.file(Map.of(), "Linux", "/home/u",
                "/desk/3.properties")).isEqualTo(Path.of("/desk/3.properties"));
    }
}
