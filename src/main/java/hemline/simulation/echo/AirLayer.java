package hemline.simulation.echo;

import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.SceneSpec;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/** Insects of the lowest kilometre, the fronts' lines among them and their thinned air behind. */
final class AirLayer implements EchoLayer {
    private static final double LEAST_SHARE = 1e-4;
    /** Turbulence of the mixed layer along the beam, m s⁻¹. */
    private static final List<Texture.Octave> GUSTS = List.of(new Texture.Octave(6, 0.8, 1200),
            new Texture.Octave(1.6, 0.7, 300));
    private final SceneSpec scene;
    private final FrontField fronts;
    private final Texture texture;
    private final Texture gusts;
    private final LatticeNoise[] rolls;
    private final double gradientX;
    private final double gradientY;

    AirLayer(SceneSpec scene, FrontField fronts, Streams streams) {
        this.scene = scene;
        this.fronts = fronts;
        Air air = scene.air();
        texture = new Texture(air.octaves(), streams.part("texture", 0));
        gusts = new Texture(GUSTS, streams.part("gusts", 0));
        rolls = new LatticeNoise[air.rolls().size()];
        for (int i = 0; i < rolls.length; i++) {
            rolls[i] = new LatticeNoise(streams.stream("rolls", i, 0));
        }
        double bearing = FastMath.toRadians(air.gradientDeg());
        gradientX = air.gradientDb() / 100 * FastMath.sin(bearing);
        gradientY = air.gradientDb() / 100 * FastMath.cos(bearing);
    }

    @Override
    public void addTo(RayEcho ray) {
        double[] airShare = ray.grid.layerShare(scene.air().depthKm());
        int n = scene.fronts().size();
        double[][] lineShare = new double[n][];
        for (int i = 0; i < n; i++) {
            lineShare[i] = ray.grid.layerShare(scene.fronts().get(i).depthKm());
        }
        FrontField.Now now = fronts.at(ray.timeS);
        Texture.Still lumps = texture.still(ray.timeS);
        Texture.Still gusting = gusts.still(ray.timeS);
        RollsNow[] bands = new RollsNow[rolls.length];
        for (int i = 0; i < bands.length; i++) {
            bands[i] = new RollsNow(scene.air().rolls().get(i), rolls[i], scene.windMs(), ray.timeS);
        }
        for (int b = 0; b < ray.bins(); b++) {
            double x = ray.xKm[b];
            double y = ray.yKm[b];
            now.look(x, y);
            double full = airShare[b] > LEAST_SHARE ? airShare[b] * Decibels.toLinear(airDbz(x, y, ray.timeS, lumps, bands)) : 0;
            double loss = now.clearingDb();
            ray.fullAir[b] += full;
            ray.air[b] += loss > 0 ? full * Decibels.toLinear(-loss) : full;
            for (int i = 0; i < n; i++) {
                if (lineShare[i][b] > LEAST_SHARE) {
                    ray.lines[b] += lineShare[i][b] * now.line(i);
                }
            }
            if (scene.velocity()) {
                double radial = now.radialMs(x, y, ray.sin, ray.cos, scene.windMs()) + gusting.at(x, y);
                ray.moment[b] += (ray.air[b] + ray.lines[b]) * radial;
            }
        }
    }

    private double airDbz(double x, double y, double timeS, Texture.Still lumps, RollsNow[] bands) {
        Air air = scene.air();
        double movedX = x - scene.windMs().xKm() * timeS / 1000;
        double movedY = y - scene.windMs().yKm() * timeS / 1000;
        double dbz = air.baseDbz() + gradientX * x + gradientY * y + air.trendDbPerH() * timeS / 3600
                + lumps.at(movedX, movedY);
        for (RollsNow band : bands) {
            dbz += band.db(x, y);
        }
        return dbz;
    }
}
