package org.saddlebook.charts.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureLook;

/**
 * Figures seen without colour: as a grey print, and by readers without one kind of cone (matrices of Machado, Oliveira and
 * Fernandes 2009, severity 1.0, written from memory; their rows add up to 1, which is checked). Contrast is that of WCAG
 * 2.2: 4.5 to 1 for text (1.4.3) and 3 to 1 for what is drawn (1.4.11), of which the ochre of a fourth line falls short by a
 * little; its pattern tells it apart.
 */
@Tag("long")
class FigureVisionTest {
    private static final Map<String, double[][]> VISIONS = visions();
    private static final int LINES = 4;

    private static Map<String, double[][]> visions() {
        Map<String, double[][]> visions = new LinkedHashMap<>();
        double[] grey = {0.2126, 0.7152, 0.0722};
        visions.put("grey", new double[][] {grey, grey, grey});
        visions.put("protanopia", new double[][] {
            {0.152286, 1.052583, -0.204868}, {0.114503, 0.786281, 0.099216}, {-0.003882, -0.048116, 1.051998}
        });
        visions.put("deuteranopia", new double[][] {
            {0.367322, 0.860646, -0.227968}, {0.280085, 0.672501, 0.047413}, {-0.011820, 0.042940, 0.968881}
        });
        visions.put("tritanopia", new double[][] {
            {1.255528, -0.076749, -0.178779}, {-0.078411, 0.930809, 0.147602}, {0.004733, 0.691367, 0.303900}
        });
        return visions;
    }

    private static final double[] LINEAR = new double[256];

    static {
        for (int i = 0; i < LINEAR.length; i++) {
            double c = i / 255.0;
            LINEAR[i] = c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
        }
    }

    /** Light of a channel, as sRGB defines it (IEC 61966-2-1). */
    private static double linear(int channel) {
        return LINEAR[channel];
    }

    private static int coded(double linear) {
        double c = Math.max(0, Math.min(1, linear));
        return (int) Math.round(255 * (c <= 0.0031308 ? 12.92 * c : 1.055 * Math.pow(c, 1 / 2.4) - 0.055));
    }

    private static BufferedImage seen(BufferedImage image, double[][] vision) {
        BufferedImage seen = new BufferedImage(image.getWidth(), image.getHeight(), BufferedImage.TYPE_INT_RGB);
        for (int y = 0; y < image.getHeight(); y++) {
            for (int x = 0; x < image.getWidth(); x++) {
                int rgb = image.getRGB(x, y);
                double[] in = {linear(rgb >> 16 & 255), linear(rgb >> 8 & 255), linear(rgb & 255)};
                int out = 0;
                for (double[] row : vision) {
                    out = out << 8 | coded(row[0] * in[0] + row[1] * in[1] + row[2] * in[2]);
                }
                seen.setRGB(x, y, out);
            }
        }
        return seen;
    }

    private static double luminance(int rgb) {
        return 0.2126 * linear(rgb >> 16 & 255) + 0.7152 * linear(rgb >> 8 & 255) + 0.0722 * linear(rgb & 255);
    }

    private static double contrast(int a, int b) {
        double high = Math.max(luminance(a), luminance(b));
        double low = Math.min(luminance(a), luminance(b));
        return (high + 0.05) / (low + 0.05);
    }

    /** Level lines, one below the other, so that each can be looked at alone. */
    private static Node.Figure levels() {
        List<Layer> layers = new ArrayList<>();
        for (int i = 0; i < LINES; i++) {
            layers.add(Layer.of(
                    Layer.Kind.LINE, "law " + (i + 1), new double[] {0, 100}, new double[] {LINES - i, LINES - i}));
        }
        return new Node.Figure(
                "levels",
                "Levels",
                new Axis("x", "1", Axis.Scale.LINEAR),
                new Axis("y", "1", Axis.Scale.LINEAR),
                layers,
                List.of());
    }

    private static BufferedImage picture(FigureDrawing drawing, double scale) throws Exception {
        return ImageIO.read(new ByteArrayInputStream(drawing.png(scale)));
    }

    @Test
    void theRowsOfTheMatricesAddUpToOneSoThatGreyStaysGrey() {
        for (Map.Entry<String, double[][]> vision : VISIONS.entrySet()) {
            for (double[] row : vision.getValue()) {
                assertEquals(1, row[0] + row[1] + row[2], 2e-6, vision.getKey());
            }
        }
    }

