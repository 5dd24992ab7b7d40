package weighhouse.workbook;

import java.nio.charset.StandardCharsets;
import java.util.Arrays;

/**
 * Distinct texts in one array of bytes, each with an id from 0 on: a million formulas written out
 * one by one cost their letters, not an object each. Letters beyond Latin-1 make a text take two
 * bytes a letter.
 */
final class TextPool {
  private byte[] bytes = new byte[1 << 10];
  private int used;

  /** Where each text ends, doubled; the lowest bit says that it takes two bytes a letter. */
  private long[] ends = new long[1 << 6];

  private int size;
  private int[] hashes = new int[1 << 6];
  private int[] slots = new int[1 << 8];

  /** Id of the text, which is added unless it is known. */
  int intern(char[] text, int start, int length) {
    int hash = 0;
    char all = 0;
    for (int i = start; i < start + length; i++) {
      hash = 31 * hash + text[i];
      all |= text[i];
    }
    boolean wide = all > 0xff;
    int slot = slot(hash);
    while (slots[slot] != 0) {
      int id = slots[slot] - 1;
      if (hashes[id] == hash && holds(id, text, start, length, wide)) {
        return id;
      }
      slot = (slot + 1) & (slots.length - 1);
    }
    slots[slot] = size + 1;
    append(text, start, length, wide);
    hashes[size - 1] = hash;
    if (size * 2 > slots.length) {
      rehash();
    }
    return size - 1;
  }

  String get(int id) {
    int from = start(id);
    int length = end(id) - from;
    return isWide(id)
        ? new String(bytes, from, length, StandardCharsets.UTF_16BE)
        : new String(bytes, from, length, StandardCharsets.ISO_8859_1);
  }

  /** Gives back what was reserved for growth and for finding texts; no text may be added after. */
  void seal() {
    bytes = Arrays.copyOf(bytes, used);
    ends = Arrays.copyOf(ends, size);
    hashes = new int[0];
    slots = new int[0];
  }

  private int slot(int hash) {
    int mixed = hash * 0x9E3779B9;
    return (mixed ^ (mixed >>> 16)) & (slots.length - 1);
  }

  private int start(int id) {
    return id == 0 ? 0 : end(id - 1);
  }

  private int end(int id) {
    return (int) (ends[id] >>> 1);
  }

  private boolean isWide(int id) {
    return (ends[id] & 1) != 0;
  }

  private boolean holds(int id, char[] text, int start, int length, boolean wide) {
    int at = start(id);
    if (isWide(id) != wide || end(id) - at != (wide ? 2 * length : length)) {
      return false;
    }
    for (int i = start; i < start + length; i++) {
      if (text[i] != letter(at, wide)) {
        return false;
      }
      at += wide ? 2 : 1;
    }
    return true;
  }

  private char letter(int at, boolean wide) {
    return wide
        ? (char) ((bytes[at] & 0xff) << 8 | (bytes[at + 1] & 0xff))
        : (char) (bytes[at] & 0xff);
  }

  private void append(char[] text, int start, int length, boolean wide) {
    int need = Math.addExact(used, wide ? 2 * length : length);
    if (need > bytes.length) {
      bytes = Arrays.copyOf(bytes, Growth.atLeast(bytes.length, need));
    }
    for (int i = start; i < start + length; i++) {
      if (wide) {
        bytes[used++] = (byte) (text[i] >> 8);
      }
      bytes[used++] = (byte) text[i];
    }
    if (size == ends.length) {
      ends = Arrays.copyOf(ends, Growth.atLeast(size, size + 1));
      hashes = Arrays.copyOf(hashes, ends.length);
    }
    ends[size++] = (long) used << 1 | (wide ? 1 : 0);
  }

  private void rehash() {
    slots = new int[slots.length * 2];
    for (int id = 0; id < size; id++) {
      int slot = slot(hashes[id]);
      while (slots[slot] != 0) {
        slot = (slot + 1) & (slots.length - 1);
      }
      slots[slot] = id + 1;
    }
  }
}
