package weighhouse.generator.model;

/** Cycle lengths. */
public enum CycleUnit {
  WEEK(7 / 365.25, "7/365.25", "52"),
  FOUR_WEEKS(28 / 365.25, "28/365.25", "13"),
  MONTH(1 / 12.0, "1/12", "12"),
  QUARTER(0.25, "0.25", "4"),
  HALF_YEAR(0.5, "0.5", "2"),
  YEAR(1, "1", "1");

  private final double years;
  private final String yearsText;
  private final String perYearText;

  CycleUnit(double years, String yearsText, String perYearText) {
    this.years = years;
    this.yearsText = yearsText;
    this.perYearText = perYearText;
  }

  /** Length in years. */
  public double years() {
    return years;
  }

  /** Length in years as modellers type it. */
  public String yearsText() {
    return yearsText;
  }

  /** Cycles in a year as modellers type it. */
  public String perYearText() {
    return perYearText;
  }
}
