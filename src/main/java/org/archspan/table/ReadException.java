package org.archspan.table;

import java.io.IOException;

/** A table of our own that could not be read again; the message names the file and says why. */
public final class ReadException extends IOException {
  private static final long serialVersionUID = 1L;

  /** With the path and the reason. */
  public ReadException(String message) {
    super(message);
  }
}
