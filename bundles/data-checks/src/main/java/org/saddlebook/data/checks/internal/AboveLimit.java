package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.data.checks.internal.Rule.Outcome.Found;
import org.saddlebook.presentation.api.Rounding;

/**
 * Rate constants above what physics allows: {@code kB T/h} for first order (Eyring 1935); for second order in solution of
 * stated viscosity η the diffusion limit {@code 8 R T/(3 η)} (Smoluchowski 1917, equal neutral spheres); in the gas the
 * collision limit {@code NA π d² (8 R T/(π μ))^(1/2)}. An ion pair of opposite charges may exceed the diffusion limit by
 * a small factor, which the margin leaves.
 */
final class AboveLimit implements Rule {
    /** What opposite charges, spheres of unequal size and the measurement itself may add. */
    private static final double MARGIN = 3;

    /** Generous where not stated: a large molecule, 1 nm, met by a hydrogen atom. */
    private static final double LARGEST_DIAMETER = 1e-9;

    private static final double SMALLEST_MASS = 1e-3;

    @Override
    public String id() {
        return "above-limit";
    }

    @Override
    public String title() {
        return "rate constants above a physical limit";
    }

    @Override
    public Outcome examine(Subject subject) {
        double order = subject.table().order();
        String medium = subject.stated().medium();
        boolean gas = medium.equals("gas");
        if (order != 1 && order != 2) {
            return new Outcome.NotExamined("there is a limit for orders 1 and 2 only");
        }
        if (order == 2 && !gas && subject.stated().viscosity().isEmpty()) {
            return new Outcome.NotExamined(
                    "for second order it needs \"viscosity: ...\" of the solvent, or \"medium: gas\"");
        }
        List<Row> above = new ArrayList<>();
        double worst = 0;
        for (Row row : subject.rows()) {
            double limit = limit(subject, order, gas, row.kelvin());
            double margin = order == 1 ? 1 : MARGIN;
            if (row.point().rate() > margin * limit) {
                above.add(row);
                worst = Math.max(worst, row.point().rate() / limit);
            }
        }
        if (above.isEmpty()) {
            return new Outcome.Nothing();
        }
        Row first = above.get(0);
        double limit = limit(subject, order, gas, first.kelvin())
                / subject.table().rateUnit().factor();
        String unit = subject.table().rateUnit().code();
        Map<String, Node> evidence = new LinkedHashMap<>();
        evidence.put("limit", Node.Quantity.of(limit, unit));
        evidence.put("largestRatio", new Node.Scalar(worst));
        String sentence = "k of " + Say.rows(above) + (above.size() == 1 ? " lies" : " lies up to") + " a factor of "
                + Rounding.significant(worst, 2) + " above " + name(order, gas, subject) + ", "
                + Rounding.significant(limit, 3) + " "
                + org.saddlebook.presentation.api.UnitText.forPeople(unit)
                + ". Look at the unit, the order and the temperature.";
        return new Found(List.of(new Finding(sentence, Say.numbers(above), evidence)));
    }

    private static String name(double order, boolean gas, Subject subject) {
        if (order == 1) {
            return "kB T/h";
        }
        if (!gas) {
            return "the diffusion limit 8RT/(3η)";
        }
        boolean both = subject.stated().collisionDiameter().isPresent()
                && subject.stated().reducedMass().isPresent();
        return both ? "the collision limit" : "even a generous collision limit (1 nm, 1 g/mol where not stated)";
    }

    /** The limit in SI. */
    private static double limit(Subject subject, double order, boolean gas, double kelvin) {
        if (order == 1) {
            return kelvin * StrictMath.exp(Constants.LN_BOLTZMANN_OVER_PLANCK);
        }
        if (!gas) {
            return 8
                    * Constants.GAS
                    * kelvin
                    / (3 * subject.stated().viscosity().getAsDouble());
        }
        double diameter = subject.stated().collisionDiameter().orElse(LARGEST_DIAMETER);
        double mass = subject.stated().reducedMass().orElse(SMALLEST_MASS);
        return Constants.AVOGADRO
                * Math.PI
                * diameter
                * diameter
                * Math.sqrt(8 * Constants.GAS * kelvin / (Math.PI * mass));
    }
}
