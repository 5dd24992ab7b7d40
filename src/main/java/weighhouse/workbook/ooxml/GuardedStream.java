package weighhouse.workbook.ooxml;

import java.io.EOFException;
import java.io.FilterInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.util.concurrent.atomic.AtomicLong;
import java.util.zip.ZipException;
import weighhouse.workbook.WorkbookFault;

/**
 * Stops at a part that inflates beyond all reason. Measured with deflate: rows of formulas shrink
 * 12 times, a million empty styled rows 16 times, endless like rows without addresses 340 times; a
 * bomb comes near the limit of 1032 at a size that matters.
 */
final class GuardedStream extends FilterInputStream {
  /** Below this size any ratio is harmless. */
  static final long SMALL = 64L << 20;

  static final int HIGHEST_RATIO = 500;

  /** Of all parts read from one workbook together. */
  static final long HIGHEST_TOTAL = 3L << 29;

  private final long compressedSize;
  private final AtomicLong total;
  private long read;

  GuardedStream(InputStream in, long compressedSize, AtomicLong total) {
    super(in);
    this.compressedSize = compressedSize;
    this.total = total;
  }

  @Override
  public int read() throws IOException {
    byte[] one = new byte[1];
    return read(one, 0, 1) < 0 ? -1 : one[0] & 0xff;
  }

  @Override
  public int read(byte[] buffer, int offset, int length) throws IOException {
    try {
      int count = super.read(buffer, offset, length);
      if (count > 0) {
        count(count);
      }
      return count;
    } catch (ZipException | EOFException e) {
      throw ZipEntries.damaged(e);
    }
  }

  private void count(int count) throws WorkbookFault {
    read += count;
    boolean all = total.addAndGet(count) > HIGHEST_TOTAL;
    if (all || (read > SMALL && read > compressedSize * HIGHEST_RATIO)) {
      throw new WorkbookFault(
          "unpacks to far more than a workbook holds ("
              + (read >> 20)
              + " MB and more from "
              + (compressedSize >> 10)
              + " KB), as a zip bomb does, and was left unread: if you trust it, open it in Excel,"
              + " clear unused rows and save it");
    }
  }
}
