package org.archspan.uncertainty;

/**
 * First-order and total shares of each input in the variance of an answer (Sobol' 1993, Math. Model. Comput. Exp. 1,
 * 407), from groups of draws as {@link DrawDesign} makes them: first-order by Saltelli et al. (2010, Comput. Phys.
 * Commun. 181, 259, their formula b), total by Jansen (1999, Comput. Phys. Commun. 117, 35). A group of which one
 * draw has no answer is left out.
 */
public final class SobolIndices {
  private final double[] answers;
  private final double[] first;
  private final double[] firstSquare;
  private final double[] total;
  private final double[] totalSquare;
  private boolean whole;
  private long groups;
  private long left;
  private double mean;
  private double squares;

  /** For so many inputs. */
  public SobolIndices(int inputs) {
    answers = new double[inputs + 2];
    first = new double[inputs];
    firstSquare = new double[inputs];
    total = new double[inputs];
    totalSquare = new double[inputs];
  }

  /**
   * Takes the answer of the next draw.
   *
   * @param role   place of the draw in its group
   * @param answer in any unit; NaN where there is none
   */
  public void add(int role, double answer) {
    whole |= role == 0;
    answers[role] = answer;
    if (role == answers.length - 1 && whole) {
      close();
    }
  }

  /** A group whose first draws belong to another part is not whole, and does not get here. */
  private void close() {
    for (double answer : answers) {
      if (Double.isNaN(answer)) {
        left++;
        return;
      }
    }
    // the mean of the groups before does not depend on this one, which keeps the estimate without bias
    double centre = groups == 0 ? 0.5 * (answers[0] + answers[1]) : mean;
    groups++;
    spread(answers[0], 2 * groups - 1);
    spread(answers[1], 2 * groups);
    for (int j = 0; j < first.length; j++) {
      double unlikeA = 0.5 * (answers[0] - answers[j + 2]) * (answers[0] - answers[j + 2]);
      double like = (answers[1] - centre) * (answers[j + 2] - answers[0]);
      total[j] += unlikeA;
      totalSquare[j] += unlikeA * unlikeA;
      first[j] += like;
      firstSquare[j] += like * like;
    }
  }

  /** Mean and squared deviations, updated without cancellation (Welford 1962). */
  private void spread(double answer, long count) {
    double off = answer - mean;
    mean += off / count;
    squares += off * (answer - mean);
  }

  /** Groups that were used. */
  public long groups() {
    return groups;
  }

  /** Complete groups that were left out because a draw had no answer. */
  public long leftOut() {
    return left;
  }

  private double variance() {
    return squares / (2.0 * groups - 1.0);
  }

  /**
   * First-order index of an input, dimensionless: share of the variance that goes if it becomes known. NaN without
   * spread.
   */
  public double first(int input) {
    return first[input] / groups / variance();
  }

  /** Total index of an input, dimensionless: share that remains if all others become known. NaN without spread. */
  public double total(int input) {
    return total[input] / groups / variance();
  }

  /**
   * Standard error of the first-order index, dimensionless, as of independent groups: an upper estimate for even
   * draws.
   */
  public double firstError(int input) {
    return error(first[input], firstSquare[input]);
  }

  /** The same of the total index, dimensionless. */
  public double totalError(int input) {
    return error(total[input], totalSquare[input]);
  }

  private double error(double sum, double sumOfSquares) {
    double average = sum / groups;
    return Math.sqrt(Math.max(0.0, sumOfSquares / groups - average * average) / groups) / variance();
  }
}
