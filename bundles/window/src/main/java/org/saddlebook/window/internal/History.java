package org.saddlebook.window.internal;

import java.util.OptionalDouble;

/**
 * A recorded or planned course of temperature.
 *
 * @param title name for people
 * @param seconds times, s, rising
 * @param kelvin temperatures, K, as many
 * @param steps whether each temperature holds until the next time; else it changes linearly between times
 * @param referenceKelvin temperature at which the equivalent age is stated, K
 * @param activationEnergy stated for the mean kinetic temperature, J/mol; empty to take the fitted one
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record History(
        String title,
        double[] seconds,
        double[] kelvin,
        boolean steps,
        double referenceKelvin,
        OptionalDouble activationEnergy) {
    double duration() {
        return seconds[seconds.length - 1] - seconds[0];
    }

    double lowest() {
        double low = kelvin[0];
        for (double each : kelvin) {
            low = Math.min(low, each);
        }
        return low;
    }

    double highest() {
        double high = kelvin[0];
        for (double each : kelvin) {
            high = Math.max(high, each);
        }
        return high;
    }

    /** Mean temperature over time, K. */
    double meanKelvin() {
        double sum = 0;
        for (int i = 1; i < seconds.length; i++) {
            double mean = steps ? kelvin[i - 1] : (kelvin[i - 1] + kelvin[i]) / 2;
            sum += mean * (seconds[i] - seconds[i - 1]);
        }
        return sum / duration();
    }
}
