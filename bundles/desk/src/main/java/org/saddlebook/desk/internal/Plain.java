package org.saddlebook.desk.internal;

import java.awt.Cursor;
import java.awt.Insets;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import org.saddlebook.desk.api.Ink;

/** Buttons of the desk: words, no pictures. */
final class Plain {
    private Plain() {}

    /** A word that can be pressed, without a frame; the frame comes with the focus. */
    static JButton word(String text, Ink ink, Runnable work) {
        JButton button = new JButton(text);
        button.putClientProperty("JButton.buttonType", "toolBarButton");
        button.setMargin(new Insets(2, 6, 2, 6));
        button.setForeground(ink.ink());
        button.setFocusable(true);
        button.getAccessibleContext().setAccessibleName(text);
        button.setCursor(Cursor.getPredefinedCursor(Cursor.HAND_CURSOR));
        button.addActionListener(event -> work.run());
        return button;
    }

    /** A framed button, for the step that matters. */
    static JButton framed(String text, Ink ink, Runnable work) {
        JButton button = new JButton(text);
        button.setBackground(ink.sheet());
        button.setForeground(ink.ink());
        button.setBorder(BorderFactory.createCompoundBorder(
                BorderFactory.createLineBorder(ink.ink(), 2), BorderFactory.createEmptyBorder(7, 10, 7, 10)));
        button.getAccessibleContext().setAccessibleName(text);
        button.addActionListener(event -> work.run());
        return button;
    }
}
