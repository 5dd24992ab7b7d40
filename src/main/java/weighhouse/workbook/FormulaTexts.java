package weighhouse.workbook;

import java.util.Arrays;

/**
 * The formulas of a sheet: texts that cells own, and groups (shared or array formulas) with the
 * cell that each is written for.
 */
final class FormulaTexts {
  private static final int UNDEFINED = -1;

  final TextPool texts = new TextPool();
  private int groups;
  private int[] text = new int[8];
  private int[] anchorRow = new int[8];
  private int[] anchorColumn = new int[8];

  int newGroup() {
    if (groups == text.length) {
      int length = Growth.atLeast(groups, groups + 1);
      text = Arrays.copyOf(text, length);
      anchorRow = Arrays.copyOf(anchorRow, length);
      anchorColumn = Arrays.copyOf(anchorColumn, length);
    }
    text[groups] = UNDEFINED;
    return groups++;
  }

  void define(int group, int textId, int row, int column) {
    text[group] = textId;
    anchorRow[group] = row;
    anchorColumn[group] = column;
  }

  boolean isDefined(int group) {
    return text[group] != UNDEFINED;
  }

  String groupText(int group) {
    return texts.get(text[group]);
  }

  int anchorRow(int group) {
    return anchorRow[group];
  }

  int anchorColumn(int group) {
    return anchorColumn[group];
  }
}
