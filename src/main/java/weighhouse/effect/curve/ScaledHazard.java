package weighhouse.effect.curve;

import java.util.Optional;

/**
 * A curve with every hazard multiplied, for families that hold no such parameter: {@code
 * S(t)^ratio}.
 *
 * @param base the curve without the effect
 * @param ratio hazard ratio, above 0
 */
public record ScaledHazard(Curve base, double ratio) implements Curve {
  public ScaledHazard {
    Parameters.requirePositive("hazard ratio", ratio);
  }

  @Override
  public double cumulativeHazard(double time) {
    return ratio * base.cumulativeHazard(time);
  }

  @Override
  public double hazard(double time) {
    return ratio * base.hazard(time);
  }

  @Override
  public Optional<Curve> withHazardRatio(double further) {
    return Optional.of(new ScaledHazard(base, ratio * further));
  }
}
