package org.saddlebook.reaction.internal;

import java.math.BigDecimal;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.ReactionException;

/** Reads coefficients and counts: {@code 3}, {@code 0.5}, {@code 1/2}, {@code 1 1/2}, {@code ½}, {@code 1½}. */
final class NumberReader {
    private static final int MOST_DIGITS = 9;

    private final Characters characters;
    private int next;

    private NumberReader(Characters characters, int start) {
        this.characters = characters;
        this.next = start;
    }

    /**
     * A number and where it ends.
     *
     * @param value the number
     * @param end index behind it
     */
    record Read(Fraction value, int end) {}

    static boolean startsAt(Characters characters, int i) {
        return Characters.digit(characters.at(i)) || Characters.vulgar(characters.at(i));
    }

    /** The coefficient at this place; there must be one. */
    static Read coefficient(Characters characters, int start) throws ReactionException {
        NumberReader reader = new NumberReader(characters, start);
        Fraction value = reader.value();
        if (value.signum() == 0) {
            throw new ReactionException(
                    "coefficient",
                    "a coefficient of 0",
                    "a coefficient above zero",
                    "Leave the species out.",
                    start + 1);
        }
        return new Read(value, reader.next);
    }

    private Fraction value() throws ReactionException {
        if (Characters.vulgar(characters.at(next))) {
            return Characters.vulgarValue(characters.at(next++));
        }
        int start = next;
        Fraction whole = Fraction.of(new BigDecimal(digits()));
        char sign = characters.at(next);
        if (sign == ',' && Characters.digit(characters.at(next + 1))) {
            throw wrong(start, characters.skipDigits(next + 1), "Write a decimal point: 0.5.");
        }
        if (sign == '.' && Characters.digit(characters.at(next + 1))) {
            next++;
            digits();
            return Fraction.of(new BigDecimal(characters.part(start, next)));
        }
        if (Characters.vulgar(sign)) {
            next++;
            return whole.plus(Characters.vulgarValue(sign));
        }
        if (sign == '/' || sign == '⁄') {
            return whole.dividedBy(denominator(start));
        }
        // A mixed number: blanks, digits, solidus, digits.
        int ahead = characters.skipBlanks(next);
        int solidus = characters.skipDigits(ahead);
        if (ahead > next && solidus > ahead && characters.at(solidus) == '/') {
            next = ahead;
            Fraction numerator = Fraction.of(new BigDecimal(digits()));
            return whole.plus(numerator.dividedBy(denominator(start)));
        }
        return whole;
    }

    private Fraction denominator(int start) throws ReactionException {
        next++;
        if (!Characters.digit(characters.at(next))) {
            throw wrong(start, next, "Write a fraction as 1/2.");
        }
        Fraction denominator = Fraction.of(new BigDecimal(digits()));
        if (denominator.signum() == 0) {
            throw wrong(start, next, "A denominator must not be 0.");
        }
        return denominator;
    }

    private String digits() throws ReactionException {
        int start = next;
        next = characters.skipDigits(start);
        if (next - start > MOST_DIGITS) {
            throw wrong(start, next, "A number in an equation has at most 9 digits.");
        }
        return characters.part(start, next);
    }

    private ReactionException wrong(int start, int end, String remedy) {
        return new ReactionException(
                "coefficient",
                "\"" + characters.part(start, Math.min(end, characters.length())) + "\"",
                "a number such as 2, 0.5 or 1/2",
                remedy,
                start + 1);
    }
}
