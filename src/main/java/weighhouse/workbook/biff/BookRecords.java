package weighhouse.workbook.biff;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.poi.hssf.eventusermodel.HSSFEventFactory;
import org.apache.poi.hssf.eventusermodel.HSSFRequest;
import org.apache.poi.hssf.record.BOFRecord;
import org.apache.poi.hssf.record.DateWindow1904Record;
import org.apache.poi.hssf.record.EOFRecord;
import org.apache.poi.hssf.record.NameRecord;
import org.apache.poi.hssf.record.SupBookRecord;
import org.apache.poi.hssf.record.TableRecord;
import org.apache.poi.hssf.util.CellRangeAddress8Bit;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;

/** What POI's user model does not show, taken from the records of the workbook's stream. */
final class BookRecords {
  /**
   * One sheet.
   *
   * @param type kind of the stream, as in {@link BOFRecord}
   * @param dataTables ranges that what-if data tables fill
   */
  record SheetRecords(int type, List<CellRangeAddress8Bit> dataTables) {}

  private final List<SheetRecords> sheets = new ArrayList<>();
  private final List<Boolean> builtInNames = new ArrayList<>();
  private final List<String> externalLinks = new ArrayList<>();
  private boolean date1904;
  private int depth;

  private BookRecords() {}

  static BookRecords read(POIFSFileSystem file) throws IOException {
    BookRecords found = new BookRecords();
    HSSFRequest request = new HSSFRequest();
    request.addListener(r -> found.begin((BOFRecord) r), BOFRecord.sid);
    request.addListener(r -> found.depth--, EOFRecord.sid);
    request.addListener(
        r -> found.date1904 |= ((DateWindow1904Record) r).getWindowing() == 1,
        DateWindow1904Record.sid);
    request.addListener(r -> found.table((TableRecord) r), TableRecord.sid);
    request.addListener(
        r -> found.builtInNames.add(((NameRecord) r).isBuiltInName()), NameRecord.sid);
    request.addListener(r -> found.link((SupBookRecord) r), SupBookRecord.sid);
    new HSSFEventFactory().processWorkbookEvents(request, file);
    return found;
  }

  boolean date1904() {
    return date1904;
  }

  boolean isWorksheet(int sheet) {
    return sheet >= sheets.size() || sheets.get(sheet).type() == BOFRecord.TYPE_WORKSHEET;
  }

  List<CellRangeAddress8Bit> dataTables(int sheet) {
    return sheet < sheets.size() ? sheets.get(sheet).dataTables() : List.of();
  }

  /** Whether the name of that index is one of Excel's own, such as a print area. */
  boolean isBuiltInName(int name) {
    return name < builtInNames.size() && builtInNames.get(name);
  }

  List<String> externalLinks() {
    return externalLinks;
  }

  /** Charts on a sheet have streams of their own within that of the sheet. */
  private void begin(BOFRecord begin) {
    if (depth == 0 && begin.getType() != BOFRecord.TYPE_WORKBOOK) {
      sheets.add(new SheetRecords(begin.getType(), new ArrayList<>()));
    }
    depth++;
  }

  private void table(TableRecord table) {
    if (!sheets.isEmpty()) {
      sheets.get(sheets.size() - 1).dataTables().add(table.getRange());
    }
  }

  private void link(SupBookRecord book) {
    if (book.isExternalReferences()) {
      externalLinks.add(book.getURL());
    }
  }
}
