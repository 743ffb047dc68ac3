package org.saddlebook.window.internal;

/**
 * What holds at each temperature of a list.
 *
 * @param kelvin temperatures, K, rising
 * @param all probability that all limits hold there, pointwise
 * @param alone probability of each limit alone, {@code [temperature][limit]}
 * @param bits for which draws all hold, {@code [temperature][word]}
 * @param draws number of draws
 */
@SuppressWarnings("ArrayRecordComponent") // compared by nobody; handed over inside this package only
record Held(double[] kelvin, double[] all, double[][] alone, long[][] bits, int draws) {
    /** Probability that all limits hold at every temperature from index {@code from} to {@code to}, both included. */
    double throughout(int from, int to) {
        int words = bits[from].length;
        int holding = 0;
        for (int w = 0; w < words; w++) {
            long both = -1L;
            for (int t = from; t <= to; t++) {
                both &= bits[t][w];
            }
            holding += Long.bitCount(both);
        }
        return (double) holding / draws;
    }
}
