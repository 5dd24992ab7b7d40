package weighhouse.quantity;

/** Units of time in models; {@link #CYCLE} is the model's own. */
public enum TimeUnit {
  DAY(1 / 365.25),
  WEEK(7 / 365.25),
  MONTH(1 / 12.0),
  QUARTER(0.25),
  YEAR(1),
  CYCLE(Double.NaN);

  private final double years;

  TimeUnit(double years) {
    this.years = years;
  }

  /** Length in years; NaN of a cycle, whose length only the model tells. */
  public double years() {
    return years;
  }
}
