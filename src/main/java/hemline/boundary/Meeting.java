package hemline.boundary;

import hemline.geometry.Point;

/**
 * Where and when two tracks touch first.
 *
 * @param id               short and stable within a run, for example {@code M1}
 * @param trackA           id of one track
 * @param trackB           id of the other, after {@code trackA} in order
 * @param timeMs           ms since 1970-01-01T00:00Z
 * @param timeSdS          standard deviation of the time, s
 * @param place            km east and north of the radar
 * @param ellipse          one-standard-deviation ellipse of the place
 * @param crossingAngleDeg angle between the lines, degrees in [0, 90]
 * @param closing          speed at which the gap closed
 * @param status           seen, or foreseen from the tracks' motion
 * @param probability      that they meet, 0 to 1; 1 when observed
 */
public record Meeting(String id, String trackA, String trackB, long timeMs, double timeSdS, Point place,
                      Ellipse ellipse, double crossingAngleDeg, Speed closing, Status status, double probability) {

    /** Seen in the loop, or expected after its end. */
    public enum Status {
        OBSERVED("observed"),
        EXPECTED("expected");

        private final String label;

        Status(String label) {
            this.label = label;
        }

        /** The word for this status in tables. */
        public String label() {
            return label;
        }
    }

    /**
     * One-standard-deviation ellipse.
     *
     * @param majorKm         half length of the longer axis, km
     * @param minorKm         half length of the shorter axis, km
     * @param majorBearingDeg compass bearing of the longer axis, degrees in [0, 180)
     */
    public record Ellipse(double majorKm, double minorKm, double majorBearingDeg) {
    }
}
