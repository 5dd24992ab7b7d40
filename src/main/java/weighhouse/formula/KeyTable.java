package weighhouse.formula;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/** Numbers distinct keys from 0 on; looking up a known one allocates nothing. */
final class KeyTable {
  private final List<char[]> keys = new ArrayList<>();
  private int[] slots = new int[1 << 10];
  private int[] hashes = new int[1 << 8];

  int size() {
    return keys.size();
  }

  char[] key(int id) {
    return keys.get(id);
  }

  /** Number of the key, a new one if it was not seen before. */
  int add(char[] chars, int length) {
    int hash = hash(chars, length);
    int slot = hash & (slots.length - 1);
    while (slots[slot] != 0) {
      int id = slots[slot] - 1;
      char[] known = keys.get(id);
      if (hashes[id] == hash && Arrays.equals(known, 0, known.length, chars, 0, length)) {
        return id;
      }
      slot = (slot + 1) & (slots.length - 1);
    }
    int id = keys.size();
    keys.add(Arrays.copyOf(chars, length));
    if (id == hashes.length) {
      hashes = Arrays.copyOf(hashes, 2 * id);
    }
    hashes[id] = hash;
    slots[slot] = id + 1;
    if (2 * id > slots.length) {
      grow();
    }
    return id;
  }

  private void grow() {
    slots = new int[4 * slots.length];
    for (int id = 0; id < keys.size(); id++) {
      int slot = hashes[id] & (slots.length - 1);
      while (slots[slot] != 0) {
        slot = (slot + 1) & (slots.length - 1);
      }
      slots[slot] = id + 1;
    }
  }

  private static int hash(char[] chars, int length) {
    int hash = length;
    for (int i = 0; i < length; i++) {
      hash = 31 * hash + chars[i];
    }
    return hash ^ (hash >>> 15);
  }
}
