package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/** Every setting that cannot be used is refused with a sentence that names it. */
class SettingsTest {
    private static final double[] KELVIN = {313.15, 323.15, 333.15, 343.15};
    private static final double[] ERRORS = {0.03, -0.04, 0.02, -0.01};

    private static Section section(Node settings) {
        Campaign campaign = Bench.campaign("1/s", 28, 90_000, KELVIN, ERRORS).withSetting("window", settings);
        return Bench.arrhenius().window(campaign);
    }

    private static Node limit(Object... pairs) {
        return Bench.group("limits", List.of(Bench.group(pairs)));
    }

    private static Node competing(Object... barrier) {
        return limit("kind", "competing", "share", 0.02, "barrier", Bench.group(barrier));
    }

    private static Node energy(double value, String unit) {
        return Node.Quantity.of(value, unit);
    }

    static Stream<Arguments> wrong() {
        Node time = Bench.group("kind", "time", "conversion", 0.9, "within", "1 h");
        return Stream.of(
                Arguments.of(Bench.node("10 h"), "not a group"),
                Arguments.of(Bench.group("limit", List.of(time)), "\"limit\", which is not known"),
                Arguments.of(Bench.group("limits", List.of()), "at least one"),
                Arguments.of(Bench.group("limits", time), "must be a list"),
                Arguments.of(limit("conversion", 0.9), "needs kind"),
                Arguments.of(limit("kind", "fast"), "\"fast\", which is not known"),
                Arguments.of(limit("kind", "time", "within", "1 h"), "needs conversion"),
                Arguments.of(limit("kind", "time", "conversion", 95, "within", "1 h"), "between 0 and 1"),
                Arguments.of(limit("kind", "time", "conversion", 0.9), "needs within"),
                Arguments.of(limit("kind", "time", "conversion", 0.9, "within", 36_000), "has no unit"),
                Arguments.of(limit("kind", "time", "conversion", 0.9, "within", "10 K"), "found"),
                Arguments.of(limit("kind", "time", "conversion", 0.9, "within", "-1 h"), "above zero"),
                Arguments.of(limit("kind", "time", "conversion", 0.9, "within", "1 h", "until", 3), "\"until\""),
                Arguments.of(limit("kind", "allowed"), "needs ΔH and ΔS"),
                Arguments.of(limit("kind", "allowed", "reactionQuotient", 0), "above zero"),
                Arguments.of(limit("kind", "equilibrium", "conversion", 1), "between 0 and 1"),
                Arguments.of(limit("kind", "competing", "share", 0.02), "needs barrier"),
                Arguments.of(competing("Ea", energy(90, "kJ/mol")), "needs A"),
                Arguments.of(competing("Ea", energy(90, "kJ/mol"), "dS", energy(1, "J/(mol.K)")), "either dH and dS"),
                Arguments.of(competing("Ea", energy(90, "K"), "A", energy(1e12, "1/s")), "\"Ea\""),
                Arguments.of(competing("Ea", 90, "A", energy(1e12, "1/s")), "has no unit"),
                Arguments.of(competing("Ea", energy(90_000, "kJ/mol"), "A", energy(1e12, "1/s")), "check the number"),
                Arguments.of(competing("Ea", energy(90, "kJ/mol"), "A", energy(-1, "1/s")), "above zero"),
                Arguments.of(competing("Ea", energy(90, "kJ/mol"), "A", energy(1, "kJ/mol")), "rate constant"),
                Arguments.of(competing("Ea", energy(90, "kJ/mol"), "A", energy(1e9, "L/(mol.s)")), "equal orders"),
                Arguments.of(competing("dH", energy(90, "kJ/mol"), "dS", energy(1, "kJ/mol")), "\"dS\" in the barrier"),
                Arguments.of(
                        competing("dH", energy(90, "kJ/mol"), "dS", energy(1, "J/(mol.K)"), "correlation", 0.5),
                        "uncertainty of both"),
                Arguments.of(
                        competing(
                                "dH", Bench.quantity(90, "kJ/mol", 1),
                                "dS", Bench.quantity(1, "J/(mol.K)", 1),
                                "correlation", 1.5),
                        "between -1 and 1"),
                Arguments.of(limit("kind", "hold", "conversion", 0.01, "atLeast", "3 kJ/mol"), "\"atLeast\""),
                Arguments.of(
                        limit(
                                "kind",
                                "hold",
                                "conversion",
                                0.01,
                                "atLeast",
                                "1 d",
                                "barrier",
                                Bench.group("Ea", energy(90, "kJ/mol"), "A", energy(1e9, "L/(mol.s)"))),
                        "initial concentration"),
                Arguments.of(limit("kind", "equipment"), "needs lower, upper or both"),
                Arguments.of(limit("kind", "equipment", "upper", 90), "has no unit"),
                Arguments.of(limit("kind", "equipment", "upper", "90 degC", "lower", "95 degC"), "below the upper"),
                Arguments.of(limit("kind", "equipment", "upper", "-300 degC"), "\"upper\""),
                Arguments.of(Bench.group("limits", List.of(time), "draws", 10), "whole number"),
                Arguments.of(
                        Bench.group(
                                "limits", List.of(time), "range", Bench.group("lower", "80 degC", "upper", "20 degC")),
                        "below its upper end"),
                Arguments.of(Bench.group("limits", List.of(time), "rateLaw", Bench.group("kind", "second")), "order 2"),
                Arguments.of(
                        Bench.group("limits", List.of(time), "rateLaw", Bench.group("kind", "third")), "\"third\""),
                Arguments.of(Bench.group("limits", List.of(time), "conversions", List.of(0.5, 1.5)), "between 0 and 1"),
                Arguments.of(
                        Bench.group("range", Bench.group("lower", "1 K", "upper", "2 K"), "history", 3), "history"),
                Arguments.of(history(new double[][] {{0, 20}}, "h", "linear"), "at least two pairs"),
                Arguments.of(history(new double[][] {{0, 20}, {0, 21}}, "h", "linear"), "not later"),
                Arguments.of(history(new double[][] {{0, 20}, {1, -280}}, "h", "linear"), "above 0 K"),
                Arguments.of(history(new double[][] {{0, 20}, {1, 21}}, "kg", "linear"), "unit in the history"),
                Arguments.of(history(new double[][] {{0, 20}, {1, 21}}, "h", "spline"), "\"spline\""));
    }

