package org.saddlebook.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

/**
 * Mean kinetic temperature and equivalent age against the formula of J. D. Haynes, J. Pharm. Sci. 60 (1971) 927, worked by
 * hand. The activation energy 83.144 kJ/mol is the usual default of the trade (E/R = 10000 K).
 */
class HistoryTest {
    private static final double HOUR = 3600;

    private static History steps(double[] hours, double[] celsius) {
        double[] seconds = new double[hours.length];
        double[] kelvin = new double[hours.length];
        for (int i = 0; i < hours.length; i++) {
            seconds[i] = hours[i] * HOUR;
            kelvin[i] = celsius[i] + 273.15;
        }
        return new History("invented", seconds, kelvin, true, 298.15, OptionalDouble.of(83_144.6261815324));
    }

    @Test
    void meanKineticTemperatureFollowsHaynes() {
        // 20 h at 20 °C, 4 h at 40 °C, E/R = 10000 K:
        // exp(−10000/293.15) = 1.5320e-15, exp(−10000/313.15) = 1.3533e-14,
        // mean (20·1.5320e-15 + 4·1.3533e-14)/24 = 3.5322e-15, T = 10000/33.2769 = 300.509 K.
        History history = steps(new double[] {0, 20, 24}, new double[] {20, 40, 40});
        double found = new HistoryFindings(history).meanKinetic(10_000 * Bench.R);
        double mean = (20 * StrictMath.exp(-10_000 / 293.15) + 4 * StrictMath.exp(-10_000 / 313.15)) / 24;
        assertEquals(10_000 / -StrictMath.log(mean), found, 1e-9);
        assertEquals(300.51, found, 0.01);
    }

    @Test
    void aConstantCourseHasItsOwnTemperature() {
        History history = steps(new double[] {0, 1, 5}, new double[] {30, 30, 30});
        assertEquals(303.15, new HistoryFindings(history).meanKinetic(50_000), 1e-9);
    }

    @Test
    void aRampIsIntegratedAsFinelyAsSmallSteps() {
        int n = 200_000;
        double sum = 0;
        for (int i = 0; i < n; i++) {
            sum += StrictMath.exp(-10_000 / (278.15 + 60 * (i + 0.5) / n)) / n;
        }
        History ramp = new History(
                "invented",
                new double[] {0, HOUR},
                new double[] {278.15, 338.15},
                false,
                298.15,
                OptionalDouble.empty());
        assertEquals(10_000 / -StrictMath.log(sum), new HistoryFindings(ramp).meanKinetic(10_000 * Bench.R), 1e-6);
    }

    @Test
    void equivalentAgeAndConversionFollowTheFittedLaw() {
        double[] kelvin = {303.15, 313.15, 323.15, 333.15, 343.15};
        double lnA = 25;
        double ea = 83_144.6261815324;
        Campaign campaign = Bench.campaign("1/s", lnA, ea, kelvin, new double[] {1e-4, -2e-4, 2e-4, -2e-4, 1e-4}, 0.02)
                .withSetting(
                        "window",
                        Bench.group(
                                "history",
                                Bench.group(
                                        "title", "a warm afternoon",
                                        "timeUnit", "h",
                                        "temperatureUnit", "degC",
                                        "interpolation", "steps",
                                        "reference", "20 degC",
                                        "points", new Node.Matrix(new double[][] {{0, 20}, {20, 40}, {24, 40}}))));
        Section section = Bench.arrhenius().window(campaign);
        assertEquals(Section.Outcome.DONE, section.outcome());
        Node history = Bench.at(section.body(), "history");
        double cold = StrictMath.exp(lnA - ea / (Bench.R * 293.15));
        double hot = StrictMath.exp(lnA - ea / (Bench.R * 313.15));
        double sum = HOUR * (20 * cold + 4 * hot);
        Node.Quantity age = (Node.Quantity) Bench.at(history, "equivalentAge");
        double unit = age.unit().equals("d") ? 86_400 : HOUR;
        assertEquals(sum / cold, age.value().orElseThrow() * unit, 2e-3 * sum / cold);
        assertEquals(1 - StrictMath.exp(-sum), Bench.number(history, "conversion"), 2e-3);
        assertEquals(300.51, Bench.number(history, "meanKineticTemperature"), 0.02);
        assertEquals(293.15 + 20 * 4 / 24.0, Bench.number(history, "meanTemperature"), 1e-9);
        // 83.144 kJ/mol: loss is understated 1.6-fold by the mean temperature (mean 23.3 °C against 27.4 °C).
        assertTrue(age.cautions().contains("storage-lower-bound"));
    }
}
