package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Sheet;
import hemline.simulation.scene.Steps;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/** Widespread rain with ragged margins, a bright band and snow above. */
final class SheetLayer implements EchoLayer {
    private static final double SNOW_DB = -7;
    private static final double EDGE_DB = 34;
    private final Sheet sheet;
    private final Texture lumps;
    private final Texture margin;
    private final double sin;
    private final double cos;

    SheetLayer(Sheet sheet, Streams streams) {
        this.sheet = sheet;
        Streams own = streams.part("sheet", sheet.number());
        double sd = sheet.lumpsDb();
        lumps = new Texture(List.of(new Texture.Octave(16, 0.7 * sd, 3600), new Texture.Octave(5, 0.6 * sd, 1800),
                new Texture.Octave(1.6, 0.4 * sd, 700)), own.part("lumps", 0));
        margin = new Texture(List.of(new Texture.Octave(0.5 * sheet.radiusKm(), 0.22, 5400),
                new Texture.Octave(0.15 * sheet.radiusKm(), 0.12, 2400)), own.part("margin", 0));
        sin = FastMath.sin(FastMath.toRadians(sheet.longDeg()));
        cos = FastMath.cos(FastMath.toRadians(sheet.longDeg()));
    }

    @Override
    public void addTo(RayEcho ray) {
        double share = sheet.life().share(ray.timeS);
        if (share <= 0) {
            return;
        }
        Point centre = sheet.startKm().plus(sheet.driftMs().times(ray.timeS / 1000));
        double radial = sheet.driftMs().xKm() * ray.sin + sheet.driftMs().yKm() * ray.cos;
        Texture.Still lumpy = lumps.still(ray.timeS);
        Texture.Still ragged = margin.still(ray.timeS);
        double[] profile = profile(ray);
        for (int b = 0; b < ray.bins(); b++) {
            double dx = ray.xKm[b] - centre.xKm();
            double dy = ray.yKm[b] - centre.yKm();
            double u = (dx * sin + dy * cos) / sheet.radiusKm();
            double v = (dx * cos - dy * sin) * sheet.stretch() / sheet.radiusKm();
            double off = Math.sqrt(u * u + v * v);
            if (off > 1.7) {
                continue;
            }
            off += ragged.at(dx, dy);
            if (off < 1.15) {
                double dbz = sheet.dbz() - EDGE_DB * Steps.smooth((off - 0.7) / 0.45) - 30 * (1 - share)
                        + lumpy.at(dx, dy);
                ray.addRest(b, profile[b] * Decibels.toLinear(dbz), radial);
            }
        }
    }

    /** Echo of each bin over that of rain, from the shares of the beam in rain, bright band and snow. */
    private double[] profile(RayEcho ray) {
        double[] factor = new double[ray.bins()];
        double melting = sheet.meltingKm();
        for (int b = 0; b < factor.length; b++) {
            if (Double.isInfinite(melting)) {
                factor[b] = 1;
                continue;
            }
            double rain = ray.grid.layerShareBelow(melting - Sheet.BRIGHT_DEPTH_KM)[b];
            double toMelting = ray.grid.layerShareBelow(melting)[b];
            factor[b] = rain + (toMelting - rain) * Decibels.toLinear(sheet.brightDb())
                    + (1 - toMelting) * Decibels.toLinear(SNOW_DB);
        }
        return factor;
    }
}
