package hemline.casefile.edit;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.OptionalInt;
import java.util.TreeMap;

/**
 * Which changes of a log stand. An undo is an entry that names the change it takes back; nothing is ever removed, so
 * undo and redo reach back to the first edit, across save and reopen.
 */
public final class UndoLedger {
    private final TreeMap<Integer, Entry> standing = new TreeMap<>();
    private final TreeMap<Integer, Entry> undone = new TreeMap<>();
    private final Deque<Integer> redo = new ArrayDeque<>();
    private final List<NotApplied> misfits = new ArrayList<>();

    public static UndoLedger of(List<Entry> log) {
        UndoLedger ledger = new UndoLedger();
        log.forEach(ledger::add);
        return ledger;
    }

    /** Takes in the next entry; one that names no fitting change is kept among the misfits. */
    public void add(Entry entry) {
        if (entry.edit() instanceof Edit.Change) {
            standing.put(entry.sequence(), entry);
            redo.clear();
        } else if (entry.edit() instanceof Edit.Undo undo) {
            if (move(entry, undo.sequence(), standing, undone, "stands")) {
                redo.push(undo.sequence());
            }
        } else if (entry.edit() instanceof Edit.Redo again) {
            move(entry, again.sequence(), undone, standing, "is undone");
            redo.remove(again.sequence());
        }
    }

    private boolean move(Entry by, int number, TreeMap<Integer, Entry> from, TreeMap<Integer, Entry> to, String how) {
        Entry moved = from.remove(number);
        if (moved == null) {
            misfits.add(new NotApplied(by, "no change with number " + number + " " + how));
            return false;
        }
        to.put(number, moved);
        return true;
    }

    /** The changes that stand, in order. */
    public List<Entry> standing() {
        return List.copyOf(standing.values());
    }

    public boolean stands(int sequence) {
        return standing.containsKey(sequence);
    }

    public boolean isUndone(int sequence) {
        return undone.containsKey(sequence);
    }

    /** The change that one step back takes back. */
    public OptionalInt nextUndo() {
        return standing.isEmpty() ? OptionalInt.empty() : OptionalInt.of(standing.lastKey());
    }

    /** The change that one step forward brings back; none once something new was done. */
    public OptionalInt nextRedo() {
        return redo.isEmpty() ? OptionalInt.empty() : OptionalInt.of(redo.peek());
    }

    List<NotApplied> misfits() {
        return List.copyOf(misfits);
    }
}
