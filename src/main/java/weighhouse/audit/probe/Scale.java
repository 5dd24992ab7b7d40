package weighhouse.audit.probe;

import weighhouse.audit.ActsOn;

/**
 * A scale on which a ratio can act on a probability: the transform that turns "multiplied by R" on
 * that scale into a plain product.
 */
enum Scale {
  HAZARD(ActsOn.HAZARD) {
    @Override
    double of(double probability) {
      return -Math.log1p(-probability);
    }
  },
  RISK(ActsOn.RISK) {
    @Override
    double of(double probability) {
      return probability;
    }
  },
  ODDS(ActsOn.ODDS) {
    @Override
    double of(double probability) {
      return probability / (1 - probability);
    }
  },
  COMPLEMENT(ActsOn.COMPLEMENT) {
    @Override
    double of(double probability) {
      return 1 - probability;
    }
  };

  private final ActsOn actsOn;

  Scale(ActsOn actsOn) {
    this.actsOn = actsOn;
  }

  /** The probability on this scale. */
  abstract double of(double probability);

  ActsOn actsOn() {
    return actsOn;
  }

  /** The ratio that turns the probability {@code without} into {@code with} on this scale. */
  double ratio(double with, double without) {
    return of(with) / of(without);
  }
}
