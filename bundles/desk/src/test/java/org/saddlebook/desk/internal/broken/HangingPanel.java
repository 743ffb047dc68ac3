package org.saddlebook.desk.internal.broken;

import java.util.concurrent.CountDownLatch;
import javax.swing.JComponent;
import javax.swing.JLabel;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;

/** A panel that waits on the event thread for something that never comes. */
public final class HangingPanel implements DeskPanelProvider, DeskPanel {
    private final String id;
    private final int order;
    private final CountDownLatch never = new CountDownLatch(1);

    /** A panel that waits while it is shown a state. */
    public HangingPanel(String id, int order) {
        this.id = id;
        this.order = order;
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
        return this;
    }

    @Override
    public String title() {
        return id;
    }

    @Override
    public JComponent strip() {
        return new JLabel("");
    }

    @Override
    public JComponent body() {
        return new JLabel("never seen");
    }

    @Override
    public void show(DeskState state) {
        try {
            never.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    @Override
    public String sentence() {
        return "Waiting.";
    }
}
