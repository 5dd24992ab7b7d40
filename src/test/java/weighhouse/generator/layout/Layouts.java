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
        of("label-left", new LabelLeftInputs(), new ArmSheets()),
        of("translated", new LabelLeftInputs(), new ArmSheets()).in("es", "de", "fr"),
        of("translated-values-first", new ValueFirstInputs(), new AcrossTraces("trace", 0))
            .in("es", "de", "fr"),
        of("wide-table", new WideTableInputs(), new ArmSheets()),
        of("label-right", new LabelRightInputs(), new AcrossTraces("trace", 0)),
        of("names", new NamedInputs(), new ArmSheets()).cycle(CycleInput.YEARS),
        of("lookup", new LookupInputs(), new AcrossTraces("Markov", 0)),
        of("no-cycle-length", new LabelLeftInputs(), new ArmSheets()).cycle(CycleInput.ABSENT),
        of("inverse-cycle", new WideTableInputs(), new ColumnNameTraces())
            .cycle(CycleInput.PER_YEAR),
        of("section-units", new SectionUnitInputs(), new ArmSheets()),
        of("heading-above", new HeadingAboveInputs(), new ArmSheets()),
        of("values-first", new ValueFirstInputs(), new ColumnNameTraces()),
        of("scenarios", new ScenarioInputs(), new ArmSheets()),
        of("index-match", new IndexMatchInputs(), new ArmSheets()),
        of("structured-table", new TableInputs(), new AcrossTraces("Engine", 2)),
        of("matrices", new WideTableInputs(), new MatrixTraces()).constantOnly(),
        of("column-names", new NamedInputs(), new ColumnNameTraces()),
        oneSheet());
  }

  /** Inputs, parameters, results and traces on one sheet. */
  private static Layout oneSheet() {
    return Layout.of(
        "one-sheet",
        new OneSheetInputs(),
        new LifeTable(),
        new ParameterTable("Model", 2, 5),
        new AcrossTraces("Model", 60),
        new ResultsSheet("Model", 40, 5));
  }

  private static Layout of(String name, Placement inputs, Placement traces) {
    return Layout.of(
        name,
        inputs,
        new LifeTable(),
        new ParameterTable(),
        traces,
        new ResultsSheet(),
        new SoundForms());
  }
}
