package org.saddlebook.barrier.internal;

import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.estimation.api.ChiSquared;
import org.saddlebook.estimation.api.Fit;
import org.saddlebook.estimation.api.InformationCriteria;

/**
 * Statistics of one fit. Criteria: with an estimated scale K counts the parameters and sigma, and −2 ln L is that of the
 * normal law at its maximum; with stated errors K counts the parameters and chi-squared takes the place of −2 ln L
 * (K. P. Burnham and D. R. Anderson, Model Selection and Multimodel Inference, 2nd ed., Springer 2002, sections 2.2 and
 * 2.4).
 *
 * @param law the fitted law
 */
record FitStatistics(FittedLaw law) {
    /** K: the number of estimated quantities. */
    int criterionParameters() {
        return law.fit().parameterCount() + (law.data().stated() ? 0 : 1);
    }

    /** The corrected Akaike criterion; empty for n at most K + 1, or without scatter. */
    OptionalDouble aicc() {
        OptionalDouble deviance = deviance();
        return deviance.isEmpty()
                ? deviance
                : InformationCriteria.aicc(
                        deviance.getAsDouble(), criterionParameters(), law.fit().observations());
    }

    /** The criterion of Schwarz; empty without scatter. */
    OptionalDouble bic() {
        OptionalDouble deviance = deviance();
        return deviance.isEmpty()
                ? deviance
                : OptionalDouble.of(InformationCriteria.bic(
                        deviance.getAsDouble(), criterionParameters(), law.fit().observations()));
    }

    /**
     * The statistics as a group.
     *
     * @param rateUnit unit that rss and s of a fit to k itself are given in
     */
    Node.Group node(Unit rateUnit) {
        Fit fit = law.fit();
        double unit = law.data().stated() || law.data().response() == Measurements.Response.LN_RATE
                ? 1
                : law.data().responseUnit() / rateUnit.factor();
        int dof = fit.degreesOfFreedom();
        Tree tree = new Tree()
                .put("n", fit.observations())
                .put("dof", dof)
                .put("rss", fit.residualSumOfSquares() * (unit * unit));
        if (law.data().stated()) {
            tree.put("chiSquared", fit.residualSumOfSquares());
            if (dof > 0) {
                tree.put("pValue", ChiSquared.upperTail(fit.residualSumOfSquares(), dof));
                tree.put("birgeRatio", Math.sqrt(fit.residualSumOfSquares() / dof));
            }
        } else if (dof > 0) {
            tree.put("s", Math.sqrt(fit.residualVariance()) * unit);
        }
        return tree.put("aicc", aicc())
                .put("bic", bic())
                .put("conditionNumber", OptionalDouble.of(fit.conditionNumber()))
                .group();
    }

    private OptionalDouble deviance() {
        double rss = law.fit().residualSumOfSquares();
        if (law.data().stated()) {
            return OptionalDouble.of(rss);
        }
        // A fit without scatter has no finite likelihood.
        return rss > 0 && law.fit().degreesOfFreedom() > 0
                ? OptionalDouble.of(
                        InformationCriteria.minusTwoLogLikelihood(rss, law.fit().observations()))
                : OptionalDouble.empty();
    }
}
