/**
 * The catalogue of scenes: each kind turns a radar and a seed into a scene.
 *
 * <p>May use: the scene, front, radar and random packages of simulation, boundary, sweep and their base.
 * Open {@link hemline.simulation.catalogue.SceneKit} first: the common parts from which scenes are put together.
 */
package hemline.simulation.catalogue;
