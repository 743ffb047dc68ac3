package org.saddlebook.report.internal;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Checks HTML that another bundle wrote: every tag closed, nothing that runs, loads or leads out of the report. What is
 * not on the list is refused.
 */
final class FragmentCheck {
    private static final Set<String> TEXT_ELEMENTS = Set.of(
            "a",
            "abbr",
            "aside",
            "b",
            "br",
            "caption",
            "code",
            "col",
            "colgroup",
            "dd",
            "del",
            "details",
            "dfn",
            "div",
            "dl",
            "dt",
            "em",
            "figcaption",
            "figure",
            "h3",
            "h4",
            "h5",
            "h6",
            "hr",
            "i",
            "ins",
            "kbd",
            "li",
            "ol",
            "p",
            "pre",
            "q",
            "s",
            "samp",
            "section",
            "small",
            "span",
            "strong",
            "sub",
            "summary",
            "sup",
            "table",
            "tbody",
            "td",
            "tfoot",
            "th",
            "thead",
            "tr",
            "u",
            "ul",
            "var");

    private static final Set<String> DRAWING_ELEMENTS = Set.of(
            "svg",
            "g",
            "title",
            "desc",
            "path",
            "line",
            "rect",
            "circle",
            "ellipse",
            "polygon",
            "polyline",
            "text",
            "tspan",
            "defs",
            "clipPath",
            "pattern",
            "marker",
            "linearGradient",
            "stop",
            "use");

    /** Elements that HTML never closes; they must be written {@code <br/>}. */
    private static final Set<String> EMPTY = Set.of("br", "hr", "col");

    private static final Pattern TAG = Pattern.compile(
            "<(/?)([A-Za-z][A-Za-z0-9]*)((?:\\s+[A-Za-z][A-Za-z0-9:-]*\\s*=\\s*\"[^\"<]*\")*)\\s*(/?)>");

    private static final Pattern ATTRIBUTE = Pattern.compile("([A-Za-z][A-Za-z0-9:-]*)\\s*=\\s*\"([^\"<]*)\"");

    private static final Pattern REFERENCE = Pattern.compile("&(#[0-9]+|#x[0-9a-fA-F]+|amp|lt|gt|quot|apos);");

    private FragmentCheck() {}

    /** Why a fragment of text, which may hold figures, is refused; empty when it is good. */
    static Optional<String> fragment(String html) {
        return check(html, true);
    }

    /** Why an inline SVG is refused; empty when it is good. */
    static Optional<String> figure(String svg) {
        return check(svg, false);
    }

    private static Optional<String> check(String html, boolean text) {
        Deque<String> open = new ArrayDeque<>();
        Matcher tag = TAG.matcher(html);
        int at = 0;
        while (at < html.length()) {
            int next = html.indexOf('<', at);
            int end = next < 0 ? html.length() : next;
            Optional<String> broken = references(html.substring(at, end));
            if (broken.isPresent()) {
                return broken;
            }
            if (next < 0) {
                break;
            }
            tag.region(next, html.length());
            if (!tag.lookingAt()) {
                return Optional.of("a tag cannot be read: " + html.substring(next, Math.min(html.length(), next + 40)));
            }
            String name = tag.group(2);
            boolean drawing = open.contains("svg") || name.equals("svg");
            if (!(drawing ? DRAWING_ELEMENTS : TEXT_ELEMENTS).contains(name) || (!text && !drawing)) {
                return Optional.of("element " + name + " is not allowed here");
            }
            if (!tag.group(1).isEmpty()) {
                if (open.isEmpty() || !open.pop().equals(name)) {
                    return Optional.of("tag " + name + " is closed but was not open");
                }
            } else {
                Optional<String> bad = attributes(tag.group(3));
                if (bad.isPresent()) {
                    return bad;
                }
                boolean closed = !tag.group(4).isEmpty();
                if (EMPTY.contains(name) && !closed) {
                    return Optional.of("element " + name + " is written " + name + "/");
                }
                // HTML ignores the stroke of <p/>; only drawings and elements without content may close themselves.
                if (closed && !drawing && !EMPTY.contains(name)) {
                    return Optional.of("element " + name + " needs a closing tag");
                }
                if (!closed) {
                    open.push(name);
                }
            }
            at = tag.end();
        }
        return open.isEmpty() ? Optional.empty() : Optional.of("tag " + open.peek() + " is not closed");
    }

    private static Optional<String> references(String text) {
        Matcher reference = REFERENCE.matcher(text);
        for (int i = text.indexOf('&'); i >= 0; i = text.indexOf('&', i + 1)) {
            reference.region(i, text.length());
            if (!reference.lookingAt()) {
                return Optional.of("an ampersand is not escaped");
            }
        }
        return Optional.empty();
    }

    private static Optional<String> attributes(String attributes) {
        Matcher attribute = ATTRIBUTE.matcher(attributes);
        while (attribute.find()) {
            String name = attribute.group(1);
            String value = attribute.group(2);
            boolean address =
                    name.equals("href") || name.equals("xlink:href") || name.equals("src") || name.equals("action");
            if (address && !value.startsWith("#")) {
                return Optional.of("address " + value + " leads out of the report");
            }
            if (name.startsWith("on") || name.equals("style") || name.equals("srcdoc")) {
                return Optional.of("attribute " + name + " is not allowed");
            }
            if (value.contains("url(") && !value.startsWith("url(#")) {
                return Optional.of("attribute " + name + " loads something");
            }
            Optional<String> broken = references(value);
            if (broken.isPresent()) {
                return broken;
            }
        }
        return Optional.empty();
    }
}
