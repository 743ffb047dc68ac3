package org.saddlebook.desk.internal;

import java.awt.event.ActionEvent;
import java.util.List;
import java.util.function.Consumer;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;
import net.miginfocom.swing.MigLayout;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Ink;

/** Where the desk speaks and asks: sheets above the strata, never a window that blocks. */
final class SheetSlot extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int MOST = 3;

    private final transient Desk desk;
    private String guide = "";

    SheetSlot(Desk desk) {
        super(new MigLayout("insets 0, fillx, wrap 1, gapy 0, hidemode 3", "[fill,grow]"));
        this.desk = desk;
        setOpaque(false);
    }

    /** A message with things to do about it; stays until it is put away. */
    void notice(String title, String text, List<DeskAction> remedies) {
        Ink ink = desk.ink();
        JPanel sheet = sheet(ink, title);
        Prose heading = new Prose(1, true, ink.ink(), 2, ink);
        heading.setText(title);
        sheet.add(heading, "growx, wmin 80, split 1");
        JButton away = Plain.word("Put away", ink, () -> drop(sheet));
        Prose body = new Prose(0.92, false, ink.ink(), 12, ink);
        body.setText(text);
        JPanel buttons = new JPanel(new MigLayout("insets 0, gapx 6"));
        buttons.setOpaque(false);
        for (DeskAction remedy : remedies) {
            buttons.add(Plain.framed(remedy.title(), ink, () -> {
                drop(sheet);
                remedy.run();
            }));
        }
        buttons.add(away);
        sheet.add(buttons, "wrap, aligny top, spany 2");
        sheet.add(body, "growx, wmin 80");
        escape(sheet, () -> drop(sheet));
        put(sheet);
    }

    /** A question for a line of text. */
    void ask(String question, String start, Consumer<String> answer) {
        Ink ink = desk.ink();
        JPanel sheet = sheet(ink, question);
        Prose heading = new Prose(1, true, ink.ink(), 2, ink);
        heading.setText(question);
        JTextField field = new JTextField(start, 40);
        field.getAccessibleContext().setAccessibleName(question);
        Runnable take = () -> {
            String text = field.getText().strip();
            if (text.isEmpty()) {
                field.requestFocusInWindow();
                return;
            }
            drop(sheet);
            answer.accept(text);
        };
        field.addActionListener(event -> take.run());
        JButton yes = Plain.framed("Go on", ink, take);
        JButton no = Plain.word("Leave it", ink, () -> drop(sheet));
        sheet.add(heading, "span 3, growx, wmin 80, wrap");
        sheet.add(field, "growx, wmin 120");
        sheet.add(yes);
        sheet.add(no, "wrap");
        escape(sheet, () -> drop(sheet));
        put(sheet);
        field.selectAll();
        SwingUtilities.invokeLater(field::requestFocusInWindow);
    }

    /** A question for a file or folder. */
    void askPath(PathQuestion question) {
        JPanel sheet = sheet(desk.ink(), question.question());
        PathSheet.fill(sheet, desk, question, () -> drop(sheet));
        escape(sheet, () -> drop(sheet));
        put(sheet);
    }

    /** One sentence that says what to do next; empty for none. */
    void guide(String sentence) {
        if (sentence.equals(guide)) {
            return;
        }
        guide = sentence;
        for (java.awt.Component component : getComponents()) {
            if (((JComponent) component).getClientProperty("guide") != null) {
                remove(component);
            }
        }
        if (!sentence.isEmpty()) {
            Ink ink = desk.ink();
            JPanel sheet = sheet(ink, sentence);
            sheet.putClientProperty("guide", true);
            Prose text = new Prose(1, false, ink.ink(), 3, ink);
            text.setText(sentence);
            sheet.add(text, "growx, wmin 80");
            sheet.add(Plain.word("Open a table", ink, () -> Commands.open(desk)));
            sheet.add(Plain.word("Put away", ink, () -> guide("")), "wrap");
            add(sheet, 0);
        }
        again();
    }

    /** Takes other colours: messages are made anew when they come, so those shown go. */
    void inkChanged() {
        String sentence = guide;
        removeAll();
        guide = "";
        guide(sentence);
        again();
    }

    private static JPanel sheet(Ink ink, String name) {
        JPanel sheet = new JPanel(new MigLayout("insets 9 16 9 12, fillx, gapx 10, gapy 4", "[fill,grow][][]"));
        sheet.setBackground(ink.rail());
        sheet.setBorder(BorderFactory.createMatteBorder(0, 0, 1, 0, ink.line()));
        sheet.getAccessibleContext().setAccessibleName(name);
        return sheet;
    }

    private static void escape(JComponent sheet, Runnable away) {
        sheet.getInputMap(WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(KeyStroke.getKeyStroke("ESCAPE"), "away");
        sheet.getActionMap().put("away", new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                away.run();
            }
        });
    }

    private void put(JPanel sheet) {
        while (getComponentCount() >= MOST) {
            remove(0);
        }
        add(sheet);
        again();
    }

    private void drop(JPanel sheet) {
        remove(sheet);
        again();
    }

    private void again() {
        revalidate();
        repaint();
    }
}
