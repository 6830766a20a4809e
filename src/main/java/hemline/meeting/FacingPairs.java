package hemline.meeting;

import hemline.geometry.Point;
import java.util.ArrayList;
import java.util.List;

/**
 * Pairs of vertices of two tracks whose paths could bring them together: for each, the gap along the direction in
 * which they approach, at the present, and how fast either closes it. Made once, then asked for many futures.
 */
final class FacingPairs {
    /** Vertices count as facing each other when they lie this near across the direction of approach, km. */
    private static final double FACING_KM = 1.2;
    /** The same for pairs worth keeping for uncertain futures, km. */
    private static final double KEPT_KM = 5;
    private static final double LEAST_CLOSING_MS = 1;

    private final List<Facing> pairs = new ArrayList<>();

    /**
     * @param atA      where the first vertex is at present, km
     * @param atB      where the second is
     * @param towardA  unit direction of the first's motion
     * @param towardB  of the second's
     * @param speedA   m s⁻¹
     * @param speedB   m s⁻¹
     * @param sdA      standard deviation, m s⁻¹
     * @param sdB      standard deviation, m s⁻¹
     * @param lagA     time since the first was seen, 1000 s
     * @param lagB     time since the second was seen, 1000 s
     * @param presence chance that both lines are there
     * @param crossDeg angle between the lines, degrees in [0, 90]
     */
    private record Facing(Point atA, Point atB, Point towardA, Point towardB, double speedA, double speedB, double sdA,
                          double sdB, double lagA, double lagB, double presence, double crossDeg) {
    }

    /** A contact in one future: {@code afterKs} from the present, 1000 s. */
    record Contact(double afterKs, Point place, double closingMs, double crossDeg) {
    }

    /** @param horizonKs farthest future of interest, 1000 s */
    FacingPairs(List<MovingLine> a, List<MovingLine> b, double nowS, double minTurnDeg, double horizonKs) {
        double mostCos = Math.cos(Math.toRadians(minTurnDeg));
        for (MovingLine first : a) {
            for (MovingLine second : b) {
                for (int i = 0; i < first.size(); i++) {
                    for (int j = 0; j < second.size(); j++) {
                        Facing pair = facing(first, i, second, j, nowS, mostCos);
                        if (pair != null && worthKeeping(pair, horizonKs)) {
                            pairs.add(pair);
                        }
                    }
                }
            }
        }
    }

    private static Facing facing(MovingLine a, int i, MovingLine b, int j, double nowS, double mostCos) {
        double va = a.speedMs(i);
        double vb = b.speedMs(j);
        if (va < 0.1 || vb < 0.1) {
            return null;
        }
        Point towardA = new Point(a.velocityX()[i] / va, a.velocityY()[i] / va);
        Point towardB = new Point(b.velocityX()[j] / vb, b.velocityY()[j] / vb);
        double cos = towardA.dot(towardB);
        if (cos > mostCos) {
            return null;
        }
        double turn = Math.toDegrees(Math.acos(Math.max(-1, Math.min(1, cos))));
        return new Facing(a.at(i, nowS), b.at(j, nowS), towardA, towardB, va, vb, a.sdMs()[i], b.sdMs()[j],
                (nowS - a.timeS()[i]) / 1000, (nowS - b.timeS()[j]) / 1000,
                Outlook.presence(a.carriedKm()[i]) * Outlook.presence(b.carriedKm()[j]), turn > 90 ? 180 - turn : turn);
    }

    private static boolean worthKeeping(Facing pair, double horizonKs) {
        Point approach = approach(pair);
        double gap = pair.atB.minus(pair.atA).dot(approach);
        double closing = closing(pair, approach, pair.speedA, pair.speedB);
        if (closing < LEAST_CLOSING_MS || gap < -2 || gap > (closing + 6) * horizonKs) {
            return false;
        }
        return Math.abs(sideways(pair, approach, Math.max(0, gap / closing), pair.speedA, pair.speedB)) < KEPT_KM;
    }

    private static Point approach(Facing pair) {
        Point difference = pair.towardA.minus(pair.towardB);
        return difference.times(1 / Math.max(1e-9, difference.lengthKm()));
    }

    private static double closing(Facing pair, Point approach, double speedA, double speedB) {
        return speedA * pair.towardA.dot(approach) - speedB * pair.towardB.dot(approach);
    }

    private static double sideways(Facing pair, Point approach, double afterKs, double speedA, double speedB) {
        Point between = pair.atB.plus(pair.towardB.times(speedB * afterKs))
                .minus(pair.atA.plus(pair.towardA.times(speedA * afterKs)));
        return approach.cross(between);
    }

    boolean isEmpty() {
        return pairs.isEmpty();
    }

    /**
     * The first contact of one future; null if there is none.
     *
     * @param speedA    error of the first track's speed, standard deviations
     * @param changeA   its unforeseen change of speed, m s⁻¹ per 1000 s
     * @param speedB    likewise of the second
     * @param changeB   likewise of the second
     * @param leastPresence lines less likely to be there than this are not there in this future
     */
    Contact first(double speedA, double changeA, double speedB, double changeB, double leastPresence, double horizonKs) {
        Contact best = null;
        for (Facing pair : pairs) {
            if (pair.presence < leastPresence) {
                continue;
            }
            Point approach = approach(pair);
            double ca = pair.towardA.dot(approach);
            double cb = -pair.towardB.dot(approach);
            double va = pair.speedA + speedA * pair.sdA;
            double vb = pair.speedB + speedB * pair.sdB;
            double gap = pair.atB.minus(pair.atA).dot(approach) - ca * speedA * pair.sdA * pair.lagA
                    - cb * speedB * pair.sdB * pair.lagB;
            double after = root(gap, va * ca + vb * cb, changeA * ca + changeB * cb);
            if (after > horizonKs || best != null && after >= best.afterKs) {
                continue;
            }
            double meanA = va + 0.5 * changeA * after;
            double meanB = vb + 0.5 * changeB * after;
            if (Math.abs(sideways(pair, approach, after, meanA, meanB)) <= FACING_KM) {
                Point place = pair.atA.plus(pair.towardA.times(meanA * after))
                        .plus(pair.atB.plus(pair.towardB.times(meanB * after))).times(0.5);
                best = new Contact(after, place, va * ca + vb * cb, pair.crossDeg);
            }
        }
        return best;
    }

    /** First time at which {@code gap = c t + a t² / 2}; infinite if never. */
    private static double root(double gap, double closing, double change) {
        if (gap <= 0) {
            return gap > -2 ? 0 : Double.POSITIVE_INFINITY;
        }
        double square = closing * closing + 2 * change * gap;
        if (square < 0 || closing + Math.sqrt(square) <= 0) {
            return Double.POSITIVE_INFINITY;
        }
        return 2 * gap / (closing + Math.sqrt(square));
    }
}
