package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.task.Cancelled;

class SharedErrorsTest {
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double[] SCATTER = {0.02, -0.03, 0.01, 0.02, -0.02};
    private static final double ENERGY = 100_000;

    @Test
    void aCommonOffsetMovesTheEnergyByTwiceItsShareOfTheTemperature() {
        // d ln Ea / dT = 2/T: methods of the trade, derived in the test by the fit itself for data without scatter.
        Node.Group with = body(settings("thermometerOffset", Node.Quantity.of(0.5, "K")), stated());
        Node.Group without = body(Map.of(), stated());
        double own = Bench.parameter(without, "arrhenius", "Ea")
                .standardUncertainty()
                .orElseThrow();
        double all =
                Bench.parameter(with, "arrhenius", "Ea").standardUncertainty().orElseThrow();
        double shared = Math.sqrt(all * all - own * own);
        assertEquals(2 * 0.5 / 333.15 * ENERGY, shared, 0.02 * shared);
        assertTrue(Bench.texts(without, "cautions").contains("thermometer-not-included"));
        assertFalse(Bench.texts(with, "cautions").contains("thermometer-not-included"));
    }

    @Test
    void aTargetReadOnTheSameSensorHardlyFeelsTheOffset() {
        Map<String, Node> settings = settings("thermometerOffset", Node.Quantity.of(1, "K"));
        double trueTarget = effect(body(settings, stated(), 333.15), 1);
        settings.put("targets", new Node.Text("same-sensor"));
        double sameSensor = effect(body(settings, stated(), 333.15), 1);
        // At 60 degrees Celsius and 100 kJ/mol: Ea/(R T^2) = 0.108 per kelvin against less than a hundredth of that.
        assertEquals(ENERGY / (Constants.GAS * 333.15 * 333.15), trueTarget, 0.002);
        assertTrue(sameSensor < 0.002, "effect " + sameSensor);
    }

    @Test
    void anOffsetStatedInFahrenheitDegreesIsADifference() {
        Node.Group kelvin = body(settings("thermometerOffset", Node.Quantity.of(0.5, "K")), stated());
        Node.Group fahrenheit = body(settings("thermometerOffset", Node.Quantity.of(0.9, "[degF]")), stated());
        assertEquals(
                Bench.parameter(kelvin, "eyring", "dH").standardUncertainty().orElseThrow(),
                Bench.parameter(fahrenheit, "eyring", "dH")
                        .standardUncertainty()
                        .orElseThrow(),
                1e-6);
    }

    @Test
    void aCommonConcentrationErrorMovesTheEntropyAndNotTheEnthalpy() {
        RateTable second =
                Bench.table(Bench.LITRE_PER_MOLE_SECOND, 2, KELVIN, rates(new double[5]), OptionalDouble.of(0.02));
        Node.Group with = body(settings("concentrationUncertainty", new Node.Scalar(0.03)), second);
        Node.Group without = body(Map.of(), second);
        assertEquals(
                Bench.parameter(without, "eyring", "dH").standardUncertainty().orElseThrow(),
                Bench.parameter(with, "eyring", "dH").standardUncertainty().orElseThrow(),
                1e-3);
        double own =
                Bench.parameter(without, "eyring", "dS").standardUncertainty().orElseThrow();
        double all = Bench.parameter(with, "eyring", "dS").standardUncertainty().orElseThrow();
        assertEquals(Constants.GAS * 0.03, Math.sqrt(all * all - own * own), 1e-6);
        assertEquals(
                body(Map.of(), stated()).get("models"),
                body(settings("concentrationUncertainty", new Node.Scalar(0.03)), stated())
                        .get("models"),
                "a first-order constant holds no concentration");
    }

    @Test
    void scatterAndOffsetTogetherTakeTheQuantileOfTheirSum() {
        RateTable table = Bench.firstOrder(KELVIN, rates(SCATTER));
        Node.Quantity energy = Bench.parameter(
                body(settings("thermometerOffset", Node.Quantity.of(0.5, "K")), table), "arrhenius", "Ea");
        assertEquals("t+normal", energy.interval().orElseThrow().method());
        double half = energy.interval().orElseThrow().upper().orElseThrow()
                - energy.value().orElseThrow();
        double u = energy.standardUncertainty().orElseThrow();
        assertTrue(half < 3.1825 * u && half > 1.95 * u, half / u + " standard uncertainties");
    }

    @Test
    void theBudgetAddsUpAndNamesTheLargestCause() {
        Map<String, Node> settings = settings("thermometerOffset", Node.Quantity.of(2, "K"));
        Node.Group body = body(settings, Bench.firstOrder(KELVIN, rates(SCATTER)), 298.15);
        Node.Table table =
                TreeReader.member((Node.Group) TreeReader.items(body, "budgets").get(0), "table", Node.Table.class);
        double share = 0;
        for (List<Node> row : table.rows()) {
            share += ((Node.Scalar) row.get(3)).value();
        }
        assertEquals(1, share, 1e-12);
        assertEquals(
                List.of("scatter of the runs", "common offset of the thermometer", "choice of the law"),
                table.rows().stream()
                        .map(row -> ((Node.Text) row.get(0)).value())
                        .toList());
    }

