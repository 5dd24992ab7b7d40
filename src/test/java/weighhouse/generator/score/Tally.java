package weighhouse.generator.score;

/** Counts of one group of cases. */
public final class Tally {
  private int seeded;
  private int found;
  private int matched;
  private int falseAlarms;
  private int valuesCompared;
  private int valuesRight;

  void seeded(boolean wasFound) {
    seeded++;
    found += wasFound ? 1 : 0;
  }

  void finding(boolean matches) {
    matched += matches ? 1 : 0;
    falseAlarms += matches ? 0 : 1;
  }

  void value(boolean right) {
    valuesCompared++;
    valuesRight += right ? 1 : 0;
  }

  /** Share of seeded faults that were found; one where none was seeded. */
  public double recall() {
    return seeded == 0 ? 1 : (double) found / seeded;
  }

  /** Share of findings that match a seeded fault; one where nothing was found. */
  public double precision() {
    return matched + falseAlarms == 0 ? 1 : (double) matched / (matched + falseAlarms);
  }

  /** Share of compared right values that agree with the twin; one where none was compared. */
  public double valuesRight() {
    return valuesCompared == 0 ? 1 : (double) valuesRight / valuesCompared;
  }

  /** Faults seeded. */
  public int seeded() {
    return seeded;
  }

  /** Findings that match no seeded fault. */
  public int falseAlarms() {
    return falseAlarms;
  }

  @Override
  public String toString() {
    return "%5d seeded  recall %.3f  precision %.3f (%d false)  values %.3f of %d"
        .formatted(seeded, recall(), precision(), falseAlarms, valuesRight(), valuesCompared);
  }
}
