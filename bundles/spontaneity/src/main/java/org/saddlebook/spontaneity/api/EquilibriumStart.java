package org.saddlebook.spontaneity.api;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/**
 * The start that the section {@code spontaneity} states under {@code equilibriumStart}.
 *
 * @param extent the extent at equilibrium for any ln K with standard states 1 bar and 1 mol/L
 * @param lnShift what to add to ln K of the section, whose standard state may be another
 */
public record EquilibriumStart(EquilibriumExtent extent, double lnShift) {
    /** Key in the body of the section. */
    public static final String KEY = "equilibriumStart";

    /** The start; empty where the section states none or is not understood. */
    public static Optional<EquilibriumStart> of(Section section) {
        if (section.outcome() == Section.Outcome.DONE
                && section.body() instanceof Node.Group body
                && body.get(KEY).orElse(null) instanceof Node.Group group
                && group.get("species").orElse(null) instanceof Node.Items items) {
            List<EquilibriumExtent.Member> members = new ArrayList<>();
            for (Node item : items.items()) {
                Optional<EquilibriumExtent.Member> member = member(item);
                if (member.isEmpty()) {
                    return Optional.empty();
                }
                members.add(member.get());
            }
            double inert = number(group, "inert", 0);
            double bar = number(group, "pressure", 1e5) / 1e5;
            double litres = number(group, "volume", 1e-3) / 1e-3;
            double shift = number(group, "lnKShift", 0);
            return Optional.of(new EquilibriumStart(new EquilibriumExtent(members, inert, bar, litres), shift));
        }
        return Optional.empty();
    }

    private static Optional<EquilibriumExtent.Member> member(Node item) {
        if (item instanceof Node.Group one && one.get("kind").orElse(null) instanceof Node.Text kind) {
            for (EquilibriumExtent.Kind known : EquilibriumExtent.Kind.values()) {
                if (word(known).equals(kind.value())) {
                    return Optional.of(new EquilibriumExtent.Member(
                            number(one, "coefficient", Double.NaN), number(one, "amount", Double.NaN), known));
                }
            }
        }
        return Optional.empty();
    }

    private static double number(Node.Group group, String key, double otherwise) {
        Node node = group.get(key).orElse(null);
        if (node instanceof Node.Scalar scalar) {
            return scalar.value();
        }
        return node instanceof Node.Quantity quantity ? quantity.value().orElse(otherwise) : otherwise;
    }

    private static String word(EquilibriumExtent.Kind kind) {
        return kind.name().toLowerCase(Locale.ROOT);
    }

    /**
     * The start as findings.
     *
     * @param names of the species, in the order of the members
     */
    public Node.Group node(List<String> names) {
        List<Node> species = new ArrayList<>();
        for (int i = 0; i < names.size(); i++) {
            EquilibriumExtent.Member member = extent.members().get(i);
            Map<String, Node> one = new LinkedHashMap<>();
            one.put("species", new Node.Text(names.get(i)));
            one.put("coefficient", new Node.Scalar(member.coefficient()));
            one.put("kind", new Node.Text(word(member.kind())));
            one.put("amount", Node.Quantity.of(member.amount(), "mol"));
            species.add(new Node.Group(one));
        }
        Map<String, Node> group = new LinkedHashMap<>();
        group.put("species", new Node.Items(species));
        group.put("inert", Node.Quantity.of(extent.inert(), "mol"));
        group.put("pressure", Node.Quantity.of(extent.bar() * 1e5, "Pa"));
        group.put("volume", Node.Quantity.of(extent.litres() * 1e-3, "m3"));
        group.put("lnKShift", new Node.Scalar(lnShift));
        return new Node.Group(group);
    }
}
