package hemline.cli;

import java.io.PrintWriter;
import java.io.StringWriter;

/** The command line run inside the test, with what it said. */
record Invocation(int exitCode, String out, String err) {

    static Invocation of(String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int code = Main.commandLine(new PrintWriter(out, true), new PrintWriter(err, true)).execute(args);
        return new Invocation(code, out.toString(), err.toString());
    }
}
