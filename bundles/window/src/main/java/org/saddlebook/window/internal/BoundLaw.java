package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.FittedModel;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.barrier.api.FittedLaws;

/**
 * A fitted law bound to the context of the findings, with what is uncertain about it: the scatter of the runs and, apart
 * from it, errors common to all runs.
 */
final class BoundLaw {
    /** An error common to all runs at one standard uncertainty. */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    private record Shared(double[] shift, double offset, double gain, double gainFrom) {
        double moved(double kelvin, int sign) {
            return kelvin + sign * (offset + gain * (kelvin - gainFrom));
        }
    }

    /**
     * The law at one temperature.
     *
     * @param lnRate ln k at the best estimates
     * @param gradient of ln k with respect to the parameters
     * @param sensor what each shared error does to ln k because the temperature itself is read on the thermometer of the
     *     measurements; zero where it is a true one
     */
    @SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
    record At(double kelvin, double lnRate, double[] gradient, double[] sensor) {}

    private final String id;
    private final String title;
    private final RateFunction function;
    private final double[] values;
    private final double[][] ownCovariance;
    private final OptionalDouble degreesOfFreedom;
    private final List<Shared> shared = new ArrayList<>();
    private final boolean sameSensor;

    /**
     * A law with a covariance.
     *
     * @throws IllegalArgumentException when the installed model has other parameters than the findings
     */
    BoundLaw(FittedLaws.FittedLawView view, RateFunction function, boolean sameSensor) {
        FittedModel fitted = view.fitted();
        List<String> symbols = new ArrayList<>();
        for (Parameter parameter : function.parameters()) {
            symbols.add(parameter.symbol());
        }
        if (!symbols.equals(fitted.basis())) {
            throw new IllegalArgumentException("the installed model " + view.id() + " has the parameters "
                    + String.join(", ", symbols) + ", the findings " + String.join(", ", fitted.basis()));
        }
        id = view.id();
        title = view.title();
        this.function = function;
        this.sameSensor = sameSensor;
        values = fitted.values();
        ownCovariance = fitted.covariance();
        double[][] common = view.sharedCovariance();
        for (int i = 0; i < common.length; i++) {
            for (int j = 0; j < common.length; j++) {
                ownCovariance[i][j] -= common[i][j];
            }
        }
        degreesOfFreedom = fitted.degreesOfFreedom();
        for (Node node : view.sharedErrors()) {
            if (node instanceof Node.Group group) {
                shared.add(shared(group));
            }
        }
    }

    String id() {
        return id;
    }

    String title() {
        return title;
    }

    boolean linear() {
        return function.linear();
    }

    int parameters() {
        return values.length;
    }

    int sharedErrors() {
        return shared.size();
    }

    OptionalDouble degreesOfFreedom() {
        return degreesOfFreedom;
    }

    Source source() {
        return new Source(ownCovariance, degreesOfFreedom);
    }

    double shift(int cause, int parameter) {
        return shared.get(cause).shift()[parameter];
    }

    boolean movesTarget() {
        return sameSensor && !shared.isEmpty();
    }

    At at(double kelvin) {
        double[] gradient = new double[values.length];
        double lnRate = function.lnRate(kelvin, values, gradient);
        double[] sensor = new double[shared.size()];
        if (sameSensor) {
            double[] unused = new double[values.length];
            for (int c = 0; c < sensor.length; c++) {
                Shared cause = shared.get(c);
                sensor[c] = (function.lnRate(cause.moved(kelvin, 1), values, unused)
                                - function.lnRate(cause.moved(kelvin, -1), values, unused))
                        / 2;
            }
        }
        return new At(kelvin, lnRate, gradient, sensor);
    }

    /** ln k with other parameters; NaN where the law has no value. */
    double lnRate(double kelvin, double[] deviation, double[] scratch, double[] unused) {
        for (int i = 0; i < values.length; i++) {
            scratch[i] = values[i] + deviation[i];
        }
        return function.defined(kelvin, scratch) ? function.lnRate(kelvin, scratch, unused) : Double.NaN;
    }

    /** d ln k/dT, 1/K, by a central difference: the local activation energy over R T². */
    double slope(double kelvin) {
        double step = kelvin * 1e-5;
        double[] unused = new double[values.length];
        return (function.lnRate(kelvin + step, values, unused) - function.lnRate(kelvin - step, values, unused))
                / (2 * step);
    }

    /** Standard uncertainties of something linear in the parameters: from scatter, and from shared errors. */
    double[] uncertainties(double[] gradient, double[] sensor) {
        double own = quadratic(ownCovariance, gradient);
        double common = 0;
        for (int c = 0; c < shared.size(); c++) {
            double sum = sensor[c];
            for (int i = 0; i < gradient.length; i++) {
                sum += gradient[i] * shared.get(c).shift()[i];
            }
            common += sum * sum;
        }
        return new double[] {Math.sqrt(Math.max(0, own)), Math.sqrt(common)};
    }

    private static double quadratic(double[][] matrix, double[] vector) {
        double sum = 0;
        for (int i = 0; i < vector.length; i++) {
            for (int j = 0; j < vector.length; j++) {
                sum += vector[i] * matrix[i][j] * vector[j];
            }
        }
        return sum;
    }

    private static Shared shared(Node.Group group) {
        double[] shift = new double[0];
        if (group.get("shift").orElse(null) instanceof Node.Items items) {
            shift = new double[items.items().size()];
            for (int i = 0; i < shift.length; i++) {
                shift[i] = ((Node.Scalar) items.items().get(i)).value();
            }
        }
        return new Shared(shift, number(group, "offset"), number(group, "gain"), number(group, "gainFrom"));
    }

    private static double number(Node.Group group, String key) {
        Node node = group.get(key).orElseThrow(() -> new IllegalArgumentException("no member " + key));
        return node instanceof Node.Quantity quantity ? quantity.value().orElseThrow() : ((Node.Scalar) node).value();
    }
}
