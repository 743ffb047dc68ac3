package org.saddlebook.launcher.internal;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;

/** SHA-256 as lower-case hexadecimal. */
final class Digests {
    private static final char[] HEX = "0123456789abcdef".toCharArray();

    private Digests() {}

    static MessageDigest sha256() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    static String sha256(byte[] bytes) {
        return hex(sha256().digest(bytes));
    }

    static String hex(byte[] bytes) {
        char[] text = new char[2 * bytes.length];
        for (int i = 0; i < bytes.length; i++) {
            text[2 * i] = HEX[(bytes[i] >> 4) & 0xf];
            text[2 * i + 1] = HEX[bytes[i] & 0xf];
        }
        return new String(text);
    }
}
