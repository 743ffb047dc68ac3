package org.saddlebook.json.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Example;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.saddlebook.api.problem.InputException;

class PrettyJsonTest {
    private static String pretty(JsonValue value) {
        return new String(PrettyJson.bytes(value), StandardCharsets.UTF_8);
    }

    @Example
    void laysOutShortThingsOnOneLine() {
        JsonValue value = JsonObject.builder()
                .put("title", "A title")
                .put("empty", new JsonArray(List.of()))
                .put("matrix", new JsonArray(List.of(JsonArray.ofNumbers(1, 0.5), JsonArray.ofNumbers(0.5, 1))))
                .put(
                        "quantity",
                        JsonObject.builder().put("value", 1.5).put("unit", "K").build())
                .build();
        assertEquals("""
                {
                  "title": "A title",
                  "empty": [],
                  "matrix": [
                    [1, 0.5],
                    [0.5, 1]
                  ],
                  "quantity": {"value": 1.5, "unit": "K"}
                }
                """, pretty(value));
    }

    @Example
    void fillsLinesWithLongRowsOfNumbers() {
        double[] numbers = IntStream.range(0, 100).mapToDouble(i -> 1000 + i).toArray();
        String text = pretty(JsonArray.ofNumbers(numbers));
        List<String> lines = text.lines().toList();
        assertEquals("[", lines.get(0));
        assertTrue(lines.get(1).startsWith("  1000, 1001, "), text);
        assertTrue(lines.stream().allMatch(line -> line.length() <= 110), text);
        assertTrue(lines.stream().noneMatch(line -> line.endsWith(" ")), text);
        assertTrue(lines.size() < 10, text);
    }

    @Property(tries = 500)
    void readsBackAsTheSameTree(@ForAll("values") JsonValue value) throws InputException {
        assertEquals(value, JsonReader.read("pretty.json", PrettyJson.bytes(value)));
        assertEquals(value, JsonReader.read("canonical.json", CanonicalJson.bytes(value)));
    }

    @Property(tries = 200)
    void canonicalFormDoesNotDependOnTheWayThroughTheOther(@ForAll("values") JsonValue value) throws InputException {
        byte[] direct = CanonicalJson.bytes(value);
        assertArrayEquals(direct, CanonicalJson.bytes(JsonReader.read("pretty.json", PrettyJson.bytes(value))));
    }

    @Provide
    Arbitrary<JsonValue> values() {
        return values(3);
    }

    private static Arbitrary<JsonValue> values(int depth) {
        Arbitrary<JsonValue> leaves = Arbitraries.oneOf(
                texts().map(JsonString::new),
                Arbitraries.doubles().map(JsonNumber::new),
                Arbitraries.of(new JsonBoolean(true), new JsonBoolean(false), new JsonNull()));
        if (depth == 0) {
            return leaves;
        }
        Arbitrary<JsonValue> inner = Arbitraries.lazy(() -> values(depth - 1));
        return Arbitraries.oneOf(
                leaves,
                inner.list().ofMaxSize(6).map(JsonArray::new),
                Arbitraries.maps(texts(), inner).ofMaxSize(6).map(PrettyJsonTest::object));
    }

    private static JsonValue object(Map<String, JsonValue> members) {
        return new JsonObject(new LinkedHashMap<>(members));
    }

    private static Arbitrary<String> texts() {
        return Arbitraries.strings()
                .withChars("aZ09\"\\/\b\n\t\u0000\u007f\u00e4\u2028\uffff\u4e2d")
                .ofMaxLength(12);
    }
}
