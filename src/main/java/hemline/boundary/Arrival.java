package hemline.boundary;

/**
 * When a moving boundary reaches a site.
 *
 * @param site        the site's name
 * @param trackId     the boundary
 * @param timeMs      ms since 1970-01-01T00:00Z; meaningless when {@code reached} is false
 * @param timeSdS     standard deviation of the time, s; NaN when not reached
 * @param probability that it arrives within the horizon asked for, 0 to 1
 * @param speed       along {@code bearingDeg} at arrival
 * @param bearingDeg  compass bearing it moves toward at arrival; NaN when not reached
 * @param reached     false when it is not expected within the horizon
 */
public record Arrival(String site, String trackId, long timeMs, double timeSdS, double probability, Speed speed,
                      double bearingDeg, boolean reached) {
}
