package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;

/** Every crossover of a reaction in its range as findings, with the signs of ΔG between them. */
final class CrossoverFindings {
    private final ReactionFunction function;
    private final boolean uncertain;
    private final double level;
    private final List<String> common;
    private final List<Root> roots;
    private final CrossoverSet set;

    /**
     * Finds them.
     *
     * @param function the reaction, at standard states or at a composition
     * @param uncertain whether any species states an uncertainty
     * @param quantile of the intervals
     * @param level of the intervals
     * @param common cautions of every number of this reaction
     */
    CrossoverFindings(
            ReactionFunction function, boolean uncertain, double quantile, double level, List<String> common) {
        this.function = function;
        this.uncertain = uncertain;
        this.level = level;
        this.common = List.copyOf(common);
        roots = CrossoverSearch.roots(function);
        set = new CrossoverSet(function, quantile);
    }

    List<Root> roots() {
        return roots;
    }

    /** Whether the sign of ΔG is open somewhere in the range. */
    boolean open() {
        return uncertain && set.touchesZero();
    }

    /** What the signs over the range come to. */
    String word() {
        int changes = 0;
        for (Root root : roots) {
            changes += root.kind() == Root.Kind.TANGENT ? 0 : 1;
        }
        double start = firstSign();
        if (changes == 0) {
            return start < 0
                    ? "exergonic over the whole range"
                    : start > 0 ? "at no temperature of the range" : "zero over the whole range";
        }
        if (changes == 1) {
            return start < 0 ? "below the crossover" : "above the crossover";
        }
        return "changes more than once";
    }

    /** Sign of ΔG between the lower end of the range and the first crossover that is not at it. */
    private double firstSign() {
        double to = function.upper();
        for (Root root : roots) {
            if (root.kelvin() > function.lower()) {
                to = root.kelvin();
                break;
            }
        }
        double middle = function.lower() + (to - function.lower()) / 2;
        double value = function.gibbs(middle);
        double size = Math.abs(function.enthalpy(middle)) + middle * Math.abs(function.entropy(middle));
        return Math.abs(value) <= 1e-11 * size ? 0 : value;
    }

    String outcome() {
        if (roots.isEmpty()) {
            return open() ? "not determined" : "no crossover in the range";
        }
        boolean bounded = true;
        for (Root root : roots) {
            bounded &= !uncertain || set.around(root.kelvin(), level).kind() == Interval.Kind.BETWEEN;
        }
        return bounded ? "bounded" : "unbounded";
    }

    List<Node> crossovers() {
        List<Node> items = new ArrayList<>();
        for (Root root : roots) {
            List<String> cautions = new ArrayList<>();
            Node.Quantity quantity = Node.Quantity.of(root.kelvin(), "K");
            if (root.kind() == Root.Kind.JUMP) {
                cautions.add(SpontaneityCautions.JUMP);
            }
            if (uncertain) {
                Interval interval = set.around(root.kelvin(), level);
                boolean bounded = interval.kind() == Interval.Kind.BETWEEN;
                double slope = Math.abs(function.entropy(root.kelvin()));
                if (bounded && slope > 0 && root.kind() == Root.Kind.CROSSING) {
                    quantity = Node.Quantity.of(root.kelvin(), "K", function.uncertaintyOfGibbs(root.kelvin()) / slope);
                }
                if (!bounded) {
                    cautions.add("undetermined");
                }
                quantity = quantity.withInterval(interval);
            }
            cautions.add("at-stated-composition");
            cautions.addAll(common);
            items.add(quantity.withCautions(cautions));
        }
        return items;
    }

    List<Node> kinds() {
        List<Node> items = new ArrayList<>();
        for (Root root : roots) {
            items.add(new Node.Text(root.kind().word()));
        }
        return items;
    }

    /** Sign of ΔG between crossovers, over the whole range. */
    List<Node> signs() {
        List<Node> items = new ArrayList<>();
        double from = function.lower();
        double sign = firstSign();
        for (Root root : roots) {
            if (root.kind() != Root.Kind.TANGENT && root.kelvin() > function.lower()) {
                items.add(stretch(from, root.kelvin(), sign));
                from = root.kelvin();
                sign = root.signAbove();
            }
        }
        if (from < function.upper()) {
            items.add(stretch(from, function.upper(), sign));
        }
        return items;
    }

    private static Node stretch(double from, double to, double sign) {
        Map<String, Node> item = new LinkedHashMap<>();
        item.put("lower", Node.Quantity.of(from, "K"));
        item.put("upper", Node.Quantity.of(to, "K"));
        item.put("sign", new Node.Text(sign < 0 ? "negative" : sign > 0 ? "positive" : "zero"));
        return new Node.Group(item);
    }
}
