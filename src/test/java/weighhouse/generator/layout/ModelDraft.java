package weighhouse.generator.layout;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import weighhouse.generator.book.Book;
import weighhouse.generator.book.CellAt;
import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.model.Dice;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Model;
import weighhouse.generator.model.Step;
import weighhouse.generator.model.Words;

/** A model on its way into a workbook: the faulty one or its twin. */
public final class ModelDraft {
  private static final Pattern PLACE = Pattern.compile("\\{(:?)(\\w+)}");
  private static final List<String> OWN_INPUTS =
      List.of("base", "R", "R2", "lambda", "gamma", "scale", "shape", "mu", "sigma");

  private final Model model;
  private final boolean faulty;
  private final long seed;
  private final Book book = Book.workbook();
  private final Map<String, SortedSet<CellAt>> roots = new LinkedHashMap<>();
  private final Map<String, CellAt> outcomes = new LinkedHashMap<>();

  /** An empty workbook for a model. The seed settles details of layout, alike in both twins. */
  public ModelDraft(Model model, boolean faulty, long seed) {
    this.model = model;
    this.faulty = faulty;
    this.seed = seed;
  }

  /** The workbook. */
  public Book book() {
    return book;
  }

  /** The model. */
  public Model model() {
    return model;
  }

  /** The model's words. */
  public Words words() {
    return model.words();
  }

  /** Whether this is the faulty one. */
  public boolean faulty() {
    return faulty;
  }

  /** Fresh choices, the same for both twins. */
  public Dice dice() {
    return new Dice(seed);
  }

  /** The cells where the twins differ, by the event or extra that holds the fault. */
  public Map<String, SortedSet<CellAt>> roots() {
    return roots;
  }

  /** Cells of the outcomes by name. */
  public Map<String, CellAt> outcomes() {
    return outcomes;
  }

  /** Marks the last cell of a sheet as a root of a fault. */
  public void root(String holder, CellAt at) {
    roots.computeIfAbsent(holder, it -> new TreeSet<>()).add(at);
  }

  /** Writes a scalar step of an event in an arm and registers it. */
  public void scalar(SheetDraft sheet, Event event, Step step, int arm) {
    sheet.formula(bind(event, event.template(step, arm, faulty), arm));
    sheet.as(event.symbol(step.name(), arm));
    if (event.isRoot(step)) {
      root(event.key(), sheet.last());
    }
  }

  /** Template of a scalar step: its own places become symbols of the event. */
  private String bind(Event event, String template, int arm) {
    return replace(
        model.cycleInput().fill(template, model.unit()),
        (own, name) -> {
          if (own || name.equals("p0")) {
            boolean before =
                event.form().before().stream().anyMatch(step -> step.name().equals(name));
            return event.symbol(name, before ? 0 : arm);
          }
          return OWN_INPUTS.contains(name) ? event.symbol(name) : name;
        });
  }

  /** Template of a step along the cycles: its own places become lines of the trace. */
  public String bindLine(Event event, String template, int arm) {
    return replace(
        model.cycleInput().fill(template, model.unit()),
        (own, name) -> {
          if (own || name.equals("p0") || name.equals("S0")) {
            return name.endsWith("Adj") ? event.symbol(name, arm) : "@" + event.symbol(name);
          }
          return switch (name) {
            case "t" -> "@time";
            case "t0" -> "<time";
            case "qx" -> "@qx";
            case "S0prev" -> "<" + event.symbol("S0");
            case "Sprev" -> "<" + event.symbol("S");
            case "OS0" -> "@os.S0";
            case "OS" -> "@os.S";
            default -> OWN_INPUTS.contains(name) ? event.symbol(name) : name;
          };
        });
  }

  /** Fills in the cycle's places of a template. */
  public String cycle(String template) {
    return model.cycleInput().fill(template, model.unit());
  }

  private interface Naming {
    String of(boolean own, String name);
  }

  private static String replace(String template, Naming naming) {
    Matcher place = PLACE.matcher(template);
    StringBuilder text = new StringBuilder();
    while (place.find()) {
      String name = naming.of(!place.group(1).isEmpty(), place.group(2));
      place.appendReplacement(text, Matcher.quoteReplacement("{" + name + "}"));
    }
    return place.appendTail(text).toString();
  }
}
