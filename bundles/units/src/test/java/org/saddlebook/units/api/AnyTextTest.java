package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.MathContext;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.IntRange;
import net.jqwik.api.constraints.LongRange;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Unit;

/** Properties that hold for any text. */
class AnyTextTest {
    @Provide
    Arbitrary<String> scraps() {
        Arbitrary<String> scrap = Arbitraries.of(
                "s",
                "mol",
                "L",
                "cm",
                "M",
                "K",
                "Cel",
                "degF",
                "{molecule}",
                "min",
                "kJ",
                "S",
                "1",
                "10^",
                "10*",
                "^",
                "-",
                "+",
                "0.5",
                "2",
                "3",
                "(",
                ")",
                "/",
                ".",
                "·",
                " ",
                "⁻",
                "¹",
                "²",
                "per ",
                "[",
                "]",
                "±",
                "e",
                "%",
                " per particle",
                "u ",
                "°",
                "C",
                "99999",
                ",");
        return scrap.list().ofMaxSize(12).map(parts -> String.join("", parts));
    }

    @Property(tries = 5000)
    void anyTextIsReadOrRefusedWithAReason(@ForAll("scraps") String text) {
        try {
            Unit unit = Units.parse(text);
            assertEquals(unit, Units.parse(unit.code()), text);
        } catch (UnitException e) {
            assertTrue(!e.remedy().isEmpty()
                    && !e.found().isEmpty()
                    && !e.expected().isEmpty());
        }
        try {
            Units.kelvin(text);
        } catch (UnitException e) {
            assertTrue(!e.remedy().isEmpty());
        }
        try {
            Units.measured("1" + text);
        } catch (UnitException e) {
            assertTrue(!e.remedy().isEmpty());
        }
        try {
            Units.standardState("1" + text);
        } catch (UnitException e) {
            assertTrue(!e.remedy().isEmpty());
        }
    }

    @Property(tries = 1000)
    void anyCharactersAreReadOrRefused(@ForAll String text) {
        for (DecimalSign sign : DecimalSign.values()) {
            try {
                Numerals.parse(text, sign);
            } catch (UnitException e) {
                assertTrue(!e.remedy().isEmpty());
            }
        }
        try {
            Units.parse(text);
        } catch (UnitException e) {
            assertTrue(!e.remedy().isEmpty());
        }
    }

    @Property
    void everyDoubleHasShortestDigitsThatReadBack(@ForAll double value) throws UnitException {
        BigDecimal digits = Numerals.shortest(value);
        assertEquals(value + 0.0, digits.doubleValue());
        assertEquals(0, digits.compareTo(Numerals.parse(digits.toString(), DecimalSign.POINT)));
    }

    @Provide
    Arbitrary<StandardState> states() {
        return Combinators.combine(
                        Arbitraries.of(StandardState.Kind.values()),
                        Arbitraries.doubles().between(-24, 12))
                .as((kind, power) -> new StandardState(kind, StrictMath.pow(10, power)));
    }

    @Property
    void standardStatesReadBack(@ForAll("states") StandardState state) throws UnitException {
        assertEquals(state, Units.standardState(Units.text(state)));
    }

    /** The expected value is the definition in 60 digits, rounded once: 1 h = 3600 s, T/K = (t/°F + 459.67) 5/9. */
    @Property
    void conversionsAreRoundedOnce(
            @ForAll @LongRange(min = -999_999_999_999L, max = 999_999_999_999L) long digits,
            @ForAll @IntRange(min = -20, max = 40) int scale)
            throws UnitException {
        BigDecimal value = BigDecimal.valueOf(digits, scale);
        MathContext exact = new MathContext(60);
        BigDecimal perHour = value.divide(BigDecimal.valueOf(3600), exact);
        assertEquals(perHour.doubleValue(), Converter.of(Units.parse("1/h")).toSi(value));
        BigDecimal fahrenheit = value.add(new BigDecimal("459.67"))
                .multiply(BigDecimal.valueOf(5))
                .divide(BigDecimal.valueOf(9), exact);
        assertEquals(fahrenheit.doubleValue(), Converter.of(Units.parse("degF")).toSi(value));
        assertEquals(
                value.multiply(BigDecimal.valueOf(5))
                        .divide(BigDecimal.valueOf(9), exact)
                        .doubleValue(),
                Converter.of(Units.parse("degF")).differenceToSi(value));
        BigDecimal perMolecule = value.multiply(new BigDecimal("6.02214076E17"));
        assertEquals(
                perMolecule.doubleValue(),
                Converter.of(Units.parse("cm3 molecule-1 s-1")).toSi(value));
        assertEquals(
                value.add(new BigDecimal("273.15")).doubleValue(),
                Converter.of(Units.parse("°C")).toSi(value));
    }
}
