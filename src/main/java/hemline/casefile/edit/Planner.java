package hemline.casefile.edit;

/** Decides what a change does to a board, without touching it. */
final class Planner {
    private Planner() {
    }

    static Step plan(Board board, int sequence, Edit.Change change) throws CannotApplyException {
        LinePlans lines = new LinePlans(board, sequence);
        LinkPlans links = new LinkPlans(board, sequence);
        RecordPlans records = new RecordPlans(board, sequence);
        return switch (EditKind.of(change)) {
            case DRAW -> lines.draw((Edit.Draw) change);
            case NUDGE -> lines.nudge((Edit.Nudge) change);
            case TRIM -> lines.trim((Edit.Trim) change);
            case CUT -> lines.cut((Edit.Cut) change);
            case JOIN -> lines.join((Edit.Join) change);
            case CHANGE_KIND -> lines.changeKind((Edit.ChangeKind) change);
            case RELINK -> links.relink((Edit.Relink) change);
            case SPLIT_TRACK -> links.split((Edit.SplitTrack) change);
            case MERGE_TRACKS -> links.merge((Edit.MergeTracks) change);
            case SET_ASIDE -> links.setAside((Edit.SetAside) change);
            case RESTORE -> links.restore((Edit.Restore) change);
            case FIX_CENTRE -> records.fixCentre((Edit.FixCentre) change);
            case RULE_MEETING -> records.rule((Edit.RuleMeeting) change);
            case ADD_MEETING -> records.addMeeting((Edit.AddMeeting) change);
            case NOTE -> records.note((Edit.Note) change);
            case REVIEW -> records.review((Edit.Review) change);
            case UNDO, REDO, MENDED -> throw new IllegalStateException(change + " is no change");
        };
    }
}
