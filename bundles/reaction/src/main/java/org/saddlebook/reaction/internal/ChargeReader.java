package org.saddlebook.reaction.internal;

import org.saddlebook.reaction.api.ReactionException;

/**
 * Finds where the body of a formula ends and what charge follows. Digits before a sign may be a count or a charge; where
 * custom does not decide, both readings are named and neither is taken.
 */
final class ChargeReader {
    private static final int LARGEST = 99;

    private final Characters characters;
    private final int start;

    /** Index behind the body. */
    private int bodyEnd;

    /** Index behind the charge. */
    private int end;

    private int charge;

    private ChargeReader(Characters characters, int start) {
        this.characters = characters;
        this.start = start;
    }

    /**
     * Body and charge of the formula that starts here.
     *
     * @param bodyEnd index behind the composition
     * @param end index behind the charge
     * @param charge in elementary charges
     */
    record Extent(int bodyEnd, int end, int charge) {}

    static Extent at(Characters characters, int start) throws ReactionException {
        ChargeReader reader = new ChargeReader(characters, start);
        reader.bodyEnd = reader.scanBody();
        reader.end = reader.bodyEnd;
        char c = characters.at(reader.end);
        if (c == '^') {
            reader.caret();
        } else if (Characters.raised(c) >= 0 || c == '⁺' || c == '⁻') {
            reader.raised();
        } else if (c == '-' || c == '+') {
            reader.plain(c);
        }
        return new Extent(reader.bodyEnd, reader.end, reader.charge);
    }

    private int scanBody() {
        int depth = 0;
        int i = start;
        while (true) {
            char c = characters.at(i);
            if (c == '(' || c == '[') {
                if (depth == 0 && characters.phaseAt(i)) {
                    return i;
                }
                depth++;
            } else if (c == ')' || c == ']') {
                if (--depth < 0) {
                    return i;
                }
            } else if (!inBody(c, i)) {
                return i;
            }
            i++;
        }
    }

    private boolean inBody(char c, int i) {
        return Characters.capital(c)
                || Characters.small(c)
                || Characters.digit(c)
                || c == '.'
                || c == '·'
                || Characters.vulgar(c)
                || (c == '/' && Characters.digit(characters.at(i - 1)) && Characters.digit(characters.at(i + 1)));
    }

    /** {@code ^2-}, {@code ^-2}, {@code ^-}, {@code ^(2-)}, {@code ^{2-}}. */
    private void caret() throws ReactionException {
        end++;
        char open = characters.at(end);
        char close = open == '(' ? ')' : open == '{' ? '}' : 0;
        if (close != 0) {
            end++;
        }
        int digits = end;
        end = characters.skipDigits(end);
        int magnitude = magnitude(digits, end);
        char sign = characters.at(end);
        if (sign != '+' && sign != '-') {
            throw bad();
        }
        end++;
        if (magnitude < 0) {
            digits = end;
            end = characters.skipDigits(end);
            magnitude = magnitude(digits, end);
        }
        if (close != 0 && characters.at(end++) != close) {
            throw bad();
        }
        take(sign, magnitude < 0 ? 1 : magnitude);
    }

    private void raised() throws ReactionException {
        int magnitude = -1;
        char sign = 0;
        while (true) {
            char c = characters.at(end);
            int digit = Characters.raised(c);
            if (digit >= 0 && magnitude <= LARGEST) {
                magnitude = Math.max(0, magnitude) * 10 + digit;
            } else if ((c == '⁺' || c == '⁻') && sign == 0) {
                sign = c == '⁺' ? '+' : '-';
            } else {
                break;
            }
            end++;
        }
        if (sign == 0) {
            throw bad();
        }
        take(sign, magnitude < 0 ? 1 : magnitude);
    }

