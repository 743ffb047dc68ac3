package org.saddlebook.barrier.internal;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonReader;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.units.api.Converter;
import org.saddlebook.units.api.Units;

/** Reads the reference tables and evaluates them as the analysis does. */
final class ReferenceCampaign {
    static final Path FOLDER = Path.of("src/test/resources/reference");

    private final Map<String, String> definition;
    private final Unit rateUnit;
    private final List<RatePoint> points;

    private ReferenceCampaign(Map<String, String> definition, Unit rateUnit, List<RatePoint> points) {
        this.definition = definition;
        this.rateUnit = rateUnit;
        this.points = points;
    }

    /** The tables of {@code tables.csv}. */
    static List<ReferenceCampaign> all() throws Exception {
        List<ReferenceCampaign> campaigns = new ArrayList<>();
        List<Map<String, String>> uncertainties = csv("uncertainties.csv");
        for (Map<String, String> definition : csv("tables.csv")) {
            Unit unit = Units.rateConstant(definition.get("rate_unit"));
            Converter temperature = Converter.of(Units.temperature(definition.get("temperature_unit")));
            Converter rate = Converter.of(unit);
            List<String> percents = uncertainties.stream()
                    .filter(row -> row.get("name").equals(definition.get("name")))
                    .map(row -> row.get("relative_standard_uncertainty_percent"))
                    .toList();
            List<RatePoint> points = new ArrayList<>();
            for (Map<String, String> row : csv(definition.get("name") + ".csv")) {
                List<String> cells = List.copyOf(row.values());
                double k = rate.toSi(new BigDecimal(cells.get(1)));
                double percent = Double.parseDouble(percents.get(points.size()));
                points.add(RatePoint.of(temperature.toSi(new BigDecimal(cells.get(0))), k)
                        .withRateUncertainty(k * percent / 100));
            }
            campaigns.add(new ReferenceCampaign(definition, unit, points));
        }
        return campaigns;
    }

    static ReferenceCampaign named(String name) throws Exception {
        return all().stream()
                .filter(each -> each.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    String name() {
        return definition.get("name");
    }

    List<Double> targets() {
        List<Double> targets = new ArrayList<>();
        for (String text : definition.get("targets_K").split(";", -1)) {
            targets.add(Double.parseDouble(text));
        }
        return targets;
    }

    Unit rateUnit() {
        return rateUnit;
    }

    double order() {
        return Double.parseDouble(definition.get("order"));
    }

    List<RatePoint> points() {
        return points;
    }

    /** The member of {@code barrier.models} and the predictions of one law. */
    static Node.Group evaluate(Unit rateUnit, double order, List<RatePoint> points, Choices choices) throws Cancelled {
        Campaign campaign = Campaign.titled("reference")
                .withRateTable(new RateTable(rateUnit, order, points))
                .withChoices(choices);
        Section section = new BarrierEvaluation(campaign, Bench.models(), Bench.TASK).section();
        return (Node.Group) section.body();
    }

    /** Findings of one law for this table. */
    Node.Group evaluate(String model, String standard, ErrorModel errorModel) throws Exception {
        Choices choices = Choices.defaults()
                .withModels(List.of(model))
                .withErrorModel(errorModel)
                .withStandard(Units.standardState(standard))
                .withTargetsKelvin(targets());
        return evaluate(rateUnit, order(), points, choices);
    }

    /** Rows of a file as heading to cell, in order; cells may be quoted. */
    static List<Map<String, String>> csv(String file) throws IOException {
        List<Map<String, String>> rows = new ArrayList<>();
        List<String> head = null;
        for (String line : Files.readAllLines(FOLDER.resolve(file))) {
            List<String> cells = cells(line);
            if (head == null) {
                head = cells;
                continue;
            }
            Map<String, String> row = new LinkedHashMap<>();
            for (int i = 0; i < head.size(); i++) {
                row.put(head.get(i), cells.get(i));
            }
            rows.add(row);
        }
        return rows;
    }

    private static List<String> cells(String line) {
        List<String> cells = new ArrayList<>();
        StringBuilder cell = new StringBuilder();
        boolean quoted = false;
        for (int i = 0; i < line.length(); i++) {
            char c = line.charAt(i);
            if (c == '"') {
                quoted = !quoted;
            } else if (c == ',' && !quoted) {
                cells.add(cell.toString());
                cell.setLength(0);
            } else {
                cell.append(c);
            }
        }
        cells.add(cell.toString());
        return cells;
    }

    static JsonObject json(String file) throws Exception {
        return (JsonObject) JsonReader.read(file, Files.readAllBytes(FOLDER.resolve(file)));
    }

    static JsonValue member(JsonValue object, String key) {
        return ((JsonObject) object)
                .get(key)
                .orElseThrow(() -> new AssertionError("no member " + key + " in " + object));
    }

    static double number(JsonValue object, String key) {
        return ((JsonNumber) member(object, key)).value();
    }

    static String text(JsonValue object, String key) {
        return ((JsonString) member(object, key)).value();
    }

    static List<JsonValue> items(JsonValue object, String key) {
        return ((JsonArray) member(object, key)).items();
    }
}
