package hemline.casefile.edit;

import java.util.Objects;

/**
 * One line of the edit log.
 *
 * @param sequence its number, rising from 1 without gaps
 * @param timeMs   when it was made, ms since 1970-01-01T00:00Z
 * @param author   who made it
 * @param reason   why, in the author's words; may be empty
 * @param edit     what was done
 * @param before   the things it touched as they were, in words
 * @param after    and as they became
 */
public record Entry(int sequence, long timeMs, String author, String reason, Edit edit, String before,
                    String after) {
    public Entry {
        Checks.sequence(sequence);
        Checks.time(timeMs);
        Checks.shortText("an author's name", author);
        Checks.words("a reason", reason);
        Objects.requireNonNull(edit);
        Checks.words("a summary", before);
        Checks.words("a summary", after);
    }
}
