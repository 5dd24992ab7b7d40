package weighhouse.audit.pipeline;

import java.util.List;
import java.util.Locale;
import weighhouse.audit.QuantityRow;
import weighhouse.quantity.Inferred;
import weighhouse.quantity.Quantities;
import weighhouse.quantity.Role;
import weighhouse.quantity.Span;
import weighhouse.workbook.CellRange;

/** What was inferred, in words. */
final class QuantityRows {
  private QuantityRows() {}

  static List<QuantityRow> of(Quantities quantities) {
    return quantities.ranges().stream().map(range -> row(quantities, range)).toList();
  }

  private static QuantityRow row(Quantities quantities, CellRange range) {
    Inferred inferred = quantities.inferred(range.first());
    Role role = inferred.quantity().role();
    String kind = inferred.quantity().kind().text();
    return new QuantityRow(
        range,
        quantities.label(range.first()),
        role == Role.ESTIMATE ? kind : kind + ", " + words(role),
        inWords(inferred.quantity().span()),
        inferred.evidence(),
        inferred.basis().name().toLowerCase(Locale.ROOT));
  }

  private static String words(Role role) {
    return role.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }

  /** {@code 1 month}, {@code 1 year per 1000 people}; null of a quantity without a span. */
  static String inWords(Span span) {
    if (span == null) {
      return null;
    }
    String unit = span.unit().name().toLowerCase(Locale.ROOT);
    String length = plain(span.amount()) + " " + (span.amount() == 1 ? unit : unit + "s");
    return span.people() == 1 ? length : length + " per " + plain(span.people()) + " people";
  }

  private static String plain(double number) {
    return number == Math.rint(number)
        ? Long.toString((long) number)
        : String.format(Locale.ROOT, "%.4g", number);
  }
}
