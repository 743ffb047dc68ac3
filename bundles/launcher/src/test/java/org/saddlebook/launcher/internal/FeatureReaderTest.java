package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class FeatureReaderTest {
    private static Feature read(String text) throws Refused {
        return FeatureReader.read("features/x.json", text.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void readsBundlesInOrderWithCommentsAndMetadata() throws Refused {
        Feature feature = read("""
                { // what the laboratory uses
                  "feature-resource-version": "1.0",
                  "id": "org.example:x:1.0.0",
                  "name": "X",
                  "bundles": [ { "id": "a:one:1", "note": { "deep": [1] } }, "a:two:2" ],
                  "configurations": {},
                  "extensions": { "hints": { "type": "json", "kind": "optional", "json": [] } }
                }""");
        assertEquals("X", feature.name());
        assertEquals(List.of(new Coordinates("a", "one", "1"), new Coordinates("a", "two", "2")), feature.bundles());
    }

    @Test
    void aFeatureCanBelongToSomeVerbsOnly() throws Refused {
        Feature feature = read("""
                { "id": "org.example:x:1.0.0",
                  "extensions": { "saddlebook-verbs": { "kind": "optional", "type": "text", "text": ["desk", "help"] } } }""");
        assertTrue(feature.neededBy("desk"));
        assertTrue(feature.neededBy("")); // no verb: what there is gets listed
        assertTrue(feature.neededBy("--version"));
        assertFalse(feature.neededBy("evaluate"));
        assertTrue(read("{ \"id\": \"org.example:x:1.0.0\" }").neededBy("evaluate"));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{ \"name\": \"X\" }|no \"id\"",
                "{ \"id\": \"a:b:1\", \"id\": \"a:b:1\" }|Duplicate",
                "{ \"id\": \"a:b:1\", \"bundels\": [] }|bundels",
                "{ \"id\": \"a:b\" }|group:artifact:version",
                "{ \"id\": \"a:../b:1\" }|group:artifact:version",
                "{ \"id\": \"a:b:1\", \"bundles\": [ {} ] }|without \"id\"",
                "{ \"id\": \"a:b:1\", \"bundles\": {} }|list",
                "{ \"id\": \"a:b:1\", \"configurations\": { \"pid\": {} } }|configurations",
                "{ \"id\": \"a:b:1\", \"extensions\": { \"e\": { \"kind\": \"mandatory\" } } }|mandatory",
                "{ \"id\": \"a:b:1\" } {}|nothing after it",
                "[]|object",
                "{ \"id\": 3 }|text in quotes",
                "|object",
            })
    void refusesWhatItCannotHonour(String text, String said) {
        Refused refused = assertThrows(Refused.class, () -> read(text == null ? "" : text));
        assertTrue(refused.getMessage().startsWith("features/x.json"), refused.getMessage());
        assertTrue(refused.getMessage().contains(said), refused.getMessage());
    }

    @Test
    void namesTheLine() {
        Refused refused = assertThrows(Refused.class, () -> read("{\n  \"id\": \"a:b:1\",\n  \"nmae\": \"X\"\n}"));
        assertTrue(refused.getMessage().startsWith("features/x.json, line 3: "), refused.getMessage());
    }
}
