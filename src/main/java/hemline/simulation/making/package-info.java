/**
 * Turns a scene and a radar into sweeps and truth: beam, receiver, what can be seen, first contacts.
 *
 * <p>May use: the other packages of simulation, boundary, sweep and their base.
 * Open {@link hemline.simulation.making.SweepMaker} first.
 */
package hemline.simulation.making;
