package org.saddlebook.desk.internal;

import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javax.swing.KeyStroke;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.desk.api.Change;
import org.saddlebook.desk.api.DeskAction;

/** Everything the shell can do by name; the actions of panels join them in the search. */
final class Commands {
    private static final int MENU = TitleLine.menuKey();

    /** Comes to the search. */
    static final KeyStroke SEARCH = KeyStroke.getKeyStroke(TitleLine.SEARCH_KEY, MENU);

    /** Comes to the choice of campaigns. */
    static final KeyStroke CAMPAIGNS = KeyStroke.getKeyStroke(KeyEvent.VK_E, MENU);

    private Commands() {}

    /** Everything that can be done now, the panels' own first. */
    static List<DeskAction> all(Desk desk) {
        List<DeskAction> all = new ArrayList<>();
        desk.shelf().open().ifPresent(host -> all.addAll(host.actions()));
        for (PanelHost host : desk.shelf().hosts()) {
            if (!desk.shelf().open().equals(Optional.of(host))) {
                all.addAll(host.actions());
            }
        }
        for (PanelHost host : desk.shelf().hosts()) {
            host.lastStep().map(step -> step.withWords("register")).ifPresent(all::add);
        }
        all.addAll(keyed(desk));
        all.add(DeskAction.of("Save in another folder", () -> desk.files().saveElsewhere())
                .withWords("save as", "copy", "export"));
        all.add(report(desk));
        all.add(DeskAction.of("Rename the campaign", () -> rename(desk)).withWords("title"));
        all.add(DeskAction.of("Write a note into the account", () -> note(desk)).withWords("comment"));
        all.add(DeskAction.of("Move the hairline to a temperature", () -> hairline(desk))
                .withWords("read k at", "predict"));
        all.add(DeskAction.of("Show the demo campaign", () -> desk.files().openDemo())
                .withWords("example", "help", "invented"));
        for (DeskSettings.Theme theme : DeskSettings.Theme.values()) {
            all.add(DeskAction.of("Colours: " + word(theme), () -> {
                        desk.settings().theme(theme);
                        desk.files().saveSettings();
                        desk.ink(Look.ink(theme));
                    })
                    .withWords("theme", "dark", "light", "look"));
        }
        all.addAll(campaigns(desk));
        return all;
    }

    /** The actions with a key that works everywhere. */
    static List<DeskAction> keyed(Desk desk) {
        List<DeskAction> keyed = new ArrayList<>();
        keyed.add(TitleLine.keyed("Open a table or campaign", KeyEvent.VK_O, MENU, () -> open(desk))
                .withWords("file", "import", "read", "csv"));
        keyed.add(TitleLine.keyed(
                "Save the campaign", KeyEvent.VK_S, MENU, () -> desk.files().save()));
        keyed.add(TitleLine.keyed(
                "Close the campaign", KeyEvent.VK_W, MENU, () -> desk.files().close()));
        Optional<String> undo = desk.current().flatMap(OpenCampaign::undoable);
        Optional<String> redo = desk.current().flatMap(OpenCampaign::redoable);
        keyed.add(step("Undo", undo, KeyEvent.VK_Z, MENU, desk::undo));
        keyed.add(step("Redo", redo, KeyEvent.VK_Z, MENU | InputEvent.SHIFT_DOWN_MASK, desk::redo));
        keyed.add(
                TitleLine.keyed("Next campaign", KeyEvent.VK_PAGE_DOWN, InputEvent.ALT_DOWN_MASK, () -> turn(desk, 1)));
        keyed.add(TitleLine.keyed(
                "Campaign before", KeyEvent.VK_PAGE_UP, InputEvent.ALT_DOWN_MASK, () -> turn(desk, -1)));
        keyed.add(TitleLine.keyed(
                        "Move the hairline warmer", KeyEvent.VK_RIGHT, InputEvent.ALT_DOWN_MASK, () -> desk.nudge(0.5))
                .withWords("temperature"));
        keyed.add(TitleLine.keyed(
                        "Move the hairline colder", KeyEvent.VK_LEFT, InputEvent.ALT_DOWN_MASK, () -> desk.nudge(-0.5))
                .withWords("temperature"));
        int number = 1;
        for (PanelHost host : desk.shelf().hosts()) {
            DeskAction unfold = DeskAction.of(
                            "Unfold " + host.title(),
                            () -> desk.unfold(host.contribution().id()))
                    .withWords("show", "stratum", host.contribution().id());
            if (number <= 9) {
                unfold = unfold.withKey(KeyStroke.getKeyStroke(KeyEvent.VK_0 + number, MENU));
            }
            keyed.add(unfold);
            number++;
        }
        keyed.add(TitleLine.keyed(
                        "Leave the desk", KeyEvent.VK_Q, MENU, () -> desk.view().leave())
                .withWords("quit", "exit", "end"));
        return keyed;
    }

