package hemline.workflow;

import hemline.reader.InputFate;
import hemline.reader.LoopOpener;
import hemline.reader.OpenedLoop;
import hemline.reader.ReadOptions;
import hemline.sweep.Progress;
import hemline.workflow.RunOutcome.Refusal;
import java.nio.file.Path;
import java.util.List;

/** Opens the loop that a user's paths and choices name. */
final class LoopReading {
    private LoopReading() {
    }

    /** @throws UserProblem if nothing could be read */
    static OpenedLoop open(List<Path> paths, ReadChoices choices, Progress progress) throws UserProblem {
        OpenedLoop opened = LoopOpener.open(paths, options(choices), progress);
        if (opened.loop().size() == 0) {
            List<String> lines = refusals(opened).stream().map(r -> r.path() + ": " + r.reason()).toList();
            throw new UserProblem(UserProblem.Kind.NOTHING_READABLE,
                    "nothing could be read from " + (opened.inputs().isEmpty() ? "an empty folder"
                            : opened.inputs().size() == 1 ? "one file" : opened.inputs().size() + " files")
                            + "; give files of low sweeps in CfRadial, ODIM_H5 or WSR-88D Level II", lines, null);
        }
        return opened;
    }

    static ReadOptions options(ReadChoices choices) {
        return new ReadOptions(choices.minElevationDeg(), choices.maxElevationDeg(), choices.field(), choices.site(),
                choices.position().map(p -> new ReadOptions.Position(p.place(), p.altitudeM())));
    }

    static List<Refusal> refusals(OpenedLoop opened) {
        return opened.inputs().stream().filter(input -> input.fate() == InputFate.Fate.REFUSED)
                .map(input -> new Refusal(slashes(input.path()), input.reason())).toList();
    }

    /** A path as it is written in results, the same on every system. */
    static String slashes(Path path) {
        return path.toString().replace(path.getFileSystem().getSeparator(), "/");
    }
}
