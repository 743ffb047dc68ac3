package org.saddlebook.intake.internal;

import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.saddlebook.api.campaign.Campaign;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Problem;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.api.reader.Imported.Directive;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The statement of an earlier result: {@code reference: Ea = 85.2 ± 1.1 kJ/mol, A = 1e13 1/s, from ...}, the same with dH
 * and dS, or {@code reference: k = 1.2e-3 1/s at 298.15 K, from ...}.
 */
final class ReferenceReader {
    private static final String EXPECTED =
            "\"Ea = 85.2 kJ/mol, A = 1e13 1/s, from ...\", or dH and dS, or" + " \"k = 1.2e-3 1/s at 298.15 K\"";

    private final Directive directive;
    private final Campaign campaign;
    private final Map<String, Node> members = new LinkedHashMap<>();

    private ReferenceReader(Directive directive, Campaign campaign) {
        this.directive = directive;
        this.campaign = campaign;
    }

    /** The group {@code Ea, A} or {@code dH, dS} or {@code k, at}, with {@code source}. */
    static Node read(Directive directive, Campaign campaign) throws InputException {
        return new ReferenceReader(directive, campaign).read();
    }

    private Node read() throws InputException {
        String rest = directive.value();
        while (!rest.isEmpty()) {
            if (rest.toLowerCase(Locale.ROOT).startsWith("from ")) {
                members.put(
                        "source", new Node.Text(rest.substring("from ".length()).strip()));
                break;
            }
            int end = separator(rest);
            item(rest.substring(0, end).strip());
            rest = rest.substring(Math.min(end + 1, rest.length())).strip();
        }
        boolean complete = has("Ea", "A") || has("dH", "dS") || has("k", "at");
        int numbers = members.size() - (members.containsKey("source") ? 1 : 0);
        if (!complete || numbers != 2) {
            throw wrong("\"" + directive.value() + "\"", "State one of these pairs, each number with its unit.");
        }
        return new Node.Group(members);
    }

    private boolean has(String one, String other) {
        return members.containsKey(one) && members.containsKey(other);
    }

    private static int separator(String text) {
        for (int i = 0; i < text.length(); i++) {
            if (text.charAt(i) == ',' || text.charAt(i) == ';') {
                return i;
            }
        }
        return text.length();
    }

    private void item(String text) throws InputException {
        int equals = text.indexOf('=');
        String key = equals < 0 ? "" : key(text.substring(0, equals).strip());
        if (equals < 0 && text.startsWith("at ")) {
            put(
                    "at",
                    Node.Quantity.of(
                            ValueReader.kelvin(directive, text.substring(3).strip()), "K"));
            return;
        }
        String value = text.substring(equals + 1).strip();
        switch (key) {
            case "Ea", "dH" -> put(key, quantity(value, Optional.of(Dimension.MOLAR_ENERGY)));
            case "dS" -> put(key, quantity(value, Optional.of(Dimension.MOLAR_ENTROPY)));
            case "A" -> put(key, quantity(value, rateDimension()));
            case "k" -> {
                int at = value.indexOf(" at ");
                put(key, quantity(at < 0 ? value : value.substring(0, at).strip(), rateDimension()));
                if (at >= 0) {
                    item(value.substring(at + 1));
                }
            }
            case "at" -> put(key, Node.Quantity.of(ValueReader.kelvin(directive, value), "K"));
            default ->
                throw wrong(
                        "\"" + text + "\"",
                        "Write each number as name = value unit; put the source last, after \"from\".");
        }
    }

    private static String key(String text) {
        return switch (text) {
            case "ΔH", "∆H", "ΔH‡", "∆H‡", "dH‡" -> "dH";
            case "ΔS", "∆S", "ΔS‡", "∆S‡", "dS‡" -> "dS";
            case "T" -> "at";
            default -> text;
        };
    }

    private void put(String key, Node node) throws InputException {
        if (members.put(key, node) != null) {
            throw wrong("a second " + key, "Remove one of them.");
        }
    }

    private Optional<Dimension> rateDimension() {
        return campaign.rateTable().map(table -> Dimension.rateConstant(table.order()));
    }

    /** The quantity as stated, in its own unit; of rate constants without a table any order is taken. */
    private Node quantity(String text, Optional<Dimension> dimension) throws InputException {
        try {
            Measured measured = Units.measured(text);
            Unit unit = measured.unit();
            boolean fits = dimension.isPresent()
                    ? unit.dimension().equals(dimension.get())
                    : Units.rateOrder(unit).isPresent();
            if (!fits) {
                throw new InputException(new Problem(
                        "wrong-dimension",
                        directive.place(),
                        "\"" + text + "\", a " + Units.name(unit.dimension()),
                        dimension.isPresent() ? "a " + Units.name(dimension.get()) : "a rate constant",
                        "Correct the unit."));
            }
            return measured.uncertainty().isPresent()
                    ? Node.Quantity.of(
                            measured.value(),
                            unit.code(),
                            measured.uncertainty().getAsDouble())
                    : Node.Quantity.of(measured.value(), unit.code());
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    private InputException wrong(String found, String remedy) {
        return new InputException(new Problem("wrong-reference", directive.place(), found, EXPECTED, remedy));
    }
}
