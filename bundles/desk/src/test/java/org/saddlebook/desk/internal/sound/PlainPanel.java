package org.saddlebook.desk.internal.sound;

import javax.swing.JComponent;
import javax.swing.JLabel;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;

/** A panel that does nothing but be there, and its provider. */
public final class PlainPanel implements DeskPanelProvider, DeskPanel {
    private final String id;
    private final int order;
    private final JLabel strip = new JLabel("");
    private final JLabel body;
    private DeskContext context;
    private int closed;

    /** A panel at this place. */
    public PlainPanel(String id, int order) {
        this.id = id;
        this.order = order;
        body = new JLabel("body of " + id);
    }

    /** What it was made with. */
    public DeskContext context() {
        return context;
    }

    /** How often it was closed. */
    public int closed() {
        return closed;
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
    public DeskPanel create(DeskContext given) {
        context = given;
        return this;
    }

    @Override
    public String title() {
        return id;
    }

    @Override
    public JComponent strip() {
        return strip;
    }

    @Override
    public JComponent body() {
        return body;
    }

    @Override
    public void show(DeskState state) {
        body.setToolTipText(state.campaign().title());
    }

    @Override
    public String sentence() {
        return "All is well.";
    }

    @Override
    public void close() {
        closed++;
    }
}
