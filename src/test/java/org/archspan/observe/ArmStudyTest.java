package org.archspan.observe;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.OptionalDouble;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.apache.commons.math3.distribution.UniformRealDistribution;
import org.apache.commons.math3.random.Well19937c;
import org.apache.commons.math3.stat.inference.KolmogorovSmirnovTest;
import org.junit.jupiter.api.RepeatedTest;
import org.junit.jupiter.api.RepetitionInfo;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ArmStudyTest {
  private static ObservedArm solved(InventedArm arm, long seed, int trials, int threads) {
    return ArmStudy.solve(arm.positions(seed), new ObserveOptions(OptionalDouble.empty(), OptionalDouble.empty(),
        trials,
        seed, threads), () -> { });
  }

  /**
   * Truth of the generator, both windings, 0.8 to 2.6 turns, up to 5 strays. Pitch and spacing within five of their own
   * errors: those were found honest (scatter of 0.9 to 1.2 errors) on 100 galaxies of each kind.
   */
  @ParameterizedTest
  @CsvSource({"17, 3, 1.6, 19, 0.16, 0.03, 0.15, 3", "-17, 3, 1.6, 19, 0.16, 0.03, 0.15, 3",
      "-9, 3, 1.2, 40, 0.12, 0.02, 0.2, 5", "25, 2, 2, 14, 0.2, 0.04, 0, 1"})
  void findsTheTruth(double pitch, double inner, double spacing, int sites, double jitter, double width, double missing,
      int strays) {
    InventedArm arm = new InventedArm(pitch, inner, spacing, sites, jitter, width, missing, strays);
    for (int seed = 1; seed <= 3; seed++) {
      ObservedArm found = solved(arm, seed, 300, 2);
      assertThat(found.arm().spiral().pitchAngle()).isCloseTo(Math.toRadians(pitch), within(5.0 *
          found.arm().pitchError()));
      MeasuredLength wavelength = found.peak().wavelength();
      assertThat(wavelength.value()).isCloseTo(spacing, within(5.0 * wavelength.error()));
      // the error itself must say something: a few per cent
      assertThat(wavelength.error()).isLessThan(0.06 * spacing);
      assertThat(found.chance().peak().value()).isLessThan(0.1);
      assertThat(java.util.Arrays.stream(found.chain().separations()).min().orElseThrow()).isNotNegative();
    }
  }

  /** The errors are as large as the scatter: 40 galaxies, standard deviation of (found - true)/error. */
  @Test
  void errorsAreHonest() {
    double[] pulls = IntStream.rangeClosed(1, 40).mapToDouble(seed -> {
      MeasuredLength wavelength = solved(InventedArm.shipped(), seed, 100, 2).peak().wavelength();
      return (wavelength.value() - 1.6) / wavelength.error();
    }).toArray();
    // 40 values fix a standard deviation to 11 per cent; the bootstrap of 15 complexes is known to be a little short
    assertThat(Math.sqrt(org.apache.commons.math3.stat.StatUtils.variance(pulls))).isBetween(0.7, 1.4);
  }

  /**
   * Complexes at random on an arm, seen through the fit: p-values are uniform (Kolmogorov and Smirnov). 1e-3 is the
   * chance of this fixed set of seeds to fail although all is well.
   */
  @Test
  void falseAlarmsAreAsOftenAsStated() {
    InventedArm random = new InventedArm(14.0, 3.0, 0.0, 16, 0.0, 0.03, 0.0, 0);
    double[] peaks = new double[250];
    double[] regular = new double[250];
    for (int seed = 0; seed < peaks.length; seed++) {
      ArmChain chain = ArmChain.of(new ArmSearch(random.positions(1000 + seed)).arms().get(0), random.positions(1000
          + seed));
      double mean = chain.length() / (chain.complexes().size() - 1);
      RandomPlacing chance = RandomPlacing.of(RayleighPeriodogram.over(0.6 * mean, 0.5 * chain.length(),
          chain.length()),
          chain.arcPositions(), 400, new SeededDraws(seed, 2, () -> { }));
      peaks[seed] = chance.peak().value();
      regular[seed] = chance.regular().value();
    }
    // p-values are multiples of 1/401; a shift of a thousandth parts ties and is far below what the test resolves (0.1)
    assertThat(uniformity(peaks)).isGreaterThan(1e-3);
    assertThat(uniformity(regular)).isGreaterThan(1e-3);
    assertThat(java.util.Arrays.stream(peaks).filter(p -> p <= 0.05).count() / 250.0).isCloseTo(0.05, within(0.045));
  }

  private static double uniformity(double[] values) {
    SplittableRandom random = new SplittableRandom(5);
    double[] spread = java.util.Arrays.stream(values).map(p -> p - random.nextDouble() / 401.0).toArray();
    return new KolmogorovSmirnovTest().kolmogorovSmirnovTest(new UniformRealDistribution(new Well19937c(1), 0.0,
        1.0), spread);
  }

  @Test
  void threadsDoNotChangeADigit() {
    ObservedArm one = solved(InventedArm.shipped(), 7, 500, 1);
    ObservedArm four = solved(InventedArm.shipped(), 7, 500, 4);
    assertThat(four.chance().highest()).isEqualTo(one.chance().highest());
    assertThat(four.peak().wavelength()).isEqualTo(one.peak().wavelength());
    assertThat(four.separation()).isEqualTo(one.separation());
  }

  /** Deprojection undoes a projection: tilt about the line of nodes, turn by the position angle. */
  @RepeatedTest(20)
  void deprojectionUndoesTheProjection(RepetitionInfo repetition) {
    SplittableRandom random = new SplittableRandom(repetition.getCurrentRepetition());
    double inclination = Math.toRadians(85.0 * random.nextDouble());
    double angle = 2.0 * Math.PI * random.nextDouble();
    double x = random.nextDouble() - 0.5;
    double y = random.nextDouble() - 0.5;
    double minor = y * Math.cos(inclination);
    double north = x * Math.cos(angle) - minor * Math.sin(angle);
    double east = x * Math.sin(angle) + minor * Math.cos(angle);
    PlanePosition back = new SkyOrientation(inclination, angle, 2.0).deproject(0.5 * east, 0.5 * north, 0.01);
    // 1e-13: rounding, times 1/cos 85 deg
    assertThat(back.x()).isCloseTo(x, within(1e-13));
    assertThat(back.y()).isCloseTo(y, within(1e-13));
    assertThat(back.errorY()).isCloseTo(0.02 / Math.cos(inclination), within(1e-13));
  }

  /** At exact multiples the power is the number of points; by rotation of phases as by cosines. */
  @Test
  void powerOfExactMultiplesIsTheirNumber() {
    double[] positions = IntStream.range(0, 12).mapToDouble(i -> 2.5 * i).toArray();
    double[] ones = new double[12];
    java.util.Arrays.fill(ones, 1.0);
    RayleighPeriodogram grid = RayleighPeriodogram.over(1.5, 13.0, 27.5);
    assertThat(1.0 / grid.peakFrequency(positions, ones)).isCloseTo(2.5, within(1e-6));
    // 1e-12: rounding of 12 phases
    assertThat(RayleighPeriodogram.power(positions, ones, 0.4)).isCloseTo(12.0, within(1e-12));
    double[] powers = grid.powers(positions, ones);
    for (int k = 0; k < powers.length; k++) {
      assertThat(powers[k]).isCloseTo(RayleighPeriodogram.power(positions, ones, grid.frequency(k)), within(1e-10));
    }
  }

  /** Arc length of the spiral against a sum of short chords. */
  @Test
  void arcLengthIsTheSumOfChords() {
    LogarithmicSpiral spiral = new LogarithmicSpiral(Math.toRadians(-13.0), 0.1, 5.0);
    double sum = 0.0;
    int chords = 20_000;
    for (int i = 0; i < chords; i++) {
      double a = 8.0 * i / chords;
      double b = 8.0 * (i + 1) / chords;
      sum += Math.hypot(spiral.radius(a) * Math.cos(a) - spiral.radius(b) * Math.cos(b),
          spiral.radius(a) * Math.sin(a) - spiral.radius(b) * Math.sin(b));
    }
    // chords fall short by (angle)^2/24, 7e-9
    assertThat(spiral.arcLength(spiral.radius(8.0), spiral.radius(0.0))).isCloseTo(sum, within(2e-8 * sum));
  }

  /**
   * Clopper and Pearson: with none or all of n the ends solve (1 - p)^n = 0.15865; they bracket the value elsewhere.
   */
  @ParameterizedTest
  @CsvSource({"0, 1000, 0, 0.00183936", "1000, 1000, 0.99816064, 1", "30, 1000, 0.0246, 0.0365"})
  void probabilitiesHaveTheirInterval(int exceeding, int trials, double lower, double upper) {
    ChanceProbability chance = new ChanceProbability(exceeding, trials);
    // the ends to the digits given; for 30 of 1000 the square root of 30, 5.5, within a fifth
    double digits = exceeding == 30 ? 1e-3 : 1e-8;
    assertThat(chance.lower()).isCloseTo(lower, within(digits));
    assertThat(chance.upper()).isCloseTo(upper, within(digits));
  }

  @Test
  void tooFewComplexesAreRefused() {
    assertThatThrownBy(() -> solved(new InventedArm(17, 3, 1.6, 5, 0, 0, 0, 0), 1, 100, 1))
        .isInstanceOf(UnmeasurableArmException.class).hasMessageContaining("found 5 complexes; at least 6");
  }
}
