package org.saddlebook.estimation.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.util.List;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

/** Whether intervals hold the truth as often as they say: a sample at every build, the whole table in the long run. */
class CoverageTest {
    private static final Path TABLE = Path.of("target", "checks", "coverage.md");
    private static final Path SAMPLE = Path.of("target", "checks", "coverage-sample.md");

    private static void compare(CoverageProgram.Cell cell, double lowest, double highest, long seed) {
        assertTrue(
                cell.percent() >= lowest && cell.percent() <= highest,
                () -> cell.method + ", " + cell.quantity + ", n = " + cell.n + ": " + cell.held + " of " + cell.all
                        + ", seed " + seed);
    }

    @Test
    void aSampleOfNewCampaignsCoversRoughlyAsClaimed() throws IOException {
        // 1,000 campaigns: one standard error is 0.7 %, the bounds lie beyond six of them.
        long seed = new SecureRandom().nextInt(1_000_000_000);
        System.out.println("coverage sample, seed " + seed);
        CoverageProgram program = new CoverageProgram(1000, seed);
        List<CoverageProgram.Cell> cells = program.claims();
        assertEquals(4 * 2 * 9, cells.size());
        for (CoverageProgram.Cell cell : cells) {
            if (!cell.method.startsWith("1.96")) {
                compare(cell, 90.5, 99.5, seed);
            }
        }
        program.write(SAMPLE);
    }

    @Test
    @Tag("long")
    void twentyThousandCampaignsCoverAsClaimed() throws IOException {
        long seed = 20_260_401;
        CoverageProgram program = new CoverageProgram(20_000, seed);
        List<CoverageProgram.Cell> cells = program.claims();
        program.write(TABLE);
        for (CoverageProgram.Cell cell : cells) {
            if (cell.method.startsWith("Student") || cell.method.startsWith("Fieller")) {
                compare(cell, 94.4, 95.6, seed);
            } else if (cell.method.startsWith("t plus normal")) {
                compare(cell, 94.4, 98, seed);
            } else {
                // The habit of 1.96 standard errors is in the table to show what it costs.
                compare(cell, 75, 94, seed);
            }
        }
        program.blocks();
        program.rest();
        program.write(TABLE);
    }
}
