package hemline.cli;

import picocli.CommandLine;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;

/** Says in one line what is wrong with the arguments, and where the right ones are listed. */
final class UsageLine implements IParameterExceptionHandler {
    @Override
    public int handleParseException(ParameterException wrong, String[] args) {
        CommandLine command = wrong.getCommandLine();
        String message = wrong.getMessage().replaceAll("\\s*\\R\\s*", " ");
        command.getErr().println("hemline: " + message + "; see " + command.getCommandSpec().qualifiedName() + " --help");
        return ExitCodes.WRONG_USAGE;
    }
}
