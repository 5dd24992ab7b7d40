package weighhouse.generator.fault;

import static weighhouse.generator.model.Basis.ANNUAL_PROBABILITY;
import static weighhouse.generator.model.Basis.ANNUAL_RATE;
import static weighhouse.generator.model.Basis.CYCLE_PROBABILITY;
import static weighhouse.generator.model.Basis.MEDIAN_YEARS;
import static weighhouse.generator.model.Measure.HAZARD_RATIO;
import static weighhouse.generator.model.Measure.LOG_HAZARD_RATIO;
import static weighhouse.generator.model.Measure.ODDS_RATIO;
import static weighhouse.generator.model.Measure.RATE_RATIO;
import static weighhouse.generator.model.Measure.RISK_RATIO;

import java.util.List;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Step;

/** Odds and risk ratios on other scales; ratios applied twice, inverted, added, as logarithms. */
public final class RatioFaults {
  private static final String ODDS = "{R}*{base}/(1-{base}+{R}*{base})";
  private static final Step PER_CYCLE = Step.of("p", "1-(1-{:annual})^{cyc}");
  private static final Step FROM_RATE = Step.of("p", "1-EXP(-{:rate}{xcyc})");

  private RatioFaults() {}

  /** All forms of the family. */
  public static List<EventForm> forms() {
    FormTable table = new FormTable();
    odds(table);
    risks(table);
    twiceOrInverted(table);
    others(table);
    return table.forms();
  }

  private static void odds(FormTable table) {
    table
        .rule("odds-ratio-times-probability")
        .measures(ODDS_RATIO)
        .bases(ANNUAL_PROBABILITY)
        .line("product", Step.of("annual", ODDS, "{base}*{R}"), PER_CYCLE)
        .line("MIN", Step.of("annual", "MIN(1," + ODDS + ")", "MIN(1,{R}*{base})"), PER_CYCLE)
        .line("difference", Step.of("annual", ODDS, "{base}-(1-{R})*{base}"), PER_CYCLE)
        .line("PRODUCT", Step.of("annual", ODDS, "PRODUCT({base},{R})"), PER_CYCLE)
        .rule("odds-ratio-as-hazard-ratio")
        .line("power", Step.of("annual", ODDS, "1-(1-{base})^{R}"), PER_CYCLE)
        .line("POWER", Step.of("annual", ODDS, "1-POWER(1-{base},{R})"), PER_CYCLE)
        .line("logarithm", Step.of("annual", ODDS, "1-EXP({R}*LN(1-{base}))"), PER_CYCLE)
        .line(
            "on the rate",
            Step.of("rate", "-LN(1-{R}*{base}/(1-{base}+{R}*{base}))", "-LN(1-{base})*{R}"),
            FROM_RATE);
  }

  private static void risks(FormTable table) {
    String right = "{base}*LN(1-{R}*(1-EXP(-{base})))/LN(1-(1-EXP(-{base})))";
    table
        .rule("risk-ratio-on-rate")
        .measures(RISK_RATIO)
        .bases(ANNUAL_RATE)
        .line("product", Step.of("rate", "-LN(1-{R}*(1-EXP(-{base})))", "{base}*{R}"), FROM_RATE)
        .line("ratio first", Step.of("rate", right, "{R}*{base}"), FROM_RATE)
        .line("PRODUCT", Step.of("rate", right, "PRODUCT({base},{R})"), FROM_RATE)
        .line("inside EXP", "1-(1-{R}*(1-EXP(-{base})))^{cyc}", "1-EXP(-{base}*{R}{xcyc})")
        .rule("risk-ratio-over-wrong-horizon", Trait.SHORT_CYCLE)
        .bases(ANNUAL_PROBABILITY)
        .line("product", "1-(1-{R}*(1-(1-{p0})^{inv}))^{cyc}", "{p0}*{R}")
        .line("ratio first", "1-(1-{R}*{base})^{cyc}", "{R}*{p0}")
        .line("PRODUCT", "1-(1-{R}*{base})^{cyc}", "PRODUCT({p0},{R})")
        .line("difference", "1-(1-{base}*{R})^{cyc}", "{p0}-{p0}*(1-{R})");
  }

