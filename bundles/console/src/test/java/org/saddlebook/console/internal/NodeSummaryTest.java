package org.saddlebook.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;

class NodeSummaryTest {
    private static String printed(Section section) {
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        PrintStream out = new PrintStream(bytes, true, StandardCharsets.UTF_8);
        new Summary(out).print(List.of(), new Findings("T", "", List.of(), Map.of(section.id(), section)));
        return bytes.toString(StandardCharsets.UTF_8).replace("\u00a0", " ");
    }

    @Test
    void aSectionOfAnUnknownBundleReadsWell() {
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("kineticIsotopeEffect", Node.Quantity.of(6.9, "1", 0.2).withCautions(List.of("rough")));
        body.put("proven", new Node.Flag(true));
        body.put("empty", new Node.Items(List.of()));
        body.put("notes", new Node.Items(List.of(new Node.Text("one"), new Node.Text("two"))));
        body.put(
                "values",
                new Node.Table(
                        List.of(new Node.Column("t", "T", "K"), new Node.Column("x", "effect", "")),
                        List.of(List.of(new Node.Scalar(300), new Node.Text("small")))));
        Section section = Section.done(
                "com.example.isotopes", "Isotopes", new Node.Group(body), Map.of("rough", "Only roughly."));
        assertEquals("""
                T

                Isotopes
                  kinetic isotope effect  6.90 ± 0.20 [1]
                  proven                  yes
                  notes
                    - one
                    - two
                  values
                    T K  effect
                    300  small

                Cautions
                  [1]  Only roughly.

                """, printed(section));
    }

    @Test
    void likeGroupsInAListAreRowsUnderOneHead() {
        Map<String, Node> one = new LinkedHashMap<>();
        one.put("temperature", Node.Quantity.of(300, "K"));
        one.put("sign", new Node.Text("positive"));
        Map<String, Node> two = new LinkedHashMap<>(one);
        two.put("sign", new Node.Text("open"));
        Section section =
                Section.done("x", "X", new Node.Items(List.of(new Node.Group(one), new Node.Group(two))), Map.of());
        assertEquals("""
                T

                X
                  temperature          sign
                  300.00 K (26.85 °C)  positive
                  300.00 K (26.85 °C)  open

                """, printed(section));
    }

    @Test
    void aRefusedSectionGivesItsReason() {
        assertEquals(
                "T\n\nX\n  refused: it does not apply\n\n", printed(Section.refused("x", "X", "it does not apply")));
    }
}
