package org.saddlebook.presentation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;

class CsvTextTest {
    private static String written(CsvText text) {
        return new String(text.bytes(), StandardCharsets.UTF_8).substring(1);
    }

    @Test
    void cellsThatNeedItStandInQuotes() {
        // RFC 4180, section 2, items 5 to 7.
        CsvText text = new CsvText().row(List.of("plain", "a,b", "say \"so\"", "two\nlines", ""));
        assertEquals("plain,\"a,b\",\"say \"\"so\"\"\",\"two\nlines\",\r\n", written(text));
    }

    @Test
    void textsThatWouldRunAreNotFormulasAnyMore() {
        for (String evil : List.of("=1+1", "+1", "-1", "@SUM(A1)", "\t=1", "\r=1")) {
            assertTrue(CsvText.isFormula(evil), evil);
            assertTrue(written(new CsvText().text(evil)).replace("\"", "").startsWith("'"), evil);
        }
        assertFalse(CsvText.isFormula("a=b"));
        assertFalse(CsvText.isFormula(""));
    }

    @Test
    void numbersStayNumbers() {
        assertEquals(
                "-1.5,2\r\n", written(new CsvText().number("-1.5").number("2").endRow()));
    }

    @Test
    void aByteOrderMarkTellsSpreadsheetsTheEncoding() {
        byte[] bytes = new CsvText().text("ΔH‡").bytes();
        assertEquals((byte) 0xEF, bytes[0]);
        assertEquals((byte) 0xBB, bytes[1]);
        assertEquals((byte) 0xBF, bytes[2]);
    }
}