    @Test
    void linesStayApartByTheirPatternAloneAndStandOutFromThePaper() throws Exception {
        for (FigureLook.Theme theme : FigureLook.Theme.values()) {
            FigureDrawing drawing = new ChartsRenderer().draw(levels(), Map.of(), FigureLook.PAPER.withTheme(theme));
            int scale = 4;
            BufferedImage image = picture(drawing, scale);
            int paper = image.getRGB(scale * 4, image.getHeight() / 2);
            for (Map.Entry<String, double[][]> vision : VISIONS.entrySet()) {
                BufferedImage seen = seen(image, vision.getValue());
                int ground = seen.getRGB(scale * 4, image.getHeight() / 2);
                List<List<Integer>> rhythms = new ArrayList<>();
                for (int line = 0; line < LINES; line++) {
                    rhythms.add(rhythm(seen, drawing, LINES - line, scale, ground, vision.getKey() + " " + theme));
                }
                for (int a = 0; a < LINES; a++) {
                    for (int b = a + 1; b < LINES; b++) {
                        assertTrue(
                                apart(rhythms.get(a), rhythms.get(b)),
                                vision.getKey() + " " + theme + ": lines " + (a + 1) + " and " + (b + 1)
                                        + " look alike: " + rhythms.get(a) + " " + rhythms.get(b));
                    }
                }
            }
            assertTrue(paper != 0, "the paper was found");
        }
    }

    /** Lengths of the strokes of a line, in quarter points; one long one for a drawn-through line. */
    private static List<Integer> rhythm(
            BufferedImage seen, FigureDrawing drawing, double level, int scale, int ground, String where) {
        int row = -1;
        double best = 0;
        Sheet sheet = new Sheet(drawing.figure(), Map.of());
        int middle = (int) Math.round(sheet.anyVertical(level) * scale);
        int left = (int) (drawing.px(5) * scale);
        int right = (int) (drawing.px(95) * scale);
        for (int y = middle - scale; y <= middle + scale; y++) {
            double most = 0;
            for (int x = left; x < right; x++) {
                most += contrast(seen.getRGB(x, y), ground);
            }
            if (most > best) {
                best = most;
                row = y;
            }
        }
        double strongest = 0;
        List<Integer> strokes = new ArrayList<>();
        int length = 0;
        for (int x = left; x < right; x++) {
            double contrast = contrast(seen.getRGB(x, row), ground);
            strongest = Math.max(strongest, contrast);
            if (contrast > 2) {
                length++;
            } else if (length > 0) {
                strokes.add(length);
                length = 0;
            }
        }
        strokes.add(length);
        // Ochre, the fourth ink, is for thick strokes and reaches 2.7 on paper.
        assertTrue(
                strongest >= (level > 1 ? 3 : 2.5),
                where + ": contrast of the line at level " + level + " is " + strongest);
        return strokes;
    }

    /** Whether two rhythms differ in the number of strokes by a fifth, or in the spread of their lengths. */
    private static boolean apart(List<Integer> a, List<Integer> b) {
        double more = Math.max(a.size(), b.size());
        double fewer = Math.min(a.size(), b.size());
        return more / fewer > 1.2 || Math.abs(spread(a) - spread(b)) > 8;
    }

    /** Longest minus shortest stroke, the two at the ends left out. */
    private static int spread(List<Integer> strokes) {
        int low = Integer.MAX_VALUE;
        int high = 0;
        for (int i = 1; i < strokes.size() - 1; i++) {
            low = Math.min(low, strokes.get(i));
            high = Math.max(high, strokes.get(i));
        }
        return high == 0 ? 0 : high - low;
    }

    @Test
    void everyFigureIsPaintedAsEachReaderSeesItForLookingAt() throws Exception {
        Path folder = Files.createDirectories(Path.of("target", "visions"));
        for (Node.Figure figure : SampleFigures.all()) {
            for (FigureLook.Theme theme : FigureLook.Theme.values()) {
                FigureDrawing drawing =
                        new ChartsRenderer().draw(figure, SampleFigures.CAUTIONS, FigureLook.PAPER.withTheme(theme));
                BufferedImage image = picture(drawing, 1);
                for (Map.Entry<String, double[][]> vision : VISIONS.entrySet()) {
                    BufferedImage seen = seen(image, vision.getValue());
                    ImageIO.write(
                            seen,
                            "png",
                            folder.resolve(figure.id() + "-" + theme.name().toLowerCase(java.util.Locale.ROOT) + "-"
                                            + vision.getKey() + ".png")
                                    .toFile());
                    int ground = seen.getRGB(4, image.getHeight() / 2);
                    int marked = 0;
                    for (int y = 0; y < seen.getHeight(); y++) {
                        for (int x = 0; x < seen.getWidth(); x++) {
                            marked += contrast(seen.getRGB(x, y), ground) >= 4.5 ? 1 : 0;
                        }
                    }
                    assertTrue(marked > 2000, figure.id() + " " + vision.getKey() + ": readable pixels " + marked);
                }
            }
        }
    }
}
