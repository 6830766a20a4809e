package hemline.viewer.viewmodel;

import hemline.boundary.Meeting;
import hemline.boundary.Track;
import hemline.boundary.TrackPiece;
import hemline.geometry.Point;
import hemline.sweep.Progress;
import hemline.sweep.Sweep;
import hemline.sweep.SweepFrame;
import hemline.workflow.LoopSession;
import hemline.workflow.SessionOpener;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletionException;
import java.util.concurrent.Executor;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.ObjectBinding;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** One window's whole state, and the opening of loops. All methods belong on the user's thread. */
public final class ViewerModel {
    private static final long SWEEP_BUDGET_BYTES = 256L << 20;
    /** A fitted view reaches a little beyond the height ceiling: what lies further out cannot show a boundary. */
    private static final double FIT_BEYOND_CEILING = 1.1;

    private final SessionOpener opener;
    private final Executor reading;
    private final Executor ui;
    private final Clock clock;
    private final JobModel job;
    private final LoopModel loop = new LoopModel();
    private final PlaneModel plane = new PlaneModel();
    private final OverlayModel overlays = new OverlayModel();
    private final SelectionModel selection = new SelectionModel();
    private final LedgerModel ledger = new LedgerModel();
    private final MeasureModel measure = new MeasureModel();
    private final StatusModel status = new StatusModel();
    private final MapModel map;
    private final SettingsModel settings = new SettingsModel();
    private final ReadOnlyObjectWrapper<LoopSession> session = new ReadOnlyObjectWrapper<>(this, "session");
    private final ReadOnlyObjectWrapper<HeldSweep> shown = new ReadOnlyObjectWrapper<>(this, "shown");
    private final ReadOnlyStringWrapper sweepTrouble = new ReadOnlyStringWrapper(this, "sweepTrouble", "");
    private final ObjectBinding<Optional<ReadOut>> readOut;
    private SweepStore store;
    private boolean reachUnknown;

    /**
     * @param work    runs long work, one piece at a time
     * @param reading reads single sweeps
     * @param ui      runs on the user's thread
     */
    public ViewerModel(SessionOpener opener, Executor work, Executor reading, Executor ui, Clock clock) {
        this.opener = opener;
        this.reading = reading;
        this.ui = ui;
        this.clock = clock;
        job = new JobModel(work, ui, System::nanoTime);
        map = new MapModel(reading, ui, job);
        readOut = Bindings.createObjectBinding(() -> shown.get() == null || plane.cursorProperty().get() == null
                ? Optional.empty() : Optional.of(ReadOut.at(plane.cursorProperty().get(), shown.get())),
                shown, plane.cursorProperty());
        loop.indexProperty().addListener((o, was, now) -> showSweep());
    }

    /** Opens files and folders: sweeps first, results when they are there. */
    public void open(List<Path> paths) {
        job.start("Opening", progress -> {
            LoopSession read = opener.open(paths, progress);
            post(progress, () -> {
                show(read, true);
                paths.forEach(path -> settings.remember(path.toAbsolutePath()));
            });
            if (!read.analysed()) {
                LoopSession done = opener.analyse(read, progress);
                post(progress, () -> show(done, false));
            }
        });
    }

    private void post(Progress progress, Runnable change) {
        progress.check();
        ui.execute(() -> {
            if (!progress.cancelled()) {
                change.run();
            }
        });
    }

    /** Shows a session; {@code afresh} false keeps sweep, view and selection where they were. */
    void show(LoopSession opened, boolean afresh) {
        session.set(opened);
        store = new SweepStore(opened, reading, SWEEP_BUDGET_BYTES);
        ledger.open(opened);
        status.open(opened, clock.millis());
        if (afresh) {
            map.open(opened.site());
            plane.fieldProperty().set(PlaneField.MEASURED);
            reachUnknown = true;
            selection.clear();
            measure.onProperty().set(false);
            shown.set(null);
            loop.open(opened.frames().size());
        } else if (track(selection.track()).isEmpty() && meeting(selection.meeting()).isEmpty()) {
            selection.clear();
        }
        showSweep();
    }

    private void showSweep() {
        if (store == null || session.get() == null) {
            return;
        }
        SweepStore mine = store;
        int wanted = loop.index();
        Optional<HeldSweep> there = mine.peek(wanted);
        if (there.isPresent()) {
            take(there.get());
            return;
        }
        mine.load(wanted).whenComplete((held, failure) -> ui.execute(() -> {
            if (mine != store || loop.index() != wanted) {
                return;
            }
            if (failure == null) {
                take(held);
            } else {
                Throwable cause = failure instanceof CompletionException ? failure.getCause() : failure;
                shown.set(null);
                sweepTrouble.set("Sweep " + (wanted + 1) + " could not be read: " + (cause.getMessage() == null
                        ? cause.getClass().getSimpleName() : cause.getMessage()));
            }
        }));
    }

