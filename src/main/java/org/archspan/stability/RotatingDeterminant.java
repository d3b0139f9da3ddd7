package org.archspan.stability;

import org.apache.commons.math3.complex.Complex;
import org.archspan.linalg.ComplexFront;
import org.archspan.mesh.Mesh;
import org.archspan.mesh.ReferenceElement;

/**
 * The determinant of S(s) under rigid rotation on a mesh: analytic in Re s > 0, where the eliminated block of X and Y, a
 * gyroscopic system of its own with positive stiffness, is never singular. Above a lid or a free surface, or below an open
 * top, the conditions are those of {@link DynamicStiffness}. One instance for one thread.
 */
final class RotatingDeterminant {
  private final Atmosphere atmosphere;
  private final ModeProblem problem;
  private final RotatingForm form;
  private final ReferenceElement element;
  private final int unknowns;
  private final ComplexFront front;
  private final double[] gram;
  private final double[] vectorReal;
  private final double[] vectorImaginary;
  private long evaluations;

  RotatingDeterminant(ModeProblem problem, Scales scales, Mesh mesh, double angularSpeed) {
    this.problem = problem;
    atmosphere = new Atmosphere(problem.equilibrium(), scales, mesh, problem.perturbedGravity(), problem.turn());
    form = new RotatingForm(problem, scales, atmosphere, angularSpeed);
    element = mesh.reference();
    unknowns = problem.perturbedGravity() ? 2 : 1;
    int n = element.degree() + 1;
    front = new ComplexFront(mesh.elements(), unknowns * n, unknowns);
    gram = element.slopeGram();
    int length = mesh.elements() * unknowns * (n - 1) + unknowns;
    vectorReal = new double[length];
    vectorImaginary = new double[length];
  }

  Atmosphere atmosphere() {
    return atmosphere;
  }

  RotatingForm form() {
    return form;
  }

  /** Determinants evaluated so far. */
  long evaluations() {
    return evaluations;
  }

  /** ln |det S|. */
  double logMagnitude() {
    return front.logMagnitude();
  }

  /** Argument of det S, rad, not reduced. */
  double phase() {
    return front.phase();
  }

  /** Evaluates at s = growth + i frequency. O(elements degree^3), no allocation. */
  void evaluate(double growth, double frequency, double kx, double ky) {
    evaluations++;
    form.fill(growth, frequency, kx, ky);
    java.util.Arrays.fill(front.real(), 0.0);
    java.util.Arrays.fill(front.imaginary(), 0.0);
    for (int e = 0; e < atmosphere.mesh.elements(); e++) {
      assemble(e, kx * kx + ky * ky);
    }
    close(Math.hypot(kx, ky));
    front.factor();
  }

  private int entry(int e, int row, int rowUnknown, int column, int columnUnknown) {
    int size = unknowns * (element.degree() + 1);
    return e * size * size + (row * unknowns + rowUnknown) * size + column * unknowns + columnUnknown;
  }

  private void assemble(int e, double waveSquared) {
    int n = element.degree() + 1;
    double[] derivative = element.derivative();
    double[] re = front.real();
    double[] im = front.imaginary();
    for (int q = 0; q < n; q++) {
      int node = e * n + q;
      double g = atmosphere.gravity[node];
      double half = 0.5 * atmosphere.inverseScaleHeight[node];
      double ar = form.real[0][node];
      double ai = form.imaginary[0][node];
      double slopeWeight = atmosphere.slopeWeight[node];
      double mixedWeight = atmosphere.mixedWeight[node];
      double rowReal = mixedWeight * (g * form.real[1][node] + ar * half);
      double rowImaginary = mixedWeight * (g * form.imaginary[1][node] + ai * half);
      double columnReal = mixedWeight * (g * form.real[2][node] + ar * half);
      double columnImaginary = mixedWeight * (g * form.imaginary[2][node] + ai * half);
      for (int i = 0; i < n; i++) {
        double di = derivative[q * n + i];
        for (int j = 0; j < n; j++) {
          int at = entry(e, i, 0, j, 0);
          double product = slopeWeight * di * derivative[q * n + j];
          re[at] += ar * product;
          im[at] += ai * product;
        }
        int slopeRow = entry(e, i, 0, q, 0);
        re[slopeRow] += rowReal * di;
        im[slopeRow] += rowImaginary * di;
        int slopeColumn = entry(e, q, 0, i, 0);
        re[slopeColumn] += columnReal * di;
        im[slopeColumn] += columnImaginary * di;
      }
      double mixedReal = g * (form.real[1][node] + form.real[2][node]) + ar * half;
      double mixedImaginary = g * (form.imaginary[1][node] + form.imaginary[2][node]) + ai * half;
      int diagonal = entry(e, q, 0, q, 0);
      double w = atmosphere.weight[node];
      re[diagonal] += w * (form.real[4][node] - g * g * form.real[3][node] + half * mixedReal);
      im[diagonal] += w * (form.imaginary[4][node] - g * g * form.imaginary[3][node] + half * mixedImaginary);
      if (unknowns == 2) {
        couple(e, q, waveSquared);
      }
    }
  }

