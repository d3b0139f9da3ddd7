package org.archspan.modelfile;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Sees that the tables of arrays are numbered 1, 2, ... without gaps, so that no value is passed over in silence: a
 * setting such as {@code gas.component.4.dispersion} beside three components. Takes the entries that have no place away.
 */
final class ArrayNumbers {
  private final Map<String, Entry> entries;
  private final List<Diagnostic> faults;

  ArrayNumbers(Map<String, Entry> entries, List<Diagnostic> faults) {
    this.entries = entries;
    this.faults = faults;
  }

  void check() {
    Schema.ARRAYS.forEach(this::check);
    oneFormOfGravity();
  }

  private void check(String array) {
    Pattern numbered = Pattern.compile(Pattern.quote(array) + "\\.([0-9]+)\\..*");
    int count = 0;
    while (numberGiven(array + "." + (count + 1) + ".")) {
      count++;
    }
    for (String key : List.copyOf(entries.keySet())) {
      Matcher matcher = numbered.matcher(key);
      if (matcher.matches() && !isBetweenOneAnd(count, matcher.group(1))) {
        refuse(key, "there is no table " + matcher.group(1) + " of " + array,
            count == 0 ? "none is given" : "they are numbered from 1 to " + count);
      }
    }
  }

  private boolean numberGiven(String prefix) {
    return entries.keySet().stream().anyMatch(key -> key.startsWith(prefix));
  }

  private static boolean isBetweenOneAnd(int count, String number) {
    return number.length() < 9 && number.equals(Integer.toString(Integer.parseInt(number)))
        && Integer.parseInt(number) >= 1 && Integer.parseInt(number) <= count;
  }

  /** A single [gravity] has no numbers, an array has nothing else; what comes first decides. */
  private void oneFormOfGravity() {
    List<String> keys = new ArrayList<>(entries.keySet());
    keys.removeIf(key -> !key.startsWith("gravity."));
    for (String key : keys) {
      if (hasNumber(key) != hasNumber(keys.get(0))) {
        refuse(key, hasNumber(key) ? "a number, but gravity is a single table" : "no number, but gravity is an array",
            "write it like " + keys.get(0));
      }
    }
  }

  private static boolean hasNumber(String key) {
    return Character.isDigit(key.charAt("gravity.".length()));
  }

  private void refuse(String key, String found, String allowed) {
    Entry entry = entries.remove(key);
    faults.add(new Diagnostic(entry.source(), entry.line(), key, found, allowed));
  }
}
