package org.saddlebook.desk.window.internal;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javax.swing.JComponent;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Reading;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.components.api.Curve;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.RailStrip;
import org.saddlebook.presentation.api.Rounding;

/** Where every limit holds, and how surely. */
final class WindowPanel implements DeskPanel {
    static final String SECTION = "window";
    static final String FIGURE = "headroom";

    private static final String EMPTY =
            "No limits stated yet: open this and say what the reaction must meet, such as a time or the equipment.";

    /** A probability below this is thinner than a hair. */
    private static final double NOTHING = 1e-3;

    private final DeskContext context;
    private final DeskComponents components;
    private final RailStrip strip;
    private Optional<WindowPage> page = Optional.empty();
    private DeskState state;

    WindowPanel(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        this.state = context.state();
        strip = new RailStrip("Probability that all limits hold, along the temperature rail", 52, context, this::marks);
    }

    @Override
    public String title() {
        return "Operating window";
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (page.isEmpty()) {
            page = Optional.of(new WindowPage(context, components));
            page.get().show(state);
        }
        return page.get().component();
    }

    @Override
    public void show(DeskState shown) {
        state = shown;
        strip.setVisible(spindle(shown).isPresent());
        strip.repaint();
        page.ifPresent(open -> open.show(shown));
    }

    static Optional<Section> section(DeskState state) {
        return state.findings().flatMap(findings -> findings.section(SECTION));
    }

    static Optional<Node> findings(DeskState state) {
        return section(state)
                .filter(found -> found.outcome() == Section.Outcome.DONE)
                .map(Section::body);
    }

    @Override
    public String sentence() {
        return sentence(state);
    }

    static String sentence(DeskState state) {
        Optional<Section> section = section(state);
        if (section.isEmpty() || !state.campaign().settings().containsKey(SECTION)) {
            return EMPTY;
        }
        Node body = section.get().body();
        return section.get().outcome() == Section.Outcome.DONE
                ? Nodes.text(body, "answer")
                : Nodes.text(body, "reason");
    }

    @Override
    public List<String> account() {
        return findings(state).map(body -> List.of(Nodes.text(body, "answer"))).orElse(List.of());
    }

    @Override
    public List<DeskAction> actions() {
        return List.of(DeskAction.of("State a limit of the operating window", () -> {
                    context.unfold();
                    body();
                    page.ifPresent(WindowPage::focusLimits);
                })
                .withWords("time", "hold", "equipment", "conversion"));
    }

    @Override
    public List<Reading> read(DeskState shown, double kelvin) {
        Optional<Layer> spindle = spindle(shown);
        if (spindle.isEmpty()) {
            return List.of();
        }
        OptionalDouble probability = Curve.at(spindle.get().x(), spindle.get().y(), kelvin);
        return probability.isEmpty()
                ? List.of()
                : List.of(new Reading("all limits hold", Rounding.decimals(probability.getAsDouble(), 2)));
    }

    private static Optional<Layer> spindle(DeskState state) {
        return findings(state)
                .flatMap(body -> Nodes.figure(body, FIGURE))
                .flatMap(figure -> Curve.layer(figure, Layer.Kind.SPINDLE, ""));
    }

    private void marks(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height) {
        Optional<Layer> spindle = spindle(state);
        if (spindle.isEmpty()) {
            return;
        }
        double[] x = spindle.get().x();
        double middle = height / 2.0;
        double most = height - 10;
        g.setStroke(new BasicStroke(1f));
        bodies(x, spindle.get().y(), scale, middle, most, body -> {
            g.setColor(ink.paper());
            g.fill(body);
            g.setColor(ink.ink());
            g.draw(body);
        });
        g.setColor(ink.ink());
        bodies(x, spindle.get().lower(), scale, middle, most, g::fill);
    }

    private static void bodies(
            double[] x,
            double[] thick,
            TemperatureScale scale,
            double middle,
            double most,
            java.util.function.Consumer<Path2D> draw) {
        int from = 0;
        while (from < x.length) {
            int to = from;
            while (to < x.length && thick[to] > NOTHING && scale.holds(x[to])) {
                to++;
            }
            if (to - from > 1) {
                Path2D body = new Path2D.Double();
                body.moveTo(scale.x(x[from]), middle - thick[from] * most / 2);
                for (int i = from + 1; i < to; i++) {
                    body.lineTo(scale.x(x[i]), middle - thick[i] * most / 2);
                }
                for (int i = to - 1; i >= from; i--) {
                    body.lineTo(scale.x(x[i]), middle + thick[i] * most / 2);
                }
                body.closePath();
                draw.accept(body);
            }
            from = Math.max(to, from + 1);
        }
    }
}
