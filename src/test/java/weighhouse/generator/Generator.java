package weighhouse.generator;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import weighhouse.generator.fault.CycleFaults;
import weighhouse.generator.fault.RatioFaults;
import weighhouse.generator.fault.RightForms;
import weighhouse.generator.fault.ScaleFaults;
import weighhouse.generator.layout.Layout;
import weighhouse.generator.layout.Layouts;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.ModelDraw;

/** Makes cases: every rule in turn, in layout after layout, each time in another disguise. */
public final class Generator {
  private static final List<EventForm> RIGHT = RightForms.forms();
  private static final Map<String, List<EventForm>> FAULTS =
      Stream.of(ScaleFaults.forms(), RatioFaults.forms(), CycleFaults.forms())
          .flatMap(List::stream)
          .collect(Collectors.groupingBy(EventForm::rule, TreeMap::new, Collectors.toList()));

  private Generator() {}

  /** Any number of cases; the same seed gives the same cases. */
  public static List<GeneratedCase> cases(int n, long seed) {
    List<String> rules = List.copyOf(FAULTS.keySet());
    List<Layout> layouts = Layouts.all();
    List<GeneratedCase> cases = new ArrayList<>();
    for (int i = 0; i < n; i++) {
      long own = seed * 1_000_003L + i;
      Dice dice = new Dice(own);
      Layout layout = layouts.get(Math.floorMod(i + i / layouts.size(), layouts.size()));
      cases.add(
          ModelCases.of(own, layout, forms(dice, rules.get(i % rules.size()), layout), RIGHT));
    }
    return cases;
  }

  private static List<EventForm> forms(Dice dice, String rule, Layout layout) {
    List<EventForm> wanted = new ArrayList<>();
    addIfPossible(wanted, dice.pick(suiting(FAULTS.get(rule), layout)));
    while (dice.chance(0.35) && wanted.size() < 3) {
      String another = dice.pick(List.copyOf(FAULTS.keySet()));
      addIfPossible(wanted, dice.pick(suiting(FAULTS.get(another), layout)));
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
    List<EventForm> suiting =
        forms.stream()
            .filter(form -> layout.frame().alongCycles() || !form.basis().alongCycles())
            .toList();
    return suiting.isEmpty() ? forms : suiting;
  }
}
