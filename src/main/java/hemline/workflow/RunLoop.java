package hemline.workflow;

import hemline.boundary.station.StationPassage;
import hemline.casefile.SettingsJson;
import hemline.export.FolderInUseException;
import hemline.export.Pictures;
import hemline.export.ResultFolder;
import hemline.export.ResultWriter;
import hemline.export.RunInput;
import hemline.export.RunRecord;
import hemline.numerics.Workers;
import hemline.pipeline.Analysis;
import hemline.pipeline.Pipeline;
import hemline.pipeline.Settings;
import hemline.reader.InputFate;
import hemline.reader.OpenedLoop;
import hemline.sweep.Loop;
import hemline.sweep.Progress;
import hemline.workflow.UserProblem.Kind;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.file.FileSystemException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** The main job: opens a loop, analyses it and writes the results. */
public final class RunLoop {

    /**
     * @throws UserProblem if the settings, the inputs or the folder do not allow it
     * @throws java.util.concurrent.CancellationException if cancelled; earlier results are then as they were
     */
    public RunOutcome run(RunRequest request, Progress progress) throws UserProblem {
        Settings settings = settings(request);
        Optional<StationWork> stations = stations(request);
        OpenedLoop opened = LoopReading.open(request.paths(), request.reading(), progress);
        try (ResultFolder folder = open(request);
                Workers workers = new Workers(request.threads())) {
            Analysis analysis = Pipeline.run(opened.loop(), settings, workers, progress);
            RunRecord record = record(opened, analysis, settings);
            Optional<List<StationPassage>> passages = stations.isPresent()
                    ? Optional.of(stations.get().passages(analysis)) : Optional.empty();
            List<String> files = write(folder, record, passages, opened.loop(), request.pictures(), progress);
            return outcome(request, opened, analysis, files);
        } catch (IOException e) {
            throw new UserProblem(Kind.CANNOT_WRITE, "results cannot be written to " + request.out() + ": "
                    + words(e) + "; free some space or choose another folder", e);
        }
    }

    /** Read before the work begins: a broken table must not cost a run. */
    private static Optional<StationWork> stations(RunRequest request) throws UserProblem {
        return request.stations().isPresent() ? Optional.of(new StationWork(request.stations().get()))
                : Optional.empty();
    }

    private static Settings settings(RunRequest request) throws UserProblem {
        Settings settings = request.settings().isPresent() ? SettingsFile.read(request.settings().get())
                : Settings.defaults();
        if (request.ceilingM().isEmpty()) {
            return settings;
        }
        try {
            return settings.withHeightCeilingM(request.ceilingM().getAsDouble());
        } catch (IllegalArgumentException e) {
            throw new UserProblem(Kind.USAGE, e.getMessage(), e);
        }
    }

    private static ResultFolder open(RunRequest request) throws UserProblem {
        try {
            return ResultFolder.open(request.out());
        } catch (FolderInUseException e) {
            throw new UserProblem(Kind.USAGE, e.getMessage(), e);
        } catch (IOException e) {
            throw new UserProblem(Kind.USAGE, request.out() + ": cannot be used for results (" + words(e)
                    + "); choose a folder that can be written to", e);
        }
    }

    private static List<String> write(ResultFolder folder, RunRecord record, Optional<List<StationPassage>> passages,
                                      Loop loop, RunRequest.Pictures which, Progress progress) throws IOException {
        ResultWriter writer = new ResultWriter(folder);
        writer.tables(record, passages);
        Pictures pictures = new Pictures(record.analysis(), record.heightCeilingM());
        if (which != RunRequest.Pictures.NONE) {
            progress.check();
            writer.picture("overview.png", pictures.overview(loop.sweep(loop.size() - 1)));
        }
        if (which == RunRequest.Pictures.ALL) {
            writer.traces(record);
            writer.animation("loop.gif", loop.size(), i -> {
                progress.check();
                BufferedImage picture = pictures.sweep(i, loop.sweep(i));
                writer.picture(String.format(Locale.ROOT, "pictures/sweep-%03d.png", i), picture);
                progress.step("drawing", i + 1, loop.size());
                return picture;
            });
        }
        progress.check();
        return writer.finish(record);
    }

    private static RunRecord record(OpenedLoop opened, Analysis analysis, Settings settings) {
        List<RunInput> inputs = opened.inputs().stream().map(RunLoop::input).toList();
        return new RunRecord(ProgramVersion.current(), analysis, settings.heightCeilingM(),
                SettingsJson.toJson(settings), inputs, opened.notes());
    }

    private static RunInput input(InputFate input) {
        RunInput.Fate fate = switch (input.fate()) {
            case READ -> RunInput.Fate.READ;
            case REFUSED -> RunInput.Fate.REFUSED;
            case DUPLICATE -> RunInput.Fate.DUPLICATE;
            case SKIPPED -> RunInput.Fate.SKIPPED;
        };
        return new RunInput(LoopReading.slashes(input.path()), input.sha256(), fate, input.sweepsTaken(),
                input.reason());
    }

    private static RunOutcome outcome(RunRequest request, OpenedLoop opened, Analysis analysis, List<String> files) {
        long first = analysis.frames().stream().mapToLong(f -> f.rays().firstMs()).min().orElseThrow();
        long last = analysis.frames().stream().mapToLong(f -> f.rays().lastMs()).max().orElseThrow();
        return new RunOutcome(analysis.site(), analysis.frames().size(), first, last, analysis.tracks(),
                analysis.meetings(), opened.notes(), LoopReading.refusals(opened), analysis.cautions(),
                request.out(), files);
    }

    private static String words(IOException e) {
        if (e instanceof FileSystemException file && file.getReason() != null) {
            return file.getReason();
        }
        return e instanceof FileSystemException ? e.getClass().getSimpleName().replace("Exception", "")
                .replaceAll("(?<=[a-z])(?=[A-Z])", " ").toLowerCase(Locale.ROOT) : e.getMessage();
    }
}
