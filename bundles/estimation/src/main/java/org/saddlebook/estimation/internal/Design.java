package org.saddlebook.estimation.internal;

/** The rows of a linear problem, flat and row by row, each number with an optional trailing part. */
public final class Design {
    private final int rows;
    private final int columns;
    private final double[] high;
    private final double[] lowOrNull;

    Design(int rows, int columns, double[] high, double[] lowOrNull) {
        this.rows = rows;
        this.columns = columns;
        this.high = high;
        this.lowOrNull = lowOrNull;
    }

    /** Copies and checks rows of numbers. */
    public static Design of(double[][] design) {
        int n = design.length;
        if (n == 0 || design[0].length == 0) {
            throw new IllegalArgumentException("the design needs at least one row and one column");
        }
        int p = design[0].length;
        double[] flat = new double[n * p];
        for (int i = 0; i < n; i++) {
            double[] row = design[i];
            if (row.length != p) {
                throw new IllegalArgumentException("row " + i + " has " + row.length + " numbers, row 0 has " + p);
            }
            for (int j = 0; j < p; j++) {
                Inputs.requireNumber(row[j], "design row " + i + " ", j);
                flat[i * p + j] = row[j];
            }
        }
        return new Design(n, p, flat, null);
    }

    /** Powers 0 to degree of each abscissa, to double-double accuracy. */
    public static Design polynomial(double[] abscissae, int degree) {
        if (degree < 0 || abscissae.length == 0) {
            throw new IllegalArgumentException("a polynomial needs a degree of at least 0 and one point; degree "
                    + degree + ", points " + abscissae.length);
        }
        int n = abscissae.length;
        int p = degree + 1;
        double[] high = new double[n * p];
        double[] low = new double[n * p];
        Wide power = new Wide();
        for (int i = 0; i < n; i++) {
            double x = abscissae[i];
            Inputs.requireNumber(x, "abscissa", i);
            power.set(1, 0);
            for (int j = 0; j < p; j++) {
                Inputs.requireNumber(power.hi, "power " + j + " of abscissa", i);
                high[i * p + j] = power.hi;
                low[i * p + j] = power.lo;
                power.multiply(x, 0);
            }
        }
        return new Design(n, p, high, low);
    }

    /** Number of rows. */
    public int rows() {
        return rows;
    }

    /** Number of columns. */
    public int columns() {
        return columns;
    }

    double high(int row, int column) {
        return high[row * columns + column];
    }

    double low(int row, int column) {
        return lowOrNull == null ? 0 : lowOrNull[row * columns + column];
    }

    boolean wide() {
        return lowOrNull != null;
    }
}
