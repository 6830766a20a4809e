package hemline.reader;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** One {@code datasetN} of an ODIM_H5 file. */
final class OdimSweep {
    private static final double MAX_NEAR_EDGE_KM = 20;

    private final InputFile file;
    private final SweepHead head;
    private final Map<String, ArrayGroup> data;
    private final ArrayGroup dataset;
    private final ArrayGroup root;

    private OdimSweep(InputFile file, SweepHead head, Map<String, ArrayGroup> data, ArrayGroup dataset,
                      ArrayGroup root) {
        this.file = file;
        this.head = head;
        this.data = data;
        this.dataset = dataset;
        this.root = root;
    }

    static OdimSweep of(InputFile file, ArrayGroup root, ArrayGroup dataset, String object, int[] version)
            throws UnreadableFileException {
        String place = dataset.path();
        List<String> notes = new ArrayList<>();
        OdimNode node = OdimNode.of(dataset, root);
        int[] shape = shape(file, dataset);
        Limits.checkSweep(file, place, shape[0], shape[1]);
        require(file, node, "nrays", shape[0]);
        require(file, node, "nbins", shape[1]);
        Ranges ranges = ranges(file, node, shape[1], version, notes);
        OdimRays rays = OdimRays.of(file, node, object, shape[0], notes);
        double elevation = node.number("where", "elangle").orElse(rays.table().medianElevationDeg());
        elevation = elevation > 180 ? elevation - 360 : elevation;
        if (!(Math.abs(elevation) <= 90)) {
            throw file.fault(place + "/where", "has no usable elevation (elangle)", "ask the file's maker for it");
        }
        ScanMode mode = object.equals("ELEV") ? ScanMode.RHI
                : ScanMode.of("", rays.table().azimuthDeg(), rays.table().elevationDeg());

        Map<String, ArrayGroup> data = new LinkedHashMap<>();
        List<FieldHead> fields = new ArrayList<>();
        for (String name : OdimFile.numbered(dataset.groupNames(), "data")) {
            ArrayGroup group = dataset.group(name).orElseThrow();
            if (group.variable("data").isEmpty()) {
                continue;
            }
            OdimNode inner = OdimNode.of(group, dataset, root);
            String quantity = inner.text("what", "quantity").orElse(name);
            if (data.putIfAbsent(quantity, group) != null) {
                notes.add("quantity " + quantity + " occurs twice; the first one is taken");
                continue;
            }
            fields.add(new FieldHead(quantity, quantity, "", units(quantity), ranges, tellsUndetect(inner)));
        }
        double beamWidth = node.number("how", "beamwidth").orElse(Double.NaN);
        if (Double.isNaN(beamWidth)) {
            beamWidth = node.number("how", "beamwH").orElse(Double.NaN);
        }
        SweepHead head = new SweepHead(place, mode, elevation, beamWidth, node.number("how", "NI").orElse(Double.NaN),
                rays.table(), rays.startMs(), rays.endMs(), fields, notes);
        return new OdimSweep(file, head, data, dataset, root);
    }

    private static int[] shape(InputFile file, ArrayGroup dataset) throws UnreadableFileException {
        for (String name : OdimFile.numbered(dataset.groupNames(), "data")) {
            Optional<ArrayVariable> array = dataset.group(name).orElseThrow().variable("data");
            if (array.isPresent()) {
                int[] shape = array.get().shape();
                if (shape.length != 2) {
                    throw file.broken(array.get().path(), "has " + shape.length + " dimensions, a sweep has 2");
                }
                return shape;
            }
        }
        throw file.broken(dataset.path(), "holds no data array");
    }

    private static void require(InputFile file, OdimNode node, String name, int stored)
            throws UnreadableFileException {
        Optional<Double> claimed = node.number("where", name);
        if (claimed.isPresent() && claimed.get() != stored) {
            throw file.broken(node.path() + "/where", name + " is " + claimed.get() + ", the array has " + stored);
        }
    }

    /** rstart is the near edge of the first gate: in km up to version 2.3, in m from 2.4; rscale is always in m. */
    private static Ranges ranges(InputFile file, OdimNode node, int gates, int[] version, List<String> notes)
            throws UnreadableFileException {
        String place = node.path() + "/where";
        double spacing = node.number("where", "rscale").orElse(Double.NaN);
        if (!(spacing > 0 && spacing < 1e5)) {
            throw file.fault(place, "has no usable gate length (rscale " + spacing + ")",
                    "ask the file's maker for complete geometry");
        }
        double start = node.number("where", "rstart").orElse(0.0);
        boolean inMetres = version[0] > 2 || version[0] == 2 && version[1] >= 4;
        if (inMetres && start != 0 && Math.abs(start) < MAX_NEAR_EDGE_KM) {
            inMetres = false;
            notes.add("rstart " + start + " is too small for metres and is taken as km");
        } else if (!inMetres && Math.abs(start) >= MAX_NEAR_EDGE_KM) {
            inMetres = true;
            notes.add("rstart " + start + " is too large for km and is taken as metres");
        }
        double startM = inMetres ? start : 1000 * start;
        if (!(Math.abs(startM) < 1e6)) {
            throw file.fault(place, "rstart is " + start, "correct the file");
        }
        return new Ranges(startM + spacing / 2, spacing, gates);
    }

    private static boolean tellsUndetect(OdimNode node) throws UnreadableFileException {
        Optional<Double> undetect = node.number("what", "undetect");
        return undetect.isPresent() && !undetect.equals(node.number("what", "nodata"));
    }

    private static String units(String quantity) {
        if (quantity.startsWith("DBZ") || quantity.equals("TH") || quantity.equals("TV") || quantity.equals("DBZ")) {
            return "dBZ";
        }
        return quantity.startsWith("VRAD") || quantity.startsWith("WRAD") ? "m s-1" : "";
    }

    SweepHead head() {
        return head;
    }

    float[] values(FieldHead field) throws UnreadableFileException {
        ArrayGroup group = data.get(field.name());
        OdimNode node = OdimNode.of(group, dataset, root);
        ArrayVariable array = group.variable("data").orElseThrow();
        int[] shape = array.shape();
        if (shape.length != 2 || shape[0] != head.rays().rays() || shape[1] != field.ranges().gates()) {
            throw file.broken(array.path(), "has another shape than the sweep");
        }
        double gain = node.number("what", "gain").orElse(1.0);
        double offset = node.number("what", "offset").orElse(0.0);
        if (!Double.isFinite(gain) || !Double.isFinite(offset) || gain == 0) {
            throw file.broken(group.path() + "/what", "gain " + gain + " and offset " + offset + " give no values");
        }
        return OdimScaling.decode(array.read(), gain, offset, node.number("what", "nodata"),
                field.tellsUndetect() ? node.number("what", "undetect") : Optional.empty());
    }
}
