package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assertions.fail;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.task.Cancelled;

/**
 * What every reader must hold to: it reads its own files, and on anything else it ends in an {@link InputException} with
 * complete problems or in a valid result, never in another exception. Extend it and run it with JUnit 5.
 */
public abstract class DataReaderContract {
    private static final int LARGEST_HEAD = 64 * 1024;
    private static final int MUTANTS_PER_FILE = 200;

    /** Creates the contract. */
    protected DataReaderContract() {}

    /** A new instance of the reader. */
    protected abstract DataReader reader();

    /** Small files that the reader must read, at least one. */
    protected abstract List<Source> readable();

    @Test
    void hasAStableIdOfLowerCaseWords() {
        String id = reader().id();
        assertTrue(id.matches("[a-z][a-z0-9]*([.-][a-z0-9]+)*"), "id must be lower-case words: " + id);
        assertEquals(id, reader().id(), "the id must always be the same");
    }

    @Test
    void recognisesAndReadsItsOwnFiles() throws InputException, Cancelled {
        assertFalse(readable().isEmpty(), "readable() must not be empty");
        for (Source source : readable()) {
            int confidence = reader().confidence(head(source));
            assertTrue(
                    confidence > 0 && confidence <= 100,
                    "confidence must lie between 1 and 100 for " + source.name() + ": " + confidence);
            Imported imported = read(source);
            assertTrue(
                    imported.rateTable().isPresent() || !imported.directives().isEmpty(),
                    "nothing was found in " + source.name());
            assertFalse(imported.understood().isEmpty(), "say how the file was read: " + source.name());
        }
    }

    @Test
    void readsTheSameBytesAlikeAndLeavesThemAlone() throws InputException, Cancelled {
        for (Source source : readable()) {
            byte[] before = source.bytes().clone();
            Imported first = read(source);
            assertArrayEquals(before, source.bytes(), "the reader changed the bytes of " + source.name());
            assertEquals(first, read(source), "a second reading differs: " + source.name());
        }
    }

    @Test
    void endsInAProblemOrAResultOnWhateverBytes() {
        for (Source source : garbage()) {
            examine(source);
        }
    }

    @Test
    void endsInAProblemOrAResultOnDamagedFiles() {
        SplittableRandom random = new SplittableRandom(20);
        for (Source source : readable()) {
            for (int i = 0; i < MUTANTS_PER_FILE; i++) {
                examine(new Source(source.name(), damage(source.bytes(), random)));
            }
        }
    }

    @Test
    void letsCancellationThrough() throws InputException {
        for (Source source : readable()) {
            try {
                reader().read(source, ReadingRule.AUTOMATIC, ImmediateTask.cancelled());
            } catch (Cancelled expected) {
                assertEquals("cancelled", expected.getMessage(), "cancellation must pass through as it is");
            }
        }
    }

    private Imported read(Source source) throws InputException, Cancelled {
        return reader().read(source, ReadingRule.AUTOMATIC, ImmediateTask.seeded(1));
    }

    private void examine(Source source) {
        String what = source.name() + " beginning " + preview(source.bytes());
        try {
            int confidence = reader().confidence(head(source));
            assertTrue(confidence >= 0 && confidence <= 100, "confidence " + confidence + " for " + what);
            Imported imported = read(source);
            imported.rateTable().ifPresent(table -> assertFalse(table.points().isEmpty(), what));
        } catch (InputException refused) {
            for (Problem problem : refused.problems()) {
                complete(problem, source, what);
            }
        } catch (Cancelled cancelled) {
            fail("nobody cancelled: " + what, cancelled);
        } catch (RuntimeException | StackOverflowError broken) {
            fail("a reader ends in a result or an InputException, whatever it is given: " + what, broken);
        }
    }

    private static void complete(Problem problem, Source source, String what) {
        assertTrue(problem.code().matches("[a-z][a-z0-9]*(-[a-z0-9]+)*"), "code: " + problem);
        assertEquals(source.name(), problem.place().file(), "a problem names the file as the user gave it: " + problem);
        assertFalse(problem.expected().isBlank(), "expected is empty in " + problem + " for " + what);
        assertFalse(problem.remedy().isBlank(), "remedy is empty in " + problem + " for " + what);
        assertTrue(
                problem.place().line().isEmpty() || problem.place().line().getAsInt() >= 1,
                "lines count from 1: " + problem);
    }

