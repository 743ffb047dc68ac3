package org.saddlebook.campaign.json.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

class BadCampaignsTest {
    private static List<Problem> problems(String json) {
        return assertThrows(
                        InputException.class,
                        () -> new JsonCampaignFormat()
                                .readCampaign("campaign.json", json.getBytes(StandardCharsets.UTF_8)))
                .problems();
    }

    private static String point(String temperature, String k, String more) {
        return "\"rateTable\": {\"points\": [\n{\"temperature\": " + temperature + ", \"k\": " + k + more + "}]}";
    }

    static Stream<Arguments> wrong() {
        String t = "\"25degC\"";
        String k = "{\"value\": 1, \"unit\": \"1/s\"}";
        return Stream.of(
                Arguments.of(point("25", k, ""), "missing-unit", "rateTable.points[0].temperature"),
                Arguments.of(point("\"25\"", k, ""), "missing-unit", "rateTable.points[0].temperature"),
                Arguments.of(point("\"-300degC\"", k, ""), "below-absolute-zero", "rateTable.points[0].temperature"),
                Arguments.of(
                        point("{\"value\": 0, \"unit\": \"K\"}", k, ""),
                        "below-absolute-zero",
                        "rateTable.points[0].temperature"),
                Arguments.of(
                        point("{\"value\": 1, \"unit\": \"s\"}", k, ""),
                        "wrong-dimension",
                        "rateTable.points[0].temperature.unit"),
                Arguments.of(point(t, "1", ""), "missing-unit", "rateTable.points[0].k"),
                Arguments.of(
                        point(t, "{\"value\": 0, \"unit\": \"1/s\"}", ""), "not-positive", "rateTable.points[0].k"),
                Arguments.of(
                        point(t, "{\"value\": 1, \"unit\": \"furlong\"}", ""),
                        "unknown-unit",
                        "rateTable.points[0].k.unit"),
                Arguments.of(
                        point(t, "{\"value\": 1, \"unit\": \"kJ/mol\"}", ""),
                        "wrong-dimension",
                        "rateTable.points[0].k.unit"),
                Arguments.of(point(t, k, ", \"kUncertainty\": 1"), "missing-unit", "rateTable.points[0].kUncertainty"),
                Arguments.of(point(t, k, ", \"lable\": \"a\""), "unknown-key", "rateTable.points[0].lable"),
                Arguments.of(point(t, k, ", \"excluded\": true"), "wrong-type", "rateTable.points[0].excluded"),
                Arguments.of(
                        point(t, "{\"value\": 1, \"unit\": \"1/s\", \"standardUncertainty\": 0}", ""),
                        "wrong-value",
                        "rateTable.points[0].k.standardUncertainty"),
                Arguments.of(
                        point(t, k, "},\n{\"temperature\": " + t + ", \"k\": \"2 L/(mol.s)\""),
                        "wrong-dimension",
                        "rateTable.points[1].k"),
                Arguments.of("\"rateTable\":\n{}", "missing-key", "rateTable"),
                Arguments.of("\"rateTable\": {\n\"points\": []}", "empty-table", "rateTable.points"),
                Arguments.of(
                        "\"rateTable\": {\n\"order\": 2, \"points\": [{\"temperature\": " + t + ", \"k\": " + k + "}]}",
                        "order-against-unit",
                        "rateTable.order"),
                Arguments.of("\"choices\": {\n\"molecularity\": -1}", "wrong-value", "choices.molecularity"),
                Arguments.of("\"choices\": {\n\"seed\": 1.5}", "wrong-value", "choices.seed"),
                Arguments.of("\"choices\": {\n\"level\": 95}", "wrong-value", "choices.level"),
                Arguments.of("\"choices\": {\n\"at\": [25]}", "missing-unit", "choices.at[0]"),
                Arguments.of("\"choices\": {\n\"standardState\": \"1 K\"}", "wrong-dimension", "choices.standardState"),
                Arguments.of("\"choices\": {\n\"constant\": \"lump\"}", "wrong-value", "choices.constant"),
                Arguments.of("\"settings\": {\n\"a\": null}", "wrong-type", "settings.a"),
                Arguments.of(
                        "\"settings\": {\"spontaneity\": {\"dH\":\n{\"value\": 1, \"unit\": \"J/mol\","
                                + " \"standardUncertanty\": 1}}}",
                        "unknown-key",
                        "settings.spontaneity.dH.standardUncertanty"),
                Arguments.of(
                        "\"sources\": [\n{\"path\": \"../a\", \"sha256\": \"" + "a".repeat(64) + "\", \"size\": 1}]",
                        "path-outside",
                        "sources[0].path"),
                Arguments.of(
                        "\"sources\": [\n{\"path\": \"a\", \"sha256\": \"A\", \"size\": 1}]",
                        "wrong-value",
                        "sources[0].sha256"),
                Arguments.of(
                        "\"history\": [\n{\"who\": \"a\", \"when\": \"2026-02-30T00:00:00Z\", \"what\": \"b\"}]",
                        "wrong-value",
                        "history[0].when"));
    }

    @ParameterizedTest
    @MethodSource("wrong")
    void namesCodePathAndLine(String json, String code, String path) {
        Problem problem = problems("{\"schema\": \"saddlebook/campaign/1\", \"title\": \"t\",\n" + json + "}")
                .get(0);
        assertEquals(code, problem.code(), problem.toString());
        assertEquals("campaign.json", problem.place().file());
        assertEquals(path, problem.place().column().orElse(""));
        int line = 3 + (path.contains("[1]") ? 1 : 0);
        assertEquals(line, problem.place().line().orElseThrow(), problem.toString());
    }

    @Test
    void suggestsTheKeyThatWasMeant() {
        Problem problem = problems(
                        "{\"schema\": \"saddlebook/campaign/1\", \"title\": \"t\", \"ratetable\": {\"points\": []}}")
                .get(0);
        assertEquals("unknown-key", problem.code());
        assertTrue(problem.remedy().contains("\"rateTable\""), problem.remedy());
    }

    @Test
    void saysWhichVersionIsRead() {
        Problem newer = problems("{\"schema\": \"saddlebook/campaign/2\"}").get(0);
        assertEquals("unknown-schema", newer.code());
        assertTrue(newer.remedy().contains("reads version 1"), newer.remedy());
        Problem other = problems("{\"schema\": \"saddlebook/findings/1\"}").get(0);
        assertTrue(other.remedy().contains("something else"), other.remedy());
        assertEquals("missing-key", problems("{\"title\": \"t\"}").get(0).code());
        assertEquals("wrong-type", problems("[]").get(0).code());
        assertEquals("broken-json", problems("{").get(0).code());
    }

    @Test
    void namesTheMistakesOfAllParts() {
        List<Problem> problems = problems(
                "{\"schema\": \"saddlebook/campaign/1\", \"notes\": 1, \"choices\": {\"seed\": -1}, \"x\": 1}");
        assertEquals(
                List.of("unknown-key", "missing-key", "wrong-value"),
                problems.stream().map(Problem::code).toList());
    }

    @Test
    void refusesMolecularityAgainstTheUnit() {
        Problem problem = problems("{\"schema\": \"saddlebook/campaign/1\", \"title\": \"t\", "
                        + point("\"25degC\"", "\"1 1/s\"", "") + ", \"choices\": {\"molecularity\": 2}}")
                .get(0);
        assertEquals("order-against-unit", problem.code());
    }
}
