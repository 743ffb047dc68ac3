package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.model.arrhenius.internal.Arrhenius;
import org.saddlebook.model.eyring.internal.Eyring;
import org.saddlebook.testkit.api.ImmediateTask;

/** The section as a whole against closed forms. All numbers invented. */
class WindowEvaluationTest {
    private static final double EA = 90_000;
    private static final double LN_A = 28;
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double[] ERRORS = {0.03, -0.04, 0.02, 0.03, -0.04};
    private static final Bench BENCH = Bench.arrhenius();

    private static Campaign measured() {
        return Bench.campaign("1/s", LN_A, EA, KELVIN, ERRORS);
    }

    private static Campaign with(Campaign campaign, Object... settings) {
        return campaign.withSetting("window", Bench.group(settings));
    }

    private static Campaign thermodynamics(Campaign campaign) {
        return campaign.withSetting(
                "spontaneity",
                Bench.group(
                        "dH", Bench.quantity(-60, "kJ/mol", 1.5),
                        "dS", Bench.quantity(-160, "J/(mol.K)", 4),
                        "correlation", 0.9));
    }

    private static Node time() {
        return Bench.group("kind", "time", "conversion", 0.95, "within", "10 h");
    }

    private static Node body(Section section) {
        assertEquals(Section.Outcome.DONE, section.outcome(), () -> Bench.text(section.body(), "reason"));
        return section.body();
    }

    /** Ordinary least squares of ln k on 1/T, by the textbook. */
    private record Line(double mean, double slope, double centre, double sxx, double s, int dof) {
        static Line of() {
            int n = KELVIN.length;
            double centre = 0;
            double mean = 0;
            for (int i = 0; i < n; i++) {
                centre += 1 / KELVIN[i] / n;
                mean += lnRate(i) / n;
            }
            double sxx = 0;
            double sxy = 0;
            for (int i = 0; i < n; i++) {
                sxx += (1 / KELVIN[i] - centre) * (1 / KELVIN[i] - centre);
                sxy += (1 / KELVIN[i] - centre) * lnRate(i);
            }
            double slope = sxy / sxx;
            double rss = 0;
            for (int i = 0; i < n; i++) {
                double r = lnRate(i) - mean - slope * (1 / KELVIN[i] - centre);
                rss += r * r;
            }
            return new Line(mean, slope, centre, sxx, Math.sqrt(rss / (n - 2)), n - 2);
        }

        private static double lnRate(int i) {
            return LN_A - EA / (Bench.R * KELVIN[i]) + ERRORS[i];
        }

        double at(double kelvin, double quantile) {
            double x = 1 / kelvin - centre;
            return mean + slope * x + quantile * s * Math.sqrt(1.0 / KELVIN.length + x * x / sxx);
        }

        /** Where the bound of ln k reaches a value, by bisection. */
        double kelvinAt(double lnRate, double quantile) {
            double low = 200;
            double high = 450;
            for (int i = 0; i < 100; i++) {
                double middle = (low + high) / 2;
                if (at(middle, quantile) < lnRate) {
                    low = middle;
                } else {
                    high = middle;
                }
            }
            return low;
        }
    }

