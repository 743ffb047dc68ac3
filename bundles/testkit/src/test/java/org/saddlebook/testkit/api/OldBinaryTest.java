package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

/** An add-on that was built against the first api, and not rebuilt since, still holds to the contract. */
class OldBinaryTest extends RateModelContract {
    private static final Path JAR = Path.of(
            "..", "..", "distribution", "src", "test", "resources", "old-binaries", "example.harcourt-esson-1.0.0.jar");
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit MOLAR_RATE = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        try {
            return BundleLoader.rateModel(JAR);
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    @Override
    protected List<Example> examples() {
        return HarcourtEssonExamples.LIST;
    }

    @Test
    void multipliesTheRateByAPowerOfTheTemperature() throws Inapplicable {
        var law = model().bind(RateContext.of(TestLaw.PER_SECOND, 1).withReferenceKelvin(300));
        // k = k0 (T/T0)^C with k0 = 1/s, C = 20 and T = 2 T0 is 2^20 by definition.
        assertEquals(20 * StrictMath.log(2), law.lnRate(600, new double[] {0, 20}, new double[2]), 1e-13);
    }

    /** Shared with the test of the example's source. */
    static final class HarcourtEssonExamples {
        static final List<Example> LIST = List.of(
                Example.of(RateContext.of(TestLaw.PER_SECOND, 1), StrictMath.log(1e-4), 33),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR), -9, 21),
                Example.of(RateContext.of(MOLAR_RATE, 0), -2, 25));

        private HarcourtEssonExamples() {}
    }
}
