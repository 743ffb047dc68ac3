package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;

/**
 * ΔH and ΔS of the reaction as the section spontaneity states them: independent of temperature, or, where that section
 * follows heat capacities, ΔG between its rows. Uncertainties are those of ΔH and ΔS either way.
 *
 * @param enthalpy ΔH, J/mol
 * @param entropy ΔS, J/(mol K)
 * @param covariance of both in that order
 * @param degreesOfFreedom of the uncertainties; empty for normal ones
 * @param rows {@code [K, ΔG, ΔS]} with rising temperatures where heat capacities are followed; empty for constant ΔH, ΔS
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record Thermo(
        double enthalpy, double entropy, double[][] covariance, OptionalDouble degreesOfFreedom, double[][] rows) {
    /**
     * Reads the section.
     *
     * @throws Refusal when it does not hold ΔH and ΔS
     */
    static Thermo of(Section section) throws Refusal {
        if (section.outcome() != Section.Outcome.DONE || !(section.body() instanceof Node.Group body)) {
            throw new Refusal("The section spontaneity has no findings, and a limit of window needs its ΔH and ΔS.");
        }
        if (!(body.get("dH").orElse(null) instanceof Node.Quantity dH)
                || !(body.get("dS").orElse(null) instanceof Node.Quantity dS)
                || dH.value().isEmpty()
                || dS.value().isEmpty()
                || !dH.unit().equals("J/mol")
                || !dS.unit().equals("J/(mol.K)")) {
            throw new Refusal("The section spontaneity states no ΔH and ΔS, and a limit of window needs both.");
        }
        double u = dH.standardUncertainty().orElse(0);
        double v = dS.standardUncertainty().orElse(0);
        double r = body.get("correlation").orElse(null) instanceof Node.Scalar scalar ? scalar.value() : 0;
        OptionalDouble dof = body.get("degreesOfFreedom").orElse(null) instanceof Node.Scalar scalar
                ? OptionalDouble.of(scalar.value())
                : OptionalDouble.empty();
        return new Thermo(
                dH.value().getAsDouble(),
                dS.value().getAsDouble(),
                new double[][] {{u * u, r * u * v}, {r * u * v, v * v}},
                dof,
                body.get("dCp").isPresent() ? rows(body) : new double[0][]);
    }

    private static double[][] rows(Node.Group body) throws Refusal {
        List<double[]> rows = new ArrayList<>();
        if (body.get("dG").orElse(null) instanceof Node.Items items) {
            for (Node item : items.items()) {
                if (item instanceof Node.Group row
                        && row.get("temperature").orElse(null) instanceof Node.Quantity kelvin
                        && row.get("dG").orElse(null) instanceof Node.Quantity gibbs
                        && row.get("dS").orElse(null) instanceof Node.Quantity entropy
                        && kelvin.value().isPresent()
                        && gibbs.value().isPresent()
                        && entropy.value().isPresent()) {
                    rows.add(new double[] {
                        kelvin.value().getAsDouble(),
                        gibbs.value().getAsDouble(),
                        entropy.value().getAsDouble()
                    });
                }
            }
        }
        rows.sort(Comparator.comparingDouble(row -> row[0]));
        if (rows.size() < 2) {
            throw new Refusal("The section spontaneity has too few rows of ΔG for window to follow heat capacities.");
        }
        return rows.toArray(new double[0][]);
    }

    /** Whether ΔH and ΔS are taken as constant. */
    boolean constant() {
        return rows.length == 0;
    }

    /** Whether heat capacities are known at this temperature. */
    boolean covers(double kelvin) {
        return constant() || (kelvin >= rows[0][0] && kelvin <= rows[rows.length - 1][0]);
    }

    /**
     * ΔG, J/mol. Between rows a cubic through ΔG with the slopes −ΔS, which are exact (Hermite); outside them ΔH and ΔS of
     * the nearest row.
     */
    double gibbs(double kelvin) {
        if (constant()) {
            return enthalpy - kelvin * entropy;
        }
        int last = rows.length - 1;
        if (!(kelvin > rows[0][0] && kelvin < rows[last][0])) {
            double[] end = kelvin <= rows[0][0] ? rows[0] : rows[last];
            return end[1] - (kelvin - end[0]) * end[2];
        }
        int high = 1;
        while (rows[high][0] < kelvin) {
            high++;
        }
        double[] from = rows[high - 1];
        double[] to = rows[high];
        double span = to[0] - from[0];
        double t = (kelvin - from[0]) / span;
        double rest = 1 - t;
        return rest * rest * (1 + 2 * t) * from[1]
                + t * t * (3 - 2 * t) * to[1]
                - span * t * rest * (rest * from[2] - t * to[2]);
    }

    /** ln of the equilibrium constant. */
    double lnEquilibrium(double kelvin) {
        return -gibbs(kelvin) / (Constants.GAS * kelvin);
    }

    boolean exact() {
        return covariance[0][0] == 0 && covariance[1][1] == 0;
    }

    Source source() {
        return new Source(covariance, degreesOfFreedom);
    }
}
