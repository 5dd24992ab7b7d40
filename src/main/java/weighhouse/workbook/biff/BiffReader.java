package weighhouse.workbook.biff;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.poi.EncryptedDocumentException;
import org.apache.poi.hssf.OldExcelFormatException;
import org.apache.poi.hssf.usermodel.HSSFName;
import org.apache.poi.hssf.usermodel.HSSFWorkbook;
import org.apache.poi.poifs.filesystem.DirectoryNode;
import org.apache.poi.poifs.filesystem.POIFSFileSystem;
import weighhouse.workbook.CellRange;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Visibility;
import weighhouse.workbook.Workbook;
import weighhouse.workbook.WorkbookFault;

/** Reads an .xls file (BIFF8) from memory. */
public final class BiffReader {
  private static final String MACROS = "_VBA_PROJECT_CUR";

  private final HSSFWorkbook book;
  private final BookRecords records;
  private final List<String> problems = new ArrayList<>();
  private final int[] sheetOfTab;

  private BiffReader(HSSFWorkbook book, BookRecords records) {
    this.book = book;
    this.records = records;
    sheetOfTab = new int[book.getNumberOfSheets()];
    int next = 0;
    for (int tab = 0; tab < sheetOfTab.length; tab++) {
      sheetOfTab[tab] = records.isWorksheet(tab) ? next++ : -1;
    }
  }

  /**
   * The snapshot of the workbook.
   *
   * @param file the whole file
   * @param fileName its name without its folder
   * @param sha256 digest of its bytes
   * @throws IOException a {@link WorkbookFault} when it is no .xls workbook that can be read
   */
  public static Workbook read(byte[] file, String fileName, String sha256) throws IOException {
    try (POIFSFileSystem container = new POIFSFileSystem(new ByteArrayInputStream(file))) {
      CompoundFile.check(container.getRoot());
      BookRecords records = BookRecords.read(container);
      try (HSSFWorkbook book = new HSSFWorkbook(container, false)) {
        return new BiffReader(book, records)
            .workbook(fileName, sha256, macros(container.getRoot()));
      }
    } catch (EncryptedDocumentException e) {
      throw CompoundFile.protectedByPassword(e);
    } catch (OldExcelFormatException e) {
      throw CompoundFile.tooOld(e);
    }
  }

  private static List<String> macros(DirectoryNode root) {
    return root.hasEntry(MACROS) ? List.of(MACROS) : List.of();
  }

  private Workbook workbook(String fileName, String sha256, List<String> macros) {
    List<String> formats = new ArrayList<>();
    for (int i = 0; i < book.getNumCellStyles(); i++) {
      formats.add(book.getCellStyleAt(i).getDataFormatString());
    }
    List<Sheet> sheets = new ArrayList<>();
    for (int tab = 0; tab < sheetOfTab.length; tab++) {
      if (sheetOfTab[tab] >= 0) {
        sheets.add(sheet(tab, formats));
      }
    }
    return new Workbook(
        fileName,
        sha256,
        sheets,
        names(),
        records.date1904(),
        macros,
        records.externalLinks(),
        problems);
  }

  private Sheet sheet(int tab, List<String> formats) {
    int index = sheetOfTab[tab];
    Visibility visibility =
        switch (book.getSheetVisibility(tab)) {
          case VISIBLE -> Visibility.VISIBLE;
          case HIDDEN -> Visibility.HIDDEN;
          case VERY_HIDDEN -> Visibility.VERY_HIDDEN;
        };
    List<CellRange> tables =
        records.dataTables(tab).stream().map(range -> BiffSheet.range(range, index)).toList();
    return new BiffSheet(book.getSheetAt(tab), index, problems).read(visibility, formats, tables);
  }

  private List<DefinedName> names() {
    List<DefinedName> names = new ArrayList<>();
    List<HSSFName> all = book.getAllNames();
    for (int i = 0; i < all.size(); i++) {
      HSSFName name = all.get(i);
      int tab = name.getSheetIndex();
      int scope = tab < 0 ? DefinedName.WORKBOOK_SCOPE : sheetOfTab[tab];
      if (!records.isBuiltInName(i) && (tab < 0 || scope >= 0)) {
        String comment = name.getComment() == null ? "" : name.getComment();
        names.add(
            new DefinedName(name.getNameName(), scope, refersTo(name), name.isHidden(), comment));
      }
    }
    return names;
  }

  private String refersTo(HSSFName name) {
    try {
      return name.isFunctionName() ? "#NAME?" : name.getRefersToFormula();
    } catch (RuntimeException e) {
      problems.add("The name " + name.getNameName() + " cannot be read.");
      return "#REF!";
    }
  }
}