  /** The terms of the potential at node q of an element. */
  private void couple(int e, int q, double waveSquared) {
    int n = element.degree() + 1;
    int node = e * n + q;
    double[] re = front.real();
    double[] im = front.imaginary();
    double omega = atmosphere.jeansFrequency[node];
    double h = atmosphere.inverseScaleHeight[node];
    double weight = atmosphere.weight[node];
    double mixed = atmosphere.mixedWeight[node] * omega;
    double scale = 2.0 / atmosphere.mesh.length(e);
    for (int i = 0; i < n; i++) {
      double di = element.derivative()[q * n + i];
      re[entry(e, i, 0, q, 1)] += mixed * form.real[1][node] * di;
      im[entry(e, i, 0, q, 1)] += mixed * form.imaginary[1][node] * di;
      re[entry(e, q, 1, i, 0)] += mixed * form.real[2][node] * di;
      im[entry(e, q, 1, i, 0)] += mixed * form.imaginary[2][node] * di;
      re[entry(e, q, 1, i, 1)] += scale * gram[q * n + i];
    }
    double pull = atmosphere.gravity[node] * omega;
    double flatReal = weight * (omega * h - pull * form.real[3][node]);
    double flatImaginary = -weight * pull * form.imaginary[3][node];
    double half = 0.5 * weight * h * omega;
    re[entry(e, q, 0, q, 1)] += flatReal + half * form.real[1][node];
    im[entry(e, q, 0, q, 1)] += flatImaginary + half * form.imaginary[1][node];
    re[entry(e, q, 1, q, 0)] += flatReal + half * form.real[2][node];
    im[entry(e, q, 1, q, 0)] += flatImaginary + half * form.imaginary[2][node];
    re[entry(e, q, 1, q, 1)] += weight * (waveSquared - omega * omega * form.real[3][node]);
    im[entry(e, q, 1, q, 1)] -= weight * omega * omega * form.imaginary[3][node];
  }

  /** Conditions at both ends; what is fixed becomes a decoupled 1. */
  private void close(double wavenumber) {
    int last = atmosphere.mesh.elements() - 1;
    int n = element.degree() + 1;
    int top = atmosphere.nodes() - 1;
    switch (problem.topBoundary()) {
      case LID -> fix(last, n - 1, 0);
      case FREE -> front.real()[entry(last, n - 1, 0, n - 1, 0)] += atmosphere.gravity[top];
      case OPEN -> open(last, n - 1, top);
    }
    if (unknowns == 2) {
      front.real()[entry(last, n - 1, 1, n - 1, 1)] += wavenumber;
      if (problem.topBoundary() != org.archspan.boundary.TopBoundary.LID) {
        front.real()[entry(last, n - 1, 0, n - 1, 1)] += atmosphere.jeansFrequency[top];
        front.real()[entry(last, n - 1, 1, n - 1, 0)] += atmosphere.jeansFrequency[top];
      }
    }
    if (problem.bottomFixed()) {
      fix(0, 0, 0);
    } else if (unknowns == 2) {
      fix(0, 0, 1);
    }
  }

  private void fix(int e, int node, int unknown) {
    int n = element.degree() + 1;
    for (int i = 0; i < n; i++) {
      for (int u = 0; u < unknowns; u++) {
        int row = entry(e, node, unknown, i, u);
        int column = entry(e, i, u, node, unknown);
        front.real()[row] = 0.0;
        front.imaginary()[row] = 0.0;
        front.real()[column] = 0.0;
        front.imaginary()[column] = 0.0;
      }
    }
    front.real()[entry(e, node, unknown, node, unknown)] = 1.0;
  }

  /** Above an open top zeta falls as exp(-mu z), a mu^2 + (b_2 - b_1) mu - c = 0 with Re mu > 0. */
  private void open(int e, int node, int top) {
    double g = atmosphere.gravity[top];
    double half = 0.5 * atmosphere.inverseScaleHeight[top];
    Complex a = new Complex(form.real[0][top], form.imaginary[0][top]);
    Complex first = new Complex(g * form.real[1][top], g * form.imaginary[1][top]);
    Complex second = new Complex(g * form.real[2][top], g * form.imaginary[2][top]);
    Complex rowMixed = first.add(a.multiply(half));
    Complex c = new Complex(form.real[4][top] - g * g * form.real[3][top],
        form.imaginary[4][top] - g * g * form.imaginary[3][top])
        .add(first.add(second).add(a.multiply(half)).multiply(half));
    Complex difference = second.subtract(first);
    Complex root = difference.multiply(difference).add(a.multiply(c).multiply(4.0)).sqrt();
    Complex decay = root.subtract(difference).divide(a.multiply(2.0));
    if (decay.getReal() < 0.0) {
      decay = root.multiply(-1.0).subtract(difference).divide(a.multiply(2.0));
    }
    Complex added = a.multiply(decay).subtract(rowMixed);
    int at = entry(e, node, 0, node, 0);
    front.real()[at] += added.getReal();
    front.imaginary()[at] += added.getImaginary();
  }

  /** After an evaluation at a root: the values of zeta at the nodes, and of the potential, by one inverse iteration. */
  void nullVector(double[] zetaReal, double[] zetaImaginary, double[] potentialReal, double[] potentialImaginary) {
    for (int i = 0; i < vectorReal.length; i++) {
      vectorReal[i] = 1.0 + 0.1 * Math.sin(i);
      vectorImaginary[i] = 0.0;
    }
    front.solve(vectorReal, vectorImaginary);
    double greatest = 0.0;
    for (int i = 0; i < vectorReal.length; i++) {
      greatest = Math.max(greatest, Math.hypot(vectorReal[i], vectorImaginary[i]));
    }
    int n = element.degree() + 1;
    for (int node = 0; node < atmosphere.nodes(); node++) {
      int at = unknowns * (node / n * (n - 1) + node % n);
      zetaReal[node] = vectorReal[at] / greatest;
      zetaImaginary[node] = vectorImaginary[at] / greatest;
      if (unknowns == 2) {
        potentialReal[node] = vectorReal[at + 1] / greatest;
        potentialImaginary[node] = vectorImaginary[at + 1] / greatest;
      }
    }
  }
}
