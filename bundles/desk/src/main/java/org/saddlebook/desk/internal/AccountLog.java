package org.saddlebook.desk.internal;

import java.time.Instant;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.findings.Findings;

/** The running account of one campaign: a line for each decision, number and caution, in order. Event thread only. */
final class AccountLog {
    /** What a line is about. */
    enum Kind {
        DECISION,
        NUMBER,
        CAUTION,
        NOTE
    }

    /**
     * A line.
     *
     * @param when when; shown by hour and minute
     * @param text what
     * @param more the full text of a caution, the reason of a decision; empty for none
     * @param number number of a caution, 0 for others
     */
    record Line(Kind kind, Instant when, String text, String more, int number) {}

    private static final int MOST = 400;

    private final List<Line> lines = new ArrayList<>();
    private final Map<String, List<String>> numbers = new HashMap<>();
    private final Map<String, Integer> cautions = new HashMap<>();
    private int historyShown;

    List<Line> lines() {
        return List.copyOf(lines);
    }

    /** Adds what is new in the campaign's history. */
    boolean decisions(Campaign campaign) {
        List<HistoryEntry> history = campaign.history();
        int from = Math.min(historyShown, history.size());
        for (HistoryEntry entry : history.subList(from, history.size())) {
            add(new Line(Kind.DECISION, entry.when(), sentence(entry), entry.reason(), 0));
        }
        historyShown = history.size();
        return from < history.size();
    }

    /** Adds the numbers of a stratum that were not there before. */
    boolean numbers(String stratum, List<String> texts, Instant when) {
        List<String> before = numbers.getOrDefault(stratum, List.of());
        boolean added = false;
        for (String text : texts) {
            if (!before.contains(text)) {
                add(new Line(Kind.NUMBER, when, text, "", 0));
                added = true;
            }
        }
        numbers.put(stratum, List.copyOf(texts));
        return added;
    }

    /** Adds cautions that were not there before; a caution keeps its number. */
    boolean cautions(Findings findings, Instant when) {
        boolean added = false;
        for (Map.Entry<String, String> caution : findings.cautions().entrySet()) {
            if (!cautions.containsKey(caution.getKey())) {
                int number = cautions.size() + 1;
                cautions.put(caution.getKey(), number);
                add(new Line(Kind.CAUTION, when, firstSentence(caution.getValue()), caution.getValue(), number));
                added = true;
            }
        }
        return added;
    }

    /** Adds a note. */
    void note(String text, Instant when) {
        add(new Line(Kind.NOTE, when, text, "", 0));
    }

    private void add(Line line) {
        lines.add(line);
        if (lines.size() > MOST) {
            lines.remove(0);
        }
    }

    private static String sentence(HistoryEntry entry) {
        StringBuilder text = new StringBuilder(entry.what());
        if (!entry.newValue().isEmpty()) {
            text.append(": ");
            if (!entry.oldValue().isEmpty()) {
                text.append(shortened(entry.oldValue())).append(" → ");
            }
            text.append(shortened(entry.newValue()));
        }
        return text.toString();
    }

    /** Hashes and the like are for the record, not for the margin. */
    private static String shortened(String value) {
        int hash = value.indexOf(", SHA-256");
        String text = hash > 0 ? value.substring(0, hash) : value;
        return text.length() > 80 ? text.substring(0, 79) + "…" : text;
    }

    private static String firstSentence(String text) {
        int stop = text.indexOf(". ");
        int colon = text.indexOf(": ");
        int end = stop < 0 ? text.length() : stop + 1;
        return colon > 12 && colon < end ? text.substring(0, colon) + "…" : text.substring(0, end);
    }
}
