package org.archspan.observe;

import java.util.List;

/** From positions of complexes to the spacing along their arm. */
public final class ArmStudy {
  /** Fewest complexes that make an arm. */
  public static final int FEWEST = 6;
  /** Most that are read. */
  public static final int MOST = 2000;

  private static final double SHORTEST_OF_MEAN = 0.6;
  private static final double LONGEST_OF_LENGTH = 0.5;

  private ArmStudy() {
  }

  /**
   * Fits the arm and measures the spacing.
   *
   * @param positions at least {@link #FEWEST}, none of them the centre
   * @param done      called after each random trial, from any thread
   * @throws UnmeasurableArmException when the complexes do not follow a logarithmic spiral, or too few do
   */
  public static ObservedArm solve(List<PlanePosition> positions, ObserveOptions options, Runnable done) {
    if (positions.size() < FEWEST) {
      throw new UnmeasurableArmException("found " + positions.size() + " complexes; at least " + FEWEST
          + " are needed to fit an arm and tell a spacing from chance");
    }
    List<FittedArm> arms = new ArmSearch(positions).arms();
    if (arms.isEmpty()) {
      throw new UnmeasurableArmException("no logarithmic spiral with a pitch angle of 2 to 60 deg fits the complexes;"
          + " check centre, inclination and position angle");
    }
    FittedArm arm = arms.get(0);
    ArmChain chain = ArmChain.of(arm, positions);
    if (chain.complexes().size() < FEWEST) {
      throw new UnmeasurableArmException("only " + chain.complexes().size() + " of " + positions.size()
          + " complexes follow one logarithmic spiral; at least " + FEWEST + " are needed. Give the complexes of one"
          + " arm"
          + " only, and check centre, inclination and position angle");
    }
    RayleighPeriodogram grid = grid(chain, options);
    double[] arcPositions = chain.arcPositions();
    RandomPlacing chance = RandomPlacing.of(grid, arcPositions, options.trials(),
        new SeededDraws(options.seed(), options.threads(), done));
    SpacingBootstrap bootstrap = new SpacingBootstrap(
        new SeededDraws(~options.seed(), options.threads(), () -> { }), arm, chain);
    return new ObservedArm(List.copyOf(positions), arm, arms.stream().skip(1).findFirst(), chain,
        bootstrap.median(chain.separations()), bootstrap.median(chain.nearestDistances()),
        bootstrap.peak(grid, positions), chance);
  }

  private static RayleighPeriodogram grid(ArmChain chain, ObserveOptions options) {
    double mean = chain.length() / (chain.complexes().size() - 1);
    double shortest = options.shortest().orElse(SHORTEST_OF_MEAN * mean);
    double longest = options.longest().orElse(LONGEST_OF_LENGTH * chain.length());
    if (!(shortest < longest && longest <= chain.length() && shortest >= 0.1 * mean)) {
      throw new UnmeasurableArmException("the wavelengths to search must ascend, from at least a tenth of the mean"
          + " separation to at most the length of the arm");
    }
    return RayleighPeriodogram.over(shortest, longest, chain.length());
  }
}
