package hemline.reader;

import hemline.sweep.Progress;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;

/** Short ways to open what a test has just written. */
final class ReaderTestKit {
    private ReaderTestKit() {
    }

    static Sweep read(Path file, int sweep) throws UnreadableFileException {
        return read(file, sweep, FieldChoice.automatic());
    }

    static Sweep read(Path file, int sweep, FieldChoice choice) throws UnreadableFileException {
        try (RadarFile opened = RadarFiles.open(file)) {
            return opened.read(sweep, choice);
        }
    }

    static RadarFileFacts facts(Path file) throws UnreadableFileException {
        try (RadarFile opened = RadarFiles.open(file)) {
            return opened.facts();
        }
    }

    static OpenedLoop loop(Path... paths) {
        return loop(ReadOptions.defaults(), paths);
    }

    static OpenedLoop loop(ReadOptions options, Path... paths) {
        return LoopOpener.open(List.of(paths), options, Progress.NONE);
    }

    static long ms(String utc) {
        return Instant.parse(utc).toEpochMilli();
    }

    /** The one line with which a file is refused. */
    static String refusal(Path file) {
        OpenedLoop opened = loop(file);
        if (opened.loop().size() != 0 || opened.inputs().get(0).fate() != InputFate.Fate.REFUSED) {
            throw new AssertionError(file + " was not refused: " + opened.inputs());
        }
        return opened.inputs().get(0).reason();
    }
}
