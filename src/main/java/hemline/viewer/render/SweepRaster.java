package hemline.viewer.render;

import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.ViewTransform;
import java.nio.IntBuffer;
import javafx.scene.image.Image;
import javafx.scene.image.PixelBuffer;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;

/**
 * A sweep drawn for one view.
 *
 * @param image the pixels
 * @param view  the view they were drawn for
 * @param index place of the sweep in the loop
 * @param field what it shows
 */
public record SweepRaster(Image image, ViewTransform view, int index, PlaneField field) {

    /** @param backdrop drawn over the sweep */
    static SweepRaster draw(LevelGrid grid, PolarMap map, Backdrop backdrop, ViewTransform view, int index,
                            PlaneField field) {
        int[] argb = new int[map.width() * map.height()];
        grid.paint(map, argb);
        backdrop.paint(new PixelPen(argb, map.width(), map.height()), view, map.pixelsPerUnit());
        PixelBuffer<IntBuffer> pixels = new PixelBuffer<>(map.width(), map.height(), IntBuffer.wrap(argb),
                PixelFormat.getIntArgbPreInstance());
        return new SweepRaster(new WritableImage(pixels), view, index, field);
    }
}
