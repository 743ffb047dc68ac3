package org.saddlebook.campaign.json.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import org.saddlebook.api.campaign.RatePoint;
import org.saddlebook.api.campaign.RateTable;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonCursor;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.json.api.NumberText;
import org.saddlebook.units.api.Units;

/**
 * Rate tables as JSON. Written in SI, and the file says so under {@code units}; a person may put other units there, or
 * give each value its own.
 */
final class RateTableJson {
    private static final List<String> TABLE_KEYS = List.of("statedUnit", "order", "units", "points");
    private static final List<String> UNIT_KEYS = List.of("temperature", "k");
    private static final List<String> POINT_KEYS = List.of(
            "temperature",
            "k",
            "temperatureUncertainty",
            "kUncertainty",
            "label",
            "block",
            "excluded",
            "conditions",
            "asRead");
    private static final List<String> AS_READ_KEYS = List.of("line", "temperature", "k");

    private RateTableJson() {}

    static JsonObject write(RateTable table) {
        List<JsonValue> points = new ArrayList<>();
        for (RatePoint point : table.points()) {
            points.add(point(point));
        }
        return JsonObject.builder()
                .put("statedUnit", table.rateUnit().code())
                .put("order", table.order())
                .put(
                        "units",
                        JsonObject.builder()
                                .put("temperature", "K")
                                .put("k", siCode(table.order()))
                                .build())
                .put("points", new JsonArray(points))
                .build();
    }

    private static JsonObject point(RatePoint point) {
        JsonObject.Builder out =
                JsonObject.builder().put("temperature", point.kelvin()).put("k", point.rate());
        if (point.kelvinUncertainty().isPresent()) {
            out.put("temperatureUncertainty", point.kelvinUncertainty().getAsDouble());
        }
        if (point.rateUncertainty().isPresent()) {
            out.put("kUncertainty", point.rateUncertainty().getAsDouble());
        }
        if (!point.label().isEmpty()) {
            out.put("label", point.label());
        }
        if (!point.block().isEmpty()) {
            out.put("block", point.block());
        }
        if (point.excluded().isPresent()) {
            out.put("excluded", point.excluded().get());
        }
        if (!point.conditions().isEmpty()) {
            JsonObject.Builder conditions = JsonObject.builder();
            for (Map.Entry<String, Double> condition :
                    point.conditions().values().entrySet()) {
                String unit = ConditionUnits.si(condition.getKey());
                if (unit.isEmpty()) {
                    conditions.put(condition.getKey(), condition.getValue());
                } else {
                    conditions.put(
                            condition.getKey(),
                            JsonObject.builder()
                                    .put("value", condition.getValue())
                                    .put("unit", unit)
                                    .build());
                }
            }
            out.put("conditions", conditions.build());
        }
        RatePoint.AsRead asRead = point.asRead();
        if (!asRead.equals(RatePoint.AsRead.NOT_READ)) {
            JsonObject.Builder source = JsonObject.builder();
            if (asRead.line().isPresent()) {
                source.put("line", asRead.line().getAsInt());
            }
            out.put(
                    "asRead",
                    source.put("temperature", asRead.temperature())
                            .put("k", asRead.rate())
                            .build());
        }
        return out.build();
    }

    /** UCUM term of the SI unit of a rate constant of this order: concentration^(1 - order) per second. */
    static String siCode(double order) {
        if (order == 1) {
            return "1/s";
        }
        double moles = Math.abs(order - 1);
        String length = "m" + exponent(3 * moles);
        String amount = "mol" + exponent(moles);
        return order > 1 ? length + "/(" + amount + ".s)" : amount + "/(" + length + ".s)";
    }

    private static String exponent(double value) {
        if (value == 1) {
            return "";
        }
        return (value == Math.rint(value) ? "" : "^") + NumberText.of(value);
    }

    static RateTable read(JsonCursor at) throws InputException {
        at.onlyKeys(TABLE_KEYS);
        Optional<JsonCursor> stated = at.optional("statedUnit");
        Optional<Unit> unit = stated.isPresent() ? Optional.of(rateUnit(stated.get())) : Optional.empty();
        Optional<Unit> plainTemperature = Optional.empty();
        Optional<Unit> plainRate = Optional.empty();
        if (at.optional("units").isPresent()) {
            JsonCursor units = at.member("units");
            units.onlyKeys(UNIT_KEYS);
            if (units.optional("temperature").isPresent()) {
                plainTemperature = Optional.of(Amounts.unit(units.member("temperature"), Amounts.Kind.TEMPERATURE));
            }
            if (units.optional("k").isPresent()) {
                plainRate = Optional.of(plainRateUnit(units.member("k"), unit));
            }
        }
        if (unit.isEmpty()) {
            unit = plainRate;
        }
        return points(at, unit, plainTemperature, plainRate);
    }

