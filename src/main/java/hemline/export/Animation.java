package hemline.export;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStream;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.MemoryCacheImageOutputStream;

/** Pictures one after the other as an animated GIF (GIF89a) that runs for ever. */
final class Animation implements AutoCloseable {
    private static final String FORMAT = "javax_imageio_gif_image_1.0";
    /** Hundredths of a second that each picture and the last one stand. */
    private static final int DELAY = 30;
    private static final int LAST_DELAY = 120;

    private final MemoryCacheImageOutputStream out;
    private final ImageWriter writer;

    Animation(OutputStream target) throws IOException {
        out = new MemoryCacheImageOutputStream(target);
        writer = ImageIO.getImageWritersByFormatName("gif").next();
        writer.setOutput(out);
        writer.prepareWriteSequence(null);
    }

    void add(BufferedImage picture, boolean last) throws IOException {
        IIOMetadata metadata = writer.getDefaultImageMetadata(ImageTypeSpecifier.createFromRenderedImage(picture),
                writer.getDefaultWriteParam());
        IIOMetadataNode control = new IIOMetadataNode("GraphicControlExtension");
        control.setAttribute("disposalMethod", "none");
        control.setAttribute("userInputFlag", "FALSE");
        control.setAttribute("transparentColorFlag", "FALSE");
        control.setAttribute("transparentColorIndex", "0");
        control.setAttribute("delayTime", Integer.toString(last ? LAST_DELAY : DELAY));
        IIOMetadataNode again = new IIOMetadataNode("ApplicationExtension");
        again.setAttribute("applicationID", "NETSCAPE");
        again.setAttribute("authenticationCode", "2.0");
        again.setUserObject(new byte[] {1, 0, 0});
        IIOMetadataNode extensions = new IIOMetadataNode("ApplicationExtensions");
        extensions.appendChild(again);
        IIOMetadataNode root = new IIOMetadataNode(FORMAT);
        root.appendChild(control);
        root.appendChild(extensions);
        metadata.mergeTree(FORMAT, root);
        writer.writeToSequence(new IIOImage(picture, null, metadata), null);
    }

    @Override
    public void close() throws IOException {
        writer.endWriteSequence();
        out.close();
        writer.dispose();
    }
}
