package org.saddlebook.data.checks.internal;

import org.saddlebook.api.quantity.Constants;

/**
 * How well rows are explained: the probability density of their ln k when a straight or a gently curved law holds with a
 * scatter of unknown size, with everything unknown integrated out (Jeffreys, Theory of Probability, 3rd ed. 1961, ch. V).
 *
 * <p>ln k = a + b/T + γ w(T) + error, a and b flat, {@code w(T) = (300 J/(mol K)/R)(ln(T/Tc) + Tc/T − 1)} the shape that a
 * heat capacity of activation gives, γ normal (standard deviations 0, 0.5 and 2 with shares 0.5, 0.3 and 0.2), the scatter
 * log-normal around 3 % (where uncertainties are stated: around them). With the line projected out, of n − 2 numbers
 * remains the length, and the integral over γ is closed: {@code σ^-(n-2) (1+τ²W/σ²)^(-1/2) exp(−(A − τ²B²/(σ²+τ²W))/(2σ²))},
 * A = |y'|², B = w'·y', W = |w'|².
 */
final class Evidence {
    private static final double[] CURVATURE = {0, 0.5, 2};
    private static final double[] CURVATURE_SHARE = {0.5, 0.3, 0.2};
    private static final double CURVATURE_UNIT = 300 / Constants.GAS;
    private static final int GRID = 24;
    private static final double[] LN_SCATTER = new double[GRID];
    private static final double[] LN_PRIOR = new double[GRID];
    private static final double[] VARIANCE = new double[GRID];

    /** Typical scatter of rate constants, relative, and the spread of its logarithm (common practice, no source). */
    private static final double TYPICAL = 0.03;

    private static final double SPREAD = 0.9;

    /** Rounding alone leaves this much, ln. */
    private static final double SMALLEST = 0.001;

    private static final double LARGEST = 0.6;

    static {
        double low = StrictMath.log(SMALLEST / TYPICAL);
        double high = StrictMath.log(LARGEST / TYPICAL);
        double total = 0;
        for (int i = 0; i < GRID; i++) {
            LN_SCATTER[i] = low + (high - low) * i / (GRID - 1);
            LN_PRIOR[i] = -0.5 * LN_SCATTER[i] * LN_SCATTER[i] / (SPREAD * SPREAD);
            VARIANCE[i] = StrictMath.exp(2 * LN_SCATTER[i]);
            total += StrictMath.exp(LN_PRIOR[i]);
        }
        for (int i = 0; i < GRID; i++) {
            LN_PRIOR[i] -= StrictMath.log(total);
        }
    }

    private final int n;
    private final double[] weight;
    private final double[] first;
    private final double[] second;
    private final double[] curve;
    private final double curveSquared;
    private final double lnDeterminant;

    /** For each scatter and curvature: what does not depend on the values, and the factors of A and B². */
    private final double[] constant = new double[GRID * CURVATURE.length];

    private final double[] ofSquared = new double[GRID * CURVATURE.length];
    private final double[] ofAlong = new double[GRID * CURVATURE.length];
    private double floor = Double.NEGATIVE_INFINITY;

    /**
     * Evidence for rows at these temperatures.
     *
     * @param kelvin temperatures, K
     * @param lnUncertaintyOrNull stated relative uncertainties; null for an unknown scatter
     */
    Evidence(double[] kelvin, double[] lnUncertaintyOrNull) {
        n = kelvin.length;
        weight = new double[n];
        double centre = 0;
        for (int i = 0; i < n; i++) {
            weight[i] = lnUncertaintyOrNull == null ? 1 : 1 / lnUncertaintyOrNull[i];
            centre += 1 / kelvin[i];
        }
        centre = n / centre;
        double scale = lnUncertaintyOrNull == null ? TYPICAL : 1;
        first = weight.clone();
        double firstLength = normalise(first);
        second = new double[n];
        curve = new double[n];
        for (int i = 0; i < n; i++) {
            second[i] = weight[i] * (1 / kelvin[i] - 1 / centre);
            curve[i] = weight[i] * CURVATURE_UNIT * (StrictMath.log(kelvin[i] / centre) + centre / kelvin[i] - 1);
        }
        remove(second, first);
        double secondLength = normalise(second);
        remove(curve, first);
        remove(curve, second);
        curveSquared = dot(curve, curve);
        lnDeterminant = StrictMath.log(firstLength * secondLength);
        prepare(scale);
    }

    private void prepare(double scale) {
        double lnScale = StrictMath.log(scale);
        for (int i = 0; i < GRID; i++) {
            double lnSigma = LN_SCATTER[i] + lnScale;
            double variance = VARIANCE[i] * scale * scale;
            for (int j = 0; j < CURVATURE.length; j++) {
                double tau2 = CURVATURE[j] * CURVATURE[j];
                int at = i * CURVATURE.length + j;
                constant[at] = LN_PRIOR[i]
                        + StrictMath.log(CURVATURE_SHARE[j])
                        - (n - 2) * lnSigma
                        - (tau2 == 0 ? 0 : 0.5 * StrictMath.log1p(tau2 * curveSquared / variance));
                ofSquared[at] = 0.5 / variance;
                ofAlong[at] = tau2 / (variance + tau2 * curveSquared);
            }
        }
    }

    /** Densities this far below a value need not be exact: they are answered by their largest term. */
    void negligibleBelow(double lnDensity) {
        floor = lnDensity - 30;
    }

    /** Whether the temperatures differ at all. */
    boolean usable() {
        return n > 2 && Double.isFinite(lnDeterminant);
    }

    /** Weighted values with the straight line taken out. */
    double[] project(double[] values) {
        double[] projected = new double[n];
        for (int i = 0; i < n; i++) {
            projected[i] = values[i] * weight[i];
        }
        remove(projected, first);
        remove(projected, second);
        return projected;
    }

    /** {@code w'·y'}. */
    double alongCurve(double[] projected) {
        return dot(curve, projected);
    }

    /**
     * ln of the density, without a constant that is common to all explanations of these rows.
     *
     * @param squared A
     * @param along B
     */
    double ln(double squared, double along) {
        double best = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < constant.length; i++) {
            best = Math.max(best, term(i, squared, along));
        }
        if (best - lnDeterminant < floor) {
            return best - lnDeterminant;
        }
        double sum = 0;
        for (int i = 0; i < constant.length; i++) {
            sum += StrictMath.exp(term(i, squared, along) - best);
        }
        return best + StrictMath.log(sum) - lnDeterminant;
    }

    private double term(int i, double squared, double along) {
        return constant[i] - ofSquared[i] * Math.max(0, squared - ofAlong[i] * along * along);
    }

    static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    private static double normalise(double[] vector) {
        double length = Math.sqrt(dot(vector, vector));
        for (int i = 0; i < vector.length; i++) {
            vector[i] /= length;
        }
        return length;
    }

    private static void remove(double[] vector, double[] direction) {
        double along = dot(vector, direction);
        for (int i = 0; i < vector.length; i++) {
            vector[i] -= along * direction[i];
        }
    }
}
