package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;

/**
 * Every crossover in a range. Between two zeros of ΔH the quotient ΔG/T is monotone, because
 * {@code d(ΔG/T)/dT = −ΔH/T²} (Gibbs and Helmholtz); between two zeros of ΔCp so is ΔH. For sums of powers ΔCp T² is a
 * polynomial, whose zeros are all found, so that no crossover can be missed. Between the rows of a table, where the heat
 * capacity is close to a straight line, the same is done on eight steps.
 */
final class CrossoverSearch {
    private static final int TABLE_STEPS = 8;

    /** A turning point of ΔG/T this close to zero, relative to T ΔS, is rounding: it touches. */
    private static final double TOUCH = 1e-11;

    private final ReactionFunction function;

    /** Temperatures and values of ΔG, in order; a joint stands twice. */
    private final List<double[]> points = new ArrayList<>();

    private CrossoverSearch(ReactionFunction function) {
        this.function = function;
        for (int i = 0; i < function.size(); i++) {
            addPiece(function.piece(i));
        }
    }

    /** The crossovers in rising order; empty also when ΔG is zero throughout. */
    static List<Root> roots(ReactionFunction function) {
        return new CrossoverSearch(function).walk();
    }

    /** Temperatures between which ΔG/T is monotone, joints once, ends included. */
    static List<Double> steps(ReactionFunction function) {
        List<Double> kelvins = new ArrayList<>();
        for (double[] point : new CrossoverSearch(function).points) {
            if (kelvins.isEmpty() || point[0] > kelvins.get(kelvins.size() - 1)) {
                kelvins.add(point[0]);
            }
        }
        return kelvins;
    }

    private void addPiece(Piece piece) {
        List<Double> monotone = new ArrayList<>();
        monotone.add(piece.lower());
        if (piece.analytic()) {
            monotone.addAll(Zeros.ofPolynomial(piece.heatCapacityPolynomial(), piece.lower(), piece.upper()));
        } else {
            for (int k = 1; k < TABLE_STEPS; k++) {
                monotone.add(piece.lower() + (piece.upper() - piece.lower()) * k / TABLE_STEPS);
            }
        }
        monotone.add(piece.upper());
        List<Double> ends = new ArrayList<>(monotone);
        Zeros.signChanges(piece::enthalpy, monotone, ends);
        // Where ΔH is zero without changing sign, ΔG/T has no turning point.
        ends.sort(null);
        for (double kelvin : ends) {
            double value = function.gibbs(piece, kelvin);
            double size = Math.abs(kelvin * piece.entropy(kelvin)) + Math.abs(piece.enthalpy(kelvin));
            points.add(new double[] {kelvin, Math.abs(value) <= TOUCH * size ? 0 : value});
        }
    }

    private List<Root> walk() {
        List<Root> roots = new ArrayList<>();
        int before = -1;
        int zero = -1;
        for (int i = 0; i < points.size(); i++) {
            double y = points.get(i)[1];
            if (y == 0) {
                zero = zero < 0 ? i : zero;
                continue;
            }
            int sign = (int) Math.signum(y);
            if (before < 0) {
                if (zero >= 0) {
                    roots.add(new Root(points.get(zero)[0], Root.Kind.CROSSING, sign));
                }
            } else if (zero >= 0) {
                boolean changes = points.get(before)[1] * y < 0;
                roots.add(new Root(points.get(zero)[0], changes ? Root.Kind.CROSSING : Root.Kind.TANGENT, sign));
            } else if (points.get(before)[1] * y < 0) {
                roots.add(between(points.get(before), points.get(i), sign));
            }
            before = i;
            zero = -1;
        }
        if (zero >= 0 && before >= 0) {
            roots.add(new Root(points.get(zero)[0], Root.Kind.CROSSING, 0));
        }
        return roots;
    }

    private Root between(double[] low, double[] high, int signAbove) {
        if (low[0] == high[0]) {
            return new Root(low[0], Root.Kind.JUMP, signAbove);
        }
        Piece piece = function.piece(low[0]);
        double kelvin = Zeros.between(t -> function.gibbs(piece, t), low[0], high[0], Math.signum(low[1]));
        return new Root(kelvin, Root.Kind.CROSSING, signAbove);
    }
}
