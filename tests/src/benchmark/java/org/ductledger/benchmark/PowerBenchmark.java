package org.ductledger.benchmark;

import java.util.concurrent.TimeUnit;
import org.ductledger.catalogue.Kernel;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** A column of a closed form, by the catalogue's kernel and by a plain loop over {@code Math} of the textbook form. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class PowerBenchmark {
    private static final int ROWS = 100_000;

    /** A closed form as a textbook writes it. */
    @FunctionalInterface
    private interface Textbook {
        void apply(double[] x, double[] gamma, double[] out);
    }

    @Param({
        "p_over_p0",
        "rho_over_rho0",
        "area_ratio",
        "mass_flow_number",
        "shock_p02_over_p01",
        "prandtl_meyer_angle",
        "fanno_fl_over_d"
    })
    private String function = "";

    @Param({"true", "false"})
    private boolean oneGamma;

    private double[][] arguments = {};
    private double[] result = {};
    private Kernel kernel = Columns.kernel("t_over_t0");
    private Textbook textbook = PowerBenchmark::pressure;

    @Setup
    public void draw() {
        boolean supersonic = function.startsWith("shock") || function.startsWith("prandtl");
        arguments = new double[][] {
            Columns.drawn(ROWS, supersonic ? 1.01 : 0.05, 5), Columns.gammas(oneGamma, ROWS),
        };
        result = new double[ROWS];
        kernel = Columns.kernel(function);
        textbook = switch (function) {
            case "p_over_p0" -> PowerBenchmark::pressure;
            case "rho_over_rho0" -> PowerBenchmark::density;
            case "area_ratio" -> PowerBenchmark::area;
            case "mass_flow_number" -> PowerBenchmark::massFlow;
            case "shock_p02_over_p01" -> PowerBenchmark::shock;
            case "prandtl_meyer_angle" -> PowerBenchmark::prandtlMeyer;
            default -> PowerBenchmark::fanno;
        };
    }

    @Benchmark
    public double[] ours() {
        kernel.apply(arguments, 0, ROWS, result);
        return result;
    }

    @Benchmark
    public double[] plain() {
        textbook.apply(arguments[0], arguments[1], result);
        return result;
    }

    private static void pressure(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            out[i] = Math.pow(1 + 0.5 * (g - 1) * x[i] * x[i], -g / (g - 1));
        }
    }

    private static void density(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            out[i] = Math.pow(1 + 0.5 * (g - 1) * x[i] * x[i], -1 / (g - 1));
        }
    }

    private static void area(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            double t = 2 / (g + 1) * (1 + 0.5 * (g - 1) * x[i] * x[i]);
            out[i] = Math.pow(t, 0.5 * (g + 1) / (g - 1)) / x[i];
        }
    }

    private static void massFlow(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            double t = 1 + 0.5 * (g - 1) * x[i] * x[i];
            out[i] = Math.sqrt(g) * x[i] * Math.pow(t, -0.5 * (g + 1) / (g - 1));
        }
    }

    private static void shock(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            double m = x[i] * x[i];
            out[i] = Math.pow((g + 1) * m / ((g - 1) * m + 2), g / (g - 1))
                    * Math.pow((g + 1) / (2 * g * m - (g - 1)), 1 / (g - 1));
        }
    }

    private static void prandtlMeyer(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            double y = Math.sqrt(x[i] * x[i] - 1);
            double k = Math.sqrt((g + 1) / (g - 1));
            out[i] = Math.toDegrees(k * Math.atan(y / k) - Math.atan(y));
        }
    }

    private static void fanno(double[] x, double[] gamma, double[] out) {
        for (int i = 0; i < out.length; i++) {
            double g = Columns.at(gamma, i);
            double m = x[i] * x[i];
            out[i] = (1 - m) / (g * m) + (g + 1) / (2 * g) * Math.log((g + 1) * m / (2 + (g - 1) * m));
        }
    }
}
