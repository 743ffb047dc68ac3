package org.saddlebook.desk.api;

import java.awt.Color;
import java.awt.Font;
import javax.swing.UIManager;

/**
 * Colours and letters of the desk, in light and dark. Ochre and lichen are for fills and thick strokes only: as text they
 * cannot be read. Nothing is told by colour alone.
 */
public final class Ink {
    private static final Ink LIGHT = new Ink(false);
    private static final Ink DARK = new Ink(true);

    private final boolean dark;

    private Ink(boolean dark) {
        this.dark = dark;
    }

    /** The colours of the light or the dark desk. */
    public static Ink of(boolean dark) {
        return dark ? DARK : LIGHT;
    }

    /** Whether this is the dark desk. */
    public boolean dark() {
        return dark;
    }

    /** Text, axes, measured points. */
    public Color ink() {
        return new Color(dark ? 0xE9E4D8 : 0x1F2A30);
    }

    /** Text of second rank; still readable. */
    public Color faint() {
        return new Color(dark ? 0xAEB0A8 : 0x57626A);
    }

    /** First line of a figure, the open stratum. */
    public Color plum() {
        return new Color(dark ? 0xD08FBE : 0x6B2D5C);
    }

    /** Second line of a figure, run traces. */
    public Color petrol() {
        return new Color(dark ? 0x5FBCC2 : 0x1F7A80);
    }

    /** Thick strokes only. */
    public Color ochre() {
        return new Color(dark ? 0xDDA94A : 0xC98A1B);
    }

    /** Fills of cautions and bands; text on it is written in {@link #ink}. */
    public Color lichen() {
        return new Color(dark ? 0x464E37 : 0xC9CFA8);
    }

    /** The sheet everything lies on. */
    public Color paper() {
        return new Color(dark ? 0x181D20 : 0xFBF8F1);
    }

    /** The open stratum and fields to write in. */
    public Color sheet() {
        return new Color(dark ? 0x1F2529 : 0xFFFEFA);
    }

    /** The ground of the temperature rail. */
    public Color rail() {
        return new Color(dark ? 0x262C25 : 0xE8EBD9);
    }

    /** Lines between strata. */
    public Color line() {
        return new Color(dark ? 0x5A636A : 0x8E969B);
    }

    /** The letters, scaled from the usual size. */
    public Font font(double scale, boolean bold) {
        Font usual = UIManager.getFont("Label.font");
        if (usual == null) {
            usual = new Font(Font.SANS_SERIF, Font.PLAIN, 12);
        }
        return usual.deriveFont(bold ? Font.BOLD : Font.PLAIN, (float) (usual.getSize2D() * scale));
    }
}
