package org.archspan.cli;

import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;

/** Progress of a long command: a bar on a terminal, nothing elsewhere. Safe for several threads. */
final class Progress implements AutoCloseable {
  private final ProgressBar bar;

  Progress(String task, long steps, boolean silent) {
    bar = silent || System.console() == null ? null
        : new ProgressBarBuilder().setTaskName(task).setInitialMax(steps).setStyle(ProgressBarStyle.ASCII).build();
  }

  void step() {
    if (bar != null) {
      bar.step();
    }
  }

  @Override
  public void close() {
    if (bar != null) {
      bar.close();
    }
  }
}
