package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.barrier.api.FittedLaws;
import org.saddlebook.barrier.api.NewRun;

/** Writes one member of {@code barrier.models}. */
final class LawNode {
    private final Plausibility plausibility;
    private final Unit rateUnit;
    private final double centreKelvin;
    private final double level;

    LawNode(Plausibility plausibility, Unit rateUnit, double centreKelvin, double level) {
        this.plausibility = plausibility;
        this.rateUnit = rateUnit;
        this.centreKelvin = centreKelvin;
        this.level = level;
    }

    /** A law without parameters. */
    static Node.Group notFitted(LawOutcome.NotFitted law) {
        return new Tree()
                .put("id", law.id())
                .put("title", law.title())
                .put("outcome", law.kind().key())
                .put("reason", law.reason())
                .put("parameters", new Node.Group(Map.of()))
                .group();
    }

    /**
     * A fitted law.
     *
     * @param heldParameters parameters that were held, in the form handed to the law
     */
    Node.Group fitted(FittedLaw law, Map<String, Double> heldParameters) {
        Quantities quantities = new Quantities(level, law.degreesOfFreedom());
        Map<String, Node> parameters = new LinkedHashMap<>();
        for (int i = 0; i < law.parameters().size(); i++) {
            Parameter parameter = law.parameters().get(i);
            FittedLaw.Estimate estimate = law.parameter(i);
            List<String> cautions = plausibility.quantity(parameter.symbol(), law, estimate);
            if (undetermined(parameter, estimate, law)) {
                cautions.add(0, "undetermined");
            }
            parameters.put(parameter.symbol(), quantities.of(estimate, parameter.scale(), parameter.unit(), cautions));
        }
        Map<String, Node> derived = new LinkedHashMap<>();
        for (Derived each : law.law().derived()) {
            FittedLaw.Estimate estimate = law.derived(each, centreKelvin);
            derived.put(
                    each.symbol(),
                    quantities.of(
                            estimate, each.scale(), each.unit(), plausibility.quantity(each.symbol(), law, estimate)));
        }
        derived.put(
                "k", quantities.of(law.lnRate(centreKelvin), Parameter.Scale.LOG, rateUnit, List.of("same-mechanism")));
        Tree tree = new Tree()
                .put("id", law.id())
                .put("title", law.title())
                .put("outcome", "fitted")
                .put("parameters", new Node.Group(parameters))
                .put("derived", new Node.Group(derived))
                .put("derivedAt", Node.Quantity.of(centreKelvin, "K"));
        List<String> basis = new ArrayList<>();
        for (Parameter parameter : law.parameters()) {
            basis.add((logarithm(parameter) ? FittedLaws.LOGARITHM : "") + parameter.symbol());
        }
        tree.put("basis", Tree.texts(basis));
        if (!heldParameters.isEmpty()) {
            Tree held = new Tree();
            new TreeMap<>(heldParameters).forEach(held::put);
            tree.put("held", held.group());
        }
        Tree names = new Tree();
        law.parameters().forEach(parameter -> names.put(parameter.symbol(), parameter.name()));
        law.law().derived().forEach(each -> names.put(each.symbol(), each.name()));
        tree.put("names", names.group());
        double[][] covariance = law.covariance();
        if (covariance.length > 0) {
            tree.put("covariance", covariance(law, basis, covariance));
            NewRun newRun = law.newRun();
            tree.put("newRunScatter", newRun.lnRate());
            if (newRun.rate().isPresent()) {
                tree.put(
                        "newRunRate",
                        Node.Quantity.of(newRun.rate().getAsDouble() / rateUnit.factor(), rateUnit.code()));
            }
            if (newRun.kelvin().isPresent()) {
                tree.put("newRunKelvin", Node.Quantity.of(newRun.kelvin().getAsDouble(), "K"));
            }
            if (!law.shared().isEmpty()) {
                List<Node> shared = new ArrayList<>();
                law.shared().forEach(shift -> shared.add(shift.node()));
                tree.put("sharedErrors", new Node.Items(shared));
            }
        }
        return tree.put("statistics", new FitStatistics(law).node(rateUnit)).group();
    }

    /**
     * An extra parameter whose interval includes the value of no effect is not determined: the data do not even say
     * whether the law needs it.
     */
    private boolean undetermined(Parameter parameter, FittedLaw.Estimate estimate, FittedLaw law) {
        return parameter.neutral().isPresent()
                && estimate.variance().isPresent()
                && Math.abs(estimate.value() - parameter.neutral().getAsDouble())
                        <= estimate.halfWidth(level, law.degreesOfFreedom());
    }

    private static Node.Group covariance(FittedLaw law, List<String> basis, double[][] matrix) {
        List<String> units = new ArrayList<>();
        for (Parameter parameter : law.parameters()) {
            units.add(logarithm(parameter) ? "1" : parameter.unit().code());
        }
        double[][] inUnits = new double[matrix.length][matrix.length];
        for (int i = 0; i < matrix.length; i++) {
            for (int j = 0; j < matrix.length; j++) {
                inUnits[i][j] = matrix[i][j] / factor(law, i) / factor(law, j);
            }
        }
        Tree tree = new Tree()
                .put("basis", Tree.texts(basis))
                .put("units", Tree.texts(units))
                .put("matrix", new Node.Matrix(inUnits));
        if (matrix.length == 2) {
            tree.put(
                    "correlation", OptionalDouble.of(matrix[0][1] / Math.sqrt(matrix[0][0]) / Math.sqrt(matrix[1][1])));
        }
        return tree.group();
    }

    private static double factor(FittedLaw law, int i) {
        Parameter parameter = law.parameters().get(i);
        return logarithm(parameter) ? 1 : parameter.unit().factor();
    }

    private static boolean logarithm(Parameter parameter) {
        return parameter.scale() == Parameter.Scale.LOG;
    }
}
