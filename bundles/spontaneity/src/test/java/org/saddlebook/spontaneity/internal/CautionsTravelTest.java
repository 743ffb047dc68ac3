package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** "Allowed is not fast" and "at this composition only" go with every Gibbs energy, ln K, crossover and figure of the section. */
class CautionsTravelTest {
    private static Node.Group equilibrium() {
        return new Node.Group(Map.of(
                "amounts", new Node.Group(Map.of("N2O4", new Node.Scalar(1))), "pressure", Node.Quantity.of(1, "bar")));
    }

    @Test
    void withEveryNumberOfAReaction() throws Exception {
        Section section = new Settings()
                .with("reaction", new Node.Text("N2O4(g) = 2 NO2(g)"))
                .with("composition", 1.5)
                .with("equilibrium", equilibrium())
                .section();
        check(section);
        Node.Group body = (Node.Group) section.body();
        for (Node row : Settings.items(body, "equilibrium")) {
            assertTrue(
                    Settings.quantity((Node.Group) row, "conversion").cautions().contains("allowed-is-not-fast"));
            assertTrue(
                    Settings.quantity((Node.Group) row, "conversion").cautions().contains("spontaneity-ideal"));
        }
    }

    @Test
    void withEveryNumberOfStatedValuesAndTables() throws Exception {
        check(Settings.of(Node.Quantity.of(-92.2, "kJ/mol", 0.4), Node.Quantity.of(-198.1, "J/(mol.K)", 0.3))
                .section());
        List<Node> rows = List.of(row(298.15, 0.1426), row(308.15, 0.3183), row(318.15, 0.6706), row(328.15, 1.3));
        check(new Settings()
                .with(
                        "equilibriumTable",
                        new Node.Group(Map.of(
                                "kind",
                                new Node.Text("Kp"),
                                "standardState",
                                new Node.Text("1 atm"),
                                "rows",
                                new Node.Items(rows))))
                .section());
    }

    private static Node row(double kelvin, double k) {
        return new Node.Group(Map.of("temperature", new Node.Scalar(kelvin), "K", new Node.Scalar(k)));
    }

    private static void check(Section section) {
        Node.Group body = (Node.Group) section.body();
        for (Node node : Settings.items(body, "dG")) {
            for (Map.Entry<String, Node> entry : ((Node.Group) node).members().entrySet()) {
                boolean judged = List.of("dG", "lnK", "dGAtComposition").contains(entry.getKey());
                if (judged && entry.getValue() instanceof Node.Quantity quantity) {
                    assertTrue(quantity.cautions().contains("allowed-is-not-fast"), entry.getKey());
                    assertTrue(quantity.cautions().contains("at-stated-composition"), entry.getKey());
                }
            }
        }
        for (Node node : Settings.items(body, "crossovers")) {
            assertTrue(((Node.Quantity) node).cautions().contains("at-stated-composition"));
        }
        assertFalse(Settings.items(body, "figures").isEmpty());
        for (Node node : Settings.items(body, "figures")) {
            assertTrue(((Node.Figure) node).cautions().contains("allowed-is-not-fast"), "figure");
            assertTrue(((Node.Figure) node).cautions().contains("at-stated-composition"), "figure");
        }
        for (Map.Entry<String, String> text : section.cautions().entrySet()) {
            assertFalse(text.getValue().isBlank());
            assertFalse((" " + text.getValue().toLowerCase(Locale.ROOT)).contains(" safe"), text.getKey());
        }
    }
}
