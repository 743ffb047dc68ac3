package org.saddlebook.desk.internal;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFolder;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.ReportWriter;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.desk.api.DeskAction;
import org.saddlebook.desk.api.DeskState;

/** Files in and out. Event thread only; the work is done in the background. */
final class DeskFiles {
    private final Desk desk;

    DeskFiles(Desk desk) {
        this.desk = desk;
    }

    /** Opens a table or campaign. */
    void open(Path file) {
        for (OpenCampaign campaign : desk.campaigns()) {
            if (campaign.state().folder().equals(Optional.of(folderOf(file)))) {
                desk.show(campaign);
                return;
            }
        }
        desk.background()
                .run(
                        "reading " + file.getFileName(),
                        true,
                        progress -> Reread.open(
                                desk.services().need(Intake.class, "base"),
                                file,
                                ReadingRule.AUTOMATIC,
                                desk.user(),
                                progress),
                        state -> opened(file, state),
                        fault -> desk.workFailed("reading " + file, fault));
    }

    private void opened(Path file, DeskState state) {
        desk.settings().opened(file.toString());
        desk.settings().demoSeen(true);
        boolean stored = Files.isDirectory(file) || file.toString().endsWith(".json");
        desk.open(stored ? state.withFolder(folderOf(file)) : state, !stored);
        desk.dropEmpty();
        saveSettings();
    }

    private static Path folderOf(Path file) {
        Path whole = file.toAbsolutePath().normalize();
        Path parent = whole.getParent();
        return Files.isDirectory(whole) || parent == null || !whole.toString().endsWith(".json") ? whole : parent;
    }

    /** Opens the invented campaign that comes with the product. */
    void openDemo() {
        Optional<String> home = desk.services().setting("saddlebook.home");
        Path demo = Path.of(home.orElse("")).resolve("demo-data").resolve("adduct-campaign");
        if (home.isEmpty() || !Files.isDirectory(demo)) {
            desk.openEmpty();
            return;
        }
        desk.background()
                .run(
                        "opening the demo",
                        false,
                        progress -> Reread.open(
                                desk.services().need(Intake.class, "base"),
                                demo,
                                ReadingRule.AUTOMATIC,
                                desk.user(),
                                progress),
                        state -> {
                            desk.open(state, false).markDemo();
                            desk.dropEmpty();
                            desk.view().campaignsChanged();
                        },
                        fault -> {
                            desk.openEmpty();
                            desk.workFailed("opening the demo", fault);
                        });
    }

    /** Opens a table that was copied elsewhere. */
    void paste(String text) {
        desk.background()
                .run(
                        "reading the pasted table",
                        true,
                        progress -> pasted(text, progress),
                        state -> {
                            desk.settings().demoSeen(true);
                            desk.open(state, true);
                            desk.dropEmpty();
                            saveSettings();
                        },
                        fault -> desk.workFailed("reading the pasted table", fault));
    }

    private DeskState pasted(String text, org.saddlebook.api.service.Progress progress)
            throws InputException, Cancelled, IOException {
        Path folder = Files.createTempDirectory("saddlebook-paste-");
        Path file = folder.resolve("pasted.csv");
        try {
            Files.writeString(file, text, StandardCharsets.UTF_8);
            return Reread.open(
                    desk.services().need(Intake.class, "base"), file, ReadingRule.AUTOMATIC, desk.user(), progress);
        } finally {
            Files.deleteIfExists(file);
            Files.deleteIfExists(folder);
        }
    }

    /** Saves where the campaign is kept, or asks where. */
    void save() {
        desk.current().ifPresent(campaign -> {
            if (campaign.state().folder().isPresent() && !campaign.demo()) {
                save(campaign, campaign.state().folder().get());
            } else {
                saveElsewhere();
            }
        });
    }

    /** Asks for a folder and saves there. */
    void saveElsewhere() {
        desk.current().ifPresent(campaign -> {
            String name = campaign.state().campaign().title().replaceAll("[\\\\/:*?\"<>|\\p{Cntrl}]", "_");
            Path start =
                    Path.of(System.getProperty("user.home", ".")).resolve(name.isBlank() ? "campaign" : name.strip());
            desk.view()
                    .askPath(new PathQuestion(
                            "Into which folder shall the campaign be saved?",
                            start,
                            true,
                            folder -> save(campaign, folder)));
        });
    }

    void save(OpenCampaign campaign, Path folder) {
        DeskState state = campaign.state();
        long edition = campaign.edition();
        desk.background()
                .run(
                        "saving " + state.campaign().title(),
                        true,
                        progress -> {
                            desk.services()
                                    .need(CampaignFolder.class, "base")
                                    .save(new Intake.Opened(state.campaign(), state.parts(), List.of()), folder);
                            return folder.toAbsolutePath().normalize();
                        },
                        saved -> {
                            desk.settings().opened(saved.toString());
                            if (campaign.edition() == edition) {
                                campaign.saved(campaign.state().withFolder(saved));
                                desk.keeper().drop(campaign.key());
                            } else {
                                campaign.learn(campaign.state().withFolder(saved));
                            }
                            desk.note(campaign, "saved in " + saved);
                            desk.view().campaignsChanged();
                            saveSettings();
                        },
                        fault -> desk.workFailed("saving", fault));
    }

    /** Closes the campaign in view; asks first when something would be lost. */
    void close() {
        desk.current().ifPresent(campaign -> {
            if (!campaign.unsaved()) {
                desk.close(campaign);
                return;
            }
            desk.view()
                    .notice(
                            "\u201c" + campaign.state().campaign().title() + "\u201d is not saved.",
                            "What was decided since the last save is lost when it is closed.",
                            List.of(
                                    DeskAction.of("Save", this::save),
                                    DeskAction.of("Close and lose it", () -> desk.close(campaign))));
        });
    }

    /** Asks for a folder and writes the report there. */
    void report() {
        desk.current().filter(c -> c.state().effective().isPresent()).ifPresent(campaign -> {
            DeskState state = campaign.state();
            Path start = Path.of(System.getProperty("user.home", ".")).resolve("report");
            desk.view()
                    .askPath(new PathQuestion(
                            "Into which folder shall the report be written?",
                            start,
                            true,
                            folder -> report(campaign, state, folder)));
        });
    }

    private void report(OpenCampaign campaign, DeskState state, Path folder) {
        desk.background()
                .run(
                        "writing the report",
                        true,
                        progress -> {
                            List<Intake.Part> parts = desk.services()
                                    .need(ReportWriter.class, "report")
                                    .report(
                                            state.effective().orElseThrow(),
                                            state.findings().orElseThrow());
                            for (Intake.Part part : parts) {
                                DeskSettings.write(folder.resolve(part.name()), part.bytes());
                            }
                            return folder.resolve(parts.get(0).name());
                        },
                        file -> desk.note(campaign, "report written: " + file),
                        fault -> desk.workFailed("writing the report", fault));
    }

    /** Writes the settings in the background; when that fails the desk goes on without. */
    void saveSettings() {
        desk.background()
                .run(
                        "remembering settings",
                        false,
                        progress -> {
                            desk.settings().save();
                            return true;
                        },
                        done -> {},
                        fault -> desk.workFailed("remembering settings", fault));
    }
}
