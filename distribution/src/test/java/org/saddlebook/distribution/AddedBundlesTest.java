package org.saddlebook.distribution;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.jar.Attributes;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.zip.ZipEntry;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

/** Bundles from outside: a rate model built against the api jar alone comes and goes, a broken one takes nothing down. */
@Timeout(300)
class AddedBundlesTest {
    /** Built once from {@code distribution/example-model} and kept: an add-on of today must run with every later api. */
    private static final Path EXAMPLE = Path.of("src/test/resources/old-binaries/example.harcourt-esson-1.0.0.jar")
            .toAbsolutePath();

    private static final String NAME = "example.harcourt-esson";

    @TempDir
    private Path home;

    private InstalledProduct product;

    @BeforeEach
    void install() throws IOException {
        product = InstalledProduct.of(InstalledProduct.ASSEMBLED, home);
        InstalledProduct.table(home);
    }

    @Test
    void aForeignModelIsAddedUsedEverywhereAndRemoved() throws Exception {
        InstalledProduct.Outcome before = product.run("evaluate", "rates.csv", "--at", "25degC", "--json");
        InstalledProduct.Outcome added = product.run("bundles", "add", EXAMPLE.toString());
        assertEquals(0, added.exitCode(), added.all());
        assertTrue(added.out().contains("rate model " + NAME), added.out());

        assertTrue(product.run("models").out().contains(NAME + "  "));
        InstalledProduct.Outcome evaluated =
                product.run("evaluate", "rates.csv", "--at", "25degC", "--json", "--out", "result");
        assertEquals(0, evaluated.exitCode(), evaluated.err());
        assertTrue(evaluated.out().contains("\"id\": \"" + NAME + "\""), "it is not fitted");
        assertTrue(evaluated.out().contains("\"model\": \"" + NAME + "\""), "it does not predict");
        assertTrue(evaluated.out().contains("\"name\": \"" + NAME + "\""), "it is not named as a contributor");
        assertTrue(evaluated.out().contains(sha256(EXAMPLE)), "its hash is not named");
        String weights = evaluated.out().substring(evaluated.out().indexOf("akaikeWeights"));
        assertTrue(weights.substring(0, weights.indexOf('}')).contains(NAME), "it is not compared");
        assertTrue(Files.readString(home.resolve("result/report.html")).contains("Harcourt"), "it is not reported");
        InstalledProduct.Outcome list = product.run("bundles", "list");
        assertTrue(list.out().lines().anyMatch(line -> line.startsWith(NAME) && line.contains("added")), list.out());
        assertEquals(0, product.run("bundles", "check").exitCode());

        InstalledProduct.Outcome removed = product.run("bundles", "remove", NAME);
        assertEquals(0, removed.exitCode(), removed.all());
        assertFalse(product.run("models").out().contains(NAME));
        assertEquals(
                before.out(),
                product.run("evaluate", "rates.csv", "--at", "25degC", "--json").out());
    }

    @Test
    void removingWhatIsNotThereNamesTheNearestOne() throws Exception {
        assertEquals(0, product.run("bundles", "add", EXAMPLE.toString()).exitCode());
        InstalledProduct.Outcome missed = product.run("bundles", "remove", "example.harcourt-eson");
        assertEquals(1, missed.exitCode());
        assertTrue(missed.err().contains("Did you mean " + NAME + "?"), missed.err());
    }

    @Test
    void aFileThatIsNoBundleIsNotAdded() throws Exception {
        InstalledProduct.Outcome refused = product.run("bundles", "add", "rates.csv");
        assertEquals(2, refused.exitCode());
        assertTrue(refused.err().contains("Bundle-SymbolicName"), refused.err());
    }

    @Test
    void aBundleThatNeedsWhatIsNotThereIsNotAdded() throws Exception {
        Path jar = bundle("lacking.jar", "org.example.lacking", "nowhere.to.be.found;version=\"[2,3)\"", null);
        InstalledProduct.Outcome refused = product.run("bundles", "add", jar.toString());
        assertEquals(1, refused.exitCode(), refused.all());
        assertTrue(refused.err().contains("nowhere.to.be.found from version 2.0.0 below 3.0.0"), refused.err());
        assertFalse(Files.exists(product.data().resolve("bundles/org.example.lacking-1.0.0.jar")));
    }

    @Test
    void aBundleWithTheNameOfOneOfTheProductIsNotAdded() throws Exception {
        Path jar = bundle("double.jar", "org.saddlebook.barrier", null, null);
        InstalledProduct.Outcome refused = product.run("bundles", "add", jar.toString());
        assertEquals(1, refused.exitCode(), refused.all());
        assertTrue(refused.err().contains("name of a bundle of the product"), refused.err());
    }

