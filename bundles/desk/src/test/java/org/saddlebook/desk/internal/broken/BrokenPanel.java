package org.saddlebook.desk.internal.broken;

import java.awt.Graphics;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.SwingUtilities;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;

/** A panel that throws at one place. */
public final class BrokenPanel implements DeskPanelProvider, DeskPanel {
    /** Where it throws. */
    public enum Where {
        CREATE,
        SHOW,
        STRIP,
        BODY,
        SENTENCE,
        GAPS,
        PAINT,
        LATER
    }

    private final String id;
    private final int order;
    private final Where where;

    /** A panel that throws there. */
    public BrokenPanel(String id, int order, Where where) {
        this.id = id;
        this.order = order;
        this.where = where;
    }

    private void at(Where place) {
        if (where == place) {
            throw new IllegalStateException("broken on purpose");
        }
    }

    @Override
    public String id() {
        return id;
    }

    @Override
    public int order() {
        return order;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        at(Where.CREATE);
        return this;
    }

    @Override
    public String title() {
        return id;
    }

    @Override
    public JComponent strip() {
        at(Where.STRIP);
        return new JLabel("");
    }

    @Override
    public JComponent body() {
        at(Where.BODY);
        if (where == Where.LATER) {
            SwingUtilities.invokeLater(() -> at(Where.LATER));
        }
        return new JPanel() {
            private static final long serialVersionUID = 1L;

            @Override
            protected void paintComponent(Graphics graphics) {
                at(Where.PAINT);
            }
        };
    }

    @Override
    public void show(DeskState state) {
        at(Where.SHOW);
    }

    @Override
    public String sentence() {
        at(Where.SENTENCE);
        return "Not yet broken.";
    }

    @Override
    public List<DeskAction> gaps() {
        at(Where.GAPS);
        return List.of();
    }
}
