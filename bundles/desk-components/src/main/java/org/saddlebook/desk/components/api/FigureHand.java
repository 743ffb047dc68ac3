package org.saddlebook.desk.components.api;

import java.awt.BasicStroke;
import java.awt.Component;
import java.awt.Cursor;
import java.awt.FontMetrics;
import java.awt.Graphics2D;
import java.awt.Rectangle;
import java.awt.event.ActionEvent;
import java.awt.event.FocusEvent;
import java.awt.event.FocusListener;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.event.MouseWheelEvent;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigurePoint;
import org.saddlebook.desk.api.Ink;

/** Mouse and keys of a figure, and what they paint over it. */
final class FigureHand extends MouseAdapter implements FocusListener {
    private static final double REACH = 9;
    private static final int LEAST_DRAG = 8;
    private static final double STEP = 0.8;
    private static final BasicStroke DASHED =
            new BasicStroke(1f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, new float[] {4, 3}, 0f);

    private final FigureView view;
    private Optional<MouseEvent> over = Optional.empty();
    private Optional<MouseEvent> pressed = Optional.empty();
    private int chosen = -1;

    FigureHand(FigureView view) {
        this.view = view;
    }

    void install() {
        view.addMouseListener(this);
        view.addMouseMotionListener(this);
        view.addMouseWheelListener(this);
        view.addFocusListener(this);
        key(KeyEvent.VK_LEFT, 0, "previous point", () -> choose(-1));
        key(KeyEvent.VK_RIGHT, 0, "next point", () -> choose(1));
        key(KeyEvent.VK_ENTER, 0, "act on point", this::act);
        key(KeyEvent.VK_SPACE, 0, "act on point", this::act);
        key(KeyEvent.VK_PLUS, 0, "nearer", () -> zoom(STEP));
        key(KeyEvent.VK_EQUALS, 0, "nearer", () -> zoom(STEP));
        key(KeyEvent.VK_ADD, 0, "nearer", () -> zoom(STEP));
        key(KeyEvent.VK_MINUS, 0, "farther", () -> zoom(1 / STEP));
        key(KeyEvent.VK_SUBTRACT, 0, "farther", () -> zoom(1 / STEP));
        key(KeyEvent.VK_LEFT, InputEvent.SHIFT_DOWN_MASK, "move left", () -> view.moveBy(-0.1, 0));
        key(KeyEvent.VK_RIGHT, InputEvent.SHIFT_DOWN_MASK, "move right", () -> view.moveBy(0.1, 0));
        key(KeyEvent.VK_UP, InputEvent.SHIFT_DOWN_MASK, "move up", () -> view.moveBy(0, -0.1));
        key(KeyEvent.VK_DOWN, InputEvent.SHIFT_DOWN_MASK, "move down", () -> view.moveBy(0, 0.1));
        key(KeyEvent.VK_ESCAPE, 0, "whole figure", this::whole);
        key(
                KeyEvent.VK_C,
                InputEvent.CTRL_DOWN_MASK,
                "copy picture",
                () -> view.menu().copy());
        key(KeyEvent.VK_F10, InputEvent.SHIFT_DOWN_MASK, "more", this::popUp);
        key(KeyEvent.VK_CONTEXT_MENU, 0, "more", this::popUp);
    }

