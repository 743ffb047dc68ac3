package org.saddlebook.reaction.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;

/** Properties that hold for any text and any equation. */
class AnyEquationTest {
    @Provide
    Arbitrary<String> scraps() {
        Arbitrary<String> scrap = Arbitraries.of(
                "H", "O2", "Fe", "Na", "e", "e-", "SO4", "2", "3", "0.5", "1/2", "½", ".", "·", "(", ")", "[", "]", "+",
                "-", " + ", " ", "^", "²", "⁻", "⁺", "=", " = ", "->", "⇌", "(g)", "(aq)", "(s,", "x", "{", "}", "0",
                "99999", ",", "/", "\n", "é");
        return scrap.list().ofMaxSize(14).map(parts -> String.join("", parts));
    }

    @Property(tries = 5000)
    void everyTextGivesAnEquationThatReadsBackOrAProblem(@ForAll("scraps") String text) throws Exception {
        Equation equation;
        try {
            equation = Equation.parse(text);
        } catch (ReactionException wrong) {
            assertTrue(wrong.character() >= 1 && wrong.character() <= text.length() + 1, wrong.getMessage());
            return;
        }
        assertEquals(equation, Equation.parse(equation.text()), text);
        Equation reversed = equation.reversed();
        equation.net()
                .forEach((species, coefficient) ->
                        assertEquals(coefficient.negated(), reversed.net().get(species)));
        assertEquals(equation.imbalance().balanced(), reversed.imbalance().balanced());
    }

    @Property(tries = 2000)
    void everyStringIsReadWithoutAFault(@ForAll String text) {
        try {
            Formula.parse(text);
        } catch (ReactionException wrong) {
            assertTrue(!wrong.code().isEmpty());
        }
    }

    @Provide
    Arbitrary<int[]> atoms() {
        return Arbitraries.integers().between(1, 30).array(int[].class).ofSize(4);
    }

    /** Combustion of any CaHbOcNd has one balance; the coefficients follow by hand. */
    @Property(tries = 500)
    void balancesTheCombustionOfAnything(@ForAll("atoms") int[] n) throws Exception {
        String fuel = "C" + n[0] + "H" + n[1] + "O" + n[2] + "N" + n[3];
        Fraction oxygen = Fraction.of(n[0]).plus(Fraction.of(n[1], 4)).minus(Fraction.of(n[2], 2));
        Equation written = Equation.parse(fuel + " + O2 = CO2 + H2O + N2");
        if (oxygen.signum() <= 0) {
            assertTrue(written.balanced().isEmpty());
            return;
        }
        Equation balanced = written.balanced().orElseThrow();
        assertTrue(balanced.imbalance().balanced());
        Fraction one = balanced.reactants().get(0).coefficient();
        assertEquals(oxygen, balanced.reactants().get(1).coefficient().dividedBy(one));
        assertEquals(
                Fraction.of(n[1], 2), balanced.products().get(1).coefficient().dividedBy(one));
        Fraction common = Fraction.ZERO;
        List<Term> all = new ArrayList<>(balanced.reactants());
        all.addAll(balanced.products());
        for (Term term : all) {
            assertEquals(java.math.BigInteger.ONE, term.coefficient().denominator());
            common = new Fraction(common.numerator().gcd(term.coefficient().numerator()), java.math.BigInteger.ONE);
        }
        assertEquals(Fraction.ONE, common, "the smallest whole numbers");
    }

    @Property(tries = 500)
    void fractionsObeyTheRulesOfArithmetic(@ForAll("ratios") Fraction a, @ForAll("ratios") Fraction b) {
        assertEquals(a, a.plus(b).minus(b));
        assertEquals(a.times(b), b.times(a));
        assertEquals(
                a.doubleValue(), a.numerator().doubleValue() / a.denominator().doubleValue());
        if (b.signum() != 0) {
            assertEquals(a, a.times(b).dividedBy(b));
        }
    }

    @Provide
    Arbitrary<Fraction> ratios() {
        Arbitrary<Long> whole = Arbitraries.longs().between(-1_000_000, 1_000_000);
        return Combinators.combine(whole, Arbitraries.longs().between(1, 1_000_000))
                .as(Fraction::of);
    }
}
