package hemline.viewer.view;

import atlantafx.base.theme.PrimerDark;
import atlantafx.base.theme.PrimerLight;
import atlantafx.base.theme.Theme;
import hemline.viewer.viewmodel.SettingsModel;
import java.util.Locale;
import javafx.application.Application;
import javafx.scene.Parent;

/** Gives a window its theme and text size, and keeps them true to the settings. */
final class Themes {
    private static final double USUAL_TEXT_PX = 13;

    private Themes() {
    }

    static void follow(Parent root, SettingsModel settings) {
        root.getStylesheets().add(Themes.class.getResource("/hemline/viewer/viewer.css").toExternalForm());
        Runnable apply = () -> {
            boolean dark = settings.darkProperty().get();
            Theme theme = dark ? new PrimerDark() : new PrimerLight();
            Application.setUserAgentStylesheet(theme.getUserAgentStylesheetBSS());
            root.getStyleClass().removeAll("dark", "light");
            root.getStyleClass().add(dark ? "dark" : "light");
            root.setStyle(String.format(Locale.ROOT, "-fx-font-size: %.1fpx;",
                    USUAL_TEXT_PX * settings.textScaleProperty().get()));
        };
        settings.darkProperty().addListener((o, was, now) -> apply.run());
        settings.textScaleProperty().addListener((o, was, now) -> apply.run());
        apply.run();
    }
}
