package org.saddlebook.desk.internal;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Point;
import java.awt.event.ActionEvent;
import java.awt.event.FocusAdapter;
import java.awt.event.FocusEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.function.Supplier;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.DefaultListModel;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JLayeredPane;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JRootPane;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.ListCellRenderer;
import javax.swing.ListSelectionModel;
import javax.swing.SwingUtilities;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Ink;

/** A list of actions below a text field that narrows it while one types; arrows choose, Enter does, Escape leaves. */
final class ListPopup extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int ROWS = 12;
    private static final int WIDTH = 460;

    private final transient Desk desk;
    private final JTextField field;
    private final JComponent anchor;
    private final transient Supplier<List<DeskAction>> source;
    private final DefaultListModel<DeskAction> model = new DefaultListModel<>();
    private final JList<DeskAction> list = new JList<>(model);
    private transient List<DeskAction> all = List.of();

    /**
     * A popup.
     *
     * @param field where one types
     * @param anchor below which the list lies
     * @param source the actions, asked each time it opens
     */
    ListPopup(Desk desk, JTextField field, JComponent anchor, String name, Supplier<List<DeskAction>> source) {
        super(new BorderLayout());
        this.desk = desk;
        this.field = field;
        this.anchor = anchor;
        this.source = source;
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setCellRenderer(new Cell());
        list.setFocusable(false);
        list.getAccessibleContext().setAccessibleName(name);
        list.addMouseListener(new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                take();
            }
        });
        JScrollPane scroll = new JScrollPane(list);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        add(scroll);
        key("DOWN", () -> choose(1));
        key("UP", () -> choose(-1));
        key("ENTER", this::take);
        key("ESCAPE", this::leave);
        field.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                narrow();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                narrow();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                narrow();
            }
        });
        field.addFocusListener(new FocusAdapter() {
            @Override
            public void focusGained(FocusEvent event) {
                open();
            }

            @Override
            public void focusLost(FocusEvent event) {
                hideAway();
            }
        });
    }

    private void key(String stroke, Runnable work) {
        field.getInputMap().put(KeyStroke.getKeyStroke(stroke), stroke);
        field.getActionMap().put(stroke, new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                work.run();
            }
        });
    }

    /** Shows the list. */
    void open() {
        JRootPane root = SwingUtilities.getRootPane(anchor);
        if (root == null) {
            return;
        }
        all = source.get();
        narrow();
        if (getParent() == null) {
            root.getLayeredPane().add(this, JLayeredPane.POPUP_LAYER);
        }
        place();
    }

    private void place() {
        JRootPane root = SwingUtilities.getRootPane(anchor);
        if (root == null || getParent() == null) {
            return;
        }
        Ink ink = desk.ink();
        setBorder(BorderFactory.createLineBorder(ink.ink()));
        list.setBackground(ink.sheet());
        JLayeredPane layers = root.getLayeredPane();
        Point at = SwingUtilities.convertPoint(anchor, 0, anchor.getHeight() + 2, layers);
        int width = Math.min(Math.max(WIDTH, anchor.getWidth()), layers.getWidth() - 8);
        int x = Math.max(4, Math.min(at.x, layers.getWidth() - width - 4));
        int row = list.getFixedCellHeight() > 0 ? list.getFixedCellHeight() : 26;
        int height = Math.min(ROWS, Math.max(1, model.size())) * row + 4;
        setBounds(x, at.y, width, Math.min(height, layers.getHeight() - at.y - 8));
        validate();
        repaint();
    }

    private void narrow() {
        if (getParent() == null && !field.isFocusOwner()) {
            return;
        }
        list.setFixedCellHeight(getFontMetrics(desk.ink().font(1, false)).getHeight() + 9);
        List<DeskAction> found = matching(all, field.getText());
        model.clear();
        model.addAll(found);
        if (!found.isEmpty()) {
            list.setSelectedIndex(0);
        }
        place();
    }

    /** The actions that hold every word typed, those whose title starts with it first. */
    static List<DeskAction> matching(List<DeskAction> all, String typed) {
        String query = typed.strip().toLowerCase(Locale.ROOT);
        List<DeskAction> first = new ArrayList<>();
        List<DeskAction> later = new ArrayList<>();
        for (DeskAction action : all) {
            String title = action.title().toLowerCase(Locale.ROOT);
            StringBuilder text = new StringBuilder(title);
            for (String word : action.words()) {
                text.append(' ').append(word.toLowerCase(Locale.ROOT));
            }
            boolean fits = true;
            for (String word : query.split(" +", -1)) {
                fits &= text.indexOf(word) >= 0;
            }
            if (fits) {
                (title.startsWith(query) ? first : later).add(action);
            }
        }
        first.addAll(later);
        return first;
    }

    private void choose(int by) {
        if (getParent() == null) {
            open();
            return;
        }
        int next = Math.max(0, Math.min(model.size() - 1, list.getSelectedIndex() + by));
        list.setSelectedIndex(next);
        list.ensureIndexIsVisible(next);
    }

    private void take() {
        DeskAction chosen = list.getSelectedValue();
        if (chosen == null || getParent() == null) {
            return;
        }
        leave();
        if (chosen.obstacle().isPresent()) {
            desk.view().notice("Not now: " + chosen.title(), chosen.obstacle().get(), List.of());
        } else {
            chosen.run();
        }
    }

    private void leave() {
        hideAway();
        field.setText("");
        JRootPane root = SwingUtilities.getRootPane(anchor);
        if (root != null) {
            desk.view().strata().ifPresent(Component::requestFocusInWindow);
        }
    }

    private void hideAway() {
        if (getParent() instanceof JLayeredPane layers) {
            layers.remove(this);
            layers.repaint(getX(), getY(), getWidth(), getHeight());
        }
        all = List.of();
        model.clear();
    }

    /** Title on the left; key, or why not now, on the right. */
    private final class Cell extends JPanel implements ListCellRenderer<DeskAction> {
        private static final long serialVersionUID = 1L;

        private final JLabel title = new JLabel();
        private final JLabel side = new JLabel();

        Cell() {
            super(new BorderLayout(12, 0));
            setBorder(BorderFactory.createEmptyBorder(2, 10, 2, 10));
            add(title);
            add(side, BorderLayout.EAST);
        }

        @Override
        public Component getListCellRendererComponent(
                JList<? extends DeskAction> owner, DeskAction action, int index, boolean selected, boolean focused) {
            Ink ink = desk.ink();
            title.setText(action.title());
            title.setFont(ink.font(1, false));
            title.setForeground(action.obstacle().isPresent() ? ink.faint() : ink.ink());
            side.setText(
                    action.obstacle().isPresent()
                            ? "not now"
                            : action.key().map(ListPopup::text).orElse(""));
            side.setFont(ink.font(0.85, false));
            side.setForeground(ink.faint());
            setBackground(selected ? ink.lichen() : ink.sheet());
            getAccessibleContext().setAccessibleName(action.title());
            return this;
        }

        @Override
        public Dimension getPreferredSize() {
            return new Dimension(WIDTH - 30, super.getPreferredSize().height);
        }
    }

    static String text(KeyStroke key) {
        String modifiers = java.awt.event.InputEvent.getModifiersExText(key.getModifiers());
        String name = java.awt.event.KeyEvent.getKeyText(key.getKeyCode());
        return modifiers.isEmpty() ? name : modifiers + "+" + name;
    }
}
