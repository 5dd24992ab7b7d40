package weighhouse.generator.book;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.apache.poi.openxml4j.exceptions.InvalidFormatException;
import org.apache.poi.openxml4j.opc.OPCPackage;
import org.apache.poi.openxml4j.opc.PackageAccess;
import org.apache.poi.ss.usermodel.Cell;
import org.apache.poi.ss.usermodel.CellType;
import org.apache.poi.ss.usermodel.FormulaError;
import org.apache.poi.ss.usermodel.Row;
import org.apache.poi.ss.usermodel.Sheet;
import org.apache.poi.xssf.usermodel.XSSFWorkbook;

/** The stored values of a saved workbook. */
public final class StoredValues {
  private final Map<CellAt, Double> numbers = new HashMap<>();
  private final List<String> errors = new ArrayList<>();
  private int formulas;

  private StoredValues() {}

  /** Reads a workbook without changing it. */
  public static StoredValues of(Path file) throws IOException {
    StoredValues values = new StoredValues();
    try (OPCPackage parts = OPCPackage.open(file.toFile(), PackageAccess.READ);
        XSSFWorkbook workbook = new XSSFWorkbook(parts)) {
      for (Sheet sheet : workbook) {
        for (Row row : sheet) {
          row.forEach(values::add);
        }
      }
    } catch (InvalidFormatException e) {
      throw new IOException(file + " is no workbook", e);
    }
    return values;
  }

  private void add(Cell cell) {
    CellAt at =
        new CellAt(cell.getSheet().getSheetName(), cell.getRowIndex(), cell.getColumnIndex());
    CellType type = cell.getCellType();
    if (type == CellType.FORMULA) {
      formulas++;
      type = cell.getCachedFormulaResultType();
    }
    if (type == CellType.NUMERIC) {
      numbers.put(at, cell.getNumericCellValue());
    } else if (type == CellType.ERROR) {
      errors.add(at.text() + " " + FormulaError.forInt(cell.getErrorCellValue()).getString());
    }
  }

  /** The number at a cell, if there is one. */
  public OptionalDouble number(CellAt at) {
    Double number = numbers.get(at);
    return number == null ? OptionalDouble.empty() : OptionalDouble.of(number);
  }

  /** Cells whose value is an error, with the error. */
  public List<String> errors() {
    return errors;
  }

  /** How many cells hold formulas. */
  public int formulas() {
    return formulas;
  }
}
