package org.saddlebook.json.api;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.problem.InputException;

/** Against the worked examples of RFC 8785. */
@Tag("validation")
class CanonicalJsonValidationTest {
    private static String canonical(String json) throws InputException {
        JsonValue value = JsonReader.read("example.json", json.getBytes(StandardCharsets.UTF_8));
        return new String(CanonicalJson.bytes(value), StandardCharsets.UTF_8);
    }

    /** RFC 8785, 3.2.2 and 3.2.4. */
    @Test
    void writesTheSampleOfTheStandard() throws InputException {
        String input = """
                {
                  "numbers": [333333333.33333329, 1E30, 4.50, 2e-3, 0.000000000000000000000000001],
                  "string": "\\u20ac$\\u000F\\u000aA'\\u0042\\u0022\\u005c\\\\\\"\\/",
                  "literals": [null, true, false]
                }
                """;
        assertEquals(
                "{\"literals\":[null,true,false],\"numbers\":[333333333.3333333,1e+30,4.5,0.002,1e-27],"
                        + "\"string\":\"\u20ac$\\u000f\\nA'B\\\"\\\\\\\\\\\"/\"}",
                canonical(input));
    }

    /** RFC 8785, 3.2.3: order by UTF-16 code units. */
    @Test
    void sortsKeysByCodeUnits() throws InputException {
        String input = """
                {
                  "\\u20ac": "Euro Sign",
                  "\\r": "Carriage Return",
                  "\\ufb33": "Hebrew Letter Dalet With Dagesh",
                  "1": "One",
                  "\\ud83d\\ude00": "Emoji: Grinning Face",
                  "\\u0080": "Control",
                  "\\u00f6": "Latin Small Letter O With Diaeresis"
                }
                """;
        assertEquals(
                "{\"\\r\":\"Carriage Return\",\"1\":\"One\",\"\u0080\":\"Control\","
                        + "\"\u00f6\":\"Latin Small Letter O With Diaeresis\",\"\u20ac\":\"Euro Sign\","
                        + "\"\ud83d\ude00\":\"Emoji: Grinning Face\",\"\ufb33\":\"Hebrew Letter Dalet With Dagesh\"}",
                canonical(input));
    }

    /** RFC 8785, 3.2.2.2: short escapes, lower-case hexadecimal for the other control characters, nothing else. */
    @Test
    void escapesControlCharactersAndNothingElse() {
        String text = "\b\t\n\f\r\u0000\u001f\u007f\u2028/<";
        assertEquals(
                "\"\\b\\t\\n\\f\\r\\u0000\\u001f\u007f\u2028/<\"",
                new String(CanonicalJson.bytes(new JsonString(text)), StandardCharsets.UTF_8));
    }

    /** The example "abc" of FIPS 180-4's published test values, from memory. */
    @Test
    void hashesTheExampleOfTheStandard() {
        String hash = Sha256.of("abc".getBytes(StandardCharsets.US_ASCII));
        assertEquals("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad", hash);
        assertEquals(true, Sha256.isHash(hash));
        assertEquals(false, Sha256.isHash(hash.toUpperCase(Locale.ROOT)));
        assertEquals(false, Sha256.isHash(hash.substring(1)));
    }
}
