package weighhouse.rules.check.evidence;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import weighhouse.effect.survival.CurvePair;
import weighhouse.quantity.Kind;
import weighhouse.rules.check.ratio.ModelView;

/**
 * Survival of two arms as a table of a workbook holds it.
 *
 * @param first survival of one arm
 * @param second survival of the other
 * @param pair both where both can be compared: not all alive, not all dead
 */
record ArmCurves(DataColumn first, DataColumn second, CurvePair pair) {
  private static final Pattern TIME =
      Pattern.compile("\\b(time|months?|years?|weeks?|days?|cycles?|t)\\b");
  private static final Pattern SURVIVAL =
      Pattern.compile("surviv|\\b(os|pfs|dfs|efs|km)\\b|kaplan|s\\(t\\)|\\bs_?[0-9a-z]?\\b|alive");
  private static final Pattern PROGRESSION =
      Pattern.compile("\\b(pfs|dfs|efs|ttp|ttd)\\b|progression|disease.free|event.free");
  private static final Pattern OVERALL = Pattern.compile("\\bos\\b|overall");
  private static final Pattern INTERVAL =
      Pattern.compile("\\b(lower|upper|lcl|ucl|lci|uci|ci|se|low|high)\\b|95");
  private static final double ALL_ALIVE = 0.95;
  private static final double ALL_DEAD = 0.05;

  static List<ArmCurves> in(List<DataColumn> table, ModelView model) {
    List<ArmCurves> found = new ArrayList<>();
    DataColumn time = table.stream().filter(c -> isTime(c, model)).findFirst().orElse(null);
    if (time != null) {
      Map<String, List<DataColumn>> byEndpoint = new LinkedHashMap<>();
      for (DataColumn column : table) {
        if (isSurvival(column, model)) {
          byEndpoint.computeIfAbsent(endpoint(column), e -> new ArrayList<>()).add(column);
        }
      }
      byEndpoint.values().stream()
          .filter(columns -> columns.size() == 2)
          .forEach(columns -> found.add(of(time, columns.get(0), columns.get(1))));
    }
    return found;
  }

  private static boolean isTime(DataColumn column, ModelView model) {
    boolean told =
        column.isHeaded(TIME) || model.quantity(column.range().first()).kind() == Kind.TIME;
    return told && column.isAscending() && column.figures()[0] >= 0;
  }

  private static boolean isSurvival(DataColumn column, ModelView model) {
    boolean told =
        column.isHeaded(SURVIVAL) || model.quantity(column.range().first()).kind() == Kind.SURVIVAL;
    double[] figures = column.figures();
    boolean falls = figures[0] <= 1 && figures[0] > 0.7 && figures[figures.length - 1] >= 0;
    for (int i = 1; i < figures.length; i++) {
      falls &= figures[i] <= figures[i - 1];
    }
    return told
        && falls
        && figures[figures.length - 1] < figures[0] - 0.1
        && !column.isHeaded(INTERVAL);
  }

  private static String endpoint(DataColumn column) {
    return column.isHeaded(PROGRESSION) ? "pfs" : column.isHeaded(OVERALL) ? "os" : "";
  }

  private static ArmCurves of(DataColumn time, DataColumn first, DataColumn second) {
    List<double[]> usable = new ArrayList<>();
    for (int i = 0; i < time.size(); i++) {
      double a = first.figures()[i];
      double b = second.figures()[i];
      double t = time.figures()[i];
      if (t > 0 && Math.max(a, b) < ALL_ALIVE && Math.min(a, b) > ALL_DEAD) {
        usable.add(new double[] {t, a, b});
      }
    }
    return new ArmCurves(
        first, second, CurvePair.of(part(usable, 0), part(usable, 1), part(usable, 2)));
  }

  private static double[] part(List<double[]> points, int index) {
    return points.stream().mapToDouble(point -> point[index]).toArray();
  }
}
