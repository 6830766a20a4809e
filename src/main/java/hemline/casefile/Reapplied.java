package hemline.casefile;

import hemline.casefile.edit.NotApplied;
import java.util.List;

/**
 * What came of applying a log to a new result.
 *
 * @param applied     changes that fit
 * @param notApplied  entries that do not, and why; they stay in the log
 * @param differences between the case before and after
 */
public record Reapplied(int applied, List<NotApplied> notApplied, Differences differences) {
    public Reapplied {
        notApplied = List.copyOf(notApplied);
    }
}
