package org.saddlebook.desk.register.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.components.api.DeskComponents;
import org.saddlebook.desk.components.api.FieldFlow;
import org.saddlebook.desk.components.api.Page;
import org.saddlebook.desk.components.api.Sentence;
import org.saddlebook.desk.components.api.Sentence.Rank;
import org.saddlebook.desk.components.api.TableContent;
import org.saddlebook.desk.components.api.TableView;
import org.saddlebook.register.api.Verification;
import org.saddlebook.register.console.api.Recomputed;

/** The open stratum: search, the entries, what can be done with the chosen ones, and what came of it. */
final class RegisterPage {
    private record Pair(Findings first, Findings second) {}

    private final RegisterPanel panel;
    private final DeskContext context;
    private final RegisterAccess access;
    private final Page page;
    private final JScrollPane scroll;
    private final Sentence empty;
    private final JTextField search;
    private final TableView entries;
    private final JButton open;
    private final JButton compare;
    private final JButton recompute;
    private final JButton supersede;
    private final Sentence outcome;
    private final TableView result;
    private List<EntryRow> all = List.of();
    private List<EntryRow> listed = List.of();
    private Optional<Long> kept = Optional.empty();

    RegisterPage(RegisterPanel panel, DeskContext context, DeskComponents components, RegisterAccess access) {
        this.panel = panel;
        this.context = context;
        this.access = access;
        page = new Page("Register", context.ink());
        empty = page.put(new Sentence("Register", "", Rank.STATEMENT, context.ink()));
        FieldFlow find = page.put(new FieldFlow(context.ink()));
        search = find.field("Search", "Search the register", "", 28, text -> filter());
        search.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                filter();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                filter();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                filter();
            }
        });
        find.button("Verify", "Read the whole register again and check it", this::verify);
        find.button("Read anew", "Read the list of entries anew", panel::reload);
        entries = page.put(components.table("Entries", context))
                .withRowsInView(12)
                .onRow("Open beside this campaign", row -> open())
                .onSelection(row -> possible());
        FieldFlow deeds = page.put(new FieldFlow(context.ink()));
        open = deeds.button("Open", "Open the chosen entry beside this campaign", this::open);
        compare = deeds.button("Compare …", "Compare the chosen entry with another, value by value", this::compare);
        recompute = deeds.button("Recompute", "Evaluate the chosen entry again and compare", this::recompute);
        supersede = deeds.button(
                "Supersede …",
                "Enter this campaign's result in the place of the chosen entry",
                () -> chosen().ifPresent(row -> panel.supersede(row.number())));
        outcome = page.put(6, new Sentence("Outcome", "", Rank.STATEMENT, context.ink()));
        result = page.put(4, components.table("Result", context)).withRowsInView(18);
        result.show(TableContent.EMPTY);
        scroll = page.scrolling();
        list(List.of());
    }

    JComponent component() {
        return scroll;
    }

    void focusSearch() {
        search.requestFocusInWindow();
    }

    void list(List<EntryRow> rows) {
        all = rows;
        empty.say(rows.isEmpty() ? panel.sentence() : "");
        filter();
    }

    private void filter() {
        List<EntryRow> matching = new ArrayList<>();
        for (EntryRow row : all) {
            if (row.matches(search.getText().strip())) {
                matching.add(row);
            }
        }
        listed = matching;
        entries.show(EntryTables.entries(matching));
        if (matching.isEmpty() && !all.isEmpty()) {
            empty.say("No entry holds these words.");
        } else if (!all.isEmpty()) {
            empty.say("");
        }
        possible();
        page.revalidate();
        page.repaint();
    }

    private Optional<EntryRow> chosen() {
        int row = entries.selectedRow();
        return row >= 0 && row < listed.size() ? Optional.of(listed.get(row)) : Optional.empty();
    }

    /** What can be done follows from what is chosen and from the state shown. */
    void possible() {
        boolean one = chosen().isPresent();
        for (JButton button : new JButton[] {open, compare, recompute}) {
            button.setEnabled(one);
        }
        supersede.setEnabled(one && panel.obstacle().isEmpty());
        compare.setText(kept.isPresent() && one ? "Compare with " + kept.get() : "Compare …");
    }

    private void open() {
        chosen().ifPresent(row -> context.run(
                "opening entry " + row.number(), progress -> access.opened(context, row.number()), context::open));
    }

    /** The first press keeps an entry, the second compares it with the one chosen then. */
    private void compare() {
        if (chosen().isEmpty()) {
            return;
        }
        long number = chosen().get().number();
        if (kept.isEmpty() || kept.get() == number) {
            kept = Optional.of(number);
            outcome.say("Entry " + number + " is kept for comparison: choose another one and press Compare again.");
            possible();
            return;
        }
        long first = kept.get();
        kept = Optional.empty();
        context.run(
                "comparing entries " + first + " and " + number,
                progress -> new Pair(access.findings(context, first), access.findings(context, number)),
                pair -> {
                    TableContent differing = EntryTables.comparison(first, pair.first(), number, pair.second(), true);
                    int values = EntryTables.comparison(first, pair.first(), number, pair.second(), false)
                            .rows()
                            .size();
                    outcome.say("Of " + values + " values in entries " + first + " and " + number + ", "
                            + (differing.rows().isEmpty()
                                    ? "none differs."
                                    : differing.rows().size() + " differ; they are listed below."));
                    result.show(differing.rows().isEmpty() ? TableContent.EMPTY : differing);
                    shown();
                });
    }

    private void recompute() {
        chosen().ifPresent(row -> context.run(
                "recomputing entry " + row.number(),
                progress -> access.recompute(context, row.number(), progress),
                done -> {
                    outcome.say(sentence(row.number(), done));
                    result.show(EntryTables.differences(done));
                    shown();
                }));
    }

    private static String sentence(long number, Recomputed done) {
        return switch (done.agreement()) {
            case IDENTICAL -> "Entry " + number + " gives the same findings, bit for bit, with the same bundles.";
            case AGREES ->
                "Entry " + number + " was evaluated with other bundles; the findings agree: every number within the"
                        + " larger of 1e-9 of its value and 1e-6 of its standard uncertainty.";
            case WRITTEN_DIFFERENTLY ->
                "Entry " + number + " gives findings whose values are all equal, in other bytes.";
            case DIFFERS ->
                "Entry " + number + " gives other findings: "
                        + (done.differences().size() == 1
                                ? "one value differs."
                                : done.differences().size() + " values differ.");
            case NOT_POSSIBLE ->
                "Entry " + number + " cannot be recomputed: " + String.join(", ", done.absentModels())
                        + " is not installed here.";
        };
    }

    void verify() {
        context.run("verifying the register", progress -> access.verify(context, progress), verification -> {
            outcome.say(sentence(verification));
            result.show(TableContent.EMPTY);
            shown();
        });
    }

    private static String sentence(Verification verification) {
        if (verification.agrees()) {
            return "Everything agrees: " + verification.records() + " records, " + verification.parts()
                    + " parts read again. Root hash " + verification.head().root() + ".";
        }
        StringBuilder text = new StringBuilder("What is stored differs from what was sealed:");
        for (Verification.Difference difference : verification.differences()) {
            text.append("\n– ").append(difference.message());
        }
        return text.toString();
    }

    private void shown() {
        page.revalidate();
        page.repaint();
    }
}
