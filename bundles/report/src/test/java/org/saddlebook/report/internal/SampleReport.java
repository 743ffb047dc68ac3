package org.saddlebook.report.internal;

import java.time.Instant;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.HistoryEntry;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.campaign.SourcePart;
import org.saddlebook.api.findings.Axis;
import org.saddlebook.api.findings.Contributor;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Interval;
import org.saddlebook.api.findings.Layer;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.presentation.api.CautionText;

/** A campaign and findings with invented numbers, in the shape that the analyses write. */
final class SampleReport {
    static final String NASTY = "Title <script>alert(\"x\")</script> & 'co' \u202eback";

    private SampleReport() {}

    static Campaign campaign() {
        RatePoint first = new RatePoint(
                323.15,
                4.5e-5,
                OptionalDouble.empty(),
                OptionalDouble.of(1.3e-6),
                "50a <b>",
                Optional.empty(),
                new RatePoint.AsRead(OptionalInt.of(9), "50", "0.0027"));
        RatePoint second = new RatePoint(
                333.15,
                1.5e-4,
                OptionalDouble.of(0.2),
                OptionalDouble.empty(),
                "60a",
                Optional.empty(),
                new RatePoint.AsRead(OptionalInt.of(10), "60", "0.009"));
        RatePoint third = new RatePoint(
                343.15,
                4.6e-4,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                "70a",
                Optional.of("stirrer stopped & restarted"),
                new RatePoint.AsRead(OptionalInt.of(11), "70", "0.0276"));
        Unit perMinute = new Unit("1/min", Dimension.rateConstant(1), 1.0 / 60, 0);
        return Campaign.titled(NASTY)
                .withNotes("Line one.\nLine two <i>.")
                .withSources(List.of(new SourcePart("sources/rates.csv", "ab".repeat(32), 321, "reader-text")))
                .withRateTable(new RateTable(perMinute, 1, List.of(first, second, third)))
                .withChoices(Choices.defaults()
                        .withTargetsKelvin(List.of(298.15))
                        .withErrorModel(ErrorModel.CONSTANT_RELATIVE))
                .withHistory(new HistoryEntry(
                        "A. Chemist",
                        Instant.parse("2026-03-02T09:12:00Z"),
                        "point 3 excluded",
                        "used",
                        "excluded",
                        "stirrer stopped"));
    }

