package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.saddlebook.api.quantity.Constants;

/**
 * What a course of temperature achieves at one set temperature: {@code ∫k(T(t))dt} against what a conversion needs, for every
 * draw; for a reversible first-order law the conversion itself, followed through the course.
 *
 * <p>For {@code dx/dt = k(1 − x) − (k/K)x} a short piece moves x by {@code (x∞ − x)(1 − exp(−(1 + 1/K)∫k dt))} with
 * {@code x∞ = K/(1 + K)}, exact where the temperature stays; on ramps K is taken in the middle of a short piece and ∫k dt
 * by Gauss and Legendre's two points. Pieces whose traces later ones wipe out (exp(−40) is left) or that move nothing (1e-6) are
 * left out.
 */
final class CourseProgress {
    /** ln of a share of ∫k dt that changes no digit that is shown. */
    private static final double NEGLIGIBLE = -15;

    private static final double WIPED = 40;
    private static final double IDLE = 1e-6;

    private final double thermal;
    private final double sign;
    private final double lnNeeded;
    private final double conversion;
    private final List<double[]> nodes;
    private final List<double[]> pieces;
    private final Optional<StatedBarrier> barrier;
    private final Optional<Thermo> thermo;

    private CourseProgress(
            double kelvin,
            Course course,
            RateLaw law,
            double conversion,
            double sign,
            Limit limit,
            Optional<Thermo> thermo) {
        thermal = Constants.GAS * kelvin;
        this.sign = sign;
        this.conversion = conversion;
        this.thermo = thermo;
        barrier = limit.stated();
        boolean irreversible = law.irreversible();
        lnNeeded = irreversible ? law.lnProgress(conversion) : 0;
        nodes = irreversible ? course.nodes(kelvin) : List.of();
        pieces = irreversible ? List.of() : course.pieces(kelvin);
    }

    /** The progress that a limit with a course asks for. */
    static CourseProgress of(Limit limit, double kelvin, Optional<Thermo> thermo) {
        if (limit instanceof Limit.Time time) {
            return new CourseProgress(
                    kelvin, time.course().orElseThrow(), time.law(), time.conversion(), 1, limit, thermo);
        }
        if (limit instanceof Limit.Hold hold) {
            return new CourseProgress(
                    kelvin, hold.course().orElseThrow(), hold.law(), hold.conversion(), -1, limit, thermo);
        }
        throw new IllegalArgumentException("no course: " + limit.kind());
    }

    /** Headroom at the best estimates, J/mol: {@code ±RT ln(∫k dt / needed)}, or RT ln of the odds ratio of conversions. */
    double best(Optional<BoundLaw> law) {
        if (!pieces.isEmpty()) {
            double x = 0;
            for (Piece piece : pieces(law.orElseThrow())) {
                double far = 1 / (1 + piece.back());
                x = far + (x - far) * StrictMath.exp(-StrictMath.exp(piece.lnProgress()) * (1 + piece.back()));
            }
            return odds(x);
        }
        double most = Double.NEGATIVE_INFINITY;
        double[] terms = new double[nodes.size()];
        for (int j = 0; j < terms.length; j++) {
            terms[j] = lnTerm(j, law);
            most = Math.max(most, terms[j]);
        }
        double sum = 0;
        for (double term : terms) {
            sum += StrictMath.exp(term - most);
        }
        return sign * thermal * (most + StrictMath.log(sum) - lnNeeded);
    }

    /** RT ln of the odds of a conversion over the odds of the one needed. */
    private double odds(double x) {
        return thermal * (StrictMath.log(x / (1 - x)) - StrictMath.log(conversion / (1 - conversion)));
    }

    private double lnTerm(int j, Optional<BoundLaw> law) {
        double kelvin = nodes.get(j)[0];
        double lnRate = barrier.isPresent()
                ? barrier.get().lnRate(kelvin)
                : law.orElseThrow().at(kelvin).lnRate();
        return lnRate + StrictMath.log(nodes.get(j)[1]);
    }

