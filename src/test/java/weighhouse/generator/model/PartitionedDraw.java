package weighhouse.generator.model;

import java.util.List;
import weighhouse.generator.model.ModelDraw.Frame;

/** Draws partitioned-survival models: overall and progression-free survival in both arms. */
public final class PartitionedDraw {
  private PartitionedDraw() {}

  /**
   * A model of two curves.
   *
   * @param overall how overall survival is calculated
   * @param progressionFree how progression-free survival is calculated, of the same family
   */
  public static Model draw(Dice dice, Frame frame, EventForm overall, EventForm progressionFree) {
    Scenario any = Scenario.draw(dice, frame.languages());
    Words words = any.words();
    List<String> living = List.of(words.of("state.pf"), words.of("state.pd"));
    Scenario scenario = new Scenario(words, any.progressions(), living);
    CycleUnit unit = dice.pick(List.of(CycleUnit.FOUR_WEEKS, CycleUnit.MONTH, CycleUnit.QUARTER));
    List<CycleInput> suiting =
        frame.cycleInputs().stream().filter(it -> it != CycleInput.MONTHS).toList();
    CycleInput input = suiting.isEmpty() ? CycleInput.YEARS : dice.pick(suiting);
    ModelParts parts = new ModelParts(dice, scenario, unit, input);
    double rate = dice.between(0.15, 0.3, 3);
    parts.add("os", words.of("curve.os"), Event.ANY, 2, overall, rate);
    parts.add("pfs", words.of("curve.pfs"), 0, 1, progressionFree, rate * 3.2);
    return parts.model(dice.between(40, 90));
  }
}
