package weighhouse.generator.fault;

import static weighhouse.generator.model.Basis.ANNUAL_PROBABILITY;
import static weighhouse.generator.model.Basis.ANNUAL_RATE;
import static weighhouse.generator.model.Basis.CYCLE_PROBABILITY;
import static weighhouse.generator.model.Basis.FIVE_YEAR_PROBABILITY;
import static weighhouse.generator.model.Basis.LIFE_TABLE;
import static weighhouse.generator.model.Basis.MEDIAN_YEARS;
import static weighhouse.generator.model.Basis.RATE_PER_1000;
import static weighhouse.generator.model.Basis.WEIBULL_HAZARD;
import static weighhouse.generator.model.Measure.HAZARD_RATIO;
import static weighhouse.generator.model.Measure.HAZARD_REDUCTION;
import static weighhouse.generator.model.Measure.LOG_HAZARD_RATIO;
import static weighhouse.generator.model.Measure.MORTALITY_RATIO;
import static weighhouse.generator.model.Measure.ODDS_RATIO;
import static weighhouse.generator.model.Measure.RATE_RATIO;
import static weighhouse.generator.model.Measure.RISK_RATIO;

import java.util.List;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Step;

/** Events calculated rightly, in the several ways that modellers write. */
public final class RightForms {
  private static final Step FROM_RATE = Step.of("p", "1-EXP(-{:rate}{xcyc})");
  private static final Step FROM_ANNUAL = Step.of("p", "1-(1-{:annual})^{cyc}");

  private RightForms() {}

  /** All right forms. */
  public static List<EventForm> forms() {
    FormTable table = new FormTable().rule(null);
    hazards(table);
    table
        .measures(RISK_RATIO)
        .bases(ANNUAL_PROBABILITY)
        .line("risk ratio on its risk", Step.of("annual", "{base}*{R}"), FROM_ANNUAL)
        .measures(ODDS_RATIO)
        .line(
            "odds ratio on its odds",
            Step.of("annual", "{R}*{base}/(1-{base}+{R}*{base})"),
            FROM_ANNUAL)
        .noMeasure()
        .bases(ANNUAL_RATE, RATE_PER_1000, ANNUAL_PROBABILITY, CYCLE_PROBABILITY, MEDIAN_YEARS)
        .line("no effect")
        .rule(null, Trait.DEATH)
        .bases(LIFE_TABLE)
        .line("life table")
        .measures(MORTALITY_RATIO)
        .bases(ANNUAL_PROBABILITY, LIFE_TABLE)
        .line("mortality ratio", "1-(1-{p0})^{R}", null);
    return table.forms();
  }

  private static void hazards(FormTable table) {
    table
        .measures(HAZARD_RATIO, RATE_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY, FIVE_YEAR_PROBABILITY, CYCLE_PROBABILITY)
        .line("power", "1-(1-{p0})^{R}", null)
        .line("logarithm", "1-EXP({R}*LN(1-{p0}))", null)
        .bases(ANNUAL_RATE)
        .line("rate", Step.of("rate", "{base}*{R}"), FROM_RATE)
        .line("inside EXP", "1-EXP(-{base}*{R}{xcyc})", null)
        .measures(HAZARD_RATIO)
        .bases(WEIBULL_HAZARD)
        .line("negative bracket", "1-EXP({lambda}*{R}*({t0}^{gamma}-{t}^{gamma}))", null)
        .measures(HAZARD_REDUCTION)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY)
        .line("reduction", "1-(1-{p0})^(1-{R})", null)
        .measures(LOG_HAZARD_RATIO)
        .line("coefficient", "1-(1-{p0})^EXP({R})", null);
  }
}
