package weighhouse.generator;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import weighhouse.generator.fault.CurveFaults;
import weighhouse.generator.fault.CycleFaults;
import weighhouse.generator.fault.RatioFaults;
import weighhouse.generator.fault.RightForms;
import weighhouse.generator.fault.ScaleFaults;
import weighhouse.generator.layout.Layout;
import weighhouse.generator.layout.Layouts;
import weighhouse.generator.lookalike.LookAlikes;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.ModelDraw;
import weighhouse.generator.sidecar.Block;
import weighhouse.generator.sidecar.Blocks;

/** Makes cases: every rule in turn, in layout after layout, each time in another disguise. */
public final class Generator {
  private static final List<EventForm> RIGHT = RightForms.forms();
  private static final Map<String, List<EventForm>> FAULTS =
      Stream.of(ScaleFaults.forms(), RatioFaults.forms(), CycleFaults.forms(), CurveFaults.forms())
          .flatMap(List::stream)
          .collect(Collectors.groupingBy(EventForm::rule, TreeMap::new, Collectors.toList()));

  private static final Map<String, List<Block>> BLOCKS = Blocks.byRule();

  private Generator() {}

  /** Any number of cases; the same seed gives the same cases. */
  public static List<GeneratedCase> cases(int n, long seed) {
    List<String> rules = Stream.concat(FAULTS.keySet().stream(), BLOCKS.keySet().stream()).toList();
    List<GeneratedCase> cases = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      long own = seed * 1_000_003L + i;
      Dice dice = new Dice(own);
      if (i % 8 == 7) {
        cases.add(lookAlike(i / 8, own));
        continue;
      }
      cases.add(model(dice, own, rules, i - i / 8));
    }
    return cases;
  }

  private static GeneratedCase model(Dice dice, long seed, List<String> rules, int turn) {
    String rule = rules.get(turn % rules.size());
    if (BLOCKS.containsKey(rule)) {
      Layout any = Layouts.all().get((turn / 5) % Layouts.all().size());
      return ModelCases.withBlock(seed, any, dice.pick(BLOCKS.get(rule)), RIGHT);
    }
    Layout layout = layout(rule, turn);
    EventForm main = dice.pick(suiting(FAULTS.get(rule), layout));
    return main.basis().isCurve()
        ? ModelCases.partitioned(seed, layout, main)
        : ModelCases.of(seed, layout, together(dice, main, layout), RIGHT);
  }

  private static GeneratedCase lookAlike(int i, long seed) {
    String name = LookAlikes.names().get(i % LookAlikes.names().size());
    return new GeneratedCase(
        name + "-" + Long.toHexString(seed),
        "look-alike",
        "look-alike",
        seed,
        LookAlikes.draft(name, seed),
        null,
        List.of(),
        List.of(),
        Map.of());
  }

  /** The form and perhaps others that go with it. */
  private static List<EventForm> together(Dice dice, EventForm main, Layout layout) {
    List<EventForm> wanted = new ArrayList<>();
    wanted.add(main);
    while (dice.chance(0.35) && wanted.size() < 3) {
      String another = dice.pick(List.copyOf(FAULTS.keySet()));
      List<EventForm> forms =
          suiting(FAULTS.get(another), layout).stream()
              .filter(form -> !form.basis().isCurve())
              .toList();
      if (!forms.isEmpty()) {
        addIfPossible(wanted, dice.pick(forms));
      }
    }
    return wanted;
  }

  private static void addIfPossible(List<EventForm> wanted, EventForm form) {
    wanted.add(form);
    if (!ModelDraw.goTogether(wanted)) {
      wanted.remove(wanted.size() - 1);
    }
  }

  private static List<EventForm> suiting(List<EventForm> forms, Layout layout) {
    return forms.stream()
        .filter(form -> layout.frame().alongCycles() || !form.basis().alongCycles())
        .toList();
  }

  /** The layout whose turn it is among those that can hold the rule's faults. */
  private static Layout layout(String rule, int turn) {
    List<Layout> able =
        Layouts.all().stream()
            .filter(layout -> !suiting(FAULTS.get(rule), layout).isEmpty())
            .toList();
    return able.get(Math.floorMod(turn + turn / able.size(), able.size()));
  }
}
