package org.saddlebook.launcher.internal;

import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.security.CodeSigner;
import java.security.cert.Certificate;
import java.security.cert.CertificateEncodingException;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.jar.JarEntry;
import java.util.jar.JarInputStream;

/** Signatures of jars: every entry is read, and a signer counts only when it signed all of them. */
final class Signatures {
    private Signatures() {}

    /**
     * Fingerprints of the certificates that signed every entry of a jar.
     *
     * @return lower-case SHA-256 of the encoded end-entity certificates; empty when an entry is not signed
     * @throws SecurityException an entry does not match its signature
     */
    static Set<String> signersOfAll(InputStream bytes) throws IOException {
        Set<String> common = null;
        try (JarInputStream jar = new JarInputStream(bytes, true)) {
            if (jar.getManifest() == null) {
                return Set.of(); // without a manifest as its first entry nothing in a jar stream is verified
            }
            for (JarEntry entry = jar.getNextJarEntry(); entry != null; entry = jar.getNextJarEntry()) {
                jar.transferTo(OutputStream.nullOutputStream());
                if (entry.isDirectory() || belongsToSignature(entry.getName())) {
                    continue;
                }
                Set<String> signers = fingerprints(entry.getCodeSigners());
                if (common == null) {
                    common = new TreeSet<>(signers);
                } else {
                    common.retainAll(signers);
                }
            }
        }
        return common == null ? Set.of() : common;
    }

    private static Set<String> fingerprints(CodeSigner[] signers) throws IOException {
        Set<String> all = new TreeSet<>();
        if (signers != null) {
            for (CodeSigner signer : signers) {
                Certificate certificate =
                        signer.getSignerCertPath().getCertificates().get(0);
                try {
                    all.add(Digests.sha256(certificate.getEncoded()));
                } catch (CertificateEncodingException e) {
                    throw new IOException("a certificate that cannot be encoded", e);
                }
            }
        }
        return all;
    }

    private static boolean belongsToSignature(String name) {
        String upper = name.toUpperCase(Locale.ROOT);
        return upper.startsWith("META-INF/")
                && upper.indexOf('/', "META-INF/".length()) < 0
                && (upper.equals("META-INF/MANIFEST.MF")
                        || upper.endsWith(".SF")
                        || upper.endsWith(".RSA")
                        || upper.endsWith(".DSA")
                        || upper.endsWith(".EC"));
    }
}
