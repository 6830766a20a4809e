package hemline.tracking;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** A track while it is being made: its strands in each sweep. */
final class Draft {
    private final List<List<Strand>> bySweep = new ArrayList<>();
    final double score;

    Draft(List<Strand> strands, int sweeps, double score) {
        this.score = score;
        for (int k = 0; k < sweeps; k++) {
            bySweep.add(new ArrayList<>());
        }
        strands.forEach(this::add);
    }

    void add(Strand strand) {
        bySweep.get(strand.sweep).add(strand);
    }

    /** The strands of a sweep; the list may be changed. */
    List<Strand> at(int sweep) {
        return bySweep.get(sweep);
    }

    int sweeps() {
        return bySweep.size();
    }

    List<Strand> all() {
        return bySweep.stream().flatMap(List::stream).toList();
    }

    int firstSweep() {
        return all().stream().mapToInt(s -> s.sweep).min().orElse(0);
    }

    int lastSweep() {
        return all().stream().mapToInt(s -> s.sweep).max().orElse(-1);
    }

    /** Sweeps in which at least some kilometres are seen. */
    int sweepsSeen() {
        return (int) bySweep.stream().filter(list -> !list.isEmpty()).count();
    }

    double maxLengthKm() {
        return bySweep.stream().mapToDouble(list -> list.stream().mapToDouble(Strand::lengthKm).sum()).max().orElse(0);
    }

    void removeShorterThan(int vertices) {
        bySweep.forEach(list -> list.removeIf(strand -> strand.size() < vertices));
    }

    /** Orders the strands of each sweep so that results do not depend on how they came. */
    void sort() {
        bySweep.forEach(list -> list.sort(Comparator.<Strand>comparingDouble(s -> s.x[0])
                .thenComparingDouble(s -> s.y[0])));
    }
}
