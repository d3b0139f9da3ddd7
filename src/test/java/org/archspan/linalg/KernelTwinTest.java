package org.archspan.linalg;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.archspan.mesh.ReferenceElement;
import org.ejml.data.DMatrixRMaj;
import org.ejml.dense.row.factory.DecompositionFactory_DDRM;
import org.ejml.interfaces.decomposition.EigenDecomposition_F64;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The kernels against their plain twins: dense matrices whose eigenvalues EJML finds. */
class KernelTwinTest {
  private static int negativeEigenvalues(double[][] matrix) {
    EigenDecomposition_F64<DMatrixRMaj> eigen = DecompositionFactory_DDRM.eig(matrix.length, false, true);
    eigen.decompose(new DMatrixRMaj(matrix));
    int count = 0;
    for (int i = 0; i < matrix.length; i++) {
      count += eigen.getEigenvalue(i).getReal() < 0.0 ? 1 : 0;
    }
    return count;
  }

  private static double[][] randomSymmetric(Random random, int n, double shift) {
    double[][] matrix = new double[n][n];
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        matrix[i][j] = random.nextGaussian();
        matrix[j][i] = matrix[i][j];
      }
      matrix[i][i] += shift;
    }
    return matrix;
  }

  /** Haynsworth: pivots of the eliminated part and eigenvalues of the Schur complement make up the inertia. */
  @RepeatedTest(200)
  void eliminationKeepsTheInertia(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    int n = 3 + random.nextInt(12);
    int eliminated = 1 + random.nextInt(n - 2);
    double[][] matrix = randomSymmetric(random, n, 3.0 * random.nextGaussian());
    double[] packed = new double[n * (n + 1) / 2];
    int at = 0;
    for (int i = 0; i < n; i++) {
      for (int j = i; j < n; j++) {
        packed[at++] = matrix[i][j];
      }
    }
    int pivots = PackedElimination.eliminate(packed, 0, n, eliminated);
    int kept = n - eliminated;
    double[][] schur = new double[kept][kept];
    at = packed.length - kept * (kept + 1) / 2;
    for (int i = 0; i < kept; i++) {
      for (int j = i; j < kept; j++) {
        schur[i][j] = packed[at];
        schur[j][i] = packed[at++];
      }
    }
    assertThat(pivots + negativeEigenvalues(schur)).isEqualTo(negativeEigenvalues(matrix));

    double[] x = new double[n];
    for (int i = eliminated; i < n; i++) {
      x[i] = random.nextGaussian();
    }
    PackedElimination.extend(packed, 0, n, eliminated, x);
    double size = 0.0;
    for (double value : x) {
      size = Math.max(size, Math.abs(value));
    }
    for (int i = 0; i < eliminated; i++) {
      double row = 0.0;
      for (int j = 0; j < n; j++) {
        row += matrix[i][j] * x[j];
      }
      // 1e-8 of the solution: random indefinite matrices without pivoting lose some digits
      assertThat(row).isCloseTo(0.0, within(1e-8 * Math.max(1.0, size)));
    }
  }

  @RepeatedTest(200)
  void tridiagonalCountAndNullVector(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    int n = 1 + random.nextInt(15);
    double[] diagonal = new double[n];
    double[] offDiagonal = new double[Math.max(1, n - 1)];
    double[][] matrix = new double[n][n];
    double shift = 2.0 * random.nextGaussian();
    for (int i = 0; i < n; i++) {
      diagonal[i] = random.nextGaussian() + shift;
      matrix[i][i] = diagonal[i];
      if (i + 1 < n) {
        offDiagonal[i] = random.nextGaussian();
        matrix[i][i + 1] = offDiagonal[i];
        matrix[i + 1][i] = offDiagonal[i];
      }
    }
    TwistedTridiagonal twisted = new TwistedTridiagonal(n);
    assertThat(twisted.count(diagonal, offDiagonal, 0, n)).isEqualTo(negativeEigenvalues(matrix));
    double[] x = new double[n];
    twisted.nullVector(diagonal, offDiagonal, 0, x);
    double form = 0.0;
    double size = 0.0;
    for (int i = 0; i < n; i++) {
      double row = 0.0;
      for (int j = 0; j < n; j++) {
        row += matrix[i][j] * x[j];
      }
      form += x[i] * row;
      size = Math.max(size, x[i] * x[i]);
    }
    // 1e-9 of the vector's square: T x = r e_k makes the quadratic form equal to r
    assertThat(form).isCloseTo(twisted.residual(), within(1e-9 * Math.max(1.0, size)));
  }

  @ParameterizedTest
  @ValueSource(ints = {2, 3, 4, 7, 8, 10, 13})
  void assemblyIsTheTripleLoop(int degree) {
    ReferenceElement element = ReferenceElement.ofDegree(degree);
    int n = degree + 1;
    Random random = new Random(degree);
    double[] a = random.doubles(n).toArray();
    double[] b = random.doubles(n).toArray();
    double[] c = random.doubles(n).toArray();
    double[] packed = new double[n * (n + 1) / 2];
    ElementAssembly.assemble(a, b, c, 0, n, element.slopeProducts(), element.pairFirst(), element.pairSecond(),
        element.pairSlope(), element.pairSlopeReversed(), packed, 0);
    for (int pair = 0; pair < packed.length; pair++) {
      int i = element.pairFirst()[pair];
      int j = element.pairSecond()[pair];
      double sum = i == j ? c[i] : 0.0;
      sum += b[i] * element.derivative()[i * n + j] + b[j] * element.derivative()[j * n + i];
      for (int q = 0; q < n; q++) {
        sum += a[q] * element.derivative()[q * n + i] * element.derivative()[q * n + j];
      }
      // 1e-13 of the largest entry of such matrices, about degree^4/10
      assertThat(packed[pair]).isCloseTo(sum, within(1e-13 * Math.pow(degree, 4)));
    }
  }

  /** The rule integrates x^k exactly up to degree 2p - 1, and slopes of polynomials are exact. */
  @ParameterizedTest
  @ValueSource(ints = {2, 5, 8, 16, 24})
  void lobattoRuleAndSlopesAreExact(int degree) {
    ReferenceElement element = ReferenceElement.ofDegree(degree);
    int n = degree + 1;
    for (int power = 0; power <= 2 * degree - 1; power++) {
      double sum = 0.0;
      for (int q = 0; q < n; q++) {
        sum += element.weights()[q] * Math.pow(element.nodes()[q], power);
      }
      // 1e-13: rounding of some dozen terms
      assertThat(sum).isCloseTo(power % 2 == 0 ? 2.0 / (power + 1) : 0.0, within(1e-13));
    }
    for (int q = 0; q < n; q++) {
      double slope = 0.0;
      for (int i = 0; i < n; i++) {
        slope += element.derivative()[q * n + i] * Math.pow(element.nodes()[i], degree);
      }
      // 1e-11: entries of the matrix grow as degree^2
      assertThat(slope).isCloseTo(degree * Math.pow(element.nodes()[q], degree - 1), within(1e-11));
    }
  }
}
