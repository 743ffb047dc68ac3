package org.saddlebook.reader.text.internal;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import org.saddlebook.api.problem.InputException;

/** Bytes to text. What is not text in UTF-8, UTF-16 or Windows-1252 is refused; no character is replaced. */
final class TextDecoder {
    /**
     * Text and the sentence that says how it was read.
     *
     * @param text without a byte order mark
     * @param understood for people
     */
    record Decoded(String text, String understood) {}

    private static final String REMEDY =
            "save the table as text in UTF-8, with columns separated by commas," + " semicolons or tabs";

    /** Fewer bytes show no pattern. */
    private static final int SHORTEST_UTF16 = 8;

    private TextDecoder() {}

    /** Decodes; {@code encoding} is empty to find it out, else utf-8, utf-16le, utf-16be or windows-1252. */
    static Decoded decode(byte[] bytes, String encoding, Problems problems) throws InputException {
        String binary = binaryKind(bytes);
        if (!binary.isEmpty()) {
            throw problems.fatal("not-text", problems.wholeFile(), binary, "delimited text", REMEDY);
        }
        Decoded decoded = encoding.isEmpty() ? detected(bytes, problems) : prescribed(bytes, encoding, problems);
        checkCharacters(decoded.text(), problems);
        return decoded;
    }

    /** What a binary file is, by its first bytes; empty when none is recognised. */
    static String binaryKind(byte[] bytes) {
        if (startsWith(bytes, 'P', 'K', 3, 4) || startsWith(bytes, 'P', 'K', 5, 6)) {
            return "a ZIP archive or a spreadsheet file";
        }
        if (startsWith(bytes, '%', 'P', 'D', 'F')) {
            return "a PDF document";
        }
        if (startsWith(bytes, 0xD0, 0xCF, 0x11, 0xE0)) {
            return "an old office document";
        }
        if (startsWith(bytes, 0x1F, 0x8B)) {
            return "a gzip archive";
        }
        if (startsWith(bytes, 0x89, 'P', 'N', 'G') || startsWith(bytes, 0xFF, 0xD8, 0xFF)) {
            return "a picture";
        }
        return "";
    }

    /** Whether bytes without a byte order mark are UTF-16, as their zero bytes say: 0 no, -1 little, 1 big endian. */
    static int utf16Guess(byte[] bytes, int length) {
        int evenZeros = 0;
        int oddZeros = 0;
        for (int i = 0; i < length; i++) {
            if (bytes[i] == 0) {
                if (i % 2 == 0) {
                    evenZeros++;
                } else {
                    oddZeros++;
                }
            }
        }
        // Tables are nearly all ASCII: one byte of each pair is zero in most pairs, and the other never.
        int most = length / 2 * 8 / 10;
        boolean candidate = length >= SHORTEST_UTF16 && length % 2 == 0;
        if (candidate && oddZeros >= most && evenZeros == 0) {
            return -1;
        }
        return candidate && evenZeros >= most && oddZeros == 0 ? 1 : 0;
    }

    private static Decoded detected(byte[] bytes, Problems problems) throws InputException {
        if (startsWith(bytes, 0xEF, 0xBB, 0xBF)) {
            return strict(bytes, 3, StandardCharsets.UTF_8, "read as UTF-8, with a byte order mark", problems);
        }
        if (startsWith(bytes, 0xFF, 0xFE, 0, 0) || startsWith(bytes, 0, 0, 0xFE, 0xFF)) {
            throw wrong("text in UTF-32", problems);
        }
        if (startsWith(bytes, 0xFF, 0xFE)) {
            return strict(bytes, 2, StandardCharsets.UTF_16LE, "read as UTF-16, little-endian", problems);
        }
        if (startsWith(bytes, 0xFE, 0xFF)) {
            return strict(bytes, 2, StandardCharsets.UTF_16BE, "read as UTF-16, big-endian", problems);
        }
        int guess = utf16Guess(bytes, bytes.length);
        if (guess != 0) {
            return strict(
                    bytes,
                    0,
                    guess < 0 ? StandardCharsets.UTF_16LE : StandardCharsets.UTF_16BE,
                    "read as UTF-16, " + (guess < 0 ? "little" : "big")
                            + "-endian, without a byte order mark, as its zero bytes show",
                    problems);
        }
        String text = tryDecode(bytes, 0, StandardCharsets.UTF_8);
        if (text != null) {
            return new Decoded(text, "read as UTF-8");
        }
        String western = tryDecode(bytes, 0, Charset.forName("windows-1252"));
        if (western == null) {
            throw wrong("bytes that are neither UTF-8 nor Windows-1252", problems);
        }
        return new Decoded(western, "read as Windows-1252 (Latin-1), because it is not valid UTF-8");
    }

    private static Decoded prescribed(byte[] bytes, String encoding, Problems problems) throws InputException {
        Charset charset = switch (encoding) {
            case "utf-8" -> StandardCharsets.UTF_8;
            case "utf-16le" -> StandardCharsets.UTF_16LE;
            case "utf-16be" -> StandardCharsets.UTF_16BE;
            default -> Charset.forName("windows-1252");
        };
        Decoded decoded = strict(bytes, 0, charset, "read as " + encoding + ", as the reading rule says", problems);
        return decoded.text().startsWith("\uFEFF")
                ? new Decoded(decoded.text().substring(1), decoded.understood())
                : decoded;
    }

    private static Decoded strict(byte[] bytes, int skip, Charset charset, String understood, Problems problems)
            throws InputException {
        String text = tryDecode(bytes, skip, charset);
        if (text == null) {
            throw wrong("bytes that are not valid " + charset.name(), problems);
        }
        return new Decoded(text, understood);
    }

    private static String tryDecode(byte[] bytes, int skip, Charset charset) {
        try {
            return charset.newDecoder()
                    .onMalformedInput(CodingErrorAction.REPORT)
                    .onUnmappableCharacter(CodingErrorAction.REPORT)
                    .decode(ByteBuffer.wrap(bytes, skip, bytes.length - skip))
                    .toString();
        } catch (CharacterCodingException e) {
            return null;
        }
    }

    private static void checkCharacters(String text, Problems problems) throws InputException {
        int line = 1;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '\n' || (c == '\r' && (i + 1 == text.length() || text.charAt(i + 1) != '\n'))) {
                line++;
            } else if (c == '\uFFFD') {
                throw problems.fatal(
                        "wrong-encoding",
                        problems.place(line),
                        "the replacement character U+FFFD",
                        "text whose characters are all known",
                        "export the table again from its source: an earlier program has lost a character here");
            } else if (c != '\t' && c != '\r' && (c < ' ' || (c >= 0x7F && c < 0xA0))) {
                throw problems.fatal(
                        "not-text",
                        problems.place(line),
                        "the control character U+" + hex(c),
                        "delimited text",
                        REMEDY);
            }
        }
    }

    private static String hex(char c) {
        String digits = Integer.toHexString(c);
        return "0000".substring(digits.length()) + digits.toUpperCase(Locale.ROOT);
    }

    private static InputException wrong(String found, Problems problems) {
        return problems.fatal(
                "wrong-encoding",
                problems.wholeFile(),
                found,
                "text in UTF-8, UTF-16 or Windows-1252 (Latin-1)",
                "save the file as text in UTF-8");
    }

    private static boolean startsWith(byte[] bytes, int... magic) {
        if (bytes.length < magic.length) {
            return false;
        }
        for (int i = 0; i < magic.length; i++) {
            if (bytes[i] != (byte) magic[i]) {
                return false;
            }
        }
        return true;
    }
}
