package weighhouse.recalculate.engine;

import java.util.Arrays;

/** Stretches of slots that a run has written to. */
final class Stretches implements Runner.Touched {
  private long[] stretches = new long[64];
  private int size;

  @Override
  public boolean slots(int from, int to) {
    if (size == stretches.length) {
      merge();
      if (size > stretches.length / 2) {
        stretches = Arrays.copyOf(stretches, size * 2);
      }
    }
    stretches[size++] = (long) from << 32 | to;
    return true;
  }

  private void merge() {
    Arrays.sort(stretches, 0, size);
    int kept = 0;
    for (int i = 0; i < size; i++) {
      int from = (int) (stretches[i] >> 32);
      int to = (int) stretches[i];
      if (kept > 0 && from <= (int) stretches[kept - 1]) {
        int before = (int) (stretches[kept - 1] >> 32);
        stretches[kept - 1] = (long) before << 32 | Math.max(to, (int) stretches[kept - 1]);
      } else {
        stretches[kept++] = stretches[i];
      }
    }
    size = kept;
  }

  /** First slot of each stretch, in order. */
  int[] starts() {
    merge();
    int[] starts = new int[size];
    for (int i = 0; i < size; i++) {
      starts[i] = (int) (stretches[i] >> 32);
    }
    return starts;
  }

  /** One more than the last slot of a stretch. */
  int end(int stretch) {
    return (int) stretches[stretch];
  }

  void clear() {
    size = 0;
  }
}
