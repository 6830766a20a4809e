package hemline.workflow;

/** Something a user can mend; the message is one line that says what is wrong, where, and what to do. */
public final class UserProblem extends Exception {
    private static final long serialVersionUID = 1L;

    private final Kind kind;

    public UserProblem(Kind kind, String message) {
        super(message);
        this.kind = kind;
    }

    public UserProblem(Kind kind, String message, Throwable cause) {
        super(message, cause);
        this.kind = kind;
    }

    public Kind kind() {
        return kind;
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
