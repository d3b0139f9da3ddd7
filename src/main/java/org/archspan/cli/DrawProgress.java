package org.archspan.cli;

import java.io.PrintWriter;
import java.util.Locale;
import me.tongfei.progressbar.ProgressBar;
import me.tongfei.progressbar.ProgressBarBuilder;
import me.tongfei.progressbar.ProgressBarStyle;

/** Progress of an ensemble: a bar with rate and time left on a terminal, a plain line now and then elsewhere. */
final class DrawProgress implements AutoCloseable {
  private static final double SECONDS_BETWEEN_LINES = 10.0;
  private final ProgressBar bar;
  private final PrintWriter lines;
  private final long draws;
  private final long start = System.nanoTime();
  private long done;
  private double lastLine;

  DrawProgress(long draws, boolean silent, PrintWriter err) {
    boolean terminal = System.console() != null;
    this.draws = draws;
    lines = silent || terminal ? null : err;
    bar = silent || !terminal ? null : new ProgressBarBuilder().setTaskName("ensemble").setInitialMax(draws)
        .setStyle(ProgressBarStyle.ASCII).setUnit(" draws", 1).showSpeed().build();
  }

  void step() {
    done++;
    if (bar != null) {
      bar.step();
    } else if (lines != null && done % 64 == 0) {
      line();
    }
  }

  private void line() {
    double seconds = 1e-9 * (System.nanoTime() - start);
    if (seconds - lastLine >= SECONDS_BETWEEN_LINES) {
      lastLine = seconds;
      double rate = done / seconds;
      lines.println(String.format(Locale.ROOT, "ensemble: %d of %d draws, %.0f draws/s, %.0f s left", done, draws, rate,
          (draws - done) / rate));
      lines.flush();
    }
  }

  @Override
  public void close() {
    if (bar != null) {
      bar.close();
    }
  }
}
