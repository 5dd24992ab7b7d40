package weighhouse.report.json;

import java.io.IOException;
import weighhouse.audit.Measure;

/** The fields of a measure of the ledger. */
final class MeasureJson {
  private MeasureJson() {}

  static void write(Measure measure, Json json) throws IOException {
    json.text("cell", json.show(measure.cell()));
    json.text("label", measure.label());
    json.text("kind", measure.kind().text());
    json.number("value", measure.value());
    json.number("lower", measure.lower());
    json.number("upper", measure.upper());
    json.number("entered", measure.value());
    effective(measure.effective(), json);
    json.text("actsOn", measure.actsOn().text());
    json.texts("reaches", measure.reaches().stream().map(json::show).toList());
    json.numbers("series", measure.series());
  }

  private static void effective(Measure.Effective effective, Json json) throws IOException {
    if (effective == null) {
      json.nothing("effective");
      return;
    }
    json.object(
        "effective",
        () -> {
          json.number("min", effective.min());
          json.number("median", effective.median());
          json.number("max", effective.max());
        });
  }
}
