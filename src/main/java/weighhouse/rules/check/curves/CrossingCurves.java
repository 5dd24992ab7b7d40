package weighhouse.rules.check.curves;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import weighhouse.quantity.Kind;
import weighhouse.rules.Check;
import weighhouse.rules.Match;
import weighhouse.rules.Rule;
import weighhouse.rules.Subject;
import weighhouse.rules.check.Captions;
import weighhouse.rules.check.Line;
import weighhouse.rules.check.Survey;

/** Survival without progression that is above survival, of one arm at one time. */
public final class CrossingCurves implements Check {
  private static final Pattern WITHOUT_EVENT =
      Pattern.compile(
          "\\bpfs\\b|\\bdfs\\b|\\befs\\b|\\brfs\\b"
              + "|(?:progression|disease|event|relapse)[- ]free(?: survival)?");
  private static final Pattern OVERALL = Pattern.compile("\\bos\\b|overall(?: survival)?");
  private static final double ROUNDING = 1e-7;

  @Override
  public String name() {
    return "crossing-curves";
  }

  @Override
  public List<Match> find(Subject subject, Rule rule, Map<String, String> parameters) {
    Survey survey = new Survey(subject);
    Captions captions = new Captions(survey);
    List<Line> lines = Line.of(Kind.SURVIVAL, survey);
    List<Match> matches = new ArrayList<>();
    for (Line part : lines) {
      String caption = part.caption(captions);
      if (WITHOUT_EVENT.matcher(caption).find()) {
        Line whole = overall(part, caption, lines, captions);
        if (whole != null) {
          compare(part, whole, survey, rule, matches);
        }
      }
    }
    return matches;
  }

  /** The curve of the same arm; the only one there is where arms have no names. */
  private static Line overall(Line part, String caption, List<Line> lines, Captions captions) {
    String arm = arm(WITHOUT_EVENT, caption);
    List<Line> beside =
        lines.stream()
            .filter(part::isBeside)
            .filter(line -> OVERALL.matcher(line.caption(captions)).find())
            .filter(line -> !WITHOUT_EVENT.matcher(line.caption(captions)).find())
            .toList();
    List<Line> same =
        beside.stream().filter(line -> arm(OVERALL, line.caption(captions)).equals(arm)).toList();
    List<Line> fitting = same.isEmpty() ? beside : same;
    return fitting.size() == 1 ? fitting.get(0) : null;
  }

  private static String arm(Pattern name, String caption) {
    return name.matcher(caption).replaceAll(" ").replaceAll("[^\\p{L}\\p{N}]+", " ").strip();
  }

  private static void compare(
      Line part, Line whole, Survey survey, Rule rule, List<Match> matches) {
    double[] without = part.values(survey);
    double[] overall = whole.values(survey);
    for (int i = 0; i < without.length; i++) {
      if (without[i] > overall[i] + ROUNDING) {
        String note =
            "Above %s first in %s."
                .formatted(
                    survey.subject().workbook().show(whole.cells()),
                    survey.subject().workbook().show(part.at(i)));
        matches.add(Survey.match(rule, part.cells(), null, null, note));
        return;
      }
    }
  }
}
