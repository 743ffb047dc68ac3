package org.saddlebook.reaction.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

class EquationTest {
    @ParameterizedTest
    @ValueSource(
            strings = {
                "N2(g) + 3 H2(g) = 2 NH3(g)",
                "N2+3H2=2NH3",
                "N₂ + 3H₂ ⇌ 2NH₃",
                "H2 + 1/2 O2 -> H2O",
                "H2 + 0.5 O2 → H2O(l)",
                "H2 + ½O2 = H2O (g)",
                "H2+½O2=H2O",
                "2 C2H6 + 7 O2 = 4 CO2 + 6 H2O",
                "CH4 + 1 1/2 O2 = CO + 2 H2O",
                "CuSO4·5H2O(s) = CuSO4(s) + 5 H2O(g)",
                "CaSO4·2H2O(s) = CaSO4·0.5H2O(s) + 1.5 H2O(l)",
                "CaSO4·½H2O = CaSO4 + ½ H2O",
                "Fe3+ + e- <=> Fe2+",
                "Fe^3+ + e^- = Fe^2+",
                "Fe³⁺ + e⁻ = Fe²⁺",
                "H+ + OH- = H2O",
                "H++OH-=H2O",
                "Na+(aq) + Cl-(aq) = NaCl(s)",
                "Ca++ + CO3-- = CaCO3(s)",
                "Ag+(aq)+Cl-(aq)->AgCl(s)",
                "MnO4- + 8 H+ + 5 e- = Mn^2+ + 4 H2O",
                "Cr2O7^2- + 14 H3O+ + 6 Fe2+ = 2 Cr3+ + 6 Fe3+ + 21 H2O",
                "[Fe(CN)6]3- + e- = [Fe(CN)6]4-",
                "[Co(NH3)6]^{3+} + 6 H3O^(+) = Co3+ + 6 NH4+ + 6 H2O",
                "SO4-2 + Ba+2 = BaSO4",
                "2 K4[Fe(CN)6] + Cl2 = 2 K3[Fe(CN)6] + 2 KCl",
                "C(s,graphite) + O2(g) = CO2(g)",
                "20 Fe0.95O + C = 19 Fe + CO + 19/2 O2",
                "D2 + H2 = HD + HD",
                "Hg(l) = Hg(g)"
            })
    void readsWhatBalances(String text) throws Exception {
        Equation equation = Equation.parseBalanced(text);
        assertEquals(equation, Equation.parse(equation.text()), "reads back: " + equation.text());
    }

    @Test
    void keepsCoefficientsExact() throws Exception {
        Equation equation = Equation.parse("1/3 N2 + 0.1 H2 + 1 1/2 O2 = 2½ NO");
        assertEquals(Fraction.of(1, 3), equation.reactants().get(0).coefficient());
        assertEquals(Fraction.of(1, 10), equation.reactants().get(1).coefficient());
        assertEquals(Fraction.of(3, 2), equation.reactants().get(2).coefficient());
        assertEquals(Fraction.of(5, 2), equation.products().get(0).coefficient());
    }

