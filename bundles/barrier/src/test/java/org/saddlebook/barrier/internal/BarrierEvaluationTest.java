package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Constants;

class BarrierEvaluationTest {
    private static final double[] FIVE = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double[] SCATTER = {0.02, -0.03, 0.01, 0.02, -0.02};

    @Test
    void twoPointsGiveParametersWithoutAnyUncertainty() {
        Node.Group body = Bench.body(
                Bench.firstOrder(new double[] {300, 320}, new double[] {1e-4, 1e-3}),
                Choices.defaults().withTargetsKelvin(List.of(310.0)));
        Node.Quantity energy = Bench.parameter(body, "arrhenius", "Ea");
        assertEquals(
                Constants.GAS * StrictMath.log(10) / (1 / 300.0 - 1 / 320.0),
                energy.value().orElseThrow(),
                1e-8);
        assertTrue(energy.standardUncertainty().isEmpty());
        assertTrue(energy.interval().isEmpty());
        assertTrue(energy.cautions().contains("no-scale-estimate"));
        Node.Group row = (Node.Group) TreeReader.items(body, "predictions").get(0);
        assertTrue(TreeReader.quantity(row, "k").interval().isEmpty());
        assertFalse(row.get("kNewRun").isPresent());
        assertEquals(
                "undetermined",
                TreeReader.text(Bench.model(body, "modified-arrhenius"), "outcome"),
                "three parameters need three temperatures");
    }

    @Test
    void threePointsGiveIntervalsWithACaution() {
        Node.Group body = Bench.body(
                Bench.firstOrder(new double[] {300, 310, 320}, new double[] {1e-4, 3.3e-4, 1e-3}), Choices.defaults());
        Node.Quantity energy = Bench.parameter(body, "arrhenius", "Ea");
        assertTrue(energy.interval().isPresent());
        assertTrue(energy.cautions().contains("three-points"));
        assertTrue(Bench.parameter(body, "modified-arrhenius", "E").interval().isEmpty());
    }

    @Test
    void oneTemperatureDeterminesNothing() {
        Node.Group body = Bench.body(
                Bench.firstOrder(new double[] {300, 300, 300}, new double[] {1e-4, 1.1e-4, 0.9e-4}),
                Choices.defaults());
        for (String id : List.of("arrhenius", "eyring", "modified-arrhenius")) {
            assertEquals("undetermined", TreeReader.text(Bench.model(body, id), "outcome"));
            assertTrue(TreeReader.group(Bench.model(body, id), "parameters")
                    .members()
                    .isEmpty());
        }
        assertTrue(TreeReader.text(Bench.model(body, "eyring"), "reason").contains("the table has 1"));
    }

    @Test
    void aTableOfExcludedPointsIsRefused() {
        RateTable table = Bench.firstOrder(FIVE, FIVE);
        List<RatePoint> none =
                table.points().stream().map(point -> point.exclude("spilled")).toList();
        assertEquals(
                Section.Outcome.REFUSED,
                Bench.section(table.withPoints(none), Choices.defaults()).outcome());
    }

    @Test
    void excludedPointsDoNotCount() {
        RateTable table = arrhenius(SCATTER);
        List<RatePoint> points = new java.util.ArrayList<>(table.points());
        Node.Group without = Bench.body(table, Choices.defaults());
        points.add(RatePoint.of(363.15, 1).exclude("leak"));
        Node.Group with = Bench.body(table.withPoints(points), Choices.defaults());
        assertEquals(TreeReader.group(without, "comparison"), TreeReader.group(with, "comparison"));
        assertEquals(Bench.model(without, "eyring"), Bench.model(with, "eyring"));
        assertEquals(1, TreeReader.number(TreeReader.group(with, "table"), "excluded"));
    }

    @Test
    void arrheniusAndEyringAgreeOnTheirDerivedValuesAtTheCentre() {
        Node.Group body = Bench.body(arrhenius(SCATTER), Choices.defaults());
        double energy = Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow();
        Node.Quantity derived = Bench.derived(body, "eyring", "Ea");
        double uncertainty = derived.standardUncertainty().orElseThrow();
        assertEquals(energy, derived.value().orElseThrow(), uncertainty / 3);
        assertEquals(
                Bench.derived(body, "arrhenius", "dG").value().orElseThrow(),
                Bench.derived(body, "eyring", "dG").value().orElseThrow(),
                Bench.derived(body, "eyring", "dG").standardUncertainty().orElseThrow() / 3);
    }

