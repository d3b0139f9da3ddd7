package org.archspan.units;

import java.util.Collection;
import java.util.Comparator;
import java.util.Optional;

/** Finds the name that somebody probably meant. */
public final class NearestName {
  private static final int LONGEST = 100;

  private NearestName() {
  }

  /** The nearest of the known names, if one is near enough; ties go to the alphabetically first. */
  public static Optional<String> of(String found, Collection<String> known) {
    if (found.length() > LONGEST) {
      return Optional.empty();
    }
    int allowed = Math.max(1, Math.min(4, found.length() / 2));
    return known.stream().sorted().filter(name -> distance(found, name) <= allowed)
        .min(Comparator.comparingInt(name -> distance(found, name)));
  }

  /** Number of letters to insert, delete or replace (Levenshtein 1966), case ignored. O(product of lengths). */
  static int distance(String first, String second) {
    String a = first.toLowerCase(java.util.Locale.ROOT);
    String b = second.toLowerCase(java.util.Locale.ROOT);
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int diagonal = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int replaced = diagonal + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        diagonal = row[j];
        row[j] = Math.min(replaced, Math.min(row[j], row[j - 1]) + 1);
      }
    }
    return row[b.length()];
  }
}
