package hemline.simulation.scene;

import hemline.simulation.front.FrontCurve;

/**
 * A boundary of the scene.
 *
 * @param id       its name in the truth
 * @param curve    where it is
 * @param look     its thin line
 * @param clearing the air behind it
 * @param life     when it is there
 * @param window   which stations of it are there
 * @param depthKm  depth of the line's echo above the ground, km (insects are carried to the top of the head)
 * @param outflow  false for a boundary of another kind
 * @param flow     speed of the air right behind it over the front's own speed; 0 for no wind of its own
 */
public record Front(String id, FrontCurve curve, LineLook look, Clearing clearing, Life life, Window window,
                    double depthKm, boolean outflow, double flow) {

    /**
     * A stretch of stations with soft ends.
     *
     * @param first first station
     * @param last  last station, above {@code first}; for a ring both may run on past a full turn
     * @param soft  stations over which an end fades in
     */
    public record Window(double first, double last, double soft) {
        /** Everything. */
        public static final Window ALL = new Window(-1e9, 1e9, 1);

        public double share(double station) {
            return Steps.smooth((station - first) / soft) * Steps.smooth((last - station) / soft);
        }
    }

    /** Share of the thinning of the air behind at a station: like the front, but with far softer ends. */
    public double clearingShare(double station, double timeS) {
        double there;
        if (curve.closed()) {
            Window wide = new Window(window.first, window.last, Math.max(window.soft, 1.2));
            there = Math.max(wide.share(station), wide.share(station + 2 * Math.PI));
        } else {
            there = window.share(station) * openEnds(station, 0.6);
        }
        return there * life.share(timeS);
    }

    /** Share of the front that is there at a station, before breaks and before it runs into another, 0 to 1. */
    public double share(double station, double timeS) {
        double there = window.share(station);
        if (curve.closed()) {
            there = Math.max(there, window.share(station + 2 * Math.PI));
        } else {
            there *= openEnds(station, 0.12);
        }
        return there * life.share(timeS);
    }

    private double openEnds(double station, double softShare) {
        double soft = softShare * curve.lastStation();
        return Steps.smooth((curve.lastStation() - Math.abs(station)) / soft);
    }

    /** {@code thin-line}, {@code arc} or {@code both}. */
    public String form() {
        if (!look.present()) {
            return "arc";
        }
        return clearing.depthDb() > 0 ? "both" : "thin-line";
    }
}
