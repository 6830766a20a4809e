package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.random.LatticeNoise;
import hemline.simulation.scene.Air;
import hemline.simulation.scene.Steps;
import org.apache.commons.math3.util.FastMath;

/** The bands of one set of rolls at one time. */
final class RollsNow {
    private final Air.Rolls rolls;
    private final LatticeNoise.Still patches;
    private final double sin;
    private final double cos;
    private final double alongKm;
    private final double acrossKm;

    RollsNow(Air.Rolls rolls, LatticeNoise noise, Point windMs, double timeS) {
        this.rolls = rolls;
        patches = noise.still(timeS / 5400);
        double bearing = FastMath.toRadians(rolls.alongDeg());
        sin = FastMath.sin(bearing);
        cos = FastMath.cos(bearing);
        alongKm = (windMs.xKm() * sin + windMs.yKm() * cos) * timeS / 1000;
        acrossKm = rolls.driftMs() * timeS / 1000;
    }

    double db(double x, double y) {
        double dx = x - rolls.centreKm().xKm();
        double dy = y - rolls.centreKm().yKm();
        double within = Steps.smooth(2 * (1 - Math.sqrt(dx * dx + dy * dy) / rolls.radiusKm()));
        if (within <= 0) {
            return 0;
        }
        double along = x * sin + y * cos - alongKm;
        double across = x * cos - y * sin - acrossKm;
        // Bands are some ten spacings long and meander by a fraction of their spacing.
        double meander = 0.35 * rolls.spacingKm() * FastMath.sin(2 * Math.PI * along / (9 * rolls.spacingKm()));
        double wave = FastMath.cos(2 * Math.PI * (across + meander) / rolls.spacingKm());
        double patch = patches.at(across / (1.7 * rolls.spacingKm()), along / (6 * rolls.spacingKm()));
        return within * rolls.ampDb() * (0.55 * wave + 0.75 * patch);
    }
}
