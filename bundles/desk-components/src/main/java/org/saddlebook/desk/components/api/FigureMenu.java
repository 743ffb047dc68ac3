package org.saddlebook.desk.components.api;

import java.awt.Image;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javax.imageio.ImageIO;
import javax.swing.JMenuItem;
import javax.swing.JPopupMenu;
import org.saddlebook.charts.api.FigureDrawing;
import org.saddlebook.charts.api.FigureFile;
import org.saddlebook.desk.api.DeskContext;

/** Zoom, copy and save of a figure. */
final class FigureMenu {
    private static final double CLIPBOARD_SCALE = 2;

    private final FigureView view;
    private final List<FigureFile> files;
    private final DeskContext context;
    private final Saving saving;

    FigureMenu(FigureView view, List<FigureFile> files, DeskContext context, Saving saving) {
        this.view = view;
        this.files = List.copyOf(files);
        this.context = context;
        this.saving = saving;
    }

    JPopupMenu menu() {
        JPopupMenu menu = new JPopupMenu("Figure");
        menu.add(item("Nearer", true, () -> zoom(0.64)));
        menu.add(item("Farther", true, () -> zoom(1 / 0.64)));
        menu.add(item("Whole figure", view.zoom().isPresent(), () -> view.zoomTo(Optional.empty())));
        menu.addSeparator();
        menu.add(item("Copy picture", true, this::copy));
        for (FigureFile file : files) {
            menu.add(item("Save as " + file.extension().toUpperCase(Locale.ROOT) + " …", true, () -> save(file)));
        }
        return menu;
    }

    private void zoom(double factor) {
        view.drawing()
                .ifPresent(now ->
                        view.zoomBy(factor, now.area().getCenterX(), now.area().getCenterY()));
    }

    private static JMenuItem item(String text, boolean possible, Runnable work) {
        JMenuItem item = new JMenuItem(text);
        item.setEnabled(possible);
        item.addActionListener(event -> work.run());
        return item;
    }

    /** Copies the part shown as a picture, its cautions written out. */
    void copy() {
        Optional<FigureDrawing> paper = view.paper();
        if (paper.isEmpty()) {
            return;
        }
        String title = paper.get().figure().title();
        context.run(
                "copying the figure",
                progress -> ImageIO.read(new ByteArrayInputStream(paper.get().png(CLIPBOARD_SCALE))),
                image -> {
                    saving.clipboard().get().setContents(new Picture(image), null);
                    context.note("Copied the figure " + title + ".");
                });
    }

    void save(FigureFile file) {
        Optional<FigureDrawing> paper = view.paper();
        if (paper.isPresent()) {
            String name = Saving.fileName(paper.get().figure().title(), file.extension());
            saving.save(view, context, name, () -> file.bytes(paper.get()));
        }
    }

    /** A picture on the clipboard. */
    private record Picture(Image image) implements Transferable {
        @Override
        public DataFlavor[] getTransferDataFlavors() {
            return new DataFlavor[] {DataFlavor.imageFlavor};
        }

        @Override
        public boolean isDataFlavorSupported(DataFlavor flavor) {
            return DataFlavor.imageFlavor.equals(flavor);
        }

        @Override
        public Object getTransferData(DataFlavor flavor) throws UnsupportedFlavorException, IOException {
            if (!isDataFlavorSupported(flavor)) {
                throw new UnsupportedFlavorException(flavor);
            }
            return image;
        }
    }
}
