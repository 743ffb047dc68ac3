package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Nested;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Unit;

/** The contract lets a sound law pass and catches every fault it is there for. */
class RateModelContractTest {
    @Nested
    class SoundLaw extends RateModelContract {
        @Override
        protected RateModel model() {
            return new TestLaw();
        }

        @Override
        protected List<Example> examples() {
            return List.of(Example.of(TestLaw.CONTEXT, 30, 12_000));
        }
    }

    @Test
    void catchesAWrongGradient() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                double value = super.lnRate(kelvin, p, gradient);
                gradient[1] *= 1.00001;
                return value;
            }
        });
        caught("differences", contract::givesTheGradientThatDifferencesGive);
    }

    @Test
    void catchesAGradientThatIsAddedTo() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                gradient[0] += 1;
                gradient[1] -= 1 / kelvin;
                return p[0] - p[1] / kelvin;
            }
        });
        caught("left unset", contract::hasAValueAndGradientEverywhereInItsDomain);
    }

    @Test
    void catchesAWrongGradientOfADerivedQuantity() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public List<Derived> derived() {
                return List.of(new Derived(
                        "Bhalf", "half of it", Unit.KELVIN, Parameter.Scale.LINEAR, (kelvin, p, gradient) -> {
                            gradient[0] = 0;
                            gradient[1] = 1;
                            return p[1] / 2;
                        }));
            }
        });
        caught("d Bhalf / d B", contract::givesDerivedQuantitiesWithTheGradientThatDifferencesGive);
    }

    @Test
    void catchesAnActivationEnergyThatIsNotTheSlope() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public List<Derived> derived() {
                return List.of(new Derived(
                        "Ea",
                        "activation energy",
                        Unit.JOULE_PER_MOLE,
                        Parameter.Scale.LINEAR,
                        (kelvin, p, gradient) -> {
                            gradient[0] = 0;
                            gradient[1] = 8;
                            return p[1] * 8;
                        }));
            }
        });
        caught("R T^2", contract::derivesActivationQuantitiesThatAgreeWithTheLaw);
    }

    @Test
    void catchesCurvatureInALawThatSaysItIsLinear() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                gradient[0] = 1;
                gradient[1] = -2 * p[1] / kelvin;
                return p[0] - p[1] * p[1] / kelvin;
            }
        });
        caught("linear", contract::isLinearInItsParametersWhenItSaysSo);
    }

    @Test
    void catchesALawWithoutStartsThatIsNotLinear() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public boolean linear() {
                return false;
            }
        });
        caught("starting values", contract::offersValidStartsWhenItIsNotLinear);
    }

    @Test
    void catchesAStartThatIsNotANumber() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public boolean linear() {
                return false;
            }

            @Override
            public List<double[]> starts(double[] kelvin, double[] lnRate) {
                return List.of(new double[] {1, Double.NaN});
            }
        });
        caught("not a number", contract::offersValidStartsWhenItIsNotLinear);
    }

    @Test
    void catchesAHeldParameterThatIsIgnored() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public RateFunction bind(RateContext context) {
                return this;
            }
        });
        caught("no longer appears", contract::honoursOrRefusesAParameterThatIsHeld);
        caught("must not be ignored", contract::refusesToHoldAParameterItDoesNotHave);
    }

    @Test
    void catchesAStateThatChangesFromCallToCall() {
        RateModelContract contract = of(new TestLaw() {
            private double calls;

            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                calls += 1e-13;
                return super.lnRate(kelvin, p, gradient) + calls;
            }
        });
        caught("differs", contract::givesTheSameBitsForEveryInstanceAndCall);
        caught("threads", contract::givesTheSameBitsFromManyThreads);
    }

    @Test
    void catchesAUnitThatEntersTheLaw() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                return super.lnRate(kelvin, p, gradient)
                        + StrictMath.log(bound().rateUnit().factor());
            }
        });
        caught("unit", contract::doesNotDependOnTheUnitInWhichRatesAreShown);
    }

    @Test
    void catchesParametersThatAreOverwritten() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                double value = super.lnRate(kelvin, p, gradient);
                p[1] = 0;
                return value;
            }
        });
        caught("changed the parameters", contract::leavesTheParameterArrayAlone);
    }

    @Test
    void catchesASymbolThatIsUsedTwice() {
        RateModelContract contract = of(new TestLaw() {
            @Override
            public List<Derived> derived() {
                return List.of(
                        new Derived("B", "again", Unit.KELVIN, Parameter.Scale.LINEAR, (kelvin, p, gradient) -> 0));
            }
        });
        caught("used twice", contract::namesEveryParameterAndDerivedQuantityOnce);
    }

    @Test
    void catchesASimplerLawThatTheNeutralValueDoesNotGive() {
        RateModel bent = new TestLaw() {
            @Override
            public ModelDescription description() {
                return new ModelDescription("Bent", "ln k", "made for tests", Optional.of("test.law"));
            }

            @Override
            public List<Parameter> parameters() {
                return List.of(
                        super.parameters().get(0),
                        super.parameters().get(1),
                        Parameter.linear("c", "curvature", Unit.ONE).withNeutral(1));
            }

            @Override
            public double lnRate(double kelvin, double[] p, double[] gradient) {
                double bend = 1e5 / (kelvin * kelvin);
                gradient[0] = 1;
                gradient[1] = -1 / kelvin;
                gradient[2] = bend;
                return p[0] - p[1] / kelvin + p[2] * bend;
            }

            @Override
            public List<Derived> derived() {
                return List.of();
            }
        };
        RateModelContract contract = new Contract(bent, Example.of(TestLaw.CONTEXT, 30, 12_000, 1)) {
            @Override
            protected Optional<RateModel> contained() {
                return Optional.of(new TestLaw());
            }
        };
        caught("still differs", contract::becomesTheSimplerLawAtTheNeutralValue);
    }

    @Test
    void catchesAContextThatOughtToBeRefused() {
        RateModelContract contract = new Contract(new TestLaw(), Example.of(TestLaw.CONTEXT, 30, 12_000)) {
            @Override
            protected List<RateContext> inapplicable() {
                return List.of(TestLaw.CONTEXT);
            }
        };
        caught("order", contract::refusesContextsWithoutMeaningInASentence);
    }

    private static RateModelContract of(RateModel model) {
        return new Contract(model, Example.of(TestLaw.CONTEXT, 30, 12_000));
    }

    private static void caught(String word, Executable test) {
        AssertionError error = assertThrows(AssertionError.class, test);
        assertTrue(error.getMessage().contains(word), error.getMessage());
    }

    private static class Contract extends RateModelContract {
        private final RateModel model;
        private final Example example;

        Contract(RateModel model, Example example) {
            this.model = model;
            this.example = example;
        }

        @Override
        protected RateModel model() {
            return model;
        }

        @Override
        protected List<Example> examples() {
            return List.of(example);
        }
    }

    @Test
    void differencesAreGoodToTenDigits() {
        // d/dx exp(sin x) = cos x exp(sin x), an identity.
        double x = 0.7;
        double exact = StrictMath.cos(x) * StrictMath.exp(StrictMath.sin(x));
        Slopes.Slope slope = Slopes.at(t -> StrictMath.exp(StrictMath.sin(t)), x, 0.1);
        assertEquals(exact, slope.value(), 1e-10 * exact);
        assertTrue(Math.abs(slope.value() - exact) <= 10 * slope.error());
    }
}
