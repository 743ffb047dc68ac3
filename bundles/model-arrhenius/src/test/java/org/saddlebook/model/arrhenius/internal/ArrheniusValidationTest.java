package org.saddlebook.model.arrhenius.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

@Tag("validation")
class ArrheniusValidationTest {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final double GAS = 8.31446261815324;
    private static final double[] P = {17, 60_000};

    @ParameterizedTest
    @MethodSource("rows")
    void givesActivationQuantitiesOfTheTable(double[] row) throws Inapplicable {
        RateFunction law = new Arrhenius().bind(RateContext.of(PER_SECOND, 1));
        double kelvin = row[2];
        double[] p = {StrictMath.log(row[5]), row[4] * 1e3};
        // Ea is printed to 1e-6 J/mol at worst, which is 2e-10 in k.
        assertEquals(1, StrictMath.exp(law.lnRate(kelvin, p, new double[2])) / row[3], 3e-10);
        assertEquals(row[0], derived(law, "dH", kelvin, p), 1e-6);
        assertEquals(row[1], derived(law, "dS", kelvin, p), 1e-9);
        assertEquals(row[6] * 1e3, derived(law, "dG", kelvin, p), 1e-6);
    }

    /**
     * One slope, two standard states: dS(1 mol/L) − dS(1 bar) = (m−1) R [1 + ln(R T c0/p0)], 35.0 J/(mol K) at 298.15 K for
     * m = 2, and 26.7 without the one. Derived from the two forms of the law; numbers by hand from the constants.
     */
    @Test
    void movesTheEntropyBetweenOneMolarAndOneBar() throws Inapplicable {
        RateFunction molar = new Arrhenius().bind(RateContext.of(MOLAR_PER_SECOND, 2));
        RateFunction bar =
                new Arrhenius().bind(RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR));
        double shift = derived(molar, "dS", 298.15, P) - derived(bar, "dS", 298.15, P);
        assertEquals(35.0, shift, 0.05);
        double gibbsShift = derived(bar, "dG", 298.15, P) - derived(molar, "dG", 298.15, P);
        // dG moves by (m-1) R T ln(R T c0/p0), which is 26.7 J/(mol K) times T.
        assertEquals(26.7, gibbsShift / 298.15, 0.05);
        assertEquals(GAS * 298.15, derived(molar, "dH", 298.15, P) - derived(bar, "dH", 298.15, P), 1e-9);
        assertEquals(shift, gibbsShift / 298.15 + GAS, 1e-10);
    }

    /** Going from 1 mol/L to 1 mol/m3 changes dS by −(m−1) R ln 1000, −57.4 J/(mol K) for m = 2 (identity). */
    @Test
    void movesTheEntropyBetweenConcentrationStandards() throws Inapplicable {
        RateContext context = RateContext.of(MOLAR_PER_SECOND, 2);
        RateFunction perLitre = new Arrhenius().bind(context);
        RateFunction perCubicMetre =
                new Arrhenius().bind(context.withStandard(new StandardState(StandardState.Kind.CONCENTRATION, 1)));
        double shift = derived(perCubicMetre, "dS", 320, P) - derived(perLitre, "dS", 320, P);
        assertEquals(-57.4, shift, 0.05);
        assertEquals(-GAS * StrictMath.log(1000), shift, 1e-11);
    }

    private static double derived(RateFunction law, String symbol, double kelvin, double... p) {
        return law.derived().stream()
                .filter(quantity -> quantity.symbol().equals(symbol))
                .findFirst()
                .orElseThrow()
                .function()
                .value(kelvin, p, new double[p.length]);
    }

    private static List<double[]> rows() throws IOException {
        try (InputStream stream =
                ArrheniusValidationTest.class.getResourceAsStream("/reference/eyring_arrhenius_identities.csv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> Stream.of(line.split(",", -1))
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .toList();
        }
    }
}
