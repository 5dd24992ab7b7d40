package weighhouse.generator.fault;

import static weighhouse.generator.model.Basis.EXPONENTIAL;
import static weighhouse.generator.model.Basis.GOMPERTZ;
import static weighhouse.generator.model.Basis.LOG_LOGISTIC;
import static weighhouse.generator.model.Basis.LOG_NORMAL;
import static weighhouse.generator.model.Basis.WEIBULL_RATE;
import static weighhouse.generator.model.Basis.WEIBULL_SCALE;
import static weighhouse.generator.model.Measure.HAZARD_RATIO;

import java.util.List;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.Step;

/** Hazard ratios on survival curves. */
public final class CurveFaults {
  private static final String POWER = "{S0}^{R}";

  private CurveFaults() {}

  /** Right forms of a curve with a hazard ratio. */
  public static List<EventForm> right() {
    return new FormTable()
        .rule(null)
        .measures(HAZARD_RATIO)
        .bases(WEIBULL_RATE, WEIBULL_SCALE, EXPONENTIAL, GOMPERTZ)
        .line("power", s(POWER, null))
        .line("logarithm", s("EXP({R}*LN({S0}))", null))
        .bases(WEIBULL_RATE)
        .line("rate", s("EXP(-{lambda}*{R}*{t}^{gamma})", null))
        .bases(EXPONENTIAL)
        .line("rate", s("EXP(-{lambda}*{R}*{t})", null))
        .noMeasure()
        .bases(LOG_NORMAL, LOG_LOGISTIC)
        .line("no effect")
        .forms();
  }

  /** All forms of the family. */
  public static List<EventForm> forms() {
    FormTable table = new FormTable().measures(HAZARD_RATIO);
    products(table);
    parameters(table);
    overTime(table);
    return table.forms();
  }

  private static Step s(String right, String wrong) {
    return Step.of("S", right, wrong);
  }

  private static void products(FormTable table) {
    table
        .rule("hazard-ratio-times-survival")
        .bases(WEIBULL_RATE, WEIBULL_SCALE, EXPONENTIAL, GOMPERTZ)
        .line("product", s(POWER, "{S0}*{R}"))
        .line("ratio first", s("EXP({R}*LN({S0}))", "{R}*{S0}"))
        .line("PRODUCT", s("POWER({S0},{R})", "PRODUCT({S0},{R})"))
        .line("MIN", s("MIN(1,{S0}^{R})", "MIN(1,{S0}*{R})"))
        .line("difference", s(POWER, "{S0}-{S0}*(1-{R})"));
  }

  private static void parameters(FormTable table) {
    String scaled = "EXP(-(({t}/{:scaleAdj})^{shape}))";
    table
        .rule("hazard-ratio-on-accelerated-scale")
        .bases(WEIBULL_SCALE)
        .line(
            "divided",
            parameter("scaleAdj", "{scale}*{R}^(-1/{shape})", "{scale}/{R}"),
            s(scaled, null))
        .line(
            "multiplied",
            parameter("scaleAdj", "{scale}*{R}^(-1/{shape})", "{scale}*{R}"),
            s(scaled, null))
        .line(
            "inside",
            s(
                "EXP(-(({t}/({scale}*{R}^(-1/{shape})))^{shape}))",
                "EXP(-(({t}/({scale}/{R}))^{shape}))"))
        .line("on time", s("EXP(-{R}*({t}/{scale})^{shape})", "EXP(-(({R}*{t}/{scale})^{shape}))"))
        .rule("hazard-ratio-on-curve-shape")
        .bases(WEIBULL_RATE)
        .line("inside", s("EXP(-{lambda}*{R}*{t}^{gamma})", "EXP(-{lambda}*{t}^({gamma}*{R}))"))
        .line(
            "adjusted shape",
            parameter("shapeAdj", "{gamma}", "{gamma}*{R}"),
            s("EXP(-{lambda}*{R}*{t}^{:shapeAdj})", "EXP(-{lambda}*{t}^{:shapeAdj})"))
        .bases(GOMPERTZ)
        .line(
            "Gompertz",
            s(
                "EXP(-({lambda}*{R}/{gamma})*(EXP({gamma}*{t})-1))",
                "EXP(-({lambda}/({gamma}*{R}))*(EXP({gamma}*{R}*{t})-1))"))
        .rule("hazard-ratio-on-accelerated-curve")
        .bases(LOG_NORMAL)
        .line("location", s(POWER, "IF({t}=0,1,1-NORMSDIST((LN({t})-({mu}-LN({R})))/{sigma}))"))
        .bases(LOG_LOGISTIC)
        .line("scale", s(POWER, "1/(1+({t}/({scale}/{R}))^{shape})"));
  }

  private static Step parameter(String name, String right, String wrong) {
    return Step.of(name, right, wrong);
  }

  private static void overTime(FormTable table) {
    Step left = Step.of("w", "MAX(0,1-{t}/5)");
    String faded = "IF({t}=0,1,{Sprev}*({S0}/{S0prev})^(1-(1-{R})*{:w}))";
    table
        .rule("waning-on-wrong-scale")
        .bases(WEIBULL_RATE, WEIBULL_SCALE, EXPONENTIAL)
        .line("mixed survival", left, s(faded, "{:w}*{S0}^{R}+(1-{:w})*{S0}"))
        .line("mixed survival, difference", left, s(faded, "{S0}+{:w}*({S0}^{R}-{S0})"))
        .rule("survival-increases")
        .bases(WEIBULL_RATE)
        .line("delayed effect", s(delayed("{lambda}"), "IF({t}<1,{S0},{S0}^{R})"))
        .line("effect from year 1", s(delayed("{lambda}"), "{S0}^IF({t}>=1,{R},1)"))
        .bases(EXPONENTIAL)
        .line("delayed effect", s(delayed("{lambda}"), "IF({t}<1,{S0},{S0}^{R})"));
  }

  /** The effect acts on what happens after the first year. */
  private static String delayed(String hazardOfYearOne) {
    String one = "EXP(-" + hazardOfYearOne + ")";
    return "IF({t}<1,{S0}," + one + "*({S0}/" + one + ")^{R})";
  }
}
