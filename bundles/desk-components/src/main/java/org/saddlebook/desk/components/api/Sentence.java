package org.saddlebook.desk.components.api;

import javax.swing.BorderFactory;
import javax.swing.JTextArea;
import org.saddlebook.desk.api.Ink;

/** Text that wraps, can be marked and copied, and cannot be changed. */
public final class Sentence extends JTextArea {
    private static final long serialVersionUID = 1L;

    /** How a text stands out. */
    public enum Rank {
        /** The name of what follows. */
        HEADING,
        /** What the panel has to say first. */
        STATEMENT,
        /** Running text. */
        TEXT,
        /** Text of second rank. */
        ASIDE
    }

    private final String name;

    /**
     * A text.
     *
     * @param name accessible name; the text itself for headings, when empty
     */
    public Sentence(String name, String text, Rank rank, Ink ink) {
        this.name = name;
        setEditable(false);
        setLineWrap(true);
        setWrapStyleWord(true);
        setOpaque(false);
        setBorder(BorderFactory.createEmptyBorder(rank == Rank.HEADING ? 12 : 2, 16, 2, 16));
        setForeground(rank == Rank.ASIDE ? ink.faint() : ink.ink());
        setFont(
                switch (rank) {
                    case HEADING -> ink.font(1.0, true);
                    case STATEMENT -> ink.font(1.15, false);
                    case TEXT -> ink.font(1.0, false);
                    case ASIDE -> ink.font(0.92, false);
                });
        // Tab walks from control to control; text that only reads is left out of that walk, but not out of the mouse's.
        setFocusable(rank != Rank.HEADING);
        setFocusTraversalKeysEnabled(true);
        putClientProperty("html.disable", true);
        say(text);
    }

    /** Setting a text moves its caret, which would scroll the page here; only who reads with the keyboard wants that. */
    @Override
    public void scrollRectToVisible(java.awt.Rectangle area) {
        if (isFocusOwner()) {
            super.scrollRectToVisible(area);
        }
    }

    /** Shows another text; hidden while it is empty. */
    public void say(String text) {
        if (!text.equals(getText())) {
            setText(text);
            setCaretPosition(0);
        }
        setVisible(!text.isEmpty());
        getAccessibleContext().setAccessibleName(name.isEmpty() ? text : name);
    }
}