    @Test
    void theGibbsEnergyAtTheCentreIsFarBetterKnownThanTheEnthalpy() {
        Node.Group body = Bench.body(arrhenius(SCATTER), Choices.defaults());
        double enthalpy =
                Bench.parameter(body, "eyring", "dH").standardUncertainty().orElseThrow();
        double gibbs = Bench.derived(body, "eyring", "dG").standardUncertainty().orElseThrow();
        // u(dG) = R T s / sqrt(n) at the centre.
        double s = TreeReader.number(TreeReader.group(Bench.model(body, "eyring"), "statistics"), "s");
        double centre = TreeReader.quantity(Bench.model(body, "eyring"), "derivedAt")
                .value()
                .orElseThrow();
        assertEquals(Constants.GAS * centre * s / Math.sqrt(5), gibbs, 1e-9 * gibbs);
        assertTrue(gibbs < enthalpy / 20);
    }

    @Test
    void statedUncertaintiesAreNeverRescaled() {
        RateTable table = Bench.table(Bench.PER_SECOND, 1, FIVE, rates(SCATTER), OptionalDouble.of(0.10));
        Node.Group stated = Bench.body(table, Choices.defaults());
        Node.Group estimated = Bench.body(arrhenius(SCATTER), Choices.defaults());
        assertEquals("stated", TreeReader.text(stated, "errorModel"));
        Node.Group statistics = TreeReader.group(Bench.model(stated, "arrhenius"), "statistics");
        double s = TreeReader.number(TreeReader.group(Bench.model(estimated, "arrhenius"), "statistics"), "s");
        double ratio =
                Bench.parameter(stated, "arrhenius", "Ea").standardUncertainty().orElseThrow()
                        / Bench.parameter(estimated, "arrhenius", "Ea")
                                .standardUncertainty()
                                .orElseThrow();
        assertEquals(0.10 / s, ratio, 1e-9);
        assertEquals(3 * s * s / 0.01, TreeReader.number(statistics, "chiSquared"), 1e-9);
        assertEquals(
                "normal",
                Bench.parameter(stated, "arrhenius", "Ea")
                        .interval()
                        .orElseThrow()
                        .method());
        assertEquals(
                "t",
                Bench.parameter(estimated, "arrhenius", "Ea")
                        .interval()
                        .orElseThrow()
                        .method());
    }

    @Test
    void veryUncertainRateConstantsAreFittedThemselvesAndAgreeWhereThereIsNoScatter() {
        RateTable table = Bench.table(Bench.PER_SECOND, 1, FIVE, rates(new double[5]), OptionalDouble.of(0.3));
        Node.Group body = Bench.body(table, Choices.defaults());
        assertEquals("k", TreeReader.text(body, "response"));
        assertEquals(90_000, Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow(), 1e-5);
        assertEquals("fitted", TreeReader.text(Bench.model(body, "eyring"), "outcome"));
    }

    @Test
    void straightAndCurvedLawsCannotBeToldApartOnFiveScatteredPoints() {
        Node.Group comparison = TreeReader.group(Bench.body(arrhenius(SCATTER), Choices.defaults()), "comparison");
        assertTrue(TreeReader.member(comparison, "undecided", Node.Flag.class).value());
        assertFalse(comparison.get("best").isPresent());
        assertEquals("arrhenius\neyring\nmodified-arrhenius\n", Bench.texts(comparison, "candidates"));
        String notes = Bench.texts(comparison, "notes");
        assertTrue(
                notes.contains("Modified Arrhenius: no AICc, 5 points are too few for 4 estimated quantities"), notes);
    }

