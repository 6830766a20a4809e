package hemline.scoring;

import java.util.Arrays;
import java.util.List;
import java.util.function.Function;
import java.util.function.Predicate;
import java.util.function.ToDoubleFunction;

/** The tallies of several scenes, each taken a number of times: once for the value, at random for the bootstrap. */
final class Totals {
    private final List<SceneTally> scenes;
    final PooledErrors positionKm;
    final PooledErrors speedMs;
    final PooledErrors speedLongMs;
    final PooledErrors expansionMs;
    final PooledErrors meetingKm;
    final PooledErrors meetingMin;
    final int[] times;

    Totals(List<SceneTally> scenes) {
        this.scenes = scenes;
        positionKm = pooled(SceneTally::positionKm);
        speedMs = pooled(SceneTally::speedMs);
        speedLongMs = pooled(SceneTally::speedLongMs);
        expansionMs = pooled(SceneTally::expansionMs);
        meetingKm = pooled(s -> s.meetings().placeKm());
        meetingMin = pooled(s -> s.meetings().timeMin());
        times = new int[scenes.size()];
        Arrays.fill(times, 1);
    }

    private Totals(Totals other, int[] times) {
        scenes = other.scenes;
        positionKm = other.positionKm;
        speedMs = other.speedMs;
        speedLongMs = other.speedLongMs;
        expansionMs = other.expansionMs;
        meetingKm = other.meetingKm;
        meetingMin = other.meetingMin;
        this.times = times.clone();
    }

    private PooledErrors pooled(Function<SceneTally, ErrorSamples> of) {
        return new PooledErrors(scenes.stream().map(of).toList());
    }

    /** The same scenes, scene {@code i} taken {@code newTimes[i]} times. */
    Totals taken(int[] newTimes) {
        return new Totals(this, newTimes);
    }

    double sum(ToDoubleFunction<SceneTally> of) {
        return sumWhere(scene -> true, of);
    }

    double sumWhere(Predicate<SceneTally> which, ToDoubleFunction<SceneTally> of) {
        double sum = 0;
        for (int i = 0; i < times.length; i++) {
            if (times[i] > 0 && which.test(scenes.get(i))) {
                sum += times[i] * of.applyAsDouble(scenes.get(i));
            }
        }
        return sum;
    }

    double sumTracks(ToDoubleFunction<SceneTally.TrackTally> of) {
        return sum(scene -> scene.tracks().stream().mapToDouble(of).sum());
    }

    double sumBoundaries(ToDoubleFunction<SceneTally.BoundaryTally> of) {
        return sum(scene -> scene.boundaries().stream().mapToDouble(of).sum());
    }
}
