package org.saddlebook.barrier.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.function.IntFunction;
import java.util.random.RandomGenerator;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.findings.Findings;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.findings.Section;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.task.Cancelled;
import org.saddlebook.api.task.Task;
import org.saddlebook.model.arrhenius.internal.Arrhenius;
import org.saddlebook.model.eyring.internal.Eyring;
import org.saddlebook.model.modified.arrhenius.internal.ModifiedArrhenius;

/** What tests of this bundle share: tables, the three models, an evaluation without a framework. */
final class Bench {
    static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);
    static final Unit LITRE_PER_MOLE_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);

    private Bench() {}

    /** A task without threads. */
    static final Task TASK = new Task() {
        @Override
        public void progress(double fraction, String doing) {}

        @Override
        public void check() {}

        @Override
        public RandomGenerator random(String stream) {
            throw new AssertionError("this analysis draws no random numbers");
        }

        @Override
        public <T> List<T> parts(int count, IntFunction<T> part) {
            List<T> results = new ArrayList<>();
            for (int i = 0; i < count; i++) {
                results.add(part.apply(i));
            }
            return results;
        }
    };

    static Map<String, InstalledModel> models(RateModel... more) {
        Map<String, InstalledModel> models = new TreeMap<>();
        for (RateModel model : List.of(new Arrhenius(), new Eyring(), new ModifiedArrhenius())) {
            models.put(model.id(), new InstalledModel(model, "org.saddlebook.model-" + model.id()));
        }
        for (RateModel model : more) {
            models.put(model.id(), new InstalledModel(model, "com.example." + model.id()));
        }
        return models;
    }

    /** A table of rate constants in {@code unit}; {@code relative} is u(k)/k for every point, empty for none. */
    static RateTable table(Unit unit, double order, double[] kelvin, double[] k, OptionalDouble relative) {
        List<RatePoint> points = new ArrayList<>();
        for (int i = 0; i < kelvin.length; i++) {
            RatePoint point = RatePoint.of(kelvin[i], unit.toSi(k[i]));
            points.add(relative.isPresent() ? point.withRateUncertainty(point.rate() * relative.getAsDouble()) : point);
        }
        return new RateTable(unit, order, points);
    }

    static RateTable firstOrder(double[] kelvin, double[] k) {
        return table(PER_SECOND, 1, kelvin, k, OptionalDouble.empty());
    }

    static Campaign campaign(RateTable table, Choices choices, Map<String, InstalledModel> installed) {
        Choices effective = choices.models().isEmpty() ? choices.withModels(List.copyOf(installed.keySet())) : choices;
        boolean stated =
                table.used().stream().allMatch(point -> point.rateUncertainty().isPresent());
        return Campaign.titled("test")
                .withRateTable(table)
                .withChoices(effective.withErrorModel(effective
                        .errorModel()
                        .orElse(stated && !table.used().isEmpty() ? ErrorModel.STATED : ErrorModel.CONSTANT_RELATIVE)));
    }

    static Section section(RateTable table, Choices choices, RateModel... more) {
        Map<String, InstalledModel> installed = models(more);
        try {
            return new BarrierEvaluation(campaign(table, choices, installed), installed, TASK).section();
        } catch (Cancelled impossible) {
            throw new AssertionError(impossible);
        }
    }

    static Node.Group body(RateTable table, Choices choices, RateModel... more) {
        return (Node.Group) section(table, choices, more).body();
    }

    static Findings findings(Section section) {
        Map<String, Section> sections = new LinkedHashMap<>();
        sections.put(section.id(), section);
        return new Findings("test", "0", List.of(), sections);
    }

    static Node.Group model(Node.Group body, String id) {
        for (Node model : TreeReader.items(body, "models")) {
            if (TreeReader.text((Node.Group) model, "id").equals(id)) {
                return (Node.Group) model;
            }
        }
        throw new AssertionError("no model " + id);
    }

    static Node.Quantity parameter(Node.Group body, String model, String symbol) {
        return TreeReader.quantity(TreeReader.group(model(body, model), "parameters"), symbol);
    }

    static Node.Quantity derived(Node.Group body, String model, String symbol) {
        return TreeReader.quantity(TreeReader.group(model(body, model), "derived"), symbol);
    }

    static String texts(Node.Group group, String key) {
        StringBuilder text = new StringBuilder();
        for (Node item : TreeReader.items(group, key)) {
            text.append(((Node.Text) item).value()).append('\n');
        }
        return text.toString();
    }
}
