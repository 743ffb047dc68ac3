package org.saddlebook.thermo.data.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.reaction.api.Species;

/**
 * A laboratory's own files. NASA 7 records as public thermochemistry files carry them (A. Burcat and E. Goos; GRI-Mech 3.0), with
 * their usual irregularities: fill zeros among the elements, no middle temperature, Fortran numbers, a fifteenth coefficient.
 */
class SpeciesFilesTest {
    private static final String NASA_7 = """
            THERMO
               200.000  1000.000  5000.000
            O2                TPIS89O   2   00   00   00G   200.000  3500.000  1000.000    1
             3.28253784E+00 1.48308754E-03-7.57966669E-07 2.09470555E-10-2.16717794E-14    2
            -1.08845772E+03 5.45323129E+00 3.78245636E+00-2.99673416E-03 9.84730201E-06    3
            -9.68129509E-09 3.24372837E-12-1.06394356E+03 3.65767573E+00                   4
            OH                S 9/01O   1H   1    0    0G   200.000  6000.000   1000.00    1
             2.86472886E+00 1.05650448E-03-2.59082758E-07 3.05218674E-11-1.33195876E-15    2
             3.71885774E+03 5.70164073E+00 4.12530561E+00-3.22544939E-03 6.52764691E-06    3
            -5.79853643E-09 2.06237379E-12 3.38153812E+03-6.90432960E-01                   4
            CH3CHO            L 8/88C   2H   4O   1    0G   200.000  6000.0    1000.0      1
             0.54041108E+01 0.11723059E-01-0.42263137E-05 0.68372451E-09-0.40984863E-13    2
            -0.22593122E+05-0.34807917E+01 0.47294595E+01-0.31932858E-02 0.47534921E-04    3
            -0.57458611E-07 0.21931112E-10-0.21572878E+05 0.41030159E+01                   4
            C3H3              T 5/97C   3H   3    0    0G   200.000  6000.000              1
             7.14221880E+00 7.61902005E-03-2.67459950E-06 4.24914801E-10-2.51475415E-14    2
             3.89087427E+04-1.25848436E+01 1.35110927E+00 3.27411223E-02-4.73827135E-05    3
             3.76309808E-08-1.18540923E-11 4.01057783E+04 1.52058924E+01 4.16139977E+04    4
            END
            """;

    @Test
    void readsRecordsWithTheirUsualIrregularities() throws Exception {
        List<SpeciesData> all = SpeciesFiles.read(NASA_7, "lab.dat", "public files");
        assertEquals(4, all.size());
        assertEquals("O2(g)", all.get(0).species().text());
        assertEquals(0, all.get(0).nearest(298.15).enthalpy(298.15), 10);
        // S°(O2) 205.15 J/(mol K), NIST-JANAF.
        assertEquals(205.15, all.get(0).nearest(298.15).entropy(298.15), 0.05);
        // ΔfH°(OH) 37.3 kJ/mol, S° 183.7 (B. Ruscic et al., J. Phys. Chem. A 106 (2002) 2727; from memory).
        assertEquals(37_300, all.get(1).nearest(298.15).enthalpy(298.15), 300);
        assertEquals(183.7, all.get(1).nearest(298.15).entropy(298.15), 0.1);
        // ΔfH°(acetaldehyde) −166.2 kJ/mol (NIST Chemistry WebBook; from memory).
        assertEquals(-166_200, all.get(2).nearest(298.15).enthalpy(298.15), 500);
        // The fifteenth coefficient of the record is ΔfH°(298.15 K)/R.
        assertEquals(4.16139977e4 * 8.31446, all.get(3).nearest(298.15).enthalpy(298.15), 20);
        assertEquals(1000, all.get(3).segments().get(0).upperKelvin());
    }

    @Test
    void readsShomateCoefficientsWithEitherSeparator() throws Exception {
        String text = """
                # from the laboratory
                species;lower_K;upper_K;A;B;C;D;E;F;G
                NO2(g);298;1200;16.10857;75.89525;-54.3874;14.30777;0.239423;26.17464;240.5386
                """;
        for (String content : List.of(text, text.replace(';', ','))) {
            SpeciesData one = SpeciesFiles.read(content, "lab.csv", "lab").get(0);
            assertEquals("NO2(g)", one.species().text());
            // NIST-JANAF: 33.095 kJ/mol, 240.034 J/(mol K).
            assertEquals(33_095, one.nearest(298.15).enthalpy(298.15), 20);
            assertEquals(240.034, one.nearest(298.15).entropy(298.15), 0.02);
        }
    }

