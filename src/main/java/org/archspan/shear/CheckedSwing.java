package org.archspan.shear;

import java.util.List;
import java.util.Locale;
import org.archspan.mesh.Mesh;
import org.archspan.stability.UnsolvedException;

/** The best motion from one start, with steps and elements halved until the amplification stands still. */
final class CheckedSwing {
  private static final double KICK_TOLERANCE = 1e-6;
  private static final int KICK_ROUNDS = 30;
  private static final int MOST_HALVINGS = 8;
  private static final int MOST_MESHES = 4;

  private final Swing swing;
  private final double start;
  private final double tolerance;
  private int steps;
  private double stepError;

  CheckedSwing(Swing swing, double start, double tolerance) {
    this.swing = swing;
    this.start = start;
    this.tolerance = tolerance;
  }

  /** Solves on halves of these elements until two meshes agree. */
  Amplification solve(Mesh mesh, List<StartGain> starts, List<String> warnings) {
    Mesh current = mesh;
    steps = swing.coarseSteps(swing.column(mesh));
    Track last = track(current);
    for (int round = 1; round < MOST_MESHES; round++) {
      current = current.halved();
      Track finer = track(current);
      double error = Math.abs(finer.logGain() - last.logGain()) + stepError;
      if (error <= tolerance) {
        return swing.result(finer, error, starts, warnings);
      }
      last = finer;
    }
    throw new UnsolvedException(String.format(Locale.ROOT, "the amplification could not be brought to a relative error of"
        + " %.0e with %d elements: the wave is wound up more finely than that; shorten --duration or ask for a larger"
        + " --amplification-error", tolerance, current.elements()));
  }

  /** The best kick on a mesh, followed with steps short enough. */
  private Track track(Mesh mesh) {
    WindingWave winding = swing.winding(swing.column(mesh));
    BestKick best = swing.kick(winding, start, steps);
    best.improve(KICK_TOLERANCE, KICK_ROUNDS);
    Track before = swing.track(winding, start, steps, best.kick());
    for (int halving = 0; halving < MOST_HALVINGS; halving++) {
      Track now = swing.track(winding, start, 2 * steps, best.kick());
      stepError = Math.abs(now.logGain() - before.logGain());
      if (stepError <= 0.5 * tolerance && now.wellPosed()) {
        return now;
      }
      steps *= 2;
      before = now;
    }
    throw new UnsolvedException("the steps in time could not be made short enough in " + steps
        + " of them; shorten --duration or ask for a larger --amplification-error");
  }
}
