package weighhouse.effect.survival;

import java.util.Arrays;

/** The function of time along which a test of proportional hazards looks for a trend. */
public enum TimeTransform {
  IDENTITY {
    @Override
    double[] of(double[] eventTimes, SurvivalTimes people) {
      return eventTimes.clone();
    }
  },
  /** Natural logarithm; needs times above 0. */
  LOG {
    @Override
    double[] of(double[] eventTimes, SurvivalTimes people) {
      return Arrays.stream(eventTimes).map(Math::log).toArray();
    }
  },
  /** Rank among all people's times, the mean rank for ties. */
  RANK {
    @Override
    double[] of(double[] eventTimes, SurvivalTimes people) {
      return Arrays.stream(eventTimes).map(time -> rank(time, people)).toArray();
    }

    private double rank(double time, SurvivalTimes people) {
      int notBelow = people.atRisk(time);
      int above = people.atRisk(Math.nextUp(time));
      int below = people.size() - notBelow;
      return below + (notBelow - above + 1) / 2.0;
    }
  },
  /** One less the Kaplan-Meier survival just before. */
  KAPLAN_MEIER {
    @Override
    double[] of(double[] eventTimes, SurvivalTimes people) {
      KaplanMeier curve = KaplanMeier.of(people);
      return Arrays.stream(eventTimes).map(time -> 1 - curve.survivalBefore(time)).toArray();
    }
  };

  abstract double[] of(double[] eventTimes, SurvivalTimes people);
}
