package org.saddlebook.desk.components.api;

import java.awt.Component;
import java.awt.Toolkit;
import java.awt.datatransfer.Clipboard;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import javax.swing.JFileChooser;
import org.saddlebook.desk.api.DeskContext;

/**
 * Where copies and files go. One object for all components, so that tests and other shells can stand in for the clipboard
 * and the question for a file.
 *
 * @param clipboard gives the clipboard when something is copied
 * @param chooser asks for a file, given the component in front and a proposed name; empty when the user turns away
 */
public record Saving(Supplier<Clipboard> clipboard, Asking chooser) {
    /** Asks for a file. */
    @FunctionalInterface
    public interface Asking {
        /** The file to write; empty when the user turns away. */
        Optional<Path> ask(Component front, String name);
    }

    /** Bytes that may fail to be made. */
    @FunctionalInterface
    public interface Bytes {
        /** Makes them; off the event thread. */
        byte[] make() throws IOException;
    }

    /** The system's clipboard and a dialogue for files. */
    public static Saving system() {
        return new Saving(() -> Toolkit.getDefaultToolkit().getSystemClipboard(), Saving::dialogue);
    }

    private static Optional<Path> dialogue(Component front, String name) {
        JFileChooser chooser = new JFileChooser();
        chooser.setDialogTitle("Save " + name);
        chooser.setSelectedFile(new File(name));
        chooser.getAccessibleContext().setAccessibleName("Save " + name);
        return chooser.showSaveDialog(front) == JFileChooser.APPROVE_OPTION
                ? Optional.of(chooser.getSelectedFile().toPath())
                : Optional.empty();
    }

    /**
     * Asks for a file and writes it in the background: complete or not at all.
     *
     * @param name proposed file name
     */
    void save(Component front, DeskContext context, String name, Bytes bytes) {
        Optional<Path> file = chooser.ask(front, name);
        if (file.isEmpty()) {
            return;
        }
        Function<Path, String> said = path -> "Saved " + path.getFileName() + ".";
        context.run(
                "saving " + file.get().getFileName(),
                progress -> {
                    write(file.get(), bytes.make());
                    return file.get();
                },
                path -> context.note(said.apply(path)));
    }

    private static void write(Path file, byte[] bytes) throws IOException {
        Path whole = file.toAbsolutePath();
        Path part = Files.createTempFile(whole.getParent(), ".", ".part");
        try {
            Files.write(part, bytes);
            Files.move(part, whole, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(part);
        }
    }

    /** A file name from a title: letters, digits and hyphens. */
    static String fileName(String title, String extension) {
        StringBuilder name = new StringBuilder();
        for (int i = 0; i < title.length() && name.length() < 60; i++) {
            char c = Character.toLowerCase(title.charAt(i));
            boolean plain = (c >= 'a' && c <= 'z') || (c >= '0' && c <= '9');
            if (plain) {
                name.append(c);
            } else if (name.length() > 0 && name.charAt(name.length() - 1) != '-') {
                name.append('-');
            }
        }
        while (name.length() > 0 && name.charAt(name.length() - 1) == '-') {
            name.setLength(name.length() - 1);
        }
        return (name.length() == 0 ? "figure" : name.toString()) + "." + extension;
    }
}