    @Test
    void theEndOfATimeLimitIsWhereTheStudentBoundOfTheRateReachesIt() {
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(time()),
                "range",
                Bench.group("lower", "260 K", "upper", "400 K"),
                "draws",
                200_000));
        Node body = body(section);
        Line line = Line.of();
        double needed = StrictMath.log(-StrictMath.log(0.05) / 36_000);
        double t = StudentT.quantile(0.95, line.dof());
        Node interval = Bench.at(body, "intervals", 0);
        assertEquals(line.kelvinAt(needed, -t), Bench.number(interval, "lower"), 0.06);
        assertEquals(400, Bench.number(interval, "upper"), 1e-9);
        Node.Table crossings = (Node.Table) Bench.at(interval, "lowerEnd", "crossings");
        assertEquals(3, crossings.rows().size());
        assertEquals(
                line.kelvinAt(needed, 0), Bench.number(crossings.rows().get(1).get(1)), 0.02);
        assertEquals(
                line.kelvinAt(needed, t), Bench.number(crossings.rows().get(2).get(1)), 0.06);
        assertEquals("time", Bench.text(interval, "lowerEnd", "binds"));
        // Twice the time: ln k needed falls by ln 2, d ln k/dT = Ea/(RT²).
        double kelvin = Bench.number(interval, "lower");
        double shift = -StrictMath.log(2) / (-line.slope() / (kelvin * kelvin));
        assertEquals(shift, Bench.number(interval, "lowerEnd", "shiftIfEased"), 0.01 * Math.abs(shift) + 0.05);
        // A single limit that holds with 95 % at its coldest temperature holds with no less above it.
        assertEquals(0.95, Bench.number(interval, "wholeIntervalProbability"), 0.002);
    }

    @Test
    void aHoldTimeIsTheMirrorOfATime() {
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(Bench.group("kind", "hold", "conversion", 0.02, "atLeast", "1 d")),
                "range",
                Bench.group("lower", "220 K", "upper", "330 K"),
                "draws",
                100_000));
        Line line = Line.of();
        double needed = StrictMath.log(-StrictMath.log(0.98) / 86_400.0);
        double t = StudentT.quantile(0.95, line.dof());
        Node interval = Bench.at(body(section), "intervals", 0);
        assertEquals(line.kelvinAt(needed, t), Bench.number(interval, "upper"), 0.25);
        Node.Quantity upper = (Node.Quantity) Bench.at(interval, "upper");
        assertTrue(
                upper.cautions().contains("storage-lower-bound"),
                upper.cautions().toString());
        assertTrue(upper.cautions().contains("extrapolated"));
        assertEquals(
                KELVIN[0] - Bench.number(interval, "upper"), Bench.number(interval, "upperEnd", "extrapolation"), 1e-9);
    }

    @Test
    void allowedHasTheNormalProbabilityOfANegativeGibbsEnergy() {
        Section section = BENCH.window(thermodynamics(with(
                Campaign.titled("invented"),
                "limits",
                List.of(Bench.group("kind", "allowed", "reactionQuotient", 0.2)),
                "range",
                Bench.group("lower", "300 K", "upper", "450 K"),
                "draws",
                200_000)));
        Node body = body(section);
        for (Node row : ((Node.Items) Bench.at(body, "probability")).items()) {
            double kelvin = Bench.number(row, "temperature");
            double g = -60_000 + 160 * kelvin + Bench.R * kelvin * StrictMath.log(0.2);
            double u = Math.sqrt(1500 * 1500 + kelvin * kelvin * 16 - 2 * kelvin * 0.9 * 1500 * 4);
            // Rows are interpolated between neighbouring temperatures of the search.
            assertEquals(Normal.upperTail(g / u), Bench.number(row, "allowed"), 0.006, "at " + kelvin);
        }
        assertEquals("allowed", Bench.text(body, "intervals", 0, "upperEnd", "binds"));
    }

    @Test
    void aCompetingReactionWithAHigherBarrierBindsTheHotEnd() {
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(Bench.group(
                        "kind",
                        "competing",
                        "share",
                        0.02,
                        "barrier",
                        Bench.group(
                                "Ea", Bench.quantity(120, "kJ/mol", 0),
                                "A", Bench.quantity(StrictMath.exp(35), "1/s", 0)))),
                "range",
                Bench.group("lower", "290 K", "upper", "400 K"),
                "draws",
                100_000));
        Node interval = Bench.at(body(section), "intervals", 0);
        // ln k1 − ln k2 = ln(98/2) at the best estimate; ends at one half.
        Line line = Line.of();
        Node.Table crossings = (Node.Table) Bench.at(interval, "upperEnd", "crossings");
        double half = Bench.number(crossings.rows().get(1).get(1));
        double lnRatio = line.at(half, 0) - (35 - 120_000 / (Bench.R * half));
        assertEquals(StrictMath.log(49), lnRatio, 0.003);
        assertEquals("competing", Bench.text(interval, "upperEnd", "binds"));
    }

    @Test
    void wallsAreExactEnds() {
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(
                        time(),
                        Bench.group(
                                "kind",
                                "equipment",
                                "lower",
                                "5 degC",
                                "upper",
                                "72.5 degC",
                                "upperTitle",
                                "solvent"))));
        Node interval = Bench.at(body(section), "intervals", 0);
        assertEquals(345.65, Bench.number(interval, "upper"), 1e-9);
        assertEquals("equipment", Bench.text(interval, "upperEnd", "binds"));
        assertEquals("upper end", Bench.text(section.body(), "limits", 1, "binds"));
        assertEquals("lower end", Bench.text(section.body(), "limits", 0, "binds"));
    }

    @Test
    void twoEndsMakeTheWholeLessProbableThanEachTemperature() {
        Section section = BENCH.window(thermodynamics(with(
                measured(),
                "limits",
                List.of(time(), Bench.group("kind", "allowed")),
                "range",
                Bench.group("lower", "260 K", "upper", "400 K"),
                "draws",
                100_000)));
        Node interval = Bench.at(body(section), "intervals", 0);
        double whole = Bench.number(interval, "wholeIntervalProbability");
        // Independent errors at each end: 0.95².
        assertEquals(0.95 * 0.95, whole, 0.004);
        Node part = Bench.at(interval, "whole");
        assertTrue(Bench.number(part, "probability") >= 0.95);
        assertTrue(Bench.number(part, "lower") > Bench.number(interval, "lower"));
        assertTrue(Bench.number(part, "upper") < Bench.number(interval, "upper"));
    }

    @Test
    void noWindowSaysWhereItIsMostProbable() {
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(time(), Bench.group("kind", "equipment", "upper", "10 degC")),
                "range",
                Bench.group("lower", "270 K", "upper", "330 K")));
        Node body = body(section);
        assertTrue(((Node.Items) Bench.at(body, "intervals")).items().isEmpty());
        assertTrue(Bench.text(body, "answer").startsWith("At no temperature from"), Bench.text(body, "answer"));
        assertTrue(Bench.number(body, "best", "probability") < 0.95);
    }

    @Test
    void aNarrowWindowBetweenTheTemperaturesOfTheSearchIsFound() {
        double needed = Line.of().kelvinAt(StrictMath.log(-StrictMath.log(0.05) / 36_000), -5);
        Section section = BENCH.window(with(
                measured(),
                "limits",
                List.of(Bench.group("kind", "equipment", "upper", Bench.quantity(needed + 0.02, "K", 0)), time()),
                "range",
                Bench.group("lower", "200 K", "upper", "900 K")));
        assertEquals(
                1, ((Node.Items) Bench.at(body(section), "intervals")).items().size());
    }

    @Test
    void theReversibleLawFailsWhereTheEquilibriumForbidsTheConversion() {
        Section section = BENCH.window(thermodynamics(with(
                measured(),
                "rateLaw",
                Bench.group("kind", "reversible first"),
                "limits",
                List.of(Bench.group("kind", "time", "conversion", 0.9, "within", "24 h")),
                "range",
                Bench.group("lower", "290 K", "upper", "420 K"),
                "draws",
                50_000)));
        Node interval = Bench.at(body(section), "intervals", 0);
        // K = 9 at the best estimate: T = ΔH/(ΔS − R ln 9).
        double forbidden = -60_000 / (-160 - Bench.R * StrictMath.log(9));
        Node.Table crossings = (Node.Table) Bench.at(interval, "upperEnd", "crossings");
        double half = Bench.number(crossings.rows().get(1).get(1));
        assertTrue(half < forbidden && half > forbidden - 3, half + " against " + forbidden);
        Node.Table times = (Node.Table) Bench.at(section.body(), "times");
        assertEquals("reversible first", Bench.text(section.body(), "rateLaw"));
        assertFalse(times.rows().isEmpty());
    }

    @Test
    void drawsAreSpreadOverLawsThatCannotBeToldApart() {
        Section section = Bench.with(new Arrhenius(), new Eyring()).window(with(measured(), "limits", List.of(time())));
        Node body = body(section);
        String notes = String.join(
                " ",
                ((Node.Items) Bench.at(body, "notes"))
                        .items().stream()
                                .map(note -> ((Node.Text) note).value())
                                .toList());
        assertTrue(notes.contains("spread over the laws"), notes);
        Node.Table rates = (Node.Table) Bench.at(body, "rates");
        Node.Quantity k = (Node.Quantity) rates.rows().get(0).get(1);
        assertEquals("draws", k.interval().orElseThrow().method());
    }

    @Test
    void ratesAndTimesAgreeWithTheLineOfTheTextbook() {
        Campaign campaign = measured();
        campaign = campaign.withChoices(campaign.choices().withTargetsKelvin(List.of(298.15)));
        Section section = BENCH.window(with(campaign, "limits", List.of(time())));
        Line line = Line.of();
        double two = StudentT.quantile(0.975, line.dof());
        double one = StudentT.quantile(0.95, line.dof());
        List<Node> rates =
                ((Node.Table) Bench.at(body(section), "rates")).rows().get(0);
        Node.Quantity k = (Node.Quantity) rates.get(1);
        assertEquals(
                StrictMath.exp(line.at(298.15, 0)),
                k.value().orElseThrow(),
                1e-9 * k.value().orElseThrow());
        assertRelative(
                StrictMath.exp(line.at(298.15, two)),
                k.interval().orElseThrow().upper().orElseThrow());
        Node.Quantity most = (Node.Quantity) rates.get(2);
        assertRelative(
                StrictMath.exp(line.at(298.15, one)),
                most.interval().orElseThrow().upper().orElseThrow());
        assertTrue(most.cautions().contains("not-a-hazard-assessment"));
        // Ten kelvin more: exp(Ea/R (1/T − 1/(T+10))) with the fitted Ea.
        double factor = StrictMath.exp(line.slope() * (1 / 308.15 - 1 / 298.15));
        assertRelative(factor, Bench.number(rates.get(3)));
        Node.Table times = (Node.Table) Bench.at(section.body(), "times");
        List<Node> half = times.rows().get(0);
        assertEquals(0.5, Bench.number(half.get(1)));
        Node.Quantity halfLife = (Node.Quantity) half.get(2);
        double seconds = halfLife.unit().equals("d") ? 86_400 : halfLife.unit().equals("h") ? 3600 : 60;
        assertRelative(
                StrictMath.log(2) / k.value().orElseThrow(), halfLife.value().orElseThrow() * seconds);
        Node.Quantity least = (Node.Quantity) half.get(3);
        assertRelative(
                StrictMath.log(2) / StrictMath.exp(line.at(298.15, one)),
                least.interval().orElseThrow().lower().orElseThrow() * seconds);
        assertTrue(least.cautions().contains("storage-lower-bound"));
    }

    private static void assertRelative(double expected, double found) {
        assertEquals(expected, found, 1e-6 * Math.abs(expected));
    }

    @Test
    void theSameSeedGivesTheSameFindings() {
        Campaign campaign = thermodynamics(with(measured(), "limits", List.of(time(), Bench.group("kind", "allowed"))));
        assertEquals(BENCH.window(campaign, ImmediateTask.seeded(9)), BENCH.window(campaign, ImmediateTask.seeded(9)));
    }

    @Test
    void everyCautionUsedHasItsTextAndNothingIsCalledSafe() {
        Section section = BENCH.window(thermodynamics(with(
                measured(),
                "limits",
                List.of(
                        time(),
                        Bench.group("kind", "allowed"),
                        Bench.group("kind", "hold", "conversion", 0.5, "atLeast", "1 min")))));
        assertEquals(WindowCautions.used(section.body()), section.cautions());
        assertTrue(section.cautions().containsKey("not-a-hazard-assessment"));
        assertTrue(section.cautions().containsKey("window-pointwise"));
        assertFalse(section.toString().toLowerCase(java.util.Locale.ROOT).contains("safe"));
    }

    @Test
    void theFigureShowsLimitsWallsSpindleAndRuns() {
        Section section = BENCH.window(thermodynamics(with(
                measured(),
                "limits",
                List.of(
                        time(),
                        Bench.group("kind", "allowed"),
                        Bench.group("kind", "equipment", "lower", "5 degC", "upper", "90 degC")))));
        Node.Figure figure = (Node.Figure) Bench.at(body(section), "figures", 0);
        List<Layer.Kind> kinds = figure.layers().stream().map(Layer::kind).toList();
        assertEquals(2, count(kinds, Layer.Kind.LINE));
        assertEquals(2, count(kinds, Layer.Kind.WALL));
        assertEquals(1, count(kinds, Layer.Kind.SPINDLE));
        assertEquals(1, count(kinds, Layer.Kind.RUG));
        assertTrue(figure.cautions().contains("window-pointwise"));
        Layer spindle = figure.layers().stream()
                .filter(layer -> layer.kind() == Layer.Kind.SPINDLE)
                .findFirst()
                .orElseThrow();
        for (int i = 0; i < spindle.size(); i++) {
            boolean outside = spindle.x()[i] < KELVIN[0] || spindle.x()[i] > KELVIN[4];
            assertEquals(outside ? 0 : spindle.y()[i], spindle.lower()[i]);
        }
    }

    private static long count(List<Layer.Kind> kinds, Layer.Kind wanted) {
        return kinds.stream().filter(kind -> kind == wanted).count();
    }
}
