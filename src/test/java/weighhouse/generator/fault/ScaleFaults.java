package weighhouse.generator.fault;

import static weighhouse.generator.model.Basis.ANNUAL_PROBABILITY;
import static weighhouse.generator.model.Basis.ANNUAL_RATE;
import static weighhouse.generator.model.Basis.CYCLE_PROBABILITY;
import static weighhouse.generator.model.Basis.FIVE_YEAR_PROBABILITY;
import static weighhouse.generator.model.Basis.LIFE_TABLE;
import static weighhouse.generator.model.Basis.RATE_PER_1000;
import static weighhouse.generator.model.Measure.HAZARD_RATIO;
import static weighhouse.generator.model.Measure.INVERSE_HAZARD_RATIO;
import static weighhouse.generator.model.Measure.MORTALITY_RATIO;
import static weighhouse.generator.model.Measure.RATE_RATIO;

import java.util.List;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.EventForm.Trait;
import weighhouse.generator.model.Step;

/** Hazard, rate and mortality ratios on the wrong scale. */
public final class ScaleFaults {
  private static final String RIGHT = "1-(1-{p0})^{R}";

  private ScaleFaults() {}

  /** All forms of the family. */
  public static List<EventForm> forms() {
    FormTable table = new FormTable();
    product(table);
    mortality(table);
    others(table);
    return table.forms();
  }

  private static void product(FormTable table) {
    table
        .rule("hazard-ratio-times-probability")
        .measures(HAZARD_RATIO, RATE_RATIO)
        .bases(
            ANNUAL_RATE,
            RATE_PER_1000,
            ANNUAL_PROBABILITY,
            FIVE_YEAR_PROBABILITY,
            CYCLE_PROBABILITY)
        .line("product", RIGHT, "{p0}*{R}")
        .line("product, ratio first", "1-(1-{p0})^({R})", "{R}*{p0}")
        .line("difference", "1-EXP({R}*LN(1-{p0}))", "{p0}-{p0}*(1-{R})")
        .line("percent", RIGHT, "({p0}*100)%*{R}")
        .line("PRODUCT", "1-POWER(1-{p0},{R})", "PRODUCT({p0},{R})")
        .line("IF", "IF({R}>0,1-(1-{p0})^{R},{p0})", "IF({R}>0,{p0}*{R},{p0})")
        .line("CHOOSE", "1-(1-{p0})^CHOOSE(1,{R},1)", "{p0}*CHOOSE(1,{R},1)")
        .line("IFERROR", "IFERROR(1-(1-{p0})^{R},0)", "IFERROR({p0}*{R},0)")
        .line("ROUND", "ROUND(1-(1-{p0})^{R},8)", "ROUND({p0}*{R},8)")
        .line("MIN", "MIN(1,1-(1-{p0})^{R})", "MIN(1,{p0}*{R})")
        .line("POWER", "1-POWER((1-{p0}),{R})", "{p0}*POWER({R},1)")
        .line("logarithms", "1-EXP(LN(1-{p0})*{R})", "EXP(LN({p0})+LN({R}))")
        .line("SUMPRODUCT", RIGHT, "SUMPRODUCT({p0},{R})")
        .line("division by the reciprocal", RIGHT, "{p0}/(1/{R})")
        .line("LET", RIGHT, "_xlfn.LET(_xlpm.p,{p0},_xlpm.p*{R})")
        .line(
            "helper: reduction",
            Step.of("red", "1-{R}"),
            Step.of("p", "1-(1-{p0})^(1-{:red})", "{p0}*(1-{:red})"))
        .line(
            "helper: cases avoided",
            Step.of("avoided", "{p0}-(1-(1-{p0})^{R})", "{p0}*(1-{R})"),
            Step.of("p", "{p0}-{:avoided}"))
        .line(
            "helper: copy",
            Step.of("copy", "{R}"),
            Step.of("p", "1-(1-{p0})^{:copy}", "{p0}*{:copy}"));
  }

  private static void mortality(FormTable table) {
    table
        .rule("mortality-ratio-times-probability", Trait.DEATH)
        .measures(MORTALITY_RATIO)
        .bases(ANNUAL_PROBABILITY, CYCLE_PROBABILITY, LIFE_TABLE)
        .line("product", RIGHT, "{p0}*{R}")
        .line("MIN", "MIN(1,1-(1-{p0})^{R})", "MIN(1,{R}*{p0})")
        .line("added excess", "1-EXP({R}*LN(1-{p0}))", "{p0}+{p0}*({R}-1)")
        .line("IF", "IF({p0}<1,1-(1-{p0})^{R},1)", "IF({p0}<1,{p0}*{R},1)")
        .line("PRODUCT", "1-POWER(1-{p0},{R})", "PRODUCT({R},{p0})");
  }

  private static void others(FormTable table) {
    table
        .rule("hazard-ratio-divides-probability")
        .measures(INVERSE_HAZARD_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY, CYCLE_PROBABILITY)
        .line("quotient", "1-(1-{p0})^(1/{R})", "{p0}/{R}")
        .line("product with the reciprocal", "1-(1-{p0})^(1/{R})", "{p0}*(1/{R})")
        .line("negative power", "1-(1-{p0})^({R}^-1)", "{p0}*{R}^-1")
        .line("IF", "IF({R}=0,0,1-(1-{p0})^(1/{R}))", "IF({R}=0,0,{p0}/{R})")
        .rule("ratio-times-complement")
        .measures(HAZARD_RATIO, RATE_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY)
        .line("stay", stay("(1-{p0})^{R}", "(1-{p0})*{R}"), Step.of("p", "1-{:stay}"))
        .line("stay, ratio first", stay("(1-{p0})^{R}", "{R}*(1-{p0})"), Step.of("p", "1-{:stay}"))
        .line("one minus", "1-(1-{p0})^{R}", "1-(1-{p0})*{R}")
        .line("one minus, PRODUCT", "1-POWER(1-{p0},{R})", "1-PRODUCT(1-{p0},{R})")
        .rule("hazard-ratio-on-odds")
        .measures(HAZARD_RATIO)
        .bases(ANNUAL_RATE, ANNUAL_PROBABILITY, CYCLE_PROBABILITY)
        .line("closed form", RIGHT, "{p0}*{R}/(1-{p0}+{R}*{p0})")
        .line("through odds", RIGHT, "({R}*{p0}/(1-{p0}))/(1+{R}*{p0}/(1-{p0}))")
        .line("complement of odds", RIGHT, "1-1/(1+{R}*{p0}/(1-{p0}))")
        .line(
            "helper: odds",
            Step.of("odds", "{p0}/(1-{p0})"),
            Step.of("p", "1-(1+{:odds})^(-{R})", "{:odds}*{R}/(1+{:odds}*{R})"));
  }

  private static Step stay(String right, String wrong) {
    return Step.of("stay", right, wrong);
  }
}