    static Node.Group group(Object... keysAndNodes) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (int i = 0; i < keysAndNodes.length; i += 2) {
            Object value = keysAndNodes[i + 1];
            Node node = value instanceof Node n
                    ? n
                    : value instanceof String text ? new Node.Text(text) : new Node.Scalar((Double) value);
            members.put((String) keysAndNodes[i], node);
        }
        return new Node.Group(members);
    }

    static Node.Items items(Node... nodes) {
        return new Node.Items(List.of(nodes));
    }

    static Node.Quantity logarithmic(double value, String unit, double factor, String... cautions) {
        return new Node.Quantity(
                OptionalDouble.of(value),
                unit,
                OptionalDouble.empty(),
                OptionalDouble.of(factor),
                Optional.of(Interval.between(value / factor / factor, value * factor * factor, 0.95, "t")),
                List.of(cautions));
    }

    static Node.Quantity linear(double value, String unit, double u, String... cautions) {
        return Node.Quantity.of(value, unit, u)
                .withInterval(Interval.between(value - 2.3 * u, value + 2.3 * u, 0.95, "t"))
                .withCautions(List.of(cautions));
    }

    static Node.Figure figure() {
        return new Node.Figure(
                "ln-rate",
                "Rate <constant>",
                new Axis("temperature", "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("ln k", "1", Axis.Scale.LINEAR),
                List.of(Layer.of(Layer.Kind.MEASURED, "measured", new double[] {300}, new double[] {1})),
                List.of("same-mechanism"));
    }

    static Section barrier() {
        Node arrhenius = group(
                "id",
                "arrhenius",
                "title",
                "Arrhenius",
                "outcome",
                "fitted",
                "parameters",
                group("A", logarithmic(3.4567e15, "1/min", 2.4), "Ea", linear(99876.5, "J/mol", 2345)),
                "derived",
                group("dH", linear(97100, "J/mol", 2345), "dS", linear(21.2, "J/(mol.K)", 6.8, "entropy-and-solvent")),
                "derivedAt",
                Node.Quantity.of(338.15, "K"),
                "covariance",
                group(
                        "basis", items(new Node.Text("ln A"), new Node.Text("Ea")),
                        "units", items(new Node.Text("1"), new Node.Text("J/mol")),
                        "matrix", new Node.Matrix(new double[][] {{0.6951, 1953.1}, {1953.1, 5499025.0}})),
                "statistics",
                group("n", 10.0, "dof", 8.0, "rss", 0.01, "s", 0.0354, "aicc", -30.25, "conditionNumber", 12.3));
        Node modified = group(
                "id",
                "modified-arrhenius",
                "title",
                "modified Arrhenius",
                "outcome",
                "fitted",
                "parameters",
                group("n", linear(-4.1, "1", 3.0, "undetermined")),
                "statistics",
                group("n", 10.0, "dof", 7.0));
        Node refused = group(
                "id",
                "eyring",
                "title",
                "Eyring",
                "outcome",
                "refused",
                "reason",
                "It is not <applicable>.",
                "parameters",
                new Node.Group(Map.of()));
        Node prediction = group(
                "temperature",
                Node.Quantity.of(298.15, "K"),
                "model",
                "arrhenius",
                "k",
                logarithmic(1.1e-4, "1/min", 1.08, "extrapolated", "same-mechanism"),
                "kNewRun",
                logarithmic(1.1e-4, "1/min", 1.1, "extrapolated", "same-mechanism"),
                "extrapolation",
                Node.Quantity.of(25, "K"));
        Node body = group(
                "context",
                        group(
                                "order",
                                1.0,
                                "standardStateText",
                                "1 mol/L",
                                "standardStateAssumed",
                                new Node.Flag(true)),
                "models", items(arrhenius, modified, refused),
                "comparison",
                        group(
                                "undecided", new Node.Flag(true),
                                "candidates", items(new Node.Text("arrhenius"), new Node.Text("modified-arrhenius")),
                                "akaikeWeights", group("arrhenius", 0.93, "modified-arrhenius", 0.07),
                                "notes", items(new Node.Text("The interval of n includes 0."))),
                "predictions", items(prediction),
                "notes", items(new Node.Text("No hint is drawn.")),
                "figures", items(figure()),
                "cautions", items(new Node.Text("few-temperatures")));
        return Section.done(
                "barrier",
                "Barrier",
                body,
                CautionText.texts(List.of(
                        "few-temperatures", "undetermined", "extrapolated", "same-mechanism", "entropy-and-solvent")));
    }

    static Section spontaneity() {
        Node.Quantity open = new Node.Quantity(
                OptionalDouble.empty(),
                "K",
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                Optional.of(new Interval(
                        Interval.Kind.OUTSIDE, 0.95, OptionalDouble.of(340), OptionalDouble.of(371), "fieller")),
                List.of());
        return Section.done(
                "spontaneity",
                "Spontaneity",
                group(
                        "case",
                        "Allowed above the crossover.",
                        "dH",
                        linear(62000, "J/mol", 1800),
                        "dS",
                        linear(160, "J/(mol.K)", 5),
                        "dG",
                        items(group(
                                "temperature",
                                Node.Quantity.of(298.15, "K"),
                                "dG",
                                linear(14300, "J/mol", 2300, "allowed-is-not-fast"))),
                        "crossovers",
                        items(group("temperature", open, "outcome", "unbounded")),
                        "notes",
                        items(new Node.Text("ΔH and ΔS were stated."))),
                CautionText.texts(List.of("allowed-is-not-fast")));
    }

    static Section foreign() {
        return Section.done(
                "com.example.isotopes",
                "Isotopes <foreign>",
                group(
                        "kinetic isotopeEffect", linear(2.34, "1", 0.12, "own-caution"),
                        "answer", new Node.Flag(true),
                        "table",
                                new Node.Table(
                                        List.of(
                                                new Node.Column("t", "temperature", "K"),
                                                new Node.Column("e", "energy", "J/mol"),
                                                new Node.Column("w", "word", "")),
                                        List.of(List.of(
                                                new Node.Scalar(300),
                                                new Node.Scalar(12345.6),
                                                new Node.Text("<cell>")))),
                        "matrix", new Node.Matrix(new double[][] {{1, 0.5}, {0.5, 1}}),
                        "nested", group("deeper", items(new Node.Text("one"), group("two", 2.5)))),
                Map.of("own-caution", "A caution of its <own>."));
    }

    static Findings findings(Section... sections) {
        Map<String, Section> map = new LinkedHashMap<>();
        for (Section section : sections) {
            map.put(section.id(), section);
        }
        return new Findings(
                NASTY,
                "cd".repeat(32),
                List.of(new Contributor("org.saddlebook.barrier", "0.1.0", "ef".repeat(32))),
                map);
    }

    static Findings findings() {
        return findings(
                barrier(), spontaneity(), foreign(), Section.refused("window", "Window", "No limit was stated."));
    }
}