    private List<Source> garbage() {
        String name = readable().get(0).name();
        List<Source> all = new ArrayList<>();
        all.add(new Source(name, new byte[0]));
        for (String text : List.of(
                " ",
                "\n",
                "\r\n\r\n",
                "\0\0\0\0",
                "T,k",
                "T (K),k (1/s)",
                "T (K),k (1/s)\n",
                "T (K),k (1/s)\n300",
                "T (K),k (1/s)\n,\n,\n",
                "T (K),k (1/s)\nNaN,NaN\ninf,-inf\n1e999,1e-999\n",
                "T (K),k (1/s)\n-1,0\n0,-1\n",
                "T (K),T (K)\n300,300\n",
                "\"T (K),k (1/s)\n300,1",
                "#",
                "# standard state:",
                "#:",
                "{\"schema\":",
                "<?xml version=\"1.0\"?><!DOCTYPE a [<!ENTITY b SYSTEM \"file:///nowhere\">]><a>&b;</a>",
                "\u00b0\u2020\ud83d\ude00",
                "=1+1,@A1,-2+3")) {
            all.add(new Source(name, text.getBytes(StandardCharsets.UTF_8)));
            all.add(new Source(name, text.getBytes(StandardCharsets.UTF_16LE)));
            all.add(new Source(name, text.getBytes(StandardCharsets.UTF_16)));
            all.add(new Source(name, ("\ufeff" + text).getBytes(StandardCharsets.UTF_8)));
        }
        for (byte[] bytes : new byte[][] {
            {(byte) 0xFF, (byte) 0xFE},
            {(byte) 0xFE, (byte) 0xFF},
            {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF},
            {(byte) 0xC3},
            {'P', 'K', 3, 4},
            {0x1F, (byte) 0x8B},
            filled(',', 20_000),
            filled('(', 20_000),
            filled('"', 20_001)
        }) {
            all.add(new Source(name, bytes));
        }
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < 50; i++) {
            byte[] noise = new byte[1 + random.nextInt(400)];
            random.nextBytes(noise);
            all.add(new Source(name, noise));
        }
        return all;
    }

    private static byte[] filled(char character, int length) {
        byte[] bytes = new byte[length];
        Arrays.fill(bytes, (byte) character);
        return bytes;
    }

    private static byte[] damage(byte[] original, SplittableRandom random) {
        byte[] bytes = original.clone();
        int length = Math.max(1, bytes.length);
        switch (random.nextInt(4)) {
            case 0 -> {
                return Arrays.copyOf(bytes, random.nextInt(length));
            }
            case 1 -> {
                for (int i = 0; i < 3 && bytes.length > 0; i++) {
                    bytes[random.nextInt(length)] = (byte) random.nextInt(256);
                }
                return bytes;
            }
            case 2 -> {
                int at = random.nextInt(bytes.length + 1);
                byte[] longer = Arrays.copyOf(bytes, bytes.length + 1);
                System.arraycopy(bytes, at, longer, at + 1, bytes.length - at);
                longer[at] = (byte) ",;\t\"\n-.e0#(".charAt(random.nextInt(11));
                return longer;
            }
            default -> {
                int from = random.nextInt(bytes.length + 1);
                int to = from + random.nextInt(bytes.length - from + 1);
                byte[] shorter = Arrays.copyOf(bytes, bytes.length - (to - from));
                System.arraycopy(bytes, to, shorter, from, bytes.length - to);
                return shorter;
            }
        }
    }

    private static SourceHead head(Source source) {
        byte[] bytes = source.bytes();
        return new SourceHead(source.name(), Arrays.copyOf(bytes, Math.min(bytes.length, LARGEST_HEAD)), bytes.length);
    }

    private static String preview(byte[] bytes) {
        StringBuilder text = new StringBuilder("\"");
        for (int i = 0; i < Math.min(60, bytes.length); i++) {
            int b = bytes[i] & 0xFF;
            if (b >= 0x20 && b < 0x7F) {
                text.append((char) b);
            } else {
                text.append("\\x").append(Character.forDigit(b >> 4, 16)).append(Character.forDigit(b & 15, 16));
            }
        }
        return text.append("\" (").append(bytes.length).append(" bytes)").toString();
    }
}
