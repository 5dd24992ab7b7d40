package weighhouse.effect;

/** How a printed figure stands for a ratio. */
public enum Form {
  /** The figure is the ratio. */
  RATIO {
    @Override
    public double toRatio(double figure) {
      return figure;
    }

    @Override
    public double ofRatio(double ratio) {
      return ratio;
    }
  },
  /** One minus the ratio: 0.3 for a ratio of 0.7. */
  REDUCTION {
    @Override
    public double toRatio(double figure) {
      return 1 - figure;
    }

    @Override
    public double ofRatio(double ratio) {
      return 1 - ratio;
    }
  },
  /** Natural logarithm of the ratio, as a regression coefficient is. */
  LOG {
    @Override
    public double toRatio(double figure) {
      return Math.exp(figure);
    }

    @Override
    public double ofRatio(double ratio) {
      return Math.log(ratio);
    }
  };

  /** The ratio that a figure stands for; negative for a reduction above 1. */
  public abstract double toRatio(double figure);

  /** The figure that stands for a ratio; a logarithm needs a ratio above 0. */
  public abstract double ofRatio(double ratio);

  /** The figure that means no effect: 1 for a ratio, 0 otherwise. */
  public double neutral() {
    return ofRatio(1);
  }
}
