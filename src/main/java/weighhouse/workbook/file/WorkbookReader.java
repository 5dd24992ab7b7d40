package weighhouse.workbook.file;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import weighhouse.workbook.UnreadableWorkbookException;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.WorkbookFault;
import weighhouse.workbook.biff.BiffReader;
import weighhouse.workbook.ooxml.OoxmlReader;

/**
 * Reads .xlsx, .xlsm and .xls workbooks into the snapshot. The file is read once into memory and
 * never written to, locked or followed to other files; macros do not run.
 */
public final class WorkbookReader {
  /** Larger files are no models, and would not fit in memory beside their content. */
  private static final long LARGEST_FILE = 1L << 29;

  private WorkbookReader() {}

  /**
   * Reads a file.
   *
   * @throws UnreadableWorkbookException if there is no such file, or it is no workbook that can be
   *     read
   */
  public static Workbook read(Path file) throws UnreadableWorkbookException {
    String name = String.valueOf(file.getFileName());
    try {
      return read(bytes(file), name);
    } catch (WorkbookFault e) {
      throw e.in(name);
    }
  }

  /**
   * Reads a file that is in memory.
   *
   * @param bytes all of the file
   * @param fileName its name without its folder
   * @throws UnreadableWorkbookException if it is no workbook that can be read
   */
  public static Workbook read(byte[] bytes, String fileName) throws UnreadableWorkbookException {
    try {
      return switch (FileFormat.of(bytes)) {
        case OOXML -> OoxmlReader.read(bytes, fileName, sha256(bytes));
        case BIFF -> BiffReader.read(bytes, fileName, sha256(bytes));
      };
    } catch (WorkbookFault e) {
      throw e.in(fileName);
    } catch (IOException | RuntimeException e) {
      throw new WorkbookFault(
              "is damaged: open it in Excel, let Excel repair it and save it, or get a fresh copy",
              e)
          .in(fileName);
    }
  }

  private static byte[] bytes(Path file) throws WorkbookFault {
    try {
      if (Files.isDirectory(file)) {
        throw new WorkbookFault("is a folder: give a workbook file");
      }
      if (Files.size(file) > LARGEST_FILE) {
        throw new WorkbookFault(
            "is larger than "
                + (LARGEST_FILE >> 20)
                + " MB: clear unused sheets and pictures, and save it");
      }
      return Files.readAllBytes(file);
    } catch (NoSuchFileException e) {
      throw new WorkbookFault("does not exist: check its path", e);
    } catch (WorkbookFault e) {
      throw e;
    } catch (IOException e) {
      throw new WorkbookFault(
          "cannot be opened: close it in other programs and check that you may read it", e);
    }
  }

  private static String sha256(byte[] bytes) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java runtime has SHA-256", e);
    }
  }
}
