package org.saddlebook.campaign.json.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.CanonicalJson;
import org.saddlebook.json.api.JsonReader;

/**
 * Files of every version that was ever released, read forever. A fixture is added, never changed; when one no longer reads
 * as it did, the reader is wrong.
 */
class FixturesTest {
    private static final Path FIXTURES = Path.of("src", "test", "resources", "fixtures");

    private final JsonCampaignFormat format = new JsonCampaignFormat();

    static List<Path> all() throws IOException {
        try (Stream<Path> files = Files.walk(FIXTURES)) {
            return files.filter(Files::isRegularFile).sorted().toList();
        }
    }

    private static byte[] bytes(String name) throws IOException {
        return Files.readAllBytes(FIXTURES.resolve(name));
    }

    @Test
    void everyFixtureIsReadAndComesBackTheSame() throws Exception {
        List<Path> fixtures = all();
        assertTrue(fixtures.size() >= 3, fixtures.toString());
        for (Path fixture : fixtures) {
            byte[] json = Files.readAllBytes(fixture);
            String name = fixture.getFileName().toString();
            if (name.startsWith("campaign")) {
                Campaign campaign = format.readCampaign(name, json);
                assertEquals(campaign, format.readCampaign(name, format.campaign(campaign)));
            } else {
                Findings findings = format.readFindings(name, json);
                assertEquals(findings, format.readFindings(name, format.findings(findings)));
            }
        }
    }

    /**
     * A register holds such digests. Both agree with a canonical form and hash made by a Python 3 program of our own (json,
     * decimal, hashlib) from the JSON as written.
     */
    @Test
    void digestsStay() throws Exception {
        assertEquals(
                "560162ccbc08f109158e662f7e005e6b5236ee331f9c9156e59805eab3b7c0b3",
                format.digest(format.readCampaign("f", bytes("v1/campaign-full.json"))));
        assertEquals(
                "97da14cf9a688ea3092d5190fb2eb9f0ed10911befc96a4a35b0257970a3fbcc",
                format.digest(format.readCampaign("f", bytes("v1/campaign-by-hand.json"))));
    }

    @Test
    void versionOneIsWhatIsWritten() throws Exception {
        Campaign campaign = format.readCampaign("f", bytes("v1/campaign-full.json"));
        assertSame("v1/campaign-full.json", format.campaign(campaign));
        Findings findings = format.readFindings("f", bytes("v1/findings-full.json"));
        assertSame("v1/findings-full.json", format.findings(findings));
    }

    private static void assertSame(String fixture, byte[] written) throws IOException, InputException {
        assertEquals(
                new String(CanonicalJson.bytes(JsonReader.read("f", bytes(fixture))), StandardCharsets.UTF_8),
                new String(CanonicalJson.bytes(JsonReader.read("f", written)), StandardCharsets.UTF_8));
    }

    @Test
    void versionOneKeepsItsMeaning() throws Exception {
        Campaign campaign = format.readCampaign("f", bytes("v1/campaign-full.json"));
        RatePoint second = campaign.rateTable().orElseThrow().points().get(1);
        assertEquals("stirrer stopped", second.excluded().orElseThrow());
        assertEquals(0.1, second.kelvinUncertainty().orElseThrow());
        assertEquals("L/(mol.s)", campaign.rateTable().orElseThrow().rateUnit().code());
        assertEquals(9007199254740991L, campaign.choices().seed());
        assertEquals(2, campaign.history().size());
        Findings findings = format.readFindings("f", bytes("v1/findings-full.json"));
        Node.Group barrier =
                (Node.Group) findings.section("barrier").orElseThrow().body();
        assertTrue(barrier.get("covariance").orElseThrow() instanceof Node.Matrix);
        assertTrue(barrier.get("ragged").orElseThrow() instanceof Node.Items);
        assertTrue(barrier.get("predictions").orElseThrow() instanceof Node.Table);
        assertTrue(barrier.get("plot").orElseThrow() instanceof Node.Figure);
        Node.Group parameters = (Node.Group) barrier.get("parameters").orElseThrow();
        assertTrue(parameters.members().values().stream().allMatch(node -> node instanceof Node.Quantity));
        assertEquals(
                "Other words.",
                findings.section("com.example.isotopes")
                        .orElseThrow()
                        .cautions()
                        .get("extrapolated"));
    }

    @Test
    void aCampaignWrittenByHandIsConvertedToSi() throws Exception {
        Campaign campaign = format.readCampaign("f", bytes("v1/campaign-by-hand.json"));
        List<RatePoint> points = campaign.rateTable().orElseThrow().points();
        assertEquals(298.15, points.get(0).kelvin());
        assertEquals(0.002, points.get(0).rate());
        assertEquals(0.0001, points.get(0).rateUncertainty().orElseThrow());
        assertEquals(308.15, points.get(1).kelvin());
        assertEquals(0.0051, points.get(1).rate());
        assertEquals(0.0002, points.get(1).rateUncertainty().orElseThrow());
        assertEquals(318.15, points.get(2).kelvin());
        assertEquals(0.5, points.get(2).kelvinUncertainty().orElseThrow());
        assertEquals("1/min", campaign.rateTable().orElseThrow().rateUnit().code());
        assertEquals(List.of(293.15, 300.0), campaign.choices().targetsKelvin());
        assertEquals(StandardState.ONE_BAR, campaign.choices().standard().orElseThrow());
        Node.Group thermo = (Node.Group) campaign.settings().get("spontaneity");
        assertEquals(Node.Quantity.of(-92.2, "kJ/mol", 0.4), thermo.get("dH").orElseThrow());
    }
}
