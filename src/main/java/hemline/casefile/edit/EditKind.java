package hemline.casefile.edit;

import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/** The kinds of edit and their words in the log. */
public enum EditKind {
    DRAW("draw", Edit.Draw.class),
    NUDGE("nudge", Edit.Nudge.class),
    TRIM("trim", Edit.Trim.class),
    CUT("cut", Edit.Cut.class),
    JOIN("join", Edit.Join.class),
    RELINK("relink", Edit.Relink.class),
    SPLIT_TRACK("split-track", Edit.SplitTrack.class),
    MERGE_TRACKS("merge-tracks", Edit.MergeTracks.class),
    CHANGE_KIND("change-kind", Edit.ChangeKind.class),
    SET_ASIDE("set-aside", Edit.SetAside.class),
    RESTORE("restore", Edit.Restore.class),
    FIX_CENTRE("fix-centre", Edit.FixCentre.class),
    RULE_MEETING("rule-meeting", Edit.RuleMeeting.class),
    ADD_MEETING("add-meeting", Edit.AddMeeting.class),
    NOTE("note", Edit.Note.class),
    REVIEW("review", Edit.Review.class),
    UNDO("undo", Edit.Undo.class),
    REDO("redo", Edit.Redo.class),
    MENDED("mended", Edit.Mended.class);

    private static final Map<Class<?>, EditKind> BY_TYPE =
            Arrays.stream(values()).collect(Collectors.toUnmodifiableMap(EditKind::type, Function.identity()));
    private static final Map<String, EditKind> BY_LABEL =
            Arrays.stream(values()).collect(Collectors.toUnmodifiableMap(EditKind::label, Function.identity()));

    private final String label;
    private final Class<? extends Edit> type;

    EditKind(String label, Class<? extends Edit> type) {
        this.label = label;
        this.type = type;
    }

    public String label() {
        return label;
    }

    public Class<? extends Edit> type() {
        return type;
    }

    public static EditKind of(Edit edit) {
        return BY_TYPE.get(edit.getClass());
    }

    public static Optional<EditKind> labelled(String label) {
        return Optional.ofNullable(BY_LABEL.get(label));
    }
}
