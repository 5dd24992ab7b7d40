package weighhouse.report.plot;

import java.util.stream.DoubleStream;
import org.jsoup.nodes.Element;
import weighhouse.audit.Measure;
import weighhouse.report.text.Numbers;

/**
 * A graduated beam: the entered ratio hangs above it with its interval, what the model delivers
 * lies below as a band from the smallest to the largest cycle. Graduated in ratios where all are
 * above 0.
 */
public final class Beam {
  private static final int WIDTH = 320;
  private static final int HEIGHT = 74;
  private static final int LEFT = 14;
  private static final int RIGHT = WIDTH - 14;
  private static final int LINE = 34;

  private Beam() {}

  /** Draws the beam of a measure; nothing where its value is no number. */
  public static void draw(Element parent, Measure measure) {
    if (!Double.isFinite(measure.value())) {
      return;
    }
    Axis axis = axis(measure);
    Svg svg =
        Svg.drawing(parent, "beam", WIDTH, HEIGHT, "Entered against effective", words(measure));
    graduate(svg, axis);
    if (Double.isFinite(measure.lower()) && Double.isFinite(measure.upper())) {
      svg.line("interval", axis.at(measure.lower()), 16, axis.at(measure.upper()), 16);
    }
    double entered = axis.at(measure.value());
    svg.path("entered", triangle(entered, LINE - 1, -11));
    if (measure.effective() != null) {
      effective(svg, axis, measure.effective());
    }
  }

  private static void effective(Svg svg, Axis axis, Measure.Effective effective) {
    double from = axis.at(effective.min());
    double width = Math.max(2, axis.at(effective.max()) - from);
    svg.box("effective", from, LINE + 4, width, 7);
    svg.path("effective-median", triangle(axis.at(effective.median()), LINE + 2, 12));
  }

  private static void graduate(Svg svg, Axis axis) {
    svg.line("axis", LEFT, LINE, RIGHT, LINE);
    for (double tick : axis.ticks(5)) {
      boolean none = Math.abs(tick - 1) < 1e-9;
      svg.line(none ? "none" : "axis", axis.at(tick), LINE - (none ? 26 : 4), axis.at(tick), LINE);
      svg.text("tick", axis.at(tick), HEIGHT - 10, "middle", Numbers.show(tick));
    }
  }

  private static String triangle(double x, double y, double height) {
    return "M" + Svg.number(x) + " " + Svg.number(y) + "l-6 " + Svg.number(height) + "h12z";
  }

  private static String words(Measure measure) {
    String entered = "Entered " + Numbers.show(measure.value());
    Measure.Effective effective = measure.effective();
    return effective == null
        ? entered + "; no effective ratio"
        : entered
            + "; effective "
            + Numbers.show(effective.min())
            + " to "
            + Numbers.show(effective.max());
  }

  private static Axis axis(Measure measure) {
    Measure.Effective e = measure.effective();
    double[] all =
        DoubleStream.of(
                measure.value(),
                measure.lower(),
                measure.upper(),
                e == null ? Double.NaN : e.min(),
                e == null ? Double.NaN : e.max())
            .filter(Double::isFinite)
            .toArray();
    double least = DoubleStream.of(all).min().orElse(0);
    double most = DoubleStream.of(all).max().orElse(1);
    if (least > 0) {
      // 1 is always on the beam: it is what no effect would weigh
      return new Axis(Math.min(least, 1) * 0.94, Math.max(most, 1) * 1.06, LEFT, RIGHT, true);
    }
    return Axis.linear(Math.min(least, 0), Math.max(most, 0), LEFT, RIGHT);
  }
}
