package org.saddlebook.testkit.api;

import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Nested;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.Imported;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.reader.Source;
import org.saddlebook.api.reader.SourceHead;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** The contract lets a sound reader pass and catches one that throws something else. */
class DataReaderContractTest {
    private static final Source GOOD =
            new Source("pairs.txt", "T/K k/(1/s)\n300 0.001\n310 0.003\n".getBytes(StandardCharsets.UTF_8));

    @Nested
    class SoundReader extends DataReaderContract {
        @Override
        protected DataReader reader() {
            return new PairReader();
        }

        @Override
        protected List<Source> readable() {
            return List.of(GOOD);
        }
    }

    @Test
    void catchesAReaderThatThrowsSomethingElse() {
        DataReaderContract contract = of(new PairReader() {
            @Override
            RatePoint point(Source source, int line, String text) {
                String[] cells = text.split(" ", -1);
                return RatePoint.of(Double.parseDouble(cells[0]), Double.parseDouble(cells[1]));
            }
        });
        AssertionError error = assertThrows(AssertionError.class, contract::endsInAProblemOrAResultOnDamagedFiles);
        assertTrue(error.getMessage().contains("InputException"), error.getMessage());
    }

    @Test
    void catchesAProblemThatNamesAnotherFile() {
        DataReaderContract contract = of(new PairReader() {
            @Override
            Place place(Source source, int line) {
                return Place.of("somewhere else", line);
            }
        });
        assertThrows(AssertionError.class, contract::endsInAProblemOrAResultOnWhateverBytes);
    }

    @Test
    void catchesAReaderThatChangesTheBytes() {
        Source source = new Source("pairs.txt", GOOD.bytes().clone());
        DataReaderContract contract = new DataReaderContract() {
            @Override
            protected DataReader reader() {
                return new PairReader() {
                    @Override
                    public Imported read(Source given, ReadingRule rule, Task task) throws InputException, Cancelled {
                        Imported imported = super.read(given, rule, task);
                        given.bytes()[given.bytes().length - 1] = ' ';
                        return imported;
                    }
                };
            }

            @Override
            protected List<Source> readable() {
                return List.of(source);
            }
        };
        assertThrows(AssertionError.class, contract::readsTheSameBytesAlikeAndLeavesThemAlone);
    }

    private static DataReaderContract of(DataReader reader) {
        return new DataReaderContract() {
            @Override
            protected DataReader reader() {
                return reader;
            }

            @Override
            protected List<Source> readable() {
                return List.of(GOOD);
            }
        };
    }

    /** Reads two blank-separated numbers per line after one fixed header. */
    private static class PairReader implements DataReader {
        private static final String HEADER = "T/K k/(1/s)";

        @Override
        public String id() {
            return "test.pairs";
        }

        @Override
        public int confidence(SourceHead head) {
            return new String(head.start(), StandardCharsets.UTF_8).startsWith(HEADER) ? 100 : 0;
        }

        @Override
        public Imported read(Source source, ReadingRule rule, Task task) throws InputException, Cancelled {
            task.check();
            List<String> lines =
                    new String(source.bytes(), StandardCharsets.UTF_8).lines().toList();
            if (lines.isEmpty() || !lines.get(0).equals(HEADER) || lines.size() < 2) {
                throw problem(source, 1, lines.isEmpty() ? "" : lines.get(0));
            }
            List<RatePoint> points = new ArrayList<>();
            for (int i = 1; i < lines.size(); i++) {
                points.add(point(source, i + 1, lines.get(i)));
            }
            return new Imported(
                    Optional.of(new RateTable(TestLaw.PER_SECOND, 1, points)), List.of(), List.of("pairs of numbers"));
        }

        RatePoint point(Source source, int line, String text) throws InputException {
            String[] cells = text.split(" ", -1);
            try {
                return RatePoint.of(Double.parseDouble(cells[0]), Double.parseDouble(cells[cells.length - 1]));
            } catch (IllegalArgumentException notAPair) {
                throw problem(source, line, text);
            }
        }

        Place place(Source source, int line) {
            return Place.of(source.name(), line);
        }

        private InputException problem(Source source, int line, String found) {
            return new InputException(new Problem(
                    "not-a-pair", place(source, line), found, "two positive numbers", "Write temperature and rate."));
        }
    }
}
