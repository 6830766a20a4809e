package hemline.bench;

import hemline.boundary.ObservedBoundary;
import hemline.boundary.ObservedVertex;
import hemline.boundary.truth.Truth;
import hemline.geometry.Point;
import hemline.sweep.GateMask;
import hemline.sweep.MaskReason;
import hemline.sweep.ReflectivityScale;
import hemline.sweep.ScreenedLoop;
import hemline.sweep.ScreenedSweep;
import hemline.sweep.Sweep;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import javax.imageio.ImageIO;

/** Pictures of sweeps with truth (green) and what was found (red), masked gates in flat tints. */
final class DetectionPictures {
    private static final int SIDE = 800;

    private DetectionPictures() {
    }

    static void write(Path dir, String name, ScreenedLoop loop, List<ObservedBoundary> found, Truth truth)
            throws IOException {
        Files.createDirectories(dir);
        for (int i = 0; i < loop.size(); i += Math.max(1, loop.size() / 4)) {
            int sweep = i;
            BufferedImage image = sweep(loop.screened(i));
            double km = reachKm(loop.screened(i).raw());
            if (truth != null) {
                truth.boundaries().forEach(b -> b.lines().stream().filter(l -> l.sweep() == sweep).forEach(l -> {
                    List<Truth.TruthVertex> v = l.vertices();
                    for (int k = 0; k + 1 < v.size(); k++) {
                        Color colour = v.get(k).detectability() >= 0.5 ? new Color(0, 230, 0) : new Color(0, 90, 0);
                        draw(image, km, colour, 1, List.of(new Point(v.get(k).xKm(), v.get(k).yKm()),
                                new Point(v.get(k + 1).xKm(), v.get(k + 1).yKm())));
                    }
                }));
            }
            for (ObservedBoundary one : found) {
                if (one.sweep() == sweep) {
                    draw(image, km, Color.RED, 1.6f, one.points());
                    ObservedVertex middle = one.vertices().get(one.vertices().size() / 2);
                    Point tip = middle.position().plus(middle.normal().times(2 + middle.motionMs() / 2));
                    draw(image, km, Color.ORANGE, 1.6f, List.of(middle.position(), tip));
                }
            }
            ImageIO.write(image, "png", dir.resolve(name + "-" + i + ".png").toFile());
        }
    }

    private static double reachKm(Sweep sweep) {
        return Math.min(120, sweep.slantRangeM(sweep.gateCount() - 1) / 1000);
    }

    private static BufferedImage sweep(ScreenedSweep screened) {
        BufferedImage image = new BufferedImage(SIDE, SIDE, BufferedImage.TYPE_INT_RGB);
        Sweep sweep = screened.raw();
        double km = reachKm(sweep);
        for (int py = 0; py < SIDE; py++) {
            for (int px = 0; px < SIDE; px++) {
                Point place = new Point((px + 0.5 - SIDE / 2.0) * 2 * km / SIDE, (SIDE / 2.0 - py - 0.5) * 2 * km / SIDE);
                double slant = sweep.beam().slantRangeM(1000 * place.lengthKm());
                int gate = (int) Math.round((slant - sweep.firstGateCentreM()) / sweep.gateSpacingM());
                if (gate < 0 || gate >= sweep.gateCount()) {
                    continue;
                }
                int ray = sweep.rays().nearestRay(place.bearingDeg());
                image.setRGB(px, py, colour(sweep.reflectivity().at(ray, gate), screened.mask(), ray, gate));
            }
        }
        return image;
    }

    private static int colour(float dbz, GateMask mask, int ray, int gate) {
        if (mask.is(ray, gate, MaskReason.CLUTTER)) {
            return 0x804000;
        }
        if (mask.is(ray, gate, MaskReason.SPIKE)) {
            return 0x800080;
        }
        if (mask.is(ray, gate, MaskReason.SECOND_TRIP)) {
            return 0x4040c0;
        }
        if (mask.is(ray, gate, MaskReason.BLOCKED)) {
            return 0x404040;
        }
        int argb = ReflectivityScale.standard().argb(dbz);
        return mask.is(ray, gate, MaskReason.ABOVE_CEILING) ? argb >> 1 & 0x7f7f7f : argb & 0xffffff;
    }

    private static void draw(BufferedImage image, double km, Color colour, float width, List<Point> points) {
        Graphics2D pen = image.createGraphics();
        pen.setRenderingHint(java.awt.RenderingHints.KEY_ANTIALIASING, java.awt.RenderingHints.VALUE_ANTIALIAS_ON);
        pen.setColor(colour);
        pen.setStroke(new BasicStroke(width));
        Path2D path = new Path2D.Double();
        for (int i = 0; i < points.size(); i++) {
            double x = SIDE / 2.0 + points.get(i).xKm() * SIDE / (2 * km);
            double y = SIDE / 2.0 - points.get(i).yKm() * SIDE / (2 * km);
            if (i == 0) {
                path.moveTo(x, y);
            } else {
                path.lineTo(x, y);
            }
        }
        pen.draw(path);
        pen.dispose();
    }
}
