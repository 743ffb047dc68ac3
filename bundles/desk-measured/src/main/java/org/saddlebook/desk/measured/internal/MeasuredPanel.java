package org.saddlebook.desk.measured.internal;

import java.awt.Graphics2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.TreeSet;
import javax.swing.JComponent;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Marks;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.Exclusions;
import org.saddlebook.desk.components.api.MarkPlaces;
import org.saddlebook.desk.components.api.RailStrip;
import org.saddlebook.presentation.api.UnitText;

/** What was imported, how it was understood, and which points count. */
final class MeasuredPanel implements DeskPanel {
    private static final String EMPTY =
            "Nothing measured yet: drop a table of temperatures and rate constants anywhere on this window.";

    private final DeskContext context;
    private final DeskComponents components;
    private final RailStrip strip;
    private Optional<MeasuredPage> page = Optional.empty();
    private DeskState state;

    MeasuredPanel(DeskContext context, DeskComponents components) {
        this.context = context;
        this.components = components;
        this.state = context.state();
        strip = new RailStrip("Measured points on the temperature rail", 40, context, this::marks);
    }

    @Override
    public String title() {
        return "Measured";
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (page.isEmpty()) {
            page = Optional.of(new MeasuredPage(this, context, components));
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
        Optional<RateTable> table = state.campaign().rateTable();
        if (table.isEmpty()) {
            return state.problems().isEmpty()
                    ? EMPTY
                    : state.problems().size() == 1
                            ? "The file could not be read: open this to put one thing right."
                            : "The file could not be read: open this to put "
                                    + state.problems().size() + " things right.";
        }
        return summary(table.get());
    }

    /** How many points, where, in which unit. */
    static String summary(RateTable table) {
        TreeSet<Double> kelvin = new TreeSet<>();
        int excluded = 0;
        for (RatePoint point : table.points()) {
            kelvin.add(point.kelvin());
            excluded += point.excluded().isPresent() ? 1 : 0;
        }
        int points = table.points().size();
        String range = kelvin.size() == 1
                ? " at " + Exclusions.celsius(kelvin.first())
                : " at " + kelvin.size() + " temperatures, " + Exclusions.celsius(kelvin.first()) + " to "
                        + Exclusions.celsius(kelvin.last());
        String unit = UnitText.forPeople(table.rateUnit().code());
        return points + (points == 1 ? " point" : " points") + range + "; k in " + unit
                + (excluded == 0 ? "." : "; " + excluded + " excluded.");
    }

    @Override
    public List<DeskAction> gaps() {
        List<DeskAction> gaps = new ArrayList<>();
        if (state.campaign().rateTable().isEmpty()) {
            gaps.add(DeskAction.of("no measured rate constants", context::unfold));
        }
        return gaps;
    }

    @Override
    public List<DeskAction> actions() {
        List<DeskAction> actions = new ArrayList<>();
        actions.add(DeskAction.of("Read the file again by another rule", this::openRule)
                .withWords("unit", "separator"));
        actions.add(DeskAction.of("Save the reading rule", () -> {
                    context.unfold();
                    body();
                    page.ifPresent(MeasuredPage::saveRule);
                })
                .withWords("layout", "instrument"));
        for (int i = 0; i < points().size() && i < 60; i++) {
            RatePoint point = points().get(i);
            int index = i;
            String name = Exclusions.name(point);
            actions.add(
                    point.excluded().isPresent()
                            ? DeskAction.of("Use " + name + " again", () -> Exclusions.toggle(context, index))
                            : DeskAction.of("Exclude " + name, () -> Exclusions.toggle(context, index)));
        }
        return actions;
    }

    private void openRule() {
        context.unfold();
        body();
        page.ifPresent(MeasuredPage::focusRule);
    }

    private List<RatePoint> points() {
        return state.campaign().rateTable().map(RateTable::points).orElse(List.of());
    }

    /** Reads the file again with one option of the rule changed; an empty value leaves it to the reader. */
    void option(String key, String value, String what) {
        Map<String, String> options = new TreeMap<>(state.rule().options());
        if (value.equals(options.getOrDefault(key, ""))) {
            return;
        }
        if (value.isEmpty()) {
            options.remove(key);
        } else {
            options.put(key, value);
        }
        context.reread(
                new ReadingRule(options), value.isEmpty() ? what + " left to the reader" : what + " read as " + value);
    }

    private void marks(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height) {
        MarkPlaces used = new MarkPlaces();
        MarkPlaces excluded = new MarkPlaces();
        for (RatePoint point : points()) {
            double x = scale.x(point.kelvin());
            MarkPlaces places = point.excluded().isPresent() ? excluded : used;
            if (!places.take(x, 0)) {
                continue;
            }
            if (point.excluded().isPresent()) {
                Marks.excluded(g, ink, x, height / 2.0);
            } else {
                Marks.measured(g, ink, x, height / 2.0);
            }
        }
    }
}
