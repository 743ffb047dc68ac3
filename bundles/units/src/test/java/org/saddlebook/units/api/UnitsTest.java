package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.OptionalDouble;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

class UnitsTest {
    @ParameterizedTest
    @CsvSource(
            quoteCharacter = '"',
            value = {
                "L/(mol.s), L/(mol.s)",
                "L.mol-1.s-1, L/(mol.s)",
                "L mol-1 s-1, L/(mol.s)",
                "L mol^-1 s^-1, L/(mol.s)",
                "L/mol/s, L/(mol.s)",
                "dm3 mol-1 s-1, L/(mol.s)",
                "dm³·mol⁻¹·s⁻¹, L/(mol.s)",
                "M-1 s-1, L/(mol.s)",
                "M⁻¹ s⁻¹, L/(mol.s)",
                "M⁻¹s⁻¹, L/(mol.s)",
                "1/(M s), L/(mol.s)",
                "1/(M.s), L/(mol.s)",
                "s-1 L mol-1, L/(mol.s)",
                "1/s, 1/s",
                "/s, 1/s",
                "s-1, 1/s",
                "s^-1, 1/s",
                "s⁻¹, 1/s",
                "s**-1, 1/s",
                "s^{-1}, 1/s",
                "min-1, 1/min",
                "1/min, 1/min",
                "h-1, 1/h",
                "1/h, 1/h",
                "cm3/({molecule}.s), cm3/({molecule}.s)",
                "cm3 molecule-1 s-1, cm3/({molecule}.s)",
                "cm³ molecule⁻¹ s⁻¹, cm3/({molecule}.s)",
                "cm^6 molecule^-2 s^-1, cm6/({molecule}2.s)",
                "cm3 molec-1 s-1, cm3/({molecule}.s)",
                "m3/(mol.min), m3/(mol.min)",
                "L2 mol-2 s-1, L2/(mol2.s)",
                "M-2 s-1, L2/(mol2.s)",
                "mol L-1 s-1, mol/(L.s)",
                "mol dm-3 s-1, mol/(L.s)",
                "M/s, mol/(L.s)",
                "mM-1 s-1, L/(mmol.s)",
                "µM-1 s-1, L/(umol.s)",
                "μM, umol/L",
                "mol dm-3, mol/L",
                "L^0.5 mol^-0.5 s^-1, L^0.5/(mol^0.5.s)",
                "L^(1/2) mol^(-1/2) s^-1, L^0.5/(mol^0.5.s)",
                "L^(1/3) mol^(-1/3) s^-1, L^(1/3)/(mol^(1/3).s)",
                "J/(mol.K), J/(mol.K)",
                "J mol-1 K-1, J/(mol.K)",
                "kJ/mol, kJ/mol",
                "kJ mol-1, kJ/mol",
                "kcal/mol, kcal/mol",
                "kcal_th/mol, kcal_th/mol",
                "cal/mol, cal/mol",
                "°C, Cel",
                "degC, Cel",
                "deg C, Cel",
                "Cel, Cel",
                "℃, Cel",
                "K, K",
                "°F, [degF]",
                "degF, [degF]",
                "[degF], [degF]",
                "eV per particle, eV/{molecule}",
                "L per mol per s, L/(mol.s)",
                "10^-5 s-1, 10*-5/s",
                "10⁻⁵ s⁻¹, 10*-5/s",
                "1, 1",
                "%, %"
            })
    void readsEverySpellingAsOneTerm(String text, String code) throws UnitException {
        assertEquals(code, Units.parse(text).code());
        assertEquals(Units.parse(text), Units.parse(code));
    }

    @Test
    void wellKnownUnitsAreTheConstantsOfTheApi() throws UnitException {
        assertEquals(Unit.ONE, Units.parse("1"));
        assertEquals(Unit.KELVIN, Units.parse("kelvin"));
        assertEquals(Unit.JOULE_PER_MOLE, Units.parse("J mol^-1"));
        assertEquals(Unit.JOULE_PER_MOLE_KELVIN, Units.parse("J K-1 mol-1"));
    }

    @Test
    void theUsersOwnUnitIsKept() throws UnitException {
        Unit perMinute = Units.parse("min-1");
        assertEquals("1/min", perMinute.code());
        assertEquals(1.0 / 60, perMinute.factor());
        assertEquals(Units.parse("1/s").dimension(), perMinute.dimension());
    }

