package weighhouse.report.plot;

import org.jsoup.nodes.Element;
import weighhouse.audit.Verdict;

/** The emblem beside the verdict: a balance, level when all is well, leaning when it is not. */
public final class Balance {
  private static final double ARM = 34;

  private Balance() {}

  public static void draw(Element parent, Verdict verdict) {
    double lean =
        Math.toRadians(
            switch (verdict) {
              case PASS -> 0;
              case QUERY -> 6;
              case HOLD -> 15;
            });
    Svg svg = Svg.drawing(parent, "balance", 96, 84, "Balance", "Verdict " + verdict.text());
    svg.line("post", 48, 14, 48, 76);
    svg.line("post", 34, 77, 62, 77);
    double dx = ARM * Math.cos(lean);
    double dy = ARM * Math.sin(lean);
    svg.line("post", 48 - dx, 20 - dy, 48 + dx, 20 + dy);
    pan(svg, 48 - dx, 20 - dy);
    pan(svg, 48 + dx, 20 + dy);
    svg.path("pivot", "M48 14m-4 0a4 4 0 1 0 8 0a4 4 0 1 0 -8 0");
  }

  private static void pan(Svg svg, double x, double y) {
    svg.path("cord", "M" + Svg.number(x) + " " + Svg.number(y) + "l-9 24h18z");
    svg.path("pan", "M" + Svg.number(x - 11) + " " + Svg.number(y + 24) + "a11 8 0 0 0 22 0z");
  }
}
