package org.saddlebook.model.modified.arrhenius.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

@Tag("validation")
class ModifiedArrheniusValidationTest {
    private static final double GAS = 8.31446261815324;

    /** 1 cm3/(molecule s) in m3/(mol s), exact (SI 2019). */
    private static final double CUBIC_CENTIMETRE = 6.02214076e23 * 1e-6;

    private static final Unit UNIT = new Unit("cm3/s", Dimension.rateConstant(2), CUBIC_CENTIMETRE, 0);

    @ParameterizedTest
    @MethodSource("rows")
    void givesRateAndLocalActivationEnergyOfEvaluatedExpressions(double[] row) throws Inapplicable {
        double reference = 300;
        RateFunction law = new ModifiedArrhenius().bind(RateContext.of(UNIT, 2).withReferenceKelvin(reference));
        double n = row[1];
        double kelvin = row[3];
        // The tables write A T^n, the law A (T/T0)^n: ln A moves by n ln T0.
        double lnA = StrictMath.log(row[0] * CUBIC_CENTIMETRE) + n * StrictMath.log(reference);
        double[] p = {lnA, n, row[2] * GAS};
        double rate = StrictMath.exp(law.lnRate(kelvin, p, new double[3])) / CUBIC_CENTIMETRE;
        assertEquals(1, rate / row[4], 1e-9);
        double energy = derived(law, "Ea", kelvin, p);
        assertEquals(1, energy / (row[5] * 1e3), 1e-6);
        // The local pair gives the same k: k = Alocal exp(-Ea/(RT)) (identity).
        double lnRate = derived(law, "Alocal", kelvin, p) - energy / (GAS * kelvin);
        assertEquals(1, StrictMath.exp(lnRate) / CUBIC_CENTIMETRE / row[4], 1e-9);
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
                ModifiedArrheniusValidationTest.class.getResourceAsStream("/reference/evaluated_grid.csv")) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> Stream.of(line.split(",", -1))
                            .skip(1)
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .toList();
        }
    }
}
