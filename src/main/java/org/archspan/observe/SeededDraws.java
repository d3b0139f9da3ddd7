package org.archspan.observe;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Function;

/** Repeats a random experiment. Blocks have generators of their own, so the numbers do not depend on the threads. */
final class SeededDraws {
  private static final int BLOCK = 50;

  private final SplittableRandom root;
  private final int threads;
  private final Runnable done;

  /** Draws from a seed; {@code done} is called after each, from any thread. */
  SeededDraws(long seed, int threads, Runnable done) {
    this.root = new SplittableRandom(seed);
    this.threads = threads;
    this.done = done;
  }

  /** The outcomes of so many experiments, in order. */
  List<double[]> outcomes(int draws, Function<SplittableRandom, double[]> experiment) {
    ExecutorService pool = Executors.newFixedThreadPool(threads);
    try {
      List<Future<List<double[]>>> running = new ArrayList<>();
      for (int first = 0; first < draws; first += BLOCK) {
        SplittableRandom random = root.split();
        int size = Math.min(BLOCK, draws - first);
        running.add(pool.submit(() -> block(size, random, experiment)));
      }
      List<double[]> outcomes = new ArrayList<>();
      for (Future<List<double[]>> future : running) {
        outcomes.addAll(future.get());
      }
      return outcomes;
    } catch (ExecutionException failed) {
      throw failed.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(failed.getCause());
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted before all random trials were done", stopped);
    } finally {
      pool.shutdownNow();
    }
  }

  private List<double[]> block(int size, SplittableRandom random, Function<SplittableRandom, double[]> experiment) {
    List<double[]> outcomes = new ArrayList<>();
    for (int i = 0; i < size; i++) {
      outcomes.add(experiment.apply(random));
      done.run();
    }
    return outcomes;
  }
}
