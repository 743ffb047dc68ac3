package org.saddlebook.intake.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.CampaignFormat;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.json.api.Sha256;

/** Opens a campaign folder, a campaign.json or a table. */
final class InputOpener {
    /** Name of the document in a campaign folder. */
    static final String DOCUMENT = "campaign.json";

    private final CampaignFormat format;
    private final TableImport tables;

    InputOpener(CampaignFormat format, TableImport tables) {
        this.format = format;
        this.tables = tables;
    }

    Intake.Opened open(Path input, ReadingRule rule, String who, Progress progress) throws InputException, Cancelled {
        String name = input.toString();
        if (name.isEmpty()) {
            throw FileGate.problem(
                    "missing-file", "INPUT", "an empty name", "a file or folder", "Name a table or a campaign.");
        }
        try {
            if (Files.isDirectory(input)) {
                return folder(input.toRealPath(), input);
            }
            Path fileName = input.getFileName();
            if (fileName != null && fileName.toString().toLowerCase(Locale.ROOT).endsWith(".json")) {
                byte[] json = FileGate.read(input, name);
                // A link to a campaign stands for the campaign it leads to, with the files beside that.
                Path folder = input.toRealPath().getParent();
                return campaign(json, name, folder, folder);
            }
        } catch (IOException e) {
            throw FileGate.unreadable(name, e);
        }
        return tables.open(input, rule, who, progress);
    }

    private Intake.Opened folder(Path folder, Path shown) throws InputException, IOException {
        Path document = folder.resolve(DOCUMENT);
        String name = shown.resolve(DOCUMENT).toString();
        if (!Files.exists(document, LinkOption.NOFOLLOW_LINKS)) {
            throw FileGate.problem(
                    "no-campaign",
                    shown.toString(),
                    "a folder without " + DOCUMENT,
                    "a folder with " + DOCUMENT + ", or a file",
                    "Name the table in it, or the folder of a campaign.");
        }
        if (Files.exists(document) && !document.toRealPath().startsWith(folder)) {
            throw FileGate.problem(
                    "path-outside",
                    name,
                    "a link out of the campaign's folder",
                    "a file inside the folder",
                    "Copy the file into the folder.");
        }
        return campaign(FileGate.read(document, name), name, folder, shown);
    }

    private Intake.Opened campaign(byte[] json, String name, Path folder, Path shown) throws InputException {
        Campaign campaign = format.readCampaign(name, json);
        List<Intake.Part> parts = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        for (SourcePart source : campaign.sources()) {
            try {
                parts.add(part(source, folder, shown));
            } catch (InputException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        return new Intake.Opened(campaign, parts, List.of());
    }

    private static Intake.Part part(SourcePart source, Path folder, Path shown) throws InputException {
        Path path = folder.resolve(source.path());
        String name = shown.resolve(source.path()).toString();
        try {
            if (!path.toRealPath().startsWith(folder)) {
                throw FileGate.problem(
                        "path-outside",
                        name,
                        "a link out of the campaign's folder",
                        "a file inside the folder",
                        "Copy the file into the folder.");
            }
        } catch (IOException e) {
            throw FileGate.problem(
                    "missing-part",
                    name,
                    Files.exists(path, LinkOption.NOFOLLOW_LINKS)
                            ? "a file that cannot be reached: " + FileGate.reason(e)
                            : "no such file",
                    "the file that the campaign was read from, SHA-256 " + source.sha256(),
                    "Put the file back, or import the table again.");
        }
        byte[] bytes = FileGate.read(path, name);
        String found = Sha256.of(bytes);
        if (!found.equals(source.sha256())) {
            throw FileGate.problem(
                    "changed-part",
                    name,
                    "changed content, SHA-256 " + found,
                    "the content that the campaign was read from, SHA-256 " + source.sha256(),
                    "Put the unchanged file back, or import the changed table as a new campaign.");
        }
        return new Intake.Part(source.path(), bytes);
    }
}
