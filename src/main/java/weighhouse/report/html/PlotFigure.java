package weighhouse.report.html;

import java.util.ArrayList;
import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.audit.Plot;
import weighhouse.report.plot.LinePlot;
import weighhouse.report.text.Numbers;

/** A plot with its caption and its figures as a table. */
final class PlotFigure {
  private static final int MOST_ROWS = 25;

  private PlotFigure() {}

  static void write(Plot plot, Element parent) {
    Element figure = Tags.add(parent, "figure", "");
    Tags.text(figure, "figcaption", "", plot.title());
    LinePlot.draw(figure, plot);
    Element details = Tags.details(figure, "Figures of the plot");
    if (sharesXs(plot)) {
      table(details, plot.title(), plot.x(), plot.series());
    } else {
      plot.series().forEach(s -> table(details, s.name(), plot.x(), List.of(s)));
    }
  }

  private static boolean sharesXs(Plot plot) {
    return plot.series().stream().allMatch(series -> series.xs().equals(plot.series().get(0).xs()));
  }

  private static void table(Element parent, String caption, String x, List<Plot.Series> series) {
    List<String> heads = new ArrayList<>(List.of(x));
    series.forEach(one -> heads.add(one.name()));
    Element body = Tags.table(parent, caption, heads);
    List<Double> xs = series.isEmpty() ? List.of() : series.get(0).xs();
    int stride = Math.max(1, (xs.size() + MOST_ROWS - 1) / MOST_ROWS);
    for (int i = 0; i < xs.size(); i += stride) {
      int at = i;
      Tags.row(
          body,
          Numbers.show(xs.get(i)),
          series.stream().map(one -> Numbers.show(one.ys().get(at))).toList());
    }
  }
}
