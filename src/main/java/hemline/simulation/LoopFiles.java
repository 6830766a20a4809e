package hemline.simulation;

import hemline.boundary.truth.Truth;
import hemline.numerics.Workers;
import hemline.simulation.files.FileFormat;
import hemline.simulation.files.TruthWriter;
import hemline.simulation.radar.RadarSpec;
import hemline.sweep.Progress;
import hemline.sweep.Sweep;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/** Writes loops into folders. */
final class LoopFiles {
    private static final DateTimeFormatter STAMP =
            DateTimeFormatter.ofPattern("yyyyMMdd'T'HHmmss'Z'", Locale.ROOT).withZone(ZoneOffset.UTC);

    private LoopFiles() {
    }

    static WrittenLoop write(Path dir, SimulatedLoop loop, List<FileFormat> formats, Workers workers, Progress progress)
            throws IOException {
        Files.createDirectories(dir);
        loop.prepare(workers, progress);
        List<Path> files = new ArrayList<>();
        RadarSpec radar = loop.radar();
        for (int i = 0; i < loop.size(); i++) {
            progress.check();
            Sweep sweep = loop.sweep(i);
            FileFormat format = formats.get(i % formats.size());
            Path file = dir.resolve(radar.site().name() + "-" + STAMP.format(Instant.ofEpochMilli(sweep.startMs()))
                    + format.ending());
            format.writer().write(file, sweep, radar.receiver().packing(), radar.receiver().velocityPacking());
            files.add(file);
            progress.step("writing", i + 1, loop.size());
        }
        Truth truth = loop.truth();
        Path truthFile = dir.resolve("truth.json");
        TruthWriter.write(truthFile, truth);
        return new WrittenLoop(files, truthFile, truth);
    }
}
