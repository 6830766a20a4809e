package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.scene.Masts;
import org.apache.commons.math3.util.FastMath;

/** A wind farm. */
final class MastLayer implements EchoLayer {
    private static final double SIZE_KM = 0.22;
    private static final double FLICKER_S = 1.5;
    private final Masts masts;
    private final LatticeNoise flicker;

    MastLayer(Masts masts, Streams streams) {
        this.masts = masts;
        flicker = new LatticeNoise(streams.part("masts", masts.number()).stream("flicker"));
    }

    @Override
    public void addTo(RayEcho ray) {
        double mean = Decibels.toLinear(masts.dbz());
        double part = ray.grid.groundKm(1) - ray.grid.groundKm(0);
        for (int m = 0; m < masts.places().size(); m++) {
            Point mast = masts.places().get(m);
            double abeam = mast.xKm() * ray.cos - mast.yKm() * ray.sin;
            double along = mast.xKm() * ray.sin + mast.yKm() * ray.cos;
            if (along < 0 || Math.abs(abeam) > 4 * SIZE_KM) {
                continue;
            }
            double turned = masts.flickerDb() * flicker.at(ray.timeS / FLICKER_S, m + 0.5);
            double sideways = FastMath.exp(-0.5 * abeam * abeam / (SIZE_KM * SIZE_KM));
            int middle = (int) Math.rint((along - ray.grid.groundKm(0)) / part);
            for (int b = Math.max(0, middle - 4); b <= Math.min(ray.bins() - 1, middle + 4); b++) {
                double off = (ray.grid.groundKm(b) - along) / SIZE_KM;
                ray.addRest(b, mean * Decibels.toLinear(turned) * sideways * FastMath.exp(-0.5 * off * off), 0);
            }
        }
    }
}
