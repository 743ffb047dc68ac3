package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.task.Cancelled;

class NextMeasurementTest {
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double[] SCATTER = {0.04, -0.06, 0.02, 0.04, -0.04};

    @Test
    void forAColdTargetTheColdEndIsMeasuredWhenRunsCostTheSame() {
        Node.Group plan = plan(278.15, Map.of("runCost", new Node.Text("equal")));
        assertEquals("measure", TreeReader.text(plan, "outcome"));
        assertEquals(313.15, TreeReader.quantity(plan, "next").value().orElseThrow(), 1e-9);
    }

    @Test
    void aLowerAllowedTemperatureIsUsed() {
        Node.Group plan =
                plan(278.15, Map.of("runCost", new Node.Text("equal"), "measureFrom", Node.Quantity.of(20, "Cel")));
        assertEquals(293.15, TreeReader.quantity(plan, "next").value().orElseThrow(), 1e-9);
    }

    @Test
    void timeInProportionToTheHalfLifeMovesTheChoiceToWarmerRuns() {
        Map<String, Node> settings = new LinkedHashMap<>();
        settings.put("measureFrom", Node.Quantity.of(283.15, "K"));
        Node.Group byTime = plan(278.15, settings);
        settings.put("runCost", new Node.Text("equal"));
        Node.Group byRun = plan(278.15, settings);
        assertTrue(TreeReader.quantity(byTime, "next").value().orElseThrow()
                > TreeReader.quantity(byRun, "next").value().orElseThrow());
    }

    @Test
    void aMetToleranceSaysStop() {
        Node.Group plan = plan(333.15, Map.of("tolerance", new Node.Scalar(0.5)));
        assertEquals("reached", TreeReader.text(plan, "outcome"));
        assertTrue(TreeReader.text(plan, "advice").startsWith("Stop"));
        assertFalse(plan.get("next").isPresent());
    }

    @Test
    void noNumberOfRunsBeatsACommonOffset() {
        Node.Group plan =
                plan(278.15, Map.of("thermometerOffset", Node.Quantity.of(2, "K"), "tolerance", new Node.Scalar(0.05)));
        assertFalse(plan.get("runsNeeded").isPresent());
        assertTrue(Bench.texts(plan, "notes").contains("No number of runs reaches the tolerance"));
    }

    @Test
    void repeatsInTheMiddleNeverHalveTheUncertaintyFarOutside() {
        // Common practice: for k(5 C) from 40 to 80 C, repeats at 60 C alone leave almost all of the uncertainty.
        Node.Group plan = plan(
                278.15,
                Map.of(
                        "runCost",
                        new Node.Text("equal"),
                        "measureFrom",
                        Node.Quantity.of(333.15, "K"),
                        "measureTo",
                        Node.Quantity.of(333.15, "K"),
                        "tolerance",
                        new Node.Scalar(0.01)));
        assertFalse(plan.get("runsNeeded").isPresent());
    }

    @Test
    void aCampaignWithoutAMiddleIsAskedToKeepOne() {
        double[] ends = {313.15, 313.15, 313.15, 353.15, 353.15};
        Node.Group body = body(table(ends, SCATTER), 278.15, Map.of());
        Node.Group plan =
                (Node.Group) TreeReader.items(body, "nextMeasurements").get(0);
        assertTrue(Bench.texts(plan, "notes").contains("Keep one run near the middle"));
    }

    /** The promise is kept: the median of realised over promised half-widths of simulated campaigns lies near one. */
    @Test
    void simulatedCampaignsRealiseThePromisedWidth() {
        Random random = new Random(20261201);
        double[] ratios = new double[200];
        for (int i = 0; i < ratios.length; i++) {
            double[] scatter = new double[5];
            for (int j = 0; j < 5; j++) {
                scatter[j] = 0.05 * random.nextGaussian();
            }
            RateTable table = table(KELVIN, scatter);
            Map<String, Node> settings = Map.of(
                    "runCost", new Node.Text("equal"),
                    "measureFrom", Node.Quantity.of(293.15, "K"),
                    "tolerance", new Node.Scalar(0.02));
            Node.Group plan = (Node.Group) TreeReader.items(body(table, 278.15, settings), "nextMeasurements")
                    .get(0);
            List<RatePoint> points = new ArrayList<>(table.points());
            double next = TreeReader.quantity(plan, "next").value().orElseThrow();
            for (int r = 0; r < TreeReader.number(plan, "repeats"); r++) {
                points.add(RatePoint.of(next, rate(next, 0.05 * random.nextGaussian())));
            }
            Node.Group realised =
                    (Node.Group) TreeReader.items(body(table.withPoints(points), 278.15, settings), "nextMeasurements")
                            .get(0);
            ratios[i] = StrictMath.log1p(TreeReader.number(realised, "present"))
                    / StrictMath.log1p(TreeReader.number(plan, "promised"));
        }
        Arrays.sort(ratios);
        double median = ratios[ratios.length / 2];
        // Four standard errors of a median of 200 ratios are about 0.12.
        assertEquals(1.0, median, 0.18, "median of realised over promised half-width");
    }

    private static double rate(double kelvin, double scatter) {
        return StrictMath.exp(28 - 100_000 / (Constants.GAS * kelvin) + scatter);
    }

    private static RateTable table(double[] kelvin, double[] scatter) {
        double[] k = new double[kelvin.length];
        for (int i = 0; i < k.length; i++) {
            k[i] = rate(kelvin[i], scatter[i]);
        }
        return Bench.table(Bench.PER_SECOND, 1, kelvin, k, OptionalDouble.empty());
    }

    private static Node.Group plan(double target, Map<String, Node> settings) {
        Node.Group body = body(table(KELVIN, SCATTER), target, settings);
        return (Node.Group) TreeReader.items(body, "nextMeasurements").get(0);
    }

    private static Node.Group body(RateTable table, double target, Map<String, Node> settings) {
        Campaign campaign = Bench.campaign(
                table,
                Choices.defaults().withModels(List.of("arrhenius")).withTargetsKelvin(List.of(target)),
                Bench.models());
        if (!settings.isEmpty()) {
            campaign = campaign.withSetting("barrier", new Node.Group(settings));
        }
        try {
            return (Node.Group) new BarrierEvaluation(campaign, Bench.models(), Bench.TASK)
                    .section()
                    .body();
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }
}
