package org.saddlebook.estimation.api;

import org.saddlebook.estimation.internal.Design;
import org.saddlebook.estimation.internal.Inputs;
import org.saddlebook.estimation.internal.LinearSolution;
import org.saddlebook.estimation.internal.LinearSolver;

/**
 * Weighted linear least squares: the b that makes {@code sum w (y - X b)^2} smallest.
 *
 * <p>Householder QR with scaled and pivoted columns (Businger &amp; Golub 1965), never the normal equations. When the
 * condition number and the residual (Björck 1967: error about {@code eps (cond + cond^2 |r| / (|X| |b|))}) put the ninth
 * digit in doubt, or the weights differ by more than 1e8, the factorisation is repeated in double-double arithmetic
 * (about 31 digits), which keeps parameters, residual and covariance alike; refinement would mend the parameters only.
 */
public final class LinearLeastSquares {
    private LinearLeastSquares() {}

    /**
     * Fits {@code y = X b}.
     *
     * @param design n rows of p numbers, p at least one; used as the exact numbers they are
     * @param response n numbers
     * @param weightsOrNull n weights multiplying the squared residuals, each at least zero; zero excludes the observation;
     *     null means all one
     * @return the fit, or why the data do not determine it
     * @throws IllegalArgumentException on NaN, infinite or over-large numbers, negative weights, and lengths that disagree
     */
    public static LinearOutcome fit(double[][] design, double[] response, double[] weightsOrNull) {
        return outcome(
                Design.of(design),
                Inputs.response(response, design.length),
                Inputs.weights(weightsOrNull, design.length));
    }

    /**
     * Fits {@code y = b0 + b1 x + ... + bd x^d}. The powers are carried in double-double: rounding them to double, as a
     * caller of {@link #fit} must, alone costs the parameters as many digits as the condition number has.
     *
     * @param abscissae n numbers x
     * @param degree d, at least zero
     * @param response n numbers
     * @param weightsOrNull as in {@link #fit}
     * @return the fit with d + 1 parameters, the constant first, or why the data do not determine it
     * @throws IllegalArgumentException as {@link #fit}
     */
    public static LinearOutcome fitPolynomial(
            double[] abscissae, int degree, double[] response, double[] weightsOrNull) {
        return outcome(
                Design.polynomial(abscissae, degree),
                Inputs.response(response, abscissae.length),
                Inputs.weights(weightsOrNull, abscissae.length));
    }

    private static LinearOutcome outcome(Design design, double[] response, double[] weightsOrNull) {
        LinearSolution solution = LinearSolver.solve(design, response, weightsOrNull);
        if (solution.rank() < design.columns()) {
            return new RankDeficient(solution.rank(), design.columns(), solution.deficiency());
        }
        return new LinearFit(solution);
    }
}
