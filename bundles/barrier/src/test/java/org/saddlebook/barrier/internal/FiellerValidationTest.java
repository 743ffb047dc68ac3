package org.saddlebook.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.HashMap;
import java.util.Map;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.saddlebook.estimation.api.Fieller;
import org.saddlebook.estimation.api.Normal;
import org.saddlebook.estimation.api.RatioSet;
import org.saddlebook.estimation.api.StudentT;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;

/** Fieller sets of every shape against mpmath, SciPy and R; see README.md beside the data. */
@Tag("validation")
class FiellerValidationTest {
    @Test
    void setsHaveTheShapeAndLimitsOfTheOutsidePrograms() throws Exception {
        Map<String, JsonValue> expected = new HashMap<>();
        for (JsonValue each : ReferenceCampaign.items(ReferenceCampaign.json("expected/fieller.json"), "cases")) {
            expected.put(ReferenceCampaign.text(each, "name"), each);
        }
        for (Map<String, String> row : ReferenceCampaign.csv("fieller.csv")) {
            String dof = row.get("degrees_of_freedom");
            RatioSet set = Fieller.set(
                    number(row, "a"),
                    number(row, "b"),
                    number(row, "v11"),
                    number(row, "v12"),
                    number(row, "v22"),
                    dof.isEmpty() ? Normal.quantile(0.975) : StudentT.quantile(0.975, Double.parseDouble(dof)));
            JsonValue answer = expected.remove(row.get("name"));
            JsonObject values = (JsonObject) ReferenceCampaign.member(answer, "values");
            String kind = ReferenceCampaign.text(answer, "kind");
            if (set instanceof RatioSet.Bounded bounded) {
                assertEquals(kind, "between", row.toString());
                assertLimits(values, bounded.lower(), bounded.upper(), row.toString());
            } else if (set instanceof RatioSet.TwoRays rays) {
                assertEquals(kind, "outside", row.toString());
                assertLimits(values, rays.lowerRayEnd(), rays.upperRayStart(), row.toString());
            } else {
                assertEquals(new RatioSet.WholeLine(), set, row.toString());
                assertEquals(kind, "everything", row.toString());
            }
        }
        assertEquals(Map.of(), expected);
    }

    private static void assertLimits(JsonObject values, double lower, double upper, String label) {
        double expectedLower = ReferenceCampaign.number(values, "limit.lower");
        double expectedUpper = ReferenceCampaign.number(values, "limit.upper");
        assertEquals(expectedLower, lower, 1e-10 * Math.abs(expectedLower), label);
        assertEquals(expectedUpper, upper, 1e-10 * Math.abs(expectedUpper), label);
    }

    private static double number(Map<String, String> row, String key) {
        return Double.parseDouble(row.get(key));
    }
}
