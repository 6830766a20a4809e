package hemline.launcher;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** The packaged program run through its launcher, as a user runs it, with what it said. */
record Launched(int exitCode, String out, String err) {
    private static final Path LAUNCHER = Path.of(System.getProperty("hemline.launcher"));
    static final Path BASE = Path.of(System.getProperty("hemline.basedir"));
    static final Path SAMPLE = BASE.resolve("sample-sweeps");

    static Launched of(Object... arguments) {
        try {
            Path out = Files.createTempFile("hemline-out", ".txt");
            Path err = Files.createTempFile("hemline-err", ".txt");
            try {
                Process process = start(out, err, arguments);
                if (!process.waitFor(5, TimeUnit.MINUTES)) {
                    process.destroyForcibly();
                    throw new AssertionError("did not end: " + List.of(arguments));
                }
                return new Launched(process.exitValue(), Files.readString(out), Files.readString(err));
            } finally {
                Files.delete(out);
                Files.delete(err);
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new AssertionError(e);
        }
    }

    static Process start(Path out, Path err, Object... arguments) throws IOException {
        List<String> command = new ArrayList<>(List.of(LAUNCHER.toString()));
        for (Object argument : arguments) {
            command.add(argument.toString());
        }
        ProcessBuilder builder = new ProcessBuilder(command).redirectOutput(out.toFile()).redirectError(err.toFile());
        builder.environment().remove("HEMLINE_JAVA_OPTS");
        builder.environment().put("LC_ALL", "C");
        return builder.start();
    }
}
