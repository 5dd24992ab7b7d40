package weighhouse.rules.check.evidence;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.quantity.TimeUnit;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.Workbook;

/** Lengths of time that a workbook states in a cell beside words. */
final class Durations {
  private static final Pattern UNIT =
      Pattern.compile("(?i)\\b(day|week|month|year)s?\\b|\\b(yrs?|mths?|wks?)\\b");
  private static final int ACROSS = 7;

  private final Workbook workbook;

  Durations(Workbook workbook) {
    this.workbook = workbook;
  }

  /** A length of time, in years, and the cell that holds it. */
  record Duration(CellAddress cell, double years) {}

  /** The lengths whose words match. */
  List<Duration> of(Pattern words) {
    List<Duration> found = new ArrayList<>();
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      CellStore cells = workbook.sheet(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        if (cells.kind(i) == CellKind.TEXT && words.matcher(cells.text(i)).find()) {
          beside(sheet, cells.row(i), cells.column(i), found);
        }
      }
    }
    return found;
  }

  /** Whether any text of the workbook matches. */
  boolean says(Pattern words) {
    for (int sheet = 0; sheet < workbook.sheets().size(); sheet++) {
      CellStore cells = workbook.sheet(sheet).cells();
      for (int i = 0; i < cells.size(); i++) {
        if (cells.kind(i) == CellKind.TEXT && words.matcher(cells.text(i)).find()) {
          return true;
        }
      }
    }
    return workbook.names().stream().anyMatch(name -> words.matcher(name.name()).find());
  }

  private void beside(int sheet, int row, int column, List<Duration> found) {
    CellStore cells = workbook.sheet(sheet).cells();
    StringBuilder words = new StringBuilder();
    double number = Double.NaN;
    int at = -1;
    for (int c = Math.max(0, column - 2); c <= column + ACROSS; c++) {
      int index = cells.find(row, c);
      if (index >= 0 && cells.kind(index) == CellKind.TEXT) {
        words.append(cells.text(index)).append(' ');
      } else if (index >= 0 && cells.kind(index) == CellKind.NUMBER && at < 0) {
        number = cells.number(index);
        at = c;
      }
    }
    double unit = unit(words.toString());
    if (at >= 0 && number > 0 && !Double.isNaN(unit)) {
      found.add(new Duration(new CellAddress(sheet, row, at), number * unit));
    }
  }

  /** Years of the one unit that the words name; NaN where they name none or several. */
  private static double unit(String words) {
    Matcher matcher = UNIT.matcher(words);
    double years = Double.NaN;
    while (matcher.find()) {
      double next = years(matcher.group().toLowerCase(java.util.Locale.ROOT));
      if (!Double.isNaN(years) && years != next) {
        return Double.NaN;
      }
      years = next;
    }
    return years;
  }

  private static double years(String unit) {
    return switch (unit.charAt(0)) {
      case 'd' -> TimeUnit.DAY.years();
      case 'w' -> TimeUnit.WEEK.years();
      case 'm' -> TimeUnit.MONTH.years();
      default -> TimeUnit.YEAR.years();
    };
  }
}
