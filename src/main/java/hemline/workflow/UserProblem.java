package hemline.workflow;

import java.util.List;

/** Something a user can mend; the message is one line that says what is wrong, where, and what to do. */
public final class UserProblem extends Exception {
    private static final long serialVersionUID = 1L;

    private final Kind kind;
    private final transient List<String> details;

    public UserProblem(Kind kind, String message) {
        this(kind, message, List.of(), null);
    }

    public UserProblem(Kind kind, String message, Throwable cause) {
        this(kind, message, List.of(), cause);
    }

    /** @param details what led to it, a line each */
    public UserProblem(Kind kind, String message, List<String> details, Throwable cause) {
        super(message, cause);
        this.kind = kind;
        this.details = List.copyOf(details);
    }

    public Kind kind() {
        return kind;
    }

    public List<String> details() {
        return details;
    }

    /** What sort of problem it is. */
    public enum Kind {
        /** The arguments or the files they name ask for something that cannot be done. */
        USAGE,
        /** None of the inputs could be read. */
        NOTHING_READABLE,
        /** Results could not be written. */
        CANNOT_WRITE
    }
}
