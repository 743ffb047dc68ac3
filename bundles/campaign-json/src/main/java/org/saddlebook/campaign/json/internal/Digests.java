package org.saddlebook.campaign.json.internal;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;

/** SHA-256 in lower-case hexadecimal. */
final class Digests {
    private static final String HEX = "0123456789abcdef";

    private Digests() {}

    static String sha256(byte[] bytes) {
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

    static boolean isSha256(String text) {
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
