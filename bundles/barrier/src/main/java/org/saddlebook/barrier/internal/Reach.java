package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import org.saddlebook.api.findings.Node;

/**
 * How far the numbers reach: the error budget of each prediction, and the range of honest use, the temperatures at which
 * the interval of k meets the tolerance.
 */
final class Reach {
    /** The search for the ends goes from half the lowest to twice the highest measured temperature. */
    private static final double BEYOND = 2;

    private static final int STEPS = 400;
    private static final int HALVINGS = 60;

    private final List<FittedLaw> laws;
    private final Set<String> candidates;
    private final double level;
    private final double tolerance;
    private final boolean onSameSensor;
    private final NextMeasurement.Allowed allowed;

    /**
     * A reach.
     *
     * @param laws fitted laws
     * @param candidates ids of those that the comparison left standing
     * @param tolerance largest relative half-width of the interval of k, as exp(half-width) - 1
     */
    Reach(
            List<FittedLaw> laws,
            Set<String> candidates,
            double level,
            double tolerance,
            boolean onSameSensor,
            NextMeasurement.Allowed allowed) {
        this.laws = laws;
        this.candidates = candidates;
        this.level = level;
        this.tolerance = tolerance;
        this.onSameSensor = onSameSensor;
        this.allowed = allowed;
    }

    /** Members {@code budgets} and {@code honestRange}; empty when no law has an uncertainty. */
    Node.Group node(List<Double> targets) {
        Tree tree = new Tree();
        Optional<FittedLaw> law = carrying();
        if (law.isPresent()) {
            List<Node> budgets = new ArrayList<>();
            for (double kelvin : targets) {
                if (law.get().defined(kelvin)) {
                    budgets.add(budget(law.get(), kelvin));
                }
            }
            if (!budgets.isEmpty()) {
                tree.put("budgets", new Node.Items(budgets));
            }
            tree.put("honestRange", honestRange(law.get()));
            if (!targets.isEmpty()) {
                NextMeasurement next = new NextMeasurement(law.get(), level, tolerance, onSameSensor, allowed);
                List<Node> plans = new ArrayList<>();
                for (double kelvin : targets) {
                    if (law.get().defined(kelvin)) {
                        plans.add(next.node(kelvin));
                    }
                }
                tree.put("nextMeasurements", new Node.Items(plans));
            }
        }
        return tree.group();
    }

    Optional<FittedLaw> carrying() {
        return laws.stream()
                .filter(law -> law.scale().isPresent() && (candidates.isEmpty() || candidates.contains(law.id())))
                .findFirst();
    }

    private Node.Group budget(FittedLaw law, double kelvin) {
        FittedLaw.Estimate estimate = law.lnRate(kelvin, onSameSensor);
        List<Row> rows = new ArrayList<>();
        rows.add(new Row(
                law.data().stated() ? "stated errors of single runs" : "scatter of the runs",
                new Node.Text(""),
                Math.sqrt(estimate.variance().orElseThrow())));
        double[] gradient = new double[law.fit().parameterCount()];
        law.law().lnRate(kelvin, law.fit().parameters(), gradient);
        for (SharedShift shift : law.shared()) {
            rows.add(new Row(
                    shift.cause().title(),
                    shift.cause().size(),
                    Math.abs(shift.onLnRate(law.law(), law.fit().parameters(), gradient, kelvin, onSameSensor))));
        }
        double spread = spread(kelvin);
        if (spread > 0) {
            // Any of the laws may hold: a rectangle over their spread has this standard deviation (JCGM 100, 4.3.7).
            rows.add(new Row("choice of the law", new Node.Text(""), spread / 2 / Math.sqrt(3)));
        }
        double total = 0;
        for (Row row : rows) {
            total += row.effect() * row.effect();
        }
        List<List<Node>> cells = new ArrayList<>();
        for (Row row : rows) {
            cells.add(List.of(
                    new Node.Text(row.cause()),
                    row.size(),
                    new Node.Scalar(row.effect()),
                    new Node.Scalar(total > 0 ? row.effect() * row.effect() / total : 0)));
        }
        return new Tree()
                .put("temperature", Node.Quantity.of(kelvin, "K"))
                .put("model", law.id())
                .put(
                        "table",
                        new Node.Table(
                                List.of(
                                        new Node.Column("cause", "Cause", ""),
                                        new Node.Column("size", "Size (standard uncertainty)", ""),
                                        new Node.Column("effect", "Effect on ln k", "1"),
                                        new Node.Column("share", "Share of the variance", "1")),
                                cells))
                .group();
    }

    private record Row(String cause, Node size, double effect) {}

    /** Largest difference in ln k at a temperature between the laws that the data cannot tell apart. */
    private double spread(double kelvin) {
        double lowest = Double.POSITIVE_INFINITY;
        double highest = Double.NEGATIVE_INFINITY;
        for (FittedLaw law : laws) {
            if (candidates.contains(law.id()) && law.defined(kelvin)) {
                double value = law.lnRate(kelvin).value();
                lowest = Math.min(lowest, value);
                highest = Math.max(highest, value);
            }
        }
        return highest > lowest ? highest - lowest : 0;
    }

    private Node.Group honestRange(FittedLaw law) {
        double centre = law.data().centreKelvin();
        Tree tree = new Tree().put("model", law.id()).put("tolerance", tolerance);
        if (!meets(law, centre)) {
            return tree.put("outcome", "nowhere").group();
        }
        OptionalDouble lower = end(law, centre, law.data().lowestKelvin() / BEYOND);
        OptionalDouble upper = end(law, centre, law.data().highestKelvin() * BEYOND);
        tree.put("outcome", "range");
        if (lower.isPresent()) {
            tree.put("lower", Node.Quantity.of(lower.getAsDouble(), "K"));
        }
        if (upper.isPresent()) {
            tree.put("upper", Node.Quantity.of(upper.getAsDouble(), "K"));
        }
        return tree.group();
    }

    /** Where the tolerance is first exceeded on the way from the centre, in 1/T; empty when it never is. */
    private OptionalDouble end(FittedLaw law, double centre, double limit) {
        double inside = 1 / centre;
        double step = (1 / limit - inside) / STEPS;
        for (int i = 1; i <= STEPS; i++) {
            double next = 1 / centre + i * step;
            if (!meets(law, 1 / next)) {
                double outside = next;
                for (int j = 0; j < HALVINGS; j++) {
                    double middle = (inside + outside) / 2;
                    if (meets(law, 1 / middle)) {
                        inside = middle;
                    } else {
                        outside = middle;
                    }
                }
                return OptionalDouble.of(1 / inside);
            }
            inside = next;
        }
        return OptionalDouble.empty();
    }

    private boolean meets(FittedLaw law, double kelvin) {
        double half = law.lnRate(kelvin, onSameSensor).halfWidth(level, law.degreesOfFreedom());
        return StrictMath.expm1(half) <= tolerance;
    }
}
