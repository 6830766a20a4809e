package hemline.reader;

import hemline.sweep.RadarSite;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * CfRadial 1.1 to 1.5 in netCDF-3 or netCDF-4 (Dixon and Lee, NCAR/EOL, "CfRadial data file format"), all sweeps in
 * one group; and CfRadial 2, one group a sweep (also WMO FM 301).
 */
final class CfRadialFile implements FormatFile {
    private static final Pattern VERSION = Pattern.compile("(?:Radial-)?(\\d\\.\\d+)");
    private static final Pattern SWEEP_GROUP = Pattern.compile("sweep_?(\\d{1,6})");

    private final ArrayFile arrays;
    private final String format;
    private final RadarSite site;
    private final List<CfSweep> sweeps;
    private final List<String> notes;

    private CfRadialFile(ArrayFile arrays, String format, RadarSite site, List<CfSweep> sweeps, List<String> notes) {
        this.arrays = arrays;
        this.format = format;
        this.site = site;
        this.sweeps = sweeps;
        this.notes = notes;
    }

    static boolean recognises(ArrayGroup root) throws UnreadableFileException {
        return isFlat(root) || !sweepGroups(root).isEmpty();
    }

    private static boolean isFlat(ArrayGroup root) throws UnreadableFileException {
        return root.variable("azimuth").isPresent() && root.variable("elevation").isPresent();
    }

    private static List<String> sweepGroups(ArrayGroup root) throws UnreadableFileException {
        List<String> groups = root.groupNames();
        Optional<ArrayVariable> listed = root.variable("sweep_group_name");
        if (listed.isPresent() && listed.get().isText()) {
            List<String> names = listed.get().texts().stream().filter(groups::contains).distinct().toList();
            if (!names.isEmpty()) {
                return names;
            }
        }
        return groups.stream().filter(n -> SWEEP_GROUP.matcher(n).matches())
                .sorted(java.util.Comparator.comparingInt((String n) -> number(n)).thenComparing(n -> n)).toList();
    }

    private static int number(String group) {
        Matcher m = SWEEP_GROUP.matcher(group);
        return m.matches() ? Integer.parseInt(m.group(1)) : 0;
    }

    static CfRadialFile open(InputFile file, ArrayFile arrays) throws UnreadableFileException {
        ArrayGroup root = arrays.root();
        List<String> notes = new ArrayList<>();
        boolean flat = isFlat(root);
        List<CfSweep> sweeps = flat ? flat(file, root, notes) : grouped(file, root, notes);
        String container = arrays.container().equals("HDF5") ? "netCDF-4" : arrays.container();
        return new CfRadialFile(arrays, "CfRadial " + version(root, flat) + " " + container, CfSite.of(file, root),
                sweeps, List.copyOf(notes));
    }

    private static String version(ArrayGroup root, boolean flat) throws UnreadableFileException {
        Matcher inConventions = Pattern.compile("Radial-(\\d\\.\\d+)")
                .matcher(root.attributes().text("Conventions").orElse(""));
        if (inConventions.find()) {
            return inConventions.group(1);
        }
        Matcher stated = VERSION.matcher(root.attributes().text("version").orElse(""));
        return stated.find() ? stated.group(1) : flat ? "1" : "2";
    }

    private static List<CfSweep> flat(InputFile file, ArrayGroup root, List<String> notes)
            throws UnreadableFileException {
        CfRays rays = CfRays.of(file, root, root, notes);
        List<int[]> index = CfSweepIndex.of(CfNumbers.find(file, root, "sweep_start_ray_index"),
                CfNumbers.find(file, root, "sweep_end_ray_index"), rays.elevationDeg(), notes);
        List<String> modes = texts(root, "sweep_mode");
        List<CfSweep> sweeps = new ArrayList<>();
        UnreadableFileException first = null;
        for (int i = 0; i < index.size(); i++) {
            int[] span = index.get(i);
            try {
                sweeps.add(CfSweep.of(file, root, root, rays, span[0], span[1], i, "sweep " + i,
                        modes.size() == index.size() ? modes.get(i) : modes.size() == 1 ? modes.get(0) : ""));
            } catch (UnreadableFileException e) {
                first = first == null ? e : first;
                notes.add("left out sweep " + i + ": " + e.problem());
            }
        }
        return requireSome(sweeps, first);
    }

    private static List<CfSweep> grouped(InputFile file, ArrayGroup root, List<String> notes)
            throws UnreadableFileException {
        List<String> names = sweepGroups(root);
        if (names.size() > Limits.MAX_SWEEPS) {
            throw file.broken("/", "claims " + names.size() + " sweep groups");
        }
        List<CfSweep> sweeps = new ArrayList<>();
        UnreadableFileException first = null;
        for (String name : names) {
            ArrayGroup group = root.group(name).orElseThrow();
            try {
                CfRays rays = CfRays.of(file, group, root, notes);
                sweeps.add(CfSweep.of(file, group, root, rays, 0, rays.azimuthDeg().length, 0, group.path(),
                        texts(group, "sweep_mode").stream().findFirst().orElse("")));
            } catch (UnreadableFileException e) {
                first = first == null ? e : first;
                notes.add("left out " + name + ": " + e.problem());
            }
        }
        return requireSome(sweeps, first);
    }

    private static List<CfSweep> requireSome(List<CfSweep> sweeps, UnreadableFileException fault)
            throws UnreadableFileException {
        if (sweeps.isEmpty()) {
            throw fault;
        }
        return sweeps;
    }

    private static List<String> texts(ArrayGroup group, String name) throws UnreadableFileException {
        Optional<ArrayVariable> variable = group.variable(name);
        return variable.isPresent() && variable.get().isText() ? variable.get().texts() : List.of();
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
        return sweeps.stream().map(CfSweep::head).toList();
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
