package org.archspan.uncertainty;

import java.util.List;
import java.util.SplittableRandom;
import org.apache.commons.math3.random.SobolSequenceGenerator;

/**
 * Which values the inputs take in each draw. Draw i depends on the seed and i alone: points of a Sobol' sequence
 * (Sobol' 1967; directions of Joe and Kuo 2008) whose binary digits are shifted at random, which
 * keeps the evenness of the sequence (a digital shift, L'Ecuyer and Lemieux 2002).
 *
 * <p>A design for sensitivities makes groups of n + 2 draws from one point of twice as many dimensions: two
 * independent draws A and B, and for each input a draw that has its value from B and all others from A (Saltelli et
 * al. 2010, Comput. Phys. Commun. 181, 259). Each draw of a group is by itself a fair draw.
 *
 * @param inputs        that are uncertain, at least one, at most 500
 * @param seed          of the shift
 * @param sensitivities whether draws come in groups
 */
public record DrawDesign(List<UncertainInput> inputs, long seed, boolean sensitivities) {
  private static final int BITS = 52;

  /** Copies the list. */
  public DrawDesign {
    inputs = List.copyOf(inputs);
  }

  /** Draws in a group; 1 where they stand alone. */
  public int groupSize() {
    return sensitivities ? inputs.size() + 2 : 1;
  }

  /**
   * The values of successive draws, in the CGS units of the inputs, shape [count][inputs].
   *
   * @param first index of the first, 0 or more, below 2^31 groups
   */
  public double[][] values(long first, int count) {
    int group = groupSize();
    int dimensions = sensitivities ? 2 * inputs.size() : inputs.size();
    long[] shift = new SplittableRandom(seed).longs(dimensions).map(bits -> bits >>> (Long.SIZE - BITS)).toArray();
    SobolSequenceGenerator sequence = new SobolSequenceGenerator(dimensions);
    long point = first / group;
    // the point at index i + 1 is the one that follows index i; the first, all zeros, is a fair point once shifted
    double[] position = sequence.skipTo(Math.toIntExact(point));
    double[][] values = new double[count][];
    for (int i = 0; i < count; i++) {
      if ((first + i) / group != point) {
        point = (first + i) / group;
        position = sequence.nextVector();
      }
      values[i] = draw(position, shift, (int) ((first + i) % group));
    }
    return values;
  }

  private double[] draw(double[] position, long[] shift, int role) {
    double[] values = new double[inputs.size()];
    for (int j = 0; j < values.length; j++) {
      boolean second = role == 1 || role == j + 2;
      int dimension = second ? inputs.size() + j : j;
      values[j] = inputs.get(j).distribution().quantile(shifted(position[dimension], shift[dimension]));
    }
    return values;
  }

  /** Within (0, 1): a half is added to the last digit. */
  private static double shifted(double share, long shift) {
    long digits = (long) (share * (1L << BITS)) ^ shift;
    return (digits + 0.5) / (1L << BITS);
  }
}
