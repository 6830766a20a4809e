package hemline.boundary.station;

import hemline.boundary.Speed;
import java.util.Optional;

/**
 * One boundary passing over one station.
 *
 * @param station      the station's name
 * @param trackId      the boundary
 * @param trackTimeMs  when the tracked line passed, ms since 1970-01-01T00:00Z
 * @param trackTimeSdS standard deviation of that, s
 * @param bearingDeg   compass bearing it moved toward there, degrees
 * @param speed        along that bearing
 * @param signal       the passage in the station's own record
 * @param change       before and after
 * @param theory       against a density current
 * @param note         why signal, change or theory are missing, in words; empty when none is
 */
public record StationPassage(String station, String trackId, long trackTimeMs, double trackTimeSdS, double bearingDeg,
                             Speed speed, Optional<StationSignal> signal, Optional<AirChange> change,
                             Optional<TheoryCheck> theory, String note) {
}
