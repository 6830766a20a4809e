package hemline.export;

import hemline.geodesy.BeamGeometry;
import hemline.geometry.Point;
import hemline.sweep.Field;
import hemline.sweep.RayGeometry;
import hemline.sweep.ReflectivityScale;
import hemline.sweep.Sweep;
import java.awt.image.BufferedImage;

/** The gates of a sweep, each pixel in the colour of the gate its middle lies in. */
final class SweepLayer {
    private static final int DIRECTIONS = 7200;

    private SweepLayer() {
    }

    /** @param opacity 0 (paper only) to 1 (full colour) */
    static void paint(BufferedImage picture, PlaneView view, Sweep sweep, double opacity) {
        int[] rayOf = raysByDirection(sweep.rays());
        BeamGeometry beam = sweep.beam();
        Field field = sweep.reflectivity();
        ReflectivityScale scale = ReflectivityScale.standard();
        double reachKm = beam.groundRangeM(sweep.slantRangeM(sweep.gateCount() - 1)) / 1000;
        for (int y = view.topPx(); y < view.topPx() + view.sizePx(); y++) {
            for (int x = view.leftPx(); x < view.leftPx() + view.sizePx(); x++) {
                Point place = view.place(x, y);
                double km = place.lengthKm();
                int colour = Ink.NOT_MEASURED.getRGB();
                if (km <= reachKm) {
                    int ray = rayOf[(int) (place.bearingDeg() / 360 * DIRECTIONS) % DIRECTIONS];
                    long gate = Math.round((beam.slantRangeM(1000 * km) - sweep.firstGateCentreM())
                            / sweep.gateSpacingM());
                    if (ray >= 0 && gate >= 0 && gate < field.gates() && Field.isMeasured(field.at(ray, (int) gate))) {
                        colour = scale.argb(field.at(ray, (int) gate));
                    }
                }
                picture.setRGB(x, y, blend(colour, Ink.PAPER.getRGB(), opacity));
            }
        }
    }

    /** The ray over each of many even directions, −1 where none is near. */
    private static int[] raysByDirection(RayGeometry rays) {
        int[] rayOf = new int[DIRECTIONS];
        double reachDeg = 0.75 * Math.max(1, 360.0 / rays.rays());
        for (int i = 0; i < DIRECTIONS; i++) {
            double azimuth = (i + 0.5) * 360 / DIRECTIONS;
            int nearest = rays.nearestRay(azimuth);
            rayOf[i] = RayGeometry.gapDeg(rays.azimuthDeg(nearest), azimuth) <= reachDeg ? nearest : -1;
        }
        return rayOf;
    }

    private static int blend(int top, int under, double opacity) {
        int out = 0xff000000;
        for (int shift = 0; shift <= 16; shift += 8) {
            double mixed = opacity * (top >> shift & 0xff) + (1 - opacity) * (under >> shift & 0xff);
            out |= (int) Math.round(mixed) << shift;
        }
        return out;
    }
}
