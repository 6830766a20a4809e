package hemline.casefile.edit;

/** An entry that stays in the log but has no effect on this result, and why. */
public record NotApplied(Entry entry, String why) {
}
