package org.saddlebook.desk.components.api;

import java.awt.Component;
import java.awt.Dimension;
import java.awt.FontMetrics;
import java.awt.KeyboardFocusManager;
import java.util.Set;
import javax.swing.BorderFactory;
import javax.swing.JTable;
import javax.swing.JTextArea;
import javax.swing.table.AbstractTableModel;
import javax.swing.table.TableCellRenderer;
import javax.swing.table.TableColumn;
import org.saddlebook.desk.api.Ink;

/** The grid inside a table: columns as wide as their text where there is room, cells that wrap where there is not. */
final class CellGrid extends JTable {
    private static final long serialVersionUID = 1L;

    private static final int PAD = 14;
    private static final int LEAST = 64;
    private static final int MEASURED_ROWS = 200;

    private final transient Ink ink;
    private transient TableContent content = TableContent.EMPTY;
    private final Head head;
    private int laidOutAt = -1;

    CellGrid(Ink ink) {
        this.ink = ink;
        head = new Head();
        setModel(new Model());
        setFont(ink.font(0.96, false));
        setForeground(ink.ink());
        setBackground(ink.sheet());
        setGridColor(ink.line());
        setShowVerticalLines(false);
        setShowHorizontalLines(true);
        setRowHeight(lineHeight() + 6);
        setAutoResizeMode(AUTO_RESIZE_OFF);
        setFillsViewportHeight(true);
        setDefaultRenderer(Object.class, new Wrapping());
        getTableHeader().setReorderingAllowed(false);
        getTableHeader().setFont(ink.font(0.92, true));
        getTableHeader().setForeground(ink.ink());
        getTableHeader().setBackground(ink.rail());
        getTableHeader().setFocusable(false);
        // Tab walks on to the next control; arrows walk within.
        setFocusTraversalKeys(
                KeyboardFocusManager.FORWARD_TRAVERSAL_KEYS, Set.of(java.awt.AWTKeyStroke.getAWTKeyStroke("TAB")));
        setFocusTraversalKeys(
                KeyboardFocusManager.BACKWARD_TRAVERSAL_KEYS,
                Set.of(java.awt.AWTKeyStroke.getAWTKeyStroke("shift TAB")));
    }

    private int lineHeight() {
        return getFontMetrics(getFont()).getHeight();
    }

    void show(TableContent newContent) {
        boolean sameColumns = content.columns().equals(newContent.columns());
        content = newContent;
        laidOutAt = -1;
        if (sameColumns) {
            ((AbstractTableModel) getModel()).fireTableDataChanged();
        } else {
            ((AbstractTableModel) getModel()).fireTableStructureChanged();
        }
        if (getWidth() > 0) {
            widths(getWidth());
        }
    }

    @Override
    public void doLayout() {
        Component holder = getParent();
        widths(holder == null || holder.getWidth() == 0 ? getWidth() : holder.getWidth());
        super.doLayout();
    }

    @Override
    public Dimension getPreferredSize() {
        Component holder = getParent();
        if (holder != null && holder.getWidth() > 0) {
            widths(holder.getWidth());
        }
        return super.getPreferredSize();
    }

    /** Gives every column its natural width where all fit; else takes from the widest first. */
    private void widths(int room) {
        if (room == laidOutAt || room <= 0) {
            return;
        }
        laidOutAt = room;
        int n = getColumnCount();
        int[] natural = new int[n];
        int[] least = new int[n];
        long sum = 0;
        FontMetrics cell = getFontMetrics(getFont());
        FontMetrics heads = getFontMetrics(getTableHeader().getFont());
        for (int j = 0; j < n; j++) {
            String title = content.columns().get(j).title();
            natural[j] = Math.max(LEAST, heads.stringWidth(title) + PAD);
            least[j] = Math.max(LEAST, longestWord(heads, title) + PAD);
            int rows = Math.min(MEASURED_ROWS, content.rows().size());
            for (int i = 0; i < rows; i++) {
                String text = content.rows().get(i).get(j).text();
                natural[j] = Math.max(natural[j], cell.stringWidth(text) + PAD);
                least[j] = Math.max(least[j], Math.min(260, longestWord(cell, text) + PAD));
            }
            sum += natural[j];
        }
        int cap = cap(natural, least, room, sum);
        for (int j = 0; j < n; j++) {
            TableColumn column = getColumnModel().getColumn(j);
            int width = Math.max(least[j], Math.min(natural[j], cap));
            if (sum <= room) {
                // Spare room goes between the columns, evenly, but never so much that a row falls apart.
                width += (int) Math.min(48, (room - sum) / n);
            }
            // Asked for by column: a common one would be measured for the first column only.
            column.setHeaderRenderer(head);
            column.setPreferredWidth(width);
            column.setWidth(width);
        }
        getTableHeader().resizeAndRepaint();
        heights();
    }

