package weighhouse.report.copy.ooxml;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.zip.ZipEntry;
import java.util.zip.ZipInputStream;
import java.util.zip.ZipOutputStream;

/** The parts of a package by name, in the order of the file. */
final class Parts {
  private final Map<String, byte[]> parts = new LinkedHashMap<>();

  static Parts read(byte[] file) throws IOException {
    Parts parts = new Parts();
    try (ZipInputStream zip = new ZipInputStream(new ByteArrayInputStream(file))) {
      for (ZipEntry entry = zip.getNextEntry(); entry != null; entry = zip.getNextEntry()) {
        if (!entry.isDirectory()) {
          parts.parts.put(entry.getName(), zip.readAllBytes());
        }
      }
    }
    return parts;
  }

  void write(OutputStream out) throws IOException {
    ZipOutputStream zip = new ZipOutputStream(out);
    for (Map.Entry<String, byte[]> part : parts.entrySet()) {
      ZipEntry entry = new ZipEntry(part.getKey());
      entry.setTime(0);
      zip.putNextEntry(entry);
      zip.write(part.getValue());
      zip.closeEntry();
    }
    zip.finish();
  }

  boolean has(String name) {
    return parts.containsKey(name);
  }

  /** The text of a part; null where there is none. */
  String text(String name) {
    byte[] part = parts.get(name);
    return part == null ? null : XmlText.of(part);
  }

  void put(String name, String text) {
    parts.put(name, XmlText.bytes(text));
  }

  void remove(String name) {
    parts.remove(name);
  }

  /** A name that no part has: the base with the first number that is free. */
  String free(String before, String after) {
    int number = 1;
    while (has(before + number + after)) {
      number++;
    }
    return before + number + after;
  }
}
