package org.saddlebook.tunnelling.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.Transmission;
import org.saddlebook.api.model.Tunnelling;

@Tag("validation")
class TunnellingValidationTest {
    /** Digits the tables print: twelve for Wigner and Bell, eight for Eckart. */
    private static final double TWELVE_DIGITS = 5e-12;

    private static final double EIGHT_DIGITS = 5e-8;

    @ParameterizedTest
    @MethodSource("parabolas")
    void wignerAndBellGiveThePublishedFactors(List<String> row) throws Inapplicable {
        Tunnelling stated = Tunnelling.by("any").with(Tunnelling.WAVENUMBER, Double.parseDouble(row.get(0)) * 100);
        double kelvin = Double.parseDouble(row.get(1));
        Transmission wigner = new Wigner().of(stated);
        assertEquals(1, StrictMath.exp(wigner.lnCoefficient(kelvin)) / Double.parseDouble(row.get(3)), TWELVE_DIGITS);
        Transmission bell = new Bell().of(stated);
        if (row.get(4).startsWith("diverges")) {
            assertFalse(bell.defined(kelvin));
            assertTrue(Double.isNaN(bell.lnCoefficient(kelvin)));
            assertTrue(bell.limit().contains("u reaches 2 pi"), bell.limit());
        } else {
            assertTrue(bell.defined(kelvin));
            assertEquals(1, StrictMath.exp(bell.lnCoefficient(kelvin)) / Double.parseDouble(row.get(4)), TWELVE_DIGITS);
        }
    }

    @ParameterizedTest
    @MethodSource("barriers")
    void eckartGivesThePublishedFactors(List<String> row) {
        double alpha1 = Double.parseDouble(row.get(0));
        double alpha2 = Double.parseDouble(row.get(1));
        double u = Double.parseDouble(row.get(2));
        double kelvin = 300;
        double theta = u * kelvin;
        EckartIntegral integral =
                new EckartIntegral(theta, alpha1 * theta / (2 * Math.PI), alpha2 * theta / (2 * Math.PI));
        double factor = StrictMath.exp(integral.at(kelvin).lnCoefficient());
        // The table's own two computations agree to the relative difference in its last column.
        double tolerance = EIGHT_DIGITS + 2 * Double.parseDouble(row.get(5));
        assertEquals(1, factor / Double.parseDouble(row.get(3)), tolerance);
    }

    private static List<List<String>> parabolas() throws IOException {
        return rows("wigner_tunnelling.csv");
    }

    private static List<List<String>> barriers() throws IOException {
        return rows("eckart_tunnelling.csv");
    }

    /** Rows without quoted commas; the header has some and is left out. */
    private static List<List<String>> rows(String name) throws IOException {
        try (InputStream stream = TunnellingValidationTest.class.getResourceAsStream("/reference/" + name)) {
            List<List<String>> rows = new ArrayList<>();
            new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .forEach(line -> rows.add(List.of(line.split(",", -1))));
            return rows;
        }
    }
}