    @Test
    void strongCurvatureIsSeenAndTheStraightLawsAreLeftOut() {
        double[] kelvin = new double[12];
        double[] k = new double[12];
        for (int i = 0; i < 12; i++) {
            kelvin[i] = 280 + 20 * i;
            k[i] = StrictMath.exp(20
                    + 6 * StrictMath.log(kelvin[i] / 298.15)
                    - 60_000 / (Constants.GAS * kelvin[i])
                    + 0.01 * SCATTER[i % 5] / 0.02);
        }
        Node.Group comparison =
                TreeReader.group(Bench.body(Bench.firstOrder(kelvin, k), Choices.defaults()), "comparison");
        assertEquals("modified-arrhenius", TreeReader.text(comparison, "best"));
        assertFalse(TreeReader.member(comparison, "undecided", Node.Flag.class).value());
        assertTrue(Bench.texts(comparison, "notes").contains("excludes 1, where the two laws coincide"));
    }

    @Test
    void theSimplerLawSufficesWhereNoCurvatureTheDataAllowWouldMatter() {
        double[] tiny = {1e-3, -1.5e-3, 5e-4, 1e-3, -1e-3};
        Choices inside = Choices.defaults().withTargetsKelvin(List.of(333.15));
        Node.Group comparison = TreeReader.group(Bench.body(arrhenius(tiny), inside), "comparison");
        assertEquals("arrhenius\neyring\n", Bench.texts(comparison, "candidates"));
        assertTrue(Bench.texts(comparison, "notes").contains("suffices there"));
    }

    @Test
    void anUndeterminedExponentKeepsItsIntervalAndSaysSo() {
        Node.Quantity n =
                Bench.parameter(Bench.body(arrhenius(SCATTER), Choices.defaults()), "modified-arrhenius", "n");
        assertTrue(n.cautions().contains("undetermined"));
        Interval interval = n.interval().orElseThrow();
        assertTrue(interval.lower().orElseThrow() < 0 && interval.upper().orElseThrow() > 0);
    }

    @Test
    void aHeldExponentIsNoParameterAnyMore() {
        Node.Group body =
                Bench.body(arrhenius(SCATTER), Choices.defaults().withFixed(Map.of("modified-arrhenius/n", 0.0)));
        assertEquals(
                Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow(),
                Bench.parameter(body, "modified-arrhenius", "E").value().orElseThrow(),
                1e-6);
    }

    @Test
    void predictionsSayHowFarTheyReachAndCarryTheirCautions() {
        Node.Group body = Bench.body(arrhenius(SCATTER), Choices.defaults().withTargetsKelvin(List.of(278.15, 333.0)));
        Node.Group cold = (Node.Group) TreeReader.items(body, "predictions").get(0);
        assertEquals(35, TreeReader.quantity(cold, "extrapolation").value().orElseThrow(), 1e-9);
        Node.Quantity k = TreeReader.quantity(cold, "k");
        assertTrue(k.cautions()
                .containsAll(
                        List.of("extrapolated", "same-mechanism", "not-a-hazard-assessment", "storage-lower-bound")));
        Node.Quantity newRun = TreeReader.quantity(cold, "kNewRun");
        assertTrue(newRun.interval().orElseThrow().upper().orElseThrow()
                > k.interval().orElseThrow().upper().orElseThrow());
        Node.Group inside = (Node.Group) TreeReader.items(body, "predictions").get(1);
        assertEquals(0, TreeReader.quantity(inside, "extrapolation").value().orElseThrow());
        assertFalse(TreeReader.quantity(inside, "k").cautions().contains("extrapolated"));
    }

    @Test
    void predictionsFromFindingsAloneAreTheSame() throws InputException {
        Choices choices = Choices.defaults().withTargetsKelvin(List.of(278.15, 333.0));
        RateTable table = Bench.table(Bench.LITRE_PER_MOLE_SECOND, 2, FIVE, rates(SCATTER), OptionalDouble.empty());
        Section section = Bench.section(table, choices);
        Node.Group body = (Node.Group) section.body();
        List<Node> again =
                BarrierComponent.predict(Bench.findings(section), choices.targetsKelvin(), List.of(), Bench.models());
        List<Node> first = TreeReader.items(body, "predictions");
        assertEquals(first.size(), again.size());
        for (int i = 0; i < first.size(); i++) {
            for (String key : List.of("k", "kNewRun")) {
                Node.Quantity a = TreeReader.quantity((Node.Group) first.get(i), key);
                Node.Quantity b = TreeReader.quantity((Node.Group) again.get(i), key);
                assertEquals(
                        a.value().orElseThrow(),
                        b.value().orElseThrow(),
                        1e-10 * a.value().orElseThrow());
                assertEquals(
                        a.standardFactor().orElseThrow(), b.standardFactor().orElseThrow(), 1e-8);
                assertEquals(a.cautions(), b.cautions());
            }
        }
    }

