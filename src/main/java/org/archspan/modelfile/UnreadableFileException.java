package org.archspan.modelfile;

import java.io.IOException;

/** A file that cannot be read at all; the message names it and says why. */
public final class UnreadableFileException extends IOException {
  private static final long serialVersionUID = 1L;

  /** With the path and the reason. */
  public UnreadableFileException(String message) {
    super(message);
  }
}
