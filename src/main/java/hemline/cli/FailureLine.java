package hemline.cli;

import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.util.concurrent.CancellationException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.ParseResult;

/** Says in one line why a command failed. With {@code HEMLINE_TRACE} set, a failure inside is shown in full. */
final class FailureLine implements IExecutionExceptionHandler {
    @Override
    public int handleExecutionException(Exception failure, CommandLine command, ParseResult parsed) {
        PrintWriter err = command.getErr();
        if (failure instanceof UserProblem problem) {
            problem.details().forEach(line -> err.println("hemline: " + line));
            err.println("hemline: " + problem.getMessage());
            return ExitCodes.of(problem.kind());
        }
        if (failure instanceof CancellationException) {
            err.println("hemline: stopped; earlier results are as they were");
            return ExitCodes.INTERRUPTED;
        }
        err.println("hemline: internal failure: " + failure
                + "; please report it with the output of the same command under HEMLINE_TRACE=1");
        if (System.getenv("HEMLINE_TRACE") != null) {
            failure.printStackTrace(err);
        }
        return ExitCodes.INTERNAL_FAILURE;
    }
}
