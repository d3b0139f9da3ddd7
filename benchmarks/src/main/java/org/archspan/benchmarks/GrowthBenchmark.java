package org.archspan.benchmarks;

import java.util.concurrent.TimeUnit;
import org.archspan.boundary.Parity;
import org.archspan.stability.BranchSolver;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** One growth rate to 1e-8, with mode, slope, count and error: from a guess that is off by 1e-3, and from none. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class GrowthBenchmark {
  /** Model. */
  @Param({"tanh", "thick"})
  public String model;

  /** Whether ky is positive. */
  @Param({"false", "true"})
  public boolean oblique;

  /** Symmetry. */
  @Param({"MIRROR", "FLEXING"})
  public Parity parity;

  private BranchSolver solver;
  private double wavenumber;
  private double guess;
  private int turn;

  /** Builds the solver and finds the guess. */
  @Setup
  public void prepare() {
    solver = new BranchSolver(Cases.problem(model, oblique, parity));
    wavenumber = Cases.along(model);
    guess = solver.growth(wavenumber, 0).orElseThrow().growthRate() * (1.0 + 1e-3);
  }

  /** From a guess; the wavenumber moves a little each time, so that nothing can be remembered. */
  @Benchmark
  public double warm() {
    turn = (turn + 1) % 1000;
    return solver.growth(wavenumber * (1.0 + 1e-9 * turn), 0, guess).orElseThrow().growthRate();
  }

  /** From nothing, on a solver that knows its mesh. */
  @Benchmark
  public double unguided() {
    turn = (turn + 1) % 1000;
    return solver.growth(wavenumber * (1.0 + 1e-9 * turn), 0).orElseThrow().growthRate();
  }
}
