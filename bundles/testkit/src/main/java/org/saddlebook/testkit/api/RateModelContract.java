package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Unit;

/**
 * What every rate model must hold to. Extend it, hand in the model and some {@link #examples()}, and run it with JUnit 5.
 */
public abstract class RateModelContract {
    private static final double RELATIVE = 1e-7;

    /** Creates the contract. */
    protected RateModelContract() {}

    /** A new instance of the model. */
    protected abstract RateModel model();

    /** Cases in which the model works, at least one; choose different orders and standard states where it depends on them. */
    protected abstract List<Example> examples();

    /** Contexts in which the model has no meaning; empty when there are none. */
    protected List<RateContext> inapplicable() {
        return List.of();
    }

    /** The simpler law that the model names in its description, when it is at hand; it must be linear in its parameters. */
    protected Optional<RateModel> contained() {
        return Optional.empty();
    }

    @Test
    void hasAStableIdOfLowerCaseWords() {
        String id = model().id();
        assertTrue(
                id.matches("[a-z][a-z0-9]*([.-][a-z0-9]+)*"),
                "id must be lower-case words joined by hyphens, with a prefix and a dot for add-ons: " + id);
        assertEquals(id, model().id(), "the id must always be the same");
    }

    @Test
    void describesItselfWithTitleFormulaAndSource() {
        var description = model().description();
        assertFalse(description.title().isBlank(), "title is empty");
        assertFalse(description.formula().isBlank(), "formula is empty");
        assertFalse(description.source().isBlank(), "source is empty: say where the law was published");
        assertEquals(description, model().description(), "two instances must describe themselves alike");
        assertFalse(description.contains().equals(Optional.of(model().id())), "a law cannot be its own simpler law");
    }

    @Test
    void givesAtLeastOneExampleWithOneValuePerParameter() throws Inapplicable {
        assertFalse(examples().isEmpty(), "examples() must not be empty");
        for (Example example : examples()) {
            List<Parameter> parameters = bind(example).parameters();
            double[] p = example.parameters();
            assertEquals(parameters.size(), p.length, "number of parameters: " + example);
            for (int i = 0; i < p.length; i++) {
                Parameter parameter = parameters.get(i);
                assertTrue(
                        p[i] >= parameter.lower() && p[i] <= parameter.upper(),
                        "example value " + p[i] + " of " + parameter.symbol() + " lies outside its bounds "
                                + parameter.lower() + " to " + parameter.upper());
            }
        }
    }

