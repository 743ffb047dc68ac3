package org.saddlebook.desk.measured.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextField;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;

class MeasuredPanelTest {
    @TempDir
    Path folder;

    private TestDesk desk;
    private MeasuredPanel panel;

    @BeforeEach
    void open() {
        open(ExampleStates.ringClosure());
    }

    private void open(DeskState state) {
        desk = new TestDesk(state, folder, false);
        panel = Pictures.onDesk(false, () -> {
            MeasuredPanel made =
                    new MeasuredPanel(desk, new ComponentsService(new ChartsRenderer(), List.of(), Saving.system()));
            desk.attach(made);
            made.body();
            return made;
        });
    }

    private void act(String title) {
        Pictures.onDesk(false, () -> {
            for (DeskAction action : panel.actions()) {
                if (action.title().equals(title)) {
                    action.run();
                    return null;
                }
            }
            throw new AssertionError(title + " is none of "
                    + panel.actions().stream().map(DeskAction::title).toList());
        });
    }

    @Test
    void saysHowManyPointsWhereAndInWhichUnit() {
        assertEquals("10 points at 5 temperatures, 45\u00a0°C to 85\u00a0°C; k in s⁻¹.", panel.sentence());
    }

    @Test
    void aPointIsExcludedOnlyWithAReasonAndUsedAgain() {
        act("Exclude run 65p at 65\u00a0°C");
        assertEquals(List.of(), desk.changes(), "turning away from the question changes nothing");
        desk.answer("stirrer stopped");
        act("Exclude run 65p at 65\u00a0°C");
        assertEquals("stirrer stopped", desk.changes().get(0).reason());
        assertEquals(
                Optional.of("stirrer stopped"),
                desk.state()
                        .campaign()
                        .rateTable()
                        .orElseThrow()
                        .points()
                        .get(4)
                        .excluded());
        assertTrue(panel.sentence().endsWith("; 1 excluded."), panel.sentence());
        JTable table = Pictures.onDesk(false, () -> Pictures.named((JScrollPane) panel.body(), JTable.class, "Points"));
        assertEquals("excluded: stirrer stopped", table.getValueAt(4, table.getColumnCount() - 1));
        act("Use run 65p at 65\u00a0°C again");
        assertEquals(
                ExampleStates.ringClosure().campaign().rateTable(),
                desk.state().campaign().rateTable());
    }

    @Test
    void aMissingUnitIsPutRightWhereItIsShown() {
        Campaign kept = Campaign.titled("rates")
                .withSources(List.of(new SourcePart("sources/rates.csv", "0".repeat(64), 12, "")));
        open(DeskState.of(kept)
                .withSources(
                        List.of(new Intake.Part("sources/rates.csv", new byte[12])),
                        List.of(),
                        new ReadingRule(Map.of("decimal", "comma")))
                .withProblems(List.of(new Problem(
                        "missing-unit",
                        Place.of("rates.csv"),
                        "T",
                        "a unit behind the name",
                        "State the unit of T in the reading rule."))));
        assertEquals("The file could not be read: open this to put one thing right.", panel.sentence());
        Pictures.onDesk(false, () -> {
            JTextField unit = Pictures.named((JScrollPane) panel.body(), JTextField.class, "Reading rule: unit of T");
            unit.setText("degC");
            unit.postActionEvent();
            return null;
        });
        assertEquals(
                Map.of("decimal", "comma", "unit.T", "degC"),
                desk.rules().get(0).options());
        assertEquals(List.of("unit of T read as degC"), desk.notes());
    }

    @Test
    void aSavedRuleIsReadBackAsItWas() throws Exception {
        ReadingRule rule = new ReadingRule(Map.of("unit.T", "°C", "separator", "semicolon"));
        RuleFile files = new RuleFile(folder);
        files.save("bench 3/../x", rule);
        assertEquals(List.of("bench-3----x"), files.names());
        assertEquals(rule, files.read("bench-3----x"));
        try (var all = java.nio.file.Files.walk(folder)) {
            assertEquals(1, all.filter(java.nio.file.Files::isRegularFile).count());
        }
    }

    @Test
    void anEmptyCampaignSaysHowToFillIt() {
        open(DeskState.of(Campaign.titled("new")));
        assertTrue(panel.sentence().startsWith("Nothing measured yet: drop a table"), panel.sentence());
        assertEquals(1, panel.gaps().size());
    }
}
