package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/**
 * The cautions of predictions, of an operating window and of a Gibbs energy reach the console, the findings, the report and every
 * picture, and nothing anywhere is called safe.
 */
@Timeout(300)
class CautionsOfTheProductTest {
    /** Beginnings of what must be read wherever numbers of the demo are; words of the cautions themselves. */
    private static final List<String> SAID = List.of(
            "The probability holds at one temperature each",
            "Only the limits stated here were looked at",
            "not a hazard assessment",
            "same mechanism");

    @TempDir
    private Path home;

    @Test
    void travelIntoConsoleFindingsReportAndPictures() throws Exception {
        String campaign =
                InstalledProduct.ASSEMBLED.resolve("demo-data/ring-closure").toString();
        InstalledProduct product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        InstalledProduct.Outcome shown = product.run("evaluate", campaign, "--out", "result");
        assertEquals(0, shown.exitCode(), shown.err());
        says("console", shown.out());
        Path result = home.resolve("result");
        says("findings", Files.readString(result.resolve("findings.json")));
        String report;
        try (Stream<Path> files = Files.walk(result)) {
            Path html = files.filter(file -> file.toString().endsWith(".html"))
                    .findFirst()
                    .orElseThrow();
            report = Files.readString(html);
        }
        says("report", report);
        int pictures = 0;
        try (Stream<Path> files = Files.walk(result)) {
            for (Path picture :
                    files.filter(file -> file.toString().endsWith(".svg")).toList()) {
                String text = plain(Files.readString(picture).replaceAll("<[^>]*>", " "));
                if (picture.toString().contains("headroom")
                        || picture.toString().contains("gibbs")) {
                    pictures++;
                    assertTrue(
                            text.contains("allowed does not mean fast or complete"),
                            "no caution in " + picture.getFileName());
                }
                if (picture.toString().contains("headroom")) {
                    says("headroom", text);
                }
            }
        }
        assertTrue(pictures >= 2, "pictures of the Gibbs energy and of the headroom: " + pictures);
        neverSafe(shown.out());
        neverSafe(report);
    }

    private static void says(String where, String text) {
        for (String words : SAID) {
            assertTrue(plain(text).contains(words.toLowerCase(Locale.ROOT)), where + ": " + words);
        }
    }

    private static String plain(String text) {
        return text.replaceAll("\\s+", " ").toLowerCase(Locale.ROOT);
    }

    private static void neverSafe(String text) {
        assertFalse(text.toLowerCase(Locale.ROOT).matches("(?s).*\\bis safe\\b.*"), "something is called safe");
    }
}
