package org.saddlebook.desk.components.api;

import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.util.List;
import java.util.Map;
import javax.swing.BorderFactory;
import javax.swing.JPanel;
import javax.swing.JTextArea;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Marks;

/** Cautions in full, each numbered on a dog-eared strip, as on paper. */
public final class CautionList extends JPanel {
    private static final long serialVersionUID = 1L;

    private final transient Ink ink;

    /** An empty list. */
    public CautionList(Ink ink) {
        this.ink = ink;
        setLayout(new Downward());
        setOpaque(false);
        setBorder(BorderFactory.createEmptyBorder(8, 16, 0, 16));
        getAccessibleContext().setAccessibleName("Cautions");
        setVisible(false);
    }

    /**
     * Shows cautions.
     *
     * @param ids which, in this order
     * @param texts caution id to text of the whole findings, in the order of their numbers
     */
    public void show(List<String> ids, Map<String, String> texts) {
        removeAll();
        CautionNumbers numbers = new CautionNumbers(texts.keySet());
        for (String id : ids) {
            add(new Note(numbers.of(id), texts.getOrDefault(id, id)));
        }
        setVisible(!ids.isEmpty());
        revalidate();
        repaint();
    }

    private final class Note extends JTextArea {
        private static final long serialVersionUID = 1L;

        Note(int number, String text) {
            super((number > 0 ? number + "\u2002" : "") + text);
            setEditable(false);
            setLineWrap(true);
            setWrapStyleWord(true);
            setOpaque(false);
            setFont(ink.font(0.92, false));
            setForeground(ink.ink());
            setBorder(BorderFactory.createEmptyBorder(4, 10, 7, 22));
            getAccessibleContext().setAccessibleName("Caution " + (number > 0 ? number : ""));
        }

        /** Setting a text moves its caret, which would scroll the page here; only who reads with the keyboard wants that. */
        @Override
        public void scrollRectToVisible(java.awt.Rectangle area) {
            if (isFocusOwner()) {
                super.scrollRectToVisible(area);
            }
        }

        @Override
        protected void paintComponent(Graphics graphics) {
            Graphics2D g = (Graphics2D) graphics.create();
            g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            Marks.dogEar(g, ink, 0, 0, getWidth() - 1, getHeight() - 4);
            g.dispose();
            super.paintComponent(graphics);
        }
    }
}
