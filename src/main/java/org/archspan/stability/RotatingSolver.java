package org.archspan.stability;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import org.archspan.disk.RefusedModelException;
import org.archspan.mesh.Mesh;

/**
 * Growing modes of a disk that rotates rigidly about the vertical axis, where growth rates may be complex.
 *
 * <p>Multiplying the equation of motion by conj(s) xi and taking the real part leaves Re s (|s|^2 m + k) <= 0, m the inertia
 * and k the energy with the softest closures, whatever the Coriolis force: a growing mode has |s|^2 <= -k/m. So no mode grows
 * faster than the fastest without rotation and with the softest closures, which bounds the contour of the argument principle,
 * and where nothing grows without rotation nothing grows with it.
 *
 * <p>CGS outside, {@link Scales} inside. Owns its work arrays: one instance for one thread.
 */
public final class RotatingSolver {
  /** Slowest growth that is counted, of the bound. */
  private static final double EDGE = 0.05;
  private static final double HAIR = 0.03;
  private static final int MOST_HALVINGS = 4;
  private static final double RAISE = 1.5;
  private static final int MOST_RAISES = 6;
  private static final int SEARCHED_ORDERS = 40;
  private static final int MOST_DIVISIONS = 24;
  /** Of |s|: a smaller frequency is rounding. */
  private static final double REAL = 1e-7;
  private final ModeProblem problem;
  private final Scales scales;
  private final ModeSolver still;
  private final double angularSpeed;
  private final double ky;
  private RotatingDeterminant working;
  private RotatingDeterminant checking;
  private Mesh mesh;

  /**
   * A solver for a problem.
   *
   * @param angularSpeed Omega, s^-1, not negative
   */
  public RotatingSolver(ModeProblem problem, double angularSpeed) {
    if (problem.turn().turns()) {
      throw new RefusedModelException("rotation is not solved where the field turns with height; remove"
          + " [rotation] or field.turn");
    }
    this.problem = problem;
    this.still = new ModeSolver(problem.withSoftestClosures());
    this.scales = still.scales();
    this.angularSpeed = angularSpeed * scales.time();
    this.ky = problem.crossWavenumber() * scales.length();
  }

  /** The same at another rotation rate, s^-1. */
  public RotatingSolver withAngularSpeed(double other) {
    return new RotatingSolver(problem, other);
  }

  /** The problem that is solved. */
  public ModeProblem problem() {
    return problem;
  }

  /** Greatest wavenumber at which anything may grow, cm^-1: that without rotation. */
  public double marginalWavenumber() {
    return still.marginalWavenumber(0) / scales.length();
  }

  private void adopt(Mesh newMesh) {
    if (mesh != null && mesh.elements() >= newMesh.elements()) {
      return;
    }
    mesh = newMesh;
    working = new RotatingDeterminant(problem, scales, mesh, angularSpeed);
    checking = new RotatingDeterminant(problem, scales, mesh.withDegree(ModeSolver.CHECKING_DEGREE), angularSpeed);
  }

  /** Fastest growth without rotation at a wavenumber in scale lengths; 0 when stable. Adopts the mesh that it took. */
  private double bound(double kx) {
    double bound = still.growth(kx, 0, Double.NaN).map(GrowthRoot::growth).orElse(0.0);
    adopt(still.mesh());
    return Math.max(bound, still.haloEdge(kx));
  }

  /**
   * Counts and finds every mode that grows at a wavenumber.
   *
   * @param wavenumber kx, cm^-1, positive
   * @throws UnsolvedException when a count does not settle, or not all counted modes are found
   */
  public RotatingCount modes(double wavenumber) {
    double kx = wavenumber * scales.length();
    double radius = bound(kx) * (1.0 + HAIR);
    double edge = Math.max(EDGE * radius, still.haloEdge(kx) * (1.0 + HAIR));
    if (radius == 0.0 || edge >= radius) {
      return new RotatingCount(List.of(), 0, edge / scales.time(), radius / scales.time(), 0);
    }
    List<Complex> starts = starts(kx, edge);
    for (int attempt = 0; attempt <= MOST_HALVINGS + MOST_RAISES && edge < radius; attempt++) {
      WindingContour contour = new WindingContour(working, kx, ky);
      int number = contour.zeros(edge, radius);
      RotatingRoots roots = roots(kx, number, edge, radius, starts);
      if (roots.count() != number) {
        // slow modes crowd: those that cannot be told apart are left out, and the edge says so
        edge *= RAISE;
        continue;
      }
      List<RotatingMode> modes = new ArrayList<>();
      for (Complex root : roots.found()) {
        modes.add(checked(kx, root));
      }
      if (modes.stream().allMatch(mode -> goodEnough(mode, radius))) {
        modes.sort(Comparator.comparingDouble(RotatingMode::growthRate).reversed());
        return new RotatingCount(List.copyOf(modes), number, edge / scales.time(), radius / scales.time(),
            contour.points());
      }
      adopt(mesh.halved());
    }
    throw new UnsolvedException("the growing modes of a rotating disk, counted by the argument principle, could not all be"
        + " found, or not to the tolerance " + problem.tolerance() + "; ask for a larger --tolerance");
  }

  /** Slow modes are held to the tolerance of the bound: their error is one of s^2. */
  private boolean goodEnough(RotatingMode mode, double radius) {
    double share = Math.hypot(mode.growthRate(), mode.frequency()) * scales.time() / radius;
    return mode.growthError() * share <= problem.tolerance();
  }

