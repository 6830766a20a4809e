package hemline.meeting;

import hemline.geometry.Point;
import java.util.List;

/**
 * How near two sets of lines come to each other at one time, each vertex carried along its normal to that time.
 *
 * @param gapKm     shortest distance, km
 * @param onA       where the first line is there, km
 * @param onB       where the second is
 * @param velocityA motion of the first there, m s⁻¹
 * @param velocityB motion of the second
 * @param closingMs rate at which the gap closes from both lines' motion, m s⁻¹
 * @param sdMs      its standard deviation, m s⁻¹
 * @param turnDeg   angle between the directions of motion there, degrees in [0, 180]
 * @param crossDeg  angle between the lines there, degrees in [0, 90]
 * @param alongX    unit direction of the bisector of the lines, east
 * @param alongY    north
 * @param carrySdKm standard deviation of the gap from ends that had to be carried on, km
 */
record Approach(double gapKm, Point onA, Point onB, Point velocityA, Point velocityB, double closingMs, double sdMs, double turnDeg, double crossDeg,
                double alongX, double alongY, double carrySdKm) {
    /** Standard deviation of where a line carried on beyond its end is: grows along it and with its square, km. */
    private static final double CARRY_SD = 0.05;
    private static final double CARRY_BEND_SD = 0.02;

    /** The nearest approach at a time, s; null when either side is empty. Lines that move alike do not count. */
    static Approach nearest(List<MovingLine> a, List<MovingLine> b, double atS, double minTurnDeg) {
        Approach best = null;
        double bestPrice = Double.POSITIVE_INFINITY;
        double cosTurn = Math.cos(Math.toRadians(minTurnDeg));
        for (MovingLine first : a) {
            for (MovingLine second : b) {
                for (int i = 0; i < first.size(); i++) {
                    double ax = first.x()[i] + first.velocityX()[i] * (atS - first.timeS()[i]) / 1000;
                    double ay = first.y()[i] + first.velocityY()[i] * (atS - first.timeS()[i]) / 1000;
                    for (int j = 0; j < second.size(); j++) {
                        double bx = second.x()[j] + second.velocityX()[j] * (atS - second.timeS()[j]) / 1000;
                        double by = second.y()[j] + second.velocityY()[j] * (atS - second.timeS()[j]) / 1000;
                        double gap = Math.hypot(bx - ax, by - ay);
                        double carried = Math.hypot(carrySdKm(first.carriedKm()[i]), carrySdKm(second.carriedKm()[j]));
                        double price = gap + carried;
                        if (price < bestPrice && turnCos(first, i, second, j) < cosTurn) {
                            bestPrice = price;
                            best = at(first, i, second, j, new double[] {ax, ay, bx, by}, carried);
                        }
                    }
                }
            }
        }
        return best;
    }

    /** Where the lines are found at once after a wait, each having moved on at its own speed. */
    Point placeAfter(double waitS) {
        return onA.plus(velocityA.times(waitS / 1000)).plus(onB).plus(velocityB.times(waitS / 1000)).times(0.5);
    }

    private static double carrySdKm(double carriedKm) {
        return CARRY_SD * carriedKm + CARRY_BEND_SD * carriedKm * carriedKm;
    }

    private static double turnCos(MovingLine a, int i, MovingLine b, int j) {
        double lengths = Math.hypot(a.velocityX()[i], a.velocityY()[i]) * Math.hypot(b.velocityX()[j], b.velocityY()[j]);
        return lengths < 1e-9 ? 1
                : (a.velocityX()[i] * b.velocityX()[j] + a.velocityY()[i] * b.velocityY()[j]) / lengths;
    }

    private static Approach at(MovingLine a, int i, MovingLine b, int j, double[] ends, double carried) {
        double dx = ends[2] - ends[0];
        double dy = ends[3] - ends[1];
        double gap = Math.hypot(dx, dy);
        double va = Math.hypot(a.velocityX()[i], a.velocityY()[i]);
        double vb = Math.hypot(b.velocityX()[j], b.velocityY()[j]);
        double turn = Math.toDegrees(Math.acos(Math.max(-1, Math.min(1, turnCos(a, i, b, j)))));
        // Along the bisector of the motions both lines come nearer; the gap's own direction is noise once it is small.
        double ux = a.velocityX()[i] / va - b.velocityX()[j] / vb;
        double uy = a.velocityY()[i] / va - b.velocityY()[j] / vb;
        double length = Math.max(1e-9, Math.hypot(ux, uy));
        ux /= length;
        uy /= length;
        double closing = (a.velocityX()[i] - b.velocityX()[j]) * ux + (a.velocityY()[i] - b.velocityY()[j]) * uy;
        return new Approach(gap, new Point(ends[0], ends[1]), new Point(ends[2], ends[3]),
                new Point(a.velocityX()[i], a.velocityY()[i]), new Point(b.velocityX()[j], b.velocityY()[j]), closing,
                Math.hypot(a.sdMs()[i], b.sdMs()[j]), turn, turn > 90 ? 180 - turn : turn, -uy, ux, carried);
    }
}
