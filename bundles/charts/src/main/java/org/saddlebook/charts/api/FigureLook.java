package org.saddlebook.charts.api;

import java.util.Objects;
import java.util.Optional;
import java.util.OptionalInt;

/** How a figure is laid out. Immutable; grows by {@code with} methods. */
public final class FigureLook {
    /** As in the report: on light paper, 720 points wide, with the full text of its cautions. */
    public static final FigureLook PAPER =
            new FigureLook(720, OptionalInt.empty(), Theme.LIGHT, Notes.WRITTEN, Optional.empty(), Optional.empty());

    /** Colours. */
    public enum Theme {
        /** Dark ink on light paper. */
        LIGHT,
        /** Light ink on a dark sheet. */
        DARK
    }

    /** How cautions are shown. */
    public enum Notes {
        /** Numbered in the folded corner and written out below. */
        WRITTEN,
        /** Numbered in the folded corner; the text stands elsewhere. */
        NUMBERED
    }

    /**
     * A part of the axes, in their units.
     *
     * @param lowX left end
     * @param highX right end, above the left one
     * @param lowY lower end
     * @param highY upper end, above the lower one
     */
    public record Zoom(double lowX, double highX, double lowY, double highY) {
        /** Checks the ends. */
        public Zoom {
            if (!(lowX < highX)
                    || !(lowY < highY)
                    || !Double.isFinite(highX - lowX)
                    || !Double.isFinite(highY - lowY)) {
                throw new IllegalArgumentException(
                        "no part of the axes: " + lowX + " to " + highX + ", " + lowY + " to " + highY);
            }
        }
    }

    /**
     * Where temperatures lie outside the figure, so that one vertical line crosses several figures at one temperature. The
     * figure then has no temperature axis of its own.
     *
     * @param lowKelvin temperature at the left end, K
     * @param highKelvin temperature at the right end, K, above the low one
     * @param left left end, points
     * @param right right end, points
     */
    public record Rail(double lowKelvin, double highKelvin, double left, double right) {
        /** Checks the ends. */
        public Rail {
            if (!(lowKelvin > 0) || !(highKelvin > lowKelvin) || !(right > left)) {
                throw new IllegalArgumentException("no rail: " + lowKelvin + " to " + highKelvin + " K");
            }
        }
    }

    private final int width;
    private final OptionalInt height;
    private final Theme theme;
    private final Notes notes;
    private final Optional<Zoom> zoom;
    private final Optional<Rail> rail;

    private FigureLook(
            int width, OptionalInt height, Theme theme, Notes notes, Optional<Zoom> zoom, Optional<Rail> rail) {
        this.width = width;
        this.height = height;
        this.theme = Objects.requireNonNull(theme, "theme");
        this.notes = Objects.requireNonNull(notes, "notes");
        this.zoom = zoom;
        this.rail = rail;
        if (width < 240) {
            throw new IllegalArgumentException("a figure is at least 240 points wide: " + width);
        }
    }

    /** Width of the sheet, points. */
    public int width() {
        return width;
    }

    /** Height of the sheet, points; empty for a drawing area of 300 points. The area is never lower than 90 points. */
    public OptionalInt height() {
        return height;
    }

    /** Colours. */
    public Theme theme() {
        return theme;
    }

    /** How cautions are shown. */
    public Notes notes() {
        return notes;
    }

    /** The part of the axes shown; empty for everything. */
    public Optional<Zoom> zoom() {
        return zoom;
    }

    /** Where temperatures lie; empty for a figure with its own axis. Used only for abscissas in kelvin. */
    public Optional<Rail> rail() {
        return rail;
    }

    /** The same, this large. */
    public FigureLook withSize(int newWidth, int newHeight) {
        return new FigureLook(newWidth, OptionalInt.of(newHeight), theme, notes, zoom, rail);
    }

    /** The same in other colours. */
    public FigureLook withTheme(Theme newTheme) {
        return new FigureLook(width, height, newTheme, notes, zoom, rail);
    }

    /** The same with cautions shown so. */
    public FigureLook withNotes(Notes newNotes) {
        return new FigureLook(width, height, theme, newNotes, zoom, rail);
    }

    /** The same, this part of the axes; empty for everything. */
    public FigureLook withZoom(Optional<Zoom> newZoom) {
        return new FigureLook(width, height, theme, notes, newZoom, rail);
    }

    /** The same, its temperatures there; empty for a figure with its own axis. */
    public FigureLook withRail(Optional<Rail> newRail) {
        return new FigureLook(width, height, theme, notes, zoom, newRail);
    }
}
