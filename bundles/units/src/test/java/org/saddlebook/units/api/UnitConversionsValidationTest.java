package org.saddlebook.units.api;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.quantity.Unit;

/** Against published definitions; the source stands beside each check. */
@Tag("validation")
class UnitConversionsValidationTest {
    /** Rows of unit-conversions.csv: from, to, factor. */
    static List<String[]> conversions() throws IOException {
        List<String[]> rows = new ArrayList<>();
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(
                UnitConversionsValidationTest.class.getResourceAsStream("/reference/unit-conversions.csv"),
                StandardCharsets.UTF_8))) {
            String line = reader.readLine();
            while (line.startsWith("#") || line.startsWith("from_unit")) {
                line = reader.readLine();
            }
            for (; line != null; line = reader.readLine()) {
                rows.add(line.split(",", 4));
            }
        }
        return rows;
    }

    @Test
    void theTableOfConversionsIsReadWhole() throws IOException {
        assertEquals(22, conversions().size());
    }

    @ParameterizedTest
    @MethodSource("conversions")
    void publishedFactorsBetweenUnitsAreReproduced(String from, String to, String factor, String note)
            throws UnitException {
        Unit one = unit(from);
        Unit other = unit(to);
        double expected = Double.parseDouble(factor);
        boolean sameDimension = one.dimension().equals(other.dimension());
        double computed = sameDimension
                ? one.factor() / other.factor()
                : molarEnergy(from).factor() / molarEnergy(to).factor();
        double tolerance = from.startsWith("hartree") ? 2e-12 : 5e-15;
        assertEquals(1, computed / expected, tolerance, note);
    }

    private static Unit unit(String text) throws UnitException {
        int remark = text.indexOf(" (entropy unit)");
        return Units.parse(remark < 0 ? text : text.substring(0, remark));
    }

    /** Energy equivalents are compared as molar energies: E, h c times wavenumber, h times frequency, k_B times T. */
    private static Unit molarEnergy(String text) throws UnitException {
        return Units.parse(text.contains("mol^-1") || text.endsWith("particle") ? text : text + " per particle");
    }

    /** SI Brochure, 9th edition, tables 4 and 8; NIST SP 811 (2008), appendix B.8 for psi-free pressures and °F. */
    @ParameterizedTest
    @CsvSource({
        "min, 60",
        "h, 3600",
        "d, 86400",
        "L, 0.001",
        "dm3, 0.001",
        "cm3, 1e-6",
        "mL, 1e-6",
        "bar, 100000",
        "atm, 101325",
        "eV, 1.602176634e-19",
        "cal, 4.184",
        "kcal_th/mol, 4184",
        "kcal_IT/mol, 4186.8",
        "kg, 1",
        "mM, 1",
        "mol/m3, 1",
        "1/(mmol.L), 1e6"
    })
    void factorsAreThoseOfTheirDefinition(String text, double factor) throws UnitException {
        assertEquals(factor, Units.parse(text).factor());
    }

    /** ITS-90 steam and ice points by definition of the scales: 32 °F = 0 °C = 273.15 K, 212 °F = 100 °C. */
    @ParameterizedTest
    @CsvSource({
        "0degC, 273.15",
        "32degF, 273.15",
        "212degF, 373.15",
        "100 °C, 373.15",
        "-40 °F, 233.15",
        "-40 °C, 233.15",
        "77degF, 298.15",
        "25 °C, 298.15",
        "298.15K, 298.15",
        "25degC, 298.15",
        "-5 degC, 268.15",
        "−5 °C, 268.15",
        "25 deg C, 298.15",
        "25C, 298.15",
        "2.9815e2 K, 298.15"
    })
    void temperatureScalesMeetAtTheirFixedPoints(String text, double kelvin) throws UnitException {
        assertEquals(kelvin, Units.kelvin(text));
    }
}
