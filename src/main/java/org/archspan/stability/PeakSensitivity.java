package org.archspan.stability;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.stream.IntStream;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.mesh.Mesh;

/**
 * How the fastest growth rate of a branch and its wavelength answer a small change of an input, without solving the changed
 * problem.
 *
 * <p>A mode makes the form F stationary, so that to first order its growth rate changes by {@code ds/dq = -(dF/dq)/(dF/ds)} at
 * a fixed vector. The changed form is evaluated on the same mesh, stretched onto the changed domain, along the same nodal
 * values. At a peak {@code ds/dk = 0}, hence {@code d s_max/dq = ds/dq} and {@code dk/dq = -(d/dk ds/dq)/(d^2 s/dk^2)}; the
 * derivatives with respect to k are differences of exact slopes.
 *
 * <p>One instance for one thread.
 */
public final class PeakSensitivity {
  /** Relative steps of an input and of the wavenumber. */
  private static final double INPUT_STEP = 3e-4;
  private static final double WAVENUMBER_STEP = 4e-3;

  private final ModeProblem problem;
  private final Scales scales;
  private final double kx;
  private final Level fine;
  private final Level coarse;

  /** The peak on a mesh of one degree: its vector in the middle, then those beside it. */
  private record Level(Mesh mesh, ModeVector middle, ModeVector[] beside, CentralDifference curvature) {
  }

  private PeakSensitivity(ModeSolver solver, double kx, double[] growth) {
    problem = solver.problem();
    scales = solver.scales();
    this.kx = kx;
    fine = level(solver, ModeSolver.CHECKING_DEGREE, growth);
    coarse = level(solver, ModeSolver.DEGREE, growth);
  }

  /**
   * A peak; empty where the branch does not reach a per cent to either side of it.
   *
   * @param order      of the mode at that wavenumber
   * @param wavenumber of the peak along the field, cm^-1, positive
   * @param growthRate of the peak, s^-1
   * @throws UnsolvedException when a tolerance is missed
   */
  public static Optional<PeakSensitivity> of(ModeProblem problem, int order, double wavenumber, double growthRate) {
    ModeSolver solver = new ModeSolver(problem);
    double kx = wavenumber * solver.scales().length();
    double[] growth = new double[CentralDifference.VALUES + 1];
    double guess = growthRate * solver.scales().time();
    for (int i = 0; i < growth.length; i++) {
      Optional<GrowthRoot> root = solver.growth(place(kx, i), order, guess);
      if (root.isEmpty()) {
        return Optional.empty();
      }
      growth[i] = root.get().growth();
    }
    return Optional.of(new PeakSensitivity(solver, kx, growth));
  }

  /** Wavenumbers beside the peak, and last the peak's own. */
  private static double place(double kx, int i) {
    return i < CentralDifference.VALUES ? kx * (1.0 + WAVENUMBER_STEP * CentralDifference.step(i)) : kx;
  }

  private Level level(ModeSolver solver, int degree, double[] growth) {
    Mesh mesh = solver.mesh().withDegree(degree);
    Discretisation discretisation = new Discretisation(problem, scales, mesh);
    ModeVector[] beside = new ModeVector[growth.length - 1];
    for (int i = 0; i < beside.length; i++) {
      beside[i] = ModeVector.near(discretisation, place(kx, i), solver.ky(), growth[i]);
    }
    ModeVector middle = ModeVector.near(discretisation, kx, solver.ky(), growth[beside.length]);
    double[] slopes = Arrays.stream(beside).mapToDouble(ModeVector::slope).toArray();
    return new Level(mesh, middle, beside, CentralDifference.of(slopes, WAVENUMBER_STEP * kx));
  }

  /**
   * The elasticities with respect to one input. O(elements * degree^2) and four base states.
   *
   * @param altered the same problem with the input times a factor (dimensionless) close to 1; its base state must end at a
   *                height that changes smoothly with the factor
   */
  public PeakElasticity to(DoubleFunction<ModeProblem> altered) {
    ModeProblem[] changed = IntStream.range(0, CentralDifference.VALUES)
        .mapToObj(i -> altered.apply(1.0 + CentralDifference.step(i) * INPUT_STEP)).toArray(ModeProblem[]::new);
    PeakElasticity best = elasticity(fine, changed);
    PeakElasticity rough = elasticity(coarse, changed);
    return new PeakElasticity(best.growthRate(),
        best.growthRateError() + Math.abs(best.growthRate() - rough.growthRate()), best.wavelength(),
        best.wavelengthError() + Math.abs(best.wavelength() - rough.wavelength()));
  }

  private PeakElasticity elasticity(Level level, ModeProblem[] changed) {
    FormAlong[] forms = Arrays.stream(changed)
        .map(other -> new FormAlong(other, problem.topBoundary(), scales,
            stretched(level.mesh(), other.equilibrium())))
        .toArray(FormAlong[]::new);
    CentralDifference growth = growthByInput(forms, level.middle());
    double[] beside = new double[level.beside().length];
    double noise = 0.0;
    for (int i = 0; i < beside.length; i++) {
      CentralDifference there = growthByInput(forms, level.beside()[i]);
      beside[i] = there.value();
      noise = Math.max(noise, there.error());
    }
    CentralDifference twist = CentralDifference.of(beside, WAVENUMBER_STEP * kx);
    double scale = 1.0 / (kx * level.curvature().value());
    double wavelength = twist.value() * scale;
    double error = Math.abs(scale) * (twist.error() + noise / (WAVENUMBER_STEP * kx))
        + Math.abs(wavelength * level.curvature().error() / level.curvature().value());
    double s = level.middle().growth();
    // the peak is known to a few digits less than its growth rate: from where it was looked for to where it is
    double shift = -level.middle().slope() / level.curvature().value();
    return new PeakElasticity((growth.value() + shift * twist.value()) / s, growth.error() / s, wavelength, error);
  }

  /** ds/d ln(q) at a fixed wavenumber. */
  private static CentralDifference growthByInput(FormAlong[] forms, ModeVector vector) {
    double[] values = Arrays.stream(forms).mapToDouble(form -> form.of(vector) / -vector.byGrowth()).toArray();
    return CentralDifference.of(values, INPUT_STEP);
  }

  /** The mesh on another domain: ends to ends and kinks to kinks, straight between. */
  private Mesh stretched(Mesh mesh, Equilibrium other) {
    double[] from = anchors(problem.equilibrium());
    double[] to = anchors(other);
    if (from.length != to.length) {
      from = new double[] {from[0], from[from.length - 1]};
      to = new double[] {to[0], to[to.length - 1]};
    }
    double[] edges = mesh.edges().clone();
    for (int i = 0; i < edges.length; i++) {
      int piece = 0;
      while (piece < from.length - 2 && edges[i] > from[piece + 1]) {
        piece++;
      }
      double share = (edges[i] - from[piece]) / (from[piece + 1] - from[piece]);
      edges[i] = to[piece] + share * (to[piece + 1] - to[piece]);
    }
    return new Mesh(edges, mesh.degree());
  }

  /** Ends of the domain, and its kinks between them, in scale lengths. */
  private double[] anchors(Equilibrium state) {
    double[] kinks = state.kinks();
    double[] anchors = new double[kinks.length + 2];
    anchors[0] = state.bottom() / scales.length();
    for (int i = 0; i < kinks.length; i++) {
      anchors[i + 1] = kinks[i] / scales.length();
    }
    anchors[anchors.length - 1] = state.top() / scales.length();
    return anchors;
  }
}
