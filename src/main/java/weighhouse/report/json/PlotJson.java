package weighhouse.report.json;

import java.io.IOException;
import weighhouse.audit.Plot;

/** The fields of a plot's data. */
final class PlotJson {
  private PlotJson() {}

  static void write(Plot plot, Json json) throws IOException {
    json.text("about", plot.about());
    json.text("title", plot.title());
    json.text("x", plot.x());
    json.text("y", plot.y());
    json.list(
        "series",
        plot.series(),
        series -> {
          json.text("name", series.name());
          json.numbers("xs", series.xs());
          json.numbers("ys", series.ys());
        });
  }
}
