package org.saddlebook.units.internal;

import org.saddlebook.units.api.UnitException;

/**
 * Reads a unit expression: UCUM terms and the trade's spellings.
 *
 * <pre>
 * product  = ["/"] factor { ("." | "*" | blank | "/" | "per") factor }
 * factor   = "(" product ")" [exponent] | "1" | ("10*" | "10^") integer | symbol [exponent]
 * exponent = ("^" | "**") [sign] decimal | "^(" [sign] integer "/" integer ")" | [sign] integer | superscripts
 * </pre>
 *
 * A product that follows a division without parentheses is refused: {@code J/mol K} is read in two ways by two people,
 * and UCUM's left-to-right rule is not what most of them mean (SI Brochure, 9th edition, section 5.2).
 */
final class UnitParser {
    private static final int LONGEST = 200;
    private static final int DEEPEST = 8;

    private final String original;
    private final String text;
    private int position;

    private UnitParser(String original, String text) {
        this.original = original;
        this.text = text;
    }

    static Term parse(String original) throws UnitException {
        String text = UnitText.plain(original);
        if (text.isEmpty()) {
            throw new UnitException(
                    "missing-unit", "no unit", "a unit", "write the unit, for example \"1/s\" or \"kJ/mol\"");
        }
        if (text.length() > LONGEST) {
            throw new UnitException(
                    "unit-syntax",
                    "a text of " + text.length() + " characters",
                    "a unit expression of at most " + LONGEST + " characters",
                    "write the unit alone");
        }
        boolean perParticle = false;
        for (String suffix : new String[] {" per particle", " per molecule"}) {
            if (text.endsWith(suffix)) {
                text = text.substring(0, text.length() - suffix.length());
                perParticle = true;
            }
        }
        UnitParser parser = new UnitParser(original, degrees(text));
        try {
            Term term = parser.product(0);
            if (parser.position < parser.text.length()) {
                throw parser.syntax("\"" + parser.rest() + "\" where the unit should end");
            }
            return (perParticle ? EnergyEquivalents.perParticle(term) : term).withLitres();
        } catch (ArithmeticException e) {
            throw parser.syntax("an exponent or a size beyond any unit in use");
        }
    }

    /** "deg C" and "° C" are one symbol written in two words. */
    private static String degrees(String text) {
        String joined = text;
        for (String scale : new String[] {"C", "F"}) {
            if (joined.equals("deg " + scale) || joined.equals("° " + scale) || joined.equals("deg. " + scale)) {
                joined = "deg" + scale;
            }
        }
        return joined;
    }

    private Term product(int depth) throws UnitException {
        if (depth > DEEPEST) {
            throw syntax("parentheses nested more than " + DEEPEST + " deep");
        }
        Term product = Term.ONE;
        boolean divide = false;
        boolean divided = false;
        skipBlank();
        if (at('/')) {
            position++;
            divide = true;
        }
        while (true) {
            skipBlank();
            Term factor = factor(depth);
            if (divided && !divide) {
                throw ambiguous();
            }
            divided |= divide;
            product = product.times(divide ? factor.power(new Exponent(-1, 1)) : factor);
            boolean blank = skipBlank();
            if (position >= text.length() || at(')')) {
                return product;
            }
            if (at('/')) {
                position++;
                divide = true;
            } else if (text.startsWith("per ", position) && blank) {
                position += 4;
                divide = true;
            } else {
                divide = false;
                if (at('.') || at('*')) {
                    position++;
                } else if (!blank && !startsSymbol() && !at('(')) {
                    throw syntax("\"" + rest() + "\" after a complete unit");
                }
            }
        }
    }

    private Term factor(int depth) throws UnitException {
        if (position >= text.length()) {
            throw syntax("an expression that breaks off");
        }
        if (at('(')) {
            position++;
            Term inner = product(depth + 1);
            if (!at(')')) {
                throw syntax("a parenthesis that is not closed");
            }
            position++;
            return inner.power(exponent());
        }
        char c = text.charAt(position);
        if (c >= '0' && c <= '9') {
            return number();
        }
        if (!startsSymbol()) {
            throw syntax("\"" + rest() + "\" where a unit should stand");
        }
        String symbol = symbol();
        Term term = SymbolReader.read(symbol, original);
        Exponent exponent = exponent();
        Term factor = term.power(exponent);
        if (term.factors().size() == 1 && term.factors().get(0).symbol().hasOffset() && !alone(exponent)) {
            throw new UnitException(
                    "ambiguous-unit",
                    "\"" + original + "\", a temperature scale inside a larger unit",
                    "kelvin in products and quotients",
                    "write K for temperature differences, as in \"J/(mol.K)\"");
        }
        return factor;
    }

