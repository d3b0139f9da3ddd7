package org.archspan.linalg;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexField;
import org.apache.commons.math3.linear.Array2DRowFieldMatrix;
import org.apache.commons.math3.linear.ArrayFieldVector;
import org.apache.commons.math3.linear.FieldLUDecomposition;
import org.apache.commons.math3.linear.FieldMatrix;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;

/** The complex chain against its plain twin: the assembled dense matrix and the field LU of Commons Math. */
class ComplexFrontTest {
  /** Random fronts with a heavy diagonal, so that elimination in order is stable. */
  private static FieldMatrix<Complex> fill(ComplexFront chain, Random random, int fronts, int size, int coupled) {
    int step = size - coupled;
    int n = fronts * step + coupled;
    FieldMatrix<Complex> dense = new Array2DRowFieldMatrix<>(ComplexField.getInstance(), n, n);
    for (int e = 0; e < fronts; e++) {
      for (int i = 0; i < size; i++) {
        for (int j = 0; j < size; j++) {
          double re = random.nextGaussian() + (i == j ? 3.0 * size : 0.0);
          double im = random.nextGaussian();
          chain.real()[(e * size + i) * size + j] = re;
          chain.imaginary()[(e * size + i) * size + j] = im;
          dense.addToEntry(e * step + i, e * step + j, new Complex(re, im));
        }
      }
    }
    return dense;
  }

  @RepeatedTest(60)
  void determinantAndSolutionAreThoseOfTheDenseMatrix(RepetitionInfo repetition) {
    Random random = new Random(repetition.getCurrentRepetition());
    int coupled = 1 + random.nextInt(2);
    int size = 2 * coupled + 1 + random.nextInt(5);
    int fronts = 1 + random.nextInt(4);
    ComplexFront chain = new ComplexFront(fronts, size, coupled);
    FieldMatrix<Complex> dense = fill(chain, random, fronts, size, coupled);
    int n = dense.getRowDimension();
    double[] xr = random.doubles(n, -1.0, 1.0).toArray();
    double[] xi = random.doubles(n, -1.0, 1.0).toArray();
    Complex[] right = new Complex[n];
    for (int i = 0; i < n; i++) {
      right[i] = new Complex(xr[i], xi[i]);
    }
    FieldLUDecomposition<Complex> plain = new FieldLUDecomposition<>(dense);
    Complex determinant = plain.getDeterminant();
    Complex[] expected = plain.getSolver().solve(new ArrayFieldVector<>(ComplexField.getInstance(), right)).toArray();
    chain.factor();
    chain.solve(xr, xi);
    // 1e-12: rounding of some thirty steps on a matrix that is well conditioned
    assertThat(chain.logMagnitude()).isCloseTo(Math.log(determinant.abs()), within(1e-12 * n));
    assertThat(Math.IEEEremainder(chain.phase() - determinant.getArgument(), 2.0 * Math.PI)).isCloseTo(0.0, within(1e-12));
    for (int i = 0; i < n; i++) {
      assertThat(new Complex(xr[i], xi[i]).subtract(expected[i]).abs()).isLessThan(1e-12);
    }
  }
}
