package org.saddlebook.reaction.series.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Progress;
import org.saddlebook.campaign.json.internal.JsonCampaignFormat;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;

/** The verb on tables of ratios, which it reads itself; tables of rate constants are tried by the documents. */
class CompareVerbTest {
    @TempDir
    Path folder;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();

    private final CompareVerb verb = new CompareVerb(new CompareVerb.Services() {
        @Override
        public <S> Optional<S> find(Class<S> type) {
            return type == CampaignFormat.class ? Optional.of(type.cast(new JsonCampaignFormat())) : Optional.empty();
        }
    });

    @BeforeEach
    void tables() throws Exception {
        Files.writeString(folder.resolve("ee.csv"), Data.EXCESS, StandardCharsets.UTF_8);
        Files.writeString(folder.resolve("kie.csv"), "T (K),KIE\n290,6.9\n310,6.1\n330,5.6\n", StandardCharsets.UTF_8);
        Files.writeString(folder.resolve("one.csv"), "T (K),KIE\n290,6.9\n", StandardCharsets.UTF_8);
    }

    private int run(String... arguments) throws Exception {
        PrintStream stream = new PrintStream(out, true, StandardCharsets.UTF_8);
        return verb.run(new Invocation() {
            @Override
            public List<String> arguments() {
                return List.of(arguments);
            }

            @Override
            public PrintStream out() {
                return stream;
            }

            @Override
            public PrintStream err() {
                return stream;
            }

            @Override
            public Progress progress() {
                return Progress.NONE;
            }

            @Override
            public Clock clock() {
                return Clock.fixed(Instant.EPOCH, ZoneOffset.UTC);
            }

            @Override
            public String user() {
                return "a.chemist";
            }

            @Override
            public Path workingFolder() {
                return folder;
            }

            @Override
            public Path dataFolder() {
                return folder;
            }
        });
    }

    private String printed() {
        return out.toString(StandardCharsets.UTF_8);
    }

    @Test
    void printsFindingsThatCanBeReadBack() throws Exception {
        assertEquals(ExitCode.DONE, run("ee.csv", "kie.csv", "--at", "25degC", "--json"));
        var findings = new JsonCampaignFormat().readFindings("findings", out.toByteArray());
        assertEquals(
                List.of("selectivity.1", "selectivity.2"),
                List.copyOf(findings.sections().keySet()));
        String first = printed();
        out.reset();
        run("ee.csv", "kie.csv", "--at", "25degC", "--json");
        assertEquals(first, printed());
        out.reset();
        run("ee.csv", "kie.csv", "--at", "26degC", "--json");
        assertFalse(first.equals(printed()));
    }

    @Test
    void printsSentencesForPeople() throws Exception {
        assertEquals(ExitCode.DONE, run("kie.csv"));
        String text = printed().replaceAll("\\s+", " "); // lines are broken at the terminal's width
        assertTrue(text.contains("light minus heavy"), text);
        assertTrue(text.contains("any temperature from 787 K upward, unbounded"), text);
    }

    @Test
    void writesItsFolder() throws Exception {
        assertEquals(ExitCode.DONE, run("ee.csv", "--out", "result"));
        assertTrue(Files.size(folder.resolve("result/findings.json")) > 1000);
        assertTrue(printed().contains("no report was written"), printed());
    }

    @Test
    void saysThatNothingCouldBeCompared() throws Exception {
        assertEquals(ExitCode.REFUSED, run("one.csv"));
        assertTrue(printed().contains("It needs ratios at two temperatures"), printed());
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "--json | missing-argument",
                "ee.csv --model eyring | unknown-option",
                "ee.csv --literature x.csv | missing-argument",
                "ee.csv --at 25 | missing-unit",
                "12 | not-installed",
                "rates.csv | not-installed",
            })
    void refusesArgumentsThatMakeNoSense(String arguments, String code) {
        InputException e = assertThrows(InputException.class, () -> run(arguments.split(" ")));
        assertEquals(code, e.problems().get(0).code());
    }
}
