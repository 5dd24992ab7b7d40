package weighhouse.workbook;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.Random;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.apache.poi.hssf.record.crypto.Biff8EncryptionKey;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.poifs.crypt.EncryptionInfo;
import org.apache.poi.poifs.crypt.EncryptionMode;
import org.apache.poi.poifs.crypt.Encryptor;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import weighhouse.workbook.file.WorkbookReader;

/** Each file that cannot be read gets one sentence with its name, what is wrong and what to do. */
class UnreadableFilesTest {
  @TempDir Path folder;

  private static void refuses(byte[] file, String name, String... words) {
    String message = messageOf(() -> WorkbookReader.read(file, name));
    checkSentence(message, name, words);
  }

  private static String messageOf(org.junit.jupiter.api.function.Executable reading) {
    return assertThrows(UnreadableWorkbookException.class, reading).getMessage();
  }

  private static void checkSentence(String message, String name, String... words) {
    assertTrue(message.startsWith(name + " "), message);
    assertTrue(message.endsWith(".") && message.contains(":"), message);
    assertTrue(message.lines().count() == 1 && !message.contains("Exception"), message);
    for (String word : words) {
      assertTrue(message.contains(word), message);
    }
  }

  private static byte[] ascii(String text) {
    return text.getBytes(StandardCharsets.US_ASCII);
  }

  private static byte[] zip(String name, byte[] content) throws Exception {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (ZipOutputStream zip = new ZipOutputStream(out)) {
      zip.putNextEntry(new ZipEntry(name));
      zip.write(content);
    }
    return out.toByteArray();
  }

