package org.saddlebook.estimation.api;

/** The models of the certified non-linear sets with their derivatives; formulas as the certificates state them. */
final class ReferenceModels {
    private ReferenceModels() {}

    /** A curve y(x; b) with its gradient. */
    interface Curve {
        double value(double x, double[] b, double[] gradient);
    }

    static ResponseFunction over(double[] x, int parameters, Curve curve) {
        return new ResponseFunction() {
            @Override
            public int observations() {
                return x.length;
            }

            @Override
            public int parameterCount() {
                return parameters;
            }

            @Override
            public void evaluate(double[] p, double[] values, double[][] jacobian) {
                for (int i = 0; i < x.length; i++) {
                    values[i] = curve.value(x[i], p, jacobian[i]);
                }
            }
        };
    }

    static Curve curve(String name) {
        return switch (name) {
            case "Bennett5" -> ReferenceModels::bennett;
            case "Chwirut1", "Chwirut2" -> ReferenceModels::chwirut;
            case "DanWood" -> ReferenceModels::power;
            case "ENSO" -> ReferenceModels::cycles;
            case "Eckerle4" -> ReferenceModels::bell;
            case "Gauss1", "Gauss3" -> ReferenceModels::peaks;
            case "Kirby2" -> ReferenceModels::rational;
            case "Lanczos1", "Lanczos3" -> ReferenceModels::threeExponentials;
            case "MGH10" -> ReferenceModels::meyer;
            case "MGH17" -> ReferenceModels::osborne;
            case "Misra1a" -> ReferenceModels::misraA;
            case "Misra1b" -> ReferenceModels::misraB;
            case "Misra1c" -> ReferenceModels::misraC;
            case "Rat42" -> ReferenceModels::sigmoid;
            case "Roszman1" -> ReferenceModels::roszman;
            default -> throw new IllegalArgumentException(name);
        };
    }

    private static double bennett(double x, double[] b, double[] g) {
        double log = StrictMath.log(b[1] + x);
        double power = StrictMath.exp(-log / b[2]);
        g[0] = power;
        g[1] = -b[0] / b[2] * power / (b[1] + x);
        g[2] = b[0] * power * log / (b[2] * b[2]);
        return b[0] * power;
    }

    private static double chwirut(double x, double[] b, double[] g) {
        double decay = StrictMath.exp(-b[0] * x);
        double divisor = b[1] + b[2] * x;
        double y = decay / divisor;
        g[0] = -x * y;
        g[1] = -y / divisor;
        g[2] = -x * y / divisor;
        return y;
    }

    private static double power(double x, double[] b, double[] g) {
        double power = StrictMath.pow(x, b[1]);
        g[0] = power;
        g[1] = b[0] * power * StrictMath.log(x);
        return b[0] * power;
    }

    private static double cycles(double x, double[] b, double[] g) {
        double turn = 2 * Math.PI * x;
        g[0] = 1;
        g[1] = StrictMath.cos(turn / 12);
        g[2] = StrictMath.sin(turn / 12);
        double y = b[0] + b[1] * g[1] + b[2] * g[2];
        for (int k = 3; k < 9; k += 3) {
            g[k + 1] = StrictMath.cos(turn / b[k]);
            g[k + 2] = StrictMath.sin(turn / b[k]);
            g[k] = (b[k + 1] * g[k + 2] - b[k + 2] * g[k + 1]) * turn / (b[k] * b[k]);
            y += b[k + 1] * g[k + 1] + b[k + 2] * g[k + 2];
        }
        return y;
    }

    private static double bell(double x, double[] b, double[] g) {
        double z = (x - b[2]) / b[1];
        double e = StrictMath.exp(-0.5 * z * z);
        double y = b[0] / b[1] * e;
        g[0] = e / b[1];
        g[1] = y * (z * z - 1) / b[1];
        g[2] = y * z / b[1];
        return y;
    }

    private static double peaks(double x, double[] b, double[] g) {
        g[0] = StrictMath.exp(-b[1] * x);
        g[1] = -x * b[0] * g[0];
        double y = b[0] * g[0];
        for (int k = 2; k < 8; k += 3) {
            double z = (x - b[k + 1]) / b[k + 2];
            g[k] = StrictMath.exp(-z * z);
            g[k + 1] = 2 * b[k] * g[k] * z / b[k + 2];
            g[k + 2] = g[k + 1] * z;
            y += b[k] * g[k];
        }
        return y;
    }

    private static double rational(double x, double[] b, double[] g) {
        double divisor = 1 + x * (b[3] + x * b[4]);
        double y = (b[0] + x * (b[1] + x * b[2])) / divisor;
        g[0] = 1 / divisor;
        g[1] = x / divisor;
        g[2] = x * x / divisor;
        g[3] = -y * x / divisor;
        g[4] = -y * x * x / divisor;
        return y;
    }

    private static double threeExponentials(double x, double[] b, double[] g) {
        double y = 0;
        for (int k = 0; k < 6; k += 2) {
            g[k] = StrictMath.exp(-b[k + 1] * x);
            g[k + 1] = -x * b[k] * g[k];
            y += b[k] * g[k];
        }
        return y;
    }

    private static double meyer(double x, double[] b, double[] g) {
        double e = StrictMath.exp(b[1] / (x + b[2]));
        g[0] = e;
        g[1] = b[0] * e / (x + b[2]);
        g[2] = -g[1] * b[1] / (x + b[2]);
        return b[0] * e;
    }

    private static double osborne(double x, double[] b, double[] g) {
        g[0] = 1;
        g[1] = StrictMath.exp(-x * b[3]);
        g[2] = StrictMath.exp(-x * b[4]);
        g[3] = -x * b[1] * g[1];
        g[4] = -x * b[2] * g[2];
        return b[0] + b[1] * g[1] + b[2] * g[2];
    }

    private static double misraA(double x, double[] b, double[] g) {
        g[0] = -StrictMath.expm1(-b[1] * x);
        g[1] = b[0] * x * StrictMath.exp(-b[1] * x);
        return b[0] * g[0];
    }

    private static double misraB(double x, double[] b, double[] g) {
        double base = 1 + b[1] * x / 2;
        g[0] = 1 - 1 / (base * base);
        g[1] = b[0] * x / (base * base * base);
        return b[0] * g[0];
    }

    private static double misraC(double x, double[] b, double[] g) {
        double base = 1 + 2 * b[1] * x;
        g[0] = 1 - 1 / Math.sqrt(base);
        g[1] = b[0] * x / (base * Math.sqrt(base));
        return b[0] * g[0];
    }

    private static double sigmoid(double x, double[] b, double[] g) {
        double e = StrictMath.exp(b[1] - b[2] * x);
        double divisor = 1 + e;
        g[0] = 1 / divisor;
        g[1] = -b[0] * (e / divisor) / divisor;
        g[2] = -x * g[1];
        return b[0] / divisor;
    }

    private static double roszman(double x, double[] b, double[] g) {
        double u = x - b[3];
        double length = Math.PI * (u * u + b[2] * b[2]);
        g[0] = 1;
        g[1] = -x;
        g[2] = -u / length;
        g[3] = -b[2] / length;
        return b[0] - b[1] * x - StrictMath.atan(b[2] / u) / Math.PI;
    }
}
