package org.saddlebook.campaign.json.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;

import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Tag;
import org.saddlebook.api.problem.InputException;

/** What is written, and what is read, against the published JSON Schemas (draft 2020-12) by com.networknt's validator. */
@Tag("validation")
class SchemasValidationTest {
    private static final Schema CAMPAIGN = schema("campaign-1");
    private static final Schema FINDINGS = schema("findings-1");

    private final JsonCampaignFormat format = new JsonCampaignFormat();

    private static Schema schema(String name) {
        try (InputStream in = SchemasValidationTest.class.getResourceAsStream("/schemas/" + name + ".schema.json")) {
            return SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
                    .getSchema(new String(in.readAllBytes(), StandardCharsets.UTF_8), InputFormat.JSON);
        } catch (IOException e) {
            throw new AssertionError(e);
        }
    }

    private static List<?> errors(Schema schema, byte[] json) {
        return schema.validate(new String(json, StandardCharsets.UTF_8), InputFormat.JSON);
    }

    @Property(tries = 300)
    void writtenCampaignsAreValid(@ForAll long seed) {
        assertEquals(List.of(), errors(CAMPAIGN, format.campaign(new RandomTrees(seed).campaign())));
    }

    @Property(tries = 300)
    void writtenFindingsAreValid(@ForAll long seed) {
        assertEquals(List.of(), errors(FINDINGS, format.findings(new RandomTrees(seed).findings())));
    }

    @Example
    void fixturesOfThisVersionAreValid() throws IOException {
        for (Path fixture : FixturesTest.all()) {
            boolean campaign = fixture.getFileName().toString().startsWith("campaign");
            assertEquals(
                    List.of(), errors(campaign ? CAMPAIGN : FINDINGS, Files.readAllBytes(fixture)), fixture.toString());
        }
    }

    /** The schema and the reader refuse the same mistakes. */
    @Example
    void schemaRefusesWhatTheReaderRefuses() {
        String start = "{\"schema\":\"saddlebook/campaign/1\",\"title\":\"t\"";
        for (String rest : List.of(
                ",\"titel\":\"t\"",
                ",\"notes\":1",
                ",\"rateTable\":{\"points\":[]}",
                ",\"rateTable\":{\"points\":[{\"temperature\":\"25degC\"}]}",
                ",\"rateTable\":{\"points\":[{\"temperature\":\"25degC\",\"k\":{\"value\":1}}]}",
                ",\"choices\":{\"level\":1.5}",
                ",\"choices\":{\"at\":[300]}",
                ",\"choices\":{\"seed\":-1}",
                ",\"choices\":{\"constant\":\"lump\"}",
                ",\"sources\":[{\"path\":\"a\",\"sha256\":\"A\",\"size\":1}]",
                ",\"history\":[{\"who\":\"a\",\"when\":\"yesterday\",\"what\":\"b\"}]")) {
            byte[] json = (start + rest + "}").getBytes(StandardCharsets.UTF_8);
            assertFalse(errors(CAMPAIGN, json).isEmpty(), rest);
            assertThrows(InputException.class, () -> format.readCampaign("f", json), rest);
        }
    }

    @Example
    void schemaRefusesFindingsThatTheReaderRefuses() {
        String start = "{\"schema\":\"saddlebook/findings/1\",\"software\":{\"bundles\":[],\"sections\":["
                + "{\"id\":\"a\",\"title\":\"A\",\"outcome\":\"done\"}]},"
                + "\"campaign\":{\"title\":\"t\",\"digest\":\"d\"},\"cautions\":{},\"a\":";
        for (String body : List.of(
                "1",
                "null",
                "{\"x\":null}",
                "{\"x\":{\"value\":1,\"unit\":\"K\",\"standardUncertanty\":1}}",
                "{\"x\":{\"value\":1,\"unit\":\"K\",\"interval\":{\"kind\":\"about\",\"level\":0.9,\"method\":\"t\"}}}",
                "{\"x\":{\"columns\":[{\"key\":\"a\"}],\"rows\":[]}}",
                "{\"x\":{\"figure\":\"a\",\"layers\":[]}}")) {
            byte[] json = (start + body + "}").getBytes(StandardCharsets.UTF_8);
            assertFalse(errors(FINDINGS, json).isEmpty(), body);
            assertThrows(InputException.class, () -> format.readFindings("f", json), body);
        }
    }
}
