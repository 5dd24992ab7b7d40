package weighhouse.report.json;

import java.io.IOException;
import java.util.Map;
import weighhouse.audit.Coverage;

/** The fields of the coverage. */
final class CoverageJson {
  private CoverageJson() {}

  static void write(Coverage coverage, Json json) throws IOException {
    json.integer("formulaCells", coverage.formulaCells());
    json.integer("read", coverage.read());
    json.integer("recalculated", coverage.recalculated());
    json.integer("reproduced", coverage.reproduced());
    json.list("notReproduced", coverage.notReproduced(), difference -> write(difference, json));
    json.list("unsupported", coverage.unsupported().entrySet(), entry -> unsupported(entry, json));
    json.texts("macros", coverage.macros());
    json.texts("externalLinks", coverage.externalLinks());
    json.texts("hidden", coverage.hidden());
    json.texts("problems", coverage.problems());
  }

  private static void write(Coverage.Difference difference, Json json) throws IOException {
    json.text("cell", json.show(difference.cell()));
    json.pair("stored", difference.stored(), "recalculated", difference.recalculated());
  }

  private static void unsupported(Map.Entry<String, Integer> entry, Json json) throws IOException {
    json.text("function", entry.getKey());
    json.integer("cells", entry.getValue());
  }
}
