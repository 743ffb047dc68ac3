package org.saddlebook.data.checks.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.testkit.api.ImmediateTask;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** One planted mistake for each rule, in invented tables; what a person would see at a glance is the standard. */
class RulesTest {
    private static final double R = 8.314462618;
    private static final double[] SCATTER = {0.02, -0.03, 0.01, 0.02, -0.02, 0.03, -0.01, -0.02};

    /** Ea 90 kJ/mol, k(330 K) = 1e-3 in the unit, 300 to 370 K. */
    private static List<double[]> table() {
        List<double[]> rows = new ArrayList<>();
        for (int i = 0; i < 8; i++) {
            double t = 300 + 10 * i;
            rows.add(new double[] {t, StrictMath.log(1e-3) - 90_000 / R * (1 / t - 1.0 / 330) + SCATTER[i]});
        }
        return rows;
    }

    private static Campaign campaign(List<double[]> rows, String unit) {
        try {
            Unit parsed = Units.parse(unit);
            List<RatePoint> points = new ArrayList<>();
            for (double[] row : rows) {
                double k = StrictMath.exp(row[1]);
                points.add(new RatePoint(
                        row[0],
                        parsed.toSi(k),
                        OptionalDouble.empty(),
                        OptionalDouble.empty(),
                        "",
                        Optional.empty(),
                        new RatePoint.AsRead(OptionalInt.of(points.size() + 2), "", Double.toString(k))));
            }
            return Campaign.titled("invented")
                    .withRateTable(new RateTable(parsed, Units.rateOrder(parsed).getAsDouble(), points));
        } catch (UnitException wrong) {
            throw new AssertionError(wrong);
        }
    }

    private static Campaign stating(Campaign campaign, Map<String, Node> settings) {
        return campaign.withSetting("dataChecks", new Node.Group(settings));
    }

