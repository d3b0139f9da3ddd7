package org.archspan.stability;

import java.util.Optional;
import org.archspan.mesh.Mesh;

/**
 * Growth rates of one parity at one cross-field wavenumber. Chooses and refines its mesh by itself: every growth rate is
 * checked against a mesh of higher degree, and elements are split until the two agree within the tolerance.
 *
 * <p>Works in {@link Scales}. Owns its work arrays: one instance for one thread.
 */
final class ModeSolver {
  /** Degree of the working mesh, and of the mesh that checks it. */
  static final int DEGREE = 7;
  static final int CHECKING_DEGREE = 9;

  private static final int MOST_ELEMENTS = 2000;
  private static final int MOST_REFINEMENTS = 24;
  /** The end of a search need not be exact: where this many do not settle it, the last is taken. */
  private static final int MARGIN_REFINEMENTS = 8;
  private static final int NODES_PER_HALF_WAVE = 4;
  private static final double HAIR = 1e-9;
  private static final double NEUTRAL_HAIR = 1e-6;
  /** A mesh is refined to this share of the tolerance, so that warm starts beside its limit do not miss it. */
  private static final double RESERVE = 0.5;
  private static final double CROWDING_MARGIN = 0.95;
  private static final double SMALL_CORRECTION = 1e-4;
  private static final double ROUNDING_OF_SQUARE = 1e-12;

  private final ModeProblem problem;
  private final Scales scales;
  private final double ky;
  private Discretisation working;
  private Discretisation checking;
  private WarmStart warmStart;
  private HaloEdge halo;
  private double fastestPossible;
  private double shortestUnstable;
  private long spentBefore;

  ModeSolver(ModeProblem problem) {
    this.problem = problem;
    this.scales = Scales.of(problem.equilibrium());
    this.ky = problem.crossWavenumber() * scales.length();
    discretise(MeshGrading.initial(problem.equilibrium(), scales, DEGREE));
  }

  private void discretise(double[] edges) {
    if (edges.length > MOST_ELEMENTS) {
      throw tooFine();
    }
    discretise(new Mesh(edges, DEGREE));
  }

  private UnsolvedException tooFine() {
    return new UnsolvedException("a growth rate could not be brought to the tolerance " + problem.tolerance() + " with "
        + mesh().elements() + " elements: the mode varies over lengths far shorter than the domain; lower domain.top, or"
        + " ask for a larger --tolerance");
  }

  private void discretise(Mesh mesh) {
    spentBefore = factorisations();
    working = new Discretisation(problem, scales, mesh);
    checking = new Discretisation(problem, scales, mesh.withDegree(CHECKING_DEGREE));
    warmStart = new WarmStart(working, checking, ky, problem.tolerance());
    halo = problem.topBoundary() == org.archspan.boundary.TopBoundary.OPEN
        ? new HaloEdge(working.stiffness().atmosphere(), new PressureResponse(problem.gas(), problem.cosmicRays(), scales))
        : null;
    BuoyancyBound bound = BuoyancyBound.of(working.stiffness().atmosphere(), problem.gas().softestIndex())
        .max(BuoyancyBound.of(checking.stiffness().atmosphere(), problem.gas().softestIndex()));
    fastestPossible = bound.growth();
    shortestUnstable = bound.wavenumber();
  }

  ModeProblem problem() {
    return problem;
  }

  Scales scales() {
    return scales;
  }

  double ky() {
    return ky;
  }

  Mesh mesh() {
    return working.stiffness().atmosphere().mesh;
  }

  /** The mesh of higher degree, with the displacement of the latest root. */
  Discretisation checking() {
    return checking;
  }

  /** ds/dkx of the latest root on the working mesh. */
  double workingSlope() {
    return working.slope();
  }

  /** Factorisations spent so far, on both meshes. */
  long factorisations() {
    return working == null ? 0
        : spentBefore + working.stiffness().factorisations() + checking.stiffness().factorisations();
  }

  /** A growth rate that no mode exceeds; 0 when nothing can be unstable. */
  double fastestPossible() {
    return fastestPossible;
  }

  /** A wavenumber beyond which nothing grows; infinite without field. */
  double shortestUnstable() {
    return shortestUnstable;
  }

