package org.saddlebook.api.campaign;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.api.findings.Node;

/**
 * All that was measured and decided about one reaction. An immutable document; every change makes a new one and adds to
 * the history.
 */
public final class Campaign {
    private final String title;
    private final String notes;
    private final List<SourcePart> sources;
    private final Optional<RateTable> rateTable;
    private final Choices choices;
    private final Map<String, Node> settings;
    private final List<HistoryEntry> history;

    private Campaign(
            String title,
            String notes,
            List<SourcePart> sources,
            Optional<RateTable> rateTable,
            Choices choices,
            Map<String, Node> settings,
            List<HistoryEntry> history) {
        this.title = Objects.requireNonNull(title, "title");
        this.notes = Objects.requireNonNull(notes, "notes");
        this.sources = List.copyOf(sources);
        this.rateTable = Objects.requireNonNull(rateTable, "rateTable");
        this.choices = Objects.requireNonNull(choices, "choices");
        this.settings = Collections.unmodifiableMap(new LinkedHashMap<>(settings));
        this.history = List.copyOf(history);
    }

    /** An empty campaign with this title. */
    public static Campaign titled(String title) {
        return new Campaign(title, "", List.of(), Optional.empty(), Choices.defaults(), Map.of(), List.of());
    }

    /** Title for people. */
    public String title() {
        return title;
    }

    /** Free text about the campaign; empty for none. */
    public String notes() {
        return notes;
    }

    /** The files it was read from. */
    public List<SourcePart> sources() {
        return sources;
    }

    /** The measured rate constants; absent when the campaign has none. */
    public Optional<RateTable> rateTable() {
        return rateTable;
    }

    /** What was decided. */
    public Choices choices() {
        return choices;
    }

    /** Settings of analyses, section id to node; those of absent bundles are kept untouched. */
    public Map<String, Node> settings() {
        return settings;
    }

    /** Every change, oldest first. */
    public List<HistoryEntry> history() {
        return history;
    }

    /** The same with this title. */
    public Campaign withTitle(String newTitle) {
        return new Campaign(newTitle, notes, sources, rateTable, choices, settings, history);
    }

    /** The same with these notes. */
    public Campaign withNotes(String newNotes) {
        return new Campaign(title, newNotes, sources, rateTable, choices, settings, history);
    }

    /** The same with these sources. */
    public Campaign withSources(List<SourcePart> newSources) {
        return new Campaign(title, notes, newSources, rateTable, choices, settings, history);
    }

    /** The same with this rate table. */
    public Campaign withRateTable(RateTable table) {
        return new Campaign(title, notes, sources, Optional.of(table), choices, settings, history);
    }

    /** The same with these choices. */
    public Campaign withChoices(Choices newChoices) {
        return new Campaign(title, notes, sources, rateTable, newChoices, settings, history);
    }

    /** The same with the settings of one section replaced. */
    public Campaign withSetting(String section, Node value) {
        Map<String, Node> more = new LinkedHashMap<>(settings);
        more.put(section, value);
        return new Campaign(title, notes, sources, rateTable, choices, more, history);
    }

    /** The same with one more line of history. */
    public Campaign withHistory(HistoryEntry entry) {
        List<HistoryEntry> more = new ArrayList<>(history);
        more.add(entry);
        return new Campaign(title, notes, sources, rateTable, choices, settings, more);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Campaign c
                && title.equals(c.title)
                && notes.equals(c.notes)
                && sources.equals(c.sources)
                && rateTable.equals(c.rateTable)
                && choices.equals(c.choices)
                && settings.equals(c.settings)
                && history.equals(c.history);
    }

    @Override
    public int hashCode() {
        return Objects.hash(title, notes, sources, rateTable, choices, settings, history);
    }
}