    @Test
    void readsATableAndTakesTheSpeciesFromACommentOrTheName() throws Exception {
        String rows = """
                temperature_K,Cp_J_mol-1_K-1,S_J_mol-1_K-1,H_minus_H298_kJ_mol-1,dfH_kJ_mol-1
                298.15,29.142,197.653,0.000,-110.527
                300,29.142,197.833,0.054,-110.516
                """;
        SpeciesData named = SpeciesFiles.read(rows, "CO_g.csv", "lab").get(0);
        assertEquals("CO(g)", named.species().text());
        assertEquals(-110_473, named.nearest(300).enthalpy(300), 1e-6);
        SpeciesData commented = SpeciesFiles.read("# species: CO(g)\n" + rows, "any name.csv", "lab")
                .get(0);
        assertEquals(named.species(), commented.species());
    }

    @Test
    void theSourceNamesFileAndContent() throws Exception {
        SpeciesSource source = SpeciesFiles.source("lab", "The laboratory", Map.of("lab.dat", NASA_7));
        SpeciesData found = source.find(Species.parse("OH")).get(0);
        assertTrue(found.reference().startsWith("lab.dat, SHA-256 "), found.reference());
        assertTrue(source.find(Species.parse("Xe")).isEmpty());
        SpeciesSource other =
                SpeciesFiles.source("lab", "The laboratory", Map.of("lab.dat", NASA_7.replace("9/01", "9/02")));
        assertTrue(!other.find(Species.parse("OH")).get(0).reference().equals(found.reference()));
    }

    @Test
    void aBrokenFileSaysWhereAndWhat() {
        String broken = NASA_7.replace("3.38153812E+03", "3.38x53812E+03");
        SpeciesSource source = SpeciesFiles.source("lab", "The laboratory", Map.of("lab.dat", broken));
        BrokenSourceException wrong = assertThrows(BrokenSourceException.class, () -> source.find(Species.parse("OH")));
        assertTrue(wrong.getMessage().startsWith("lab.dat, line 10, column columns 31-45: found"), wrong.getMessage());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "empty-file|1|# nothing",
                "missing-column|1|species;lower_K;A",
                "missing-phase|2|species;lower_K;upper_K;A;B;C;D;E;F;G#NO2;298;1200;1;1;1;1;1;1;1",
                "unknown-species|2|species;lower_K;upper_K;A;B;C;D;E;F;G#Nq2(g);298;1200;1;1;1;1;1;1;1",
                "temperature-range|2|species;lower_K;upper_K;A;B;C;D;E;F;G#NO2(g);1298;1200;1;1;1;1;1;1;1",
                "temperature-range|2|species;lower_K;upper_K;A;B;C;D;E;F;G#NO2(g);-5;1200;1;1;1;1;1;1;1",
                "not-a-number|2|species;lower_K;upper_K;A;B;C;D;E;F;G#NO2(g);298;1200;1,5;1;1;1;1;1;1",
                "ragged-row|2|species;lower_K;upper_K;A;B;C;D;E;F;G#NO2(g);298;1200;1;1",
                "temperature-range|3|species;lower_K;upper_K;A;B;C;D;E;F;G#NO(g);298;1200;1;1;1;1;1;1;1#NO(g);298;900;1;1;1;1;1;1;1",
                "missing-row|1|temperature_K;Cp_J_mol-1_K-1;S_J_mol-1_K-1;H_minus_H298_kJ_mol-1;dfH_kJ_mol-1#300;1;1;1;1",
                "temperature-order|3|temperature_K;Cp_J_mol-1_K-1;S_J_mol-1_K-1;H_minus_H298_kJ_mol-1;dfH_kJ_mol-1#300;1;1;1;1#200;1;1;1;1",
            })
    void namesWhatIsWrong(String code, int line, String text) {
        String content = text.startsWith("#") ? text : text.replace('#', '\n');
        Problem problem = assertThrows(InputException.class, () -> SpeciesFiles.read(content, "lab.csv", "lab"))
                .problems()
                .get(0);
        assertEquals(code, problem.code());
        assertEquals(line, problem.place().line().orElseThrow());
        assertTrue(!problem.remedy().isEmpty());
    }
}
