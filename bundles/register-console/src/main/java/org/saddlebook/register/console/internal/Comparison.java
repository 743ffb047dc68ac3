package org.saddlebook.register.console.internal;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.saddlebook.json.api.CanonicalJson;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonNumber;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonString;
import org.saddlebook.json.api.JsonValue;

/**
 * Compares findings as JSON, so that sections of bundles that are gone are compared too.
 *
 * <p>Two numbers agree when {@code |a - b| <= max(1e-9 |a|, 1e-6 u)}; u is the standard uncertainty of the quantity the
 * number belongs to (for one with a standard factor f: {@code |value| ln f}), and 0 elsewhere. Numbers in an array of
 * numbers (a row of a matrix, a series of a figure) share the scale of the largest of them, because what cancels to nearly
 * zero there carries the rounding of its neighbours. Everything that is no number must be equal.
 */
final class Comparison {
    /** One place that differs. */
    record Moved(String path, String before, String after) {}

    private final boolean exact;
    private final List<Moved> moved = new ArrayList<>();

    private Comparison(boolean exact) {
        this.exact = exact;
    }

    /**
     * Every place that differs.
     *
     * @param exact numbers must be equal; otherwise they must agree
     * @param skip members of the top level that are not compared
     */
    static List<Moved> of(JsonObject before, JsonObject after, boolean exact, Set<String> skip) {
        Comparison comparison = new Comparison(exact);
        comparison.members("", before, after, skip, 0);
        return List.copyOf(comparison.moved);
    }

    private void members(String path, JsonObject before, JsonObject after, Set<String> skip, double uncertainty) {
        Set<String> keys = new LinkedHashSet<>(before.members().keySet());
        keys.addAll(after.members().keySet());
        for (String key : keys) {
            if (!skip.contains(key)) {
                String member = path.isEmpty() ? key : path + "." + key;
                values(member, before.get(key), after.get(key), uncertainty, 0);
            }
        }
    }

    private void values(
            String path, Optional<JsonValue> before, Optional<JsonValue> after, double uncertainty, double scale) {
        if (before.isEmpty() || after.isEmpty()) {
            moved.add(new Moved(path, text(before), text(after)));
        } else if (before.get() instanceof JsonObject a && after.get() instanceof JsonObject b) {
            // An interval belongs to the quantity around it.
            members(path, a, b, Set.of(), a.has("value") ? uncertainty(a) : uncertainty);
        } else if (before.get() instanceof JsonArray a && after.get() instanceof JsonArray b) {
            items(path, a.items(), b.items());
        } else if (before.get() instanceof JsonNumber a && after.get() instanceof JsonNumber b) {
            double allowed = exact ? 0 : Math.max(1e-9 * Math.max(Math.abs(a.value()), scale), 1e-6 * uncertainty);
            if (!(Math.abs(a.value() - b.value()) <= allowed)) {
                moved.add(new Moved(path, text(before), text(after)));
            }
        } else if (!before.equals(after)) {
            moved.add(new Moved(path, text(before), text(after)));
        }
    }

    private void items(String path, List<JsonValue> before, List<JsonValue> after) {
        double scale = 0;
        for (JsonValue value : before) {
            if (value instanceof JsonNumber number) {
                scale = Math.max(scale, Math.abs(number.value()));
            }
        }
        for (int i = 0; i < Math.max(before.size(), after.size()); i++) {
            values(path + "[" + i + "]", at(before, i), at(after, i), 0, scale);
        }
    }

    private static Optional<JsonValue> at(List<JsonValue> items, int index) {
        return index < items.size() ? Optional.of(items.get(index)) : Optional.empty();
    }

    private static double uncertainty(JsonObject quantity) {
        if (quantity.get("standardUncertainty").orElse(null) instanceof JsonNumber stated) {
            return Math.abs(stated.value());
        }
        if (quantity.get("standardFactor").orElse(null) instanceof JsonNumber factor
                && quantity.get("value").orElse(null) instanceof JsonNumber value
                && factor.value() > 1) {
            return Math.abs(value.value()) * StrictMath.log(factor.value());
        }
        return 0;
    }

    private static String text(Optional<JsonValue> value) {
        if (value.isEmpty()) {
            return "nothing";
        }
        String text = new String(CanonicalJson.bytes(value.get()), StandardCharsets.UTF_8);
        return text.length() <= 60 ? text : text.substring(0, 57) + "...";
    }

    /** The bundles of findings, name to "version, SHA-256", in their order. */
    static Map<String, String> bundles(JsonObject findings) {
        Map<String, String> bundles = new LinkedHashMap<>();
        if (findings.get("software").orElse(null) instanceof JsonObject software
                && software.get("bundles").orElse(null) instanceof JsonArray list) {
            for (JsonValue item : list.items()) {
                if (item instanceof JsonObject bundle) {
                    bundles.put(word(bundle, "name"), word(bundle, "version") + " (" + word(bundle, "sha256") + ")");
                }
            }
        }
        return bundles;
    }

    private static String word(JsonObject object, String key) {
        return object.get(key).orElse(null) instanceof JsonString text ? text.value() : "not stated";
    }
}
