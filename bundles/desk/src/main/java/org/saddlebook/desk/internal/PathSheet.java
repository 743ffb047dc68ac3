package org.saddlebook.desk.internal;

import java.awt.event.ActionEvent;
import java.io.IOException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.swing.AbstractAction;
import javax.swing.BorderFactory;
import javax.swing.DefaultListModel;
import javax.swing.JButton;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextField;
import javax.swing.KeyStroke;
import javax.swing.ListSelectionModel;
import javax.swing.SwingUtilities;
import javax.swing.event.DocumentEvent;
import javax.swing.event.DocumentListener;
import org.saddlebook.desk.api.DeskTask;
import org.saddlebook.desk.api.Ink;

/**
 * Asks for a file or folder: a line to type in, and below it what lies there, listed in the background. The arrow keys choose,
 * Tab takes a folder and looks into it, Enter answers.
 */
final class PathSheet {
    private static final int MOST = 200;
    private static final int ROWS = 6;

    private final Desk desk;
    private final PathQuestion question;
    private final Runnable away;
    private final JTextField field;
    private final DefaultListModel<String> entries = new DefaultListModel<>();
    private final JList<String> list = new JList<>(entries);
    private final Prose wrong;
    private Optional<DeskTask> listing = Optional.empty();
    private String wanted = "";

    private PathSheet(Desk desk, PathQuestion question, Runnable away) {
        this.desk = desk;
        this.question = question;
        this.away = away;
        Ink ink = desk.ink();
        String start = question.start().toString();
        field = new JTextField(question.toWrite() ? start : start + "/", 50);
        wrong = new Prose(0.92, false, ink.ink(), 2, ink);
    }

    /** Fills a sheet with the question. */
    static void fill(JPanel sheet, Desk desk, PathQuestion question, Runnable away) {
        new PathSheet(desk, question, away).fill(sheet);
    }

    private void fill(JPanel sheet) {
        Ink ink = desk.ink();
        Prose heading = new Prose(1, true, ink.ink(), 2, ink);
        heading.setText(question.question());
        field.getAccessibleContext().setAccessibleName(question.question());
        field.setFocusTraversalKeysEnabled(false);
        field.addActionListener(event -> take());
        JButton yes = Plain.framed(question.toWrite() ? "Save here" : "Open", ink, this::take);
        JButton no = Plain.word("Leave it", ink, away);
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setVisibleRowCount(ROWS);
        list.getAccessibleContext().setAccessibleName("Files and folders there");
        list.setFocusable(false);
        list.addMouseListener(new java.awt.event.MouseAdapter() {
            @Override
            public void mouseClicked(java.awt.event.MouseEvent event) {
                complete();
                if (event.getClickCount() > 1 && !field.getText().endsWith("/")) {
                    take();
                }
                field.requestFocusInWindow();
            }
        });
        JScrollPane scroll = new JScrollPane(list);
        scroll.setBorder(BorderFactory.createLineBorder(ink.line()));
        sheet.add(heading, "span 3, growx, wmin 80, wrap");
        sheet.add(field, "growx, wmin 120");
        sheet.add(yes);
        sheet.add(no, "wrap");
        sheet.add(scroll, "span 3, growx, wrap");
        sheet.add(wrong, "span 3, growx, wmin 80, hidemode 3");
        wrong.setVisible(false);
        keys();
        field.getDocument().addDocumentListener(new DocumentListener() {
            @Override
            public void insertUpdate(DocumentEvent event) {
                look();
            }

            @Override
            public void removeUpdate(DocumentEvent event) {
                look();
            }

            @Override
            public void changedUpdate(DocumentEvent event) {
                look();
            }
        });
        look();
        SwingUtilities.invokeLater(() -> {
            field.requestFocusInWindow();
            field.setCaretPosition(field.getText().length());
        });
    }

    private void keys() {
        key("DOWN", () -> choose(1));
        key("UP", () -> choose(-1));
        key("TAB", this::complete);
    }

    private void key(String stroke, Runnable work) {
        field.getInputMap().put(KeyStroke.getKeyStroke(stroke), stroke);
        field.getActionMap().put(stroke, new AbstractAction() {
            private static final long serialVersionUID = 1L;

            @Override
            public void actionPerformed(ActionEvent event) {
                work.run();
            }
        });
    }

    private void choose(int by) {
        int next = Math.max(0, Math.min(entries.size() - 1, list.getSelectedIndex() + by));
        list.setSelectedIndex(next);
        list.ensureIndexIsVisible(next);
    }

    /** Takes the chosen entry, or the only one, into the line. */
    private void complete() {
        String chosen = list.getSelectedValue();
        if (chosen == null && entries.size() == 1) {
            chosen = entries.get(0);
        }
        if (chosen != null) {
            String text = field.getText();
            int slash = Math.max(text.lastIndexOf('/'), text.lastIndexOf('\\'));
            field.setText(text.substring(0, slash + 1) + chosen);
        }
    }

    private void look() {
        String text = field.getText();
        wanted = text;
        listing.ifPresent(DeskTask::cancel);
        listing = Optional.of(desk.background()
                .run(
                        "listing",
                        false,
                        progress -> list(text),
                        found -> {
                            if (text.equals(wanted)) {
                                entries.clear();
                                found.forEach(entries::addElement);
                            }
                        },
                        fault -> entries.clear()));
    }

    static List<String> list(String text) throws IOException {
        int slash = Math.max(text.lastIndexOf('/'), text.lastIndexOf('\\'));
        String start = text.substring(slash + 1).toLowerCase(Locale.ROOT);
        List<String> found = new ArrayList<>();
        Path folder;
        try {
            folder = Path.of(text.substring(0, slash + 1));
        } catch (InvalidPathException e) {
            return found;
        }
        if (!Files.isDirectory(folder)) {
            return found;
        }
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            for (Path entry : entries) {
                String name = entry.getFileName().toString();
                if (name.toLowerCase(Locale.ROOT).startsWith(start) && (!name.startsWith(".") || !start.isEmpty())) {
                    found.add(Files.isDirectory(entry) ? name + "/" : name);
                }
            }
        }
        Collections.sort(found);
        return found.subList(0, Math.min(MOST, found.size()));
    }

    private void take() {
        if (list.getSelectedValue() != null) {
            complete();
            list.clearSelection();
        }
        String text = field.getText().strip();
        String problem = "";
        try {
            Path path = Path.of(text);
            if (text.isEmpty() || !path.isAbsolute()) {
                problem = "Write the whole path, from the root on.";
            } else if (!question.toWrite() && !Files.exists(path)) {
                problem = "There is no such file or folder.";
            } else {
                away.run();
                question.answer().accept(path);
            }
        } catch (InvalidPathException e) {
            problem = "No file can have this name.";
        }
        wrong.setText(problem);
        wrong.setVisible(!problem.isEmpty());
    }
}
