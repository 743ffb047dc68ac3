package org.saddlebook.desk.components.api;

import java.awt.BorderLayout;
import java.awt.Dimension;
import java.awt.datatransfer.StringSelection;
import java.awt.event.ActionEvent;
import java.awt.event.KeyEvent;
import java.awt.event.MouseAdapter;
import java.awt.event.MouseEvent;
import java.util.Optional;
import java.util.function.IntConsumer;
import java.util.stream.IntStream;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JMenuItem;
import javax.swing.JPanel;
import javax.swing.JPopupMenu;
import javax.swing.JScrollPane;
import javax.swing.KeyStroke;
import javax.swing.ListSelectionModel;
import org.saddlebook.desk.api.DeskContext;
import org.saddlebook.desk.api.Ink;

/**
 * A table that copies with head and units into a spreadsheet, saves as CSV, and is walked with the keyboard: arrows within,
 * Tab to leave, Enter to act on a row.
 */
public final class TableView extends JPanel {
    private static final long serialVersionUID = 1L;

    private static final int MOST_ROWS = 400;

    private final transient DeskContext context;
    private final transient Saving saving;
    private final String name;
    private final CellGrid grid;
    private final JPanel place = new JPanel(new BorderLayout());
    private transient TableContent content = TableContent.EMPTY;
    private int rowsInView = 14;
    private transient Optional<IntConsumer> act = Optional.empty();
    private String verb = "";

    /**
     * An empty table.
     *
     * @param name accessible name, also shown above the table
     */
    public TableView(String name, DeskContext context, Saving saving) {
        this.context = context;
        this.saving = saving;
        this.name = name;
        Ink ink = context.ink();
        setLayout(new BorderLayout());
        setOpaque(false);
        setBorder(BorderFactory.createEmptyBorder(4, 16, 4, 16));
        grid = new CellGrid(ink);
        grid.getAccessibleContext().setAccessibleName(name);
        grid.setSelectionMode(ListSelectionModel.MULTIPLE_INTERVAL_SELECTION);
        JPanel head = new JPanel(new BorderLayout());
        head.setOpaque(false);
        javax.swing.JLabel title = new javax.swing.JLabel(name);
        title.setFont(ink.font(0.92, true));
        title.setForeground(ink.ink());
        title.setLabelFor(grid);
        head.add(title, BorderLayout.CENTER);
        head.add(new MoreButton("Table " + name + ": copy or save", ink, this::menu), BorderLayout.EAST);
        add(head, BorderLayout.NORTH);
        place.setOpaque(false);
        add(place, BorderLayout.CENTER);
        bind();
        lay();
    }

    private void bind() {
        int menuKey = java.awt.event.InputEvent.CTRL_DOWN_MASK;
        on(KeyStroke.getKeyStroke(KeyEvent.VK_C, menuKey), "copy with units", this::copy);
        on(KeyStroke.getKeyStroke(KeyEvent.VK_ENTER, 0), "act on row", this::actOnSelected);
        on(KeyStroke.getKeyStroke(KeyEvent.VK_F10, java.awt.event.InputEvent.SHIFT_DOWN_MASK), "more", this::popUp);
        on(KeyStroke.getKeyStroke(KeyEvent.VK_CONTEXT_MENU, 0), "more", this::popUp);
        grid.addMouseListener(new MouseAdapter() {
            @Override
            public void mouseClicked(MouseEvent event) {
                if (event.getClickCount() == 2) {
                    actOnSelected();
                }
            }

            @Override
            public void mousePressed(MouseEvent event) {
                menuAt(event);
            }

            @Override
            public void mouseReleased(MouseEvent event) {
                menuAt(event);
            }

            private void menuAt(MouseEvent event) {
                if (event.isPopupTrigger()) {
                    menu().show(grid, event.getX(), event.getY());
                }
            }
        });
    }

