package hemline.export;

import static org.assertj.core.api.Assertions.assertThat;

import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.ReflectivityScale;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PicturesTest {
    private final Pictures pictures = new Pictures(InventedAnalysis.at(InventedAnalysis.PLACED), 1500);
    private final PlaneView view = new PlaneView(new Point(0, 0), 50, 10, 20, 500);

    private BufferedImage plane() {
        BufferedImage picture = new BufferedImage(520, 530, BufferedImage.TYPE_INT_RGB);
        SweepLayer.paint(picture, view, InventedSweep.of(1, InventedAnalysis.PLACED), 1);
        return picture;
    }

    private int pixel(BufferedImage picture, double xKm, double yKm) {
        Point place = new Point(xKm, yKm);
        return picture.getRGB((int) view.x(place), (int) view.y(place)) | 0xff000000;
    }

    @Test
    void aGateHasTheColourOfItsReflectivity() {
        assertThat(pixel(plane(), 20, 5)).isEqualTo(ReflectivityScale.standard().argb(2));
        assertThat(pixel(plane(), -30 + 13, -5)).isNotEqualTo(ReflectivityScale.standard().argb(2));
    }

    @Test
    void belowDetectionAndNotMeasuredAreToldApart() {
        assertThat(pixel(plane(), 0.4, 40)).isEqualTo(ReflectivityScale.standard().argb(Field.BELOW_DETECTION));
        double toward = Math.toRadians(203);
        assertThat(pixel(plane(), 40 * Math.sin(toward), 40 * Math.cos(toward))).isEqualTo(Ink.NOT_MEASURED.getRGB());
    }

    @Test
    void placesAndPixelsMatch() {
        Point place = view.place(137, 222);
        assertThat((int) view.x(place)).isEqualTo(137);
        assertThat((int) view.y(place)).isEqualTo(222);
        assertThat(view.y(new Point(0, 10))).isLessThan(view.y(new Point(0, -10)));
    }

    @Test
    void boundariesShowOnThePicture() {
        BufferedImage picture = pictures.sweep(2, InventedSweep.of(2, InventedAnalysis.PLACED));
        int found = 0;
        for (int x = 0; x < picture.getWidth(); x++) {
            for (int y = 60; y < 1000; y++) {
                found += (picture.getRGB(x, y) | 0xff000000) == Ink.track(0).getRGB() ? 1 : 0;
            }
        }
        assertThat(found).isGreaterThan(200);
    }

    @Test
    void theSamePictureHasTheSameBytes(@TempDir Path temp) throws IOException {
        for (String name : new String[] {"a.png", "b.png"}) {
            try (ResultFolder folder = ResultFolder.open(temp)) {
                new ResultWriter(folder).picture(name, pictures.overview(InventedSweep.of(2, InventedAnalysis.PLACED)));
                folder.publish();
            }
        }
        byte[] bytes = Files.readAllBytes(temp.resolve("a.png"));
        assertThat(bytes).isEqualTo(Files.readAllBytes(temp.resolve("b.png")));
        assertThat(ImageIO.read(new ByteArrayInputStream(bytes)).getWidth()).isEqualTo(1060);
    }

    @Test
    void theAnimationHoldsEverySweepAndRunsForEver(@TempDir Path temp) throws IOException {
        try (ResultFolder folder = ResultFolder.open(temp)) {
            new ResultWriter(folder).animation("loop.gif", 3,
                    i -> pictures.sweep(i, InventedSweep.of(i, InventedAnalysis.PLACED)));
            folder.publish();
        }
        byte[] bytes = Files.readAllBytes(temp.resolve("loop.gif"));
        ImageReader reader = ImageIO.getImageReadersByFormatName("gif").next();
        reader.setInput(ImageIO.createImageInputStream(new ByteArrayInputStream(bytes)));
        assertThat(reader.getNumImages(true)).isEqualTo(3);
        assertThat(new String(bytes, java.nio.charset.StandardCharsets.ISO_8859_1)).startsWith("GIF89a")
                .contains("NETSCAPE2.0");
    }

    @Test
    void theFontHoldsAllThatPicturesSay() {
        assertThat(StrokeFont.standard().holds("Lone Hill · Sweep 2 of 0–14, 0.50°, 2026-06-01 10:10 UTC (±3.5 m s⁻¹) "
                + "ABCDEFGHIJKLMNOPQRSTUVWXYZ abcdefghijklmnopqrstuvwxyz 0123456789 #T01: 10% → −5; x=y/z?")).isTrue();
        assertThat(StrokeFont.standard().width("WW", 9)).isGreaterThan(StrokeFont.standard().width("il", 9));
    }
}
