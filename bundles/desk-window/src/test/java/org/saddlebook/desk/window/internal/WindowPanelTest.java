package org.saddlebook.desk.window.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import javax.swing.JButton;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.Nodes;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;

class WindowPanelTest {
    @TempDir
    Path folder;

    private TestDesk desk;
    private WindowPanel panel;

    @BeforeEach
    void open() {
        desk = new TestDesk(ExampleStates.ringClosure(), folder, false);
        panel = Pictures.onDesk(false, () -> {
            WindowPanel made =
                    new WindowPanel(desk, new ComponentsService(new ChartsRenderer(), List.of(), Saving.system()));
            desk.attach(made);
            made.body();
            return made;
        });
    }

    private void type(String name, String text) {
        Pictures.onDesk(false, () -> {
            JTextField field = Pictures.named((JScrollPane) panel.body(), JTextField.class, name);
            field.setText(text);
            field.postActionEvent();
            return null;
        });
    }

    private void press(String name) {
        Pictures.onDesk(false, () -> {
            Pictures.named((JScrollPane) panel.body(), JButton.class, name).doClick();
            return null;
        });
    }

    private List<Node.Group> limits() {
        return Limits.of(desk.state().campaign());
    }

    @Test
    void aLimitIsChangedInPlaceWithItsUnitAndNothingElseMoves() {
        List<Node.Group> before = limits();
        type("Limit 2, time: within", "6 h");
        assertEquals("6 h", Nodes.text(limits().get(1), "within"));
        assertEquals(before.get(2), limits().get(2), "the barrier of the competing reaction is kept");
        assertEquals("10 h", desk.changes().get(0).oldValue());
        type("Limit 3, competing: share", "1 %");
        assertEquals(0.01, Nodes.number(limits().get(2), "share").orElseThrow(), 1e-12);
        type("Limit 3, competing: share", "much");
        assertEquals(2, desk.changes().size(), "what is no number changes nothing");
    }

    @Test
    void limitsAreAddedAndRemoved() {
        press("Remove limit 1, allowed");
        assertEquals(3, limits().size());
        desk.answer("0.03 in 2 d");
        press("Add a hold time");
        Node.Group hold = limits().get(3);
        assertEquals("hold", Nodes.text(hold, "kind"));
        assertEquals(0.03, Nodes.number(hold, "conversion").orElseThrow());
        assertEquals("2 d", Nodes.text(hold, "atLeast"));
        press("Add a limit of time");
        assertEquals(4, limits().size(), "turning away adds nothing");
        type("Temperatures looked at: to", "120 degC");
        assertEquals("120 degC", Nodes.text(Limits.settings(desk.state().campaign()), "range", "upper"));
    }

    @Test
    void theHairlineReadsTheProbability() {
        DeskState state = ExampleStates.ringClosure();
        assertEquals("1.00", panel.read(state, 333.15).get(0).text());
        assertEquals("0.00", panel.read(state, 283.15).get(0).text());
        assertTrue(panel.sentence().startsWith("All stated limits hold from"), panel.sentence());
    }
}
