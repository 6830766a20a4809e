package hemline.viewer.viewmodel;

import hemline.geodesy.BeamGeometry;
import hemline.sweep.RayGeometry;
import hemline.sweep.SweepFrame;
import hemline.workflow.LoopSession;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** What the status line always says: age of the data, reach of the beam, and what the output is not. */
public final class StatusModel {
    /** The sentence that never leaves the screen. */
    public static final String GUIDANCE = "Guidance, not a warning";
    /** Data older than this are too old to act on; two missed sweeps of a usual radar. */
    private static final long OLD_MS = 15 * 60_000L;
    private static final long ARCHIVE_MS = 24 * 3_600_000L;

    private final ReadOnlyStringWrapper age = new ReadOnlyStringWrapper(this, "age", "No data");
    private final ReadOnlyBooleanWrapper old = new ReadOnlyBooleanWrapper(this, "old", false);
    private final ReadOnlyStringWrapper reach = new ReadOnlyStringWrapper(this, "reach", "");
    private long newestMs = Long.MIN_VALUE;

    public void open(LoopSession session, long nowMs) {
        SweepFrame newest = session.frames().get(session.frames().size() - 1);
        newestMs = endMs(newest.rays());
        reach.set("Nothing claimed beyond " + Words.number(ceilingRangeKm(newest.beam(), session.heightCeilingM()), 0)
                + " km: beam " + Words.number(session.heightCeilingM() / 1000, 1) + " km up");
        refresh(nowMs);
    }

    /** Says the age as of now. */
    public void refresh(long nowMs) {
        if (newestMs == Long.MIN_VALUE) {
            return;
        }
        long ageMs = nowMs - newestMs;
        boolean archive = ageMs > ARCHIVE_MS;
        old.set(ageMs > OLD_MS && !archive);
        String when = "Newest data " + Words.date(newestMs) + " " + Words.clock(newestMs) + " UTC, ";
        if (ageMs < -60_000) {
            age.set(when + Words.span(ageMs) + " ahead of the clock here");
        } else {
            age.set(when + Words.span(Math.max(0, ageMs)) + " old" + (archive ? " (archive)" : old.get() ? ": old"
                    : ""));
        }
    }

    /** Ground range at which the beam centre passes a height above the radar, km. */
    public static double ceilingRangeKm(BeamGeometry beam, double heightM) {
        double low = 0;
        double high = 600_000;
        for (int i = 0; i < 60; i++) {
            double middle = 0.5 * (low + high);
            if (beam.heightAboveAntennaM(middle) < heightM) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return beam.groundRangeM(low) / 1000;
    }

    private static long endMs(RayGeometry rays) {
        long last = Long.MIN_VALUE;
        for (int i = 0; i < rays.rays(); i++) {
            last = Math.max(last, rays.timeMs(i));
        }
        return last;
    }

    public ReadOnlyStringProperty ageProperty() {
        return age.getReadOnlyProperty();
    }

    /** Whether live data have grown too old to act on. */
    public ReadOnlyBooleanProperty oldProperty() {
        return old.getReadOnlyProperty();
    }

    public ReadOnlyStringProperty reachProperty() {
        return reach.getReadOnlyProperty();
    }
}
