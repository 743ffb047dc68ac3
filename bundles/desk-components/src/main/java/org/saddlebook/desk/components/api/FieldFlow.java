package org.saddlebook.desk.components.api;

import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.Insets;
import java.awt.LayoutManager;
import java.util.function.Consumer;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextField;
import org.saddlebook.desk.api.Ink;

/** Fields and buttons in the flow of a sentence, on as many lines as they need. */
public final class FieldFlow extends JPanel {
    private static final long serialVersionUID = 1L;

    /** Letters are a little wider on a screen of high density than they were measured. */
    private static final javax.swing.border.Border SLACK = BorderFactory.createEmptyBorder(0, 0, 0, 5);

    private final transient Ink ink;

    /** An empty flow. */
    public FieldFlow(Ink ink) {
        this.ink = ink;
        setOpaque(false);
        setLayout(new Wrapping());
        setBorder(BorderFactory.createEmptyBorder(4, 16, 4, 16));
    }

    /** Adds words. */
    public JLabel say(String text) {
        JLabel label = new JLabel(text);
        label.setFont(ink.font(1, false));
        label.setForeground(ink.ink());
        label.setBorder(SLACK);
        label.getAccessibleContext().setAccessibleName(text);
        add(label);
        return label;
    }

    /**
     * Adds a field with its label in front; what was typed counts when Enter is pressed.
     *
     * @param label shown
     * @param name accessible name
     * @param columns width in letters
     * @param entered receives the text without blanks around it
     */
    public JTextField field(String label, String name, String text, int columns, Consumer<String> entered) {
        JPanel pair = new JPanel();
        pair.setLayout(new java.awt.BorderLayout(6, 0));
        pair.setOpaque(false);
        JTextField field = new JTextField(text, columns);
        field.setFont(ink.font(1, false));
        field.getAccessibleContext().setAccessibleName(name);
        field.getAccessibleContext().setAccessibleDescription("Enter applies what was typed.");
        field.addActionListener(event -> entered.accept(field.getText().strip()));
        if (!label.isEmpty()) {
            JLabel words = new JLabel(label);
            words.setFont(ink.font(1, false));
            words.setForeground(ink.ink());
            words.setBorder(SLACK);
            words.setLabelFor(field);
            pair.add(words, java.awt.BorderLayout.WEST);
        }
        pair.add(field, java.awt.BorderLayout.CENTER);
        add(pair);
        return field;
    }

    /** Adds a button. */
    public JButton button(String text, String name, Runnable work) {
        JButton button = new JButton(text);
        button.setFont(ink.font(0.96, false));
        button.getAccessibleContext().setAccessibleName(name);
        button.addActionListener(event -> work.run());
        add(button);
        return button;
    }

    /** Takes everything out. */
    public void clear() {
        removeAll();
        revalidate();
        repaint();
    }

    /** From left to right, on the next line where there is no room. */
    private static final class Wrapping implements LayoutManager {
        private static final int GAP = 12;
        private static final int LINE = 6;

        @Override
        public void addLayoutComponent(String name, Component component) {
            // Nothing to remember.
        }

        @Override
        public void removeLayoutComponent(Component component) {
            // Nothing was remembered.
        }

        @Override
        public Dimension preferredLayoutSize(Container flow) {
            int width = flow.getWidth() > 0 ? flow.getWidth() : 800;
            return new Dimension(width, place(flow, width, false));
        }

        @Override
        public Dimension minimumLayoutSize(Container flow) {
            return new Dimension(200, 20);
        }

        @Override
        public void layoutContainer(Container flow) {
            place(flow, flow.getWidth(), true);
        }

        private static int place(Container flow, int width, boolean move) {
            Insets insets = flow.getInsets();
            int x = insets.left;
            int y = insets.top;
            int high = 0;
            for (Component component : flow.getComponents()) {
                if (!component.isVisible()) {
                    continue;
                }
                Dimension wanted = component.getPreferredSize();
                int wide = Math.min(wanted.width, width - insets.left - insets.right);
                if (x > insets.left && x + wide > width - insets.right) {
                    x = insets.left;
                    y += high + LINE;
                    high = 0;
                }
                if (move) {
                    component.setBounds(x, y, wide, wanted.height);
                }
                x += wide + GAP;
                high = Math.max(high, wanted.height);
            }
            if (move) {
                centreLines(flow);
            }
            return y + high + insets.bottom;
        }

        /** Labels stand on the middle of the fields beside them. */
        private static void centreLines(Container flow) {
            Component[] all = flow.getComponents();
            int from = 0;
            while (from < all.length) {
                int to = from;
                int high = all[from].getHeight();
                while (to + 1 < all.length && all[to + 1].getY() == all[from].getY()) {
                    to++;
                    high = Math.max(high, all[to].getHeight());
                }
                int top = all[from].getY();
                for (int i = from; i <= to; i++) {
                    all[i].setLocation(all[i].getX(), top + (high - all[i].getHeight()) / 2);
                }
                from = to + 1;
            }
        }
    }
}
