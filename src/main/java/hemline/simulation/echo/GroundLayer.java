package hemline.simulation.echo;

import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Ground;
import hemline.simulation.scene.Steps;
import java.util.List;
import org.apache.commons.math3.distribution.NormalDistribution;

/** Ground echo: lumps that stand still, with steep sides and a flicker. */
final class GroundLayer implements EchoLayer {
    private static final double FLICKER_S = 200;
    private final Ground ground;
    private final Texture lumps;
    private final LatticeNoise flicker;
    private final double level;

    GroundLayer(Ground ground, Streams streams) {
        this.ground = ground;
        Streams own = streams.part("ground", ground.number());
        lumps = new Texture(List.of(new Texture.Octave(ground.grainKm(), 0.8, Double.POSITIVE_INFINITY),
                new Texture.Octave(4 * ground.grainKm(), 0.6, Double.POSITIVE_INFINITY)), own);
        flicker = new LatticeNoise(own.stream("flicker"));
        level = new NormalDistribution(null, 0, 1).inverseCumulativeProbability(
                Math.min(0.999, Math.max(0.001, 1 - ground.coverage())));
    }

    @Override
    public void addTo(RayEcho ray) {
        double cx = ground.centreKm().xKm();
        double cy = ground.centreKm().yKm();
        if (Math.abs(cx * ray.cos - cy * ray.sin) > ground.radiusKm()) {
            return;
        }
        Texture.Still still = lumps.still(0);
        LatticeNoise.Still flickering = flicker.still(ray.timeS / FLICKER_S);
        for (int b = 0; b < ray.bins(); b++) {
            double dx = ray.xKm[b] - cx;
            double dy = ray.yKm[b] - cy;
            double off = (dx * dx + dy * dy) / (ground.radiusKm() * ground.radiusKm());
            if (off >= 1) {
                continue;
            }
            double above = still.at(ray.xKm[b], ray.yKm[b]) - level - 2 * off;
            if (above > -0.3) {
                double dbz = ground.peakDbz() - 32 * (1 - Steps.smooth(0.35 + 0.5 * above));
                dbz += ground.flickerDb() * flickering.at(ray.xKm[b] / 0.7, ray.yKm[b] / 0.7);
                ray.addRest(b, Decibels.toLinear(dbz), 0);
            }
        }
    }
}
