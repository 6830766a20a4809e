package hemline.reader;

import hemline.sweep.RadarSite;
import hemline.sweep.Sweep;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * An opened radar file: what it holds, and one sweep at a time. Values are read from the file only when asked for.
 * Not for use by several threads at once.
 */
public final class RadarFile implements AutoCloseable {
    private final InputFile file;
    private final FormatFile format;

    RadarFile(InputFile file, FormatFile format) {
        this.file = file;
        this.format = format;
    }

    public Path path() {
        return file.path();
    }

    /** What the file holds, sweeps in the order of the file. */
    public RadarFileFacts facts() {
        List<SweepFacts> sweeps = new ArrayList<>();
        for (SweepHead head : format.sweeps()) {
            sweeps.add(facts(format.firstIndex() + sweeps.size(), head));
        }
        return new RadarFileFacts(file.path(), format.format(), format.site(), format.antennaAboveSiteM(),
                sweeps, format.notes());
    }

    private static SweepFacts facts(int index, SweepHead head) {
        Ranges ranges = FieldChooser.reflectivity(head.fields(), FieldChoice.automatic())
                .or(() -> head.fields().stream().findFirst()).map(FieldHead::ranges).orElse(new Ranges(0, 0, 0));
        return new SweepFacts(index, head.place(), head.mode(), head.elevationDeg(), head.rays().rays(),
                ranges.gates(), ranges.spacingM(), ranges.firstCentreM(),
                RayOrder.turned(head.rays().azimuthDeg()[0]), head.startMs(), head.endMs(),
                head.fields().stream().map(f -> new FieldFacts(f.name(), f.quantity(), f.units())).toList(),
                head.notes());
    }

    /** The name of the reflectivity field that would be taken from a sweep; empty when it has none. */
    public Optional<String> reflectivityField(int sweep, FieldChoice choice) {
        return FieldChooser.reflectivity(head(sweep).fields(), choice).map(FieldHead::name);
    }

    /**
     * Reads one sweep.
     *
     * @param sweep 0-based place in the file
     * @throws UnreadableFileException if it has no such field, or its values cannot be read
     */
    public Sweep read(int sweep, FieldChoice choice) throws UnreadableFileException {
        boolean speed = choice.withVelocity() && LowSweeps.hasVelocity(head(sweep));
        return read(new LowSweeps.Cut(sweep, speed ? sweep : -1), choice);
    }

    /** Reads one cut, its velocity from another sweep of this file where the cut says so. */
    Sweep read(LowSweeps.Cut cut, FieldChoice choice) throws UnreadableFileException {
        return read(cut, choice, this, cut.velocity());
    }

    /** Reads one cut, its velocity from a sweep of another file of the same radar. */
    Sweep read(LowSweeps.Cut cut, FieldChoice choice, RadarFile donor, int donorSweep)
            throws UnreadableFileException {
        SweepHead head = head(cut.reflectivity());
        FieldHead reflectivity = FieldChooser.reflectivity(head.fields(), choice).orElseThrow(() -> noField(head,
                choice));
        SweepAssembly.Stored stored = stored(cut.reflectivity(), reflectivity);
        if (donorSweep < 0) {
            return SweepAssembly.assemble(head, source(cut.reflectivity()), site(), stored, Optional.empty(),
                    head.nyquistMs());
        }
        SweepHead other = donor.head(donorSweep);
        Optional<FieldHead> velocity = FieldChooser.velocity(other.fields());
        Optional<SweepAssembly.Stored> speed = velocity.isPresent()
                ? Optional.of(donor.stored(donorSweep, velocity.get())) : Optional.empty();
        return SweepAssembly.assemble(head, source(cut.reflectivity()), site(), stored, speed,
                other.nyquistMs());
    }

    UnreadableFileException noField(SweepHead head, FieldChoice choice) {
        String names = head.fields().isEmpty() ? "no field"
                : String.join(", ", head.fields().stream().map(FieldHead::name).toList());
        return choice.reflectivity().isPresent()
                ? file.fault(head.place(), "has no field " + choice.reflectivity().get() + "; it has " + names,
                        "choose one of these with --field")
                : file.fault(head.place(), "has no reflectivity field; it has " + names,
                        "name the field with --field if one of these is reflectivity");
    }

    /** Reads a field over the rays and gates as stored, and summarises it. */
    public FieldSummary summarise(int sweep, String field) throws UnreadableFileException {
        SweepHead head = head(sweep);
        FieldHead found = head.fields().stream().filter(f -> f.name().equals(field)).findFirst()
                .orElseThrow(() -> noField(head, FieldChoice.named(field)));
        return FieldSummary.of(format.values(sweep - format.firstIndex(), found), found.ranges().gates());
    }

    SweepAssembly.Stored stored(int sweep, FieldHead field) throws UnreadableFileException {
        return new SweepAssembly.Stored(field, head(sweep).rays(), format.values(sweep - format.firstIndex(), field));
    }

    SweepHead head(int sweep) {
        List<SweepHead> sweeps = format.sweeps();
        int first = format.firstIndex();
        if (sweep < first || sweep >= first + sweeps.size()) {
            throw new IllegalArgumentException("sweep must be within " + first + ".." + (first + sweeps.size() - 1)
                    + ", got " + sweep);
        }
        return sweeps.get(sweep - first);
    }

    /** The radar with its antenna's altitude. */
    RadarSite site() {
        RadarSite stated = format.site();
        return new RadarSite(stated.name(), stated.position(), stated.altitudeM() + format.antennaAboveSiteM());
    }

    List<String> notes() {
        return format.notes();
    }

    /** Where a cut lies, to open it again quickly. */
    Optional<SweepSpan> span(LowSweeps.Cut cut) {
        int other = cut.velocity() < 0 ? cut.reflectivity() : cut.velocity();
        return format.span(Math.min(cut.reflectivity(), other) - format.firstIndex(),
                Math.max(cut.reflectivity(), other) - format.firstIndex());
    }

    List<SweepHead> heads() {
        return format.sweeps();
    }

    String source(int sweep) {
        return file.path().getFileName() + " sweep " + sweep;
    }

    InputFile input() {
        return file;
    }

    @Override
    public void close() {
        format.close();
    }
}
