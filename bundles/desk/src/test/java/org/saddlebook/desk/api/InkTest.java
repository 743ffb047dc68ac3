package org.saddlebook.desk.api;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * Contrast after WCAG 2.2 (W3C Recommendation, section 1.4.3 and the definition of relative luminance): 4.5 to 1 for text,
 * 3 to 1 for lines that carry meaning (1.4.11).
 */
class InkTest {
    static double contrast(Color a, Color b) {
        double brighter = Math.max(luminance(a), luminance(b));
        double darker = Math.min(luminance(a), luminance(b));
        return (brighter + 0.05) / (darker + 0.05);
    }

    private static double luminance(Color colour) {
        return 0.2126 * channel(colour.getRed())
                + 0.7152 * channel(colour.getGreen())
                + 0.0722 * channel(colour.getBlue());
    }

    private static double channel(int value) {
        double share = value / 255.0;
        return share <= 0.04045 ? share / 12.92 : StrictMath.pow((share + 0.055) / 1.055, 2.4);
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void textCanBeReadOnEveryGround(boolean dark) {
        Ink ink = Ink.of(dark);
        for (Color ground : new Color[] {ink.paper(), ink.sheet(), ink.rail(), ink.lichen()}) {
            assertTrue(contrast(ink.ink(), ground) >= 4.5, () -> "ink on " + ground);
        }
        for (Color ground : new Color[] {ink.paper(), ink.sheet(), ink.rail()}) {
            assertTrue(contrast(ink.faint(), ground) >= 4.5, () -> "second rank on " + ground);
        }
    }

    @ParameterizedTest
    @ValueSource(booleans = {false, true})
    void linesOfFiguresCanBeSeen(boolean dark) {
        Ink ink = Ink.of(dark);
        for (Color line : new Color[] {ink.plum(), ink.petrol(), ink.ink()}) {
            assertTrue(contrast(line, ink.paper()) >= 3, () -> "line " + line);
            assertTrue(contrast(line, ink.sheet()) >= 3, () -> "line " + line);
        }
    }
}
