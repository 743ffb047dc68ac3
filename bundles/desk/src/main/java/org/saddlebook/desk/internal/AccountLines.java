package org.saddlebook.desk.internal;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.JPanel;
import javax.swing.Scrollable;

/** The lines of the account: a time and its text side by side, a caution across both; as high as they are at their width. */
final class AccountLines extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    private static final int LEFT = 14;
    private static final int RIGHT = 12;
    private static final int TIME = 40;
    private static final int GAP = 5;

    AccountLines() {
        super(null);
    }

    @Override
    public void doLayout() {
        arrange(getWidth(), true);
    }

    private int arrange(int width, boolean place) {
        int y = 2;
        int room = Math.max(60, width - LEFT - RIGHT);
        Component[] parts = getComponents();
        for (int i = 0; i < parts.length; i++) {
            int height;
            if (parts[i] instanceof CautionLine caution) {
                height = caution.heightAt(room);
                put(parts[i], place, LEFT, y, room, height);
            } else {
                Component text = parts[i + 1];
                height = ((Prose) text).heightAt(room - TIME);
                put(parts[i], place, LEFT, y + 1, TIME, height);
                put(text, place, LEFT + TIME, y, room - TIME, height);
                i++;
            }
            y += height + GAP;
        }
        return y + GAP;
    }

    private static void put(Component part, boolean place, int x, int y, int width, int height) {
        if (place) {
            part.setBounds(x, y, width, height);
        }
    }

    @Override
    public Dimension getPreferredSize() {
        int width = getParent() == null || getParent().getWidth() == 0
                ? 260
                : getParent().getWidth();
        return new Dimension(width, arrange(width, false));
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return 20;
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
        return visible.height;
    }

    @Override
    public boolean getScrollableTracksViewportWidth() {
        return true;
    }

    @Override
    public boolean getScrollableTracksViewportHeight() {
        return false;
    }
}
