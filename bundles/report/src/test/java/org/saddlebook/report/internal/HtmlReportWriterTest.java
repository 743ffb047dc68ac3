package org.saddlebook.report.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.api.service.Intake;
import org.saddlebook.report.api.ReportPart;
import org.saddlebook.report.api.ReportTools;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

class HtmlReportWriterTest {
    /** Draws a rectangle and says which cautions it was given. */
    private static final class Rectangles implements FigureRenderer {
        @Override
        public byte[] svg(Node.Figure figure, Map<String, String> cautions) {
            return ("<?xml version=\"1.0\"?>\n<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 1 1\"><text>"
                            + List.copyOf(cautions.keySet())
                                    .indexOf(figure.cautions().get(0)) + "</text></svg>")
                    .getBytes(StandardCharsets.UTF_8);
        }

        @Override
        public byte[] png(Node.Figure figure, Map<String, String> cautions, double scale) {
            return new byte[0];
        }
    }

    private static ReportPart part(String section, java.util.function.BiFunction<Section, ReportTools, String> html) {
        return new ReportPart() {
            @Override
            public String section() {
                return section;
            }

            @Override
            public String html(Section of, ReportTools tools) {
                return html.apply(of, tools);
            }
        };
    }

    private static String report(Findings findings, List<ReportPart> parts, List<FigureRenderer> renderers) {
        List<Intake.Part> files = new HtmlReportWriter(parts, renderers).report(SampleReport.campaign(), findings);
        assertEquals("report.html", files.get(0).name());
        return new String(files.get(0).bytes(), StandardCharsets.UTF_8);
    }

    private static String report() {
        return report(SampleReport.findings(), List.of(), List.of(new Rectangles()));
    }

