package hemline.simulation.front;

import hemline.geometry.Point;

/** A curve that moves by a closed formula, so that its place and its normal speed are known exactly at any time. */
public sealed interface FrontCurve permits RingCurve, BowCurve {
    /** The curve held still at a time, s after the scene's start, for many questions about places. */
    Still still(double timeS);

    /** The point of a station at a time. */
    CurvePoint at(double station, double timeS);

    /** Lowest station. */
    double firstStation();

    /** Highest station; for a closed curve the same place as the lowest. */
    double lastStation();

    boolean closed();

    /** Length of curve for one unit of station at a time, km; the along-line texture of a front is laid out with it. */
    double kmPerStation(double timeS);

    /** A curve at one time. */
    interface Still {
        /** Fills {@code foot}; far from the curve only the sign and the largeness of the distance are meaningful. */
        void locate(double xKm, double yKm, Foot foot);

        /** Velocity of the air that follows the curve at a place behind it, m s⁻¹ east and north. */
        Point followingMs(double xKm, double yKm);
    }
}
