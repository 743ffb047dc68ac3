package org.saddlebook.barrier.internal;

import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.barrier.api.NewRun;
import org.saddlebook.estimation.api.Fit;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentPlusNormal;
import org.saddlebook.estimation.api.StudentT;

/**
 * A law with its estimates.
 *
 * @param id id of the rate model
 * @param title name of the law
 * @param law the bound law
 * @param fit estimates in the form handed to the law
 * @param data what it was fitted to
 * @param shared how errors common to all runs shift the estimates; empty when none is stated
 */
record FittedLaw(String id, String title, RateFunction law, Fit fit, Measurements data, List<SharedShift> shared)
        implements LawOutcome {
    /**
     * A number with its variances.
     *
     * @param value the number
     * @param variance its variance from the scatter or the stated errors of single runs; absent when their scale is
     *     unknown
     * @param sharedVariance its variance from errors common to all runs; 0 when none is stated
     */
    record Estimate(double value, OptionalDouble variance, double sharedVariance) {
        /** Half the width of its interval; the variance must be present. */
        double halfWidth(double level, OptionalDouble degreesOfFreedom) {
            double own = variance.orElseThrow();
            if (degreesOfFreedom.isEmpty()) {
                return quantile(level, degreesOfFreedom) * Math.sqrt(own + sharedVariance);
            }
            return StudentPlusNormal.quantile(
                    0.5 + level / 2, Math.sqrt(own), degreesOfFreedom.getAsDouble(), Math.sqrt(sharedVariance));
        }

        /** Its standard uncertainty; the variance must be present. */
        double standardUncertainty() {
            return Math.sqrt(variance.orElseThrow() + sharedVariance);
        }
    }

    FittedLaw {
        shared = List.copyOf(shared);
    }

    /** The same with errors common to all runs. */
    FittedLaw withShared(List<SharedShift> shifts) {
        return new FittedLaw(id, title, law, fit, data, shifts);
    }

    /** The variance of an observation of weight one: 1 for stated errors, else estimated; absent without a degree of freedom. */
    OptionalDouble scale() {
        if (data.stated()) {
            return OptionalDouble.of(1);
        }
        return fit.degreesOfFreedom() > 0 ? OptionalDouble.of(fit.residualVariance()) : OptionalDouble.empty();
    }

    /** Degrees of freedom of the scale; empty for stated errors, whose quantiles are normal. */
    OptionalDouble degreesOfFreedom() {
        return data.stated() ? OptionalDouble.empty() : OptionalDouble.of(fit.degreesOfFreedom());
    }

    /** The two-sided quantile of the level: normal for stated errors, else t. */
    double quantile(double level) {
        return quantile(level, degreesOfFreedom());
    }

    static double quantile(double level, OptionalDouble degreesOfFreedom) {
        double probability = 0.5 + level / 2;
        return degreesOfFreedom.isPresent()
                ? StudentT.quantile(probability, degreesOfFreedom.getAsDouble())
                : Normal.quantile(probability);
    }

    /** The word for the quantile in intervals. */
    String method() {
        return method(degreesOfFreedom());
    }

    static String method(OptionalDouble degreesOfFreedom) {
        return degreesOfFreedom.isPresent() ? "t" : "normal";
    }

    List<Parameter> parameters() {
        return law.parameters();
    }

    /** The estimate of parameter i, in the form handed to the law. */
    Estimate parameter(int i) {
        double[] row = new double[fit.parameterCount()];
        row[i] = 1;
        return estimate(fit.parameters()[i], row);
    }

    /** Whether the law has a value at this temperature, K. */
    boolean defined(double kelvin) {
        double[] p = fit.parameters();
        return law.defined(kelvin, p) && Double.isFinite(law.lnRate(kelvin, p, new double[p.length]));
    }

    /** ln k in SI at a true temperature. */
    Estimate lnRate(double kelvin) {
        return lnRate(kelvin, false);
    }

    /**
     * ln k in SI at a target temperature.
     *
     * @param onSameSensor whether the temperature will be read on the thermometer of the measurements
     */
    Estimate lnRate(double kelvin, boolean onSameSensor) {
        double[] gradient = new double[fit.parameterCount()];
        double value = law.lnRate(kelvin, fit.parameters(), gradient);
        double variance = 0;
        for (SharedShift shift : shared) {
            double effect = shift.onLnRate(law, fit.parameters(), gradient, kelvin, onSameSensor);
            variance += effect * effect;
        }
        return new Estimate(value, scaled(fit.predictionVariance(gradient)), variance);
    }

    /** A derived quantity at a temperature, in SI or as a logarithm of it. */
    Estimate derived(Derived derived, double kelvin) {
        double[] gradient = new double[fit.parameterCount()];
        double value = derived.function().value(kelvin, fit.parameters(), gradient);
        return estimate(value, gradient);
    }

    /** How one more run would scatter about the law. */
    NewRun newRun() {
        if (data.stated()) {
            OptionalDouble kelvin = data.uncertainTemperatures()
                    ? OptionalDouble.of(data.typicalKelvinUncertainty())
                    : OptionalDouble.empty();
            return new NewRun(OptionalDouble.of(data.typicalRelativeUncertainty()), OptionalDouble.empty(), kelvin);
        }
        OptionalDouble scale = scale();
        if (scale.isEmpty()) {
            return NewRun.UNKNOWN;
        }
        double deviation = Math.sqrt(scale.getAsDouble());
        return data.errorModel() == ErrorModel.CONSTANT_ABSOLUTE
                ? new NewRun(
                        OptionalDouble.empty(),
                        OptionalDouble.of(deviation * data.responseUnit()),
                        OptionalDouble.empty())
                : NewRun.ofLnRate(deviation);
    }

    /** d ln k/dT at a temperature, 1/K. */
    double slope(double kelvin) {
        return BothErrorsFitter.slope(law, kelvin, fit.parameters());
    }

    /** Weights of the residuals of the fit; null where all are 1. */
    double[] weights() {
        if (fit instanceof DistanceFit distances) {
            return distances.weights();
        }
        return data.response() == Measurements.Response.RATE ? data.weights() : data.weightsOnLogarithm();
    }

    /** Covariance of the estimates, shared errors included; of size 0 when the scale of the errors is unknown. */
    double[][] covariance() {
        OptionalDouble scale = scale();
        if (scale.isEmpty()) {
            return new double[0][];
        }
        double[][] covariance = fit.unscaledCovariance();
        for (int i = 0; i < covariance.length; i++) {
            for (int j = 0; j < covariance.length; j++) {
                covariance[i][j] *= scale.getAsDouble();
                for (SharedShift shift : shared) {
                    covariance[i][j] += shift.parameter(i) * shift.parameter(j);
                }
            }
        }
        return covariance;
    }

    /** Index of the extra parameter that separates the law from a simpler one; -1 when there is none. */
    int extraParameter() {
        for (int i = 0; i < parameters().size(); i++) {
            if (parameters().get(i).neutral().isPresent()) {
                return i;
            }
        }
        return -1;
    }

    private Estimate estimate(double value, double[] gradient) {
        double variance = 0;
        for (SharedShift shift : shared) {
            double effect = shift.along(gradient);
            variance += effect * effect;
        }
        return new Estimate(value, scaled(fit.predictionVariance(gradient)), variance);
    }

    private OptionalDouble scaled(double variance) {
        OptionalDouble scale = scale();
        return scale.isPresent() ? OptionalDouble.of(variance * scale.getAsDouble()) : OptionalDouble.empty();
    }
}
