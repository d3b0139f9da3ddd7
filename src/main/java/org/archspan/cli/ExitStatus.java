package org.archspan.cli;

/** Exit statuses, as scripts rely on them. */
final class ExitStatus {
  /** Solved; that a disk is stable is an answer too. */
  static final int SOLVED = 0;
  /** The command line is wrong. */
  static final int USAGE = 2;
  /** The model is wrong. */
  static final int MODEL = 3;
  /** The computation could not reach its tolerance. */
  static final int UNSOLVED = 4;
  /** A file could not be read or written. */
  static final int FILE = 5;

  private ExitStatus() {
  }
}
