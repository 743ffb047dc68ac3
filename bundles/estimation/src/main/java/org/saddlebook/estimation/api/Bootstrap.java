package org.saddlebook.estimation.api;

import java.util.List;
import org.saddlebook.estimation.internal.Chunks;
import org.saddlebook.estimation.internal.Inputs;
import org.saddlebook.estimation.internal.LinearBootstrap;
import org.saddlebook.estimation.internal.NonlinearBootstrap;

/**
 * Bootstrap resampling of a fit. Seeded by named streams, one for each few hundred resamples: the result is the same on any
 * number of threads.
 */
public final class Bootstrap {
    private Bootstrap() {}

    /**
     * Resamples a linear fit.
     *
     * @param kind what is drawn anew
     * @param design as in {@link LinearLeastSquares#fit}
     * @param response as there
     * @param weightsOrNull as there
     * @param options how much
     * @param streams random numbers
     * @return the resamples, or why there are none: the fit is not determined, or passes through every point
     */
    public static ResampleOutcome linear(
            BootstrapKind kind,
            double[][] design,
            double[] response,
            double[] weightsOrNull,
            ResampleOptions options,
            RandomStreams streams) {
        LinearOutcome outcome = LinearLeastSquares.fit(design, response, weightsOrNull);
        if (outcome instanceof RankDeficient deficient) {
            return new NotResampled(deficient.reason());
        }
        LinearFit fit = (LinearFit) outcome;
        NotResampled refusal = refusal(kind, fit);
        if (refusal != null) {
            return refusal;
        }
        LinearBootstrap bootstrap = new LinearBootstrap(fit, design, response, weightsOrNull);
        if (kind == BootstrapKind.RESIDUAL && !bootstrap.hasResiduals()) {
            return new NotResampled("the fit passes through every point whatever it is: there is no residual to draw");
        }
        return run(kind, fit, bootstrap.work(kind, deviation(kind, fit)), bootstrap.jackknife(), options, streams);
    }

    /**
     * Resamples a non-linear fit by refitting from its estimate.
     *
     * @param kind what is drawn anew
     * @param fit the fit
     * @param function the response, as fitted; with {@link ResampleOptions#parallel()} safe to call from several threads
     * @param response observed values, as fitted
     * @param weightsOrNull weights, as fitted
     * @param search bounds, limits and check of each refit
     * @param options how much
     * @param streams random numbers
     * @return the resamples; refits that do not converge are drawn again and counted
     */
    public static ResampleOutcome nonlinear(
            BootstrapKind kind,
            NonlinearFit fit,
            ResponseFunction function,
            double[] response,
            double[] weightsOrNull,
            NonlinearOptions search,
            ResampleOptions options,
            RandomStreams streams) {
        NotResampled refusal = refusal(kind, fit);
        if (refusal != null) {
            return refusal;
        }
        int n = function.observations();
        NonlinearOptions quick = search.withThorough(false);
        double[] start = fit.parameters();
        NonlinearBootstrap.Refit refit =
                (values, weights) -> NonlinearLeastSquares.fit(function, values, weights, List.of(start), quick)
                                instanceof NonlinearFit found
                        ? found.parameters()
                        : null;
        NonlinearBootstrap bootstrap =
                new NonlinearBootstrap(fit, Inputs.response(response, n), Inputs.weights(weightsOrNull, n), refit);
        if (kind == BootstrapKind.RESIDUAL && !bootstrap.hasResiduals()) {
            return new NotResampled("the fit passes through every point whatever it is: there is no residual to draw");
        }
        return run(kind, fit, bootstrap.work(kind, deviation(kind, fit)), bootstrap.jackknife(), options, streams);
    }

    private static NotResampled refusal(BootstrapKind kind, Fit fit) {
        boolean needsFreedom = kind == BootstrapKind.RESIDUAL || kind == BootstrapKind.PARAMETRIC_ESTIMATED;
        return needsFreedom && fit.degreesOfFreedom() == 0
                ? new NotResampled("no degree of freedom is left: the residuals say nothing of the scatter")
                : null;
    }

    private static double deviation(BootstrapKind kind, Fit fit) {
        return kind == BootstrapKind.PARAMETRIC_ESTIMATED ? Math.sqrt(fit.residualVariance()) : 1;
    }

    private static ResampleOutcome run(
            BootstrapKind kind,
            Fit fit,
            Chunks.Work work,
            double[] jackknife,
            ResampleOptions options,
            RandomStreams streams) {
        double[] values = new double[options.resamples() * fit.parameterCount()];
        long redrawn = Chunks.run(options, streams, kind.id(), values, work);
        return redrawn < 0
                ? new NotResampled("hardly any sample of the observations determines the parameters")
                : new Resamples(fit.parameters(), values, jackknife, redrawn);
    }
}
