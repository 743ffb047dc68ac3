package org.saddlebook.intake.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.Assertions;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.DataReader;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.campaign.json.internal.JsonCampaignFormat;
import org.saddlebook.reader.text.internal.DelimitedTextReader;

/** An intake with the real format and the real text reader, and a clock that stands still. */
final class IntakeFixture {
    static final Clock CLOCK = Clock.fixed(Instant.parse("2026-03-02T09:30:00.123Z"), ZoneOffset.UTC);
    static final CampaignFormat FORMAT = new JsonCampaignFormat();
    static final String TABLE = "T (degC),k (1/min)\n25,0.12\n35,0.31\n45,0.74\n";

    private IntakeFixture() {}

    static InputOpener opener(DataReader... readers) {
        return new InputOpener(FORMAT, new TableImport(List.of(readers), CLOCK));
    }

    static Intake.Opened open(Path input) throws InputException {
        return open(opener(new DelimitedTextReader()), input);
    }

    static Intake.Opened open(InputOpener opener, Path input) throws InputException {
        try {
            return opener.open(input, ReadingRule.AUTOMATIC, "a.chemist", Progress.NONE);
        } catch (Cancelled e) {
            throw new AssertionError(e);
        }
    }

    static Problem problem(Path input) {
        return problem(opener(new DelimitedTextReader()), input);
    }

    static Problem problem(InputOpener opener, Path input) {
        return Assertions.assertThrows(InputException.class, () -> open(opener, input))
                .problems()
                .get(0);
    }

    static Path write(Path folder, String name, String text) throws IOException {
        return Files.writeString(folder.resolve(name), text, StandardCharsets.UTF_8);
    }
}
