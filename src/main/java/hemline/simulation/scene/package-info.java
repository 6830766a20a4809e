/**
 * What there is in an invented scene, as plain values: fronts, clear air, rain, ground, things that only look like
 * boundaries, and faults of the receiver. Nothing here knows of a radar's gates.
 *
 * <p>May use: simulation.front, simulation.random, boundary, sweep and their base.
 * Open {@link hemline.simulation.scene.SceneSpec} first.
 */
package hemline.simulation.scene;