    @ParameterizedTest
    @CsvSource({
        "SO4^2-, -2, O=4 S=1",
        "SO₄²⁻, -2, O=4 S=1",
        "SO4--, -2, O=4 S=1",
        "SO4-2, -2, O=4 S=1",
        "NO3-, -1, N=1 O=3",
        "H3O+, 1, H=3 O=1",
        "Fe3+, 3, Fe=1",
        "Fe^+3, 3, Fe=1",
        "O2^2-, -2, O=2",
        "I3^-, -1, I=3",
        "VO2^+, 1, O=2 V=1",
        "VO^2+, 2, O=1 V=1",
        "Hg2^2+, 2, Hg=2",
        "[PtCl6]2-, -2, Cl=6 Pt=1",
        "e-, -1, ''",
        "Ca(OH)2, 0, Ca=1 H=2 O=2",
        "(NH4)2SO4, 0, H=8 N=2 O=4 S=1",
        "Ca3(PO4)2, 0, Ca=3 O=8 P=2",
        "CuSO4·5H2O, 0, Cu=1 H=10 O=9 S=1",
        "CuSO4*5H2O, 0, Cu=1 H=10 O=9 S=1",
        "KAl(SO4)2·12H2O, 0, Al=1 H=24 K=1 O=20 S=2",
        "K4[Fe(CN)6].3H2O, 0, C=6 Fe=1 H=6 K=4 N=6 O=3",
        "CO, 0, C=1 O=1",
        "Co, 0, Co=1",
        "CH3CH2OH, 0, C=2 H=6 O=1"
    })
    void knowsCompositionAndCharge(String text, int charge, String elements) throws Exception {
        Formula formula = Formula.parse(text);
        assertEquals(charge, formula.charge(), text);
        StringBuilder found = new StringBuilder();
        formula.elements()
                .forEach((symbol, count) -> found.append(found.length() == 0 ? "" : " ")
                        .append(symbol)
                        .append('=')
                        .append(count.text()));
        assertEquals(elements, found.toString(), text);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "N2 + 3 H2 = 3 NH3 | H: 6 on the left, 9 on the right; N: 2 on the left, 3 on the right"
                        + " | N2 + 3 H2 = 2 NH3",
                "Fe3+ + Sn2+ = Fe2+ + Sn^4+ | charge: 5 on the left, 6 on the right | 2 Fe^3+ + Sn^2+ = 2 Fe^2+ + Sn^4+",
                "C3H8 + O2 = CO2 + H2O | C: 3 on the left, 1 on the right; H: 8 on the left, 2 on the right; O: 2 on the"
                        + " left, 3 on the right | C3H8 + 5 O2 = 3 CO2 + 4 H2O",
                "H2 + 1/2 O2 = 1/2 H2O | H: 2 on the left, 1 on the right; O: 1 on the left, 1/2 on the right | 2 H2 + O2"
                        + " = 2 H2O"
            })
    void namesEveryImbalanceAndTheCoefficientsThatBalance(String text, String imbalance, String better)
            throws Exception {
        ReactionException wrong = assertThrows(ReactionException.class, () -> Equation.parseBalanced(text));
        assertEquals("unbalanced", wrong.code());
        assertEquals(imbalance.strip(), wrong.found());
        assertTrue(wrong.remedy().contains(better.strip() + ","), wrong.remedy());
    }

    @Test
    void namesNoCoefficientsWhereThereIsNoneOrMoreThanOneChoice() throws Exception {
        assertEquals(Optional.empty(), Equation.parse("H2 = O2").balanced());
        assertEquals(Optional.empty(), Equation.parse("H2 + O2 = H2O + H2O2").balanced(), "two independent reactions");
        assertEquals(Optional.empty(), Equation.parse("H2O + O2 = H2").balanced(), "one would be negative");
    }

    @Test
    void cancelsWhatStandsOnBothSides() throws Exception {
        Equation equation = Equation.parse("H2O(l) + NH3(aq) = NH4+(aq) + OH-(aq)");
        assertEquals(4, equation.net().size());
        Equation spectator = Equation.parse("Na+ + 2 H+ + OH- = Na+ + H+ + H2O");
        assertEquals(
                List.of("H^+", "OH^-", "H2O"),
                spectator.net().keySet().stream().map(Species::text).toList());
        assertEquals(Fraction.of(-1), spectator.net().get(Species.parse("H+")));
        assertTrue(Equation.parse("Hg = Hg").net().isEmpty());
        assertFalse(Equation.parse("Hg(l) = Hg(g)").net().isEmpty(), "another phase is another species");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "N2 + 3 H2 | missing-arrow | 1",
                "B = C = N | several-arrows | 7",
                "H2 + Xx = H2 | unknown-element | 6",
                "H2 + J2 = H2 | unknown-element | 6",
                "Ho2A = H2 | unknown-element | 4",
                "h2 + O2 = H2O | formula-syntax | 1",
                "SO42- = S | ambiguous-charge | 1",
                "O2- = O2 | ambiguous-charge | 1",
                "I3- = I2 | ambiguous-charge | 1",
                "VO2+ = V | ambiguous-charge | 1",
                "H2+ O2 = H2O | ambiguous-charge | 1",
                "CuSO4.5H2O = CuSO4 + 5 H2O | ambiguous-count | 5",
                "H2 + 0,5 O2 = H2O | coefficient | 6",
                "H2 + 0 O2 = H2O | coefficient | 6",
                "H2 + 1/0 O2 = H2O | coefficient | 6",
                "H2 - O2 = H2O | formula-syntax | 4",
                "-H2 = O2 | coefficient | 1",
                "H2 + + O2 = H2O | missing-species | 6",
                "H2 + = H2O | missing-species | 6",
                "H2 + O2 = | missing-species | 10",
                "H2(x) = H2 | unknown-phase | 3",
                "H2(g = H2 | unknown-phase | 3",
                "Ca(OH2 = Ca | formula-syntax | 3",
                "Ca(OH]2 = Ca | formula-syntax | 3",
                "Ca() = Ca | formula-syntax | 4",
                "H0 = H | formula-syntax | 2",
                "H2O = H2O^0- | formula-syntax | 10",
                "e = e | formula-syntax | 1",
                "OH-->O + H | ambiguous-arrow | 3",
                "1234567890 H2 = H2 | coefficient | 1",
                "H1234567890 = H2 | formula-syntax | 2",
                "H2 O2 = H2 | formula-syntax | 4"
            })
    void saysWhatIsWrongAndWhere(String text, String code, int character) {
        ReactionException wrong = assertThrows(ReactionException.class, () -> Equation.parse(text), text);
        assertEquals(code, wrong.code(), wrong.getMessage());
        assertEquals(character, wrong.character(), wrong.getMessage());
        Problem problem = wrong.at(Place.of("campaign.json"));
        assertTrue(problem.found().endsWith("(character " + character + ")"));
        assertTrue(problem.remedy().endsWith("."), problem.remedy());
    }

    @Test
    void namesBothReadingsOfAnAmbiguousCharge() {
        ReactionException wrong = assertThrows(ReactionException.class, () -> Formula.parse("SO42-"));
        assertTrue(wrong.remedy().startsWith("Write SO42^- for one charge, or SO4^2- for 2 charges"), wrong.remedy());
    }

    @Test
    void refusesWhatIsTooLong() {
        String text = "H2 + ".repeat(500) + "O2 = H2O";
        assertEquals(
                "equation-too-long",
                assertThrows(ReactionException.class, () -> Equation.parse(text))
                        .code());
        String deep = "(".repeat(900) + "H" + ")".repeat(900);
        assertThrows(ReactionException.class, () -> Formula.parse(deep));
    }
}
