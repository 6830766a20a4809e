package hemline.cli;

import hemline.geodesy.GeoPoint;
import hemline.workflow.Inspect;
import hemline.workflow.InspectedFile;
import hemline.workflow.InspectedFile.InspectedField;
import hemline.workflow.InspectedFile.InspectedSweep;
import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** {@code hemline inspect}: what files hold. */
@Command(name = "inspect", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        description = "Says what radar files hold: format, radar, sweeps, fields with their units and range.",
        footer = {"", "An asterisk marks the reflectivity field that a run would take."})
final class InspectCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(arity = "1..*", paramLabel = "FILE", description = "Radar files.")
    private List<Path> files;

    @Override
    public Integer call() {
        PrintWriter out = spec.commandLine().getOut();
        int read = 0;
        for (Path file : files) {
            try {
                InspectedFile found = new Inspect().file(file);
                if (read > 0) {
                    out.println();
                }
                print(out, found);
                read++;
            } catch (UserProblem e) {
                out.flush();
                spec.commandLine().getErr().println("hemline: " + e.getMessage());
            }
        }
        out.flush();
        return read == files.size() ? ExitCodes.DONE : read > 0 ? ExitCodes.SOME_UNREADABLE : ExitCodes.NOTHING_READABLE;
    }

    private static void print(PrintWriter out, InspectedFile file) {
        out.println(file.path());
        out.println("  format  " + file.format());
        String place = file.site().position().map(InspectCommand::place).orElse("position not given");
        String height = Double.isNaN(file.site().altitudeM()) ? "height not given"
                : String.format(Locale.ROOT, "%.0f m above sea level", file.site().altitudeM());
        out.println("  radar   " + file.site().name() + ", " + place + ", " + height);
        file.notes().forEach(note -> out.println("  note    " + note));
        file.sweeps().forEach(sweep -> print(out, sweep));
    }

    private static void print(PrintWriter out, InspectedSweep sweep) {
        out.println(String.format(Locale.ROOT, "  sweep %d: %s, %.2f°, %d rays, %d gates of %s m from %s m, %s to %s",
                sweep.index(), sweep.mode(), sweep.elevationDeg(), sweep.rays(), sweep.gates(),
                metres(sweep.gateSpacingM()), metres(sweep.firstGateCentreM()), Instant.ofEpochMilli(sweep.startMs()),
                Instant.ofEpochMilli(sweep.endMs())));
        sweep.notes().forEach(note -> out.println("    note: " + note));
        if (sweep.fields().isEmpty()) {
            return;
        }
        TextTable table = new TextTable("    field", "units", "min", "max", "detected", "below", "not measured");
        for (InspectedField field : sweep.fields()) {
            table.row("    " + field.name() + (field.chosen() ? " *" : ""),
                    field.units().isEmpty() ? "-" : field.units(), value(field.min()), value(field.max()),
                    Integer.toString(field.valid()), Integer.toString(field.below()),
                    Integer.toString(field.notMeasured()));
        }
        table.print(out);
    }

    private static String place(GeoPoint point) {
        return String.format(Locale.ROOT, "%.4f° N %.4f° E", point.latitudeDeg(), point.longitudeDeg());
    }

    private static String metres(double value) {
        return value == Math.rint(value) ? String.format(Locale.ROOT, "%.0f", value)
                : String.format(Locale.ROOT, "%.1f", value);
    }

    private static String value(double number) {
        return Double.isNaN(number) ? "-" : String.format(Locale.ROOT, "%.2f", number);
    }
}
