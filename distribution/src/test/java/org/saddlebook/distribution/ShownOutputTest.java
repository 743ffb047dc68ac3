package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

class ShownOutputTest {
    private static final List<String> PRINTED =
            List.of("title", "", "Ea  107.1 kJ/mol  ", "A   1.1e13\u00a01/s", "end");

    @Test
    void acceptsAPassageAnywhere() {
        assertEquals(Optional.empty(), missing("Ea  107.1 kJ/mol", "A   1.1e13 1/s"));
    }

    @Test
    void acceptsGapsAndPlacesLeftOpen() {
        assertEquals(Optional.empty(), missing("title", "...", "A   … 1/s"));
        assertEquals(Optional.empty(), missing("…", "end"));
    }

    @Test
    void refusesAnotherNumber() {
        assertEquals(Optional.of("Ea  107.2 kJ/mol"), missing("title", "...", "Ea  107.2 kJ/mol"));
    }

    @Test
    void refusesLinesThatAreNotNextToEachOther() {
        assertEquals(Optional.of("title\nend"), missing("title", "end"));
    }

    @Test
    void refusesAnotherOrder() {
        assertEquals(Optional.of("title"), missing("end", "...", "title"));
    }

    @Test
    void takesSignsOfPatternsAsTheyAre() {
        assertEquals(Optional.of("Ea .* kJ/mol"), missing("Ea .* kJ/mol"));
    }

    private static Optional<String> missing(String... shown) {
        return new ShownOutput(List.of(shown)).missingFrom(PRINTED);
    }
}