    private void key(int code, int modifiers, String what, Runnable work) {
        view.getInputMap(JComponent.WHEN_FOCUSED).put(KeyStroke.getKeyStroke(code, modifiers), what);
        view.getActionMap().put(what, new AbstractAction(what) {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                work.run();
            }
        });
    }

    /** The figure was laid out anew: places are no longer what they were. */
    void forget() {
        over = Optional.empty();
        pressed = Optional.empty();
        chosen = -1;
    }

    private void whole() {
        view.zoomTo(Optional.empty());
    }

    private void popUp() {
        view.menu().menu().show(view, view.getWidth() / 2, view.getHeight() / 2);
    }

    private void zoom(double factor) {
        view.drawing()
                .ifPresent(now ->
                        view.zoomBy(factor, now.area().getCenterX(), now.area().getCenterY()));
    }

    private void choose(int step) {
        int points = view.drawing().map(now -> now.points().size()).orElse(0);
        if (points == 0) {
            return;
        }
        chosen = chosen < 0 ? (step > 0 ? 0 : points - 1) : Math.floorMod(chosen + step, points);
        FigurePoint point = view.drawing().orElseThrow().points().get(chosen);
        String before = view.getAccessibleContext().getAccessibleDescription();
        view.getAccessibleContext().setAccessibleDescription(view.textOf(point).replace('\n', ' '));
        view.getAccessibleContext()
                .firePropertyChange(
                        javax.accessibility.AccessibleContext.ACCESSIBLE_DESCRIPTION_PROPERTY,
                        before,
                        view.textOf(point));
        view.repaint();
    }

    private Optional<FigurePoint> chosenPoint() {
        return view.drawing()
                .filter(now -> chosen >= 0 && chosen < now.points().size())
                .map(now -> now.points().get(chosen));
    }

    private void act() {
        chosenPoint().ifPresent(view::actOn);
    }

    @Override
    public void mouseMoved(MouseEvent event) {
        over = Optional.of(event);
        boolean point = view.verb().isPresent() && under(event).isPresent();
        view.setCursor(Cursor.getPredefinedCursor(point ? Cursor.HAND_CURSOR : Cursor.DEFAULT_CURSOR));
        view.repaint();
    }

    private Optional<FigurePoint> under(MouseEvent event) {
        return view.drawing().flatMap(now -> now.pointAt(event.getX(), event.getY(), REACH));
    }

    @Override
    public void mouseExited(MouseEvent event) {
        over = Optional.empty();
        view.repaint();
    }

    @Override
    public void mousePressed(MouseEvent event) {
        view.requestFocusInWindow();
        if (event.isPopupTrigger()) {
            view.menu().menu().show(view, event.getX(), event.getY());
        } else if (SwingUtilities.isLeftMouseButton(event)) {
            pressed = Optional.of(event);
        }
    }

    @Override
    public void mouseDragged(MouseEvent event) {
        over = Optional.of(event);
        view.repaint();
    }

    @Override
    public void mouseReleased(MouseEvent event) {
        Optional<MouseEvent> from = pressed;
        pressed = Optional.empty();
        if (event.isPopupTrigger()) {
            view.menu().menu().show(view, event.getX(), event.getY());
            return;
        }
        if (from.isEmpty()) {
            return;
        }
        Optional<FigureDrawing> now = view.drawing();
        Rectangle2D dragged = dragged(from.get(), event);
        if (now.isPresent() && dragged.getWidth() >= LEAST_DRAG && dragged.getHeight() >= LEAST_DRAG) {
            Rectangle2D inside = dragged.createIntersection(now.get().area());
            if (inside.getWidth() >= LEAST_DRAG && inside.getHeight() >= LEAST_DRAG) {
                now.get().part(inside).ifPresent(part -> view.zoomTo(Optional.of(part)));
            }
        } else if (event.getClickCount() == 2 && under(event).isEmpty()) {
            whole();
        } else {
            under(event).ifPresent(view::actOn);
        }
        view.repaint();
    }

    private static Rectangle2D dragged(MouseEvent from, MouseEvent to) {
        Rectangle2D dragged = new Rectangle2D.Double();
        dragged.setFrameFromDiagonal(from.getPoint(), to.getPoint());
        return dragged;
    }

    @Override
    public void mouseWheelMoved(MouseWheelEvent event) {
        if (event.isControlDown() || view.hasFocus()) {
            view.zoomBy(StrictMath.pow(STEP, -event.getPreciseWheelRotation()), event.getX(), event.getY());
            return;
        }
        // Over a figure that nobody works with, the wheel turns the page.
        Component page = view.getParent();
        if (page != null) {
            page.dispatchEvent(SwingUtilities.convertMouseEvent(view, event, page));
        }
    }

    @Override
    public void focusGained(FocusEvent event) {
        view.repaint();
    }

    @Override
    public void focusLost(FocusEvent event) {
        chosen = -1;
        view.repaint();
    }

    void paint(Graphics2D g, FigureDrawing now) {
        Ink ink = view.context().ink();
        if (view.hasFocus()) {
            g.setColor(view.focusInk());
            g.setStroke(new BasicStroke(2f));
            g.draw(new Rectangle(1, 1, view.getWidth() - 2, view.getHeight() - 2));
        }
        if (pressed.isPresent() && over.isPresent()) {
            g.setColor(ink.ink());
            g.setStroke(DASHED);
            g.draw(dragged(pressed.get(), over.get()).createIntersection(now.area()));
            return;
        }
        if (over.isPresent()) {
            hover(g, now, over.get(), ink);
        } else if (chosenPoint().isPresent()) {
            FigurePoint point = chosenPoint().get();
            ring(g, point, ink);
            plate(g, ink, lines(point), point.px(), point.py());
        }
    }

    private void hover(Graphics2D g, FigureDrawing now, MouseEvent event, Ink ink) {
        Optional<FigurePoint> point = now.pointAt(event.getX(), event.getY(), REACH);
        if (point.isPresent()) {
            ring(g, point.get(), ink);
            plate(g, ink, lines(point.get()), point.get().px(), point.get().py());
            return;
        }
        boolean inside = now.area().contains(event.getPoint());
        List<String> readings = inside ? now.readingsAt(event.getX()) : List.of();
        if (!readings.isEmpty()) {
            g.setColor(ink.faint());
            g.setStroke(DASHED);
            g.draw(new Line2D.Double(
                    event.getX(), now.area().getMinY(), event.getX(), now.area().getMaxY()));
            plate(g, ink, readings, event.getX(), event.getY());
        }
    }

    private List<String> lines(FigurePoint point) {
        List<String> lines = new ArrayList<>(List.of(view.textOf(point).split("\n", -1)));
        view.verb().ifPresent(verb -> lines.add(verb + ": click or Enter"));
        return lines;
    }

    private static void ring(Graphics2D g, FigurePoint point, Ink ink) {
        g.setColor(ink.plum());
        g.setStroke(new BasicStroke(1.5f));
        g.draw(new Ellipse2D.Double(point.px() - 10, point.py() - 10, 20, 20));
    }

    /** A plate with lines of text beside a place, always inside the figure. */
    private void plate(Graphics2D g, Ink ink, List<String> lines, double x, double y) {
        g.setFont(ink.font(0.92, false));
        FontMetrics metrics = g.getFontMetrics();
        int wide = 0;
        for (String line : lines) {
            wide = Math.max(wide, metrics.stringWidth(line));
        }
        int width = wide + 16;
        int height = lines.size() * metrics.getHeight() + 8;
        double left = x + 16 + width <= view.getWidth() ? x + 14 : Math.max(2, x - 14 - width);
        double top = Math.max(2, Math.min(y - height - 8, view.getHeight() - height - 2));
        Rectangle2D plate = new Rectangle2D.Double(left, top, width, height);
        g.setColor(ink.sheet());
        g.fill(plate);
        g.setColor(ink.ink());
        g.setStroke(new BasicStroke(1f));
        g.draw(plate);
        float base = (float) top + 4 + metrics.getAscent();
        for (String line : lines) {
            g.drawString(line, (float) left + 8, base);
            base += metrics.getHeight();
        }
    }
}
