package org.saddlebook.desk.internal;

import java.awt.event.KeyEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import javax.swing.JTextField;
import net.miginfocom.swing.MigLayout;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Ink;

/** The title line: which campaign, how it stands, what runs, undo and redo, the search for actions. */
final class TitleLine extends JPanel {
    private static final long serialVersionUID = 1L;

    private final transient Desk desk;
    private JButton title;
    private Prose state;
    private JPanel work;
    private JProgressBar progress;
    private JButton undo;
    private JButton redo;
    private JButton save;
    private JTextField search;
    private JTextField which;

    TitleLine(Desk desk) {
        super(new MigLayout(
                "insets 5 12 5 12, fillx, gapx 4, hidemode 2", "[][fill,grow][][][][][][240!]", "[center,30!]"));
        this.desk = desk;
        inkChanged();
    }

    void inkChanged() {
        Ink ink = desk.ink();
        removeAll();
        setBackground(ink.paper());
        setBorder(BorderFactory.createMatteBorder(0, 0, 2, 0, ink.line()));
        title = Plain.word("", ink, this::chooseCampaign);
        title.setFont(ink.font(1.3, true));
        title.setToolTipText("Other campaigns (" + ListPopup.text(Commands.CAMPAIGNS) + ")");
        state = new Prose(0.92, false, ink.faint(), 1, ink);
        progress = new JProgressBar(0, 1000);
        progress.getAccessibleContext().setAccessibleName("Work in the background");
        progress.setStringPainted(true);
        work = new JPanel(new MigLayout("insets 0, gapx 2", "[160!][]"));
        work.setOpaque(false);
        work.add(progress, "growx");
        work.add(Plain.word("Stop", ink, this::stop));
        undo = Plain.word("Undo", ink, desk::undo);
        redo = Plain.word("Redo", ink, desk::redo);
        save = Plain.word("Save", ink, () -> desk.files().save());
        JButton open = Plain.word("Open", ink, () -> Commands.open(desk));
        search = new JTextField();
        search.putClientProperty("JTextField.placeholderText", "⌕ what do you want to do?");
        search.getAccessibleContext().setAccessibleName("What do you want to do?");
        search.getAccessibleContext()
                .setAccessibleDescription("Finds every action; " + ListPopup.text(Commands.SEARCH) + " comes here.");
        new ListPopup(desk, search, search, "Actions", () -> Commands.all(desk));
        which = new JTextField();
        which.putClientProperty("JTextField.placeholderText", "which campaign?");
        which.getAccessibleContext().setAccessibleName("Which campaign?");
        which.setVisible(false);
        new ListPopup(desk, which, which, "Campaigns", () -> Commands.campaigns(desk));
        which.addFocusListener(new java.awt.event.FocusAdapter() {
            @Override
            public void focusLost(java.awt.event.FocusEvent event) {
                which.setText("");
                which.setVisible(false);
                title.setVisible(true);
                revalidate();
            }
        });
        add(title, "wmin 60, split 2");
        add(which, "w 300!, h 28!");
        add(state, "growx, wmin 40");
        add(work);
        add(undo);
        add(redo);
        add(save);
        add(open);
        add(search, "growx, h 28!");
        tell();
        work();
    }

    /** Shows the campaign in view. */
    void tell() {
        Optional<OpenCampaign> current = desk.current();
        int open = desk.campaigns().size();
        String name = current.map(c -> c.state().campaign().title()).orElse("");
        title.setText(shortened(name, 44) + (open > 1 ? "  ▾ " + open : "  ▾"));
        title.getAccessibleContext()
                .setAccessibleName("Campaign " + name + ", " + open + (open == 1 ? " open" : " open; choose another"));
        state.setText(current.map(TitleLine::state).orElse(""));
        step(undo, "Undo", current.flatMap(OpenCampaign::undoable));
        step(redo, "Redo", current.flatMap(OpenCampaign::redoable));
        save.setEnabled(current.map(OpenCampaign::unsaved).orElse(false));
        revalidate();
        repaint();
    }

    private static void step(JButton button, String word, Optional<String> what) {
        button.setEnabled(what.isPresent());
        button.setToolTipText(what.map(w -> word + ": " + w).orElse(null));
        button.getAccessibleContext()
                .setAccessibleName(what.map(w -> word + ": " + w).orElse(word));
    }

    private static String shortened(String text, int most) {
        return text.length() <= most ? text : text.substring(0, most - 1) + "…";
    }

    static String state(OpenCampaign campaign) {
        Campaign c = campaign.state().campaign();
        List<String> parts = new ArrayList<>();
        int files = c.sources().size();
        if (files > 0) {
            parts.add(files + (files == 1 ? " file" : " files"));
        }
        if (c.rateTable().isPresent()) {
            int excluded = 0;
            for (RatePoint point : c.rateTable().get().points()) {
                excluded += point.excluded().isPresent() ? 1 : 0;
            }
            int points = c.rateTable().get().points().size();
            parts.add(points + (points == 1 ? " run" : " runs"));
            if (excluded > 0) {
                parts.add(excluded + " excluded");
            }
        }
        if (Desk.isEmpty(campaign)) {
            return "";
        }
        if (campaign.demo() && !campaign.unsaved()) {
            parts.add("demo, invented");
        } else {
            parts.add(campaign.unsaved() ? "not saved, kept for recovery" : "saved");
        }
        return String.join(" · ", parts);
    }

    /** Shows what runs. */
    void work() {
        List<Background.Shown> shown = desk.background().shown();
        work.setVisible(!shown.isEmpty());
        if (!shown.isEmpty()) {
            Background.Shown first = shown.get(0);
            progress.setValue((int) (first.fraction() * 1000));
            progress.setString(shortened(first.what(), 22) + (shown.size() > 1 ? " +" + (shown.size() - 1) : ""));
            progress.setToolTipText(first.what());
        }
        revalidate();
        repaint();
    }

    private void stop() {
        for (Background.Shown shown : desk.background().shown()) {
            shown.task().cancel();
        }
    }

    void search() {
        search.requestFocusInWindow();
    }

    void chooseCampaign() {
        title.setVisible(false);
        which.setVisible(true);
        revalidate();
        which.requestFocusInWindow();
    }

    /** Actions of the title line that need no search. */
    static DeskAction keyed(String title, int key, int modifiers, Runnable work) {
        return DeskAction.of(title, work).withKey(javax.swing.KeyStroke.getKeyStroke(key, modifiers));
    }

    /** The key that goes with menus on this system. */
    static int menuKey() {
        return java.awt.GraphicsEnvironment.isHeadless()
                ? java.awt.event.InputEvent.CTRL_DOWN_MASK
                : java.awt.Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx();
    }

    static final int SEARCH_KEY = KeyEvent.VK_K;
}
