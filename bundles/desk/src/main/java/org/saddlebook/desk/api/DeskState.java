package org.saddlebook.desk.api;

import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.reader.ReadingRule;
import org.saddlebook.api.service.Intake;

/**
 * A campaign and what is known about it at one moment. Immutable; grows by {@code with} methods. Hold on to the newest one
 * only: an old one keeps an old campaign alive.
 */
public final class DeskState {
    private final Campaign campaign;
    private final Optional<Campaign> effective;
    private final Optional<Findings> findings;
    private final boolean current;
    private final List<Intake.Part> parts;
    private final List<String> understood;
    private final List<Problem> problems;
    private final ReadingRule rule;
    private final Optional<Path> folder;

    private DeskState(
            Campaign campaign,
            Optional<Campaign> effective,
            Optional<Findings> findings,
            boolean current,
            List<Intake.Part> parts,
            List<String> understood,
            List<Problem> problems,
            ReadingRule rule,
            Optional<Path> folder) {
        this.campaign = Objects.requireNonNull(campaign, "campaign");
        this.effective = Objects.requireNonNull(effective, "effective");
        this.findings = Objects.requireNonNull(findings, "findings");
        this.current = current;
        this.parts = List.copyOf(parts);
        this.understood = List.copyOf(understood);
        this.problems = List.copyOf(problems);
        this.rule = Objects.requireNonNull(rule, "rule");
        this.folder = Objects.requireNonNull(folder, "folder");
    }

    /** A campaign of which nothing more is known. */
    public static DeskState of(Campaign campaign) {
        return new DeskState(
                campaign,
                Optional.empty(),
                Optional.empty(),
                false,
                List.of(),
                List.of(),
                List.of(),
                ReadingRule.AUTOMATIC,
                Optional.empty());
    }

    /** The campaign as it was decided. A file that could not be read is a source with an empty reader and no rate table. */
    public Campaign campaign() {
        return campaign;
    }

    /** The effective campaign that {@link #findings} belong to. */
    public Optional<Campaign> effective() {
        return effective;
    }

    /** The newest findings; of an earlier state of this campaign while it is evaluated again. */
    public Optional<Findings> findings() {
        return findings;
    }

    /** Whether the findings are those of {@link #campaign}. */
    public boolean current() {
        return current;
    }

    /** The source files with their bytes, in the order of the campaign's sources. */
    public List<Intake.Part> parts() {
        return parts;
    }

    /** Sentences that say how the table was read; empty for a stored campaign. */
    public List<String> understood() {
        return understood;
    }

    /** What is wrong with file or choices, so that there are no findings of this campaign. */
    public List<Problem> problems() {
        return problems;
    }

    /** The reading rule that the table was read with. */
    public ReadingRule rule() {
        return rule;
    }

    /** The campaign folder it is kept in; empty while it was never saved. */
    public Optional<Path> folder() {
        return folder;
    }

    /** The same with another campaign; its findings are then those of an earlier state. */
    public DeskState withCampaign(Campaign changed) {
        return new DeskState(changed, effective, findings, false, parts, understood, List.of(), rule, folder);
    }

    /** The same with findings of its campaign. */
    public DeskState withFindings(Campaign effectiveCampaign, Findings found) {
        return new DeskState(
                campaign,
                Optional.of(effectiveCampaign),
                Optional.of(found),
                true,
                parts,
                understood,
                List.of(),
                rule,
                folder);
    }

    /** The same with source files, how they were read, and by which rule. */
    public DeskState withSources(List<Intake.Part> newParts, List<String> newUnderstood, ReadingRule newRule) {
        return new DeskState(
                campaign, effective, findings, current, newParts, newUnderstood, problems, newRule, folder);
    }

    /** The same with problems in place of findings. */
    public DeskState withProblems(List<Problem> found) {
        return new DeskState(
                campaign, Optional.empty(), Optional.empty(), true, parts, understood, found, rule, folder);
    }

    /** The same, kept in this folder. */
    public DeskState withFolder(Path newFolder) {
        return new DeskState(
                campaign, effective, findings, current, parts, understood, problems, rule, Optional.of(newFolder));
    }
}
