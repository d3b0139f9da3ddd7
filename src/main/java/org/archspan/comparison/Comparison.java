package org.archspan.comparison;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.archspan.disk.RefusedModelException;
import org.archspan.stability.UnsolvedException;

/**
 * All combinations of the values of some inputs, each with its answer.
 *
 * @param inputs at least one
 * @param cases  one for each combination, the last input varying fastest
 */
public record Comparison(List<VariedInput> inputs, List<ComparedCase> cases) {
  /**
   * Solves every combination; one that fails does not stop the others. The answers do not depend on the number of
   * threads.
   *
   * @param threads at least 1
   * @param done    called after each case, from any thread
   */
  public static Comparison solve(List<VariedInput> inputs, VariedModel model, int threads, Runnable done) {
    ExecutorService pool = Executors.newFixedThreadPool(threads);
    try {
      List<Future<ComparedCase>> running = new ArrayList<>();
      for (List<String> values : combinations(inputs)) {
        running.add(pool.submit(() -> {
          ComparedCase answer = solved(values, model);
          done.run();
          return answer;
        }));
      }
      List<ComparedCase> cases = new ArrayList<>();
      for (Future<ComparedCase> future : running) {
        cases.add(future.get());
      }
      return new Comparison(List.copyOf(inputs), List.copyOf(cases));
    } catch (ExecutionException failed) {
      throw failed.getCause() instanceof RuntimeException cause ? cause : new IllegalStateException(failed.getCause());
    } catch (InterruptedException stopped) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException("interrupted before all cases were solved", stopped);
    } finally {
      pool.shutdownNow();
    }
  }

  private static ComparedCase solved(List<String> values, VariedModel model) {
    try {
      return new ComparedCase(values, Optional.of(model.solve(values)), "");
    } catch (RefusedModelException | UnsolvedException fault) {
      return new ComparedCase(values, Optional.empty(), fault.getMessage());
    }
  }

  private static List<List<String>> combinations(List<VariedInput> inputs) {
    List<List<String>> combinations = List.of(List.of());
    for (VariedInput input : inputs) {
      List<List<String>> longer = new ArrayList<>();
      for (List<String> start : combinations) {
        for (String value : input.values()) {
          List<String> extended = new ArrayList<>(start);
          extended.add(value);
          longer.add(List.copyOf(extended));
        }
      }
      combinations = longer;
    }
    return combinations;
  }

  /** How many cases have no answer. */
  public long failures() {
    return cases.stream().filter(ComparedCase::failed).count();
  }
}
