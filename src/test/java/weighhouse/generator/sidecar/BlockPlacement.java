package weighhouse.generator.sidecar;

import weighhouse.generator.book.SheetDraft;
import weighhouse.generator.layout.ModelDraft;
import weighhouse.generator.layout.Placement;
import weighhouse.generator.model.Event;
import weighhouse.generator.model.Ratio;

/** Writes a block on its own sheet: labels left, right or above; then the event uses its result. */
public final class BlockPlacement implements Placement {
  /** Holder of the roots of a block's fault. */
  public static final String BLOCK = "block";

  private final Block block;
  private final String event;

  /** A block about the effect of an event. */
  public BlockPlacement(Block block, String event) {
    this.block = block;
    this.event = event;
  }

  @Override
  public void place(ModelDraft draft) {
    SheetDraft sheet = draft.book().sheet("Evidence").at(0, 0);
    Event affected = draft.model().event(event);
    sheet.label(block.title() + ": " + affected.label()).down(2);
    switch (draft.dice().between(0, 2)) {
      case 0 ->
          block
              .items()
              .forEach(
                  item -> {
                    write(draft, sheet.label(item.label()), affected, item);
                    sheet.down();
                  });
      case 1 ->
          block
              .items()
              .forEach(
                  item -> {
                    write(draft, sheet, affected, item);
                    sheet.skip(2).label(item.label()).down();
                  });
      default -> {
        block.items().forEach(item -> sheet.label(item.label()));
        sheet.down();
        block.items().forEach(item -> write(draft, sheet, affected, item));
      }
    }
    String last = block.items().get(block.items().size() - 1).name();
    draft.book().symbols().text(affected.symbol("R"), "{block." + last + "}");
  }

  private void write(ModelDraft draft, SheetDraft sheet, Event affected, Item item) {
    String content = filled(item.content(draft.faulty()), affected);
    if (content.startsWith("=")) {
      sheet.formula(content.substring(1).replace("{:", "{block."));
    } else if (content.startsWith("'")) {
      sheet.label(content.substring(1));
    } else {
      sheet.value(number(content));
    }
    sheet.as("block." + item.name());
    if (item.root()) {
      draft.root(BLOCK, sheet.last());
    }
  }

  /** A number, or a product of numbers. */
  private static double number(String text) {
    double product = 1;
    for (String factor : text.split("\\*", -1)) {
      product *= Double.parseDouble(factor.strip());
    }
    return weighhouse.generator.model.Dice.round(product, 4);
  }

  private static String filled(String content, Event event) {
    Ratio ratio = event.ratio();
    return content
        .replace("{in}", "{" + event.symbol("R") + "}")
        .replace("{value}", Double.toString(ratio.value()))
        .replace("{lower}", Double.toString(ratio.lower()))
        .replace("{upper}", Double.toString(ratio.upper()))
        .replace("{se}", Double.toString(ratio.standardError()));
  }
}
