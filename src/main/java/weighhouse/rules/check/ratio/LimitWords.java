package weighhouse.rules.check.ratio;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import weighhouse.quantity.Kind;
import weighhouse.quantity.Quantity;
import weighhouse.quantity.Role;
import weighhouse.workbook.CellAddress;

/** Whether a number is a limit, by its quantity or, where none is known, by the words at it. */
final class LimitWords {
  private static final Pattern LOWER =
      Pattern.compile("(?i)\\b(lower|lcl|lci)\\b|^(low|ll|lo|min)$");
  private static final Pattern UPPER =
      Pattern.compile("(?i)\\b(upper|ucl|uci)\\b|^(high|ul|hi|max)$");

  private static final Pattern STARTS =
      Pattern.compile("(?i)^(95 ?% (ci )?)?(lower|upper|lcl|ucl|lci|uci|low|high)\\b");

  private final ModelView model;
  private final NearbyTexts texts;

  LimitWords(ModelView model) {
    this.model = model;
    this.texts = new NearbyTexts(model.subject().workbook());
  }

  /**
   * Whether the cell can be that limit of a ratio of the kind. The words at a limit often say
   * nothing of what it limits, so that its kind is a guess; its role is not.
   *
   * @param beside whether it stands in the ratio's own row
   */
  boolean isLimit(CellAddress cell, Role role, Kind kind, boolean beside) {
    Quantity quantity = model.quantity(cell);
    if (!(model.value(cell) > 0) || Ratios.isLog(quantity) || Ratios.isStandardError(quantity)) {
      return false;
    } else if (quantity.kind() == Kind.UNKNOWN) {
      return quantity.role() == role || says(cell, role);
    }
    boolean own = quantity.kind() == kind || beside || startsWithLimit(cell);
    return quantity.role() == role && own;
  }

  private boolean startsWithLimit(CellAddress cell) {
    String label = model.subject().quantities().label(cell).strip();
    return STARTS.matcher(label).find();
  }

  private boolean says(CellAddress cell, Role role) {
    List<String> words = new ArrayList<>();
    words.add(model.subject().quantities().label(cell));
    texts.beside(cell, words);
    texts.above(cell, words);
    Pattern wanted = role == Role.LOWER_LIMIT ? LOWER : UPPER;
    Pattern other = role == Role.LOWER_LIMIT ? UPPER : LOWER;
    for (String text : words) {
      boolean yes = wanted.matcher(text.strip()).find();
      boolean no = other.matcher(text.strip()).find();
      if (yes != no) {
        return yes; // the nearest words that tell one from the other decide
      }
    }
    return false;
  }
}
