package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.Segment;

/**
 * The functions of a reaction between two temperatures at which no species changes its segment. All sums of powers are
 * added into one, so that a value costs the same however many species there are.
 */
final class Piece {
    private final double lower;
    private final double upper;
    private final PowerSegment powers;
    private final double[] weights;
    private final Segment[] tables;

    private Piece(double lower, double upper, PowerSegment powers, double[] weights, Segment[] tables) {
        this.lower = lower;
        this.upper = upper;
        this.powers = powers;
        this.weights = weights;
        this.tables = tables;
    }

    /**
     * The weighted sum of segments.
     *
     * @param weights coefficients, products positive
     * @param segments as many segments
     */
    static Piece sum(double lower, double upper, double[] weights, List<Segment> segments) {
        double[] c = new double[PowerSegment.POWERS + 2];
        List<Segment> tables = new ArrayList<>();
        double[] kept = new double[weights.length];
        for (int i = 0; i < weights.length; i++) {
            if (segments.get(i) instanceof PowerSegment power) {
                double[] one = power.coefficients();
                for (int k = 0; k < c.length; k++) {
                    c[k] += weights[i] * one[k];
                }
            } else {
                kept[tables.size()] = weights[i];
                tables.add(segments.get(i));
            }
        }
        PowerSegment powers = new PowerSegment(
                lower,
                upper,
                java.util.Arrays.copyOf(c, PowerSegment.POWERS),
                c[PowerSegment.POWERS],
                c[PowerSegment.POWERS + 1]);
        return new Piece(
                lower, upper, powers, java.util.Arrays.copyOf(kept, tables.size()), tables.toArray(new Segment[0]));
    }

    double lower() {
        return lower;
    }

    double upper() {
        return upper;
    }

    /** Whether it is a sum of powers alone. */
    boolean analytic() {
        return tables.length == 0;
    }

    /** {@code ΔCp T²} as a polynomial in T, constant first; of the part that is a sum of powers. */
    double[] heatCapacityPolynomial() {
        return java.util.Arrays.copyOf(powers.coefficients(), PowerSegment.POWERS);
    }

    double heatCapacity(double kelvin) {
        double sum = powers.heatCapacity(kelvin);
        for (int i = 0; i < tables.length; i++) {
            sum += weights[i] * tables[i].heatCapacity(kelvin);
        }
        return sum;
    }

    double enthalpy(double kelvin) {
        double sum = powers.enthalpy(kelvin);
        for (int i = 0; i < tables.length; i++) {
            sum += weights[i] * tables[i].enthalpy(kelvin);
        }
        return sum;
    }

    double entropy(double kelvin) {
        double sum = powers.entropy(kelvin);
        for (int i = 0; i < tables.length; i++) {
            sum += weights[i] * tables[i].entropy(kelvin);
        }
        return sum;
    }
}
