package org.saddlebook.desk.components.api;

import java.util.function.Supplier;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JPopupMenu;
import org.saddlebook.desk.api.Ink;

/** Three dots that open what else can be done. */
final class MoreButton extends JButton {
    private static final long serialVersionUID = 1L;

    MoreButton(String name, Ink ink, Supplier<JPopupMenu> menu) {
        super("\u22ef");
        setFont(ink.font(1.2, true));
        setForeground(ink.ink());
        setContentAreaFilled(false);
        setBorder(BorderFactory.createEmptyBorder(0, 6, 0, 6));
        setToolTipText(name);
        getAccessibleContext().setAccessibleName(name);
        addActionListener(event -> menu.get().show(this, 0, getHeight()));
    }
}
