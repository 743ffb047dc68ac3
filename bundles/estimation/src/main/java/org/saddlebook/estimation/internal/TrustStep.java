package org.saddlebook.estimation.internal;

/** The steps from one point, for any radius: one factorisation, then a scalar search for each radius. */
final class TrustStep {
    private final NonlinearProblem problem;
    private final NonlinearProblem.Point point;
    private final int[] free;
    private final double[] scale;
    private final HouseholderQr qr;
    private final SingularValues singular;
    private final double[] gradient;
    private boolean restricted;

    TrustStep(NonlinearProblem problem, NonlinearProblem.Point point, int[] free, double[] scale) {
        this.problem = problem;
        this.point = point;
        this.free = free;
        this.scale = scale;
        int n = problem.active();
        int p = free.length;
        double[] a = new double[n * p];
        double[] y = new double[n];
        int row = 0;
        for (int i = 0; i < problem.rows; i++) {
            double root = Math.sqrt(problem.weight(i));
            if (root > 0) {
                for (int j = 0; j < p; j++) {
                    double s = scale[free[j]];
                    a[j * n + row] = s > 0 ? root * point.jacobian[i][free[j]] / s : 0;
                }
                y[row++] = root * point.residuals[i];
            }
        }
        qr = new HouseholderQr(n, p, a, y);
        singular = new SingularValues(p, qr.factor);
        gradient = singular.scaledLeftTimes(y);
    }

    /** Whether the last step was cut to the radius. */
    boolean restricted() {
        return restricted;
    }

    /** The step in the free parameters whose scaled length is at most about the radius. */
    double[] within(double radius) {
        double[] s = singular.values();
        double none = s[0] * 0x1p-50;
        double damping = 0;
        restricted = false;
        if (qr.rank < s.length || s[s.length - 1] <= none || length(0, none) > 1.1 * radius) {
            restricted = true;
            damping = damping(radius, none);
        }
        double[] inner = new double[s.length];
        for (int k = 0; k < s.length; k++) {
            inner[k] = s[k] > none || damping > 0 ? gradient[k] / (s[k] * s[k] + damping) : 0;
            if (!(Math.abs(inner[k]) < Double.POSITIVE_INFINITY)) {
                inner[k] = 0;
            }
        }
        double[] rotated = singular.rightTimes(inner);
        double[] move = new double[s.length];
        for (int k = 0; k < s.length; k++) {
            double divisor = scale[free[qr.order[k]]];
            move[qr.order[k]] = divisor > 0 ? rotated[k] / divisor : 0;
        }
        return move;
    }

    private double length(double damping, double none) {
        double[] s = singular.values();
        double sum = 0;
        for (int k = 0; k < s.length; k++) {
            if (s[k] > none || (damping > 0 && s[k] > 0)) {
                double part = gradient[k] / (s[k] * s[k] + damping);
                sum += part * part;
            }
        }
        return Math.sqrt(sum);
    }

    /** The damping that gives a step of the radius, within a tenth. */
    private double damping(double radius, double none) {
        double[] s = singular.values();
        double norm = 0;
        for (double part : gradient) {
            norm += part * part;
        }
        double high = Math.sqrt(norm) / radius;
        double low = 0;
        if (length(0, none) <= radius && s[s.length - 1] <= none) {
            // The determined part already fits: damp just enough to leave the undetermined part alone.
            return none * none + 0x1p-52 * s[0] * s[0];
        }
        double damping = high * 1e-3;
        for (int i = 0; i < 100; i++) {
            double length = length(damping, none);
            double excess = length - radius;
            if (Math.abs(excess) <= 0.1 * radius) {
                break;
            }
            if (excess > 0) {
                low = damping;
            } else {
                high = damping;
            }
            // Hebden's iteration: the inverse of the length is nearly linear in the damping.
            double slope = 0;
            for (int k = 0; k < s.length; k++) {
                double divisor = s[k] * s[k] + damping;
                slope += gradient[k] / divisor * (gradient[k] / divisor) / divisor;
            }
            double next = damping + excess / radius * length * length / slope;
            damping = next > low && next < high ? next : Math.max(1e-3 * high, Math.sqrt(low) * Math.sqrt(high));
        }
        return damping;
    }

    /** Share by which the linear prediction lowers the sum of squares. */
    double predictedShare(double[] move) {
        double lowered = 0;
        for (int i = 0; i < problem.rows; i++) {
            double weight = problem.weight(i);
            if (weight > 0) {
                double change = 0;
                for (int j = 0; j < free.length; j++) {
                    change += point.jacobian[i][free[j]] * move[j];
                }
                // r^2 - (r - c)^2
                lowered += weight * change * (2 * point.residuals[i] - change);
            }
        }
        return lowered / point.sumOfSquares;
    }
}
