package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.model.eyring.heat.capacity.internal.EyringHeatCapacity;
import org.saddlebook.model.falloff.internal.Lindemann;
import org.saddlebook.model.falloff.internal.Troe;
import org.saddlebook.model.parallel.channels.internal.ParallelChannels;
import org.saddlebook.model.shifted.origin.internal.ShiftedOrigin;

/** Simulated truth and edges of the laws beside the three that every product has. */
class FurtherLawsTest {
    private static final Unit PER_MINUTE = new Unit("1/min", Dimension.rateConstant(1), 1.0 / 60, 0);

    /** A law, its true parameters, temperatures and third bodies (mol/m3; none for a law of temperature alone). */
    @SuppressWarnings("ArrayRecordComponent") // made and read in this class only, never compared
    private record Truth(RateModel model, double[] p, double[] kelvin, double[] thirdBody) {
        RateTable table(Unit unit, double scatter, long seed) {
            Random random = new Random(seed);
            List<RatePoint> points = new ArrayList<>();
            RateFunction law = law();
            for (double t : kelvin) {
                for (double m : thirdBody.length == 0 ? new double[] {1} : thirdBody) {
                    Conditions at =
                            thirdBody.length == 0 ? Conditions.NONE : Conditions.NONE.with(Conditions.THIRD_BODY, m);
                    double ln = law.lnRate(t, at, p, new double[p.length]) + scatter * random.nextGaussian();
                    points.add(RatePoint.of(t, StrictMath.exp(ln)).withConditions(at));
                }
            }
            return new RateTable(unit, 1, points);
        }

        RateFunction law() {
            try {
                return model.bind(model.completed(RateContext.of(Bench.PER_SECOND, 1)));
            } catch (Inapplicable impossible) {
                throw new AssertionError(impossible);
            }
        }
    }

    private static double[] grid(double from, double to, int n) {
        double[] grid = new double[n];
        for (int i = 0; i < n; i++) {
            grid[i] = from + (to - from) * i / (n - 1);
        }
        return grid;
    }

    private static Truth truth(String id) {
        double[] none = {};
        return switch (id) {
            case "eyring-heat-capacity" ->
                new Truth(new EyringHeatCapacity(), new double[] {85_000, -20, -400}, grid(280, 380, 11), none);
            case "parallel-channels" ->
                new Truth(
                        new ParallelChannels(),
                        new double[] {Math.log(5e2), 45_000, Math.log(3e13), 110_000},
                        grid(270, 400, 14),
                        none);
            case "shifted-origin" ->
                new Truth(new ShiftedOrigin(), new double[] {20, 1500, 190}, grid(240, 400, 12), none);
            case "falloff-lindemann" ->
                new Truth(
                        new Lindemann(),
                        new double[] {Math.log(6e11), 170_000, Math.log(1e15), 200_000},
                        grid(500, 700, 5),
                        new double[] {0.02, 0.2, 2, 20, 200});
            default ->
                new Truth(
                        new Troe(),
                        new double[] {Math.log(6e11), 170_000, Math.log(1e15), 200_000, 0.45},
                        grid(500, 700, 5),
                        new double[] {0.02, 0.2, 2, 20, 200});
        };
    }

    private static Node.Group body(RateTable table, Truth truth) {
        return Bench.body(
                table, Choices.defaults().withModels(List.of(truth.model().id())), truth.model());
    }

