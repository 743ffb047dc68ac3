package org.saddlebook.desk.components.api;

import java.awt.BorderLayout;
import java.awt.Color;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.GraphicsEnvironment;
import java.awt.RenderingHints;
import java.awt.geom.AffineTransform;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.accessibility.AccessibleContext;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JViewport;
import javax.swing.SwingUtilities;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureDrawings;
import org.saddlebook.charts.api.FigureFile;
import org.saddlebook.charts.api.FigureLook;
import org.saddlebook.charts.api.FigurePoint;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.TemperatureScale;

/**
 * A figure that answers: values under the pointer, zoom by drag, wheel (with Control, or while the figure has the focus)
 * and keys, a click on a point, copy and save. Keys: Left and Right walk from point to point, Enter acts on the point, plus
 * and minus zoom, Shift with arrows moves the part shown, Escape shows everything, Control C copies, the menu key opens
 * what else there is.
 */
public final class FigureView extends JComponent {
    private static final long serialVersionUID = 1L;

    /** Below this the rail is not laid out yet, or too small to read a figure on it. */
    private static final double LEAST_RAIL = 160;

    /** Below this the drawing area of a figure is too low to be read, points. */
    private static final int LEAST_HEIGHT = 240;

    private static final int LEAST_WITH_SPINDLE = 340;

    /** Room that numbers of the vertical axis take. */
    private static final double LEAST_LEFT = 60;

    private final transient DeskContext context;
    private final transient FigureDrawings drawings;
    private final transient FigureHand hand;
    private final MoreButton more;
    private final transient FigureMenu menu;
    private transient Optional<Node.Figure> figure = Optional.empty();
    private transient Map<String, String> cautions = Map.of();
    private transient Optional<FigureLook.Zoom> zoom = Optional.empty();
    private transient Optional<FigureDrawing> drawing = Optional.empty();
    private transient Optional<Consumer<FigurePoint>> act = Optional.empty();
    private String verb = "";
    private transient Function<FigurePoint, String> describe = point -> "";
    private transient BufferedImage picture;
    private boolean onRail;

    /**
     * An empty figure.
     *
     * @param files formats it can be saved in
     */
    public FigureView(FigureDrawings drawings, List<FigureFile> files, DeskContext context, Saving saving) {
        this.drawings = drawings;
        this.context = context;
        setFocusable(true);
        setOpaque(true);
        setBackground(context.ink().paper());
        setLayout(new BorderLayout());
        hand = new FigureHand(this);
        menu = new FigureMenu(this, files, context, saving);
        more = new MoreButton("Figure: zoom, copy or save", context.ink(), menu::menu);
        JPanel corner = new JPanel(new BorderLayout());
        corner.setOpaque(false);
        corner.add(more, BorderLayout.EAST);
        JPanel foot = new JPanel(new BorderLayout());
        foot.setOpaque(false);
        foot.add(corner, BorderLayout.SOUTH);
        add(foot, BorderLayout.EAST);
        setHeight(300);
        hand.install();
        context.onScale(this::relay);
    }

    /** Height, points. */
    public FigureView setHeight(int height) {
        setPreferredSize(new Dimension(600, height));
        return this;
    }

    /** As high as it was set, but not higher than the place around its page, so that it can be seen whole. */
    @Override
    public Dimension getPreferredSize() {
        Dimension wanted = super.getPreferredSize();
        java.awt.Container place = SwingUtilities.getAncestorOfClass(JViewport.class, this);
        if (place == null || place.getHeight() <= 0 || figure.isEmpty()) {
            return wanted;
        }
        boolean spindle = Curve.layer(figure.get(), Layer.Kind.SPINDLE, "").isPresent();
        int least = Math.min(wanted.height, spindle ? LEAST_WITH_SPINDLE : LEAST_HEIGHT);
        return new Dimension(wanted.width, Math.max(least, Math.min(wanted.height, place.getHeight())));
    }

    /** Lays temperatures out as on the desk's rail, so that the hairline crosses the figure at the right one. */
    public FigureView onRail() {
        onRail = true;
        return this;
    }

