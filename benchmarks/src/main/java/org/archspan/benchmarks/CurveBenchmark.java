package org.archspan.benchmarks;

import java.util.concurrent.TimeUnit;
import org.archspan.boundary.Parity;
import org.archspan.stability.BranchSolver;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** One growth rate on a curve of a hundred wavelengths around that of the race; each starts from the last two. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class CurveBenchmark {
  private static final int POINTS = 100;

  /** Model. */
  @Param({"tanh", "thick", "heavy"})
  public String model;

  /** Whether ky is positive. */
  @Param({"false", "true"})
  public boolean oblique;

  /** Symmetry. */
  @Param({"MIRROR", "FLEXING"})
  public Parity parity;

  private BranchSolver solver;
  private final double[] wavenumbers = new double[POINTS];

  /** Builds the solver and lets it find its mesh. */
  @Setup
  public void prepare() {
    solver = new BranchSolver(Cases.problem(model, oblique, parity));
    for (int i = 0; i < POINTS; i++) {
      wavenumbers[i] = Cases.along(model) * (0.7 + 0.006 * i);
    }
    solver.curve(0, wavenumbers, false);
    long before = solver.factorisations();
    solver.curve(0, wavenumbers, false);
    System.out.println("# factorisations a wavelength: " + (solver.factorisations() - before) / (double) POINTS);
  }

  /** Time of one growth rate, with mode, slope and error. */
  @Benchmark
  @OperationsPerInvocation(POINTS)
  public double oneGrowthRate() {
    return solver.curve(0, wavenumbers, false).points().get(50).growthRate();
  }
}
