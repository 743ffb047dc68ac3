package org.saddlebook.evaluation.internal;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.random.RandomGenerator;

/**
 * A random stream that is the same on every machine and Java version: xoshiro256++ (Blackman and Vigna, ACM Trans. Math.
 * Softw. 47 (2021) 36), its state taken from SHA-256 of seed and name; normal deviates by the polar method of Marsaglia
 * and Bray (SIAM Rev. 6 (1964) 260) in {@link StrictMath}, because the library's own method may change.
 */
final class NamedStream implements RandomGenerator {
    private final long[] state = new long[4];
    private double spare;
    private boolean hasSpare;

    NamedStream(long seed, String name) {
        byte[] hash;
        try {
            MessageDigest sha = MessageDigest.getInstance("SHA-256");
            for (int shift = 56; shift >= 0; shift -= 8) {
                sha.update((byte) (seed >>> shift));
            }
            hash = sha.digest(name.getBytes(StandardCharsets.UTF_8));
        } catch (NoSuchAlgorithmException impossible) {
            throw new IllegalStateException("every Java platform has SHA-256", impossible);
        }
        for (int i = 0; i < 32; i++) {
            state[i / 8] = state[i / 8] << 8 | (hash[i] & 0xff);
        }
    }

    @Override
    public long nextLong() {
        long result = Long.rotateLeft(state[0] + state[3], 23) + state[0];
        long t = state[1] << 17;
        state[2] ^= state[0];
        state[3] ^= state[1];
        state[1] ^= state[2];
        state[0] ^= state[3];
        state[2] ^= t;
        state[3] = Long.rotateLeft(state[3], 45);
        return result;
    }

    @Override
    public double nextDouble() {
        return (nextLong() >>> 11) * 0x1.0p-53;
    }

    @Override
    public double nextGaussian() {
        if (hasSpare) {
            hasSpare = false;
            return spare;
        }
        double u;
        double v;
        double r;
        do {
            u = 2 * nextDouble() - 1;
            v = 2 * nextDouble() - 1;
            r = u * u + v * v;
        } while (r >= 1 || r == 0);
        double factor = StrictMath.sqrt(-2 * StrictMath.log(r) / r);
        spare = v * factor;
        hasSpare = true;
        return u * factor;
    }
}
