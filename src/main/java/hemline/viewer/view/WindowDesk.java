package hemline.viewer.view;

import hemline.viewer.viewmodel.Desk;
import hemline.viewer.viewmodel.ViewerModel;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javafx.stage.Stage;

/** Does for a window what its actions ask of it. */
public final class WindowDesk implements Desk {
    private final ViewerWindow window;
    private final ViewerModel model;
    private final Ask ask;

    /** Questions to the user that leave the window; empty when the user thinks better of it. */
    public interface Ask {
        List<Path> files(Stage owner);

        Optional<Path> folder(Stage owner);

        Optional<Path> mapLayer(Stage owner);

        Optional<Path> pictureFile(Stage owner);
    }

    WindowDesk(ViewerWindow window, ViewerModel model, Ask ask) {
        this.window = window;
        this.model = model;
        this.ask = ask;
    }

    @Override
    public void chooseFiles() {
        List<Path> files = ask.files(window.stage());
        if (!files.isEmpty()) {
            model.open(files);
        }
    }

    @Override
    public void chooseFolder() {
        ask.folder(window.stage()).ifPresent(folder -> model.open(List.of(folder)));
    }

    @Override
    public void chooseMapLayer() {
        ask.mapLayer(window.stage()).ifPresent(model.map()::add);
    }

    @Override
    public void copyPicture() {
        Pictures.copy(window.picture());
    }

    @Override
    public void savePicture() {
        ask.pictureFile(window.stage()).ifPresent(file ->
                model.job().attempt("Saving the picture", () -> Pictures.save(window.picture(), file)));
    }

    @Override
    public void searchCommands() {
        window.raiseSearch();
    }

    @Override
    public void showShortcuts() {
        window.raiseShortcuts();
    }

    @Override
    public void focusFilter() {
        window.focusFilter();
    }

    @Override
    public void nextPart() {
        window.focusNextPart();
    }

    @Override
    public void close() {
        window.stage().close();
    }
}
