package org.archspan.cli;

/** Ends a command because the model is wrong; the message is complete. */
final class ModelFault extends RuntimeException {
  private static final long serialVersionUID = 1L;

  ModelFault(String message) {
    super(message);
  }
}
