package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.FittedModel;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;

/** Reads fitted laws back from findings, so that an entry of years ago predicts without its measurements. */
final class StoredLaws {
    private final Node.Group body;
    private final RateContext context;

    /** Reads the body of a section {@code barrier}; throws {@link IllegalArgumentException} when it is not one. */
    StoredLaws(Node.Group body) {
        this.body = body;
        this.context = ContextNode.read(TreeReader.group(body, "context"));
    }

    /** Ids of the fitted laws, in order. */
    List<String> ids() {
        List<String> ids = new ArrayList<>();
        for (Node model : TreeReader.items(body, "models")) {
            if (model instanceof Node.Group group
                    && TreeReader.text(group, "outcome").equals("fitted")) {
                ids.add(TreeReader.text(group, "id"));
            }
        }
        return ids;
    }

    /** Predictions rows with the unit, range and level of the section. */
    Predictions predictions() {
        Node.Group table = TreeReader.group(body, "table");
        return new Predictions(
                context.rateUnit(),
                TreeReader.quantity(table, "lowest").value().orElseThrow(),
                TreeReader.quantity(table, "highest").value().orElseThrow(),
                TreeReader.number(body, "level"));
    }

    /** One prediction row from a stored law, whose model is installed. */
    Node.Group predict(String id, RateModel model, double kelvin) throws Inapplicable {
        Node.Group group = group(id);
        RateFunction law = model.bind(context);
        FittedModel fitted = fitted(id, group, law.parameters());
        double[] gradient = new double[law.parameters().size()];
        double lnRate = law.lnRate(kelvin, fitted.values(), gradient);
        OptionalDouble variance = OptionalDouble.empty();
        if (fitted.hasCovariance()) {
            double[][] covariance = fitted.covariance();
            double sum = 0;
            for (int i = 0; i < gradient.length; i++) {
                for (int j = 0; j < gradient.length; j++) {
                    sum += gradient[i] * covariance[i][j] * gradient[j];
                }
            }
            variance = OptionalDouble.of(Math.max(0, sum));
        }
        OptionalDouble scatter = group.get("newRunScatter").isPresent()
                ? OptionalDouble.of(TreeReader.number(group, "newRunScatter"))
                : OptionalDouble.empty();
        return predictions()
                .row(
                        kelvin,
                        id,
                        new FittedLaw.Estimate(lnRate, variance),
                        scatter,
                        fitted.degreesOfFreedom(),
                        fitted.degreesOfFreedom().isEmpty());
    }

    private Node.Group group(String id) {
        for (Node model : TreeReader.items(body, "models")) {
            if (model instanceof Node.Group group
                    && TreeReader.text(group, "id").equals(id)) {
                return group;
            }
        }
        throw new IllegalArgumentException("no model “" + id + "”");
    }

    private FittedModel fitted(String id, Node.Group group, List<Parameter> parameters) {
        Map<String, Node> stored = TreeReader.group(group, "parameters").members();
        double[] values = new double[parameters.size()];
        List<String> basis = new ArrayList<>();
        for (int i = 0; i < values.length; i++) {
            Parameter parameter = parameters.get(i);
            if (!(stored.get(parameter.symbol()) instanceof Node.Quantity quantity)) {
                throw new IllegalArgumentException("no parameter “" + parameter.symbol() + "” of " + id);
            }
            double si = parameter.unit().toSi(quantity.value().orElseThrow());
            values[i] = parameter.scale() == Parameter.Scale.LOG ? StrictMath.log(si) : si;
            basis.add(parameter.symbol());
        }
        double[][] covariance = new double[0][];
        if (group.get("covariance").isPresent()) {
            covariance = TreeReader.member(TreeReader.group(group, "covariance"), "matrix", Node.Matrix.class)
                    .toArray();
            for (int i = 0; i < covariance.length; i++) {
                for (int j = 0; j < covariance.length; j++) {
                    covariance[i][j] *= factor(parameters.get(i)) * factor(parameters.get(j));
                }
            }
        }
        boolean stated = TreeReader.text(body, "errorModel").equals("stated");
        double dof = TreeReader.number(TreeReader.group(group, "statistics"), "dof");
        return new FittedModel(
                id, context, basis, values, covariance, stated ? OptionalDouble.empty() : OptionalDouble.of(dof));
    }

    private static double factor(Parameter parameter) {
        return parameter.scale() == Parameter.Scale.LOG ? 1 : parameter.unit().factor();
    }
}
