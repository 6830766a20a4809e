package hemline.cli;

import hemline.workflow.UserProblem;

/** Exit codes, the same for every command. */
final class ExitCodes {
    static final int DONE = 0;
    static final int INTERNAL_FAILURE = 1;
    static final int WRONG_USAGE = 2;
    static final int SOME_UNREADABLE = 3;
    static final int NOTHING_READABLE = 4;
    /** Stopped by a signal, as shells count it: 128 + 2. */
    static final int INTERRUPTED = 130;

    private ExitCodes() {
    }

    static int of(UserProblem.Kind kind) {
        return switch (kind) {
            case USAGE -> WRONG_USAGE;
            case NOTHING_READABLE -> NOTHING_READABLE;
            case CANNOT_WRITE -> INTERNAL_FAILURE;
        };
    }
}
