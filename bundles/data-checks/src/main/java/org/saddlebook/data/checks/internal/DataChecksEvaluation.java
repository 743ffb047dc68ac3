package org.saddlebook.data.checks.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;

/** Lets every rule look and writes down what each saw. */
final class DataChecksEvaluation {
    static final String SECTION = "dataChecks";
    static final String TITLE = "Looking for mistakes";

    /** Every rule, in the order of the findings. */
    static final List<Rule> RULES = List.of(
            new ShiftedRows(),
            new ShiftedTemperatures(false),
            new ShiftedTemperatures(true),
            new AgainstReference(),
            new MoleculesForMoles(),
            new DuplicatedRows(),
            new SlopeOnOneRow(),
            new ColdRunDrift(),
            new ImplausiblePrefactor(),
            new AboveLimit());

    private DataChecksEvaluation() {}

    static Section section(Campaign campaign, Task task) throws Cancelled {
        Node settings = campaign.settings().get(SECTION);
        Stated stated = settings == null ? Stated.NOTHING : Stated.of(settings);
        if (!stated.unusable().isEmpty()) {
            return Section.refused(SECTION, TITLE, String.join(" ", stated.unusable()));
        }
        Subject subject = new Subject(campaign, stated);
        if (subject.rows().isEmpty()) {
            return Section.refused(SECTION, TITLE, "Every row of the rate table is excluded.");
        }
        if (campaign.rateTable().orElseThrow().varies(Conditions.THIRD_BODY)) {
            return Section.refused(
                    SECTION,
                    TITLE,
                    "The rows were measured at different third-body concentrations or pressures; k then follows more than the"
                            + " temperature, and the rules would take that for mistakes.");
        }
        List<Node> findings = new ArrayList<>();
        List<Node> nothing = new ArrayList<>();
        List<Node> notExamined = new ArrayList<>();
        for (Rule rule : RULES) {
            task.check();
            Rule.Outcome outcome = rule.examine(subject);
            if (outcome instanceof Rule.Outcome.Found found) {
                for (Finding finding : found.findings()) {
                    findings.add(node(rule, finding));
                }
            } else if (outcome instanceof Rule.Outcome.NotExamined not) {
                notExamined.add(new Node.Text(rule.id() + ": " + not.reason()));
            } else {
                nothing.add(new Node.Text(rule.id()));
            }
        }
        Map<String, Node> body = new LinkedHashMap<>();
        body.put("summary", new Node.Text(summary(findings.size(), nothing.size())));
        body.put("found", new Node.Items(findings));
        body.put("nothingFound", new Node.Items(nothing));
        body.put("notExamined", new Node.Items(notExamined));
        Alternatives.of(subject).ifPresent(table -> body.put("wouldAlsoFit", table));
        return Section.done(SECTION, TITLE, new Node.Group(body), Map.of());
    }

    private static String summary(int found, int quiet) {
        String proposals = "Nothing was changed: what follows is for a person to look at.";
        return found == 0
                ? quiet + (quiet == 1 ? " kind" : " kinds")
                        + " of mistake were looked for and none was seen. A mistake in"
                        + " the whole table alike leaves no trace in it."
                : (found == 1 ? "One thing looks" : found + " things look") + " like a mistake. " + proposals;
    }

    private static Node node(Rule rule, Finding finding) {
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("rule", new Node.Text(rule.id()));
        members.put("sentence", new Node.Text(finding.sentence()));
        if (!finding.rows().isEmpty()) {
            List<Node> rows = new ArrayList<>();
            for (int row : finding.rows()) {
                rows.add(new Node.Scalar(row));
            }
            members.put("rows", new Node.Items(rows));
        }
        if (!finding.evidence().isEmpty()) {
            members.put("evidence", new Node.Group(finding.evidence()));
        }
        return new Node.Group(members);
    }
}