    private static Document parse(String html) throws Exception {
        String xml = html.substring(html.indexOf("<html"));
        return DocumentBuilderFactory.newInstance()
                .newDocumentBuilder()
                .parse(new ByteArrayInputStream(xml.getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void isWellFormedAndCompleteInItself() throws Exception {
        String html = report();
        assertTrue(html.startsWith("<!DOCTYPE html>\n<html lang=\"en\">"));
        Document document = parse(html);
        NodeList all = document.getElementsByTagName("*");
        Set<String> ids = new HashSet<>();
        Set<String> targets = new HashSet<>();
        for (int i = 0; i < all.getLength(); i++) {
            Element element = (Element) all.item(i);
            assertFalse(
                    Set.of("script", "link", "img", "iframe", "object").contains(element.getTagName()),
                    element.getTagName());
            assertFalse(element.hasAttribute("src") || element.hasAttribute("onclick"));
            if (element.hasAttribute("id")) {
                assertTrue(ids.add(element.getAttribute("id")), "id twice: " + element.getAttribute("id"));
            }
            if (element.hasAttribute("href")) {
                assertTrue(element.getAttribute("href").startsWith("#"), element.getAttribute("href"));
                targets.add(element.getAttribute("href").substring(1));
            }
            if (element.getTagName().equals("th")) {
                assertTrue(element.hasAttribute("scope"));
            }
        }
        assertTrue(ids.containsAll(targets), "every number leads to its caution");
        assertFalse(targets.isEmpty());
        assertFalse(html.contains("@import") || html.contains("url("));
    }

    @Test
    void escapesEveryText() {
        String html = report();
        for (String raw : List.of("<script", "50a <b>", "<applicable>", "<foreign>", "<cell>", "<own>", "\u202e")) {
            assertFalse(html.contains(raw), raw);
        }
        assertTrue(html.contains("Title &lt;script&gt;alert(&quot;x&quot;)&lt;/script&gt; &amp; &#39;co&#39;"));
    }

    @Test
    void isAFunctionOfItsArguments() {
        HtmlReportWriter writer = new HtmlReportWriter(List.of(), List.of(new Rectangles()));
        List<Intake.Part> one = writer.report(SampleReport.campaign(), SampleReport.findings());
        List<Intake.Part> two = new HtmlReportWriter(List.of(), List.of(new Rectangles()))
                .report(SampleReport.campaign(), SampleReport.findings());
        assertEquals(one.size(), two.size());
        for (int i = 0; i < one.size(); i++) {
            assertEquals(one.get(i).name(), two.get(i).name());
            assertArrayEquals(one.get(i).bytes(), two.get(i).bytes());
        }
        assertEquals("figures/section-barrier-ln-rate.svg", one.get(1).name());
    }

    @Test
    void statesWhatWasMeasuredAndWhatWasLeftOut() {
        String html = report();
        assertTrue(html.contains("2 of 3 points used"));
        assertTrue(html.contains("excluded: stirrer stopped &amp; restarted"));
        assertTrue(html.contains("0.0276"), "the text as read");
        assertTrue(html.contains("1\u00a0mol/L, assumed"));
        assertTrue(html.contains("Line one.\nLine two"));
        assertTrue(html.contains("cd".repeat(32)) && html.contains("ab".repeat(32)) && html.contains("ef".repeat(32)));
        assertTrue(html.contains("2026-03-02 09:12:00"));
    }

    @Test
    void givesTheNumbersInTheirWords() {
        String html = report();
        assertTrue(html.contains("99.9 ± 2.3\u00a0kJ/mol"), "two digits of the uncertainty");
        assertTrue(html.contains("338.15\u00a0K (65.00\u00a0°C)"));
        assertTrue(html.contains("below 340\u00a0K or above 371\u00a0K"));
        assertTrue(html.contains("Cannot be told apart: Arrhenius, modified Arrhenius."));
        assertFalse(html.contains("−4.1 ±"), "what is not determined has no tidy ±");
        assertTrue(html.contains("Not fitted: It is not &lt;applicable&gt;."));
        assertTrue(html.contains("Not done: No limit was stated."));
    }

    @Test
    void printsASetThatGivesTheRateConstantBack() {
        String html = report();
        int start = html.indexOf("To calculate with:");
        String set = html.substring(start, html.indexOf("</p>", start));
        assertTrue(set.contains("3.46 × 10¹⁵\u00a0min⁻¹") && set.contains("99.88\u00a0kJ/mol"), set);
        // Checked by calculating with the printed set: ln k = ln A - Ea/(R T), u from the full covariance of the
        // sample.
        double gas = 8.31446261815324;
        for (double kelvin = 250; kelvin <= 420; kelvin += 10) {
            double x = -1 / (gas * kelvin);
            double u = Math.sqrt(0.6951 + 2 * x * 1953.1 + x * x * 5499025.0);
            double shift = Math.log(3.46e15 / 3.4567e15) + x * (99880 - 99876.5);
            assertTrue(Math.abs(shift) <= u / 10, kelvin + " K: " + shift + " against " + u);
        }
    }

    @Test
    void repeatsEveryCautionBesideItsNumberWithOneNumberingThroughout() {
        String html = report();
        List<String> ids = List.copyOf(SampleReport.findings().cautions().keySet());
        int number = ids.indexOf("same-mechanism") + 1;
        assertTrue(html.contains("id=\"caution-section-barrier-" + number + "\"><b>" + number + "</b> "
                + Html.text(SampleReport.barrier().cautions().get("same-mechanism"))));
        assertTrue(html.contains("<text>" + (number - 1) + "</text>"), "figures get the same list");
        assertTrue(html.contains("A caution of its &lt;own&gt;."));
    }

    @Test
    void aBrokenPartLosesOnlyItself() throws Exception {
        List<ReportPart> broken = List.of(
                part("com.example.isotopes", (section, tools) -> {
                    throw new IllegalStateException("no luck");
                }),
                part("barrier", (section, tools) -> "<p onclick=\"x()\">hello</p>"),
                part("spontaneity", (section, tools) -> null));
        String html = report(SampleReport.findings(), broken, List.of());
        parse(html);
        assertTrue(html.contains(HtmlReportWriterTest.class.getName()), "names where the part comes from");
        assertTrue(html.contains("IllegalStateException, no luck"));
        assertTrue(html.contains("attribute onclick is not allowed"));
        assertTrue(html.contains("it returned nothing"));
        assertTrue(html.contains("kinetic isotope effect"), "the plain form follows");
        assertTrue(html.contains("Arrhenius"));
    }

    @Test
    void aPartThatCannotSayItsSectionIsNamed() {
        ReportPart mute = new ReportPart() {
            @Override
            public String section() {
                throw new IllegalStateException("mute");
            }

            @Override
            public String html(Section section, ReportTools tools) {
                return "";
            }
        };
        String html = report(SampleReport.findings(), List.of(mute), List.of());
        assertTrue(html.contains("could not be used: IllegalStateException, mute."));
        assertTrue(html.contains("To calculate with:"));
    }

    @Test
    void aContributedPartIsShown() throws Exception {
        ReportPart own = part(
                "com.example.isotopes",
                (section, tools) -> "<h3>Ours</h3><p>" + tools.cautions(List.of("own-caution")) + "</p>");
        String html = report(SampleReport.findings(), List.of(own), List.of());
        parse(html);
        assertTrue(html.contains("<h3>Ours</h3>"));
        assertTrue(html.contains("A caution of its &lt;own&gt;."), "its cautions stand in the margin");
    }

    @Test
    void saysWhyAFigureIsMissing() {
        assertTrue(report(SampleReport.findings(), List.of(), List.of())
                .contains("Figure “Rate &lt;constant&gt;” is not drawn: no bundle that draws figures is installed."));
        FigureRenderer fontless = new FigureRenderer() {
            @Override
            public byte[] svg(Node.Figure figure, Map<String, String> cautions) {
                throw new InternalError("no fonts");
            }

            @Override
            public byte[] png(Node.Figure figure, Map<String, String> cautions, double scale) {
                return new byte[0];
            }
        };
        assertTrue(report(SampleReport.findings(), List.of(), List.of(fontless))
                .contains("is not drawn: InternalError, no fonts."));
    }

    @Test
    void writesACampaignWithNothingInIt() throws Exception {
        Findings none = new Findings("", "", List.of(), Map.of());
        byte[] html = new HtmlReportWriter(List.of(), List.of())
                .report(org.saddlebook.api.campaign.Campaign.titled(""), none)
                .get(0)
                .bytes();
        parse(new String(html, StandardCharsets.UTF_8));
        assertTrue(new String(html, StandardCharsets.UTF_8).contains("holds no rate table"));
    }
}
