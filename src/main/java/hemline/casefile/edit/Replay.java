package hemline.casefile.edit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Everything that stands in a log, applied to what was found.
 *
 * @param state      the outcome
 * @param notApplied entries that do not fit, in order; they stay in the log and are tried again at each replay
 */
public record Replay(CaseState state, List<NotApplied> notApplied) {
    public Replay {
        notApplied = List.copyOf(notApplied);
    }

    public static Replay of(Found found, List<Entry> log) {
        return of(CaseState.of(found), UndoLedger.of(log));
    }

    /** @param start the state before any edit */
    public static Replay of(CaseState start, UndoLedger ledger) {
        Board board = Board.of(start);
        List<NotApplied> notApplied = new ArrayList<>(ledger.misfits());
        for (Entry entry : ledger.standing()) {
            try {
                Planner.plan(board, entry.sequence(), (Edit.Change) entry.edit()).commit(board);
            } catch (CannotApplyException e) {
                notApplied.add(new NotApplied(entry, e.getMessage()));
            }
        }
        notApplied.sort(Comparator.comparingInt(misfit -> misfit.entry().sequence()));
        return new Replay(board.freeze(), notApplied);
    }
}
