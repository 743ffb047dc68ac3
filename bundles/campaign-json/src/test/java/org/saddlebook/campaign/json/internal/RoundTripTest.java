package org.saddlebook.campaign.json.internal;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.time.Instant;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonDocument;
import org.saddlebook.json.api.PrettyJson;

class RoundTripTest {
    private final JsonCampaignFormat format = new JsonCampaignFormat();

    private static Node through(Node node) throws InputException {
        byte[] json = PrettyJson.bytes(NodeWriter.write(node));
        return NodeReader.read(JsonDocument.read("node.json", json).cursor());
    }

    @Property(tries = 2000)
    void everyTreeComesBackTheSame(@ForAll long seed) throws InputException {
        Node node = new RandomTrees(seed).node(4);
        assertEquals(node, through(node));
    }

    @Property(tries = 500)
    void findingsComeBackTheSame(@ForAll long seed) throws InputException {
        Findings findings = new RandomTrees(seed).findings();
        byte[] json = format.findings(findings);
        Findings again = format.readFindings("findings.json", json);
        assertEquals(findings, again);
        assertEquals(
                new ArrayList<>(findings.sections().keySet()),
                new ArrayList<>(again.sections().keySet()),
                "order of sections");
        assertArrayEquals(json, format.findings(again));
    }

    @Property(tries = 1000)
    void campaignsComeBackTheSame(@ForAll long seed) throws InputException {
        Campaign campaign = new RandomTrees(seed).campaign();
        byte[] json = format.campaign(campaign);
        Campaign again = format.readCampaign("campaign.json", json);
        assertEquals(campaign, again);
        assertEquals(format.digest(campaign), format.digest(again));
        assertArrayEquals(json, format.campaign(again));
    }

    @Example
    void emptyThingsKeepTheirKind() throws InputException {
        for (Node node : List.of(
                new Node.Items(List.of()),
                new Node.Group(Map.of()),
                new Node.Table(List.of(), List.of()),
                new Node.Items(List.of(new Node.Items(List.of()))),
                new Node.Text(""))) {
            assertEquals(node, through(node));
        }
    }

    @Example
    void twoSectionsMayWordOneCautionDifferently() throws InputException {
        Node body = new Node.Group(Map.of());
        Findings findings = new Findings(
                "t",
                "d",
                List.of(),
                Map.of(
                        "a", Section.done("a", "A", body, Map.of("far", "10 K away")),
                        "b", Section.done("b", "B", body, Map.of("far", "20 K away"))));
        assertEquals(findings, format.readFindings("f", format.findings(findings)));
    }

    @Example
    void historyDoesNotChangeTheDigest() {
        Campaign campaign = new RandomTrees(1).campaign();
        Campaign longer =
                campaign.withHistory(new HistoryEntry("a", Instant.EPOCH, "title changed", "", "", "a reason"));
        assertEquals(format.digest(campaign), format.digest(longer));
        assertNotEquals(format.digest(campaign), format.digest(campaign.withTitle("other")));
    }

    @Example
    void refusesTreesThatCouldNotBeReadAgain() {
        Node node = new Node.Items(List.of());
        for (int i = 0; i < 300; i++) {
            node = new Node.Items(List.of(node));
        }
        Node deep = node;
        assertThrows(IllegalArgumentException.class, () -> NodeWriter.write(deep));
        assertThrows(IllegalArgumentException.class, () -> NodeWriter.write(new Node.Text("\ud800")));
    }
}
