package org.saddlebook.charts.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

class ChartsRendererTest {
    private final ChartsRenderer renderer = new ChartsRenderer();

    private static Document parse(byte[] svg) throws Exception {
        return DocumentBuilderFactory.newInstance().newDocumentBuilder().parse(new ByteArrayInputStream(svg));
    }

    private static List<String> texts(Document svg) {
        List<String> texts = new ArrayList<>();
        NodeList found = svg.getElementsByTagName("text");
        for (int i = 0; i < found.getLength(); i++) {
            texts.add(found.item(i).getTextContent());
        }
        return texts;
    }

    @Test
    void drawsWellFormedSvgWithRealText() throws Exception {
        for (Node.Figure figure : SampleFigures.all()) {
            byte[] svg = renderer.svg(figure, SampleFigures.CAUTIONS);
            // For looking at: target/figures.
            Path folder = Files.createDirectories(Path.of("target", "figures"));
            Files.write(folder.resolve(figure.id() + ".svg"), svg);
            Document document = parse(svg);
            Element root = document.getDocumentElement();
            assertEquals("720", root.getAttribute("width"));
            assertTrue(root.getAttribute("viewBox").startsWith("0 0 720 "), root.getAttribute("viewBox"));
            assertEquals("img", root.getAttribute("role"));
            assertEquals(figure.title(), root.getAttribute("aria-label"));
            assertEquals(
                    figure.title(), root.getElementsByTagName("title").item(0).getTextContent());
            for (Layer layer : figure.layers()) {
                if (layer.kind() == Layer.Kind.LINE) {
                    assertTrue(String.join(" ", texts(document)).contains(layer.label()), layer.label());
                }
            }
        }
    }

    @Test
    void sameFigureGivesSameBytesWhateverWasDrawnBefore() {
        byte[] first = renderer.svg(SampleFigures.barrier(), SampleFigures.CAUTIONS);
        renderer.svg(SampleFigures.gibbs(), SampleFigures.CAUTIONS);
        assertArrayEquals(first, new ChartsRenderer().svg(SampleFigures.barrier(), SampleFigures.CAUTIONS));
        byte[] png = renderer.png(SampleFigures.barrier(), SampleFigures.CAUTIONS, 1);
        assertArrayEquals(png, renderer.png(SampleFigures.barrier(), SampleFigures.CAUTIONS, 1));
    }

    @Test
    void hasNoIdsNoImagesAndNoLinksSoThatSeveralFitInOnePage() {
        for (Node.Figure figure : SampleFigures.all()) {
            String svg = new String(renderer.svg(figure, SampleFigures.CAUTIONS), StandardCharsets.UTF_8);
            for (String forbidden : List.of(
                    " id=", "url(", "<image", "href", "clip-path", "<script", "<?xml-stylesheet", "<!DOCTYPE")) {
                assertFalse(svg.contains(forbidden), figure.id() + " contains " + forbidden);
            }
            assertTrue(svg.length() < 60_000, figure.id() + ": " + svg.length() + " characters");
        }
    }

    @Test
    void drawsPngAtTheScaleAskedFor() throws Exception {
        for (Node.Figure figure : SampleFigures.all()) {
            byte[] png = renderer.png(figure, SampleFigures.CAUTIONS, 2);
            Path folder = Files.createDirectories(Path.of("target", "figures"));
            Files.write(folder.resolve(figure.id() + ".png"), png);
            BufferedImage image = ImageIO.read(new ByteArrayInputStream(png));
            assertEquals(1440, image.getWidth());
        }
        assertThrows(IllegalArgumentException.class, () -> renderer.png(SampleFigures.gibbs(), Map.of(), 0.5));
        assertThrows(IllegalArgumentException.class, () -> renderer.png(SampleFigures.gibbs(), Map.of(), Double.NaN));
    }

