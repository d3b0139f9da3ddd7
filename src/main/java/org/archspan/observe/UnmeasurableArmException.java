package org.archspan.observe;

/** Complexes that show no arm, or too little of one; the message says what was found and what is needed. */
public final class UnmeasurableArmException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** With what was found and what is needed. */
  public UnmeasurableArmException(String message) {
    super(message);
  }
}
