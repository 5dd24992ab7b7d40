package weighhouse.generator.fault;

import static weighhouse.generator.model.Basis.ANNUAL_PROBABILITY;
import static weighhouse.generator.model.Basis.ANNUAL_RATE;
import static weighhouse.generator.model.Basis.MONTHLY_PROBABILITY;
import static weighhouse.generator.model.Basis.RATE_PER_1000;
import static weighhouse.generator.model.Basis.WEIBULL_HAZARD;
import static weighhouse.generator.model.Measure.HAZARD_RATIO;

import java.util.List;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Step;

/** Conversions between rates and probabilities, and between lengths of time. */
public final class CycleFaults {
  private static final String FROM_PROBABILITY = "1-(1-{base})^{cyc}";
  private static final String FROM_RATE = "1-EXP(-{base}{xcyc})";
  private static final String EFFECT = "1-(1-{p0})^{R}";

  private CycleFaults() {}

  /** All forms of the family. */
  public static List<EventForm> forms() {
    FormTable table = new FormTable();
    table.measures(HAZARD_RATIO);
    shortened(table);
    rates(table);
    malformed(table);
    alongCycles(table);
    return table.forms();
  }

  private static FormTable on(FormTable table, String rule, Trait... traits) {
    return table.rule(rule, traits).effect(EFFECT);
  }

  private static Step p0(String right, String wrong) {
    return Step.of("p0", right, wrong);
  }

  private static void shortened(FormTable table) {
    on(table, "probability-divided-by-cycles", Trait.SHORT_CYCLE)
        .bases(ANNUAL_PROBABILITY)
        .before("by the cycle", p0(FROM_PROBABILITY, "{base}{xcyc}"))
        .before("PRODUCT", p0("1-POWER(1-{base},{cyc})", "PRODUCT({base},{cyc})"))
        .before("quotient", p0(FROM_PROBABILITY, "{base}/{inv}"))
        .before("typed number", p0("1-(1-{base})^(1/{perYear})", "{base}/{perYear}"))
        .before("ROUND", p0("ROUND(1-(1-{base})^{cyc},8)", "ROUND({base}{xcyc},8)"))
        .before(
            "helper: share of a year",
            Step.of("share", "{cyc}"),
            p0("1-(1-{base})^{:share}", "{base}*{:share}"));
    on(table, "probability-multiplied-by-time", Trait.YEAR_CYCLE)
        .bases(MONTHLY_PROBABILITY)
        .before("twelve", p0("1-(1-{base})^12", "{base}*12"))
        .before("twelve first", p0("1-(1-{base})^12", "12*{base}"))
        .before("MIN", p0("MIN(1,1-(1-{base})^12)", "MIN(1,12*{base})"))
        .before("quotient", p0("1-(1-{base})^(1/(1/12))", "{base}/(1/12)"))
        .before("SUM", p0("1-POWER(1-{base},12)", "SUM({base},11*{base})"));
    on(table, "period-not-rescaled", Trait.SHORT_CYCLE)
        .bases(ANNUAL_PROBABILITY)
        .before("copied", p0(FROM_PROBABILITY, "{base}"))
        .before("IF", p0("IF({base}>0,1-(1-{base})^{cyc},0)", "IF({base}>0,{base},0)"))
        .bases(ANNUAL_RATE)
        .before("rate of a year", p0(FROM_RATE, "1-EXP(-{base})"))
        .before("rate of a year, power", p0(FROM_RATE, "1-EXP(1)^(-{base})"));
    on(table, "rescaling-inverted", Trait.SHORT_CYCLE)
        .bases(ANNUAL_PROBABILITY)
        .before("power", p0(FROM_PROBABILITY, "1-(1-{base})^{inv}"))
        .before("POWER", p0("1-POWER(1-{base},{cyc})", "1-POWER(1-{base},{inv})"))
        .bases(ANNUAL_RATE)
        .before("rate", Step.of("rc", "{base}{xcyc}", "{base}{xinv}"), p0("1-EXP(-{:rc})", null))
        .before("inside EXP", p0(FROM_RATE, "1-EXP(-{base}{xinv})"));
  }