    private static double value(Node.Quantity quantity) {
        return quantity.value().orElseThrow();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "eyring-heat-capacity",
                "parallel-channels",
                "shifted-origin",
                "falloff-lindemann",
                "falloff-troe"
            })
    void findsTheTruthWithinItsIntervals(String id) {
        Truth truth = truth(id);
        List<Parameter> parameters = truth.law().parameters();
        RateContext context = truth.model().completed(RateContext.of(Bench.PER_SECOND, 1));
        int inside = 0;
        int campaigns = 100;
        for (int seed = 0; seed < campaigns; seed++) {
            Measurements data =
                    Measurements.of(truth.table(Bench.PER_SECOND, 0.02, seed), ErrorModel.CONSTANT_RELATIVE);
            FittedLaw law = (FittedLaw) LawFitter.fit(truth.model(), context, data, () -> {});
            for (int i = 0; i < parameters.size(); i++) {
                FittedLaw.Estimate estimate = law.parameter(i);
                double distance = Math.abs(estimate.value() - truth.p()[i]);
                inside += distance <= estimate.halfWidth(0.95, law.degreesOfFreedom()) ? 1 : 0;
            }
        }
        double share = (double) inside / campaigns / parameters.size();
        // 95 % intervals; a campaign's parameters move together, so the share of all of them scatters by some percent.
        assertTrue(share > 0.89 && share <= 0.995, id + " covers " + share);
    }

    @ParameterizedTest
    @ValueSource(strings = {"parallel-channels", "shifted-origin", "falloff-troe"})
    void givesTheSameAnswerInAnyUnit(String id) {
        Truth truth = truth(id);
        RateTable seconds = truth.table(Bench.PER_SECOND, 0.02, 7);
        RateTable minutes = new RateTable(PER_MINUTE, 1, seconds.points());
        Node.Group one = body(seconds, truth);
        Node.Group other = body(minutes, truth);
        for (var parameter : truth.law().parameters()) {
            Node.Quantity first = Bench.parameter(one, id, parameter.symbol());
            Node.Quantity second = Bench.parameter(other, id, parameter.symbol());
            double factor = first.unit().equals(second.unit()) ? 1 : 60;
            assertEquals(1, value(second) / value(first) / factor, 1e-9, parameter.symbol());
        }
    }

    @Test
    void channelsStandInOrderOfTheirEnergiesAndSaySo() {
        Truth truth = truth("parallel-channels");
        Node.Group body = body(truth.table(Bench.PER_SECOND, 0.02, 3), truth);
        assertTrue(value(Bench.parameter(body, "parallel-channels", "Ea1"))
                < value(Bench.parameter(body, "parallel-channels", "Ea2")));
        assertTrue(Bench.texts(body, "notes").contains("same with the channels exchanged"));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.02})
    void identicalChannelsAreUndetermined(double scatter) {
        Truth same = new Truth(
                new ParallelChannels(),
                new double[] {Math.log(1e11), 80_000, Math.log(1e11), 80_000},
                grid(300, 360, 9),
                new double[0]);
        Node.Group body = body(same.table(Bench.PER_SECOND, scatter, 11), same);
        assertEquals("undetermined", TreeReader.text(Bench.model(body, "parallel-channels"), "outcome"));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-9, 1e9})
    void aCampaignAtOneEndOfTheFalloffDoesNotDetermineTheOtherLimit(double thirdBody) {
        Truth end = new Truth(
                new Lindemann(),
                new double[] {Math.log(6e11), 170_000, Math.log(1e15), 200_000},
                grid(500, 700, 5),
                new double[] {thirdBody, 2 * thirdBody, 5 * thirdBody});
        Node.Group body = body(end.table(Bench.PER_SECOND, 0.02, 5), end);
        if (TreeReader.text(Bench.model(body, "falloff-lindemann"), "outcome").equals("fitted")) {
            // The scatter may look like a hint of the other limit; then its factor must be open by powers of ten.
            String absent = thirdBody < 1 ? "Ainf" : "A0";
            String present = thirdBody < 1 ? "E0" : "Einf";
            double factor = Bench.parameter(body, "falloff-lindemann", absent)
                    .standardFactor()
                    .orElse(Double.POSITIVE_INFINITY);
            assertTrue(factor > 100, absent + " known within a factor of " + factor);
            double energy = value(Bench.parameter(body, "falloff-lindemann", present));
            assertEquals(thirdBody < 1 ? 170_000 : 200_000, energy, 10_000);
        } else {
            assertEquals("undetermined", TreeReader.text(Bench.model(body, "falloff-lindemann"), "outcome"));
        }
    }

    @Test
    void aTableWithoutThirdBodyRefusesFalloffAndNamesTheColumn() {
        Truth truth = truth("falloff-troe");
        Node.Group body = Bench.body(
                Bench.firstOrder(new double[] {300, 310, 320, 330}, new double[] {1, 2, 4, 8}),
                Choices.defaults().withModels(List.of("falloff-troe")),
                truth.model());
        Node.Group model = Bench.model(body, "falloff-troe");
        assertEquals("refused", TreeReader.text(model, "outcome"));
        assertTrue(TreeReader.text(model, "reason").contains("[M] (molecule cm-3)"), TreeReader.text(model, "reason"));
    }

    @Test
    void falloffPredictsOnlyAtAStatedThirdBody() throws Exception {
        Truth truth = truth("falloff-troe");
        RateTable table = truth.table(Bench.PER_SECOND, 0.02, 2);
        Choices choices = Choices.defaults().withModels(List.of("falloff-troe")).withTargetsKelvin(List.of(620.0));
        Node.Group without = Bench.body(table, choices, truth.model());
        assertTrue(TreeReader.items(without, "predictions").isEmpty());
        assertTrue(Bench.texts(without, "notes").contains("the third body is not stated"));
        var installed = Bench.models(truth.model());
        Node.Group barrier = new Tree()
                .put(Surroundings.THIRD_BODY, Node.Quantity.of(3, "mol/m3"))
                .group();
        Node.Group with = (Node.Group) new BarrierEvaluation(
                        Bench.campaign(table, choices, installed).withSetting("barrier", barrier),
                        installed,
                        Bench.TASK)
                .section()
                .body();
        Node.Group row = (Node.Group) TreeReader.items(with, "predictions").get(0);
        double expected = StrictMath.exp(
                truth.law().lnRate(620, Conditions.NONE.with(Conditions.THIRD_BODY, 3), truth.p(), new double[5]));
        assertEquals(1, value(TreeReader.quantity(row, "k")) / expected, 0.05);
    }

    @Test
    void aPressureStandsForTheThirdBodyOfAnIdealGas() {
        Truth truth = truth("falloff-lindemann");
        RateTable table = truth.table(Bench.PER_SECOND, 0.02, 4);
        List<RatePoint> points = new ArrayList<>();
        for (RatePoint point : table.points()) {
            // p = [M] R T, the ideal gas law.
            double pascal =
                    point.conditions().thirdBody(point.kelvin()).orElseThrow() * 8.31446261815324 * point.kelvin();
            points.add(point.withConditions(Conditions.NONE.with(Conditions.PRESSURE, pascal)));
        }
        Node.Group one = body(table, truth);
        Node.Group other = body(table.withPoints(points), truth);
        for (String symbol : List.of("A0", "E0", "Ainf", "Einf")) {
            assertEquals(
                    1,
                    value(Bench.parameter(other, "falloff-lindemann", symbol))
                            / value(Bench.parameter(one, "falloff-lindemann", symbol)),
                    1e-9);
        }
    }

    @Test
    void aPredictionBelowTheOriginIsLeftOutWithANote() {
        Truth truth = truth("shifted-origin");
        Node.Group body = Bench.body(
                truth.table(Bench.PER_SECOND, 0.02, 6),
                Choices.defaults()
                        .withModels(List.of("arrhenius", "shifted-origin"))
                        .withTargetsKelvin(List.of(180.0, 300.0)),
                truth.model());
        int rows = 0;
        for (Node row : TreeReader.items(body, "predictions")) {
            rows += TreeReader.text((Node.Group) row, "model").equals("shifted-origin") ? 1 : 0;
        }
        assertEquals(1, rows);
        assertTrue(
                Bench.texts(body, "notes").contains("Shifted origin has no value at 180"), Bench.texts(body, "notes"));
        // What is above the origin is computed as before.
        assertFalse(TreeReader.items(body, "budgets").isEmpty());
    }

    @Test
    void heatCapacityAndTemperatureExponentAreOneCurveAndComparedOnce() {
        Truth truth = truth("eyring-heat-capacity");
        Node.Group body = Bench.body(truth.table(Bench.PER_SECOND, 0.02, 8), Choices.defaults(), truth.model());
        Node.Group comparison = TreeReader.group(body, "comparison");
        assertTrue(Bench.texts(comparison, "notes").contains("are the same curve in other parameters"));
        assertEquals("eyring-heat-capacity", TreeReader.text(comparison, "best"));
        // dCp = (n - 1) R at a standard concentration.
        assertEquals(
                (value(Bench.parameter(body, "modified-arrhenius", "n")) - 1) * 8.31446261815324,
                value(Bench.parameter(body, "eyring-heat-capacity", "dCp")),
                1e-5);
    }

    @Test
    void aLawThatIsNotLinearIsFoundToContainTheSimplerOne() {
        Truth curved = truth("shifted-origin");
        Node.Group bent = Bench.body(
                curved.table(Bench.PER_SECOND, 0.02, 9),
                Choices.defaults().withModels(List.of("arrhenius", "shifted-origin")),
                curved.model());
        assertEquals("shifted-origin", TreeReader.text(TreeReader.group(bent, "comparison"), "best"));
        Truth straight = new Truth(new ShiftedOrigin(), new double[] {25, 9000, 0}, grid(300, 360, 8), new double[0]);
        Node.Group flat = Bench.body(
                straight.table(Bench.PER_SECOND, 0.02, 9),
                Choices.defaults().withModels(List.of("arrhenius", "shifted-origin")),
                straight.model());
        assertTrue(Bench.texts(TreeReader.group(flat, "comparison"), "notes")
                .contains("Shifted origin against Arrhenius: the 95 % interval of Tinf"));
        assertEquals(OptionalDouble.empty(), straight.law().parameters().get(0).neutral());
    }
}
