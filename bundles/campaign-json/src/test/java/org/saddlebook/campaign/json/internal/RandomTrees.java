package org.saddlebook.campaign.json.internal;

import java.time.Instant;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Random;
import java.util.function.Supplier;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
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
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Random nodes, findings and campaigns; keys and sizes are chosen so that ambiguous forms come up often. */
final class RandomTrees {
    private static final String[] KEYS = {
        "unit", "value", "cautions", "interval", "columns", "rows", "figure", "layers", "title", "dH", "a b", "\u00e4\""
    };
    private static final String[] RATE_UNITS = {
        "1/s",
        "1/min",
        "L/(mol.s)",
        "cm3/({molecule}.s)",
        "mol/(L.h)",
        "L2/(mol2.s)",
        "L^0.5/(mol^0.5.s)",
        "L^(1/3)/(mol^(1/3).s)"
    };

    private final Random random;

    RandomTrees(long seed) {
        random = new Random(seed);
    }

    Node node(int depth) {
        int kind = random.nextInt(depth > 0 ? 9 : 5);
        return switch (kind) {
            case 0 -> new Node.Scalar(number());
            case 1 -> new Node.Text(text());
            case 2 -> new Node.Flag(random.nextBoolean());
            case 3 -> quantity();
            case 4 -> matrix();
            case 5 -> acceptable(() -> group(depth - 1));
            case 6 -> acceptable(() -> items(depth - 1));
            case 7 -> table(depth - 1);
            default -> figure();
        };
    }

    /** Nodes refuse ambiguous members when they are made; then another is drawn. */
    private static Node acceptable(Supplier<Node> draw) {
        while (true) {
            try {
                return draw.get();
            } catch (IllegalArgumentException e) {
                // refused as it should be: draw again
            }
        }
    }

    private Node group(int depth) {
        Map<String, Node> members = new LinkedHashMap<>();
        for (int i = random.nextInt(5); i > 0; i--) {
            members.put(pick(KEYS), node(depth));
        }
        return new Node.Group(members);
    }

    private Node items(int depth) {
        List<Node> items = new ArrayList<>();
        boolean rows = random.nextBoolean();
        for (int i = random.nextInt(4); i > 0; i--) {
            items.add(rows ? rowOfScalars() : node(depth));
        }
        return new Node.Items(items);
    }

    private Node rowOfScalars() {
        List<Node> row = new ArrayList<>();
        for (int i = random.nextInt(3); i > 0; i--) {
            row.add(new Node.Scalar(number()));
        }
        return new Node.Items(row);
    }

