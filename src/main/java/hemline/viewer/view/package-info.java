/**
 * Windows and controls. They bind to the view models and hold no knowledge of their own.
 *
 * <p>May use: viewmodel, render, JavaFX and its themes and icons; workflow, boundary, sweep and their base.
 * Open {@link hemline.viewer.view.ViewerWindow} first.
 */
package hemline.viewer.view;
