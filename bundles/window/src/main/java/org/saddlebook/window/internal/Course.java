package org.saddlebook.window.internal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * A recorded or planned course of temperature that a limit is judged over. Each point states a temperature, or stands for the
 * temperature of the window's axis (the set temperature, with an offset): {@code 20 °C, heated to T within 1 h, held for 6 h}.
 * Between points the temperature changes linearly, or by steps.
 */
final class Course {
    /** Gauss and Legendre's points and weights on (0, 1), six of them: exact for polynomials of degree 11. */
    private static final double[] POINTS = {
        0.03376524289842399,
        0.16939530676686776,
        0.3806904069584015,
        0.6193095930415985,
        0.8306046932331324,
        0.966234757101576
    };

    private static final double[] WEIGHTS = {
        0.08566224618958516,
        0.18038078652406930,
        0.23395696728634552,
        0.23395696728634552,
        0.18038078652406930,
        0.08566224618958516
    };

    /** A ramp is integrated in parts of at most so many kelvin, in which ln k stays close to a polynomial. */
    private static final double PART = 60;

    /** Temperatures closer than this are the same, K. */
    private static final double SAME = 1e-7;

    /** Where the order matters, a ramp is followed in pieces of at most so many kelvin. */
    private static final double PIECE = 10;

    /** Courses with more stretches than this are gathered into classes of temperature. */
    private static final int MOST_NODES = 48;

    private static final int CLASSES = 16;

    private final double[] seconds;
    private final double[] value;
    private final boolean[] follows;
    private final boolean steps;
    private final List<double[]> fixedNodes;
    private final List<double[]> followingNodes;

    /**
     * A course.
     *
     * @param seconds times, s, rising
     * @param value temperature in K, or, where it follows, offset from the set temperature in K
     * @param follows which points follow the set temperature
     * @param steps whether each temperature holds until the next time
     */
    Course(double[] seconds, double[] value, boolean[] follows, boolean steps) {
        this.seconds = seconds.clone();
        this.value = value.clone();
        this.follows = follows.clone();
        this.steps = steps;
        List<double[]> fixed = new ArrayList<>();
        List<double[]> following = new ArrayList<>();
        for (int i = 0; i + 1 < seconds.length; i++) {
            boolean level = steps || follows[i] == follows[i + 1];
            if (level) {
                stretch(follows[i] ? following : fixed, value[i], steps ? value[i] : value[i + 1], span(i));
            }
        }
        fixedNodes = gathered(fixed);
        followingNodes = gathered(following);
    }

    private double span(int i) {
        return seconds[i + 1] - seconds[i];
    }

    double duration() {
        return seconds[seconds.length - 1] - seconds[0];
    }

    /** Whether the temperature of the axis matters at all. */
    boolean follows() {
        for (boolean one : follows) {
            if (one) {
                return true;
            }
        }
        return false;
    }

    /** Number of stretches between points. */
    int stretches() {
        return seconds.length - 1;
    }

    private static void stretch(List<double[]> nodes, double from, double to, double span) {
        if (from == to) {
            nodes.add(new double[] {from, span});
            return;
        }
        int parts = (int) Math.max(1, Math.ceil(Math.abs(to - from) / PART));
        for (int p = 0; p < parts; p++) {
            for (int g = 0; g < POINTS.length; g++) {
                double share = (p + POINTS[g]) / parts;
                nodes.add(new double[] {from + share * (to - from), span * WEIGHTS[g] / parts});
            }
        }
    }

    /** Many nodes in classes: two nodes for each class, at its mean plus and minus its spread, exact to the third moment. */
    private static List<double[]> gathered(List<double[]> nodes) {
        if (nodes.size() <= MOST_NODES) {
            return List.copyOf(nodes);
        }
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (double[] node : nodes) {
            low = Math.min(low, node[0]);
            high = Math.max(high, node[0]);
        }
        double width = Math.max(1e-9, (high - low) / CLASSES);
        double[] time = new double[CLASSES];
        double[] sum = new double[CLASSES];
        double[] square = new double[CLASSES];
        for (double[] node : nodes) {
            int i = (int) Math.min(CLASSES - 1.0, (node[0] - low) / width);
            double beyond = node[0] - (low + (i + 0.5) * width);
            time[i] += node[1];
            sum[i] += node[1] * beyond;
            square[i] += node[1] * beyond * beyond;
        }
        List<double[]> gathered = new ArrayList<>();
        for (int i = 0; i < CLASSES; i++) {
            if (time[i] > 0) {
                double mean = sum[i] / time[i];
                double spread = Math.sqrt(Math.max(0, square[i] / time[i] - mean * mean));
                double middle = low + (i + 0.5) * width + mean;
                gathered.add(new double[] {middle - spread, time[i] / 2});
                gathered.add(new double[] {middle + spread, time[i] / 2});
            }
        }
        return List.copyOf(gathered);
    }

    /**
     * Temperatures and the time spent there, so that {@code ∫k(T(t))dt = Σ s k(T)}.
     *
     * @param setKelvin the set temperature, K
     * @return {@code [K, s]} for each
     */
    List<double[]> nodes(double setKelvin) {
        List<double[]> nodes = new ArrayList<>(fixedNodes);
        for (double[] node : followingNodes) {
            nodes.add(new double[] {setKelvin + node[0], node[1]});
        }
        for (int i = 0; i + 1 < seconds.length; i++) {
            if (!steps && follows[i] != follows[i + 1]) {
                stretch(nodes, kelvin(i, setKelvin), kelvin(i + 1, setKelvin), span(i));
            }
        }
        return merged(nodes);
    }

    /** Times at the same temperature together, as on the way up and down between the same two. */
    private static List<double[]> merged(List<double[]> nodes) {
        List<double[]> sorted = new ArrayList<>(nodes);
        sorted.sort(Comparator.comparingDouble(node -> node[0]));
        List<double[]> merged = new ArrayList<>();
        for (double[] node : sorted) {
            double[] last = merged.isEmpty() ? null : merged.get(merged.size() - 1);
            if (last != null && node[0] - last[0] < SAME) {
                last[1] += node[1];
            } else {
                merged.add(node.clone());
            }
        }
        return merged;
    }

    /**
     * The course cut into short pieces in order of time, for what depends on the order.
     *
     * @return {@code [K at the start, K at the end, s]} for each
     */
    List<double[]> pieces(double setKelvin) {
        List<double[]> pieces = new ArrayList<>();
        for (int i = 0; i + 1 < seconds.length; i++) {
            double from = kelvin(i, setKelvin);
            double to = steps ? from : kelvin(i + 1, setKelvin);
            int parts = from == to ? 1 : (int) Math.max(2, Math.ceil(Math.abs(to - from) / PIECE));
            for (int p = 0; p < parts; p++) {
                double at = from + (to - from) * p / parts;
                double until = from + (to - from) * (p + 1) / parts;
                pieces.add(new double[] {at, until, span(i) / parts});
            }
        }
        return pieces;
    }

    private double kelvin(int i, double setKelvin) {
        return follows[i] ? setKelvin + value[i] : value[i];
    }

    /** Coldest and hottest stated temperature, K; empty where every point follows. */
    double[] stated() {
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < value.length; i++) {
            if (!follows[i]) {
                low = Math.min(low, value[i]);
                high = Math.max(high, value[i]);
            }
        }
        return low <= high ? new double[] {low, high} : new double[0];
    }
}
