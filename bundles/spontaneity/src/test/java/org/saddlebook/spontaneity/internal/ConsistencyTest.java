package org.saddlebook.spontaneity.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.testkit.api.ImmediateTask;
import org.saddlebook.thermo.data.api.CuratedSet;

/** Forward and reverse rate constants against K, and cycles, against sums by hand and NumPy. Invented rate constants. */
class ConsistencyTest {
    private static final double H = 50_000;
    private static final double S = 100;
    private static final double[] KELVIN = {300, 320, 340};

    private static Node.Group group(Object... pairs) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (int i = 0; i < pairs.length; i += 2) {
            Object value = pairs[i + 1];
            members.put(
                    (String) pairs[i],
                    value instanceof Node node
                            ? node
                            : value instanceof Number number
                                    ? new Node.Scalar(number.doubleValue())
                                    : new Node.Text((String) value));
        }
        return new Node.Group(members);
    }

    private static Node rates(String unit, double[] k, double[] u) {
        List<Node> rows = new ArrayList<>();
        for (int i = 0; i < k.length; i++) {
            rows.add(
                    u.length == 0
                            ? group("temperature", KELVIN[i], "k", k[i])
                            : group("temperature", KELVIN[i], "k", k[i], "u", u[i]));
        }
        return group("unit", unit, "rows", new Node.Items(rows));
    }

    /** Reverse rate constants in L/(mol s) of an invented line; forward ones in 1/s from K at 1 mol/L, times exp(error). */
    private static Node consistency(double[] errors, double[] forward, double[] reverse) {
        double[] kr = new double[KELVIN.length];
        double[] kf = new double[KELVIN.length];
        for (int i = 0; i < kr.length; i++) {
            kr[i] = 1e9 * Math.exp(-20_000 / (Constants.GAS * KELVIN[i]));
            double k = Math.exp(-(H - KELVIN[i] * S) / (Constants.GAS * KELVIN[i]));
            kf[i] = kr[i] * k * Math.exp(errors[i]);
        }
        return group("forward", rates("1/s", kf, forward), "reverse", rates("L/(mol.s)", kr, reverse));
    }

    private static Node stated(double uH, double uS) {
        return group(
                "dH",
                Node.Quantity.of(H, "J/mol", uH),
                "dS",
                Node.Quantity.of(S, "J/(mol.K)", uS),
                "correlation",
                0.95,
                "standardState",
                "1 mol/L");
    }

    private static Section section(Node consistency, Node spontaneity) throws Exception {
        Campaign campaign = Campaign.titled("invented")
                .withSetting("consistency", consistency)
                .withSetting("spontaneity", spontaneity);
        return new ConsistencyComponent(List.of(CuratedSet.source()))
                .analyse(campaign, new Findings("invented", "", List.of(), Map.of()), ImmediateTask.seeded(1));
    }

    private static Node at(Node node, Object... path) {
        Node here = node;
        for (Object step : path) {
            here = step instanceof Integer index
                    ? ((Node.Items) here).items().get(index)
                    : ((Node.Group) here).get((String) step).orElseThrow(() -> new AssertionError("no " + step));
        }
        return here;
    }

    private static double number(Node node, Object... path) {
        Node leaf = at(node, path);
        return leaf instanceof Node.Quantity quantity ? quantity.value().orElseThrow() : ((Node.Scalar) leaf).value();
    }

    private static String text(Node node, Object... path) {
        return ((Node.Text) at(node, path)).value();
    }

    /**
     * chi-squared 10.0935523, p 0.0177874 and standard uncertainties: NumPy 2.4.6, {@code d @ solve(C, d)} with C the sum of
     * both rates' variances and of the covariance of ΔH and ΔS carried to each pair of temperatures; SciPy 1.17.1 chi2.sf.
     */
    @Test
    void testsSharedTemperaturesWithTheFullCovarianceOfK() throws Exception {
        Section section = section(
                consistency(new double[] {0.15, -0.05, 0.22}, new double[] {0.05, 0.04, 0.05}, new double[] {
                    0.06, 0.05, 0.04
                }),
                stated(1000, 3));
        Node rates = at(section.body(), "rates");
        assertEquals("kf/kr = K (c°)^1, K from: ΔH and ΔS as stated", text(rates, "relation"));
        assertEquals(10.093552304394226, number(rates, "pointTest", "chiSquared"), 1e-8);
        assertEquals(0.017787418715069857, number(rates, "pointTest", "pValue"), 1e-9);
        assertEquals(3, number(rates, "pointTest", "degreesOfFreedom"));
        Node.Quantity first = (Node.Quantity) at(rates, "points", 0, "difference");
        assertEquals(0.15, first.value().orElseThrow(), 1e-12);
        assertEquals(0.14890504, first.standardUncertainty().orElseThrow(), 1e-8);
        assertEquals("do not agree", text(rates, "verdict"));
    }

    @Test
    void exactRatesAgreeAndGiveTheEnthalpyOfReaction() throws Exception {
        Section section = section(
                consistency(new double[3], new double[] {0.05, 0.05, 0.05}, new double[] {0.05, 0.05, 0.05}),
                stated(1000, 3));
        Node rates = at(section.body(), "rates");
        assertEquals("agree within their uncertainties", text(rates, "verdict"));
        assertEquals(H, number(rates, "lines", "energyFromRates"), 1e-5);
        assertEquals(H, number(rates, "lines", "energyFromK"), 1e-5);
        assertEquals(0, number(rates, "lines", "differenceInLn"), 1e-9);
        Node.Quantity energy = (Node.Quantity) at(rates, "lines", "energyFromK");
        assertEquals(1000, energy.standardUncertainty().orElseThrow(), 0.01);
        for (String id : List.of("consistency-elementary", "consistency-independent")) {
            assertTrue(section.cautions().containsKey(id), id);
        }
    }

    @Test
    void aWrongStandardStateIsFound() throws Exception {
        // The same ΔS taken for 1 bar in the gas: kf/kr is off by ln(c° RT/p°), 3.2.
        Node.Group wrong = group(
                "dH",
                Node.Quantity.of(H, "J/mol", 1000),
                "dS",
                Node.Quantity.of(S, "J/(mol.K)", 3),
                "correlation",
                0.95,
                "standardState",
                "1 bar");
        Section section = section(
                consistency(new double[3], new double[] {0.05, 0.05, 0.05}, new double[] {0.05, 0.05, 0.05}), wrong);
        Node rates = at(section.body(), "rates");
        assertEquals("do not agree", text(rates, "verdict"));
        double expected = Math.log(1000 * Constants.GAS * 300 / 1e5);
        assertEquals(expected, number(rates, "points", 0, "difference"), 1e-9);
        // Ea,f − Ea,r = ΔH − RT in the gas, with Δν = 1.
        double theta = number(rates, "lines", "referenceTemperature");
        assertEquals(H - Constants.GAS * theta, number(rates, "lines", "energyFromK"), 1e-6);
    }

    /** Species data: N2O4(g) = 2 NO2(g), with kf from Kp by {@code kf/kr = Kp (p°/RT)^Δν}. */
    @Test
    void usesSpeciesDataInTheGas() throws Exception {
        ReactionFunction function = ReactionFunction.of(
                SpeciesResolver.resolve(
                        org.saddlebook.reaction.api.Equation.parseBalanced("N2O4(g) = 2 NO2(g)"),
                        List.of(CuratedSet.source()),
                        java.util.Optional.of("janaf"),
                        java.util.Optional.empty()),
                298.15,
                500);
        double[] kf = new double[3];
        double[] kr = {4e8, 4.5e8, 5e8};
        for (int i = 0; i < 3; i++) {
            double lnK = -function.gibbs(KELVIN[i]) / (Constants.GAS * KELVIN[i]);
            double molesPerLitre = 1e5 / (Constants.GAS * KELVIN[i]) / 1000;
            kf[i] = kr[i] * Math.exp(lnK) * molesPerLitre;
        }
        double[] u = {0.03, 0.03, 0.03};
        Section section = section(
                group("forward", rates("1/s", kf, u), "reverse", rates("L/(mol.s)", kr, u)),
                group("reaction", "N2O4(g) = 2 NO2(g)", "source", "janaf"));
        for (int i = 0; i < 3; i++) {
            assertEquals(0, number(section.body(), "rates", "points", i, "difference"), 1e-9);
        }
    }

    @Test
    void withoutUncertaintiesTheScatterOfTheLinesDecides() throws Exception {
        Section agree =
                section(consistency(new double[] {0.02, -0.04, 0.02}, new double[0], new double[0]), stated(1000, 3));
        assertEquals("agree within their uncertainties", text(agree.body(), "rates", "verdict"));
        assertEquals(
                "t",
                ((Node.Quantity) at(agree.body(), "rates", "lines", "differenceInLn"))
                        .interval()
                        .orElseThrow()
                        .method());
    }

    /**
     * Two cycles that share a step: chi-squared 5.49096, p 0.0642174, adjusted values and their uncertainties from NumPy 2.4.6,
     * {@code x - V L' inv(L V L') L x}.
     */
    @Test
    void adjustsCyclesThatShareAStep() throws Exception {
        Node steps = group(
                "a", group("lnK", 1.20, "u", 0.05),
                "b", group("lnK", -0.50, "u", 0.04),
                "c", group("lnK", -0.62, "u", 0.06),
                "d", group("lnK", 0.30, "u", 0.05),
                "e", group("lnK", -0.80, "u", 0.03));
        Node closures = new Node.Items(List.of(group("a", 1, "b", 1, "c", 1), group("c", -1, "d", 1, "e", 1)));
        Section section = section(
                group("cycles", group("temperature", 298.15, "steps", steps, "closures", closures)), stated(1, 1));
        Node cycles = at(section.body(), "cycles");
        assertEquals(0.08, number(cycles, "closures", 0, "lnProduct"), 1e-12);
        assertEquals(5.490962383976542, number(cycles, "test", "chiSquared"), 1e-9);
        assertEquals(0.06421739261384551, number(cycles, "test", "pValue"), 1e-9);
        double[] adjusted = {1.13942355, -0.53876893, -0.60065462, 0.22598925, -0.82664387};
        double[] u = {0.03783336, 0.03409232, 0.03501134, 0.03639367, 0.02734328};
        double[] size = {1.85305681, 1.85305681, 0.39702525, 2.1586555, 2.1586555};
        for (int i = 0; i < 5; i++) {
            Node.Quantity one = (Node.Quantity) at(cycles, "steps", i, "adjusted");
            assertEquals(adjusted[i], one.value().orElseThrow(), 1e-8);
            assertEquals(u[i], one.standardUncertainty().orElseThrow(), 1e-8);
            assertEquals(size[i], number(cycles, "steps", i, "normalisedCorrection"), 1e-7);
        }
        assertEquals("close within their uncertainties", text(cycles, "verdict"));
    }

    @Test
    void aCycleOfRateConstantsInTheirUnitsMultipliesToOne() throws Exception {
        // A + B = AB by rates; AB = A + B by its dissociation constant 2.5e-3 mol/L: 400 L/mol times 2.5e-3 mol/L is 1.
        Node steps = group(
                "binding",
                        group(
                                "forward",
                                Node.Quantity.of(8e5, "L/(mol.s)", 2e4),
                                "reverse",
                                Node.Quantity.of(2000, "1/s", 50)),
                "dissociation", group("K", Node.Quantity.of(2.5, "mmol/L", 0.1)));
        Node closures = new Node.Items(List.of(group("binding", 1, "dissociation", 1)));
        Section section = section(
                group("cycles", group("temperature", 298.15, "steps", steps, "closures", closures)), stated(1, 1));
        Node cycles = at(section.body(), "cycles");
        assertEquals(1, number(cycles, "closures", 0, "product"), 1e-12);
        Node.Quantity ln = (Node.Quantity) at(cycles, "closures", 0, "lnProduct");
        assertEquals(
                Math.sqrt(0.025 * 0.025 * 2 + 0.04 * 0.04),
                ln.standardUncertainty().orElseThrow(),
                1e-12);
    }

    @Test
    void namesTheStepToLookAt() throws Exception {
        Node steps = group(
                "a", group("lnK", 1.0, "u", 0.1),
                "b", group("lnK", 1.0, "u", 0.1),
                "c", group("lnK", -2.0, "u", 0.1),
                "d", group("lnK", 3.0, "u", 0.1));
        // d is in two cycles and both are open by the same amount.
        Node closures = new Node.Items(List.of(group("a", 1, "d", 1), group("b", 1, "d", 1), group("c", 1, "a", 2)));
        Section section = section(
                group("cycles", group("temperature", 298.15, "steps", steps, "closures", closures)), stated(1, 1));
        assertEquals("do not close", text(section.body(), "cycles", "verdict"));
        String note = text(section.body(), "notes", 0);
        assertTrue(note.contains("is d; look there first") || note.contains("cannot tell"), note);
        assertTrue(note.contains("d"), note);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "1/s|1/s|number of dissolved and gas molecules changes by 0",
                "kg|1/s|unit of k cannot be used",
            })
    void refusesUnitsThatDoNotFit(String forward, String reverse, String words) throws Exception {
        double[] k = {1, 2, 3};
        Node spontaneity = group("reaction", "N2O4(g) = 2 NO2(g)", "source", "janaf");
        Section section = section(group("forward", rates(forward, k, k), "reverse", rates(reverse, k, k)), spontaneity);
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        String reason = text(section.body(), "reason");
        assertTrue(reason.contains(words) || reason.contains("concentration to the power"), reason);
    }

    @Test
    void refusesByName() throws Exception {
        refused("need reverse rate constants", group("forward", rates("1/s", new double[] {1}, new double[0])));
        refused("no rate table", group("reverse", rates("1/s", new double[] {1}, new double[0])));
        Node one = rates("1/s", new double[] {1}, new double[0]);
        refused(
                "k must be a plain number above zero",
                group("forward", one, "reverse", rates("1/s", new double[] {-1}, new double[0])));
        refused("there must be one of K", cycles(group("u", 1), group("a", 1)));
        refused("there must be one of K", cycles(group("lnK", 1, "pK", 1), group("a", 1)));
        refused("u must be above zero", cycles(group("lnK", 1, "u", 0), group("a", 1)));
        refused("must be above zero", cycles(group("K", 0), group("a", 1)));
        refused("number of times other than zero", cycles(group("lnK", 1), group("a", 0)));
        refused("not known", cycles(group("lnK", 1), group("z", 1)));
        refused("concentration to the power 1", cycles(group("K", Node.Quantity.of(1, "mol/L")), group("a", 1)));
        refused("power of concentration", cycles(group("K", Node.Quantity.of(1, "kJ/mol")), group("a", 1)));
        refused("stated twice", cycles(group("K", Node.Quantity.of(1, "mol/L", 0.1), "u", 0.1), group("a", 1)));
    }

    private static Node cycles(Node step, Node closure) {
        return group(
                "cycles",
                group("temperature", 298.15, "steps", group("a", step), "closures", new Node.Items(List.of(closure))));
    }

    private static void refused(String words, Node consistency) throws Exception {
        Section section = section(consistency, stated(1000, 3));
        assertEquals(Section.Outcome.REFUSED, section.outcome(), words);
        String reason = text(section.body(), "reason");
        assertTrue(reason.contains(words), reason);
        assertFalse(reason.contains("Exception"), reason);
    }
}
