package weighhouse.report.plot;

import java.util.List;
import java.util.function.Function;
import org.jsoup.nodes.Element;
import weighhouse.audit.Plot;
import weighhouse.report.text.Numbers;
import weighhouse.report.text.Visible;

/** A plot with axes, one line a series and a legend in words. */
public final class LinePlot {
  private static final int WIDTH = 480;
  private static final int HEIGHT = 270;
  private static final int LEFT = 62;
  private static final int RIGHT = WIDTH - 22;
  private static final int TOP = 34;
  private static final int BOTTOM = HEIGHT - 46;
  private static final int MOST_POINTS = 400;
  private static final int LOOKS = 4;

  private LinePlot() {}

  /** Draws the plot; nothing where no point of it is a number. */
  public static void draw(Element parent, Plot plot) {
    double[] xs = bounds(plot, Plot.Series::xs);
    double[] ys = bounds(plot, Plot.Series::ys);
    if (xs[0] > xs[1] || ys[0] > ys[1]) {
      return;
    }
    Svg svg = Svg.drawing(parent, "plot", WIDTH, HEIGHT, plot.title(), description(plot, ys));
    Axis x = new Axis(xs[0], xs[1] > xs[0] ? xs[1] : xs[0] + 1, LEFT, RIGHT, false);
    Axis y = Axis.linear(ys[0], ys[1], BOTTOM, TOP);
    grid(svg, x, y);
    svg.text("axis-name", (LEFT + RIGHT) / 2.0, HEIGHT - 8, "middle", plot.x());
    svg.text("axis-name", 4, TOP - 20, "start", plot.y());
    legend(svg, plot.series());
    for (int i = 0; i < plot.series().size(); i++) {
      svg.path("series s" + i % LOOKS, path(plot.series().get(i), x, y));
    }
  }

  private static String description(Plot plot, double[] ys) {
    String lines = String.join(", ", plot.series().stream().map(Plot.Series::name).toList());
    return "Lines: "
        + lines
        + ". "
        + plot.y()
        + " from "
        + Numbers.show(ys[0])
        + " to "
        + Numbers.show(ys[1])
        + " along "
        + plot.x()
        + ". The figures follow as a table";
  }

  private static void grid(Svg svg, Axis x, Axis y) {
    for (double tick : y.ticks(5)) {
      svg.line("grid", LEFT, y.at(tick), RIGHT, y.at(tick));
      svg.text("tick", LEFT - 8, y.at(tick) + 4, "end", Numbers.show(tick));
    }
    for (double tick : x.ticks(5)) {
      svg.line("axis", x.at(tick), BOTTOM, x.at(tick), BOTTOM + 5);
      svg.text("tick", x.at(tick), BOTTOM + 20, "middle", Numbers.show(tick));
    }
    svg.line("axis", LEFT, BOTTOM, RIGHT, BOTTOM);
  }

  /** Names from the right, each with a piece of its line. */
  private static void legend(Svg svg, List<Plot.Series> series) {
    double right = RIGHT;
    for (int i = series.size() - 1; i >= 0; i--) {
      String name = Visible.shortened(series.get(i).name(), 28);
      svg.text("legend", right, TOP - 20, "end", name);
      double start = right - 6.6 * name.length() - 34;
      svg.line("series s" + i % LOOKS, start, TOP - 24, start + 26, TOP - 24);
      right = start - 18;
    }
  }

  private static String path(Plot.Series series, Axis x, Axis y) {
    StringBuilder path = new StringBuilder();
    int size = Math.min(series.xs().size(), series.ys().size());
    int stride = Math.max(1, (size + MOST_POINTS - 1) / MOST_POINTS);
    boolean pen = false;
    for (int i = 0; i < size; i = i == size - 1 ? size : Math.min(i + stride, size - 1)) {
      double px = x.at(series.xs().get(i));
      double py = y.at(series.ys().get(i));
      boolean drawn = Double.isFinite(px) && Double.isFinite(py);
      if (drawn) {
        path.append(pen ? 'L' : 'M').append(Svg.number(px)).append(' ').append(Svg.number(py));
      }
      pen = drawn;
    }
    return path.toString();
  }

  private static double[] bounds(Plot plot, Function<Plot.Series, List<Double>> numbers) {
    double[] bounds = {Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY};
    for (Plot.Series series : plot.series()) {
      for (double number : numbers.apply(series)) {
        if (Double.isFinite(number)) {
          bounds[0] = Math.min(bounds[0], number);
          bounds[1] = Math.max(bounds[1], number);
        }
      }
    }
    return bounds;
  }
}