  /**
   * The slowest growth that is told from none. A gas that holds itself may be neutral to every displacement at the margin:
   * there s^2 must stand out from rounding.
   */
  double slowest() {
    return (problem.perturbedGravity() ? NEUTRAL_HAIR : HAIR) * fastestPossible;
  }

  /** Growth rate of the edge of the continuum above an open top; 0 where there is none. */
  double haloEdge(double kx) {
    return halo == null ? 0.0 : halo.growth(kx, ky, fastestPossible);
  }

  /** The greatest growth rate of that edge over a range of wavenumbers; empty where the atmosphere above is stable. */
  Optional<GrowthRoot> haloPeak(double lowest, double highest) {
    double end = Math.min(highest, shortestUnstable);
    if (halo == null || fastestPossible == 0.0 || !(end > lowest) || Double.isInfinite(end)) {
      return Optional.empty();
    }
    GrowthRoot peak = halo.peak(lowest, end, ky, fastestPossible);
    return peak.growth() > 0.0 ? Optional.of(peak) : Optional.empty();
  }

  /** A growth rate just above whatever is not a discrete mode. */
  private double floor(double kx) {
    return Math.max(slowest(), haloEdge(kx) * (1.0 + HAIR));
  }

  /**
   * Number of discrete modes that grow at a wavenumber. The slowest of many live where the fastest needs no fine mesh: the
   * count is repeated on halved first elements until it stands still with several nodes to each half-wave; -1 if never.
   */
  int unstableModes(double kx) {
    if (fastestPossible == 0.0) {
      return 0;
    }
    double floor = floor(kx);
    Mesh mesh = MeshGrading.initial(problem.equilibrium(), scales, DEGREE);
    int count = -1;
    while (mesh.elements() <= MOST_ELEMENTS) {
      mesh = mesh.halved();
      int finer = new Discretisation(problem, scales, mesh).stiffness().count(floor, kx, ky);
      if (finer == count && mesh.elements() * DEGREE >= NODES_PER_HALF_WAVE * count) {
        return count;
      }
      count = finer;
    }
    return -1;
  }

  /** Number of modes faster than s at any wavenumber between two, or more. */
  int count(double growth, double lowest, double highest) {
    return working.stiffness().countBetween(growth, lowest, highest, ky);
  }

  /** Whether no mode is faster than s at any wavenumber between two. */
  boolean positive(double growth, double lowest, double highest) {
    return working.stiffness().positiveBetween(growth, lowest, highest, ky);
  }

  /**
   * The growth rate of the mode of an order, or nothing when fewer modes grow.
   *
   * @param guess a growth rate to start from; NaN for none
   */
  Optional<GrowthRoot> growth(double kx, int order, double guess) {
    if (fastestPossible == 0.0) {
      return Optional.empty();
    }
    double floor = floor(kx);
    double ceiling = fastestPossible * (1.0 + HAIR);
    return floor >= ceiling ? Optional.empty() : refineUntilTrue(kx, order, floor, ceiling, guess);
  }

  private Optional<GrowthRoot> refineUntilTrue(double kx, int order, double floor, double ceiling, double guess) {
    double start = guess;
    for (int refinement = 0; refinement <= MOST_REFINEMENTS; refinement++) {
      GrowthRoot root = Double.isNaN(start) ? null : warmStart.find(kx, order, floor, ceiling, start);
      if (root == null || !goodEnough(root, 1.0)) {
        double s = RootFinder.find(growthAxis(working, kx), order, floor, ceiling, start);
        if (Double.isNaN(s)) {
          return Optional.empty();
        }
        if (uncrowded(kx, s)) {
          start = s;
          continue;
        }
        root = check(kx, order, floor, ceiling, s);
      }
      if (goodEnough(root, RESERVE)) {
        return Optional.of(root);
      }
      start = root.growth();
      discretise(MeshGrading.split(checking.stiffness().atmosphere(), checking.displacement().zeta));
    }
    throw tooFine();
  }

  /** Splits elements that could hold a mode of their own nearly as fast as s; whether there were any. */
  private boolean uncrowded(double kx, double s) {
    if (working.stiffness().count(CROWDING_MARGIN * s, kx, ky) == DynamicStiffness.INFINITE) {
      working.stiffness().count(s, kx, ky);
    }
    if (!working.stiffness().anyCrowded()) {
      return false;
    }
    discretise(MeshGrading.split(mesh(), working.stiffness().crowded()));
    return true;
  }

