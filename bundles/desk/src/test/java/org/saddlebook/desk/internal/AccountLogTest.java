package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

class AccountLogTest {
    private static final Instant NOW = Instant.parse("2026-03-04T05:06:07Z");

    private final AccountLog log = new AccountLog();

    private static Findings findings(String... cautions) {
        Map<String, String> texts = new LinkedHashMap<>();
        for (String id : cautions) {
            texts.put(id, "About " + id + ". More about it.");
        }
        Section section = Section.done("made.up", "Made up", new Node.Group(Map.of("a", new Node.Scalar(1))), texts);
        return new Findings("t", "d", List.of(), Map.of("made.up", section));
    }

    @Test
    void aCautionKeepsItsNumberAndComesOnce() {
        assertTrue(log.cautions(findings("one", "two"), NOW));
        assertFalse(log.cautions(findings("two"), NOW));
        assertTrue(log.cautions(findings("two", "three"), NOW));
        assertEquals(
                List.of(1, 2, 3),
                log.lines().stream().map(AccountLog.Line::number).toList());
        assertEquals("About one.", log.lines().get(0).text());
        assertEquals("About one. More about it.", log.lines().get(0).more());
    }

    @Test
    void aNumberComesAgainOnlyWhenItChanged() {
        assertTrue(log.numbers("barrier", List.of("Ea 84 kJ/mol"), NOW));
        assertFalse(log.numbers("barrier", List.of("Ea 84 kJ/mol"), NOW));
        assertTrue(log.numbers("barrier", List.of("Ea 85 kJ/mol"), NOW));
        assertTrue(log.numbers("barrier", List.of("Ea 84 kJ/mol"), NOW), "back again is a change too");
        assertEquals(3, log.lines().size());
    }

    @Test
    void staysFiniteHoweverLongOneWorks() {
        for (int i = 0; i < 5000; i++) {
            log.note("note " + i, NOW);
        }
        assertTrue(log.lines().size() <= 400);
        assertEquals("note 4999", log.lines().get(log.lines().size() - 1).text());
    }
}
