package org.archspan.benchmarks;

import java.util.concurrent.TimeUnit;
import org.archspan.boundary.Parity;
import org.archspan.disk.Disk;
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

/** The fastest mode of one parity to 1e-8, proved at every wavelength. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class FastestBenchmark {
  /** Model. */
  @Param({"tanh", "thick", "heavy"})
  public String model;

  /** Symmetry. */
  @Param({"MIRROR", "FLEXING"})
  public Parity parity;

  private Disk disk;
  private BranchSolver solver;

  /** Builds the solver. */
  @Setup
  public void prepare() {
    disk = Cases.disk(model);
    solver = new BranchSolver(Cases.problem(disk, 0.0, parity));
  }

  /** On a solver that knows its mesh. */
  @Benchmark
  public double warm() {
    return solver.fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0).orElseThrow().growthRate();
  }

  /** Everything from the disk on: equilibrium, mesh, search, proof. */
  @Benchmark
  public double fromTheDisk() {
    return new BranchSolver(Cases.problem(disk, 0.0, parity)).fastest(0, 0.0, Double.POSITIVE_INFINITY, 0.0)
        .orElseThrow().growthRate();
  }
}