    @Test
    void aLawWithAHeldParameterPredictsFromFindingsToo() throws InputException {
        Choices choices = Choices.defaults()
                .withTargetsKelvin(List.of(300.0))
                .withModels(List.of("modified-arrhenius"))
                .withFixed(Map.of("modified-arrhenius/n", 0.5));
        Section section = Bench.section(arrhenius(SCATTER), choices);
        Node.Group first = (Node.Group)
                TreeReader.items((Node.Group) section.body(), "predictions").get(0);
        Node.Group again = (Node.Group)
                BarrierComponent.predict(Bench.findings(section), List.of(300.0), List.of(), Bench.models())
                        .get(0);
        double k = TreeReader.quantity(first, "k").value().orElseThrow();
        assertEquals(k, TreeReader.quantity(again, "k").value().orElseThrow(), 1e-10 * k);
    }

    @Test
    void aHintFromTheEntropyNeedsItsConditions() {
        RateTable table = arrhenius(SCATTER);
        assertTrue(hint(table, Choices.defaults()).contains("not stated that the constant belongs to an elementary"));
        assertTrue(hint(table, Choices.defaults().withConstantKind(ConstantKind.PSEUDO_ORDER))
                .contains("stated to be pseudo-order"));
        String elementary = hint(table, Choices.defaults().withConstantKind(ConstantKind.ELEMENTARY));
        assertTrue(elementary.contains("is negative") || elementary.contains("includes zero"), elementary);
        RateTable second = Bench.table(Bench.LITRE_PER_MOLE_SECOND, 2, FIVE, rates(SCATTER), OptionalDouble.empty());
        assertTrue(hint(
                        second,
                        Choices.defaults()
                                .withConstantKind(ConstantKind.ELEMENTARY)
                                .withStandard(StandardState.ONE_BAR))
                .contains("read at 1 mol/L only"));
    }

    @Test
    void theStandardStateIsPrintedAndItsAssumptionSaid() {
        Node.Group assumed = Bench.body(arrhenius(SCATTER), Choices.defaults());
        assertTrue(Bench.parameter(assumed, "eyring", "dS").cautions().contains("assumed-standard-state"));
        Node.Group stated = Bench.body(arrhenius(SCATTER), Choices.defaults().withStandard(StandardState.ONE_BAR));
        assertFalse(Bench.parameter(stated, "eyring", "dS").cautions().contains("assumed-standard-state"));
        assertEquals("1 bar", TreeReader.text(TreeReader.group(stated, "context"), "standardStateText"));
    }

    @Test
    void everyCautionUsedHasItsText() {
        Section section = Bench.section(arrhenius(SCATTER), Choices.defaults().withTargetsKelvin(List.of(278.15)));
        java.util.Set<String> used = new java.util.LinkedHashSet<>();
        Cautions.collect(section.body(), used);
        assertTrue(section.cautions().keySet().containsAll(used));
        assertTrue(section.cautions().values().stream().noneMatch(String::isBlank));
    }

    private static String hint(RateTable table, Choices choices) {
        return Bench.texts(Bench.body(table, choices), "notes");
    }

    private static RateTable arrhenius(double[] scatter) {
        return Bench.firstOrder(FIVE, rates(scatter));
    }

    private static double[] rates(double[] scatter) {
        double[] k = new double[FIVE.length];
        for (int i = 0; i < k.length; i++) {
            k[i] = StrictMath.exp(25 - 90_000 / (Constants.GAS * FIVE[i]) + scatter[i]);
        }
        return k;
    }
}
