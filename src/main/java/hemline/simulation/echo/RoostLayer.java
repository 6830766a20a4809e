package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.front.Foot;
import hemline.simulation.front.FrontCurve;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Roost;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/** A growing ring of animals: the same animals on a longer and wider ring, so it weakens as it grows. */
final class RoostLayer implements EchoLayer {
    private static final double WIDENING = 0.25;
    private static final double LAYOUT_KM = 20;
    private final Roost roost;
    private final Texture clumps;

    RoostLayer(Roost roost, Streams streams) {
        this.roost = roost;
        clumps = new Texture(List.of(new Texture.Octave(10, 2.0, 1800), new Texture.Octave(2.2, 1.8, 500)),
                streams.part("roost", roost.number()));
    }

    @Override
    public void addTo(RayEcho ray) {
        double share = roost.life().share(ray.timeS);
        if (share <= 0) {
            return;
        }
        FrontCurve.Still still = roost.curve().still(ray.timeS);
        double radius = roost.curve().growth().radiusKm(ray.timeS);
        double start = roost.curve().growth().radiusKm();
        double sd = roost.sdKm() + WIDENING * (radius - start);
        double peak = roost.peakDbz() - 10 * FastMath.log10(radius * sd / (start * roost.sdKm()));
        double[] filled = ray.grid.layerShare(roost.depthKm());
        Texture.Still flocks = clumps.still(ray.timeS);
        Point centre = roost.curve().centreKm(ray.timeS);
        double layout = LAYOUT_KM / (radius + 2 * sd);
        double toward = FastMath.toRadians(roost.towardDeg());
        Foot foot = new Foot();
        for (int b = 0; b < ray.bins(); b++) {
            if (filled[b] < 1e-4) {
                continue;
            }
            still.locate(ray.xKm[b], ray.yKm[b], foot);
            double across = foot.aheadKm / sd;
            if (Math.abs(across) > 4) {
                continue;
            }
            double side = 1 + roost.lopsided() * FastMath.cos(foot.station - toward);
            // Flocks keep their place in the ring while it grows.
            double x = (ray.xKm[b] - centre.xKm()) * layout;
            double y = (ray.yKm[b] - centre.yKm()) * layout;
            double linear = share * filled[b] * side * Decibels.toLinear(peak + flocks.at(x, y))
                    * FastMath.exp(-0.5 * across * across);
            Point flying = still.followingMs(ray.xKm[b], ray.yKm[b]);
            ray.addRest(b, linear, flying.xKm() * ray.sin + flying.yKm() * ray.cos);
        }
    }
}