    private static Node history(double[][] points, String unit, String interpolation) {
        return Bench.group(
                "history",
                Bench.group(
                        "timeUnit",
                        unit,
                        "temperatureUnit",
                        "degC",
                        "points",
                        new Node.Matrix(points),
                        "interpolation",
                        interpolation));
    }

    @ParameterizedTest
    @MethodSource("wrong")
    void isRefusedWithASentence(Node settings, String expected) {
        Section section = section(settings);
        assertEquals(Section.Outcome.REFUSED, section.outcome());
        String reason = Bench.text(section.body(), "reason");
        assertTrue(reason.contains(expected), reason);
        assertTrue(reason.endsWith("."), reason);
    }

    @Test
    void aSecondOrderTableNeedsAConcentration() {
        Campaign campaign = Bench.campaign("L/(mol.s)", 20, 70_000, KELVIN, ERRORS)
                .withSetting("window", limit("kind", "time", "conversion", 0.9, "within", "1 h"));
        String reason = Bench.text(Bench.arrhenius().window(campaign).body(), "reason");
        assertTrue(reason.contains("initial concentration"), reason);
    }

    @Test
    void aLimitOnTimeNeedsMeasuredRates() {
        Campaign campaign = Campaign.titled("invented")
                .withSetting("window", limit("kind", "time", "conversion", 0.9, "within", "1 h"));
        String reason = Bench.text(Bench.arrhenius().window(campaign).body(), "reason");
        assertTrue(reason.contains("no rate table"), reason);
    }

    @Test
    void twoPointsGiveNoCovarianceAndNoWindow() {
        Campaign campaign = Bench.campaign("1/s", 28, 90_000, new double[] {310, 330}, new double[] {0, 0})
                .withSetting("window", limit("kind", "time", "conversion", 0.9, "within", "1 h"));
        String reason = Bench.text(Bench.arrhenius().window(campaign).body(), "reason");
        assertTrue(reason.contains("covariance"), reason);
    }

    @Test
    void quantitiesMayBeWrittenAsTextOrWithUnit() {
        Node asText = limit("kind", "time", "conversion", 0.9, "within", "10 h");
        Node asQuantity = limit("kind", "time", "conversion", energy(90, "%"), "within", energy(600, "min"));
        assertEquals(
                Bench.number(section(asText).body(), "intervals", 0, "lower"),
                Bench.number(section(asQuantity).body(), "intervals", 0, "lower"));
    }
}
