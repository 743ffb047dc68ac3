package org.saddlebook.intake.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.saddlebook.intake.internal.IntakeFixture.TABLE;
import static org.saddlebook.intake.internal.IntakeFixture.open;
import static org.saddlebook.intake.internal.IntakeFixture.problem;
import static org.saddlebook.intake.internal.IntakeFixture.write;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;

/** Statements for laws with conditions, tunnelling and held parameters. */
class FurtherStatementsTest {
    @TempDir
    private Path temp;

    private Campaign campaign(String line) throws IOException, InputException {
        return open(write(temp, "rates.csv", "# " + line + "\n" + TABLE)).campaign();
    }

    private Node.Group barrier(String line) throws IOException, InputException {
        return (Node.Group) campaign(line).settings().get("barrier");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "third body: 1 bar | 100000 | Pa",
                "third body: 2 mol/m3 | 2 | mol/m3",
                "Third body: 6.02214076e17 molecule cm-3 | 1 | mol/m3",
            })
    void readsTheThirdBody(String line, double value, String unit) throws Exception {
        Node.Quantity quantity = (Node.Quantity) barrier(line).get("thirdBody").orElseThrow();
        assertEquals(value, quantity.value().orElseThrow(), 1e-12 * value);
        assertEquals(unit, quantity.unit());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"tunnelling: wigner 1200i cm-1", "Tunneling: wigner 1200 1/cm", "tunnelling: wigner 1200i cm^-1"
            })
    void readsAWavenumberWithOrWithoutItsI(String line) throws Exception {
        Node.Group tunnelling = (Node.Group) barrier(line).get("tunnelling").orElseThrow();
        assertEquals(new Node.Text("wigner"), tunnelling.get("model").orElseThrow());
        assertEquals(
                Node.Quantity.of(120_000, "1/m"), tunnelling.get("wavenumber").orElseThrow());
    }

    @Test
    void readsTheHeightsOfABarrier() throws Exception {
        Node.Group tunnelling =
                (Node.Group) barrier("tunnelling: eckart 900i cm-1; forward 60 kJ/mol; reverse 80000 J/mol")
                        .get("tunnelling")
                        .orElseThrow();
        assertEquals(
                Node.Quantity.of(60_000, "J/mol"),
                tunnelling.get("forwardBarrier").orElseThrow());
        assertEquals(
                Node.Quantity.of(80_000, "J/mol"),
                tunnelling.get("reverseBarrier").orElseThrow());
    }

    @Test
    void readsHeldParametersInSi() throws Exception {
        assertEquals(
                Map.of("falloff-troe/Fc", 0.6, "falloff-troe/E0", 2000.0),
                campaign("hold: falloff-troe/Fc = 0.6; falloff-troe/E0 = 2 kJ/mol")
                        .choices()
                        .fixed());
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "tunnelling: wigner",
                "tunnelling: wigner 1200i",
                "tunnelling: wigner 12 kJ/mol",
                "tunnelling: wigner -1200i cm-1",
                "tunnelling: eckart 1200i cm-1; forwards 60 kJ/mol",
                "tunnelling: eckart 1200i cm-1; forward 60 kJ/mol; forward 50 kJ/mol",
                "tunnelling: eckart 1200i cm-1; forward",
                "third body: 1 kJ/mol",
                "third body: 0 bar",
                "third body: 2.4e19",
                "hold: Fc = 0.6",
                "hold: falloff-troe/Fc 0.6",
                "hold: arrhenius/A = 1e13",
                "hold: arrhenius/Ea = warm",
                "tuneling: wigner 1200i cm-1"
            })
    void refusesWhatItCannotReadWithLineAndRemedy(String line) throws Exception {
        Problem problem = problem(write(temp, "rates.csv", "# " + line + "\n" + TABLE));
        assertEquals(1, problem.place().line().orElseThrow());
        assertTrue(!problem.remedy().isEmpty(), problem.toString());
    }
}
