package weighhouse.quantity.label;

import java.util.Arrays;
import java.util.HashMap;
import java.util.Map;
import java.util.stream.IntStream;

/** Numbers gathered by a key: the rows of each column that hold text, or the other way round. */
final class Places {
  private final Map<Integer, IntStream.Builder> gathered = new HashMap<>();

  void add(int key, int value) {
    gathered.computeIfAbsent(key, k -> IntStream.builder()).add(value);
  }

  void sortInto(Map<Integer, int[]> sorted) {
    gathered.forEach(
        (key, values) -> {
          int[] all = values.build().toArray();
          Arrays.sort(all);
          sorted.put(key, all);
        });
  }
}
