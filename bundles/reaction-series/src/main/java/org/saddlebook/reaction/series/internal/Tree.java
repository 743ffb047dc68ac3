package org.saddlebook.reaction.series.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Unit;

/** Builds groups of findings and their quantities. */
final class Tree {
    private final Map<String, Node> members = new LinkedHashMap<>();

    Tree put(String key, Node node) {
        members.put(key, node);
        return this;
    }

    Tree put(String key, String text) {
        return put(key, new Node.Text(text));
    }

    Tree put(String key, double number) {
        return put(key, new Node.Scalar(number));
    }

    /** The group; what it is and the sentence come first, the numbers behind it after them. */
    Node.Group group() {
        Map<String, Node> ordered = new LinkedHashMap<>();
        for (String key : List.of("id", "sentence")) {
            if (members.containsKey(key)) {
                ordered.put(key, members.get(key));
            }
        }
        members.forEach(ordered::putIfAbsent);
        return new Node.Group(ordered);
    }

    /** A value with t or normal interval, in SI unit {@code code}. */
    static Node.Quantity linear(double value, double u, String code, double level, Scale scale, List<String> cautions) {
        double half = scale.quantile(level) * u;
        return Node.Quantity.of(value, code, u)
                .withInterval(Interval.between(value - half, value + half, level, scale.method()))
                .withCautions(cautions);
    }

    /** exp of a logarithm with its interval, in a unit with this factor. */
    static Node.Quantity factor(double ln, double u, Unit unit, double level, Scale scale, List<String> cautions) {
        double half = scale.quantile(level) * u;
        double value = StrictMath.exp(ln) / unit.factor();
        double standard = StrictMath.exp(u);
        double lower = StrictMath.exp(ln - half) / unit.factor();
        double upper = StrictMath.exp(ln + half) / unit.factor();
        boolean shown = value > 0 && Double.isFinite(value);
        boolean bounded = lower > 0 && Double.isFinite(upper);
        return new Node.Quantity(
                shown ? OptionalDouble.of(value) : OptionalDouble.empty(),
                unit.code(),
                OptionalDouble.empty(),
                Double.isFinite(standard) ? OptionalDouble.of(standard) : OptionalDouble.empty(),
                Optional.of(
                        bounded
                                ? Interval.between(lower, upper, level, scale.method())
                                : Interval.everything(level, scale.method())),
                cautions);
    }

    /** A temperature with a set of whatever kind; absent value where there is none above 0 K. */
    static Node.Quantity temperature(OptionalDouble kelvin, Interval set, List<String> cautions) {
        return new Node.Quantity(
                kelvin, "K", OptionalDouble.empty(), OptionalDouble.empty(), Optional.of(set), cautions);
    }
}
