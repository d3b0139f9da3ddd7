package org.archspan.catalogue;

import java.io.IOException;

/** A table that cannot be read at all; the message names it and says why. */
public final class UnreadableTableException extends IOException {
  private static final long serialVersionUID = 1L;

  UnreadableTableException(String message) {
    super(message);
  }
}