    /**
     * Headroom for every draw of a chunk, J/mol.
     *
     * @param exact whether the value matters, not only its sign
     */
    void headroom(Chunk chunk, int stated, boolean exact, double[] headroom) {
        if (!pieces.isEmpty()) {
            reversible(chunk, exact, headroom);
            return;
        }
        int count = nodes.size();
        double[] terms = new double[count];
        double most = Double.NEGATIVE_INFINITY;
        for (int j = 0; j < count; j++) {
            terms[j] = lnTerm(j, chunk.law());
            most = Math.max(most, terms[j]);
        }
        double[] sum = new double[headroom.length];
        double[] deviation = new double[headroom.length];
        for (int j = 0; j < count; j++) {
            double kelvin = nodes.get(j)[0];
            if (terms[j] - most < NEGLIGIBLE) {
                continue;
            }
            if (barrier.isPresent()) {
                double[][] drawn = chunk.stated(stated);
                double ofEnergy = barrier.get().ofEnergy(kelvin);
                double ofSecond = barrier.get().ofSecond();
                for (int d = 0; d < deviation.length; d++) {
                    deviation[d] = ofEnergy * drawn[0][d] + ofSecond * drawn[1][d];
                }
            } else {
                chunk.rates(chunk.law().orElseThrow().at(kelvin), deviation);
            }
            double base = terms[j] - most;
            for (int d = 0; d < deviation.length; d++) {
                sum[d] += FastExp.exp(base + deviation[d]);
            }
        }
        double needed = lnNeeded - most;
        double least = StrictMath.exp(needed);
        for (int d = 0; d < headroom.length; d++) {
            headroom[d] = exact ? sign * thermal * (StrictMath.log(sum[d]) - needed) : sign * (sum[d] - least);
        }
    }

    /**
     * A piece at the best estimates.
     *
     * @param kelvin its middle, K
     * @param lnProgress ln ∫k dt
     * @param back 1/K
     */
    private record Piece(double kelvin, double lnProgress, double back) {
        double relaxation() {
            return StrictMath.exp(lnProgress) * (1 + back);
        }
    }

    private List<Piece> pieces(BoundLaw law) {
        double half = 0.5 / Math.sqrt(3);
        List<Piece> all = new ArrayList<>();
        double[] later = new double[pieces.size() + 1];
        for (double[] piece : pieces) {
            double middle = (piece[0] + piece[1]) / 2;
            double reach = half * (piece[1] - piece[0]);
            double mean = (StrictMath.exp(law.at(middle - reach).lnRate())
                            + StrictMath.exp(law.at(middle + reach).lnRate()))
                    / 2;
            double back = StrictMath.exp(-thermo.orElseThrow().lnEquilibrium(middle));
            all.add(new Piece(middle, StrictMath.log(mean * piece[2]), back));
        }
        for (int i = all.size() - 1; i >= 0; i--) {
            later[i] = later[i + 1] + all.get(i).relaxation();
        }
        List<Piece> kept = new ArrayList<>();
        double before = 0;
        for (int i = 0; i < all.size(); i++) {
            boolean wiped = later[i + 1] > WIPED;
            before += all.get(i).relaxation();
            boolean idle = before < IDLE || later[i] < IDLE;
            if (!wiped && !idle) {
                kept.add(all.get(i));
            }
        }
        return kept.isEmpty() ? all : kept;
    }

    private void reversible(Chunk chunk, boolean exact, double[] headroom) {
        int size = headroom.length;
        BoundLaw law = chunk.law().orElseThrow();
        double[] x = new double[size];
        double[] rates = new double[size];
        double[][] drawn = chunk.thermo();
        for (Piece piece : pieces(law)) {
            chunk.rates(law.at(piece.kelvin()), rates);
            double lnBack = StrictMath.log(piece.back());
            double ofEnthalpy = 1 / (Constants.GAS * piece.kelvin());
            double ofEntropy = -1 / Constants.GAS;
            for (int d = 0; d < size; d++) {
                double progress = FastExp.exp(piece.lnProgress() + rates[d]);
                double back = FastExp.exp(lnBack + ofEnthalpy * drawn[0][d] + ofEntropy * drawn[1][d]);
                double far = 1 / (1 + back);
                x[d] = far + (x[d] - far) * FastExp.exp(-progress * (1 + back));
            }
        }
        for (int d = 0; d < size; d++) {
            headroom[d] = exact ? odds(x[d]) : x[d] - conversion;
        }
    }
}