    private Node table(int depth) {
        int count = random.nextInt(4);
        List<Node.Column> columns = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            columns.add(new Node.Column("c" + i, text(), random.nextBoolean() ? "" : "K"));
        }
        List<List<Node>> rows = new ArrayList<>();
        for (int i = random.nextInt(3); i > 0; i--) {
            List<Node> cells = new ArrayList<>();
            for (int j = 0; j < count; j++) {
                cells.add(node(depth));
            }
            rows.add(cells);
        }
        return new Node.Table(columns, rows);
    }

    private Node matrix() {
        double[][] entries = new double[1 + random.nextInt(3)][1 + random.nextInt(3)];
        for (double[] row : entries) {
            for (int j = 0; j < row.length; j++) {
                row[j] = number();
            }
        }
        return new Node.Matrix(entries);
    }

    private Node quantity() {
        OptionalDouble value = random.nextInt(4) == 0 ? OptionalDouble.empty() : OptionalDouble.of(infinite());
        boolean factor = random.nextInt(3) == 0;
        return new Node.Quantity(
                value,
                random.nextBoolean() ? "J/mol" : "",
                factor || random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(Math.abs(infinite())),
                factor ? OptionalDouble.of(1 + Math.abs(infinite())) : OptionalDouble.empty(),
                random.nextBoolean() ? Optional.of(interval()) : Optional.empty(),
                random.nextBoolean() ? List.of() : List.of(text(), "extrapolated"));
    }

    private Interval interval() {
        Interval.Kind kind = pick(Interval.Kind.values());
        boolean lower =
                kind == Interval.Kind.BETWEEN || kind == Interval.Kind.AT_LEAST || kind == Interval.Kind.OUTSIDE;
        boolean upper = kind == Interval.Kind.BETWEEN || kind == Interval.Kind.AT_MOST || kind == Interval.Kind.OUTSIDE;
        return new Interval(
                kind,
                0.5 + random.nextDouble() / 3,
                lower ? OptionalDouble.of(infinite()) : OptionalDouble.empty(),
                upper ? OptionalDouble.of(infinite()) : OptionalDouble.empty(),
                "t");
    }

    private Node figure() {
        List<Layer> layers = new ArrayList<>();
        for (int i = random.nextInt(3); i > 0; i--) {
            int size = random.nextInt(4);
            Layer.Kind[] kinds = Layer.Kind.values();
            layers.add(new Layer(
                    pick(kinds), text(), coordinates(size), coordinates(size), coordinates(size), coordinates(size)));
        }
        return new Node.Figure(
                "rate",
                text(),
                new Axis(text(), "K", Axis.Scale.RECIPROCAL_TEMPERATURE),
                new Axis("k", "1/s", Axis.Scale.LOGARITHMIC),
                layers,
                random.nextBoolean() ? List.of() : List.of("extrapolated"));
    }

    private double[] coordinates(int size) {
        double[] values = new double[size];
        for (int i = 0; i < size; i++) {
            values[i] = number();
        }
        return values;
    }

    /** Finite, and not negative zero: both zeros are written alike. */
    double number() {
        double value = random.nextInt(3) == 0 ? random.nextInt(20) - 10 : Double.longBitsToDouble(random.nextLong());
        return Double.isFinite(value) ? value + 0.0 : 1;
    }

    private double infinite() {
        return random.nextInt(20) == 0
                ? (random.nextBoolean() ? Double.POSITIVE_INFINITY : Double.NEGATIVE_INFINITY)
                : number();
    }

    private <T> T pick(T[] choices) {
        return choices[random.nextInt(choices.length)];
    }

    private double positive() {
        return StrictMath.exp(random.nextGaussian() * 20);
    }

    private String text() {
        String[] words = {"", "k", "\u0394H\u2021", "line\nfeed", "\"quoted\"", "Infinity", "\ud83e\uddea"};
        return pick(words);
    }

    Findings findings() {
        Map<String, Section> sections = new LinkedHashMap<>();
        String[] ids = {"barrier", "com.example.isotopes", "spontaneity"};
        for (int i = random.nextInt(4) - 1; i >= 0; i--) {
            Node body = random.nextBoolean() ? acceptable(() -> group(3)) : acceptable(() -> items(3));
            Map<String, String> cautions = new LinkedHashMap<>();
            for (int j = random.nextInt(3); j > 0; j--) {
                cautions.put("c" + random.nextInt(3), text());
            }
            Section.Outcome outcome = pick(Section.Outcome.values());
            sections.put(ids[i], new Section(ids[i], text(), outcome, body, cautions));
        }
        List<Contributor> contributors = List.of(
                new Contributor("org.saddlebook.barrier", "0.1.0", "ab".repeat(32)), new Contributor("a.b", "1.0", ""));
        return new Findings(text(), "cd".repeat(32), random.nextBoolean() ? contributors : List.of(), sections);
    }

    Campaign campaign() {
        Campaign campaign = Campaign.titled(text()).withNotes(text());
        if (random.nextBoolean()) {
            campaign = campaign.withSources(List.of(part()));
        }
        if (random.nextInt(4) > 0) {
            campaign = campaign.withRateTable(table());
        }
        campaign = campaign.withChoices(choices());
        for (int i = random.nextInt(3); i > 0; i--) {
            campaign = campaign.withSetting("section" + i, node(3));
        }
        for (int i = random.nextInt(3); i > 0; i--) {
            campaign = campaign.withHistory(new HistoryEntry(
                    text(),
                    Instant.ofEpochSecond(random.nextInt(), random.nextBoolean() ? 0 : random.nextInt(1_000_000_000)),
                    "imported",
                    text(),
                    text(),
                    text()));
        }
        return campaign;
    }

    private SourcePart part() {
        return new SourcePart(
                "sources/a.csv", "ab".repeat(32), random.nextInt(1 << 20), random.nextBoolean() ? "" : "r");
    }

    private RateTable table() {
        try {
            var unit = Units.rateConstant(pick(RATE_UNITS));
            List<RatePoint> points = new ArrayList<>();
            for (int i = 1 + random.nextInt(4); i > 0; i--) {
                points.add(new RatePoint(
                                positive(),
                                positive(),
                                random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(positive()),
                                random.nextBoolean() ? OptionalDouble.empty() : OptionalDouble.of(positive()),
                                text(),
                                random.nextBoolean() ? Optional.empty() : Optional.of(text()),
                                random.nextBoolean()
                                        ? RatePoint.AsRead.NOT_READ
                                        : new RatePoint.AsRead(
                                                random.nextBoolean() ? OptionalInt.empty() : OptionalInt.of(7),
                                                "25",
                                                text()))
                        .withConditions(
                                random.nextBoolean()
                                        ? Conditions.NONE
                                        : Conditions.NONE
                                                .with(Conditions.THIRD_BODY, positive())
                                                .with(Conditions.PRESSURE, positive())
                                                .with("fieldStrength", positive()))
                        .withBlock(random.nextBoolean() ? "" : text()));
            }
            return new RateTable(unit, Units.rateOrder(unit).orElseThrow(), points);
        } catch (UnitException e) {
            throw new AssertionError(e);
        }
    }

    private Choices choices() {
        Choices choices = Choices.defaults();
        if (random.nextBoolean()) {
            choices = choices.withModels(List.of("eyring", text()))
                    .withTargetsKelvin(List.of(positive(), 298.15))
                    .withTransmission(positive())
                    .withReferenceKelvin(positive());
        }
        if (random.nextBoolean()) {
            choices = choices.withStandard(new StandardState(pick(StandardState.Kind.values()), positive()))
                    .withConstantKind(pick(ConstantKind.values()))
                    .withErrorModel(pick(ErrorModel.values()))
                    .withLevel(0.9)
                    .withSeed(random.nextLong() & Choices.LARGEST_SEED)
                    .withFixed(Map.of("modified-arrhenius/n", 0.5, "a/b", number()));
        }
        return choices;
    }
}
