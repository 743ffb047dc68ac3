package org.saddlebook.evaluation.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.function.Consumer;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Contained;
import org.saddlebook.api.task.Task;

/** Runs analyses in order; one that breaks leaves a failed section and the rest goes on. */
final class Evaluator {
    private final Map<String, Analysis> analyses;
    private final Map<String, String> bundles;

    /**
     * An evaluator over these analyses.
     *
     * @param analyses section id to analysis
     * @param bundles section id to the symbolic name of its bundle
     */
    Evaluator(Map<String, Analysis> analyses, Map<String, String> bundles) {
        this.analyses = analyses;
        this.bundles = bundles;
    }

    /**
     * Findings without contributors.
     *
     * @param ran told the id of each section that was computed
     */
    Findings evaluate(Campaign campaign, String digest, Task task, Consumer<String> ran) throws Cancelled {
        Map<String, Section> sections = new LinkedHashMap<>();
        Map<String, Set<String>> reads = new TreeMap<>();
        for (Map.Entry<String, Analysis> entry : analyses.entrySet()) {
            String culprit = culprit(entry.getKey());
            Contained<Set<String>> answer = task.contain(
                    culprit, () -> entry.getValue().appliesTo(campaign) ? readBy(entry.getValue()) : Set.of(LEFT_OUT));
            if (answer instanceof Contained.Broke<Set<String>> broke) {
                sections.put(entry.getKey(), Section.failed(entry.getKey(), entry.getKey(), broke.reason()));
            } else if (answer instanceof Contained.Answer<Set<String>> given
                    && !given.value().contains(LEFT_OUT)) {
                reads.put(entry.getKey(), given.value());
            }
        }
        Schedule schedule = Schedule.of(reads);
        for (String section : schedule.cyclic()) {
            sections.put(
                    section,
                    Section.refused(
                            section,
                            section,
                            culprit(section) + " reads sections that read it in turn: "
                                    + String.join(", ", schedule.cyclic())));
        }
        List<String> order = schedule.order();
        for (int i = 0; i < order.size(); i++) {
            String id = order.get(i);
            task.check();
            task.progress(i / (double) order.size(), id);
            sections.put(id, section(id, reads.get(id), campaign, digest, sections, task));
            ran.accept(id);
        }
        task.progress(1, "done");
        return new Findings(campaign.title(), digest, List.of(), sections);
    }

    private static final String LEFT_OUT = "\0left out";

    private static Set<String> readBy(Analysis analysis) {
        return Set.copyOf(analysis.reads());
    }

    private Section section(
            String id, Set<String> reads, Campaign campaign, String digest, Map<String, Section> done, Task task)
            throws Cancelled {
        Map<String, Section> earlier = new LinkedHashMap<>(done);
        earlier.keySet().retainAll(reads);
        Findings view = new Findings(campaign.title(), digest, List.of(), earlier);
        Contained<Section> answer =
                task.contain(culprit(id), () -> analyses.get(id).analyse(campaign, view, task));
        if (answer instanceof Contained.Answer<Section> given) {
            return given.value().id().equals(id)
                    ? given.value()
                    : Section.failed(
                            id,
                            id,
                            culprit(id) + " wrote a section named "
                                    + given.value().id());
        }
        return Section.failed(id, id, ((Contained.Broke<Section>) answer).reason());
    }

    private String culprit(String section) {
        return "analysis " + section + " of bundle " + bundles.getOrDefault(section, "unknown");
    }
}
