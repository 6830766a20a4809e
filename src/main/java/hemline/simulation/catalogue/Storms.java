package hemline.simulation.catalogue;

import hemline.geometry.Point;
import hemline.simulation.scene.Cell;
import hemline.simulation.scene.EchoSpec;
import hemline.simulation.scene.Life;
import java.util.ArrayList;
import java.util.List;

/** Clusters and lines of rain cells. */
final class Storms {
    private Storms() {
    }

    /** A storm of several cells that come and go about a moving place; the first is born at {@code birthS}. */
    static List<EchoSpec> cluster(SceneKit kit, Point placeKm, Point driftMs, double birthS, double lastS) {
        List<EchoSpec> cells = new ArrayList<>();
        double when = birthS;
        int count = 0;
        while (when < lastS && count < 9) {
            Point centre = placeKm.plus(driftMs.times((when - birthS) / 1000));
            Point off = count == 0 ? new Point(0, 0) : kit.velocity(1.5, 7);
            cells.add(cell(kit, centre.plus(off), driftMs, when));
            when += kit.between(400, 900);
            count++;
        }
        return cells;
    }

    static Cell cell(SceneKit kit, Point placeKm, Point driftMs, double birthS) {
        double rise = kit.between(700, 1200);
        Life life = new Life(birthS, rise, birthS + rise + kit.between(300, 1200), kit.between(1200, 2200));
        return new Cell(placeKm, driftMs.plus(kit.velocity(0, 1.5)), life, kit.between(44, 57), kit.between(2.6, 5),
                kit.between(1, 2), kit.between(0, 180), kit.number());
    }

    /** Showers strewn over the area, all moving with one wind, coming and going at all times. */
    static List<EchoSpec> scattered(SceneKit kit, int count, Point driftMs, double fromDbz, double toDbz) {
        List<EchoSpec> cells = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            double birth = kit.between(-2400, kit.spanS);
            Point place = kit.velocity(10, 1.1 * kit.reachKm).minus(driftMs.times(0.9));
            double rise = kit.between(700, 1500);
            Life life = new Life(birth, rise, birth + rise + kit.between(600, 1800), kit.between(1200, 2400));
            cells.add(new Cell(place, driftMs.plus(kit.velocity(0, 1)), life, kit.between(fromDbz, toDbz), kit.between(2.5, 6),
                    kit.between(1, 2.6), kit.between(0, 180), kit.number()));
        }
        return cells;
    }

    /** Cells strung along a line that trails a front. */
    static List<EchoSpec> line(SceneKit kit, Point middleKm, double alongDeg, double lengthKm, Point driftMs,
                               double fromS, double toS) {
        List<EchoSpec> cells = new ArrayList<>();
        int places = (int) Math.max(2, lengthKm / 11);
        for (int i = 0; i < places; i++) {
            double along = lengthKm * ((i + 0.5) / places - 0.5) + kit.between(-3, 3);
            Point at = middleKm.plus(Point.towards(alongDeg).times(along)).plus(kit.velocity(0, 4));
            for (double when = fromS + kit.between(-1800, 0); when < toS; when += kit.between(1500, 2600)) {
                Cell cell = cell(kit, at.plus(driftMs.times((when - fromS) / 1000)), driftMs, when);
                cells.add(cell);
            }
        }
        return cells;
    }
}
