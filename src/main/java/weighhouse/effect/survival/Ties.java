package weighhouse.effect.survival;

/**
 * How events at one time share the people at risk in the partial likelihood.
 *
 * <p>Source: therneau-grambsch-2000.
 */
public enum Ties {
  /** Every tied event meets all people at risk. */
  BRESLOW {
    @Override
    double share(int event, int events) {
      return 0;
    }
  },
  /** Tied events leave the people at risk by equal parts, one after the other. */
  EFRON {
    @Override
    double share(int event, int events) {
      return (double) event / events;
    }
  };

  /** The part of the tied events' own weight that is no longer at risk for one of them. */
  abstract double share(int event, int events);
}
