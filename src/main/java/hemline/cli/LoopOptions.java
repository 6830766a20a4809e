package hemline.cli;

import hemline.workflow.ReadChoices;
import hemline.workflow.ReadChoices.Position;
import java.util.Optional;
import picocli.CommandLine.Option;

/** Options of every command that reads a loop. */
final class LoopOptions {
    @Option(names = "--elevation", paramLabel = "MIN..MAX", defaultValue = "0..1.5",
            converter = ElevationRange.Converter.class,
            description = "Elevations taken from each volume, degrees (default: ${DEFAULT-VALUE}).")
    private ElevationRange elevation;

    @Option(names = "--field", paramLabel = "NAME", description = "Reflectivity field, where the usual choice is not it.")
    private String field;

    @Option(names = "--site", paramLabel = "NAME", description = "Radar to take, where files of several are given.")
    private String site;

    @Option(names = "--position", paramLabel = "LAT,LON,ALT", converter = PositionConverter.class,
            description = "Where the radar stands, for files that do not say: degrees north, degrees east, m.")
    private Position position;

    ReadChoices choices() {
        return new ReadChoices(elevation.minDeg(), elevation.maxDeg(), Optional.ofNullable(field),
                Optional.ofNullable(site), Optional.ofNullable(position));
    }
}
