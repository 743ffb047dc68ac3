package org.saddlebook.desk.internal;

import java.awt.BasicStroke;
import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.event.ActionEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.awt.geom.Line2D;
import java.util.List;
import javax.accessibility.AccessibleContext;
import javax.accessibility.AccessibleRole;
import javax.accessibility.AccessibleValue;
import javax.swing.AbstractAction;
import javax.swing.JComponent;
import javax.swing.KeyStroke;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Reading;
import org.saddlebook.desk.api.TemperatureScale;
import org.saddlebook.presentation.api.Rounding;

/** The temperature rail at the foot: spaced as 1/T, round values in kelvin above the line and in degrees Celsius below. */
final class RailPane extends JComponent {
    private static final long serialVersionUID = 1L;

    /** Height of the rail, points; the plate with the readings lies in its lower part. */
    static final int HEIGHT = 122;

    /** y of the line. */
    static final int LINE = 34;

    /** y of the top of the plate. */
    static final int PLATE = 62;

    private static final int ROOM = 14;

    private final transient Desk desk;
    private final transient RailModel rail;
    private transient Ink ink;
    private transient List<Reading> readings = List.of();
    private double readAt;

    RailPane(Desk desk) {
        this.desk = desk;
        rail = desk.rail();
        ink = desk.ink();
        setOpaque(true);
        setFocusable(true);
        setCursor(Cursor.getPredefinedCursor(Cursor.W_RESIZE_CURSOR));
        MouseAdapter mouse = new MouseAdapter() {
            @Override
            public void mousePressed(MouseEvent event) {
                requestFocusInWindow();
                rail.move(rail.scale().kelvin(event.getX()));
            }

            @Override
            public void mouseDragged(MouseEvent event) {
                rail.move(rail.scale().kelvin(event.getX()));
            }
        };
        addMouseListener(mouse);
        addMouseMotionListener(mouse);
        addMouseWheelListener(event -> desk.nudge(event.getPreciseWheelRotation() * 0.5));
        key("LEFT", -0.5);
        key("RIGHT", 0.5);
        key("DOWN", -0.5);
        key("UP", 0.5);
        key("shift LEFT", -5);
        key("shift RIGHT", 5);
        key("PAGE_DOWN", -10);
        key("PAGE_UP", 10);
        key("HOME", Double.NEGATIVE_INFINITY);
        key("END", Double.POSITIVE_INFINITY);
        java.awt.event.FocusListener focus = new java.awt.event.FocusAdapter() {
            @Override
            public void focusGained(java.awt.event.FocusEvent event) {
                repaint();
            }

            @Override
            public void focusLost(java.awt.event.FocusEvent event) {
                repaint();
            }
        };
        addFocusListener(focus);
    }

