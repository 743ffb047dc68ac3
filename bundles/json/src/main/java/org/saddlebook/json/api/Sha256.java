package org.saddlebook.json.api;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;

/** SHA-256 (FIPS 180-4) as files and documents name it: 64 lower-case hexadecimal digits. */
public final class Sha256 {
    private static final String HEX = "0123456789abcdef";

    private Sha256() {}

    /** The hash of these bytes. */
    public static String of(byte[] bytes) {
        byte[] hash;
        try {
            hash = MessageDigest.getInstance("SHA-256").digest(bytes);
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException(e); // every Java platform has it
        }
        StringBuilder text = new StringBuilder(64);
        for (byte b : hash) {
            text.append(HEX.charAt(b >> 4 & 15)).append(HEX.charAt(b & 15));
        }
        return text.toString();
    }

    /** Whether a text has the form of a hash. */
    public static boolean isHash(String text) {
        if (text.length() != 64) {
            return false;
        }
        for (int i = 0; i < 64; i++) {
            if (HEX.indexOf(text.charAt(i)) < 0) {
                return false;
            }
        }
        return true;
    }
}