    /**
     * What a click on a point, or Enter, does.
     *
     * @param what in the imperative, for the menu and screen readers
     */
    public FigureView onPoint(String what, Consumer<FigurePoint> work) {
        verb = what;
        act = Optional.of(work);
        return this;
    }

    /** Says more about a point than its values, for example the run's name; empty for nothing. */
    public FigureView describePoints(Function<FigurePoint, String> say) {
        describe = say;
        return this;
    }

    /**
     * Shows a figure; the part shown stays while it is the same figure with other values.
     *
     * @param texts caution id to text of the whole findings, in the order of their numbers
     */
    public void show(Node.Figure newFigure, Map<String, String> texts) {
        boolean same = figure.isPresent() && figure.get().id().equals(newFigure.id());
        if (figure.isPresent() && figure.get().equals(newFigure) && cautions.equals(texts)) {
            return;
        }
        zoom = same ? zoom : Optional.empty();
        figure = Optional.of(newFigure);
        cautions = Collections.unmodifiableMap(new LinkedHashMap<>(texts));
        setVisible(true);
        getAccessibleContext().setAccessibleName(newFigure.title());
        relay();
    }

    /** Shows nothing and takes no room. */
    public void clear() {
        figure = Optional.empty();
        setVisible(false);
        relay();
    }

    /** The figure shown. */
    public Optional<Node.Figure> figure() {
        return figure;
    }

    /** The part of the axes shown; empty for everything. */
    public Optional<FigureLook.Zoom> zoom() {
        return zoom;
    }

    /** Shows a part of the axes, or everything. */
    public void zoomTo(Optional<FigureLook.Zoom> part) {
        zoom = part;
        relay();
    }

    /** Lays the figure out anew. */
    private void relay() {
        drawing = Optional.empty();
        picture = null;
        hand.forget();
        repaint();
    }

    @Override
    public void setBounds(int x, int y, int width, int height) {
        boolean other = width != getWidth() || height != getHeight() || x != getX();
        super.setBounds(x, y, width, height);
        if (other) {
            relay();
        }
    }

    /** The figure as it is laid out now; empty while there is none or no room. */
    public Optional<FigureDrawing> drawing() {
        if (drawing.isEmpty() && figure.isPresent() && getWidth() >= 240) {
            FigureLook look = FigureLook.PAPER
                    .withSize(getWidth(), getHeight())
                    .withTheme(context.ink().dark() ? FigureLook.Theme.DARK : FigureLook.Theme.LIGHT)
                    .withNotes(FigureLook.Notes.NUMBERED)
                    .withZoom(zoom)
                    .withRail(rail());
            drawing = Optional.of(drawings.draw(figure.get(), cautions, look));
            getAccessibleContext().setAccessibleDescription(drawing.get().description());
        }
        return drawing;
    }

    /** The figure for files and clipboard: the part shown, on light paper, with its cautions written out. */
    public Optional<FigureDrawing> paper() {
        return figure.map(shown -> drawings.draw(shown, cautions, FigureLook.PAPER.withZoom(zoom)));
    }

    private Optional<FigureLook.Rail> rail() {
        if (!onRail) {
            return Optional.empty();
        }
        TemperatureScale scale = context.scale(this);
        boolean room = scale.right() - scale.left() >= LEAST_RAIL && scale.left() >= LEAST_LEFT;
        return room
                ? Optional.of(new FigureLook.Rail(scale.lowKelvin(), scale.highKelvin(), scale.left(), scale.right()))
                : Optional.empty();
    }

    /** Does what a click on a point does. */
    void actOn(FigurePoint point) {
        act.ifPresent(work -> work.accept(point));
    }

    /** What a click on a point does; empty for nothing. */
    Optional<String> verb() {
        return act.isPresent() ? Optional.of(verb) : Optional.empty();
    }

    /** Everything known about a point. */
    String textOf(FigurePoint point) {
        String extra = describe.apply(point);
        return extra.isEmpty() ? point.text() : point.text() + "\n" + extra;
    }

