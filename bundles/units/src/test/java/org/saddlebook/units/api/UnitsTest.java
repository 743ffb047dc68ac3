package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

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
    void readsEverySpellingAsOneTerm(String text, String code) throws Exception {
        assertEquals(code, Units.parse(text).code());
        assertEquals(Units.parse(text), Units.parse(code));
    }
}