    private void take(HeldSweep held) {
        sweepTrouble.set("");
        if (reachUnknown) {
            reachUnknown = false;
            plane.open(fitRadiusKm(held.raw(), session.get().heightCeilingM()));
        }
        shown.set(held);
    }

    static double fitRadiusKm(Sweep sweep, double ceilingM) {
        double reach = sweep.beam().groundRangeM(sweep.slantRangeM(sweep.gateCount() - 1)) / 1000;
        return Math.max(1, Math.min(reach, FIT_BEYOND_CEILING * StatusModel.ceilingRangeKm(sweep.beam(), ceilingM)));
    }

    /** Selects a track; if it is not in the shown sweep, goes to its nearest one; brings it into view. */
    public void goToTrack(String id) {
        selection.selectTrack(id);
        track(id).ifPresent(track -> {
            int now = loop.index();
            TrackPiece nearest = track.pieces().stream()
                    .min(Comparator.comparingInt(p -> Math.abs(p.sweep() - now))).orElseThrow();
            if (nearest.sweep() != now) {
                loop.show(nearest.sweep());
            }
            plane.reveal(nearest.line().at(nearest.line().lengthKm() / 2));
        });
    }

    /** Selects a meeting and goes to its sweep and place. */
    public void goToMeeting(String id) {
        selection.selectMeeting(id);
        meeting(id).ifPresent(m -> {
            loop.show(Frames.nearest(session.get().frames(), m.timeMs()));
            plane.reveal(m.place());
        });
    }

    public Optional<Track> track(String id) {
        return session.get() == null ? Optional.empty()
                : session.get().tracks().stream().filter(t -> t.id().equals(id)).findFirst();
    }

    public Optional<Meeting> meeting(String id) {
        return session.get() == null ? Optional.empty()
                : session.get().meetings().stream().filter(m -> m.id().equals(id)).findFirst();
    }

    /** Puts a mark of the measure tool at a place, at the time its ray passed in the shown sweep. */
    public void markAt(Point place) {
        if (session.get() != null) {
            SweepFrame frame = session.get().frames().get(loop.index());
            measure.mark(new MeasureModel.Mark(place, frame.timeAtMs(place), loop.index()));
        }
    }

    /** Selects what lies within {@code reachKm} of a place, meetings before tracks; nothing there clears. */
    public void selectAt(Point place, double reachKm) {
        if (session.get() == null) {
            return;
        }
        Optional<Meeting> meeting = overlays.isShown(Overlay.MEETINGS)
                ? Hits.meeting(session.get(), place, reachKm) : Optional.empty();
        Optional<Track> track = overlays.isShown(Overlay.BOUNDARIES)
                ? Hits.track(session.get(), loop.index(), place, reachKm) : Optional.empty();
        if (meeting.isPresent()) {
            selection.selectMeeting(meeting.get().id());
        } else if (track.isPresent()) {
            selection.selectTrack(track.get().id());
        } else {
            selection.clear();
        }
    }

    /** Says the data's age as of now. */
    public void refreshAge() {
        status.refresh(clock.millis());
    }

    public ReadOnlyObjectProperty<LoopSession> sessionProperty() {
        return session.getReadOnlyProperty();
    }

    /** Null before anything is open. */
    public LoopSession session() {
        return session.get();
    }

    /** The sweep at the loop's index; null while it is being read. */
    public ReadOnlyObjectProperty<HeldSweep> shownProperty() {
        return shown.getReadOnlyProperty();
    }

    /** Why the sweep cannot be shown, in words; empty when it can. */
    public ReadOnlyStringProperty sweepTroubleProperty() {
        return sweepTrouble.getReadOnlyProperty();
    }

    /** What the shown sweep says of the place under the cursor. */
    public ObjectBinding<Optional<ReadOut>> readOut() {
        return readOut;
    }

    /** Sweeps of the open session; null before anything is open. */
    public SweepStore store() {
        return store;
    }

    public JobModel job() {
        return job;
    }

    public LoopModel loop() {
        return loop;
    }

    public PlaneModel plane() {
        return plane;
    }

    public OverlayModel overlays() {
        return overlays;
    }

    public SelectionModel selection() {
        return selection;
    }

    public LedgerModel ledger() {
        return ledger;
    }

    public MeasureModel measure() {
        return measure;
    }

    public StatusModel status() {
        return status;
    }

    public MapModel map() {
        return map;
    }

    public SettingsModel settings() {
        return settings;
    }
}
