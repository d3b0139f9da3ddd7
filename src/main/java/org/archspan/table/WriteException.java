package org.archspan.table;

import java.io.IOException;

/** A file that could not be written; the message names it and says why. Nothing of it is left behind. */
public final class WriteException extends IOException {
  private static final long serialVersionUID = 1L;

  /** With the path and the reason. */
  public WriteException(String message) {
    super(message);
  }
}
