package org.saddlebook.charts.internal;

import java.awt.Color;
import java.awt.Graphics;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.io.IOException;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import javax.xml.parsers.DocumentBuilderFactory;
import javax.xml.parsers.ParserConfigurationException;
import org.apache.batik.svggen.DOMGroupManager;
import org.apache.batik.svggen.SVGGeneratorContext;
import org.apache.batik.svggen.SVGGraphics2D;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.Node;

/**
 * A Graphics2D that writes SVG through Batik, kept lean: real text with an anchor, no rendering hints, no clips (layers
 * are cut before they are drawn) and therefore no ids, so that several figures can stand in one page.
 */
final class SvgPaper extends SVGGraphics2D {
    private static final String SVG = "http://www.w3.org/2000/svg";

    private static final String FONTS = "'DejaVu Sans', 'Segoe UI', 'Helvetica Neue', 'Noto Sans', Arial, sans-serif";

    /** Declared by Batik for images and links, of which there are none. */
    private static final String UNUSED_NAMESPACE = " xmlns:xlink=\"http://www.w3.org/1999/xlink\"";

    private final double paperWidth;
    private final double paperHeight;

    SvgPaper(double width, double height) {
        super(context(), false);
        paperWidth = width;
        paperHeight = height;
    }

    private SvgPaper(SvgPaper other) {
        super(other);
        paperWidth = other.paperWidth;
        paperHeight = other.paperHeight;
    }

    private static SVGGeneratorContext context() {
        try {
            Document document = DocumentBuilderFactory.newInstance()
                    .newDocumentBuilder()
                    .getDOMImplementation()
                    .createDocument(SVG, "svg", null);
            SVGGeneratorContext context = SVGGeneratorContext.createDefault(document);
            context.setComment(null);
            context.setPrecision(1);
            return context;
        } catch (ParserConfigurationException e) {
            throw new IllegalStateException("the JDK has no XML parser", e);
        }
    }

    /** A text with its anchor at the coordinate, in a font that the reader's machine chooses. */
    void text(String text, double x, double y, String anchor, int size, boolean bold, Color ink) {
        Element element = getDOMFactory().createElementNS(SVG, "text");
        element.setAttribute("x", getGeneratorContext().doubleString(x));
        element.setAttribute("y", getGeneratorContext().doubleString(y));
        element.setAttribute("font-size", Integer.toString(size));
        if (!anchor.equals("start")) {
            element.setAttribute("text-anchor", anchor);
        }
        if (bold) {
            element.setAttribute("font-weight", "bold");
        }
        element.appendChild(getDOMFactory().createTextNode(text));
        setPaint(ink);
        domGroupManager.addElement(element, DOMGroupManager.FILL);
    }

    /** The document. {@code title} and {@code description} are what a screen reader says. */
    byte[] document(String title, String description) {
        Element root = getRoot();
        lean(root);
        root.setAttribute("width", getGeneratorContext().doubleString(paperWidth));
        root.setAttribute("height", getGeneratorContext().doubleString(paperHeight));
        root.setAttribute(
                "viewBox",
                "0 0 " + getGeneratorContext().doubleString(paperWidth) + " "
                        + getGeneratorContext().doubleString(paperHeight));
        root.setAttribute("role", "img");
        root.setAttribute("aria-label", title);
        root.setAttribute("font-family", FONTS);
        root.setAttribute("stroke-miterlimit", "10");
        describe(root, "desc", description);
        describe(root, "title", title);
        try {
            StringWriter out = new StringWriter();
            stream(root, out, false, false);
            // Batik begins with a document type whose address some parsers would fetch; SVG needs none.
            String svg = out.toString();
            String body = svg.substring(svg.indexOf("<svg")).replace(UNUSED_NAMESPACE, "");
            return ("<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n" + body).getBytes(StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private void describe(Element root, String name, String text) {
        if (!text.isEmpty()) {
            Element element = root.getOwnerDocument().createElementNS(SVG, name);
            element.appendChild(root.getOwnerDocument().createTextNode(text));
            root.insertBefore(element, root.getFirstChild());
        }
    }

    /** Batik states every graphic attribute on the outer group; what is SVG's own default, or a font, is left out. */
    private static void lean(Node node) {
        for (Node child = node.getFirstChild(); child != null; ) {
            Node next = child.getNextSibling();
            if (child instanceof Element element) {
                lean(element);
                boolean emptyShell = (element.getTagName().equals("g")
                                || element.getTagName().equals("defs"))
                        && !element.hasChildNodes();
                if (emptyShell) {
                    node.removeChild(element);
                }
            } else if (child.getNodeType() == Node.COMMENT_NODE) {
                node.removeChild(child);
            }
            child = next;
        }
        NamedNodeMap attributes = node.getAttributes();
        for (int i = attributes.getLength() - 1; i >= 0; i--) {
            Node attribute = attributes.item(i);
            String value = DEFAULTS.get(attribute.getNodeName());
            if (value != null && (value.isEmpty() || value.equals(attribute.getNodeValue()))) {
                ((Element) node).removeAttribute(attribute.getNodeName());
            }
        }
    }

    /** Attribute to the value at which it is dropped; empty for always. */
    private static final Map<String, String> DEFAULTS = Map.ofEntries(
            Map.entry("color-rendering", ""),
            Map.entry("color-interpolation", ""),
            Map.entry("shape-rendering", ""),
            Map.entry("text-rendering", ""),
            Map.entry("image-rendering", ""),
            Map.entry("font-family", ""),
            Map.entry("font-style", ""),
            Map.entry("stroke-miterlimit", ""),
            Map.entry("stroke-dashoffset", "0"),
            Map.entry("fill-opacity", "1"),
            Map.entry("stroke-opacity", "1"));

    @Override
    public Graphics create() {
        return new SvgPaper(this);
    }

    @Override
    public void setRenderingHint(RenderingHints.Key key, Object value) {
        // Hints describe pixels; a drawing of lines has none.
    }

    @Override
    @SuppressWarnings("rawtypes") // Batik declares it so
    public void setRenderingHints(Map hints) {
        // See setRenderingHint.
    }

    @Override
    @SuppressWarnings("rawtypes") // Batik declares it so
    public void addRenderingHints(Map hints) {
        // See setRenderingHint.
    }

    @Override
    public void clip(Shape shape) {
        // Layers are cut to the drawing area before they are drawn.
    }

    @Override
    public void setClip(Shape shape) {
        // See clip.
    }

    @Override
    public void setClip(int x, int y, int width, int height) {
        // See clip.
    }

    @Override
    public void clipRect(int x, int y, int width, int height) {
        // See clip.
    }

    @Override
    public Rectangle getClipBounds() {
        return new Rectangle(0, 0, (int) Math.ceil(paperWidth), (int) Math.ceil(paperHeight));
    }
}
