package hemline.viewer.render;

import hemline.boundary.Track;
import hemline.viewer.viewmodel.MapLine;
import hemline.viewer.viewmodel.MeasureModel.Mark;
import hemline.viewer.viewmodel.Overlay;
import hemline.viewer.viewmodel.ViewTransform;
import hemline.workflow.LoopSession;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * All that the overlays of one moment are drawn from.
 *
 * @param session  the open loop
 * @param index    the sweep shown, 0 the earliest
 * @param view     how the plane lies on the screen
 * @param shown    the overlays to draw
 * @param track    id of the selected track, empty for none
 * @param meeting  id of the selected meeting, empty for none
 * @param marks    of the measure tool, none to two
 * @param map      lines of the base map and of the user's own
 * @param letters  fonts at the user's text size
 */
public record PlaneScene(LoopSession session, int index, ViewTransform view, Set<Overlay> shown, String track,
                         String meeting, List<Mark> marks, List<MapLine> map,
                         Letters letters) {

    boolean shows(Overlay overlay) {
        return shown.contains(overlay);
    }

    boolean isSelected(Track candidate) {
        return candidate.id().equals(track);
    }

    /** Time of the sweep shown, ms since 1970-01-01T00:00Z. */
    long nowMs() {
        return session.frames().get(index).meanTimeMs();
    }

    Optional<Track> track(String id) {
        return session.tracks().stream().filter(t -> t.id().equals(id)).findFirst();
    }
}
