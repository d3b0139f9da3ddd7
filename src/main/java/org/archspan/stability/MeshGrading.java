package org.archspan.stability;

import java.util.Arrays;
import org.archspan.equilibrium.Equilibrium;
import org.archspan.mesh.Mesh;
import org.archspan.mesh.ReferenceElement;

/** Chooses the elements: graded from the lower end, aligned with kinks, split where a mode is not yet resolved. */
public final class MeshGrading {
  private static final double FIRST_LENGTH = 1.5;
  private static final double GROWTH = 2.0;
  private static final double SPLIT_SHARE = 0.2;
  /** The kinks of a table with more entries than this are too faint to need edges of their own. */
  private static final int MOST_KINKS = 200;

  private MeshGrading() {
  }

  /**
   * A first mesh, in scale lengths: its lowest element spans the shortest length over which the base state changes, and
   * each next one twice as much. At least two elements: between two fixed ends one alone would leave no node that couples
   * elements, and no vector to refine a root with.
   */
  public static Mesh initial(Equilibrium equilibrium, int degree) {
    return initial(equilibrium, Scales.of(equilibrium), degree);
  }

  static Mesh initial(Equilibrium equilibrium, Scales scales, int degree) {
    double bottom = equilibrium.bottom() / scales.length();
    double top = equilibrium.top() / scales.length();
    double length = 1.0;
    for (double landmark : equilibrium.landmarks()) {
      length = Math.min(length, landmark / scales.length());
    }
    length = Math.min(FIRST_LENGTH * length, 0.5 * (top - bottom));
    double[] kinks = equilibrium.kinks().length > MOST_KINKS ? new double[0]
        : Arrays.stream(equilibrium.kinks()).map(z -> z / scales.length()).toArray();
    double[] edges = new double[kinks.length + 2 + (int) Math.ceil(4.0 + Math.log1p((top - bottom) / length) * 2.0)];
    int count = 0;
    edges[count++] = bottom;
    double z = bottom;
    while (z < top) {
      double next = z + 1.4 * length >= top ? top : z + length;
      for (double kink : kinks) {
        if (kink > z && kink < next) {
          next = kink;
        }
      }
      length = next == z + length ? GROWTH * length : length;
      z = next;
      edges[count++] = z;
    }
    return new Mesh(Arrays.copyOf(edges, count), degree);
  }

  /**
   * Splits the elements in which a mode's highest Legendre coefficients carry most of the unresolved energy.
   *
   * @param resolved a mode on these elements, of whatever degree
   */
  static double[] split(Atmosphere resolved, double[] zeta) {
    int elements = resolved.mesh.elements();
    double[] energy = new double[elements];
    double greatest = 0.0;
    for (int e = 0; e < elements; e++) {
      energy[e] = tailEnergy(resolved, zeta, e);
      greatest = Math.max(greatest, energy[e]);
    }
    boolean[] chosen = new boolean[elements];
    for (int e = 0; e < elements; e++) {
      chosen[e] = energy[e] >= SPLIT_SHARE * greatest;
    }
    return split(resolved.mesh, chosen);
  }

  /** The edges after cutting the chosen elements in two. */
  static double[] split(Mesh mesh, boolean[] chosen) {
    double[] edges = new double[2 * mesh.elements() + 1];
    int count = 0;
    for (int e = 0; e < mesh.elements(); e++) {
      edges[count++] = mesh.edges()[e];
      if (chosen[e]) {
        edges[count++] = 0.5 * (mesh.edges()[e] + mesh.edges()[e + 1]);
      }
    }
    edges[count++] = mesh.edges()[mesh.elements()];
    return Arrays.copyOf(edges, count);
  }

  private static double tailEnergy(Atmosphere atmosphere, double[] zeta, int e) {
    ReferenceElement element = atmosphere.mesh.reference();
    int n = element.degree() + 1;
    double[] tail = element.legendreTail();
    double lower = 0.0;
    double upper = 0.0;
    double scale = 0.0;
    for (int i = 0; i < n; i++) {
      lower += tail[i] * zeta[e * n + i];
      upper += tail[n + i] * zeta[e * n + i];
      scale = Math.max(scale, atmosphere.alfvenSquared[e * n + i] + atmosphere.gasPerMass[e * n + i]);
    }
    double p = element.degree();
    return scale * p * p * (lower * lower + upper * upper) / atmosphere.mesh.length(e);
  }
}
