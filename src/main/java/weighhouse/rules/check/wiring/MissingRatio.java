package weighhouse.rules.check.wiring;

import java.util.ArrayList;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import weighhouse.formula.Expr;
import weighhouse.formula.Region;
import weighhouse.formula.Shape;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Measures;
import weighhouse.rules.check.Survey;
import weighhouse.rules.pattern.ModelScope;
import weighhouse.rules.term.Identity;
import weighhouse.rules.term.Sample;
import weighhouse.rules.term.Term;
import weighhouse.rules.term.Terms;
import weighhouse.rules.term.Translator;
import weighhouse.workbook.CellAddress;
import weighhouse.workbook.CellRange;

/** A part of a filled range whose formula is its siblings' but for the effect measure. */
public final class MissingRatio implements Check {
  private static final int SAMPLES = 3;

  @Override
  public String name() {
    return "missing-ratio";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Siblings siblings = new Siblings(survey);
    Search search = new Search(survey, rule);
    for (Region region : survey.regions()) {
      List<Expr> measures = survey.measuresIn(survey.tree(region), region.range().first());
      if (!measures.isEmpty() && !measures.contains(survey.tree(region))) {
        siblings.of(region).forEach(pair -> search.look(pair, measures));
      }
    }
    return search.found;
  }

  private static final class Search {
    private final Survey survey;
    private final Rule rule;
    private final ModelScope scope;
    private final List<Match> found = new ArrayList<>();

    Search(Survey survey, Rule rule) {
      this.survey = survey;
      this.rule = rule;
      Subject subject = survey.subject();
      this.scope = new ModelScope(subject.workbook(), subject.shapes(), subject.quantities());
    }

    void look(Siblings.Pair pair, List<Expr> measures) {
      Optional<String> level = level(pair);
      CellAddress host = pair.odd().first();
      Expr full = survey.tree(pair.regular());
      Shape odd = survey.subject().shapes().at(host);
      boolean lacks = odd == null ? pair.between() : lacks(full, measures, odd.tree(), pair);
      boolean known = found.stream().anyMatch(match -> match.cells().contains(pair.odd()));
      if (level.isPresent() && lacks && !known) {
        found.add(Survey.match(rule.at(level.get()), pair.odd(), null, full));
      }
    }

    /** How sure it is: an effect may well end or begin on purpose, but not pause. */
    private Optional<String> level(Siblings.Pair pair) {
      CellRange regular = pair.regular().range();
      long size = pair.odd().size();
      if (pair.between()) {
        return size <= 2 * regular.size() ? Optional.of(rule.level()) : Optional.empty();
      } else if (!pair.lengthwise() || regular.size() < 3 || (!pair.forward() && size == 1)) {
        return Optional.empty();
      }
      return Optional.of(size * 5 <= regular.size() ? rule.level() : "query");
    }

    private boolean lacks(Expr full, List<Expr> measures, Expr odd, Siblings.Pair pair) {
      CellAddress host = pair.odd().first();
      Terms terms = new Terms();
      Term without = new Translator(terms, scope).translate(odd, host);
      IdentityHashMap<Expr, Term> neutral = new IdentityHashMap<>();
      for (Expr measure : measures) {
        Term one = terms.number(neutral(measure, pair.regular()));
        neutral.put(measure, one);
        IdentityHashMap<Expr, Term> single = new IdentityHashMap<>();
        single.put(measure, one);
        if (same(new Translator(terms, scope, single).translate(full, host), without)) {
          return true;
        }
      }
      return same(new Translator(terms, scope, neutral).translate(full, host), without);
    }

    private double neutral(Expr measure, Region regular) {
      return Measures.neutral(survey.kind(measure, regular.range().first()));
    }

    private static boolean same(Term a, Term b) {
      for (int seed = 0; seed < SAMPLES; seed++) {
        Sample sample = new Sample(seed, Math.max(a.id(), b.id()) + 1);
        if (!Identity.agree(sample.of(a), sample.of(b))) {
          return false;
        }
      }
      return true;
    }
  }
}
