package org.saddlebook.desk.internal;

import java.awt.BorderLayout;
import java.awt.Rectangle;
import java.time.ZoneId;
import java.time.ZonedDateTime;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.ScrollPaneConstants;
import javax.swing.SwingUtilities;
import net.miginfocom.swing.MigLayout;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.Ink;

/** The right margin: the running account, what is open, the last step. */
final class AccountPane extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int MOST_GAPS = 6;

    private final transient Desk desk;
    private final JPanel lines = new AccountLines();
    private final JScrollPane scroll;
    private final JPanel foot = new JPanel(new MigLayout("insets 8 14 14 14, fillx, wrap 1, gapy 2", "[fill,grow]"));
    private transient List<AccountLog.Line> shown = List.of();
    private transient Ink ink;

    AccountPane(Desk desk) {
        super(new BorderLayout());
        this.desk = desk;
        ink = desk.ink();
        scroll = new JScrollPane(
                lines,
                ScrollPaneConstants.VERTICAL_SCROLLBAR_AS_NEEDED,
                ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
        scroll.setBorder(BorderFactory.createEmptyBorder());
        scroll.getVerticalScrollBar().setUnitIncrement(20);
        scroll.getVerticalScrollBar().getAccessibleContext().setAccessibleName("Scroll the account");
        scroll.getAccessibleContext().setAccessibleName("Running account");
        scroll.setFocusable(true);
        inkChanged();
    }

    void inkChanged() {
        ink = desk.ink();
        shown = List.of();
        removeAll();
        setBackground(ink.paper());
        lines.setBackground(ink.paper());
        scroll.getViewport().setBackground(ink.paper());
        foot.setBackground(ink.paper());
        setBorder(BorderFactory.createMatteBorder(0, 1, 0, 0, ink.line()));
        Prose heading = new Prose(1.15, true, ink.ink(), 1, ink);
        heading.setText("Account");
        heading.setBorder(BorderFactory.createEmptyBorder());
        JPanel head = new JPanel(new MigLayout("insets 10 14 6 14, fillx", "[fill,grow]"));
        head.setOpaque(false);
        head.add(heading);
        add(head, BorderLayout.NORTH);
        add(scroll, BorderLayout.CENTER);
        add(foot, BorderLayout.SOUTH);
        lines.removeAll();
        tell();
        gaps();
    }

    /** Shows the account of the campaign in view; only what is new is added. */
    void tell() {
        List<AccountLog.Line> now = desk.current().map(c -> c.account().lines()).orElse(List.of());
        int from = 0;
        if (now.size() >= shown.size() && now.subList(0, shown.size()).equals(shown)) {
            from = shown.size();
        } else {
            lines.removeAll();
        }
        for (AccountLog.Line line : now.subList(from, now.size())) {
            add(line);
        }
        boolean more = now.size() > from;
        shown = now;
        lines.revalidate();
        lines.repaint();
        if (more) {
            SwingUtilities.invokeLater(() -> {
                int height = lines.getHeight();
                lines.scrollRectToVisible(new Rectangle(0, Math.max(0, height - 1), 1, 1));
            });
        }
    }

    private void add(AccountLog.Line line) {
        if (line.kind() == AccountLog.Kind.CAUTION) {
            lines.add(new CautionLine(line, ink));
            return;
        }
        Prose time = new Prose(0.85, false, ink.faint(), 1, ink);
        time.setText(time(line));
        Prose text = new Prose(0.92, false, ink.ink(), 4, ink);
        text.setText(line.more().isEmpty() ? line.text() : line.text() + " (" + line.more() + ")");
        lines.add(time);
        lines.add(text);
    }

    private String time(AccountLog.Line line) {
        ZonedDateTime when = line.when().atZone(ZoneId.systemDefault());
        ZonedDateTime now = desk.clock().instant().atZone(ZoneId.systemDefault());
        return when.toLocalDate().equals(now.toLocalDate())
                ? two(when.getHour()) + ":" + two(when.getMinute())
                : two(when.getMonthValue()) + "-" + two(when.getDayOfMonth());
    }

    private static String two(int number) {
        return number < 10 ? "0" + number : Integer.toString(number);
    }

    /** Shows what is open and the last step. */
    void gaps() {
        List<DeskAction> gaps = new ArrayList<>();
        Optional<DeskAction> last = Optional.empty();
        for (PanelHost host : desk.shelf().hosts()) {
            gaps.addAll(host.gaps());
            Optional<DeskAction> step = host.lastStep();
            last = step.isPresent() ? step : last;
        }
        foot.removeAll();
        if (!gaps.isEmpty()) {
            Prose heading = new Prose(1, true, ink.ink(), 1, ink);
            heading.setText("Open before signing");
            foot.add(heading);
            for (DeskAction gap : gaps.subList(0, Math.min(MOST_GAPS, gaps.size()))) {
                foot.add(gap(gap), "wmin 60");
            }
            if (gaps.size() > MOST_GAPS) {
                Prose rest = new Prose(0.85, false, ink.faint(), 1, ink);
                rest.setText("and " + (gaps.size() - MOST_GAPS) + " more");
                foot.add(rest);
            }
        }
        last.ifPresent(step -> {
            JButton button = Plain.framed(step.title(), ink, step::run);
            button.setEnabled(step.obstacle().isEmpty());
            step.obstacle().ifPresent(reason -> {
                button.setToolTipText(reason);
                button.getAccessibleContext().setAccessibleDescription(reason);
            });
            foot.add(button, "gaptop 8");
            step.obstacle().ifPresent(reason -> {
                Prose why = new Prose(0.85, false, ink.faint(), 3, ink);
                why.setText(reason);
                foot.add(why, "wmin 60");
            });
        });
        foot.revalidate();
        foot.repaint();
    }

    private JComponent gap(DeskAction gap) {
        JButton button = Plain.word("– " + gap.title(), ink, gap::run);
        button.setFont(ink.font(0.92, false));
        button.setHorizontalAlignment(javax.swing.SwingConstants.LEFT);
        button.setToolTipText(gap.title());
        button.getAccessibleContext().setAccessibleName("Open: " + gap.title());
        return button;
    }
}
