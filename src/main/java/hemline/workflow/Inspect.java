package hemline.workflow;

import hemline.reader.FieldChoice;
import hemline.reader.FieldFacts;
import hemline.reader.FieldSummary;
import hemline.reader.RadarFile;
import hemline.reader.RadarFileFacts;
import hemline.reader.RadarFiles;
import hemline.reader.SweepFacts;
import hemline.reader.UnreadableFileException;
import hemline.workflow.InspectedFile.InspectedField;
import hemline.workflow.InspectedFile.InspectedSweep;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Says what radar files hold. */
public final class Inspect {

    /** @throws UserProblem if the file cannot be read */
    public InspectedFile file(Path path) throws UserProblem {
        try (RadarFile file = RadarFiles.open(path)) {
            RadarFileFacts facts = file.facts();
            List<InspectedSweep> sweeps = new ArrayList<>();
            for (SweepFacts sweep : facts.sweeps()) {
                sweeps.add(new InspectedSweep(sweep.index(), sweep.mode().toString().toLowerCase(Locale.ROOT)
                        .replace('_', ' '), sweep.elevationDeg(), sweep.rays(), sweep.gates(), sweep.gateSpacingM(),
                        sweep.firstGateCentreM(), sweep.startMs(), sweep.endMs(), fields(file, sweep), sweep.notes()));
            }
            return new InspectedFile(path, facts.format(), facts.site(), sweeps, facts.notes());
        } catch (UnreadableFileException e) {
            throw new UserProblem(UserProblem.Kind.NOTHING_READABLE, path + ": " + e.reason(), e);
        }
    }

    private static List<InspectedField> fields(RadarFile file, SweepFacts sweep) throws UnreadableFileException {
        Optional<String> chosen = file.reflectivityField(sweep.index(), FieldChoice.automatic());
        List<InspectedField> fields = new ArrayList<>();
        for (FieldFacts field : sweep.fields()) {
            FieldSummary values = file.summarise(sweep.index(), field.name());
            fields.add(new InspectedField(field.name(), field.quantity(), field.units(),
                    chosen.isPresent() && chosen.get().equals(field.name()), values.valid(), values.belowDetection(),
                    values.notMeasured(), values.min(), values.max()));
        }
        return fields;
    }
}
