package org.saddlebook.tunnelling.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.TransitionState;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;
import org.saddlebook.api.model.TunnellingModel;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.model.eyring.internal.Eyring;

class TunnellingTest {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);
    private static final List<TunnellingModel> MODELS = List.of(new Wigner(), new Bell(), new Eckart());

    private static Stream<Tunnelling> statements() {
        Tunnelling wigner = Tunnelling.by("wigner").with(Tunnelling.WAVENUMBER, 80_000);
        Tunnelling eckart = Tunnelling.by("eckart")
                .with(Tunnelling.WAVENUMBER, 130_000)
                .with(Tunnelling.FORWARD_BARRIER, 60_000)
                .with(Tunnelling.REVERSE_BARRIER, 95_000);
        return Stream.of(
                wigner,
                Tunnelling.by("bell").with(Tunnelling.WAVENUMBER, 80_000),
                Tunnelling.by("bell").with(Tunnelling.WAVENUMBER, 300),
                eckart,
                eckart.with(Tunnelling.REVERSE_BARRIER, 20_000),
                eckart.with(Tunnelling.FORWARD_BARRIER, 2_000).with(Tunnelling.REVERSE_BARRIER, 3_000));
    }

    private static Transmission resolved(Tunnelling stated) throws Inapplicable {
        return TunnellingModel.resolve(RateContext.of(PER_SECOND, 1).withTunnelling(stated), MODELS)
                .transmissionLaw()
                .orElseThrow();
    }

    @ParameterizedTest
    @MethodSource("statements")
    void hasTheSlopeThatDifferencesGive(Tunnelling stated) throws Inapplicable {
        Transmission law = resolved(stated);
        for (double kelvin : new double[] {200, 273, 400, 900}) {
            double step = kelvin * 3e-4;
            double difference = (8 * (law.lnCoefficient(kelvin + step) - law.lnCoefficient(kelvin - step))
                            - (law.lnCoefficient(kelvin + 2 * step) - law.lnCoefficient(kelvin - 2 * step)))
                    / (12 * step);
            assertEquals(difference, law.slope(kelvin), 1e-8 * Math.abs(difference) + 2e-14, kelvin + " K");
        }
    }

    @ParameterizedTest
    @MethodSource("statements")
    void approachesOneAtHighTemperature(Tunnelling stated) throws Inapplicable {
        Transmission law = resolved(stated);
        // All three corrections are 1 + u²/24 + ... for small u; for Eckart's also the barrier must be high against kT.
        double hot = law.lnCoefficient(50_000);
        assertTrue(Math.abs(hot) < 0.6, "ln kappa " + hot);
        assertTrue(Math.abs(law.slope(50_000) * 50_000) < 0.6);
    }

    @Test
    void eckartIsTheSameFromBothSides() {
        // Detailed balance: exchange of the heights changes nothing (H. S. Johnston and J. Heicklen 1962).
        EckartIntegral down = new EckartIntegral(1500, 6000, 9000);
        EckartIntegral up = new EckartIntegral(1500, 9000, 6000);
        for (double kelvin : new double[] {80, 200, 300, 1000}) {
            assertEquals(up.at(kelvin).lnCoefficient(), down.at(kelvin).lnCoefficient(), 1e-10, kelvin + " K");
            assertEquals(up.at(kelvin).slope(), down.at(kelvin).slope(), 1e-10 / kelvin, kelvin + " K");
        }
    }

    @Test
    void eckartStaysFiniteDeepInTunnelling() {
        EckartIntegral integral = new EckartIntegral(2500, 12_000, 15_000);
        double previous = 0;
        for (double kelvin : new double[] {300, 150, 80, 40, 20, 10}) {
            double value = integral.at(kelvin).lnCoefficient();
            assertTrue(Double.isFinite(value) && value > previous, kelvin + " K: " + value);
            previous = value;
        }
        // At the cold end k no longer depends on T: d ln κ/dT is that of exp(V1/T) but for a small rest.
        assertEquals(-12_000.0 / 100, integral.at(10).slope(), 0.25);
    }

    @ParameterizedTest
    @MethodSource("statements")
    void eyringTakesUpTheCoefficientAndItsSlope(Tunnelling stated) throws Inapplicable {
        Transmission kappa = resolved(stated);
        RateContext plain = RateContext.of(PER_SECOND, 1);
        RateFunction with = new Eyring().bind(plain.withTransmission(kappa));
        RateFunction without = new Eyring().bind(plain);
        double[] p = {70_000, -30};
        double kelvin = 310;
        assertEquals(
                without.lnRate(kelvin, p, new double[2]) + kappa.lnCoefficient(kelvin),
                with.lnRate(kelvin, p, new double[2]),
                1e-12);
        double energy = value(with, "Ea", kelvin, p);
        // Ea = dH + R T + R T² d ln κ/dT (methods of transition-state theory, by differentiation).
        assertEquals(
                70_000 + Constants.GAS * kelvin + Constants.GAS * kelvin * kelvin * kappa.slope(kelvin), energy, 1e-6);
        assertEquals(
                with.lnRate(kelvin, p, new double[2]),
                value(with, "A", kelvin, p) - energy / (Constants.GAS * kelvin),
                1e-12);
        // ΔG‡ belongs to the barrier, not to the way through it.
        assertEquals(value(without, "dG", kelvin, p), value(with, "dG", kelvin, p), 1e-9);
        TransitionState state = TransitionState.of(plain.withTransmission(kappa));
        assertEquals(70_000, state.enthalpy(kelvin, energy), 1e-6);
        assertEquals(-30, state.entropy(kelvin, value(with, "A", kelvin, p)), 1e-9);
        assertEquals(
                StrictMath.exp(kappa.lnCoefficient(kelvin)),
                state.transmission(kelvin),
                1e-12 * state.transmission(kelvin));
    }

    private static double value(RateFunction law, String symbol, double kelvin, double... p) {
        for (Derived derived : law.derived()) {
            if (derived.symbol().equals(symbol)) {
                return derived.function().value(kelvin, p, new double[p.length]);
            }
        }
        throw new AssertionError("no " + symbol);
    }

    @Test
    void refusesWhatIsMissingUnusedOrNotInstalledInASentence() {
        Tunnelling bare = Tunnelling.by("eckart").with(Tunnelling.WAVENUMBER, 100_000);
        assertSentence(bare, "needs the forward height");
        assertSentence(bare.with(Tunnelling.FORWARD_BARRIER, 1e4), "needs the reverse height");
        assertSentence(Tunnelling.by("wigner"), "needs the wavenumber");
        assertSentence(
                Tunnelling.by("bell").with(Tunnelling.WAVENUMBER, 1e5).with(Tunnelling.FORWARD_BARRIER, 1e4),
                "does not depend on the height");
        assertSentence(Tunnelling.by("instanton").with(Tunnelling.WAVENUMBER, 1e5), "is not installed");
    }

    private static void assertSentence(Tunnelling stated, String part) {
        String message =
                assertThrows(Inapplicable.class, () -> resolved(stated)).getMessage();
        assertTrue(message.contains(part) && message.endsWith("."), message);
    }

    @Test
    void aLawIsNotBoundWhileTheStatementIsUnresolved() {
        RateContext open = RateContext.of(PER_SECOND, 1)
                .withTunnelling(Tunnelling.by("wigner").with(Tunnelling.WAVENUMBER, 1e5));
        assertThrows(Inapplicable.class, () -> new Eyring().bind(open));
    }

    @Test
    void bellLeavesTheLawUndefinedWhereItDiverges() throws Inapplicable {
        Tunnelling stated = Tunnelling.by("bell").with(Tunnelling.WAVENUMBER, 150_000);
        RateFunction law = new Eyring().bind(RateContext.of(PER_SECOND, 1).withTransmission(resolved(stated)));
        double[] p = {70_000, -30};
        // 1500i cm-1: u = 2 pi at 343.5 K, from the reference table's u = 7.238521939 at 298.15 K.
        double edge = 7.23852193948 * 298.15 / (2 * Math.PI);
        assertTrue(law.defined(edge * 1.001, p));
        assertTrue(!law.defined(edge * 0.999, p));
        assertTrue(Double.isNaN(law.lnRate(edge * 0.999, p, new double[2])));
    }
}
