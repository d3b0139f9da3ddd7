package org.archspan.report;

import static org.assertj.core.api.Assertions.assertThat;

import org.archspan.units.Constants;
import org.archspan.units.OutputUnits;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NumbersTest {
  /** Four digits, also where rounding carries into the next decade. */
  @ParameterizedTest
  @CsvSource({"34.41206, 34.41", "999.96, 1000", "9.99996, 10.00", "0.99996, 1.000", "19794.3, 19790", "99999.7, 1.000e5",
      "100000, 1.000e5", "2.35e7, 2.350e7", "0.00099996, 0.001000", "0.0009994, 9.994e-4", "-0.5, -0.5000", "0, 0",
      "-0.0, 0", "NaN, -", "Infinity, infinite", "1e-300, 1.000e-300"})
  void fourDigits(double value, String text) {
    assertThat(Numbers.plain(value)).isEqualTo(text);
  }

  /** A digit beyond the error would promise what nobody knows. */
  @ParameterizedTest
  @CsvSource({"34.41206, 1e-9, 34.41", "34.41206, 0.002, 34.4", "34.41206, 0.04, 34", "34.41206, 0.9, 34",
      "343.21, 0.02, 340", "34.41206, 0, 34.41", "34.41206, NaN, 34.41", "0.96e-4, 0.05, 9.6e-5"})
  void digitsFollowTheError(double value, double error, String text) {
    assertThat(Numbers.plain(value, error)).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({"343.04, 343.0 pc", "999.94, 999.9 pc", "999.96, 1.000 kpc", "3422.4, 3.422 kpc", "0, 0 pc",
      "Infinity, infinite"})
  void kiloparsecsWhereTheySuit(double parsecs, String text) {
    assertThat(Numbers.length(parsecs * Constants.PARSEC, OutputUnits.galactic())).isEqualTo(text);
  }

  @ParameterizedTest
  @CsvSource({"3e-9, 1e-8", "1e-8, 1e-8", "0, 1e-8", "2e-10, 1e-8", "0.02, 1e-1", "NaN, not known"})
  void errorsAreBounds(double error, String text) {
    assertThat(Numbers.error(error)).isEqualTo(text);
  }

  /** A bound that is rounded to the nearest could lie below what it bounds. */
  @ParameterizedTest
  @CsvSource({"0.0364009, 0.03641/Myr", "0.0364, 0.03641/Myr", "0.5, 0.5000/Myr", "0, 0/Myr"})
  void boundsAreRoundedUp(double perMegayear, String text) {
    assertThat(Numbers.rateBound(perMegayear / Constants.MEGAYEAR, OutputUnits.galactic())).isEqualTo(text);
  }
}
