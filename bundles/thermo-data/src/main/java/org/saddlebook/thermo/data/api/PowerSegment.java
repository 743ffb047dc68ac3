package org.saddlebook.thermo.data.api;

import java.util.Arrays;
import org.saddlebook.api.quantity.Constants;

/**
 * A heat capacity that is a sum of powers of temperature, with the integrals that follow:
 *
 * <pre>
 * Cp = c0/T² + c1/T + c2 + c3 T + c4 T² + c5 T³ + c6 T⁴
 * H  = h − c0/T + c1 ln T + c2 T + c3 T²/2 + c4 T³/3 + c5 T⁴/4 + c6 T⁵/5
 * S  = s − c0/(2T²) − c1/T + c2 ln T + c3 T + c4 T²/2 + c5 T³/3 + c6 T⁴/4
 * </pre>
 *
 * Shomate, NASA 7 and NASA 9 coefficients and a constant heat capacity are cases of it; the factories rescale them.
 */
public final class PowerSegment implements Segment {
    /** Number of coefficients of the heat capacity. */
    public static final int POWERS = 7;

    private static final double LN_1000 = StrictMath.log(1000);

    private final double lower;
    private final double upper;
    private final double[] c;
    private final double h;
    private final double s;

    /**
     * A segment.
     *
     * @param lowerKelvin lower end of validity, above 0 K
     * @param upperKelvin upper end, not below the lower
     * @param heatCapacity c0 to c6, J/(mol K) and powers of K
     * @param enthalpyConstant h, J/mol
     * @param entropyConstant s, J/(mol K)
     */
    public PowerSegment(
            double lowerKelvin,
            double upperKelvin,
            double[] heatCapacity,
            double enthalpyConstant,
            double entropyConstant) {
        if (!(lowerKelvin > 0 && upperKelvin >= lowerKelvin && upperKelvin < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("not a range of temperatures: " + lowerKelvin + " to " + upperKelvin);
        }
        if (heatCapacity.length != POWERS) {
            throw new IllegalArgumentException("needs 7 coefficients, has " + heatCapacity.length);
        }
        double sum = enthalpyConstant + entropyConstant;
        for (double coefficient : heatCapacity) {
            sum += coefficient;
        }
        if (!Double.isFinite(sum)) {
            throw new IllegalArgumentException("coefficients must be finite");
        }
        lower = lowerKelvin;
        upper = upperKelvin;
        c = heatCapacity.clone();
        h = enthalpyConstant;
        s = entropyConstant;
    }

    /**
     * A segment from values at 298.15 K and a heat capacity.
     *
     * @param heatCapacity c0 to c6 as above
     * @param enthalpy ΔfH°(298.15 K), J/mol
     * @param entropy S°(298.15 K), J/(mol K)
     */
    public static PowerSegment from298(
            double lowerKelvin, double upperKelvin, double[] heatCapacity, double enthalpy, double entropy) {
        PowerSegment bare = new PowerSegment(lowerKelvin, upperKelvin, heatCapacity, 0, 0);
        double t = Constants.REFERENCE_KELVIN;
        return new PowerSegment(
                lowerKelvin, upperKelvin, heatCapacity, enthalpy - bare.enthalpy(t), entropy - bare.entropy(t));
    }

    /**
     * Shomate coefficients: with t = T/(1000 K), {@code Cp = A + B t + C t² + D t³ + E/t²}, {@code H = 1000 (A t + B t²/2 +
     * C t³/3 + D t⁴/4 − E/t + F)}, {@code S = A ln t + B t + C t²/2 + D t³/3 − E/(2t²) + G}, in J, mol and K (NIST Chemistry
     * WebBook, SRD 69; after C. H. Shomate, J. Phys. Chem. 58 (1954) 368).
     *
     * @param coefficients A to G; H, which only repeats the enthalpy of formation, is not needed
     */
    public static PowerSegment shomate(double lowerKelvin, double upperKelvin, double[] coefficients) {
        if (coefficients.length != 7) {
            throw new IllegalArgumentException("needs A to G, has " + coefficients.length + " coefficients");
        }
        double[] a = coefficients;
        return new PowerSegment(
                lowerKelvin,
                upperKelvin,
                new double[] {a[4] * 1e6, 0, a[0], a[1] * 1e-3, a[2] * 1e-6, a[3] * 1e-9, 0},
                1000 * a[5],
                a[6] - a[0] * LN_1000);
    }

    /**
     * NASA 7 coefficients: {@code Cp/R = a1 + a2 T + a3 T² + a4 T³ + a5 T⁴}, a6 of H/R, a7 of S/R (S. Gordon and B. J.
     * McBride, NASA SP-273, 1971).
     *
     * @param coefficients a1 to a7
     */
    public static PowerSegment nasa7(double lowerKelvin, double upperKelvin, double[] coefficients) {
        if (coefficients.length != 7) {
            throw new IllegalArgumentException("needs a1 to a7, has " + coefficients.length + " coefficients");
        }
        double r = Constants.GAS;
        double[] a = coefficients;
        return new PowerSegment(
                lowerKelvin,
                upperKelvin,
                new double[] {0, 0, r * a[0], r * a[1], r * a[2], r * a[3], r * a[4]},
                r * a[5],
                r * a[6]);
    }

    /**
     * NASA 9 coefficients: {@code Cp/R = a1/T² + a2/T + a3 + a4 T + a5 T² + a6 T³ + a7 T⁴}, b1 of H/R, b2 of S/R (B. J.
     * McBride, M. J. Zehe, S. Gordon, NASA TP-2002-211556).
     *
     * @param coefficients a1 to a7, b1, b2
     */
    public static PowerSegment nasa9(double lowerKelvin, double upperKelvin, double[] coefficients) {
        if (coefficients.length != POWERS + 2) {
            throw new IllegalArgumentException("needs a1 to a7, b1, b2, has " + coefficients.length);
        }
        double[] scaled = new double[POWERS + 2];
        for (int i = 0; i < scaled.length; i++) {
            scaled[i] = Constants.GAS * coefficients[i];
        }
        return new PowerSegment(
                lowerKelvin, upperKelvin, Arrays.copyOf(scaled, POWERS), scaled[POWERS], scaled[POWERS + 1]);
    }

    @Override
    public double lowerKelvin() {
        return lower;
    }

    @Override
    public double upperKelvin() {
        return upper;
    }

    /** c0 to c6, h and s: nine numbers, so that reactions can add them. */
    public double[] coefficients() {
        double[] all = Arrays.copyOf(c, POWERS + 2);
        all[POWERS] = h;
        all[POWERS + 1] = s;
        return all;
    }

    @Override
    public double heatCapacity(double kelvin) {
        double t = kelvin;
        double inverse = 1 / t;
        return (c[0] * inverse + c[1]) * inverse + c[2] + t * (c[3] + t * (c[4] + t * (c[5] + t * c[6])));
    }

    @Override
    public double enthalpy(double kelvin) {
        double t = kelvin;
        double logarithm = c[1] == 0 ? 0 : c[1] * StrictMath.log(t);
        return h
                - c[0] / t
                + logarithm
                + t * (c[2] + t * (c[3] / 2 + t * (c[4] / 3 + t * (c[5] / 4 + t * (c[6] / 5)))));
    }

    @Override
    public double entropy(double kelvin) {
        double t = kelvin;
        double inverse = 1 / t;
        return s
                - (c[0] * inverse / 2 + c[1]) * inverse
                + c[2] * StrictMath.log(t)
                + t * (c[3] + t * (c[4] / 2 + t * (c[5] / 3 + t * (c[6] / 4))));
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof PowerSegment p
                && lower == p.lower
                && upper == p.upper
                && Arrays.equals(coefficients(), p.coefficients());
    }

    @Override
    public int hashCode() {
        return Arrays.hashCode(coefficients());
    }
}
