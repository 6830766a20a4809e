package hemline.reader;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/**
 * Which sweeps of a file go into a loop: those at the lowest elevation inside the window, wherever they stand in the
 * file. A volume that scans its lowest elevation again later gives several. A split cut, that is a surveillance sweep
 * without velocity and a Doppler sweep with it directly one after the other, is one look at the sky: it gives one
 * sweep, the surveillance reflectivity (which reaches farther, free of range folding) with the Doppler velocity.
 */
final class LowSweeps {
    /** Sweeps this close in elevation are at the same one, degrees. */
    static final double SAME_ELEVATION_DEG = 0.2;
    /** The Doppler part of a split cut starts so soon after the surveillance part ends, ms. */
    private static final long SPLIT_CUT_PAUSE_MS = 60_000;

    private LowSweeps() {
    }

    /**
     * A sweep to take.
     *
     * @param reflectivity index of the sweep that gives the reflectivity
     * @param velocity     index of the sweep that gives the velocity, −1 for none
     */
    record Cut(int reflectivity, int velocity) {
    }

    static List<Cut> choose(List<SweepHead> heads, ReadOptions options, List<String> notes) {
        List<Integer> low = lowest(heads, options);
        List<Cut> cuts = new ArrayList<>();
        for (int i = 0; i < low.size(); i++) {
            int here = low.get(i);
            int next = i + 1 < low.size() ? low.get(i + 1) : -1;
            boolean speed = hasVelocity(heads.get(here));
            if (next >= 0 && speed != hasVelocity(heads.get(next)) && followsDirectly(heads, here, next)) {
                int reflectivity = speed ? next : here;
                int velocity = speed ? here : next;
                if (hasReflectivity(heads.get(reflectivity), options)) {
                    cuts.add(new Cut(reflectivity, velocity));
                    if (hasReflectivity(heads.get(velocity), options)) {
                        notes.add("split cut: velocity of sweep " + velocity + " carried to sweep " + reflectivity
                                + ", its reflectivity not used");
                    }
                    i++;
                    continue;
                }
            }
            if (hasReflectivity(heads.get(here), options)) {
                cuts.add(new Cut(here, speed ? here : -1));
            }
        }
        return cuts;
    }

    /** Sweeps at the lowest elevation that has reflectivity, with or without reflectivity themselves. */
    private static List<Integer> lowest(List<SweepHead> heads, ReadOptions options) {
        double lowest = Double.POSITIVE_INFINITY;
        for (SweepHead head : heads) {
            if (usable(head, options) && hasReflectivity(head, options)) {
                lowest = Math.min(lowest, head.elevationDeg());
            }
        }
        List<Integer> low = new ArrayList<>();
        for (int i = 0; i < heads.size(); i++) {
            SweepHead head = heads.get(i);
            if (usable(head, options) && Math.abs(head.elevationDeg() - lowest) <= SAME_ELEVATION_DEG
                    && (hasReflectivity(head, options) || hasVelocity(head))) {
                low.add(i);
            }
        }
        return low;
    }

    private static boolean usable(SweepHead head, ReadOptions options) {
        return head.mode() == ScanMode.PPI && options.takes(head.elevationDeg());
    }

    private static boolean followsDirectly(List<SweepHead> heads, int first, int second) {
        for (int between = first + 1; between < second; between++) {
            if (Math.abs(heads.get(between).elevationDeg() - heads.get(first).elevationDeg()) > SAME_ELEVATION_DEG) {
                return false;
            }
        }
        return heads.get(second).startMs() - heads.get(first).endMs() <= SPLIT_CUT_PAUSE_MS;
    }

    static boolean hasVelocity(SweepHead head) {
        return FieldChooser.velocity(head.fields()).isPresent();
    }

    static boolean hasReflectivity(SweepHead head, ReadOptions options) {
        return FieldChooser.reflectivity(head.fields(), options.fieldChoice()).isPresent();
    }

    /** Why a file gives no sweep, in one line. */
    static UnreadableFileException refusal(RadarFile file, ReadOptions options) {
        List<SweepHead> heads = file.heads();
        Optional<SweepHead> inWindow = heads.stream().filter(h -> usable(h, options)).findFirst();
        if (inWindow.isPresent()) {
            return file.noField(inWindow.get(), options.fieldChoice());
        }
        List<SweepHead> turning = heads.stream().filter(h -> h.mode() == ScanMode.PPI).toList();
        if (turning.isEmpty()) {
            SweepHead first = heads.get(0);
            String what = switch (first.mode()) {
                case RHI -> "an RHI scan (the antenna moves in elevation)";
                case VERTICAL -> "a vertical scan";
                default -> "not a turning scan";
            };
            return file.input().fault(first.place(), "is " + what + "; boundaries are found in low sweeps around",
                    "give PPI volumes or surveillance scans");
        }
        double lowest = turning.stream().mapToDouble(SweepHead::elevationDeg).min().orElseThrow();
        return file.input().fault("", String.format(Locale.ROOT, "has no sweep between %.1f and %.1f degrees; its "
                + "lowest sweep is at %.1f degrees", options.minElevationDeg(), options.maxElevationDeg(), lowest),
                "give low sweeps, or widen --elevation");
    }
}
