package hemline.viewer.view;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.embed.swing.SwingFXUtils;
import javafx.scene.Node;
import javafx.scene.SnapshotParameters;
import javafx.scene.image.WritableImage;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javax.imageio.ImageIO;

/** Pictures of parts of the window. */
final class Pictures {
    private Pictures() {
    }

    static WritableImage of(Node node) {
        return node.snapshot(new SnapshotParameters(), null);
    }

    static void copy(Node node) {
        ClipboardContent content = new ClipboardContent();
        content.putImage(of(node));
        Clipboard.getSystemClipboard().setContent(content);
    }

    /** Writes a PNG; an existing file is replaced. */
    static void save(Node node, Path file) throws IOException {
        BufferedImage image = SwingFXUtils.fromFXImage(of(node), null);
        // Given a file, ImageIO would also print its failure to standard error.
        try (OutputStream out = Files.newOutputStream(file)) {
            if (!ImageIO.write(image, "png", out)) {
                throw new IOException("this Java runtime cannot write PNG files");
            }
        }
    }
}
