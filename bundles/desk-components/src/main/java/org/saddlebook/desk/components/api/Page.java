package org.saddlebook.desk.components.api;

import java.awt.Dimension;
import java.awt.Rectangle;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.ScrollPaneConstants;
import javax.swing.Scrollable;
import org.saddlebook.desk.api.Ink;

/**
 * A page that runs downward: each component as wide as the page and as high as it needs at that width. Scrolls when it is
 * higher than its place; never sideways.
 */
public final class Page extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    private static final int STEP = 24;

    /**
     * An empty page.
     *
     * @param name accessible name
     */
    public Page(String name, Ink ink) {
        setLayout(new Downward());
        setBackground(ink.sheet());
        setBorder(javax.swing.BorderFactory.createEmptyBorder(2, 0, 12, 0));
        getAccessibleContext().setAccessibleName(name);
    }

    /** Adds a component below the others. */
    public <C extends JComponent> C put(C component) {
        add(component);
        return component;
    }

    /** Adds a component with space above it. */
    public <C extends JComponent> C put(int above, C component) {
        component.putClientProperty(Downward.ABOVE, above);
        return put(component);
    }

    /** The page in a place that scrolls. */
    public JScrollPane scrolling() {
        JScrollPane pane = new JScrollPane(
                this, ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED, ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
        pane.setBorder(javax.swing.BorderFactory.createEmptyBorder());
        pane.getViewport().setBackground(getBackground());
        pane.getVerticalScrollBar().setUnitIncrement(STEP);
        pane.getVerticalScrollBar().getAccessibleContext().setAccessibleName("Scroll");
        return pane;
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return STEP;
    }

    @Override
    public int getScrollableBlockIncrement(Rectangle visible, int orientation, int direction) {
        return Math.max(STEP, visible.height - STEP);
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
