package hemline.meeting;

import hemline.boundary.Meeting;

/** One-standard-deviation ellipses of covariances. */
final class Ellipses {
    private Ellipses() {
    }

    /** From variances and covariance toward east and north, km². */
    static Meeting.Ellipse of(double xx, double yy, double xy) {
        double mean = 0.5 * (xx + yy);
        double spread = Math.hypot(0.5 * (xx - yy), xy);
        double bearing = Math.toDegrees(0.5 * Math.atan2(2 * xy, yy - xx));
        return new Meeting.Ellipse(Math.sqrt(mean + spread), Math.sqrt(Math.max(0, mean - spread)),
                (bearing % 180 + 180) % 180);
    }
}
