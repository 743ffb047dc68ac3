package org.saddlebook.report.internal;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.service.FigureRenderer;
import org.saddlebook.api.service.Intake;

/** Draws the figures of one report and keeps them as files beside it. */
final class FigureShelf {
    private final Optional<FigureRenderer> renderer;
    private final List<Intake.Part> files = new ArrayList<>();

    FigureShelf(Optional<FigureRenderer> renderer) {
        this.renderer = renderer;
    }

    /** The figures drawn so far, {@code figures/*.svg}. */
    List<Intake.Part> files() {
        return List.copyOf(files);
    }

    String html(String section, Node.Figure figure, Map<String, String> cautions) {
        if (renderer.isEmpty()) {
            return missing(figure, "no bundle that draws figures is installed");
        }
        try {
            byte[] svg = renderer.get().svg(figure, cautions);
            String text = new String(svg, StandardCharsets.UTF_8);
            int start = text.indexOf("<svg");
            if (start < 0) {
                return missing(figure, "the bundle that draws figures returned something else than SVG");
            }
            String inline = text.substring(start);
            Optional<String> refused = FragmentCheck.figure(inline);
            if (refused.isPresent()) {
                return missing(figure, "the drawing was refused: " + refused.get());
            }
            files.add(new Intake.Part("figures/" + free(section + "-" + figure.id()) + ".svg", svg));
            return "<figure class=\"figure\">" + inline + "</figure>\n";
        } catch (RuntimeException | LinkageError | InternalError | StackOverflowError fault) {
            // A machine without fonts makes the JDK throw errors here; the numbers must reach the reader all the same.
            return missing(figure, Parts.fault(fault));
        }
    }

    private static String missing(Node.Figure figure, String reason) {
        return "<p class=\"lost\">Figure “" + Html.text(figure.title()) + "” is not drawn: " + Html.text(reason)
                + ".</p>\n";
    }

    private String free(String wanted) {
        String base = wanted.toLowerCase(Locale.ROOT).replaceAll("[^a-z0-9-]+", "-");
        String name = base;
        for (int i = 2; taken(name); i++) {
            name = base + "-" + i;
        }
        return name;
    }

    private boolean taken(String name) {
        for (Intake.Part file : files) {
            if (file.name().equals("figures/" + name + ".svg")) {
                return true;
            }
        }
        return false;
    }
}
