package org.saddlebook.desk.barrier.internal;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.JComponent;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.Prediction;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Marks;
import org.saddlebook.desk.api.Reading;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.components.api.Curve;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.MarkPlaces;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.RailStrip;
import org.saddlebook.presentation.api.QuantityText;

/** Rate laws against the measured rate constants. */
final class BarrierPanel implements DeskPanel {
    private static final String EMPTY = "No law is fitted yet: it needs measured rate constants.";

    private final DeskContext context;
    private final DeskComponents components;
    private final Optional<Prediction> prediction;
    private final RailStrip strip;
    private Optional<BarrierPage> page = Optional.empty();
    private DeskState state;

    BarrierPanel(DeskContext context, DeskComponents components, Optional<Prediction> prediction) {
        this.context = context;
        this.components = components;
        this.prediction = prediction;
        this.state = context.state();
        strip = new RailStrip("Rate constants along the temperature rail", 64, context, this::marks);
    }

    @Override
    public String title() {
        return "Barrier";
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (page.isEmpty()) {
            page = Optional.of(new BarrierPage(context, components));
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

    @Override
    public String sentence() {
        return sentence(state);
    }

    static String sentence(DeskState state) {
        Optional<Section> section = state.findings().flatMap(findings -> findings.section(Laws.SECTION));
        if (section.isEmpty()) {
            return EMPTY;
        }
        Optional<Laws> laws = Laws.of(state);
        if (laws.isEmpty()) {
            return Nodes.text(section.get().body(), "reason");
        }
        Optional<Node> law = laws.get().carrying();
        if (law.isEmpty()) {
            return "No law could be fitted; open this for the reasons.";
        }
        boolean undecided = Nodes.flag(laws.get().body(), "comparison", "undecided");
        return Laws.parameters(law.get()) + " (" + Nodes.text(law.get(), "title") + ")"
                + (undecided ? "; these data cannot tell the laws apart." : ".");
    }

    @Override
    public List<String> account() {
        List<String> lines = new ArrayList<>();
        Laws.of(state).ifPresent(laws -> {
            for (Node law : laws.fitted()) {
                lines.add(Nodes.text(law, "title") + ": " + Laws.parameters(law));
            }
        });
        return lines;
    }

    @Override
    public List<DeskAction> gaps() {
        List<DeskAction> gaps = new ArrayList<>();
        Laws.of(state).ifPresent(laws -> {
            if (Nodes.flag(laws.body(), "context", "standardStateAssumed")) {
                gaps.add(DeskAction.of("standard state not stated, 1 mol/L assumed", () -> {
                    context.unfold();
                    body();
                    page.ifPresent(BarrierPage::focusStandard);
                }));
            }
        });
        return gaps;
    }

    @Override
    public List<DeskAction> actions() {
        return List.of(
                DeskAction.of("Predict the rate constant at a temperature", () -> {
                            context.unfold();
                            body();
                            page.ifPresent(BarrierPage::focusTargets);
                        })
                        .withWords("k", "target"),
                DeskAction.of("Show ln(k/T) or ln k", () -> {
                            context.unfold();
                            body();
                            page.ifPresent(BarrierPage::turn);
                        })
                        .withWords("figure", "ordinate"));
    }

    @Override
    public List<Reading> read(DeskState shown, double kelvin) {
        Optional<Laws> laws = Laws.of(shown);
        Optional<Node> law = laws.flatMap(Laws::carrying);
        if (prediction.isEmpty() || law.isEmpty()) {
            return List.of();
        }
        try {
            List<Node> rows = prediction
                    .get()
                    .predict(shown.findings().orElseThrow(), List.of(kelvin), List.of(Nodes.text(law.get(), "id")));
            if (rows.isEmpty()) {
                return List.of();
            }
            return Nodes.quantity(rows.get(0), "k")
                    .map(k -> List.of(new Reading("k", QuantityText.of(k))))
                    .orElse(List.of());
        } catch (InputException e) {
            // Said where the law is asked for; the plate leaves out what cannot be read.
            return List.of();
        }
    }

    private void marks(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height) {
        Optional<Node.Figure> figure = Laws.of(state).flatMap(laws -> Nodes.figure(laws.body(), "ln-rate"));
        if (figure.isEmpty()) {
            return;
        }
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (Layer layer : figure.get().layers()) {
            if (layer.kind() == Layer.Kind.LINE || layer.kind() == Layer.Kind.MEASURED) {
                double[] x = layer.x();
                double[] y = layer.y();
                for (int i = 0; i < x.length; i++) {
                    if (scale.holds(x[i])) {
                        low = Math.min(low, y[i]);
                        high = Math.max(high, y[i]);
                    }
                }
            }
        }
        if (!(low < high)) {
            return;
        }
        double bottom = low;
        double unit = (height - 16) / (high - low);
        int lines = 0;
        for (Layer layer : figure.get().layers()) {
            if (layer.kind() == Layer.Kind.LINE && lines < 2) {
                g.setColor(lines == 0 ? ink.plum() : ink.petrol());
                g.setStroke(
                        lines == 0
                                ? new BasicStroke(1.6f)
                                : new BasicStroke(
                                        1.6f,
                                        BasicStroke.CAP_BUTT,
                                        BasicStroke.JOIN_ROUND,
                                        1f,
                                        new float[] {7, 4},
                                        0f));
                g.draw(Curve.path(layer.x(), layer.y(), scale, y -> height - 8 - (y - bottom) * unit));
                lines++;
            }
        }
        for (Layer layer : figure.get().layers()) {
            double[] x = layer.x();
            double[] y = layer.y();
            MarkPlaces places = new MarkPlaces();
            for (int i = 0; i < x.length; i++) {
                double py = height - 8 - (y[i] - low) * unit;
                boolean inside = scale.holds(x[i]) && py >= 4 && py <= height - 4 && places.take(scale.x(x[i]), py);
                if (inside && layer.kind() == Layer.Kind.MEASURED) {
                    Marks.measured(g, ink, scale.x(x[i]), py);
                } else if (inside && layer.kind() == Layer.Kind.EXCLUDED) {
                    Marks.excluded(g, ink, scale.x(x[i]), py);
                }
            }
        }
    }
}
