package hemline.sweep;

import java.util.List;

/**
 * Sweeps of one radar in order of time. A loop may read its sweeps afresh at each call, so that a long one need not
 * be in memory: ask for a sweep once, use it, let it go. Safe for use by several threads.
 */
public interface Loop {
    int size();

    /** Sweep {@code index}, 0 the earliest. */
    Sweep sweep(int index);

    /** A loop held in memory. */
    static Loop of(List<Sweep> sweeps) {
        List<Sweep> held = List.copyOf(sweeps);
        return new Loop() {
            @Override
            public int size() {
                return held.size();
            }

            @Override
            public Sweep sweep(int index) {
                return held.get(index);
            }
        };
    }
}
