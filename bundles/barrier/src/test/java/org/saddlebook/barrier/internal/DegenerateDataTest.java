package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;

/** Data that do not suffice end in a named outcome, whatever the error model. */
class DegenerateDataTest {
    private static final double GAS = 8.31446261815324;

    private static double rate(double kelvin) {
        return StrictMath.exp(30 - 100_000 / (GAS * kelvin));
    }

    private static RateTable table(double... kelvin) {
        List<RatePoint> points = new ArrayList<>();
        for (double t : kelvin) {
            points.add(RatePoint.of(t, rate(t)));
        }
        return new RateTable(Bench.PER_SECOND, 1, points);
    }

    private static Node.Group body(RateTable table, ErrorModel errorModel) {
        Node.Group body =
                Bench.body(table, Choices.defaults().withErrorModel(errorModel).withTargetsKelvin(List.of(298.15)));
        assertFalse(Bench.texts(body, "notes").contains("failed"), Bench.texts(body, "notes"));
        return body;
    }

    private static String outcome(Node.Group body, String model) {
        return TreeReader.text(Bench.model(body, model), "outcome");
    }

    @Test
    void asManyPointsAsParametersGiveParametersWithoutUncertainty() {
        for (ErrorModel errorModel : List.of(ErrorModel.CONSTANT_RELATIVE, ErrorModel.CONSTANT_ABSOLUTE)) {
            Node.Group body = body(table(300, 330), errorModel);
            Node.Quantity ea = Bench.parameter(body, "arrhenius", "Ea");
            assertEquals(100_000, ea.value().orElseThrow(), 1e-3);
            assertTrue(ea.standardUncertainty().isEmpty());
            assertTrue(ea.cautions().contains("no-scale-estimate"));
            assertEquals("undetermined", outcome(body, "modified-arrhenius"));
        }
    }

    @Test
    void identicalTemperaturesDetermineNoLaw() {
        for (ErrorModel errorModel : List.of(ErrorModel.CONSTANT_RELATIVE, ErrorModel.CONSTANT_ABSOLUTE)) {
            Node.Group body = body(table(300, 300, 300, 300), errorModel);
            for (String model : List.of("arrhenius", "eyring", "modified-arrhenius")) {
                assertEquals("undetermined", outcome(body, model));
                assertTrue(TreeReader.text(Bench.model(body, model), "reason").contains("different temperatures"));
            }
        }
        List<RatePoint> both = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            both.add(RatePoint.of(300, rate(300) * (1 + 0.01 * i))
                    .withRateUncertainty(0.02 * rate(300))
                    .withKelvinUncertainty(0.2));
        }
        assertEquals(
                "undetermined",
                outcome(body(new RateTable(Bench.PER_SECOND, 1, both), ErrorModel.STATED_BOTH), "arrhenius"));
    }

    @Test
    void pointsWithoutScatterAreFittedAndHaveNoCriterion() {
        Node.Group body = body(table(300, 310, 320, 330, 340), ErrorModel.CONSTANT_RELATIVE);
        Node.Quantity ea = Bench.parameter(body, "arrhenius", "Ea");
        assertEquals(100_000, ea.value().orElseThrow(), 1e-3);
        assertTrue(ea.standardUncertainty().orElseThrow() < 1e-3);
    }

    @Test
    void aPointWrongByAMillionIsFittedAndNamed() {
        List<RatePoint> points = new ArrayList<>(
                table(300, 306, 312, 318, 324, 330, 336, 342, 348).points());
        for (int i = 0; i < points.size(); i++) {
            double jitter = 1 + 0.02 * StrictMath.sin(7.0 * i);
            points.set(i, RatePoint.of(points.get(i).kelvin(), points.get(i).rate() * jitter * (i == 4 ? 1e6 : 1)));
        }
        Node.Group body = body(new RateTable(Bench.PER_SECOND, 1, points), ErrorModel.CONSTANT_RELATIVE);
        assertEquals("fitted", outcome(body, "arrhenius"));
        assertTrue(Bench.texts(body, "remarks").contains("point 5 lies"), Bench.texts(body, "remarks"));
    }

    @Test
    void anUncertaintyOfZeroIsNoPoint() {
        RatePoint point = RatePoint.of(300, 1);
        assertThrows(IllegalArgumentException.class, () -> point.withRateUncertainty(0));
        assertThrows(IllegalArgumentException.class, () -> point.withKelvinUncertainty(0));
    }

    @Test
    void weightsOverTwelveDecadesKeepTheDigits() {
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < 7; i++) {
            double t = 300 + 8 * i;
            // Relative uncertainties from 1e-7 to 0.1: weights over twelve decades.
            points.add(RatePoint.of(t, rate(t)).withRateUncertainty(rate(t) * StrictMath.pow(10, -7 + i)));
        }
        for (ErrorModel errorModel : List.of(ErrorModel.STATED, ErrorModel.CONSTANT_RELATIVE)) {
            Node.Group body = body(new RateTable(Bench.PER_SECOND, 1, points), errorModel);
            assertEquals(
                    100_000, Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow(), 1e-3, errorModel.key());
        }
    }
}
