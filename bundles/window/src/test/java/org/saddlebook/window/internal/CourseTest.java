package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** Limits over a course of temperature, against fine stepwise integration of the rate equation. Invented numbers. */
class CourseTest {
    private static final double LN_A = 24.5;
    private static final double EA = 90_000;
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15, 353.15};
    private static final double HOUR = 3600;

    /** 20 °C, heated to the set temperature within 1 h, held for 3 h, cooled to 20 °C within 2 h. */
    private static Course batch() {
        return new Course(
                new double[] {0, HOUR, 4 * HOUR, 6 * HOUR},
                new double[] {293.15, 0, 0, 293.15},
                new boolean[] {false, true, true, false},
                false);
    }

    private static double kelvin(double set, double seconds) {
        double hours = seconds / HOUR;
        return hours < 1 ? 293.15 + hours * (set - 293.15) : hours < 4 ? set : set + (hours - 4) / 2 * (293.15 - set);
    }

    /** Classical fourth-order Runge-Kutta steps of dx/dt over the batch. */
    private static double integrate(double set, DoubleUnaryOperator ofKelvin, double back, int steps) {
        double h = 6 * HOUR / steps;
        double x = 0;
        for (int i = 0; i < steps; i++) {
            double t = i * h;
            double k1 = slope(ofKelvin, back, set, t, x);
            double k2 = slope(ofKelvin, back, set, t + h / 2, x + h / 2 * k1);
            double k3 = slope(ofKelvin, back, set, t + h / 2, x + h / 2 * k2);
            double k4 = slope(ofKelvin, back, set, t + h, x + h * k3);
            x += h / 6 * (k1 + 2 * k2 + 2 * k3 + k4);
        }
        return x;
    }

    private static double slope(DoubleUnaryOperator rate, double dH, double set, double t, double x) {
        double kelvin = kelvin(set, t);
        double k = rate.applyAsDouble(kelvin);
        // K = 1 at 360 K, with an enthalpy; none for an irreversible reaction.
        double back = dH == 0 ? 0 : Math.exp(dH / Bench.R * (1 / kelvin - 1 / 360.0));
        return k * (1 - x) - k * back * x;
    }

    private static double rate(double kelvin) {
        return Math.exp(LN_A - EA / (Bench.R * kelvin));
    }

    @ParameterizedTest
    @ValueSource(doubles = {300, 340, 380, 450})
    void theIntegralOfRateOverARampAgreesWithFineSteps(double set) {
        double sum = 0;
        for (double[] node : batch().nodes(set)) {
            sum += rate(node[0]) * node[1];
        }
        double fine = 0;
        int steps = 600_000;
        for (int i = 0; i < steps; i++) {
            fine += rate(kelvin(set, (i + 0.5) * 6 * HOUR / steps)) * 6 * HOUR / steps;
        }
        assertEquals(1, sum / fine, 1e-5);
    }

    @Test
    void aLongRecordGathersIntoFewTemperaturesWithoutChangingTheIntegral() {
        int n = 5000;
        double[] seconds = new double[n];
        double[] value = new double[n];
        SplittableRandom random = new SplittableRandom(8);
        double walk = 300;
        for (int i = 0; i < n; i++) {
            seconds[i] = 60.0 * i;
            walk = Math.max(280, Math.min(340, walk + random.nextGaussian()));
            value[i] = walk;
        }
        Course course = new Course(seconds, value, new boolean[n], true);
        List<double[]> nodes = course.nodes(300);
        assertTrue(nodes.size() <= 32, "nodes " + nodes.size());
        double sum = 0;
        for (double[] node : nodes) {
            sum += rate(node[0]) * node[1];
        }
        double fine = 0;
        for (int i = 0; i + 1 < n; i++) {
            fine += 60 * rate(value[i]);
        }
        assertEquals(1, sum / fine, 1e-4);
    }

    @Test
    void fastExponentialAgreesWithTheLibrary() {
        SplittableRandom random = new SplittableRandom(3);
        for (int i = 0; i < 200_000; i++) {
            double x = -700 + 1400 * random.nextDouble();
            assertEquals(1, FastExp.exp(x) / StrictMath.exp(x), 1e-14, "at " + x);
        }
        assertEquals(1, FastExp.exp(0));
        assertEquals(0, FastExp.exp(-800));
        assertTrue(Double.isNaN(FastExp.exp(Double.NaN)));
        assertTrue(Double.isInfinite(FastExp.exp(800)));
    }

    private static Node points(Object... pairs) {
        java.util.ArrayList<Object> items = new java.util.ArrayList<>();
        for (int i = 0; i < pairs.length; i += 2) {
            items.add(List.of(pairs[i], pairs[i + 1]));
        }
        return Bench.node(items);
    }

    private static Node batchNode() {
        return Bench.group(
                "timeUnit", "h", "temperatureUnit", "degC", "points", points(0, 20, 1, "set", 4, "set", 6, 20));
    }

    private static Campaign campaign(Node limits, Object... more) {
        Object[] all = new Object[more.length + 4];
        all[0] = "limits";
        all[1] = limits;
        all[2] = "range";
        all[3] = Bench.group("lower", "290 K", "upper", "440 K");
        System.arraycopy(more, 0, all, 4, more.length);
        return Bench.campaign("1/s", LN_A, EA, KELVIN, new double[5], 0.02).withSetting("window", Bench.group(all));
    }

    /** The crossing at one half is where the best law reaches the conversion. */
    private static double even(Section section, String end) {
        Node.Table crossings = (Node.Table) Bench.at(section.body(), "intervals", 0, end, "crossings");
        return Bench.number(crossings.rows().get(1).get(1));
    }

    @Test
    void aPlannedBatchMustBeSoHotThatTheConversionIsReachedAtItsEnd() {
        Section section = Bench.arrhenius()
                .window(campaign(
                        Bench.node(List.of(Bench.group("kind", "time", "conversion", 0.9, "course", batchNode())))));
        double low = 290;
        double high = 440;
        for (int i = 0; i < 50; i++) {
            double middle = (low + high) / 2;
            if (integrate(middle, CourseTest::rate, 0, 1000) < 0.9) {
                low = middle;
            } else {
                high = middle;
            }
        }
        assertEquals(low, even(section, "lowerEnd"), 0.15);
        Node.Quantity end = (Node.Quantity) Bench.at(section.body(), "intervals", 0, "lower");
        assertTrue(end.cautions().contains("window-course"));
        assertTrue(section.cautions().get("window-course").contains("followed exactly"));
    }

    @Test
    void aReversibleReactionIsFollowedThroughTheCourse() {
        double dH = -50_000;
        Campaign campaign = campaign(
                        Bench.node(List.of(Bench.group("kind", "time", "conversion", 0.7, "course", batchNode()))),
                        "rateLaw",
                        Bench.group("kind", "reversible first"),
                        "draws",
                        2000)
                .withSetting(
                        "spontaneity",
                        Bench.group(
                                "dH", Bench.quantity(dH, "J/mol", 100),
                                "dS", Bench.quantity(dH / 360, "J/(mol.K)", 0.3),
                                "correlation", 0.99));
        Section section = Bench.arrhenius().window(campaign);
        double low = 300;
        double high = 340;
        for (int i = 0; i < 40; i++) {
            double middle = (low + high) / 2;
            if (integrate(middle, CourseTest::rate, dH, 1000) < 0.7) {
                low = middle;
            } else {
                high = middle;
            }
        }
        assertEquals(low, even(section, "lowerEnd"), 0.2);
        // Cooling under reaction lets even a hot batch come down into its equilibrium: the far end is set by the slow
        // end.
        CourseProgress progress = CourseProgress.of(
                new Limit.Time(
                        "time",
                        "",
                        "",
                        0.7,
                        6 * HOUR,
                        new RateLaw(RateLaw.Kind.REVERSIBLE_FIRST, 1, 1, 1),
                        Optional.of(batch())),
                390,
                Optional.of(
                        new Thermo(dH, dH / 360, new double[2][2], java.util.OptionalDouble.empty(), new double[0][])));
        double x = integrate(390, CourseTest::rate, dH, 20_000);
        double odds = Math.log(x / (1 - x)) - Math.log(0.7 / 0.3);
        BoundLaw law = Bench.law(LN_A, EA);
        assertEquals(odds, progress.best(Optional.of(law)) / (Bench.R * 390), 0.02);
    }

    @Test
    void anExcursionUsesUpAHoldTime() {
        Node plain = Bench.group("kind", "hold", "conversion", 0.01, "atLeast", "2 d");
        Node excursion = Bench.group(
                "kind",
                "hold",
                "conversion",
                0.01,
                "course",
                Bench.group(
                        "timeUnit",
                        "d",
                        "temperatureUnit",
                        "degC",
                        "interpolation",
                        "steps",
                        "points",
                        points(0, "set", 1, 5, 1.1, "set", 2, "set")));
        double without = even(Bench.arrhenius().window(cold(plain)), "upperEnd");
        double with = even(Bench.arrhenius().window(cold(excursion)), "upperEnd");
        // ∫k dt must be −ln 0.99: 1.9 d at T, 0.1 d at 5 °C.
        double needed = (-Math.log(0.99) - 8640 * rate(278.15)) / (1.9 * 86_400);
        assertEquals(EA / (Bench.R * (LN_A - Math.log(needed))), with, 0.1);
        assertTrue(with < without);
    }

    private static Campaign cold(Node limit) {
        return Bench.campaign("1/s", LN_A, EA, KELVIN, new double[5], 0.02)
                .withSetting(
                        "window",
                        Bench.group(
                                "limits", List.of(limit), "range", Bench.group("lower", "250 K", "upper", "320 K")));
    }

    @ParameterizedTest
    @ValueSource(strings = {"hot", "set*2", "set+2000", "5 set"})
    void namesAWordThatIsNoTemperature(String word) {
        Node course = Bench.group("timeUnit", "h", "temperatureUnit", "degC", "points", points(0, 20, 1, word));
        Section section = Bench.arrhenius()
                .window(campaign(
                        Bench.node(List.of(Bench.group("kind", "time", "conversion", 0.9, "course", course)))));
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        assertTrue(Bench.text(section.body(), "reason").contains("neither a number nor"));
    }
}
