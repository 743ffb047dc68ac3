package org.saddlebook.desk.internal;

import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.Scrollable;
import net.miginfocom.swing.MigLayout;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Marks;
import org.saddlebook.desk.api.NodeViews;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.presentation.api.QuantityText;
import org.saddlebook.presentation.api.Rounding;

/** Shows any section: quantities and words as lines, tables as tables, figures as figures, its points as marks. */
final class DefaultPanel implements DeskPanel {
    private static final int DEEPEST = 12;

    private final String id;
    private final String title;
    private final DeskContext context;
    private final Services services;
    private final Strip strip = new Strip();
    private Optional<JPanel> content = Optional.empty();
    private Optional<JScrollPane> scroll = Optional.empty();
    private Optional<Section> section = Optional.empty();

    DefaultPanel(String id, String title, DeskContext context, Services services) {
        this.id = id;
        this.title = title;
        this.context = context;
        this.services = services;
        context.onScale(strip::repaint);
    }

    @Override
    public String title() {
        return title;
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (scroll.isEmpty()) {
            JPanel lines = new Lines();
            content = Optional.of(lines);
            JScrollPane pane = new JScrollPane(lines);
            pane.setBorder(BorderFactory.createEmptyBorder());
            pane.setOpaque(false);
            pane.getViewport().setOpaque(false);
            pane.getVerticalScrollBar().setUnitIncrement(24);
            pane.getVerticalScrollBar().getAccessibleContext().setAccessibleName("Scroll " + title);
            scroll = Optional.of(pane);
            fill();
        }
        return scroll.get();
    }

    @Override
    public void show(DeskState state) {
        Optional<Section> next = state.findings().flatMap(findings -> findings.section(id));
        if (!next.equals(section)) {
            section = next;
            strip.points(next);
            fill();
        }
    }

    @Override
    public String sentence() {
        if (section.isEmpty()) {
            return "Nothing found.";
        }
        return switch (section.get().outcome()) {
            case DONE ->
                note(section.get()).orElse("No panel for this section is installed; it is shown as it was found.");
            case REFUSED, FAILED -> reason(section.get());
        };
    }

    /** Sections say the most important thing in their summary or as the first of their notes. */
    private static Optional<String> note(Section section) {
        if (section.body() instanceof Node.Group body
                && body.get("summary").orElse(null) instanceof Node.Text summary) {
            return Optional.of(summary.value());
        }
        boolean first = section.body() instanceof Node.Group group
                && group.get("notes").orElse(null) instanceof Node.Items notes
                && !notes.items().isEmpty()
                && notes.items().get(0) instanceof Node.Text;
        if (!first) {
            return Optional.empty();
        }
        Node.Items notes = (Node.Items) ((Node.Group) section.body()).members().get("notes");
        return Optional.of(((Node.Text) notes.items().get(0)).value());
    }

    private static String reason(Section section) {
        if (section.body() instanceof Node.Group group && group.get("reason").orElse(null) instanceof Node.Text text) {
            return text.value();
        }
        return "It gave no reason.";
    }

    private void fill() {
        content.ifPresent(panel -> {
            panel.removeAll();
            section.ifPresent(s -> add(panel, s, "", s.body(), 0));
            panel.revalidate();
            panel.repaint();
        });
    }

    private void add(JPanel panel, Section from, String name, Node node, int depth) {
        if (depth > DEEPEST) {
            return;
        }
        String indent = "gapleft " + Math.max(0, depth - 1) * 16;
        if (node instanceof Node.Group group) {
            heading(panel, name, indent);
            group.members().forEach((key, member) -> add(panel, from, words(key), member, depth + 1));
        } else if (node instanceof Node.Items items) {
            heading(panel, name, indent);
            int number = 1;
            for (Node item : items.items()) {
                add(panel, from, Integer.toString(number), item, depth + 1);
                number++;
            }
        } else if (node instanceof Node.Table table) {
            heading(panel, name, indent);
            panel.add(table(name.isEmpty() ? title : name, table), "span 2, growx, wmin 100, " + indent);
        } else if (node instanceof Node.Figure figure) {
            heading(panel, figure.title(), indent);
            panel.add(figure(figure, from.cautions()), "span 2, growx, wmin 100, h 300!, " + indent);
        } else {
            line(panel, name, text(node), indent);
        }
    }

    private void heading(JPanel panel, String name, String indent) {
        if (!name.isEmpty()) {
            Ink ink = context.ink();
            Prose heading = new Prose(1, true, ink.ink(), 2, ink);
            heading.setText(name);
            panel.add(heading, "span 2, growx, wmin 80, gaptop 6, " + indent);
        }
    }

    private void line(JPanel panel, String name, String text, String indent) {
        Ink ink = context.ink();
        Prose key = new Prose(0.92, false, ink.faint(), 2, ink);
        key.setText(name);
        Prose value = new Prose(0.92, false, ink.ink(), 12, ink);
        value.setText(text);
        panel.add(key, "w 120:180:220, aligny top, " + indent);
        panel.add(value, "growx, wmin 80");
    }

