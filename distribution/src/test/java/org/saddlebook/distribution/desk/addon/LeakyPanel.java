package org.saddlebook.distribution.desk.addon;

import java.awt.AWTEvent;
import java.awt.KeyboardFocusManager;
import java.awt.Toolkit;
import java.util.ArrayList;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JLabel;
import org.osgi.framework.BundleActivator;
import org.osgi.framework.BundleContext;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.DeskPanel;
import org.saddlebook.desk.api.DeskPanelProvider;
import org.saddlebook.desk.api.DeskState;

/** An add-on that lets go of nothing: it keeps what it gets, listens everywhere and works for ever. */
public final class LeakyPanel implements BundleActivator, DeskPanelProvider, DeskPanel {
    private static final List<Object> KEPT = new ArrayList<>();

    private final JLabel strip = new JLabel("");
    private final JLabel body = new JLabel("body of the leaky panel");

    @Override
    public void start(BundleContext context) {
        context.registerService(DeskPanelProvider.class, this, null);
    }

    @Override
    public void stop(BundleContext context) {
        KEPT.add(context);
    }

    @Override
    public String id() {
        return "org.saddlebook.test.leaky";
    }

    @Override
    public int order() {
        return OTHERS;
    }

    @Override
    public DeskPanel create(DeskContext context) {
        KEPT.add(context);
        context.onHairline(kelvin -> body.setToolTipText("seen"));
        context.onScale(() -> body.setToolTipText("scaled"));
        context.run(
                "working for ever",
                progress -> {
                    Object wait = new Object();
                    while (true) {
                        progress.check();
                        synchronized (wait) {
                            wait.wait(5);
                        }
                    }
                },
                never -> KEPT.add(never));
        Toolkit.getDefaultToolkit().addAWTEventListener(event -> body.setName("seen"), AWTEvent.KEY_EVENT_MASK);
        KeyboardFocusManager.getCurrentKeyboardFocusManager()
                .addPropertyChangeListener("focusOwner", event -> body.setName("focus"));
        return this;
    }

    @Override
    public String title() {
        return "Leaky";
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
        KEPT.add(state);
    }

    @Override
    public String sentence() {
        return "Lets go of nothing.";
    }
}
