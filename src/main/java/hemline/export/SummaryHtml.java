package hemline.export;

import hemline.boundary.ArcHistory;
import hemline.boundary.Meeting;
import hemline.boundary.Speed;
import hemline.boundary.Track;
import hemline.pipeline.Analysis;
import hemline.sweep.SweepFrame;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** {@code summary.html}: the case on one page, for the screen and for print; no script, nothing from outside. */
final class SummaryHtml {
    private static final String STYLE = """
            body{font:15px/1.45 sans-serif;color:#1b1f24;background:#fff;max-width:960px;margin:2em auto;padding:0 1em}
            h1{font-size:1.5em;margin-bottom:.2em}h2{font-size:1.15em;margin:1.6em 0 .4em}
            .caution{border-left:4px solid #b4540a;padding:.3em .8em;background:#faf4ee}
            table{border-collapse:collapse;width:100%;font-size:.9em}th,td{text-align:right;padding:.25em .5em;
            border-bottom:1px solid #d5d8dd}th:first-child,td:first-child,td.words,th.words{text-align:left}
            td.words{overflow-wrap:anywhere}.traces{display:flex;flex-wrap:wrap;gap:12px}svg{max-width:100%;height:auto}
            pre{font-size:.8em;white-space:pre-wrap}code{font-size:.8em;overflow-wrap:anywhere}
            @media print{body{margin:0;max-width:none}h2,svg,tr{break-inside:avoid}h2{break-after:avoid}}
            """;

    private final StringBuilder html = new StringBuilder();
    private final RunRecord run;
    private final Analysis analysis;

    private SummaryHtml(RunRecord run) {
        this.run = run;
        this.analysis = run.analysis();
    }

    static void write(OutputStream out, RunRecord run) throws IOException {
        SummaryHtml page = new SummaryHtml(run);
        page.build(run.heightCeilingM());
        out.write(page.html.toString().getBytes(StandardCharsets.UTF_8));
    }

    private void build(double ceilingM) {
        String radar = Markup.escape(analysis.site().name());
        List<SweepFrame> frames = analysis.frames();
        FrameSpan span = FrameSpan.of(frames);
        html.append("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\"/>\n<meta name=\"viewport\" "
                + "content=\"width=device-width, initial-scale=1\"/>\n<meta http-equiv=\"Content-Security-Policy\" "
                + "content=\"default-src 'none'; style-src 'unsafe-inline'\"/>\n<title>Outflow boundaries, ")
                .append(radar).append("</title>\n<style>\n").append(STYLE).append("</style>\n</head>\n<body>\n");
        html.append("<h1>Outflow boundaries, ").append(radar).append("</h1>\n<p>").append(frames.size())
                .append(frames.size() == 1 ? " sweep, " : " sweeps, ").append(Times.toMinute(span.firstMs())).append(" to ")
                .append(Times.toMinute(span.lastMs())).append("</p>\n");
        html.append("<p class=\"caution\">").append(Markup.escape(Cautions.GUIDANCE))
                .append(" Nothing is claimed where the beam is more than ").append(Numbers.fixed(ceilingM, 0))
                .append(" m above the radar.");
        analysis.cautions().forEach(caution -> html.append("<br/>").append(Markup.escape(caution)));
        html.append("</p>\n<h2>Map</h2>\n").append(IsochroneMap.draw(analysis, ceilingM));
        tracks();
        meetings();
        traces(span);
        sources();
        html.append("<h2>Settings</h2>\n<pre>").append(Markup.escape(run.settings().toPrettyString()))
                .append("</pre>\n<p>hemline ").append(Markup.escape(run.version())).append("</p>\n</body>\n</html>\n");
    }

