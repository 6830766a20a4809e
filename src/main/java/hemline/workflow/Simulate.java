package hemline.workflow;

import hemline.numerics.Workers;
import hemline.simulation.Radars;
import hemline.simulation.Scenes;
import hemline.simulation.Simulation;
import hemline.simulation.SimulationRequest;
import hemline.simulation.WrittenLoop;
import hemline.simulation.files.FileFormat;
import hemline.sweep.Progress;
import java.io.IOException;
import java.util.Arrays;
import java.util.List;

/** Invents a loop with known truth and writes it in the open formats. */
public final class Simulate {

    /** Kinds of scene there are. */
    public static List<String> scenes() {
        return Scenes.names();
    }

    /** Invented radars there are. */
    public static List<String> radars() {
        return Radars.names();
    }

    /** Formats there are. */
    public static List<String> formats() {
        return Arrays.stream(FileFormat.values()).map(FileFormat::label).toList();
    }

    /**
     * @throws UserProblem if there is no such scene, radar or format, or the folder cannot be written to
     * @throws java.util.concurrent.CancellationException if cancelled
     */
    public SimulateOutcome write(SimulateRequest request, Progress progress) throws UserProblem {
        try (Workers workers = new Workers(request.threads())) {
            List<FileFormat> formats = request.formats().isEmpty() ? List.of(FileFormat.values())
                    : request.formats().stream().map(FileFormat::labelled).toList();
            WrittenLoop made = Simulation.write(request.folder(),
                    new SimulationRequest(request.scene(), request.radar(), request.seed(), formats), workers, progress);
            return new SimulateOutcome(made.sweeps(), made.truth(), made.what().boundaries().size(),
                    made.what().meetings().size());
        } catch (IllegalArgumentException e) {
            throw new UserProblem(UserProblem.Kind.USAGE, e.getMessage(), e);
        } catch (IOException e) {
            throw new UserProblem(UserProblem.Kind.CANNOT_WRITE, request.folder() + ": cannot be written to ("
                    + e.getMessage() + "); choose another folder", e);
        }
    }
}
