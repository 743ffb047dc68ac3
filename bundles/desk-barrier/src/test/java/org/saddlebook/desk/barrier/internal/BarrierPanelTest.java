package org.saddlebook.desk.barrier.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextField;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.service.Prediction;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.FigureView;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;

class BarrierPanelTest {
    @TempDir
    Path folder;

    private TestDesk desk;

    private BarrierPanel panel(DeskState state, Optional<Prediction> prediction) {
        desk = new TestDesk(state, folder, false);
        return Pictures.onDesk(false, () -> {
            BarrierPanel made = new BarrierPanel(
                    desk, new ComponentsService(new ChartsRenderer(), List.of(), Saving.system()), prediction);
            desk.attach(made);
            JScrollPane body = (JScrollPane) made.body();
            Pictures.layOut((javax.swing.JComponent) body.getViewport().getView(), 1000, 3000);
            return made;
        });
    }

    private static JScrollPane body(BarrierPanel panel) {
        return (JScrollPane) panel.body();
    }

    @Test
    void saysTheLawThatCarriesAndThatTheOthersAreNotRuledOut() {
        BarrierPanel panel = panel(ExampleStates.ringClosure(), Optional.empty());
        assertTrue(panel.sentence().contains("Ea\u00a090.37 ± 0.69\u00a0kJ/mol (Arrhenius)"), panel.sentence());
        assertTrue(panel.sentence().endsWith("cannot tell the laws apart."), panel.sentence());
        assertEquals(3, panel.account().size());
    }

    @Test
    void aLawOfABundleNobodyHereKnowsStandsBesideTheOthers() throws Exception {
        DeskState state = ExampleStates.ringClosure();
        String json =
                new String(ExampleStates.format().findings(state.findings().orElseThrow()), StandardCharsets.UTF_8);
        String foreign = json.replace("\"modified-arrhenius\"", "\"com.example.bent\"")
                .replace("Modified Arrhenius", "Bent law");
        Findings findings = ExampleStates.format().readFindings("foreign", foreign.getBytes(StandardCharsets.UTF_8));
        BarrierPanel panel = panel(state.withFindings(state.campaign(), findings), Optional.empty());
        JTable laws = Pictures.onDesk(false, () -> Pictures.named(body(panel), JTable.class, "Laws side by side"));
        assertEquals("Bent law", laws.getColumnName(3));
        FigureView figure = Pictures.onDesk(
                false, () -> Pictures.all(body(panel), FigureView.class).get(0));
        List<String> lines = new ArrayList<>();
        figure.figure().orElseThrow().layers().forEach(layer -> lines.add(layer.label()));
        assertTrue(lines.contains("Bent law"), lines.toString());
    }

    @Test
    void temperaturesAskedForBecomeAChangeAndMistakesAreSaid() {
        BarrierPanel panel = panel(ExampleStates.ringClosure(), Optional.empty());
        Pictures.onDesk(false, () -> {
            JTextField asked = Pictures.named(
                    body(panel),
                    JTextField.class,
                    "Temperatures to predict the rate constant at, separated by semicolons");
            assertEquals("25\u00a0°C; 60\u00a0°C; 95\u00a0°C", asked.getText());
            asked.setText("5 °C; 350 K");
            asked.postActionEvent();
            return null;
        });
        assertEquals(List.of(278.15, 350.0), desk.state().campaign().choices().targetsKelvin());
        Pictures.onDesk(false, () -> {
            JTextField asked = Pictures.named(
                    body(panel),
                    JTextField.class,
                    "Temperatures to predict the rate constant at, separated by semicolons");
            asked.setText("warm");
            asked.postActionEvent();
            return null;
        });
        assertEquals(1, desk.changes().size());
    }

    @Test
    void anotherErrorModelIsChosenWhereTheyAreCompared() {
        BarrierPanel panel = panel(ExampleStates.ringClosure(), Optional.empty());
        Pictures.onDesk(false, () -> {
            Pictures.named(body(panel), JButton.class, "Use the error model constant relative")
                    .doClick();
            return null;
        });
        assertEquals(
                Optional.of(ErrorModel.CONSTANT_RELATIVE),
                desk.state().campaign().choices().errorModel());
    }

    @Test
    void theHairlineReadsWhatThePredictionServiceSays() {
        List<String> asked = new ArrayList<>();
        Prediction prediction = (findings, kelvin, models) -> {
            asked.add(kelvin + " " + models);
            return List.of(new Node.Group(Map.of("k", Node.Quantity.of(0.5, "1/s"))));
        };
        DeskState state = ExampleStates.ringClosure();
        BarrierPanel panel = panel(state, Optional.of(prediction));
        assertEquals("0.500000\u00a0s⁻¹", panel.read(state, 325).get(0).text());
        assertEquals(List.of("[325.0] [arrhenius]"), asked);
    }

    @Test
    void aPointOfTheFigureIsExcludedWithItsReason() {
        BarrierPanel panel = panel(ExampleStates.ringClosure(), Optional.empty());
        desk.answer("leak");
        Pictures.onDesk(false, () -> {
            FigureView figure = Pictures.all(body(panel), FigureView.class).get(0);
            var actions = figure.getAccessibleContext().getAccessibleAction();
            for (int i = 0; i < actions.getAccessibleActionCount(); i++) {
                if (actions.getAccessibleActionDescription(i).contains("run 75q")) {
                    return actions.doAccessibleAction(i);
                }
            }
            throw new AssertionError("no run 75q among " + actions.getAccessibleActionCount() + " points");
        });
        assertEquals("run 75q at 75\u00a0°C excluded", desk.changes().get(0).what());
        assertEquals("leak", desk.changes().get(0).reason());
    }
}
