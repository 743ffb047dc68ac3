package org.saddlebook.desk.internal;

import java.awt.Graphics;
import java.awt.Graphics2D;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.desk.api.Marks;

/** A caution with its number on a dog-eared ground: one line of it, and its full text once it is pressed. */
final class CautionLine extends JButton {
    private static final long serialVersionUID = 1L;

    private static final int PAD = 4;
    private static final int EAR = 12;
    private static final int NUMBER = 22;

    private final transient AccountLog.Line line;
    private final transient Ink ink;
    private final Prose number;
    private final Prose brief;
    private final Prose full;
    private boolean whole;

    CautionLine(AccountLog.Line line, Ink ink) {
        this.line = line;
        this.ink = ink;
        setLayout(null);
        setContentAreaFilled(false);
        setBorder(BorderFactory.createEmptyBorder());
        number = new Prose(0.92, true, ink.ink(), 1, ink);
        number.setText(Integer.toString(line.number()));
        brief = new Prose(0.92, false, ink.ink(), 2, ink);
        brief.setText(line.text());
        full = new Prose(0.92, false, ink.ink(), 20, ink);
        full.setText(line.more());
        add(number);
        add(brief);
        add(full);
        setToolTipText("Press to read it whole");
        getAccessibleContext().setAccessibleName("Caution " + line.number() + ": " + line.more());
        addActionListener(event -> {
            whole = !whole;
            revalidate();
            repaint();
        });
    }

    /** Height when it is this wide. */
    int heightAt(int width) {
        return (whole ? full : brief).heightAt(width - PAD - NUMBER - EAR) + 2 * PAD;
    }

    @Override
    public void doLayout() {
        int wide = getWidth() - PAD - NUMBER - EAR;
        int high = getHeight() - 2 * PAD;
        number.setBounds(PAD + 2, PAD, NUMBER, high);
        brief.setVisible(!whole);
        full.setVisible(whole);
        (whole ? full : brief).setBounds(PAD + NUMBER, PAD, wide, high);
    }

    @Override
    protected void paintComponent(Graphics graphics) {
        Graphics2D g = (Graphics2D) graphics.create();
        Prose.smooth(g);
        Marks.dogEar(g, ink, 0, 0, getWidth() - 1.0, getHeight() - 1.0);
        if (isFocusOwner()) {
            g.setColor(ink.petrol());
            g.drawRect(1, 1, getWidth() - 3, getHeight() - 3);
        }
        g.dispose();
    }

    @Override
    public String toString() {
        return "caution " + line.number();
    }
}
