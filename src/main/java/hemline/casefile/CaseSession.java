package hemline.casefile;

import com.fasterxml.jackson.databind.node.ObjectNode;
import hemline.boundary.Track;
import hemline.casefile.Remeasure.Measured;
import hemline.casefile.edit.CannotApplyException;
import hemline.casefile.edit.CaseState;
import hemline.casefile.edit.Edit;
import hemline.casefile.edit.Entry;
import hemline.casefile.edit.Found;
import hemline.casefile.edit.NotApplied;
import hemline.casefile.edit.Replay;
import hemline.casefile.edit.UndoLedger;
import hemline.casefile.store.CaseStore;
import hemline.casefile.store.SourceFile;
import java.io.Closeable;
import java.io.IOException;
import java.time.Clock;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * A case at work: takes edits, saves each before it counts, and measures what they touch anew. A view once handed out
 * never changes. Safe for use by several threads; edits are taken one at a time.
 */
public final class CaseSession implements Closeable {
    private final CaseStore store;
    private final Remeasure remeasure;
    private final String author;
    private final Clock clock;
    private UndoLedger ledger;
    private CaseState start;
    private Measured measured;
    private CaseView view;

    /**
     * @param store  closed with this session
     * @param author signs the edits made from here on
     */
    public CaseSession(CaseStore store, Remeasure remeasure, String author, Clock clock) {
        this.store = store;
        this.remeasure = remeasure;
        this.author = author;
        this.clock = clock;
        begin(store.found());
    }

    private void begin(Found found) {
        start = CaseState.of(found);
        measured = new Measured(start.tracks(), found.meetings());
        view = new CaseView(start, measured.tracks(), CaseMeetings.of(start, measured.meetings()), List.of());
        ledger = UndoLedger.of(store.entries());
        replay();
    }

    public synchronized CaseView view() {
        return view;
    }

    /** Every entry ever made, undone ones too. */
    public synchronized List<Entry> log() {
        return store.entries();
    }

    public synchronized CaseStore store() {
        return store;
    }

    /** The change that {@link #undo} would take back. */
    public synchronized OptionalInt nextUndo() {
        return ledger.nextUndo();
    }

    /** The change that {@link #redo} would bring back. */
    public synchronized OptionalInt nextRedo() {
        return ledger.nextRedo();
    }

    /**
     * Makes a change and saves it.
     *
     * @param reason in the author's words; may be empty
     * @return what became different
     * @throws CannotApplyException if it does not fit; nothing is then logged
     * @throws IOException          if it could not be saved; the case is then as before
     */
    public synchronized Differences edit(Edit.Change change, String reason) throws CannotApplyException, IOException {
        int sequence = nextSequence();
        CaseState.Applied applied = view.state().apply(sequence, change);
        log(change, reason, applied.before(), applied.after());
        return show(applied.state(), view.notApplied());
    }

    /** Takes the last standing change back; does nothing where there is none. */
    public synchronized Differences undo() throws IOException {
        return ledger.nextUndo().isPresent() ? undo(ledger.nextUndo().getAsInt()) : Differences.none();
    }

    /**
     * Takes one change back, be it the last or not; later ones that lean on it are then listed as not applied.
     *
     * @throws IllegalArgumentException if no such change stands
     */
    public synchronized Differences undo(int sequence) throws IOException {
        if (!ledger.stands(sequence)) {
            throw new IllegalArgumentException("no change with number " + sequence + " stands");
        }
        Entry undone = store.entries().get(sequence - 1);
        log(new Edit.Undo(sequence), "", undone.after(), undone.before());
        return replay();
    }

    /** Brings the last undone change back; does nothing where there is none, or something new was done since. */
    public synchronized Differences redo() throws IOException {
        return ledger.nextRedo().isPresent() ? redo(ledger.nextRedo().getAsInt()) : Differences.none();
    }

    /**
     * Brings one undone change back.
     *
     * @throws IllegalArgumentException if no such change is undone
     */
    public synchronized Differences redo(int sequence) throws IOException {
        if (!ledger.isUndone(sequence)) {
            throw new IllegalArgumentException("no change with number " + sequence + " is undone");
        }
        Entry undone = store.entries().get(sequence - 1);
        log(new Edit.Redo(sequence), "", undone.before(), undone.after());
        return replay();
    }

    /**
     * Puts a new result in the place of the old and applies the log to it.
     *
     * @return which edits did not fit, and what became different
     */
    public synchronized Reapplied rerun(String program, ObjectNode settings, List<SourceFile> sources, Found found)
            throws IOException {
        CaseView old = view;
        store.publish(program, settings, sources, found);
        begin(found);
        return new Reapplied(ledger.standing().size() - changesIn(view.notApplied()), view.notApplied(),
                Differences.between(old, view));
    }

    private static int changesIn(List<NotApplied> misfits) {
        return (int) misfits.stream().filter(misfit -> misfit.entry().edit() instanceof Edit.Change).count();
    }

    private int nextSequence() {
        return store.entries().size() + 1;
    }

    private void log(Edit edit, String reason, String before, String after) throws IOException {
        Entry entry = new Entry(nextSequence(), clock.millis(), author, reason, edit, before, after);
        store.append(entry);
        ledger.add(entry);
    }

    private Differences replay() {
        Replay replay = Replay.of(start, ledger);
        return show(replay.state(), replay.notApplied());
    }

    private Differences show(CaseState state, List<NotApplied> notApplied) {
        Map<String, CaseState.FixedCentre> centres = new TreeMap<>();
        state.centres().forEach(centre -> centres.put(centre.trackId(), centre));
        Set<String> changed = changed(state);
        if (!changed.isEmpty() || measured.tracks().size() != state.tracks().size()) {
            measured = remeasure.measure(new Remeasure.Request(state.tracks(), state.sweeps().frames(), centres,
                    changed, measured));
        }
        CaseView old = view;
        view = new CaseView(state, measured.tracks(), CaseMeetings.of(state, measured.meetings()), notApplied);
        return Differences.between(old, view);
    }

    /** Tracks that were not there before, or whose lines or held centre differ. */
    private Set<String> changed(CaseState state) {
        Map<String, Track> before = new TreeMap<>();
        view.state().tracks().forEach(track -> before.put(track.id(), track));
        Set<String> changed = new TreeSet<>();
        for (Track track : state.tracks()) {
            if (!track.equals(before.get(track.id()))) {
                changed.add(track.id());
            }
        }
        Set<CaseState.FixedCentre> centres = new java.util.HashSet<>(view.state().centres());
        for (CaseState.FixedCentre centre : state.centres()) {
            if (!centres.remove(centre)) {
                changed.add(centre.trackId());
            }
        }
        centres.forEach(freed -> changed.add(freed.trackId()));
        changed.removeIf(id -> state.track(id).isEmpty());
        return changed;
    }

    @Override
    public synchronized void close() throws IOException {
        store.close();
    }
}
