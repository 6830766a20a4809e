package hemline.reader;

import java.nio.ByteBuffer;

/**
 * The volume coverage pattern that precedes the radials (message 5 or 7; ICD 2620002, table XI): the planned cuts, by
 * which a reader of low cuts knows where it may stop.
 */
final class Level2Pattern {
    private static final int CUTS_AT = 22;
    private static final int CUT_BYTES = 46;
    private static final int MOST_CUTS = 64;
    private static final double ANGLE_DEG = 180.0 / 32768;

    private Level2Pattern() {
    }

    /**
     * The number, from 1, of the last cut at the lowest elevation that the options take; 0 when the message is not
     * laid out as expected or plans no such cut.
     */
    static int lastLowCut(ByteBuffer body, ReadOptions options) {
        if (body.limit() < CUTS_AT + CUT_BYTES) {
            return 0;
        }
        int cuts = body.getShort(6) & 0xffff;
        if (cuts < 1 || cuts > MOST_CUTS || body.limit() < CUTS_AT + CUT_BYTES * cuts
                || (body.getShort(0) & 0xffff) * 2 != CUTS_AT + CUT_BYTES * cuts) {
            return 0;
        }
        double lowest = Double.POSITIVE_INFINITY;
        for (int cut = 0; cut < cuts; cut++) {
            double elevation = elevationDeg(body, cut);
            lowest = options.takes(elevation) ? Math.min(lowest, elevation) : lowest;
        }
        int last = 0;
        for (int cut = 0; cut < cuts; cut++) {
            last = Math.abs(elevationDeg(body, cut) - lowest) <= LowSweeps.SAME_ELEVATION_DEG ? cut + 1 : last;
        }
        return last;
    }

    private static double elevationDeg(ByteBuffer body, int cut) {
        double angle = (body.getShort(CUTS_AT + CUT_BYTES * cut) & 0xffff) * ANGLE_DEG;
        return angle > 180 ? angle - 360 : angle;
    }
}
