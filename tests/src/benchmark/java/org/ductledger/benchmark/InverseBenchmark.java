package org.ductledger.benchmark;

import java.util.concurrent.TimeUnit;
import org.ductledger.catalogue.Kernel;
import org.hipparchus.analysis.UnivariateFunction;
import org.hipparchus.analysis.solvers.BracketingNthOrderBrentSolver;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** A column of an inverse, by the catalogue's kernel and by a general bracketing solver on the textbook form. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class InverseBenchmark {
    private static final double SOLVED = 1e-15;

    /** A textbook's forward form: the Mach number and gamma to the given quantity. */
    @FunctionalInterface
    private interface Forward {
        double at(double mach, double gamma);
    }

    @Param({
        "mach_from_area_ratio",
        "mach_from_mass_flow_number",
        "mach_from_prandtl_meyer_angle",
        "mach_from_fanno_fl_over_d",
        "mach1_from_shock_p02_over_p01"
    })
    private String function = "";

    @Param({"true", "false"})
    private boolean oneGamma;

    /** The solver is asked for fewer rows, and the time is given a row. */
    @Param({"100000"})
    private int rows;

    private double[][] arguments = {};
    private double[] result = {};
    private Kernel kernel = Columns.kernel("t_over_t0");
    private Forward forward = InverseBenchmark::area;

    @Setup
    public void draw() {
        forward = switch (function) {
            case "mach_from_area_ratio" -> InverseBenchmark::area;
            case "mach_from_mass_flow_number" -> InverseBenchmark::massFlow;
            case "mach_from_prandtl_meyer_angle" -> InverseBenchmark::prandtlMeyer;
            case "mach_from_fanno_fl_over_d" -> InverseBenchmark::fanno;
            default -> InverseBenchmark::shock;
        };
        kernel = Columns.kernel(function);
        double[] mach = Columns.drawn(rows, 1.01, 4);
        double[] gamma = Columns.gammas(oneGamma, rows);
        double[] given = new double[rows];
        for (int i = 0; i < rows; i++) {
            given[i] = forward.at(mach[i], Columns.at(gamma, i));
        }
        boolean branches = kernel.arity() == 3;
        arguments = branches ? new double[][] {given, gamma, {1}} : new double[][] {given, gamma};
        result = new double[rows];
    }

    @Benchmark
    public double[] ours() {
        kernel.apply(arguments, 0, rows, result);
        return result;
    }

    @Benchmark
    public double[] solver() {
        BracketingNthOrderBrentSolver brent = new BracketingNthOrderBrentSolver(SOLVED, SOLVED, 5);
        for (int i = 0; i < rows; i++) {
            double gamma = Columns.at(arguments[1], i);
            double given = arguments[0][i];
            UnivariateFunction residual = mach -> forward.at(mach, gamma) - given;
            result[i] = brent.solve(200, residual, 1, 5);
        }
        return result;
    }

    private static double area(double mach, double g) {
        return Math.pow(2 / (g + 1) * (1 + 0.5 * (g - 1) * mach * mach), 0.5 * (g + 1) / (g - 1)) / mach;
    }

    private static double massFlow(double mach, double g) {
        return Math.sqrt(g) * mach * Math.pow(1 + 0.5 * (g - 1) * mach * mach, -0.5 * (g + 1) / (g - 1));
    }

    private static double prandtlMeyer(double mach, double g) {
        double y = Math.sqrt(mach * mach - 1);
        double k = Math.sqrt((g + 1) / (g - 1));
        return Math.toDegrees(k * Math.atan(y / k) - Math.atan(y));
    }

    private static double fanno(double mach, double g) {
        double m = mach * mach;
        return (1 - m) / (g * m) + (g + 1) / (2 * g) * Math.log((g + 1) * m / (2 + (g - 1) * m));
    }

    private static double shock(double mach, double g) {
        double m = mach * mach;
        return Math.pow((g + 1) * m / ((g - 1) * m + 2), g / (g - 1))
                * Math.pow((g + 1) / (2 * g * m - (g - 1)), 1 / (g - 1));
    }
}
