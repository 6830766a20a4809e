package hemline.workflow;

import hemline.boundary.station.StationPassage;
import hemline.boundary.station.StationSeries;
import hemline.geodesy.LocalPlane;
import hemline.outflow.StationPassages;
import hemline.outflow.StationSettings;
import hemline.pipeline.Analysis;
import java.nio.file.Path;
import java.util.List;

/** The passages of a run's boundaries over the stations of a file. */
final class StationWork {
    private final Path file;
    private final List<StationSeries> stations;

    /** @throws UserProblem if the table cannot be used */
    StationWork(Path file) throws UserProblem {
        this.file = file;
        stations = StationTable.read(file);
    }

    /** @throws UserProblem if it is not known where the radar stands */
    List<StationPassage> passages(Analysis analysis) throws UserProblem {
        LocalPlane plane = analysis.site().position().map(LocalPlane::new).orElseThrow(() -> new UserProblem(
                UserProblem.Kind.USAGE, file + ": stations need to know where the radar stands and its files do not say; "
                + "give --position"));
        return new StationPassages(plane, StationSettings.defaults()).find(analysis.tracks(), stations);
    }
}
