/**
 * The JavaFX viewer: {@code viewmodel} holds what it knows, {@code render} draws, {@code view} binds the two.
 *
 * <p>May use: workflow, casefile, boundary, sweep and their base; JavaFX, its themes and icons.
 * Open {@link hemline.viewer.FxViewerStart} first.
 */
package hemline.viewer;
