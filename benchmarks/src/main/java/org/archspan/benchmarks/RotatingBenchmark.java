package org.archspan.benchmarks;

import java.util.concurrent.TimeUnit;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
import org.archspan.stability.BranchSolver;
import org.archspan.stability.Peak;
import org.archspan.stability.RotatingMode;
import org.archspan.stability.RotatingSolver;
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

/** Modes of a rotating disk to 1e-8, counted by the argument principle, where growth is fastest without rotation. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 4, time = 1)
@Fork(1)
public class RotatingBenchmark {
  /** Model. */
  @Param({"tanh", "thick"})
  public String model;

  /** Symmetry. */
  @Param({"MIRROR", "FLEXING"})
  public Parity parity;

  private double wavenumber;
  private RotatingSolver solver;
  private RotatingMode mode;

  /** Builds the solver: Omega is 0.2 of the dispersion over the scale height. */
  @Setup
  public void prepare() {
    Disk disk = Cases.disk(model);
    var problem = Cases.problem(disk, 0.0, parity);
    Peak still = new BranchSolver(problem).fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow();
    wavenumber = still.wavenumber();
    double crossingRate = problem.equilibrium().dispersion() / problem.equilibrium().scaleHeight();
    solver = new RotatingSolver(problem, 0.2 * crossingRate);
    mode = solver.modes(wavenumber).modes().get(0);
  }

  /** Every mode at one wavelength: counted, and as many found. */
  @Benchmark
  public int everyMode() {
    return solver.modes(wavenumber).number();
  }

  /** The fastest mode from a neighbour, and the count that nothing is faster at this wavelength. */
  @Benchmark
  public int fastestWithCount() {
    RotatingMode near = solver.follow(wavenumber * 1.02, mode).orElseThrow();
    return solver.fasterThan(near.growthRate() * (1.0 + 1e-5), near.wavenumber());
  }

  /** Its growth rate alone, from a neighbour. */
  @Benchmark
  public double growthRate() {
    return solver.follow(wavenumber * 1.02, mode).orElseThrow().growthRate();
  }
}
