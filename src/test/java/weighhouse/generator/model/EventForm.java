package weighhouse.generator.model;

import java.util.List;
import java.util.stream.Stream;

/**
 * How an event is calculated from its inputs, rightly and (where {@code rule} is set) with a fault.
 *
 * @param rule id of the rule that the fault breaks, or null
 * @param note the disguise
 * @param measure the effect measure, or null
 * @param basis what the workbook holds about the event
 * @param before steps without effect, ending in {@code p0} (or {@code S0} for curves)
 * @param applied steps that apply the effect, ending in {@code p} (or {@code S}); may be empty
 * @param traits what the event must bring along, see {@link Trait}
 */
public record EventForm(
    String rule,
    String note,
    Measure measure,
    Basis basis,
    List<Step> before,
    List<Step> applied,
    List<Trait> traits) {

  /** Demands of a form on its event and model. */
  public enum Trait {
    /** The base probability is high. */
    HIGH_BASE,
    /** A second ratio, <code>{R2}</code>, belongs to the event. */
    SECOND_RATIO,
    /** The event is death. */
    DEATH,
    /** Cycles must be shorter than a year. */
    SHORT_CYCLE,
    /** The cycle must be one year. */
    YEAR_CYCLE,
    /** The cycle length must stand in a cell. */
    CYCLE_IN_CELL,
    /** The effect applies to the comparator by mistake: forms of the two arms change places. */
    SWAPS_ARMS,
    /** LibreOffice of today cannot run it. */
    NEEDS_EXCEL
  }

  /** Whether the form seeds a fault. */
  public boolean seedsFault() {
    return rule != null;
  }

  /** Whether the form demands it. */
  public boolean has(Trait trait) {
    return traits.contains(trait);
  }

  /** All steps. */
  public Stream<Step> steps() {
    return Stream.concat(before.stream(), applied.stream());
  }

  /** The same form with other steps after the effect. */
  public EventForm with(Measure newMeasure, List<Step> newApplied) {
    return new EventForm(rule, note, newMeasure, basis, before, newApplied, traits);
  }
}
