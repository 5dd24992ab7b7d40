package weighhouse.workbook.ooxml;

import java.nio.ByteBuffer;
import java.nio.ByteOrder;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import weighhouse.workbook.WorkbookFault;

/**
 * The central directory of a zip archive held in memory (PKWARE APPNOTE 6.3, sections 4.3 to 4.5).
 * Entries are found by name without reading the others, and can be read by several threads.
 */
final class ZipEntries {
  /**
   * An entry.
   *
   * @param method 0 stored, 8 deflated
   * @param compressedSize bytes in the archive
   * @param size bytes when inflated, as the archive claims
   * @param headerOffset where its local header starts
   */
  record Entry(
      String name,
      int method,
      boolean encrypted,
      long compressedSize,
      long size,
      long headerOffset) {}

  private static final int END_SIGNATURE = 0x06054b50;
  private static final int ENTRY_SIGNATURE = 0x02014b50;
  private static final int LOCAL_SIGNATURE = 0x04034b50;
  private static final int END_SIZE = 22;
  private static final int ENTRY_SIZE = 46;
  private static final int LOCAL_SIZE = 30;
  private static final int LONGEST_COMMENT = 0xffff;
  private static final long IN_ZIP64_EXTRA = 0xffffffffL;

  private final ByteBuffer bytes;

  private ZipEntries(byte[] archive) {
    bytes = ByteBuffer.wrap(archive).order(ByteOrder.LITTLE_ENDIAN);
  }

  /** All entries by name. */
  static Map<String, Entry> of(byte[] archive) throws WorkbookFault {
    try {
      return new ZipEntries(archive).read();
    } catch (IndexOutOfBoundsException | IllegalArgumentException e) {
      throw damaged(e);
    }
  }

  /** Where the data of the entry start. */
  static int dataOffset(byte[] archive, Entry entry) throws WorkbookFault {
    ByteBuffer bytes = ByteBuffer.wrap(archive).order(ByteOrder.LITTLE_ENDIAN);
    try {
      int header = Math.toIntExact(entry.headerOffset());
      if (bytes.getInt(header) != LOCAL_SIGNATURE) {
        throw damaged(null);
      }
      int data =
          header
              + LOCAL_SIZE
              + unsignedShort(bytes, header + 26)
              + unsignedShort(bytes, header + 28);
      if (data + entry.compressedSize() > archive.length) {
        throw damaged(null);
      }
      return data;
    } catch (IndexOutOfBoundsException | ArithmeticException e) {
      throw damaged(e);
    }
  }

  static WorkbookFault damaged(Exception cause) {
    return new WorkbookFault(
        "is damaged or cut short (its zip archive cannot be read): get a fresh copy, or open it in"
            + " Excel, let Excel repair it and save it",
        cause);
  }

  private Map<String, Entry> read() throws WorkbookFault {
    int end = findEnd();
    int count = unsignedShort(bytes, end + 10);
    long at = unsignedInt(end + 16);
    if (at == IN_ZIP64_EXTRA || count == 0xffff) {
      int end64 = Math.toIntExact(bytes.getLong(end - 20 + 8));
      count = Math.toIntExact(bytes.getLong(end64 + 32));
      at = bytes.getLong(end64 + 48);
    }
    Map<String, Entry> entries = new LinkedHashMap<>();
    int next = Math.toIntExact(at);
    for (int i = 0; i < count; i++) {
      if (bytes.getInt(next) != ENTRY_SIGNATURE) {
        throw damaged(null);
      }
      Entry entry = entry(next);
      entries.putIfAbsent(entry.name(), entry);
      next += ENTRY_SIZE + lengthsAfter(next);
    }
    return entries;
  }

  private int findEnd() throws WorkbookFault {
    int last = bytes.limit() - END_SIZE;
    for (int at = last; at >= Math.max(0, last - LONGEST_COMMENT); at--) {
      if (bytes.getInt(at) == END_SIGNATURE) {
        return at;
      }
    }
    throw damaged(null);
  }

  private Entry entry(int at) {
    int nameLength = unsignedShort(bytes, at + 28);
    byte[] name = new byte[nameLength];
    bytes.get(at + ENTRY_SIZE, name);
    boolean encrypted = (unsignedShort(bytes, at + 8) & 1) != 0;
    Zip64 extra = new Zip64(at + ENTRY_SIZE + nameLength, unsignedShort(bytes, at + 30));
    long size = extra.orExtended(unsignedInt(at + 24));
    long compressed = extra.orExtended(unsignedInt(at + 20));
    long offset = extra.orExtended(unsignedInt(at + 42));
    return new Entry(
        new String(name, StandardCharsets.UTF_8).replace('\\', '/'),
        unsignedShort(bytes, at + 10),
        encrypted,
        compressed,
        size,
        offset);
  }

  private int lengthsAfter(int at) {
    return unsignedShort(bytes, at + 28)
        + unsignedShort(bytes, at + 30)
        + unsignedShort(bytes, at + 32);
  }

  private long unsignedInt(int at) {
    return Integer.toUnsignedLong(bytes.getInt(at));
  }

  private static int unsignedShort(ByteBuffer bytes, int at) {
    return Short.toUnsignedInt(bytes.getShort(at));
  }

  /** The extra field with the long sizes, which holds only those that did not fit, in order. */
  private final class Zip64 {
    private int next = -1;

    Zip64(int at, int length) {
      for (int field = at; field + 4 <= at + length; ) {
        if (unsignedShort(bytes, field) == 1) {
          next = field + 4;
          return;
        }
        field += 4 + unsignedShort(bytes, field + 2);
      }
    }

    long orExtended(long value) {
      if (value != IN_ZIP64_EXTRA || next < 0) {
        return value;
      }
      long extended = bytes.getLong(next);
      next += 8;
      return extended;
    }
  }
}
