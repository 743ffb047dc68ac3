package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;

class ErrorModelComparisonTest {
    /** H+ + S2O6(2-), from 50 to 90 degrees Celsius: G. Lente, I. Fabian, A. J. Poe, New J. Chem. 29 (2005) 759. */
    private static final double[] KELVIN = {323.15, 328.15, 333.15, 338.15, 343.15, 348.15, 353.15, 358.15, 363.15};

    private static final double[] RATES = {
        9.54e-7, 1.91e-6, 3.76e-6, 7.33e-6, 1.38e-5, 2.56e-5, 4.71e-5, 8.43e-5, 1.47e-4
    };

    /**
     * The source's supplementary information gives, for equal weights on k, 118.80(41) kJ/mol and 7.2(11) J/(mol K), and
     * for ln(k/T) 120.27(15) and 11.33(45). Gauss-Newton in 40-digit arithmetic (mpmath, run for this test) on the rounded
     * table: 118794.8547591(390.076069613) J/mol and 7.19604430945(1.08120019459) J/(mol K).
     */
    @Test
    @Tag("validation")
    void theErrorModelMovesTheEnthalpyAsPublished() {
        Node.Group body = body(OptionalDouble.empty(), Choices.defaults().withModels(List.of("eyring")));
        Node.Table table = TreeReader.member(body, "errorModels", Node.Table.class);
        assertEquals(List.of("constant-relative", "constant-absolute"), errorModels(table));
        assertEquals(120_269.37, value(table, 0, 1), 0.005);
        assertEquals(152.985, uncertainty(table, 0, 1), 0.0005);
        assertEquals(118_794.8547591, value(table, 1, 1), 1e-5);
        assertEquals(390.076069613, uncertainty(table, 1, 1), 4e-6);
        assertEquals(7.19604430945, value(table, 1, 2), 1e-9);
        assertEquals(1.08120019459, uncertainty(table, 1, 2), 1e-8);
    }

    @Test
    void anAbsoluteErrorCanBeChosenForTheWholeEvaluation() {
        Node.Group body = body(
                OptionalDouble.empty(),
                Choices.defaults().withErrorModel(ErrorModel.CONSTANT_ABSOLUTE).withTargetsKelvin(List.of(298.15)));
        assertEquals("k", TreeReader.text(body, "response"));
        assertEquals(
                118_794.8547591, Bench.parameter(body, "eyring", "dH").value().orElseThrow(), 1e-5);
        Node.Group row = (Node.Group) TreeReader.items(body, "predictions").get(0);
        assertTrue(TreeReader.quantity(row, "k").interval().isPresent());
        // At 298.15 K a run is as uncertain as k is large: its reading may be zero.
        Interval run = TreeReader.quantity(row, "kNewRun").interval().orElseThrow();
        assertEquals(Interval.Kind.AT_MOST, run.kind());
        Node.Quantity mean = TreeReader.quantity(row, "k");
        double s = TreeReader.number(TreeReader.group(Bench.model(body, "arrhenius"), "statistics"), "s");
        // Student's t at 0.975 with n - 2 degrees of freedom by SciPy 1.17.1.
        double above = Math.sqrt(StrictMath.pow(
                        mean.interval().orElseThrow().upper().orElseThrow()
                                - mean.value().orElseThrow(),
                        2)
                + StrictMath.pow(2.3646242510102993 * s, 2));
        assertEquals(mean.value().orElseThrow() + above, run.upper().orElseThrow(), 1e-9 * above);
    }

    @Test
    void statedErrorsJoinWhereTheyAreStated() {
        Node.Table table = TreeReader.member(
                body(OptionalDouble.of(0.02), Choices.defaults().withTargetsKelvin(List.of(298.15))),
                "errorModels",
                Node.Table.class);
        assertEquals(List.of("constant-relative", "stated", "constant-absolute"), errorModels(table));
        assertEquals(4, table.columns().size());
        assertTrue(table.columns().get(3).title().startsWith("k at 298.15"));
    }

    private static List<String> errorModels(Node.Table table) {
        return table.rows().stream()
                .map(row -> ((Node.Text) row.get(0)).value())
                .toList();
    }

    private static double value(Node.Table table, int row, int column) {
        return ((Node.Quantity) table.rows().get(row).get(column)).value().orElseThrow();
    }

    private static double uncertainty(Node.Table table, int row, int column) {
        return ((Node.Quantity) table.rows().get(row).get(column))
                .standardUncertainty()
                .orElseThrow();
    }

    private static Node.Group body(OptionalDouble relative, Choices choices) {
        return Bench.body(Bench.table(Bench.LITRE_PER_MOLE_SECOND, 2, KELVIN, RATES, relative), choices);
    }
}