    @Test
    void brokenBundlesAreNamedAndEverythingElseGoesOn() throws Exception {
        String sound = product.run("evaluate", "rates.csv", "--json").out();
        Path bundles = Files.createDirectories(product.data().resolve("bundles"));
        Files.writeString(bundles.resolve("a-garbage.jar"), "this is no jar");
        bundle("data/saddlebook/bundles/b-lacking.jar", "org.example.lacking", "nowhere.to.be.found", null);
        bundle("data/saddlebook/bundles/c-no-activator.jar", "org.example.activator", null, "org.example.Missing");
        bundle("data/saddlebook/bundles/d-double.jar", "org.saddlebook.evaluation", null, null);
        InstalledProduct.Outcome outcome = product.run("evaluate", "rates.csv", "--json");
        assertEquals(0, outcome.exitCode(), outcome.all());
        assertEquals(sound, outcome.out());
        for (String name :
                new String[] {"a-garbage.jar", "org.example.lacking", "org.example.activator", "d-double.jar"}) {
            assertTrue(outcome.err().contains(name), () -> name + " is not named in\n" + outcome.err());
        }
        assertFalse(outcome.showsAStackTrace(), outcome.err());
        InstalledProduct.Outcome list = product.run("bundles", "list");
        assertTrue(list.out().contains("nowhere.to.be.found"), list.out());
        assertEquals(1, product.run("bundles", "check").exitCode());
    }

    @Test
    void anAddedBundleCannotPutItsOwnApiUnderTheProduct() throws Exception {
        Path bundles = Files.createDirectories(product.data().resolve("bundles"));
        Manifest manifest = manifest("org.example.hijack");
        manifest.getMainAttributes().putValue("Export-Package", "org.saddlebook.api.model;version=\"1.9.0\"");
        write(bundles.resolve("hijack.jar"), manifest);
        InstalledProduct.Outcome outcome = product.run("evaluate", "rates.csv", "--json");
        assertEquals(0, outcome.exitCode(), outcome.all());
        assertTrue(outcome.out().contains("\"outcome\": \"fitted\""));
    }

    @Test
    void aPolicyListsTheBundlesThatMayStart() throws Exception {
        assertEquals(0, product.run("bundles", "add", EXAMPLE.toString()).exitCode());
        Path policy = Files.writeString(
                home.resolve("policy.json"), "{ \"userBundles\": { \"allow\": \"listed\", \"sha256\": [] } }");
        product.with("SADDLEBOOK_POLICY", policy.toString());
        InstalledProduct.Outcome models = product.run("models");
        assertEquals(0, models.exitCode());
        assertFalse(models.out().contains(NAME));
        assertTrue(models.err().contains(EXAMPLE.getFileName().toString())
                && models.err().contains(sha256(EXAMPLE)));
        assertEquals(1, models.err().lines().count(), models.err());
        InstalledProduct.Outcome refused = product.run("bundles", "add", EXAMPLE.toString());
        assertEquals(1, refused.exitCode());

        Files.writeString(
                policy, "{ \"userBundles\": { \"allow\": \"listed\", \"sha256\": [\"" + sha256(EXAMPLE) + "\"] } }");
        assertTrue(product.run("models").out().contains(NAME));
        Files.writeString(policy, "{ \"userBundles\": { \"allow\": \"none\" } }");
        assertFalse(product.run("models").out().contains(NAME));
    }

    private Path bundle(String name, String symbolicName, String imports, String activator) throws IOException {
        Manifest manifest = manifest(symbolicName);
        if (imports != null) {
            manifest.getMainAttributes().putValue("Import-Package", imports);
        }
        if (activator != null) {
            manifest.getMainAttributes().putValue("Bundle-Activator", activator);
        }
        Path jar = home.resolve(name);
        write(jar, manifest);
        return jar;
    }

    private static Manifest manifest(String symbolicName) {
        Manifest manifest = new Manifest();
        Attributes main = manifest.getMainAttributes();
        main.put(Attributes.Name.MANIFEST_VERSION, "1.0");
        main.putValue("Bundle-ManifestVersion", "2");
        main.putValue("Bundle-SymbolicName", symbolicName);
        main.putValue("Bundle-Version", "1.0.0");
        return manifest;
    }

    private static void write(Path jar, Manifest manifest) throws IOException {
        try (OutputStream out = Files.newOutputStream(jar);
                JarOutputStream stream = new JarOutputStream(out, manifest)) {
            stream.putNextEntry(new ZipEntry("readme.txt"));
            stream.write("made by a test".getBytes(StandardCharsets.UTF_8));
        }
    }

    private static String sha256(Path file) throws Exception {
        return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file)));
    }
}
