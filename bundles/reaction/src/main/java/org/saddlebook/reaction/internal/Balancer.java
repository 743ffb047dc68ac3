package org.saddlebook.reaction.internal;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.reaction.api.Equation;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Imbalance;
import org.saddlebook.reaction.api.Term;

/** Balance in exact arithmetic: sums over both sides, and the null space of the matrix of elements and species. */
public final class Balancer {
    private Balancer() {}

    /** What differs between the sides. */
    public static Imbalance imbalance(Equation equation) {
        List<Imbalance.Sum> sums = new ArrayList<>();
        for (String element : elements(equation)) {
            add(element, sum(equation.reactants(), element), sum(equation.products(), element), sums);
        }
        add(Imbalance.CHARGE, charge(equation.reactants()), charge(equation.products()), sums);
        return new Imbalance(sums);
    }

    /** The smallest whole coefficients that balance; empty unless there is exactly one choice above zero. */
    public static Optional<Equation> balance(Equation equation) {
        List<Term> terms = new ArrayList<>(equation.reactants());
        terms.addAll(equation.products());
        int split = equation.reactants().size();
        Fraction[] solution = kernel(matrix(equation, terms, split), terms.size());
        if (solution.length == 0) {
            return Optional.empty();
        }
        int sign = solution[0].signum();
        for (Fraction one : solution) {
            if (sign == 0 || one.signum() != sign) {
                return Optional.empty();
            }
        }
        Fraction scale = scale(solution);
        List<Term> left = new ArrayList<>();
        List<Term> right = new ArrayList<>();
        for (int i = 0; i < solution.length; i++) {
            Fraction whole = solution[i].times(scale);
            (i < split ? left : right)
                    .add(new Term(
                            sign < 0 ? whole.negated() : whole, terms.get(i).species()));
        }
        return Optional.of(new Equation(left, equation.arrow(), right));
    }

    /** One row for each element and one for the charge; products count negative. */
    private static Fraction[][] matrix(Equation equation, List<Term> terms, int split) {
        List<Fraction[]> rows = new ArrayList<>();
        for (String element : elements(equation)) {
            Fraction[] row = new Fraction[terms.size()];
            for (int j = 0; j < row.length; j++) {
                row[j] = signed(count(terms.get(j), element), j < split);
            }
            rows.add(row);
        }
        Fraction[] charges = new Fraction[terms.size()];
        for (int j = 0; j < charges.length; j++) {
            charges[j] = signed(Fraction.of(terms.get(j).species().formula().charge()), j < split);
        }
        rows.add(charges);
        return rows.toArray(new Fraction[0][]);
    }

    /** The vector that spans the null space; empty unless the space has one dimension. Gauss-Jordan elimination. */
    private static Fraction[] kernel(Fraction[][] matrix, int columns) {
        int[] pivotRow = new int[columns];
        Arrays.fill(pivotRow, -1);
        int rank = 0;
        for (int j = 0; j < columns && rank < matrix.length; j++) {
            int found = rank;
            while (found < matrix.length && matrix[found][j].signum() == 0) {
                found++;
            }
            if (found == matrix.length) {
                continue;
            }
            Fraction[] swap = matrix[found];
            matrix[found] = matrix[rank];
            matrix[rank] = swap;
            Fraction pivot = swap[j];
            for (int k = 0; k < columns; k++) {
                swap[k] = swap[k].dividedBy(pivot);
            }
            for (int i = 0; i < matrix.length; i++) {
                if (i != rank && matrix[i][j].signum() != 0) {
                    Fraction factor = matrix[i][j];
                    for (int k = 0; k < columns; k++) {
                        matrix[i][k] = matrix[i][k].minus(factor.times(swap[k]));
                    }
                }
            }
            pivotRow[j] = rank++;
        }
        if (rank != columns - 1) {
            return new Fraction[0];
        }
        int free = 0;
        while (pivotRow[free] >= 0) {
            free++;
        }
        Fraction[] solution = new Fraction[columns];
        for (int j = 0; j < columns; j++) {
            solution[j] = j == free ? Fraction.ONE : matrix[pivotRow[j]][free].negated();
        }
        return solution;
    }

    /** What makes them whole numbers without a common divisor. */
    private static Fraction scale(Fraction[] solution) {
        BigInteger multiple = BigInteger.ONE;
        for (Fraction one : solution) {
            multiple = multiple.multiply(one.denominator()).divide(multiple.gcd(one.denominator()));
        }
        BigInteger divisor = BigInteger.ZERO;
        for (Fraction one : solution) {
            divisor = divisor.gcd(one.numerator().multiply(multiple).divide(one.denominator()));
        }
        return new Fraction(multiple, divisor);
    }

    private static void add(String of, Fraction left, Fraction right, List<Imbalance.Sum> sums) {
        if (!left.equals(right)) {
            sums.add(new Imbalance.Sum(of, left, right));
        }
    }

    private static Set<String> elements(Equation equation) {
        Set<String> elements = new TreeSet<>();
        for (List<Term> side : List.of(equation.reactants(), equation.products())) {
            for (Term term : side) {
                elements.addAll(term.species().formula().elements().keySet());
            }
        }
        return elements;
    }

    private static Fraction sum(List<Term> side, String element) {
        Fraction sum = Fraction.ZERO;
        for (Term term : side) {
            sum = sum.plus(term.coefficient().times(count(term, element)));
        }
        return sum;
    }

    private static Fraction charge(List<Term> side) {
        Fraction sum = Fraction.ZERO;
        for (Term term : side) {
            sum = sum.plus(term.coefficient()
                    .times(Fraction.of(term.species().formula().charge())));
        }
        return sum;
    }

    private static Fraction count(Term term, String element) {
        Map<String, Fraction> elements = term.species().formula().elements();
        return elements.getOrDefault(element, Fraction.ZERO);
    }

    private static Fraction signed(Fraction value, boolean left) {
        return left ? value : value.negated();
    }
}
