package hemline.workflow;

import hemline.numerics.Workers;
import hemline.pipeline.Analysis;
import hemline.pipeline.Pipeline;
import hemline.pipeline.Settings;
import hemline.reader.OpenedLoop;
import hemline.sweep.Progress;
import hemline.sweep.ScreenedLoop;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** Opens loops from files and analyses them with one set of settings. */
public final class FileSessions implements SessionOpener {
    private final ReadChoices reading;
    private final Settings settings;
    private final int threads;

    private FileSessions(ReadChoices reading, Settings settings, int threads) {
        this.reading = reading;
        this.settings = settings;
        this.threads = threads;
    }

    /** With the usual settings. */
    public static FileSessions usual(ReadChoices reading, int threads) {
        return new FileSessions(reading, Settings.defaults(), threads);
    }

    /**
     * With settings from a file.
     *
     * @throws UserProblem if the file cannot be used
     */
    public static FileSessions with(ReadChoices reading, Path settings, int threads) throws UserProblem {
        return new FileSessions(reading, SettingsFile.read(settings), threads);
    }

    @Override
    public LoopSession open(List<Path> paths, Progress progress) throws IOException {
        try (Workers workers = new Workers(threads)) {
            OpenedLoop opened = LoopReading.open(paths, reading, progress);
            return FileSession.read(title(paths, opened), opened,
                    Pipeline.frames(opened.loop(), workers, progress), settings.heightCeilingM());
        } catch (UserProblem e) {
            String details = e.details().isEmpty() ? "" : " (" + e.details().get(0)
                    + (e.details().size() > 1 ? ", and " + (e.details().size() - 1) + " more)" : ")");
            throw new IOException(e.getMessage() + details, e);
        }
    }

    @Override
    public LoopSession analyse(LoopSession read, Progress progress) {
        if (!(read instanceof FileSession session)) {
            throw new IllegalArgumentException("only a session of this opener can be analysed, got " + read);
        }
        try (Workers workers = new Workers(threads)) {
            ScreenedLoop screened = Pipeline.screen(session.loop(), settings, workers, progress);
            Analysis analysis = Pipeline.analyse(session.loop(), screened, settings, workers, progress);
            return session.analysed(screened, analysis);
        }
    }

    private static String title(List<Path> paths, OpenedLoop opened) {
        Path first = paths.get(0).toAbsolutePath().normalize();
        String name = first.getFileName() == null ? first.toString() : first.getFileName().toString();
        return opened.site().name() + ", " + name + (paths.size() > 1 ? " and " + (paths.size() - 1) + " more" : "");
    }
}
