package org.archspan.stability;

/** The computation could not reach its tolerance; the message says what was reached. */
public final class UnsolvedException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** With what was found and what to do. */
  public UnsolvedException(String message) {
    super(message);
  }
}