    @Test
    void namesEveryParameterAndDerivedQuantityOnce() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            assertFalse(function.parameters().isEmpty(), "a law without parameters cannot be fitted");
            Set<String> symbols = new HashSet<>();
            for (Parameter parameter : function.parameters()) {
                assertTrue(symbols.add(parameter.symbol()), "symbol used twice: " + parameter.symbol());
                assertFalse(parameter.name().isBlank(), "name for people is empty: " + parameter.symbol());
            }
            for (Derived derived : function.derived()) {
                assertTrue(symbols.add(derived.symbol()), "symbol used twice: " + derived.symbol());
                assertFalse(derived.name().isBlank(), "name for people is empty: " + derived.symbol());
            }
        }
    }

    @Test
    void hasAValueAndGradientEverywhereInItsDomain() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            double[] p = example.parameters();
            for (double kelvin : example.kelvins()) {
                double[] gradient = garbage(p.length);
                double value = function.lnRate(kelvin, p, gradient);
                String where = " at " + kelvin + " K, " + example;
                assertTrue(function.defined(kelvin, p), "the law says it is not defined" + where);
                assertTrue(Double.isFinite(value), "ln k is " + value + where);
                for (int i = 0; i < p.length; i++) {
                    assertTrue(
                            Double.isFinite(gradient[i]),
                            "d ln k / d " + function.parameters().get(i).symbol() + " is " + gradient[i]
                                    + " (left unset?)" + where);
                }
            }
        }
    }

    @Test
    void givesTheGradientThatDifferencesGive() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            compareGradient(
                    example,
                    function.parameters(),
                    "ln k",
                    (kelvin, p, gradient) -> function.lnRate(kelvin, p, gradient));
        }
    }

    @Test
    void givesDerivedQuantitiesWithTheGradientThatDifferencesGive() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            for (Derived derived : function.derived()) {
                compareGradient(example, function.parameters(), derived.symbol(), derived.function());
            }
        }
    }

    @Test
    void derivesActivationQuantitiesThatAgreeWithTheLaw() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            double[] p = example.parameters();
            for (Derived derived : function.derived()) {
                for (double kelvin : example.kelvins()) {
                    double value = derived.function().value(kelvin, p, new double[p.length]);
                    String where = derived.symbol() + " at " + kelvin + " K, " + example;
                    if (derived.symbol().equals("Ea")) {
                        Slopes.Slope slope =
                                Slopes.at(t -> function.lnRate(t, p, new double[p.length]), kelvin, kelvin * 0.02);
                        double scale = Constants.GAS * kelvin * kelvin;
                        assertEquals(
                                scale * slope.value(),
                                value,
                                tolerance(value, scale * slope.value(), scale * slope.error()),
                                "not R T^2 d ln k/dT: " + where);
                    } else if (derived.symbol().equals("dG")) {
                        double expected = TransitionState.of(example.context())
                                .gibbsEnergy(kelvin, function.lnRate(kelvin, p, new double[p.length]));
                        assertEquals(expected, value, tolerance(value, expected, 1e-6), "not R T ln(F/k): " + where);
                    }
                }
            }
        }
    }

    @Test
    void leavesTheParameterArrayAlone() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            double[] p = example.parameters();
            function.lnRate(example.kelvins()[0], p, new double[p.length]);
            function.defined(example.kelvins()[0], p);
            for (Derived derived : function.derived()) {
                derived.function().value(example.kelvins()[0], p, new double[p.length]);
            }
            assertArrayEquals(example.parameters(), p, "the law changed the parameters it was given: " + example);
        }
    }

    @Test
    void givesTheSameBitsForEveryInstanceAndCall() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction first = bind(example);
            long[] expected = bits(first, example);
            assertArrayEquals(expected, bits(first, example), "a second call differs: " + example);
            assertArrayEquals(expected, bits(bind(example), example), "a second instance differs: " + example);
        }
    }

    @Test
    void givesTheSameBitsFromManyThreads() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try {
            for (Example example : examples()) {
                RateFunction shared = bind(example);
                long[] expected = bits(shared, example);
                List<Callable<long[]>> calls = new ArrayList<>();
                for (int i = 0; i < 64; i++) {
                    calls.add(() -> bits(shared, example));
                }
                for (Future<long[]> result : threads.invokeAll(calls)) {
                    assertArrayEquals(expected, bitsOf(result), "threads disturb each other: " + example);
                }
            }
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void isLinearInItsParametersWhenItSaysSo() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            if (!function.linear()) {
                continue;
            }
            double[] p = example.parameters();
            double[] moved = p.clone();
            for (int i = 0; i < p.length; i++) {
                moved[i] += 0.25 * Math.max(1, Math.abs(p[i]));
            }
            for (double kelvin : example.kelvins()) {
                double[] here = garbage(p.length);
                double[] there = garbage(p.length);
                double value = function.lnRate(kelvin, p, here);
                double expected = value;
                double size = Math.abs(value);
                double movedValue = function.lnRate(kelvin, moved, there);
                for (int i = 0; i < p.length; i++) {
                    assertEquals(
                            here[i],
                            there[i],
                            1e-12 * Math.abs(here[i]) + Double.MIN_NORMAL,
                            "the gradient of a linear law varies");
                    expected += here[i] * (moved[i] - p[i]);
                    size += Math.abs(here[i] * moved[i]);
                }
                assertEquals(
                        expected,
                        movedValue,
                        1e-12 * size + Double.MIN_NORMAL,
                        "linear() is true but ln k is curved: " + example);
            }
        }
    }

    @Test
    void offersValidStartsWhenItIsNotLinear() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction function = bind(example);
            if (function.linear()) {
                continue;
            }
            double[] kelvins = example.kelvins();
            double[] lnRates = new double[kelvins.length];
            double[] p = example.parameters();
            for (int i = 0; i < kelvins.length; i++) {
                lnRates[i] = function.lnRate(kelvins[i], p, new double[p.length]);
            }
            List<double[]> starts = function.starts(kelvins.clone(), lnRates.clone());
            assertFalse(starts.isEmpty(), "a law that is not linear must offer starting values: " + example);
            for (double[] start : starts) {
                checkStart(function, kelvins, start);
            }
        }
    }

    @Test
    void doesNotDependOnTheUnitInWhichRatesAreShown() throws Inapplicable {
        for (Example example : examples()) {
            Unit unit = example.context().rateUnit();
            RateContext other =
                    example.context().withRateUnit(new Unit("other", unit.dimension(), unit.factor() / 60, 0));
            assertArrayEquals(
                    bits(bind(example), example),
                    bits(model().bind(other), example),
                    "parameters arrive in SI whatever the unit shown; the unit must not enter ln k: " + example);
        }
    }

    @Test
    void honoursOrRefusesAParameterThatIsHeld() throws Inapplicable {
        for (Example example : examples()) {
            RateFunction free = bind(example);
            double[] p = example.parameters();
            for (int i = 0; i < p.length && p.length > 1; i++) {
                String symbol = free.parameters().get(i).symbol();
                RateFunction held;
                try {
                    held = model().bind(example.context().withFixed(symbol, p[i]));
                } catch (Inapplicable refused) {
                    checkReason(refused);
                    continue;
                }
                checkHeld(example, free, held, i);
            }
        }
    }

    @Test
    void refusesToHoldAParameterItDoesNotHave() {
        for (Example example : examples()) {
            RateContext context = example.context().withFixed("noSuchParameter", 1);
            checkReason(
                    assertThrows(
                            Inapplicable.class,
                            () -> model().bind(context),
                            "holding an unknown parameter must not be ignored: end bind() with HeldParameters.of(context, law)"));
        }
    }

    @Test
    void refusesContextsWithoutMeaningInASentence() {
        for (RateContext context : inapplicable()) {
            checkReason(assertThrows(Inapplicable.class, () -> model().bind(context), "order " + context.order()));
        }
    }

    @Test
    void marksOneNeutralValueWhenItContainsASimplerLaw() throws Inapplicable {
        boolean names = model().description().contains().isPresent();
        for (Example example : examples()) {
            long neutral = neutralCount(bind(example));
            boolean held = !example.context().fixed().isEmpty();
            assertTrue(
                    neutral == (names ? 1 : 0) || (held && neutral == 0),
                    "a law that names a simpler one marks exactly one parameter with its neutral value, others none: "
                            + neutral + " marked");
        }
    }

    @Test
    void becomesTheSimplerLawAtTheNeutralValue() throws Inapplicable {
        Optional<RateModel> simpler = contained();
        if (simpler.isEmpty()) {
            return;
        }
        assertEquals(Optional.of(simpler.get().id()), model().description().contains(), "id of the simpler law");
        for (Example example : examples()) {
            RateFunction function = bind(example);
            if (neutralCount(function) == 1) {
                double distance = Reduction.distance(function, simpler.get().bind(example.context()), example);
                assertTrue(
                        distance < 1e-9,
                        "at the neutral value the law still differs from "
                                + simpler.get().id() + " by " + distance + " in ln k: " + example);
            }
        }
    }

    private RateFunction bind(Example example) throws Inapplicable {
        return model().bind(example.context());
    }

    private static long neutralCount(RateFunction function) {
        return function.parameters().stream()
                .map(Parameter::neutral)
                .filter(OptionalDouble::isPresent)
                .count();
    }

    private static void compareGradient(
            Example example, List<Parameter> parameters, String what, Derived.Function function) {
        double[] p = example.parameters();
        for (double kelvin : example.kelvins()) {
            double[] gradient = garbage(p.length);
            double value = function.value(kelvin, p, gradient);
            assertTrue(Double.isFinite(value), what + " is " + value + " at " + kelvin + " K, " + example);
            for (int i = 0; i < p.length; i++) {
                int index = i;
                Slopes.Slope slope = Slopes.at(
                        x -> {
                            double[] moved = p.clone();
                            moved[index] = x;
                            return function.value(kelvin, moved, new double[p.length]);
                        },
                        p[i],
                        step(parameters.get(i), p[i]));
                assertEquals(
                        slope.value(),
                        gradient[i],
                        tolerance(gradient[i], slope.value(), 10 * slope.error()),
                        "d " + what + " / d " + parameters.get(i).symbol() + " at " + kelvin
                                + " K: differences give the first, the law the second; " + example);
            }
        }
    }

    private static double step(Parameter parameter, double value) {
        double step = 0.01 * Math.max(1, Math.abs(value));
        if (Double.isFinite(parameter.lower())) {
            step = Math.min(step, (value - parameter.lower()) / 2);
        }
        if (Double.isFinite(parameter.upper())) {
            step = Math.min(step, (parameter.upper() - value) / 2);
        }
        assertTrue(step > 0, "choose an example value of " + parameter.symbol() + " inside its bounds, not on them");
        return step;
    }

    private static double tolerance(double a, double b, double error) {
        return RELATIVE * Math.max(Math.abs(a), Math.abs(b)) + error;
    }

    private static void checkStart(RateFunction function, double[] kelvins, double[] start) {
        List<Parameter> parameters = function.parameters();
        assertEquals(parameters.size(), start.length, "a start has one value per parameter");
        for (int i = 0; i < start.length; i++) {
            String what = "start " + start[i] + " of " + parameters.get(i).symbol();
            assertTrue(Double.isFinite(start[i]), what + " is not a number");
            assertTrue(
                    start[i] >= parameters.get(i).lower()
                            && start[i] <= parameters.get(i).upper(),
                    what + " lies outside its bounds");
        }
        for (double kelvin : kelvins) {
            double value = function.lnRate(kelvin, start, new double[start.length]);
            assertTrue(
                    function.defined(kelvin, start) && Double.isFinite(value),
                    "start " + Arrays.toString(start) + " gives ln k = " + value + " at " + kelvin + " K");
        }
    }

    private static void checkHeld(Example example, RateFunction free, RateFunction held, int index) {
        List<Parameter> expected = new ArrayList<>(free.parameters());
        String symbol = expected.remove(index).symbol();
        assertEquals(expected, held.parameters(), "a held parameter no longer appears among the free ones");
        double[] p = example.parameters();
        double[] rest = new double[p.length - 1];
        for (int i = 0; i < rest.length; i++) {
            rest[i] = p[i < index ? i : i + 1];
        }
        for (double kelvin : example.kelvins()) {
            double value = free.lnRate(kelvin, p, new double[p.length]);
            assertEquals(
                    value,
                    held.lnRate(kelvin, rest, new double[rest.length]),
                    1e-12 * Math.max(1, Math.abs(value)),
                    "holding " + symbol + " at its value changes ln k");
        }
    }

    private static void checkReason(Inapplicable refused) {
        String reason = refused.getMessage();
        assertAll(
                () -> assertTrue(reason != null && !reason.isBlank(), "Inapplicable must give its reason"),
                () -> assertTrue(reason.endsWith("."), "the reason must be a sentence: " + reason));
    }

    private static long[] bits(RateFunction function, Example example) {
        double[] p = example.parameters();
        List<Derived> derived = function.derived();
        double[] kelvins = example.kelvins();
        long[] bits = new long[kelvins.length * (1 + p.length) * (1 + derived.size())];
        int next = 0;
        for (double kelvin : kelvins) {
            double[] gradient = garbage(p.length);
            bits[next++] = Double.doubleToLongBits(function.lnRate(kelvin, p, gradient));
            for (double entry : gradient) {
                bits[next++] = Double.doubleToLongBits(entry);
            }
            for (Derived quantity : derived) {
                bits[next++] = Double.doubleToLongBits(quantity.function().value(kelvin, p, gradient));
                for (double entry : gradient) {
                    bits[next++] = Double.doubleToLongBits(entry);
                }
            }
        }
        return bits;
    }

    private static long[] bitsOf(Future<long[]> result) throws InterruptedException {
        try {
            return result.get();
        } catch (ExecutionException broken) {
            throw new AssertionError("the law threw when called from several threads", broken.getCause());
        }
    }

    /** A gradient array that shows when an entry is added to or left unset. */
    private static double[] garbage(int length) {
        double[] array = new double[length];
        Arrays.fill(array, Double.NaN);
        return array;
    }
}
