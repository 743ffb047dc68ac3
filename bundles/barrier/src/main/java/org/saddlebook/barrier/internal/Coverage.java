package org.saddlebook.barrier.internal;

/**
 * How often intervals of 95 % hold the truth, as measured by the coverage program of the estimation bundle (20,000 campaigns
 * for each number, slope of a straight law at 5 % scatter, n points from 40 to 80 degrees Celsius; its table is in the
 * README of that bundle and in the documents).
 */
final class Coverage {
    static final String T =
            "Measured coverage of 95 % t intervals: 94.7 to 95.3 % (slope, intercept and prediction of a"
                    + " straight law, n = 4 to 8).";
    static final String PROFILE =
            "Measured coverage of 95 % profile intervals: 94.8 to 95.1 % (slope fitted to k itself, n = 4 to 12).";
    static final String RESIDUAL = "Measured coverage of 95 % intervals from residuals: 79.5 % at n = 4, 85.0 % at 5,"
            + " 88.2 % at 6, 89.9 % at 8, 92.4 % at 12; BCa 79.6, 84.9, 88.0, 89.8, 92.2 %.";
    static final String CASE = "Measured coverage of 95 % intervals from whole points: 91.8 % at n = 4, 90.1 % at 5,"
            + " 91.1 % at 6, 90.5 % at 8, 91.3 % at 12; BCa 90.2, 90.5, 91.5, 90.9, 91.3 %.";
    static final String PARAMETRIC =
            "Measured coverage of 95 % intervals from normal errors: 81.3 % at n = 4, 85.7 % at"
                    + " 5, 88.5 % at 6, 90.0 % at 8, 92.4 % at 12; BCa 81.3, 85.6, 88.3, 90.0, 92.3 %.";
    static final String MONTE_CARLO = "Measured coverage of 95 % intervals from multivariate-t draws: 94.9 to 95.3 %"
            + " (prediction of a straight law, n = 4 to 12).";
    static final String ROBUST =
            "Intervals from these standard errors would cover less than they say: measured for 95 %,"
                    + " Huber 90.8, 89.1, 92.4, 92.8, 93.7 % and bisquare 84.4, 86.8, 90.0, 91.0, 93.0 % at n = 4, 5, 6, 8, 12.";
    static final String BLOCKS =
            "Measured coverage of 95 % intervals with blocks: 94.5 to 95.0 % when every block spans"
                    + " the temperatures; 90.3 % with three blocks at one temperature each, 94.5 to 95.5 % with four to eight."
                    + " Ignoring such blocks covers 59.6 to 71.3 %.";

    private Coverage() {}
}