    /** Whether the symbol just read, with this exponent, is the whole expression. */
    private boolean alone(Exponent exponent) {
        boolean bare = exponent.numerator() == 1 && exponent.denominator() == 1;
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            bare &= c != '/' && c != '.' && c != '*' && c != ' ';
        }
        return bare;
    }

    private Term number() throws UnitException {
        int start = position;
        if (text.startsWith("10*", position) || text.startsWith("10^", position)) {
            position += text.startsWith("10**", position) ? 4 : 3;
            return Term.of(Symbols.TEN, signedInteger());
        }
        if (text.startsWith("10", position)
                && position + 2 < text.length()
                && UnitText.superscript(text.charAt(position + 2)) != 0) {
            position += 2;
            return Term.of(Symbols.TEN, superscripts());
        }
        while (position < text.length() && (isDigit(text.charAt(position)) || (at('.') && digitAt(position + 1)))) {
            position++;
        }
        if (!text.substring(start, position).equals("1")) {
            throw new UnitException(
                    "unit-syntax",
                    "the number " + text.substring(start, position) + " in \"" + original + "\"",
                    "units, the number 1, or a power of ten such as 10^-5",
                    "write the power of ten as \"10^-5\", or put the number into the values");
        }
        return Term.ONE;
    }

    private String symbol() throws UnitException {
        int start = position;
        while (position < text.length()) {
            char c = text.charAt(position);
            if (c == '{' || c == '[') {
                int end = text.indexOf(c == '{' ? '}' : ']', position);
                if (end < 0) {
                    throw syntax("a bracket that is not closed");
                }
                position = end + 1;
            } else if (isSymbolPart(c)) {
                position++;
            } else {
                break;
            }
        }
        return text.substring(start, position);
    }

    private Exponent exponent() throws UnitException {
        if (position >= text.length()) {
            return Exponent.ONE;
        }
        if (at('^') || text.startsWith("**", position)) {
            position += at('^') ? 1 : 2;
            return explicitExponent();
        }
        char c = text.charAt(position);
        if (UnitText.superscript(c) != 0) {
            return superscripts();
        }
        if (isDigit(c) || ((c == '-' || c == '+') && digitAt(position + 1))) {
            Exponent exponent = signedInteger();
            if (at('.') && digitAt(position + 1)) {
                throw syntax("a broken exponent without \"^\"");
            }
            return exponent;
        }
        return Exponent.ONE;
    }

    private Exponent explicitExponent() throws UnitException {
        char close = at('(') ? ')' : at('{') ? '}' : 0;
        if (close != 0) {
            position++;
        }
        int sign = sign();
        long numerator = digits();
        long denominator = 1;
        if (at('.') && digitAt(position + 1)) {
            position++;
            int start = position;
            long decimals = digits();
            for (int i = start; i < position; i++) {
                denominator *= 10;
            }
            numerator = numerator * denominator + decimals;
        } else if (close != 0 && at('/')) {
            position++;
            denominator = digits();
        }
        if (close != 0) {
            if (!at(close)) {
                throw syntax("an exponent whose bracket is not closed");
            }
            position++;
        }
        return Exponent.of(sign * numerator, denominator);
    }

    private Exponent signedInteger() throws UnitException {
        int sign = sign();
        return Exponent.of(sign * digits(), 1);
    }

    private int sign() {
        if (at('-') || at('+')) {
            return text.charAt(position++) == '-' ? -1 : 1;
        }
        return 1;
    }

    private long digits() throws UnitException {
        int start = position;
        long value = 0;
        while (digitAt(position)) {
            value = value * 10 + text.charAt(position) - '0';
            position++;
        }
        if (position == start || position - start > 4) {
            throw syntax("an exponent that is not a small number");
        }
        return value;
    }

    private Exponent superscripts() throws UnitException {
        StringBuilder digits = new StringBuilder();
        while (position < text.length() && UnitText.superscript(text.charAt(position)) != 0) {
            digits.append(UnitText.superscript(text.charAt(position)));
            position++;
        }
        UnitParser inner = new UnitParser(original, digits.toString());
        Exponent exponent = inner.signedInteger();
        if (inner.position < inner.text.length()) {
            throw syntax("superscripts that are not a whole number");
        }
        return exponent;
    }

    private boolean startsSymbol() {
        char c = position < text.length() ? text.charAt(position) : 0;
        return c == '{' || c == '[' || isSymbolPart(c);
    }

    private static boolean isSymbolPart(char c) {
        return c == '_' || c == '°' || c == '%' || Character.isLetter(c);
    }

    private boolean skipBlank() {
        boolean skipped = false;
        while (at(' ')) {
            position++;
            skipped = true;
        }
        return skipped;
    }

    private boolean at(char c) {
        return position < text.length() && text.charAt(position) == c;
    }

    private boolean digitAt(int index) {
        return index < text.length() && isDigit(text.charAt(index));
    }

    private static boolean isDigit(char c) {
        return c >= '0' && c <= '9';
    }

    private String rest() {
        return text.substring(position);
    }

    private UnitException ambiguous() {
        return new UnitException(
                "ambiguous-unit",
                "\"" + original + "\", a product after a division",
                "a unit that can be read in one way only",
                "put the denominator in parentheses, as in \"J/(mol.K)\", or write exponents, as in \"J mol-1 K-1\"");
    }

    private UnitException syntax(String what) {
        return new UnitException(
                "unit-syntax",
                "\"" + original + "\": " + what,
                "a unit such as \"L/(mol.s)\", \"L mol-1 s-1\" or \"L mol^-1 s^-1\"",
                "write symbols with whole exponents, or \"^\" before a broken one, as in \"L^0.5 mol^-0.5 s^-1\"");
    }
}
