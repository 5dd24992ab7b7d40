package weighhouse.generator.layout;

import java.util.ArrayList;
import java.util.List;
import weighhouse.generator.model.CycleInput;
import weighhouse.generator.model.ModelDraw.Frame;

/**
 * A way to lay out a cohort model.
 *
 * @param frame which models it suits
 * @param parts placements in the order of writing
 */
public record Layout(String name, Frame frame, List<Placement> parts) {
  /** A layout in English with any cycle input. */
  public static Layout of(String name, Placement... parts) {
    return new Layout(
        name,
        new Frame(
            List.of("en"), List.of(CycleInput.YEARS, CycleInput.PER_YEAR, CycleInput.MONTHS), true),
        List.of(parts));
  }

  /** The same in other languages. */
  public Layout in(String... languages) {
    return new Layout(
        name, new Frame(List.of(languages), frame.cycleInputs(), frame.alongCycles()), parts);
  }

  /** The same with other ways to hold the cycle length. */
  public Layout cycle(CycleInput... inputs) {
    return new Layout(
        name, new Frame(frame.languages(), List.of(inputs), frame.alongCycles()), parts);
  }

  /** The same for models without probabilities that change from cycle to cycle. */
  public Layout constantOnly() {
    return new Layout(name, new Frame(frame.languages(), frame.cycleInputs(), false), parts);
  }

  /** The same with another part right after the inputs. */
  public Layout with(Placement part) {
    List<Placement> more = new ArrayList<>(parts);
    more.add(1, part);
    return new Layout(name, frame, more);
  }

  /** Writes a model. */
  public void lay(ModelDraft draft) {
    parts.forEach(part -> part.place(draft));
  }
}
