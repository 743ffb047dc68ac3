package org.saddlebook.launcher.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.KeyStore;
import java.security.PrivateKey;
import java.security.cert.CertificateFactory;
import java.util.List;
import java.util.concurrent.TimeUnit;
import java.util.jar.JarOutputStream;
import java.util.jar.Manifest;
import java.util.zip.ZipEntry;
import java.util.zip.ZipFile;
import jdk.security.jarsigner.JarSigner;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.api.io.TempDir;

class PolicyTest {
    private static final byte[] BUNDLE = "some bytes".getBytes(StandardCharsets.UTF_8);

    @TempDir
    private Path folder;

    private Policy policy(String text) throws IOException, Refused {
        Path file = Files.createTempFile(folder, "policy", ".json");
        return Policy.read(Files.writeString(file, text));
    }

    @Test
    void withoutAFileEverythingIsAllowed() throws Refused {
        Policy policy = Policy.read(folder.resolve("none.json"));
        assertSame(Policy.OPEN, policy);
        assertEquals("", policy.forbids(BUNDLE));
    }

    @Test
    void listedBundlesMayStartAndOthersMayNot() throws Exception {
        Policy policy = policy(
                "{ \"userBundles\": { \"allow\": \"listed\", \"sha256\": [\"" + Digests.sha256(BUNDLE) + "\"] } }");
        assertEquals("", policy.forbids(BUNDLE));
        assertTrue(policy.forbids(new byte[] {1}).contains("does not list it"));
    }

    @Test
    void aSecondPolicyOnlyTightens() throws Exception {
        Policy machine = policy(
                "{ \"userBundles\": { \"allow\": \"none\" }, \"features\": { \"off\": [\"a\"] }, \"register\": \"/r\" }");
        Policy own = policy("{ \"userBundles\": { \"allow\": \"any\" }, \"features\": { \"off\": [\"b\"] },"
                + " \"register\": \"/mine\" }");
        Policy both = machine.and(own);
        assertTrue(both.forbids(BUNDLE).contains("no added bundles"));
        assertEquals(List.of("a", "b"), both.featuresOff());
        assertEquals("/r", both.register());
        assertTrue(Policy.OPEN.and(machine).forbids(BUNDLE).contains("no added bundles"));

        String hash = Digests.sha256(BUNDLE);
        Policy one = policy("{ \"userBundles\": { \"allow\": \"listed\", \"sha256\": [\"" + hash + "\"] } }");
        Policy other = policy("{ \"userBundles\": { \"allow\": \"listed\" } }");
        assertEquals("", one.and(one).forbids(BUNDLE));
        assertTrue(one.and(other).forbids(BUNDLE).contains("does not list it"));
        assertTrue(other.and(one).forbids(BUNDLE).contains("does not list it"));
    }

    @Test
    void aPolicyThatIsNotUnderstoodIsRefused() {
        for (String text : new String[] {
            "",
            "{ \"userBundles\": { \"allow\": \"some\" } }",
            "{ \"userBundles\": { \"sha256\": [\"abc\"] } }",
            "{ \"userBundles\": { \"alow\": \"any\" } }",
            "{ \"features\": { \"on\": [] } }",
            "{ \"schema\": \"saddlebook-policy/2\" }",
            "{ \"register\": \"/a\", \"register\": \"/b\" }"
        }) {
            assertThrows(Refused.class, () -> policy(text), text);
        }
    }

    @Test
    @Timeout(60)
    void aSignerCountsOnlyWhenItSignedEveryFile() throws Exception {
        Path store = folder.resolve("keys.p12");
        Process keytool = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "keytool")
                                .toString(),
                        "-genkeypair",
                        "-alias",
                        "lab",
                        "-keyalg",
                        "RSA",
                        "-dname",
                        "CN=Test",
                        "-storetype",
                        "PKCS12",
                        "-keystore",
                        store.toString(),
                        "-storepass",
                        "password")
                .redirectErrorStream(true)
                .redirectOutput(folder.resolve("keytool.txt").toFile())
                .start();
        assertTrue(keytool.waitFor(50, TimeUnit.SECONDS));
        KeyStore keys = KeyStore.getInstance(store.toFile(), "password".toCharArray());
        PrivateKey key = (PrivateKey) keys.getKey("lab", "password".toCharArray());
        var chain = CertificateFactory.getInstance("X.509").generateCertPath(List.of(keys.getCertificate("lab")));
        String fingerprint = Digests.sha256(keys.getCertificate("lab").getEncoded());

        Path plain = folder.resolve("plain.jar");
        jar(plain, null);
        Path signed = folder.resolve("signed.jar");
        try (ZipFile in = new ZipFile(plain.toFile());
                OutputStream out = Files.newOutputStream(signed)) {
            new JarSigner.Builder(key, chain).build().sign(in, out);
        }
        Policy policy =
                policy("{ \"userBundles\": { \"allow\": \"listed\", \"signers\": [\"" + fingerprint + "\"] } }");
        assertEquals("", policy.forbids(Files.readAllBytes(signed)));
        assertTrue(policy.forbids(Files.readAllBytes(plain)).contains("does not list it"));

        // The same signature with one more file, and with one file changed.
        Path more = folder.resolve("more.jar");
        repack(signed, more, "extra.txt", null);
        assertTrue(policy.forbids(Files.readAllBytes(more)).contains("does not list it"));
        Path changed = folder.resolve("changed.jar");
        repack(signed, changed, null, "file.txt");
        assertTrue(policy.forbids(Files.readAllBytes(changed)).contains("does not verify"));
    }

    private static void jar(Path file, String extra) throws IOException {
        Manifest manifest = new Manifest();
        manifest.getMainAttributes().putValue("Manifest-Version", "1.0");
        try (OutputStream out = Files.newOutputStream(file);
                JarOutputStream jar = new JarOutputStream(out, manifest)) {
            jar.putNextEntry(new ZipEntry(extra == null ? "file.txt" : extra));
            jar.write(BUNDLE);
        }
    }

    private static void repack(Path from, Path to, String extra, String change) throws IOException {
        try (ZipFile in = new ZipFile(from.toFile());
                OutputStream out = Files.newOutputStream(to);
                java.util.zip.ZipOutputStream zip = new java.util.zip.ZipOutputStream(out)) {
            for (ZipEntry entry : java.util.Collections.list(in.entries())) {
                zip.putNextEntry(new ZipEntry(entry.getName()));
                byte[] bytes = in.getInputStream(entry).readAllBytes();
                zip.write(entry.getName().equals(change) ? "other bytes".getBytes(StandardCharsets.UTF_8) : bytes);
            }
            if (extra != null) {
                zip.putNextEntry(new ZipEntry(extra));
                zip.write(BUNDLE);
            }
        }
    }
}
