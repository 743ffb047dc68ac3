package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;

/** Where ΔG = ΔH − TΔS is negative, from the signs of ΔH and ΔS. {@code word} is the word in files. */
enum SignCase {
    /** ΔH negative, ΔS positive; or one of them zero and the other so. */
    EVERYWHERE("exergonic at every temperature", "ΔG is negative at every temperature above 0 K."),
    /** Both negative. */
    BELOW("below the crossover", "ΔG is negative below the crossover and positive above it."),
    /** Both positive. */
    ABOVE("above the crossover", "ΔG is negative above the crossover and positive below it."),
    /** ΔH positive, ΔS negative; or one of them zero and the other so. */
    NOWHERE("at no temperature", "ΔG is positive at every temperature above 0 K."),
    /** Both exactly zero. */
    ZERO("zero at every temperature", "ΔG is zero at every temperature.");

    private final String word;
    private final String sentence;

    SignCase(String word, String sentence) {
        this.word = word;
        this.sentence = sentence;
    }

    String word() {
        return word;
    }

    String sentence() {
        return sentence;
    }

    /**
     * The case of two signs.
     *
     * @param enthalpy sign of ΔH: -1, 0 or 1
     * @param entropy sign of ΔS: -1, 0 or 1
     */
    static SignCase of(int enthalpy, int entropy) {
        if (enthalpy == 0 && entropy == 0) {
            return ZERO;
        }
        if (enthalpy <= 0 && entropy >= 0) {
            return EVERYWHERE;
        }
        if (enthalpy >= 0 && entropy <= 0) {
            return NOWHERE;
        }
        return enthalpy < 0 ? BELOW : ABOVE;
    }

    /**
     * The cases that remain when a sign is open.
     *
     * @param enthalpy signs that ΔH may have
     * @param entropy signs that ΔS may have
     */
    static List<SignCase> possible(List<Integer> enthalpy, List<Integer> entropy) {
        List<SignCase> cases = new ArrayList<>();
        for (SignCase candidate : values()) {
            for (int h : enthalpy) {
                for (int s : entropy) {
                    if (of(h, s) == candidate && !cases.contains(candidate)) {
                        cases.add(candidate);
                    }
                }
            }
        }
        return cases;
    }

    /**
     * The signs a value may have whose interval is value ± half: its own where the interval excludes zero, else minus and
     * plus. Without uncertainty it is the value's own, zero included.
     */
    static List<Integer> signs(double value, double half) {
        if (half == 0 || Math.abs(value) > half) {
            return List.of((int) Math.signum(value));
        }
        return List.of(-1, 1);
    }
}
