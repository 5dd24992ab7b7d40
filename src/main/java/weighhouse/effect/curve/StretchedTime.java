package weighhouse.effect.curve;

import java.util.Optional;

/**
 * A curve with time stretched by a time ratio: {@code S(t / ratio)}.
 *
 * @param base the curve without the effect
 * @param ratio time ratio, above 0
 */
public record StretchedTime(Curve base, double ratio) implements Curve {
  public StretchedTime {
    Parameters.requirePositive("time ratio", ratio);
  }

  @Override
  public double survival(double time) {
    return base.survival(time / ratio);
  }

  @Override
  public double cumulativeHazard(double time) {
    return base.cumulativeHazard(time / ratio);
  }

  @Override
  public double hazard(double time) {
    return base.hazard(time / ratio) / ratio;
  }

  @Override
  public Optional<Curve> withHazardRatio(double hazardRatio) {
    return base.withHazardRatio(hazardRatio).map(curve -> new StretchedTime(curve, ratio));
  }
}
