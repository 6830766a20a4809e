package hemline.export;

import hemline.boundary.Track;
import hemline.boundary.station.StationPassage;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.OutputStreamWriter;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.imageio.stream.MemoryCacheImageOutputStream;

/**
 * Writes the results of a run into a folder: {@link #tables}, any {@link #picture}, and last {@link #finish} with
 * {@code run.json}, at which all of them appear.
 */
public final class ResultWriter {
    /** Name of the record of the run; it appears last, so where it stands with right check sums, all is there. */
    public static final String RUN = "run.json";

    private final ResultFolder folder;

    public ResultWriter(ResultFolder folder) {
        this.folder = folder;
    }

    /**
     * The tables with what explains them, the GeoJSON and the page for people.
     *
     * @param passages over stations; empty when no stations were given
     */
    public void tables(RunRecord run, Optional<List<StationPassage>> passages) throws IOException {
        Geolocation where = new Geolocation(run.analysis().site());
        table(BoundariesTable.TABLE, BoundariesTable.rows(run.analysis().tracks(), where));
        table(TracksTable.TABLE, run.analysis().tracks());
        table(MeetingsTable.TABLE, MeetingsTable.rows(run.analysis().meetings(), where));
        List<Table<?>> written = new ArrayList<>(DataPackage.TABLES);
        if (passages.isPresent()) {
            table(PassagesTable.TABLE, passages.get());
            written.add(DataPackage.PASSAGES);
        }
        folder.stage("datapackage.json", out -> Json.write(DataPackage.describe(written), out));
        folder.stage("boundaries.geojson", out -> BoundariesGeoJson.write(out, run.analysis(), where));
        folder.stage("arcs.geojson", out -> ArcsGeoJson.write(out, run.analysis(), where));
        folder.stage("meetings.geojson", out -> MeetingsGeoJson.write(out, run.analysis(), where));
        folder.stageFile("boundaries.nc", file -> BoundariesNetcdf.write(file, run, where));
        folder.stage("summary.html", out -> SummaryHtml.write(out, run));
    }

    /** One picture as PNG. */
    public void picture(String name, BufferedImage picture) throws IOException {
        folder.stage(name, out -> {
            try (MemoryCacheImageOutputStream image = new MemoryCacheImageOutputStream(out)) {
                if (!ImageIO.write(picture, "png", image)) {
                    throw new IllegalStateException("this Java platform cannot write PNG");
                }
            }
        });
    }

    /** The pictures of all sweeps, asked for one at a time, as an animation. */
    public void animation(String name, int count, PictureOfSweep pictures) throws IOException {
        folder.stage(name, out -> {
            try (Animation animation = new Animation(out)) {
                for (int i = 0; i < count; i++) {
                    animation.add(pictures.of(i), i == count - 1);
                }
            }
        });
    }

    /** Speed, radius and length of each track against time, as SVG. */
    public void traces(RunRecord run) throws IOException {
        FrameSpan span = FrameSpan.of(run.analysis().frames());
        TraceChart chart = new TraceChart(span.firstMs(), span.lastMs());
        List<Track> tracks = run.analysis().tracks();
        for (int i = 0; i < tracks.size(); i++) {
            Track track = tracks.get(i);
            String colour = PaperInk.track(i);
            for (Series series : List.of(Series.speed(track), Series.radius(track), Series.length(track))) {
                if (!series.values().isEmpty()) {
                    String drawing = chart.draw(track.id(), series, colour);
                    folder.stage("traces/" + track.id() + "-" + series.key() + ".svg",
                            out -> out.write(drawing.getBytes(StandardCharsets.UTF_8)));
                }
            }
        }
    }

    /** Gives the picture of a sweep by its index. */
    @FunctionalInterface
    public interface PictureOfSweep {
        BufferedImage of(int sweep) throws IOException;
    }

    /**
     * The record of the run; then everything appears in the folder.
     *
     * @return names of all results, {@code run.json} last
     */
    public List<String> finish(RunRecord run) throws IOException {
        List<ResultSum> sums = new ArrayList<>();
        for (String name : folder.staged()) {
            sums.add(ResultSum.of(name, folder.stagedFile(name)));
        }
        folder.stage(RUN, out -> Json.write(RunJson.of(run, sums), out));
        List<String> names = folder.staged();
        folder.publish();
        return names;
    }

    private <R> void table(Table<R> table, List<R> rows) throws IOException {
        folder.stage(table.name() + ".csv", out -> {
            Writer writer = new OutputStreamWriter(out, StandardCharsets.UTF_8);
            table.write(writer, rows);
            writer.flush();
        });
    }
}
