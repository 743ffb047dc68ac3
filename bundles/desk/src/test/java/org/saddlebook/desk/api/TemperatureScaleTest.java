package org.saddlebook.desk.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TemperatureScaleTest {
    @Test
    void spacesTemperaturesEvenlyInTheirReciprocal() {
        TemperatureScale scale = new TemperatureScale(250, 500, 100, 300);
        assertEquals(100, scale.x(250), 1e-9);
        assertEquals(300, scale.x(500), 1e-9);
        // 1/T of the middle is (1/250 + 1/500)/2 = 0.003, so T = 333.33 K.
        assertEquals(1000.0 / 3, scale.kelvin(200), 1e-9);
    }

    @Test
    void turnsPositionsBackIntoTemperatures() {
        TemperatureScale scale = new TemperatureScale(273.15, 373.15, 40, 900);
        for (double kelvin = 260; kelvin < 400; kelvin += 7) {
            assertEquals(kelvin, scale.kelvin(scale.x(kelvin)), 1e-9);
        }
    }

    @Test
    void seenFromAComponentPositionsMoveTemperaturesDoNot() {
        TemperatureScale scale = new TemperatureScale(273.15, 373.15, 40, 900);
        TemperatureScale shifted = scale.shifted(25);
        assertEquals(scale.x(300) - 25, shifted.x(300), 1e-9);
    }

    @ParameterizedTest
    @ValueSource(ints = {60, 150, 400, 860, 3000})
    void labelsAreRoundAndNeverCloserThanTheRoomAskedFor(int width) {
        TemperatureScale scale = new TemperatureScale(270, 390, 0, width);
        for (double zero : new double[] {0, 273.15}) {
            List<TemperatureScale.Tick> ticks = scale.ticks(zero, 45);
            for (int i = 0; i < ticks.size(); i++) {
                TemperatureScale.Tick tick = ticks.get(i);
                assertTrue(scale.holds(tick.kelvin()));
                assertEquals(
                        (double) Long.parseLong(tick.label().replace('\u2212', '-')),
                        tick.kelvin() - zero,
                        1e-9,
                        tick.label());
                if (i > 0) {
                    assertTrue(scale.x(tick.kelvin()) - scale.x(ticks.get(i - 1).kelvin()) >= 45);
                }
            }
        }
        assertFalse(scale.ticks(273.15, 45).isEmpty() && width > 150, "a wide scale has labels");
    }

    @Test
    void refusesRangesThatAreNone() {
        assertThrows(IllegalArgumentException.class, () -> new TemperatureScale(0, 300, 0, 1));
        assertThrows(IllegalArgumentException.class, () -> new TemperatureScale(300, 300, 0, 1));
        assertThrows(IllegalArgumentException.class, () -> new TemperatureScale(Double.NaN, 300, 0, 1));
        assertThrows(IllegalArgumentException.class, () -> new TemperatureScale(290, 300, 5, 5));
    }
}
