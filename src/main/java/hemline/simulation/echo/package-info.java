/**
 * What a scene sends back from the places along a ray, without noise: clear air, fronts, rain, ground and decoys.
 *
 * <p>May use: simulation.scene, simulation.front, simulation.radar, simulation.random, boundary, sweep and their base.
 * Open {@link hemline.simulation.echo.SceneEchoes} first.
 */
package hemline.simulation.echo;
