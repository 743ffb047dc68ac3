package org.saddlebook.presentation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/**
 * Printed roundings of JCGM 100:2008 (Evaluation of measurement data — Guide to the expression of uncertainty in
 * measurement). The unrounded H.3 numbers were recomputed from the printed readings of table H.6; those of 7.2.6 and H.1
 * are printed in the text (quoted from memory, checked against each other by their arithmetic).
 */
@Tag("validation")
class RoundingValidationTest {
    @Test
    void roundsTheThermometerCalibrationOfAnnexH3() {
        assertEquals("−0.1712 ± 0.0029", Rounding.plusMinus(-0.17120379, 0.0028776));
        assertEquals("0.00218 ± 0.00067", Rounding.plusMinus(0.0021827, 0.00066794));
        assertEquals("−0.1494 ± 0.0041", Rounding.plusMinus(-0.14937681, 0.0041385958));
        // The guide prints −0.930: three decimals. Two digits of 1 − |r| = 0.0696 give three as well.
        assertEquals("−0.930", Rounding.correlation(-0.9304296));
    }

    @Test
    void roundsTheEndGaugeOfAnnexH1() {
        // H.1.6: l = 50.000 838 mm with u_c = 32 nm; here in millimetres.
        assertEquals("50.000838 ± 0.000032", Rounding.plusMinus(50.000838, 31.7e-6));
    }

    @Test
    void roundsTheExamplesOfClause726() {
        // "if y = 10.057 62 ohm with u_c(y) = 27 mohm, y should be rounded to 10.058 ohm"
        assertEquals("10.058 ± 0.027", Rounding.plusMinus(10.05762, 0.027));
        // "28.05 kHz should be rounded down to 28 kHz"
        assertEquals("100 ± 28", Rounding.plusMinus(100.2, 28.05));
    }
}
