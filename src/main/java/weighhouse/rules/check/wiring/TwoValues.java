package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import weighhouse.formula.Region;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** One effect measure entered in two cells with different values. */
public final class TwoValues implements Check {
  /** Words that many measures share; what tells one from another are the words that remain. */
  private static final Set<String> GENERIC =
      Set.of(
          "hazard",
          "rate",
          "risk",
          "odds",
          "ratio",
          "relative",
          "mortality",
          "effect",
          "hr",
          "rr",
          "or",
          "irr",
          "smr",
          "ln",
          "log",
          "of",
          "for",
          "the",
          "vs",
          "versus",
          "ci",
          "95",
          "mean",
          "base",
          "case",
          "value",
          "estimate",
          "treatment",
          "new",
          "intervention",
          "reduction");

  @Override
  public String name() {
    return "two-values";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    List<Match> matches = new ArrayList<>();
    for (List<CellAddress> same : byLabel(survey).values()) {
      CellAddress first = same.get(0);
      same.stream()
          .filter(cell -> differs(survey.base().number(first), survey.base().number(cell)))
          .filter(cell -> !areAlternatives(first, cell, survey))
          .findFirst()
          .ifPresent(other -> matches.add(match(rule, first, other, survey)));
    }
    return matches;
  }

  private record Key(Kind kind, String label) {}

  private static Map<Key, List<CellAddress>> byLabel(Survey survey) {
    Captions captions = new Captions(survey);
    Map<Key, List<CellAddress>> cells = new LinkedHashMap<>();
    for (CellAddress cell : survey.measures()) {
      String label = plain(captions.of(cell));
      boolean ratio = Measures.isRatio(survey.kind(cell)) && survey.isTyped(cell);
      if (ratio && isTelling(label)) {
        cells.computeIfAbsent(new Key(survey.kind(cell), label), k -> new ArrayList<>()).add(cell);
      }
    }
    return cells;
  }

  private static String plain(String label) {
    return label.toLowerCase(Locale.ROOT).replaceAll("[^\\p{L}\\p{N}]+", " ").strip();
  }

  private static boolean isTelling(String label) {
    for (String word : label.split(" ", -1)) {
      if (word.length() > 2 && !GENERIC.contains(word)) {
        return true;
      }
    }
    return false;
  }

  private static boolean differs(double a, double b) {
    return Math.abs(a - b) > 1e-9 * Math.max(Math.abs(a), Math.abs(b));
  }

  /** Scenarios: columns of one row, the same place of two sheets, or choices of one formula. */
  private static boolean areAlternatives(CellAddress a, CellAddress b, Survey survey) {
    if (a.row() == b.row()) {
      return true;
    }
    for (Region region : survey.regions()) {
      CellAddress host = region.range().first();
      List<CellRange> read = survey.references().ranges(survey.tree(region), host);
      if (read.stream().anyMatch(r -> r.contains(a))
          && read.stream().anyMatch(r -> r.contains(b))) {
        return true;
      }
    }
    return !survey.isRead(a) || !survey.isRead(b);
  }

  private static Match match(Rule rule, CellAddress a, CellAddress b, Survey survey) {
    String note =
        "%s holds %s, %s holds %s."
            .formatted(
                survey.subject().workbook().show(a),
                survey.base().number(a),
                survey.subject().workbook().show(b),
                survey.base().number(b));
    List<CellRange> cells = List.of(CellRange.of(a), CellRange.of(b));
    return new Match(rule, cells, a, null, null, Map.of(), List.of(note));
  }
}