    private void tracks() {
        html.append("<h2>Boundaries</h2>\n");
        if (analysis.tracks().isEmpty()) {
            html.append("<p>None found.</p>\n");
            return;
        }
        head("track", "first", "last", "sweeps", "length km", "speed m s⁻¹", "toward", "radius km", "expansion m s⁻¹");
        for (Track track : analysis.tracks()) {
            row(track.id(), Times.clock(track.firstMs()), Times.clock(track.lastMs()),
                    Integer.toString(track.sweepCount()), Numbers.fixed(track.maxLengthKm(), 1), speed(track.speed()),
                    degrees(track.bearingDeg()), track.arc().map(SummaryHtml::radii).orElse("–"),
                    track.arc().map(arc -> speed(arc.expansion())).orElse("–"));
        }
        html.append("</tbody></table>\n");
    }

    private void meetings() {
        html.append("<h2>Meetings</h2>\n");
        if (analysis.meetings().isEmpty()) {
            html.append("<p>None found.</p>\n");
            return;
        }
        head("meeting", "boundaries", "time", "x km", "y km", "angle", "closing m s⁻¹", "status", "probability");
        for (Meeting m : analysis.meetings()) {
            row(m.id(), m.trackA() + ", " + m.trackB(), Times.clock(m.timeMs()), Numbers.fixed(m.place().xKm(), 1),
                    Numbers.fixed(m.place().yKm(), 1), degrees(m.crossingAngleDeg()), speed(m.closing()),
                    m.status().label(), Numbers.fixed(m.probability(), 2));
        }
        html.append("</tbody></table>\n");
    }

    private void traces(FrameSpan span) {
        if (analysis.tracks().isEmpty()) {
            return;
        }
        html.append("<h2>Traces</h2>\n<p>Bands: two standard deviations.</p>\n<div class=\"traces\">\n");
        TraceChart chart = new TraceChart(span.firstMs(), span.lastMs());
        for (int i = 0; i < analysis.tracks().size(); i++) {
            Track track = analysis.tracks().get(i);
            for (Series series : List.of(Series.speed(track), Series.radius(track))) {
                if (!series.values().isEmpty()) {
                    html.append(chart.draw(track.id(), series, PaperInk.track(i)));
                }
            }
        }
        html.append("</div>\n");
    }

    private void sources() {
        html.append("<h2>Sources</h2>\n<table><thead><tr><th>file</th>"
                + "<th class=\"words\">fate</th><th class=\"words\">SHA-256</th></tr></thead><tbody>\n");
        for (RunInput input : run.inputs()) {
            String fate = input.fate().label() + (input.reason().isEmpty() ? "" : ": " + input.reason());
            html.append("<tr><td>").append(Markup.escape(input.path())).append("</td><td class=\"words\">")
                    .append(Markup.escape(fate)).append("</td><td class=\"words\"><code>")
                    .append(Markup.escape(input.sha256())).append("</code></td></tr>\n");
        }
        html.append("</tbody></table>\n");
        run.notes().forEach(note -> html.append("<p>").append(Markup.escape(note)).append("</p>\n"));
    }

    private void head(String... names) {
        html.append("<table><thead><tr>");
        for (String name : names) {
            html.append("<th>").append(Markup.escape(name)).append("</th>");
        }
        html.append("</tr></thead><tbody>\n");
    }

    private void row(String... cells) {
        html.append("<tr>");
        for (String cell : cells) {
            html.append("<td>").append(Markup.escape(cell)).append("</td>");
        }
        html.append("</tr>\n");
    }

    private static String radii(ArcHistory arc) {
        return Numbers.fixed(arc.radii().get(0).radiusKm(), 1) + " to "
                + Numbers.fixed(arc.radii().get(arc.radii().size() - 1).radiusKm(), 1);
    }

    private static String speed(Speed speed) {
        return speed.isKnown() ? Numbers.fixed(speed.speedMs(), 1) + " ± " + Numbers.fixed(speed.sdMs(), 1) : "–";
    }

    private static String degrees(double value) {
        return Double.isNaN(value) ? "–" : Numbers.fixed(value, 0) + "°";
    }
}