  @Test
  void missingFileAndFolder() {
    Path missing = folder.resolve("none.xlsx");
    checkSentence(messageOf(() -> WorkbookReader.read(missing)), "none.xlsx", "does not exist");
    checkSentence(
        messageOf(() -> WorkbookReader.read(folder)), folder.getFileName().toString(), "folder");
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "''|empty",
        "a;b;c|text file",
        "<!DOCTYPE html><html>|web page",
        "<?xml version='1.0'?><Workbook/>|XML",
      })
  void filesThatAreNoContainer(String content, String word) {
    refuses(ascii(content), "model.xlsx", word);
    refuses(ascii(content), "model.xls", word);
  }

  @Test
  void noise() {
    byte[] noise = new byte[5000];
    new Random(7).nextBytes(noise);
    refuses(noise, "model.xlsx", "is no workbook");
  }

  @ParameterizedTest
  @ValueSource(doubles = {0.1, 0.5, 0.9, 0.999})
  void truncated(double part) throws Exception {
    for (String name : new String[] {"sample.xlsx", "sample.xls"}) {
      byte[] whole = SampleBooks.sample(name);
      byte[] cut = Arrays.copyOf(whole, (int) (whole.length * part));
      if (name.equals("sample.xlsx") || part < 0.9) {
        refuses(cut, name, "damaged");
      }
    }
  }

  @Test
  void otherZips() throws Exception {
    refuses(zip("readme.txt", ascii("hello")), "a.xlsx", "zip archive but no workbook");
    refuses(
        zip("mimetype", ascii("application/vnd.oasis.opendocument.spreadsheet")), "a.ods", ".ods");
    refuses(
        RawBook.ofCells("")
            .contentType("application/vnd.ms-excel.sheet.binary.macroEnabled.main")
            .bytes(),
        "a.xlsb",
        ".xlsb");
    refuses(
        RawBook.ofCells("")
            .contentType(
                "application/vnd.openxmlformats-officedocument.wordprocessingml.document.main+xml")
            .bytes(),
        "a.docx",
        "document");
  }

  @Test
  void missingPartsAndWrongTypes() {
    refuses(RawBook.ofCells("").contentType("text/plain").bytes(), "a.xlsx", "text/plain");
    refuses(
        RawBook.ofCells("").without("xl/worksheets/sheet1.xml").bytes(),
        "a.xlsx",
        "xl/worksheets/sheet1.xml");
    refuses(
        RawBook.ofCells("").without("xl/_rels/workbook.xml.rels").bytes(), "a.xlsx", "its sheet S");
    refuses(RawBook.ofCells("").without("xl/workbook.xml").bytes(), "a.xlsx", "xl/workbook.xml");
    refuses(RawBook.ofCells("").main("<sheets/>").bytes(), "a.xlsx", "no worksheet");
  }

  @Test
  void brokenXml() {
    refuses(RawBook.ofCells("<row><c></row>").bytes(), "a.xlsx", "not well-formed");
    refuses(RawBook.ofCells("<row r='x'/>").bytes(), "a.xlsx", "damaged");
    refuses(RawBook.ofCells("<row><c r='??'/></row>").bytes(), "a.xlsx", "damaged");
    refuses(RawBook.ofSheet("").part("xl/workbook.xml", "").bytes(), "a.xlsx", "not well-formed");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "<row r='1048577'/>",
        "<row r='0'/>",
        "<row r='2147483647'/><row/>",
        "<row r='1'><c r='XFE1'/></row>",
        "<row r='1'><c r='ZZZZZZ1'/></row>"
      })
  void cellsBeyondTheLastRowOrColumn(String rows) {
    refuses(RawBook.ofCells(rows).bytes(), "a.xlsx", "Excel");
  }

  @Test
  void entities() {
    StringBuilder laughs = new StringBuilder("<!DOCTYPE w [<!ENTITY a0 'ha'>");
    for (int i = 1; i < 30; i++) {
      laughs.append("<!ENTITY a%d '&a%d;&a%d;'>".formatted(i, i - 1, i - 1));
    }
    String sheet = laughs + "]><worksheet><sheetData>&a29;</sheetData></worksheet>";
    refuses(
        RawBook.ofSheet("").part("xl/worksheets/sheet1.xml", sheet).bytes(),
        "a.xlsx",
        "document type");
  }

  @Test
  void zipBomb() {
    byte[] spaces = new byte[80 << 20];
    Arrays.fill(spaces, (byte) ' ');
    byte[] start = ascii("<worksheet><sheetData>");
    System.arraycopy(start, 0, spaces, 0, start.length);
    refuses(
        RawBook.ofSheet("").part("xl/worksheets/sheet1.xml", spaces).bytes(), "a.xlsx", "zip bomb");
  }

  @Test
  void passwords() throws Exception {
    try (POIFSFileSystem container = new POIFSFileSystem()) {
      Encryptor encryptor = new EncryptionInfo(EncryptionMode.agile).getEncryptor();
      encryptor.confirmPassword("secret");
      try (var out = encryptor.getDataStream(container)) {
        out.write(SampleBooks.sample("sample.xlsx"));
      }
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      container.writeFilesystem(bytes);
      refuses(bytes.toByteArray(), "a.xlsx", "password");
    }
    try (HSSFWorkbook book = new HSSFWorkbook()) {
      book.createSheet();
      Biff8EncryptionKey.setCurrentUserPassword("secret");
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      book.write(bytes);
      Biff8EncryptionKey.setCurrentUserPassword(null);
      refuses(bytes.toByteArray(), "a.xls", "password");
    } finally {
      Biff8EncryptionKey.setCurrentUserPassword(null);
    }
  }

  @Test
  void olderThanExcel97() throws Exception {
    refuses(new byte[] {9, 8, 6, 0, 0, 0, 0x10, 0, 0, 0}, "a.xls", "Excel 95");
    refuses(new byte[] {9, 4, 6, 0, 0, 0, 0x10, 0, 0, 0}, "a.xls", "Excel 95");
    try (POIFSFileSystem container = new POIFSFileSystem()) {
      container.createDocument(new java.io.ByteArrayInputStream(new byte[5000]), "Book");
      ByteArrayOutputStream bytes = new ByteArrayOutputStream();
      container.writeFilesystem(bytes);
      refuses(bytes.toByteArray(), "a.xls", "Excel 95");
    }
  }

  @Test
  void damagedRecordsOfBinaryWorkbooks() throws Exception {
    byte[] whole = SampleBooks.sample("sample.xls");
    Random random = new Random(11);
    for (int round = 0; round < 200; round++) {
      byte[] damaged = whole.clone();
      for (int i = 0; i < 40; i++) {
        damaged[512 + random.nextInt(damaged.length - 512)] = (byte) random.nextInt();
      }
      readsOrRefuses(damaged, "a.xls");
    }
  }

  @Test
  void damagedZips() throws Exception {
    byte[] whole = SampleBooks.sample("sample.xlsx");
    Random random = new Random(13);
    for (int round = 0; round < 400; round++) {
      byte[] damaged = whole.clone();
      for (int i = 0; i < 3; i++) {
        damaged[random.nextInt(damaged.length)] = (byte) random.nextInt();
      }
      readsOrRefuses(damaged, "a.xlsx");
    }
  }

  private static void readsOrRefuses(byte[] file, String name) {
    try {
      assertTrue(WorkbookReader.read(file, name).sheets().size() >= 1);
    } catch (UnreadableWorkbookException e) {
      checkSentence(e.getMessage(), name);
    }
  }

  @Test
  void manyEmptyStyledRowsAreReadAndCheap() throws Exception {
    StringBuilder rows = new StringBuilder();
    for (int r = 1; r <= 1 << 20; r++) {
      rows.append("<row r='").append(r).append("' s='1' customFormat='1'><c r='A");
      rows.append(r).append("' s='1'/></row>");
    }
    CellStore cells = RawBook.ofCells(rows.toString()).read().sheet(0).cells();
    assertEquals(0, cells.size());
    assertEquals(0, cells.rows());
  }

  @Test
  void theFileStaysAsItIs() throws Exception {
    for (String name : SampleBooks.fileNames().toList()) {
      Path file = folder.resolve(name);
      Files.write(file, SampleBooks.sample(name));
      var time = Files.getLastModifiedTime(file);
      byte[] before = Files.readAllBytes(file);
      WorkbookReader.read(file);
      assertEquals(time, Files.getLastModifiedTime(file));
      assertEquals(
          java.util.HexFormat.of().formatHex(before),
          java.util.HexFormat.of().formatHex(Files.readAllBytes(file)));
    }
  }
}
