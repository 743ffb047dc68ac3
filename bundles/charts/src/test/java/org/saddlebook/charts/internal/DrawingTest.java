package org.saddlebook.charts.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.Color;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureLook;
import org.saddlebook.charts.api.FigurePoint;

class DrawingTest {
    private static final Node.Figure FIGURE = new Node.Figure(
            "f",
            "A law",
            new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
            new Axis("energy", "J/mol", Axis.Scale.LINEAR),
            List.of(
                    new Layer(
                            Layer.Kind.CONFIDENCE_BAND,
                            "law",
                            new double[] {290, 310, 330, 350},
                            new double[] {1000, 3000, 5000, 7000},
                            new double[] {500, 2500, 4500, 6500},
                            new double[] {1500, 3500, 5500, 7500}),
                    Layer.of(Layer.Kind.LINE, "law", new double[] {290, 310, 330, 350}, new double[] {
                        1000, 3000, 5000, 7000
                    }),
                    Layer.of(Layer.Kind.EXCLUDED, "excluded", new double[] {340}, new double[] {3000}),
                    new Layer(
                            Layer.Kind.MEASURED,
                            "measured",
                            new double[] {300, 320},
                            new double[] {2000, 4000},
                            new double[] {1800, 3900},
                            new double[] {2200, 4100})),
            List.of());

    private static FigureDrawing drawing(FigureLook look) {
        return new ChartsRenderer().draw(FIGURE, Map.of(), look);
    }

    @Test
    void findsThePointUnderAPixelAndSaysItsValuesInUnitsOfPeople() {
        FigureDrawing drawing = drawing(FigureLook.PAPER);
        FigurePoint point = drawing.points().get(0);
        assertEquals(Layer.Kind.MEASURED, point.kind());
        assertEquals(300, point.x());
        assertEquals(2000, point.y());
        assertEquals("measured at 300.00 K (26.85 °C), energy 2.000\u00a0kJ/mol (1.80 to 2.20)", point.text());
        assertEquals(Optional.of(point), drawing.pointAt(point.px() + 3, point.py() - 3, 9));
        assertEquals(Optional.empty(), drawing.pointAt(point.px() + 30, point.py(), 9));
        assertTrue(
                drawing.points().get(2).text().startsWith("excluded at 340.00 K"),
                drawing.points().toString());
    }

    @Test
    void readsLinesOffAtAnyAbscissa() {
        FigureDrawing drawing = drawing(FigureLook.PAPER);
        List<String> read = drawing.readingsAt(drawing.px(310));
        assertEquals("310.00 K (36.85 °C)", read.get(0));
        assertEquals("law: energy 3.000\u00a0kJ/mol", read.get(1));
        assertEquals(List.of(), drawing.readingsAt(1));
    }

    @Test
    void pixelsAndAbscissasGoBackAndForth() {
        FigureDrawing drawing = drawing(FigureLook.PAPER);
        for (double kelvin : new double[] {285, 300, 333.3, 360}) {
            assertEquals(kelvin, drawing.x(drawing.px(kelvin)), 1e-9);
        }
    }

    @Test
    void onTheRailTemperaturesLieWhereTheRailSays() {
        FigureLook look =
                FigureLook.PAPER.withSize(900, 300).withRail(Optional.of(new FigureLook.Rail(280, 360, 150, 850)));
        FigureDrawing drawing = drawing(look);
        assertEquals(150, drawing.px(280), 1e-9);
        assertEquals(850, drawing.px(360), 1e-9);
        // Even in 1/T: halfway between 1/280 and 1/360 is 1/315.
        assertEquals(500, drawing.px(315), 1e-9);
        assertFalse(new String(drawing.svg(), StandardCharsets.UTF_8).contains("spaced as 1/T"));
    }

    @Test
    void nothingOfTheLayersLeavesTheAreaOfAPart() throws Exception {
        FigureDrawing whole = drawing(FigureLook.PAPER);
        Rectangle2D area = whole.area();
        FigureLook.Zoom part = whole.part(new Rectangle2D.Double(
                        area.getX() + area.getWidth() * 0.4,
                        area.getY() + area.getHeight() * 0.4,
                        area.getWidth() * 0.3,
                        area.getHeight() * 0.2))
                .orElseThrow();
        FigureDrawing zoomed = drawing(FigureLook.PAPER.withZoom(Optional.of(part)));
        String svg = new String(zoomed.svg(), StandardCharsets.UTF_8);
        Files.writeString(Files.createDirectories(Path.of("target", "figures")).resolve("zoomed.svg"), svg);
        Rectangle2D inside = zoomed.area();
        Matcher path = Pattern.compile("<path[^>]* d=\"([^\"]*)\"").matcher(svg);
        Pattern number = Pattern.compile("(-?[0-9.]+) (-?[0-9.]+)");
        int seen = 0;
        while (path.find()) {
            Matcher pair =
                    number.matcher(path.group(1).replaceAll("[A-Za-z]", " ").replaceAll(" +", " "));
            // The sheet itself and its key are paths too; the layers are the ones that begin inside the area.
            if (!pair.find() || !inside.contains(at(pair, 1), at(pair, 2))) {
                continue;
            }
            do {
                assertTrue(
                        at(pair, 1) >= inside.getMinX() - 0.1
                                && at(pair, 1) <= inside.getMaxX() + 0.1
                                && at(pair, 2) >= inside.getMinY() - 0.1
                                && at(pair, 2) <= inside.getMaxY() + 0.1,
                        pair.group());
                seen++;
            } while (pair.find());
        }
        assertTrue(seen > 10, "points of layers: " + seen);
        assertTrue(zoomed.points().size() < whole.points().size());
    }

    private static double at(Matcher pair, int group) {
        return Double.parseDouble(pair.group(group));
    }

    @Test
    void refusesAPartBeyondInfiniteTemperature() {
        FigureDrawing drawing = drawing(FigureLook.PAPER);
        assertEquals(Optional.empty(), drawing.part(new Rectangle2D.Double(-1e6, 0, 3e6, 100)));
    }

    @Test
    void theDarkSheetIsDark() throws Exception {
        byte[] png = drawing(FigureLook.PAPER.withTheme(FigureLook.Theme.DARK)).png(1);
        BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
        assertEquals(new Color(0x181D20), new Color(image.getRGB(5, 100)));
    }

    @Test
    void takesTheHeightItIsGiven() {
        assertEquals(300, drawing(FigureLook.PAPER.withSize(600, 300)).height());
        assertEquals(600, drawing(FigureLook.PAPER.withSize(600, 300)).width());
    }
}
