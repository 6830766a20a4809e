package hemline.simulation.echo;

import hemline.geometry.Point;
import hemline.simulation.random.Streams;
import hemline.simulation.random.Texture;
import hemline.simulation.scene.Cell;
import java.util.List;
import org.apache.commons.math3.util.FastMath;

/** A rain cell: a steep core in dBZ with ragged edges, as deep as any beam within range is high. */
final class CellLayer implements EchoLayer {
    /** Loss at the radius, dB; it grows with distance to the power of 3/2. */
    private static final double LOSS_AT_RADIUS_DB = 12;
    private static final double FAINTEST_DBZ = -6;
    /** How far below its full strength a cell starts and ends, dB. */
    private static final double YOUNG_DB = 45;
    private final Cell cell;
    private final Texture ragged;
    private final Texture speckled;
    private final double sin;
    private final double cos;

    CellLayer(Cell cell, Streams streams) {
        this.cell = cell;
        Streams own = streams.part("cell", cell.number());
        ragged = new Texture(List.of(new Texture.Octave(0.9 * cell.radiusKm(), 0.17, 900),
                new Texture.Octave(0.35 * cell.radiusKm(), 0.05, 500)), own.part("ragged", 0));
        speckled = new Texture(List.of(new Texture.Octave(1.1, 2.0, 400)), own.part("lumps", 0));
        sin = FastMath.sin(FastMath.toRadians(cell.longDeg()));
        cos = FastMath.cos(FastMath.toRadians(cell.longDeg()));
    }

    @Override
    public void addTo(RayEcho ray) {
        double share = cell.life().share(ray.timeS);
        if (share <= 0) {
            return;
        }
        double peak = cell.peakDbz() - YOUNG_DB * (1 - Math.sqrt(share));
        if (peak < FAINTEST_DBZ) {
            return;
        }
        Point centre = cell.startKm().plus(cell.driftMs().times((ray.timeS - cell.life().fromS()) / 1000));
        double reach = 1.8 * cell.radiusKm() * Math.sqrt(cell.stretch())
                * FastMath.pow((peak - FAINTEST_DBZ) / LOSS_AT_RADIUS_DB, 2.0 / 3);
        double abeam = Math.abs(centre.xKm() * ray.cos - centre.yKm() * ray.sin);
        double along = centre.xKm() * ray.sin + centre.yKm() * ray.cos;
        if (abeam > reach || along < -reach) {
            return;
        }
        double half = Math.sqrt(reach * reach - abeam * abeam);
        double radial = cell.driftMs().xKm() * ray.sin + cell.driftMs().yKm() * ray.cos;
        Texture.Still outline = ragged.still(ray.timeS);
        Texture.Still lumps = speckled.still(ray.timeS);
        double squeeze = Math.sqrt(cell.stretch());
        for (int b = 0; b < ray.bins(); b++) {
            double range = ray.grid.groundKm(b);
            if (range < along - half || range > along + half) {
                continue;
            }
            double dx = ray.xKm[b] - centre.xKm();
            double dy = ray.yKm[b] - centre.yKm();
            double u = (dx * sin + dy * cos) / squeeze;
            double v = (dx * cos - dy * sin) * squeeze;
            double distance = Math.sqrt(u * u + v * v) / cell.radiusKm();
            // Raggedness stays a matter of the outline: far out it must not pull up echo of its own.
            distance *= Math.max(0.45, 1 + outline.at(dx, dy) / Math.max(1, distance));
            double dbz = peak - LOSS_AT_RADIUS_DB * distance * Math.sqrt(distance);
            if (dbz > FAINTEST_DBZ) {
                ray.addRest(b, Decibels.toLinear(dbz + lumps.at(dx, dy)), radial);
            }
        }
    }
}
