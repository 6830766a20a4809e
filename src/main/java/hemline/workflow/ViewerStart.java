package hemline.workflow;

/** Starts a viewer; found through {@link java.util.ServiceLoader}, so that a skin without a screen needs none. */
public interface ViewerStart {
    /**
     * Shows the viewer and returns when its last window is closed.
     *
     * @return the exit code of the program
     */
    int start(ViewerRequest request);
}
