package org.saddlebook.desk.internal;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.TreeMap;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;
import org.saddlebook.api.service.Progress;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.desk.api.DeskState;
import org.saddlebook.json.api.Sha256;

/** Reading a table, also one with mistakes, and reading it again by another rule. Off the event thread. */
final class Reread {
    private Reread() {}

    /**
     * A table or campaign. A table that cannot be read becomes a campaign that keeps the file and says what is wrong, so
     * that it can be put right in place.
     *
     * @throws InputException when even the file cannot be kept, or a stored campaign is damaged
     */
    static DeskState open(Intake intake, Path file, ReadingRule rule, String who, Progress progress)
            throws InputException, Cancelled {
        try {
            Intake.Opened opened = intake.open(file, rule, who, progress);
            return opened(opened, rule);
        } catch (InputException e) {
            return kept(file, rule, e);
        }
    }

    static DeskState opened(Intake.Opened opened, ReadingRule rule) {
        return DeskState.of(opened.campaign()).withSources(opened.parts(), opened.understood(), rule);
    }

    private static DeskState kept(Path file, ReadingRule rule, InputException wrong) throws InputException {
        Path name = file.getFileName();
        if (name == null || !Files.isRegularFile(file) || name.toString().endsWith(".json")) {
            throw wrong;
        }
        byte[] bytes;
        try {
            if (Files.size(file) > 64 << 20) {
                throw wrong;
            }
            bytes = Files.readAllBytes(file);
        } catch (IOException e) {
            throw wrong;
        }
        String path = "sources/" + safe(name.toString());
        SourcePart source = new SourcePart(path, Sha256.of(bytes), bytes.length, "");
        int dot = name.toString().lastIndexOf('.');
        String title = dot > 0 ? name.toString().substring(0, dot) : name.toString();
        return DeskState.of(Campaign.titled(title).withSources(List.of(source)))
                .withSources(List.of(new Intake.Part(path, bytes)), List.of(), rule)
                .withProblems(wrong.problems());
    }

    private static String safe(String name) {
        StringBuilder safe = new StringBuilder();
        for (int i = 0; i < name.length(); i++) {
            char c = name.charAt(i);
            boolean forbidden = c < ' ' || c == 0x7f || "\\:*?\"<>|".indexOf(c) >= 0 || Character.isSurrogate(c);
            safe.append(forbidden ? '_' : c);
        }
        return safe.toString();
    }

    /** The same campaign with its table read by another rule; what people decided stays where it still applies. */
    static DeskState again(Intake intake, DeskState before, ReadingRule rule, String who, Progress progress)
            throws InputException, Cancelled, IOException {
        if (before.parts().isEmpty()) {
            return before;
        }
        Intake.Part part = before.parts().get(0);
        Path folder = Files.createTempDirectory("saddlebook-reading-");
        Path file = folder.resolve(Path.of(part.name()).getFileName());
        try {
            Files.write(file, part.bytes());
            Intake.Opened opened = intake.open(file, rule, who, progress);
            Campaign campaign = merged(before.campaign(), opened.campaign());
            return before.withCampaign(campaign).withSources(opened.parts(), opened.understood(), rule);
        } catch (InputException e) {
            return before.withSources(before.parts(), List.of(), rule).withProblems(without(folder, e.problems()));
        } finally {
            Files.deleteIfExists(file);
            Files.deleteIfExists(folder);
        }
    }

    /** Problems name the file as the user knows it, not where it lies for the moment. */
    private static List<Problem> without(Path folder, List<Problem> problems) {
        String prefix = folder + "/";
        List<Problem> clean = new ArrayList<>();
        for (Problem problem : problems) {
            var place = problem.place();
            clean.add(new Problem(
                    problem.code(),
                    new org.saddlebook.api.problem.Place(
                            place.file().replace(prefix, "").replace(folder + "\\", ""), place.line(), place.column()),
                    problem.found(),
                    problem.expected(),
                    problem.remedy()));
        }
        return clean;
    }

    static Campaign merged(Campaign before, Campaign read) {
        if (before.rateTable().isEmpty()) {
            // Nothing was decided yet but perhaps settings: what the file states counts.
            Campaign campaign = read.withTitle(before.title().isBlank() ? read.title() : before.title());
            for (var setting : before.settings().entrySet()) {
                campaign = campaign.withSetting(setting.getKey(), setting.getValue());
            }
            return campaign;
        }
        Campaign campaign = before.withSources(read.sources());
        if (read.rateTable().isPresent()) {
            Map<Integer, String> excluded = excluded(before);
            List<RatePoint> points = new ArrayList<>();
            for (RatePoint point : read.rateTable().get().points()) {
                OptionalInt line = point.asRead().line();
                String reason = line.isPresent() ? excluded.get(line.getAsInt()) : null;
                points.add(reason == null || point.excluded().isPresent() ? point : point.exclude(reason));
            }
            campaign = campaign.withRateTable(read.rateTable().get().withPoints(points));
        }
        return campaign;
    }

    private static Map<Integer, String> excluded(Campaign before) {
        Map<Integer, String> reasons = new TreeMap<>();
        for (RatePoint point : before.rateTable().orElseThrow().points()) {
            OptionalInt line = point.asRead().line();
            if (line.isPresent() && point.excluded().isPresent()) {
                reasons.put(line.getAsInt(), point.excluded().get());
            }
        }
        return reasons;
    }
}
