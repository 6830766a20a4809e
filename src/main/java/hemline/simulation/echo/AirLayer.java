package hemline.simulation.echo;

import hemline.simulation.random.LatticeNoise;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.SceneSpec;
import hemline.simulation.scene.Steps;
import org.apache.commons.math3.util.FastMath;

/** Insects of the lowest kilometre, the fronts' lines among them and their thinned air behind. */
final class AirLayer implements EchoLayer {
    private static final double LEAST_SHARE = 1e-4;
    private final SceneSpec scene;
    private final FrontField fronts;
    private final Texture texture;
    private final LatticeNoise[] rolls;
    private final double gradientX;
    private final double gradientY;

    AirLayer(SceneSpec scene, FrontField fronts, Streams streams) {
        this.scene = scene;
        this.fronts = fronts;
        Air air = scene.air();
        texture = new Texture(air.octaves(), streams.part("texture", 0));
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
        for (int b = 0; b < ray.bins(); b++) {
            double x = ray.xKm[b];
            double y = ray.yKm[b];
            now.look(x, y);
            double full = airShare[b] > LEAST_SHARE ? airShare[b] * Decibels.toLinear(airDbz(x, y, ray.timeS)) : 0;
            double loss = now.clearingDb();
            ray.fullAir[b] += full;
            ray.air[b] += loss > 0 ? full * Decibels.toLinear(-loss) : full;
            for (int i = 0; i < n; i++) {
                if (lineShare[i][b] > LEAST_SHARE) {
                    ray.lines[b] += lineShare[i][b] * now.line(i);
                }
            }
            if (scene.velocity()) {
                double radial = now.radialMs(x, y, ray.sin, ray.cos, scene.windMs());
                ray.moment[b] += (ray.air[b] + ray.lines[b]) * radial;
            }
        }
    }

    private double airDbz(double x, double y, double timeS) {
        Air air = scene.air();
        double movedX = x - scene.windMs().xKm() * timeS / 1000;
        double movedY = y - scene.windMs().yKm() * timeS / 1000;
        double dbz = air.baseDbz() + gradientX * x + gradientY * y + air.trendDbPerH() * timeS / 3600
                + texture.at(movedX, movedY, timeS);
        for (int i = 0; i < rolls.length; i++) {
            dbz += rollDb(air.rolls().get(i), rolls[i], x, y, timeS);
        }
        return dbz;
    }

    private double rollDb(Air.Rolls roll, LatticeNoise noise, double x, double y, double timeS) {
        double dx = x - roll.centreKm().xKm();
        double dy = y - roll.centreKm().yKm();
        double within = Steps.smooth(2 * (1 - Math.sqrt(dx * dx + dy * dy) / roll.radiusKm()));
        if (within <= 0) {
            return 0;
        }
        double bearing = FastMath.toRadians(roll.alongDeg());
        double sin = FastMath.sin(bearing);
        double cos = FastMath.cos(bearing);
        double alongWind = scene.windMs().xKm() * sin + scene.windMs().yKm() * cos;
        double along = x * sin + y * cos - alongWind * timeS / 1000;
        double across = x * cos - y * sin - roll.driftMs() * timeS / 1000;
        // Bands are some ten spacings long and meander by a fraction of their spacing.
        double meander = 0.35 * roll.spacingKm() * FastMath.sin(2 * Math.PI * along / (9 * roll.spacingKm()));
        double wave = FastMath.cos(2 * Math.PI * (across + meander) / roll.spacingKm());
        double patch = noise.at(across / (1.7 * roll.spacingKm()), along / (6 * roll.spacingKm()), timeS / 5400);
        return within * roll.ampDb() * (0.55 * wave + 0.75 * patch);
    }
}