    private static RateTable points(
            JsonCursor at, Optional<Unit> stated, Optional<Unit> plainTemperature, Optional<Unit> plainRate)
            throws InputException {
        Optional<Unit> unit = stated;
        List<RatePoint> points = new ArrayList<>();
        List<Problem> problems = new ArrayList<>();
        for (JsonCursor item : at.member("points").items()) {
            try {
                Amounts.Amount k = Amounts.rate(item.member("k"), plainRate);
                if (unit.isEmpty()) {
                    unit = Optional.of(k.unit());
                } else if (!unit.get().dimension().equals(k.unit().dimension())) {
                    throw item.member("k")
                            .problem(
                                    "wrong-dimension",
                                    "the unit " + k.unit().code(),
                                    "a rate constant of the same order as one in "
                                            + unit.get().code(),
                                    "Give every rate constant of a table a unit of one order.");
                }
                points.add(readPoint(item, k, plainTemperature, plainRate));
            } catch (InputException e) {
                problems.addAll(e.problems());
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
        if (points.isEmpty()) {
            throw at.member("points").problem("empty-table", "no points", "at least one point", "Add the points.");
        }
        return new RateTable(unit.orElseThrow(), order(at, unit.orElseThrow()), points);
    }

    private static double order(JsonCursor at, Unit unit) throws InputException {
        double order = Units.rateOrder(unit).orElseThrow();
        Optional<JsonCursor> stated = at.optional("order");
        if (stated.isPresent() && stated.get().number() != order) {
            throw stated.get()
                    .problem(
                            "order-against-unit",
                            "order " + stated.get().quoted(),
                            "order " + NumberText.of(order) + ", which the unit " + unit.code() + " has",
                            "Correct the order or the unit.");
        }
        return order;
    }

    private static Unit rateUnit(JsonCursor at) throws InputException {
        Unit unit = Amounts.unit(at, Amounts.Kind.RATE);
        if (Units.rateOrder(unit).isEmpty()) {
            throw at.problem(
                    "wrong-dimension",
                    at.quoted(),
                    "a unit of a rate constant, for example \"1/s\" or \"L/(mol.s)\"",
                    "Correct the unit.");
        }
        return unit;
    }

    /** The unit of plain rate constants; our own SI code is known without reading it as a unit. */
    private static Unit plainRateUnit(JsonCursor at, Optional<Unit> stated) throws InputException {
        if (stated.isPresent()) {
            String code = siCode(Units.rateOrder(stated.get()).orElseThrow());
            if (code.equals(at.text())) {
                return new Unit(code, stated.get().dimension(), 1, 0);
            }
        }
        return rateUnit(at);
    }

    private static RatePoint readPoint(
            JsonCursor at, Amounts.Amount k, Optional<Unit> plainTemperature, Optional<Unit> plainRate)
            throws InputException {
        at.onlyKeys(POINT_KEYS);
        Amounts.Amount temperature = Amounts.temperature(at.member("temperature"), plainTemperature);
        Optional<JsonCursor> label = at.optional("label");
        Optional<JsonCursor> block = at.optional("block");
        Optional<JsonCursor> excluded = at.optional("excluded");
        Optional<JsonCursor> asRead = at.optional("asRead");
        return new RatePoint(
                        temperature.si(),
                        k.si(),
                        uncertainty(at, "temperatureUncertainty", temperature, plainTemperature),
                        uncertainty(at, "kUncertainty", k, plainRate),
                        label.isPresent() ? label.get().text() : "",
                        excluded.isPresent() ? Optional.of(excluded.get().text()) : Optional.empty(),
                        asRead.isPresent() ? asRead(asRead.get()) : RatePoint.AsRead.NOT_READ)
                .withConditions(conditions(at))
                .withBlock(block.isPresent() ? block.get().text() : "");
    }

    private static Conditions conditions(JsonCursor at) throws InputException {
        Conditions conditions = Conditions.NONE;
        Optional<JsonCursor> stated = at.optional("conditions");
        if (stated.isEmpty()) {
            return conditions;
        }
        for (JsonCursor value : stated.get().members()) {
            String name = value.key();
            if (!name.matches("[a-z][A-Za-z0-9]*")) {
                throw value.problem(
                        "wrong-value",
                        "a condition named \"" + name + "\"",
                        "a plain name, such as \"thirdBody\" or \"pressure\"",
                        "Rename it.");
            }
            conditions = conditions.with(name, ConditionUnits.value(value, name));
        }
        return conditions;
    }

    private static OptionalDouble uncertainty(JsonCursor at, String key, Amounts.Amount amount, Optional<Unit> plain)
            throws InputException {
        Optional<JsonCursor> apart = at.optional(key);
        if (apart.isEmpty()) {
            return amount.uncertainty();
        }
        if (amount.uncertainty().isPresent()) {
            throw apart.get()
                    .problem(
                            "wrong-value",
                            "a second uncertainty",
                            "one uncertainty, either \"standardUncertainty\" of the value or \"" + key + "\"",
                            "Remove one of the two.");
        }
        return OptionalDouble.of(Amounts.uncertainty(apart.get(), plain));
    }

    private static RatePoint.AsRead asRead(JsonCursor at) throws InputException {
        at.onlyKeys(AS_READ_KEYS);
        OptionalInt line = OptionalInt.empty();
        if (at.optional("line").isPresent()) {
            long number = at.member("line").wholeNumber();
            if (number < 1 || number > Integer.MAX_VALUE) {
                throw at.member("line").wrongValue("a line number from 1");
            }
            line = OptionalInt.of((int) number);
        }
        return new RatePoint.AsRead(
                line, at.member("temperature").text(), at.member("k").text());
    }
}
