package org.saddlebook.reaction.series.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;

/**
 * Against R 4.2.2, run on the same invented tables with y = log(k/3600), x = 1/(t + 273.15), r the reaction:
 *
 * <pre>
 * full  &lt;- lm(y ~ r + r:x); slope &lt;- lm(y ~ r + x); inter &lt;- lm(y ~ r:x); one &lt;- lm(y ~ x)
 * anova(slope, full); anova(inter, full); anova(one, full)
 * S &lt;- function(x0) deviance(lm(y ~ I(x - x0):r)); o &lt;- optimize(S, c(1/600, 1/250), tol = 1e-14)
 * limit &lt;- o$objective + qf(.95, 1, df.residual(full)) * deviance(full)/df.residual(full)  # uniroot on either side
 * m &lt;- lm(log((100+ee)/(100-ee)) ~ x, weights = 1/uy^2), uy = 2 (u/100)/(1-(ee/100)^2); V &lt;- summary(m)$cov.unscaled
 * </pre>
 *
 * <p>Tolerance: the digits printed by R, and 1e-6 relative for what {@code optimize} and {@code uniroot} found.
 */
@Tag("validation")
class SeriesValidationTest {
    private static final Node.Group BODY =
            Data.body(SeriesFindings.section(List.of(Data.PLAIN, Data.ZINC, Data.TIN), List.of(), 0.95));

    private static void close(double expected, double found, double relative) {
        assertEquals(expected, found, relative * Math.abs(expected));
    }

    @Test
    void testsOfCommonParametersAreThoseOfR() {
        Node.Group energy = Data.item(BODY, "common", 0);
        assertEquals("common-activation-energy", Data.text(energy, "id"));
        close(194.8083526, Data.number(energy, "statistic"), 1e-8);
        close(80892.89744, Data.quantity(energy, "Ea").value().getAsDouble(), 1e-9);
        close(2269.810322, Data.quantity(energy, "Ea").standardUncertainty().getAsDouble(), 1e-8);
        Node.Group prefactor = Data.item(BODY, "common", 1);
        close(130.7657273, Data.number(prefactor, "statistic"), 1e-8);
        close(19.82251499, StrictMath.log(Data.quantity(prefactor, "A").value().getAsDouble() / 3600), 1e-9);
        close(
                0.6876455852,
                StrictMath.log(Data.quantity(prefactor, "A").standardFactor().getAsDouble()),
                1e-8);
        Node.Group one = Data.item(BODY, "common", 3);
        close(1674.034925, Data.number(one, "statistic"), 1e-8);
        close(6.533434422e-13, Data.number(one, "pValue"), 1e-6);
    }

    @Test
    void commonPointAndItsSetAreThoseOfR() {
        Node.Group point = Data.item(BODY, "common", 2);
        assertEquals("isokinetic-point", Data.text(point, "id"));
        close(0.7137807563, Data.number(point, "statistic"), 1e-6);
        close(400.3957463, Data.quantity(point, "temperature").value().getAsDouble(), 1e-6);
        Interval set = Data.quantity(point, "temperature").interval().orElseThrow();
        assertEquals(Interval.Kind.BETWEEN, set.kind());
        close(391.2694387, set.lower().getAsDouble(), 1e-6);
        close(412.4348478, set.upper().getAsDouble(), 1e-6);
    }

    @Test
    void ratioOfTwoReactionsIsThatOfR() {
        // f2 <- lm(y ~ r + r:x) on plain and zinc alone; g the difference of the model rows at 330 K.
        Node.Group ratio = Data.item(
                Data.body(SeriesFindings.section(List.of(Data.PLAIN, Data.ZINC), List.of(330.0), 0.95)), "ratios", 0);
        close(0.6911173376, StrictMath.log(Data.quantity(ratio, "ratio").value().getAsDouble()), 1e-8);
        close(
                0.01736262211,
                StrictMath.log(Data.quantity(ratio, "ratio").standardFactor().getAsDouble()),
                1e-8);
        assertEquals("faster", Data.text(ratio, "outcome"));
    }

    @Test
    void enantiomersAreThoseOfR() throws Exception {
        Node.Group body = Data.body(RatioFindings.section(
                RatioReader.read("ee.csv", Data.EXCESS.getBytes(StandardCharsets.UTF_8)), List.of(298.15), 0.95));
        close(-8989.847303, Data.quantity(body, "enthalpyDifference").value().getAsDouble(), 1e-9);
        close(
                211.5360944,
                Data.quantity(body, "enthalpyDifference").standardUncertainty().getAsDouble(),
                1e-8);
        close(-25.43146205, Data.quantity(body, "entropyDifference").value().getAsDouble(), 1e-9);
        close(
                0.7589548102,
                Data.quantity(body, "entropyDifference").standardUncertainty().getAsDouble(),
                1e-8);
        Node.Quantity inversion = Data.quantity(body, "inversion");
        close(353.4931372, inversion.value().getAsDouble(), 1e-9);
        Interval set = inversion.interval().orElseThrow();
        close(349.013902, set.lower().getAsDouble(), 1e-8);
        close(358.4948436, set.upper().getAsDouble(), 1e-8);
        Node.Group at = Data.item(body, "predictions", 0);
        close(0.5677617144, StrictMath.log(Data.quantity(at, "ratio").value().getAsDouble()), 1e-9);
        close(
                0.01045505615,
                StrictMath.log(Data.quantity(at, "ratio").standardFactor().getAsDouble()),
                1e-8);
        assertTrue(Data.text(body, "errors").contains("2.61"), Data.text(body, "errors")); // χ² of R: 2.610766
    }
}
