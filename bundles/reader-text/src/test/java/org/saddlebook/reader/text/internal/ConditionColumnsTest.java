package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

class ConditionColumnsTest {
    /** 1 molecule/cm3 in mol/m3 is 1e6/NA, exact (SI 2019). */
    private static final double MOLECULE = 1e6 / 6.02214076e23;

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "[M] (molecule cm-3) | molecule",
                "[M] / molecule cm-3 | molecule",
                "[m] [mol/L] | molar",
                "third body (molecules/cm3) | molecule",
                "Third-body concentration (mol/L) | molar",
            })
    void readsTheThirdBody(String heading, String unit) throws InputException {
        Conditions conditions = Reading.table("T (K);k (1/s);" + heading + "\n298;1;2.5e1\n")
                .points()
                .get(0)
                .conditions();
        double expected = 25 * (unit.equals("molar") ? 1000 : MOLECULE);
        assertEquals(expected, conditions.get(Conditions.THIRD_BODY).orElseThrow(), 1e-15 * expected);
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "p (bar) | 200000",
                "P / mbar | 200",
                "pressure (kPa) | 2000",
                "total pressure [Torr] | 266.6447368421053",
                "p_bar | 200000"
            })
    void readsThePressure(String heading, double pascal) throws InputException {
        Conditions conditions = Reading.table("T (K);k (1/s);" + heading + "\n298;1;2\n")
                .points()
                .get(0)
                .conditions();
        assertEquals(pascal, conditions.get(Conditions.PRESSURE).orElseThrow(), 1e-15 * pascal);
        assertEquals(pascal / 8.31446261815324 / 298, conditions.thirdBody(298).orElseThrow(), 1e-12 * pascal);
    }

    @Test
    void readsAUnitOfThePressureBelowTheHeader() throws InputException {
        assertEquals(
                300_000,
                Reading.table("T;k;p\nK;1/s;bar\n298;1;3\n")
                        .points()
                        .get(0)
                        .conditions()
                        .get(Conditions.PRESSURE)
                        .orElseThrow());
    }

    @ParameterizedTest
    @ValueSource(strings = {"p", "pH", "p (%)", "purity (%)", "probe", "p value", "position (mm)"})
    void leavesOtherColumnsWithThatBeginningUnused(String heading) throws InputException {
        assertTrue(Reading.table("T (K);k (1/s);" + heading + "\n298;1;3\n")
                .points()
                .get(0)
                .conditions()
                .isEmpty());
    }

    @Test
    void anExcludedRowMayLeaveAConditionOpen() throws InputException {
        assertTrue(Reading.table("T (K);k (1/s);p (bar);excluded\n298;1;;gauge broken\n300;1;2;\n")
                .points()
                .get(0)
                .conditions()
                .isEmpty());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "[M] | 1 | missing-unit",
                "[M] (bar) | 1 | wrong-dimension",
                "[M] (1/cm3) | 1 | wrong-dimension",
                "[M] (mol/L) | 0 | not-positive",
                "[M] (mol/L) | -1 | not-positive",
                "p (bar) | 0 | not-positive",
                "p (bar) | high | not-a-number"
            })
    void refusesAWrongConditionWithItsPlace(String heading, String cell, String code) {
        List<Problem> problems = Reading.problems("T (K);k (1/s);" + heading + "\n298;1;" + cell + "\n");
        assertEquals(1, problems.size(), problems.toString());
        assertEquals(code, problems.get(0).code(), problems.toString());
    }

    @Test
    void anEmptyCellOfAUsedRowIsAProblem() {
        List<Problem> problems = Reading.problems("T (K);k (1/s);p (bar)\n298;1;2\n300;1;\n");
        assertEquals(1, problems.size(), problems.toString());
        assertEquals(3, problems.get(0).place().line().orElseThrow());
    }
}
