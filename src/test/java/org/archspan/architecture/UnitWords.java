package org.archspan.architecture;

import java.util.regex.Pattern;

/** Tells a unit from a symbol in a sentence: {@code ", s^-1"} is one, the s of "growth rate s" is not. */
final class UnitWords {
  private static final String UNIT =
      "(?:cm|km|Mm|au|pc|kpc|g|Msun|s|yr|Myr|Gyr|erg|dyn|G|uG|mG|K|rad|radians|ms)";
  private static final String POWER = "\\^-?\\d+";
  /** A power makes a unit beyond doubt, as does a product of two or a reciprocal. */
  private static final Pattern COMPOUND = Pattern.compile(
      "(?<![\\w(])(?:1/)?" + UNIT + POWER + "(?![\\w(])|(?<![\\w(])1/" + UNIT + "(?![\\w(^])");
  /** A bare one counts in apposition: after a comma, a bracket or "in", and with an end behind it. */
  private static final Pattern BARE = Pattern.compile(
      "(?:^|[,;(]|\\bin\\b)\\s*" + UNIT + "(?=\\s*(?:$|[.,;:)]|\\s\\(|\\s(?:of|from|above)\\b))");
  private static final Pattern WORDS = Pattern.compile(
      "\\bdimensionless\\b|\\bunits? of the\\b|\\bin units\\b|\\bcentimetres\\b|\\bmilliseconds\\b");

  /** What a type may say once for all its members. */
  private static final Pattern FOR_ALL = Pattern.compile("\\bAll numbers are dimensionless\\b");

  private UnitWords() {
  }

  /** Whether the Javadoc of a type speaks for its members, which then need not repeat it. */
  static boolean coverMembers(String typeDocumentation) {
    return FOR_ALL.matcher(typeDocumentation.replaceAll("\\s+", " ")).find();
  }

  static boolean present(String text) {
    String line = text.replaceAll("\\{@code ([^}]*)}", "$1").replaceAll("\\s+", " ").strip();
    return COMPOUND.matcher(line).find() || BARE.matcher(line).find() || WORDS.matcher(line).find();
  }
}
