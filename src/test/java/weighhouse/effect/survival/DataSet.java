package weighhouse.effect.survival;

import java.util.List;
import java.util.stream.IntStream;
import weighhouse.support.Reference;

/** A public data set among the test resources: columns time, event, arm. */
record DataSet(SurvivalTimes control, SurvivalTimes treated) {

  static DataSet read(String name) {
    List<Reference.Row> rows = Reference.rows("data/" + name + ".csv");
    return new DataSet(times(ofArm(rows, 0)), times(ofArm(rows, 1)));
  }

  /** A data set with covariates. */
  static CoxData covariates(String name, List<String> names) {
    List<Reference.Row> rows = Reference.rows("data/" + name + ".csv");
    double[][] covariates =
        rows.stream()
            .map(row -> names.stream().mapToDouble(row::number).toArray())
            .toArray(double[][]::new);
    return CoxData.of(times(rows), covariates);
  }

  SurvivalTimes arm(int number) {
    return number == 0 ? control : treated;
  }

  CoxData coxData() {
    return CoxData.ofArms(control, treated);
  }

  CoxFit cox(Ties ties) {
    return CoxRegression.fit(coxData(), ties).orElseThrow();
  }

  private static List<Reference.Row> ofArm(List<Reference.Row> rows, int arm) {
    return rows.stream().filter(row -> row.integer("arm") == arm).toList();
  }

  private static SurvivalTimes times(List<Reference.Row> rows) {
    return times(Reference.column(rows, "time"), Reference.column(rows, "event"));
  }

  static SurvivalTimes times(double[] times, double[] events) {
    boolean[] had = new boolean[events.length];
    IntStream.range(0, events.length).forEach(i -> had[i] = events[i] == 1);
    return SurvivalTimes.of(times, had);
  }
}
