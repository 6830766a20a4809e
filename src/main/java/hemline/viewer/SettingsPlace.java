package hemline.viewer;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Map;

/** Where a user's settings belong on each system. */
final class SettingsPlace {
    /** System property that overrides the file, for example for a shared work station. */
    static final String OVERRIDE = "hemline.settings";

    private SettingsPlace() {
    }

    /**
     * The file of the viewer's settings: under {@code XDG_CONFIG_HOME} or {@code ~/.config} (XDG Base Directory
     * Specification), {@code APPDATA} on Windows, {@code ~/Library/Application Support} on macOS.
     *
     * @param environment  environment variables
     * @param systemName   value of {@code os.name}
     * @param userHome     value of {@code user.home}
     * @param overriding   value of {@link #OVERRIDE}, null for none
     */
    static Path file(Map<String, String> environment, String systemName, String userHome, String overriding) {
        if (overriding != null && !overriding.isBlank()) {
            return Path.of(overriding);
        }
        String system = systemName.toLowerCase(Locale.ROOT);
        Path base;
        if (system.contains("win") && environment.containsKey("APPDATA")) {
            base = Path.of(environment.get("APPDATA"), "Hemline");
        } else if (system.contains("mac")) {
            base = Path.of(userHome, "Library", "Application Support", "Hemline");
        } else {
            String config = environment.getOrDefault("XDG_CONFIG_HOME", "");
            base = config.isBlank() ? Path.of(userHome, ".config", "hemline") : Path.of(config, "hemline");
        }
        return base.resolve("viewer.properties");
    }
}