    private static DeskAction step(String word, Optional<String> what, int key, int modifiers, Runnable work) {
        DeskAction action = TitleLine.keyed(what.map(w -> word + ": " + w).orElse(word), key, modifiers, work);
        return what.isPresent()
                ? action
                : action.notNow("There is nothing to " + word.toLowerCase(java.util.Locale.ROOT) + ".");
    }

    /** The open campaigns and the recent ones. */
    static List<DeskAction> campaigns(Desk desk) {
        List<DeskAction> list = new ArrayList<>();
        for (OpenCampaign campaign : desk.campaigns()) {
            boolean shown = desk.current().isPresent() && desk.current().get() == campaign;
            if (!shown) {
                list.add(DeskAction.of(
                                "Go to " + campaign.state().campaign().title()
                                        + (campaign.unsaved() ? " · not saved" : ""),
                                () -> desk.show(campaign))
                        .withWords("campaign", "switch"));
            }
        }
        for (String recent : desk.settings().recent()) {
            list.add(DeskAction.of("Open again " + shortPath(recent), () -> openRecent(desk, recent))
                    .withWords("recent", recent));
        }
        list.add(DeskAction.of("Open a table or campaign …", () -> open(desk)).withWords("file"));
        return list;
    }

    private static String shortPath(String path) {
        return path.length() <= 52 ? path : "…" + path.substring(path.length() - 51);
    }

    private static void openRecent(Desk desk, String path) {
        // Whether it is still there is looked up in the background, with everything else about it.
        desk.files().open(Path.of(path));
    }

    private static String word(DeskSettings.Theme theme) {
        return switch (theme) {
            case LIGHT -> "light";
            case DARK -> "dark";
            case SYSTEM -> "as the system";
        };
    }

    private static DeskAction report(Desk desk) {
        DeskAction action =
                DeskAction.of("Write the report", () -> desk.files().report()).withWords("html", "export", "print");
        boolean found = desk.current()
                .map(c -> c.state().effective().isPresent() && c.state().current())
                .orElse(false);
        if (desk.services().find(ReportWriter.class).isEmpty()) {
            return action.notNow("The feature report is not installed.");
        }
        return found ? action : action.notNow("There are no findings of this campaign yet.");
    }

    /** Asks for a file. */
    static void open(Desk desk) {
        Path start = Path.of(System.getProperty("user.home", "/"));
        List<String> recent = desk.settings().recent();
        if (!recent.isEmpty()) {
            Path parent = Path.of(recent.get(0)).toAbsolutePath().getParent();
            start = parent == null || !Files.isDirectory(parent) ? start : parent;
        }
        desk.view()
                .askPath(new PathQuestion(
                        "Which table or campaign? You can also drop a file here, or paste a copied table.",
                        start,
                        false,
                        file -> desk.files().open(file)));
    }

    private static void turn(Desk desk, int by) {
        List<OpenCampaign> all = desk.campaigns();
        desk.current().ifPresent(campaign -> {
            int next = Math.floorMod(all.indexOf(campaign) + by, all.size());
            if (all.get(next) != campaign) {
                desk.show(all.get(next));
            }
        });
    }

    private static void rename(Desk desk) {
        desk.current().ifPresent(campaign -> {
            Campaign c = campaign.state().campaign();
            desk.ask(
                    "What shall the campaign be called?",
                    c.title(),
                    title -> desk.change(
                            campaign, new Change("title", c.title(), title, "", changed -> changed.withTitle(title))));
        });
    }

    private static void note(Desk desk) {
        desk.current().ifPresent(campaign -> {
            Campaign c = campaign.state().campaign();
            desk.ask(
                    "What is to be noted?",
                    "",
                    text -> desk.change(
                            campaign,
                            new Change(
                                    "note",
                                    "",
                                    text,
                                    "",
                                    changed ->
                                            changed.withNotes(c.notes().isEmpty() ? text : c.notes() + "\n" + text))));
        });
    }

    private static void hairline(Desk desk) {
        desk.ask("To which temperature, in °C?", "", text -> {
            try {
                String number = text.replace("°C", "")
                        .replace(',', '.')
                        .replace('\u2212', '-')
                        .strip();
                desk.rail().move(Double.parseDouble(number) + Constants.ZERO_CELSIUS);
            } catch (NumberFormatException e) {
                desk.view()
                        .notice(
                                "Not a temperature: " + text,
                                "Write a number in degrees Celsius, such as 25.",
                                List.of());
            }
        });
    }
}
