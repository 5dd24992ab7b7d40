package weighhouse.rules.pattern;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import weighhouse.quantity.Kind;

/** The other forms in which a ratio stands in a workbook: as its reduction or its logarithm. */
final class Reduced {
  /** A kind and how a ratio is got from it. */
  record Form(Kind kind, Wrapping wrapping) {}

  private static final Map<Kind, List<Form>> FORMS = new EnumMap<>(Kind.class);

  static {
    FORMS.put(
        Kind.HAZARD_RATIO,
        List.of(
            new Form(Kind.HAZARD_REDUCTION, Wrapping.COMPLEMENT),
            new Form(Kind.LOG_HAZARD_RATIO, Wrapping.EXPONENTIAL)));
    FORMS.put(Kind.RATE_RATIO, List.of(new Form(Kind.LOG_RATE_RATIO, Wrapping.EXPONENTIAL)));
    FORMS.put(
        Kind.RISK_RATIO,
        List.of(
            new Form(Kind.RISK_REDUCTION, Wrapping.COMPLEMENT),
            new Form(Kind.LOG_RISK_RATIO, Wrapping.EXPONENTIAL)));
    FORMS.put(Kind.ODDS_RATIO, List.of(new Form(Kind.LOG_ODDS_RATIO, Wrapping.EXPONENTIAL)));
  }

  private Reduced() {}

  /** The wrapping by which a term of one kind becomes one of the kinds wanted; null if none. */
  static Wrapping toward(Iterable<Kind> wanted, Kind kind) {
    for (Kind ratio : wanted) {
      for (Form form : FORMS.getOrDefault(ratio, List.of())) {
        if (form.kind() == kind) {
          return form.wrapping();
        }
      }
    }
    return null;
  }
}
