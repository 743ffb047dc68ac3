package org.saddlebook.reader.text.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.Imported;

/** The example of the README is read as the README says. */
class ReadmeTest {
    @Test
    void theSmallestUseIsRead() throws IOException, InputException {
        String readme = Files.readString(Path.of("README.md"));
        int start = readme.indexOf("```\n") + 4;
        Imported imported = Reading.read(readme.substring(start, readme.indexOf("```", start)));
        assertEquals("standard state", imported.directives().get(0).key());
        assertEquals("1 mol/L", imported.directives().get(0).value());
        assertEquals(2, imported.rateTable().orElseThrow().order());
        List<RatePoint> points = imported.rateTable().orElseThrow().points();
        assertEquals(298.15, points.get(0).kelvin());
        assertEquals(1.02e-5, points.get(0).rate());
        assertEquals("A1", points.get(0).label());
        assertEquals(Optional.of("stirrer stopped"), points.get(2).excluded());
    }
}
