package org.archspan.disk;

/** The model asks for a state that does not exist or cannot be solved as stated; the message says where and why. */
public final class RefusedModelException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** With what was found, where, and what to do. */
  public RefusedModelException(String message) {
    super(message);
  }
}
