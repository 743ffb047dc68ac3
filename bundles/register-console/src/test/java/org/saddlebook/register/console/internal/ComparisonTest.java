package org.saddlebook.register.console.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;

class ComparisonTest {
    private static List<String> moved(String before, String after, boolean exact) throws Exception {
        return Comparison.of(read(before), read(after), exact, Set.of("software")).stream()
                .map(Comparison.Moved::path)
                .toList();
    }

    private static JsonObject read(String text) throws Exception {
        return (JsonObject) JsonReader.read("text", text.replace('\'', '"').getBytes(StandardCharsets.UTF_8));
    }

    /** The rule of two builds: |d| at most max(1e-9 |value|, 1e-6 u). */
    @ParameterizedTest
    @CsvSource({
        "100, 1, 100.0000009, true",
        "100, 1, 100.0000011, false",
        "1000, 0, 1000.0000009, true",
        "1000, 0, 1000.0000011, false",
        "0, 1, 9e-7, true",
        "0, 1, 1.1e-6, false",
        "0, 0, 0, true",
        "0, 0, 5e-324, false"
    })
    void comparesAQuantity(String value, String uncertainty, String other, boolean agrees) throws Exception {
        String form = "{'x':{'value':%s,'unit':'K','standardUncertainty':%s}}";
        List<String> paths = moved(form.formatted(value, uncertainty), form.formatted(other, uncertainty), false);
        assertEquals(agrees ? List.of() : List.of("x.value"), paths);
    }

    @Test
    void givesLimitsTheUncertaintyOfTheirQuantity() throws Exception {
        String form = "{'x':{'value':0,'unit':'K','standardUncertainty':1,'interval':{'kind':'between','lower':%s}}}";
        assertEquals(List.of(), moved(form.formatted("0"), form.formatted("9e-7"), false));
        assertEquals(List.of("x.interval.lower"), moved(form.formatted("0"), form.formatted("2e-6"), false));
    }

    @Test
    void takesTheUncertaintyOfALogarithmicQuantityFromItsFactor() throws Exception {
        // u = 1e10 ln 1.1 = 9.5e8, so 1e-6 u = 953 (and 1e-9 of the value is 10).
        String form = "{'A':{'value':%s,'unit':'1/s','standardFactor':1.1}}";
        assertEquals(List.of(), moved(form.formatted("1e10"), form.formatted("10000000900"), false));
        assertEquals(List.of("A.value"), moved(form.formatted("1e10"), form.formatted("10000001000"), false));
    }

    @Test
    void sharesTheScaleWithinAnArrayOfNumbers() throws Exception {
        assertEquals(List.of(), moved("{'r':[1000,1e-12]}", "{'r':[1000,-1e-12]}", false));
        assertEquals(List.of("r[1]"), moved("{'r':[1000,1]}", "{'r':[1000,1.00001]}", false));
    }

    @Test
    void namesWordsMembersAndLengthsThatDiffer() throws Exception {
        assertEquals(
                List.of("a", "b", "c[1]", "d"),
                moved("{'a':'x','b':1,'c':[1,2]}", "{'a':'y','c':[1],'d':true}", false));
    }

    @Test
    void skipsTheBundlesAndForgivesNothingWhenExact() throws Exception {
        assertEquals(List.of(), moved("{'software':1,'a':1}", "{'software':2,'a':1}", true));
        assertEquals(List.of("a"), moved("{'a':1}", "{'a':1.0000000000000002}", true));
    }
}
