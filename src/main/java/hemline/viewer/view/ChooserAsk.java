package hemline.viewer.view;

import java.io.File;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.DirectoryChooser;
import javafx.stage.FileChooser;
import javafx.stage.Stage;

/** Asks with the system's own dialogs. */
public final class ChooserAsk implements WindowDesk.Ask {
    @Override
    public List<Path> files(Stage owner) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Open sweeps");
        List<File> chosen = chooser.showOpenMultipleDialog(owner);
        return chosen == null ? List.of() : chosen.stream().map(File::toPath).toList();
    }

    @Override
    public Optional<Path> folder(Stage owner) {
        DirectoryChooser chooser = new DirectoryChooser();
        chooser.setTitle("Open a folder of sweeps");
        return Optional.ofNullable(chooser.showDialog(owner)).map(File::toPath);
    }

    @Override
    public Optional<Path> mapLayer(Stage owner) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Add a map layer");
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("GeoJSON", "*.geojson", "*.json"));
        return Optional.ofNullable(chooser.showOpenDialog(owner)).map(File::toPath);
    }

    @Override
    public Optional<Path> pictureFile(Stage owner) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Save the plane as a picture");
        chooser.setInitialFileName("plane.png");
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("PNG picture", "*.png"));
        return Optional.ofNullable(chooser.showSaveDialog(owner)).map(File::toPath);
    }
}