  /** The modes without rotation, on whose mesh the others are sought. */
  private List<Complex> starts(double kx, double edge) {
    List<Complex> starts = new ArrayList<>();
    for (int order = 0; order < SEARCHED_ORDERS; order++) {
      Optional<GrowthRoot> start = still.growth(kx, order, Double.NaN);
      if (start.isEmpty() || start.get().growth() < edge) {
        break;
      }
      starts.add(new Complex(start.get().growth(), 0.0));
    }
    adopt(still.mesh());
    return starts;
  }

  private RotatingRoots roots(double kx, int number, double edge, double radius, List<Complex> starts) {
    RotatingRoots roots = new RotatingRoots(working, kx, ky);
    if (number > 0) {
      roots.searchRealAxis(edge, radius, 8 * Math.max(starts.size(), 4));
    }
    for (double shrunk : new double[] {0.97, 0.85, 0.7, 0.5, 0.3}) {
      for (int i = 0; i < starts.size() && roots.count() < number; i++) {
        roots.search(starts.get(i).multiply(new Complex(shrunk, 0.5 * (1.0 - shrunk))), edge, radius);
      }
    }
    if (roots.count() < number) {
      divide(roots, new WindingContour(working, kx, ky), new Rectangle(edge, radius, 1e-3 * edge, radius), edge, radius, 0);
    }
    return roots;
  }

  /** A part of the upper half-plane. */
  private record Rectangle(double left, double right, double low, double high) {
  }

  /** Halves a rectangle that holds zeros not yet found until each lies alone near the middle of its own. */
  private void divide(RotatingRoots roots, WindingContour contour, Rectangle part, double edge, double radius, int depth) {
    int inside = contour.zerosInside(part.left, part.right, part.low, part.high);
    long known = roots.found().stream().filter(root -> root.getReal() > part.left && root.getReal() <= part.right
        && root.getImaginary() > part.low && root.getImaginary() <= part.high).count();
    if (inside <= known || depth > MOST_DIVISIONS) {
      return;
    }
    Complex middle = new Complex(0.5 * (part.left + part.right), 0.5 * (part.low + part.high));
    if (roots.search(middle, edge, radius) && inside == known + 1) {
      return;
    }
    // not quite in the middle: symmetric spectra like to lie there
    if (part.right - part.left > part.high - part.low) {
      double cut = part.left + 0.4871 * (part.right - part.left);
      divide(roots, contour, new Rectangle(part.left, cut, part.low, part.high), edge, radius, depth + 1);
      divide(roots, contour, new Rectangle(cut, part.right, part.low, part.high), edge, radius, depth + 1);
    } else {
      double cut = part.low + 0.4871 * (part.high - part.low);
      divide(roots, contour, new Rectangle(part.left, part.right, part.low, cut), edge, radius, depth + 1);
      divide(roots, contour, new Rectangle(part.left, part.right, cut, part.high), edge, radius, depth + 1);
    }
  }

  /** The root on the mesh of higher degree; the difference is the error. */
  private RotatingMode checked(double kx, Complex root) {
    Complex better = new RotatingRoots(checking, kx, ky).refine(root);
    if (better == null) {
      throw new UnsolvedException("a growing mode at wavenumber " + kx + " per scale height is not resolved");
    }
    double frequency = root.getImaginary() == 0.0 ? 0.0 : Math.abs(better.getImaginary());
    return new RotatingMode(kx / scales.length(), better.getReal() / scales.time(), frequency / scales.time(),
        better.subtract(root).abs() / better.abs());
  }

  /**
   * The mode that a guess leads to, refined until its error meets the tolerance; empty when it leads to none that grows.
   *
   * @param wavenumber kx, cm^-1, positive
   * @param guess      a mode at this wavenumber or one nearby
   */
  public Optional<RotatingMode> follow(double wavenumber, RotatingMode guess) {
    double kx = wavenumber * scales.length();
    if (bound(kx) == 0.0) {
      return Optional.empty();
    }
    Complex start = new Complex(guess.growthRate() * scales.time(), guess.frequency() * scales.time());
    for (int halving = 0; halving <= MOST_HALVINGS; halving++) {
      Complex root = new RotatingRoots(working, kx, ky).refine(start);
      if (root == null) {
        return Optional.empty();
      }
      root = Math.abs(root.getImaginary()) < REAL * root.abs() ? new Complex(root.getReal(), 0.0) : root;
      RotatingMode mode = checked(kx, root);
      if (mode.growthError() <= problem.tolerance()) {
        return Optional.of(mode);
      }
      adopt(mesh.halved());
    }
    throw new UnsolvedException("a rotating mode could not be brought to the tolerance " + problem.tolerance());
  }

  /** Number of modes that grow faster than a rate (s^-1) at a wavenumber (cm^-1), by the argument principle. */
  public int fasterThan(double growthRate, double wavenumber) {
    double kx = wavenumber * scales.length();
    double radius = bound(kx) * (1.0 + HAIR);
    double edge = growthRate * scales.time();
    return edge >= radius ? 0 : new WindingContour(working, kx, ky).zeros(edge, radius);
  }

  /** Height of the kinetic-energy centroid of a mode of this solver, cm. */
  public double centroidHeight(RotatingMode mode) {
    return shape(mode).centroid() * scales.length();
  }

  /** Its column contrast, as of {@link EigenMode#columnContrast()}, dimensionless. */
  public double columnContrast(RotatingMode mode) {
    double[] rootDensity = checking.atmosphere().rootDensity(problem.equilibrium(), scales);
    return shape(mode).columnContrast(problem.parity(), rootDensity);
  }

  private RotatingShape shape(RotatingMode mode) {
    Complex s = new Complex(mode.growthRate() * scales.time(), mode.frequency() * scales.time());
    return new RotatingShape(checking, s, mode.wavenumber() * scales.length(), ky);
  }
}
