package org.saddlebook.reaction.api;

import java.util.List;

/**
 * What an equation does not have alike on both sides.
 *
 * @param sums one for each element, and for the charge, that differs; elements in alphabetical order, charge last; empty
 *     when the equation balances
 */
public record Imbalance(List<Sum> sums) {
    /** The name under which the charge stands. */
    public static final String CHARGE = "charge";

    /**
     * The two sums of one element, or of the charge.
     *
     * @param of symbol of the element, or {@link Imbalance#CHARGE}
     * @param left sum over the left side
     * @param right sum over the right side
     */
    public record Sum(String of, Fraction left, Fraction right) {}

    /** Copies the sums. */
    public Imbalance {
        sums = List.copyOf(sums);
    }

    /** Whether nothing differs. */
    public boolean balanced() {
        return sums.isEmpty();
    }

    /** {@code H: 6 on the left, 4 on the right; charge: 1 on the left, 0 on the right}; empty when it balances. */
    public String text() {
        StringBuilder text = new StringBuilder();
        for (Sum sum : sums) {
            text.append(text.length() == 0 ? "" : "; ")
                    .append(sum.of())
                    .append(": ")
                    .append(sum.left().text())
                    .append(" on the left, ")
                    .append(sum.right().text())
                    .append(" on the right");
        }
        return text.toString();
    }
}
