/**
 * Where and when boundaries met or will meet, arrivals at sites, and what follows a meeting.
 *
 * <p>May use: boundary, sweep and their base.
 */
package hemline.meeting;
