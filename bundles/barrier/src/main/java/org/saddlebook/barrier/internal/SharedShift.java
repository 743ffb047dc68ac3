package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.RateFunction;

/** How one common error, at one standard uncertainty, moves the estimates of a law. */
final class SharedShift {
    private final SharedErrors.Cause cause;
    private final double[] parameters;

    /**
     * A shift.
     *
     * @param parameters shift of each parameter in the form handed to the law; copied
     */
    SharedShift(SharedErrors.Cause cause, double[] parameters) {
        this.cause = cause;
        this.parameters = parameters.clone();
    }

    /** The shift of a fitted law: half the difference of fits to measurements displaced either way. */
    static SharedShift of(FittedLaw above, FittedLaw below, SharedErrors.Cause cause) {
        double[] shift = new double[above.fit().parameterCount()];
        double[] high = above.fit().parameters();
        double[] low = below.fit().parameters();
        for (int i = 0; i < shift.length; i++) {
            shift[i] = (high[i] - low[i]) / 2;
        }
        return new SharedShift(cause, shift);
    }

    SharedErrors.Cause cause() {
        return cause;
    }

    double parameter(int i) {
        return parameters[i];
    }

    /** The shift of a quantity with this gradient. */
    double along(double[] gradient) {
        double sum = 0;
        for (int i = 0; i < gradient.length; i++) {
            sum += gradient[i] * parameters[i];
        }
        return sum;
    }

    /**
     * The shift of ln k at a target temperature. A target that is read on the same thermometer moves with it, which
     * nearly cancels the shift.
     */
    double onLnRate(RateFunction law, double[] p, double[] gradient, double kelvin, boolean onSameSensor) {
        double shift = along(gradient);
        if (onSameSensor) {
            double[] unused = new double[p.length];
            shift +=
                    (law.lnRate(cause.shifted(kelvin, 1), p, unused) - law.lnRate(cause.shifted(kelvin, -1), p, unused))
                            / 2;
        }
        return shift;
    }

    Node.Group node() {
        List<Node> shift = new ArrayList<>();
        for (double value : parameters) {
            shift.add(new Node.Scalar(value));
        }
        return new Tree()
                .put("id", cause.id())
                .put("title", cause.title())
                .put("size", cause.size())
                .put("offset", cause.offset())
                .put("gain", cause.gain())
                .put("gainFrom", Node.Quantity.of(cause.gainFrom(), "K"))
                .put("lnRateShift", cause.lnRateShift())
                .put("shift", new Node.Items(shift))
                .group();
    }

    /** Reads a group written by {@link #node()}; {@link IllegalArgumentException} when it is not one. */
    static SharedShift read(Node.Group group) {
        List<Node> shift = TreeReader.items(group, "shift");
        double[] parameters = new double[shift.size()];
        for (int i = 0; i < parameters.length; i++) {
            parameters[i] = ((Node.Scalar) shift.get(i)).value();
        }
        return new SharedShift(
                new SharedErrors.Cause(
                        TreeReader.text(group, "id"),
                        TreeReader.text(group, "title"),
                        TreeReader.quantity(group, "size"),
                        TreeReader.number(group, "offset"),
                        TreeReader.number(group, "gain"),
                        TreeReader.quantity(group, "gainFrom").value().orElseThrow(),
                        TreeReader.number(group, "lnRateShift")),
                parameters);
    }
}
