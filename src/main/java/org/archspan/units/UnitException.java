package org.archspan.units;

/** A value or unit that cannot be read; the message says what was found and what is allowed. */
public final class UnitException extends Exception {
  private static final long serialVersionUID = 1L;

  /** With what was found and what is allowed. */
  public UnitException(String message) {
    super(message);
  }
}
