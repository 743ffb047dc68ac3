package org.saddlebook.estimation.internal;

import org.saddlebook.estimation.api.ResponseFunction;

/** A response with its observations, weights and bounds. */
public final class NonlinearProblem {
    final int rows;
    final int columns;
    final double[] response;
    final double[] weightsOrNull;
    final double[] lower;
    final double[] upper;
    final Runnable check;

    private final ResponseFunction function;
    private final int active;
    private final double responseNorm;

    /** A problem of checked inputs. */
    public NonlinearProblem(
            ResponseFunction function,
            double[] response,
            double[] weightsOrNull,
            double[] lower,
            double[] upper,
            Runnable check) {
        this.function = function;
        this.rows = function.observations();
        this.columns = function.parameterCount();
        this.response = response;
        this.weightsOrNull = weightsOrNull;
        this.lower = lower;
        this.upper = upper;
        this.check = check;
        int count = 0;
        double sum = 0;
        for (int i = 0; i < rows; i++) {
            if (weight(i) > 0) {
                count++;
                sum += weight(i) * response[i] * response[i];
            }
        }
        active = count;
        responseNorm = Math.sqrt(sum);
    }

    /** Observations with a weight above zero. */
    public int active() {
        return active;
    }

    double responseNorm() {
        return responseNorm;
    }

    double weight(int i) {
        return weightsOrNull == null ? 1 : weightsOrNull[i];
    }

    /** A point where the response and its derivatives are known, or known not to be defined. */
    final class Point {
        final double[] parameters;
        final double[] residuals = new double[rows];
        final double[][] jacobian = new double[rows][columns];
        /** Weighted sum of squares; NaN where the response is not defined. */
        final double sumOfSquares;

        Point(double[] parameters) {
            this.parameters = parameters;
            function.evaluate(parameters.clone(), residuals, jacobian);
            boolean finite = true;
            for (int i = 0; i < rows; i++) {
                residuals[i] = response[i] - residuals[i];
                if (weight(i) > 0) {
                    for (int j = 0; j < columns; j++) {
                        finite &= Math.abs(jacobian[i][j]) < Double.POSITIVE_INFINITY;
                    }
                }
            }
            double value = finite ? sumOfSquares(residuals) : Double.NaN;
            sumOfSquares = value < Double.POSITIVE_INFINITY ? value : Double.NaN;
        }

        boolean defined() {
            return !Double.isNaN(sumOfSquares);
        }

        /** {@code J' W r} for one column: half the downhill slope along that parameter. */
        double slope(int column) {
            Wide sum = new Wide();
            for (int i = 0; i < rows; i++) {
                double weight = weight(i);
                if (weight > 0) {
                    sum.addProduct(weight * jacobian[i][column], 0, residuals[i], 0);
                }
            }
            return sum.value();
        }

        /** Parameters that can move: inside the bounds or pulled back inside. */
        int[] free() {
            int[] result = new int[columns];
            int count = 0;
            for (int j = 0; j < columns; j++) {
                boolean held =
                        (parameters[j] <= lower[j] && slope(j) <= 0) || (parameters[j] >= upper[j] && slope(j) >= 0);
                if (!held) {
                    result[count++] = j;
                }
            }
            return java.util.Arrays.copyOf(result, count);
        }

        /** The linear problem {@code J d = r} in the free parameters. */
        LinearSolution linearised(int[] free) {
            double[] flat = new double[rows * free.length];
            double[] right = residuals.clone();
            for (int i = 0; i < rows; i++) {
                if (weight(i) > 0) {
                    for (int j = 0; j < free.length; j++) {
                        flat[i * free.length + j] = jacobian[i][free[j]];
                    }
                } else {
                    right[i] = 0;
                }
            }
            return LinearSolver.solve(new Design(rows, free.length, flat, null), right, weightsOrNull);
        }
    }

    /** Weighted sum of squares, accumulated in double-double. */
    double sumOfSquares(double[] residuals) {
        Wide sum = new Wide();
        for (int i = 0; i < rows; i++) {
            double weight = weight(i);
            if (weight > 0) {
                double r = residuals[i];
                double weighted = weight * r;
                sum.addProduct(weighted, Math.fma(weight, r, -weighted), r, 0);
            }
        }
        return sum.value();
    }

    Point at(double[] parameters) {
        return new Point(parameters);
    }

    /** Moves parameters onto the bounds they violate. */
    double[] clip(double[] parameters) {
        for (int j = 0; j < columns; j++) {
            parameters[j] = Math.max(lower[j], Math.min(upper[j], parameters[j]));
        }
        return parameters;
    }
}
