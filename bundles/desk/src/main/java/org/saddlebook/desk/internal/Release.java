package org.saddlebook.desk.internal;

import java.awt.KeyboardFocusManager;
import java.awt.Toolkit;
import java.awt.Window;
import java.awt.event.AWTEventListener;
import java.awt.event.AWTEventListenerProxy;
import java.beans.PropertyChangeListener;
import java.beans.PropertyChangeListenerProxy;
import javax.swing.UIManager;

/**
 * Takes back what a panel that is gone has left in places that belong to everybody, as far as Java lets one look: listeners
 * of the toolkit, of the focus and of the look, and windows. Each would hold the panel's bundle for ever.
 */
final class Release {
    private Release() {}

    /** Everything whose class comes from this loader; the desk's own loader and that of the platform are never meant. */
    static void leftBy(ClassLoader loader) {
        if (loader == null || loader == Release.class.getClassLoader()) {
            return;
        }
        Toolkit toolkit = Toolkit.getDefaultToolkit();
        for (AWTEventListener listener : toolkit.getAWTEventListeners()) {
            AWTEventListener inner = listener instanceof AWTEventListenerProxy proxy ? proxy.getListener() : listener;
            if (from(loader, inner)) {
                toolkit.removeAWTEventListener(inner);
            }
        }
        KeyboardFocusManager focus = KeyboardFocusManager.getCurrentKeyboardFocusManager();
        for (PropertyChangeListener listener : focus.getPropertyChangeListeners()) {
            if (listener instanceof PropertyChangeListenerProxy proxy && from(loader, proxy.getListener())) {
                focus.removePropertyChangeListener(proxy.getPropertyName(), proxy.getListener());
            } else if (from(loader, listener)) {
                focus.removePropertyChangeListener(listener);
            }
        }
        for (PropertyChangeListener listener : UIManager.getPropertyChangeListeners()) {
            if (from(loader, listener)) {
                UIManager.removePropertyChangeListener(listener);
            }
        }
        for (Window window : Window.getWindows()) {
            if (from(loader, window)) {
                window.dispose();
            }
        }
    }

    private static boolean from(ClassLoader loader, Object object) {
        return object.getClass().getClassLoader() == loader;
    }
}
