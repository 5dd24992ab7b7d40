package weighhouse.report.plot;

import org.jsoup.nodes.Element;
import org.jsoup.parser.Parser;
import weighhouse.report.text.Visible;

/** Elements of a drawing, appended to the page's tree. */
final class Svg {
  private final Element root;

  private Svg(Element root) {
    this.root = root;
  }

  /** A drawing that is read out by its title and description. */
  static Svg drawing(
      Element parent, String css, int width, int height, String title, String description) {
    Element root = parent.appendElement("svg", Parser.NamespaceSvg);
    root.attr("class", css)
        .attr("viewBox", "0 0 " + width + " " + height)
        .attr("role", "img")
        .attr("aria-label", Visible.text(title + ". " + description));
    return new Svg(root);
  }

  void line(String css, double x1, double y1, double x2, double y2) {
    shape("line", css)
        .attr("x1", number(x1))
        .attr("y1", number(y1))
        .attr("x2", number(x2))
        .attr("y2", number(y2));
  }

  void path(String css, String data) {
    shape("path", css).attr("d", data);
  }

  void box(String css, double x, double y, double width, double height) {
    shape("rect", css)
        .attr("x", number(x))
        .attr("y", number(y))
        .attr("width", number(width))
        .attr("height", number(height));
  }

  /** Text whose {@code anchor} (start, middle or end) stands at x. */
  void text(String css, double x, double y, String anchor, String text) {
    shape("text", css)
        .attr("x", number(x))
        .attr("y", number(y))
        .attr("text-anchor", anchor)
        .text(Visible.text(text));
  }

  /** A coordinate with one decimal: finer than any screen or printer shows at this size. */
  static String number(double coordinate) {
    long tenths = Math.round(coordinate * 10);
    return tenths % 10 == 0 ? Long.toString(tenths / 10) : Double.toString(tenths / 10.0);
  }

  private Element shape(String tag, String css) {
    return root.appendElement(tag, Parser.NamespaceSvg).attr("class", css);
  }
}
