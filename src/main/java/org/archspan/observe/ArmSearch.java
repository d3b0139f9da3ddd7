package org.archspan.observe;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * Finds the logarithmic spiral that most complexes follow: every pitch angle of both windings on a grid, each with
 * offsets through the complexes themselves and several widths, the best refined. It takes no count of turns: a complex
 * belongs to the turn that passes closest, so an arm may go round the centre more than once.
 */
public final class ArmSearch {
  /** Smallest pitch angle that is searched, rad (2 deg): below, a ring is as good a description. */
  public static final double TIGHTEST = Math.toRadians(2.0);
  /** Largest pitch angle that is searched, rad (60 deg). */
  public static final double MOST_OPEN = Math.toRadians(60.0);

  private static final double STEP = Math.toRadians(0.25);
  private static final double[] WIDTHS = {0.015, 0.04, 0.1};
  private static final double STRAYS = 0.1;
  private static final int MOST_STARTS = 40;
  private static final int REFINED = 24;

  private final List<LogPolarPoint> points = new ArrayList<>();
  private final double referenceRadius;

  /** A search among complexes off the centre. */
  public ArmSearch(List<PlanePosition> positions) {
    referenceRadius = Math.exp(positions.stream().mapToDouble(each -> Math.log(each.radius())).average().orElseThrow());
    for (PlanePosition each : positions) {
      points.add(new LogPolarPoint(Math.log(each.radius() / referenceRadius), each.azimuth(), each));
    }
  }

  /**
   * Arms with locally greatest likelihood and a pitch angle of the range, best first, without repetitions. O(10^3
   * n^2).
   */
  public List<FittedArm> arms() {
    List<FittedArm> arms = new ArrayList<>();
    List<ArmMixture> starts = starts();
    starts.stream().limit(REFINED).map(start -> new ArmRefinement(points, start).fitted())
        .filter(arm -> inRange(arm.spiral().pitchAngle()))
        .sorted(Comparator.comparingDouble(FittedArm::logLikelihood).reversed()).forEach(arm -> {
          if (arms.stream().noneMatch(better -> same(better, arm))) {
            arms.add(arm);
          }
        });
    return arms;
  }

  private static boolean inRange(double pitch) {
    return Math.abs(pitch) >= TIGHTEST && Math.abs(pitch) <= MOST_OPEN;
  }

  private static boolean same(FittedArm one, FittedArm other) {
    double difference = Math.abs(one.spiral().pitchAngle() - other.spiral().pitchAngle());
    return difference < 3.0 * Math.max(one.pitchError(), other.pitchError());
  }

  /** The best mixture at each pitch angle, where it is better than at the neighbouring ones; best first. */
  private List<ArmMixture> starts() {
    List<ArmMixture> starts = new ArrayList<>();
    for (int winding = -1; winding <= 1; winding += 2) {
      List<Scored> scored = new ArrayList<>();
      for (double pitch = TIGHTEST; pitch <= MOST_OPEN; pitch += STEP) {
        scored.add(best(winding * pitch));
      }
      for (int i = 0; i < scored.size(); i++) {
        double below = i == 0 ? Double.NEGATIVE_INFINITY : scored.get(i - 1).score();
        double above = i == scored.size() - 1 ? Double.NEGATIVE_INFINITY : scored.get(i + 1).score();
        if (scored.get(i).score() >= below && scored.get(i).score() >= above) {
          starts.add(scored.get(i).mixture());
        }
      }
    }
    starts.sort(Comparator.comparingDouble((ArmMixture mixture) -> mixture.logLikelihood(points)).reversed());
    return starts;
  }

  private Scored best(double pitch) {
    int stride = 1 + (points.size() - 1) / MOST_STARTS;
    Optional<Scored> best = Optional.empty();
    for (int i = 0; i < points.size(); i += stride) {
      LogPolarPoint through = points.get(i);
      double offset = through.logRadius() * Math.cos(pitch) - through.azimuth() * Math.sin(pitch);
      for (double width : WIDTHS) {
        ArmMixture mixture = new ArmMixture(new LogarithmicSpiral(pitch, offset, referenceRadius), width, STRAYS);
        double score = mixture.logLikelihood(points);
        if (best.isEmpty() || score > best.get().score()) {
          best = Optional.of(new Scored(mixture, score));
        }
      }
    }
    return best.orElseThrow();
  }

  /** A mixture with its likelihood. */
  private record Scored(ArmMixture mixture, double score) {
  }
}
