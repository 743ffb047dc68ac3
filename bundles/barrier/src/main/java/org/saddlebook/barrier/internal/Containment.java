package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.estimation.api.LinearLeastSquares;
import org.saddlebook.estimation.api.NonlinearFit;

/**
 * Finds out by trial whether one law is a special case of another: the larger law is fitted to the curve of the smaller
 * one at the measured temperatures. When it reproduces it, the value its extra parameter takes there is the one at which
 * the two coincide (0 for the Arrhenius law in the modified one, 1 for the Eyring law at a standard concentration).
 */
final class Containment {
    /** Largest difference in ln k that counts as the same curve: far below any scatter, far above rounding. */
    private static final double SAME_CURVE = 1e-7;

    private Containment() {}

    /** The value of the larger law's extra parameter at which it is the smaller law; empty when it never is. */
    static OptionalDouble valueAt(FittedLaw smaller, FittedLaw larger) {
        int extra = larger.extraParameter();
        int p = larger.fit().parameterCount();
        if (extra < 0 || p != smaller.fit().parameterCount() + 1) {
            return OptionalDouble.empty();
        }
        Measurements data = larger.data();
        if (!larger.law().linear()) {
            return bySearch(smaller, larger, extra);
        }
        double[][] design = new double[data.size()][p];
        double[] response = new double[data.size()];
        double[] zero = new double[p];
        double[] unused = new double[smaller.fit().parameterCount()];
        for (int i = 0; i < response.length; i++) {
            double offset = data.lnRate(larger.law(), i, zero.clone(), design[i]);
            response[i] = data.lnRate(smaller.law(), i, smaller.fit().parameters(), unused) - offset;
        }
        return LinearLeastSquares.fit(design, response, null)
                .fold(
                        fit -> {
                            for (double residual : fit.residuals()) {
                                if (!(Math.abs(residual) < SAME_CURVE)) {
                                    return OptionalDouble.empty();
                                }
                            }
                            return OptionalDouble.of(fit.parameters()[extra]);
                        },
                        deficient -> OptionalDouble.empty());
    }

    /** The same for a law that is not linear: a search from its own starts with the extra parameter at its neutral value. */
    private static OptionalDouble bySearch(FittedLaw smaller, FittedLaw larger, int extra) {
        Measurements data = larger.data();
        double[] curve = new double[data.size()];
        for (int i = 0; i < curve.length; i++) {
            curve[i] = data.lnRate(
                    smaller.law(),
                    i,
                    smaller.fit().parameters(),
                    new double[smaller.fit().parameterCount()]);
        }
        double neutral = larger.parameters().get(extra).neutral().orElseThrow();
        List<double[]> starts = new ArrayList<>();
        for (double[] start : larger.law().starts(data.kelvin(), data.conditions(), curve)) {
            start[extra] = neutral;
            starts.add(start);
        }
        Optional<NonlinearFit> found = NonlinearFitter.reproduce(larger.law(), data, curve, starts);
        if (found.isEmpty()) {
            return OptionalDouble.empty();
        }
        for (double residual : found.get().residuals()) {
            if (!(Math.abs(residual) < SAME_CURVE)) {
                return OptionalDouble.empty();
            }
        }
        return OptionalDouble.of(found.get().parameters()[extra]);
    }

    /** Whether two laws of equally many parameters are the same curve in other words: equal at every measured point. */
    static boolean sameCurve(FittedLaw one, FittedLaw other) {
        int p = one.fit().parameterCount();
        if (p != other.fit().parameterCount()) {
            return false;
        }
        Measurements data = one.data();
        // As many parameters as points: every law goes through all of them.
        if (data.distinctPoints() <= p) {
            return false;
        }
        for (int i = 0; i < data.size(); i++) {
            double difference = data.lnRate(one.law(), i, one.fit().parameters(), new double[p])
                    - data.lnRate(other.law(), i, other.fit().parameters(), new double[p]);
            if (!(Math.abs(difference) < SAME_CURVE)) {
                return false;
            }
        }
        return true;
    }

    /**
     * The largest difference in ln k between the laws at the targets, over all values of the extra parameter inside its
     * interval, the other parameters following it.
     */
    static double largestDifference(FittedLaw smaller, FittedLaw larger, double halfWidth, List<Double> targets) {
        int extra = larger.extraParameter();
        double[] axis = new double[larger.fit().parameterCount()];
        axis[extra] = 1;
        double own = larger.fit().predictionVariance(axis);
        double largest = 0;
        for (double kelvin : targets) {
            double[] gradient = new double[axis.length];
            double middle = larger.law().lnRate(kelvin, larger.fit().parameters(), gradient)
                    - smaller.lnRate(kelvin).value();
            // Along the ridge ln k is linear in the extra parameter, so its extremes lie at the ends.
            double slope = larger.fit().predictionCovariance(gradient, axis) / own;
            double difference = Math.abs(middle) + Math.abs(slope * halfWidth);
            // A law that has no value at a target differs there from one that has.
            largest = Math.max(largest, Double.isNaN(difference) ? Double.POSITIVE_INFINITY : difference);
        }
        return largest;
    }
}
