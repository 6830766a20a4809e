package hemline.viewer.view;

import hemline.boundary.Track;
import hemline.viewer.viewmodel.ViewerModel;
import hemline.viewer.viewmodel.Words;
import hemline.workflow.LoopSession;

/** The plane in words, for screen readers. */
final class PlaneWords {
    private PlaneWords() {
    }

    static String of(ViewerModel model) {
        LoopSession session = model.session();
        if (session == null) {
            return "Plane: no loop is open";
        }
        int index = model.loop().index();
        long here = session.tracks().stream().filter(t -> t.pieces().stream().anyMatch(p ->
                p.sweep() == index)).count();
        StringBuilder words = new StringBuilder("Plane: sweep ").append(index + 1).append(" of ")
                .append(session.frames().size()).append(", ")
                .append(Words.clock(session.frames().get(index).meanTimeMs())).append(" UTC, ").append(here)
                .append(here == 1 ? " boundary" : " boundaries");
        model.track(model.selection().track()).ifPresent(track -> words.append(". Selected ").append(of(track)));
        model.meeting(model.selection().meeting()).ifPresent(m -> words.append(". Selected meeting ").append(m.id())
                .append(" of ").append(m.trackA()).append(" and ").append(m.trackB()).append(" at ")
                .append(Words.shortClock(m.timeMs())).append(", ").append(m.status().label()));
        return words.toString();
    }

    private static String of(Track track) {
        String toward = Double.isFinite(track.bearingDeg()) ? "toward " + Words.bearing(track.bearingDeg()) + " " : "";
        return track.id() + (track.speed().isKnown()
                ? ", moving " + toward + "at " + Words.speed(track.speed()) : "");
    }
}
