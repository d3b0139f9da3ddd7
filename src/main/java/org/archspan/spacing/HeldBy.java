package org.archspan.spacing;

/** What confines a mode. */
public enum HeldBy {
  /** The disk itself: the answer barely moves when the domain is made taller. */
  DISK,
  /** The lid: a taller domain gives another answer. */
  LID,
  /** Nothing: the growth is that of the continuum of the uniform atmosphere above, or of a branch where it merges with it. */
  HALO
}
