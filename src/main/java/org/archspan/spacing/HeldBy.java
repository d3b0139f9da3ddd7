package org.archspan.spacing;

/** What confines a mode. */
public enum HeldBy {
  /** The disk itself: the answer barely moves when the domain is made taller. */
  DISK,
  /** The lid: a taller domain gives another answer. */
  LID,
  /** Nothing: the fastest growth is the edge of the continuum of the uniform atmosphere above. */
  HALO
}
