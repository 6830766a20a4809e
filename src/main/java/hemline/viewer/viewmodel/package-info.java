/**
 * Everything the viewer knows, as properties: loop, view, selection, overlays, read-out, ledger, traces, jobs,
 * actions. No control and no scene occurs here, so all of it runs in plain unit tests.
 *
 * <p>May use: javafx.beans and javafx.collections; workflow, casefile, boundary, sweep and their base.
 * Open {@link hemline.viewer.viewmodel.ViewerModel} first.
 */
package hemline.viewer.viewmodel;
