/**
 * Invented sweeps with known truth, written in the open formats.
 *
 * <p>{@link hemline.simulation.Scenes} and {@link hemline.simulation.Radars} are the catalogues,
 * {@link hemline.simulation.Simulation} joins one of each with a seed into a loop and its truth. Everything is a function
 * of scene, radar and seed: the order of asking and the number of threads change nothing.
 *
 * <p>May use: boundary, sweep and their base. Open {@link hemline.simulation.Simulation} first.
 */
package hemline.simulation;
