package weighhouse.generator.sidecar;

import java.util.List;

/** How a ratio varies: limits, standard errors, draws. */
final class UncertaintyBlocks {
  private static final Item VALUE = Item.of("hr", "Hazard ratio", "={in}");
  private static final Item LOWER = Item.of("l", "Lower 95% limit", "{lower}");
  private static final Item UPPER = Item.of("u", "Upper 95% limit", "{upper}");
  private static final Item SE = Item.of("se", "Standard error of ln(HR)", "{se}");
  private static final Item SWITCH = Item.of("sw", "Probabilistic (1 = yes)", "0");
  private static final Item USED = used("=IF({:sw}=1,{:draw},{:hr})");
  private static final String PSA = "Probabilistic analysis";

  private UncertaintyBlocks() {}

  static List<Block> all() {
    return List.of(
        drawn(
            "ratio-sampled-on-natural-scale",
            "NORMINV",
            "=EXP(NORMINV(RAND(),LN({:hr}),{:se}))",
            "=NORMINV(RAND(),{:hr},{:se})"),
        drawn(
            "ratio-sampled-on-natural-scale",
            "NORM.INV",
            "=EXP(_xlfn.NORM.INV(RAND(),LN({:hr}),{:se}))",
            "=_xlfn.NORM.INV(RAND(),{:hr},{:se})"),
        drawn(
            "ratio-sampled-on-natural-scale",
            "NORMSINV",
            "=EXP(LN({:hr})+{:se}*NORMSINV(RAND()))",
            "={:hr}+{:se}*NORMSINV(RAND())"),
        drawn(
            "log-normal-parameters-on-natural-scale",
            "LOGINV",
            "=LOGINV(RAND(),LN({:hr}),{:se})",
            "=LOGINV(RAND(),{:hr},{:se})"),
        drawn(
            "log-normal-parameters-on-natural-scale",
            "LOGNORM.INV",
            "=_xlfn.LOGNORM.INV(RAND(),LN({:hr}),{:se})",
            "=_xlfn.LOGNORM.INV(RAND(),{:hr},{:se})"),
        drawn(
            "log-normal-parameters-on-natural-scale",
            "EXP of NORMINV",
            "=EXP(NORMINV(RAND(),LN({:hr}),{:se}))",
            "=EXP(NORMINV(RAND(),{:hr},{:se}))"),
        error(
            "standard-error-from-natural-interval",
            "3.92",
            "=(LN({:u})-LN({:l}))/3.92",
            "=({:u}-{:l})/3.92"),
        error(
            "standard-error-from-natural-interval",
            "twice 1.96",
            "=(LN({:u})-LN({:l}))/(2*1.96)",
            "=({:u}-{:l})/(2*1.96)"),
        error(
            "standard-error-from-natural-interval",
            "upper half",
            "=(LN({:u})-LN({:hr}))/1.96",
            "=({:u}-{:hr})/1.96"),
        error(
            "interval-level-mismatch",
            "3.29",
            "=(LN({:u})-LN({:l}))/3.92",
            "=(LN({:u})-LN({:l}))/3.29"),
        error(
            "interval-level-mismatch",
            "twice 1.645",
            "=(LN({:u})-LN({:l}))/(2*1.96)",
            "=(LN({:u})-LN({:l}))/(2*1.645)"),
        error(
            "interval-level-mismatch",
            "one half",
            "=(LN({:u})-LN({:l}))/3.92",
            "=(LN({:u})-LN({:l}))/1.96"),
        limits(
            "interval-excludes-estimate",
            "limits change places",
            "{lower}",
            "{upper}",
            "{upper}",
            "{lower}"),
        limits(
            "interval-excludes-estimate",
            "estimate above",
            "{lower}",
            "{lower}*0.7",
            "{upper}",
            "{value}*0.95"),
        limits(
            "interval-not-log-symmetric",
            "symmetric around the ratio",
            "{lower}",
            "{value}*0.6",
            "{upper}",
            "{value}*1.4"),
        unused("draw not used", "={:hr}"),
        unused("draw not used, IF", "=IF({:sw}=1,{:hr},{:hr})"),
        unusual("uniform", "={:l}+({:u}-{:l})*RAND()"),
        unusual("beta", "=BETAINV(RAND(),100*{:hr},100*(1-{:hr}))"),
        unusual("gamma", "=GAMMAINV(RAND(),({:hr}/{:se})^2,{:se}^2/{:hr})"));
  }

  private static Item used(String formula) {
    return Item.of("use", "Hazard ratio used in the model", formula);
  }

  private static Block drawn(String rule, String note, String right, String wrong) {
    Item draw = Item.of("draw", "Hazard ratio, drawn", right, wrong);
    return Block.of(rule, note, PSA, VALUE, LOWER, UPPER, SE, SWITCH, draw, USED);
  }

  private static Block error(String rule, String note, String right, String wrong) {
    Item se = Item.of("se", "Standard error of ln(HR)", right, wrong);
    Item draw = Item.of("draw", "Hazard ratio, drawn", "=EXP(NORMINV(RAND(),LN({:hr}),{:se}))");
    return Block.of(rule, note, PSA, VALUE, LOWER, UPPER, se, SWITCH, draw, USED);
  }

  private static Block limits(
      String rule, String note, String lower, String wrongLower, String upper, String wrongUpper) {
    return Block.of(
        rule,
        note,
        "Published effect",
        Item.of("l", "Lower 95% limit", lower, wrongLower),
        Item.of("u", "Upper 95% limit", upper, wrongUpper),
        Item.of("hr", "Hazard ratio", "{value}").asRoot());
  }

  private static Block unused(String note, String wrong) {
    Item draw = Item.of("draw", "Hazard ratio, drawn", "=EXP(NORMINV(RAND(),LN({:hr}),{:se}))");
    Item use =
        Item.of("use", "Hazard ratio used in the model", "=IF({:sw}=1,{:draw},{:hr})", wrong);
    return Block.of("sampled-ratio-not-used", note, PSA, VALUE, SE, SWITCH, draw.asRoot(), use);
  }

  private static Block unusual(String note, String wrong) {
    Item draw =
        Item.of("draw", "Hazard ratio, drawn", "=EXP(NORMINV(RAND(),LN({:hr}),{:se}))", wrong);
    return Block.of(
        "unusual-distribution-for-ratio", note, PSA, VALUE, LOWER, UPPER, SE, SWITCH, draw, USED);
  }
}
