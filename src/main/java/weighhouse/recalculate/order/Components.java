package weighhouse.recalculate.order;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Strongly connected components in the order in which each comes after all that it reads (Tarjan
 * 1972, with its own stack).
 */
final class Components {
  private final int[][] sources;
  private final int[] number;
  private final int[] low;
  private final boolean[] waiting;
  private final int[] path;
  private final int[] calls;
  private final int[] progress;
  private final List<int[]> found = new ArrayList<>();
  private int pathLength;
  private int numbered;

  private Components(int[][] sources) {
    this.sources = sources;
    int size = sources.length;
    this.number = new int[size];
    this.low = new int[size];
    this.waiting = new boolean[size];
    this.path = new int[size];
    this.calls = new int[size];
    this.progress = new int[size];
  }

  /**
   * @param sources of each node, the nodes that it reads
   */
  static List<int[]> of(int[][] sources) {
    Components components = new Components(sources);
    for (int node = 0; node < sources.length; node++) {
      if (components.number[node] == 0) {
        components.walk(node);
      }
    }
    return components.found;
  }

  private void walk(int start) {
    int depth = 0;
    enter(start, depth);
    while (depth >= 0) {
      int node = calls[depth];
      if (progress[node] < sources[node].length) {
        int source = sources[node][progress[node]++];
        if (number[source] == 0) {
          enter(source, ++depth);
        } else if (waiting[source]) {
          low[node] = Math.min(low[node], number[source]);
        }
      } else {
        depth--;
        if (low[node] == number[node]) {
          close(node);
        }
        if (depth >= 0) {
          low[calls[depth]] = Math.min(low[calls[depth]], low[node]);
        }
      }
    }
  }

  private void enter(int node, int depth) {
    number[node] = ++numbered;
    low[node] = numbered;
    waiting[node] = true;
    path[pathLength++] = node;
    calls[depth] = node;
  }

  private void close(int node) {
    int from = pathLength;
    do {
      from--;
      waiting[path[from]] = false;
    } while (path[from] != node);
    int[] component = Arrays.copyOfRange(path, from, pathLength);
    Arrays.sort(component);
    found.add(component);
    pathLength = from;
  }
}
