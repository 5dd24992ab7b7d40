package weighhouse.generator;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.layout.Layout;
import weighhouse.generator.layout.ModelDraft;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.ModelDraw;

/** Cohort models with faults in the forms of their events. */
final class ModelCases {
  private ModelCases() {}

  static GeneratedCase of(
      long seed, Layout layout, List<EventForm> wanted, List<EventForm> rightForms) {
    Model model = ModelDraw.draw(new Dice(seed), layout.frame(), wanted, rightForms);
    ModelDraft faulty = new ModelDraft(model, true, seed);
    ModelDraft twin = new ModelDraft(model, false, seed);
    layout.lay(faulty);
    layout.lay(twin);
    List<SeededFault> faults = new ArrayList<>();
    List<List<CellAt>> roots = new ArrayList<>();
    for (Map.Entry<String, SortedSet<CellAt>> root : faulty.roots().entrySet()) {
      Event event = model.event(root.getKey());
      CellAt first = root.getValue().first();
      roots.add(List.copyOf(root.getValue()));
      faults.add(
          new SeededFault(
              event.form().rule(),
              event.form().note() + ", " + event.form().basis(),
              Ranges.of(root.getValue()),
              faulty.book().formulaAt(first),
              twin.book().formulaAt(first),
              List.of()));
    }
    String name = "%s-%s".formatted(layout.name(), Long.toHexString(seed));
    return new GeneratedCase(
        name,
        "model",
        layout.name(),
        seed,
        faulty.book(),
        twin.book(),
        faults,
        roots,
        faulty.outcomes());
  }
}