    /** The width to which the widest columns are cut so that all fit. */
    private static int cap(int[] natural, int[] least, int room, long sum) {
        if (sum <= room) {
            return Integer.MAX_VALUE;
        }
        int low = LEAST;
        int high = room;
        while (low < high) {
            int middle = (low + high + 1) / 2;
            long total = 0;
            for (int j = 0; j < natural.length; j++) {
                total += Math.max(least[j], Math.min(natural[j], middle));
            }
            if (total <= room) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return low;
    }

    private static int longestWord(FontMetrics metrics, String text) {
        int longest = 0;
        for (String word : text.split(" ", -1)) {
            longest = Math.max(longest, metrics.stringWidth(word));
        }
        return longest;
    }

    private void heights() {
        if (content.rows().size() > TableView.wrappedRows()) {
            setRowHeight(lineHeight() + 6);
            return;
        }
        Wrapping measure = new Wrapping();
        for (int i = 0; i < content.rows().size(); i++) {
            int most = lineHeight() + 6;
            for (int j = 0; j < getColumnCount(); j++) {
                measure.setText(content.rows().get(i).get(j).text());
                measure.setSize(getColumnModel().getColumn(j).getWidth(), Short.MAX_VALUE);
                most = Math.max(most, measure.getPreferredSize().height);
            }
            if (getRowHeight(i) != most) {
                setRowHeight(i, most);
            }
        }
    }

    private final class Model extends AbstractTableModel {
        private static final long serialVersionUID = 1L;

        @Override
        public int getRowCount() {
            return content == null ? 0 : content.rows().size();
        }

        @Override
        public int getColumnCount() {
            return content == null ? 0 : content.columns().size();
        }

        @Override
        public String getColumnName(int column) {
            return content.columns().get(column).title();
        }

        @Override
        public Object getValueAt(int row, int column) {
            return content.rows().get(row).get(column).text();
        }
    }

    /** A cell that wraps. */
    private final class Wrapping extends JTextArea implements TableCellRenderer {
        private static final long serialVersionUID = 1L;

        Wrapping() {
            setLineWrap(true);
            setWrapStyleWord(true);
            setFont(ink.font(0.96, false));
            setBorder(BorderFactory.createEmptyBorder(3, 4, 3, 4));
            setOpaque(true);
        }

        @Override
        public Component getTableCellRendererComponent(
                JTable table, Object value, boolean selected, boolean focused, int row, int column) {
            setText(String.valueOf(value));
            setForeground(ink.ink());
            setBackground(selected ? ink.rail() : ink.sheet());
            boolean here = focused && table.hasFocus();
            setBorder(
                    here
                            ? BorderFactory.createCompoundBorder(
                                    BorderFactory.createLineBorder(ink.plum(), 2),
                                    BorderFactory.createEmptyBorder(1, 2, 1, 2))
                            : BorderFactory.createEmptyBorder(3, 4, 3, 4));
            return this;
        }
    }

    /** A head that wraps. */
    private final class Head extends JTextArea implements TableCellRenderer {
        private static final long serialVersionUID = 1L;

        Head() {
            setLineWrap(true);
            setWrapStyleWord(true);
            setFont(ink.font(0.92, true));
            setForeground(ink.ink());
            setBackground(ink.rail());
            setBorder(BorderFactory.createEmptyBorder(3, 4, 3, 4));
        }

        @Override
        public Component getTableCellRendererComponent(
                JTable table, Object value, boolean selected, boolean focused, int row, int column) {
            setText(String.valueOf(value));
            setSize(getColumnModel().getColumn(column).getWidth(), Short.MAX_VALUE);
            return this;
        }
    }
}
