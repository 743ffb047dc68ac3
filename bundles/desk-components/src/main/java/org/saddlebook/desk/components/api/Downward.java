package org.saddlebook.desk.components.api;

import java.awt.Component;
import java.awt.Container;
import java.awt.Dimension;
import java.awt.Insets;
import java.awt.LayoutManager;
import javax.swing.JComponent;

/** One below the other, each as wide as the container. */
final class Downward implements LayoutManager {
    static final String ABOVE = "saddlebook.above";

    @Override
    public void addLayoutComponent(String name, Component component) {
        // Nothing to remember.
    }

    @Override
    public void removeLayoutComponent(Component component) {
        // Nothing was remembered.
    }

    @Override
    public Dimension preferredLayoutSize(Container page) {
        Insets insets = page.getInsets();
        int width = page.getWidth() > 0 ? page.getWidth() : 800;
        int height = place(page, width, insets, false);
        return new Dimension(width, height);
    }

    @Override
    public Dimension minimumLayoutSize(Container page) {
        return new Dimension(240, 100);
    }

    @Override
    public void layoutContainer(Container page) {
        place(page, page.getWidth(), page.getInsets(), true);
    }

    private static int place(Container page, int width, Insets insets, boolean move) {
        int inner = width - insets.left - insets.right;
        int y = insets.top;
        for (Component component : page.getComponents()) {
            if (!component.isVisible()) {
                continue;
            }
            if (component instanceof JComponent swing && swing.getClientProperty(ABOVE) instanceof Integer above) {
                y += above;
            }
            // Text wraps at the width it has when it is asked for its height.
            if (component.getWidth() != inner) {
                component.setSize(inner, Math.max(1, component.getHeight()));
                component.validate();
            }
            int height = component.getPreferredSize().height;
            if (move) {
                component.setBounds(insets.left, y, inner, height);
            }
            y += height;
        }
        return y + insets.bottom;
    }
}
