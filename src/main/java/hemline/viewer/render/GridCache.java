package hemline.viewer.render;

import hemline.viewer.viewmodel.HeldSweep;
import hemline.viewer.viewmodel.PlaneField;
import hemline.viewer.viewmodel.SweepStore;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.Optional;

/** Level grids kept while there is room; the one unused longest goes first. Safe for use by several threads. */
final class GridCache {
    private final long budgetBytes;
    private final LinkedHashMap<Key, LevelGrid> kept = new LinkedHashMap<>(16, 0.75f, true);
    private long keptBytes;
    private SweepStore current;

    private record Key(int index, PlaneField field) {
    }

    GridCache(long budgetBytes) {
        this.budgetBytes = budgetBytes;
    }

    synchronized Optional<LevelGrid> peek(SweepStore store, int index, PlaneField field) {
        return store == current ? Optional.ofNullable(kept.get(new Key(index, field))) : Optional.empty();
    }

    LevelGrid of(SweepStore store, HeldSweep held, PlaneField field) {
        Key key = new Key(held.index(), field);
        synchronized (this) {
            if (store != current) {
                kept.clear();
                keptBytes = 0;
                current = store;
            }
            LevelGrid there = kept.get(key);
            if (there != null) {
                return there;
            }
        }
        LevelGrid made = LevelGrid.of(held, field);
        synchronized (this) {
            if (store == current && kept.put(key, made) == null) {
                keptBytes += made.bytes();
            }
            Iterator<LevelGrid> oldest = kept.values().iterator();
            while (keptBytes > budgetBytes && kept.size() > 1) {
                keptBytes -= oldest.next().bytes();
                oldest.remove();
            }
        }
        return made;
    }
}
