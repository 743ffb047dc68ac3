package org.saddlebook.report.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.service.Intake;

class CsvTablesTest {
    private static Map<String, String> files(Map<String, Node> members) {
        Section section = new Section(
                "barrier", "Barrier", Section.Outcome.DONE, new Node.Group(members), Map.of("c1", "=HYPERLINK(\"x\")"));
        Map<String, String> files = new LinkedHashMap<>();
        for (Intake.Part part : new CsvTables().tables(new Findings("t", "d", List.of(), Map.of("barrier", section)))) {
            files.put(part.name(), new String(part.bytes(), StandardCharsets.UTF_8).substring(1));
        }
        return files;
    }

    @Test
    void everyQuantityHasARowWithItsPlaceUnitAndInterval() {
        Node.Quantity energy = Node.Quantity.of(-1234.5678901234, "J/mol", 10.25)
                .withInterval(new Interval(
                        Interval.Kind.BETWEEN, 0.95, OptionalDouble.of(-1260), OptionalDouble.of(-1210), "t"))
                .withCautions(List.of("c1"));
        Node model = new Node.Group(Map.of("id", new Node.Text("arrhenius"), "Ea", energy));
        String text = files(Map.of("models", new Node.Items(List.of(model)))).get("tables/quantities.csv");
        String row = "barrier.models.arrhenius.Ea,-1234.5678901234,J/mol,10.25,,between,0.95,-1260,-1210,t,c1";
        assertTrue(List.of(text.split("\r\n")).contains(row), text);
    }

    @Test
    void everyTableIsAFileWithUncertaintiesBesideTheirValues() {
        Node.Table table = new Node.Table(
                List.of(new Node.Column("T", "T", "K"), new Node.Column("run", "Run", "")),
                List.of(
                        List.of(Node.Quantity.of(300, "K", 0.5), new Node.Text("=cmd|' /C calc'!A0")),
                        List.of(Node.Quantity.of(310, "K"), new Node.Text("plain"))));
        Map<String, String> files = files(Map.of("table", table));
        assertEquals(
                "T (K),u(T),run\r\n300,0.5,'=cmd|' /C calc'!A0\r\n310,,plain\r\n",
                files.get("tables/barrier.table.csv"));
    }

    @Test
    void textsThatWouldRunAsFormulasAreNeutralInEveryFile() {
        assertEquals(
                "caution,text\r\nc1,\"'=HYPERLINK(\"\"x\"\")\"\r\n",
                files(Map.of()).get("tables/cautions.csv"));
    }
}
