package org.saddlebook.desk.internal;

import com.formdev.flatlaf.FlatDarkLaf;
import com.formdev.flatlaf.FlatLaf;
import com.formdev.flatlaf.FlatLightLaf;
import java.awt.Color;
import java.awt.Font;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import javax.swing.UIManager;
import org.saddlebook.desk.api.Ink;

/** Sets up the look-and-feel library with the desk's own colours. */
final class Look {
    private static final int LETTERS = 13;

    private Look() {}

    /** Uses these colours from now on. */
    static void use(Ink ink) {
        // Its native part only draws window borders, and unpacks itself into the temporary folder at each start.
        System.setProperty("flatlaf.useNativeLibrary", "false");
        Map<String, String> colours = new LinkedHashMap<>();
        colours.put("@background", hex(ink.paper()));
        colours.put("@foreground", hex(ink.ink()));
        colours.put("@accentColor", hex(ink.plum()));
        colours.put("@componentBackground", hex(ink.sheet()));
        colours.put("@disabledForeground", hex(ink.faint()));
        colours.put("Component.borderColor", hex(ink.line()));
        colours.put("Component.focusColor", hex(ink.petrol()));
        colours.put("Component.focusedBorderColor", hex(ink.petrol()));
        colours.put("TextField.placeholderForeground", hex(ink.faint()));
        colours.put("Component.focusWidth", "1");
        colours.put("Component.arc", "0");
        colours.put("Button.arc", "0");
        colours.put("TextComponent.arc", "0");
        colours.put("Table.gridColor", hex(ink.line()));
        colours.put("Table.selectionBackground", hex(ink.lichen()));
        colours.put("Table.selectionForeground", hex(ink.ink()));
        colours.put("List.selectionBackground", hex(ink.lichen()));
        colours.put("List.selectionForeground", hex(ink.ink()));
        colours.put("List.selectionInactiveBackground", hex(ink.lichen()));
        colours.put("List.selectionInactiveForeground", hex(ink.ink()));
        colours.put("TextComponent.selectionBackground", hex(ink.lichen()));
        colours.put("TextField.selectionBackground", hex(ink.lichen()));
        colours.put("TextField.selectionForeground", hex(ink.ink()));
        colours.put("ToolTip.background", hex(ink.rail()));
        colours.put("ToolTip.foreground", hex(ink.ink()));
        FlatLaf.setGlobalExtraDefaults(colours);
        UIManager.put("defaultFont", new Font(Font.SANS_SERIF, Font.PLAIN, LETTERS));
        if (ink.dark()) {
            FlatDarkLaf.setup();
        } else {
            FlatLightLaf.setup();
        }
    }

    private static String hex(Color colour) {
        return String.format(Locale.ROOT, "#%06x", colour.getRGB() & 0xFFFFFF);
    }

    /** The colours a user chose; what the system says is asked for once at the start. */
    static Ink ink(DeskSettings.Theme theme) {
        return switch (theme) {
            case LIGHT -> Ink.of(false);
            case DARK -> Ink.of(true);
            case SYSTEM -> Ink.of(systemIsDark());
        };
    }

    private static boolean systemIsDark() {
        String system = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
        if (system.startsWith("mac")) {
            return says("dark", "defaults", "read", "-g", "AppleInterfaceStyle");
        }
        if (system.startsWith("windows")) {
            return says(
                    "0x0",
                    "reg",
                    "query",
                    "HKCU\\Software\\Microsoft\\Windows\\CurrentVersion\\Themes\\Personalize",
                    "/v",
                    "AppsUseLightTheme");
        }
        String theme = System.getenv("GTK_THEME");
        if (theme != null && !theme.isEmpty()) {
            return theme.toLowerCase(Locale.ROOT).contains("dark");
        }
        Object desktop = java.awt.Toolkit.getDefaultToolkit().getDesktopProperty("gnome.Net/ThemeName");
        return desktop instanceof String name && name.toLowerCase(Locale.ROOT).contains("dark");
    }

    /** Whether a tool of the system prints a word within a second. */
    private static boolean says(String word, String... command) {
        try {
            Process process =
                    new ProcessBuilder(command).redirectErrorStream(true).start();
            process.getOutputStream().close();
            if (!process.waitFor(1, TimeUnit.SECONDS)) {
                process.destroy();
                return false;
            }
            String text = new String(process.getInputStream().readAllBytes(), java.nio.charset.StandardCharsets.UTF_8);
            return text.toLowerCase(Locale.ROOT).contains(word);
        } catch (java.io.IOException e) {
            return false;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }
}
