package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Findings are a function of the campaign and the bundles alone: the same bytes whatever runs them. */
@Timeout(300)
class SameFindingsTest {
    private static final String CAMPAIGN = InstalledProduct.ASSEMBLED
            .resolve("demo-data/adduct-release/rates.csv")
            .toString();

    @TempDir
    private Path home;

    @ParameterizedTest
    @ValueSource(
            strings = {
                "-Dsaddlebook.threads=1",
                "-Dsaddlebook.threads=2",
                "-Dsaddlebook.threads=8",
                "-Dsaddlebook.shuffle=1",
                "-Dsaddlebook.shuffle=2",
                "-Dsaddlebook.shuffle=3",
                "-Xint",
                "-Duser.language=de -Duser.country=DE -Dfile.encoding=ISO-8859-1 -Duser.timezone=Asia/Kolkata"
            })
    void threadsOrderOfBundlesAndSettingsOfTheMachineDoNotMatter(String options) throws Exception {
        InstalledProduct product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        InstalledProduct.Outcome plain = product.run("evaluate", CAMPAIGN, "--json");
        assertEquals(0, plain.exitCode(), plain.err());
        InstalledProduct.Outcome other =
                product.with("SADDLEBOOK_JAVA_OPTIONS", options).run("evaluate", CAMPAIGN, "--json");
        assertEquals(0, other.exitCode(), other.err());
        assertEquals(plain.out(), other.out());
    }

    @Test
    void aNewerJavaGivesTheSameBytes() throws Exception {
        Optional<Path> newer = newerJava();
        assumeTrue(
                newer.isPresent(),
                "no second, newer JDK under /usr/lib/jvm and none named by SADDLEBOOK_TEST_NEWER_JAVA_HOME");
        InstalledProduct product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        InstalledProduct.Outcome here = product.run("evaluate", CAMPAIGN, "--json");
        InstalledProduct.Outcome there =
                product.with("JAVA_HOME", newer.get().toString()).run("evaluate", CAMPAIGN, "--json");
        assertEquals(0, there.exitCode(), there.err());
        assertEquals("", there.err());
        assertEquals(here.out(), there.out());
    }

    @Test
    void findingsAloneLoadNoWindowToolkit() throws Exception {
        Path log = home.resolve("classes.txt");
        InstalledProduct.Outcome json = InstalledProduct.of(InstalledProduct.ASSEMBLED, home)
                .with("SADDLEBOOK_JAVA_OPTIONS", "-Xlog:class+load:file=" + log)
                .run("evaluate", CAMPAIGN, "--json");
        assertEquals(0, json.exitCode(), json.err());
        String classes = Files.readString(log);
        assertTrue(classes.contains("org.saddlebook.barrier.internal."), "the log does not show what was loaded");
        for (String unwanted : new String[] {
            " java.awt.",
            " javax.swing.",
            "org.jfree.",
            "org.saddlebook.register.",
            "org.saddlebook.report.",
            "org.sqlite."
        }) {
            assertFalse(classes.contains(unwanted), unwanted);
        }
    }

    /** The newest JDK that is not the one running the tests. */
    private static Optional<Path> newerJava() throws IOException {
        String named = System.getenv("SADDLEBOOK_TEST_NEWER_JAVA_HOME");
        if (named != null) {
            return Optional.of(Path.of(named));
        }
        Path jvms = Path.of("/usr/lib/jvm");
        if (!Files.isDirectory(jvms)) {
            return Optional.empty();
        }
        Path best = null;
        int highest = Runtime.version().feature();
        try (Stream<Path> folders = Files.list(jvms)) {
            for (Path folder : folders.toList()) {
                Path release = folder.resolve("release");
                if (Files.isExecutable(folder.resolve("bin/java")) && Files.exists(release)) {
                    for (String line : Files.readAllLines(release)) {
                        if (line.startsWith("JAVA_VERSION=\"")) {
                            int feature = Runtime.Version.parse(line.substring(14, line.length() - 1))
                                    .feature();
                            if (feature > highest) {
                                highest = feature;
                                best = folder;
                            }
                        }
                    }
                }
            }
        }
        return Optional.ofNullable(best);
    }
}
