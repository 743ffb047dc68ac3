package org.saddlebook.register.api;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * A SHA-256 (FIPS 180-4).
 *
 * @param hex 64 lower-case hexadecimal digits
 */
public record Digest(String hex) {
    /** Checks the digits. */
    public Digest {
        if (!isHex(hex)) {
            throw new IllegalArgumentException("not a SHA-256 in lower-case hexadecimal: " + hex);
        }
    }

    private static boolean isHex(String text) {
        if (text.length() != 64) {
            return false;
        }
        for (int i = 0; i < 64; i++) {
            char c = text.charAt(i);
            if (!((c >= '0' && c <= '9') || (c >= 'a' && c <= 'f'))) {
                return false;
            }
        }
        return true;
    }

    /** The digest with these 32 bytes. */
    public static Digest of(byte[] bytes) {
        return new Digest(HexFormat.of().formatHex(bytes));
    }

    /** The digest of these bytes. */
    public static Digest sha256(byte[] content) {
        return of(algorithm().digest(content));
    }

    /** A fresh SHA-256; every Java platform has it. */
    public static MessageDigest algorithm() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform provides SHA-256", e);
        }
    }

    /** The 32 bytes. */
    public byte[] bytes() {
        return HexFormat.of().parseHex(hex);
    }

    @Override
    public String toString() {
        return hex;
    }
}