    @Test
    void everyTextStaysOnTheSheet() throws Exception {
        for (Node.Figure figure : SampleFigures.all()) {
            Document svg = parse(renderer.svg(figure, SampleFigures.CAUTIONS));
            double height = Double.parseDouble(svg.getDocumentElement().getAttribute("height"));
            NodeList found = svg.getElementsByTagName("text");
            for (int i = 0; i < found.getLength(); i++) {
                Element text = (Element) found.item(i);
                double wide = Lettering.width(
                        text.getTextContent(),
                        Integer.parseInt(text.getAttribute("font-size")),
                        text.getAttribute("font-weight").equals("bold"));
                double share = switch (text.getAttribute("text-anchor")) {
                    case "middle" -> 0.5;
                    case "end" -> 1;
                    default -> 0;
                };
                double start = Double.parseDouble(text.getAttribute("x")) - share * wide;
                double y = Double.parseDouble(text.getAttribute("y"));
                String where = figure.id() + ": " + text.getTextContent();
                assertTrue(
                        start >= 0 && start + wide <= Sheet.WIDTH, where + " from " + start + " to " + (start + wide));
                assertTrue(y > 8 && y < height, where);
            }
        }
    }

    @Test
    void cautionsCarryTheNumbersOfTheListTheyComeFrom() throws Exception {
        List<String> texts = texts(parse(renderer.svg(SampleFigures.barrier(), SampleFigures.CAUTIONS)));
        assertTrue(texts.contains("2 3"), texts.toString());
        assertTrue(String.join(" ", texts).contains(SampleFigures.CAUTIONS.get("extrapolated")));
        assertFalse(texts.contains("1"), "the caution that is not the figure's is not drawn");
        Node.Figure foreign = new Node.Figure(
                "f",
                "Foreign",
                SampleFigures.gibbs().x(),
                SampleFigures.gibbs().y(),
                List.of(),
                List.of("unknown-one"));
        assertTrue(texts(parse(renderer.svg(foreign, Map.of()))).contains("unknown-one"));
    }

    @Test
    void namesTheTemperatureInBothScales() throws Exception {
        List<String> texts = texts(parse(renderer.svg(SampleFigures.barrier(), SampleFigures.CAUTIONS)));
        assertTrue(texts.contains("K") && texts.contains("°C, spaced as 1/T"), texts.toString());
        assertTrue(texts.contains("300") && texts.contains("20"), texts.toString());
    }

    @Test
    void showsMolarEnergiesInKilojoule() throws Exception {
        List<String> texts = texts(parse(renderer.svg(SampleFigures.gibbs(), SampleFigures.CAUTIONS)));
        assertTrue(texts.contains("ΔG / (kJ/mol)"), texts.toString());
        assertTrue(texts.contains("−5"), texts.toString());
    }

    @Test
    void anUndeterminedPredictionDoesNotSquashTheRest() {
        Layer measured = Layer.of(Layer.Kind.MEASURED, "", new double[] {300, 320}, new double[] {1, 2});
        Layer wild = new Layer(
                Layer.Kind.PREDICTED, "", new double[] {310}, new double[] {1.5}, new double[] {-1e6}, new double[] {1e6
                });
        Extent extent = Extent.vertical(List.of(measured, wild), Spacing.LINEAR);
        assertTrue(extent.low() > 0 && extent.high() < 3, extent.toString());
    }

    @Test
    void drawsFiguresWithNothingInThem() throws Exception {
        for (Axis.Scale scale : Axis.Scale.values()) {
            Node.Figure empty = new Node.Figure(
                    "empty",
                    "Empty",
                    new Axis("x", "K", scale),
                    new Axis("y", "1", Axis.Scale.LINEAR),
                    List.of(),
                    List.of());
            assertTrue(texts(parse(renderer.svg(empty, Map.of()))).contains("Empty"));
            Node.Figure single = new Node.Figure(
                    "single",
                    "Single",
                    new Axis("x", "K", scale),
                    new Axis("y", "1", Axis.Scale.LOGARITHMIC),
                    List.of(Layer.of(Layer.Kind.MEASURED, "", new double[] {300}, new double[] {1e-3})),
                    List.of());
            assertTrue(texts(parse(renderer.svg(single, Map.of()))).contains("Single"));
        }
    }

    @Test
    void refusesWhatAnAxisCannotShow() {
        Node.Figure figure = new Node.Figure(
                "bad",
                "Bad",
                new Axis("x", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("y", "1", Axis.Scale.LINEAR),
                List.of(Layer.of(Layer.Kind.MEASURED, "points", new double[] {-1}, new double[] {1})),
                List.of());
        IllegalArgumentException refused =
                assertThrows(IllegalArgumentException.class, () -> renderer.svg(figure, Map.of()));
        assertTrue(refused.getMessage().contains("points"), refused.getMessage());
    }
}
