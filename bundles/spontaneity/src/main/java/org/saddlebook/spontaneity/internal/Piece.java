package org.saddlebook.spontaneity.internal;

import java.util.List;
import org.saddlebook.thermo.data.api.PowerSegment;
import org.saddlebook.thermo.data.api.Segment;
import org.saddlebook.thermo.data.api.TableSegment;

/**
 * The functions of a reaction between two temperatures at which no species changes its segment and no table has a row.
 * Everything is one sum of powers, so that a value costs the same however many species there are:
 *
 * <pre>
 * Cp = c0/T² + c1/T + c2 + c3 T + c4 T² + c5 T³ + c6 T⁴
 * H  = h − c0/T + c1 ln T + (c2 + p) T + c3 T²/2 + c4 T³/3 + c5 T⁴/4 + c6 T⁵/5
 * S  = s − c0/(2T²) − c1/T + c2 ln T + (c3 + q) T + c4 T²/2 + c5 T³/3 + c6 T⁴/4
 * </pre>
 *
 * with p and q only where a table takes part, whose rounded columns need them.
 */
final class Piece {
    private static final int CONSTANT = 2;
    private static final int LINEAR = 3;

    private final double lower;
    private final double upper;
    private final double[] c;
    private final double h;
    private final double s;
    private final double ofEnthalpy;
    private final double ofEntropy;
    private final boolean analytic;

    /** J/mol, J/(mol K) and their powers; {@code extra} is p and q. */
    private Piece(double lower, double upper, double[] c, double h, double s, double[] extra, boolean analytic) {
        this.lower = lower;
        this.upper = upper;
        this.c = c;
        this.h = h;
        this.s = s;
        ofEnthalpy = c[CONSTANT] + extra[0];
        ofEntropy = c[LINEAR] + extra[1];
        this.analytic = analytic;
    }

    /**
     * The weighted sum of segments.
     *
     * @param weights coefficients, products positive
     * @param segments as many segments
     */
    static Piece sum(double lower, double upper, double[] weights, List<Segment> segments) {
        double[] c = new double[PowerSegment.POWERS];
        double h = 0;
        double s = 0;
        double[] extra = new double[2];
        boolean analytic = true;
        for (int i = 0; i < weights.length; i++) {
            if (segments.get(i) instanceof PowerSegment power) {
                double[] one = power.coefficients();
                for (int k = 0; k < c.length; k++) {
                    c[k] += weights[i] * one[k];
                }
                h += weights[i] * one[PowerSegment.POWERS];
                s += weights[i] * one[PowerSegment.POWERS + 1];
            } else if (segments.get(i) instanceof TableSegment table) {
                double[] one = table.between((lower + upper) / 2);
                c[CONSTANT] += weights[i] * one[0];
                c[LINEAR] += weights[i] * one[1];
                h += weights[i] * one[2];
                extra[0] += weights[i] * one[3];
                s += weights[i] * one[4];
                extra[1] += weights[i] * one[5];
                analytic = false;
            }
        }
        return new Piece(lower, upper, c, h, s, extra, analytic);
    }

    double lower() {
        return lower;
    }

    double upper() {
        return upper;
    }

    /** Whether no table takes part, so that enthalpy and entropy are the exact integrals of the heat capacity. */
    boolean analytic() {
        return analytic;
    }

    /** {@code ΔCp T²} as a polynomial in T, constant first. */
    double[] heatCapacityPolynomial() {
        return c.clone();
    }

    double heatCapacity(double kelvin) {
        double t = kelvin;
        double inverse = 1 / t;
        return (c[0] * inverse + c[1]) * inverse + c[2] + t * (c[3] + t * (c[4] + t * (c[5] + t * c[6])));
    }

    double enthalpy(double kelvin) {
        double t = kelvin;
        double logarithm = c[1] == 0 ? 0 : c[1] * StrictMath.log(t);
        return h
                - c[0] / t
                + logarithm
                + t * (ofEnthalpy + t * (c[3] / 2 + t * (c[4] / 3 + t * (c[5] / 4 + t * (c[6] / 5)))));
    }

    double entropy(double kelvin) {
        double t = kelvin;
        double inverse = 1 / t;
        return s
                - (c[0] * inverse / 2 + c[1]) * inverse
                + c[2] * StrictMath.log(t)
                + t * (ofEntropy + t * (c[4] / 2 + t * (c[5] / 3 + t * (c[6] / 4))));
    }
}
