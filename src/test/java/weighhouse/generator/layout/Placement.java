package weighhouse.generator.layout;

/** One part of a layout: writes its part of the model and registers what it wrote. */
@FunctionalInterface
public interface Placement {
  /** Writes it. */
  void place(ModelDraft draft);
}
