package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.barrier.api.FittedLaws;

/**
 * Stated uncertainties of k and T, on invented numbers. The lines: chi-squared of York et al. 2004 with its correlated
 * errors made smallest in 40 digits by mpmath 1.3 (root of its derivative), covariance at the adjusted points. The
 * three-parameter law: ODRPACK through {@code scipy.odr}, SciPy 1.17.1, exact derivatives, {@code sstol = partol = 1e-16}.
 */
@Tag("validation")
class BothErrorsValidationTest {
    private static final double[] KELVIN = {300, 310, 320, 330, 340, 350};
    private static final double[] RATE = {1.02e-5, 3.31e-5, 1.05e-4, 2.79e-4, 7.9e-4, 1.88e-3};
    private static final double[] RELATIVE = {0.04, 0.03, 0.05, 0.03, 0.04, 0.03};
    private static final double[] OF_KELVIN = {0.3, 0.4, 0.3, 0.5, 0.3, 0.4};

    private static RateTable table(double factor) {
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < KELVIN.length; i++) {
            points.add(RatePoint.of(KELVIN[i], RATE[i])
                    .withRateUncertainty(factor * RELATIVE[i] * RATE[i])
                    .withKelvinUncertainty(OF_KELVIN[i]));
        }
        return new RateTable(Bench.PER_SECOND, 1, points);
    }

    private static Node.Group body(double factor, RateModel... more) {
        return Bench.body(
                table(factor),
                Choices.defaults()
                        .withErrorModel(ErrorModel.STATED_BOTH)
                        .withTargetsKelvin(List.of(298.15))
                        .withReferenceKelvin(298.15),
                more);
    }

    private static void agrees(double value, double uncertainty, Node.Quantity quantity) {
        assertEquals(value, quantity.value().orElseThrow(), 1e-7 * Math.abs(value));
        assertEquals(uncertainty, quantity.standardUncertainty().orElseThrow(), 1e-5 * uncertainty);
    }

    @Test
    void anArrheniusLineIsTheLineOfYork() {
        Node.Group body = body(1);
        agrees(91357.2151439823, 1068.79752626, Bench.parameter(body, "arrhenius", "Ea"));
        Node.Group statistics = TreeReader.group(Bench.model(body, "arrhenius"), "statistics");
        assertEquals(1.34453626242612, TreeReader.number(statistics, "chiSquared"), 1e-9);
        assertEquals(
                25.1394301540097,
                StrictMath.log(Bench.parameter(body, "arrhenius", "A").value().orElseThrow()),
                1e-7);
    }

    @Test
    void anEyringLineCountsTheErrorThatItsAxesShare() {
        Node.Group body = body(1);
        agrees(88662.7032718476, 1068.82692447, Bench.parameter(body, "eyring", "dH"));
        agrees(-44.9234026247522, 3.28438060383, Bench.parameter(body, "eyring", "dS"));
        Node.Group statistics = TreeReader.group(Bench.model(body, "eyring"), "statistics");
        assertEquals(1.39577018842025, TreeReader.number(statistics, "chiSquared"), 1e-9);
    }

    @Test
    void anyOtherLawIsFittedByOrthogonalDistance() {
        Node.Group body = body(1);
        Node.Quantity n = Bench.parameter(body, "modified-arrhenius", "n");
        Node.Quantity e = Bench.parameter(body, "modified-arrhenius", "E");
        // The reference stops where its sum of squares no longer changes.
        assertEquals(-8.396569963509686, n.value().orElseThrow(), 1e-5);
        assertEquals(18.528277818932906, n.standardUncertainty().orElseThrow(), 1e-5);
        assertEquals(113989.4806831879, e.value().orElseThrow(), 0.03);
        Node.Group statistics = TreeReader.group(Bench.model(body, "modified-arrhenius"), "statistics");
        assertEquals(1.1410349621761111, TreeReader.number(statistics, "chiSquared"), 1e-9);
    }

    @Test
    void aNewRunHasAnUncertainTemperatureToo() {
        Node.Group body = body(1);
        Node.Group row = (Node.Group) TreeReader.items(body, "predictions").get(0);
        double mean =
                StrictMath.log(TreeReader.quantity(row, "k").standardFactor().orElseThrow());
        double run = StrictMath.log(
                TreeReader.quantity(row, "kNewRun").standardFactor().orElseThrow());
        double u = 0;
        double t = 0;
        for (int i = 0; i < KELVIN.length; i++) {
            u += RELATIVE[i] * RELATIVE[i] / KELVIN.length;
            t += OF_KELVIN[i] * OF_KELVIN[i] / KELVIN.length;
        }
        double ea = Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow();
        double slope = ea / (8.31446261815324 * 298.15 * 298.15);
        assertEquals(Math.sqrt(mean * mean + u + slope * slope * t), run, 1e-8);
    }

    @Test
    void findingsPredictWithTheSameUncertaintyAfterwards() throws Exception {
        Node.Group body = body(1);
        FittedLaws laws = FittedLaws.of(Bench.section(
                table(1),
                Choices.defaults().withErrorModel(ErrorModel.STATED_BOTH).withTargetsKelvin(List.of(298.15))));
        assertTrue(laws.stated());
        Node.Group again = new StoredLaws(laws)
                .predict("arrhenius", Bench.models().get("arrhenius").model(), 298.15);
        Node.Group row = (Node.Group) TreeReader.items(body, "predictions").get(0);
        for (String key : List.of("k", "kNewRun")) {
            assertEquals(
                    TreeReader.quantity(row, key).standardFactor().orElseThrow(),
                    TreeReader.quantity(again, key).standardFactor().orElseThrow(),
                    1e-9);
        }
    }

    @Test
    void largeUncertaintiesAreTakenOnTheRateConstantItself() {
        Node.Group body = body(8);
        assertEquals("k", TreeReader.text(body, "response"));
        double ea = Bench.parameter(body, "arrhenius", "Ea").value().orElseThrow();
        assertEquals(91357, ea, 3 * 8000);
        assertTrue(Bench.parameter(body, "arrhenius", "Ea").interval().isPresent());
    }
}
