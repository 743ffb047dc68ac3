package org.saddlebook.model.parallel.channels.internal;

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
class ParallelChannelsValidationTest {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);

    /** The reference file states its tolerance. */
    private static final double TOLERANCE = 1e-12;

    @ParameterizedTest
    @MethodSource("rows")
    void givesTheSumOfTwoArrheniusLaws(double[] row) throws Inapplicable {
        RateFunction law = new ParallelChannels().bind(RateContext.of(PER_SECOND, 1));
        double[] p = {row[0], row[1], row[2], row[3]};
        double kelvin = row[4];
        double lnRate = law.lnRate(kelvin, p, new double[p.length]);
        assertEquals(row[5], lnRate, TOLERANCE * Math.max(1, Math.abs(row[5])));
        double energy = activationEnergy(law, kelvin, p);
        assertEquals(row[6], energy, 10 * TOLERANCE * Math.max(1e4, Math.abs(row[6])));
    }

    private static List<double[]> rows() throws IOException {
        try (InputStream stream = ParallelChannelsValidationTest.class.getResourceAsStream("/reference/values.csv")) {
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

    private static double activationEnergy(RateFunction law, double kelvin, double... p) {
        return law.derived().stream()
                .filter(quantity -> quantity.symbol().equals("Ea"))
                .findFirst()
                .orElseThrow()
                .function()
                .value(kelvin, p, new double[p.length]);
    }
}
