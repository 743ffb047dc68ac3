package org.saddlebook.desk.internal;

import java.awt.BorderLayout;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.event.ActionEvent;
import java.awt.event.ComponentAdapter;
import java.awt.event.ComponentEvent;
import java.awt.event.KeyEvent;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.InputMap;
import javax.swing.JComponent;
import javax.swing.JFrame;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.KeyStroke;
import javax.swing.ScrollPaneConstants;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Reading;

/** The window: title line, sheets, strata over the temperature rail, account. */
final class DeskWindow extends JFrame implements DeskView {
    private static final long serialVersionUID = 1L;

    private static final int WIDE = 1366;
    private static final int HIGH = 740;
    private static final int UNITS = 46;

    private final transient Desk desk;
    private final transient Runnable left;
    private final TitleLine title;
    private final SheetSlot sheets;
    private final StrataPane strata;
    private final JScrollPane scroll;
    private final RailPane rail;
    private final AccountPane account;
    private final transient DropAndPaste transfer;
    private boolean going;

    /**
     * A window, not yet shown.
     *
     * @param left called when the user has left the desk
     */
    DeskWindow(Desk desk, Runnable left) {
        super("Saddlebook");
        this.desk = desk;
        this.left = left;
        desk.view(this);
        title = new TitleLine(desk);
        sheets = new SheetSlot(desk);
        strata = new StrataPane(desk);
        rail = new RailPane(desk);
        account = new AccountPane(desk);
        transfer = new DropAndPaste(desk);
        scroll = new JScrollPane(
                strata,
                ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
                ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        scroll.getVerticalScrollBar().setUnitIncrement(24);
        scroll.getVerticalScrollBar().getAccessibleContext().setAccessibleName("Scroll the strata");
        build();
        keys();
        desk.rail().onHairline(this::hairlineMoved);
        desk.rail().onScale(this::scaleChanged);
        setDefaultCloseOperation(DO_NOTHING_ON_CLOSE);
        addWindowListener(new WindowAdapter() {
            @Override
            public void windowClosing(WindowEvent event) {
                leave();
            }
        });
        int wide = desk.settings().width() > 400 ? desk.settings().width() : WIDE;
        int high = desk.settings().height() > 300 ? desk.settings().height() : HIGH;
        Dimension screen = getToolkit().getScreenSize();
        setSize(Math.min(wide, screen.width), Math.min(high, screen.height));
        setMinimumSize(new Dimension(800, 560));
        setLocationByPlatform(true);
        addWindowListener(new WindowAdapter() {
            @Override
            public void windowOpened(WindowEvent event) {
                strata.requestFocusInWindow();
            }
        });
    }

    private void build() {
        JPanel centre = new JPanel(new BorderLayout());
        centre.add(scroll, BorderLayout.CENTER);
        centre.add(rail, BorderLayout.SOUTH);
        centre.addComponentListener(new ComponentAdapter() {
            @Override
            public void componentResized(ComponentEvent event) {
                widths(centre.getWidth());
            }
        });
        JPanel main = new JPanel(new BorderLayout());
        main.add(sheets, BorderLayout.NORTH);
        main.add(centre, BorderLayout.CENTER);
        JPanel all = new JPanel(new BorderLayout());
        all.add(title, BorderLayout.NORTH);
        all.add(main, BorderLayout.CENTER);
        all.add(account, BorderLayout.EAST);
        all.setTransferHandler(transfer);
        setContentPane(all);
        strata.setFocusable(true);
        strata.getAccessibleContext().setAccessibleName("Strata");
        account.setPreferredSize(new Dimension(286, 200));
    }

    private void widths(int width) {
        int column = Math.max(176, Math.min(250, (int) (width * 0.19)));
        strata.column(column);
        desk.rail().ends(column + 26.0, width - UNITS - 10.0);
        int margin = Math.max(250, Math.min(340, (int) (getWidth() * 0.21)));
        if (account.getPreferredSize().width != margin) {
            account.setPreferredSize(new Dimension(margin, 200));
            account.revalidate();
        }
        strata.revalidate();
    }

    private void keys() {
        bind(Commands.SEARCH, title::search);
        bind(Commands.CAMPAIGNS, title::chooseCampaign);
        bind(KeyStroke.getKeyStroke(KeyEvent.VK_V, TitleLine.menuKey()), () -> {
            if (!(getFocusOwner() instanceof JTextComponent)) {
                transfer.paste();
            }
        });
        bind(KeyStroke.getKeyStroke(KeyEvent.VK_F6, 0), () -> nextRegion(1));
        bind(KeyStroke.getKeyStroke(KeyEvent.VK_F6, java.awt.event.InputEvent.SHIFT_DOWN_MASK), () -> nextRegion(-1));
        for (DeskAction action : Commands.keyed(desk)) {
            action.key().ifPresent(this::bindNamed);
        }
        for (int i = 1; i <= 9; i++) {
            bindNamed(KeyStroke.getKeyStroke(KeyEvent.VK_0 + i, TitleLine.menuKey()));
        }
    }

    /** The key does whatever action has it at that moment. */
    private void bindNamed(KeyStroke key) {
        bind(key, () -> {
            for (DeskAction action : Commands.keyed(desk)) {
                if (action.key().equals(Optional.of(key)) && action.obstacle().isEmpty()) {
                    action.run();
                    return;
                }
            }
        });
    }

    private void bind(KeyStroke key, Runnable work) {
        InputMap map = getRootPane().getInputMap(JComponent.WHEN_IN_FOCUSED_WINDOW);
        map.put(key, key.toString());
        getRootPane().getActionMap().put(key.toString(), new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                work.run();
            }
        });
    }

    /** F6 goes round: title line, open stratum, rail, account. */
    private void nextRegion(int by) {
        Component[] regions = {title, strata, rail, account};
        Component owner = getFocusOwner();
        int at = 0;
        for (int i = 0; i < regions.length; i++) {
            if (owner != null && SwingUtilities.isDescendingFrom(owner, regions[i])) {
                at = i;
            }
        }
        Component next = regions[Math.floorMod(at + by, regions.length)];
        if (next == strata) {
            strata.strata().stream().filter(Stratum::isOpen).findFirst().ifPresent(Stratum::focusTitle);
        } else if (next == rail) {
            rail.requestFocusInWindow();
        } else {
            Component first = getFocusTraversalPolicy().getComponentAfter(this, next);
            (first == null ? next : first).requestFocusInWindow();
        }
    }

    DropAndPaste transfer() {
        return transfer;
    }

    RailPane railPane() {
        return rail;
    }

    StrataPane strataPane() {
        return strata;
    }

    private void hairlineMoved() {
        strata.repaint();
        rail.repaint();
    }

    private void scaleChanged() {
        for (PanelHost host : desk.shelf().hosts()) {
            host.context().scaleChanged();
        }
        strata.repaint();
        rail.repaint();
    }

    @Override
    public void campaignsChanged() {
        title.tell();
        setTitle(desk.current()
                .map(c -> c.state().campaign().title() + " · Saddlebook")
                .orElse("Saddlebook"));
        boolean first = desk.current().map(OpenCampaign::demo).orElse(false)
                && !desk.settings().demoSeen();
        boolean empty = desk.current().map(Desk::isEmpty).orElse(false);
        sheets.guide(
                first
                        ? "This is an invented campaign, evaluated. Drop a table of temperatures and rate constants here, or"
                                + " open one, to see the same for your own."
                        : empty ? "Drop a table of temperatures and rate constants here, paste one, or open one." : "");
    }

    @Override
    public void strataChanged() {
        strata.rebuild();
        account.gaps();
    }

    @Override
    public void strataTold() {
        strata.tell();
        account.gaps();
    }

    @Override
    public void accountChanged() {
        account.tell();
    }

    @Override
    public void workChanged() {
        title.work();
    }

    @Override
    public void readings(double kelvin, List<Reading> readings) {
        rail.readings(kelvin, readings);
    }

    @Override
    public void notice(String heading, String text, List<DeskAction> remedies) {
        sheets.notice(heading, text, remedies);
    }

    @Override
    public void ask(String question, String start, Consumer<String> answer) {
        sheets.ask(question, start, answer);
    }

    @Override
    public void askPath(PathQuestion question) {
        sheets.askPath(question);
    }

    @Override
    public void inkChanged() {
        Look.use(desk.ink());
        SwingUtilities.updateComponentTreeUI(this);
        title.inkChanged();
        rail.inkChanged();
        account.inkChanged();
        sheets.inkChanged();
        strata.rebuild();
    }

    @Override
    public Optional<Component> strata() {
        return Optional.of(strata);
    }

    @Override
    public void leave() {
        if (!going) {
            going = true;
            desk.settings().size(getWidth(), getHeight());
            setVisible(false);
            left.run();
        }
    }
}
