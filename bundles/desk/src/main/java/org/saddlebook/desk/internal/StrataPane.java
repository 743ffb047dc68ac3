package org.saddlebook.desk.internal;

import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import javax.swing.JPanel;
import javax.swing.Scrollable;
import org.saddlebook.desk.api.Ink;

/** The strata above one another, the walk going downward. Higher than its place only when there are very many. */
final class StrataPane extends JPanel implements Scrollable {
    private static final long serialVersionUID = 1L;

    private static final int MOST_LINES = 3;

    /** Height that an open body should have above the least one before sentences get more than a line. */
    private static final int COMFORT = 40;

    private final transient Desk desk;
    private final transient List<Stratum> strata = new ArrayList<>();
    private final transient StartMark mark = new StartMark();
    private int column = 200;

    StrataPane(Desk desk) {
        super(null);
        this.desk = desk;
        setOpaque(true);
        setBackground(desk.ink().paper());
    }

    /** Width of the left column. */
    void column(int width) {
        column = width;
    }

    /** Shows the panels there are; keeps the strata that stay as they are. */
    void rebuild() {
        setBackground(desk.ink().paper());
        Optional<String> focused = focusedStratum();
        List<Stratum> next = new ArrayList<>();
        Optional<PanelHost> open = desk.shelf().open();
        for (PanelHost host : desk.shelf().hosts()) {
            boolean isOpen = open.isPresent() && open.get() == host;
            next.add(reusable(host, isOpen).orElseGet(() -> new Stratum(desk, host, isOpen)));
        }
        for (Stratum old : strata) {
            if (!next.contains(old)) {
                remove(old);
                old.removeAll(); // a component of a panel that is gone holds no stratum, and no stratum holds it
            }
        }
        strata.clear();
        strata.addAll(next);
        for (Stratum stratum : next) {
            if (stratum.getParent() != this) {
                add(stratum);
            }
        }
        for (int i = 0; i < next.size(); i++) {
            setComponentZOrder(next.get(i), i); // the order of the tab key
        }
        revalidate();
        repaint();
        focused.ifPresent(this::focus);
    }

    private Optional<Stratum> reusable(PanelHost host, boolean open) {
        for (Stratum stratum : strata) {
            if (stratum.host() == host && stratum.isOpen() == open && stratum.fresh()) {
                return Optional.of(stratum);
            }
        }
        return Optional.empty();
    }

    private Optional<String> focusedStratum() {
        Component owner =
                java.awt.KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
        for (Stratum stratum : strata) {
            if (owner != null && stratum.isTitle(owner)) {
                return Optional.of(stratum.id());
            }
        }
        return Optional.empty();
    }

    private void focus(String id) {
        for (Stratum stratum : strata) {
            if (stratum.id().equals(id)) {
                stratum.focusTitle();
            }
        }
    }

    /** Takes over sentences; rebuilds when another stratum is open. */
    void tell() {
        Optional<PanelHost> open = desk.shelf().open();
        for (Stratum stratum : strata) {
            boolean isOpen = open.isPresent() && open.get() == stratum.host();
            if (isOpen != stratum.isOpen()) {
                rebuild();
                break;
            }
        }
        strata.forEach(Stratum::tell);
        revalidate();
    }

    void focusFrom(Stratum stratum, int by) {
        int at = strata.indexOf(stratum) + by;
        if (at >= 0 && at < strata.size()) {
            strata.get(at).focusTitle();
        }
    }

    List<Stratum> strata() {
        return List.copyOf(strata);
    }

    @Override
    public Dimension getPreferredSize() {
        int width = Math.max(getWidth(), 300);
        return new Dimension(width, total(width, lines(width)));
    }

    /** How many lines of their sentences folded strata show: fewer where not all strata would be in sight. */
    private int lines(int width) {
        int room = getParent() == null ? Integer.MAX_VALUE : getParent().getHeight();
        int lines = MOST_LINES;
        while (lines > 1 && total(width, lines) + COMFORT > room) {
            lines--;
        }
        return lines;
    }

    private int total(int width, int lines) {
        int height = 0;
        for (Stratum stratum : strata) {
            stratum.column(column);
            height += stratum.wantedHeight(width, lines);
        }
        return height;
    }

    @Override
    public void doLayout() {
        int width = getWidth();
        int lines = lines(width);
        int spare = getHeight() - total(width, lines);
        int y = 0;
        for (Stratum stratum : strata) {
            int wanted = stratum.wantedHeight(width, lines);
            int height = stratum.isOpen() ? wanted + Math.max(0, spare) : wanted;
            stratum.setBounds(0, y, width, height);
            y += height;
        }
    }

    /** The hairline lies over everything, so whatever is drawn anew here is drawn together with it. */
    @Override
    protected boolean isPaintingOrigin() {
        return true;
    }

    @Override
    public void paint(Graphics graphics) {
        super.paint(graphics);
        hairline(graphics, desk.rail(), desk.ink(), getHeight());
        mark.painted(!strata.isEmpty()
                && desk.current().map(c -> c.state().current()).orElse(false));
    }

    /** Draws the hairline from top to bottom. */
    static void hairline(Graphics graphics, RailModel rail, Ink ink, int height) {
        OptionalDouble at = rail.hairline();
        if (at.isEmpty()) {
            return;
        }
        Graphics2D g = (Graphics2D) graphics.create();
        Prose.smooth(g);
        double x = rail.scale().x(at.getAsDouble());
        g.setColor(ink.ochre());
        g.setStroke(new BasicStroke(2.4f));
        g.draw(new Line2D.Double(x, 0, x, height));
        g.dispose();
    }

    @Override
    public Dimension getPreferredScrollableViewportSize() {
        return getPreferredSize();
    }

    @Override
    public int getScrollableUnitIncrement(Rectangle visible, int orientation, int direction) {
        return 24;
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
        return getParent() != null && getPreferredSize().height <= getParent().getHeight();
    }
}
