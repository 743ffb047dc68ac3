package org.saddlebook.units.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.saddlebook.units.api.UnitException;

/** One symbol, as written, to a term; an unknown one is an error that lists what it may have been meant to be. */
final class SymbolReader {
    private static final int SUGGESTIONS = 4;

    /** Compounds worth suggesting beside the table. */
    private static final String[] COMMON = {
        "ms", "us", "cm", "dm", "mm", "mL", "kJ", "kcal", "mmol", "umol", "kmol", "M", "mM", "uM", "nM", "kPa", "MPa",
        "mbar", "kg", "mg", "meV"
    };

    private SymbolReader() {}

    static Term read(String symbol, String original) throws UnitException {
        if (symbol.equals("M") || symbol.equals("molar")) {
            return molar(Symbols.find("mol"));
        }
        if (symbol.length() == 2 && symbol.charAt(1) == 'M' && "munpf".indexOf(symbol.charAt(0)) >= 0) {
            return molar(Symbols.find(symbol.charAt(0) + "mol"));
        }
        Symbol found = Symbols.find(symbol);
        if (found != null) {
            return Term.of(found, Exponent.ONE);
        }
        if (symbol.startsWith("{")) {
            throw new UnitException(
                    "unknown-unit",
                    "the annotation " + symbol + " in \"" + original + "\"",
                    "{molecule}, the only counted entity that is understood",
                    "state the unit per mol or per {molecule}");
        }
        List<String> near = near(symbol);
        String remedy = near.isEmpty()
                ? "use a symbol that \"saddlebook units\" lists; upper and lower case differ"
                : "did you mean " + String.join(" or ", near) + "? Upper and lower case differ";
        throw new UnitException(
                "unknown-unit",
                symbol.equals(original) ? "\"" + symbol + "\"" : "\"" + symbol + "\" in \"" + original + "\"",
                "a unit symbol",
                remedy);
    }

    private static Term molar(Symbol amount) {
        return Term.of(amount, Exponent.ONE).times(Symbols.LITRE, new Exponent(-1, 1));
    }

    /** Known spellings at one edit, or that differ in case only; nearest first, then in the order of the table. */
    private static List<String> near(String symbol) {
        List<String> sameLetters = new ArrayList<>();
        List<String> oneEdit = new ArrayList<>();
        for (Entry entry : Symbols.TABLE) {
            collect(symbol, entry.symbol().code(), sameLetters, oneEdit);
            for (String spelling : entry.spellings()) {
                collect(symbol, spelling, sameLetters, oneEdit);
            }
        }
        for (String common : COMMON) {
            collect(symbol, common, sameLetters, oneEdit);
        }
        if (symbol.equals("C") || symbol.equals("F")) {
            sameLetters.add("deg" + symbol);
        }
        sameLetters.addAll(oneEdit);
        return sameLetters.size() > SUGGESTIONS ? sameLetters.subList(0, SUGGESTIONS) : sameLetters;
    }

    private static void collect(String symbol, String known, List<String> sameLetters, List<String> oneEdit) {
        if (symbol.toLowerCase(Locale.ROOT).equals(known.toLowerCase(Locale.ROOT))) {
            sameLetters.add(known);
        } else if (symbol.length() > 1 && known.length() > 1 && withinOneEdit(symbol, known)) {
            oneEdit.add(known);
        }
    }

    private static boolean withinOneEdit(String one, String other) {
        String shorter = one.length() <= other.length() ? one : other;
        String longer = shorter.equals(one) ? other : one;
        if (longer.length() - shorter.length() > 1) {
            return false;
        }
        int i = 0;
        while (i < shorter.length() && shorter.charAt(i) == longer.charAt(i)) {
            i++;
        }
        boolean sameLength = shorter.length() == longer.length();
        return longer.substring(i + 1).equals(shorter.substring(sameLength && i < shorter.length() ? i + 1 : i));
    }
}