    private static Node.Group body(Campaign campaign) {
        try {
            Section section = DataChecksEvaluation.section(campaign, ImmediateTask.seeded(1));
            assertEquals(Section.Outcome.DONE, section.outcome(), section.body().toString());
            return (Node.Group) section.body();
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }

    /** Rule to sentence. */
    private static Map<String, String> found(Campaign campaign) {
        Map<String, String> found = new TreeMap<>();
        for (Node node : ((Node.Items) body(campaign).get("found").orElseThrow()).items()) {
            Node.Group group = (Node.Group) node;
            found.put(text(group, "rule"), text(group, "sentence"));
        }
        return found;
    }

    private static String text(Node.Group group, String key) {
        return ((Node.Text) group.get(key).orElseThrow()).value();
    }

    @Test
    void staysSilentOnACleanTable() {
        assertEquals(Map.of(), found(campaign(table(), "s-1")));
    }

    @Test
    void doesNotTakeAFalloffForMistakes() throws Cancelled {
        Campaign campaign = campaign(table(), "s-1");
        RateTable rates = campaign.rateTable().orElseThrow();
        List<RatePoint> points = new ArrayList<>();
        for (RatePoint point : rates.points()) {
            points.add(point.withConditions(Conditions.NONE.with(Conditions.PRESSURE, 100 * (points.size() + 1))));
        }
        Section section =
                DataChecksEvaluation.section(campaign.withRateTable(rates.withPoints(points)), ImmediateTask.seeded(1));
        assertEquals(Section.Outcome.REFUSED, section.outcome());
    }

    @Test
    void namesARowInAnotherUnitOfTime() {
        List<double[]> rows = table();
        rows.get(3)[1] += StrictMath.log(60);
        String sentence = found(campaign(rows, "s-1")).get("shifted-rows");
        assertTrue(sentence.startsWith("Row 4 (line 5, 330.00"), sentence);
        assertTrue(sentence.contains("k had been given in min⁻¹"), sentence);
        assertTrue(sentence.contains("34.0 J/(mol K)"), sentence);
    }

    @Test
    void namesTheRowsOfAFileWithoutTheFactorOfTheLogarithm() {
        List<double[]> rows = table();
        for (int i = 0; i < 3; i++) {
            rows.get(i)[1] -= StrictMath.log(StrictMath.log(10));
        }
        String sentence = found(campaign(rows, "s-1")).get("shifted-rows");
        assertTrue(sentence.startsWith("Rows 1, 2 and 3 (lines 2, 3 and 4)"), sentence);
        assertTrue(sentence.contains("log10"), sentence);
    }

    @Test
    void namesRowsWhoseCelsiusWasTakenForKelvin() {
        List<double[]> rows = table();
        rows.get(6)[0] -= 273.15;
        rows.get(7)[0] -= 273.15;
        String sentence = found(campaign(rows, "s-1")).get("shifted-temperatures");
        assertTrue(sentence.startsWith("Rows 7 and 8"), sentence);
        assertTrue(sentence.contains("read as K had been in °C"), sentence);
    }

    @Test
    void seesCelsiusInAllOfOneOverT() {
        List<double[]> rows = table();
        for (double[] row : rows) {
            row[0] -= 273.15;
        }
        Map<String, String> found = found(campaign(rows, "s-1"));
        assertTrue(found.containsKey("celsius-in-reciprocal-temperature"), found.toString());
    }

    @Test
    void comparesWithAReferenceOfEitherForm() {
        Campaign minutes = campaign(shifted(StrictMath.log(60)), "s-1");
        double lnA = StrictMath.log(1e-3) + 90_000 / (R * 330);
        Node arrhenius = new Node.Group(Map.of(
                "Ea", Node.Quantity.of(89, "kJ/mol"),
                "A", Node.Quantity.of(StrictMath.exp(lnA - 1000 / (R * 330)), "s-1"),
                "source", new Node.Text("a notebook")));
        String sentence =
                found(stating(minutes, Map.of("reference", arrhenius))).get("shift-against-reference");
        assertTrue(sentence.contains("(a notebook)") && sentence.contains("min⁻¹"), sentence);
        assertTrue(sentence.contains("34.0 J/(mol K)"), sentence);
        Node single = new Node.Group(Map.of("k", Node.Quantity.of(1e-3, "s-1"), "at", Node.Quantity.of(330, "K")));
        assertTrue(found(stating(minutes, Map.of("reference", single))).containsKey("shift-against-reference"));
        // ΔH‡ = Ea − RT, ΔS‡ from A = e (kB T/h) exp(ΔS‡/R), by hand at 333 K, the centre of the table.
        double entropy = R * (lnA - 1 - 23.759977810504218 - StrictMath.log(333));
        Node eyring = new Node.Group(Map.of(
                "dH", Node.Quantity.of(90 - R * 333 / 1000, "kJ/mol"), "dS", Node.Quantity.of(entropy, "J/(mol.K)")));
        assertTrue(found(stating(minutes, Map.of("reference", eyring))).containsKey("shift-against-reference"));
        assertFalse(found(stating(campaign(table(), "s-1"), Map.of("reference", eyring)))
                .containsKey("shift-against-reference"));
    }

    @Test
    void seesAWholeTablePerMolecule() {
        // k of 1e-3 L/(mol s) written as if it were the number for cm3/(molecule s).
        Map<String, String> found = found(campaign(table(), "cm3/({molecule}.s)"));
        assertTrue(found.get("molecules-for-moles").contains("398 J/(mol K)"), found.toString());
        assertTrue(found.containsKey("implausible-prefactor"));
        assertEquals(Map.of(), found(campaign(table(), "L/(mol.s)")));
    }

    @Test
    void seesCopies() {
        List<double[]> rows = table();
        rows.add(rows.get(2).clone());
        rows.add(rows.get(3).clone());
        String sentence = found(campaign(rows, "s-1")).get("duplicated-rows");
        assertTrue(sentence.contains("rows 3 and 9") && sentence.contains("rows 4 and 10"), sentence);
    }

    @Test
    void seesARowThatCarriesTheSlope() {
        List<double[]> rows = table();
        List<double[]> few = new ArrayList<>(rows.subList(0, 1));
        for (int i = 0; i < 3; i++) {
            double t = 360 + 2 * i;
            few.add(new double[] {t, StrictMath.log(1e-3) - 90_000 / R * (1 / t - 1.0 / 330) + SCATTER[i]});
        }
        String sentence = found(campaign(few, "s-1")).get("slope-on-one-row");
        assertTrue(sentence.startsWith("Row 1 (line 2, 300.00"), sentence);
    }

    @Test
    void seesDriftOfTheColdRuns() {
        List<double[]> rows = table();
        for (int i = 0; i < 8; i++) {
            double k = StrictMath.exp(rows.get(i)[1] - SCATTER[i] * 0.9);
            rows.get(i)[1] = StrictMath.log(k + 8e-5);
        }
        String sentence = found(campaign(rows, "s-1")).get("cold-run-drift");
        assertTrue(sentence != null && sentence.contains("added to every rate constant"), String.valueOf(sentence));
    }

    @Test
    void seesRateConstantsAboveTheLimits() {
        Campaign fast = campaign(shifted(StrictMath.log(1e17)), "s-1");
        assertTrue(found(fast).get("above-limit").contains("kB T/h"));
        Campaign second = campaign(shifted(StrictMath.log(1e14)), "L/(mol.s)");
        assertFalse(found(second).containsKey("above-limit"));
        String diffusion = found(stating(second, Map.of("viscosity", Node.Quantity.of(0.89, "mPa.s"))))
                .get("above-limit");
        // 8 R 340 K/(3 x 0.89e-3 Pa s) = 8.47e6 m3/(mol s) = 8.47e9 L/(mol s), by hand; the first row above it.
        assertTrue(diffusion.contains("diffusion limit"), diffusion);
        Campaign faster = campaign(shifted(StrictMath.log(1e18)), "L/(mol.s)");
        assertTrue(found(stating(faster, Map.of("medium", new Node.Text("gas"))))
                .get("above-limit")
                .contains("generous collision limit"));
    }

    @Test
    void listsOtherUnitsThatWouldFitAWholeTable() {
        Node.Table table =
                (Node.Table) body(campaign(table(), "s-1")).get("wouldAlsoFit").orElseThrow();
        assertTrue(table.rows().stream().anyMatch(row -> row.get(0).equals(new Node.Text("min⁻¹"))));
    }

    @Test
    void refusesSettingsThatItDoesNotUnderstand() throws Cancelled {
        Campaign campaign = stating(campaign(table(), "s-1"), Map.of("referense", new Node.Text("x")));
        Section section = DataChecksEvaluation.section(campaign, ImmediateTask.seeded(1));
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        assertTrue(section.body().toString().contains("referense"));
    }

    @Test
    void saysWhatItCouldNotExamine() {
        Node.Group body = body(campaign(table().subList(0, 3), "L/(mol.s)"));
        String not = body.get("notExamined").orElseThrow().toString();
        assertTrue(not.contains("shifted-rows: it needs four rows"), not);
        assertTrue(not.contains("viscosity"), not);
        assertEquals(Map.of(), found(campaign(table().subList(0, 1), "s-1")));
    }

    private static List<double[]> shifted(double ln) {
        List<double[]> rows = table();
        for (double[] row : rows) {
            row[1] += ln;
        }
        return rows;
    }
}
