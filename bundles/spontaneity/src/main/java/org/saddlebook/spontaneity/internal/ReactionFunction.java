package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.thermo.data.api.Segment;
import org.saddlebook.thermo.data.api.TableSegment;

/**
 * ΔH, ΔS, ΔCp and ΔG of a reaction between two temperatures, with the variance of ΔG. The uncertainties of formation
 * enthalpies and entropies are taken as independent and the same at every temperature:
 * {@code u²(ΔG) = Σ ν² (u²(ΔfH) + T² u²(S))} (JCGM 100:2008, 5.1.2).
 */
final class ReactionFunction implements GibbsFunction {
    private final Piece[] pieces;
    private final double varianceOfEnthalpy;
    private final double varianceOfEntropy;
    private final double entropyShift;

    private ReactionFunction(Piece[] pieces, double varianceOfEnthalpy, double varianceOfEntropy, double entropyShift) {
        this.pieces = pieces;
        this.varianceOfEnthalpy = varianceOfEnthalpy;
        this.varianceOfEntropy = varianceOfEntropy;
        this.entropyShift = entropyShift;
    }

    /**
     * The functions over a range; outside its own range a species is continued by its nearest segment.
     *
     * @param lower lower end, K
     * @param upper upper end, above it
     */
    static ReactionFunction of(List<Participant> participants, double lower, double upper) {
        TreeSet<Double> breaks = new TreeSet<>(List.of(lower, upper));
        double[] weights = new double[participants.size()];
        double varianceH = 0;
        double varianceS = 0;
        for (int i = 0; i < weights.length; i++) {
            Participant p = participants.get(i);
            weights[i] = p.coefficient();
            varianceH += square(weights[i] * p.data().enthalpyUncertainty().orElse(0));
            varianceS += square(weights[i] * p.data().entropyUncertainty().orElse(0));
            for (Segment segment : p.data().segments()) {
                addBetween(breaks, segment.lowerKelvin(), lower, upper);
                addBetween(breaks, segment.upperKelvin(), lower, upper);
                if (segment instanceof TableSegment table) {
                    for (double row : table.kelvins()) {
                        addBetween(breaks, row, lower, upper);
                    }
                }
            }
        }
        List<Piece> pieces = new ArrayList<>();
        double below = Double.NaN;
        for (double at : breaks) {
            if (at > lower) {
                List<Segment> segments = new ArrayList<>();
                for (Participant p : participants) {
                    segments.add(p.data().nearest((below + at) / 2));
                }
                pieces.add(Piece.sum(below, at, weights, segments));
            }
            below = at;
        }
        return new ReactionFunction(pieces.toArray(new Piece[0]), varianceH, varianceS, 0);
    }

    private static void addBetween(Set<Double> breaks, double kelvin, double lower, double upper) {
        if (kelvin > lower && kelvin < upper) {
            breaks.add(kelvin);
        }
    }

    private static double square(double value) {
        return value * value;
    }

    /** The same at a composition: {@code ΔG + R T ln Q}, so that ΔS falls by {@code R ln Q}. */
    ReactionFunction at(double lnQ) {
        return new ReactionFunction(pieces, varianceOfEnthalpy, varianceOfEntropy, Constants.GAS * lnQ);
    }

    double lower() {
        return pieces[0].lower();
    }

    double upper() {
        return pieces[pieces.length - 1].upper();
    }

    int size() {
        return pieces.length;
    }

    Piece piece(int i) {
        return pieces[i];
    }

    /** The piece that holds at a temperature, the upper one at a joint. */
    Piece piece(double kelvin) {
        int low = 0;
        int high = pieces.length - 1;
        while (low < high) {
            int middle = (low + high + 1) >>> 1;
            if (pieces[middle].lower() <= kelvin) {
                low = middle;
            } else {
                high = middle - 1;
            }
        }
        return pieces[low];
    }

    /**
     * ΔH in J/mol, ΔS in J/(mol K) and ΔG in J/mol at many temperatures. Pieces are found by walking along, which for rising
     * temperatures costs nothing.
     *
     * @param kelvin temperatures, K, best in rising order
     * @return {@code [enthalpy, entropy, gibbs][temperature]}
     */
    double[][] at(double[] kelvin) {
        double[][] values = new double[3][kelvin.length];
        int p = 0;
        for (int i = 0; i < kelvin.length; i++) {
            while (p + 1 < pieces.length && pieces[p + 1].lower() <= kelvin[i]) {
                p++;
            }
            while (p > 0 && pieces[p].lower() > kelvin[i]) {
                p--;
            }
            double h = pieces[p].enthalpy(kelvin[i]);
            double s = pieces[p].entropy(kelvin[i]) - entropyShift;
            values[0][i] = h;
            values[1][i] = s;
            values[2][i] = h - kelvin[i] * s;
        }
        return values;
    }

    double gibbs(Piece piece, double kelvin) {
        return piece.enthalpy(kelvin) - kelvin * (piece.entropy(kelvin) - entropyShift);
    }

    @Override
    public double gibbs(double kelvin) {
        return gibbs(piece(kelvin), kelvin);
    }

    @Override
    public double enthalpy(double kelvin) {
        return piece(kelvin).enthalpy(kelvin);
    }

    double entropy(double kelvin) {
        return piece(kelvin).entropy(kelvin) - entropyShift;
    }

    double heatCapacity(double kelvin) {
        return piece(kelvin).heatCapacity(kelvin);
    }

    double varianceOfEnthalpy() {
        return varianceOfEnthalpy;
    }

    double varianceOfEntropy() {
        return varianceOfEntropy;
    }

    /** (J/mol)². */
    double varianceOfGibbs(double kelvin) {
        return varianceOfEnthalpy + kelvin * kelvin * varianceOfEntropy;
    }

    @Override
    public double uncertaintyOfGibbs(double kelvin) {
        return Math.sqrt(varianceOfGibbs(kelvin));
    }
}
