package org.saddlebook.desk.api;

import java.util.ArrayList;
import java.util.List;

/**
 * Where temperatures lie across the desk: evenly in 1/T, cold on the left. Immutable; the same for every stratum, so that
 * what happens at one temperature lies on one vertical line.
 *
 * @param lowKelvin temperature at the left end, K, above 0
 * @param highKelvin temperature at the right end, K, above the low one
 * @param left x of the left end, points
 * @param right x of the right end, points, above the left one
 */
public record TemperatureScale(double lowKelvin, double highKelvin, double left, double right) {
    /** Checks the ends. */
    public TemperatureScale {
        if (!(lowKelvin > 0) || !(highKelvin > lowKelvin) || Double.isInfinite(highKelvin)) {
            throw new IllegalArgumentException("no range of temperatures: " + lowKelvin + " to " + highKelvin + " K");
        }
        if (!(right > left)) {
            throw new IllegalArgumentException("no width: " + left + " to " + right);
        }
    }

    /**
     * A mark of the scale.
     *
     * @param kelvin where, K
     * @param label what is written, in the unit asked for
     */
    public record Tick(double kelvin, String label) {}

    /** x of a temperature; beyond the ends when it lies outside. */
    public double x(double kelvin) {
        double share = (1 / lowKelvin - 1 / kelvin) / (1 / lowKelvin - 1 / highKelvin);
        return left + share * (right - left);
    }

    /** The temperature at x, K. */
    public double kelvin(double x) {
        double share = (x - left) / (right - left);
        return 1 / (1 / lowKelvin - share * (1 / lowKelvin - 1 / highKelvin));
    }

    /** Whether a temperature lies between the ends. */
    public boolean holds(double kelvin) {
        return kelvin >= lowKelvin && kelvin <= highKelvin;
    }

    /** The same, seen from a component whose origin lies at (dx, ·). */
    public TemperatureScale shifted(double dx) {
        return new TemperatureScale(lowKelvin, highKelvin, left - dx, right - dx);
    }

    /**
     * Round temperatures for labels, none closer to the next than the room asked for.
     *
     * @param zeroKelvin zero of the unit in K: 273.15 for degrees Celsius, 0 for kelvin
     * @param room least distance of neighbours, points
     */
    public List<Tick> ticks(double zeroKelvin, double room) {
        for (int step : new int[] {1, 2, 5, 10, 20, 50, 100, 200, 500, 1000}) {
            List<Tick> ticks = ticks(zeroKelvin, step);
            if (apart(ticks, room)) {
                return ticks;
            }
        }
        return List.of();
    }

    private List<Tick> ticks(double zeroKelvin, int step) {
        List<Tick> ticks = new ArrayList<>();
        long first = (long) Math.ceil((lowKelvin - zeroKelvin) / step);
        for (long i = first; i * (double) step + zeroKelvin <= highKelvin; i++) {
            long value = i * step;
            ticks.add(new Tick(value + zeroKelvin, value < 0 ? "\u2212" + -value : Long.toString(value)));
        }
        return ticks;
    }

    private boolean apart(List<Tick> ticks, double room) {
        for (int i = 1; i < ticks.size(); i++) {
            if (x(ticks.get(i).kelvin()) - x(ticks.get(i - 1).kelvin()) < room) {
                return false;
            }
        }
        return true;
    }
}
