package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Reads texts and compares problems, for the tests of this bundle. */
final class Reading {
    static final String FILE = "table.csv";

    /** Work that nobody watches. */
    static final Task TASK = new Task() {
        @Override
        public void progress(double fraction, String doing) {}

        @Override
        public void check() {}

        @Override
        public RandomGenerator random(String stream) {
            throw new AssertionError("a reader draws no random numbers");
        }

        @Override
        public <T> List<T> parts(int count, IntFunction<T> part) {
            throw new AssertionError("a reader has no parts");
        }
    };

    private Reading() {}

    static Imported read(byte[] bytes, Map<String, String> options) throws InputException {
        try {
            return new DelimitedTextReader().read(new Source(FILE, bytes), new ReadingRule(options), TASK);
        } catch (Cancelled e) {
            throw new AssertionError(e);
        }
    }

    static Imported read(byte[] bytes) throws InputException {
        return read(bytes, Map.of());
    }

    static Imported read(String text) throws InputException {
        return read(text.getBytes(StandardCharsets.UTF_8));
    }

    static RateTable table(String text) throws InputException {
        return read(text).rateTable().orElseThrow();
    }

    static List<Problem> problems(byte[] bytes) {
        return assertThrows(InputException.class, () -> read(bytes)).problems();
    }

    static List<Problem> problems(String text) {
        return problems(text.getBytes(StandardCharsets.UTF_8));
    }

    /** Asserts that there is one problem, in all its parts; column is null when the place names none. */
    static void assertProblem(
            String text, String code, int line, String column, String found, String expected, String remedy) {
        assertProblem(problems(text), code, OptionalInt.of(line), column, found, expected, remedy);
    }

    static void assertProblem(
            List<Problem> problems,
            String code,
            OptionalInt line,
            String column,
            String found,
            String expected,
            String remedy) {
        Place place = new Place(FILE, line, Optional.ofNullable(column));
        assertEquals(List.of(new Problem(code, place, found, expected, remedy)), problems);
    }
}
