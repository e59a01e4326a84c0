// SPDX-License-Identifier: Apache-2.0
package reedling.particle;

import java.io.DataInput;
import java.io.DataOutput;
import java.io.IOException;
import java.nio.charset.StandardCharsets;

/**
 * Seedable random numbers whose state can be saved and which split by name.
 *
 * <p>A stream has an identity, given by the seed and the names it was split by, and a position. Splitting looks at the
 * identity only: a stream's children do not change when the stream is used more, or less, before the split.
 * <p>Source: generator xoshiro256++ of D. Blackman and S. Vigna, Scrambled linear pseudorandom number generators, 2018;
 * filled by SplitMix64 of G. L. Steele, D. Lea and C. H. Flood, Fast splittable pseudorandom number generators, 2014;
 * both algorithms are in the public domain. Names are hashed by FNV-1a (G. Fowler, L. C. Noll and K.-P. Vo), from
 * memory. Normal numbers by the polar method of G. Marsaglia and T. A. Bray, A convenient method for generating
 * normal variables, 1964.
 * <p>Threads: confined to its owner.
 */
public final class RandomStream {

    private static final long GOLDEN = 0x9E3779B97F4A7C15L;
    private static final double UNIT = 0x1.0p-53;

    private long identity;
    private long s0;
    private long s1;
    private long s2;
    private long s3;

    /** The stream of a seed. */
    @SuppressWarnings("ConstantOverflow") // the sums are meant modulo 2^64
    public RandomStream(long seed) {
        identity = seed;
        s0 = mix(seed + GOLDEN);
        s1 = mix(seed + 2 * GOLDEN);
        s2 = mix(seed + 3 * GOLDEN);
        s3 = mix(seed + 4 * GOLDEN);
    }

    /** A stream of its own for {@code name}; the same name gives the same stream. */
    public RandomStream split(String name) {
        long hash = 0xCBF29CE484222325L;
        for (byte letter : name.getBytes(StandardCharsets.UTF_8)) {
            hash = (hash ^ (letter & 0xFF)) * 0x100000001B3L;
        }
        return new RandomStream(mix(mix(identity + GOLDEN) ^ hash));
    }

    /** The next 64 random bits. */
    public long bits() {
        long result = Long.rotateLeft(s0 + s3, 23) + s0;
        long shifted = s1 << 17;
        s2 ^= s0;
        s3 ^= s1;
        s1 ^= s2;
        s0 ^= s3;
        s2 ^= shifted;
        s3 = Long.rotateLeft(s3, 45);
        return result;
    }

    /** Uniform in [0, 1). */
    public double uniform() {
        return (bits() >>> 11) * UNIT;
    }

    /** Uniform in [low, high). */
    public double uniform(double low, double high) {
        return low + (high - low) * uniform();
    }

    /** Normal with mean 0 and standard deviation 1. */
    public double normal() {
        while (true) {
            double u = 2 * uniform() - 1;
            double v = 2 * uniform() - 1;
            double square = u * u + v * v;
            if (square < 1 && square > 0) {
                // the second number of the pair is dropped, so that the state stays five words
                return u * Math.sqrt(-2 * StrictMath.log(square) / square);
            }
        }
    }

    /** Writes identity and position, five words. */
    public void save(DataOutput out) throws IOException {
        out.writeLong(identity);
        out.writeLong(s0);
        out.writeLong(s1);
        out.writeLong(s2);
        out.writeLong(s3);
    }

    /** Reads what {@link #save} wrote; this stream then continues where that one stood. */
    public void restore(DataInput in) throws IOException {
        identity = in.readLong();
        s0 = in.readLong();
        s1 = in.readLong();
        s2 = in.readLong();
        s3 = in.readLong();
    }

    private static long mix(long z) {
        long a = (z ^ (z >>> 30)) * 0xBF58476D1CE4E5B9L;
        long b = (a ^ (a >>> 27)) * 0x94D049BB133111EBL;
        return b ^ (b >>> 31);
    }
}
