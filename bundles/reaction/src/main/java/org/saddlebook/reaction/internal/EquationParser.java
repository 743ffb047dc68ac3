package org.saddlebook.reaction.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.Formula;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.ReactionException;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.reaction.api.Term;

/** Reads formulas, species and equations. */
public final class EquationParser {
    /** Longest first: the first that fits is taken. */
    private static final String[] ARROWS = {
        "<-->", "<==>", "<=>", "<->", "-->", "==>", "=>", "->", "=", "⇌", "⇄", "⇆", "⇋", "↔", "⟷", "→", "⟶", "⇒"
    };

    private static final int SIGNS_BOTH = 4;

    private final Characters characters;

    private EquationParser(String text) throws ReactionException {
        if (text.length() > Characters.LONGEST) {
            throw new ReactionException(
                    "equation-too-long",
                    text.length() + " characters",
                    "at most " + Characters.LONGEST + " characters",
                    "Write one reaction only.",
                    1);
        }
        characters = new Characters(text);
    }

    /** A formula alone. */
    public static Formula formula(String text) throws ReactionException {
        EquationParser parser = new EquationParser(text);
        FormulaReader.Read read = FormulaReader.at(parser.characters, parser.characters.skipBlanks(0));
        parser.end(read.end());
        return read.formula();
    }

    /** A species alone. */
    public static Species species(String text) throws ReactionException {
        EquationParser parser = new EquationParser(text);
        SpeciesRead read = parser.speciesAt(parser.characters.skipBlanks(0));
        parser.end(read.end);
        return read.species;
    }

    /** An equation. */
    public static Equation equation(String text) throws ReactionException {
        EquationParser parser = new EquationParser(text);
        int at = -1;
        String arrow = "";
        int i = 0;
        while (i < parser.characters.length()) {
            String found = parser.arrowAt(i);
            if (found.isEmpty()) {
                i++;
                continue;
            }
            if (at >= 0) {
                throw new ReactionException(
                        "several-arrows",
                        "\"" + arrow + "\" and \"" + found + "\"",
                        "one arrow",
                        "Write each reaction in its own equation.",
                        i + 1);
            }
            at = i;
            arrow = found;
            i += found.length();
        }
        if (at < 0) {
            throw new ReactionException(
                    "missing-arrow",
                    "\"" + text + "\"",
                    "an arrow or = between the sides",
                    "Write an equation such as N2(g) + 3 H2(g) = 2 NH3(g).",
                    1);
        }
        if (arrow.startsWith("--") && at > 0 && parser.characters.at(at - 1) != ' ') {
            throw new ReactionException(
                    "ambiguous-arrow",
                    "\"" + arrow + "\" right behind a species",
                    "a blank before the arrow",
                    "Put blanks around the arrow, so that its dash cannot be taken for a charge.",
                    at + 1);
        }
        List<Term> left = parser.side(0, at);
        return new Equation(left, meaning(arrow), new EquationParser(text).side(at + arrow.length(), text.length()));
    }

    private String arrowAt(int i) {
        for (String arrow : ARROWS) {
            if (characters.starts(arrow, i)) {
                return arrow;
            }
        }
        return "";
    }

    private static Equation.Arrow meaning(String arrow) {
        if (arrow.equals("=")) {
            return Equation.Arrow.EQUALS;
        }
        int index = List.of(ARROWS).indexOf(arrow);
        boolean both = index < SIGNS_BOTH || "⇌⇄⇆⇋↔⟷".contains(arrow);
        return both ? Equation.Arrow.REVERSIBLE : Equation.Arrow.FORWARD;
    }

    /** The terms between two indices. */
    private List<Term> side(int from, int to) throws ReactionException {
        // Cut off what lies behind, so that a charge at the end sees the end.
        Characters cut = new Characters(characters.part(0, to));
        EquationParser parser = new EquationParser(cut);
        List<Term> terms = new ArrayList<>();
        int i = cut.skipBlanks(from);
        while (true) {
            char c = cut.at(i);
            if (c == '-') {
                throw new ReactionException(
                        "coefficient",
                        "a minus before a species",
                        "a coefficient above zero",
                        "Write the species on the other side of the equation.",
                        i + 1);
            }
            Fraction coefficient = Fraction.ONE;
            if (NumberReader.startsAt(cut, i)) {
                NumberReader.Read number = NumberReader.coefficient(cut, i);
                coefficient = number.value();
                i = cut.skipBlanks(number.end());
            }
            if (cut.at(i) == '\n' || cut.at(i) == '+') {
                throw new ReactionException(
                        "missing-species",
                        cut.at(i) == '+' ? "\"+\"" : "nothing",
                        "a species",
                        "Write a species on both sides of the arrow and of every plus.",
                        i + 1);
            }
            SpeciesRead read = parser.speciesAt(i);
            terms.add(new Term(coefficient, read.species));
            i = cut.skipBlanks(read.end);
            if (i >= cut.length()) {
                return terms;
            }
            if (cut.at(i) != '+') {
                throw new ReactionException(
                        "formula-syntax",
                        "\"" + cut.at(i) + "\"",
                        "a plus or the end of the side",
                        "Join species with a plus that has blanks on both sides.",
                        i + 1);
            }
            i = cut.skipBlanks(i + 1);
        }
    }

    private EquationParser(Characters characters) {
        this.characters = characters;
    }

    private record SpeciesRead(Species species, int end) {}

    private SpeciesRead speciesAt(int start) throws ReactionException {
        FormulaReader.Read read = FormulaReader.at(characters, start);
        int open = characters.skipBlanks(read.end());
        if (!characters.phaseAt(open)) {
            return new SpeciesRead(new Species(read.formula(), Optional.empty(), ""), read.end());
        }
        int close = open;
        while (characters.at(close) != ')') {
            if (characters.at(close) == '\n') {
                throw phase(open, characters.part(open, characters.length()));
            }
            close++;
        }
        String inside = characters.part(open + 1, close);
        int comma = inside.indexOf(',');
        String symbol = (comma < 0 ? inside : inside.substring(0, comma)).strip();
        String modification = comma < 0 ? "" : inside.substring(comma + 1).strip();
        Phase phase = switch (symbol) {
            case "g" -> Phase.GAS;
            case "l" -> Phase.LIQUID;
            case "s", "cr" -> Phase.SOLID;
            case "aq" -> Phase.AQUEOUS;
            default -> throw phase(open, characters.part(open, close + 1));
        };
        return new SpeciesRead(new Species(read.formula(), Optional.of(phase), modification), close + 1);
    }

    private static ReactionException phase(int open, String found) {
        return new ReactionException(
                "unknown-phase",
                "\"" + found + "\"",
                "(g), (l), (s) or (aq)",
                "Write one of these; a modification follows after a comma, as in C(s,graphite).",
                open + 1);
    }

    private void end(int i) throws ReactionException {
        int rest = characters.skipBlanks(i);
        if (rest < characters.length()) {
            throw new ReactionException(
                    "formula-syntax",
                    "\"" + characters.part(rest, characters.length()) + "\"",
                    "the end of the formula",
                    "Write one formula only.",
                    rest + 1);
        }
    }
}
