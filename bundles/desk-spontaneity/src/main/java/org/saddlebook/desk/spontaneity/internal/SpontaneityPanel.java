package org.saddlebook.desk.spontaneity.internal;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javax.swing.JComponent;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
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
import org.saddlebook.presentation.api.DisplayUnit;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;

/** Gibbs energies against temperature, where their sign changes, and what was stated. */
final class SpontaneityPanel implements DeskPanel {
    static final String SECTION = "spontaneity";

    private static final String FIGURE = "gibbs-energy";
    private static final String EMPTY =
            "Nothing stated on ΔH and ΔS: state them, or an equation of known species, in the campaign's settings.";

    private final DeskContext context;
    private final DeskComponents components;
    private final RailStrip strip;
    private Optional<SpontaneityPage> page = Optional.empty();
    private DeskState state;

    SpontaneityPanel(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        this.state = context.state();
        strip = new RailStrip("Gibbs energy along the temperature rail", 46, context, this::marks);
    }

    @Override
    public String title() {
        return "Spontaneity";
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (page.isEmpty()) {
            page = Optional.of(new SpontaneityPage(context, components));
            page.get().show(state);
        }
        return page.get().component();
    }

    @Override
    public void show(DeskState shown) {
        state = shown;
        strip.repaint();
        page.ifPresent(open -> open.show(shown));
    }

    static Optional<Section> section(DeskState state) {
        return state.findings().flatMap(findings -> findings.section(SECTION));
    }

    private static Optional<Node> body(DeskState state) {
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
        if (section.isEmpty()) {
            return EMPTY;
        }
        if (section.get().outcome() != Section.Outcome.DONE) {
            return Nodes.text(section.get().body(), "reason");
        }
        List<Node> notes = Nodes.items(section.get().body(), "notes");
        String first = notes.isEmpty() || !(notes.get(0) instanceof Node.Text text) ? "" : text.value();
        StringBuilder crossovers = new StringBuilder();
        for (Node item : Nodes.items(section.get().body(), "crossovers")) {
            if (item instanceof Node.Quantity quantity) {
                crossovers
                        .append(crossovers.length() == 0 ? " Crossover " : ", ")
                        .append(QuantityText.withInterval(quantity));
            }
        }
        return first + (crossovers.length() == 0 ? "" : crossovers + ".");
    }

    @Override
    public List<String> account() {
        List<String> lines = new ArrayList<>();
        body(state).ifPresent(body -> {
            for (Node item : Nodes.items(body, "crossovers")) {
                if (item instanceof Node.Quantity quantity) {
                    lines.add("ΔG changes sign at " + QuantityText.of(quantity));
                }
            }
        });
        return lines;
    }

    @Override
    public List<Reading> read(DeskState shown, double kelvin) {
        Optional<Node.Figure> figure = body(shown).flatMap(body -> Nodes.figure(body, FIGURE));
        if (figure.isEmpty()) {
            return List.of();
        }
        Optional<Layer> line = Curve.layer(figure.get(), Layer.Kind.LINE, "");
        OptionalDouble value =
                line.isPresent() ? Curve.at(line.get().x(), line.get().y(), kelvin) : OptionalDouble.empty();
        if (value.isEmpty()) {
            return List.of();
        }
        DisplayUnit unit = DisplayUnit.of(figure.get().y().unit());
        String text = Rounding.significant(unit.value(value.getAsDouble()), 3);
        Optional<Layer> band = Curve.layer(figure.get(), Layer.Kind.CONFIDENCE_BAND, "");
        if (band.isPresent()) {
            OptionalDouble low = Curve.at(band.get().x(), band.get().lower(), kelvin);
            OptionalDouble high = Curve.at(band.get().x(), band.get().upper(), kelvin);
            if (low.isPresent() && high.isPresent() && low.getAsDouble() <= high.getAsDouble()) {
                text = text + " (" + Rounding.interval(unit.value(low.getAsDouble()), unit.value(high.getAsDouble()))
                        + ")";
            }
        }
        return List.of(new Reading("ΔG", UnitText.after(text, unit.ucum())));
    }

    private void marks(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height) {
        Optional<Node> body = body(state);
        Optional<Node.Figure> figure = body.flatMap(found -> Nodes.figure(found, FIGURE));
        if (figure.isEmpty()) {
            return;
        }
        Optional<Layer> line = Curve.layer(figure.get(), Layer.Kind.LINE, "");
        if (line.isEmpty()) {
            return;
        }
        double[] x = line.get().x();
        double[] y = line.get().y();
        double most = 0;
        for (int i = 0; i < x.length; i++) {
            most = scale.holds(x[i]) ? Math.max(most, Math.abs(y[i])) : most;
        }
        double middle = height / 2.0;
        double reach = (height - 12) / 2.0;
        double unit = most > 0 ? reach / most : 0;
        g.setColor(ink.faint());
        g.setStroke(new BasicStroke(1f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, new float[] {3, 3}, 0f));
        g.draw(new Line2D.Double(scale.left(), middle, scale.right(), middle));
        g.setColor(ink.plum());
        g.setStroke(new BasicStroke(2f));
        g.draw(Curve.path(x, y, scale, value -> middle - value * unit));
        for (Node item : Nodes.items(body.get(), "crossovers")) {
            if (item instanceof Node.Quantity quantity && quantity.value().isPresent()) {
                double px = scale.x(quantity.value().getAsDouble());
                if (scale.holds(quantity.value().getAsDouble())) {
                    g.setColor(ink.ink());
                    g.draw(new Line2D.Double(px, middle - 8, px, middle + 8));
                }
            }
        }
    }
}
