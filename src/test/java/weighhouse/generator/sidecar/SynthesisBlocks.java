package weighhouse.generator.sidecar;

import java.util.List;

/** Ratios that come from other ratios. */
final class SynthesisBlocks {
  private SynthesisBlocks() {}

  static List<Block> all() {
    return List.of(
        indirect("one plus difference", "=EXP(LN({:ac})-LN({:bc}))", "=1+{:ac}-{:bc}"),
        indirect("one minus difference", "={:ac}/{:bc}", "=1-({:bc}-{:ac})"),
        indirect("difference", "=EXP(LN({:ac})-LN({:bc}))", "={:ac}-{:bc}+1"),
        averaged("AVERAGE", "=EXP((LN({:a})+LN({:b})+LN({:c}))/3)", "=AVERAGE({:a},{:b},{:c})"),
        averaged("sum over three", "=GEOMEAN({:a},{:b},{:c})", "=({:a}+{:b}+{:c})/3"),
        averaged(
            "weighted",
            "=EXP(0.5*LN({:a})+0.3*LN({:b})+0.2*LN({:c}))",
            "=0.5*{:a}+0.3*{:b}+0.2*{:c}"),
        reciprocal("both", "=1/{:cu}", "=1/{:cl}", "=1/{:cl}", "=1/{:cu}"),
        reciprocal("powers", "={:cu}^-1", "={:cl}^-1", "={:cl}^-1", "={:cu}^-1"));
  }

  private static Block indirect(String note, String right, String wrong) {
    return Block.of(
        "indirect-comparison-on-natural-scale",
        note,
        "Indirect comparison through a common comparator",
        Item.of("ac", "Hazard ratio, A vs C", "{value}*0.8"),
        Item.of("bc", "Hazard ratio, B vs C", "0.83"),
        Item.of("ab", "Hazard ratio, A vs B (indirect)", right, wrong));
  }

  private static Block averaged(String note, String right, String wrong) {
    return Block.of(
        "ratios-averaged-on-natural-scale",
        note,
        "Pooled effect of three trials",
        Item.of("a", "Hazard ratio, trial 1", "{value}*0.72"),
        Item.of("b", "Hazard ratio, trial 2", "{value}"),
        Item.of("c", "Hazard ratio, trial 3", "{value}*1.45"),
        Item.of("pool", "Pooled hazard ratio", right, wrong));
  }

  private static Block reciprocal(
      String note, String lower, String wrongLower, String upper, String wrongUpper) {
    return Block.of(
        "reciprocal-interval-not-swapped",
        note,
        "Published the other way round",
        Item.of("ca", "Hazard ratio, comparator vs treatment", "1.49"),
        Item.of("cl", "Lower 95% limit, comparator vs treatment", "1.17"),
        Item.of("cu", "Upper 95% limit, comparator vs treatment", "1.8975"),
        Item.of("l", "Lower 95% limit, treatment vs comparator", lower, wrongLower),
        Item.of("u", "Upper 95% limit, treatment vs comparator", upper, wrongUpper),
        Item.of("hr", "Hazard ratio, treatment vs comparator", "=1/{:ca}"));
  }
}