    private void plain(char sign) throws ReactionException {
        int run = 0;
        while (characters.at(end + run) == sign) {
            run++;
        }
        int after = end + run;
        if (sign == '+' && startsSpecies(after)) {
            // The last plus joins two species.
            run--;
            after--;
        }
        if (run == 0) {
            return;
        }
        int digitsEnd = characters.skipDigits(after);
        if (run == 1 && digitsEnd > after && characters.at(after) != '+') {
            int magnitude = magnitude(after, digitsEnd);
            end = digitsEnd;
            take(sign, magnitude);
            return;
        }
        int signAt = end;
        end = after;
        if (run == 1 && Characters.digit(characters.at(bodyEnd - 1))) {
            digitsBefore(sign, signAt);
        } else {
            take(sign, run);
        }
    }

    /** Whether what follows a plus is another species: {@code H2+O2}, {@code H2+3H2}, but not {@code Fe+3} at its end. */
    private boolean startsSpecies(int i) {
        char c = characters.at(i);
        if (Characters.digit(c)) {
            int behind = characters.skipDigits(i);
            int next = characters.skipBlanks(behind);
            char n = characters.at(next);
            boolean ends = n == '\n' || n == '+' || n == ')' || n == ']' || characters.phaseAt(next);
            return !ends;
        }
        return Characters.capital(c)
                || Characters.vulgar(c)
                || c == '['
                || (c == '(' && !characters.phaseAt(i))
                || (c == 'e' && !Characters.small(characters.at(i + 1)));
    }

    /** One sign without a size, behind digits: are these atoms or charges? */
    private void digitsBefore(char sign, int signAt) throws ReactionException {
        int digits = signAt;
        while (digits > start && Characters.digit(characters.at(digits - 1))) {
            digits--;
        }
        String before = characters.part(start, digits);
        boolean complex = before.endsWith("]") && closesFirst(digits - 1);
        boolean single = Elements.known(before);
        if (complex || (single && sign == '+' && Elements.metal(before))) {
            bodyEnd = digits;
            take(sign, magnitude(digits, signAt));
            return;
        }
        boolean several = signAt - digits > 1;
        boolean oxoCation = sign == '+'
                && before.endsWith("O")
                && Elements.metal(before.substring(0, Math.max(0, before.length() - 1)));
        if (single || several || oxoCation || before.endsWith(")")) {
            String number = characters.part(digits, signAt);
            String count = several ? number.substring(0, number.length() - 1) : "";
            String size = several ? number.substring(number.length() - 1) : number;
            throw new ReactionException(
                    "ambiguous-charge",
                    "\"" + characters.part(start, signAt + 1) + "\"",
                    "a charge that cannot be taken for a number of atoms",
                    "Write " + before + number + "^" + sign + " for one charge, or " + before + count + "^" + size
                            + sign + " for " + size
                            + " charges; a plus between two species needs a blank on both sides.",
                    start + 1);
        }
        take(sign, 1);
    }

    /** Whether the bracket that ends here is the one the formula starts with. */
    private boolean closesFirst(int bracket) {
        if (characters.at(start) != '[') {
            return false;
        }
        int depth = 0;
        for (int i = start; i < bracket; i++) {
            char c = characters.at(i);
            depth += c == '[' || c == '(' ? 1 : c == ']' || c == ')' ? -1 : 0;
            if (depth == 0) {
                return false;
            }
        }
        return true;
    }

    private int magnitude(int from, int to) throws ReactionException {
        if (from == to) {
            return -1;
        }
        if (to - from > 2) {
            throw bad();
        }
        return Integer.parseInt(characters.part(from, to));
    }

    private void take(char sign, int magnitude) throws ReactionException {
        if (magnitude == 0 || magnitude > LARGEST) {
            throw bad();
        }
        charge = sign == '+' ? magnitude : -magnitude;
    }

    private ReactionException bad() {
        int to = Math.min(characters.length(), Math.max(end + 1, bodyEnd + 1));
        return new ReactionException(
                "formula-syntax",
                "\"" + characters.part(start, to) + "\"",
                "a charge of 1 to 99",
                "Write the charge as in SO4^2- or Fe^3+.",
                bodyEnd + 1);
    }
}
