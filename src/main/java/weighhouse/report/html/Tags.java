package weighhouse.report.html;

import java.util.List;
import org.jsoup.nodes.Element;
import weighhouse.report.text.Visible;

/** Elements of the page. Text is made visible here and escaped by the tree when it is printed. */
final class Tags {
  private Tags() {}

  static Element add(Element parent, String tag, String css) {
    Element child = parent.appendElement(tag);
    if (!css.isEmpty()) {
      child.attr("class", css);
    }
    return child;
  }

  static Element text(Element parent, String tag, String css, String text) {
    return add(parent, tag, css).text(Visible.text(text));
  }

  /** A section that is named by its heading. */
  static Element section(Element parent, String id, String heading) {
    Element section = add(parent, "section", "").attr("id", id).attr("aria-labelledby", id + "-h");
    text(section, "h2", "", heading).attr("id", id + "-h");
    return section;
  }

  /** A table that scrolls on its own where the page is too narrow. */
  static Element table(Element parent, String caption, List<String> heads) {
    Element frame =
        add(parent, "div", "scroll")
            .attr("tabindex", "0")
            .attr("role", "group")
            .attr("aria-label", Visible.text(caption));
    Element table = frame.appendElement("table");
    text(table, "caption", "", caption);
    Element row = table.appendElement("thead").appendElement("tr");
    heads.forEach(head -> text(row, "th", "", head).attr("scope", "col"));
    return table.appendElement("tbody");
  }

  /** A row of that table: the first cell heads it, numbers stand right. */
  static Element row(Element body, String head, List<String> numbers) {
    Element row = body.appendElement("tr");
    text(row, "th", "", head).attr("scope", "row");
    numbers.forEach(number -> text(row, "td", "number", number));
    return row;
  }

  /** Something that opens on demand. */
  static Element details(Element parent, String summary) {
    Element details = add(parent, "details", "");
    text(details, "summary", "", summary);
    return details;
  }

  /** A list of sentences under a small heading; nothing where there are none. */
  static void sentences(Element parent, String heading, List<String> sentences) {
    if (sentences.isEmpty()) {
      return;
    }
    text(parent, "h3", "", heading);
    Element list = add(parent, "ul", "sentences");
    sentences.forEach(sentence -> text(list, "li", "", sentence));
  }

  /** First letter large. */
  static String capital(String text) {
    return text.isEmpty() ? text : Character.toUpperCase(text.charAt(0)) + text.substring(1);
  }

  /** {@code 1 finding}, {@code 2 findings}. */
  static String count(long number, String noun) {
    return number + " " + noun + (number == 1 ? "" : "s");
  }

  /** An id that every browser and address bar takes. */
  static String anchor(String prefix, String id) {
    return prefix + id.replaceAll("[^A-Za-z0-9_-]", "-");
  }
}
