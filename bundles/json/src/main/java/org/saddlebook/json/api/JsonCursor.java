package org.saddlebook.json.api;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.problem.Problem;

/**
 * A place in a document that was read: takes the tree apart, and turns what does not fit into a problem with file, line
 * and path ({@code rateTable.points[3].k}). Every method that is declared to throw does so with code
 * {@code missing-key}, {@code unknown-key}, {@code wrong-type} or {@code wrong-value}.
 */
public final class JsonCursor {
    private final JsonDocument document;
    private final JsonCursor parent; // null at the root
    private final Object step; // key or index in the parent; null at the root
    private final JsonValue value;

    JsonCursor(JsonDocument document, JsonValue root) {
        this(document, null, null, root);
    }

    private JsonCursor(JsonDocument document, JsonCursor parent, Object step, JsonValue value) {
        this.document = document;
        this.parent = parent;
        this.step = step;
        this.value = value;
    }

    /** The value here. */
    public JsonValue value() {
        return value;
    }

    /** Whether the value here is an object. */
    public boolean isObject() {
        return value instanceof JsonObject;
    }

    /** The path for people, for example {@code rateTable.points[3].k}; empty at the root. Items count from 0. */
    public String path() {
        StringBuilder text = new StringBuilder();
        for (Object part : steps()) {
            if (part instanceof Integer index) {
                text.append('[').append(index.intValue()).append(']');
            } else {
                text.append(text.length() == 0 ? "" : ".").append(part);
            }
        }
        return text.toString();
    }

    private List<Object> steps() {
        List<Object> steps = new ArrayList<>();
        for (JsonCursor at = this; at.parent != null; at = at.parent) {
            steps.add(at.step);
        }
        Collections.reverse(steps);
        return steps;
    }

    /** The key or index of this value in its container; {@code the document} at the root. */
    private String own() {
        return parent == null ? "the document" : path();
    }

    /** A member that must be there. */
    public JsonCursor member(String key) throws InputException {
        Optional<JsonCursor> member = optional(key);
        if (member.isEmpty()) {
            throw problem(
                    "missing-key",
                    "no key \"" + key + "\"",
                    "the key \"" + key + "\" in " + own(),
                    "Add \"" + key + "\".");
        }
        return member.get();
    }

    /** A member that may be absent. */
    public Optional<JsonCursor> optional(String key) throws InputException {
        JsonValue found = object().members().get(key);
        return found == null ? Optional.empty() : Optional.of(step(key, found));
    }

    /** The members in order. */
    public List<JsonCursor> members() throws InputException {
        List<JsonCursor> members = new ArrayList<>();
        for (Map.Entry<String, JsonValue> member : object().members().entrySet()) {
            members.add(step(member.getKey(), member.getValue()));
        }
        return members;
    }

    /** The key of this member in its object. */
    public String key() {
        return parent == null ? "" : step.toString();
    }

    /** The items of an array. */
    public List<JsonCursor> items() throws InputException {
        if (!(value instanceof JsonArray array)) {
            throw wrongType("an array");
        }
        List<JsonCursor> items = new ArrayList<>();
        for (JsonValue item : array.items()) {
            items.add(step(items.size(), item));
        }
        return items;
    }

    /** The object here. */
    public JsonObject object() throws InputException {
        if (value instanceof JsonObject object) {
            return object;
        }
        throw wrongType("an object");
    }

    /** The string here. */
    public String text() throws InputException {
        if (value instanceof JsonString string) {
            return string.value();
        }
        throw wrongType("a string");
    }

    /** The number here. */
    public double number() throws InputException {
        if (value instanceof JsonNumber number) {
            return number.value();
        }
        throw wrongType("a number");
    }

    /** The whole number here, 0 to 2^53 - 1. */
    public long wholeNumber() throws InputException {
        double number = number();
        if (!(number >= 0 && number < 1L << 53) || number != Math.rint(number)) {
            throw wrongValue("a whole number from 0 to 9007199254740991");
        }
        return (long) number;
    }

    /** The boolean here. */
    public boolean flag() throws InputException {
        if (value instanceof JsonBoolean flag) {
            return flag.value();
        }
        throw wrongType("true or false");
    }

    /** Refuses members other than these, suggesting the one that was probably meant. */
    public void onlyKeys(List<String> known) throws InputException {
        List<Problem> problems = new ArrayList<>();
        for (String key : object().members().keySet()) {
            if (!known.contains(key)) {
                Optional<String> near = NearSpelling.of(key, known);
                problems.add(step(key, new JsonNull())
                        .asProblem(
                                "unknown-key",
                                "the key \"" + key + "\"",
                                "one of " + String.join(", ", known),
                                near.isPresent()
                                        ? "Did you mean \"" + near.get() + "\"?"
                                        : "Remove it, or move what it says into \"notes\" of the campaign."));
            }
        }
        if (!problems.isEmpty()) {
            throw new InputException(problems);
        }
    }

    /** Says that the value here is of the wrong kind. */
    public InputException wrongType(String expected) {
        return problem("wrong-type", value.kind(), expected, "Write " + expected + " for " + own() + ".");
    }

    /** Says that the value here is of the right kind and still cannot be. */
    public InputException wrongValue(String expected) {
        return problem("wrong-value", quoted(), expected, "Correct " + own() + ".");
    }

    /** A problem at this place. */
    public InputException problem(String code, String found, String expected, String remedy) {
        return new InputException(asProblem(code, found, expected, remedy));
    }

    /** A problem at this place, to be collected with others. */
    public Problem asProblem(String code, String found, String expected, String remedy) {
        return new Problem(code, place(), found, expected, remedy);
    }

    /** This place: file, line and path. */
    public Place place() {
        OptionalInt line = document.line(steps());
        return new Place(document.name(), line, parent == null ? Optional.empty() : Optional.of(path()));
    }

    /** The value as it would be written, cut to a readable length. */
    public String quoted() {
        StringBuilder text = new StringBuilder();
        if (value instanceof JsonObject || value instanceof JsonArray) {
            return value.kind().toLowerCase(Locale.ROOT);
        }
        CanonicalJson.appendLeaf(text, value);
        return text.length() <= 80 ? text.toString() : text.substring(0, 77) + "...";
    }

    private JsonCursor step(Object keyOrIndex, JsonValue found) {
        return new JsonCursor(document, this, keyOrIndex, found);
    }
}
