package org.saddlebook.reaction.series.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Constants;

/**
 * Evaluated expressions of OH + CH4: 2.45e-12 exp(−1775 K/T) with k(298 K) = 6.34373e-15 cm3/(molecule s) (JPL evaluation),
 * 2.8e-14 T^0.667 exp(−1575 K/T) with k(298 K) = 6.34033e-15 (Gierczak et al., J. Phys. Chem. A 101, 3125 (1997)); the
 * values at 298 K were computed with Python 3 in double precision. Coefficients as found in public mechanisms.
 */
class LiteratureTest {
    private static final String JPL =
            "A = 2.45e-12 cm3/({molecule}.s), E/R = 1775 K, f298 = 1.1, g = 100 K, from the JPL evaluation";
    private static final double MOLECULES = 1e-6 * Constants.AVOGADRO;

    @Test
    void evaluatesBothForms() throws InputException {
        assertEquals(6.34373e-15, StrictMath.exp(Literature.parse(JPL, 2).lnRate(298)) / MOLECULES, 5e-21);
        Literature three = Literature.parse("A = 2.8e-14 cm3/({molecule}.s), n = 0.667, E/R = 1575 K", 2);
        assertEquals(6.34033e-15, StrictMath.exp(three.lnRate(298)) / MOLECULES, 5e-21);
        // R (1575 + 0.667·286.2) = 14.6824 kJ/mol
        assertEquals(14_682.4, three.energy(286.2), 0.5);
    }

    @Test
    void widensTheFactorAwayFromTheReference() throws InputException {
        Literature jpl = Literature.parse(JPL, 2);
        assertEquals(StrictMath.log(1.1), jpl.lnFactor(298), 1e-15);
        // f(200) = 1.1 exp|100 (1/200 − 1/298)| = 1.1 · exp(0.164430), by hand
        assertEquals(StrictMath.log(1.1) + 0.164430, jpl.lnFactor(200), 1e-6);
        assertEquals(jpl.lnFactor(400), StrictMath.log(1.1) + 100 * (1 / 298.0 - 1 / 400.0), 1e-15);
    }

    @Test
    void comparesTemperatureByTemperatureAndOverall() throws InputException {
        // Three-parameter values of the other expression, in degC, with 5 % stated: within the factor of the first.
        double[][] rows = new double[5][];
        for (int i = 0; i < rows.length; i++) {
            double t = 200 + 40 * i;
            double k = 2.8e-14 * StrictMath.pow(t, 0.667) * StrictMath.exp(-1575 / t);
            rows[i] = new double[] {t - 273.15, k, 0.05 * k};
        }
        Reaction measured = Data.reaction("measured", "cm3/({molecule}.s)", rows);
        Node.Group body = Data.body(
                LiteratureFindings.section(List.of(measured), ReferenceRate.of(Literature.parse(JPL, 2)), 0.95));
        Node.Group item = Data.item(body, "reactions", 0);
        assertEquals("not-distinguishable", Data.text(item, "outcome"));
        Node.Table table = (Node.Table) item.get("byTemperature").orElseThrow();
        assertEquals(5, table.rows().size());
        double ratio = ((Node.Quantity) table.rows().get(0).get(3)).value().getAsDouble();
        assertEquals(2.8e-14 * StrictMath.pow(200, 0.667) / 2.45e-12 * StrictMath.exp(200 / 200.0), ratio, 1e-9);
        Node.Group twice = Data.item(
                Data.body(LiteratureFindings.section(
                        List.of(measured),
                        ReferenceRate.of(Literature.parse(JPL.replace("2.45e-12", "1.0e-12"), 2)),
                        0.95)),
                "reactions",
                0);
        assertEquals("faster", Data.text(twice, "outcome"));
    }

    @Test
    void comparesWithATableOfOthers() {
        JointFit fit = JointFit.of(List.of(Data.TIN)).orElseThrow();
        Node.Group item = Data.item(
                Data.body(LiteratureFindings.section(
                        List.of(Data.TIN),
                        ReferenceRate.of(Data.TIN, fit.lines().get(0), fit.scale()),
                        0.95)),
                "reactions",
                0);
        assertEquals(1, Data.quantity(item, "ratio").value().getAsDouble(), 1e-12);
        assertEquals("not-distinguishable", Data.text(item, "outcome"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "A = 1e13 1/s",
                "A = 1e13 L/(mol.s), E/R = 5000 K",
                "A = 1e13 1/s, E/R = 5000",
                "A = 1e13 1/s, E/R = 5000 K, Ea = 3 kJ/mol",
                "A = 1e13 1/s, E/R = 5000 K, f298 = 0.5",
                "A = 1e13 1/s, E/R = 5000 K, f298 = x",
                "A = -1 1/s, E/R = 5000 K",
                "A = 1e13 1/s, A = 2 1/s, E/R = 5000 K",
                "A = 1e13 1/s, E/R = 5000 K, q = 3",
                "something",
            })
    void refusesExpressionsThatDoNotMakeSense(String text) {
        InputException e = assertThrows(InputException.class, () -> Literature.parse(text, 1));
        assertEquals("--literature", e.problems().get(0).place().file());
        assertTrue(!e.problems().get(0).remedy().isEmpty());
    }
}
