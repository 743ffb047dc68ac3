package org.saddlebook.intake.internal;

import java.util.Map;
import java.util.TreeMap;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.reader.Imported.Directive;
import org.saddlebook.units.api.DecimalSign;
import org.saddlebook.units.api.Numerals;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * The statement that holds parameters: {@code falloff-troe/Fc = 0.6; falloff-troe/E0 = 0 kJ/mol}. A value with a unit is
 * taken to SI. A pre-exponential factor is handed to a law as a logarithm and cannot be held this way.
 */
final class HeldStatement {
    private HeldStatement() {}

    /** What is held, with what was held before. */
    static Map<String, Double> read(Directive directive, Map<String, Double> before) throws InputException {
        Map<String, Double> held = new TreeMap<>(before);
        for (String item : ValueReader.items(directive)) {
            int sign = item.indexOf('=');
            String key = sign < 0 ? "" : item.substring(0, sign).strip();
            int solidus = key.indexOf('/');
            if (solidus < 1 || key.length() < solidus + 2 || key.charAt(solidus + 1) == 'A') {
                throw ValueReader.wrong(
                        directive,
                        "the id of a law, a parameter other than a pre-exponential factor and a value, for example"
                                + " \"modified-arrhenius/n = 0.5\"",
                        "Write each item like the example, with semicolons between them.");
            }
            held.put(key, value(directive, item.substring(sign + 1).strip()));
        }
        return held;
    }

    private static double value(Directive directive, String text) throws InputException {
        try {
            return Numerals.parse(text, DecimalSign.POINT).doubleValue();
        } catch (UnitException noPlainNumber) {
            try {
                return ValueReader.si(Units.measured(text));
            } catch (UnitException e) {
                throw new InputException(e.at(directive.place()));
            }
        }
    }
}
