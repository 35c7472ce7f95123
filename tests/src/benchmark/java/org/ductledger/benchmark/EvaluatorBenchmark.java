package org.ductledger.benchmark;

import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import org.ductledger.catalogue.Kernel;
import org.ductledger.flow.StandardCatalogue;
import org.ductledger.ledger.Call;
import org.ductledger.ledger.Evaluator;
import org.ductledger.ledger.Given;
import org.ductledger.ledger.Ledger;
import org.ductledger.ledger.LedgerRefusedException;
import org.ductledger.ledger.Outcome;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;

/** What the evaluator adds to a kernel on one core, and what the second core takes off. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
public class EvaluatorBenchmark {
    @Param({"p_over_p0", "area_ratio", "fanno_fl_over_d"})
    private String function = "";

    @Param({"12000", "100000"})
    private int rows;

    private final Evaluator evaluator = new Evaluator(StandardCatalogue.get());
    private double[][] arguments = {};
    private double[] result = {};
    private Kernel kernel = Columns.kernel("t_over_t0");
    private Ledger ledger = Ledger.of();

    @Setup
    public void draw() {
        kernel = Columns.kernel(function);
        double[] mach = Columns.drawn(rows, 0.05, 5);
        double[] gamma = Columns.gammas(false, rows);
        arguments = new double[][] {mach, gamma};
        result = new double[rows];
        ledger = Ledger.of(
                Call.of("asked", function, Map.of("mach", Given.numbers(mach), "gamma", Given.numbers(gamma))));
    }

    @Benchmark
    public double[] kernelAlone() {
        kernel.apply(arguments, 0, rows, result);
        return result;
    }

    @Benchmark
    public List<Outcome> evaluator() throws LedgerRefusedException {
        return evaluator.evaluate(ledger);
    }
}
