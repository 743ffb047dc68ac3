/**
 * Least squares a reviewer can trust: estimates, covariances, quantiles and confidence sets, to known digits and the same
 * bits on every machine. Knows nothing of chemistry and uses no other bundle.
 *
 * <p><b>Start here.</b> {@link org.saddlebook.estimation.api.LinearLeastSquares} when the response is linear in the
 * parameters, {@link org.saddlebook.estimation.api.NonlinearLeastSquares} when it is not. Both return a sealed outcome:
 * the fit, or a named reason why there is none; data never cause an exception, only input that no data file can hold (NaN,
 * negative weights, lengths that disagree) does, as an {@link java.lang.IllegalArgumentException} naming place and value.
 * Whatever the kind, a {@link org.saddlebook.estimation.api.Fit} answers the same questions.
 *
 * <pre>{@code
 * LinearOutcome outcome = LinearLeastSquares.fit(new double[][] {{1, 0}, {1, 1}, {1, 2}, {1, 3}},
 *         new double[] {1, 3, 4, 4}, null);
 * if (outcome instanceof LinearFit fit) {
 *     double t = StudentT.quantile(0.975, fit.degreesOfFreedom());
 *     double half = t * Math.sqrt(fit.residualVariance() * fit.unscaledCovariance()[1][1]);
 *     System.out.println("slope " + fit.parameters()[1] + " +/- " + half);
 * }
 * }</pre>
 *
 * <p><b>Weights and scale.</b> A weight multiplies a squared residual. With weights of one over a stated variance,
 * {@code unscaledCovariance()} is the covariance, the residual sum of squares is a chi-squared and quantiles are
 * {@link org.saddlebook.estimation.api.Normal}'s. With weights known up to a factor, multiply by
 * {@code residualVariance()} and take the quantiles of {@link org.saddlebook.estimation.api.StudentT}. The engine never
 * chooses between the two.
 *
 * <p><b>Errors in both variables.</b> {@link org.saddlebook.estimation.api.OrthogonalRegression}. <b>Outliers.</b>
 * {@link org.saddlebook.estimation.api.RobustRegression}, beside the ordinary fit. <b>Blocks.</b>
 * {@link org.saddlebook.estimation.api.BlockRegression}. <b>Residuals.</b>
 * {@link org.saddlebook.estimation.api.Diagnostics} and {@link org.saddlebook.estimation.api.LackOfFit}.
 *
 * <p><b>Intervals.</b> {@link org.saddlebook.estimation.api.StudentT} times a standard error;
 * {@link org.saddlebook.estimation.api.ProfileLikelihood} where the response is curved;
 * {@link org.saddlebook.estimation.api.MonteCarlo} and {@link org.saddlebook.estimation.api.Bootstrap} for anything computed
 * from the parameters; {@link org.saddlebook.estimation.api.JointRegion} for two at once. How often each holds the truth is
 * measured and printed in the bundle's README. {@link org.saddlebook.estimation.api.Scale} says which quantile belongs.
 *
 * <p><b>Ratios.</b> {@link org.saddlebook.estimation.api.Fieller} gives the set of ratios the data allow, whatever its
 * kind. <b>Comparison.</b> {@link org.saddlebook.estimation.api.InformationCriteria} and
 * {@link org.saddlebook.estimation.api.FisherF}.
 *
 * <p><b>Same bits everywhere.</b> Elementary functions are those of {@link java.lang.StrictMath}, sums run in a fixed
 * order, random numbers come from named streams, and threads, used only when asked for, decide nothing. Everything returned is immutable and thread-safe.
 */
@Export
@Version("1.0.0")
package org.saddlebook.estimation.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
