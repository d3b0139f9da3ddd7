package org.archspan.uncertainty;

/** Solves the model for the values of one draw. Must be safe for several threads. */
@FunctionalInterface
public interface DrawSolver {
  /**
   * The answer; a draw without one is a row that says why.
   *
   * @param draw   index of the draw
   * @param values of the uncertain inputs, CGS
   */
  DrawRow solve(long draw, double[] values);
}
