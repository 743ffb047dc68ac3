package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.saddlebook.api.campaign.Choices;
import org.saddlebook.api.campaign.ConstantKind;
import org.saddlebook.api.campaign.ErrorModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;

/** Choices as JSON: only what differs from the defaults. */
final class ChoicesJson {
    private static final List<String> KEYS = List.of(
            "models",
            "at",
            "standardState",
            "molecularity",
            "transmission",
            "referenceTemperature",
            "constant",
            "errorModel",
            "level",
            "seed",
            "fixed");

    private ChoicesJson() {}

    static JsonObject write(Choices choices) {
        Choices defaults = Choices.defaults();
        JsonObject.Builder out = JsonObject.builder();
        if (!choices.models().isEmpty()) {
            out.put("models", JsonArray.ofStrings(choices.models()));
        }
        if (!choices.targetsKelvin().isEmpty()) {
            List<JsonValue> targets = new ArrayList<>();
            for (double kelvin : choices.targetsKelvin()) {
                targets.add(amount(kelvin, "K"));
            }
            out.put("at", new JsonArray(targets));
        }
        if (choices.standard().isPresent()) {
            StandardState standard = choices.standard().get();
            boolean pressure = standard.kind() == StandardState.Kind.PRESSURE;
            out.put("standardState", amount(standard.value(), pressure ? "Pa" : "mol/m3"));
        }
        if (choices.molecularity().isPresent()) {
            out.put("molecularity", choices.molecularity().getAsDouble());
        }
        if (choices.transmission() != defaults.transmission()) {
            out.put("transmission", choices.transmission());
        }
        if (choices.referenceKelvin() != defaults.referenceKelvin()) {
            out.put("referenceTemperature", amount(choices.referenceKelvin(), "K"));
        }
        if (choices.constantKind() != defaults.constantKind()) {
            out.put("constant", choices.constantKind().key());
        }
        if (choices.errorModel().isPresent()) {
            out.put("errorModel", choices.errorModel().get().key());
        }
        if (choices.level() != defaults.level()) {
            out.put("level", choices.level());
        }
        if (choices.seed() != defaults.seed()) {
            out.put("seed", choices.seed());
        }
        if (!choices.fixed().isEmpty()) {
            Map<String, JsonValue> fixed = new LinkedHashMap<>();
            for (Map.Entry<String, Double> held : new TreeMap<>(choices.fixed()).entrySet()) {
                fixed.put(held.getKey(), new JsonNumber(held.getValue()));
            }
            out.put("fixed", new JsonObject(fixed));
        }
        return out.build();
    }

    private static JsonObject amount(double value, String unit) {
        return JsonObject.builder().put("value", value).put("unit", unit).build();
    }

    static Choices read(JsonCursor at) throws InputException {
        at.onlyKeys(KEYS);
        Choices choices = Choices.defaults().withModels(NodeReader.texts(at, "models"));
        Optional<JsonCursor> targets = at.optional("at");
        if (targets.isPresent()) {
            List<Double> kelvin = new ArrayList<>();
            for (JsonCursor target : targets.get().items()) {
                kelvin.add(Amounts.temperature(target, Optional.empty()).si());
            }
            choices = choices.withTargetsKelvin(kelvin);
        }
        Optional<JsonCursor> standard = at.optional("standardState");
        if (standard.isPresent()) {
            choices = choices.withStandard(Amounts.standardState(standard.get()));
        }
        Optional<JsonCursor> reference = at.optional("referenceTemperature");
        if (reference.isPresent()) {
            choices = choices.withReferenceKelvin(
                    Amounts.temperature(reference.get(), Optional.empty()).si());
        }
        return words(at, numbers(at, choices));
    }

    private static Choices numbers(JsonCursor at, Choices before) throws InputException {
        Choices choices = before;
        Optional<JsonCursor> molecularity = at.optional("molecularity");
        if (molecularity.isPresent()) {
            double order = molecularity.get().number();
            if (!(order >= 0)) {
                throw molecularity.get().wrongValue("an order, for example 1 or 2");
            }
            choices = choices.withMolecularity(order);
        }
        Optional<JsonCursor> transmission = at.optional("transmission");
        if (transmission.isPresent()) {
            choices = choices.withTransmission(positive(transmission.get(), "a transmission coefficient above zero"));
        }
        Optional<JsonCursor> level = at.optional("level");
        if (level.isPresent()) {
            double value = level.get().number();
            if (!(value > 0.5 && value < 1)) {
                throw level.get().wrongValue("a coverage probability between 0.5 and 1, for example 0.95");
            }
            choices = choices.withLevel(value);
        }
        Optional<JsonCursor> seed = at.optional("seed");
        if (seed.isPresent()) {
            choices = choices.withSeed(seed.get().wholeNumber());
        }
        Optional<JsonCursor> fixed = at.optional("fixed");
        if (fixed.isPresent()) {
            Map<String, Double> held = new TreeMap<>();
            for (JsonCursor member : fixed.get().members()) {
                held.put(member.key(), member.number());
            }
            choices = choices.withFixed(held);
        }
        return choices;
    }

    private static double positive(JsonCursor at, String expected) throws InputException {
        double value = at.number();
        if (!(value > 0)) {
            throw at.wrongValue(expected);
        }
        return value;
    }

    private static Choices words(JsonCursor at, Choices before) throws InputException {
        Choices choices = before;
        Optional<JsonCursor> constant = at.optional("constant");
        if (constant.isPresent()) {
            String word = constant.get().text();
            try {
                choices = choices.withConstantKind(ConstantKind.of(word));
            } catch (IllegalArgumentException e) {
                throw constant.get().wrongValue("one of unstated, elementary, pseudo-order, lumped");
            }
        }
        Optional<JsonCursor> errorModel = at.optional("errorModel");
        if (errorModel.isPresent()) {
            String word = errorModel.get().text();
            try {
                choices = choices.withErrorModel(ErrorModel.of(word));
            } catch (IllegalArgumentException e) {
                throw errorModel.get().wrongValue("one of constant-relative, stated, stated-both, constant-absolute");
            }
        }
        return choices;
    }
}
