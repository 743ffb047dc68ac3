package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** Equilibrium conversion from a start that the section spontaneity states, against Q written out by hand. Invented numbers. */
class EquilibriumLimitTest {
    private static final double H = -50_000;
    private static final double S = -140;

    private static Node species(double coefficient, String phase, double amount) {
        return Bench.group("coefficient", coefficient, "phase", phase, "amount", Node.Quantity.of(amount, "mol"));
    }

    private static Section window(double conversion, String standard, Node equilibrium) {
        Campaign campaign = Campaign.titled("invented")
                .withSetting(
                        "spontaneity",
                        Bench.group(
                                "dH",
                                Bench.quantity(H, "J/mol", 500),
                                "dS",
                                Bench.quantity(S, "J/(mol.K)", 1.2),
                                "correlation",
                                0.9,
                                "standardState",
                                standard,
                                "equilibrium",
                                equilibrium))
                .withSetting(
                        "window",
                        Bench.group(
                                "limits",
                                List.of(Bench.group("kind", "equilibrium", "conversion", conversion)),
                                "range",
                                Bench.group("lower", "300 K", "upper", "440 K")));
        return Bench.arrhenius().window(campaign);
    }

    /** The temperature at which ΔG + RT ln Q is zero. */
    private static double end(double lnQ) {
        return H / (S - Bench.R * lnQ);
    }

    private static double even(Section section) {
        Node.Table crossings = (Node.Table) Bench.at(section.body(), "intervals", 0, "upperEnd", "crossings");
        return Bench.number(crossings.rows().get(1).get(1));
    }

    @Test
    void inSolutionTheVolumeCounts() {
        // 1 mol of A in 2 L goes to B + C; at x = 0.6 Q = (0.3)(0.3)/0.2.
        Node start = Bench.group(
                "species",
                Bench.group("A", species(-1, "aq", 1), "B", species(1, "aq", 0), "C", species(1, "aq", 0)),
                "volume",
                Node.Quantity.of(2, "L"));
        Section section = window(0.6, "1 mol/L", start);
        assertEquals(end(Math.log(0.3 * 0.3 / 0.2)), even(section), 0.1);
        assertTrue(Bench.text(section.body(), "limits", 0, "statement").contains("from the stated start"));
    }

    @Test
    void inTheGasPressureAndInertGasCount() {
        // 1 mol of A with 1 mol of inert gas at 2 bar goes to 2 B; at x = 0.5 p(B) = 2 · 1/2.5, p(A) = 2 · 0.5/2.5.
        Node start = Bench.group(
                "species",
                Bench.group("A", species(-1, "g", 1), "B", species(2, "g", 0)),
                "pressure",
                Node.Quantity.of(2, "bar"),
                "inert",
                Node.Quantity.of(1, "mol"));
        assertEquals(end(Math.log(0.8 * 0.8 / 0.4)), even(window(0.5, "1 bar", start)), 0.1);
        // With K at 1 atm in place of 1 bar: Δν = 1.
        assertEquals(end(Math.log(0.8 * 0.8 / 0.4 / 1.01325)), even(window(0.5, "1 atm", start)), 0.1);
    }

    @Test
    void withoutReactantsItIsRefused() {
        Node start = Bench.group(
                "species",
                Bench.group("A", species(-1, "aq", 0), "B", species(1, "aq", 1)),
                "volume",
                Node.Quantity.of(2, "L"));
        Section section = window(0.5, "1 mol/L", start);
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        assertTrue(Bench.text(section.body(), "reason").contains("no reactant at the start"));
    }
}
