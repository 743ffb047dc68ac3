package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;

/**
 * One invented table in many disguises. The numbers are chosen so that every unit states them with few decimals; the
 * expected SI values are decimal arithmetic with the definitions of the units (SI Brochure, 9th edition, 2019: 1 min =
 * 60 s, 1 h = 3600 s, t/°C = T/K - 273.15; Fahrenheit: t/°F = 9/5 T/K - 459.67, NIST SP 811, appendix B.8).
 */
class DisguisesTest {
    private static final String[] CELSIUS = {"20", "31.5", "40", "52.5", "65"};
    private static final String[] PER_SECOND = {"1.25e-4", "4.1e-4", "9.75e-4", "3.05e-3", "8.5e-3"};
    private static final String PERCENT = "4";

    private static final BigDecimal ZERO_CELSIUS = new BigDecimal("273.15");

    private interface Rewriting {
        BigDecimal apply(BigDecimal number);
    }

    private static String rewritten(
            String header, String separator, boolean comma, Rewriting temperature, Rewriting rate, boolean absolute) {
        StringBuilder text = new StringBuilder(header).append("\n");
        for (int i = 0; i < CELSIUS.length; i++) {
            BigDecimal k = rate.apply(new BigDecimal(PER_SECOND[i]));
            BigDecimal u = absolute ? k.multiply(new BigDecimal("0.04")) : new BigDecimal(PERCENT);
            String row = temperature.apply(new BigDecimal(CELSIUS[i])).toPlainString() + "|" + k + "|" + u;
            text.append((comma ? row.replace('.', ',') : row).replace("|", separator))
                    .append("\n");
        }
        return text.toString();
    }

    private static final Rewriting AS_IS = number -> number;
    private static final Rewriting KELVIN = number -> number.add(ZERO_CELSIUS);
    private static final Rewriting FAHRENHEIT =
            number -> number.multiply(new BigDecimal("1.8")).add(new BigDecimal(32));

    private static Rewriting times(int factor) {
        return number -> number.multiply(BigDecimal.valueOf(factor));
    }

    private static byte[] disguise(String name) {
        return switch (name) {
            case "comma, K, 1/s, percent, UTF-8" ->
                rewritten("T (K),k (1/s),u(k) (%)", ",", false, KELVIN, AS_IS, false)
                        .getBytes(StandardCharsets.UTF_8);
            case "semicolon, decimal comma, °C, 1/min, absolute, byte order mark, CRLF" ->
                ("\uFEFF" + rewritten("T / °C;k / min^-1;u(k) / min^-1", ";", true, AS_IS, times(60), true))
                        .replace("\n", "\r\n")
                        .getBytes(StandardCharsets.UTF_8);
            case "tab, °F, 1/h, percent, UTF-16" ->
                ("\uFEFF" + rewritten("T [°F]\tk [h⁻¹]\tu(k) [%]", "\t", false, FAHRENHEIT, times(3600), false))
                        .getBytes(StandardCharsets.UTF_16LE);
            case "tab, decimal comma, °F, 1/s, absolute, UTF-16 without mark" ->
                rewritten("temperature_degF\tk_s-1\tu(k)_s-1", "\t", true, FAHRENHEIT, AS_IS, true)
                        .getBytes(StandardCharsets.UTF_16BE);
            case "semicolon, decimal comma, °C, 1/h, percent, Latin-1, row of units" ->
                rewritten("T;k;u(k)\n°C;1/h;%", ";", true, AS_IS, times(3600), false)
                        .getBytes(Charset.forName("ISO-8859-1"));
            case "spaces, K, 1/min, fraction, CR" ->
                rewritten("T_K k_min-1 u(k)/k", "  ", false, KELVIN, times(60), false)
                        .replace("  4\n", "  0.04\n")
                        .replace('\n', '\r')
                        .getBytes(StandardCharsets.UTF_8);
            default -> throw new AssertionError(name);
        };
    }

    private static double exact(BigDecimal number) {
        return number.round(new MathContext(40)).doubleValue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "comma, K, 1/s, percent, UTF-8",
                "semicolon, decimal comma, °C, 1/min, absolute, byte order mark, CRLF",
                "tab, °F, 1/h, percent, UTF-16",
                "tab, decimal comma, °F, 1/s, absolute, UTF-16 without mark",
                "semicolon, decimal comma, °C, 1/h, percent, Latin-1, row of units",
                "spaces, K, 1/min, fraction, CR"
            })
    void everyDisguiseGivesTheSameValuesToTheLastBit(String name) throws Exception {
        RateTable table = Reading.read(disguise(name)).rateTable().orElseThrow();
        assertEquals(1, table.order());
        List<RatePoint> points = table.points();
        assertEquals(CELSIUS.length, points.size());
        for (int i = 0; i < CELSIUS.length; i++) {
            BigDecimal k = new BigDecimal(PER_SECOND[i]);
            assertEquals(
                    exact(new BigDecimal(CELSIUS[i]).add(ZERO_CELSIUS)),
                    points.get(i).kelvin());
            assertEquals(exact(k), points.get(i).rate());
            assertEquals(
                    exact(k.multiply(new BigDecimal("0.04"))),
                    points.get(i).rateUncertainty().orElseThrow());
        }
    }

    @Test
    void concentrationUnitsAreDisguisesToo() throws Exception {
        double[] rates = new double[4];
        String[] headers = {"k (L mol-1 s-1)", "k (m3/(mol.s))", "k / mM^-1 min^-1", "k (cm3 mol-1 s-1)"};
        String[] values = {"2.5", "0.0025", "0.15", "2500"};
        for (int i = 0; i < headers.length; i++) {
            RateTable table = Reading.table("T (K);" + headers[i] + "\n300;" + values[i] + "\n");
            assertEquals(2, table.order());
            rates[i] = table.points().get(0).rate();
        }
        for (double rate : rates) {
            assertEquals(0.0025, rate);
        }
    }
}
