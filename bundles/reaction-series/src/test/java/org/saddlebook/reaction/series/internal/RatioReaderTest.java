package org.saddlebook.reaction.series.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

/** Tables of ratios as people write them, and what is said about those that cannot be used. */
class RatioReaderTest {
    private static RatioTable read(String text) throws InputException {
        return RatioReader.read("ratios.csv", text.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void readsExcessRatioAndIsotopeEffect() throws InputException {
        RatioTable excess = read("T (K),ee (%),u(ee) (%)\n300,50,1\n310,-20,\n");
        assertEquals(RatioTable.Kind.ENANTIOMERIC_EXCESS, excess.kind());
        assertEquals(StrictMath.log(3), excess.points().get(0).lnRatio(), 1e-15);
        // d ln((1+e)/(1-e)) = 2 de/(1-e²): 2·0.01/0.75, by hand
        assertEquals(0.02 / 0.75, excess.points().get(0).lnUncertainty(), 1e-15);
        assertEquals(StrictMath.log(0.8 / 1.2), excess.points().get(1).lnRatio(), 1e-15);
        assertFalse(excess.stated());
        RatioTable ratio = read("T (degC);er\n25;97:3\n35;96,5:3,5\n");
        assertEquals(StrictMath.log(97.0 / 3), ratio.points().get(0).lnRatio(), 1e-15);
        assertEquals(298.15, ratio.points().get(0).kelvin());
        assertEquals(StrictMath.log(96.5 / 3.5), ratio.points().get(1).lnRatio(), 1e-14);
        assertEquals(
                RatioTable.Kind.ISOTOPE_EFFECT,
                read("T (degC)\tKIE\tu\n25\t6.2\t0.1\n").kind());
    }

    @Test
    void recognisesItsOwnTablesOnly() {
        assertTrue(RatioReader.recognises("# x\nT (K),ratio\n".getBytes(StandardCharsets.UTF_8)));
        assertFalse(RatioReader.recognises("T (K),k (1/s)\n".getBytes(StandardCharsets.UTF_8)));
        assertFalse(RatioReader.recognises("{\"schema\": \"ratio\"}".getBytes(StandardCharsets.UTF_8)));
        assertFalse(RatioReader.recognises(new byte[0]));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "T,ratio/300,2 | missing-unit | 1 | T",
                "T (kg),ratio/300,2 | not-a-temperature | 1 | T (kg)",
                "T (K),ratio,ratio/300,2,2 | duplicate-header | 1 | ratio",
                "T (K),ratio,yield/300,2,2 | unknown-column | 1 | yield",
                "T (K),ratio (mol)/300,2 | wrong-unit | 1 | ratio (mol)",
                "ratio,u/2,1 | missing-column | 1 |",
                "T (K),ratio | no-rows | 1 |",
                "T (K),ratio/300,2/310 | ragged-row | 3 |",
                "T (K),ratio/300,2/310,x | not-a-number | 3 | ratio",
                "T (K),ratio/300,2/310,NaN | not-a-number | 3 | ratio",
                "T (K),ratio/300,-2 | wrong-value | 2 | ratio",
                "T (K),ratio,u/300,2,0 | wrong-value | 2 | u",
                "T (K),ratio/-1,2 | wrong-value | 2 | T (K)",
                "T (K),ee (%)/300,100 | wrong-value | 2 | ee (%)",
                "T (K),ee/300,95 | wrong-value | 2 | ee",
            })
    void namesLineAndColumnOfWhatItCannotUse(String table, String code, int line, String column) {
        Problem problem = assertThrows(
                        InputException.class, () -> read(table.strip().replace("/", "\n")))
                .problems()
                .get(0);
        if (!code.equals("not-a-temperature")) { // the word is that of the units bundle
            assertEquals(code, problem.code(), problem.toString());
        }
        assertEquals(line, problem.place().line().orElseThrow(), problem.toString());
        assertEquals(column == null ? "" : column, problem.place().column().orElse(""), problem.toString());
        assertFalse(problem.remedy().isEmpty());
    }

    @Test
    void refusesOtherEncodingsAndEmptyFiles() {
        assertEquals(
                "wrong-encoding",
                assertThrows(InputException.class, () -> RatioReader.read("a", new byte[] {'T', (byte) 0xff}))
                        .problems()
                        .get(0)
                        .code());
        assertEquals(
                "no-table",
                assertThrows(InputException.class, () -> read(""))
                        .problems()
                        .get(0)
                        .code());
    }
}
