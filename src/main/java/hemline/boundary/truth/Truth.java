package hemline.boundary.truth;

import java.util.List;

/**
 * The truth of one invented loop.
 *
 * @param scene      name of the kind of scene
 * @param seed       the random seed it was made with
 * @param sweeps     every sweep of the loop, in order
 * @param boundaries what should be found
 * @param decoys     what looks like a boundary and is not; kept so that false length can be told by cause
 * @param meetings   first contacts of pairs of boundaries
 */
public record Truth(String scene, long seed, List<TruthSweep> sweeps, List<TruthBoundary> boundaries,
                    List<TruthDecoy> decoys, List<TruthMeeting> meetings) {
    public Truth {
        sweeps = List.copyOf(sweeps);
        boundaries = List.copyOf(boundaries);
        decoys = List.copyOf(decoys);
        meetings = List.copyOf(meetings);
    }

    /**
     * @param index   place in the loop, 0 the earliest
     * @param startMs earliest ray, ms since 1970-01-01T00:00Z
     * @param endMs   latest ray, ms since 1970-01-01T00:00Z
     */
    public record TruthSweep(int index, long startMs, long endMs) {
    }

    /**
     * A real boundary.
     *
     * @param id      its name in the truth
     * @param form    {@code thin-line}, {@code arc} (step only) or {@code both}
     * @param outflow false for a boundary of another kind, such as a sea-breeze front
     * @param lines   where it was at each sweep
     * @param arcs    centre and radius at each sweep; empty for a boundary that is no arc
     */
    public record TruthBoundary(String id, String form, boolean outflow, List<TruthLine> lines, List<TruthArc> arcs) {
        public TruthBoundary {
            lines = List.copyOf(lines);
            arcs = List.copyOf(arcs);
        }
    }

    /** One connected stretch at one sweep, each vertex at its own ray's time. */
    public record TruthLine(int sweep, List<TruthVertex> vertices) {
        public TruthLine {
            vertices = List.copyOf(vertices);
        }
    }

    /**
     * @param xKm              km east of the radar
     * @param yKm              km north of the radar
     * @param timeMs           the ray's time, ms since 1970-01-01T00:00Z
     * @param detectability    0 (hidden: rain, blockage, too high, faded) to 1 (plain); a careful eye sees it from 0.5
     * @param peakDbz          of the line's own echo as the beam takes it in, without noise and without what lies about
     *                         it, dBZ; of the air ahead where there is no line
     * @param normalBearingDeg compass bearing it moves toward along its normal, degrees clockwise from north
     * @param speedMs          along that bearing, m s⁻¹
     */
    public record TruthVertex(double xKm, double yKm, long timeMs, double detectability, double peakDbz,
                              double normalBearingDeg, double speedMs) {
    }

    /**
     * @param timeMs      ms since 1970-01-01T00:00Z
     * @param radiusKm    km
     * @param expansionMs rate of growth of the radius, m s⁻¹
     */
    public record TruthArc(int sweep, long timeMs, double centreXKm, double centreYKm, double radiusKm,
                           double expansionMs) {
    }

    /**
     * @param cause {@code roll}, {@code bright-band}, {@code rain-band}, {@code roost}, {@code clutter} and so on
     * @param lines where it was at each sweep it was present in
     */
    public record TruthDecoy(String cause, List<TruthLine> lines) {
        public TruthDecoy {
            lines = List.copyOf(lines);
        }
    }

    /**
     * @param boundaryA        id of one boundary
     * @param boundaryB        id of the other
     * @param timeMs           of first contact, ms since 1970-01-01T00:00Z
     * @param crossingAngleDeg angle between the lines, degrees in [0, 90]
     * @param closingMs        speed at which the gap closed, m s⁻¹
     * @param detectable       whether both boundaries can be seen within 10 km of the place before contact
     */
    public record TruthMeeting(String boundaryA, String boundaryB, long timeMs, double xKm, double yKm,
                               double crossingAngleDeg, double closingMs, boolean detectable) {
    }
}
