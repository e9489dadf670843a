package plateledger.demo.sensor;

import java.util.Random;

/**
 * Random numbers by name: the same seed and name give the same number whatever else is drawn, so a run can be generated
 * alone and a shared error is one name. Uses the generator whose sequence the Java platform specifies.
 */
public final class Draws {
    private final long seed;
    private final double size;

    private Draws(long seed, double size) {
        this.seed = seed;
        this.size = size;
    }

    /** Draws for a seed. */
    public static Draws of(long seed) {
        return new Draws(seed, 1.0);
    }

    /** No errors at all: the rig as declared. */
    public static Draws none() {
        return new Draws(0L, 0.0);
    }

    /** A standard normal number (0 without errors). */
    public double normal(String name) {
        return size == 0.0 ? 0.0 : size * generator(name).nextGaussian();
    }

    /** A number spread evenly over −1..1 (0 without errors). */
    public double even(String name) {
        return size == 0.0 ? 0.0 : size * (2.0 * generator(name).nextDouble() - 1.0);
    }

    /** A generator of its own for a long sequence. */
    public Random generator(String name) {
        long hash = 0xcbf29ce484222325L; // FNV-1a, 64 bit
        for (int i = 0; i < name.length(); i++) {
            hash = (hash ^ name.charAt(i)) * 0x100000001b3L;
        }
        long mixed = hash ^ (seed * 0x9e3779b97f4a7c15L);
        mixed = (mixed ^ (mixed >>> 30)) * 0xbf58476d1ce4e5b9L;
        mixed = (mixed ^ (mixed >>> 27)) * 0x94d049bb133111ebL;
        return new Random(mixed ^ (mixed >>> 31));
    }

    /** True if nothing is drawn. */
    public boolean isNone() {
        return size == 0.0;
    }
}
