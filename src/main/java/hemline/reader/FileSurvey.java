package hemline.reader;

import hemline.sweep.Field;
import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * One input looked at: its sweeps to take, each read once to be sure that it can be.
 *
 * @param path    the file
 * @param sha256  of its bytes; empty when it cannot be read
 * @param refusal why it gives nothing; empty when it gives something
 * @param skipped true for text and the like found in a folder
 * @param tickets sweeps to take
 * @param donors  low sweeps with velocity only
 * @param notes   what was chosen and assumed
 */
record FileSurvey(Path path, String sha256, Optional<String> refusal, boolean skipped, List<SweepTicket> tickets,
                  List<SweepTicket.Donor> donors, List<String> notes) {

    static FileSurvey of(InputPaths.Candidate candidate, ReadOptions options, SweepCache cache) {
        Path path = candidate.path();
        String sha256 = Fingerprint.of(path);
        try {
            if (candidate.found() && Content.of(new InputFile(path)).kind().isBystander()) {
                return refused(path, sha256, "no radar file", true);
            }
            try (RadarFile file = RadarFiles.openLow(path, options)) {
                return taken(file, sha256, options, cache);
            }
        } catch (UnreadableFileException e) {
            return refused(path, sha256, e.reason(), false);
        }
    }

    private static FileSurvey refused(Path path, String sha256, String why, boolean skipped) {
        return new FileSurvey(path, sha256, Optional.of(why), skipped, List.of(), List.of(), List.of());
    }

    private static FileSurvey taken(RadarFile file, String sha256, ReadOptions options, SweepCache cache)
            throws UnreadableFileException {
        List<String> notes = new ArrayList<>(file.notes());
        List<LowSweeps.Cut> cuts = LowSweeps.choose(file.heads(), options, notes);
        List<SweepTicket.Donor> donors = new ArrayList<>();
        if (cuts.isEmpty()) {
            donors = donors(file, options);
            if (donors.isEmpty()) {
                throw LowSweeps.refusal(file, options);
            }
        }
        List<SweepTicket> tickets = new ArrayList<>();
        RadarSite site = file.site();
        UnreadableFileException first = null;
        for (LowSweeps.Cut cut : cuts) {
            SweepHead head = file.head(cut.reflectivity());
            try {
                Sweep sweep = file.read(cut, options.fieldChoice());
                requireMeasured(file, head, sweep);
                int rank = FieldChooser.reflectivityRank(
                        FieldChooser.reflectivity(head.fields(), options.fieldChoice()).orElseThrow());
                SweepTicket ticket = new SweepTicket(file.path(), cut, file.span(cut), Optional.empty(), site, head.elevationDeg(),
                        sweep.startMs(), sweep.endMs(), rank);
                tickets.add(ticket);
                cache.put(ticket, sweep);
                notes.addAll(notes(head, sweep, options));
            } catch (UnreadableFileException e) {
                first = first == null ? e : first;
                notes.add("left out " + head.place() + ": " + e.problem());
            }
        }
        if (tickets.isEmpty() && donors.isEmpty()) {
            throw first;
        }
        return new FileSurvey(file.path(), sha256, Optional.empty(), false, tickets, donors, notes);
    }

    private static List<SweepTicket.Donor> donors(RadarFile file, ReadOptions options) {
        List<SweepTicket.Donor> donors = new ArrayList<>();
        for (int i = 0; i < file.heads().size(); i++) {
            SweepHead head = file.head(i);
            if (head.mode() == ScanMode.PPI && options.takes(head.elevationDeg()) && LowSweeps.hasVelocity(head)) {
                donors.add(new SweepTicket.Donor(file.path(), i, file.site(), head.elevationDeg(), head.startMs(),
                        head.endMs()));
            }
        }
        return donors;
    }

    private static void requireMeasured(RadarFile file, SweepHead head, Sweep sweep) throws UnreadableFileException {
        float[] ray = new float[sweep.gateCount()];
        for (int i = 0; i < sweep.rayCount(); i++) {
            sweep.reflectivity().copyRay(i, ray);
            for (float value : ray) {
                if (Field.isMeasured(value)) {
                    return;
                }
            }
        }
        throw file.input().fault(head.place(), "every gate of " + sweep.reflectivity().name() + " is no-data",
                "leave the file out");
    }

    private static List<String> notes(SweepHead head, Sweep sweep, ReadOptions options) {
        List<String> notes = new ArrayList<>();
        head.notes().forEach(note -> notes.add(head.place() + ": " + note));
        RayOrder.of(head.rays(), head.elevationDeg()).notes().forEach(note -> notes.add(head.place() + ": " + note));
        List<FieldHead> all = FieldChooser.reflectivities(head.fields());
        if (options.field().isEmpty() && all.size() > 1) {
            notes.add("reflectivity " + sweep.reflectivity().name() + " chosen among "
                    + String.join(", ", all.stream().map(FieldHead::name).toList()));
        }
        if (options.takes(head.elevationDeg()) && head.elevationDeg() < options.minElevationDeg()
                - ReadOptions.TOLERANCE_DEG) {
            notes.add(String.format(java.util.Locale.ROOT, "the lowest sweep looks below the horizon, at %.2f degrees",
                    head.elevationDeg()));
        }
        return notes;
    }
}
