package org.saddlebook.desk.internal;

import java.awt.Cursor;
import java.awt.Dimension;
import java.awt.Graphics;
import java.awt.event.ActionEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.Optional;
import javax.swing.AbstractAction;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.KeyStroke;
import javax.swing.SwingConstants;
import org.saddlebook.desk.api.Ink;

/** One stratum: title and sentence in the left column, the marks beside them; open, the body below. */
final class Stratum extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int LOWEST = 38;
    private static final int HIGHEST = 120;
    private static final int EDGE = 5;
    private static final int MARGIN = 16;
    private static final int PAD = 6;

    /** Least height of a body. */
    static final int BODY = 260;

    private final transient Desk desk;
    private final transient PanelHost host;
    private final transient Ink ink;
    private final boolean open;
    private final JButton title;
    private final Prose sentence;
    private final transient Optional<PanelSlot> content;
    private final transient Optional<JButton> again;
    private int column = 200;

    Stratum(Desk desk, PanelHost host, boolean open) {
        super(null);
        this.desk = desk;
        this.host = host;
        this.open = open;
        ink = desk.ink();
        setOpaque(true);
        setBackground(open ? ink.sheet() : ink.paper());
        title = title();
        sentence = new Prose(0.85, false, ink.faint(), open ? 2 : 3, ink);
        add(title);
        add(sentence);
        Optional<JComponent> inner = open ? host.body() : host.strip();
        content = inner.map(component -> new PanelSlot(host, component));
        content.ifPresent(this::add);
        again = host.failure().isPresent()
                ? Optional.of(Plain.word("Try again", ink, () -> desk.shelf().again(host)))
                : Optional.empty();
        again.ifPresent(this::add);
        mouse();
        tell();
    }

    private JButton title() {
        JButton button = new JButton(host.title());
        button.setHorizontalAlignment(SwingConstants.LEFT);
        button.putClientProperty("JButton.buttonType", "toolBarButton");
        button.setMargin(new java.awt.Insets(0, 3, 0, 3));
        button.setForeground(ink.ink());
        button.setFont(ink.font(1.08, open));
        button.setCursor(Cursor.getPredefinedCursor(Cursor.HAND_CURSOR));
        button.addActionListener(event -> desk.unfold(id()));
        move(button, "UP", -1);
        move(button, "DOWN", 1);
        return button;
    }

    private void move(JButton button, String key, int by) {
        button.getInputMap().put(KeyStroke.getKeyStroke(key), key);
        button.getActionMap().put(key, new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                if (getParent() instanceof StrataPane strata) {
                    strata.focusFrom(Stratum.this, by);
                }
            }
        });
    }

    private void mouse() {
        MouseAdapter adapter = new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                if (!open) {
                    desk.unfold(id());
                }
            }

            @Override
            public void mouseDragged(MouseEvent event) {
                if (event.getX() > column) {
                    desk.rail().move(desk.rail().scale().kelvin(event.getX()));
                }
            }
        };
        addMouseListener(adapter);
        addMouseMotionListener(adapter);
        if (!open) {
            setCursor(Cursor.getPredefinedCursor(Cursor.HAND_CURSOR));
        }
    }

    String id() {
        return host.contribution().id();
    }

    boolean isOpen() {
        return open;
    }

    PanelHost host() {
        return host;
    }

    boolean isTitle(java.awt.Component component) {
        return component == title;
    }

    /** Whether what it was made for is still so. */
    boolean fresh() {
        return host.failure().isPresent() == again.isPresent();
    }

    void focusTitle() {
        title.requestFocusInWindow();
    }

    /** Takes over title and sentence. */
    void tell() {
        title.setText(host.title());
        sentence.setText(host.sentence());
        title.getAccessibleContext().setAccessibleName(host.title() + (open ? ", open" : ", folded"));
        title.getAccessibleContext().setAccessibleDescription(host.sentence());
        title.setToolTipText(open ? null : host.sentence());
        revalidate();
    }

    void column(int width) {
        column = width;
    }

    /** The height it would have when folded, with at most so many lines of its sentence, or the least one when open. */
    int wantedHeight(int width, int lines) {
        if (open) {
            return headHeight(width) + BODY;
        }
        int words = Math.min(sentence.heightAt(sentenceWidth(width)), sentence.heightOf(lines));
        int text = titleHeight() + words + 2 * PAD - 2;
        // Where room is short the marks make do with what the words need.
        int marks = lines == 1
                ? 0
                : content.map(slot -> slot.getPreferredSize().height).orElse(0);
        return Math.min(Math.max(Math.max(text, marks), LOWEST), HIGHEST);
    }

    private int titleHeight() {
        return title.getPreferredSize().height;
    }

    private int headHeight(int width) {
        return Math.max(titleHeight(), sentence.heightAt(sentenceWidth(width))) + 2 * PAD;
    }

    private int sentenceWidth(int width) {
        if (open) {
            return width - column - MARGIN - againWidth();
        }
        if (host.failure().isPresent()) {
            return width - 2 * MARGIN - againWidth();
        }
        return marked() ? column - MARGIN - 4 : width - 2 * MARGIN;
    }

    /** Whether it has marks on the rail; without them the sentence has their room. */
    private boolean marked() {
        return content.isPresent() && content.get().getComponent(0).isVisible();
    }

    private int againWidth() {
        return again.map(button -> button.getPreferredSize().width + MARGIN).orElse(0);
    }

    @Override
    public void doLayout() {
        int width = getWidth();
        int high = titleHeight();
        int wide = Math.min(title.getPreferredSize().width, column - MARGIN);
        title.setBounds(MARGIN - 4, PAD - 1, wide, high);
        if (open) {
            int head = headHeight(width);
            sentence.setBounds(column, PAD + 2, sentenceWidth(width), head - 2 * PAD);
            content.ifPresent(slot -> slot.setBounds(EDGE, head, width - EDGE, getHeight() - head - 1));
        } else {
            int left = sentenceWidth(width);
            sentence.setBounds(MARGIN, PAD + high - 1, left, getHeight() - high - PAD);
            content.ifPresent(slot -> slot.setBounds(column, 0, width - column, getHeight() - 1));
        }
        again.ifPresent(button -> {
            Dimension size = button.getPreferredSize();
            button.setBounds(width - size.width - MARGIN, PAD, size.width, size.height);
        });
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        super.paintComponent(graphics);
        if (open) {
            graphics.setColor(ink.plum());
            graphics.fillRect(0, 0, EDGE, getHeight());
        }
        graphics.setColor(ink.line());
        graphics.drawLine(0, getHeight() - 1, getWidth(), getHeight() - 1);
    }
}
