package org.saddlebook.desk.internal;

import java.awt.BorderLayout;
import java.awt.Graphics;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.SwingUtilities;

/** Where a panel's component lies; what goes wrong in its painting or laying out costs only this place. */
final class PanelSlot extends JPanel {
    private static final long serialVersionUID = 1L;

    private final transient PanelHost host;

    PanelSlot(PanelHost host, JComponent component) {
        super(new BorderLayout());
        this.host = host;
        setOpaque(false);
        add(component);
    }

    @Override
    public void paint(Graphics graphics) {
        try {
            super.paint(graphics);
        } catch (RuntimeException | LinkageError | StackOverflowError | AssertionError e) {
            SwingUtilities.invokeLater(() -> host.fail("being drawn", e));
        }
    }

    @Override
    public void doLayout() {
        try {
            super.doLayout();
        } catch (RuntimeException | LinkageError | StackOverflowError | AssertionError e) {
            SwingUtilities.invokeLater(() -> host.fail("being laid out", e));
        }
    }
}
