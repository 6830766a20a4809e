package hemline.viewer;

import hemline.workflow.ViewerRequest;
import java.nio.file.Path;
import java.util.List;

/** Shows the viewer on the invented loop of the tests, to look at it by hand. */
public final class DemoViewer {
    private DemoViewer() {
    }

    public static void main(String[] args) {
        new FxViewerStart()
                .start(new ViewerRequest(List.of(Path.of("invented")),
                        new FakeOpener(analysed -> new FakeLoop(14, 720, 600, analysed))));
    }
}
