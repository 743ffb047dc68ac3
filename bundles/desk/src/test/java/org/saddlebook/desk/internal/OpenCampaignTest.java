package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskState;

class OpenCampaignTest {
    private static final Instant NOW = Instant.parse("2026-03-04T05:06:07Z");

    private final OpenCampaign open = new OpenCampaign("key", DeskState.of(Campaign.titled("First")));

    private void rename(String title) {
        String before = open.state().campaign().title();
        open.apply(new Change("title", before, title, "", c -> c.withTitle(title)), "ada", NOW);
    }

    private List<String> history() {
        return open.state().campaign().history().stream()
                .map(HistoryEntry::what)
                .toList();
    }

    @Test
    void aChangeIsDoneAndWrittenDown() {
        rename("Second");
        assertEquals("Second", open.state().campaign().title());
        assertEquals(
                new HistoryEntry("ada", NOW, "title", "First", "Second", ""),
                open.state().campaign().history().get(0));
        assertTrue(open.unsaved());
        assertEquals(Optional.of("title"), open.undoable());
    }

    @Test
    void aChangeThatChangesNothingLeavesNoTrace() {
        assertFalse(open.apply(Change.of("title", c -> c), "ada", NOW));
        assertEquals(List.of(), history());
        assertFalse(open.unsaved());
    }

    @Test
    void undoGivesTheContentBackAndKeepsTheHistory() {
        rename("Second");
        rename("Third");
        open.undo("ada", NOW);
        assertEquals("Second", open.state().campaign().title());
        open.undo("ada", NOW);
        assertEquals("First", open.state().campaign().title());
        assertEquals(List.of("title", "title", "undone: title", "undone: title"), history());
        open.redo("ada", NOW);
        assertEquals("Second", open.state().campaign().title());
        assertEquals(5, history().size());
        assertEquals(Optional.of("title"), open.redoable());
    }

    @Test
    void aNewChangeAfterUndoEndsWhatCouldBeDoneAgain() {
        rename("Second");
        open.undo("ada", NOW);
        rename("Other");
        assertEquals(Optional.empty(), open.redoable());
        open.undo("ada", NOW);
        assertEquals("First", open.state().campaign().title());
    }

    @Test
    void everyChangeMakesOlderEvaluationsWorthless() {
        long before = open.edition();
        rename("Second");
        long after = open.edition();
        assertTrue(after > before);
        open.undo("ada", NOW);
        assertTrue(open.edition() > after);
    }

    @Test
    void aFileThatCouldNotBeReadStaysSoWhenSomethingElseChanges() {
        SourcePart source = new SourcePart("sources/a.csv", "0".repeat(64), 3, "");
        Problem problem = new Problem("missing-unit", Place.of("a.csv", 1), "T", "a unit", "Write one.");
        OpenCampaign unread = new OpenCampaign(
                "key",
                DeskState.of(Campaign.titled("a").withSources(List.of(source))).withProblems(List.of(problem)));
        unread.apply(Change.of("title", c -> c.withTitle("b")), "ada", NOW);
        assertEquals(List.of(problem), unread.state().problems());
    }

    @Test
    void theAccountHasALineForEachDecisionOnce() {
        rename("Second");
        open.undo("ada", NOW);
        List<String> lines =
                open.account().lines().stream().map(AccountLog.Line::text).toList();
        assertEquals(List.of("title: First → Second", "undone: title"), lines);
    }
}
