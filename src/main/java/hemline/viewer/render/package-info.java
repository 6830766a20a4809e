/**
 * Draws: sweeps as rasters by looking up each pixel's ray and gate, and overlays on canvases. Knows no control.
 *
 * <p>May use: viewmodel, javafx.scene.canvas, image and paint; boundary, sweep and their base.
 * Open {@link hemline.viewer.render.SweepRaster} first.
 */
package hemline.viewer.render;
