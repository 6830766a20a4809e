package hemline.simulation.random;

import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well512a;

/**
 * Independent streams of random numbers, each named by a purpose and two numbers (for example sweep and ray). The same
 * name under the same seed gives the same numbers, whatever was drawn before and on whatever thread.
 */
public final class Streams {
    private static final long GOLDEN_GAMMA = 0x9e3779b97f4a7c15L;
    private static final int WELL_WORDS = 16;
    private final long seed;

    public Streams(long seed) {
        this.seed = seed;
    }

    public RandomGenerator stream(String purpose) {
        return stream(purpose, 0, 0);
    }

    public RandomGenerator stream(String purpose, long first, long second) {
        long state = mix(seed ^ mix(nameKey(purpose) + mix(first + GOLDEN_GAMMA * (1 + mix(second + GOLDEN_GAMMA)))));
        int[] words = new int[WELL_WORDS];
        for (int i = 0; i < WELL_WORDS; i++) {
            state += GOLDEN_GAMMA;
            words[i] = (int) (mix(state) >>> 32);
        }
        return new Well512a(words);
    }

    /** The streams of one part, apart from those of any other part under the same seed. */
    public Streams part(String name, long number) {
        return new Streams(mix(seed + GOLDEN_GAMMA * (1 + nameKey(name))) ^ mix(number * GOLDEN_GAMMA + 1));
    }

    private static long nameKey(String name) {
        long key = 0;
        for (int i = 0; i < name.length(); i++) {
            key = mix(key + GOLDEN_GAMMA + name.charAt(i));
        }
        return key;
    }

    /** The finaliser of SplitMix64. */
    static long mix(long value) {
        long z = value;
        z = (z ^ (z >>> 30)) * 0xbf58476d1ce4e5b9L;
        z = (z ^ (z >>> 27)) * 0x94d049bb133111ebL;
        return z ^ (z >>> 31);
    }

    /** A uniform draw in [{@code from}, {@code to}). */
    public static double between(RandomGenerator random, double from, double to) {
        return from + (to - from) * random.nextDouble();
    }
}