    private void key(String stroke, double by) {
        getInputMap().put(KeyStroke.getKeyStroke(stroke), stroke);
        getActionMap().put(stroke, new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                TemperatureScale scale = rail.scale();
                if (by == Double.NEGATIVE_INFINITY) {
                    rail.move(scale.lowKelvin());
                } else if (by == Double.POSITIVE_INFINITY) {
                    rail.move(scale.highKelvin());
                } else {
                    desk.nudge(by);
                }
            }
        });
    }

    void inkChanged() {
        ink = desk.ink();
        repaint();
    }

    /** What is read at the hairline; also told to those who cannot see the plate. */
    void readings(double kelvin, List<Reading> read) {
        readAt = kelvin;
        readings = List.copyOf(read);
        StringBuilder text = new StringBuilder();
        for (Reading reading : readings) {
            text.append(text.length() == 0 ? "" : "; ")
                    .append(reading.name())
                    .append(" = ")
                    .append(reading.text());
        }
        getAccessibleContext().setAccessibleDescription(text.toString());
        repaint();
    }

    @Override
    public Dimension getPreferredSize() {
        return new Dimension(600, HEIGHT);
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        Prose.smooth(g);
        g.setColor(ink.rail());
        g.fillRect(0, 0, getWidth(), getHeight());
        TemperatureScale scale = rail.scale();
        if (isFocusOwner()) {
            g.setColor(ink.petrol());
            g.setStroke(new BasicStroke(2f));
            g.drawRect(1, 1, getWidth() - 3, getHeight() - 3);
        }
        g.setColor(ink.ink());
        g.setFont(ink.font(1, false));
        g.drawString("Temperature", 16, LINE + 5);
        g.setStroke(new BasicStroke(1.6f));
        g.draw(new Line2D.Double(scale.left() - 12, LINE, scale.right() + 12, LINE));
        g.setFont(ink.font(0.85, false));
        marks(g, scale, ticks(g, scale, 0), LINE - 12, LINE - 6, LINE);
        g.drawString("K", (int) scale.right() + 20, LINE - 8);
        g.setFont(ink.font(1, false));
        marks(g, scale, ticks(g, scale, Constants.ZERO_CELSIUS), LINE + 21, LINE, LINE + 7);
        g.drawString("°C", (int) scale.right() + 18, LINE + 20);
        hairline(g, scale);
        g.dispose();
    }

    /** The hairline down to the plate; readings of another position than the line's are left out until new ones come. */
    private void hairline(Graphics2D g, TemperatureScale scale) {
        if (rail.hairline().isPresent()) {
            double kelvin = rail.hairline().getAsDouble();
            StrataPane.hairline(g, rail, ink, PLATE);
            List<Reading> shown = Math.abs(readAt - kelvin) < 1e-9 ? readings : List.of();
            ReadingPlate.paint(g, ink, kelvin, shown, scale.x(kelvin), PLATE, getWidth());
        }
    }

    /** Labels of one unit, far enough apart for the widest of them. */
    static List<TemperatureScale.Tick> ticks(Graphics2D g, TemperatureScale scale, double zero) {
        FontMetrics metrics = g.getFontMetrics();
        return scale.ticks(zero, metrics.stringWidth("\u2212000") + ROOM);
    }

    private static void marks(
            Graphics2D g, TemperatureScale scale, List<TemperatureScale.Tick> ticks, int text, int top, int bottom) {
        g.setStroke(new BasicStroke(1.2f));
        for (TemperatureScale.Tick tick : ticks) {
            double x = scale.x(tick.kelvin());
            g.draw(new Line2D.Double(x, top, x, bottom));
            int wide = g.getFontMetrics().stringWidth(tick.label());
            g.drawString(tick.label(), (float) (x - wide / 2.0), text);
        }
    }

    @Override
    public AccessibleContext getAccessibleContext() {
        if (accessibleContext == null) {
            accessibleContext = new AccessibleRail();
        }
        return accessibleContext;
    }

    private final class AccessibleRail extends AccessibleJComponent implements AccessibleValue {
        private static final long serialVersionUID = 1L;

        @Override
        public AccessibleRole getAccessibleRole() {
            return AccessibleRole.SLIDER;
        }

        @Override
        public String getAccessibleName() {
            return "Temperature of the hairline, "
                    + Rounding.decimals(getCurrentAccessibleValue().doubleValue() - Constants.ZERO_CELSIUS, 1) + " °C";
        }

        @Override
        public AccessibleValue getAccessibleValue() {
            return this;
        }

        @Override
        public Number getCurrentAccessibleValue() {
            return rail.hairline().orElse(Constants.ZERO_CELSIUS);
        }

        @Override
        public boolean setCurrentAccessibleValue(Number value) {
            rail.move(value.doubleValue());
            return true;
        }

        @Override
        public Number getMinimumAccessibleValue() {
            return rail.scale().lowKelvin();
        }

        @Override
        public Number getMaximumAccessibleValue() {
            return rail.scale().highKelvin();
        }
    }
}
