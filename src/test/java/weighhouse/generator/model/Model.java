package weighhouse.generator.model;

import java.util.List;
import java.util.NoSuchElementException;

/** A cohort model before it is laid out. */
public record Model(
    Scenario scenario,
    CycleUnit unit,
    CycleInput cycleInput,
    int cycles,
    List<Event> events,
    List<Input> inputs) {

  /** The same without an input. */
  public Model without(String symbol) {
    List<Input> left = inputs.stream().filter(it -> !it.symbol().equals(symbol)).toList();
    return new Model(scenario, unit, cycleInput, cycles, events, left);
  }

  /** The words of its cells. */
  public Words words() {
    return scenario.words();
  }

  /** Event of a key. */
  public Event event(String key) {
    return events.stream()
        .filter(event -> event.key().equals(key))
        .findFirst()
        .orElseThrow(() -> new NoSuchElementException(key));
  }

  /** Whether states are areas between survival curves. */
  public boolean isPartitioned() {
    return events.stream().anyMatch(event -> event.key().equals("os"));
  }

  /** Events laid out as scalars. */
  public List<Event> scalars() {
    return events.stream().filter(event -> !event.form().basis().alongCycles()).toList();
  }

  /** Events laid out along the cycles. */
  public List<Event> alongCycles() {
    return events.stream().filter(event -> event.form().basis().alongCycles()).toList();
  }
}
