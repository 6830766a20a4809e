package hemline.viewer.viewmodel;

import javafx.beans.property.DoubleProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;

/**
 * Which sweep is shown and how the loop plays. Time comes in through {@link #advance}, so that it can be tested
 * without a clock. The range {@code first..last} limits playing and stepping; both ends belong to it.
 */
public final class LoopModel {
    public static final double MIN_SWEEPS_PER_SECOND = 0.5;
    public static final double MAX_SWEEPS_PER_SECOND = 30;

    private final ReadOnlyIntegerWrapper size = new ReadOnlyIntegerWrapper(this, "size", 0);
    private final IntegerProperty index = new SimpleIntegerProperty(this, "index", 0) {
        @Override
        public void set(int wanted) {
            super.set(Math.max(0, Math.min(Math.max(0, size.get() - 1), wanted)));
        }
    };
    private final IntegerProperty first = new SimpleIntegerProperty(this, "first", 0);
    private final IntegerProperty last = new SimpleIntegerProperty(this, "last", 0);
    private final ObjectProperty<Motion> motion = new SimpleObjectProperty<>(this, "motion", Motion.STILL);
    private final DoubleProperty sweepsPerSecond = new SimpleDoubleProperty(this, "sweepsPerSecond", 4) {
        @Override
        public void set(double wanted) {
            super.set(Math.max(MIN_SWEEPS_PER_SECOND, Math.min(MAX_SWEEPS_PER_SECOND, wanted)));
        }
    };
    private final DoubleProperty holdSeconds = new SimpleDoubleProperty(this, "holdSeconds", 1);
    private double owedSeconds;
    private boolean rockingBack;

    /** A new loop: the newest sweep is shown, the whole loop plays. */
    public void open(int sweeps) {
        motion.set(Motion.STILL);
        size.set(sweeps);
        first.set(0);
        last.set(Math.max(0, sweeps - 1));
        index.set(sweeps - 1);
    }

    /** More sweeps have come: the view stays where it is, unless it was on the newest. */
    public void grow(int sweeps) {
        boolean newest = index.get() == size.get() - 1;
        boolean open = last.get() == size.get() - 1;
        size.set(sweeps);
        if (open) {
            last.set(sweeps - 1);
        }
        if (newest && motion.get() == Motion.STILL) {
            index.set(sweeps - 1);
        }
    }

    /** One sweep on or back, wrapping within the range; stops playing. */
    public void step(int by) {
        motion.set(Motion.STILL);
        move(by);
    }

    /** To a sweep; stops playing. */
    public void show(int sweep) {
        motion.set(Motion.STILL);
        index.set(sweep);
    }

    private void move(int by) {
        int span = last.get() - first.get() + 1;
        if (size.get() > 0) {
            index.set(first.get() + Math.floorMod(index.get() - first.get() + by, span));
        }
    }

    /** Starts this motion, or stops when it already runs. */
    public void toggle(Motion wanted) {
        owedSeconds = 0;
        rockingBack = false;
        motion.set(motion.get() == wanted || size.get() < 2 ? Motion.STILL : wanted);
    }

    /** Limits playing to sweeps {@code from..to}, in either order. */
    public void limit(int from, int to) {
        int top = Math.max(0, size.get() - 1);
        first.set(Math.max(0, Math.min(top, Math.min(from, to))));
        last.set(Math.max(0, Math.min(top, Math.max(from, to))));
        index.set(Math.max(first.get(), Math.min(last.get(), index.get())));
    }

    public void clearLimits() {
        limit(0, size.get() - 1);
    }

    /** Lets time pass; moves at most one sweep a call, so that a slow screen skips none. */
    public void advance(double elapsedSeconds) {
        if (motion.get() == Motion.STILL || last.get() == first.get()) {
            return;
        }
        owedSeconds += elapsedSeconds;
        double due = 1 / sweepsPerSecond.get() + (index.get() == last.get() ? holdSeconds.get() : 0);
        if (owedSeconds < due) {
            return;
        }
        owedSeconds = Math.min(owedSeconds - due, 1 / sweepsPerSecond.get());
        switch (motion.get()) {
            case FORWARD -> move(1);
            case BACK -> move(-1);
            default -> rock();
        }
    }

    private void rock() {
        if (index.get() >= last.get()) {
            rockingBack = true;
        } else if (index.get() <= first.get()) {
            rockingBack = false;
        }
        move(rockingBack ? -1 : 1);
    }

    public void faster() {
        sweepsPerSecond.set(sweepsPerSecond.get() * 1.5);
    }

    public void slower() {
        sweepsPerSecond.set(sweepsPerSecond.get() / 1.5);
    }

    public ReadOnlyIntegerProperty sizeProperty() {
        return size.getReadOnlyProperty();
    }

    /** The sweep shown, 0 the earliest; keeps within the loop. */
    public IntegerProperty indexProperty() {
        return index;
    }

    public int index() {
        return index.get();
    }

    public IntegerProperty firstProperty() {
        return first;
    }

    public IntegerProperty lastProperty() {
        return last;
    }

    public ObjectProperty<Motion> motionProperty() {
        return motion;
    }

    public DoubleProperty sweepsPerSecondProperty() {
        return sweepsPerSecond;
    }

    /** How much longer the last sweep of the range stays, s. */
    public DoubleProperty holdSecondsProperty() {
        return holdSeconds;
    }
}
