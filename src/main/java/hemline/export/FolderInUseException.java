package hemline.export;

import java.io.IOException;
import java.nio.file.Path;

/** Another run writes into the folder. */
public final class FolderInUseException extends IOException {
    private static final long serialVersionUID = 1L;

    public FolderInUseException(Path folder) {
        super(folder + ": another run is writing here; wait for it to end or choose another folder");
    }
}
