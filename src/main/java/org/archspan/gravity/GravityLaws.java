package org.archspan.gravity;

import static org.archspan.gravity.LawInput.Range.FRACTION;
import static org.archspan.gravity.LawInput.Range.NOT_NEGATIVE;
import static org.archspan.gravity.LawInput.Range.POSITIVE;

import java.util.List;
import java.util.Optional;

/** The gravity laws that a model file may name. A law given by a table is read from a file and stands apart. */
public final class GravityLaws {
  /** Name of the law that is read from a file. */
  public static final String TABLE = "table";

  private static final List<GravityLawKind> ALL = List.of(
      new GravityLawKind("uniform", "g = strength",
          List.of(new LawInput("strength", "cm/s^2", "acceleration", POSITIVE)),
          v -> new UniformGravity(v[0])),
      new GravityLawKind("linear", "g = gradient z",
          List.of(new LawInput("gradient", "cm/s^2/kpc", "rise of the acceleration with height", POSITIVE)),
          v -> new LinearGravity(v[0])),
      new GravityLawKind("tanh", "g = strength tanh(z/height)",
          List.of(new LawInput("strength", "cm/s^2", "acceleration far from the midplane", POSITIVE),
              new LawInput("height", "pc", "height over which it is reached", POSITIVE)),
          v -> new TanhGravity(v[0], v[1])),
      new GravityLawKind("disk-and-halo", "g = disk-strength z/sqrt(z^2 + disk-height^2) + halo-gradient z",
          List.of(new LawInput("disk-strength", "cm/s^2", "acceleration of the stellar disk", POSITIVE),
              new LawInput("disk-height", "pc", "height of the stellar disk", POSITIVE),
              new LawInput("halo-gradient", "cm/s^2/kpc", "gradient of the halo's acceleration", NOT_NEGATIVE)),
          v -> new DiskAndHaloGravity(v[0], v[1], v[2])),
      new GravityLawKind("point-mass", "g = G mass z/(radius^2 + z^2)^(3/2)",
          List.of(new LawInput("mass", "Msun", "central mass", POSITIVE),
              new LawInput("radius", "pc", "radius of the ring", POSITIVE)),
          v -> new PointMassGravity(v[0], v[1])),
      new GravityLawKind("isothermal-sheet", "g = 2 pi G surface-density tanh(z/h), h = dispersion^2/(pi G surface-density)",
          List.of(new LawInput("surface-density", "Msun/pc^2", "of the stars", POSITIVE),
              new LawInput("dispersion", "km/s", "vertical velocity dispersion of the stars", POSITIVE)),
          v -> new IsothermalSheetGravity(v[0], v[1])),
      new GravityLawKind("saturating",
          "g = strength [1 - near-fraction exp(-z/near-height) - (1 - near-fraction) exp(-z/far-height)]",
          List.of(new LawInput("strength", "cm/s^2", "acceleration far above", POSITIVE),
              new LawInput("near-fraction", "", "share of the near part", FRACTION),
              new LawInput("near-height", "pc", "height of the near part", POSITIVE),
              new LawInput("far-height", "pc", "height of the far part", POSITIVE)),
          v -> new SaturatingGravity(v[0], v[1], v[2], v[3])));

  private GravityLaws() {
  }

  /** All laws given by a formula. */
  public static List<GravityLawKind> all() {
    return ALL;
  }

  /** The law of a name, if there is one. */
  public static Optional<GravityLawKind> named(String name) {
    return ALL.stream().filter(kind -> kind.name().equals(name)).findFirst();
  }
}
