package org.archspan.catalogue;

import java.util.List;
import java.util.regex.Pattern;

/** A table that is wrong; one line for each fault: place, what was found, what is allowed. */
public final class RefusedTableException extends RuntimeException {
  private static final long serialVersionUID = 1L;
  private static final Pattern INVISIBLE = Pattern.compile("[\\p{Cc}\\p{Cf}\\p{Zl}\\p{Zp}]");

  RefusedTableException(List<String> faults) {
    super(String.join(System.lineSeparator(),
        faults.stream().map(fault -> INVISIBLE.matcher(fault).replaceAll("\ufffd")).toList()));
  }
}
