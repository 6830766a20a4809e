package hemline.cli;

import hemline.workflow.ProgramVersion;
import picocli.CommandLine.IVersionProvider;

/** Tells picocli the program's version. */
final class VersionProvider implements IVersionProvider {
    @Override
    public String[] getVersion() {
        return new String[] {"hemline " + ProgramVersion.current()};
    }
}
