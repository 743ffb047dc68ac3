package org.saddlebook.desk.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.desk.api.DeskAction;

class ListPopupTest {
    private static final List<DeskAction> ALL = List.of(
            DeskAction.of("Write the report", () -> {}).withWords("html"),
            DeskAction.of("Open a table", () -> {}).withWords("file", "import"),
            DeskAction.of("Unfold Barrier", () -> {}),
            DeskAction.of("Exclude a run", () -> {}));

    private static List<String> found(String typed) {
        return ListPopup.matching(ALL, typed).stream().map(DeskAction::title).toList();
    }

    @Test
    void everyWordTypedMustOccurInTitleOrWords() {
        assertEquals(List.of("Open a table"), found("import"));
        assertEquals(List.of("Write the report"), found("report html"));
        assertEquals(List.of(), found("report import"));
    }

    @Test
    void nothingTypedGivesEverything() {
        assertEquals(4, found("").size());
    }

    @Test
    void titlesThatStartSoComeFirst() {
        assertEquals(List.of("Unfold Barrier", "Exclude a run"), found("un"));
    }
}
