package hemline.reader;

import hemline.sweep.RadarSite;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * ODIM_H5 2.0 to 2.4 objects that hold sweeps (OPERA Data Information Model for HDF5, Michelson, Lewandowski,
 * Szewczykowski, Beekhuis, Haase and others, EUMETNET OPERA; 2.4 of 2021).
 */
final class OdimFile implements FormatFile {
    private static final Set<String> SWEEP_OBJECTS = Set.of("PVOL", "SCAN", "AZIM", "ELEV");
    private static final Pattern VERSION = Pattern.compile("(\\d+)[._](\\d+)");

    private final ArrayFile arrays;
    private final String format;
    private final RadarSite site;
    private final List<OdimSweep> sweeps;
    private final List<String> notes;

    private OdimFile(ArrayFile arrays, String format, RadarSite site, List<OdimSweep> sweeps, List<String> notes) {
        this.arrays = arrays;
        this.format = format;
        this.site = site;
        this.sweeps = sweeps;
        this.notes = notes;
    }

    static boolean recognises(ArrayGroup root) throws UnreadableFileException {
        if (root.attributes().text("Conventions").orElse("").startsWith("ODIM")) {
            return true;
        }
        Optional<ArrayGroup> what = root.group("what");
        return what.isPresent() && what.get().attributes().text("object").isPresent();
    }

    static OdimFile open(InputFile file, ArrayFile arrays) throws UnreadableFileException {
        ArrayGroup root = arrays.root();
        List<String> notes = new ArrayList<>();
        OdimNode top = OdimNode.of(root);
        String object = top.text("what", "object").orElseThrow(() -> file.fault("/what", "does not say which object "
                + "the file is", "ask the file's maker for complete ODIM_H5"));
        if (!SWEEP_OBJECTS.contains(object)) {
            throw file.fault("/what", "the file is an ODIM_H5 " + object + " object, which holds no sweep",
                    "give polar volumes (PVOL) or scans (SCAN)");
        }
        String declared = root.attributes().text("Conventions").orElse("");
        int[] version = version(declared);
        if (version == null) {
            declared = top.text("what", "version").orElse("");
            version = version(declared);
            notes.add("no usable Conventions attribute; version taken from what/version " + declared);
        }
        if (version == null) {
            version = new int[] {2, 0};
        }
        List<OdimSweep> sweeps = sweeps(file, root, object, version, notes);
        String words = "ODIM_H5 " + version[0] + "." + version[1] + " " + object;
        return new OdimFile(arrays, words, OdimSite.of(file, root), sweeps, List.copyOf(notes));
    }

    private static int[] version(String text) {
        Matcher found = VERSION.matcher(text);
        return found.find() && found.group(1).length() < 4 && found.group(2).length() < 4
                ? new int[] {Integer.parseInt(found.group(1)), Integer.parseInt(found.group(2))} : null;
    }

    private static List<OdimSweep> sweeps(InputFile file, ArrayGroup root, String object, int[] version,
                                          List<String> notes) throws UnreadableFileException {
        List<String> names = numbered(root.groupNames(), "dataset");
        if (names.isEmpty()) {
            throw file.broken("/", "holds no dataset group, so no sweep");
        }
        if (names.size() > Limits.MAX_SWEEPS) {
            throw file.broken("/", "claims " + names.size() + " datasets");
        }
        List<OdimSweep> sweeps = new ArrayList<>();
        UnreadableFileException first = null;
        for (String name : names) {
            try {
                sweeps.add(OdimSweep.of(file, root, root.group(name).orElseThrow(), object, version));
            } catch (UnreadableFileException e) {
                first = first == null ? e : first;
                notes.add("left out " + name + ": " + e.problem());
            }
        }
        if (sweeps.isEmpty()) {
            throw first;
        }
        return sweeps;
    }

    /** Names such as dataset1, dataset2, … dataset10 in the order of their numbers. */
    static List<String> numbered(List<String> names, String stem) {
        Pattern pattern = Pattern.compile(stem + "(\\d{1,9})");
        return names.stream().filter(n -> pattern.matcher(n).matches())
                .sorted(Comparator.comparingInt((String n) -> Integer.parseInt(n.substring(stem.length())))
                        .thenComparing(n -> n)).toList();
    }

    @Override
    public String format() {
        return format;
    }

    @Override
    public RadarSite site() {
        return site;
    }

    @Override
    public List<SweepHead> sweeps() {
        return sweeps.stream().map(OdimSweep::head).toList();
    }

    @Override
    public List<String> notes() {
        return notes;
    }

    @Override
    public float[] values(int sweep, FieldHead field) throws UnreadableFileException {
        return sweeps.get(sweep).values(field);
    }

    @Override
    public void close() {
        arrays.close();
    }
}
