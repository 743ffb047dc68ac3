package org.saddlebook.desk.register.internal;

import java.awt.BasicStroke;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import javax.swing.JComponent;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.RailStrip;

/** The register: what was entered, and entering. */
final class RegisterPanel implements DeskPanel {
    private static final int BARS = 4;
    private static final int BAR = 14;

    private final DeskContext context;
    private final DeskComponents components;
    private final RegisterAccess access;
    private final RailStrip strip;
    private Optional<RegisterPage> page = Optional.empty();
    private Optional<List<EntryRow>> rows = Optional.empty();
    private DeskState state;

    RegisterPanel(DeskContext context, DeskComponents components, RegisterAccess access) {
        this.context = context;
        this.components = components;
        this.access = access;
        this.state = context.state();
        strip = new RailStrip(
                "Newest entries along the temperature rail: measured range solid, range of honest use outlined",
                BARS * BAR + 10,
                context,
                this::bars);
        strip.setVisible(false);
    }

    @Override
    public String title() {
        return "Register";
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        if (page.isEmpty()) {
            page = Optional.of(new RegisterPage(this, context, components, access));
            rows.ifPresent(page.get()::list);
        }
        return page.get().component();
    }

    @Override
    public void show(DeskState shown) {
        state = shown;
        if (rows.isEmpty()) {
            rows = Optional.of(List.of());
            reload();
        }
        page.ifPresent(RegisterPage::possible);
    }

    DeskState state() {
        return state;
    }

    /** Reads the list anew. */
    void reload() {
        context.run("reading the register", progress -> access.list(context, progress), read -> {
            rows = Optional.of(read);
            page.ifPresent(open -> open.list(read));
            strip.setVisible(!read.isEmpty());
            strip.repaint();
            context.refresh();
        });
    }

    @Override
    public String sentence() {
        List<EntryRow> read = rows.orElse(List.of());
        if (read.isEmpty()) {
            return "Nothing entered yet: the button at the foot of the account enters this result.";
        }
        EntryRow newest = read.get(0);
        return (read.size() == 1 ? "One entry" : read.size() + " entries") + "; " + newest.number() + " "
                + newest.standing() + ".";
    }

    @Override
    public Optional<DeskAction> lastStep() {
        DeskAction enter = DeskAction.of("Enter in the register", this::enter).withWords("sign", "save", "record");
        return Optional.of(obstacle().map(enter::notNow).orElse(enter));
    }

    /** Why the state shown cannot be entered; empty when it can. */
    Optional<String> obstacle() {
        if (!state.problems().isEmpty()) {
            return Optional.of("The campaign has problems that must be put right first.");
        }
        if (state.findings().isEmpty() || state.effective().isEmpty()) {
            return Optional.of("There are no findings yet.");
        }
        if (!state.current()) {
            return Optional.of("The campaign is being evaluated; what is shown belongs to an earlier state.");
        }
        return access.hasResult(state.findings().get())
                ? Optional.empty()
                : Optional.of("Nothing could be evaluated, so there is nothing to enter.");
    }

    @Override
    public List<DeskAction> actions() {
        List<DeskAction> actions = new ArrayList<>();
        lastStep().ifPresent(actions::add);
        actions.add(DeskAction.of("Verify the register", () -> {
                    context.unfold();
                    body();
                    page.ifPresent(RegisterPage::verify);
                })
                .withWords("check", "integrity"));
        actions.add(DeskAction.of("Search the register", () -> {
                    context.unfold();
                    body();
                    page.ifPresent(RegisterPage::focusSearch);
                })
                .withWords("find", "entry"));
        return actions;
    }

    private void enter() {
        context.ask(
                "What does your name, " + context.user() + ", under this entry mean?",
                "measured and evaluated by me",
                meaning -> enter(meaning, "", OptionalLong.empty()));
    }

    /** Asks why and enters the state shown in the place of an entry. */
    void supersede(long number) {
        context.ask(
                "Why does this result take the place of entry " + number + "? The older entry stays readable.",
                "",
                reason -> enter("measured and evaluated by me", reason, OptionalLong.of(number)));
    }

    private void enter(String meaning, String reason, OptionalLong supersedes) {
        DeskState entered = state;
        context.run(
                "entering in the register",
                progress -> access.enter(context, entered, meaning, reason, supersedes, progress),
                receipt -> {
                    context.note("Entered as " + receipt.number()
                            + (supersedes.isPresent() ? ", in the place of entry " + supersedes.getAsLong() : "")
                            + ".");
                    reload();
                });
    }

    private void bars(Graphics2D g, TemperatureScale scale, Ink ink, int width, int height) {
        List<EntryRow> read = rows.orElse(List.of());
        g.setFont(ink.font(0.85, false));
        double y = 5;
        int drawn = 0;
        for (EntryRow row : read) {
            if (drawn == BARS || row.measured().isEmpty()) {
                continue;
            }
            EntryRow.Range measured = row.measured().get();
            EntryRow.Range honest = row.honest().orElse(measured);
            double left = clamp(scale, honest.low());
            double right = clamp(scale, honest.high());
            g.setColor(ink.ink());
            g.setStroke(new BasicStroke(1f));
            g.draw(new Rectangle2D.Double(left, y, Math.max(1, right - left), BAR - 4));
            double from = clamp(scale, measured.low());
            double to = clamp(scale, measured.high());
            g.fill(new Rectangle2D.Double(from, y, Math.max(1, to - from), BAR - 4));
            String name = Long.toString(row.number());
            double x = left - 6 - g.getFontMetrics().stringWidth(name);
            // Where the bar begins at the left end of the rail, its number stands behind it.
            g.drawString(name, (float) (x < 2 ? right + 6 : x), (float) (y + BAR - 5));
            y += BAR;
            drawn++;
        }
    }

    private static double clamp(TemperatureScale scale, double kelvin) {
        return Math.max(scale.left(), Math.min(scale.x(kelvin), scale.right()));
    }
}
