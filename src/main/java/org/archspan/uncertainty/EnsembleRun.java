package org.archspan.uncertainty;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;

/**
 * Solves draws on several threads and hands them on in their order; the rows do not depend on the number of threads.
 * Memory does not grow with the number of draws.
 */
public final class EnsembleRun implements AutoCloseable {
  /** Draws that one thread solves at a stretch. */
  private static final int STRETCH = 64;

  private final DrawDesign design;
  private final DrawSolver solver;
  private final int threads;
  private final ExecutorService pool;

  /** A run on so many threads; close it to let them go. */
  public EnsembleRun(DrawDesign design, DrawSolver solver, int threads) {
    this.design = design;
    this.solver = solver;
    this.threads = threads;
    this.pool = Executors.newFixedThreadPool(threads);
  }

  /** Solves the draws from {@code first} to {@code end}, excluded, and hands each to the sink on the calling thread. */
  public void solve(long first, long end, Consumer<DrawRow> sink) {
    Deque<Future<List<DrawRow>>> running = new ArrayDeque<>();
    long next = first;
    try {
      while (next < end || !running.isEmpty()) {
        while (next < end && running.size() < 2 * threads + 2) {
          long from = next;
          int count = (int) Math.min(STRETCH, end - from);
          running.add(pool.submit(() -> stretch(from, count)));
          next += count;
        }
        running.remove().get().forEach(sink);
      }
    } catch (ExecutionException failed) {
      throw failed.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(failed.getCause());
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted before all draws were solved", stopped);
    }
  }

  private List<DrawRow> stretch(long first, int count) {
    double[][] values = design.values(first, count);
    List<DrawRow> rows = new ArrayList<>(count);
    for (int i = 0; i < count; i++) {
      rows.add(solver.solve(first + i, values[i]));
    }
    return rows;
  }

  @Override
  public void close() {
    pool.shutdownNow();
  }
}
