package org.saddlebook.desk.internal;

import java.awt.BorderLayout;
import java.awt.datatransfer.StringSelection;
import java.awt.datatransfer.Transferable;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JTable;
import javax.swing.TransferHandler;
import javax.swing.table.AbstractTableModel;
import org.saddlebook.api.findings.Node;
import org.saddlebook.desk.api.Ink;
import org.saddlebook.presentation.api.UnitText;

/** A table of findings, shown plainly; copied, it carries headings and units. */
final class PlainTable {
    private PlainTable() {}

    static JComponent of(String name, Node.Table table, Ink ink) {
        JTable view = new JTable(new Cells(table));
        view.setFont(ink.font(0.92, false));
        view.setRowHeight(view.getFontMetrics(view.getFont()).getHeight() + 4);
        view.getAccessibleContext().setAccessibleName(name);
        view.getTableHeader().getAccessibleContext().setAccessibleName("Columns of " + name);
        view.setCellSelectionEnabled(true);
        view.setTransferHandler(new TransferHandler() {
            private static final long serialVersionUID = 1L;

            @Override
            public int getSourceActions(JComponent component) {
                return COPY;
            }

            @Override
            protected Transferable createTransferable(JComponent component) {
                return new StringSelection(copied(table));
            }
        });
        JPanel place = new JPanel(new BorderLayout());
        place.setOpaque(false);
        place.add(view.getTableHeader(), BorderLayout.NORTH);
        place.add(view, BorderLayout.CENTER);
        return place;
    }

    static String heading(Node.Column column) {
        return column.unit().isEmpty() || column.unit().equals("1")
                ? column.title()
                : column.title() + " / " + UnitText.forPeople(column.unit());
    }

    /** The whole table as lines with tabs, headings with units first; no cell can be run as a formula. */
    static String copied(Node.Table table) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < table.columns().size(); i++) {
            text.append(i == 0 ? "" : "\t").append(safe(heading(table.columns().get(i))));
        }
        for (List<Node> row : table.rows()) {
            text.append('\n');
            for (int i = 0; i < row.size(); i++) {
                text.append(i == 0 ? "" : "\t").append(safe(DefaultPanel.text(row.get(i))));
            }
        }
        return text.append('\n').toString();
    }

    private static String safe(String cell) {
        String flat = cell.replace('\t', ' ').replace('\n', ' ').replace('\u2212', '-');
        boolean number = flat.matches("[-+]?[0-9.].*");
        return !number && !flat.isEmpty() && "=+-@".indexOf(flat.charAt(0)) >= 0 ? "'" + flat : flat;
    }

    private static final class Cells extends AbstractTableModel {
        private static final long serialVersionUID = 1L;

        private final transient Node.Table table;

        Cells(Node.Table table) {
            this.table = table;
        }

        @Override
        public int getRowCount() {
            return table.rows().size();
        }

        @Override
        public int getColumnCount() {
            return table.columns().size();
        }

        @Override
        public String getColumnName(int column) {
            return heading(table.columns().get(column));
        }

        @Override
        public Object getValueAt(int row, int column) {
            return DefaultPanel.text(table.rows().get(row).get(column));
        }
    }
}
