package org.saddlebook.desk.components.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Node;

class TableContentTest {
    private static final CautionNumbers NUMBERS = new CautionNumbers(List.of("first", "second"));

    private static final Node.Table TABLE = new Node.Table(
            List.of(
                    new Node.Column("law", "Law", ""),
                    new Node.Column("Ea", "Ea", "J/mol"),
                    new Node.Column("n", "n", "1")),
            List.of(
                    List.of(
                            new Node.Text("=HYPERLINK(\"x\")"),
                            Node.Quantity.of(84012.5, "J/mol", 1400).withCautions(List.of("second")),
                            new Node.Scalar(3)),
                    List.of(new Node.Text("Eyring"), Node.Quantity.of(83990, "J/mol", 1390), new Node.Scalar(-2.5))));

    @Test
    void peopleReadRoundedNumbersWithTheNumbersOfTheirCautions() {
        TableContent content = TableContent.of(TABLE, NUMBERS);
        assertEquals("84.0 ± 1.4\u00a0kJ/mol [2]", content.rows().get(0).get(1).text());
        assertEquals("3", content.rows().get(0).get(2).text());
    }

    @Test
    void aSpreadsheetGetsFullNumbersWithTheUnitInTheHeadAndTheUncertaintyBeside() {
        String[] lines =
                TableContent.of(TABLE, NUMBERS).tabSeparated(new int[] {0, 1}).split("\n", -1);
        String[] head = lines[0].split("\t", -1);
        assertEquals("Ea / J/mol", head[1]);
        assertTrue(head[2].startsWith("u(Ea)") && head[2].endsWith("/ J/mol"), head[2]);
        assertEquals(List.of("Eyring", "83990", "1390", "-2.5"), List.of(lines[2].split("\t", -1)));
    }

    @Test
    void whatASpreadsheetWouldRunIsNeutralisedOnClipboardAndInCsv() {
        TableContent content = TableContent.of(TABLE, NUMBERS);
        assertTrue(content.tabSeparated(new int[] {0}).contains("\n'=HYPERLINK"), content.tabSeparated(new int[] {0}));
        String csv = new String(content.csv(), StandardCharsets.UTF_8);
        assertTrue(csv.contains("\"'=HYPERLINK(\"\"x\"\")\""), csv);
        assertFalse(csv.contains("'-2.5"), "a negative number is no formula");
    }

    @Test
    void cellsWithUnitsOfTheirOwnHandTheUnitOn() {
        Map<String, Node> one = new LinkedHashMap<>();
        one.put("name", new Node.Text("a"));
        one.put("value", Node.Quantity.of(1, "J/mol"));
        Map<String, Node> two = new LinkedHashMap<>();
        two.put("name", new Node.Text("b"));
        two.put("value", Node.Quantity.of(2, "K"));
        TableContent content = TableContent.ofLikeGroups(List.of(new Node.Group(one), new Node.Group(two)), NUMBERS)
                .orElseThrow();
        assertEquals("name\tvalue\tunit of value\na\t1\tJ/mol\nb\t2\tK\n", content.tabSeparated(new int[] {0, 1}));
    }

    @Test
    void unlikeGroupsAreNoTable() {
        assertTrue(TableContent.ofLikeGroups(
                        List.of(
                                new Node.Group(Map.of("a", new Node.Scalar(1))),
                                new Node.Group(Map.of("b", new Node.Scalar(1)))),
                        NUMBERS)
                .isEmpty());
    }
}
