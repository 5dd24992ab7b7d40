package weighhouse.rules.check.evidence;

import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import weighhouse.effect.survival.CoxData;
import weighhouse.effect.survival.CoxFit;
import weighhouse.effect.survival.CoxRegression;
import weighhouse.effect.survival.SurvivalTimes;
import weighhouse.effect.survival.Ties;
import weighhouse.workbook.CellRange;

/**
 * Times of patients in two arms as a table of a workbook holds them.
 *
 * @param cells where they stand
 * @param control the arm with the lower code, or whose name says that it is the control
 * @param treated the other arm
 */
record PatientData(List<CellRange> cells, SurvivalTimes control, SurvivalTimes treated) {
  private static final Pattern TIME =
      Pattern.compile(
          "\\b(time|months?|years?|weeks?|days?|os|pfs|t|duration|follow.?up)\\b|surviv|futime");
  private static final Pattern EVENT =
      Pattern.compile(
          "\\b(event|events|status|dead|death|died|delta|failed|failure|relapse|progress\\w*|d)\\b"
              + "|fustat");
  private static final Pattern CENSORED = Pattern.compile("cens");
  private static final Pattern ARM =
      Pattern.compile("\\b(arm|treat\\w*|trt|group|rx|therapy|alloc\\w*|random\\w*|x)\\b");
  private static final Pattern CONTROL =
      Pattern.compile("control|placebo|standard|comparator|soc|usual|\\bno\\b");
  private static final int LEAST_PATIENTS = 20;
  private static final int LEAST_EVENTS = 10;

  static Optional<PatientData> in(List<DataColumn> table) {
    Optional<DataColumn> arm = one(table, c -> c.isHeaded(ARM) && c.distinct() == 2);
    Optional<DataColumn> event =
        one(table, c -> (c.isHeaded(EVENT) || c.isHeaded(CENSORED)) && isCoded(c));
    Optional<DataColumn> time = one(table, PatientData::isTime);
    return arm.isPresent() && event.isPresent() && time.isPresent() && !arm.equals(event)
        ? of(time.get(), event.get(), arm.get())
        : Optional.empty();
  }

  private static Optional<DataColumn> one(List<DataColumn> table, Predicate<DataColumn> wanted) {
    List<DataColumn> found = table.stream().filter(wanted).toList();
    return found.size() == 1 ? Optional.of(found.get(0)) : Optional.empty();
  }

  private static boolean isCoded(DataColumn column) {
    return column.holdsOnly(0, 1) || column.holdsOnly(1, 2);
  }

  private static boolean isTime(DataColumn column) {
    return column.isHeaded(TIME)
        && !column.isHeaded(EVENT)
        && column.size() >= LEAST_PATIENTS
        && column.distinct() > 5
        && IntStream.range(0, column.size()).allMatch(i -> column.figures()[i] >= 0);
  }

  private static Optional<PatientData> of(DataColumn time, DataColumn event, DataColumn arm) {
    boolean censoring = event.isHeaded(CENSORED) && !event.isHeaded(EVENT);
    double eventCode = event.holdsOnly(1, 2) ? 2 : censoring ? 0 : 1;
    double lower = arm.numbers().values().stream().mapToDouble(d -> d).min().orElse(0);
    boolean named = !arm.first().isEmpty();
    boolean firstIsControl = !named || CONTROL.matcher(arm.first()).find();
    SurvivalTimes low = times(time, event, eventCode, arm, code -> code == lower);
    SurvivalTimes high = times(time, event, eventCode, arm, code -> code != lower);
    PatientData data =
        new PatientData(
            List.of(time.range(), event.range(), arm.range()),
            firstIsControl ? low : high,
            firstIsControl ? high : low);
    return low.events() + high.events() >= LEAST_EVENTS ? Optional.of(data) : Optional.empty();
  }

  private static SurvivalTimes times(
      DataColumn time, DataColumn event, double eventCode, DataColumn arm, Predicate<Double> own) {
    int[] people =
        IntStream.range(0, time.size())
            .filter(i -> own.test(arm.numbers().values().get(i)))
            .toArray();
    double[] times = new double[people.length];
    boolean[] events = new boolean[people.length];
    for (int i = 0; i < people.length; i++) {
      times[i] = time.figures()[people[i]];
      events[i] = event.numbers().values().get(people[i]) == eventCode;
    }
    return SurvivalTimes.of(times, events);
  }

  /** Cox's regression on the arm, ties by Efron. */
  Optional<CoxFit> fit() {
    return CoxRegression.fit(CoxData.ofArms(control, treated), Ties.EFRON);
  }
}
