package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StudentPlusNormalTest {
    @ParameterizedTest
    @CsvSource({"1, 0.975", "2, 0.9", "3, 0.975", "5, 0.995", "40, 0.6"})
    void becomesEachPartWhereTheOtherVanishes(double dof, double probability) {
        double t = StudentT.quantile(probability, dof);
        assertEquals(t, StudentPlusNormal.quantile(probability, 1, dof, 0), 1e-12 * t);
        assertEquals(t, StudentPlusNormal.quantile(probability, 1, dof, 1e-9), 1e-9 * t);
        double z = Normal.quantile(probability);
        assertEquals(z, StudentPlusNormal.quantile(probability, 0, dof, 1), 1e-12 * z);
        assertEquals(-2 * t, StudentPlusNormal.quantile(1 - probability, 2, dof, 0), 1e-11 * t);
    }

    /**
     * Values by adaptive quadrature and root finding, SciPy 1.17.1, Python 3.11:
     * {@code brentq(lambda q: quad(lambda y: norm.sf(q/sqrt(a*a*v/exp(y)+b*b))*exp(y)*chi2.pdf(exp(y), v), -80, 12,
     * points=[log(v)], epsabs=1e-15, limit=500)[0] - (1-p), 0, 1e6, xtol=1e-13)}.
     */
    @ParameterizedTest
    @CsvSource({
        "0.975, 1, 3, 1, 3.680637806536965",
        "0.975, 1, 2, 0.5, 4.382210747591958",
        "0.95, 0.3, 4, 2, 3.3612376067579093",
        "0.995, 2, 1, 1, 127.32133549962688",
    })
    void agreesWithAdaptiveQuadrature(double probability, double a, double dof, double b, double expected) {
        assertEquals(expected, StudentPlusNormal.quantile(probability, a, dof, b), 2e-11 * expected);
    }

    @Test
    void refusesNegativeScales() {
        assertThrows(IllegalArgumentException.class, () -> StudentPlusNormal.quantile(0.975, -1, 3, 1));
        assertThrows(IllegalArgumentException.class, () -> StudentPlusNormal.quantile(0.975, 1, 3, Double.NaN));
    }
}
