package org.ductledger.catalogue;

/**
 * A function's arithmetic over columns. It trusts that its arguments lie in their intervals, and answers NaN where they
 * have no solution together.
 */
public final class Kernel {
    /** A column kernel: fills {@code result[from..to)}; an argument's column has one value for all rows, or one each. */
    @FunctionalInterface
    public interface Columns {
        void apply(double[][] arguments, int from, int to, double[] result);
    }

    @FunctionalInterface
    public interface Of1 {
        double at(double a);
    }

    @FunctionalInterface
    public interface Of2 {
        double at(double a, double b);
    }

    @FunctionalInterface
    public interface Of3 {
        double at(double a, double b, double c);
    }

    @FunctionalInterface
    public interface Of4 {
        double at(double a, double b, double c, double d);
    }

    @FunctionalInterface
    public interface Of5 {
        double at(double a, double b, double c, double d, double e);
    }

    @FunctionalInterface
    public interface Of6 {
        double at(double a, double b, double c, double d, double e, double f);
    }

    @FunctionalInterface
    public interface Of7 {
        double at(double a, double b, double c, double d, double e, double f, double g);
    }

    private final int arity;
    private final Columns columns;

    private Kernel(int arity, Columns columns) {
        this.arity = arity;
        this.columns = columns;
    }

    /** A kernel written over columns from the start, equal to the bit to its one-row form. */
    public static Kernel ofColumns(int arity, Columns columns) {
        return new Kernel(arity, columns);
    }

    public static Kernel of(Of1 f) {
        return new Kernel(1, (x, from, to, y) -> {
            double[] a = x[0];
            int as = stride(a);
            for (int i = from; i < to; i++) {
                y[i] = f.at(a[i * as]);
            }
        });
    }

    public static Kernel of(Of2 f) {
        return new Kernel(2, (x, from, to, y) -> {
            double[] a = x[0];
            double[] b = x[1];
            int as = stride(a);
            int bs = stride(b);
            for (int i = from; i < to; i++) {
                y[i] = f.at(a[i * as], b[i * bs]);
            }
        });
    }

    public static Kernel of(Of3 f) {
        return new Kernel(3, (x, from, to, y) -> {
            double[] a = x[0];
            double[] b = x[1];
            double[] c = x[2];
            int as = stride(a);
            int bs = stride(b);
            int cs = stride(c);
            for (int i = from; i < to; i++) {
                y[i] = f.at(a[i * as], b[i * bs], c[i * cs]);
            }
        });
    }

    public static Kernel of(Of4 f) {
        return new Kernel(4, (x, from, to, y) -> {
            for (int i = from; i < to; i++) {
                y[i] = f.at(pick(x[0], i), pick(x[1], i), pick(x[2], i), pick(x[3], i));
            }
        });
    }

    public static Kernel of(Of5 f) {
        return new Kernel(5, (x, from, to, y) -> {
            for (int i = from; i < to; i++) {
                y[i] = f.at(pick(x[0], i), pick(x[1], i), pick(x[2], i), pick(x[3], i), pick(x[4], i));
            }
        });
    }

    public static Kernel of(Of6 f) {
        return new Kernel(6, (x, from, to, y) -> {
            for (int i = from; i < to; i++) {
                y[i] = f.at(pick(x[0], i), pick(x[1], i), pick(x[2], i), pick(x[3], i), pick(x[4], i), pick(x[5], i));
            }
        });
    }

    public static Kernel of(Of7 f) {
        return new Kernel(7, (x, from, to, y) -> {
            for (int i = from; i < to; i++) {
                y[i] = f.at(
                        pick(x[0], i),
                        pick(x[1], i),
                        pick(x[2], i),
                        pick(x[3], i),
                        pick(x[4], i),
                        pick(x[5], i),
                        pick(x[6], i));
            }
        });
    }

    private static int stride(double[] column) {
        return column.length == 1 ? 0 : 1;
    }

    private static double pick(double[] column, int row) {
        return column[row * stride(column)];
    }

    public int arity() {
        return arity;
    }

    /** Fills {@code result[from..to)}. */
    public void apply(double[][] arguments, int from, int to, double[] result) {
        columns.apply(arguments, from, to, result);
    }

    /** One row. */
    public double at(double... row) {
        double[][] arguments = new double[row.length][];
        for (int i = 0; i < row.length; i++) {
            arguments[i] = new double[] {row[i]};
        }
        double[] result = new double[1];
        columns.apply(arguments, 0, 1, result);
        return result[0];
    }
}
