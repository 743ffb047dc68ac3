package org.saddlebook.reaction.api;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.reaction.internal.Balancer;
import org.saddlebook.reaction.internal.EquationParser;

/**
 * A reaction equation as written; it need not be balanced, see {@link #imbalance()}.
 *
 * @param reactants left side in order, at least one term
 * @param arrow how the sides are joined
 * @param products right side in order, at least one term
 */
public record Equation(List<Term> reactants, Arrow arrow, List<Term> products) {
    /** How the sides are joined; {@code sign} is the plain sign. */
    public enum Arrow {
        /** Stoichiometry only: {@code =}. */
        EQUALS("="),
        /** One direction: {@code ->}, {@code →}. */
        FORWARD("->"),
        /** Both directions: {@code <=>}, {@code ⇌}. */
        REVERSIBLE("<=>");

        private final String sign;

        Arrow(String sign) {
            this.sign = sign;
        }

        /** The sign in plain characters. */
        public String sign() {
            return sign;
        }
    }

    /** Copies the sides. */
    public Equation {
        Objects.requireNonNull(arrow, "arrow");
        reactants = List.copyOf(reactants);
        products = List.copyOf(products);
        if (reactants.isEmpty() || products.isEmpty()) {
            throw new IllegalArgumentException("each side of an equation has at least one term");
        }
    }

    /**
     * An equation: {@code N2(g) + 3 H2(g) = 2 NH3(g)}, {@code H2 + 1/2 O2 -> H2O}, {@code Fe3+ + e- ⇌ Fe2+}. A plus
     * between two species has blanks on both sides where it could be read as a charge.
     *
     * @throws ReactionException as {@link Species#parse}, and {@code missing-arrow}, {@code several-arrows}, {@code
     *     ambiguous-arrow}, {@code missing-species}, {@code coefficient}, {@code equation-too-long}
     */
    public static Equation parse(String text) throws ReactionException {
        return EquationParser.equation(text);
    }

    /**
     * The same, if it balances.
     *
     * @throws ReactionException as {@link #parse}, and {@code unbalanced}, naming every element and the charge that do
     *     not balance and, where there is one answer, the coefficients that do
     */
    public static Equation parseBalanced(String text) throws ReactionException {
        Equation equation = parse(text);
        Imbalance imbalance = equation.imbalance();
        if (imbalance.balanced()) {
            return equation;
        }
        Optional<Equation> better = equation.balanced();
        throw new ReactionException(
                "unbalanced",
                imbalance.text(),
                "as many atoms of each element and as much charge on the left as on the right",
                better.isPresent()
                        ? "Write " + better.get().text() + ", or check the formulas."
                        : "Check formulas and coefficients; no coefficients above zero balance these species in one way"
                                + " only.",
                1);
    }

    /** What is not the same on both sides. */
    public Imbalance imbalance() {
        return Balancer.imbalance(this);
    }

    /**
     * The same species with the smallest whole coefficients that balance; empty when there are none above zero, or more
     * than one choice.
     */
    public Optional<Equation> balanced() {
        return Balancer.balance(this);
    }

    /** Species to products minus reactants, in order of writing; what stands alike on both sides is left out. */
    public Map<Species, Fraction> net() {
        Map<Species, Fraction> net = new LinkedHashMap<>();
        for (Term term : reactants) {
            net.merge(term.species(), term.coefficient().negated(), Fraction::plus);
        }
        for (Term term : products) {
            net.merge(term.species(), term.coefficient(), Fraction::plus);
        }
        net.values().removeIf(coefficient -> coefficient.signum() == 0);
        return Collections.unmodifiableMap(net);
    }

    /** The reverse reaction. */
    public Equation reversed() {
        return new Equation(products, arrow, reactants);
    }

    /** {@code N2(g) + 3 H2(g) = 2 NH3(g)}; reads back as itself. */
    public String text() {
        StringBuilder text = new StringBuilder();
        side(reactants, text);
        text.append(' ').append(arrow.sign()).append(' ');
        side(products, text);
        return text.toString();
    }

    private static void side(List<Term> terms, StringBuilder text) {
        for (int i = 0; i < terms.size(); i++) {
            text.append(i == 0 ? "" : " + ").append(terms.get(i).text());
        }
    }
}
