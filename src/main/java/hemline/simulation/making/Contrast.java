package hemline.simulation.making;

import hemline.geometry.Point;
import hemline.simulation.echo.Decibels;

/**
 * What a front changes in a clean sweep across its normal, dB over the receiver's noise floor.
 *
 * <p>Every reading is 10 log₁₀(Z + N): a front beneath the noise changes nothing. {@code lineDb} is what the line adds at
 * its crest, {@code prominenceDb} how far the crest stands over the lowest place on its higher side, {@code stepDb} the
 * mean ahead less the mean behind as it is, {@code clearingDb} the part of it that the thinned air accounts for.
 */
final class Contrast {
    private static final double STEP_KM = 0.25;
    private static final double SIDE_KM = 4.0;
    private static final double CREST_KM = 0.75;
    private static final double SIDE_FROM_KM = 1.0;
    private static final double TEXTURE_TO_KM = 6.0;
    private final CleanSweep clean;
    private final double firstGroundKm;

    double lineDb;
    double prominenceDb;
    double stepDb;
    double clearingDb;
    double textureDb;
    double crestDbz;
    boolean lost;

    Contrast(CleanSweep clean) {
        this.clean = clean;
        firstGroundKm = clean.radar.gates().firstCentreM() / 1000;
    }

    /** Reads across a place; false when the place lies outside the sweep's gates. */
    boolean read(Point place, Point normal) {
        double range = place.lengthKm();
        if (gateOf(place) < 0) {
            return false;
        }
        lost = clean.lost[rayOf(place)];
        double crest = Double.NEGATIVE_INFINITY;
        lineDb = 0;
        double line = 0;
        for (double d = -CREST_KM; d <= CREST_KM; d += STEP_KM) {
            int gate = index(place.plus(normal.times(d)));
            if (gate >= 0) {
                crest = Math.max(crest, level(clean.total, gate));
                lineDb = Math.max(lineDb, level(clean.total, gate) - level(clean.withoutLines, gate));
                line = Math.max(line, clean.total[gate] - clean.withoutLines[gate]);
            }
        }
        crestDbz = line > 0 ? Decibels.fromLinear(line) : mean(place, normal, clean.total, 0.5, 3);
        double ahead = lowest(place, normal, 1);
        double behind = lowest(place, normal, -1);
        prominenceDb = crest - Math.max(ahead, behind);
        stepDb = mean(place, normal, clean.total, 0.5, 3) - mean(place, normal, clean.total, -4, -1);
        clearingDb = mean(place, normal, clean.withoutClearing, -4, -1) - mean(place, normal, clean.total, -4, -1);
        textureDb = Math.max(roughness(place, normal, 1), roughness(place, normal, -1));
        return range > firstGroundKm;
    }

    private double lowest(Point place, Point normal, int side) {
        double low = Double.POSITIVE_INFINITY;
        for (double d = SIDE_FROM_KM; d <= SIDE_KM; d += STEP_KM) {
            int gate = index(place.plus(normal.times(side * d)));
            if (gate >= 0) {
                low = Math.min(low, level(clean.total, gate));
            }
        }
        return low;
    }

    private double mean(Point place, Point normal, float[] field, double from, double to) {
        double sum = 0;
        int count = 0;
        for (double d = from; d <= to; d += STEP_KM) {
            int gate = index(place.plus(normal.times(d)));
            if (gate >= 0) {
                sum += level(field, gate);
                count++;
            }
        }
        return count == 0 ? 0 : sum / count;
    }

    /** Departure of the background from a straight line on one side, dB: what the line must be told from. */
    private double roughness(Point place, Point normal, int side) {
        double n = 0;
        double sx = 0;
        double sy = 0;
        double sxx = 0;
        double sxy = 0;
        double syy = 0;
        for (double d = SIDE_FROM_KM; d <= TEXTURE_TO_KM; d += STEP_KM) {
            int gate = index(place.plus(normal.times(side * d)));
            if (gate >= 0) {
                double y = level(clean.withoutLines, gate);
                n++;
                sx += d;
                sy += y;
                sxx += d * d;
                sxy += d * y;
                syy += y * y;
            }
        }
        if (n < 4) {
            return 0;
        }
        double vx = sxx - sx * sx / n;
        double vxy = sxy - sx * sy / n;
        return Math.sqrt(Math.max(0, syy - sy * sy / n - vxy * vxy / vx) / (n - 2));
    }

    private double level(float[] field, int index) {
        return Decibels.fromLinear(field[index] + clean.noise(index % clean.gates));
    }

    private int index(Point place) {
        int gate = gateOf(place);
        return gate < 0 ? -1 : rayOf(place) * clean.gates + gate;
    }

    private int gateOf(Point place) {
        double slantM = clean.radar.beam().slantRangeM(1000 * place.lengthKm());
        int gate = (int) Math.rint((slantM - clean.radar.gates().firstCentreM()) / clean.radar.gates().spacingM());
        return gate >= 0 && gate < clean.gates ? gate : -1;
    }

    private int rayOf(Point place) {
        return clean.nearestRay(place.bearingDeg());
    }
}