    @Test
    void theRangeOfHonestUseEndsWhereTheToleranceIsReached() {
        RateTable table = Bench.firstOrder(KELVIN, rates(SCATTER));
        Node.Group range = TreeReader.group(body(settings("tolerance", new Node.Scalar(0.25)), table), "honestRange");
        double lower = TreeReader.quantity(range, "lower").value().orElseThrow();
        double upper = TreeReader.quantity(range, "upper").value().orElseThrow();
        for (double end : new double[] {lower, upper}) {
            Node.Group row = (Node.Group)
                    TreeReader.items(body(Map.of(), table, end), "predictions").get(0);
            Node.Quantity k = TreeReader.quantity(row, "k");
            assertEquals(
                    1.25,
                    k.interval().orElseThrow().upper().orElseThrow() / k.value().orElseThrow(),
                    1e-9);
        }
        assertEquals(
                "nowhere",
                TreeReader.text(
                        TreeReader.group(body(settings("tolerance", new Node.Scalar(0.001)), table), "honestRange"),
                        "outcome"));
    }

    @Test
    void predictionsFromFindingsKeepTheSharedErrors() throws InputException {
        Map<String, Node> settings = settings("thermometerOffset", Node.Quantity.of(0.5, "K"));
        for (String targets : List.of("true", "same-sensor")) {
            settings.put("targets", new Node.Text(targets));
            Section section = section(settings, Bench.firstOrder(KELVIN, rates(SCATTER)), 290);
            Node.Group first = (Node.Group)
                    TreeReader.items((Node.Group) section.body(), "predictions").get(0);
            Node.Group again = (Node.Group)
                    BarrierComponent.predict(Bench.findings(section), List.of(290.0), List.of(), Bench.models())
                            .get(0);
            Node.Quantity a = TreeReader.quantity(first, "k");
            Node.Quantity b = TreeReader.quantity(again, "k");
            assertEquals(a.standardFactor().orElseThrow(), b.standardFactor().orElseThrow(), 1e-9);
            assertEquals(
                    a.interval().orElseThrow().upper().orElseThrow(),
                    b.interval().orElseThrow().upper().orElseThrow(),
                    1e-8 * a.value().orElseThrow());
        }
    }

    @Test
    void anUnusableSettingIsRefusedWithASentence() {
        for (Map<String, Node> settings : List.of(
                settings("thermometerOffset", Node.Quantity.of(-1, "K")),
                settings("thermometerOffset", Node.Quantity.of(1, "J/mol")),
                settings("thermometerOfset", Node.Quantity.of(1, "K")),
                settings("targets", new Node.Text("maybe")),
                settings("tolerance", new Node.Scalar(0)))) {
            Section section = section(settings, stated());
            assertEquals(Section.Outcome.REFUSED, section.outcome(), settings.toString());
            String reason = TreeReader.text((Node.Group) section.body(), "reason");
            assertTrue(reason.contains("barrier."), reason);
        }
    }

    private static double effect(Node.Group body, int row) {
        Node.Table table =
                TreeReader.member((Node.Group) TreeReader.items(body, "budgets").get(0), "table", Node.Table.class);
        return ((Node.Scalar) table.rows().get(row).get(2)).value();
    }

    private static Map<String, Node> settings(String key, Node value) {
        Map<String, Node> settings = new LinkedHashMap<>();
        settings.put(key, value);
        return settings;
    }

    private static RateTable stated() {
        return Bench.table(Bench.PER_SECOND, 1, KELVIN, rates(new double[5]), OptionalDouble.of(0.02));
    }

    private static double[] rates(double[] scatter) {
        double[] k = new double[KELVIN.length];
        for (int i = 0; i < k.length; i++) {
            k[i] = StrictMath.exp(28 - ENERGY / (Constants.GAS * KELVIN[i]) + scatter[i]);
        }
        return k;
    }

    private static Node.Group body(Map<String, Node> settings, RateTable table, double... targets) {
        return (Node.Group) section(settings, table, targets).body();
    }

    private static Section section(Map<String, Node> settings, RateTable table, double... targets) {
        List<Double> kelvin = java.util.Arrays.stream(targets).boxed().toList();
        Campaign campaign = Bench.campaign(table, Choices.defaults().withTargetsKelvin(kelvin), Bench.models());
        if (!settings.isEmpty()) {
            campaign = campaign.withSetting("barrier", new Node.Group(settings));
        }
        try {
            return new BarrierEvaluation(campaign, Bench.models(), Bench.TASK).section();
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }
}
