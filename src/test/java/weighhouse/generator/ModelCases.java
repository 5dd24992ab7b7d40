package weighhouse.generator;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.fault.CurveFaults;
import weighhouse.generator.layout.Layout;
import weighhouse.generator.layout.ModelDraft;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.EventForm;
import weighhouse.generator.model.Measure;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.ModelDraw;
import weighhouse.generator.model.PartitionedDraw;
import weighhouse.generator.sidecar.Block;
import weighhouse.generator.sidecar.BlockPlacement;

/** Cohort models with faults in the forms of their events. */
final class ModelCases {
  private ModelCases() {}

  static GeneratedCase of(
      long seed, Layout layout, List<EventForm> wanted, List<EventForm> rightForms) {
    return of(seed, layout, "", ModelDraw.draw(new Dice(seed), layout.frame(), wanted, rightForms));
  }

  /** A partitioned-survival model whose one curve has the fault. */
  static GeneratedCase partitioned(long seed, Layout layout, EventForm wanted) {
    Dice dice = new Dice(seed);
    EventForm plain =
        dice.pick(CurveFaults.right().stream().filter(it -> it.basis() == wanted.basis()).toList());
    boolean onOverall = dice.chance(0.5);
    Model model =
        PartitionedDraw.draw(
            dice, layout.frame(), onOverall ? wanted : plain, onOverall ? plain : wanted);
    return of(seed, layout, "partitioned-", model);
  }

  /** A cohort model whose first effect comes from a block with the fault. */
  static GeneratedCase withBlock(
      long seed, Layout layout, Block block, List<EventForm> rightForms) {
    Dice dice = new Dice(seed);
    EventForm first =
        dice.pick(
            rightForms.stream()
                .filter(it -> it.measure() == Measure.HAZARD_RATIO && !it.basis().alongCycles())
                .toList());
    Model model = ModelDraw.draw(dice, layout.frame(), List.of(first), rightForms);
    Layout more = layout.with(new BlockPlacement(block, "prog1"));
    return of(seed, more, "", block.usesInput() ? model : model.without("prog1.R"), block);
  }

  private static GeneratedCase of(long seed, Layout layout, String prefix, Model model) {
    return of(seed, layout, prefix, model, null);
  }

  private static GeneratedCase of(
      long seed, Layout layout, String prefix, Model model, Block block) {
    ModelDraft faulty = new ModelDraft(model, true, seed);
    ModelDraft twin = new ModelDraft(model, false, seed);
    layout.lay(faulty);
    layout.lay(twin);
    List<SeededFault> faults = new ArrayList<>();
    List<List<CellAt>> roots = new ArrayList<>();
    for (Map.Entry<String, SortedSet<CellAt>> root : faulty.roots().entrySet()) {
      boolean ofBlock = root.getKey().equals(BlockPlacement.BLOCK);
      EventForm form = ofBlock ? null : model.event(root.getKey()).form();
      CellAt first = root.getValue().first();
      roots.add(List.copyOf(root.getValue()));
      faults.add(
          new SeededFault(
              ofBlock ? block.rule() : form.rule(),
              ofBlock ? block.note() : form.note() + ", " + form.basis(),
              Ranges.of(root.getValue()),
              text(faulty, first),
              text(twin, first),
              List.of()));
    }
    String name = "%s%s-%s".formatted(prefix, layout.name(), Long.toHexString(seed));
    return new GeneratedCase(
        name,
        "model",
        prefix + layout.name(),
        seed,
        faulty.book(),
        twin.book(),
        faults,
        roots,
        faulty.outcomes());
  }

  /** The formula at a cell, or else what stands there. */
  private static String text(ModelDraft draft, CellAt at) {
    String formula = draft.book().formulaAt(at);
    return formula != null
        ? formula
        : String.valueOf(draft.book().sheet(at.sheet()).cells().get(at));
  }
}
