package hemline.reader;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** One sweep of a CfRadial file: rows of the arrays of one group. */
final class CfSweep {
    private final InputFile file;
    private final SweepHead head;
    private final Map<String, ArrayVariable> variables;
    private final CfLayout layout;

    private CfSweep(InputFile file, SweepHead head, Map<String, ArrayVariable> variables, CfLayout layout) {
        this.file = file;
        this.head = head;
        this.variables = variables;
        this.layout = layout;
    }

    /**
     * @param from,past rows of the sweep, end exclusive
     * @param index     index of the sweep in its file
     * @param mode      the declared sweep mode, may be empty
     */
    static CfSweep of(InputFile file, ArrayGroup group, ArrayGroup root, CfRays rays, int from, int past, int index,
                      String place, String mode) throws UnreadableFileException {
        List<String> notes = new ArrayList<>();
        int[] rows = rows(rays, from, past, notes);
        if (rows.length == 0) {
            throw file.broken(place, "none of its rays has a direction");
        }
        Map<String, ArrayVariable> variables = new LinkedHashMap<>();
        CfLayout layout = layout(file, group, rays, rows, past, variables);
        Limits.checkSweep(file, place, rows.length, layout.gates());
        Ranges ranges = CfRanges.of(file, group, layout.gates(), from, past, index);

        List<FieldHead> fields = new ArrayList<>();
        for (ArrayVariable variable : variables.values()) {
            Attributes attributes = variable.attributes();
            fields.add(new FieldHead(variable.name(), attributes.text("standard_name").orElse(""),
                    attributes.text("long_name").orElse(""), attributes.text("units").orElse(""), ranges,
                    CfPacking.tellsUndetect(attributes)));
        }
        RayTable table = new RayTable(pick(rays.azimuthDeg(), rows), pick(rays.elevationDeg(), rows),
                pick(rays.timeMs(), rows));
        long first = table.firstTimeMs();
        long last = table.lastTimeMs();
        if (first == last && rows.length > 1) {
            notes.add("all rays carry the same time");
        }
        SweepHead head = new SweepHead(place, ScanMode.of(mode, table.azimuthDeg(), table.elevationDeg()),
                table.medianElevationDeg(), beamWidth(file, group, root), nyquist(file, group, from, past), table, first,
                last, fields, notes);
        return new CfSweep(file, head, variables, layout);
    }

    private static int[] rows(CfRays rays, int from, int past, List<String> notes) {
        int[] rows = new int[past - from];
        int n = 0;
        for (int i = from; i < past; i++) {
            if (rays.use()[i]) {
                rows[n++] = i;
            }
        }
        if (n < rows.length) {
            notes.add("rays in transition or without direction are left out");
        }
        return Arrays.copyOf(rows, n);
    }

    /** Finds the fields, which are told by their shape: rays by gates, or the points of a ragged file. */
    private static CfLayout layout(InputFile file, ArrayGroup group, CfRays rays, int[] rows, int past,
                                   Map<String, ArrayVariable> variables) throws UnreadableFileException {
        Optional<double[]> counts = CfNumbers.find(file, group, "ray_n_gates");
        Optional<double[]> starts = CfNumbers.find(file, group, "ray_start_index");
        int all = rays.azimuthDeg().length;
        boolean indexed = counts.isPresent() && starts.isPresent() && counts.get().length == all
                && starts.get().length == all;
        Map<String, ArrayVariable> ragged = new LinkedHashMap<>();
        int gates = 0;
        for (String name : group.variableNames()) {
            ArrayVariable variable = group.variable(name).orElseThrow();
            int[] shape = variable.shape();
            if (variable.isText()) {
                continue;
            }
            if (shape.length == 2 && shape[0] == all && (gates == 0 || shape[1] == gates) && !name.equals("range")
                    && shape[1] > 1) {
                gates = shape[1];
                variables.put(name, variable);
            } else if (indexed && shape.length == 1 && shape[0] > all) {
                ragged.put(name, variable);
            }
        }
        if (!variables.isEmpty() || ragged.isEmpty()) {
            if (variables.isEmpty()) {
                throw file.broken(group.path(), "holds no field of rays by gates");
            }
            return new CfLayout(rows, gates, null, null);
        }
        variables.putAll(ragged);
        long[] start = new long[past];
        int[] count = new int[past];
        for (int row : rows) {
            double s = starts.get()[row];
            double c = counts.get()[row];
            if (!(s >= 0 && s <= Integer.MAX_VALUE && c >= 0 && c <= Limits.MAX_GATES)) {
                throw file.broken(group.path(), "ray " + row + " claims " + c + " gates from point " + s);
            }
            start[row] = (long) s;
            count[row] = (int) c;
            gates = Math.max(gates, count[row]);
        }
        return new CfLayout(rows, gates, start, count);
    }

    private static double beamWidth(InputFile file, ArrayGroup group, ArrayGroup root) throws UnreadableFileException {
        for (ArrayGroup place : List.of(group, root)) {
            Optional<double[]> width = CfNumbers.find(file, place, "radar_beam_width_h", "radar_beam_width_v");
            if (width.isPresent() && width.get().length > 0) {
                return width.get()[0];
            }
        }
        Optional<ArrayGroup> parameters = root.group("radar_parameters");
        if (parameters.isPresent()) {
            return CfNumbers.find(file, parameters.get(), "beam_width_h", "radar_beam_width_h", "beam_width_v")
                    .filter(w -> w.length > 0).map(w -> w[0]).orElse(Double.NaN);
        }
        return Double.NaN;
    }

    private static double nyquist(InputFile file, ArrayGroup group, int from, int past)
            throws UnreadableFileException {
        double[] all = CfNumbers.find(file, group, "nyquist_velocity").orElse(new double[0]);
        double[] own = all.length == 1 ? all : all.length >= past ? Arrays.copyOfRange(all, from, past) : new double[0];
        double[] known = Arrays.stream(own).filter(v -> v > 0 && v < 1000).sorted().toArray();
        return known.length == 0 ? Double.NaN : known[known.length / 2];
    }

    private static double[] pick(double[] from, int[] rows) {
        return Arrays.stream(rows).mapToDouble(i -> from[i]).toArray();
    }

    private static long[] pick(long[] from, int[] rows) {
        return Arrays.stream(rows).mapToLong(i -> from[i]).toArray();
    }

    SweepHead head() {
        return head;
    }

    float[] values(FieldHead field) throws UnreadableFileException {
        return layout.read(file, variables.get(field.name()));
    }
}
