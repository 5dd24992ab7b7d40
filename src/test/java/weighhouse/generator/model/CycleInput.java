package weighhouse.generator.model;

/** How the workbook holds its cycle length. */
public enum CycleInput {
  /** A cell with its length in years. */
  YEARS("{cycle}", "*{cycle}", "(1/{cycle})", "/{cycle}"),
  /** A cell with the number of cycles in a year. */
  PER_YEAR("(1/{cycle})", "/{cycle}", "{cycle}", "*{cycle}"),
  /** A cell with its length in months. */
  MONTHS("({cycle}/12)", "*{cycle}/12", "(12/{cycle})", "*12/{cycle}"),
  /** Only numbers in formulas. */
  ABSENT("(1/{perYear})", "/{perYear}", "{perYear}", "*{perYear}");

  private final String inYears;
  private final String times;
  private final String perYear;
  private final String timesPerYear;

  CycleInput(String inYears, String times, String perYear, String timesPerYear) {
    this.inYears = inYears;
    this.times = times;
    this.perYear = perYear;
    this.timesPerYear = timesPerYear;
  }

  /** Fills in the cycle's places of a template. */
  public String fill(String template, CycleUnit unit) {
    return template
        .replace("{xcyc}", times)
        .replace("{cyc}", inYears)
        .replace("{xinv}", timesPerYear)
        .replace("{inv}", perYear)
        .replace("{perYear}", unit.perYearText());
  }
}
