package weighhouse.generator.model;

import java.util.Map;

/**
 * An event of the model.
 *
 * @param key short name
 * @param label what happens, in the workbook's language
 * @param from state that is left; {@link #ANY} for every living state
 * @param to state that is entered
 * @param bases the numbers of its basis by name of input
 */
public record Event(
    String key,
    String label,
    int from,
    int to,
    EventForm form,
    Map<String, Double> bases,
    Ratio ratio,
    Ratio second) {
  /** Every living state. */
  public static final int ANY = -1;

  /** Symbol of an input of the event. */
  public String symbol(String input) {
    return key + "." + input;
  }

  /** Symbol of a calculated step in an arm. */
  public String symbol(String step, int arm) {
    return key + "." + step + "." + arm;
  }

  /** Symbol of what the trace uses in an arm. */
  public String result(int arm) {
    String name = form.basis().isCurve() ? "S" : "p";
    return isAffected(arm) ? symbol(name, arm) : symbol(name + "0", 0);
  }

  /** Whether the steps that apply the effect stand in this arm. */
  public boolean isAffected(int arm) {
    return !form.applied().isEmpty() && (arm == 1 || inBothArms());
  }

  /** Whether both arms have the steps that apply the effect. */
  public boolean inBothArms() {
    return swapsArms() || (form.measure() != null && form.measure().inBothArms());
  }

  /** A step's template in an arm. */
  public String template(Step step, int arm, boolean faulty) {
    if (!swapsArms() || !form.applied().contains(step)) {
      return step.formula(faulty);
    }
    return faulty == (arm == 0) ? step.right() : "{p0}";
  }

  /** Whether the faulty workbook and its twin differ at a step. */
  public boolean isRoot(Step step) {
    return step.wrong() != null || (swapsArms() && form.applied().contains(step));
  }

  private boolean swapsArms() {
    return form.has(EventForm.Trait.SWAPS_ARMS);
  }
}
