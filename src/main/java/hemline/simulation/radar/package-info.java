/**
 * Invented radars: how they scan, what their beam takes in, what their receiver can hear and how they write it down.
 *
 * <p>May use: simulation.random, boundary, sweep and their base. Open {@link hemline.simulation.radar.RadarSpec} first.
 */
package hemline.simulation.radar;
