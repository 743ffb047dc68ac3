package org.saddlebook.model.falloff.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

@Tag("validation")
class FalloffValidationTest {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);

    /** The reference file states its tolerance. */
    private static final double TOLERANCE = 1e-12;

    @ParameterizedTest
    @MethodSource("rows")
    void givesTheEquationsOfLindemannAndTroe(double[] row) throws Inapplicable {
        Conditions at = Conditions.NONE.with(Conditions.THIRD_BODY, row[8]);
        double[] p = {row[0], row[1], row[2], row[3], row[4], row[5], row[6]};
        RateFunction troe = new Troe().bind(RateContext.of(PER_SECOND, 1));
        double lnTroe = troe.lnRate(row[7], at, p, new double[7]);
        assertEquals(row[10], lnTroe, TOLERANCE * Math.max(1, Math.abs(row[10])));
        RateFunction lindemann =
                new Lindemann().bind(RateContext.of(PER_SECOND, 1).withConditions(at));
        double lnLindemann = lindemann.lnRate(row[7], Arrays.copyOf(p, 6), new double[6]);
        assertEquals(row[9], lnLindemann, TOLERANCE * Math.max(1, Math.abs(row[9])));
    }

    private static List<double[]> rows() throws IOException {
        try (InputStream stream = FalloffValidationTest.class.getResourceAsStream("/reference/values.csv")) {
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
