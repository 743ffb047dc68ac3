package org.saddlebook.json.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.OptionalInt;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

class JsonReaderTest {
    private static JsonValue read(String json) throws InputException {
        return JsonReader.read("file.json", json.getBytes(StandardCharsets.UTF_8));
    }

    private static Problem problem(byte[] json) {
        return assertThrows(InputException.class, () -> JsonReader.read("file.json", json))
                .problems()
                .get(0);
    }

    private static Problem problem(String json) {
        return problem(json.getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void skipsByteOrderMark() throws InputException {
        assertEquals(new JsonNumber(1), read("\uFEFF1"));
    }

    @Test
    void keepsTheOrderOfMembers() throws InputException {
        JsonObject object = (JsonObject) read("{\"z\":1,\"a\":2}");
        assertEquals("[z, a]", object.members().keySet().toString());
    }

    static Stream<Arguments> broken() {
        return Stream.of(
                Arguments.of("{\"a\":1,\n\"a\":2}", 2),
                Arguments.of("[1,\n2,]", 2),
                Arguments.of("[1,\n2", 2),
                Arguments.of("{\"a\"\n:1}}", 2),
                Arguments.of("[1,\n1e999]", 2),
                Arguments.of("[1,\nNaN]", 2),
                Arguments.of("[\n'a']", 2),
                Arguments.of("[\n01]", 2),
                Arguments.of("[\n+1]", 2),
                Arguments.of("[\n\"\\ud800\"]", 2),
                Arguments.of("// comment\n1", 1),
                Arguments.of("1 2", 1));
    }

    @ParameterizedTest
    @MethodSource("broken")
    void refusesWhatIsNotJsonAndSaysInWhichLine(String json, int line) {
        Problem problem = problem(json);
        assertEquals("broken-json", problem.code());
        assertEquals(OptionalInt.of(line), problem.place().line(), problem.toString());
    }

    @Test
    void namesDuplicateKeys() {
        assertTrue(problem("{\"k\":1,\"k\":2}").found().contains("'k'"));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " \n "})
    void refusesEmptyFiles(String json) {
        assertEquals("an empty file", problem(json).found());
    }

    @Test
    void refusesOtherEncodings() {
        Problem latin = problem("{\"a\":1,\n\"b\":\"\u00e4\"}".getBytes(StandardCharsets.ISO_8859_1));
        assertEquals("wrong-encoding", latin.code());
        assertEquals(OptionalInt.of(2), latin.place().line());
        problem("{}".getBytes(StandardCharsets.UTF_16));
        problem("{}".getBytes(StandardCharsets.UTF_16LE));
        problem("[\"ab".getBytes(StandardCharsets.UTF_8));
        assertEquals("wrong-encoding", problem(new byte[] {'"', (byte) 0xC3}).code(), "cut in the middle of a letter");
    }

    @Test
    void refusesWhatIsNestedTooDeep() throws InputException {
        int depth = JsonReader.MAX_DEPTH;
        read("[".repeat(depth) + "]".repeat(depth));
        Problem problem = problem("[".repeat(depth + 1) + "]".repeat(depth + 1));
        assertEquals("too-large", problem.code());
        assertEquals("too-large", problem("{\"a\":".repeat(100_000)).code());
    }

    @Test
    void refusesNumbersWithThousandsOfDigits() {
        assertEquals("too-large", problem("1".repeat(5000)).code());
    }

    @Test
    void roundsNumbersToTheNearestDouble() throws InputException {
        assertEquals(new JsonNumber(0.1), read("0.1000000000000000055511151231257827"));
        assertEquals(new JsonNumber(9007199254740992.0), read("9007199254740993"));
        assertEquals(new JsonNumber(0), read("-0"));
        assertEquals(new JsonNumber(0), read("1e-400"));
    }

    @Test
    void treesRefuseWhatHasNoJson() {
        assertThrows(IllegalArgumentException.class, () -> new JsonNumber(Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> new JsonString("\udc00"));
        assertThrows(
                IllegalArgumentException.class,
                () -> JsonObject.builder().put("a", 1).put("a", 2));
    }
}
