package org.saddlebook.desk.register.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.JTextField;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.charts.internal.ChartsRenderer;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.desk.components.api.Saving;
import org.saddlebook.desk.components.internal.ComponentsService;
import org.saddlebook.desk.testkit.api.ExampleStates;
import org.saddlebook.desk.testkit.api.Pictures;
import org.saddlebook.desk.testkit.api.TestDesk;
import org.saddlebook.register.api.Entry;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.console.api.EntryWork;
import org.saddlebook.register.console.api.Recomputed;
import org.saddlebook.register.internal.RegistersService;
import org.saddlebook.register.sqlite.internal.SqliteStoreFactory;

class RegisterPanelTest {
    private static final CampaignFormat FORMAT = ExampleStates.format();

    @TempDir
    Path folder;

    private TestDesk desk;
    private RegisterPanel panel;

    /** Parts as the product enters them, without a report; recomputing is the verbs' own matter and tested there. */
    private final EntryWork work = new EntryWork() {
        @Override
        public String location(Path workingFolder, Path dataFolder) {
            return dataFolder.resolve("saddlebook.register").toString();
        }

        @Override
        public boolean hasResult(Findings findings) {
            return !findings.sections().isEmpty();
        }

        @Override
        public List<PartFile> parts(List<Intake.Part> sources, Campaign effective, Findings findings) {
            return List.of(
                    PartFile.of("campaign.json", "application/json", FORMAT.campaign(effective)),
                    PartFile.of("findings.json", "application/json", FORMAT.findings(findings)),
                    PartFile.of("sources/rates.csv", "text/csv", "T,k".getBytes(StandardCharsets.UTF_8)));
        }

        @Override
        public Recomputed recompute(Register register, Entry entry, Progress progress) {
            return new Recomputed(
                    Recomputed.Agreement.DIFFERS,
                    List.of(),
                    List.of(new Recomputed.OtherBundle("b", "1", "2")),
                    List.of(new Recomputed.Difference("barrier.x", "1", "2")));
        }
    };

    @BeforeEach
    void open() {
        desk = new TestDesk(ExampleStates.ringClosure(), folder, false);
        panel = Pictures.onDesk(false, () -> {
            RegisterPanel made = new RegisterPanel(
                    desk,
                    new ComponentsService(new ChartsRenderer(), List.of(), Saving.system()),
                    new RegisterAccess(
                            new RegistersService(List.of(new SqliteStoreFactory(Optional.empty()))), work, FORMAT));
            desk.attach(made);
            made.body();
            return made;
        });
    }

    private JScrollPane body() {
        return (JScrollPane) panel.body();
    }

    private void enter() {
        desk.answer("measured by me");
        Pictures.onDesk(false, () -> {
            panel.lastStep().orElseThrow().run();
            return null;
        });
        assertEquals(List.of(), desk.faults());
    }

    private JTable entries() {
        return Pictures.named(body(), JTable.class, "Entries");
    }

    private void choose(int row) {
        Pictures.onDesk(false, () -> {
            entries().setRowSelectionInterval(row, row);
            return null;
        });
    }

    private void press(String name) {
        Pictures.onDesk(false, () -> {
            Pictures.named(body(), JButton.class, name).doClick();
            return null;
        });
        assertEquals(List.of(), desk.faults());
    }

    private String outcome() {
        return Pictures.named(body(), JTextArea.class, "Outcome").getText();
    }

    @Test
    void entersSupersedesAndVerifies() throws Exception {
        assertTrue(panel.sentence().startsWith("Nothing entered yet"), panel.sentence());
        enter();
        assertEquals("One entry; 1 holds.", panel.sentence());
        assertEquals("45 to 85\u00a0°C", entries().getValueAt(0, 5));
        choose(0);
        desk.answer("a run was added");
        press("Enter this campaign's result in the place of the chosen entry");
        assertEquals("2 entries; 2 holds.", panel.sentence());
        assertEquals("superseded", entries().getValueAt(1, 2));
        press("Read the whole register again and check it");
        assertTrue(outcome().startsWith("Everything agrees: 2 records"), outcome());
        JComponent strip = panel.strip();
        Pictures.onDesk(false, () -> {
            Pictures.layOut(strip, 1066, strip.getPreferredSize().height);
            return null;
        });
        Pictures.write(Pictures.onDesk(false, () -> Pictures.paint(strip, 1)), Path.of("target/pictures/strip.png"));
    }

    @Test
    void opensAnEntryWithItsSources() {
        enter();
        choose(0);
        press("Open the chosen entry beside this campaign");
        Intake.Opened opened = desk.opened().get(0);
        assertEquals(
                ExampleStates.ringClosure().campaign().title(),
                opened.campaign().title());
        assertEquals("sources/rates.csv", opened.parts().get(0).name());
    }

    @Test
    void comparesTwoEntriesValueByValue() throws Exception {
        enter();
        DeskState state = desk.state();
        String json = new String(FORMAT.findings(state.findings().orElseThrow()), StandardCharsets.UTF_8);
        String other = json.replaceFirst("\"draws\": 20000", "\"draws\": 20001");
        assertTrue(!other.equals(json), "the example has the value that is changed");
        Pictures.onDesk(false, () -> {
            try {
                desk.show(state.withFindings(
                        state.campaign(), FORMAT.readFindings("other", other.getBytes(StandardCharsets.UTF_8))));
            } catch (org.saddlebook.api.problem.InputException e) {
                throw new AssertionError(e);
            }
            return null;
        });
        enter();
        choose(1);
        press("Compare the chosen entry with another, value by value");
        choose(0);
        press("Compare the chosen entry with another, value by value");
        assertTrue(outcome().endsWith("1 differ; they are listed below."), outcome());
        JTable result = Pictures.named(body(), JTable.class, "Result");
        assertEquals("window · draws", result.getValueAt(0, 0));
        assertEquals("20000", result.getValueAt(0, 1));
        assertEquals("20001", result.getValueAt(0, 2));
    }

    @Test
    void saysWhatARecomputationFound() {
        enter();
        choose(0);
        press("Evaluate the chosen entry again and compare");
        assertEquals("Entry 1 gives other findings: one value differs.", outcome());
        assertEquals(2, Pictures.named(body(), JTable.class, "Result").getRowCount());
    }

    @Test
    void searchesAndRefusesToEnterWhatIsNotEvaluated() throws Exception {
        enter();
        Pictures.onDesk(false, () -> {
            Pictures.named(body(), JTextField.class, "Search the register").setText("ring tester");
            return null;
        });
        assertEquals(1, entries().getRowCount());
        Pictures.onDesk(false, () -> {
            Pictures.named(body(), JTextField.class, "Search the register").setText("another reaction");
            return null;
        });
        assertEquals(0, entries().getRowCount());
        Pictures.onDesk(false, () -> {
            desk.show(DeskState.of(Campaign.titled("new")));
            return null;
        });
        assertEquals(
                Optional.of("There are no findings yet."),
                panel.lastStep().orElseThrow().obstacle());
        Pictures.onDesk(false, () -> {
            JComponent page = (JComponent) body().getViewport().getView();
            Pictures.layOut(page, 1066, 100);
            Pictures.layOut(page, 1066, page.getPreferredSize().height);
            assertEquals(List.of(), Pictures.cut(page));
            assertEquals(List.of(), Pictures.nameless(page));
            return null;
        });
    }
}
