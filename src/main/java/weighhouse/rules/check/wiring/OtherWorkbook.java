package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.SheetRef;
import weighhouse.formula.Trees;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.RatioWords;
import weighhouse.rules.check.Survey;
import weighhouse.workbook.CellAddress;

/** An effect measure that is read from another workbook. */
public final class OtherWorkbook implements Check {
  @Override
  public String name() {
    return "other-workbook";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Captions captions = new Captions(survey);
    List<Match> matches = new ArrayList<>();
    for (Region region : survey.regions()) {
      link(region, survey, captions)
          .ifPresent(link -> matches.add(Survey.match(rule, region.range(), link, null)));
    }
    return matches;
  }

  private static Optional<Expr> link(Region region, Survey survey, Captions captions) {
    Expr tree = survey.tree(region);
    CellAddress host = region.range().first();
    Optional<Expr> link = Trees.walk(tree).stream().filter(OtherWorkbook::isElsewhere).findFirst();
    if (link.isEmpty()) {
      return link;
    }
    boolean measure = Measures.isMeasure(survey.kind(host)) || RatioWords.in(captions.of(host));
    boolean factor =
        Factors.ofEvents(tree, host, survey).stream()
            .anyMatch(site -> Trees.contains(site.factor(), OtherWorkbook::isElsewhere));
    return measure || factor ? link : Optional.empty();
  }

  private static boolean isElsewhere(Expr node) {
    SheetRef sheet =
        node instanceof Expr.CellRef cell
            ? cell.sheet()
            : node instanceof Expr.AreaRef area
                ? area.sheet()
                : node instanceof Expr.NameRef name ? name.sheet() : null;
    return sheet != null && sheet.workbook() != null;
  }
}