    FigureMenu menu() {
        return menu;
    }

    DeskContext context() {
        return context;
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        try {
            g.setColor(getBackground());
            g.fillRect(0, 0, getWidth(), getHeight());
            Optional<FigureDrawing> now = drawing();
            if (now.isPresent()) {
                paintPicture(g, now.get());
                smooth(g);
                hand.paint(g, now.get());
            }
        } finally {
            g.dispose();
        }
    }

    /** The figure itself is kept as a picture, so that moving the pointer costs next to nothing. */
    private void paintPicture(Graphics2D g, FigureDrawing now) {
        AffineTransform transform = g.getTransform();
        double scale = Math.max(1, transform.getScaleX());
        int wide = (int) Math.ceil(getWidth() * scale);
        int high = (int) Math.ceil(getHeight() * scale);
        if (picture == null || picture.getWidth() != wide || picture.getHeight() != high) {
            picture = GraphicsEnvironment.isHeadless()
                    ? new BufferedImage(wide, high, BufferedImage.TYPE_INT_RGB)
                    : g.getDeviceConfiguration().createCompatibleImage(wide, high);
            Graphics2D inner = picture.createGraphics();
            inner.setColor(getBackground());
            inner.fillRect(0, 0, wide, high);
            inner.scale(scale, scale);
            smooth(inner);
            now.paint(inner);
            inner.dispose();
        }
        AffineTransform whole = AffineTransform.getScaleInstance(1 / scale, 1 / scale);
        g.drawImage(picture, whole, null);
    }

    private static void smooth(Graphics2D g) {
        g.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        g.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
    }

    /** Colour of the mark of the focus. */
    Color focusInk() {
        return context.ink().plum();
    }

    /** Zooms about a place: factors below 1 come nearer. */
    void zoomBy(double factor, double px, double py) {
        Optional<FigureDrawing> now = drawing();
        if (now.isEmpty()) {
            return;
        }
        Rectangle2D area = now.get().area();
        double wide = area.getWidth() * factor;
        double high = area.getHeight() * factor;
        double left = px - (px - area.getMinX()) * factor;
        double top = py - (py - area.getMinY()) * factor;
        now.get().part(new Rectangle2D.Double(left, top, wide, high)).ifPresent(part -> zoomTo(Optional.of(part)));
    }

    /** Moves the part shown by shares of the area. */
    void moveBy(double shareX, double shareY) {
        Optional<FigureDrawing> now = drawing();
        if (now.isEmpty()) {
            return;
        }
        Rectangle2D area = now.get().area();
        Rectangle2D moved = new Rectangle2D.Double(
                area.getX() + shareX * area.getWidth(),
                area.getY() + shareY * area.getHeight(),
                area.getWidth(),
                area.getHeight());
        now.get().part(moved).ifPresent(part -> zoomTo(Optional.of(part)));
    }

    @Override
    public AccessibleContext getAccessibleContext() {
        if (accessibleContext == null) {
            accessibleContext = new AccessibleFigure();
        }
        return accessibleContext;
    }

    /** Tells screen readers the points, each of which can be acted on. */
    private final class AccessibleFigure extends AccessibleJComponent implements javax.accessibility.AccessibleAction {
        private static final long serialVersionUID = 1L;

        @Override
        public javax.accessibility.AccessibleRole getAccessibleRole() {
            return javax.accessibility.AccessibleRole.CANVAS;
        }

        @Override
        public javax.accessibility.AccessibleAction getAccessibleAction() {
            return this;
        }

        private List<FigurePoint> points() {
            return drawing().map(FigureDrawing::points).orElse(List.of());
        }

        @Override
        public int getAccessibleActionCount() {
            return act.isPresent() ? points().size() : 0;
        }

        @Override
        public String getAccessibleActionDescription(int index) {
            return verb + ": " + textOf(points().get(index)).replace('\n', ' ');
        }

        @Override
        public boolean doAccessibleAction(int index) {
            if (index < 0 || index >= getAccessibleActionCount()) {
                return false;
            }
            actOn(points().get(index));
            return true;
        }
    }
}
