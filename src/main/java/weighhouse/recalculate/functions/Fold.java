package weighhouse.recalculate.functions;

/** Folds that skip blanks, text and truth values in ranges; of no number at all they give 0. */
public enum Fold {
  SUM(0) {
    @Override
    public double step(double folded, double number) {
      return folded + number;
    }
  },
  PRODUCT(1) {
    @Override
    public double step(double folded, double number) {
      return folded * number;
    }
  },
  MIN(Double.POSITIVE_INFINITY) {
    @Override
    public double step(double folded, double number) {
      return Math.min(folded, number);
    }
  },
  MAX(Double.NEGATIVE_INFINITY) {
    @Override
    public double step(double folded, double number) {
      return Math.max(folded, number);
    }
  },
  SUMSQ(0) {
    @Override
    public double step(double folded, double number) {
      return folded + number * number;
    }
  };

  private final double start;

  Fold(double start) {
    this.start = start;
  }

  public double start() {
    return start;
  }

  public abstract double step(double folded, double number);
}
