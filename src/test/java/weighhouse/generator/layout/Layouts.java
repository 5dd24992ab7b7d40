package weighhouse.generator.layout;

import java.util.List;
import java.util.NoSuchElementException;
import weighhouse.generator.model.CycleInput;

/** The layouts of cohort models. */
public final class Layouts {
  private Layouts() {}

  /** The layout of that name. */
  public static Layout named(String name) {
    return all().stream()
        .filter(layout -> layout.name().equals(name))
        .findFirst()
        .orElseThrow(() -> new NoSuchElementException(name));
  }

  /** All of them. */
  public static List<Layout> all() {
    return List.of(
        Layout.of(
            "label-left",
            new LabelLeftInputs(),
            new LifeTable(),
            new ParameterTable(),
            new ArmSheets(),
            new ResultsSheet()),
        Layout.of(
                "translated",
                new LabelLeftInputs(),
                new LifeTable(),
                new ParameterTable(),
                new ArmSheets(),
                new ResultsSheet())
            .in("es", "de", "fr"),
        Layout.of(
            "wide-table",
            new WideTableInputs(),
            new LifeTable(),
            new ParameterTable(),
            new ArmSheets(),
            new ResultsSheet()),
        Layout.of(
            "label-right",
            new LabelRightInputs(),
            new LifeTable(),
            new ParameterTable(),
            new AcrossTraces("trace", 0),
            new ResultsSheet()),
        Layout.of(
                "names",
                new NamedInputs(),
                new LifeTable(),
                new ParameterTable(),
                new ArmSheets(),
                new ResultsSheet())
            .cycle(CycleInput.YEARS),
        Layout.of(
            "lookup",
            new LookupInputs(),
            new LifeTable(),
            new ParameterTable(),
            new AcrossTraces("Markov", 0),
            new ResultsSheet()),
        Layout.of(
                "no-cycle-length",
                new LabelLeftInputs(),
                new LifeTable(),
                new ParameterTable(),
                new ArmSheets(),
                new ResultsSheet())
            .cycle(CycleInput.ABSENT));
  }
}
