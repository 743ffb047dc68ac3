package org.saddlebook.model.eyring.internal;

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
class EyringValidationTest {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);

    @ParameterizedTest
    @MethodSource("rows")
    void givesRateAndArrheniusParametersOfTheTable(double[] row) throws Inapplicable {
        RateFunction law = new Eyring().bind(RateContext.of(PER_SECOND, 1));
        double kelvin = row[2];
        assertEquals(
                1, StrictMath.exp(law.lnRate(kelvin, new double[] {row[0], row[1]}, new double[2])) / row[3], 1e-11);
        assertEquals(row[4] * 1e3, derived(law, "Ea", kelvin, row[0], row[1]), 1e-6);
        assertEquals(1, StrictMath.exp(derived(law, "A", kelvin, row[0], row[1])) / row[5], 1e-11);
        assertEquals(row[6] * 1e3, derived(law, "dG", kelvin, row[0], row[1]), 1e-6);
    }

    @Test
    void halvesTheRateWithHalfTheTransmission() throws Inapplicable {
        double[] p = {80_000, -30};
        double whole = new Eyring().bind(RateContext.of(PER_SECOND, 1)).lnRate(310, p, new double[2]);
        double half = new Eyring()
                .bind(RateContext.of(PER_SECOND, 1).withTransmission(0.5))
                .lnRate(310, p, new double[2]);
        assertEquals(StrictMath.log(2), whole - half, 1e-14);
    }

    @Test
    void writesOutTheGasLawForThePressureStandard() throws Inapplicable {
        // k = (kB T/h)(RT/p0) exp(dS/R) exp(-dH/(RT)) for m = 2, written out with plain products of the SI constants of
        // 2019 (BIPM SI Brochure, 9th edition); k in m3/(mol s).
        double kelvin = 500;
        double gas = 1.380649e-23 * 6.02214076e23;
        double expected = 1.380649e-23
                * kelvin
                / 6.62607015e-34
                * (gas * kelvin / 1e5)
                * StrictMath.exp(-90 / gas)
                * StrictMath.exp(-30_000 / (gas * kelvin));
        RateFunction law = new Eyring().bind(RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR));
        double actual = StrictMath.exp(law.lnRate(kelvin, new double[] {30_000, -90}, new double[2]));
        assertEquals(1, actual / expected, 1e-13);
        // Ea = dH + 2 R T for a bimolecular gas reaction: IUPAC Gold Book, "enthalpy of activation".
        assertEquals(30_000 + 2 * gas * kelvin, derived(law, "Ea", kelvin, 30_000, -90), 1e-8);
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
                EyringValidationTest.class.getResourceAsStream("/reference/eyring_arrhenius_identities.csv")) {
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