  private static void rates(FormTable table) {
    on(table, "rate-used-as-probability")
        .bases(ANNUAL_RATE)
        .before("times the cycle", p0(FROM_RATE, "{base}{xcyc}"))
        .before("MIN", p0("MIN(1,1-EXP(-{base}{xcyc}))", "MIN(1,{base}{xcyc})"))
        .before("PRODUCT", p0("1-EXP(-PRODUCT({base},{cyc}))", "PRODUCT({base},{cyc})"))
        .bases(RATE_PER_1000)
        .before("per 1000", p0("1-EXP(-{base}/1000{xcyc})", "{base}/1000{xcyc}"));
    on(table, "probability-converted-as-rate")
        .bases(ANNUAL_PROBABILITY)
        .before("EXP", p0(FROM_PROBABILITY, "1-EXP(-{base}{xcyc})"))
        .before("EXP, bracket", p0("1-POWER(1-{base},{cyc})", "1-EXP(-({base}*{cyc}))"))
        .before("power of e", p0(FROM_PROBABILITY, "1-EXP(1)^(-{base}{xcyc})"))
        .before("IFERROR", p0("IFERROR(1-(1-{base})^{cyc},0)", "IFERROR(1-EXP(-{base}{xcyc}),0)"));
    on(table, "cycle-length-inconsistent", Trait.YEAR_CYCLE, Trait.CYCLE_IN_CELL)
        .bases(ANNUAL_RATE)
        .before("factor missing", p0(FROM_RATE, "1-EXP(-{base})"))
        .before("factor missing, power", p0(FROM_RATE, "1-1/EXP({base})"))
        .bases(ANNUAL_PROBABILITY)
        .before("exponent missing", p0(FROM_PROBABILITY, "{base}"));
  }

  private static void malformed(FormTable table) {
    Step fromRate = p0("1-EXP(-{:rc})", null);
    on(table, "conversion-malformed")
        .bases(ANNUAL_PROBABILITY)
        .before("LOG10", Step.of("rc", "-LN(1-{base}){xcyc}", "-LOG10(1-{base}){xcyc}"), fromRate)
        .before("LOG", Step.of("rc", "-LN(1-{base}){xcyc}", "-LOG(1-{base}){xcyc}"), fromRate)
        .before("LN of p", Step.of("rc", "-LN(1-{base}){xcyc}", "-LN({base}){xcyc}"), fromRate)
        .bases(ANNUAL_RATE)
        .before("EXP minus one", p0(FROM_RATE, "EXP({base}{xcyc})-1"))
        .before("minus missing", p0(FROM_RATE, "-(1-EXP({base}{xcyc}))"));
  }

  private static void alongCycles(FormTable table) {
    String right = WEIBULL_HAZARD.usual();
    Step survival = Step.of("surv0", "EXP(-{lambda}*{t0}^{gamma})");
    Step next = Step.of("surv1", "EXP(-{lambda}*{t}^{gamma})");
    on(table, "hazard-not-integrated")
        .bases(WEIBULL_HAZARD)
        .before("hazard at the end", p0(right, "{lambda}*{gamma}*{t}^({gamma}-1){xcyc}"))
        .before("hazard times the step", p0(right, "({t}-{t0})*{gamma}*{lambda}*{t}^({gamma}-1)"))
        .before("cumulative hazard", p0(right, "{lambda}*{t}^{gamma}"))
        .before(
            "helper: hazard",
            Step.of("haz", "{lambda}*{gamma}*{t}^({gamma}-1)"),
            p0("1-EXP({lambda}*({t0}^{gamma}-{t}^{gamma}))", "{:haz}{xcyc}"));
    on(table, "survival-drop-used-as-probability")
        .before("difference", survival, next, p0("1-{:surv1}/{:surv0}", "{:surv0}-{:surv1}"))
        .before("minus first", survival, next, p0("1-{:surv1}/{:surv0}", "-{:surv1}+{:surv0}"))
        .before(
            "in one formula", p0(right, "EXP(-{lambda}*{t0}^{gamma})-EXP(-{lambda}*{t}^{gamma})"));
  }
}
