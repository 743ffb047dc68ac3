package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.SourceHead;

/** Whatever the bytes are, they are read or refused with problems that say what to do. */
class AnyBytesTest {
    private static void readOrRefuse(byte[] bytes) {
        int confidence = new DelimitedTextReader().confidence(new SourceHead("any", bytes, bytes.length));
        assertTrue(confidence >= 0 && confidence <= 100);
        try {
            Imported imported = Reading.read(bytes);
            assertTrue(
                    imported.rateTable().isPresent() || !imported.directives().isEmpty());
        } catch (InputException e) {
            assertFalse(e.problems().isEmpty());
            assertTrue(e.problems().size() <= Problems.LIMIT + 1);
            for (Problem problem : e.problems()) {
                assertFalse(problem.found().isEmpty());
                assertFalse(problem.expected().isEmpty());
                assertFalse(problem.remedy().isEmpty());
            }
        }
    }

    @Property
    void anyBytes(@ForAll byte[] bytes) {
        readOrRefuse(bytes);
    }

    @Property
    void anyText(@ForAll String text) {
        readOrRefuse(text.getBytes(StandardCharsets.UTF_8));
        readOrRefuse(text.getBytes(StandardCharsets.UTF_16LE));
    }

    @Provide
    Arbitrary<String> scraps() {
        return Arbitraries.of(
                        "T (K)",
                        "k (1/s)",
                        "T",
                        "k",
                        "u(k) (%)",
                        "u(k)/k",
                        "u(T) (K)",
                        "label",
                        "excluded",
                        "ln k",
                        "1/T",
                        "k_L_mol-1_s-1",
                        "T / °C",
                        "\n",
                        "\r\n",
                        "\r",
                        ";",
                        ",",
                        "\t",
                        " ",
                        "  ",
                        "\"",
                        "#",
                        ":",
                        "300",
                        "1.5",
                        "1,5",
                        "-1",
                        "0",
                        "NaN",
                        "1e-5",
                        "1 234",
                        "1/min",
                        "°C",
                        "(",
                        ")",
                        "[",
                        "/",
                        "_",
                        "U(k)",
                        "k error",
                        "\uFEFF",
                        "\u00a0",
                        "10^5 k")
                .list()
                .ofMaxSize(40)
                .map(parts -> String.join("", parts));
    }

    @Property(tries = 5000)
    void scrapsOfTables(@ForAll("scraps") String text) {
        readOrRefuse(text.getBytes(StandardCharsets.UTF_8));
    }

    @Property(tries = 2000)
    void scrapsBelowAGoodHeader(@ForAll("scraps") String text) {
        readOrRefuse(("T (K);k (1/s);u(k) (%)\n300;1;2\n" + text).getBytes(StandardCharsets.UTF_8));
    }
}
