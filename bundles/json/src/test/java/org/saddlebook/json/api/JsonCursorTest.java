package org.saddlebook.json.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

class JsonCursorTest {
    private static final String JSON = """
            {
              "rateTable": {
                "points": [
                  {"k": 1},
                  {
                    "k": "fast"
                  }
                ],
                "pionts": 0
              },
              "seed": 1.5
            }
            """;

    private static JsonCursor cursor() throws InputException {
        return JsonDocument.read("campaign.json", ("\uFEFF" + JSON).getBytes(StandardCharsets.UTF_8))
                .cursor();
    }

    private static Problem problem(Executable access) {
        return assertThrows(InputException.class, access).problems().get(0);
    }

    @Test
    void namesFileLineAndPathOfTheWrongKind() throws InputException {
        JsonCursor k =
                cursor().member("rateTable").member("points").items().get(1).member("k");
        Problem problem = problem(k::number);
        assertEquals("wrong-type", problem.code());
        assertEquals("campaign.json", problem.place().file());
        assertEquals(OptionalInt.of(6), problem.place().line());
        assertEquals(Optional.of("rateTable.points[1].k"), problem.place().column());
    }

    @Test
    void suggestsTheKeyThatWasMeant() {
        Problem problem = problem(() -> cursor().member("rateTable").onlyKeys(List.of("unit", "points")));
        assertEquals("unknown-key", problem.code());
        assertEquals(OptionalInt.of(9), problem.place().line());
        assertTrue(problem.remedy().contains("\"points\""), problem.remedy());
    }

    @Test
    void namesTheKeyThatIsMissing() {
        Problem problem = problem(() -> cursor().member("rateTable").member("unit"));
        assertEquals("missing-key", problem.code());
        assertEquals(OptionalInt.of(2), problem.place().line());
        assertTrue(problem.expected().contains("unit"));
    }

    @Test
    void refusesFractionsWhereWholeNumbersAreWanted() {
        assertEquals("1.5", problem(() -> cursor().member("seed").wholeNumber()).found());
    }

    @Test
    void measuresTheDistanceOfWords() {
        assertEquals(0, NearSpelling.distance("molecularity", "molecularity"));
        assertEquals(1, NearSpelling.distance("standart state", "standard state"));
        assertEquals(1, NearSpelling.distance("pionts", "points"));
        assertEquals(3, NearSpelling.distance("kitten", "sitting"));
        assertEquals(Optional.of("seed"), NearSpelling.of("Sed", List.of("level", "seed")));
        assertEquals(Optional.empty(), NearSpelling.of("note", List.of("date")));
        assertEquals(Optional.empty(), NearSpelling.of("operator", List.of("order", "title")));
    }
}
