package weighhouse.workbook.ooxml;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.concurrent.ForkJoinTask;

/** Runs work that reads files on all cores. */
final class Parallel {
  private Parallel() {}

  /** Work on the item of one index. */
  interface Work<T> {
    T of(int index) throws IOException;
  }

  /**
   * Results by index, from 0 to {@code size} - 1.
   *
   * @param order the indices in the order in which to start their work
   */
  static <T> List<T> map(List<Integer> order, Work<T> work, int size) throws IOException {
    List<T> results = new ArrayList<>(Arrays.asList(arrayOf(size)));
    if (size == 1) {
      results.set(0, work.of(0));
      return results;
    }
    Collection<ForkJoinTask<?>> tasks = new ArrayList<>();
    for (int index : order) {
      tasks.add(ForkJoinTask.adapt(() -> set(results, index, work)));
    }
    try {
      ForkJoinTask.invokeAll(tasks);
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
    return results;
  }

  @SuppressWarnings("unchecked")
  private static <T> T[] arrayOf(int size) {
    return (T[]) new Object[size];
  }

  private static <T> void set(List<T> results, int index, Work<T> work) {
    try {
      results.set(index, work.of(index));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