  private static void twiceOrInverted(FormTable table) {
    Step rate = Step.of("rate", "{base}*{R}");
    table
        .rule("ratio-applied-twice")
        .measures(HAZARD_RATIO, RATE_RATIO)
        .bases(ANNUAL_RATE)
        .line("on rate and probability", rate, twice("1-(1-(1-EXP(-{:rate}{xcyc})))^{R}"))
        .line("on rate and inside EXP", rate, twice("1-EXP(-{:rate}*{R}{xcyc})"))
        .line("on rate and exponent", rate, twice("1-EXP(-{:rate}{xcyc})^{R}"))
        .bases(ANNUAL_PROBABILITY, CYCLE_PROBABILITY)
        .line(
            "two powers",
            Step.of("adj", "1-(1-{p0})^{R}"),
            Step.of("p", "{:adj}", "1-(1-{:adj})^{R}"))
        .line("square", "1-(1-{p0})^{R}", "1-(1-{p0})^({R}*{R})")
        .rule("ratio-inverted")
        .measures(HAZARD_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY, CYCLE_PROBABILITY)
        .line("reciprocal power", "1-(1-{p0})^{R}", "1-(1-{p0})^(1/{R})")
        .line("POWER", "1-POWER(1-{p0},{R})", "1-POWER(1-{p0},1/{R})")
        .line("divided logarithm", "1-EXP(LN(1-{p0})*{R})", "1-EXP(LN(1-{p0})/{R})")
        .bases(ANNUAL_RATE)
        .line("rate divided", Step.of("rate", "{base}*{R}", "{base}/{R}"), FROM_RATE)
        .rule("ratio-on-wrong-arm", Trait.SWAPS_ARMS)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY)
        .line("columns swapped", Step.of("p", "1-(1-{p0})^{R}"))
        .line("columns swapped, logarithm", Step.of("p", "1-EXP({R}*LN(1-{p0}))"));
  }

  private static Step twice(String wrong) {
    return Step.of("p", "1-EXP(-{:rate}{xcyc})", wrong);
  }

  private static void others(FormTable table) {
    table
        .rule("log-ratio-not-exponentiated")
        .measures(LOG_HAZARD_RATIO)
        .bases(ANNUAL_RATE)
        .line("coefficient times rate", Step.of("rate", "{base}*EXP({R})", "{base}*{R}"), FROM_RATE)
        .line("inside EXP", "1-EXP(-{base}*EXP({R}){xcyc})", "1-EXP(-{base}*{R}{xcyc})")
        .bases(ANNUAL_PROBABILITY, CYCLE_PROBABILITY)
        .line("power", "1-(1-{p0})^EXP({R})", "1-(1-{p0})^{R}")
        .line("product", "1-(1-{p0})^EXP({R})", "{p0}*{R}")
        .rule("ratios-added", Trait.SECOND_RATIO)
        .measures(HAZARD_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY)
        .line("minus one", combined("{R}*{R2}", "{R}+{R2}-1"), Step.of("p", "1-(1-{p0})^{:comb}"))
        .line(
            "reductions added",
            combined("{R}*{R2}", "1-((1-{R})+(1-{R2}))"),
            Step.of("p", "1-(1-{p0})^{:comb}"))
        .line("in the power", "1-(1-{p0})^({R}*{R2})", "1-(1-{p0})^({R}+{R2}-1)")
        .line("SUM", "1-(1-{p0})^PRODUCT({R},{R2})", "1-(1-{p0})^(SUM({R},{R2})-1)")
        .rule("hazard-ratio-times-survival-time")
        .measures(HAZARD_RATIO)
        .bases(MEDIAN_YEARS)
        .line("product", median("{base}/{R}", "{base}*{R}"), FROM_MEDIAN)
        .line("ratio first", median("{base}/{R}", "{R}*{base}"), FROM_MEDIAN)
        .line("PRODUCT", median("{base}/{R}", "PRODUCT({base},{R})"), FROM_MEDIAN)
        .line("inside", "1-EXP(-LN(2)/({base}/{R}){xcyc})", "1-EXP(-LN(2)/({base}*{R}){xcyc})");
  }

  private static final Step FROM_MEDIAN = Step.of("p", "1-EXP(-LN(2)/{:median}{xcyc})");

  private static Step median(String right, String wrong) {
    return Step.of("median", right, wrong);
  }

  private static Step combined(String right, String wrong) {
    return Step.of("comb", right, wrong);
  }
}
