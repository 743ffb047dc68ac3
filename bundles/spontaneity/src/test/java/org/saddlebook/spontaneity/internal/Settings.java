package org.saddlebook.spontaneity.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.testkit.api.ImmediateTask;
import org.saddlebook.thermo.data.api.CuratedSet;

/** Settings of the section for tests, and the section they give. */
final class Settings {
    private final Map<String, Node> members = new LinkedHashMap<>();

    static Settings of(Node dH, Node dS) {
        return new Settings().with("dH", dH).with("dS", dS);
    }

    Settings with(String key, Node node) {
        members.put(key, node);
        return this;
    }

    Settings with(String key, double value) {
        return with(key, new Node.Scalar(value));
    }

    Settings range(Node lower, Node upper) {
        return with("range", new Node.Group(Map.of("lower", lower, "upper", upper)));
    }

    Campaign campaign() {
        return Campaign.titled("invented").withSetting("spontaneity", new Node.Group(members));
    }

    Section section() throws Cancelled {
        return section(campaign());
    }

    static Section section(Campaign campaign) throws Cancelled {
        SpontaneityComponent analysis = new SpontaneityComponent(List.of(CuratedSet.source()));
        return analysis.analyse(campaign, new Findings("invented", "", List.of(), Map.of()), ImmediateTask.seeded(1));
    }

    Node.Group body() throws Cancelled {
        return (Node.Group) section().body();
    }

    static String text(Node.Group group, String key) {
        return ((Node.Text) group.get(key).orElseThrow()).value();
    }

    static Node.Quantity quantity(Node.Group group, String key) {
        return (Node.Quantity) group.get(key).orElseThrow();
    }

    static List<Node> items(Node.Group group, String key) {
        return ((Node.Items) group.get(key).orElseThrow()).items();
    }

    static Node.Quantity crossover(Node.Group body) {
        return (Node.Quantity) items(body, "crossovers").get(0);
    }

    static Stated stated(
            double h, double varianceH, double s, double varianceS, double covariance, OptionalDouble dof) {
        return new Stated(
                h,
                OptionalDouble.of(Math.sqrt(varianceH)),
                s,
                OptionalDouble.of(Math.sqrt(varianceS)),
                OptionalDouble.of(covariance),
                dof,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.empty());
    }
}
