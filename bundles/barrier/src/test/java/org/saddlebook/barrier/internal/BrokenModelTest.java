package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Unit;

/** A broken contribution loses its own result with its bundle named; the other laws stay as they are. */
class BrokenModelTest {
    private static final double[] KELVIN = {300, 310, 320, 330};
    private static final double[] RATES = {1e-4, 3e-4, 9e-4, 2.4e-3};

    /** The law of a broken model. */
    private interface Law {
        double lnRate(double kelvin, double[] p, double[] gradient);
    }

    private record Broken(Law law, boolean linear) implements RateModel {
        @Override
        public String id() {
            return "broken";
        }

        @Override
        public ModelDescription description() {
            return new ModelDescription("Broken", "none", "none", Optional.empty());
        }

        @Override
        public RateFunction bind(RateContext context) throws Inapplicable {
            return new RateFunction() {
                @Override
                public List<Parameter> parameters() {
                    return List.of(
                            Parameter.log("A", "factor", context.rateUnit()),
                            Parameter.linear("E", "energy", Unit.JOULE_PER_MOLE));
                }

                @Override
                public boolean linear() {
                    return linear;
                }

                @Override
                public double lnRate(double kelvin, double[] p, double[] gradient) {
                    return law.lnRate(kelvin, p, gradient);
                }

                @Override
                public List<double[]> starts(double[] kelvin, double[] lnRate) {
                    return List.of(new double[] {20, 50_000});
                }
            };
        }
    }

    @Test
    void oneThatThrowsIsNamed() {
        assertFailed(
                new Broken(
                        (kelvin, p, gradient) -> {
                            throw new IllegalStateException("no luck");
                        },
                        true),
                "IllegalStateException, no luck");
    }

    @Test
    void oneThatReturnsNoNumberIsNamed() {
        assertFailed(new Broken((kelvin, p, gradient) -> Double.NaN, true), "no finite ln k at 300.00");
    }

    @Test
    void aWrongGradientIsFound() {
        assertFailed(
                new Broken(
                        (kelvin, p, gradient) -> {
                            gradient[0] = 1;
                            gradient[1] = -1 / (8 * kelvin);
                            return p[0] - p[1] / (8.314 * kelvin);
                        },
                        true),
                "does not agree with the values of the law");
    }

    @Test
    void aLawThatOnlyClaimsToBeLinearIsFound() {
        assertFailed(
                new Broken(
                        (kelvin, p, gradient) -> {
                            gradient[0] = 1;
                            gradient[1] = -1 / (8.314 * kelvin) - 2e-6 * p[1];
                            return p[0] - p[1] / (8.314 * kelvin) - 1e-6 * p[1] * p[1];
                        },
                        true),
                "says that it is linear");
    }

    @Test
    void aSearchThatNeverFindsANumberIsNamed() {
        assertFailed(new Broken((kelvin, p, gradient) -> Double.NaN, false), "model broken of bundle");
    }

    private static void assertFailed(RateModel broken, String expected) {
        Choices choices = Choices.defaults().withTargetsKelvin(List.of(305.0));
        Node.Group alone = Bench.body(Bench.firstOrder(KELVIN, RATES), choices);
        Node.Group body = Bench.body(Bench.firstOrder(KELVIN, RATES), choices, broken);
        Node.Group model = Bench.model(body, "broken");
        assertEquals("failed", TreeReader.text(model, "outcome"));
        String reason = TreeReader.text(model, "reason");
        assertTrue(reason.contains("com.example.broken"), reason);
        assertTrue(reason.contains(expected), reason);
        for (String id : List.of("arrhenius", "eyring", "modified-arrhenius")) {
            assertEquals(Bench.model(alone, id), Bench.model(body, id));
        }
        assertEquals(TreeReader.group(alone, "comparison"), TreeReader.group(body, "comparison"));
        assertEquals(TreeReader.items(alone, "predictions"), TreeReader.items(body, "predictions"));
    }
}
