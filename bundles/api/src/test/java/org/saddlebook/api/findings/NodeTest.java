package org.saddlebook.api.findings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class NodeTest {
    private static Node.Items row(double... values) {
        return new Node.Items(Arrays.stream(values)
                .mapToObj(value -> (Node) new Node.Scalar(value))
                .toList());
    }

    private static Node.Group group(String keys) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (String key : keys.split(" ", -1)) {
            members.put(key, new Node.Flag(true));
        }
        return new Node.Group(members);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "unit",
                "unit cautions",
                "unit value",
                "title interval unit",
                "unit standardFactor",
                "standardUncertainty unit",
                "columns rows",
                "figure layers title"
            })
    void refusesGroupsThatWouldBeReadAsSomethingElse(String keys) {
        assertThrows(IllegalArgumentException.class, () -> group(keys));
    }

    @ParameterizedTest
    @ValueSource(strings = {"value", "unit order", "columns", "figure", "value interval", "rows title"})
    void keepsGroupsThatOnlySoundAlike(String keys) {
        assertEquals(keys, String.join(" ", group(keys).members().keySet()));
    }

    @Test
    void refusesItemsThatWouldBeReadAsMatrix() {
        assertThrows(IllegalArgumentException.class, () -> new Node.Items(List.of(row(1, 2), row(3, 4))));
        assertThrows(IllegalArgumentException.class, () -> new Node.Items(List.of(row(1))));
        assertEquals(2, new Node.Items(List.of(row(1, 2), row(3))).items().size());
        assertEquals(1, new Node.Items(List.of(row())).items().size());
    }

    @Test
    void refusesMatricesWithoutEntries() {
        assertThrows(IllegalArgumentException.class, () -> new Node.Matrix(new double[0][]));
        assertThrows(IllegalArgumentException.class, () -> new Node.Matrix(new double[2][0]));
    }

    @Test
    void refusesSectionsWithReservedIds() {
        for (String id : List.of("schema", "software", "campaign", "cautions")) {
            assertThrows(IllegalArgumentException.class, () -> Section.refused(id, "Title", "reason"));
        }
    }
}
