package org.saddlebook.desk.internal;

import java.awt.Toolkit;
import java.awt.datatransfer.Clipboard;
import java.awt.datatransfer.DataFlavor;
import java.awt.datatransfer.Transferable;
import java.awt.datatransfer.UnsupportedFlavorException;
import java.io.File;
import java.io.IOException;
import java.util.List;
import javax.swing.TransferHandler;

/** Files dropped onto the desk, tables pasted into it. */
final class DropAndPaste extends TransferHandler {
    private static final long serialVersionUID = 1L;

    private final transient Desk desk;

    DropAndPaste(Desk desk) {
        this.desk = desk;
    }

    @Override
    public boolean canImport(TransferSupport support) {
        return support.isDataFlavorSupported(DataFlavor.javaFileListFlavor)
                || support.isDataFlavorSupported(DataFlavor.stringFlavor);
    }

    @Override
    public boolean importData(TransferSupport support) {
        return canImport(support) && take(support.getTransferable());
    }

    /** Takes files, else text; false when it is neither. */
    boolean take(Transferable content) {
        try {
            if (content.isDataFlavorSupported(DataFlavor.javaFileListFlavor)) {
                List<?> files = (List<?>) content.getTransferData(DataFlavor.javaFileListFlavor);
                for (Object file : files) {
                    desk.files().open(((File) file).toPath());
                }
                return !files.isEmpty();
            }
            if (content.isDataFlavorSupported(DataFlavor.stringFlavor)) {
                String text = (String) content.getTransferData(DataFlavor.stringFlavor);
                if (text.indexOf('\n') > 0) {
                    desk.files().paste(text);
                    return true;
                }
                desk.view()
                        .notice(
                                "That is no table",
                                "Copy a table with a header line and at least one row, for example out of a spreadsheet.",
                                List.of());
            }
        } catch (IOException | UnsupportedFlavorException e) {
            desk.workFailed("taking what was dropped", e);
        }
        return false;
    }

    /** Pastes what lies in the clipboard. */
    void paste() {
        Clipboard clipboard = Toolkit.getDefaultToolkit().getSystemClipboard();
        Transferable content = clipboard.getContents(this);
        if (content != null) {
            take(content);
        }
    }
}