    @ParameterizedTest
    @CsvSource(
            quoteCharacter = '"',
            value = {
                "S-1, s",
                "Mol/L, mol",
                "KJ/mol, kJ",
                "MIN-1, min",
                "Kcal/mol, kcal",
                "secs-1, sec",
                "C, degC",
                "moles-1 L sc-1, sec",
                "litr/(mol.s), litre",
                "l/(mol.S), s",
                "PA, Pa",
            })
    void unknownUnitsNameTheirNeighboursAndAreNotGuessed(String text, String near) {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse(text));
        assertEquals("unknown-unit", problem.code());
        assertEquals("a unit symbol", problem.expected());
        assertTrue(problem.found().contains("\"" + text + "\""), problem.found());
        assertTrue(problem.remedy().startsWith("did you mean "), problem.remedy());
        for (String neighbour : near.split(" or ", -1)) {
            assertTrue(problem.remedy().replace('?', ' ').contains(" " + neighbour + " "), problem.remedy());
        }
    }

    @Test
    void aUnitLikeNothingKnownPointsToTheList() {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse("furlong"));
        assertEquals("unknown-unit", problem.code());
        assertEquals("\"furlong\"", problem.found());
        assertEquals("use a symbol that \"saddlebook units\" lists; upper and lower case differ", problem.remedy());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"J/mol K", "J/mol.K", "J/mol·K", "L/mol s", "L/mol.s", "kJ/mol K-1", "1/M s", "L per mol s"})
    void aProductAfterADivisionIsAmbiguous(String text) {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse(text));
        assertEquals("ambiguous-unit", problem.code());
        assertEquals("\"" + text + "\", a product after a division", problem.found());
        assertEquals("a unit that can be read in one way only", problem.expected());
        assertEquals(
                "put the denominator in parentheses, as in \"J/(mol.K)\", or write exponents, as in \"J mol-1 K-1\"",
                problem.remedy());
    }

    @ParameterizedTest
    @ValueSource(strings = {"J/(mol.Cel)", "J mol-1 °C-1", "1/degF", "°C^2", "W/(m2.[degF])"})
    void aTemperatureScaleInsideALargerUnitIsRefused(String text) {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse(text));
        assertEquals("W/(m2.[degF])".equals(text) ? "unknown-unit" : "ambiguous-unit", problem.code());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "s^",
                "s^-",
                "s-0.5",
                "L0.5",
                "(s",
                "s)",
                "mol/",
                "/",
                "//s",
                "1..s",
                "[degF",
                "{molecule",
                "s^(1/0)",
                "s^99999",
                "s^(1/",
                "5 s-1",
                "1.5/s",
                "10*",
                "s--1",
                "s^1.2.3",
                "()",
                "mol-",
                "s⁻",
                "s⁻¹⁻",
                "((((((((((s))))))))))",
                "{molecule}-30",
                "s30.s30",
                "µ",
                "-1",
                "…"
            })
    void brokenExpressionsAreRefused(String text) {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse(text));
        assertTrue(
                problem.code().equals("unit-syntax") || problem.code().equals("unknown-unit"),
                text + ": " + problem.code());
        assertFalse(problem.found().isEmpty());
        assertFalse(problem.remedy().isEmpty());
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\u00a0\t"})
    void nothingIsAMissingUnit(String text) {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse(text));
        assertEquals("missing-unit", problem.code());
    }

    @Test
    void otherCountedEntitiesAreRefused() {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse("cm3/({site}.s)"));
        assertEquals("unknown-unit", problem.code());
        assertEquals("the annotation {site} in \"cm3/({site}.s)\"", problem.found());
        assertEquals("state the unit per mol or per {molecule}", problem.remedy());
    }

    @Test
    void aVeryLongTextIsRefusedAtOnce() {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse("s.".repeat(10_000)));
        assertEquals("unit-syntax", problem.code());
        assertEquals("a text of 20000 characters", problem.found());
    }

    @Test
    void aProblemKnowsItsPlaceOnlyFromTheCaller() {
        UnitException problem = assertThrows(UnitException.class, () -> Units.parse("S-1"));
        Place place = Place.of("a.csv", 1, "k (S-1)");
        assertEquals(
                new Problem(
                        "unknown-unit",
                        place,
                        "\"S\" in \"S-1\"",
                        "a unit symbol",
                        "did you mean s? Upper and lower case differ"),
                problem.at(place));
    }

    @ParameterizedTest
    @CsvSource({
        "mol/(L.s), 0",
        "M/min, 0",
        "1/s, 1",
        "h-1, 1",
        "Hz, 1",
        "L/(mol.s), 2",
        "cm3/({molecule}.s), 2",
        "M-1 s-1, 2",
        "L2 mol-2 s-1, 3",
        "cm^6 molecule^-2 s^-1, 3",
        "L^0.5 mol^-0.5 s^-1, 1.5",
        "mol^0.5 L^-0.5 s^-1, 0.5",
        "L^0.3 mol^-0.3 s^-1, 1.3",
        "L^(1/3) mol^(-1/3) s^-1, 1.3333333333333333",
        "dm^0.9 mol^-0.3 s^-1, 1.3"
    })
    void theOrderFollowsFromTheUnit(String text, double order) throws UnitException {
        Unit unit = Units.rateConstant(text);
        assertEquals(OptionalDouble.of(order), Units.rateOrder(unit));
        // The rate table compares exactly.
        assertEquals(Dimension.rateConstant(order), unit.dimension());
    }

    @ParameterizedTest
    @ValueSource(strings = {"s", "cm3/s", "K", "mol2/(L2.s)", "L/mol", "J/mol", "m/s", "1/(mol.s)", "1", "L2/(mol.s)"})
    void otherDimensionsHaveNoOrder(String text) throws UnitException {
        assertEquals(OptionalDouble.empty(), Units.rateOrder(Units.parse(text)));
        UnitException problem = assertThrows(UnitException.class, () -> Units.rateConstant(text));
        assertEquals("wrong-dimension", problem.code());
    }

    @ParameterizedTest
    @ValueSource(strings = {"1/(atm.s)", "bar-1 s-1", "Torr^-1 min^-1", "kPa-2 s-1"})
    void rateConstantsPerPressureAreRefusedWithAWayOut(String text) throws UnitException {
        assertEquals(OptionalDouble.empty(), Units.rateOrder(Units.parse(text)));
        UnitException problem = assertThrows(UnitException.class, () -> Units.rateConstant(text));
        assertEquals("pressure-rate-constant", problem.code());
        assertEquals("\"" + text + "\", a rate constant per pressure", problem.found());
        assertTrue(problem.remedy().startsWith("multiply each value by (R T)^(order - 1)"), problem.remedy());
    }

    @Test
    void aDimensionCanBeDemanded() throws UnitException {
        assertEquals(
                "kJ/mol",
                Units.parse("kJ mol-1", Dimension.MOLAR_ENERGY, "kJ/mol").code());
        UnitException problem =
                assertThrows(UnitException.class, () -> Units.parse("kJ", Dimension.MOLAR_ENERGY, "kJ/mol"));
        assertEquals("wrong-dimension", problem.code());
        assertEquals("\"kJ\", a unit of energy", problem.found());
        assertEquals("a unit of molar energy", problem.expected());
        assertEquals("state it in kJ/mol", problem.remedy());
    }

    @Test
    void cAndFAreDegreesWhereOnlyATemperatureCanStand() throws UnitException {
        assertEquals("Cel", Units.temperature("C").code());
        assertEquals("[degF]", Units.temperature("F").code());
        assertEquals("K", Units.temperature("K").code());
        assertThrows(UnitException.class, () -> Units.parse("C"));
        assertEquals(
                "wrong-dimension",
                assertThrows(UnitException.class, () -> Units.temperature("1/K"))
                        .code());
    }

    @Test
    void theListHoldsEachSymbolOnceAndReadsItBack() throws UnitException {
        Set<String> symbols = new HashSet<>();
        for (ListedUnit listed : Units.list()) {
            assertTrue(symbols.add(listed.unit().code()), listed.unit().code());
            assertEquals(listed.unit(), Units.parse(listed.unit().code()));
            assertFalse(listed.name().isEmpty());
            assertFalse(listed.dimension().isEmpty());
            for (String spelling : listed.spellings()) {
                boolean prefixedMolar = spelling.length() == 2 && spelling.endsWith("M");
                if (!prefixedMolar) {
                    assertEquals(listed.unit(), Units.parse(spelling), spelling);
                }
            }
        }
        assertTrue(symbols.contains("mol/L"));
    }

    @ParameterizedTest
    @CsvSource({
        "J/mol, molar energy",
        "J/(mol.K), molar entropy or heat capacity",
        "L/(mol.s), rate constant of order 2",
        "L^0.5 mol^-0.5 s^-1, rate constant of order 1.5",
        "1/(bar.s), rate constant per pressure",
        "m2/s, m^2 s^-1",
        "1, pure number"
    })
    void dimensionsHaveNames(String text, String name) throws UnitException {
        assertEquals(name, Units.name(Units.parse(text).dimension()));
    }
}
