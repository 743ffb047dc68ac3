package org.saddlebook.tunnelling.internal;

/**
 * The thermal average of the transmission through an Eckart barrier. With energies divided by Boltzmann's constant (K):
 *
 * <pre>
 * κ(T) = ∫ P(E) exp(−(E − V1)/T) dE/T,   E from max(0, V1 − V2)
 * P(E) = 2 sinh A sinh B / (cosh(A + B) + cosh D)
 * A = 2 √(2π E/θ)/S,  B = 2 √(2π (E − V1 + V2)/θ)/S,  S = α1^(−1/2) + α2^(−1/2)
 * D = 2 √(α1 α2 − π²/4),  αi = 2π Vi/θ,  θ = h c ν̃/kB
 * </pre>
 *
 * where {@code cosh D} becomes {@code cos |D|} when the root is imaginary. P is that of Eckart with the difference of two
 * hyperbolic cosines written as a product, so that a small P keeps its digits. The slope is exact: {@code d ln κ/dT = (⟨E −
 * V1⟩/T − 1)/T}, the mean taken with the integrand as weight.
 *
 * <p>Sources: C. Eckart, Phys. Rev. 35 (1930) 1303; H. S. Johnston and J. Heicklen, J. Phys. Chem. 66 (1962) 532.
 */
final class EckartIntegral {
    /** ln κ and its derivative with respect to T. */
    record Value(double lnCoefficient, double slope) {}

    /** Energies above the barrier beyond which exp(−E/T) leaves nothing of a double, in units of T. */
    private static final double FAR = 45;

    /** Panels of the integral. Each holds a Gauss rule of {@link GaussLegendre}. */
    private static final int LEAST_PANELS = 24;

    private final double theta;
    private final double forward;
    private final double reverse;
    private final double scale;
    private final double lnTwiceCosh;
    private final double cosine;
    private final boolean oscillates;

    /**
     * For one barrier.
     *
     * @param theta {@code h c ν̃/kB}, K
     * @param forward height from the reactants divided by Boltzmann's constant, K
     * @param reverse height from the products divided by Boltzmann's constant, K
     */
    EckartIntegral(double theta, double forward, double reverse) {
        this.theta = theta;
        this.forward = forward;
        this.reverse = reverse;
        double alpha1 = 2 * Math.PI * forward / theta;
        double alpha2 = 2 * Math.PI * reverse / theta;
        scale = 2 * Math.sqrt(2 * Math.PI / theta) / (1 / Math.sqrt(alpha1) + 1 / Math.sqrt(alpha2));
        double square = alpha1 * alpha2 - Math.PI * Math.PI / 4;
        oscillates = square < 0;
        double d = 2 * Math.sqrt(Math.abs(square));
        cosine = oscillates ? StrictMath.cos(d) : 0;
        lnTwiceCosh = oscillates ? 0 : d + StrictMath.log1p(StrictMath.exp(-2 * d));
    }

    /** At a temperature, K. */
    Value at(double kelvin) {
        double threshold = Math.max(0, forward - reverse);
        double top = Math.sqrt(forward - threshold + FAR * kelvin);
        // The integrand changes over a part of θ below the top and over T above it: more panels for a barrier that is
        // high
        // against either. In the root of the energy above the threshold it has no corner there.
        double finest = Math.min(theta / 2, kelvin);
        int panels = (int) Math.min(2000, LEAST_PANELS + Math.ceil((forward - threshold) / finest));
        double width = top / panels;
        double largest = Double.NEGATIVE_INFINITY;
        double[] nodes = GaussLegendre.NODES;
        double[] weights = GaussLegendre.WEIGHTS;
        double[] logarithms = new double[panels * nodes.length];
        double[] energies = new double[logarithms.length];
        for (int i = 0; i < panels; i++) {
            for (int j = 0; j < nodes.length; j++) {
                double root = (i + 0.5 + 0.5 * nodes[j]) * width;
                double above = threshold + root * root - forward;
                int index = i * nodes.length + j;
                energies[index] = above / kelvin;
                logarithms[index] = lnProbability(threshold + root * root) - energies[index] + StrictMath.log(root);
                largest = Math.max(largest, logarithms[index]);
            }
        }
        double sum = 0;
        double mean = 0;
        for (int i = 0; i < panels; i++) {
            for (int j = 0; j < nodes.length; j++) {
                int index = i * nodes.length + j;
                double term = weights[j] * StrictMath.exp(logarithms[index] - largest);
                sum += term;
                mean += term * energies[index];
            }
        }
        // dE = 2 root d root; half a width for the interval −1 to 1 of the rule.
        double lnCoefficient = largest + StrictMath.log(sum * width / kelvin);
        return new Value(lnCoefficient, (mean / sum - 1) / kelvin);
    }

    /** ln P at an energy above the threshold, K; numerator and denominator are taken twice. */
    private double lnProbability(double energy) {
        double a = scale * Math.sqrt(energy);
        double b = scale * Math.sqrt(energy - forward + reverse);
        double numerator = a + b + lnOneMinusExp(-2 * a) + lnOneMinusExp(-2 * b);
        double sum = a + b;
        double lnTwiceSum = sum + StrictMath.log1p(StrictMath.exp(-2 * sum));
        if (oscillates) {
            double ratio = 2 * cosine * StrictMath.exp(-lnTwiceSum);
            return numerator - lnTwiceSum - StrictMath.log1p(ratio);
        }
        double larger = Math.max(lnTwiceSum, lnTwiceCosh);
        return numerator - larger - StrictMath.log1p(StrictMath.exp(Math.min(lnTwiceSum, lnTwiceCosh) - larger));
    }

    /** ln(1 − exp(x)) for a negative x, small or large. */
    private static double lnOneMinusExp(double x) {
        return StrictMath.log(-StrictMath.expm1(x));
    }
}
