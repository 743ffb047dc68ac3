package org.saddlebook.intake.internal;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.reader.Imported.Directive;
import org.saddlebook.units.api.Measured;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The statement about tunnelling: {@code wigner 1200i cm-1}, {@code eckart 1200i cm-1; forward 60 kJ/mol; reverse 80 kJ/mol}.
 * The first word names the correction; which ones there are is for the installed bundles to say.
 */
final class TunnellingStatement {
    private static final Dimension WAVENUMBER = new Dimension(0, -1, 0, 0, 0);
    private static final String EXAMPLE =
            "a correction and the imaginary wavenumber, for example \"wigner 1200i cm-1\" or"
                    + " \"eckart 1200i cm-1; forward 60 kJ/mol; reverse 80 kJ/mol\"";

    private TunnellingStatement() {}

    static Node read(Directive directive) throws InputException {
        List<String> items = ValueReader.items(directive);
        String first = items.get(0);
        int blank = first.indexOf(' ');
        if (blank < 0) {
            throw wrong(directive);
        }
        Map<String, Node> members = new LinkedHashMap<>();
        members.put("model", new Node.Text(first.substring(0, blank)));
        Measured wavenumber =
                measured(directive, withoutI(first.substring(blank + 1).strip()), WAVENUMBER);
        members.put("wavenumber", Node.Quantity.of(ValueReader.si(wavenumber), "1/m"));
        for (String item : items.subList(1, items.size())) {
            int space = item.indexOf(' ');
            String key = space < 0 ? item : item.substring(0, space);
            boolean forward = key.equals("forward");
            String name = forward ? "forwardBarrier" : "reverseBarrier";
            if (space < 0 || !(forward || key.equals("reverse")) || members.containsKey(name)) {
                throw wrong(directive);
            }
            Measured height = measured(directive, item.substring(space + 1).strip(), Dimension.MOLAR_ENERGY);
            members.put(name, Node.Quantity.of(ValueReader.si(height), "J/mol"));
        }
        return new Node.Group(members);
    }

    /** The number without the i of an imaginary one, which stands behind its last digit. */
    private static String withoutI(String text) {
        int i = text.indexOf('i');
        return i > 0 && Character.isDigit(text.charAt(i - 1))
                ? text.substring(0, i) + " " + text.substring(i + 1).strip()
                : text;
    }

    private static Measured measured(Directive directive, String text, Dimension dimension) throws InputException {
        try {
            Measured measured = Units.measured(text);
            if (!measured.unit().dimension().equals(dimension) || !(measured.value() > 0)) {
                throw wrong(directive);
            }
            return measured;
        } catch (UnitException e) {
            throw new InputException(e.at(directive.place()));
        }
    }

    private static InputException wrong(Directive directive) {
        return ValueReader.wrong(directive, EXAMPLE, "Write the statement like one of the examples.");
    }
}
