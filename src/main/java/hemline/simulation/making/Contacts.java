package hemline.simulation.making;

import hemline.geometry.Point;
import hemline.simulation.echo.FrontField;
import hemline.simulation.front.CurvePoint;
import hemline.simulation.front.FrontCurve;
import java.util.Optional;

/**
 * First contacts of two fronts in continuous time. The gap at a time is the least distance, on the side
 * where it began, of all points of one front from the other; contact is where the gap first falls to nothing. Fronts that
 * cross from the start have no first contact.
 */
final class Contacts {
    private static final double SCAN_STEP_S = 20;
    private static final double SPACING_KM = 0.4;
    private static final double LEAST_SHARE = 0.25;
    private final FrontField fronts;

    Contacts(FrontField fronts) {
        this.fronts = fronts;
    }

    /**
     * @param timeS            s after the scene's start
     * @param crossingAngleDeg 0 to 90
     * @param closingMs        fall of the gap, m s⁻¹
     */
    record Contact(double timeS, Point place, double crossingAngleDeg, double closingMs) {
    }

    private record Gap(double km, Point place, double station) {
    }

    /** First contact between two times, if the fronts are apart at the first. */
    Optional<Contact> first(int a, int b, double fromS, double toS) {
        int side = 0;
        for (double t = fromS; t <= toS; t += SCAN_STEP_S) {
            if (side == 0) {
                side = sideOf(a, b, t);
                continue;
            }
            Gap now = gap(a, b, t, side);
            if (now != null && now.km <= 0) {
                return Optional.of(refine(a, b, t - SCAN_STEP_S, t, side));
            }
        }
        return Optional.empty();
    }

    /** 1 when all of {@code a} lies ahead of {@code b}, −1 when all lies behind (it may overtake), else 0. */
    private int sideOf(int a, int b, double timeS) {
        Gap ahead = gap(a, b, timeS, 1);
        if (ahead == null) {
            return 0;
        }
        return ahead.km > 0 ? 1 : gap(a, b, timeS, -1).km > 0 ? -1 : 0;
    }

    private Contact refine(int a, int b, double apartS, double touchedS, int side) {
        double low = apartS;
        double high = touchedS;
        while (high - low > 0.05) {
            double middle = 0.5 * (low + high);
            Gap gap = gap(a, b, middle, side);
            if (gap != null && gap.km <= 0) {
                high = middle;
            } else {
                low = middle;
            }
        }
        Gap at = gap(a, b, high, side);
        CurvePoint onA = fronts.fronts().get(a).curve().at(at.station, high);
        FrontField.Now now = fronts.at(high);
        now.look(at.place.xKm(), at.place.yKm());
        CurvePoint onB = fronts.fronts().get(b).curve().at(now.station(b), high);
        double cos = onA.normal().dot(onB.normal());
        double angle = Math.toDegrees(org.apache.commons.math3.util.FastMath.acos(Math.min(1, Math.abs(cos))));
        // How fast B's line and A's point close along B's normal.
        double closing = Math.abs(onB.normalMs() - onA.normalMs() * cos);
        return new Contact(high, at.place, angle, closing);
    }

    private Gap gap(int a, int b, double timeS, int side) {
        var front = fronts.fronts().get(a);
        if (front.life().share(timeS) < LEAST_SHARE || fronts.fronts().get(b).life().share(timeS) < LEAST_SHARE) {
            return null;
        }
        FrontCurve curve = front.curve();
        double span = curve.lastStation() - curve.firstStation();
        int steps = Math.max(16, (int) Math.ceil(span * curve.kmPerStation(timeS) / SPACING_KM));
        FrontField.Now now = fronts.at(timeS);
        Gap best = null;
        for (int i = 0; i <= steps; i++) {
            double station = curve.firstStation() + span * i / steps;
            if (front.share(station, timeS) < LEAST_SHARE) {
                continue;
            }
            Point place = curve.at(station, timeS).place();
            now.look(place.xKm(), place.yKm());
            if (now.share(b) >= LEAST_SHARE && (best == null || side * now.aheadKm(b) < best.km)) {
                best = new Gap(side * now.aheadKm(b), place, station);
            }
        }
        return best;
    }
}