    private JComponent table(String name, Node.Table table) {
        return services.find(NodeViews.class)
                .map(views -> views.table(name, table, context))
                .orElseGet(() -> PlainTable.of(name, table, context.ink()));
    }

    private JComponent figure(Node.Figure figure, Map<String, String> cautions) {
        return services.find(NodeViews.class)
                .map(views -> views.figure(figure, cautions, context))
                .orElseGet(() -> new PlainFigure(figure, cautions, context, services));
    }

    /** A value in words. */
    static String text(Node node) {
        if (node instanceof Node.Quantity quantity) {
            return QuantityText.withInterval(quantity);
        }
        if (node instanceof Node.Scalar scalar) {
            return Rounding.shortest(scalar.value());
        }
        if (node instanceof Node.Flag flag) {
            return flag.value() ? "yes" : "no";
        }
        if (node instanceof Node.Text text) {
            return text.value();
        }
        if (node instanceof Node.Matrix matrix) {
            return matrixText(matrix);
        }
        return "";
    }

    private static String matrixText(Node.Matrix matrix) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < matrix.rows(); i++) {
            text.append(i == 0 ? "" : "\n");
            for (int j = 0; j < matrix.columns(); j++) {
                text.append(j == 0 ? "" : "    ").append(Rounding.significant(matrix.get(i, j), 5));
            }
        }
        return text.toString();
    }

    /** {@code lowerCamelCase} as words; symbols stay as they are. */
    static String words(String key) {
        if (key.length() <= 3) {
            return key;
        }
        StringBuilder words = new StringBuilder();
        for (int i = 0; i < key.length(); i++) {
            char c = key.charAt(i);
            boolean start = Character.isUpperCase(c) && i > 0 && Character.isLowerCase(key.charAt(i - 1));
            words.append(start ? " " : "").append(start ? Character.toLowerCase(c) : c);
        }
        return words.toString();
    }

    /** The points of the section's figures over temperature, as marks. */
    private final class Strip extends JComponent {
        private static final long serialVersionUID = 1L;

        private transient List<double[]> marks = List.of(); // kelvin, and 1 where it was excluded

        @SuppressWarnings("MixedMutabilityReturnType") // filled here and only read later
        void points(Optional<Section> found) {
            List<double[]> points = new ArrayList<>();
            found.ifPresent(s -> collect(s.body(), points, 0));
            marks = points;
            setVisible(!points.isEmpty());
            repaint();
        }

        private void collect(Node node, List<double[]> points, int depth) {
            if (depth > DEEPEST || !points.isEmpty()) {
                return;
            }
            if (node instanceof Node.Group group) {
                group.members().values().forEach(member -> collect(member, points, depth + 1));
            } else if (node instanceof Node.Items items) {
                items.items().forEach(item -> collect(item, points, depth + 1));
            } else if (node instanceof Node.Figure figure
                    && (figure.x().scale() == Axis.Scale.RECIPROCAL_TEMPERATURE
                            || figure.x().unit().equals("K"))) {
                for (Layer layer : figure.layers()) {
                    boolean excluded = layer.kind() == Layer.Kind.EXCLUDED;
                    if (excluded || layer.kind() == Layer.Kind.MEASURED) {
                        for (double kelvin : layer.x()) {
                            points.add(new double[] {kelvin, excluded ? 1 : 0});
                        }
                    }
                }
            }
        }

        @Override
        public Dimension getPreferredSize() {
            return new Dimension(200, 38);
        }

        @Override
        protected void paintComponent(Graphics graphics) {
            Graphics2D g = (Graphics2D) graphics.create();
            Prose.smooth(g);
            TemperatureScale scale = context.scale(this);
            for (double[] mark : marks) {
                if (scale.holds(mark[0])) {
                    if (mark[1] == 1) {
                        Marks.excluded(g, context.ink(), scale.x(mark[0]), getHeight() / 2.0);
                    } else {
                        Marks.measured(g, context.ink(), scale.x(mark[0]), getHeight() / 2.0);
                    }
                }
            }
            g.dispose();
        }
    }

    /** The lines keep the width of their place. */
    private static final class Lines extends JPanel implements Scrollable {
        private static final long serialVersionUID = 1L;

        Lines() {
            super(new MigLayout("insets 4 16 16 24, fillx, wrap 2, gapx 14, gapy 3", "[][fill,grow]"));
            setOpaque(false);
        }

        @Override
        public Dimension getPreferredScrollableViewportSize() {
            return getPreferredSize();
        }

        @Override
        public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
            return 24;
        }

        @Override
        public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
            return visible.height;
        }

        @Override
        public boolean getScrollableTracksViewportWidth() {
            return true;
        }

        @Override
        public boolean getScrollableTracksViewportHeight() {
            return false;
        }
    }
}
