package hemline.viewer.viewmodel;

import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.Properties;
import java.util.function.Consumer;
import java.util.stream.Collectors;

/** Keeps what a user chose from one day to the next, in one small text file. */
public final class SettingsKeeper {
    private final Path file;
    private final ViewerModel model;

    public SettingsKeeper(Path file, ViewerModel model) {
        this.file = file;
        this.model = model;
    }

    /**
     * Takes over what the file says; a missing file, a missing line or a value that makes no sense leaves what is.
     *
     * @throws IOException if the file is there and cannot be read
     */
    public void load() throws IOException {
        Properties kept = new Properties();
        try {
            kept.load(new StringReader(Files.readString(file)));
        } catch (NoSuchFileException e) {
            return;
        } catch (IllegalArgumentException e) {
            throw new IOException(file + ": " + e.getMessage() + "; delete the file to start afresh", e);
        }
        SettingsModel settings = model.settings();
        flag(kept, "dark", settings.darkProperty()::set);
        flag(kept, "local-time", settings.localTimeProperty()::set);
        flag(kept, "side-panel", settings.sidePanelProperty()::set);
        number(kept, "text-scale", settings.textScaleProperty()::set);
        number(kept, "sweeps-per-second", model.loop().sweepsPerSecondProperty()::set);
        for (Overlay overlay : Overlay.values()) {
            flag(kept, "overlay." + overlay.name(), model.overlays().shown(overlay)::set);
        }
        WindowPlace.parse(kept.getProperty("window", "")).ifPresent(settings.windowProperty()::set);
        List<Path> recent = new ArrayList<>();
        for (int i = 0; kept.containsKey("recent." + i); i++) {
            path(kept.getProperty("recent." + i)).ifPresent(recent::add);
        }
        settings.recent().setAll(recent);
    }

    /**
     * Writes the file, whole or not at all.
     *
     * @throws IOException if it cannot be written
     */
    public void save() throws IOException {
        SettingsModel settings = model.settings();
        Properties kept = new Properties();
        kept.setProperty("dark", String.valueOf(settings.darkProperty().get()));
        kept.setProperty("local-time", String.valueOf(settings.localTimeProperty().get()));
        kept.setProperty("side-panel", String.valueOf(settings.sidePanelProperty().get()));
        kept.setProperty("text-scale", String.valueOf(settings.textScaleProperty().get()));
        kept.setProperty("sweeps-per-second", String.valueOf(model.loop().sweepsPerSecondProperty().get()));
        for (Overlay overlay : Overlay.values()) {
            kept.setProperty("overlay." + overlay.name(), String.valueOf(model.overlays().isShown(overlay)));
        }
        if (settings.windowProperty().get() != null) {
            kept.setProperty("window", settings.windowProperty().get().words());
        }
        for (int i = 0; i < settings.recent().size(); i++) {
            kept.setProperty("recent." + i, settings.recent().get(i).toString());
        }
        StringWriter text = new StringWriter();
        kept.store(text, null);
        // Properties adds the time of writing; without it the same settings are the same file.
        String lines = Arrays.stream(text.toString().split("\\R")).filter(line -> !line.startsWith("#")).sorted()
                .collect(Collectors.joining("\n", "", "\n"));
        Files.createDirectories(file.toAbsolutePath().getParent());
        Path fresh = file.resolveSibling(file.getFileName() + ".new");
        Files.writeString(fresh, lines);
        Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.ATOMIC_MOVE);
    }

    private static Optional<Path> path(String words) {
        try {
            return Optional.of(Path.of(words));
        } catch (InvalidPathException e) {
            // A path of another system's making; it cannot be opened here and is not worth a complaint.
            return Optional.empty();
        }
    }

    private static void flag(Properties kept, String key, Consumer<Boolean> take) {
        String value = kept.getProperty(key, "");
        if (value.equals("true") || value.equals("false")) {
            take.accept(value.equals("true"));
        }
    }

    private static void number(Properties kept, String key, Consumer<Double> take) {
        String value = kept.getProperty(key, "");
        if (value.matches("[0-9]{1,6}(\\.[0-9]{1,20})?")) {
            take.accept(Double.valueOf(value));
        }
    }
}
