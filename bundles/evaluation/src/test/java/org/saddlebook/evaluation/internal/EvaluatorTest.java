package org.saddlebook.evaluation.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.saddlebook.api.analysis.Analysis;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

@Timeout(60)
class EvaluatorTest {
    /** What an analysis under test does. */
    private interface Work {
        Section of(String id, Findings earlier, Task task) throws Exception;
    }

    private final Map<String, Analysis> analyses = new TreeMap<>();
    private final Map<String, String> bundles = new TreeMap<>();

    @Test
    void runsAnAnalysisAfterThoseItReads() throws Cancelled {
        add(
                "alpha",
                Set.of("omega"),
                (id, earlier, task) -> done(id, earlier.sections().keySet().toString()));
        add(
                "omega",
                Set.of(),
                (id, earlier, task) -> done(id, earlier.sections().keySet().toString()));
        Findings findings = evaluate();
        assertEquals(List.of("omega", "alpha"), List.copyOf(findings.sections().keySet()));
        assertEquals("[omega]", text(findings, "alpha"));
        assertEquals("[]", text(findings, "omega"), "a section sees only what it says it reads");
    }

    @Test
    void aFailingAnalysisLosesOnlyItsOwnSectionAndIsNamed() throws Cancelled {
        add("broken", Set.of(), (id, earlier, task) -> {
            throw new IllegalStateException("no luck");
        });
        add("linked", Set.of(), (id, earlier, task) -> {
            throw new NoClassDefFoundError("com/example/Gone");
        });
        add("mute", Set.of(), (id, earlier, task) -> null);
        add("whole", Set.of("broken"), (id, earlier, task) -> done(id, "here"));
        Findings findings = evaluate();
        assertEquals(
                Section.Outcome.FAILED, findings.section("broken").orElseThrow().outcome());
        assertEquals(
                "analysis broken of bundle com.example.broken failed: IllegalStateException, no luck",
                reason(findings, "broken"));
        assertTrue(reason(findings, "linked").contains("NoClassDefFoundError, com/example/Gone"));
        assertTrue(reason(findings, "mute").contains("returned nothing"));
        assertEquals("here", text(findings, "whole"));
    }

    @Test
    void aCycleRefusesOnlyItsMembers() throws Cancelled {
        add("a", Set.of("b"), (id, earlier, task) -> done(id, ""));
        add("b", Set.of("a"), (id, earlier, task) -> done(id, ""));
        add("c", Set.of("a"), (id, earlier, task) -> done(id, "here"));
        Findings findings = evaluate();
        assertEquals(
                Section.Outcome.REFUSED, findings.section("a").orElseThrow().outcome());
        assertEquals(
                Section.Outcome.REFUSED, findings.section("b").orElseThrow().outcome());
        assertEquals("here", text(findings, "c"));
    }

    @Test
    void aSectionUnderAForeignNameIsNotTaken() throws Cancelled {
        add("a", Set.of(), (id, earlier, task) -> done("barrier", "stolen"));
        assertEquals(
                Section.Outcome.FAILED, evaluate().section("a").orElseThrow().outcome());
    }

    @Test
    void aHangingAnalysisIsLeftBehindWhileItsOuterOneGoesOn() throws Cancelled {
        CountDownLatch never = new CountDownLatch(1);
        add("outer", Set.of(), (id, earlier, task) -> {
            String inner = task.contain("model x of bundle y", () -> never.await(1, TimeUnit.DAYS))
                    .toString();
            return done(id, inner);
        });
        String text = text(evaluate(), "outer");
        assertTrue(text.contains("model x of bundle y did not answer for"), text);
        never.countDown();
    }

    @Test
    void cancelStopsAHangingAnalysis() {
        CountDownLatch never = new CountDownLatch(1);
        add("hangs", Set.of(), (id, earlier, task) -> {
            never.await();
            return done(id, "");
        });
        Progress cancelling = new Progress() {
            @Override
            public void report(double fraction, String doing) {}

            @Override
            public void check() throws Cancelled {
                if (Thread.currentThread().isDaemon()) {
                    return;
                }
                asked++;
                if (asked > 2) {
                    throw new Cancelled();
                }
            }

            private int asked;
        };
        Task task = new EvaluationTask(1, 1, TimeUnit.HOURS.toNanos(1), cancelling);
        assertThrows(
                Cancelled.class,
                () -> new Evaluator(analyses, bundles).evaluate(Campaign.titled("t"), "d", task, ran -> {}));
        never.countDown();
    }

    @Test
    void anAnalysisThatDoesNotApplyLeavesNoSection() throws Cancelled {
        add("a", Set.of(), (id, earlier, task) -> done(id, ""));
        Analysis applies = analyses.get("a");
        analyses.put("b", new Delegate(applies, "b", false));
        assertFalse(evaluate().sections().containsKey("b"));
    }

    private Findings evaluate() throws Cancelled {
        Task task = new EvaluationTask(1, 2, TimeUnit.MILLISECONDS.toNanos(300), Progress.NONE);
        return new Evaluator(analyses, bundles).evaluate(Campaign.titled("t"), "d", task, ran -> {});
    }

    private void add(String id, Set<String> reads, Work work) {
        bundles.put(id, "com.example." + id);
        analyses.put(id, new Analysis() {
            @Override
            public String section() {
                return id;
            }

            @Override
            public String title() {
                return id;
            }

            @Override
            public Set<String> reads() {
                return reads;
            }

            @Override
            public boolean appliesTo(Campaign campaign) {
                return true;
            }

            @Override
            public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
                try {
                    return work.of(id, earlier, task);
                } catch (Cancelled | RuntimeException passed) {
                    throw passed;
                } catch (Exception other) {
                    throw new IllegalStateException(other);
                }
            }
        });
    }

    private record Delegate(Analysis inner, String section, boolean applies) implements Analysis {
        @Override
        public String title() {
            return section;
        }

        @Override
        public Set<String> reads() {
            return inner.reads();
        }

        @Override
        public boolean appliesTo(Campaign campaign) {
            return applies;
        }

        @Override
        public Section analyse(Campaign campaign, Findings earlier, Task task) throws Cancelled {
            return inner.analyse(campaign, earlier, task);
        }
    }

    private static Section done(String id, String text) {
        return Section.done(id, id, new Node.Group(Map.of("text", new Node.Text(text))), Map.of());
    }

    private static String text(Findings findings, String section) {
        return member(findings, section, "text");
    }

    private static String reason(Findings findings, String section) {
        return member(findings, section, "reason");
    }

    private static String member(Findings findings, String section, String key) {
        Node.Group body = (Node.Group) findings.section(section).orElseThrow().body();
        return ((Node.Text) body.get(key).orElseThrow()).value();
    }
}