    private void on(KeyStroke key, String what, Runnable work) {
        grid.getInputMap(JComponent.WHEN_ANCESTOR_OF_FOCUSED_COMPONENT).put(key, what);
        grid.getActionMap().put(what, new AbstractAction(what) {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                work.run();
            }
        });
    }

    /** Shows a table; the selection stays where it was. */
    public void show(TableContent newContent) {
        int selected = grid.getSelectedRow();
        boolean scrolled = content.rows().size() > rowsInView;
        content = newContent;
        grid.show(newContent);
        if (selected >= 0 && selected < newContent.rows().size()) {
            grid.setRowSelectionInterval(selected, selected);
        }
        if (scrolled != (content.rows().size() > rowsInView) || place.getComponentCount() == 0) {
            lay();
        }
        setVisible(!newContent.columns().isEmpty());
        revalidate();
        repaint();
    }

    /** The table shown. */
    public TableContent content() {
        return content;
    }

    /** How many rows are shown at most before the table scrolls by itself. */
    public TableView withRowsInView(int rows) {
        rowsInView = rows;
        lay();
        return this;
    }

    /**
     * What Enter and a double click do.
     *
     * @param what in the imperative, for the menu
     * @param work receives the index of the row
     */
    public TableView onRow(String what, IntConsumer work) {
        verb = what;
        act = Optional.of(work);
        grid.getAccessibleContext().setAccessibleDescription("Enter: " + what);
        return this;
    }

    /** Calls this with the row when another one is chosen; −1 for none. */
    public TableView onSelection(IntConsumer chosen) {
        grid.getSelectionModel().addListSelectionListener(event -> {
            if (!event.getValueIsAdjusting()) {
                chosen.accept(grid.getSelectedRow());
            }
        });
        return this;
    }

    /** The row chosen; −1 for none. */
    public int selectedRow() {
        return grid.getSelectedRow();
    }

    /** Chooses a row and brings it into view. */
    public void select(int row) {
        grid.setRowSelectionInterval(row, row);
        grid.scrollRectToVisible(grid.getCellRect(row, 0, true));
    }

    private void lay() {
        place.removeAll();
        if (content.rows().size() > rowsInView) {
            JScrollPane pane = new JScrollPane(grid) {
                private static final long serialVersionUID = 1L;

                @Override
                public Dimension getPreferredSize() {
                    return new Dimension(
                            super.getPreferredSize().width,
                            grid.getTableHeader().getPreferredSize().height + grid.getRowHeight() * rowsInView + 4);
                }
            };
            pane.setBorder(BorderFactory.createEmptyBorder());
            pane.getViewport().setBackground(grid.getBackground());
            place.add(pane, BorderLayout.CENTER);
        } else {
            place.add(grid.getTableHeader(), BorderLayout.NORTH);
            place.add(grid, BorderLayout.CENTER);
        }
        place.revalidate();
    }

    /** Copies the chosen rows, or all, with head and units. */
    public void copy() {
        int[] rows = grid.getSelectedRows();
        int[] chosen = rows.length > 0
                ? rows
                : IntStream.range(0, content.rows().size()).toArray();
        saving.clipboard().get().setContents(new StringSelection(content.tabSeparated(chosen)), null);
        context.note(
                "Copied " + chosen.length + (chosen.length == 1 ? " row" : " rows") + " of " + name + " with units.");
    }

    /** Asks for a file and saves the table as CSV. */
    public void saveAsCsv() {
        TableContent now = content;
        saving.save(this, context, Saving.fileName(name, "csv"), now::csv);
    }

    private void actOnSelected() {
        int row = grid.getSelectedRow();
        if (row >= 0 && row < content.rows().size()) {
            act.ifPresent(work -> work.accept(row));
        }
    }

    private void popUp() {
        java.awt.Rectangle cell = grid.getCellRect(Math.max(0, grid.getSelectedRow()), 0, true);
        menu().show(grid, cell.x + 8, cell.y + cell.height);
    }

    private JPopupMenu menu() {
        JPopupMenu menu = new JPopupMenu(name);
        if (act.isPresent()) {
            JMenuItem row = item(verb, this::actOnSelected);
            row.setEnabled(grid.getSelectedRow() >= 0);
            menu.add(row);
        }
        menu.add(item("Copy with units", this::copy));
        menu.add(item("Copy all with units", () -> {
            grid.clearSelection();
            copy();
        }));
        menu.add(item("Save as CSV …", this::saveAsCsv));
        return menu;
    }

    private static JMenuItem item(String text, Runnable work) {
        JMenuItem item = new JMenuItem(text);
        item.addActionListener(event -> work.run());
        return item;
    }

    /** Rows up to which cells may wrap onto several lines; longer tables have one line each. */
    static int wrappedRows() {
        return MOST_ROWS;
    }
}
