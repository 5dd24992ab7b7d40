package weighhouse.quantity.inference;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import weighhouse.quantity.vocabulary.FieldWords;
import weighhouse.quantity.vocabulary.Vocabulary;
import weighhouse.workbook.CellKind;
import weighhouse.workbook.CellStore;
import weighhouse.workbook.DefinedName;
import weighhouse.workbook.Sheet;
import weighhouse.workbook.Workbook;

/**
 * Whether a workbook is a health-economic model at all. Independent groups of signs count for and
 * against it; one word never decides against.
 *
 * @param points for the signs that speak for a model
 * @param against for the signs that speak for something else
 * @param evidence one sentence each
 */
record Field(int points, int against, List<String> evidence) {
  private static final int ENOUGH = 3;

  /** Texts looked at; a workbook tells its field in its first labels. */
  private static final int MOST_TEXTS = 20_000;

  boolean isHealthEconomic() {
    return points >= ENOUGH && points > against;
  }

  static Field of(Workbook workbook, Vocabulary vocabulary) {
    Map<FieldWords.Group, List<String>> seen = new HashMap<>();
    texts(workbook).forEach(text -> vocabulary.field().count(text, seen));
    int points = 0;
    int against = 0;
    List<String> evidence = new ArrayList<>();
    for (Map.Entry<FieldWords.Group, List<String>> group : seen.entrySet()) {
      int weight = group.getKey().points();
      if (weight > 0) {
        points += weight;
      } else {
        against += group.getValue().size() > 1 ? -weight : 1;
      }
      evidence.add(group.getKey().sign() + ": " + String.join(", ", group.getValue()));
    }
    return new Field(points, against, evidence);
  }

  private static Set<String> texts(Workbook workbook) {
    Set<String> texts = new HashSet<>();
    for (DefinedName name : workbook.names()) {
      texts.add(name.name());
    }
    for (Sheet sheet : workbook.sheets()) {
      texts.add(sheet.name());
      texts.addAll(sheet.comments().values());
      CellStore cells = sheet.cells();
      for (int i = 0; i < cells.size() && texts.size() < MOST_TEXTS; i++) {
        if (cells.kind(i) == CellKind.TEXT) {
          texts.add(cells.text(i));
        }
      }
    }
    return texts;
  }
}
