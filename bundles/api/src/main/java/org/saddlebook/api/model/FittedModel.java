package org.saddlebook.api.model;

import java.util.List;
import java.util.Objects;
import java.util.OptionalDouble;

/**
 * A rate model with estimated parameters, as sections hand it to each other. Arrays are copied in and out.
 */
public final class FittedModel {
    private final String modelId;
    private final RateContext context;
    private final List<String> basis;
    private final double[] values;
    private final double[][] covariance;
    private final OptionalDouble degreesOfFreedom;

    /**
     * A fitted model.
     *
     * @param modelId id of the rate model
     * @param context context it was bound to
     * @param basis parameter symbols, in the model's order
     * @param values estimates in the form handed to the model (logarithms for LOG parameters), in order of the basis
     * @param covariance covariance of the values, in order of the basis; of size 0 when the data give none
     * @param degreesOfFreedom of the scale estimate; empty when the covariance rests on stated uncertainties (normal
     *     quantiles)
     */
    public FittedModel(
            String modelId,
            RateContext context,
            List<String> basis,
            double[] values,
            double[][] covariance,
            OptionalDouble degreesOfFreedom) {
        this.modelId = Objects.requireNonNull(modelId, "modelId");
        this.context = Objects.requireNonNull(context, "context");
        this.basis = List.copyOf(basis);
        if (values.length != this.basis.size()) {
            throw new IllegalArgumentException(values.length + " values for " + basis.size() + " parameters");
        }
        if (covariance.length != 0 && covariance.length != values.length) {
            throw new IllegalArgumentException("covariance of size " + covariance.length);
        }
        this.values = values.clone();
        this.covariance = copy(covariance);
        this.degreesOfFreedom = Objects.requireNonNull(degreesOfFreedom, "degreesOfFreedom");
    }

    /** Id of the rate model. */
    public String modelId() {
        return modelId;
    }

    /** Context it was bound to. */
    public RateContext context() {
        return context;
    }

    /** Parameter symbols in the model's order. */
    public List<String> basis() {
        return basis;
    }

    /** Estimates in the form handed to the model, a copy. */
    public double[] values() {
        return values.clone();
    }

    /** Whether the data give a covariance. */
    public boolean hasCovariance() {
        return covariance.length > 0;
    }

    /** Covariance of the values, a copy; of size 0 when there is none. */
    public double[][] covariance() {
        return copy(covariance);
    }

    /** Degrees of freedom of the scale estimate; empty for normal quantiles. */
    public OptionalDouble degreesOfFreedom() {
        return degreesOfFreedom;
    }

    private static double[][] copy(double[][] matrix) {
        double[][] result = new double[matrix.length][];
        for (int i = 0; i < result.length; i++) {
            result[i] = matrix[i].clone();
        }
        return result;
    }
}
