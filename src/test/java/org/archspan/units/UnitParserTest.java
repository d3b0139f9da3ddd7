package org.archspan.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class UnitParserTest {
  /** Factors from IAU 2012 B2, IAU 2015 B3, CODATA 2022 and the Julian year, worked out by hand. */
  @ParameterizedTest
  @CsvSource(delimiter = ';', value = {
      "km/s; 1e5; cm s^-1", "cm/s; 1; cm s^-1", "pc; 3.0856775814913673e18; cm", "kpc; 3.0856775814913673e21; cm",
      "au; 1.495978707e13; cm", "cm; 1; cm", "km; 1e5; cm", "Mm; 1e8; cm", "Myr; 3.15576e13; s", "Gyr; 3.15576e16; s",
      "yr; 3.15576e7; s", "s; 1; s", "G; 1; g^1/2 cm^-1/2 s^-1", "uG; 1e-6; g^1/2 cm^-1/2 s^-1",
      "mG; 1e-3; g^1/2 cm^-1/2 s^-1", "nG; 1e-9; g^1/2 cm^-1/2 s^-1", "kG; 1e3; g^1/2 cm^-1/2 s^-1", "K; 1; K",
      "g/cm^3; 1; g cm^-3", "cm^-3; 1; cm^-3", "1/cm^3; 1; cm^-3", "Msun; 1.988409870698051e33; g",
      "Msun/pc^2; 2.0883574e-4; g cm^-2", "Msun/pc^3; 6.7679053e-23; g cm^-3", "g/cm^2; 1; g cm^-2",
      "erg/cm^3; 1; g cm^-1 s^-2", "dyn/cm^2; 1; g cm^-1 s^-2", "cm/s^2; 1; cm s^-2",
      "km/s/kpc; 3.2407792894443e-17; s^-1", "km s^-1 kpc^-1; 3.2407792894443e-17; s^-1",
      "cm/s^2/kpc; 3.2407792894443e-22; s^-2", "km^2/s^2/pc; 3.2407792894443e-9; cm s^-2", "cm^2/s; 1; cm^2 s^-1",
      "1/Myr; 3.168808781402895e-14; s^-1", "1/s; 1; s^-1", "rad/kpc; 3.2407792894443e-22; cm^-1",
      "deg/kpc; 5.656226e-24; cm^-1", "g*cm**-3; 1; g cm^-3", "km s-1; 1e5; cm s^-1", "cm / s2; 1; cm s^-2", "Rsun; 6.957e10; cm",
      "eV/cm^3; 1.602176634e-12; g cm^-1 s^-2", "km.s^-1; 1e5; cm s^-1"})
  void compositeUnits(String text, double factor, String dimension) throws UnitException {
    Unit unit = UnitParser.parse(text);
    // 3e-7: the shortest factors above are given with seven digits
    assertThat(unit.factor()).isCloseTo(factor, within(3e-7 * factor));
    assertThat(unit.dimension().toString()).isEqualTo(dimension);
  }

  /** 26 km/s/kpc is 26 (km/s)/kpc, an angular speed, not 26 km kpc/s. */
  @Test
  void divisionGoesLeftToRight() throws UnitException {
    Quantity speed = Quantity.parse("26 km/s/kpc");
    assertThat(speed.dimension()).isEqualTo(new Dimension(0, 0, -2, 0));
    assertThat(speed.value()).isCloseTo(26e5 / (1e3 * Constants.PARSEC), within(1e-30));
  }

  /** The gauss makes a pressure: B^2 has the dimension of erg/cm^3. */
  @Test
  void gaussSquaredIsAPressure() throws UnitException {
    assertThat(UnitParser.parse("uG^2").dimension()).isEqualTo(UnitParser.parse("erg/cm^3").dimension());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "km/", "/", "km//s", "km^x", "km^", "furlong", "1-3", "km-", "km123", "3 km", "k m", "km^1.5", "(km)"})
  void refusesWhatIsNotAUnit(String text) {
    assertThatThrownBy(() -> UnitParser.parse(text)).isInstanceOf(UnitException.class);
  }

  @Test
  void namesTheNearestUnit() {
    assertThatThrownBy(() -> UnitParser.parse("Kpc")).hasMessageContaining("did you mean kpc?");
    assertThatThrownBy(() -> UnitParser.parse("ug")).hasMessageContaining("did you mean uG?");
  }

  @ParameterizedTest
  @ValueSource(strings = {"NaN km/s", "inf pc", "1e400 pc", "abc", "", "km/s", "1..2 pc", "--3 pc", "1e99999999 pc"})
  void refusesWhatIsNotAQuantity(String text) {
    assertThatThrownBy(() -> Quantity.parse(text)).isInstanceOf(UnitException.class);
  }

  @ParameterizedTest
  @CsvSource({"6.4 km/s, 6.4e5", "6.4km/s, 6.4e5", "1e-3 pc, 3.0856775814913673e15", "+2 cm, 2", "1_000 cm, 1000",
      ".5 cm, 0.5", "2. cm, 2"})
  void readsNumbers(String text, double value) throws UnitException {
    assertThat(Quantity.parse(text).value()).isCloseTo(value, within(1e-12 * value));
  }
}