  /**
   * The Newton correction that the checking mesh asks for is the error of the working mesh; its result is kept. Where the
   * correction is too large to be one, the root is sought on the checking mesh itself.
   */
  private GrowthRoot check(double kx, int order, double floor, double ceiling, double s) {
    int count = checking.stiffness().count(s, kx, ky);
    double change = count == DynamicStiffness.INFINITE ? Double.NaN : checking.newtonStep(s, kx, ky);
    double better = s + change;
    if (!(Math.abs(change) < SMALL_CORRECTION * s)) {
      better = RootFinder.find(growthAxis(checking, kx), order, floor, ceiling, s);
      if (Double.isNaN(better)) {
        return new GrowthRoot(kx, s, Double.NaN, 1.0);
      }
    }
    double error = Math.abs(better - s) / better + checking.displacement().rounding(better);
    return new GrowthRoot(kx, better, checking.slope(), error);
  }

  /** Whether the error meets a share of the tolerance, or drowns in rounding. */
  private boolean goodEnough(GrowthRoot root, double share) {
    return root.error() <= share * problem.tolerance() || lostInRounding(root);
  }

  /** Close to the margin s^2 itself drowns in rounding; a finer mesh does not help, and the error says so. */
  private boolean lostInRounding(GrowthRoot root) {
    double squareError = 2.0 * root.error() * root.growth() * root.growth();
    return squareError <= ROUNDING_OF_SQUARE * fastestPossible * fastestPossible;
  }

  private RootFinder.Axis growthAxis(Discretisation mesh, double kx) {
    return new RootFinder.Axis() {
      @Override
      public int count(double s) {
        return mesh.stiffness().count(s, kx, ky);
      }

      @Override
      public double newtonStep(double s) {
        return mesh.newtonStep(s, kx, ky);
      }
    };
  }

  /**
   * Shortest wave at which more than {@code order} modes grow, as a wavenumber; 0 when there is none. Towards the margin
   * growth leaves cosmic rays all the time to diffuse, however slowly they do; only then does the number of modes never
   * rise towards shorter waves. A gas that holds itself is found at two small growth rates and continued to none: at a
   * neutral stratification growth vanishes linearly.
   */
  double marginalWavenumber(int order) {
    if (fastestPossible == 0.0) {
      return 0.0;
    }
    if (problem.cosmicRays().leaks()) {
      ModeSolver diffused = new ModeSolver(problem.withDiffusedCosmicRays());
      diffused.discretise(mesh());
      return diffused.marginalWavenumber(order);
    }
    double high = shortestUnstable * (1.0 + HAIR);
    double low = 1e-6 * high;
    if (Double.isInfinite(high)) {
      return high;
    }
    double marginal = marginalWavenumber(order, slowest(), low, high, Double.NaN);
    if (problem.perturbedGravity() && marginal > 0.0) {
      marginal += marginal - marginalWavenumber(order, 2.0 * slowest(), low, high, marginal);
    }
    return marginal;
  }

  private double marginalWavenumber(int order, double growth, double low, double high, double guess) {
    double start = guess;
    for (int refinement = 0;; refinement++) {
      start = RootFinder.find(wavenumberAxis(working, growth), order, low, high, start);
      if (Double.isNaN(start)) {
        return 0.0;
      }
      double better = RootFinder.find(wavenumberAxis(checking, growth), order, low, high, start);
      double change = Math.abs(better - start);
      if (!(change > problem.tolerance() * start) || refinement == MARGIN_REFINEMENTS) {
        return Double.isNaN(better) ? start : better;
      }
      discretise(MeshGrading.split(checking.stiffness().atmosphere(), checking.displacement().zeta));
    }
  }

  private RootFinder.Axis wavenumberAxis(Discretisation mesh, double growth) {
    return new RootFinder.Axis() {
      @Override
      public int count(double kx) {
        return mesh.stiffness().count(growth, kx, ky);
      }

      @Override
      public double newtonStep(double kx) {
        return mesh.newtonStepInWavenumber(growth, kx, ky);
      }
    };
  }
}
