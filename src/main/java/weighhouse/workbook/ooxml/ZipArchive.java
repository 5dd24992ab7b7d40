package weighhouse.workbook.ooxml;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.atomic.AtomicLong;
import java.util.zip.Inflater;
import java.util.zip.InflaterInputStream;
import weighhouse.workbook.WorkbookFault;

/**
 * The parts of a zip archive held in memory; names are found whatever their case, as Open Packaging
 * asks (ECMA-376 part 2). All streams together give no more than a bounded number of bytes.
 */
final class ZipArchive {
  private static final int STORED = 0;
  private static final int DEFLATED = 8;

  private final byte[] archive;
  private final Map<String, ZipEntries.Entry> entries = new TreeMap<>();
  private final AtomicLong inflated = new AtomicLong();

  ZipArchive(byte[] archive) throws WorkbookFault {
    this.archive = archive;
    for (ZipEntries.Entry entry : ZipEntries.of(archive).values()) {
      entries.putIfAbsent(key(entry.name()), entry);
    }
  }

  boolean has(String name) {
    return entries.containsKey(key(name));
  }

  /** Bytes of the part when inflated, as the archive claims; 0 of a missing one. */
  long size(String name) {
    ZipEntries.Entry entry = entries.get(key(name));
    return entry == null ? 0 : entry.size();
  }

  InputStream open(String name) throws IOException {
    ZipEntries.Entry entry = entries.get(key(name));
    if (entry == null) {
      throw new WorkbookFault(
          "lacks its part "
              + name
              + ": open it in Excel, let Excel repair it and save it, or get a fresh copy");
    }
    if (entry.encrypted()) {
      throw new WorkbookFault("is an encrypted zip archive: save it without encryption");
    }
    int start = ZipEntries.dataOffset(archive, entry);
    InputStream raw = new ByteArrayInputStream(archive, start, (int) entry.compressedSize());
    return new GuardedStream(inflate(raw, entry.method()), entry.compressedSize(), inflated);
  }

  private static InputStream inflate(InputStream raw, int method) throws WorkbookFault {
    return switch (method) {
      case STORED -> raw;
      case DEFLATED -> new Inflating(raw);
      default ->
          throw new WorkbookFault(
              "is packed by zip method "
                  + method
                  + ", which workbooks do not use: save it in Excel");
    };
  }

  private static String key(String name) {
    String path = name.startsWith("/") ? name.substring(1) : name;
    return path.toLowerCase(Locale.ROOT);
  }

  /** Inflates, and releases the native memory when closed. */
  private static final class Inflating extends InflaterInputStream {
    private static final int BUFFER = 1 << 14;

    Inflating(InputStream raw) {
      super(raw, new Inflater(true), BUFFER);
    }

    @Override
    public void close() throws IOException {
      inf.end();
      super.close();
    }
  }
}
