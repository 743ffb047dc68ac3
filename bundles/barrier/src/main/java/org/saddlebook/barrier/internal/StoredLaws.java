package org.saddlebook.barrier.internal;

import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.FittedModel;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.barrier.api.FittedLaws;

/**
 * Predicts from fitted laws that were read back, so that an entry of years ago predicts without its measurements.
 *
 * @param laws the laws
 */
record StoredLaws(FittedLaws laws) {
    /** A law has no value at a temperature. */
    static final class NoValue extends IllegalArgumentException {
        private static final long serialVersionUID = 1L;

        private NoValue(String message) {
            super(message);
        }
    }

    /** Ids of the fitted laws, in order. */
    List<String> ids() {
        return laws.laws().stream().map(FittedLaws.FittedLawView::id).toList();
    }

    /**
     * One prediction row.
     *
     * @param model the installed model of this id
     * @throws Inapplicable when the installed model no longer takes this context
     * @throws IllegalArgumentException when its parameters are not those of the findings
     */
    Node.Group predict(String id, RateModel model, double kelvin) throws Inapplicable {
        FittedLaws.FittedLawView law = laws.law(id).orElseThrow();
        FittedModel fitted = law.fitted();
        RateFunction function = model.bind(fitted.context());
        List<String> symbols =
                function.parameters().stream().map(Parameter::symbol).toList();
        if (!symbols.equals(fitted.basis())) {
            throw new IllegalArgumentException("the installed model " + id + " has the parameters "
                    + String.join(", ", symbols) + ", the findings " + String.join(", ", fitted.basis()));
        }
        double[] gradient = new double[symbols.size()];
        double lnRate = function.lnRate(kelvin, fitted.values(), gradient);
        if (!function.defined(kelvin, fitted.values()) || !Double.isFinite(lnRate)) {
            throw new NoValue(law.title() + " has no value at " + Words.kelvin(kelvin));
        }
        double shared = 0;
        double along = 0;
        for (Node each : law.sharedErrors()) {
            SharedShift shift = SharedShift.read((Node.Group) each);
            double effect = shift.onLnRate(function, fitted.values(), gradient, kelvin, laws.targetOnSameSensor());
            shared += effect * effect;
            along += shift.along(gradient) * shift.along(gradient);
        }
        OptionalDouble variance = OptionalDouble.empty();
        if (fitted.hasCovariance()) {
            // The stored covariance includes the shared errors; what remains is that of the single runs.
            double[][] covariance = fitted.covariance();
            double sum = -along;
            for (int i = 0; i < gradient.length; i++) {
                for (int j = 0; j < gradient.length; j++) {
                    sum += gradient[i] * covariance[i][j] * gradient[j];
                }
            }
            // Rounding in nearly cancelling products can leave a tiny negative number.
            variance = OptionalDouble.of(Math.max(0, sum));
        }
        return new Predictions(
                        laws.context().rateUnit(),
                        laws.lowestKelvin(),
                        laws.highestKelvin(),
                        laws.level(),
                        laws.targetOnSameSensor())
                .row(
                        kelvin,
                        id,
                        new FittedLaw.Estimate(lnRate, variance, shared),
                        law.newRun(),
                        BothErrorsFitter.slope(function, kelvin, fitted.values()),
                        fitted.degreesOfFreedom(),
                        laws.stated());
    }
}
